"""Version, licence and changelog say the same thing everywhere."""

from __future__ import annotations

import re
import subprocess
import sys
import tomllib
from importlib.metadata import metadata

import fishplate
from repo.files import ROOT


def test_the_version_is_the_same_everywhere() -> None:
    done = subprocess.run(
        [sys.executable, "-c", "import fishplate_cli; fishplate_cli.main()", "--version"],
        capture_output=True,
        encoding="utf-8",
        check=True,
    )
    changelog = (ROOT / "docs" / "changelog.md").read_text(encoding="utf-8")
    newest = re.search(r"^## (\S+)", changelog, flags=re.MULTILINE)
    assert newest
    assert newest.group(1) == fishplate.__version__
    assert fishplate.__version__ in done.stdout.split()
    assert metadata("fishplate")["Version"] == fishplate.__version__


def test_the_licence_text_is_where_the_metadata_says() -> None:
    project = tomllib.loads((ROOT / "pyproject.toml").read_text(encoding="utf-8"))["project"]
    assert project["license"] == "MIT"
    texts = [(ROOT / name).read_text(encoding="utf-8") for name in project["license-files"]]
    assert "Permission is hereby granted, free of charge" in texts[0]
