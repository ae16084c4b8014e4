"""`fishplate fields`: one row a field."""

from __future__ import annotations

import json
from enum import StrEnum
from textwrap import wrap
from typing import TYPE_CHECKING, Annotated

import typer

from fishplate.errors import path_text
from fishplate.frames.rows import walk_message
from fishplate_cli.console import (
    USUAL,
    Complaints,
    coloured,
    shown_time,
    style,
    visible,
    width,
    write,
)
from fishplate_cli.inputs import (
    DirectionOption,
    FormOption,
    Given,
    Inputs,
    IssueOption,
    MediumOption,
    VersionOption,
    check_frames,
    read_frames,
)
from fishplate_cli.wording import (
    book_of,
    evidence_lines,
    heading,
    packet_title,
    quoted,
    unexplained,
)

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
NARROWEST_MEANING = 18
NUMBERS = "   bit  bits  "
GAP = "  "


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
    issue: IssueOption = None,
    form: FormOption = None,
) -> None:
    """List fields."""
    check_frames(inputs)
    given = Given(medium, direction, version, issue, form)
    complaints = Complaints()
    said: set[str] = set()
    frames = (each for each in read_frames(inputs, given, complaints) if not each.problem)
    for number, frame in enumerate(frames):
        message = given.decode(frame)
        rows = walk_message(message, frame.value, frame.bits, strict=False)
        if view is As.TEXT:
            if number:
                write("")
            for line in table(frame, message, list(rows), said):
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


def table(frame: Frame, message: Message, rows: list[FieldRow], before: set[str]) -> Iterator[str]:
    """Yield the rows of one frame as a table; `before` holds the evidence said before."""
    book = book_of(message)
    first, second = heading(message, book)
    columns = max(width(), USUAL)
    title = "  ".join(filter(None, (f"frame {frame.index}", shown_time(frame), first)))
    for each in wrap(title, columns, subsequent_indent="    "):
        yield style(each, "bold", colour=coloured())
    yield from wrap(f"  {second}", width(), subsequent_indent="    ")
    for sentence in evidence_lines(message, before):
        yield from wrap(f"  {sentence}", columns, subsequent_indent="    ")
    cells = [(_place(row), _raw(row)) for row in rows]
    raw_width = min(max(len("raw"), *(len(raw) for _, raw in cells), 0), LONGEST_RAW)
    room = columns - len(NUMBERS) - len(GAP) - raw_width - len(GAP) - NARROWEST_MEANING
    place_width = min(max((len(place) for place, _ in cells), default=0), LONGEST_PLACE, room)
    head = f"{NUMBERS}{'field':<{place_width}}{GAP}{'raw':>{raw_width}}{GAP}meaning"
    if rows:
        yield style(head, "faint", colour=coloured())
    for row, (place, raw) in zip(rows, cells, strict=True):
        if _in_packet(row) and row.path[1:] == (row.path[1], "NID_PACKET"):
            title = packet_title(message.packets[int(row.path[1])], message.direction or "", book)
            yield from wrap(f"  packets[{row.path[1]}]: {title}", columns, subsequent_indent="    ")
        start = f"{row.offset:>6}  {row.width:>4}  {place:<{place_width}}"
        if len(place) > place_width:
            # A long place has a line of its own.
            yield start
            start = " " * (len(start) - len(place) + place_width)
        start = f"{start}  {raw:>{raw_width}}  " if raw else f"{start}  "
        yield from _wrapped(start, _said(row), columns)


def _in_packet(row: FieldRow) -> bool:
    return row.path[0] == "packets"


def _place(row: FieldRow) -> str:
    return f"  {path_text(row.path[2:])}" if _in_packet(row) else path_text(row.path)


def _is_text(row: FieldRow) -> bool:
    return row.variable is not None and isinstance(row.raw, str)


def _raw(row: FieldRow) -> str:
    """Return the code; a text takes the place of code and meaning, and is no code."""
    if row.variable is None:
        return "-"
    return "" if _is_text(row) else str(row.raw)


def _said(row: FieldRow) -> str:
    if row.variable is None:
        return unexplained(str(row.raw), row.width)
    return quoted(str(row.raw)) if _is_text(row) else row.meaning


def _wrapped(start: str, text: str, columns: int) -> Iterator[str]:
    lines = wrap(visible(text), max(columns - len(start), 1)) or [""]
    yield (start + lines[0]).rstrip()
    for line in lines[1:]:
        yield " " * len(start) + line
