"""`decode`: which medium, direction and version a frame is, and then its reading."""

from __future__ import annotations

from typing import TYPE_CHECKING

from fishplate.bits import read_bits
from fishplate.engine.runtime import Codec, codec
from fishplate.errors import (
    Ambiguous,
    DecodeError,
    LengthMismatch,
    Truncated,
    Unknown,
)
from fishplate.frames import quick
from fishplate.frames.fitting import infer_version
from fishplate.frames.media import BOTH, NEITHER, hops_to_the_end, tell_medium
from fishplate.frames.message import Message
from fishplate.frames.reader import FrameReader
from fishplate.frames.sizes import (
    END_FLAG,
    HEADER_BITS,
    LONGEST_PADDING,
    MESSAGE_START,
    SHORTEST_PACKET,
)
from fishplate.standard.editions import edition, first_version, known_issues, prints
from fishplate.standard.vocabulary import DIRECTIONS, MEDIA, TO_TRACK, TO_TRAIN
from fishplate.versions import (
    DEFAULT_VERSION,
    NAME,
    closest_layouts,
    is_declared_invalid,
    no_layouts,
    version_code,
    version_text,
)

if TYPE_CHECKING:
    from fishplate.bits import Data
    from fishplate.errors import Path

Said = tuple[str | None, str | None]
"""The system version and the issue that the caller asks for."""

NOTHING_SAID = (None, None, None, None)


def decode(
    data: Data,
    *,
    medium: str | None = None,
    direction: str | None = None,
    version: str | None = None,
    issue: str | None = None,
    bits: int | None = None,
    strict: bool = True,
) -> Message:
    """Decode one frame.

    `data` is bytes, hex text or `bitstring.Bits`; `bits` its true length where the last byte is
    padded. `medium` ("balise", "loop", "radio"), `direction` ("to-train", "to-track") and
    `version` ("2.1") are found from the bits where they are not given. `issue` ("2.3.0") asks for
    the layouts as that issue prints them, for the versions it prints. Strict decoding raises the
    first `DecodeError`; otherwise the message holds all that is readable, plus `problems`.
    """
    if (medium, direction, version, issue) != NOTHING_SAID:
        _check_said(medium, direction, version, issue)
    if type(data) is bytes and bits is None:
        n, size = int.from_bytes(data), len(data) * 8
    else:
        n, size = read_bits(data, bits)
    said = (version, issue)
    if version is None and (medium is None or medium == "radio"):
        message = None
        if issue in (None, quick.USUAL.issue):
            message = quick.read_radio(n, size, direction)
        message = message or infer_version(n, size, direction, issue, careful=_radio)
        if message is not None:
            return message
    found, reason = (medium, "") if medium else tell_medium(n, size)
    if reason is BOTH and not _radio(n, size, direction, said, strict=False).problems:
        found = "radio"
    if found is None:
        return _ambiguous(n, size, reason, strict=strict)
    if found == "radio":
        return _radio(n, size, direction, said, strict=strict)
    if medium is None:
        return _if_it_ends(n, size, found, said, strict=strict)
    return _telegram(n, size, found, said, strict=strict)


def _check_said(medium: object, direction: object, version: object, issue: object) -> None:
    """Raise `ValueError` for a medium, direction, version or issue that is none."""
    if medium is not None and medium not in MEDIA:
        raise ValueError(f"medium is one of {', '.join(MEDIA)}, not {medium!r}")
    if direction is not None and direction not in DIRECTIONS:
        raise ValueError(f"direction is {TO_TRAIN} or {TO_TRACK}, not {direction!r}")
    if version is not None and not (isinstance(version, str) and NAME.fullmatch(version)):
        raise ValueError(
            f"version is written as '2.1', X to 7 and Y to 15, not {version!r}",
        )
    if issue is not None and issue not in known_issues():
        raise ValueError(f"issue is one of {', '.join(known_issues())}, not {issue!r}")
    if version and issue and not prints(issue, version):
        raise ValueError(f"issue {issue} does not lay out version {version}")


def _if_it_ends(n: int, size: int, medium: str, said: Said, *, strict: bool) -> Message:
    """Read a telegram on trial: only its end flag proves that it is one."""
    trial = _telegram(n, size, medium, said, strict=False)
    if trial.filler is None and not _cannot_be_read_but_ends(trial, n):
        return _ambiguous(n, size, NEITHER, strict=strict)
    if strict and trial.problems:
        raise trial.problems[0].error
    return trial


def _cannot_be_read_but_ends(telegram: Message, n: int) -> bool:
    kinds = [each.kind for each in telegram.problems]
    left = telegram.size - HEADER_BITS[telegram.medium or "balise"]
    return kinds[:1] == ["unknown-version"] and hops_to_the_end(n, left)


def _ambiguous(n: int, size: int, reason: str, *, strict: bool) -> Message:
    message = Message(None, None, size)
    reader = FrameReader(message, codec(DEFAULT_VERSION), n, strict=strict)
    reader.trouble(
        Ambiguous(
            f"the bits do not say what they are: {reason.format(size=size)}; give the medium",
            bit=0,
        )
    )
    message.content = reader.rest()
    return message


def _telegram(n: int, size: int, medium: str, said: Said, *, strict: bool) -> Message:
    version, issue = said
    message = Message(medium, TO_TRAIN, size)
    layouts = _layouts(message, version or DEFAULT_VERSION, issue)
    reader = FrameReader(message, layouts or codec(DEFAULT_VERSION), n, strict=strict)
    try:
        message.header, reader.left = reader.codec.read_header[medium](n, size)
    except ValueError:
        nodes = reader.registry.headers[medium].nodes
        reader.trouble(reader.locate(nodes, 0, size, ("header",)))
        message.content = reader.rest()
        return message
    if version is None:
        layouts = _layouts(message, version_text(message.header["M_VERSION"]), issue)
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


def _radio(n: int, size: int, direction: str | None, said: Said, *, strict: bool) -> Message:
    version, issue = said
    asked = edition(version, issue) if version else None
    if asked:
        whole = quick.read_radio_as(asked, n, size, direction)
        if whole is not None:
            whole.version_from = "caller"
            return whole
    number = n >> size - 8 if size >= SHORTEST_PACKET else 0
    message = Message("radio", direction, size)
    layouts = _layouts(message, version or first_version(issue), issue)
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
    if message.layouts is None:
        reader.trouble(_unknown_version(message, bit=0))
    elif read is None:
        reader.trouble(_unknown_message(number, direction))
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


def _layouts(message: Message, version: str, issue: str | None) -> Codec | None:
    """Note version and issue in the message; return the layouts that read it, if any."""
    message.version = version
    closest = closest_layouts(version)
    if closest is None:
        message.issue = ""
        message.layouts = None
        return None
    message.layouts = layouts = codec(closest, issue)
    message.issue = layouts.issue
    return layouts


def _say_if_newer(reader: FrameReader, path: Path, bit: int) -> None:
    version = reader.message.version
    closest = closest_layouts(version)
    if closest in (None, version):
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
    code = version_code(message.version)
    reason = no_layouts(message.version)
    if bit and is_declared_invalid(code):
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
