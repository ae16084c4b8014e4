"""Which system version a radio message is of, where nothing says so: the layouts that fit.

A message fits a version when it can be read to its end with nothing odd in it. The usual version
is tried before all others, elsewhere, and wins wherever it fits.
"""

from __future__ import annotations

from contextlib import suppress
from typing import TYPE_CHECKING, Protocol

from fishplate.engine.runtime import codec
from fishplate.errors import DecodeError
from fishplate.frames import quick
from fishplate.frames.sizes import LONGEST_PACKET, LONGEST_PADDING, MESSAGE_START
from fishplate.standard.editions import DEFAULT_VERSION, EDITIONS, Edition, edition, reaches
from fishplate.standard.vocabulary import TO_TRAIN

if TYPE_CHECKING:
    from fishplate.frames.message import Message


class Careful(Protocol):
    """The reader that takes in what the beaten track does not."""

    def __call__(
        self,
        n: int,
        size: int,
        direction: str | None,
        said: tuple[str | None, str | None],
        *,
        strict: bool,
    ) -> Message:
        """Read a radio message in a version and issue."""


def infer_version(
    n: int, size: int, direction: str | None, issue: str | None, careful: Careful
) -> Message | None:
    """Read a radio message that the usual version does not fit; None where no other fits.

    With an `issue`, only the versions it prints are tried.
    """
    # Without this, every broken message would have all versions loaded.
    if size < MESSAGE_START or (n >> size - MESSAGE_START & 1023) << 3 != size:
        return None
    read: dict[str, Message | None] = {}
    fitting = []
    for each in EDITIONS:
        usual = each.version == DEFAULT_VERSION and issue is None
        if usual or each != edition(each.version, issue) or issue not in (None, each.issue):
            continue
        if each.layouts not in read:
            read[each.layouts] = _read(each, n, size, direction, issue, careful)
        message = read[each.layouts]
        if message is not None and _may_hold(each, message):
            fitting.append(each)
    found = read[fitting[0].layouts] if fitting else None
    if found is not None:
        first = fitting[0]
        found.layouts = codec(first.version, first.issue)
        found.version, found.issue = first.version, first.issue
        found.version_from = "inferred"
        found.fitting = tuple(each.version for each in fitting)
    return found


def _read(
    each: Edition,
    n: int,
    size: int,
    direction: str | None,
    issue: str | None,
    careful: Careful,
) -> Message | None:
    # With an issue given, the usual version has not been tried.
    if issue is None and not _may_fit(each, n, size):
        return None
    message = quick.read_radio_as(each, n, size, direction)
    if message is None and any(codec(each.version, each.issue).forms.values()):
        # Strictly: a message that does not fit is given up at its first trouble.
        with suppress(DecodeError):
            message = careful(n, size, direction, (each.version, each.issue), strict=True)
    return message


def _may_fit(each: Edition, n: int, size: int) -> bool:
    """Tell whether lengths lead to the end, and anything is laid out otherwise than usual.

    What the usual version stumbled over, the same layouts of another one would stumble over too.
    """
    number = n >> size - 8
    way, usual = quick.ways_of(each).get(number), quick.WAYS.get(number)
    if way is None:
        return False
    try:
        _, left = way.read(n, size)
    except ValueError:
        return False
    forms = codec(each.version, each.issue).forms[way.direction]
    otherwise = usual is None or way.read is not usual.read
    while left > LONGEST_PADDING:
        if left < way.head:
            return False
        word = n >> left - way.head
        length, packet = word & LONGEST_PACKET, word >> way.head - 8 & 255
        known_here = packet in way.readers or packet in forms
        if not known_here or not way.head <= length <= left:
            return False
        known = usual.readers.get(packet) if usual else None
        otherwise = otherwise or packet in forms or way.readers.get(packet) is not known
        left -= length
    return otherwise


def _may_hold(each: Edition, message: Message) -> bool:
    """Tell whether a version may use all the packets of a message."""
    since = codec(each.version, each.issue).since[message.direction or TO_TRAIN]
    numbers = (packet["NID_PACKET"] for packet in message.packets)
    return all(reaches(each.version, since.get(number, "")) for number in numbers)
