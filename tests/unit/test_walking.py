"""Strict and lenient reading, and the rows of a walk.

Layouts: SUBSET-026 issue 3.6.0, 7.4.2 and 8.4.2, the bits written by hand in ``wire.py``.
"""

from __future__ import annotations

from decimal import Decimal

import pytest

import fishplate
from fishplate.errors import LengthMismatch, Unknown
from unit.wire import (
    END,
    TEMPORARY,
    balise,
    decode,
    field,
    packet,
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


def test_lenient_reports_all_and_strict_the_first() -> None:
    text = balise(packet(201, "1"), packet(66, "0"), packet(66, field(9, 8) + "1"), END)
    message = decode(text, strict=False)
    kinds = [each.kind for each in message.problems]
    assert kinds == ["unknown-packet", "length-mismatch", "length-mismatch"]
    assert [each.path for each in message.problems] == [
        ("packets", 0),
        ("packets", 1, "L_PACKET"),
        ("packets", 2, "L_PACKET"),
    ]
    assert [each["bit"] for each in message.tree()["problems"]] == [50, 84, 108]
    assert message.tree()["problems"][0].keys() == {"path", "bit", "kind", "message"}
    with pytest.raises(Unknown) as caught:
        decode(text)
    assert caught.value.reason == message.problems[0].message


def test_a_strict_walk_yields_what_stands_before_the_trouble() -> None:
    text = balise(TEMPORARY, packet(66, "0010"), END)
    seen: list[fishplate.FieldRow] = []
    with pytest.raises(LengthMismatch):
        seen.extend(fishplate.walk("0b" + text))
    assert [each.path for each in seen[:10]] == [("header", name) for name in HEADER]
    assert [each.path for each in seen[10:14]] == [("packets", 0, name) for name in REVOKED]
    assert [each.path for each in seen[14:]] == [
        ("packets", 1, "NID_PACKET"),
        ("packets", 1, "Q_DIR"),
        ("packets", 1, "L_PACKET"),
    ]


def test_rows_carry_scale_and_meaning() -> None:
    body = field(2, 2) + field(40, 15) + "0" + field(6, 8) + field(1, 5)
    body += field(120, 15) + "1" + field(255, 8)
    walked = rows(balise(packet(21, body), END))
    found = {each.path[2:]: each for each in walked if each.path[0] == "packets"}
    first = found["gradients", 0, "D_GRADIENT"]
    assert (first.raw, first.scale, first.meaning) == (40, 2, "400 m")
    assert (first.offset, first.width) == (50 + 25, 15)
    assert found["gradients", "N_ITER"].raw == 1
    assert found["gradients", 1, "G_A"].meaning == "gradient description ends at this D_GRADIENT"
    assert found["Q_SCALE",].meaning == "10 m"


def test_rows_of_radio_numbers_are_integers() -> None:
    body = "1" + field(300, 10) + field(5, 14) + field(0x0049123456FFFFFF, 64) + "0"
    walked = rows(balise(packet(42, body), END))
    row = next(each for each in walked if each.variable == "NID_RADIO")
    assert (row.raw, row.width, row.meaning) == (0x0049123456FFFFFF, 64, "0049123456")


def test_rows_carry_physical_values() -> None:
    """Steps of 5 km/h (7.5.1.157), of 10 m by Q_SCALE 2 (7.5.1.129), 255 no gradient (7.5.1.37)."""
    data = fishplate.encode(
        {
            "header": {"NID_MESSAGE": 24, "T_TRAIN": 5, "M_ACK": 0, "NID_LRBG": 5},
            "packets": [
                {
                    "NID_PACKET": 65,
                    "Q_DIR": 1,
                    "Q_SCALE": 2,
                    "NID_TSR": 200,
                    "D_TSR": 120,
                    "L_TSR": 30,
                    "Q_FRONT": 0,
                    "V_TSR": 8,
                },
                {
                    "NID_PACKET": 21,
                    "Q_DIR": 1,
                    "Q_SCALE": 1,
                    "gradients": [{"D_GRADIENT": 0, "Q_GDIR": 1, "G_A": 255}],
                },
            ],
        }
    )
    found = {row.path[-1]: (row.value, row.unit) for row in fishplate.walk(data)}
    assert found["D_TSR"] == (Decimal(1200), "m")
    assert found["V_TSR"] == (Decimal(40), "km/h")
    assert found["T_TRAIN"] == (Decimal("0.05"), "s")
    assert found["G_A"] == (None, "")
    assert found["Q_FRONT"] == (None, "")
