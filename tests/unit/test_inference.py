"""Which system version a radio message is of where nothing says so, and which issue lays it out.

Layouts: SUBSET-026 issue 2.3.0, 3.3.0, 3.6.0 and 4.0.0, chapters 7 and 8; issue 3.6.0, 6.5.1.5 and
6.5.1.6 for versions with X = 1. All bits are put together by hand. That the usual version is tried
first, then those that fit, is the library's own contract.
"""

from __future__ import annotations

from typing import Any

import pytest

import fishplate
from unit.wire import (
    END,
    TEMPORARY,
    balise,
    decode,
    field,
    general,
    loop,
    packet,
    packet_back,
    position,
    radio,
    report,
    rows,
)

UP = field(5, 32) + field(9, 24)
"""T_TRAIN and NID_ENGINE, behind the start of every message to the trackside (8.4.4.4)."""

# Message 132 of X = 1: Q_TRACKDEL 1 bit (6.5.1.6.3), where X = 2 has Q_MARQSTREASON 5 (8.6.3).
REQUEST = radio(132, UP + "1" + position())
# Packet 11 of X = 1 (6.5.1.5.25.2): NID_OPERATIONAL 32, NC_TRAIN 15, L_TRAIN 12, V_MAXTRAIN 7,
# M_LOADINGGAUGE 8, M_AXLELOAD 7, M_AIRTIGHT 2, N_ITER 5 with M_TRACTION 8, N_ITER 5.
TRAIN = [(0x9050FFFF, 32), (8, 15), (400, 12), (32, 7), (0, 8), (40, 7), (0, 2), (1, 5), (11, 8)]
TRAIN_DATA = radio(
    129, UP + position() + packet_back(11, "".join(field(*each) for each in TRAIN) + field(0, 5))
)
# Packet 3 to the trackside (telephone numbers) is gone from issue 3.6.0; it stands in X = 1
# (6.5.1.5.25.1) and in issue 3.3.0 (7.4.3.3): N_ITER 5, NID_RADIO 64.
ESTABLISHED = radio(
    159, UP + packet_back(3, field(1, 5) + field(0x90509051 << 32 | 0xFFFFFFFF, 64))
)
# Packet 239 (6.5.1.5.25): Q_SCALE 2, D_TRACTION 15, M_VOLTAGE 4; only 1.1 may use it (6.5.1.7.4).
TRACTION = general(packet(239, field(1, 2) + field(800, 15) + field(0, 4)))
# Packet 45 of issue 4.0.0 with Q_NETWORKTYPE 1 and NID_MN.
NETWORK = general(packet(45, field(1, 2) + field(0x90190F, 24)))
# Packet 32 of issue 4.0.0 (7.4.2.7.2): Q_RBC 1, NID_C 10, NID_RBC 14, Q_SLEEPSESSION 1.
SESSION = general(packet(32, "1" + field(905, 10) + field(90, 14) + "0"))

FITTING: dict[str, tuple[str, tuple[str, ...]]] = {
    "132 of X = 1": (REQUEST, ("1.0", "1.1")),
    "packet 11 of X = 1": (TRAIN_DATA, ("1.0", "1.1")),
    "telephone numbers": (ESTABLISHED, ("2.0", "1.0", "1.1")),
    "a packet of 1.1": (TRACTION, ("1.1",)),
    "FRMCS session": (SESSION, ("3.0", "2.2", "2.3")),
    "position with 5 bits of M_MODE": (report(position(mode_bits=5)), ("3.0", "2.2", "2.3")),
}


@pytest.mark.parametrize("name", FITTING)
def test_the_layouts_that_fit_say_the_version(name: str) -> None:
    text, fitting = FITTING[name]
    message = decode(text)
    assert message.version == fitting[0]
    assert message.version_from == "inferred"
    assert message.fitting == fitting
    assert not message.problems
    assert message.issue == fishplate.registry(fitting[0]).issue
    assert decode(text, medium="radio").tree() == message.tree()
    assert decode(text, medium="radio", direction=message.direction).tree() == message.tree()
    assert fishplate.encode(message).bin == fishplate.encode(message.tree()).bin == text


@pytest.mark.parametrize("name", FITTING)
def test_an_inferred_version_is_said_as_evidence(name: str) -> None:
    text, fitting = FITTING[name]
    message = decode(text)
    (said,) = (each for each in message.evidence if each["path"] == ["version"])
    assert said["kind"] == "inferred"
    note = f"nothing says the version: the layouts of {fitting[0]} fit"
    others = ", ".join(fitting[1:])
    assert said["message"] == note + (f"; {others} would fit as well" if others else "")
    assert said in message.tree()["evidence"]


def test_what_is_read_with_inferred_layouts() -> None:
    message = decode(REQUEST)
    assert message.header == {
        "NID_MESSAGE": 132,
        "L_MESSAGE": 24,
        "T_TRAIN": 5,
        "NID_ENGINE": 9,
        "Q_TRACKDEL": 1,
    }
    assert [each["L_PACKET"] for each in message.packets] == [114]
    assert decode(TRAIN_DATA).packets[1] == {
        "NID_PACKET": 11,
        "L_PACKET": 122,
        "NID_OPERATIONAL": "9050",
        "NC_TRAIN": 8,
        "L_TRAIN": 400,
        "V_MAXTRAIN": 32,
        "M_LOADINGGAUGE": 0,
        "M_AXLELOAD": 40,
        "M_AIRTIGHT": 0,
        "tractions": [{"M_TRACTION": 11}],
        "national_systems": [],
    }
    assert decode(NETWORK).packets[0] == {
        "NID_PACKET": 45,
        "Q_DIR": 1,
        "L_PACKET": 49,
        "Q_NETWORKTYPE": 1,
        "NID_MN": "90190",
    }
    (row,) = (each for each in rows(REQUEST) if each.variable == "Q_TRACKDEL")
    assert (row.offset, row.width, row.meaning) == (74, 1, "track description deleted")


def test_the_usual_version_wins_where_it_fits() -> None:
    """Message 24 with packet 66 is the same in every issue."""
    message = decode(general(TEMPORARY))
    assert (message.version, message.version_from) == ("2.1", "assumed")
    assert message.fitting == ()
    assert "evidence" not in message.tree()


# No version lays these out: a message number of none, a packet of none, one that is cut.
NOWHERE = {
    "message of no version": radio(201, "0" * 64),
    "packet of no version": general(packet(250, "1010")),
    "packet too long for all": general(packet(66, field(9, 8) + "111")),
    "shorter than it says": REQUEST[:-8],
    "longer than it says": REQUEST + "0" * 8,
}


@pytest.mark.parametrize("name", NOWHERE)
def test_what_fits_nowhere_is_read_as_the_usual_version(name: str) -> None:
    text = NOWHERE[name]
    with pytest.raises(fishplate.DecodeError):
        decode(text, medium="radio")
    message = decode(text, medium="radio", strict=False)
    assert (message.version, message.version_from) == ("2.1", "assumed")
    assert message.fitting == ()
    assert message.problems
    assert fishplate.encode(message).bin == text


def test_a_version_that_is_said_is_not_inferred() -> None:
    with pytest.raises(fishplate.DecodeError):
        decode(SESSION, version="2.1")
    message = decode(SESSION, version="2.1", strict=False)
    assert (message.version, message.version_from) == ("2.1", "caller")
    assert [each.kind for each in message.problems] == ["unknown-packet"]
    message = decode(REQUEST, version="1.1")
    assert (message.version, message.version_from, message.fitting) == ("1.1", "caller", ())
    assert "evidence" not in message.tree()


def test_telegrams_say_their_version() -> None:
    text = balise(packet(32, "1" + field(905, 10) + field(90, 14) + "0"), END)
    message = decode(text, strict=False)
    assert (message.version, message.version_from) == ("2.1", "frame")
    assert [each.kind for each in message.problems] == ["unknown-packet"]


# --- the layouts of an issue that is asked for --------------------------------------------------

# Packet 70: Q_SUITABILITY 0 brings M_LOADINGGAUGE 8 in issue 2.3.0 (7.4.2.21), nothing in X = 1 as
# issue 3.6.0 has it (6.5.1.5.14); N_ITER 5.
GAUGE = packet(70, field(1, 2) + "0" + field(700, 15) + field(0, 2) + field(3, 8) + field(0, 5))
# Packet 76 stands in issue 2.3.0 (7.4.2.24), not among those of X = 1 today (6.5.1.5.2): as 74 in
# issue 4.0.0, NID_STM where the level is 1 (here at the start), Q_TEXTCONFIRM 2, Q_TEXT 8.
SHOWN = [(1, 2), (0, 2), (1, 1), (30, 15), (15, 4), (1, 3), (7, 8), (500, 15), (60, 10), (15, 4)]
FIXED = packet(76, "".join(field(*each) for each in [*SHOWN, (5, 3), (0, 2), (1, 8)]))
# Packet 200 (6.5.1.5.21): NID_VBCMK 6; no such number in issue 2.3.0.
COVER = packet(200, field(9, 6))


def given_to(text: str, **given: Any) -> dict[str, Any]:
    """How to have the same packets read from a telegram and from a message."""
    return given if text[0] == "1" else given | {"version": "1.0"}


@pytest.mark.parametrize(
    "text",
    [
        balise(GAUGE, FIXED, END, version=16),
        loop(GAUGE, FIXED, END, version=16),
        general(GAUGE, FIXED),
    ],
    ids=["balise", "loop", "radio"],
)
def test_an_issue_that_is_asked_for(text: str) -> None:
    given = given_to(text, issue="2.3.0")
    message = decode(text, **given)
    assert (message.version, message.issue) == ("1.0", "2.3.0")
    gauge, fixed = message.packets[:2]
    assert gauge["suitabilities"] == [
        {"D_SUITABILITY": 700, "Q_SUITABILITY": 0, "M_LOADINGGAUGE": 3}
    ]
    assert fixed["start"]["NID_STM"] == 7
    assert fixed["Q_TEXT"] == 1
    assert message.tree()["issue"] == "2.3.0"
    assert fishplate.encode(message).bin == fishplate.encode(message.tree()).bin == text
    names = {each.variable for each in rows(text, **given)}
    assert {"M_LOADINGGAUGE", "NID_STM", "Q_TEXT"} <= names
    today = decode(text, **given_to(text), strict=False)
    assert today.issue == "3.6.0"
    assert [each.kind for each in today.problems] == ["length-mismatch", "unknown-packet"]
    assert fishplate.encode(today).bin == text


def test_what_the_older_issue_does_not_know() -> None:
    text = balise(COVER, END, version=16)
    assert decode(text).packets[0]["NID_VBCMK"] == 9
    message = decode(text, issue="2.3.0", strict=False)
    assert [each.kind for each in message.problems] == ["unknown-packet"]
    assert fishplate.encode(message).bin == text


def test_an_issue_counts_for_the_versions_it_prints() -> None:
    for code, issue in ((17, "3.6.0"), (32, "3.3.0"), (33, "3.6.0"), (48, "4.0.0")):
        assert decode(balise(TEMPORARY, END, version=code), issue="2.3.0").issue == issue
    assert decode(balise(TEMPORARY, END, version=16), issue="4.0.0").issue == "3.6.0"


def test_an_issue_narrows_what_a_message_may_be() -> None:
    """Message 24 with packet 66 is the same in every issue: the versions of this one fit."""
    assert decode(general(TEMPORARY), issue="2.3.0").version == "1.0"
    message = decode(general(TEMPORARY), issue="4.0.0")
    assert (message.version, message.issue) == ("3.0", "4.0.0")
    assert message.fitting == ("3.0", "2.2", "2.3")
    assert decode(general(TEMPORARY), issue="3.6.0").version == "2.1"


def test_an_issue_counts_for_an_inferred_version_too() -> None:
    message = decode(REQUEST, issue="2.3.0")
    assert (message.version, message.version_from) == ("1.0", "inferred")
    assert message.issue == "2.3.0"


def test_only_the_older_issue_fits_and_is_asked_for() -> None:
    """With packet 76 among its packets no version fits but 1.0 as issue 2.3.0 printed it."""
    message = decode(general(GAUGE), version="1.0", issue="2.3.0")
    assert not message.problems
    message = decode(general(GAUGE), issue="2.3.0")
    assert (message.version, message.issue) == ("1.0", "2.3.0")


# --- what rests on less than a published layout -------------------------------------------------


def said(message: fishplate.Message) -> dict[tuple[Any, ...], str]:
    return {tuple(each["path"]): each["kind"] for each in message.evidence}


def test_evidence_of_a_whole_version() -> None:
    message = decode(balise(TEMPORARY, END, version=48))
    assert said(message) == {(): "weaker"}
    assert "text conversion" in message.evidence[0]["message"]
    message = decode(balise(TEMPORARY, END, version=34))
    assert said(message) == {(): "inferred"}
    assert "chapter 6 of 4.0.0 was not read" in message.evidence[0]["message"]


def test_evidence_of_a_packet_a_message_and_a_variable() -> None:
    session = packet(32, "1" + field(905, 10) + field(90, 14) + "0")
    message = decode(balise(TEMPORARY, session, END, version=35))
    assert said(message) == {(): "inferred", ("packets", 1): "inferred"}
    # Message 38 (8.7.16): T_TRAIN, M_ACK, NID_LRBG.
    established = radio(38, field(5, 32) + "0" + field(9050, 24))
    message = decode(established, version="3.0")
    assert said(message) == {(): "weaker", ("header",): "inferred"}
    # Packet 6 (7.4.2.1.2): Q_VBCO, NID_VBCMK, NID_C, T_VBC, whose unit is printed otherwise.
    order = packet(6, "1" + field(9, 6) + field(905, 10) + field(2, 8))
    message = decode(balise(order, END, version=48))
    assert said(message) == {(): "weaker", ("packets", 0, "T_VBC"): "weaker"}


def test_evidence_of_a_variable_of_packet_3() -> None:
    """Packet 3 of X = 1 (6.5.1.5.4) takes 23 + 153 bits without a country; as in issue 2.3.0."""
    text = balise(packet(3, "0" * 153), END, version=16)
    assert said(decode(text)) == {("packets", 0, "Q_NVSRBKTRG"): "weaker"}
    assert said(decode(text, issue="2.3.0")) == {}


def test_versions_whose_layouts_were_read_have_no_evidence() -> None:
    for code in (16, 17, 32, 33):
        message = decode(balise(TEMPORARY, END, version=code))
        assert message.evidence == []
        assert "evidence" not in message.tree()


def test_what_cannot_be_read_has_no_evidence() -> None:
    assert decode("1" * 17, strict=False).evidence == []
    assert decode(balise(TEMPORARY, END, version=64), strict=False).evidence == []


def test_evidence_in_a_tree_changes_no_bit() -> None:
    text = balise(TEMPORARY, END, version=48)
    tree = decode(text).tree()
    for evidence in ([], [{"path": [], "kind": "memory", "message": "other"}]):
        assert fishplate.encode({**tree, "evidence": evidence}).bin == text
    del tree["evidence"]
    assert fishplate.encode(tree).bin == text
