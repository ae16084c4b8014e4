"""Raw bits in a file: one frame, or radio messages one after the other."""

from __future__ import annotations

from typing import IO, TYPE_CHECKING

from fishplate.bits import BYTE
from fishplate.captures.frame import Frame
from fishplate.captures.lines import CHUNK
from fishplate.errors import DecodeError
from fishplate.versions import defined_codes

if TYPE_CHECKING:
    from collections.abc import Iterator

HEAD = 3
"""Bytes that hold NID_MESSAGE and L_MESSAGE (SUBSET-026 8.4.4.6: 8 and 10 bits)."""

LONGEST = 64 * 1024
"""Bytes of the longest run that is taken as one frame."""


def binary_frames(stream: IO[bytes], medium: str | None = None) -> Iterator[Frame]:
    """Yield the frames of raw bits.

    A telegram or loop message, found by its first bits or by `medium`, is the whole file.
    Otherwise radio messages are told apart by their L_MESSAGE; from where that fails, the rest
    is one frame.
    """
    start = stream.read(1)
    if not start:
        return
    if medium in ("balise", "loop") or (medium is None and _starts_a_telegram(start[0])):
        yield _rest(stream, start, 0)
        return
    offset = 0
    while start:
        start += stream.read(HEAD - len(start))
        length = _promised(start)
        body = stream.read(max(0, length - len(start)))
        if len(start) < HEAD or len(start) + len(body) != length:
            yield _rest(stream, start + body, offset)
            return
        octets = start + body
        yield Frame(octets, len(octets) * BYTE, medium=medium)
        offset += length
        start = stream.read(1)


def measures_itself(frame: Frame) -> bool:
    """Tell whether raw bits that hold more than this frame can be split again behind it."""
    whole = len(frame.data) * BYTE == frame.bits and len(frame.data) >= HEAD
    return whole and frame.medium == "radio" and _promised(frame.data[:HEAD]) == len(frame.data)


def _starts_a_telegram(byte: int) -> bool:
    """Tell whether Q_UPDOWN is 1 and an M_VERSION the standard defines follows."""
    return bool(byte & 128) and byte & 127 in defined_codes()


def _promised(start: bytes) -> int:
    """Return the bytes that L_MESSAGE promises, 0 where it is not all there."""
    return int.from_bytes(start) >> 6 & 1023 if len(start) == HEAD else 0


def _rest(stream: IO[bytes], start: bytes, offset: int) -> Frame:
    octets = start + stream.read(LONGEST + 1 - len(start))
    if len(octets) > LONGEST:
        size = len(octets)
        while chunk := stream.read(CHUNK):
            size += len(chunk)
        reason = f"{size} bytes from byte {offset} on are passed over: no L_MESSAGE splits them"
        return Frame(problem=DecodeError(reason))
    note = f"rest of the file from byte {offset} on, not split by L_MESSAGE" if offset else ""
    medium = "radio" if offset else None
    return Frame(octets, len(octets) * BYTE, medium=medium, note=note)
