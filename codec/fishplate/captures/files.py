"""Where frames come from: files, open streams, and what a person typed."""

from __future__ import annotations

import io
from dataclasses import replace
from pathlib import Path
from typing import IO, TYPE_CHECKING, cast

from fishplate.captures.binary import binary_frames
from fishplate.captures.frame import Form, Frame
from fishplate.captures.lines import BYTE_ORDER_MARK
from fishplate.captures.text import csv_frames, hex_frames, json_frames, typed_bits
from fishplate.errors import DecodeError

if TYPE_CHECKING:
    import os
    from collections.abc import Iterator

SUFFIXES: dict[str, Form] = {
    ".bin": "bin",
    ".csv": "csv",
    ".hex": "hex",
    ".jsonl": "jsonl",
    ".ndjson": "jsonl",
    ".txt": "hex",
}
"""What a file holds, by its suffix; others are told by their first bytes."""

TEXT_CONTROLS = frozenset(b"\t\n\r\f")
SPACE = 32
LOOK = 4096


def read_capture(
    path: str | os.PathLike[str], *, form: Form | None = None, medium: str | None = None
) -> Iterator[Frame]:
    """Yield the frames of a capture, one at a time.

    `form` ("hex", "jsonl", "csv", "bin") is told by the suffix, else by the first bytes; `medium`
    helps where raw bits could be one telegram or many radio messages. A line that cannot be read
    is a frame with a `problem`. Raises `OSError` where the file cannot be read, `DecodeError`
    where there is no frame in it.
    """
    path = Path(path)
    with path.open("rb") as stream:
        yield from read_stream(stream, str(path), form=form or form_by_name(path), medium=medium)


def form_by_name(path: str | os.PathLike[str]) -> Form | None:
    """Return what a file holds by its suffix, None where the suffix does not say."""
    return SUFFIXES.get(Path(path).suffix.lower())


def read_stream(
    stream: IO[bytes], source: str = "-", *, form: Form | None = None, medium: str | None = None
) -> Iterator[Frame]:
    """Yield the frames of an open binary stream, as `read_capture` does."""
    if not hasattr(stream, "peek"):
        stream = io.BufferedReader(cast("io.RawIOBase", stream))
    form = form or _form_of(cast("io.BufferedReader", stream).peek(LOOK)[:LOOK])
    readers = {"hex": hex_frames, "jsonl": json_frames, "csv": csv_frames}
    frames = binary_frames(stream, medium) if form == "bin" else readers[form](stream)
    index = -1
    for index, frame in enumerate(frames):
        yield replace(frame, index=index, source=source)
    if index < 0:
        raise DecodeError("no frame in it")


def read_literal(text: str, source: str = "") -> Frame:
    """Return the frame that hex, ``0b`` or ``base64:`` text stands for; raises `DecodeError`."""
    data, bits = typed_bits(text)
    return Frame(data, bits, source=source or text)


def _form_of(start: bytes) -> Form:
    """Tell what a stream holds by its first bytes."""
    start = start.removeprefix(BYTE_ORDER_MARK)
    if any(byte < SPACE and byte not in TEXT_CONTROLS for byte in start):
        return "bin" if start[:2] not in (b"\xff\xfe", b"\xfe\xff") else "hex"
    try:
        # The last character may be cut by the end of the look.
        text = start.decode(errors="strict" if len(start) < LOOK else "ignore").lstrip()
    except UnicodeDecodeError as error:
        if error.end < len(start):
            return "bin"
        text = start[: error.start].decode().lstrip()
    if text.startswith("{"):
        return "jsonl"
    first = text.partition("\n")[0].lower()
    names = [
        each.strip().strip('"') for each in first.replace(";", ",").replace("\t", ",").split(",")
    ]
    return "csv" if "data" in names else "hex"
