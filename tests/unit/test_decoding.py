"""Frames read: which medium and version, where packets end, what is kept that nobody explains.

Layouts: SUBSET-026 issue 3.6.0, 7.4.2, 7.4.3, 8.4, 8.6 and 8.7, the bits written by hand in
``wire.py``. How broken frames are kept and reported is the library's own contract.
"""

from __future__ import annotations

from typing import Any

import bitstring
import pytest

import fishplate
from fishplate.errors import LengthMismatch, Truncated, Unknown
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
    rows,
)

REVOKED = {"NID_PACKET": 66, "Q_DIR": 1, "L_PACKET": 31, "NID_TSR": 9}
ORDERED = {"NID_PACKET": 2, "Q_DIR": 1, "L_PACKET": 30, "M_VERSION": 33}
LAST = {"NID_PACKET": 255}
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


def test_a_telegram() -> None:
    message = decode(balise(TEMPORARY, ORDER, END, "101"))
    assert (message.medium, message.direction) == ("balise", "to-train")
    assert (message.version, message.issue, message.version_from) == ("2.1", "3.6.0", "frame")
    assert message.header == HEADER
    assert message.packets == [REVOKED, ORDERED, LAST]
    assert message.filler == {"bits": 3, "hex": "A0"}
    assert (message.padding, message.surplus, message.content) == (None, None, None)
    assert not message.problems
    assert message.complete
    assert message.size == 50 + 31 + 30 + 8 + 3
    assert message.tree() == {
        "medium": "balise",
        "direction": "to-train",
        "version": "2.1",
        "issue": "3.6.0",
        "header": HEADER,
        "packets": [REVOKED, ORDERED, LAST],
        "filler": {"bits": 3, "hex": "A0"},
    }


def test_a_loop_message() -> None:
    message = decode(loop(TEMPORARY, END))
    assert (message.medium, message.direction, message.version) == ("loop", "to-train", "2.1")
    assert message.header == {
        "Q_UPDOWN": 1,
        "M_VERSION": 33,
        "Q_MEDIA": 1,
        "NID_C": 300,
        "NID_LOOP": 77,
    }
    assert message.packets == [REVOKED, LAST]
    assert message.filler == {"bits": 0, "hex": ""}


def test_a_radio_message_to_the_train() -> None:
    message = decode(general(TEMPORARY))
    assert (message.medium, message.direction) == ("radio", "to-train")
    assert (message.version, message.version_from) == ("2.1", "assumed")
    assert message.header == {
        "NID_MESSAGE": 24,
        "L_MESSAGE": 14,
        "T_TRAIN": 5,
        "M_ACK": 0,
        "NID_LRBG": 9,
    }
    assert message.packets == [REVOKED]
    assert message.padding == {"bits": 6, "hex": "00"}
    assert message.filler is None
    assert message.size == 112


def test_a_radio_message_to_the_trackside() -> None:
    body = field(12345678, 32)
    message = decode(ack(packet_back(5, body)))
    assert message.direction == "to-track"
    assert message.header["NID_MESSAGE"] == 146
    assert message.header["T_TRAIN"] == 5
    assert message.header["T_TRAIN_REFERENCE"] == 4
    assert message.packets == [{"NID_PACKET": 5, "L_PACKET": 53, "NID_OPERATIONAL": "00BC614E"}]


def test_no_padding_where_a_byte_is_complete() -> None:
    message = decode(ack())  # 106 bits and 6 more
    assert message.padding == {"bits": 6, "hex": "00"}
    whole = general(packet(44, field(3, 9) + "1" * 5))  # 75 + 37 = 112 bits
    message = decode(whole)
    assert message.padding is None
    assert "padding" not in message.tree()


@pytest.mark.parametrize("form", ["bytes", "hex", "bitstring", "bits given"])
def test_every_form_of_data(form: str) -> None:
    text = balise(END)
    octets = int(text + "000000", 2).to_bytes(8, "big")
    data: Any = {"bytes": octets, "hex": octets.hex(), "bits given": octets}.get(
        form, bitstring.Bits("0b" + text)
    )
    bits = 58 if form == "bits given" else None
    message = fishplate.decode(data, bits=bits)
    assert message.packets == [LAST]
    assert message.filler == {
        "bits": 0 if form in ("bitstring", "bits given") else 6,
        "hex": "" if form in ("bitstring", "bits given") else "00",
    }


# --- packets and their lengths -------------------------------------------------------------------


def test_what_follows_the_end_flag_is_not_read() -> None:
    message = decode(balise(END, TEMPORARY, END))
    assert message.packets == [LAST]
    assert message.filler is not None
    assert message.filler["bits"] == 39


def test_the_cover_marker_and_the_end_flag_have_no_length() -> None:
    message = decode(balise(field(0, 8) + field(21, 6), TEMPORARY, END))
    assert message.packets == [{"NID_PACKET": 0, "NID_VBCMK": 21}, REVOKED, LAST]


def test_an_unknown_packet_is_kept_and_passed_over() -> None:
    text = balise(packet(201, "10110"), TEMPORARY, END)
    with pytest.raises(Unknown) as caught:
        decode(text)
    assert (caught.value.kind, caught.value.path) == ("unknown-packet", ("packets", 0))
    assert caught.value.bit == 50
    message = decode(text, strict=False)
    content = {"bits": 5, "hex": "B0"}
    assert message.packets[0] == {
        "NID_PACKET": 201,
        "Q_DIR": 1,
        "L_PACKET": 28,
        "content": content,
    }
    assert message.packets[1:] == [REVOKED, LAST]
    assert [each.kind for each in message.problems] == ["unknown-packet"]
    assert message.complete
    walked = rows(text, strict=False)
    assert [each.path for each in walked if each.path[:2] == ("packets", 0)] == [
        ("packets", 0, "NID_PACKET"),
        ("packets", 0, "Q_DIR"),
        ("packets", 0, "L_PACKET"),
        ("packets", 0, "content"),
    ]


def test_an_unknown_packet_of_nothing() -> None:
    message = decode(balise(packet(201, ""), END), strict=False)
    assert message.packets[0]["content"] == {"bits": 0, "hex": ""}


def test_an_unknown_packet_to_the_trackside_has_no_direction() -> None:
    message = decode(ack(packet_back(200, "111")), strict=False)
    assert message.packets[0] == {
        "NID_PACKET": 200,
        "L_PACKET": 24,
        "content": {"bits": 3, "hex": "E0"},
    }


def test_a_packet_longer_than_its_layout_has_surplus() -> None:
    text = balise(packet(66, field(9, 8) + "011"), TEMPORARY, END)
    with pytest.raises(LengthMismatch) as caught:
        decode(text)
    assert caught.value.path == ("packets", 0, "L_PACKET")
    assert caught.value.bit == 50 + 10
    message = decode(text, strict=False)
    surplus = {"bits": 3, "hex": "60"}
    assert message.packets == [REVOKED | {"L_PACKET": 34, "surplus": surplus}, REVOKED, LAST]
    assert [each.kind for each in message.problems] == ["length-mismatch"]
    assert not message.complete
    assert [each.path for each in rows(text, strict=False)][14:16] == [
        ("packets", 0, "surplus"),
        ("packets", 1, "NID_PACKET"),
    ]


def test_a_packet_shorter_than_its_layout_is_content() -> None:
    text = balise(packet(66, "0010"), TEMPORARY, END)
    with pytest.raises(LengthMismatch, match="NID_TSR") as caught:
        decode(text)
    assert caught.value.path == ("packets", 0, "L_PACKET")
    message = decode(text, strict=False)
    assert message.packets == [
        {"NID_PACKET": 66, "Q_DIR": 1, "L_PACKET": 27, "content": {"bits": 4, "hex": "20"}},
        REVOKED,
        LAST,
    ]
    assert encode_bits(message.tree()) == (int(text, 2), len(text))


@pytest.mark.parametrize("length", [0, 1, 8, 22])
def test_a_packet_shorter_than_its_head_is_passed_over(length: int) -> None:
    # Nothing but the head is taken, so that reading always goes on.
    text = balise(packet(66, "", length=length), TEMPORARY, END)
    with pytest.raises(LengthMismatch):
        decode(text)
    message = decode(text, strict=False)
    assert message.packets[0] == {
        "NID_PACKET": 66,
        "Q_DIR": 1,
        "L_PACKET": length,
        "content": {"bits": 0, "hex": ""},
    }
    assert message.packets[1:] == [REVOKED, LAST]
    assert encode_bits(message.tree()) == (int(text, 2), len(text))


def test_a_packet_that_overshoots_the_telegram() -> None:
    text = balise(TEMPORARY, packet(66, field(9, 8), length=90), END)
    with pytest.raises(Truncated) as caught:
        decode(text, medium="balise")
    assert caught.value.missing == 90 - (31 + 8)
    assert (caught.value.path, caught.value.bit) == (("packets", 1), 81)
    message = decode(text, medium="balise", strict=False)
    assert message.packets[0] == REVOKED
    assert message.packets[1]["content"] == {"bits": 16, "hex": "09FF"}
    assert encode_bits(message.tree()) == (int(text, 2), len(text))


def test_packet_44_keeps_its_data() -> None:
    data = "110011001"
    message = decode(balise(packet(44, field(5, 9) + data), END))
    assert message.packets[0]["NID_XUSER"] == 5
    assert message.packets[0]["data"] == {"bits": 9, "hex": "CC80"}
    with_system = decode(balise(packet(44, field(102, 9) + field(20, 8) + data), END))
    assert with_system.packets[0]["NID_NTC"] == 20
    assert with_system.packets[0]["data"] == {"bits": 9, "hex": "CC80"}
    nothing = decode(balise(packet(44, field(5, 9)), END))
    assert nothing.packets[0]["data"] == {"bits": 0, "hex": ""}


def test_packets_may_be_cut_at_a_boundary() -> None:
    text = balise(TEMPORARY)
    with pytest.raises(Truncated, match="end flag") as caught:
        decode(text, medium="balise")
    assert caught.value.missing == 8
    assert caught.value.path == ("packets", 1, "NID_PACKET")
    message = decode(text, medium="balise", strict=False)
    assert message.packets == [REVOKED]
    assert encode_bits(message.tree()) == (int(text, 2), len(text))


# --- radio messages and their lengths ----------------------------------------------------------


def test_an_unknown_message_is_kept() -> None:
    text = radio(99, "1011" * 4)
    with pytest.raises(Unknown) as caught:
        decode(text)
    assert caught.value.kind == "unknown-message"
    assert caught.value.path == ("header", "NID_MESSAGE")
    message = decode(text, strict=False)
    assert message.header == {"NID_MESSAGE": 99, "L_MESSAGE": 5}
    assert message.content is not None
    assert message.content["bits"] == 22
    assert "packets" not in message.tree()
    assert encode_bits(message.tree()) == (int(text, 2), len(text))


def test_a_message_longer_than_it_says() -> None:
    text = general(TEMPORARY) + "1" * 11
    with pytest.raises(LengthMismatch) as caught:
        decode(text, medium="radio")
    assert (caught.value.path, caught.value.bit) == (("header", "L_MESSAGE"), 8)
    message = decode(text, medium="radio", strict=False)
    assert message.packets == [REVOKED]
    assert message.padding == {"bits": 6, "hex": "00"}
    assert message.surplus == {"bits": 11, "hex": "FFE0"}
    assert encode_bits(message.tree()) == (int(text, 2), len(text))
    assert [each.path for each in rows(text, medium="radio", strict=False)][-2:] == [
        ("padding",),
        ("surplus",),
    ]


def test_a_message_shorter_than_it_says() -> None:
    text = general(TEMPORARY, length=20)
    with pytest.raises(Truncated):
        decode(text, medium="radio")
    message = decode(text, medium="radio", strict=False)
    assert message.header["L_MESSAGE"] == 20
    assert message.packets == [REVOKED]
    assert encode_bits(message.tree()) == (int(text, 2), len(text))


@pytest.mark.parametrize("length", [0, 2, 3, 9])
def test_a_message_that_ends_within_its_fixed_part(length: int) -> None:
    text = general(TEMPORARY, length=length)
    with pytest.raises(LengthMismatch) as caught:
        decode(text, medium="radio")
    assert caught.value.path == ("header", "L_MESSAGE")
    message = decode(text, medium="radio", strict=False)
    assert message.header == {"NID_MESSAGE": 24, "L_MESSAGE": length}
    assert encode_bits(message.tree()) == (int(text, 2), len(text))


def test_eight_bits_behind_the_last_packet_are_no_padding() -> None:
    text = general(TEMPORARY, padding="0" * 14)
    with pytest.raises(LengthMismatch, match="14 bits of padding") as caught:
        decode(text)
    assert caught.value.path == ("padding",)
    message = decode(text, strict=False)
    assert message.padding == {"bits": 14, "hex": "0000"}
    assert encode_bits(message.tree()) == (int(text, 2), len(text))


def test_padding_may_have_any_value() -> None:
    # Its value is not specified; it is kept as it came.
    message = decode(general(TEMPORARY, padding="101011"))
    assert message.padding == {"bits": 6, "hex": "AC"}
    assert not message.problems


def test_position_report_is_packet_0_to_the_trackside() -> None:
    fields = [(1, 2), (9, 24), (100, 15), (1, 2), (1, 2), (5, 15), (5, 15), (0, 2), (24, 7)]
    body = "".join(field(*each) for each in [*fields, (1, 2), (0, 4), (3, 3)])
    text = radio(136, field(5, 32) + field(9, 24) + packet_back(0, body))
    message = decode(text)
    assert message.packets[0]["NID_PACKET"] == 0
    assert message.packets[0]["V_TRAIN"] == 24
    assert message.packets[0]["M_LEVEL"] == 3
    assert "L_TRAININT" not in message.packets[0]
    assert "NID_NTC" not in message.packets[0]


@pytest.mark.parametrize("size", [210, 830, 58, 59, 1000])
def test_a_telegram_may_have_any_length(size: int) -> None:
    text = balise(END, "1" * (size - 58))
    message = decode(text)
    assert message.size == size
    assert not message.problems
    assert encode_bits(message.tree()) == (int(text, 2), size)
