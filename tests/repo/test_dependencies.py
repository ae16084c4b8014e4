"""pyproject.toml declares what the code imports; start-up loads no more than it needs."""

from __future__ import annotations

import ast
import re
import subprocess
import sys
import tomllib
from typing import TYPE_CHECKING

import pytest

from repo.files import ROOT, kept, sources

if TYPE_CHECKING:
    from collections.abc import Iterator
    from pathlib import Path

PROJECT = tomllib.loads((ROOT / "pyproject.toml").read_text(encoding="utf-8"))["project"]
IMPORTED_AS = {"pyyaml": "yaml", "myst-parser": "myst_parser"}
SHIPPED_WITH = {"pydantic": {"pydantic_core"}}  # where pydantic documents its custom errors
OURS = {"fishplate", "fishplate_cli"}
TOOLS = {
    "bitstruct",  # imported by name in tests/bench
    "build",
    "import-linter",
    "mypy",
    "myst-parser",  # named in docs/conf.py
    "pytest-xdist",
    "ruff",
    "sphinx",
    "types-jsonschema",
    "types-PyYAML",
}
FRAME = "0x0307800078903C4C6C81E814901FF84258019000AA04E400041021F41FE0"


def distributions(requirements: list[str]) -> set[str]:
    """The names in a list of requirements, our own extras followed."""
    found: set[str] = set()
    for requirement in requirements:
        name = re.match(r"[\w-]+", requirement)
        assert name, requirement
        if name.group() == "fishplate":
            extras = re.search(r"\[(.*)\]", requirement)
            assert extras, requirement
            for extra in extras.group(1).split(","):
                found |= distributions(PROJECT["optional-dependencies"][extra.strip()])
        else:
            found.add(name.group())
    return found


def imports(path: Path) -> Iterator[str]:
    """The first parts of the modules that a file imports, at the top or inside."""
    for node in ast.walk(ast.parse(path.read_text(encoding="utf-8"))):
        if isinstance(node, ast.Import):
            yield from (alias.name.partition(".")[0] for alias in node.names)
        elif isinstance(node, ast.ImportFrom) and not node.level and node.module:
            yield node.module.partition(".")[0]


def foreign(*folders: str) -> dict[str, set[str]]:
    """Imports from outside by file; the standard library, our packages and neighbours left out."""
    near = OURS | sys.stdlib_module_names
    near |= {path.stem for path in (ROOT / "tests").iterdir()}
    found = {}
    for path in sources(*folders):
        names = set(imports(path)) - near - {each.stem for each in path.parent.glob("*.py")}
        found[path.relative_to(ROOT).as_posix()] = names
    return found


CORE = distributions(PROJECT["dependencies"])
DEV = distributions(PROJECT["optional-dependencies"]["dev"])
FUZZ = distributions(PROJECT["optional-dependencies"]["fuzz"])


def as_imports(names: set[str]) -> set[str]:
    shipped = {part for name in names for part in SHIPPED_WITH.get(name, ())}
    return {IMPORTED_AS.get(name, name) for name in names} | shipped


def test_the_packages_import_only_core_dependencies() -> None:
    undeclared = {
        name: extra
        for name, found in foreign("codec", "cli").items()
        if (extra := found - as_imports(CORE | (FUZZ if "/fuzz/" in name else set())))
    }
    assert not undeclared


def test_tests_and_scripts_import_only_what_dev_installs() -> None:
    undeclared = {
        name: extra
        for name, found in foreign("tests", "docs", "fixtures").items()
        if (extra := found - as_imports(CORE | DEV))
    }
    assert not undeclared


def test_every_declared_dependency_is_used() -> None:
    used = set().union(*foreign("codec", "cli", "tests", "docs", "fixtures").values())
    declared = CORE | distributions([*PROJECT["optional-dependencies"]["dev"], "fishplate[docs]"])
    assert not {name for name in declared - TOOLS if IMPORTED_AS.get(name, name) not in used}


def test_both_packages_are_typed() -> None:
    names = {path.relative_to(ROOT).as_posix() for path in kept()}
    assert {"codec/fishplate/py.typed", "cli/fishplate_cli/py.typed"} <= names


def loaded(statements: str) -> set[str]:
    """The modules that a fresh interpreter has loaded after these statements."""
    script = (
        "import sys\n"
        "try:\n"
        f"    {statements}\n"
        "except SystemExit as end:\n"
        "    assert not end.code, end.code\n"
        "print('modules:', *sys.modules)\n"
    )
    done = subprocess.run(
        [sys.executable, "-c", script], capture_output=True, encoding="utf-8", check=False
    )
    assert done.returncode == 0, done.stderr
    return set(done.stdout.rpartition("modules:")[2].split())


def command(*arguments: str) -> str:
    """Statements that call the entry point as the command line would."""
    argv = ["fishplate", *arguments]
    return f"sys.argv = {argv!r}; import fishplate_cli; fishplate_cli.main()"


@pytest.mark.parametrize(
    ("statements", "unwanted"),
    [
        pytest.param(
            "import fishplate",
            {"typer", "pydantic", "construct", "hypothesis", "yaml", "rich"},
            id="import",
        ),
        pytest.param(
            command("--version"),
            {"typer", "pydantic", "click", "rich", "construct", "hypothesis"},
            id="version",
        ),
        pytest.param(
            command("decode", FRAME),
            {"construct", "hypothesis", "matplotlib", "fishplate.models"},
            id="decode",
        ),
    ],
)
def test_start_up_loads_no_more_than_needed(statements: str, unwanted: set[str]) -> None:
    modules = loaded(statements)
    assert "fishplate" in modules
    assert not modules & unwanted
