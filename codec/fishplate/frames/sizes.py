"""Widths and limits of frames, in bits unless it is said otherwise."""

from __future__ import annotations

from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN, Field

END_FLAG = 255
"""The packet that ends a telegram or loop message (SUBSET-026 7.4.2.39)."""

SHORTEST_PACKET = 8
"""NID_PACKET alone; with less left, no packet can follow."""

LENGTH_BITS = 13
LONGEST_PACKET = (1 << LENGTH_BITS) - 1
"""L_PACKET and the most it can say (SUBSET-026 7.5.1.49)."""

HEADS = {TO_TRAIN: 23, TO_TRACK: 21}
"""NID_PACKET, Q_DIR (to the train only) and L_PACKET, by direction (SUBSET-026 7.4.2, 7.4.3)."""

HEAD_NAMES = {TO_TRAIN: ("NID_PACKET", "Q_DIR", "L_PACKET"), TO_TRACK: ("NID_PACKET", "L_PACKET")}
"""The variables of that head."""

HEAD_NODES = {way: tuple(Field(each) for each in names) for way, names in HEAD_NAMES.items()}
"""That head as a layout."""

HEADER_BITS = {"balise": 50, "loop": 33}
"""The header of a balise telegram and of a loop message (SUBSET-026 8.4.2.1, 8.4.3.1)."""

MESSAGE_START = 18
"""NID_MESSAGE and L_MESSAGE, with which every radio message of every version begins."""

READ_BITS = 1 << 14
"""From here on it pays to cut off the bits that have been read: shifting copies all of them."""

LONGEST_MESSAGE = 1023
"""The most that L_MESSAGE can say, in bytes (SUBSET-026 7.5.1.48)."""

LONGEST_PADDING = 7
"""More than this does not just complete the last byte (SUBSET-026 8.4.4.5)."""

TELEGRAM_SIZES = (210, 830)
"""User bits of a short and a long balise telegram (SUBSET-036 4.3.1.2)."""
