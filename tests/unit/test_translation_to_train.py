"""What packets to the train become, worked by hand from the rules.

Source: SUBSET-026 issue 3.6.0, 6.6.3.2.3, in ``fixtures/standard/x1_chapter6`` (translations.csv,
translation_maps.csv); what issue 3.3.0 says otherwise stands in the notes there. Labels of codes:
7.5 and 6.5.1.5.
"""

from __future__ import annotations

import pytest

from fishplate.translation import translate
from unit.translated import (
    HEAD,
    Tree,
    conditions,
    general,
    kinds,
    loads,
    only,
    packets_of,
    positions,
    profiles,
    speeds,
    suitabilities,
    text,
    traction,
)

CASES = {
    # Table 3 ([3]): cant deficiency classes, and the three other categories.
    "27": (
        speeds({"NC_DIFF": 0, "V_DIFF": 30}, {"NC_DIFF": 13, "V_DIFF": 28}),
        speeds(
            {"Q_DIFF": 0, "NC_CDDIFF": 9, "V_DIFF": 30},
            {"Q_DIFF": 0, "NC_CDDIFF": 6, "V_DIFF": 28},
        ),
    ),
    "27 other categories": (
        speeds({"NC_DIFF": 9, "V_DIFF": 16}, {"NC_DIFF": 11, "V_DIFF": 28}),
        speeds(
            {"Q_DIFF": 1, "NC_DIFF": 0, "V_DIFF": 16}, {"Q_DIFF": 1, "NC_DIFF": 2, "V_DIFF": 28}
        ),
    ),
    "27 without categories": (speeds(), speeds()),
    # Table 13 ([13]).
    "39": (traction(39, M_TRACTION=3), traction(39, M_VOLTAGE=1, NID_CTRACTION=13)),
    "39 not fitted": (traction(39, M_TRACTION=0), traction(39, M_VOLTAGE=0)),
    "239": (
        traction(239, M_VOLTAGE=1, NID_CTRACTION=905),
        traction(39, M_VOLTAGE=1, NID_CTRACTION=905),
    ),
    # Table 5 ([5]): to 16 t A, to 17 t HS17, to 18 t B1, to 20 t C2, to 22.5 t D2, above E4.
    "51": (
        loads(*({"M_AXLELOAD": code, "V_AXLELOAD": 16} for code in (32, 33, 35, 37, 41, 46, 126))),
        loads(*({"M_AXLELOADCAT": code, "V_AXLELOAD": 16} for code in (0, 1, 2, 4, 7, 11, 11))),
    ),
    "51 initial state ([4])": (
        {"NID_PACKET": 51, **HEAD, "Q_TRACKINIT": 1},
        {"NID_PACKET": 51, **HEAD, "Q_TRACKINIT": 1, "D_TRACKINIT": 0},
    ),
    # [9]: non stopping areas on bridges and for other reasons.
    "68": (
        conditions(68, "M_TRACKCOND", 0, 1, 2, 4),
        conditions(68, "M_TRACKCOND", 0, 0, 0, 4),
    ),
    "206": (conditions(206, "M_TRACKCONDBC", 1, 10), conditions(68, "M_TRACKCOND", 1, 10)),
    # [12]: the second entry goes, the third stays where it was: 100 m + 100 m behind the first.
    "70": (
        suitabilities(
            {"Q_SUITABILITY": 2, "M_TRACTION": 1},
            {"Q_SUITABILITY": 1, "M_AXLELOAD": 45},
            {"Q_SUITABILITY": 2, "M_TRACTION": 5},
        ),
        {
            **suitabilities(
                {"Q_SUITABILITY": 2, "M_VOLTAGE": 3, "NID_CTRACTION": 10},
                {
                    "D_SUITABILITY": 200,
                    "Q_SUITABILITY": 2,
                    "M_VOLTAGE": 4,
                    "NID_CTRACTION": 14,
                },
            )
        },
    ),
    "70 initial state": (
        {"NID_PACKET": 70, **HEAD, "Q_TRACKINIT": 1, "D_TRACKINIT": 250},
        {"NID_PACKET": 70, **HEAD, "Q_TRACKINIT": 1, "D_TRACKINIT": 250},
    ),
    "207": (
        {
            **suitabilities({"Q_SUITABILITY": 0, "M_LINEGAUGE": 3}),
            "NID_PACKET": 207,
        },
        suitabilities({"Q_SUITABILITY": 0, "M_LINEGAUGE": 3}),
    ),
    # [6].
    "72": (text(Q_TEXTCONFIRM=1), text(Q_TEXTCONFIRM=1, Q_CONFTEXTDISPLAY=0, Q_TEXTREPORT=0)),
    "72 without confirmation": (text(Q_TEXTCONFIRM=0), text(Q_TEXTCONFIRM=0)),
    # [14]: 1048575, no more position calculation, is 16777215 in 24 bits.
    "79": (positions(1048575, 1048574), positions(16777215, 1048574)),
    # [7].
    "80": (profiles({"M_MAMODE": 1}), profiles({"M_MAMODE": 1, "Q_MAMODE": 1})),
    # [10]: digits F go to the right end, where a tree does not show them.
    "140": (
        {"NID_PACKET": 140, "Q_DIR": 1, "NID_OPERATIONAL": "F9F092"},
        {"NID_PACKET": 140, "Q_DIR": 1, "NID_OPERATIONAL": "9092"},
    ),
    "44 with its NID_NTC": (
        # The first octet behind NID_XUSER 102 is NID_NTC: bits unchanged, 17 and AB.
        {"NID_PACKET": 44, "Q_DIR": 1, "NID_XUSER": 102, "data": {"bits": 16, "hex": "11AB"}},
        {
            "NID_PACKET": 44,
            "Q_DIR": 1,
            "NID_XUSER": 102,
            "NID_NTC": 17,
            "data": {"bits": 8, "hex": "AB"},
        },
    ),
}
STATED = [pytest.param(*case, id=name) for name, case in CASES.items()]


@pytest.mark.parametrize(("packet", "wanted"), STATED)
def test_packets_to_the_train(packet: Tree, wanted: Tree) -> None:
    # SUBSET-026 3.6.0, 6.6.3.2.3; the bracketed exceptions are those of that clause.
    version = "1.1" if packet["NID_PACKET"] > 200 else "1.0"
    result = translate(general(version, packet), "2.1")
    assert result.tree == {
        **general("2.1", wanted),
        "issue": "3.6.0",
    }
    assert all(each.clause == "6.6.3.2.3" for each in result.changes)
    # That an element stays where it was when the one before it goes is our own reading.
    derived = [each.path[-1] for each in result.changes if not each.stated]
    assert derived == (["D_SUITABILITY"] if len(packet.get("suitabilities", ())) > 2 else [])


BACK = {
    "27": CASES["27"],
    "27 other categories": CASES["27 other categories"],
    "39": CASES["39"],
    "51 initial state": CASES["51 initial state ([4])"],
    "70 initial state": CASES["70 initial state"],
    "72": CASES["72"],
    "79": CASES["79"],
    "80": CASES["80"],
    "44": CASES["44 with its NID_NTC"],
    # Axle loads by the load of each category (table 3d): 16, 17, 18, 20, 22.5 and 25 t.
    "51": (
        loads(*({"M_AXLELOAD": code, "V_AXLELOAD": 16} for code in (32, 34, 36, 40, 45, 50))),
        loads(*({"M_AXLELOADCAT": code, "V_AXLELOAD": 16} for code in (0, 1, 2, 4, 7, 11))),
    ),
}


@pytest.mark.parametrize(("wanted", "packet"), BACK.values(), ids=BACK)
def test_packets_to_the_train_back_to_1_0(packet: Tree, wanted: Tree) -> None:
    # The reverse of SUBSET-026 3.6.0, 6.6.3.2.3: derived, and nothing of these is lost.
    result = translate(general("2.1", packet), "1.0")
    assert result.tree == {**general("1.0", wanted), "issue": "3.6.0"}
    assert not result.lossy
    assert not any(each.stated for each in result.changes)


@pytest.mark.parametrize(
    ("wanted", "packet"), [CASES["206"], CASES["207"], CASES["239"]], ids=["206", "207", "239"]
)
def test_packets_of_1_1_are_used_for_1_1_only(packet: Tree, wanted: Tree) -> None:
    # SUBSET-026 3.6.0, 6.5.1.7.1 to .4: packets 206, 207 and 239 need version 1.1.
    result = translate(general("2.1", packet), "1.1")
    assert result.tree == {**general("1.1", wanted), "issue": "3.6.0"}
    assert not result.lossy
    assert all(each["NID_PACKET"] < 200 for each in packets_of(general("2.1", packet), "1.0"))


@pytest.mark.parametrize(("old", "new"), [(68, 206), (70, 207), (39, 239)])
def test_the_older_packet_is_ignored_beside_the_newer_one(old: int, new: int) -> None:
    # SUBSET-026 3.6.0, 6.6.3.2.3: exceptions [8], [11] and [13].
    packets = {
        68: conditions(68, "M_TRACKCOND", 4),
        206: conditions(206, "M_TRACKCONDBC", 5),
        70: {"NID_PACKET": 70, **HEAD, "Q_TRACKINIT": 1, "D_TRACKINIT": 250},
        207: {"NID_PACKET": 207, **HEAD, "Q_TRACKINIT": 1, "D_TRACKINIT": 50},
        39: traction(39, M_TRACTION=3),
        239: traction(239, M_VOLTAGE=0),
    }
    tree = general("1.1", packets[old], packets[new])
    (found,) = packets_of(tree, "2.1")
    assert found["NID_PACKET"] == old
    assert kinds(tree, "2.1") == [
        ("rejected", ("packets", 0), True),
        ("renumbered", ("packets", 1), False),
    ]


REJECTED = {
    "39 out of table 13": traction(39, M_TRACTION=4),
    "70 without traction": suitabilities({"Q_SUITABILITY": 1, "M_AXLELOAD": 45}),
    "70 out of table 13": suitabilities({"Q_SUITABILITY": 2, "M_TRACTION": 4}),
}


@pytest.mark.parametrize("packet", REJECTED.values(), ids=REJECTED)
def test_packets_that_are_rejected(packet: Tree) -> None:
    # SUBSET-026 3.6.0, 6.6.3.2.3.
    result = translate(general("1.0", packet), "2.1")
    assert result.tree is not None
    assert result.tree["packets"] == []
    last = result.changes[-1]
    assert (last.kind, last.path, last.clause) == ("rejected", ("packets", 0), "6.6.3.2.3")
    assert result.lossy


def test_fixed_texts_are_rejected() -> None:
    # X = 1 is not to use packet 76 (6.5.1.5.2) and has no layout for it: rejected, 6.6.3.2.3.
    packet = {"NID_PACKET": 76, "Q_DIR": 1, "content": {"bits": 9, "hex": "AB80"}}
    result = translate(general("1.0", packet), "2.1")
    assert result.tree is not None
    assert result.tree["packets"] == []
    (change,) = result.changes
    assert (change.kind, change.path, change.stated) == ("rejected", ("packets", 0), True)


def test_names_of_older_issues_follow_their_lineage() -> None:
    # T_LOA and V_LOA of issue 3.3.0 are T_EMA and V_EMA of 3.6.0 (7.5.1.149, .155).
    older = {
        "NID_PACKET": 15,
        **HEAD,
        "V_LOA": 0,
        "T_LOA": 1023,
        "sections": [],
        "L_ENDSECTION": 800,
        "Q_SECTIONTIMER": 0,
        "Q_ENDTIMER": 0,
        "Q_DANGERPOINT": 0,
        "Q_OVERLAP": 0,
    }
    names = {"V_LOA": "V_EMA", "T_LOA": "T_EMA"}
    newer = {names.get(name, name): value for name, value in older.items()}
    assert only(general("2.0", older), "2.1") == newer
    assert only(general("2.1", newer), "2.0") == older
    assert only(general("2.1", newer), "1.0") == newer


def test_what_issue_3_3_0_says_otherwise() -> None:
    # SUBSET-026 3.3.0, 6.6.3.2.3: packet 58 is rejected with M_LOC 3, packet 140 unchanged.
    reports: Tree = {"NID_PACKET": 58, **HEAD, "T_CYCLOC": 255, "D_CYCLOC": 100, "M_LOC": 3}
    reports |= {"locations": []}
    number = {"NID_PACKET": 140, "Q_DIR": 1, "NID_OPERATIONAL": "F9F092"}
    tree = general("1.0", reports, number)
    assert packets_of(tree, "2.0") == [number]
    # For 3.6.0 it is a spare code like others (7.5.1.69), so the message is rejected.
    assert translate(tree, "2.1").tree is None
    assert packets_of(general("1.0", number), "2.1") == [number | {"NID_OPERATIONAL": "9092"}]
    fine = general("1.0", reports | {"M_LOC": 1})
    assert packets_of(fine, "2.0") == [reports | {"M_LOC": 1}]


@pytest.mark.parametrize(
    ("number", "other", "packet"),
    [
        (39, 239, traction(39, M_TRACTION=3)),
        (68, 206, conditions(68, "M_TRACKCOND", 4)),
        (70, 207, {"NID_PACKET": 70, **HEAD, "Q_TRACKINIT": 1, "D_TRACKINIT": 250}),
    ],
)
def test_what_1_1_had_is_no_more_told(number: int, other: int, packet: Tree) -> None:
    # 6.6.3.2.3 gives packets 206, 207 and 239 the numbers 68, 70 and 39: which it was is lost.
    older, newer = (translate(general(version, packet), "2.1") for version in ("1.0", "1.1"))
    assert older.tree == newer.tree
    assert not older.lossy
    assert f"packet {other}" in newer.changes[-1].message
    assert newer.changes[-1].lossy
    assert only(newer.tree or {}, "1.1")["NID_PACKET"] == other
    assert only(newer.tree or {}, "1.0")["NID_PACKET"] == number


def test_a_distance_that_grows_is_said() -> None:
    packet = conditions(68, "M_TRACKCOND", 5, 2, 4)
    changes = translate(general("2.1", packet | {"Q_SCALE": 2}), "1.0").changes
    # Steps of 10 m (7.5.1.129).
    (change,) = [each for each in changes if each.kind == "mapped"]
    assert change.path == ("packets", 0, "conditions", 2, "D_TRACKCOND")
    assert change.message == (
        "D_TRACKCOND 100 (1000 m) becomes D_TRACKCOND 200 (2000 m): it stays where it is"
    )
