"""Whatever is handed over: a clear line, the right exit code, and never a traceback."""

from __future__ import annotations

import json
import random
from typing import TYPE_CHECKING, Any

import pytest

if TYPE_CHECKING:
    from collections.abc import Callable
    from pathlib import Path

COMMANDS = (["decode"], ["decode", "--as", "jsonl"], ["fields"], ["list"], ["encode"])
NOISE = random.Random(20310514).randbytes(3000)  # noqa: S311  noise, not a secret

FILES: dict[str, bytes] = {
    "empty.txt": b"",
    "comment.txt": b"# nothing\n\n",
    "odd.hex": b"123\n",
    "words.hex": b"this is not hex\n",
    "latin.txt": b"# caf\xe9\n",
    "nul.txt": b"\0\0\0\n",
    "utf16.txt": "A102\n".encode("utf-16"),
    "noise.bin": NOISE,
    "noise.txt": NOISE,
    "noise.jsonl": NOISE,
    "noise.csv": NOISE,
    "noise.yaml": NOISE,
    "noise": NOISE,
    "short.bin": b"\x03",
    "deep.jsonl": b"[" * 50_000 + b"\n",
    "deep.json": b'{"a":' * 50_000,
    "deep.yaml": b"[" * 5_000,
    "number.jsonl": b'{"data": "00", "time": ' + b"9" * 5_000 + b"}\n",
    "exponent.jsonl": b'{"data": "00", "time": 1e999999999999999999999}\n',
    "types.jsonl": b'{"data": []}\n[]\n1\nnull\n{"data": "00", "bits": true}\n{}\n',
    "negative.jsonl": b'{"data": "00", "bits": -1}\n{"data": "00", "bits": 99}\n',
    "surrogate.jsonl": b'{"data": "0g", "note": "\\ud800"}\n',
    "quote.csv": b'data,note\n"00\n' + b"x" * 300_000 + b"\n",
    "head.csv": b"a,b\n1,2\n",
    "mac.csv": b"time,data\r1,9B0280011996C008E0C0\r",
    "mac.txt": b"9B0280011996C008E0C0\r9B0280011996C008E0C0\r",
    "twice.csv": b"data,data\n00,00\n",
    "escape.yaml": b'a: "\\UFFFFFFFF"\n',
    "tag.yaml": b"Q_DIR: !!bool x\n",
    "number.yaml": b"a: " + b"9" * 5_000 + b"\n",
    "bomb.yaml": b"a: &a [x,x,x,x,x,x,x,x,x,x]\n"
    + b"".join(
        b"%c: &%c [%s]\n" % (i, i, b",".join([b"*%c" % (i - 1)] * 9)) for i in range(98, 110)
    ),
}


@pytest.fixture
def folder(tmp_path: Path) -> Path:
    """All files that nobody should hand over."""
    for name, content in FILES.items():
        (tmp_path / name).write_bytes(content)
    (tmp_path / "dangling").symlink_to(tmp_path / "nothing")
    return tmp_path


@pytest.mark.parametrize("command", COMMANDS, ids=" ".join)
@pytest.mark.parametrize("name", FILES)
def test_no_file_is_a_surprise(
    fishplate: Callable[..., Any], folder: Path, command: list[str], name: str
) -> None:
    ended = fishplate(*command, folder / name)
    assert ended.code == 3
    assert str(folder / name) in ended.err
    assert "Traceback" not in ended.err


@pytest.mark.parametrize("name", FILES)
@pytest.mark.parametrize("command", COMMANDS, ids=" ".join)
def test_no_standard_input_is_a_surprise(
    fishplate: Callable[..., Any], command: list[str], name: str
) -> None:
    ended = fishplate(*command, "-", given=FILES[name])
    assert ended.code == 3
    assert "standard input" in ended.err
    assert "Traceback" not in ended.err
    for word in ("Decimal(", "literal for", "Exceeds the limit", "tag:yaml", "recursion"):
        assert word not in ended.err


@pytest.mark.parametrize("command", COMMANDS, ids=" ".join)
@pytest.mark.parametrize(
    "argument",
    ["", "nofile.jsonl", "0x", "base64", "0307g", "\x1b[31m", "ü", "a" * 5000 + "!", "\0"],
)
def test_what_is_no_input_is_wrong_usage(
    fishplate: Callable[..., Any], command: list[str], argument: str
) -> None:
    ended = fishplate(*command, argument)
    assert ended.code == 2
    assert "\x1b" not in ended.err


@pytest.mark.parametrize("command", COMMANDS, ids=" ".join)
def test_folders_and_missing_arguments_are_wrong_usage(
    fishplate: Callable[..., Any], folder: Path, command: list[str]
) -> None:
    assert fishplate(*command, folder).code == 2
    assert fishplate(*command, folder / "dangling").code == 2
    assert fishplate(*command).code == 2
    assert fishplate(*command, "--as", "nothing", "-").code == 2


@pytest.mark.parametrize("command", COMMANDS, ids=" ".join)
def test_standard_input_is_read_once(fishplate: Callable[..., Any], command: list[str]) -> None:
    ended = fishplate(*command, "-", "-", given="00\n")
    assert ended.code == 2
    assert "standard input can be read only once" in ended.err


def test_a_bad_first_line_does_not_decide_the_form(
    fishplate: Callable[..., Any], frame: str
) -> None:
    for first in ("oops", "# comment", "{oops"):
        given = f'{first}\n{{"data": "{frame}"}}\n{{"data": "{frame}"}}\n'
        ended = fishplate("list", "-", given=given)
        assert ended.code == 3
        assert sum("LRBG 16/257" in line for line in ended.out.splitlines()) == 2
        assert ended.err.startswith("standard input line 1: ")
        assert len(ended.err.splitlines()) == 1


def test_a_flaw_is_named_and_the_frame_is_read(fishplate: Callable[..., Any], frame: str) -> None:
    # The last bits of vector 01 are padding: 0, but for what is put there.
    data = f"{frame[:-2]}07"
    record = {"medium": "radio", "data": data, "bits": len(frame) * 4 - 3}
    ended = fishplate("list", "--from", "jsonl", "-", given=json.dumps(record))
    assert ended.code == 3
    assert "LRBG 16/257" in ended.out
    assert "standard input line 1: bits behind the" in ended.err


def test_what_is_passed_over_is_said_once_a_file(
    fishplate: Callable[..., Any], frame: str, tmp_path: Path
) -> None:
    path = tmp_path / "more.jsonl"
    record = {"data": frame, "signal": 1, "\x1b": 2}
    path.write_text(f"{json.dumps(record)}\n" * 3)
    ended = fishplate("list", path, "-", given="data,signal\n00,1\n".replace("00", frame))
    assert ended.code == 0
    assert ended.err.splitlines() == [
        f"{path}: passed over, no part of a capture: signal, \\x1b",
        "standard input: passed over, no part of a capture: signal",
    ]


def test_bad_lines_do_not_end_the_run(fishplate: Callable[..., Any], frame: str) -> None:
    long = "A" * 70_000
    lines = [frame, "zz", "123", long, f"0x{frame} # with a comment", "", "# only a comment", frame]
    ended = fishplate("list", "-", given="\n".join(lines))
    assert ended.code == 3
    assert sum("LRBG 16/257" in line for line in ended.out.splitlines()) == 3
    said = ended.err.splitlines()
    assert [line.split(": ")[0] for line in said] == [
        f"standard input line {number}" for number in (2, 3, 4)
    ]
    assert "'z'" in said[0]
    assert "odd number of hex digits" in said[1]
    assert "70001 bytes" in said[2]


def test_the_other_inputs_are_still_read(
    fishplate: Callable[..., Any], folder: Path, frame: str
) -> None:
    ended = fishplate("list", folder / "empty.txt", folder / "noise.txt", frame)
    assert ended.code == 3
    assert "LRBG 16/257" in ended.out
    assert f"{folder / 'empty.txt'}: no frame in it" in ended.err
