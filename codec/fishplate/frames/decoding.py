"""`decode`: which medium, direction and version a frame is, and then its reading."""

from __future__ import annotations

from functools import cache
from typing import TYPE_CHECKING

from fishplate.bits import read_bits, read_blob
from fishplate.engine.runtime import Codec, codec
from fishplate.errors import (
    Ambiguous,
    DecodeError,
    LengthMismatch,
    Truncated,
    Unknown,
)
from fishplate.frames import quick
from fishplate.frames.message import Message
from fishplate.frames.reader import FrameReader
from fishplate.frames.sizes import (
    END_FLAG,
    HEADS,
    LONGEST_PACKET,
    LONGEST_PADDING,
    MESSAGE_START,
    SHORTEST_PACKET,
)
from fishplate.standard.vocabulary import DIRECTIONS, MEDIA, TO_TRACK, TO_TRAIN
from fishplate.versions import (
    DEFAULT_VERSION,
    NAME,
    closest_layouts,
    defined_codes,
    is_declared_invalid,
    version_text,
)

if TYPE_CHECKING:
    from fishplate.bits import Data
    from fishplate.errors import Path

NOTHING_SAID = (None, None, None)


def decode(
    data: Data,
    *,
    medium: str | None = None,
    direction: str | None = None,
    version: str | None = None,
    bits: int | None = None,
    strict: bool = True,
) -> Message:
    """Decode one frame.

    `data` is bytes, hex text or `bitstring.Bits`; `bits` its true length where the last byte is
    padded. `medium` ("balise", "loop", "radio"), `direction` ("to-train", "to-track") and
    `version` ("2.1") are found from the bits where they are not given. Strict decoding raises
    the first `DecodeError`; otherwise the message holds all that is readable, plus `problems`.
    """
    if (medium, direction, version) != NOTHING_SAID:
        _check_said(medium, direction, version)
    if type(data) is bytes and bits is None:
        n, size = int.from_bytes(data), len(data) * 8
    else:
        n, size = read_bits(data, bits)
    if version is None and (medium is None or medium == "radio"):
        message = quick.read_radio(n, size, direction)
        if message is not None:
            return message
    if medium is None:
        medium = _radio_or_telegram(n, size)
        if medium is None:
            return _ambiguous(n, size, strict=strict)
        if medium != "radio":
            return _if_it_ends(n, size, medium, version, strict=strict)
    if medium == "radio":
        return _radio(n, size, direction, version, strict=strict)
    return _telegram(n, size, medium, version, strict=strict)


def _check_said(medium: object, direction: object, version: object) -> None:
    """Raise `ValueError` for a medium, direction or version that is none."""
    if medium is not None and medium not in MEDIA:
        raise ValueError(f"medium is one of {', '.join(MEDIA)}, not {medium!r}")
    if direction is not None and direction not in DIRECTIONS:
        raise ValueError(f"direction is {TO_TRAIN} or {TO_TRACK}, not {direction!r}")
    if version is not None and not (isinstance(version, str) and NAME.fullmatch(version)):
        raise ValueError(f"version is written as '2.1', not {version!r}")


def _radio_or_telegram(n: int, size: int) -> str | None:
    """Tell the medium from the first bits and the length; None when they do not say."""
    if size < MESSAGE_START:
        return None
    start = n >> size - MESSAGE_START
    if start >> 10 in _telegram_starts():
        return "loop" if start >> 9 & 1 else "balise"
    return "radio" if (start & 1023) << 3 == size else None


@cache
def _telegram_starts() -> frozenset[int]:
    """First bytes of telegrams: Q_UPDOWN 1, then an M_VERSION the standard defines."""
    return frozenset(128 | code for code in defined_codes())


def _if_it_ends(n: int, size: int, medium: str, version: str | None, *, strict: bool) -> Message:
    """Read a telegram on trial: only its end flag proves that it is one."""
    trial = _telegram(n, size, medium, version, strict=False)
    if trial.filler is None and not _hops_to_the_end(trial):
        return _ambiguous(n, size, strict=strict)
    if strict and trial.problems:
        raise trial.problems[0].error
    return trial


def _hops_to_the_end(telegram: Message) -> bool:
    """Tell whether packets of a version without layouts reach the end flag, by L_PACKET alone."""
    if not telegram.problems or telegram.problems[0].kind != "unknown-version":
        return False
    n, left = read_blob(telegram.content, ("content",))
    head = HEADS[TO_TRAIN]
    while left >= head:
        word = n >> left - head & (1 << head) - 1
        if word >> head - 8 == END_FLAG:
            return True
        left -= max(head, word & LONGEST_PACKET)
    return left >= SHORTEST_PACKET and n >> left - 8 & 255 == END_FLAG


def _ambiguous(n: int, size: int, *, strict: bool) -> Message:
    message = Message(None, None, size)
    reader = FrameReader(message, codec(DEFAULT_VERSION), n, strict=strict)
    reader.trouble(
        Ambiguous(
            "the bits do not say what they are: no telegram that reaches its end flag, and no "
            f"radio message, since no L_MESSAGE says {size} bits; give the medium",
            bit=0,
        )
    )
    message.content = reader.rest()
    return message


def _telegram(n: int, size: int, medium: str, version: str | None, *, strict: bool) -> Message:
    message = Message(medium, TO_TRAIN, size)
    layouts = _layouts(message, version or DEFAULT_VERSION)
    reader = FrameReader(message, layouts or codec(DEFAULT_VERSION), n, strict=strict)
    try:
        message.header, reader.left = reader.codec.read_header[medium](n, size)
    except ValueError:
        nodes = reader.registry.headers[medium].nodes
        reader.trouble(reader.locate(nodes, 0, size, ("header",)))
        message.content = reader.rest()
        return message
    if version is None:
        layouts = _layouts(message, version_text(message.header["M_VERSION"]))
        _say_if_newer(reader, ("header", "M_VERSION"), bit=1)
    message.version_from = "caller" if version else "frame"
    if layouts is None:
        reader.trouble(_unknown_version(message, bit=1))
        message.content = reader.rest()
        return message
    reader.codec = layouts
    reader.packets()
    if message.packets and message.packets[-1]["NID_PACKET"] == END_FLAG:
        message.filler = reader.rest()
        return message
    if not reader.cut:
        reader.trouble(_no_more(reader, SHORTEST_PACKET, "the end flag is missing"))
    message.content = reader.rest()
    return message


def _radio(
    n: int, size: int, direction: str | None, version: str | None, *, strict: bool
) -> Message:
    number = n >> size - 8 if size >= SHORTEST_PACKET else 0
    message = Message("radio", direction, size)
    layouts = _layouts(message, version or DEFAULT_VERSION)
    reader = FrameReader(message, layouts or codec(DEFAULT_VERSION), n, strict=strict)
    message.version_from = "caller" if version else "assumed"
    _say_if_newer(reader, ("header",), bit=0)
    if direction is None:
        message.direction = direction = reader.codec.direction_of(number)
    if size >= MESSAGE_START:
        promised = (n >> size - MESSAGE_START & 1023) << 3
        if promised != size:
            return _radio_misfit(reader, number, promised)
    read = reader.codec.read_message[direction].get(number)
    if read is None or layouts is None or size < MESSAGE_START:
        return _radio_misfit(reader, number, size)
    try:
        message.header, reader.left = read(n, size)
    except ValueError:
        return _radio_misfit(reader, number, size)
    reader.packets()
    return _end_radio(reader, size)


def _radio_misfit(reader: FrameReader, number: int, promised: int) -> Message:
    """Read a radio message whose length, number or version is not as it should be."""
    message = reader.message
    size = message.size
    direction = message.direction or TO_TRAIN
    if size < MESSAGE_START:
        nodes = reader.message_nodes(number)
        reader.trouble(reader.locate(nodes, 0, size, ("header",)))
        message.content = reader.rest()
        return message
    if promised < size:
        reader.trouble(
            LengthMismatch(
                f"L_MESSAGE is {promised // 8} bytes, {size / 8:g} were handed over",
                path=("header", "L_MESSAGE"),
                bit=SHORTEST_PACKET,
            )
        )
        extra = min(size - promised, size - MESSAGE_START)
        message.surplus = reader.surplus(extra)
    read = reader.codec.read_message[direction].get(number)
    if read is None:
        reader.trouble(_unknown_message(number, direction))
    elif not closest_layouts(message.version):
        reader.trouble(_unknown_version(message, bit=0))
    else:
        try:
            message.header, reader.left = read(reader.n, reader.size)
        except ValueError:
            error = reader.locate(reader.message_nodes(number), 0, reader.size, ("header",))
            reader.trouble(error if promised > size else _too_short_message(error, promised))
        else:
            reader.packets()
            return _end_radio(reader, promised)
    _keep_from_start(reader, number)
    return message


def _end_radio(reader: FrameReader, promised: int) -> Message:
    """Explain what follows the last packet, up to the end that L_MESSAGE promises."""
    message = reader.message
    if promised > reader.size:
        if not reader.cut:
            ahead = promised - reader.size
            field = SHORTEST_PACKET if ahead + reader.left >= SHORTEST_PACKET else 0
            reason = f"L_MESSAGE is {promised // 8} bytes, {reader.size / 8:g} are there"
            reader.trouble(_no_more(reader, field or ahead + reader.left, reason))
        message.content = reader.rest()
    elif reader.cut:
        message.content = reader.rest()
    elif reader.left:
        if reader.left > LONGEST_PADDING:
            reader.trouble(
                LengthMismatch(
                    f"{reader.left} bits of padding follow the last packet, "
                    f"at most {LONGEST_PADDING} complete a byte",
                    path=("padding",),
                    bit=reader.size - reader.left,
                )
            )
        message.padding = reader.rest()
    return message


def _no_more(reader: FrameReader, width: int, reason: str) -> Truncated:
    """Say that the next field, `width` bits wide, is not all there."""
    missing = width - reader.left
    path = ("packets", len(reader.message.packets), "NID_PACKET")
    return Truncated(
        reason,
        missing=missing,
        path=path if width == SHORTEST_PACKET else ("padding",),
        bit=reader.size - reader.left,
    )


def _keep_from_start(reader: FrameReader, number: int) -> None:
    """Keep a radio message as its number, its length and unexplained content."""
    reader.left = reader.size - MESSAGE_START
    length = reader.n >> reader.left & 1023
    reader.message.header = {"NID_MESSAGE": number, "L_MESSAGE": length}
    reader.message.content = reader.rest()


def _layouts(message: Message, version: str) -> Codec | None:
    """Note version and issue in the message; return the layouts that read it, if any."""
    message.version = version
    closest = closest_layouts(version)
    if closest is None:
        return None
    layouts = codec(closest)
    message.issue = layouts.issue
    return layouts


def _say_if_newer(reader: FrameReader, path: Path, bit: int) -> None:
    version = reader.message.version
    closest = closest_layouts(version)
    if closest is None or version in codec(closest).versions.values():
        return
    reader.trouble(
        Unknown(
            f"system version {version} is not known; "
            f"read with the layouts of {closest}, which has the same X",
            kind="newer-version",
            path=path,
            bit=bit,
        )
    )


def _unknown_version(message: Message, bit: int) -> Unknown:
    code = message.header.get("M_VERSION")
    reason = f"there are no layouts for system version {message.version}"
    if code is not None and is_declared_invalid(code):
        reason = f"M_VERSION {code}, {message.version}, is declared not valid"
    return Unknown(
        reason,
        kind="unknown-version",
        path=("header", "M_VERSION") if bit else ("header",),
        bit=bit,
    )


def _unknown_message(number: int, direction: str) -> Unknown:
    return Unknown(
        f"message {number} is not known {direction}",
        kind="unknown-message",
        path=("header", "NID_MESSAGE"),
        bit=0,
    )


def _too_short_message(error: Truncated, promised: int) -> DecodeError:
    return LengthMismatch(
        f"L_MESSAGE is {promised // 8} bytes, but its fixed part goes on: "
        f"{error.path[-1]} has no bits left",
        path=("header", "L_MESSAGE"),
        bit=SHORTEST_PACKET,
    )
