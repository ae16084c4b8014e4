"""The check that stands before translation to the train, from X = 1 to X = 2.

Source: SUBSET-026 issue 3.6.0, 6.6.3.1.1 (consistency is checked on the X = 1 form first) and
3.16.1.1.1 (one spare code makes a message unusable). Spare codes: 6.5.1.5.26 to 6.5.1.5.35 in
``fixtures/standard/x1_chapter6`` (codes.csv), for what they do not name 7.5.1.
"""

from __future__ import annotations

import pytest

from fishplate.translation import translate
from unit.translated import (
    HEAD,
    Tree,
    conditions,
    general,
    loads,
    packets_of,
    positions,
    profiles,
    speeds,
    suitabilities,
    text,
    traction,
)

DEFAULT = {"NID_PACKET": 254, "Q_DIR": 1}

SPARE = {
    "27": (speeds({"NC_DIFF": 14, "V_DIFF": 30}), ("steps", 0, "categories", 0, "NC_DIFF"), 14),
    "27 speed": (
        speeds({"NC_DIFF": 3, "V_DIFF": 121}),
        ("steps", 0, "categories", 0, "V_DIFF"),
        121,
    ),
    "51": (
        loads({"M_AXLELOAD": 81, "V_AXLELOAD": 9}),
        ("areas", 0, "categories", 0, "M_AXLELOAD"),
        81,
    ),
    "51 last": (
        loads({"M_AXLELOAD": 127, "V_AXLELOAD": 9}),
        ("areas", 0, "categories", 0, "M_AXLELOAD"),
        127,
    ),
    "80": (profiles({"M_MAMODE": 2}), ("profiles", 0, "M_MAMODE"), 2),
    "68": (conditions(68, "M_TRACKCOND", 4, 10), ("conditions", 1, "M_TRACKCOND"), 10),
    "206": (conditions(206, "M_TRACKCONDBC", 11), ("conditions", 0, "M_TRACKCONDBC"), 11),
    "72": (text(Q_TEXTCONFIRM=3), ("Q_TEXTCONFIRM",), 3),
    "70": (suitabilities({"Q_SUITABILITY": 3}), ("suitabilities", 0, "Q_SUITABILITY"), 3),
    "207 no gauge": (
        {**suitabilities({"Q_SUITABILITY": 0, "M_LINEGAUGE": 0}), "NID_PACKET": 207},
        ("suitabilities", 0, "M_LINEGAUGE"),
        0,
    ),
    "207 spare bit": (
        {**suitabilities({"Q_SUITABILITY": 0, "M_LINEGAUGE": 17}), "NID_PACKET": 207},
        ("suitabilities", 0, "M_LINEGAUGE"),
        17,
    ),
    "239": (traction(239, M_VOLTAGE=6, NID_CTRACTION=1), ("M_VOLTAGE",), 6),
    "scale": (traction(39, M_TRACTION=3) | {"Q_SCALE": 3}, ("Q_SCALE",), 3),
    "direction": (DEFAULT | {"Q_DIR": 3}, ("Q_DIR",), 3),
    "2": ({"NID_PACKET": 2, "Q_DIR": 1, "M_VERSION": 18}, ("M_VERSION",), 18),
    "140": (
        {"NID_PACKET": 140, "Q_DIR": 1, "NID_OPERATIONAL": "90A2"},
        ("NID_OPERATIONAL",),
        "90A2",
    ),
}


@pytest.mark.parametrize("to", ["2.0", "2.1"])
@pytest.mark.parametrize(("packet", "place", "code"), SPARE.values(), ids=SPARE)
def test_one_spare_code_rejects_the_message(
    packet: Tree, place: tuple[str, ...], code: int | str, to: str
) -> None:
    result = translate(general("1.1", DEFAULT, packet, DEFAULT | {"Q_DIR": 3}), to)
    assert result.tree is None
    (change,) = result.changes
    assert change.kind == "rejected"
    assert change.path == ("packets", 1, *place)
    assert (change.clause, change.stated, change.lossy) == ("6.6.3.1.1", True, True)
    assert f"{place[-1]} {code}" in change.message


def test_a_spare_code_of_the_header_comes_first() -> None:
    header = {
        "NID_MESSAGE": 15,
        "T_TRAIN": 7,
        "M_ACK": 1,
        "NID_LRBG": 9060,
        "NID_EM": 9,
        "Q_SCALE": 1,
        "Q_DIR": 3,
        "D_EMERGENCYSTOP": 400,
    }
    result = translate({**general("1.0"), "header": header}, "2.1")
    assert result.tree is None
    (change,) = result.changes
    assert change.path == ("header", "Q_DIR")
    assert change.message == "the whole message is rejected: Q_DIR 3 (spare) makes it unusable"


@pytest.mark.parametrize(
    "broken",
    [
        {**traction(39, M_TRACTION=3), "surplus": {"bits": 2, "hex": "C0"}},
        {"NID_PACKET": 39, "Q_DIR": 1, "content": {"bits": 9, "hex": "AB80"}},
    ],
    ids=["too long", "too short"],
)
def test_a_packet_that_does_not_fit_its_layout_rejects_the_message(broken: Tree) -> None:
    result = translate(general("1.0", DEFAULT, broken), "2.1")
    assert result.tree is None
    (change,) = result.changes
    assert (change.kind, change.path) == ("rejected", ("packets", 1))
    assert (change.clause, change.stated, change.lossy) == ("6.6.3.1.1", True, True)


USED = {
    "special": speeds({"NC_DIFF": 13, "V_DIFF": 120}),
    "profile ends": {**speeds(), "steps": [speeds()["steps"][0] | {"V_STATIC": 127}]},
    "above 40 t": loads({"M_AXLELOAD": 126, "V_AXLELOAD": 9}),
    "digits F": {"NID_PACKET": 140, "Q_DIR": 1, "NID_OPERATIONAL": "F9F092"},
    "no number": {"NID_PACKET": 140, "Q_DIR": 1, "NID_OPERATIONAL": ""},
    "position ends": positions(1048575),
    "far away": {"NID_PACKET": 67, **HEAD, "areas": [{"D_TRACKCOND": 32767, "L_TRACKCOND": 1}]},
}


@pytest.mark.parametrize("packet", USED.values(), ids=USED)
def test_codes_at_the_edge_are_not_spare(packet: Tree) -> None:
    assert len(packets_of(general("1.0", packet), "2.1")) == 1


def test_the_other_ways_are_not_checked() -> None:
    # 6.6.3.1.1 speaks of data that the train receives with X = 1.
    assert packets_of(general("2.1", DEFAULT | {"Q_DIR": 3}), "1.0") == [DEFAULT | {"Q_DIR": 3}]
