"""The forms of a capture that come in lines: hex, JSON Lines and CSV."""

from __future__ import annotations

import json
import re
from decimal import Decimal
from typing import IO, TYPE_CHECKING, Any

from fishplate.bits import BYTE, read_bits, to_bytes
from fishplate.captures.frame import Frame
from fishplate.captures.lines import read_lines
from fishplate.errors import DecodeError, FishplateError

if TYPE_CHECKING:
    from collections.abc import Iterator, Mapping

    from fishplate.captures.lines import Line

MEDIA = ("balise", "loop", "radio")
DIRECTIONS = ("to-train", "to-track")
TEXTS: Mapping[str, tuple[str, ...]] = {
    "medium": MEDIA,
    "direction": DIRECTIONS,
    "version": (),
    "note": (),
}
"""Columns that hold text, and the words that may stand there (none: any)."""

TREE_KEYS = frozenset({"header", "packets", "content"})
NUMBER = re.compile(r"-?(?:0|[1-9]\d*)(?:\.\d+)?")
BINARY = frozenset("01 \t\r\n")
COLUMN = "data"
SHOWN = 24


def data_bits(data: str, bits: int | None = None) -> tuple[bytes, int]:
    """Return the bytes and the true length of hex or ``base64:`` text; raises `DecodeError`."""
    if data[:2] in {"0b", "0B"}:
        # Hex of a frame that begins with the byte 0B, not a mark for binary digits.
        data = f"0x{data}"
    if bits is None:
        try:
            octets = bytes.fromhex(data)
        except ValueError:
            # Not plain hex: the slow way reads it, or says what is wrong.
            value, size = read_bits(data)
            return to_bytes(value, size), size
        return octets, len(octets) * BYTE
    value, size = read_bits(data, bits)
    return to_bytes(value, size), size


def typed_bits(text: str) -> tuple[bytes, int]:
    """Return the bytes and the length of what a person writes: as `data_bits`, or ``0b`` bits.

    A capital B is a hex digit, as is a small one that other than binary digits follow.
    """
    text = text.strip()
    if text.startswith("0b") and len(text) > len("0b") and BINARY.issuperset(text[2:]):
        value, size = read_bits(text)
        data = to_bytes(value, size)
    else:
        data, size = data_bits(text)
    if not size:
        raise DecodeError("no digits in it")
    return data, size


def hex_frames(stream: IO[bytes]) -> Iterator[Frame]:
    """Yield the frames of a text with one frame a line; ``#`` starts a comment."""
    for line in read_lines(stream):
        if line.problem:
            yield _unreadable(line, line.problem)
            continue
        text = line.text.partition("#")[0].strip()
        if not text:
            continue
        try:
            data, bits = typed_bits(text)
        except DecodeError as error:
            yield _unreadable(line, error)
        else:
            yield Frame(data, bits, line=line.number)


def json_frames(stream: IO[bytes]) -> Iterator[Frame]:
    """Yield the frames of a capture in JSON Lines."""
    for line in read_lines(stream):
        if line.problem:
            yield _unreadable(line, line.problem)
        elif line.text and not line.text.isspace():
            try:
                yield _from_record(_record(line.text), line.number)
            except FishplateError as error:
                yield _unreadable(line, error)


def csv_frames(stream: IO[bytes]) -> Iterator[Frame]:
    """Yield the frames of a capture in CSV with the column names of JSON Lines."""
    import csv  # noqa: PLC0415  only this form needs it

    rows = _CsvLines(stream)
    first = next((each for each in rows if each.strip()), "")
    delimiter = max(",;\t", key=first.count)
    head = [each.strip().lower() for each in next(csv.reader([first], delimiter=delimiter), [])]
    if first.strip() and COLUMN not in head:
        shown = first.strip()[: 4 * SHOWN]
        problem = rows.problem or DecodeError(f"no column {COLUMN} in the head line: {shown}")
        yield Frame(line=rows.number, problem=problem)
        return
    reader = csv.reader(rows, delimiter=delimiter)
    while True:
        line = rows.number + 1
        try:
            fields = next(reader)
        except StopIteration:
            return
        except csv.Error as error:
            yield Frame(line=line, problem=DecodeError(f"not CSV: {error}"))
            continue
        unreadable = rows.taken_problem()
        if unreadable:
            yield Frame(line=rows.number, problem=unreadable)
        elif any(map(str.strip, fields)):
            yield _from_fields(head, fields, line)


class _CsvLines:
    """Lines for the csv module, which takes texts only: `problem` keeps what was none."""

    def __init__(self, stream: IO[bytes]) -> None:
        self.lines = read_lines(stream)
        self.number = 0
        self.problem: DecodeError | None = None

    def __iter__(self) -> _CsvLines:
        return self

    def __next__(self) -> str:
        line = next(self.lines)
        self.number = line.number
        self.problem = line.problem or self.problem
        return f"{line.text}\n" if line.problem is None else "?\n"

    def taken_problem(self) -> DecodeError | None:
        """Return what was wrong with a line since it was last asked."""
        problem, self.problem = self.problem, None
        return problem


def _unreadable(line: Line, problem: FishplateError) -> Frame:
    return Frame(line=line.number, problem=problem)


def _constant(name: str) -> None:
    raise ValueError(f"{name} is not a JSON number")


def _record(text: str) -> dict[str, Any]:
    try:
        record = json.loads(text, parse_float=Decimal, parse_constant=_constant)
    except json.JSONDecodeError as error:
        raise DecodeError(f"not JSON: {error.msg} at character {error.colno}") from None
    except (ValueError, RecursionError, ArithmeticError) as error:
        raise DecodeError(f"not JSON: {str(error)[: 4 * SHOWN]}") from None
    if not isinstance(record, dict):
        raise DecodeError("expected a JSON object with data, got something else")
    return record


def _from_record(record: dict[str, Any], number: int) -> Frame:
    data = record.get(COLUMN)
    if not isinstance(data, str):
        if data is None and not TREE_KEYS.isdisjoint(record):
            raise DecodeError("a decoded tree instead of a frame: `fishplate encode` takes trees")
        raise DecodeError(f"no {COLUMN}" if data is None else f"{COLUMN} is not text")
    bits = record.get("bits")
    if bits is not None and type(bits) is not int:
        raise DecodeError(f"bits is {_shown(bits)}, not a whole number")
    time = record.get("time")
    if isinstance(time, bool) or not isinstance(time, (str, int, Decimal, type(None))):
        raise DecodeError(f"time is {_shown(time)}, neither text nor a number")
    texts = {name: _text(name, record.get(name)) for name in TEXTS}
    octets, size = data_bits(data, bits)
    return Frame(
        octets,
        size,
        time,
        texts["medium"],
        texts["direction"],
        texts["version"],
        texts["note"] or "",
        line=number,
    )


def _text(name: str, value: object) -> str | None:
    if value is None or value == "":
        return None
    words = TEXTS[name]
    if not isinstance(value, str):
        raise DecodeError(f"{name} is {_shown(value)}, not text")
    if words and value not in words:
        raise DecodeError(f"{name} is {_shown(value)}, expected {' or '.join(words)}")
    return value


def _shown(value: object) -> str:
    text = repr(value)
    return text if len(text) <= SHOWN else f"{text[:SHOWN]}…"


def _from_fields(head: list[str], fields: list[str], number: int) -> Frame:
    record: dict[str, Any] = {}
    for name, field in zip(head, fields, strict=False):
        if field.strip():
            record[name] = field.strip()
    try:
        for name, kinds in (("bits", int), ("time", Decimal)):
            if NUMBER.fullmatch(record.get(name, "")):
                whole = "." not in record[name]
                record[name] = int(record[name]) if whole else kinds(record[name])
        return _from_record(record, number)
    except (FishplateError, ValueError) as error:
        problem = error if isinstance(error, FishplateError) else DecodeError(str(error))
        return Frame(line=number, problem=problem)
