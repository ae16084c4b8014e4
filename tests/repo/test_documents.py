"""The documents are true: their commands exist, their examples run and print what they show."""

from __future__ import annotations

import doctest
import os
import re
import subprocess
import sys
import sysconfig
from typing import TYPE_CHECKING

import pytest
import yaml

import fishplate
from fishplate.trees import read_yaml
from repo.files import ROOT, blocks, documents, short

if TYPE_CHECKING:
    from pathlib import Path

OPTIONS = doctest.ELLIPSIS | doctest.NORMALIZE_WHITESPACE
SCRIPTS = sysconfig.get_path("scripts")


def readme() -> str:
    return (ROOT / "README.md").read_text(encoding="utf-8")


@pytest.mark.parametrize(
    ("name", "runs"), [("demo", r"fishplate decode fixtures/demo/"), ("test", r"pytest")]
)
def test_readme_has_its_two_commands(name: str, runs: str) -> None:
    marker = re.escape(f"<!-- command: {name} -->")
    found = re.findall(rf"^{marker}\n+```\w*\n(.*?)^```$", readme(), re.MULTILINE | re.DOTALL)
    assert len(found) == 1, f"one block behind the marker, not {len(found)}"
    assert "python3 -m venv" in found[0]
    assert re.search(runs, found[0])


@pytest.mark.parametrize("path", documents(), ids=short)
def test_files_that_documents_name_exist(path: Path) -> None:
    text = path.read_text(encoding="utf-8")
    named = re.findall(r"\b(?:fixtures|codec|cli|tests|docs)/[\w./-]*\w", text)
    assert not [name for name in named if not (ROOT / name).exists()]


@pytest.mark.parametrize("name", ["README.md", "docs/start.md"])
def test_the_caution_stands_where_people_begin(name: str) -> None:
    text = (ROOT / name).read_text(encoding="utf-8")
    assert "EN 50128" in text
    assert "EN 50716" in text


@pytest.mark.parametrize("path", documents(), ids=short)
def test_python_examples_print_what_they_show(path: Path) -> None:
    text = path.read_text(encoding="utf-8")
    examples = [block for block in blocks(text, "python") if block.startswith(">>>")]
    parser, names = doctest.DocTestParser(), {}
    said: list[str] = []
    for number, block in enumerate(examples, 1):
        test = parser.get_doctest(block, names, f"{short(path)}[{number}]", str(path), 0)
        runner = doctest.DocTestRunner(optionflags=OPTIONS)
        runner.run(test, out=said.append, clear_globs=False)
        names = test.globs
    assert not said, "".join(said)


def test_the_authored_example_gives_the_frame_it_shows() -> None:
    """The hex was packed by hand from the widths in SUBSET-026 3.6.0, 7.4.2.4 and 8.7.2."""
    text = (ROOT / "docs" / "how-to" / "author.md").read_text(encoding="utf-8")
    (tree, report), (shown,) = blocks(text, "yaml"), blocks(text, "text")
    assert fishplate.encode(yaml.safe_load(tree)).hex.upper() == shown.strip()
    (authored,) = read_yaml(report)
    assert fishplate.decode(fishplate.encode(authored.tree)).version == "3.0"


def test_the_help_carries_the_caution() -> None:
    done = subprocess.run(
        [sys.executable, "-c", "import fishplate_cli; fishplate_cli.main()", "--help"],
        capture_output=True,
        encoding="utf-8",
        check=True,
    )
    assert "EN 50128" in done.stdout


def test_some_python_examples_exist() -> None:
    text = (ROOT / "docs" / "how-to" / "embed.md").read_text(encoding="utf-8")
    assert any(block.startswith(">>>") for block in blocks(text, "python"))


@pytest.mark.parametrize("path", documents(), ids=short)
def test_console_examples_print_what_they_show(path: Path) -> None:
    """Blocks of `console`: lines with `$ ` are run, `...` stands for lines left out."""
    checker = doctest.OutputChecker()
    for block in blocks(path.read_text(encoding="utf-8"), "console"):
        for example in re.split(r"^\$ ", block, flags=re.MULTILINE)[1:]:
            command, _, shown = example.partition("\n")
            output = in_shell(command)
            matches = checker.check_output(shown, output, doctest.ELLIPSIS)
            assert matches, f"$ {command}\nshown:\n{shown}\nprinted:\n{output}"


def in_shell(command: str) -> str:
    """What a command of the documents prints, run at the root with our scripts in reach."""
    done = subprocess.run(
        ["bash", "-c", command.replace(".venv/bin/", "")],
        cwd=ROOT,
        env={**os.environ, "PATH": f"{SCRIPTS}:{os.environ['PATH']}", "NO_COLOR": "1"},
        stdout=subprocess.PIPE,
        stderr=subprocess.STDOUT,
        encoding="utf-8",
        check=False,
    )
    return done.stdout
