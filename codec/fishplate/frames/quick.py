"""The beaten track: whole radio messages of the usual version in which nothing is odd.

Both ways give up (None) at the first thing that is not as it should be; the careful readers and
writers beside this module then start afresh. Tests hold the two to the same results.
"""

from __future__ import annotations

from functools import cache
from typing import TYPE_CHECKING, NamedTuple

from fishplate.bits import blob
from fishplate.engine.runtime import MISFITS, codec
from fishplate.frames.message import Message, Tree
from fishplate.frames.sizes import (
    HEADS,
    LONGEST_MESSAGE,
    LONGEST_PACKET,
    LONGEST_PADDING,
    MESSAGE_START,
)
from fishplate.standard.editions import DEFAULT_VERSION, EDITIONS

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.engine.runtime import Reader, Writer
    from fishplate.standard.editions import Edition

KEYS = frozenset({"medium", "direction", "version", "issue", "header", "packets", "padding"})


OCTETS = {f"{octet:02X}": octet for octet in range(256)}
"""What the hex of a padding may be: less than a byte, left aligned."""


class Way(NamedTuple):
    """All that reading or writing one kind of message needs."""

    direction: str
    head: int
    read: Reader
    write: Writer
    readers: Mapping[int, Reader]
    writers: Mapping[int, Writer]
    issue: str


@cache
def ways_of(edition: Edition) -> Mapping[int, Way]:
    """Return what each message number needs, in the layouts of one edition."""
    layouts = codec(edition.version, edition.issue)
    ways = {}
    for direction, messages in layouts.read_message.items():
        odd = layouts.unmeasured[direction]
        readers, writers = layouts.read_packet[direction], layouts.write_packet[direction]
        readers = {number: each for number, each in readers.items() if number not in odd}
        writers = {number: each for number, each in writers.items() if number not in odd}
        for number, read in messages.items():
            write = layouts.write_message[direction][number]
            ways[number] = Way(
                direction, HEADS[direction], read, write, readers, writers, layouts.issue
            )
    return ways


USUAL = next(each for each in EDITIONS if each.version == DEFAULT_VERSION)
WAYS = ways_of(USUAL)


def read_radio(
    n: int, size: int, direction: str | None, ways: Mapping[int, Way] = WAYS
) -> Message | None:
    """Read a radio message of `size` bits, or return None.

    Its version is the usual one; the caller says so where the ways are those of another.
    """
    if size < MESSAGE_START:
        return None
    start = n >> size - MESSAGE_START
    way = ways.get(start >> 10)
    if way is None or (start & 1023) << 3 != size or direction not in (None, way[0]):
        return None
    direction, head, read, _, readers, _, issue = way
    packets = []
    try:
        header, left = read(n, size)
        while left > LONGEST_PADDING:
            word = n >> left - head
            length = word & LONGEST_PACKET
            if length < head:
                return None
            left -= length
            part = n >> left & (1 << length) - 1
            tree, extra = readers[word >> head - 8 & 255](part, length)
            if extra:
                return None
            packets.append(tree)
    except (KeyError, ValueError):
        return None
    message = Message("radio", direction, size)
    message.version = DEFAULT_VERSION
    message.issue = issue
    message.header = header
    message.packets = packets
    if left:
        message.padding = blob(n & (1 << left) - 1, left)
    return message


def read_radio_as(each: Edition, n: int, size: int, direction: str | None) -> Message | None:
    """Read a radio message in the layouts of an edition, or return None."""
    message = read_radio(n, size, direction, ways_of(each))
    if message is not None:
        message.version, message.issue = each.version, each.issue
        message.layouts = codec(each.version, each.issue)
    return message


def write_radio(tree: Tree) -> tuple[int, int] | None:
    """Write a radio message: value and width in bits, or None."""
    try:
        header = tree["header"]
        way = WAYS[header["NID_MESSAGE"]]
        if (
            not tree.keys() <= KEYS
            or tree.get("medium", "radio") != "radio"
            or tree.get("direction", way[0]) != way[0]
            or tree.get("version", DEFAULT_VERSION) != DEFAULT_VERSION
            or tree.get("issue", way[6]) != way[6]
        ):
            return None
        _, head, _, write, _, writers, _ = way
        value, size = write(header)
        for packet in tree["packets"]:
            part, width = writers[packet["NID_PACKET"]](packet)
            if width > LONGEST_PACKET or packet.get("L_PACKET", width) != width:
                return None
            value = value << width | width << width - head | part
            size += width
        spare = -size % 8
        value <<= spare
        size += spare
        if "padding" in tree:
            padding = OCTETS[tree["padding"]["hex"]]
            if tree["padding"] != blob(padding >> 8 - spare, spare):
                return None
            value |= padding >> 8 - spare
        length = size >> 3
        if length > LONGEST_MESSAGE or header.get("L_MESSAGE", length) != length:
            return None
    except MISFITS:
        return None
    return value | length << size - MESSAGE_START, size
