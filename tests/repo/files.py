"""The files that belong to the repository: everything that .gitignore does not name."""

from __future__ import annotations

import re
from fnmatch import fnmatch
from pathlib import Path

ROOT = Path(__file__).parents[2]


def _ignored_names() -> tuple[str, ...]:
    lines = (ROOT / ".gitignore").read_text(encoding="utf-8").splitlines()
    return (".git", *(line for line in lines if line and not line.startswith("#")))


IGNORED = _ignored_names()


def ignored(name: str) -> bool:
    """Whether .gitignore names this file or folder; its patterns hold at every depth."""
    return any(fnmatch(name, pattern) for pattern in IGNORED)


def kept(folder: Path = ROOT) -> list[Path]:
    """All files below a folder that belong to the repository, in order."""
    found: list[Path] = []
    for path in sorted(folder.iterdir()):
        if ignored(path.name):
            continue
        found.extend(kept(path) if path.is_dir() else [path])
    return found


def short(path: Path) -> str:
    """The path from the root of the repository."""
    return path.relative_to(ROOT).as_posix()


def sources(*folders: str) -> list[Path]:
    """The Python files in these top level folders, generated ones left out."""
    return [
        path
        for folder in folders
        for path in kept(ROOT / folder)
        if path.suffix == ".py" and "generated" not in path.parts
    ]


def documents() -> list[Path]:
    """What people read: README, DEVELOPERS and the pages of docs/ written by hand."""
    pages = (path for path in kept(ROOT / "docs") if path.suffix == ".md")
    written = [path for path in pages if (ROOT / "docs" / "reference") not in path.parents]
    return [ROOT / "README.md", ROOT / "DEVELOPERS.md", *written]


def blocks(text: str, language: str) -> list[str]:
    """The fenced blocks of one language in a Markdown text."""
    return re.findall(rf"^```{language}\n(.*?)^```$", text, flags=re.MULTILINE | re.DOTALL)
