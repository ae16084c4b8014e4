"""Where things live, how large they are, and words that do not belong here."""

from __future__ import annotations

import ast
import re
from typing import TYPE_CHECKING

import pytest

from repo.files import ROOT, documents, ignored, kept, short, sources

if TYPE_CHECKING:
    from pathlib import Path

TOP_LEVEL = {
    "README.md",
    "DEVELOPERS.md",
    "pyproject.toml",
    "codec",
    "cli",
    "tests",
    "fixtures",
    "docs",
}
LONGEST = 400
TABLES = re.compile(r"codec/fishplate/standard/v\d+_\d+_\d+/")

# Written in halves, so that this file passes its own test.
NOT_HERE = [
    "".join(halves)
    for halves in (
        ("/wo", "rk/"),
        ("/tm", "p/"),
        ("/ro", "ot/"),
        ("/ho", "me/"),
        ("transc", "ript"),
        ("lect", "ure"),
        ("seed ", "document"),
        ("py", "pi."),
        ("python", "hosted"),
        ("np", "mjs"),
        (".deb", "ian."),
    )
]


def test_top_level_holds_only_what_the_design_names() -> None:
    found = {path.name for path in ROOT.iterdir() if not ignored(path.name)}
    assert {name for name in found if not name.startswith(".")} == TOP_LEVEL


def test_no_file_names_a_machine_a_registry_or_its_making() -> None:
    pattern = re.compile("|".join(map(re.escape, NOT_HERE)), re.IGNORECASE)
    found = [
        f"{short(path)}:{number}: {match.group()}"
        for path in kept()
        for number, line in enumerate(path.read_bytes().decode("latin1").splitlines(), 1)
        if (match := pattern.search(line))
    ]
    assert not found


@pytest.mark.parametrize("word", NOT_HERE)
def test_the_search_would_find_each_word(word: str) -> None:
    pattern = re.compile("|".join(map(re.escape, NOT_HERE)), re.IGNORECASE)
    assert pattern.search(f"see {word.upper()} there")


def test_every_module_says_what_it_is_for() -> None:
    paths = sources("codec", "cli", "tests", "fixtures", "docs")
    silent = [
        short(path)
        for path in paths
        if not ast.get_docstring(ast.parse(path.read_text(encoding="utf-8")))
    ]
    assert not silent


def test_every_source_file_fits_in_the_head() -> None:
    lengths = {
        short(path): len(path.read_text(encoding="utf-8").splitlines())
        for path in sources("codec", "cli", "tests", "fixtures", "docs")
    }
    long = {
        name: lines for name, lines in lengths.items() if lines > LONGEST and not TABLES.match(name)
    }
    assert not long


def test_files_end_with_one_newline_and_hold_no_carriage_return() -> None:
    suffixes = {".py", ".md", ".toml", ".yaml", ".yml", ".jsonl", ".csv"}
    copied = ROOT / "fixtures" / "standard"
    wrong = []
    for path in (path for path in kept() if copied not in path.parents):
        content = path.read_bytes()
        if path.suffix in suffixes and content:
            ends_well = content.endswith(b"\n") and not content.endswith(b"\n\n")
            if not ends_well or b"\r" in content:
                wrong.append(short(path))
    assert not wrong


@pytest.mark.parametrize("path", documents(), ids=short)
def test_links_between_documents_lead_somewhere(path: Path) -> None:
    links = re.findall(r"\]\(([^)#:]+)(?:#[^)]*)?\)", path.read_text(encoding="utf-8"))
    assert not [link for link in links if not (path.parent / link).exists()]
