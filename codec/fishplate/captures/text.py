"""The forms of a capture that hold one frame a line: hex and JSON Lines (CSV stands beside)."""

from __future__ import annotations

import json
from decimal import Decimal
from typing import IO, TYPE_CHECKING, Any

from fishplate.bits import BYTE, read_bits, read_text, to_bytes
from fishplate.captures.frame import Frame, Time
from fishplate.captures.lines import read_lines
from fishplate.errors import DecodeError, FishplateError
from fishplate.standard.vocabulary import DIRECTIONS, MEDIA
from fishplate.trees import repeated_key
from fishplate.versions import NAME

if TYPE_CHECKING:
    from collections.abc import Iterator, Mapping

TEXTS: Mapping[str, tuple[str, ...]] = {
    "medium": MEDIA,
    "direction": DIRECTIONS,
    "version": (),
    "note": (),
}
"""Columns that hold text, and the words that may stand there (none: any)."""

TREE_KEYS = frozenset({"header", "packets", "content"})
COLUMN = "data"
KNOWN = frozenset({"time", COLUMN, "bits", *TEXTS})
BINARY = frozenset("01 \t\r\n")
SHOWN = 24


def data_bits(data: str, bits: int | None = None) -> tuple[bytes, int, DecodeError | None]:
    """Return the bytes and the true length of hex or ``base64:`` text; raises `DecodeError`.

    Third comes what is wrong with it all the same: bits behind the true length that are not 0.
    """
    try:
        octets = bytes.fromhex(data)
    except ValueError:
        # Not plain hex: the slow way reads it, or says what is wrong.
        return _any_data_bits(data, bits)
    size = len(octets) * BYTE
    if bits is None or bits == size:
        return octets, size, None
    behind = size - bits
    if 0 < behind < BYTE and not octets[-1] & (1 << behind) - 1:
        return octets, bits, None
    return _any_data_bits(data, bits)


def _any_data_bits(data: str, bits: int | None) -> tuple[bytes, int, DecodeError | None]:
    data = data.strip()
    if data[:2] in {"0b", "0B"}:
        # Hex of a frame that begins with the byte 0B, not a mark for binary digits.
        data = f"0x{data}"
    value, size = read_bits(data, bits)
    flaw = None
    if bits is not None:
        whole, width = read_text(data, whole_bytes=False)
        behind = whole & (1 << width - size) - 1
        if behind:
            shown = f"{behind:0{width - size}b}"
            flaw = DecodeError(f"bits behind the {size} that are claimed are not 0 but {shown}")
    return to_bytes(value, size), size, flaw


def typed_bits(text: str) -> tuple[bytes, int]:
    """Return the bytes and the length of what a person writes: as `data_bits`, or ``0b`` bits.

    A capital B is a hex digit, as is a small one that other than binary digits follow.
    """
    text = text.strip()
    if text.startswith("0b") and len(text) > len("0b") and BINARY.issuperset(text[2:]):
        value, size = read_bits(text)
        data = to_bytes(value, size)
    else:
        data, size, _ = data_bits(text)
    if not size:
        raise DecodeError("no digits in it")
    return data, size


def hex_frames(stream: IO[bytes]) -> Iterator[Frame]:
    """Yield the frames of a text with one frame a line; ``#`` starts a comment."""
    for line in read_lines(stream):
        if line.problem:
            yield Frame(line=line.number, problem=line.problem)
            continue
        text = line.text.partition("#")[0].strip()
        if not text:
            continue
        try:
            data, bits = _one_line(text)
        except DecodeError as error:
            yield Frame(line=line.number, problem=error)
        else:
            yield Frame(data, bits, line=line.number)


def _one_line(text: str) -> tuple[bytes, int]:
    """Read one line of hex; what breaks it otherwise than a line feed does joins no frames."""
    first, *more = text.splitlines()
    if more:
        raise DecodeError(f"{text[len(first)]!r} within the line: lines end with a line feed here")
    return typed_bits(text)


def json_frames(stream: IO[bytes]) -> Iterator[Frame]:
    """Yield the frames of a capture in JSON Lines."""
    for line in read_lines(stream):
        if line.problem:
            yield Frame(line=line.number, problem=line.problem)
        elif line.text and not line.text.isspace():
            try:
                yield from_record(_record(line.text), line.number)
            except FishplateError as error:
                yield Frame(line=line.number, problem=error)


def _constant(name: str) -> None:
    raise DecodeError(f"not JSON: {name} is not a JSON number")


def _fraction(text: str) -> Decimal:
    try:
        return Decimal(text)
    except ArithmeticError:
        raise DecodeError(f"{text[:SHOWN]} is no number that can be held") from None


def _unique(pairs: list[tuple[str, Any]]) -> dict[str, Any]:
    found = dict(pairs)
    if len(found) != len(pairs):
        raise DecodeError(f"key {repeated_key(pairs)!r} stands twice")
    return found


DECODER = json.JSONDecoder(
    object_pairs_hook=_unique, parse_float=_fraction, parse_constant=_constant
)
"""Built once: `json.loads` would build one a line."""


def _record(text: str) -> dict[str, Any]:
    try:
        record = DECODER.decode(text)
    except json.JSONDecodeError as error:
        raise DecodeError(f"not JSON: {error.msg} at character {error.colno}") from None
    except ValueError:
        raise DecodeError("a number with more digits than can be held") from None
    except RecursionError:
        raise DecodeError("not JSON as captures use it: nested too deep") from None
    if not isinstance(record, dict):
        raise DecodeError("expected a JSON object with data, got something else")
    return record


def from_record(
    record: dict[str, Any], number: int, passed_over: tuple[str, ...] | None = None
) -> Frame:
    """Return the frame of one line, given by its columns; raises `DecodeError`."""
    data = record.get(COLUMN)
    if not isinstance(data, str):
        if data is None and not TREE_KEYS.isdisjoint(record):
            raise DecodeError("a decoded tree instead of a frame: `fishplate encode` takes trees")
        raise DecodeError(f"no {COLUMN}" if data is None else f"{COLUMN} is not text")
    bits = record.get("bits")
    if bits is not None and type(bits) is not int:
        raise DecodeError(f"bits is {_shown(bits)}, not a whole number")
    texts = {name: _text(name, record.get(name)) for name in TEXTS}
    octets, size, flaw = data_bits(data, bits)
    return Frame(
        octets,
        size,
        _time(record.get("time")),
        texts["medium"],
        texts["direction"],
        texts["version"],
        texts["note"] or "",
        line=number,
        flaw=flaw,
        passed_over=_passed_over(record) if passed_over is None else passed_over,
    )


def _passed_over(record: dict[str, Any]) -> tuple[str, ...]:
    return () if record.keys() <= KNOWN else tuple(key for key in record if key not in KNOWN)


def _time(time: object) -> Time | None:
    if isinstance(time, bool) or not isinstance(time, (str, int, Decimal, type(None))):
        raise DecodeError(f"time is {_shown(time)}, neither text nor a number")
    return time


def _text(name: str, value: object) -> str | None:
    if value is None or value == "":
        return None
    words = TEXTS[name]
    if not isinstance(value, str):
        raise DecodeError(f"{name} is {_shown(value)}, not text")
    if words and value not in words:
        raise DecodeError(f"{name} is {_shown(value)}, expected {' or '.join(words)}")
    if name == "version" and not NAME.fullmatch(value):
        raise DecodeError(f"{name} is {_shown(value)}, expected X.Y such as 2.1")
    return value


def _shown(value: object) -> str:
    """Write a value of JSON as it stands there, shortened."""
    if isinstance(value, (list, dict)):
        return "a list" if isinstance(value, list) else "an object"
    text = str(value).lower() if isinstance(value, bool) else str(value)
    if isinstance(value, str):
        text = repr(value)
    return text if len(text) <= SHOWN else f"{text[:SHOWN]}…"
