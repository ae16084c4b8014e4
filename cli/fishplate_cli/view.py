"""The text view of a frame: packet by packet, every line with the bit it begins at."""

from __future__ import annotations

from textwrap import wrap
from typing import TYPE_CHECKING, NamedTuple

from fishplate.errors import path_text
from fishplate.frames.rows import walk_message
from fishplate.standard.vocabulary import COUNT
from fishplate_cli.console import shown_time, style, visible
from fishplate_cli.wording import (
    SPARE,
    book_of,
    book_of_packet,
    evidence_lines,
    heading,
    in_heading,
    packet_title,
    row_text,
)

if TYPE_CHECKING:
    from collections.abc import Iterator, Sequence

    from fishplate.captures import Frame
    from fishplate.errors import Path
    from fishplate.frames import FieldRow, Message
    from fishplate.standard import Registry

BIT_COLUMN = 6
GAP = "  "
LONGEST_NAME = 24
PROBLEM = "!!"
HEAD = frozenset({"NID_PACKET", "Q_DIR", "L_PACKET"})
TEXT_LENGTH = "L_TEXT"


class Pair(NamedTuple):
    """One field as it is shown: its first bit, its name, and what it says."""

    bit: int
    name: str
    text: str

    def __str__(self) -> str:
        return f"{self.name} {self.text}"


class Line(NamedTuple):
    """One field, or the fields of one element of a set: shown on one line where they fit.

    `end` is the bit behind the last of them.
    """

    label: str
    depth: int
    pairs: list[Pair]
    end: int


class View:
    """Renders frames; `width` in columns, `colour` for a terminal."""

    def __init__(self, width: int, *, colour: bool = False) -> None:
        self.width = width
        self.colour = colour
        self.said: set[str] = set()

    def frame(self, frame: Frame, message: Message) -> Iterator[str]:
        """Yield the lines of one frame, its problems where they stand."""
        book = book_of(message)
        yield from self._head(frame, message, book)
        rows = list(walk_message(message, frame.value, frame.bits, strict=False))
        problems = _Problems(message, self)
        for group in _by_part(rows):
            yield from self._part(group, message, book, problems)
        yield from problems.before(None)

    def unreadable(self, frame: Frame) -> Iterator[str]:
        """Yield the lines that stand for a frame that could not be read."""
        yield style(f"frame {frame.index}  not readable", "bold", colour=self.colour)
        place = f"line {frame.line}: " if frame.line else ""
        text = visible(f"{PROBLEM} {place}{frame.problem}")
        for line in wrap(text, self.width, initial_indent=GAP, subsequent_indent=GAP * 3):
            yield style(line, "problem", colour=self.colour)

    def _head(self, frame: Frame, message: Message, book: Registry) -> Iterator[str]:
        first, second = heading(message, book)
        title = GAP.join(filter(None, (f"frame {frame.index}", shown_time(frame), first)))
        for line in wrap(title, self.width, subsequent_indent=GAP * 2):
            yield style(line, "bold", colour=self.colour)
        yield from wrap(second, self.width, initial_indent=GAP, subsequent_indent=GAP * 2)
        for sentence in evidence_lines(message, self.said):
            yield from wrap(sentence, self.width, initial_indent=GAP, subsequent_indent=GAP * 2)
        if frame.note:
            note = f"note: {visible(frame.note)}"
            yield from wrap(note, self.width, initial_indent=GAP, subsequent_indent=GAP * 4)

    def _part(
        self, rows: Sequence[FieldRow], message: Message, book: Registry, problems: _Problems
    ) -> Iterator[str]:
        """Show the header, one packet, or bits at the end of the frame."""
        first = rows[0]
        if first.path[0] == "header":
            yield from self._header(rows, message, book, problems)
        elif first.path[0] == "packets":
            packet = message.packets[int(first.path[1])]
            book = book_of_packet(packet, book)
            title = packet_title(packet, message.direction or "", book)
            yield from self._wrapped(first.offset, "", title, bold=True)
            head = [row for row in rows[: len(HEAD)] if row.path[-1] in HEAD]
            yield from problems.before(head[-1].offset + head[-1].width)
            yield from self._lines(list(_lines(rows[len(head) :], book, 2)), 1, problems)
        else:
            yield from self._lines(list(_lines(rows, book, 0)), 0, problems)

    def _header(
        self, rows: Sequence[FieldRow], message: Message, book: Registry, problems: _Problems
    ) -> Iterator[str]:
        pairs = [
            Pair(row.offset, str(row.path[-1]), row_text(row, book))
            for row in rows
            if not in_heading(row, message, book)
        ]
        end = rows[-1].offset + rows[-1].width
        yield from self._lines([Line("header", 0, pairs, end)] if pairs else [], 0, problems)
        yield from problems.before(end)

    def _lines(self, lines: list[Line], depth: int, problems: _Problems) -> Iterator[str]:
        names = [len(GAP * line.depth + line.label) for line in lines]
        column = min(max(names, default=0), LONGEST_NAME)
        for line in lines:
            label = (GAP * line.depth + line.label).ljust(column)
            yield from self._line(GAP * depth + label + GAP, line.pairs)
            yield from problems.before(line.end)

    def _line(self, label: str, pairs: list[Pair]) -> Iterator[str]:
        """Fill lines with pairs; each line names the bit of the first one on it."""
        space = self.width - BIT_COLUMN - len(GAP) - len(label)
        bit, text = pairs[0].bit, ""
        for pair in pairs:
            shown = str(pair) if pair.name else pair.text
            if text and len(text) + len(GAP) + len(shown) > space:
                yield from self._wrapped(bit, label, text)
                bit, text, label = pair.bit, "", " " * len(label)
            text = f"{text}{GAP}{shown}" if text else shown
        yield from self._wrapped(bit, label, text)

    def _wrapped(self, bit: int, label: str, text: str, *, bold: bool = False) -> Iterator[str]:
        start = f"{bit:>{BIT_COLUMN}}{GAP}"
        hanging = " " * (BIT_COLUMN + len(GAP) + len(label) + (0 if not label else 2))
        space = max(self.width - len(start) - len(label), LONGEST_NAME)
        if len(text) <= space:
            lines = [text]
        else:
            lines = wrap(text, self.width - len(hanging)) if not label else _hung(text, space)
        kind = "bold" if bold else "mark" if f"{SPARE} " in text else ""
        body = [style(each, kind, colour=self.colour) if kind else each for each in lines]
        yield f"{style(start, 'faint', colour=self.colour)}{label}{body[0]}"
        for each in body[1:]:
            yield f"{hanging}{each}"

    def problem(self, bit: int, path: Path, sentence: str) -> Iterator[str]:
        """Yield the lines that mark a problem."""
        start = f"{bit:>{BIT_COLUMN}}{GAP}{PROBLEM} "
        place = path_text(path)
        text = visible(f"{sentence} [{place}]" if place else sentence)
        for number, line in enumerate(wrap(text, self.width - len(start))):
            lead = start if number == 0 else " " * len(start)
            yield style(lead + line, "problem", colour=self.colour)


def _hung(text: str, space: int) -> list[str]:
    """Wrap text whose continuation lines stand two columns further in."""
    first, *_ = wrap(text, space)
    rest = text[len(first) :].lstrip()
    return [first, *wrap(rest, space - 2)]


class _Problems:
    """The problems of a frame, handed out in the order of their bits."""

    def __init__(self, message: Message, view: View) -> None:
        self.left = sorted(message.problems, key=lambda each: each.bit)
        self.view = view

    def before(self, bit: int | None) -> Iterator[str]:
        """Yield the lines of all problems before a bit (None: of all that are left)."""
        while self.left and (bit is None or self.left[0].bit < bit):
            found = self.left.pop(0)
            yield from self.view.problem(found.bit, found.path, found.message)


def _by_part(rows: Sequence[FieldRow]) -> Iterator[list[FieldRow]]:
    """Split rows into header, packets, and what follows."""
    part: list[FieldRow] = []
    for row in rows:
        if part and row.path[:2] != part[0].path[:2] and row.path[0] != "header":
            yield part
            part = []
        part.append(row)
    if part:
        yield part


def _lines(rows: Sequence[FieldRow], book: Registry, start: int) -> Iterator[Line]:
    """Gather the fields of one element or group; fields outside have a line each."""
    seen: set[Path] = set()
    line: Line | None = None
    where: Path = ()
    for row in rows:
        *scope, name = row.path[start:]
        end = row.offset + row.width
        here = tuple(scope)
        seen |= {here[:length] for length in range(1, len(here) + 1)}
        if _goes_without_saying(row, here, seen):
            line = line and line._replace(end=end)
            continue
        pair = Pair(row.offset, str(name), row_text(row, book))
        if name == COUNT and here[:-1]:
            # Said at the end of the element that holds the empty set.
            pair, here = Pair(row.offset, str(here[-1]), "none"), here[:-1]
        if line is not None and here and here == where:
            line.pairs.append(pair)
            line = line._replace(end=end)
            continue
        if line is not None:
            yield line
        line, where = _opened(here, pair, end), here
    if line is not None:
        yield line


def _goes_without_saying(row: FieldRow, here: Path, seen: set[Path]) -> bool:
    """Tell whether what follows or stands before says it: counts and lengths of texts."""
    if row.path[-1] == COUNT:
        return bool(row.raw) or (*here, 0) in seen
    return row.path[-1] == TEXT_LENGTH and bool(row.raw)


def _opened(here: Path, pair: Pair, end: int) -> Line:
    """Begin a line: named by its field, or by the element or group that it shows."""
    if not here:
        return Line(pair.name, 0, [pair._replace(name="")], end)
    names = [index for index, step in enumerate(here) if isinstance(step, str)]
    label = path_text(here[names[-1] :])
    if pair.name == COUNT:
        pair = pair._replace(name="", text="none")
    return Line(label, len(names) - 1, [pair], end)
