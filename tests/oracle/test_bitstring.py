"""fishplate against bitstring's own packing, on packets, headers and messages without branches.

Source: SUBSET-026 issue 3.6.0, clauses 7.4.2, 7.4.3, 8.4, 8.6 and 8.7: each line below lists the
variables and widths of one layout as the standard does. bitstring turns the values into bits.
"""

from __future__ import annotations

import random

import bitstring
import pytest

import fishplate
from oracle import frames

ROUNDS = range(20)
LAYOUTS = {
    # 8.4.2.1, 8.4.3.1
    "balise": "Q_UPDOWN:1 M_VERSION:7 Q_MEDIA:1 N_PIG:3 N_TOTAL:3 M_DUP:2 M_MCOUNT:8 NID_C:10"
    " NID_BG:14 Q_LINK:1",
    "loop": "Q_UPDOWN:1 M_VERSION:7 Q_MEDIA:1 NID_C:10 NID_LOOP:14",
}
TO_TRAIN = {
    0: "NID_PACKET:8 NID_VBCMK:6",  # 7.4.2.0
    2: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 M_VERSION:7",  # 7.4.2.1
    16: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2 L_SECTION:15",  # 7.4.2.5
    40: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2 D_CURRENT:15 M_CURRENT:10",  # 7.4.2.8.1
    42: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_RBC:1 NID_C:10 NID_RBC:14 NID_RADIO:64"
    " Q_SLEEPSESSION:1",  # 7.4.2.10
    45: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 NID_MN:24",  # 7.4.2.11.1
    57: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 T_MAR:8 T_TIMEOUTRQST:10 T_CYCRQST:8",  # 7.4.2.14
    64: "NID_PACKET:8 Q_DIR:2 L_PACKET:13",  # 7.4.2.16.1
    65: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2 NID_TSR:8 D_TSR:15 L_TSR:15 Q_FRONT:1"
    " V_TSR:7",  # 7.4.2.17
    66: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 NID_TSR:8",  # 7.4.2.18
    71: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2 D_ADHESION:15 L_ADHESION:15"
    " M_ADHESION:1",  # 7.4.2.22
    131: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2 D_RBCTR:15 NID_C:10 NID_RBC:14"
    " NID_RADIO:64 Q_SLEEPSESSION:1",  # 7.4.2.27
    132: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_ASPECT:1",  # 7.4.2.28
    134: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2 NID_LOOP:14 D_LOOP:15 L_LOOP:15"
    " Q_LOOPDIR:1 Q_SSCODE:4",  # 7.4.2.30
    137: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SRSTOP:1",  # 7.4.2.33
    138: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2 D_STARTREVERSE:15 L_REVERSEAREA:15",
    139: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2 D_REVERSE:15 V_REVERSE:7",  # 7.4.2.35
    140: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 NID_OPERATIONAL:32",  # 7.4.2.36
    141: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_GDIR:1 G_TSR:8",  # 7.4.2.37
    143: "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_RIU:1 NID_C:10 NID_RIU:14 NID_RADIO:64",
    254: "NID_PACKET:8 Q_DIR:2 L_PACKET:13",  # 7.4.2.38
}
HEAD_TO_TRAIN = "NID_MESSAGE:8 L_MESSAGE:10 T_TRAIN:32 M_ACK:1 NID_LRBG:24"
HEAD_TO_TRACK = "NID_MESSAGE:8 L_MESSAGE:10 T_TRAIN:32 NID_ENGINE:24"
MESSAGES = {
    ("to-train", 2): f"{HEAD_TO_TRAIN} Q_SCALE:2 D_SR:15",  # 8.7.1
    ("to-train", 6): HEAD_TO_TRAIN,  # 8.7.3
    ("to-train", 8): f"{HEAD_TO_TRAIN} T_TRAIN_REFERENCE:32",  # 8.7.4
    ("to-train", 15): f"{HEAD_TO_TRAIN} NID_EM:4 Q_SCALE:2 D_REF:-16 Q_DIR:2"
    " D_EMERGENCYSTOP:15",  # 8.7.6
    ("to-train", 16): f"{HEAD_TO_TRAIN} NID_EM:4",  # 8.7.7
    ("to-train", 18): f"{HEAD_TO_TRAIN} NID_EM:4",  # 8.7.8
    ("to-train", 27): f"{HEAD_TO_TRAIN} T_TRAIN_REFERENCE:32",  # 8.7.10
    ("to-train", 28): f"{HEAD_TO_TRAIN} T_TRAIN_REFERENCE:32",  # 8.7.11
    ("to-train", 32): f"{HEAD_TO_TRAIN} M_VERSION:7",  # 8.7.12
    ("to-train", 34): f"{HEAD_TO_TRAIN} Q_SCALE:2 D_REF:-16 Q_DIR:2 D_TAFDISPLAY:15"
    " L_TAFDISPLAY:15",  # 8.7.14
    ("to-train", 45): f"{HEAD_TO_TRAIN} Q_ORIENTATION:1",  # 8.7.22
    ("to-track", 146): f"{HEAD_TO_TRACK} T_TRAIN_REFERENCE:32",  # 8.6.7
    ("to-track", 154): HEAD_TO_TRACK,  # 8.6.12
    ("to-track", 155): HEAD_TO_TRACK,  # 8.6.13
    ("to-track", 156): HEAD_TO_TRACK,  # 8.6.14
}
DIGITS = {"NID_RADIO", "NID_MN", "NID_OPERATIONAL"}


def pack(layout: str, fixed: dict[str, int], rng: random.Random) -> tuple[bitstring.Bits, dict]:
    """Draw values for a layout; give bitstring's bits and the values as a tree holds them."""
    maker = frames.Maker(rng)
    tokens, values, tree = [], [], {}
    for item in layout.split():
        name, width = item.split(":")
        bits = abs(int(width))
        low, high = (
            (-(1 << bits - 1), (1 << bits - 1) - 1) if "-" in width else (0, (1 << bits) - 1)
        )
        value = fixed.get(name, rng.choice((low, high, rng.randint(low, high))))
        if name in DIGITS:
            value = maker.digits(bits // 4)
        tokens.append(f"int:{bits}" if "-" in width else f"uint:{bits}")
        values.append(value)
        # Decimal digits left adjusted in nibbles, the rest F (7.5.1.91.1, 7.5.1.92, 7.5.1.95).
        tree[name] = f"{value:0{bits // 4}X}".rstrip("F") if name in DIGITS else value
    return bitstring.Bits(bitstring.pack(", ".join(tokens), *values)), tree


def size(layout: str) -> int:
    """The bits of a layout."""
    return sum(abs(int(item.split(":")[1])) for item in layout.split())


@pytest.mark.parametrize("medium", ["balise", "loop"])
@pytest.mark.parametrize("number", sorted(TO_TRAIN))
def test_telegrams(medium: str, number: int) -> None:
    """Header, one packet, end flag (7.4.2.39: eight ones)."""
    for turn in ROUNDS:
        rng = random.Random(f"{medium} {number} {turn}")  # noqa: S311
        shown = {"Q_UPDOWN": 1, "M_VERSION": 0x21, "Q_MEDIA": int(medium == "loop")}
        header, header_tree = pack(LAYOUTS[medium], shown, rng)
        layout = TO_TRAIN[number]
        fixed = {"NID_PACKET": number, "L_PACKET": size(layout)}
        packet, packet_tree = pack(layout, fixed, rng)
        whole = header + packet + bitstring.Bits("0xFF")
        tree = fishplate.decode(whole, medium=medium).tree()
        assert tree["header"] == header_tree
        assert tree["packets"] == [packet_tree, {"NID_PACKET": 255}]
        assert fishplate.encode(tree) == whole


@pytest.mark.parametrize(("direction", "number"), sorted(MESSAGES))
def test_messages(direction: str, number: int) -> None:
    """Fixed variables, then padding that completes the last byte."""
    for turn in ROUNDS:
        rng = random.Random(f"{direction} {number} {turn}")  # noqa: S311
        layout = MESSAGES[direction, number]
        missing = -size(layout) % 8
        fixed = {"NID_MESSAGE": number, "L_MESSAGE": (size(layout) + missing) // 8}
        header, header_tree = pack(layout, fixed, rng)
        whole = header + bitstring.Bits.from_zeros(missing)
        tree = fishplate.decode(whole, medium="radio", direction=direction).tree()
        assert tree["header"] == header_tree
        assert tree["packets"] == []
        assert ("padding" in tree) == (missing > 0)
        assert fishplate.encode(tree) == whole


def test_bits_are_those_of_the_first_balise_header() -> None:
    """One header value by value, so that bitstring's order of bits is seen too."""
    packed = bitstring.pack("uint:1, uint:7, uint:1, uint:3, uint:3", 1, 0x21, 0, 1, 2)
    assert packed.bin == "101000010001010"
