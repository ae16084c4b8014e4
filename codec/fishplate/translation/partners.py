"""Which packet of a message gives its values to which other one: by the direction of travel."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

if TYPE_CHECKING:
    from collections.abc import Sequence

    from fishplate.errors import Path

Tree = dict[str, Any]

WAY = "Q_DIR"
BOTH = 2
"""Q_DIR 2: valid for both directions (SUBSET-026 7.5.1.103)."""


def partner(path: Path, packets: Sequence[Tree], number: int) -> Tree | None:
    """Return the packet of this number that gives its values to the one at a path.

    One for the same direction before one for both; a packet for both directions takes one for a
    single direction where there is no other. Never one for the opposite direction.
    """
    way = packets[int(path[1])].get(WAY)
    others = [each for each in packets if each["NID_PACKET"] == number]
    for ways in ({way}, {BOTH}, {0, 1} if way == BOTH else set()):
        for each in others:
            if each.get(WAY) in ways:
                return each
    return None


def served(path: Path, packets: Sequence[Tree], number: int) -> list[Tree]:
    """Return the packets of this number that take their values from the one at a path."""
    own = packets[int(path[1])]
    return [
        each
        for place, each in enumerate(packets)
        if each["NID_PACKET"] == number
        and partner(("packets", place), packets, own["NID_PACKET"]) is own
    ]


def same_way(one: Tree, other: Tree) -> bool:
    """Tell whether two packets are for the same direction."""
    return bool(one.get(WAY) == other.get(WAY))


def covers(one: Tree, other: Tree) -> bool:
    """Tell whether one packet is for every direction the other is for."""
    return same_way(one, other) or one.get(WAY) == BOTH
