"""What people read: the look of the text outputs, held as files beside this one.

They pin wording and look only, never facts. FISHPLATE_GOLDEN=write rewrites them; read what
changed before accepting it.
"""

from __future__ import annotations

import json
import os
from pathlib import Path
from typing import Any

import pytest
import yaml
from typer.testing import CliRunner

from fishplate_cli.app import app

HERE = Path(__file__).parent / "text"
VECTORS = Path(__file__).resolve().parents[2] / "fixtures" / "vectors"
WRITE = os.environ.get("FISHPLATE_GOLDEN") == "write"
SHOWN = ("01", "02", "03", "09", "10", "11", "12", "20")


def vector(number: str) -> dict[str, Any]:
    (path,) = VECTORS.glob(f"{number}-*.yaml")
    found: dict[str, Any] = yaml.safe_load(path.read_text(encoding="utf-8"))
    return found


def line(number: str, **changes: object) -> str:
    """One line of a capture with a frame worked by hand."""
    found = vector(number)
    record = {
        "time": f"06:15:{number}",
        "medium": found["medium"],
        "direction": found["direction"],
        "data": found["hex"].replace(" ", ""),
        "bits": found["bits"],
        "note": found["name"],
    }
    return json.dumps(record | changes) + "\n"


def clean() -> str:
    """Frames worked by hand, as they are."""
    return "".join(map(line, SHOWN))


def broken() -> str:
    """The same frame cut, lengthened, renumbered, and what is none."""
    data = vector("01")["hex"].replace(" ", "")
    telegram = vector("02")["hex"].replace(" ", "")
    return (
        line("01", data=data[:-8], bits=4 * len(data[:-8]), note="cut in packet 21")
        + line("01", data=data + "ABCD", bits=4 * len(data) + 16, note="two bytes too many")
        + line("01", data="4D" + data[2:], note="message 77 is not defined")
        + line("02", data="94" + telegram[2:], note="system version code 20")
        + line("02", bits=100, data=telegram[:26], note="cut in packet 41")
        + line("01", data="0307", bits=16, medium=None, note="too little to tell")
        + '{"data": "0307 not hex"}\n'
    )


CALLS = {
    "decode": (["decode"], clean),
    "decode-broken": (["decode"], broken),
    "fields": (["fields"], clean),
    "fields-broken": (["fields"], broken),
    "list": (["list"], clean),
    "list-broken": (["list"], broken),
}
ABOUT = {
    "about-variable": ["V_EMA"],
    "about-bit-set": ["NC_TRAIN"],
    "about-packet": ["packet", "72"],
    "about-message": ["message", "24"],
    "about-number": ["0"],
    "about-header": ["balise"],
    "about-elsewhere": ["packet", "203"],
    "about-inferred": ["packet", "45", "--version", "2.2"],
    "about-between": ["--between", "2.0", "2.1"],
}


def check(name: str, text: str) -> None:
    path = HERE / f"{name}.txt"
    if WRITE:
        HERE.mkdir(exist_ok=True)
        path.write_text(text, encoding="utf-8")
    assert text == path.read_text(encoding="utf-8"), f"{path.name}: FISHPLATE_GOLDEN=write"


@pytest.mark.parametrize("name", CALLS)
def test_frames_look_as_agreed(name: str) -> None:
    arguments, given = CALLS[name]
    done = CliRunner().invoke(app, [*arguments, "--from", "jsonl", "-"], input=given())
    assert done.exit_code == (3 if "broken" in name else 0)
    check(name, done.stdout)
    if "broken" in name:
        check(f"{name}-errors", done.stderr)


@pytest.mark.parametrize("name", ABOUT)
def test_descriptions_look_as_agreed(name: str) -> None:
    done = CliRunner().invoke(app, ["about", *ABOUT[name]])
    assert done.exit_code == 0
    check(name, done.stdout)


@pytest.mark.parametrize("name", ["", "decode", "encode", "fields", "list", "about"])
def test_no_help_is_wider_than_a_terminal(name: str) -> None:
    done = CliRunner().invoke(app, [*filter(None, [name]), "--help"])
    assert done.exit_code == 0
    assert max(map(len, done.stdout.splitlines())) <= 80
