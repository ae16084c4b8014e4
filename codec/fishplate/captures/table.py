"""Captures in CSV, with the column names of JSON Lines: one frame a line.

A quoted field that goes on in the next line is not taken: what a quote left open would hide is
worth more than a note of two lines.
"""

from __future__ import annotations

import re
from decimal import Decimal
from typing import IO, TYPE_CHECKING, Any

from fishplate.captures.frame import Frame
from fishplate.captures.lines import read_lines
from fishplate.captures.text import COLUMN, KNOWN, SHOWN, from_record
from fishplate.errors import DecodeError

if TYPE_CHECKING:
    from collections.abc import Iterator

    from fishplate.captures.lines import Line

DELIMITERS = ",;\t"
NUMBER = re.compile(r"-?(?:0|[1-9]\d*)(?:\.\d+)?", re.ASCII)
MOST_DIGITS = 1000
"""Digits of the longest number that is read as one."""


def csv_frames(stream: IO[bytes]) -> Iterator[Frame]:
    """Yield the frames of a capture in CSV; ``#`` starts a comment in front of the head line."""
    lines = read_lines(stream)
    first = next((each for each in lines if each.problem or not _says_nothing(each.text)), None)
    if first is None:
        return
    try:
        head, delimiter = _head(first)
    except DecodeError as error:
        yield Frame(line=first.number, problem=error)
        return
    passed_over = tuple(name for name in head if name not in KNOWN and name)
    for line in lines:
        try:
            cells = _cells(line, delimiter)
            if any(cells):
                yield from_record(_named(head, cells), line.number, passed_over)
        except DecodeError as error:
            yield Frame(line=line.number, problem=error)


def is_head(text: str) -> bool:
    """Tell whether a line is the head line of a capture in CSV."""
    try:
        return COLUMN in _split(text, _delimiter(text), lower=True)
    except DecodeError:
        return False


def _says_nothing(text: str) -> bool:
    return not text.strip() or text.lstrip().startswith("#")


def _delimiter(text: str) -> str:
    return max(DELIMITERS, key=text.count)


def _head(line: Line) -> tuple[list[str], str]:
    if line.problem:
        raise line.problem
    delimiter = _delimiter(line.text)
    head = _split(line.text, delimiter, lower=True)
    if COLUMN not in head:
        shown = line.text.strip()[: 4 * SHOWN]
        raise DecodeError(f"no column {COLUMN} in the head line: {shown}")
    for name in head:
        if name and head.count(name) > 1:
            raise DecodeError(f"column {name} stands twice in the head line")
    return head, delimiter


def _cells(line: Line, delimiter: str) -> list[str]:
    if line.problem:
        raise line.problem
    return _split(line.text, delimiter)


def _split(text: str, delimiter: str, *, lower: bool = False) -> list[str]:
    """Return the cells of one line without blanks around them."""
    cells = text.split(delimiter) if '"' not in text else _quoted(text, delimiter)
    return [cell.strip().lower() if lower else cell.strip() for cell in cells]


def _quoted(text: str, delimiter: str) -> list[str]:
    import csv  # noqa: PLC0415  only lines with quotes need it

    try:
        return next(csv.reader([text], delimiter=delimiter, strict=True))
    except csv.Error as error:
        if text.count('"') % 2:
            reason = "a quote is opened and not closed on the line: one frame stands on one line"
            raise DecodeError(reason) from None
        raise DecodeError(f"not CSV: {error}") from None


def _named(head: list[str], cells: list[str]) -> dict[str, Any]:
    """Return the cells that hold something under the names of their columns."""
    extra = [cell for cell in cells[len(head) :] if cell]
    if extra:
        reason = f"{len(cells)} cells for {len(head)} columns: a cell that holds the mark between"
        raise DecodeError(f"{reason} cells is put in quotes")
    record: dict[str, Any] = {name: cell for name, cell in zip(head, cells, strict=False) if cell}
    for name in ("bits", "time"):
        text = record.get(name, "")
        if not NUMBER.fullmatch(text):
            continue
        if len(text) > MOST_DIGITS:
            raise DecodeError(f"{name} is a number of {len(text)} characters")
        record[name] = Decimal(text) if "." in text else int(text)
    return record
