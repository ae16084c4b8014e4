"""Which system version a radio message is of, where nothing says so: the layouts that fit.

A message fits a version when it can be read to its end with nothing odd in it. The usual version
is tried before all others, elsewhere, and wins wherever it fits.
"""

from __future__ import annotations

from typing import TYPE_CHECKING

from fishplate.engine.runtime import codec
from fishplate.frames import quick
from fishplate.frames.sizes import MESSAGE_START
from fishplate.standard import registry
from fishplate.standard.editions import DEFAULT_VERSION, EDITIONS, Edition, edition, version_key

if TYPE_CHECKING:
    from fishplate.frames.message import Message


def infer_version(
    n: int, size: int, direction: str | None, issue: str | None = None
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
            read[each.layouts] = quick.read_radio(n, size, direction, quick.ways_of(each))
        message = read[each.layouts]
        if message is not None and _may_hold(each, message):
            fitting.append(each)
    if not fitting:
        return None
    first = fitting[0]
    found = read[first.layouts]
    if found is not None:
        found.layouts = codec(first.version, first.issue)
        found.version, found.issue = first.version, first.issue
        found.version_from = "inferred"
        found.fitting = tuple(each.version for each in fitting)
    return found


def _may_hold(each: Edition, message: Message) -> bool:
    """Tell whether a version may use all the packets of a message."""
    packets = registry(each.version, each.issue).packets
    for packet in message.packets:
        since = packets[message.direction or "", packet["NID_PACKET"]].since
        if since and version_key(since) > version_key(each.version):
            return False
    return True
