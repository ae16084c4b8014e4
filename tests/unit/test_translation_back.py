"""What 1.0 cannot say of data to the train, and what is done about it.

Source: the reverse of SUBSET-026 issue 3.6.0, 6.6.3.2.3 (``fixtures/standard/x1_chapter6``,
translations.csv); what X = 1 may carry: 6.5.1.5.2, 6.5.1.6, 6.5.1.7.
"""

from __future__ import annotations

import pytest

import fishplate
from fishplate.translation import translate
from fishplate.translation.routes import NEEDS_1_1
from unit.translated import (
    HEAD,
    Tree,
    conditions,
    general,
    kinds,
    loads,
    packets_of,
    positions,
    profiles,
    speeds,
    suitabilities,
    telegram,
    text,
    traction,
)

NO_COUNTERPART = {
    "39 another country": (traction(39, M_VOLTAGE=1, NID_CTRACTION=905), None),
    "39 another voltage": (traction(39, M_VOLTAGE=5, NID_CTRACTION=1), None),
    "70 gauge": (suitabilities({"Q_SUITABILITY": 0, "M_LINEGAUGE": 3}), None),
    "51 later initial state": (
        {"NID_PACKET": 51, **HEAD, "Q_TRACKINIT": 1, "D_TRACKINIT": 10},
        None,
    ),
    # Sound horn goes; the radio hole behind it stays 200 m behind the air tightness.
    "68": (
        conditions(68, "M_TRACKCOND", 5, 2, 4),
        {
            **conditions(68, "M_TRACKCOND", 5, 4),
            "conditions": [
                {"D_TRACKCOND": 100, "L_TRACKCOND": 50, "M_TRACKCOND": 5},
                {"D_TRACKCOND": 200, "L_TRACKCOND": 50, "M_TRACKCOND": 4},
            ],
        },
    ),
    "68 nothing remains": (conditions(68, "M_TRACKCOND", 1, 2, 10), None),
    "80 limited supervision": (
        profiles({"M_MAMODE": 2, "Q_MAMODE": 1}, {"M_MAMODE": 0, "Q_MAMODE": 1}),
        profiles({"M_MAMODE": 0, "D_MAMODE": 200}),
    ),
    "80 other supervision": (
        profiles({"M_MAMODE": 0, "Q_MAMODE": 0}),
        profiles({"M_MAMODE": 0}),
    ),
    "72 emergency brake": (
        text(Q_TEXTCONFIRM=3, Q_CONFTEXTDISPLAY=0, Q_TEXTREPORT=0),
        text(Q_TEXTCONFIRM=2),
    ),
    "72 report": (
        text(
            Q_TEXTCONFIRM=1,
            Q_CONFTEXTDISPLAY=1,
            Q_TEXTREPORT=1,
            NID_TEXTMESSAGE=90,
            NID_C=905,
            NID_RBC=9090,
        ),
        text(Q_TEXTCONFIRM=1),
    ),
    # 1050 km does not fit 20 bits of metres: position calculation ends.
    "79": (positions(1050000), positions(1048575)),
    "27 spare category": (
        speeds({"Q_DIFF": 1, "NC_DIFF": 3, "V_DIFF": 16}, {"Q_DIFF": 3, "V_DIFF": 9}),
        speeds(),
    ),
    "27 does not replace": (
        speeds({"Q_DIFF": 2, "NC_DIFF": 1, "V_DIFF": 16}),
        speeds({"NC_DIFF": 10, "V_DIFF": 16}),
    ),
    # 1 and 2 say the same category: the lower speed stays.
    "27 replacing and not": (
        speeds(
            {"Q_DIFF": 1, "NC_DIFF": 1, "V_DIFF": 18},
            {"Q_DIFF": 2, "NC_DIFF": 1, "V_DIFF": 16},
            {"Q_DIFF": 1, "NC_DIFF": 0, "V_DIFF": 20},
            {"Q_DIFF": 2, "NC_DIFF": 0, "V_DIFF": 22},
        ),
        speeds({"NC_DIFF": 10, "V_DIFF": 16}, {"NC_DIFF": 9, "V_DIFF": 20}),
    ),
    # Table 3d: C2, C3 and C4 are 20 t.
    "51 categories of one load": (
        loads(
            {"M_AXLELOADCAT": 4, "V_AXLELOAD": 16},
            {"M_AXLELOADCAT": 5, "V_AXLELOAD": 14},
            {"M_AXLELOADCAT": 6, "V_AXLELOAD": 15},
        ),
        loads({"M_AXLELOAD": 40, "V_AXLELOAD": 14}),
    ),
    # Table 3d: D3 is 22.5 t; the gauge before it goes.
    "70 axle load": (
        suitabilities(
            {"Q_SUITABILITY": 0, "M_LINEGAUGE": 3}, {"Q_SUITABILITY": 1, "M_AXLELOADCAT": 8}
        ),
        suitabilities({"Q_SUITABILITY": 1, "M_AXLELOAD": 45, "D_SUITABILITY": 200}),
    ),
    "51 heavier category": (
        loads({"M_AXLELOADCAT": 9, "V_AXLELOAD": 16}),
        loads({"M_AXLELOAD": 45, "V_AXLELOAD": 16}),
    ),
    "181": ({"NID_PACKET": 181, "Q_DIR": 1}, None),
    "2": ({"NID_PACKET": 2, "Q_DIR": 1, "M_VERSION": 33}, None),
}


@pytest.mark.parametrize(("packet", "wanted"), NO_COUNTERPART.values(), ids=NO_COUNTERPART)
def test_what_1_0_cannot_say(packet: Tree, wanted: Tree | None) -> None:
    # The reverse of 6.6.3.2.3; what X = 1 may carry: 6.5.1.5.2, 6.5.1.7.
    result = translate(general("2.1", packet), "1.0")
    assert result.tree is not None
    assert result.tree["packets"] == ([wanted] if wanted else [])
    assert result.lossy
    assert not any(each.stated for each in result.changes)


def test_a_text_bound_to_limited_supervision_is_left_out() -> None:
    packet = text(Q_TEXTCONFIRM=0)
    packet["end"] = {**packet["end"], "M_MODETEXTDISPLAY": 12}
    assert packets_of(general("2.1", packet), "1.0") == []


def test_packets_that_x_1_has_not_are_dropped() -> None:
    # SUBSET-026 3.6.0, 6.5.1.5.2.
    absent = {13, 40, 52, 64, 69, 76, 88, 143, 180, 181}
    ours, theirs = fishplate.registry("2.1").packets, fishplate.registry("1.1").packets
    missing = {number for way, number in ours if way == "to-train" and (way, number) not in theirs}
    assert missing - {0} == absent


def test_a_packet_that_the_message_does_not_carry_is_dropped() -> None:
    # Message 33 carries packet 49 in 2.1 (8.7.13), and not with X = 1 (6.5.1.6).
    header = {
        "NID_MESSAGE": 33,
        "T_TRAIN": 7,
        "M_ACK": 0,
        "NID_LRBG": 9060,
        "Q_SCALE": 1,
        "D_REF": 0,
    }
    authority = {
        "NID_PACKET": 15,
        **HEAD,
        "V_EMA": 0,
        "T_EMA": 1023,
        "sections": [],
        "L_ENDSECTION": 800,
        "Q_SECTIONTIMER": 0,
        "Q_ENDTIMER": 0,
        "Q_DANGERPOINT": 0,
        "Q_OVERLAP": 0,
    }
    groups = {"NID_PACKET": 49, "Q_DIR": 1, "groups": []}
    tree = {**general("2.1"), "header": header, "packets": [authority, groups]}
    assert packets_of(tree, "1.0") == [authority]
    assert kinds(tree, "1.0") == [("dropped", ("packets", 1), True)]


def test_an_element_too_far_away_is_left_out() -> None:
    # D_SUITABILITY has 15 bits: 30000 + 5000 cannot be said.
    packet = suitabilities(
        {"Q_SUITABILITY": 2, "M_TRACTION": 1},
        {"Q_SUITABILITY": 1, "M_AXLELOAD": 45, "D_SUITABILITY": 30000},
        {"Q_SUITABILITY": 2, "M_TRACTION": 5, "D_SUITABILITY": 5000},
    )
    (found,) = packets_of(general("1.0", packet), "2.1")
    assert [each["D_SUITABILITY"] for each in found["suitabilities"]] == [100]
    places = [each.path for each in translate(general("1.0", packet), "2.1").changes]
    assert ("packets", 0, "suitabilities", 2) in places


def test_a_category_that_may_replace_more_is_said() -> None:
    # Q_DIFF 2 (7.5.1.102.1 of 3.6.0): the speed does not replace that of the cant deficiency.
    packet = speeds({"Q_DIFF": 2, "NC_DIFF": 1, "V_DIFF": 16})
    (change,) = translate(general("2.1", packet), "1.0").changes
    assert (change.kind, change.lossy, change.stated) == ("mapped", True, False)
    assert change.message.endswith("with X = 1 it may replace the speed for the cant deficiency")


NEWER = {
    2: {"NID_PACKET": 2, "Q_DIR": 1, "M_VERSION": 33},
    6: {"NID_PACKET": 6, "Q_DIR": 1, "Q_VBCO": 0, "NID_VBCMK": 1, "NID_C": 905},
    135: {"NID_PACKET": 135, "Q_DIR": 1},
    145: {"NID_PACKET": 145, "Q_DIR": 1},
    200: {"NID_PACKET": 200, "Q_DIR": 1, "NID_VBCMK": 1},
    239: traction(239, M_VOLTAGE=0),
}


@pytest.mark.parametrize("number", NEWER)
def test_packets_that_need_1_1(number: int) -> None:
    # 6.5.1.7.1 for balises, 6.5.1.7.4 for an RBC.
    found = translate(telegram(17, NEWER[number]), "1.0")
    assert [(each.kind, each.clause) for each in found.changes] == [("dropped", "6.5.1.7.1")]
    by_radio = translate(general("1.1", NEWER[number]), "1.0")
    clause = "6.5.1.7.4" if number == 239 else "6.5.1.7"
    assert [each.clause for each in by_radio.changes] == [clause]
    from_2_1 = translate(telegram(33, NEWER[number]), "1.0") if number < 200 else found
    assert [each.clause for each in from_2_1.changes] == ["6.5.1.7.1"]


def test_packets_that_need_1_1_are_those_of_the_clauses() -> None:
    # 6.5.1.7.1 to .4: nine of balises, three of loops and radio infill units, four of an RBC.
    listed = {
        "balise": {2, 6, 135, 145, 200, 203, 206, 207, 239},
        "loop": {206, 207, 239},
        "radio": {203, 206, 207, 239},
    }
    assert set(NEEDS_1_1) == {(medium, each) for medium, found in listed.items() for each in found}
    packets = fishplate.registry("1.1").packets
    assert {n for (_, n), packet in packets.items() if packet.since} == listed["balise"]
