"""One frame of a capture, and the line of JSON that stands for it."""

from __future__ import annotations

import json
from dataclasses import dataclass
from decimal import Decimal
from typing import TYPE_CHECKING, Any, Literal

from fishplate.bits import BYTE

if TYPE_CHECKING:
    from fishplate.errors import FishplateError

Time = str | int | Decimal
"""When a frame was sent: a text as it was given, or seconds, exactly as they were written."""

Form = Literal["hex", "jsonl", "csv", "bin"]
FORMS: tuple[Form, ...] = ("hex", "jsonl", "csv", "bin")
"""The forms a capture comes in."""

MOST_ZEROS = 30
"""Places in front of or behind the point up to which a time is written without exponent."""


@dataclass(frozen=True, slots=True)
class Frame:
    """One frame as a capture holds it.

    `index` counts frames from 0, unreadable ones included; `line` counts lines of `source` from
    1 and is 0 where there are no lines. `bits` is the true length: `data` holds whole bytes,
    unused low bits 0. `problem` says why a frame could not be read; `data` is empty then. `flaw`
    says what was wrong on the line of a frame that could be read all the same. `passed_over`
    names the keys or columns of the line that mean nothing here.
    """

    data: bytes = b""
    bits: int = 0
    time: Time | None = None
    medium: str | None = None
    direction: str | None = None
    version: str | None = None
    note: str = ""
    index: int = 0
    line: int = 0
    source: str = ""
    problem: FishplateError | None = None
    flaw: FishplateError | None = None
    passed_over: tuple[str, ...] = ()

    @property
    def place(self) -> str:
        """Where the frame stands, for people: file and line, or file and number of the frame."""
        if self.line:
            return f"{self.source} line {self.line}"
        return f"{self.source} frame {self.index}" if self.index else self.source

    @property
    def value(self) -> int:
        """The bits as an integer."""
        return int.from_bytes(self.data) >> -self.bits % BYTE


def time_text(time: Time) -> str:
    """Write a time as JSON, numbers with the digits they were given with."""
    if isinstance(time, str):
        return json.dumps(time, ensure_ascii=False)
    if isinstance(time, Decimal) and abs(time.adjusted()) <= MOST_ZEROS:
        return f"{time:f}"
    return str(time)


def capture_line(frame: Frame) -> str:
    """Write a frame as one line of a JSON Lines capture, without the line end."""
    rest: dict[str, Any] = {}
    for name in ("medium", "direction", "version"):
        value = getattr(frame, name)
        if value:
            rest[name] = value
    rest["data"] = frame.data.hex().upper()
    rest["bits"] = frame.bits
    if frame.note:
        rest["note"] = frame.note
    text = json.dumps(rest, ensure_ascii=False)
    return text if frame.time is None else f'{{"time": {time_text(frame.time)}, {text[1:]}'
