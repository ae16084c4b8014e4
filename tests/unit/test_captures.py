"""Captures: every form read, every bad line named, every frame written again."""

from __future__ import annotations

import io
import json
from typing import TYPE_CHECKING

import pytest

from fishplate.captures import (
    Frame,
    capture_line,
    form_by_name,
    read_capture,
    read_literal,
    read_stream,
)
from fishplate.captures.lines import LONGEST_LINE, read_lines
from fishplate.errors import DecodeError

if TYPE_CHECKING:
    from pathlib import Path

    from fishplate.captures import Form

# SUBSET-026 8.7.2 in outline: NID_MESSAGE 3, L_MESSAGE 10 bytes, the rest of no matter here.
MESSAGE = bytes([3, 10 >> 2, (10 & 3) << 6 | 5, 1, 2, 3, 4, 5, 6, 7])
# 8.4.2.1: Q_UPDOWN 1, M_VERSION 2.1 (33): a telegram.
TELEGRAM = bytes([0b1010_0001, *range(26)])


def frames(data: bytes | str, form: Form | None = None, medium: str | None = None) -> list[Frame]:
    octets = data.encode() if isinstance(data, str) else data
    return list(read_stream(io.BytesIO(octets), "source", form=form, medium=medium))


def problem(frame: Frame) -> str:
    assert frame.problem is not None
    assert frame.data == b""
    return str(frame.problem)


def test_hex_text() -> None:
    text = "# head\n\n03 07\t80 # tail\r\n0xA1b2\n0b10100\nbase64:AwE=\n0B11\n"
    found = frames(text, "hex")
    assert [(each.line, each.data, each.bits) for each in found] == [
        (3, b"\x03\x07\x80", 24),
        (4, b"\xa1\xb2", 16),
        (5, b"\xa0", 5),
        (6, b"\x03\x01", 16),
        (7, b"\x0b\x11", 16),
    ]
    assert [each.index for each in found] == [0, 1, 2, 3, 4]
    assert {each.source for each in found} == {"source"}


@pytest.mark.parametrize(
    ("line", "said"),
    [
        ("0307g0", "character 5 of the text is 'g'"),
        ("030", "odd number of hex digits"),
        ("base64:***", "not base64"),
        ("0x", "no digits"),
        ("base64:", "no digits"),
        ("0102\f0304", "'\\x0c' within the line"),
        ("0102\u20280304", "within the line"),
        ("0102\r0304", "carriage return"),
        ("# comment\r0304", "carriage return"),
    ],
)
def test_bad_hex_is_named_and_passed_over(line: str, said: str) -> None:
    first, second = frames(f"{line}\n0102\n", "hex")
    assert said in problem(first)
    assert first.place == "source line 1"
    assert (second.line, second.data, second.index) == (2, b"\x01\x02", 1)


def test_json_lines() -> None:
    record = {
        "time": "2031-04-02T06:15:07.120Z",
        "medium": "radio",
        "direction": "to-track",
        "version": "2.1",
        "data": "0102F0",
        "bits": 20,
        "note": "ä",
        "more": [1],
    }
    bare = {"data": "0b01", "time": None, "note": None}
    first, second = frames(f"{json.dumps(record)}\n \n{json.dumps(bare)}\n", "jsonl")
    assert (first.data, first.bits) == (b"\x01\x02\xf0", 20)
    assert (first.time, first.medium, first.direction) == (record["time"], "radio", "to-track")
    assert (first.version, first.note) == ("2.1", "ä")
    # In a capture data is hex: a frame may begin with the byte 0B.
    assert (second.data, second.bits) == (b"\x0b\x01", 16)
    assert (second.time, second.medium, second.note, second.line) == (None, None, "", 3)


def test_true_length_cuts_the_last_digit() -> None:
    # 210 bits of a short telegram (SUBSET-036 4.3.1.2) take 53 hex digits.
    (frame,) = frames(json.dumps({"data": "F" * 53, "bits": 210}), "jsonl")
    assert frame.bits == 210
    assert frame.data == b"\xff" * 26 + b"\xc0"
    assert frame.value == (1 << 210) - 1


@pytest.mark.parametrize(
    ("line", "said"),
    [
        ("{", "not JSON"),
        ("[]", "expected a JSON object"),
        ("{}", "no data"),
        ('{"data": 3}', "data is not text"),
        ('{"data": "0g"}', "'g'"),
        ('{"data": "00", "bits": 9}', "9 bits are claimed"),
        ('{"data": "0000", "bits": 8}', "8 more are there"),
        ('{"data": "00", "bits": "8"}', "not a whole number"),
        ('{"data": "00", "bits": true}', "not a whole number"),
        ('{"data": "00", "time": []}', "neither text nor a number"),
        ('{"data": "00", "time": NaN}', "not a JSON number"),
        ('{"data": "00", "medium": "gsm"}', "expected balise or loop or radio"),
        ('{"data": "00", "direction": "up"}', "expected to-train or to-track"),
        ('{"data": "00", "note": 1}', "not text"),
        ('{"header": {}}', "takes trees"),
        ("[" * 60_000, "not JSON"),
        ('{"data": "00", "time": ' + "9" * 5000 + "}", "more digits than can be held"),
        ('{"data": "00", "time": 1e9999999999999999999999}', "no number that can be held"),
        ('{"data": "00", "bits": 8.0}', "bits is 8.0, not a whole number"),
        ('{"data": "00", "bits": [8]}', "bits is a list, not a whole number"),
        ('{"data": "00", "time": true}', "time is true, neither text nor a number"),
        ('{"data": "00", "version": "two"}', "expected X.Y such as 2.1"),
        ('{"data": "00", "data": "01"}', "key 'data' stands twice"),
        ('{"data": "00"}\r{"data": "01"}', "carriage return"),
    ],
)
def test_bad_json_is_named_and_passed_over(line: str, said: str) -> None:
    first, second = frames(f'{line}\n{{"data": "01"}}\n', "jsonl")
    assert said in problem(first)
    assert first.line == 1
    assert (second.line, second.data) == (2, b"\x01")


def test_radio_messages_one_after_the_other() -> None:
    found = frames(MESSAGE * 3, "bin")
    assert [each.data for each in found] == [MESSAGE] * 3
    assert {each.bits for each in found} == {80}


def test_what_does_not_split_is_one_frame_and_said() -> None:
    first, rest = frames(MESSAGE + MESSAGE[:-1], "bin")
    assert (first.data, first.note) == (MESSAGE, "")
    assert (rest.data, rest.medium) == (MESSAGE[:-1], "radio")
    assert "from byte 10 on" in rest.note
    (alone,) = frames(MESSAGE[:-1], "bin")
    assert (alone.data, alone.note) == (MESSAGE[:-1], "")
    _, zero = frames(MESSAGE + bytes(5), "bin")
    assert zero.data == bytes(5)


def test_a_telegram_is_the_whole_file() -> None:
    (frame,) = frames(TELEGRAM, "bin")
    assert (frame.data, frame.bits) == (TELEGRAM, 216)
    (given,) = frames(MESSAGE * 2, "bin", medium="loop")
    assert given.data == MESSAGE * 2


def test_a_flood_of_bytes_is_not_kept() -> None:
    (frame,) = frames(TELEGRAM + bytes(200_000), "bin")
    assert "200027 bytes from byte 0 on are passed over" in problem(frame)


@pytest.mark.parametrize(
    ("data", "bits", "problems"),
    [
        (b'\n {"data": "0102"}\n', [16], 0),
        (b"time,data\n1,0102\n", [16], 0),
        (b"0102\n", [16], 0),
        (b"\xef\xbb\xbf# caf\xc3\xa9\n0102\n", [16], 0),
        (MESSAGE, [80], 0),
        (b"0102\r\n".decode().encode("utf-16"), [0], 1),
        (b'oops\n{"data": "0102"}\n', [0, 16], 1),
        (b'# comment\n\n{"data": "0102"}\n', [0, 16], 1),
        (b'{oops\n{"data": "0102"}\n', [0, 16], 1),
        (b"{oops\n0102\n", [0, 16], 1),
        (b'{oops\n{"data"\n', [0, 0], 2),
        (b"# comment\ndata;time\n0102;1\n", [16], 0),
        (b"oops\n" * 20_000 + b'{"data": "0102"}\n', [0] * 20_001, 20_001),
    ],
)
def test_a_stream_tells_its_form(data: bytes, bits: list[int], problems: int) -> None:
    found = frames(data)
    assert [each.bits for each in found] == bits
    assert sum(each.problem is not None for each in found) == problems


@pytest.mark.parametrize("data", [b"", b"\n\n", b"# nothing\n"])
def test_nothing_is_an_error(data: bytes) -> None:
    with pytest.raises(DecodeError, match="no frame in it"):
        frames(data)


def test_a_long_line_is_passed_over_unread() -> None:
    class Watched(io.BytesIO):
        most = 0

        def readline(self, size: int | None = -1) -> bytes:  # type: ignore[override]
            line = super().readline(size)
            Watched.most = max(Watched.most, len(line))
            return line

    lines = list(read_lines(Watched(b"A" * 1_000_000 + b"\n0102\n" + b"B" * LONGEST_LINE + b"\n")))
    assert Watched.most <= LONGEST_LINE + 1
    first, second, third = lines
    assert first.problem is not None
    assert "1000001 bytes" in str(first.problem)
    assert (second.number, second.text, second.problem) == (2, "0102", None)
    assert (third.number, len(third.text)) == (3, LONGEST_LINE)


def test_files_are_read_by_their_suffix(tmp_path: Path) -> None:
    assert [form_by_name(name) for name in ("a.JSONL", "b.csv", "c.bin", "d.txt", "e")] == [
        "jsonl",
        "csv",
        "bin",
        "hex",
        None,
    ]
    path = tmp_path / "odd.txt"
    path.write_bytes(b'{"data": "00"}\n')
    (frame,) = read_capture(path)
    assert frame.problem is not None
    (frame,) = read_capture(path, form="jsonl")
    assert (frame.data, frame.source) == (b"\x00", str(path))
    absent = read_capture(tmp_path / "none.txt")
    with pytest.raises(FileNotFoundError):
        next(absent)
    with pytest.raises(ValueError, match="hex, jsonl, csv, bin, not 'xml'"):
        read_capture(path, form="xml")  # type: ignore[arg-type]


def test_what_a_person_types() -> None:
    assert (read_literal("03 07").data, read_literal("0b0011").bits) == (b"\x03\x07", 4)
    # 0B and hex digits behind it are a byte, whatever the case.
    assert read_literal("0b44").data == read_literal("0B44").data == b"\x0b\x44"
    with pytest.raises(DecodeError):
        read_literal("030")


@pytest.mark.parametrize("time", ["1", "1.50", "-0.10", "0.0000001", '"1.50"', '"ä"'])
def test_a_frame_becomes_its_line_again(time: str) -> None:
    line = (
        f'{{"time": {time}, "medium": "radio", "direction": "to-train", "data": "0BA0", '
        '"bits": 13, "note": "ü"}'
    )
    (frame,) = frames(line, "jsonl")
    assert capture_line(frame) == line
    assert capture_line(Frame(b"\x01", 8)) == '{"data": "01", "bits": 8}'
