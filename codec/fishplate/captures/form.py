"""What a stream holds where nothing says it: told by its first bytes and lines."""

from __future__ import annotations

import io
import json
from typing import IO, TYPE_CHECKING, cast

from fishplate.captures.lines import BYTE_ORDER_MARK, Replayed
from fishplate.captures.table import is_head
from fishplate.captures.text import typed_bits
from fishplate.errors import DecodeError

if TYPE_CHECKING:
    from fishplate.captures.frame import Form

TEXT_CONTROLS = frozenset(b"\t\n\r\f\v")
SPACE = 32
LOOK = 4096
"""Bytes that are looked at to tell raw bits from text."""

FURTHEST = 64 * 1024
"""Bytes of lines that are looked at where the first ones do not tell."""


def told_form(stream: IO[bytes]) -> tuple[Form, IO[bytes]]:
    """Tell what a stream holds; return it with a stream that still holds all of it."""
    if not hasattr(stream, "peek"):
        stream = io.BufferedReader(cast("io.RawIOBase", stream))
    if _is_binary(cast("io.BufferedReader", stream).peek(LOOK)[:LOOK]):
        return "bin", stream
    seen = bytearray()
    told: Form | None = None
    likely: Form = "hex"
    heads = True
    while told is None and len(seen) < FURTHEST:
        line = stream.readline(FURTHEST - len(seen))
        if not line:
            break
        seen += line
        text = line.decode(errors="replace").removeprefix("\ufeff").strip()
        if not text:
            continue
        told = _told(text, heads=heads)
        if not text.startswith("#"):
            heads = False
        if text.startswith("{"):
            likely = "jsonl"
    return told or likely, cast("IO[bytes]", Replayed(bytes(seen), stream))


def _told(text: str, *, heads: bool) -> Form | None:
    """Tell the form by one line, None where it does not say; `heads`: it may be a head line."""
    if heads and is_head(text):
        return "csv"
    if text.startswith("{"):
        try:
            return "jsonl" if isinstance(json.loads(text), dict) else None
        except (ValueError, RecursionError):
            return None
    try:
        typed_bits(text.partition("#")[0])
    except DecodeError:
        return None
    return "hex"


def _is_binary(start: bytes) -> bool:
    """Tell whether these bytes are no text; UTF-16 is left to be named as such."""
    start = start.removeprefix(BYTE_ORDER_MARK)
    if any(byte < SPACE and byte not in TEXT_CONTROLS for byte in start):
        return start[:2] not in (b"\xff\xfe", b"\xfe\xff")
    try:
        # The last character may be cut by the end of the look.
        start.decode(errors="strict" if len(start) < LOOK else "ignore")
    except UnicodeDecodeError as error:
        return error.end < len(start)
    return False
