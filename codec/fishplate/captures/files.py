"""Where frames come from: files, open streams, and what a person typed."""

from __future__ import annotations

from dataclasses import replace
from pathlib import Path
from typing import IO, TYPE_CHECKING

from fishplate.captures.binary import binary_frames
from fishplate.captures.form import told_form
from fishplate.captures.frame import FORMS, Form, Frame
from fishplate.captures.table import csv_frames
from fishplate.captures.text import hex_frames, json_frames, typed_bits
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
"""What a file holds, by its suffix; others are told by their first lines."""


def read_capture(
    path: str | os.PathLike[str], *, form: Form | None = None, medium: str | None = None
) -> Iterator[Frame]:
    """Return the frames of a capture, one at a time.

    `form` ("hex", "jsonl", "csv", "bin") is told by the suffix, else by the first lines; `medium`
    helps where raw bits could be one telegram or many radio messages. A line that cannot be read
    is a frame with a `problem`. Raises `ValueError` for any other form. The file is opened when
    the first frame is asked for: `OSError` where it cannot be read and `DecodeError` where there
    is no frame in it are raised then.
    """
    _check(form)
    return _of_file(Path(path), form, medium)


def _of_file(path: Path, form: Form | None, medium: str | None) -> Iterator[Frame]:
    with path.open("rb") as stream:
        yield from read_stream(stream, str(path), form=form or form_by_name(path), medium=medium)


def _check(form: str | None) -> None:
    if form is not None and form not in FORMS:
        raise ValueError(f"form is one of {', '.join(FORMS)}, not {form!r}")


def form_by_name(path: str | os.PathLike[str]) -> Form | None:
    """Return what a file holds by its suffix, None where the suffix does not say."""
    return SUFFIXES.get(Path(path).suffix.lower())


def read_stream(
    stream: IO[bytes], source: str = "-", *, form: Form | None = None, medium: str | None = None
) -> Iterator[Frame]:
    """Return the frames of an open binary stream, as `read_capture` does."""
    _check(form)
    return _of_stream(stream, source, form, medium)


def _of_stream(
    stream: IO[bytes], source: str, form: Form | None, medium: str | None
) -> Iterator[Frame]:
    if form is None:
        form, stream = told_form(stream)
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
