"""Lines of a binary stream, numbered, each held in memory only up to a limit."""

from __future__ import annotations

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
    """Yield the lines of a UTF-8 stream; blank lines too."""
    number = 0
    while line := stream.readline(limit + 1):
        number += 1
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
            yield Line(number, line.decode().rstrip("\r\n"))
        except UnicodeDecodeError as error:
            reason = f"byte {error.start + 1} of the line, 0x{line[error.start]:02X}, is not UTF-8"
            yield Line(number, "", DecodeError(reason))


def _pass_over(stream: IO[bytes]) -> int:
    """Read to the end of the line without keeping it; return how many bytes that took."""
    size = 0
    while chunk := stream.readline(CHUNK):
        size += len(chunk)
        if chunk.endswith(b"\n"):
            break
    return size
