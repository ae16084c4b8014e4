"""Captures line by line: CSV, what a line says beside its frame, and nothing lost silently."""

from __future__ import annotations

import csv
import io
import json
import random
from decimal import Decimal
from typing import TYPE_CHECKING

import pytest

from fishplate.captures import Frame, measures_itself, read_stream
from fishplate.captures.lines import Replayed

if TYPE_CHECKING:
    from fishplate.captures import Form


def frames(text: str, form: Form | None = "csv") -> list[Frame]:
    return list(read_stream(io.BytesIO(text.encode()), "source", form=form))


def problem(frame: Frame) -> str:
    assert frame.problem is not None
    assert frame.data == b""
    return str(frame.problem)


def test_csv() -> None:
    file = io.StringIO()
    writer = csv.writer(file)
    writer.writerow(["Time", "note", "data", "bits", "else"])
    writer.writerow(["12.50", 'a, "b"', "0102", "", "x"])
    writer.writerow(["06:15", "", "FF", "8", ""])
    writer.writerow(["", "", "zz", "", ""])
    writer.writerow(["", "", "", "", ""])
    writer.writerow(["7", "", "00"])
    first, second, third, fourth = frames(file.getvalue())
    assert (first.time, first.note, first.data) == (Decimal("12.50"), 'a, "b"', b"\x01\x02")
    assert (second.time, second.bits, second.line) == ("06:15", 8, 3)
    assert "'z'" in problem(third)
    assert (fourth.time, fourth.data, fourth.line) == (7, b"\x00", 6)
    assert {each.passed_over for each in (first, second, fourth)} == {("else",)}


@pytest.mark.parametrize("mark", [",", ";", "\t"])
def test_csv_of_other_habits(mark: str) -> None:
    (frame,) = frames(f'\ufeff\n# comment\n"time"{mark}DATA{mark}\n1{mark}0102{mark}{mark}\n', None)
    assert (frame.time, frame.data, frame.passed_over) == (1, b"\x01\x02", ())


@pytest.mark.parametrize("quoted", [False, True])
def test_quoted_and_plain_lines_are_read_alike(*, quoted: bool) -> None:
    # The reader of lines without quotes is ours, that of the others Python's.
    style = csv.QUOTE_ALL if quoted else csv.QUOTE_MINIMAL
    file = io.StringIO()
    writer = csv.writer(file, quoting=style)
    rows = [["data", "note"], ["0102", "a b"], ["03", "'"], [" 04 ", ""]]
    writer.writerows(rows)
    assert [(each.data, each.note) for each in frames(file.getvalue())] == [
        (b"\x01\x02", "a b"),
        (b"\x03", "'"),
        (b"\x04", ""),
    ]


def test_an_open_quote_loses_its_own_line_only() -> None:
    lines = ["data,note", '00,"open', *(f"{number:02},n" for number in range(1, 100))]
    opened, *rest = frames("\n".join(lines))
    assert "a quote is opened and not closed" in problem(opened)
    assert opened.line == 2
    assert [each.data[0] for each in rest] == [int(f"{n:02}", 16) for n in range(1, 100)]
    assert [each.line for each in rest] == list(range(3, 102))


@pytest.mark.parametrize(
    ("line", "said"),
    [
        ('00,"a"b,,', "not CSV"),
        ("00,n,,,x", "5 cells for 4 columns"),
        ("00,a,80.0,", "bits is 80.0, not a whole number"),
        ("00,a,x,", "bits is 'x', not a whole number"),
        ("00,a,8e0,", "bits is '8e0', not a whole number"),
        ("00,a,," + "9" * 5000, "time is a number of 5000 characters"),
        ("00,a,9,", "9 bits are claimed"),
        (",a,8,", "no data"),
        ("00,a\r,8,", "carriage return"),
        ("00," + "a" * 70_000 + ",,", "passed over"),
    ],
)
def test_bad_csv_is_named_and_passed_over(line: str, said: str) -> None:
    first, second = frames(f"data,note,bits,time\n{line}\n01,,,\n")
    assert said in problem(first)
    assert (first.line, second.line, second.data) == (2, 3, b"\x01")


@pytest.mark.parametrize(
    ("text", "said"),
    [
        ("a,b\n1,2\n", "no column data in the head line: a,b"),
        ("time,data\r1,00\r", "carriage return"),
        ("data,note,Data\n00,,01\n", "column data stands twice"),
        ("data,x,x\n00,1,2\n", "column x stands twice"),
        ('data,"note\n00,1\n', "a quote is opened"),
        ("x" * 70_000 + "\n00\n", "passed over"),
    ],
)
def test_without_a_head_line_nothing_is_guessed(text: str, said: str) -> None:
    (frame,) = frames(text)
    assert said in problem(frame)
    assert frame.line == 1


def test_no_noise_leaks_an_error_of_the_csv_module() -> None:
    draw = random.Random(20310514)  # noqa: S311  noise, not a secret
    for _ in range(300):
        noise = "".join(draw.choices('",;\r\n\t\0 a0\u2028', k=60))
        for text in (noise + "\n", f"data,note\n{noise}\n"):
            assert all(each.problem or each.data for each in frames(f"{text}00,ok\n"))


@pytest.mark.parametrize(
    ("data", "bits", "wanted", "flaw"),
    [
        ("FF", 5, "F8", "bits behind the 5 that are claimed are not 0 but 111"),
        ("F8", 5, "F8", None),
        ("F", 3, "E0", "not 0 but 1"),
        ("E", 3, "E0", None),
        ("base64:/w==", 6, "FC", "not 0 but 11"),
        ("FF", 8, "FF", None),
    ],
)
def test_bits_behind_the_length_are_named(
    data: str, bits: int, wanted: str, flaw: str | None
) -> None:
    (frame,) = frames(json.dumps({"data": data, "bits": bits}), "jsonl")
    assert (frame.data.hex().upper(), frame.bits, frame.problem) == (wanted, bits, None)
    assert (frame.flaw is None) == (flaw is None)
    assert (flaw or "") in str(frame.flaw)


@pytest.mark.parametrize("blank", ["", " ", "\t", "\u00a0"])
def test_data_is_hex_whatever_stands_before_it(blank: str) -> None:
    for data in (f"{blank}0b01", f"{blank}0B01"):
        for bits in ({}, {"bits": 16}):
            (frame,) = frames(json.dumps({"data": data, **bits}), "jsonl")
            assert (frame.data, frame.bits) == (b"\x0b\x01", 16)


def test_keys_that_mean_nothing_are_kept_by_name() -> None:
    first, second = frames('{"data": "00", "more": 1, "else": {}}\n{"data": "00"}\n', "jsonl")
    assert (first.passed_over, second.passed_over) == (("more", "else"), ())


def test_which_frames_can_be_split_from_one_run_of_bits() -> None:
    # SUBSET-026 8.4.4.6: NID_MESSAGE of 8 and L_MESSAGE of 10 bits; here 4 bytes.
    octets = bytes([3, 4 >> 2, (4 & 3) << 6, 0])
    assert measures_itself(Frame(octets, 32, medium="radio"))
    assert not measures_itself(Frame(octets, 32, medium="balise"))
    assert not measures_itself(Frame(octets, 31, medium="radio"))
    assert not measures_itself(Frame(octets + b"\0", 40, medium="radio"))
    assert not measures_itself(Frame(octets[:2], 16, medium="radio"))


def test_a_replayed_stream_is_the_stream() -> None:
    whole = b"first\nsecond\n\nlast"
    for cut in range(len(whole) + 1):
        for size in (-1, 1, 3, 100):
            again = Replayed(whole[:cut], io.BytesIO(whole[cut:]))
            plain = io.BytesIO(whole)
            while line := plain.readline(size):
                assert again.readline(size) == line
            assert again.readline(size) == b""
            again = Replayed(whole[:cut], io.BytesIO(whole[cut:]))
            assert again.read(size) == io.BytesIO(whole).read(size)
