"""What goes to standard output and standard error, and how it looks there."""

from __future__ import annotations

import os
import shutil
import sys
import time
from dataclasses import replace
from typing import TYPE_CHECKING

import typer

from fishplate.captures import time_text

if TYPE_CHECKING:
    from fishplate.captures import Frame
    from fishplate.errors import FishplateError
    from fishplate.frames import Message

NARROWEST = 60
USUAL = 80
WIDEST = 100
NOT_DECODED = 3
SHOWN_NAME = 40
CODES = {"bold": "1", "problem": "1;31", "mark": "33", "faint": "2"}


def write(text: str) -> None:
    """Write one line to standard output."""
    sys.stdout.write(text + "\n")


def width() -> int:
    """Columns to write for: the terminal's within limits, 80 elsewhere."""
    if not sys.stdout.isatty():
        return USUAL
    return min(max(shutil.get_terminal_size().columns, NARROWEST), WIDEST)


def coloured() -> bool:
    """Tell whether colour may be used: on a terminal, unless NO_COLOR says otherwise."""
    return (
        sys.stdout.isatty() and not os.environ.get("NO_COLOR") and os.environ.get("TERM") != "dumb"
    )


def style(text: str, kind: str, *, colour: bool) -> str:
    """Return the text in the look of its kind; it says the same without."""
    return f"\x1b[{CODES[kind]}m{text}\x1b[0m" if colour else text


def visible(text: str) -> str:
    """Return text with everything that could move a cursor written as an escape."""
    if text.isprintable():
        return text
    return "".join(
        each if each.isprintable() else each.encode("unicode_escape").decode() for each in text
    )


def counted(number: int, word: str) -> str:
    """Return a number with the word for what it counts: 1 bit, 2 bits."""
    return f"{number} {word}" if number == 1 else f"{number} {word}s"


def shown_time(frame: Frame) -> str:
    """Return the time of a frame for people, nothing where there is none."""
    if frame.time is None:
        return ""
    return visible(frame.time if isinstance(frame.time, str) else time_text(frame.time))


class Complaints:
    """Says on standard error what could not be done, and remembers that there was something."""

    def __init__(self) -> None:
        self.count = 0

    def say(self, place: str, reason: object) -> None:
        """Name one place and what is wrong there."""
        self.count += 1
        sys.stderr.write(f"{visible(place)}: {visible(str(reason))}\n")

    def note(self, place: str, text: str) -> None:
        """Say something that changes no exit code."""
        sys.stderr.write(f"{visible(place)}: {visible(text)}\n")

    def about_frame(self, frame: Frame, problem: FishplateError | None = None) -> None:
        """Name a frame that could not be read."""
        self.say(replace(frame, source=shortened(frame.source)).place, problem or frame.problem)

    def about_message(self, frame: Frame, message: Message) -> None:
        """Name what is wrong with a frame, unless every bit found its place."""
        if not message.complete:
            for each in message.problems:
                self.about_frame(frame, each.error)

    def end(self) -> None:
        """End the command with code 3 if there was something to say."""
        if self.count:
            raise typer.Exit(NOT_DECODED)


def shortened(name: str) -> str:
    """Return the name of an input; a long literal by its beginning."""
    plain = len(name) <= SHOWN_NAME or not name.replace(" ", "").isalnum()
    return name if plain else f"{name[:SHOWN_NAME]}…"


class Progress:
    """One line on standard error that says how far the reading has come.

    Only on a terminal, and only while standard output goes elsewhere.
    """

    def __init__(self, name: str, total: int) -> None:
        self.name = name
        self.total = total
        self.shown = False
        self.next = time.monotonic() + 1
        self.wanted = total > 0 and sys.stderr.isatty() and not sys.stdout.isatty()

    def at(self, position: int, frames: int) -> None:
        """Say it, a few times a second at most, and not at all while the work is short."""
        if not self.wanted or time.monotonic() < self.next:
            return
        self.next = time.monotonic() + 0.2
        self.shown = True
        sys.stderr.write(f"\r{self.name}: {position * 100 // self.total} %, {frames} frames\x1b[K")
        sys.stderr.flush()

    def end(self) -> None:
        """Take the line away."""
        if self.shown:
            sys.stderr.write("\r\x1b[K")
