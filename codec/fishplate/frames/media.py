"""Which medium a frame is of, told by its first bits and its length."""

from __future__ import annotations

from functools import cache

from fishplate.engine.runtime import codec
from fishplate.frames.sizes import (
    END_FLAG,
    HEADER_BITS,
    HEADS,
    LONGEST_PACKET,
    MESSAGE_START,
    READ_BITS,
    SHORTEST_PACKET,
)
from fishplate.standard.vocabulary import TO_TRAIN
from fishplate.versions import DEFAULT_VERSION, defined_codes

NEITHER = (
    "no telegram that reaches its end flag, and no radio message, since no L_MESSAGE says "
    "{size} bits"
)
BOTH = (
    "packets reach an end flag as in a telegram, and L_MESSAGE says {size} bits as in a radio "
    "message"
)


def tell_medium(n: int, size: int) -> tuple[str | None, str]:
    """Return the medium of a frame of `size` bits, or None and the reason why none is told.

    A defined M_VERSION behind a first bit 1 is no message number. Any other one may be: there,
    packets that reach the end flag speak for a telegram, L_MESSAGE for a radio message.
    """
    if size < MESSAGE_START:
        return None, NEITHER
    start = n >> size - MESSAGE_START
    medium = "loop" if start >> 9 & 1 else "balise"
    if start >> 10 in _telegram_starts():
        return medium, ""
    as_long_as_said = (start & 1023) << 3 == size
    if start >> MESSAGE_START - 1 and hops_to_the_end(n, size - HEADER_BITS[medium]):
        return (None, BOTH) if as_long_as_said else (medium, "")
    return ("radio", "") if as_long_as_said else (None, NEITHER)


@cache
def _telegram_starts() -> frozenset[int]:
    """First bytes of telegrams: Q_UPDOWN 1, then an M_VERSION the standard defines."""
    return frozenset(128 | code for code in defined_codes())


def hops_to_the_end(n: int, left: int) -> bool:
    """Tell whether packets reach the end flag, by L_PACKET alone; `n` holds `left` bits of them."""
    head = HEADS[TO_TRAIN]
    # A packet without L_PACKET is laid out the same in every version (SUBSET-026 8.4.2.4).
    unmeasured = codec(DEFAULT_VERSION).unmeasured[TO_TRAIN]
    trimmed = left
    while left >= head:
        if trimmed - left > READ_BITS:
            n, trimmed = n & (1 << left) - 1, left
        word = n >> left - head & (1 << head) - 1
        if word >> head - 8 == END_FLAG:
            return True
        left -= unmeasured.get(word >> head - 8) or max(head, word & LONGEST_PACKET)
    return left >= SHORTEST_PACKET and n >> left - 8 & 255 == END_FLAG
