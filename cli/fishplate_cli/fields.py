"""`fishplate fields`: one row a field."""

from __future__ import annotations

import json
from enum import StrEnum
from textwrap import wrap
from typing import TYPE_CHECKING, Annotated

import typer

from fishplate.errors import path_text
from fishplate.frames.rows import walk_message
from fishplate_cli.console import USUAL, Complaints, coloured, style, visible, width, write
from fishplate_cli.inputs import (
    DirectionOption,
    FormOption,
    Given,
    Inputs,
    MediumOption,
    VersionOption,
    check_frames,
    read_frames,
)
from fishplate_cli.wording import book_of, heading, packet_title, quoted, unexplained

if TYPE_CHECKING:
    from collections.abc import Iterator

    from fishplate.captures import Frame
    from fishplate.frames import FieldRow, Message

HELP = """\
List every field of frames with its place, its code and its meaning.

Offsets and widths are in bits, from the start of the frame. The rows of a frame cover it
without gap: bits that no layout explains have a row without variable."""

LONGEST_PLACE = 40
LONGEST_RAW = 20


class As(StrEnum):
    """What is written."""

    TEXT = "text"
    JSONL = "jsonl"


def command(
    inputs: Inputs,
    *,
    view: Annotated[As, typer.Option("--as", help="What to write.")] = As.TEXT,
    medium: MediumOption = None,
    direction: DirectionOption = None,
    version: VersionOption = None,
    form: FormOption = None,
) -> None:
    """List fields."""
    check_frames(inputs)
    given = Given(medium, direction, version, form)
    complaints = Complaints()
    frames = (each for each in read_frames(inputs, given, complaints) if not each.problem)
    for number, frame in enumerate(frames):
        message = given.decode(frame)
        rows = walk_message(message, frame.value, frame.bits, strict=False)
        if view is As.TEXT:
            if number:
                write("")
            for line in table(frame, message, list(rows)):
                write(line)
        else:
            for row in rows:
                write(as_json(frame.index, row))
        complaints.about_message(frame, message)
    complaints.end()


def as_json(index: int, row: FieldRow) -> str:
    """Return one row as JSON."""
    return json.dumps(
        {
            "frame": index,
            "path": row.path,
            "variable": row.variable,
            "offset": row.offset,
            "width": row.width,
            "raw": row.raw,
            "meaning": row.meaning,
        },
        ensure_ascii=False,
    )


def table(frame: Frame, message: Message, rows: list[FieldRow]) -> Iterator[str]:
    """Yield the rows of one frame as a table."""
    book = book_of(message)
    first, second = heading(message, book)
    time = "" if frame.time is None else f"  {visible(str(frame.time))}"
    title = f"frame {frame.index}{time}  {first}"
    yield style(title, "bold", colour=coloured())
    yield from wrap(f"  {second}", width(), subsequent_indent="    ")
    places = [
        f"  {path_text(row.path[2:])}" if _in_packet(row) else path_text(row.path) for row in rows
    ]
    raws = [_raw(row) for row in rows]
    place_width = min(max(map(len, places), default=0), LONGEST_PLACE)
    raw_width = min(max(map(len, raws), default=0), LONGEST_RAW)
    columns = max(width(), USUAL)
    head = f"   bit  bits  {'field':<{place_width}}  {'raw':>{raw_width}}  meaning"
    if rows:
        yield style(head, "faint", colour=coloured())
    for row, place, raw in zip(rows, places, raws, strict=True):
        if _in_packet(row) and row.path[1:] == (row.path[1], "NID_PACKET"):
            title = packet_title(message.packets[int(row.path[1])], message.direction or "", book)
            yield from wrap(f"  packets[{row.path[1]}]: {title}", columns, subsequent_indent="    ")
        start = f"{row.offset:>6}  {row.width:>4}  {place:<{place_width}}  {raw:>{raw_width}}  "
        said = unexplained(str(row.raw), row.width) if row.variable is None else row.meaning
        yield from _wrapped(
            start, "" if isinstance(row.raw, str) and row.variable else said, columns
        )


def _in_packet(row: FieldRow) -> bool:
    return row.path[0] == "packets"


def _raw(row: FieldRow) -> str:
    if row.variable is None:
        return "-"
    return quoted(row.raw) if isinstance(row.raw, str) else str(row.raw)


def _wrapped(start: str, text: str, columns: int) -> Iterator[str]:
    space = max(columns - len(start), LONGEST_RAW)
    lines = wrap(visible(text), space) or [""]
    yield (start + lines[0]).rstrip()
    for line in lines[1:]:
        yield " " * len(start) + line
