"""Trees written: lengths and padding computed, and each wrong value named with its place.

Layouts: SUBSET-026 issue 3.6.0, 7.4.2, 7.4.3, 8.4, 8.6, 8.7; telegram sizes: SUBSET-036 4.3.1.2.
The bits expected are written by hand in ``wire.py``.
"""

from __future__ import annotations

import copy
from typing import Any

import pytest

import fishplate
from fishplate.errors import EncodeError
from fishplate.frames import encode_bits
from unit.wire import (
    END,
    ORDER,
    TEMPORARY,
    ack,
    balise,
    decode,
    field,
    general,
    loop,
    packet,
    packet_back,
    radio,
)

Tree = dict[str, Any]

HEADER = {
    "Q_UPDOWN": 1,
    "M_VERSION": 33,
    "Q_MEDIA": 0,
    "N_PIG": 0,
    "N_TOTAL": 0,
    "M_DUP": 0,
    "M_MCOUNT": 255,
    "NID_C": 300,
    "NID_BG": 1207,
    "Q_LINK": 1,
}
LOOP_HEADER = {"Q_UPDOWN": 1, "M_VERSION": 33, "Q_MEDIA": 1, "NID_C": 300, "NID_LOOP": 77}
GENERAL = {"NID_MESSAGE": 24, "T_TRAIN": 5, "M_ACK": 0, "NID_LRBG": 9}
REVOKED = {"NID_PACKET": 66, "Q_DIR": 1, "NID_TSR": 9}
ORDERED = {"NID_PACKET": 2, "Q_DIR": 1, "M_VERSION": 33}
LAST = {"NID_PACKET": 255}
AUTHORITY = {
    "NID_PACKET": 12,
    "Q_DIR": 1,
    "Q_SCALE": 1,
    "V_MAIN": 24,
    "V_EMA": 0,
    "T_EMA": 1023,
    "sections": [{"L_SECTION": 1200, "Q_SECTIONTIMER": 0}],
    "L_ENDSECTION": 800,
    "Q_SECTIONTIMER": 0,
    "Q_ENDTIMER": 0,
    "Q_DANGERPOINT": 0,
    "Q_OVERLAP": 0,
}


def telegram(*packets: Tree, **more: Any) -> Tree:
    return {"medium": "balise", "header": HEADER, "packets": list(packets), **more}


def message(*packets: Tree, **more: Any) -> Tree:
    return {"medium": "radio", "header": GENERAL, "packets": list(packets), **more}


def text_of(tree: Tree, **given: Any) -> str:
    value, size = encode_bits(tree, **given)
    return f"{value:0{size}b}"


# Tree, and the bits it stands for.
WRITTEN: dict[str, tuple[Tree, dict[str, Any], str]] = {
    "a short telegram": (
        telegram(REVOKED, ORDERED),
        {},
        balise(TEMPORARY, ORDER, END, "1" * (210 - 119)),
    ),
    "a telegram with its end flag given": (
        telegram(REVOKED, LAST),
        {},
        balise(TEMPORARY, END, "1" * (210 - 89)),
    ),
    "a telegram filled to a length": (
        telegram(REVOKED),
        {"length": 830},
        balise(TEMPORARY, END, "1" * (830 - 89)),
    ),
    "a telegram of an odd length": (telegram(REVOKED), {"length": 90}, balise(TEMPORARY, END, "1")),
    "a telegram that just fits 210 bits": (
        telegram(
            *[REVOKED] * 4, {"NID_PACKET": 0, "NID_VBCMK": 1}, {"NID_PACKET": 0, "NID_VBCMK": 2}
        ),
        {},
        balise(*[TEMPORARY] * 4, field(1, 14), field(2, 14), END),
    ),
    "a telegram one packet too long for 210 bits": (
        telegram(*[REVOKED] * 5),
        {},
        balise(*[TEMPORARY] * 5, END, "1" * (830 - 213)),
    ),
    "a telegram with its filler": (
        telegram(REVOKED, LAST, filler={"bits": 3, "hex": "40"}),
        {},
        balise(TEMPORARY, END, "010"),
    ),
    "a telegram with filler and no end flag": (
        telegram(REVOKED, filler={"bits": 0, "hex": ""}),
        {},
        balise(TEMPORARY),
    ),
    "a telegram with unread bits": (
        telegram(REVOKED, content={"bits": 4, "hex": "50"}),
        {},
        balise(TEMPORARY, "0101"),
    ),
    "a telegram of nothing": (telegram(), {}, balise(END, "1" * 152)),
    "a loop message": (
        {"medium": "loop", "header": LOOP_HEADER, "packets": [REVOKED]},
        {},
        loop(TEMPORARY, END),
    ),
    "a loop message filled to a length": (
        {"medium": "loop", "header": LOOP_HEADER, "packets": [REVOKED]},
        {"length": 80},
        loop(TEMPORARY, END, "1" * 8),
    ),
    "a message": (message(REVOKED), {}, general(TEMPORARY)),
    "a message of nothing": (message(), {}, general()),
    "a message with its lengths": (
        {
            "medium": "radio",
            "header": GENERAL | {"L_MESSAGE": 14},
            "packets": [REVOKED | {"L_PACKET": 31}],
        },
        {},
        general(TEMPORARY),
    ),
    "a message with its padding": (
        message(REVOKED, padding={"bits": 6, "hex": "AC"}),
        {},
        general(TEMPORARY, padding="101011"),
    ),
    "a message back": (
        {
            "header": {
                "NID_MESSAGE": 146,
                "T_TRAIN": 5,
                "NID_ENGINE": 9,
                "T_TRAIN_REFERENCE": 4,
            },
            "packets": [{"NID_PACKET": 5, "NID_OPERATIONAL": "1234567"}],
        },
        {},
        ack(packet_back(5, field(0x1234567F, 32))),
    ),
    "an unknown packet": (
        message({"NID_PACKET": 201, "Q_DIR": 1, "content": {"bits": 5, "hex": "B0"}}, REVOKED),
        {},
        general(packet(201, "10110"), TEMPORARY),
    ),
    "a packet with surplus": (
        message(REVOKED | {"surplus": {"bits": 3, "hex": "60"}}),
        {},
        general(packet(66, field(9, 8) + "011")),
    ),
    "a packet kept as content, its length wrong on the wire": (
        message({"NID_PACKET": 66, "Q_DIR": 1, "L_PACKET": 7, "content": {"bits": 0, "hex": ""}}),
        {},
        general(packet(66, "", length=7)),
    ),
    "opaque data": (
        message({"NID_PACKET": 44, "Q_DIR": 1, "NID_XUSER": 5, "data": {"bits": 9, "hex": "CC80"}}),
        {},
        general(packet(44, field(5, 9) + "110011001")),
    ),
    "a message nobody knows": (
        {
            "medium": "radio",
            "direction": "to-train",
            "header": {"NID_MESSAGE": 99, "L_MESSAGE": 3},
            "content": {"bits": 6, "hex": "A8"},
        },
        {},
        radio(99, "101010"),
    ),
    "a frame nobody could read": ({"content": {"bits": 5, "hex": "A8"}}, {}, "10101"),
    "a telegram nobody could read": (
        {"medium": "balise", "content": {"bits": 5, "hex": "A8"}},
        {},
        "10101",
    ),
    "a wrong L_PACKET, forced": (
        message(REVOKED | {"L_PACKET": 40}),
        {"force": True},
        general(packet(66, field(9, 8), length=40)),
    ),
    "a wrong L_MESSAGE, forced": (
        {"medium": "radio", "header": GENERAL | {"L_MESSAGE": 99}, "packets": [REVOKED]},
        {"force": True},
        general(TEMPORARY, length=99),
    ),
}


@pytest.mark.parametrize("case", WRITTEN)
def test_a_tree_is_written(case: str) -> None:
    tree, given, expected = WRITTEN[case]
    before = copy.deepcopy(tree)
    assert text_of(tree, **given) == expected
    assert tree == before, "the tree handed over stays as it is"


@pytest.mark.parametrize("case", WRITTEN)
def test_what_is_written_is_read_back(case: str) -> None:
    tree, _, text = WRITTEN[case]
    medium = tree.get("medium")
    again = decode(text, medium=medium, direction=tree.get("direction"), strict=False)
    assert encode_bits(again) == (int(text, 2), len(text))
    bits = fishplate.encode(again)
    assert len(bits) == len(text)
    assert bits.bin == text


def test_order_of_keys_does_not_matter() -> None:
    tree = message(dict(reversed(AUTHORITY.items())))
    assert text_of(tree) == text_of(message(AUTHORITY))


def test_tuples_are_lists() -> None:
    tree = message(AUTHORITY | {"sections": tuple(AUTHORITY["sections"])})
    assert text_of(tree | {"packets": tuple(tree["packets"])}) == text_of(message(AUTHORITY))


def test_a_length_that_does_not_hold_the_telegram() -> None:
    with pytest.raises(EncodeError, match="takes 89 bits, 80 are wanted") as caught:
        encode_bits(telegram(REVOKED), length=80)
    assert caught.value.got == 89
    with pytest.raises(EncodeError, match="takes 92 bits, 210 are wanted"):
        encode_bits(telegram(REVOKED, LAST, filler={"bits": 3, "hex": "00"}), length=210)


@pytest.mark.parametrize("source", [None, "text", 5, [], b"\x00"])
def test_what_is_no_tree(source: Any) -> None:
    with pytest.raises(EncodeError, match="expected a message or a tree"):
        encode_bits(source)


def test_the_public_call_gives_a_bitstring() -> None:
    bits = fishplate.encode(telegram(REVOKED), length=90)
    assert bits.bin == balise(TEMPORARY, END, "1")
    assert (
        fishplate.encode(message(REVOKED)).tobytes().hex() == f"{int(general(TEMPORARY), 2):028x}"
    )


def test_a_message_is_encoded_as_its_tree() -> None:
    found = decode(general(TEMPORARY))
    assert fishplate.encode(found) == fishplate.encode(found.tree())
    found.packets[0]["NID_TSR"] = 300
    with pytest.raises(EncodeError) as caught:
        fishplate.encode(found)
    assert caught.value.path == ("packets", 0, "NID_TSR")
