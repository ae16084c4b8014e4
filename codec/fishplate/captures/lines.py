"""Lines of a binary stream, numbered, each held in memory only up to a limit."""

from __future__ import annotations

import io
from typing import IO, TYPE_CHECKING, NamedTuple

from fishplate.errors import DecodeError

if TYPE_CHECKING:
    from collections.abc import Iterator

LONGEST_LINE = 64 * 1024
"""Bytes of the longest line that is read; a longer one is reported and passed over."""

CHUNK = 64 * 1024
BYTE_ORDER_MARK = b"\xef\xbb\xbf"
UTF_16 = (b"\xff\xfe", b"\xfe\xff")


class Line(NamedTuple):
    """One line without its end, or the reason why it cannot be read."""

    number: int
    text: str
    problem: DecodeError | None = None


def read_lines(stream: IO[bytes], limit: int = LONGEST_LINE) -> Iterator[Line]:
    """Yield the lines of a UTF-8 stream but for empty ones, which are counted."""
    number = 0
    while line := stream.readline(limit + 1):
        number += 1
        if line == b"\n":
            continue
        if len(line) > limit and not line.endswith(b"\n"):
            size = len(line) + _pass_over(stream)
            reason = f"line of {size} bytes passed over, at most {limit} are read"
            yield Line(number, "", DecodeError(reason))
            continue
        if number == 1:
            if line.startswith(UTF_16):
                reason = "text in UTF-16: save it as UTF-8"
                yield Line(number, "", DecodeError(reason))
                return
            line = line.removeprefix(BYTE_ORDER_MARK)
        try:
            text = line.decode().rstrip("\r\n")
        except UnicodeDecodeError as error:
            reason = f"byte {error.start + 1} of the line, 0x{line[error.start]:02X}, is not UTF-8"
            yield Line(number, "", DecodeError(reason))
            continue
        if "\r" in text:
            reason = "a carriage return within the line: lines end with a line feed here"
            yield Line(number, "", DecodeError(reason))
        else:
            yield Line(number, text)


def _pass_over(stream: IO[bytes]) -> int:
    """Read to the end of the line without keeping it; return how many bytes that took."""
    size = 0
    while chunk := stream.readline(CHUNK):
        size += len(chunk)
        if chunk.endswith(b"\n"):
            break
    return size


class Replayed:
    """A stream whose beginning has been looked at already."""

    def __init__(self, start: bytes, stream: IO[bytes]) -> None:
        self.start = io.BytesIO(start)
        self.stream = stream

    def readline(self, size: int = -1) -> bytes:
        """Return the next line, or `size` bytes of it."""
        line = self.start.readline(size)
        if not line:
            return self.stream.readline(size)
        if line.endswith(b"\n") or len(line) == size:
            return line
        return line + self.stream.readline(size - len(line) if size > 0 else -1)

    def read(self, size: int = -1) -> bytes:
        """Return the bytes that follow, `size` of them where there are so many."""
        data = self.start.read(size)
        if len(data) == size:
            return data
        return data + self.stream.read(size - len(data) if size > 0 else -1)
