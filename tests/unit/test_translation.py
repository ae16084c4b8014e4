"""What telegrams and messages become in another system version, and what is refused.

Source: SUBSET-026 issue 3.6.0, 6.6.3.2.3 (packets to the train) and 6.6.3.3.2 (messages to the
train), in ``fixtures/standard/x1_chapter6`` (translations.csv); what issue 3.3.0 says otherwise
stands in the notes there.
"""

from __future__ import annotations

import re
from typing import get_args

import pytest

import fishplate
from fishplate.errors import EncodeError
from fishplate.translation import translate
from fishplate.translation.actions import DOES
from fishplate.translation.routes import ROUTES
from fishplate.translation.vocabulary import Action
from unit.translated import (
    HEAD,
    Tree,
    general,
    kinds,
    only,
    packets_of,
    telegram,
    traction,
)


def test_a_covered_balise_is_marked_in_front() -> None:
    # SUBSET-026 3.6.0, 6.6.3.2.3: packet 200 becomes packet 0, which has neither Q_DIR nor
    # L_PACKET and comes first (7.4.2.0).
    repositioning = {"NID_PACKET": 16, **HEAD, "L_SECTION": 300}
    marker = {"NID_PACKET": 200, "Q_DIR": 2, "NID_VBCMK": 9}
    result = translate(telegram(17, repositioning, marker), "2.1")
    assert result.tree is not None
    assert result.tree["header"]["M_VERSION"] == 33
    cover = {"NID_PACKET": 0, "NID_VBCMK": 9}
    assert result.tree["packets"] == [cover, repositioning, {"NID_PACKET": 255}]
    assert not result.lossy
    back = translate(result.tree, "1.1").tree
    assert back is not None
    assert back["packets"] == [marker, repositioning, {"NID_PACKET": 255}]
    oldest = translate(result.tree, "1.0")
    assert oldest.tree is not None
    assert oldest.tree["header"]["M_VERSION"] == 16
    assert oldest.tree["packets"] == [repositioning, {"NID_PACKET": 255}]
    assert [(each.kind, each.path) for each in oldest.changes] == [("dropped", ("packets", 0))]


def test_a_cover_is_marked_by_balises_only() -> None:
    # SUBSET-026 3.6.0, 6.5.1.5.21: packet 200 is sent by balises.
    tree = general("1.1", {"NID_PACKET": 200, "Q_DIR": 2, "NID_VBCMK": 9})
    assert packets_of(tree, "2.1") == []


def test_a_telegram_that_grows_too_long_is_an_error() -> None:
    # 830 bits at most (SUBSET-036 4.3.1.2): header 50, end flag 8, a packet 80 of ten profiles
    # 25 + 5 + 10 * 54 (6.5.1.5.18), and a packet 44 of 32 bits and data that fills the rest. With
    # Q_MAMODE each profile takes a bit more.
    profile = {"D_MAMODE": 9, "M_MAMODE": 0, "V_MAMODE": 6, "L_MAMODE": 30, "L_ACKMAMODE": 5}
    full = {"NID_PACKET": 80, **HEAD, "profiles": [profile] * 10}
    rest = 830 - 50 - 8 - 570 - 32
    for room, fits in ((10, True), (9, False)):
        size = rest - room
        data = {"bits": size, "hex": "00" * ((size + 7) // 8)}
        other = {"NID_PACKET": 44, "Q_DIR": 1, "NID_XUSER": 9, "data": data}
        tree = telegram(16, full, other)
        if fits:
            assert translate(tree, "2.1").tree is not None
        else:
            with pytest.raises(EncodeError, match="takes 831 bits, the longest holds 830"):
                translate(tree, "2.1")


STOP = {
    "NID_MESSAGE": 15,
    "T_TRAIN": 7,
    "M_ACK": 1,
    "NID_LRBG": 905 << 14 | 9060,
    "NID_EM": 9,
    "Q_SCALE": 1,
    "Q_DIR": 1,
    "D_EMERGENCYSTOP": 400,
}
TRACK_AHEAD = {
    "NID_MESSAGE": 34,
    "T_TRAIN": 7,
    "M_ACK": 0,
    "NID_LRBG": 905 << 14 | 9060,
    "Q_SCALE": 1,
    "Q_DIR": 1,
    "D_TAFDISPLAY": 100,
    "L_TAFDISPLAY": 200,
}


@pytest.mark.parametrize("header", [STOP, TRACK_AHEAD], ids=["15", "34"])
def test_messages_get_a_reference_that_is_not_shifted(header: Tree) -> None:
    # SUBSET-026 3.6.0, 6.6.3.3.2: D_REF := 0.
    tree = {**general("1.0"), "header": header}
    result = translate(tree, "2.1")
    assert result.tree is not None
    assert result.tree["header"] == header | {"D_REF": 0}
    assert [(each.kind, each.clause, each.stated) for each in result.changes] == [
        ("inserted", "6.6.3.3.2", True)
    ]
    assert translate(result.tree, "1.0").tree == tree | {"issue": "3.6.0"}
    shifted = {**result.tree, "header": header | {"D_REF": -30}}
    refused = translate(shifted, "1.0")
    assert refused.tree is None
    assert [(each.kind, each.stated) for each in refused.changes] == [("rejected", False)]


def telegram_of(bits: int, filled: int) -> Tree:
    """A telegram of 1.0 that takes so many bits with its packet 80 of one profile, then ones."""
    profile = {"D_MAMODE": 9, "M_MAMODE": 0, "V_MAMODE": 6, "L_MAMODE": 30, "L_ACKMAMODE": 5}
    # Header 50, end flag 8, packet 80 (6.5.1.5.18) 30 + 54, packet 44 (6.5.1.5.9) 32 and data.
    size = bits - 50 - 8 - 84 - 32
    data = {"bits": size, "hex": "00" * ((size + 7) // 8)}
    packets = (
        {"NID_PACKET": 80, **HEAD, "profiles": [profile]},
        {"NID_PACKET": 44, "Q_DIR": 1, "NID_XUSER": 9, "data": data},
        {"NID_PACKET": 255},
    )
    rest = filled - bits
    ones = (1 << rest) - 1 << -rest % 8
    filler = {"bits": rest, "hex": f"{ones:0{(rest + 7) // 8 * 2}X}" if rest else ""}
    return telegram(16, *packets) | {"filler": filler}


@pytest.mark.parametrize(
    ("bits", "before", "after"),
    # 832 bits are 830 in whole bytes, 216 are 210.
    [
        (200, 210, 210),
        (209, 210, 210),
        (210, 210, 830),
        (200, 830, 830),
        (209, 216, 216),
        (210, 216, 830),
        (200, 832, 832),
    ],
)
def test_a_telegram_keeps_its_length_where_it_can(bits: int, before: int, after: int) -> None:
    # 210 or 830 bits (SUBSET-036 4.3.1.2). With Q_MAMODE the profile takes a bit more.
    tree = telegram_of(bits, before)
    assert len(fishplate.encode(tree)) == before
    result = translate(tree, "2.1")
    assert result.tree is not None
    sent = fishplate.encode(result.tree)
    assert len(sent) == after
    assert set(sent[bits + 1 :].bin) <= {"1"}
    longer = [each.message for each in result.changes if each.kind == "lengthened"]
    said = f"it takes {bits + 1} bits: the telegram of {before} bits becomes one of {after}"
    assert longer == ([said] if after > before else [])
    assert not result.lossy
    # The encoder chooses 210 by itself.
    assert ("filler" in result.tree) == (after == before != 210)


@pytest.mark.parametrize("number", [40, 41])
def test_reference_of_shunting_answers_is_unknown(number: int) -> None:
    # SUBSET-026 3.6.0, 6.6.3.3.2: NID_LRBG is unknown whatever was received; 3.3.0: unchanged.
    header = {"NID_MESSAGE": number, "T_TRAIN": 7, "M_ACK": 0, "NID_LRBG": 9060}
    tree = {**general("1.0"), "header": header}
    result = translate(tree, "2.1")
    assert result.tree is not None
    assert result.tree["header"]["NID_LRBG"] == 16777215
    assert result.lossy
    older = translate(tree, "2.0")
    assert older.tree is not None
    assert older.tree["header"]["NID_LRBG"] == 9060
    assert not older.changes


def test_message_38_is_not_in_2_1() -> None:
    # SUBSET-026 3.6.0 has no message 38, 3.3.0 has.
    header = {"NID_MESSAGE": 38, "T_TRAIN": 7, "M_ACK": 0, "NID_LRBG": 9060}
    result = translate({**general("2.0"), "header": header}, "2.1")
    assert result.tree is None
    assert result.lossy


def test_another_issue_of_version_1_0_is_refused() -> None:
    # Chapter 6 is about the value lists of X = 1 as it has them (6.5.1.5.26 to .35), not about
    # those of issue 2.3.0.
    tree = general("1.0", traction(39, M_TRACTION=3)) | {"issue": "2.3.0"}
    with pytest.raises(EncodeError, match=r"read it without issue 2\.3\.0") as caught:
        translate(tree, "2.1")
    assert caught.value.path == ("issue",)


def test_versions_of_the_same_x() -> None:
    # Versions that differ in Y only are compatible (SUBSET-026 3.17.3).
    packet = traction(239, M_VOLTAGE=0)
    assert packets_of(general("1.1", packet), "1.0") == []
    plain = traction(39, M_TRACTION=3)
    assert only(general("1.1", plain), "1.0") == plain
    assert only(general("1.0", plain), "1.1") == plain
    marker = {"NID_PACKET": 181, "Q_DIR": 1}
    assert packets_of(general("2.1", marker), "2.0") == []
    assert kinds(general("2.1", marker), "2.0") == [("dropped", ("packets", 0), True)]


def test_the_same_version_is_left_as_it_is() -> None:
    tree = general("2.1", traction(39, M_VOLTAGE=0)) | {"padding": {"bits": 1, "hex": "80"}}
    result = translate(tree, "2.1")
    assert result.tree == tree
    assert result.tree is not tree
    assert not result.changes


@pytest.mark.parametrize("version", ["2.2", "2.3", "3.0", "1.2", "4.0", "x"])
def test_versions_without_published_rules(version: str) -> None:
    with pytest.raises(EncodeError, match="no published rules") as caught:
        translate(general("2.1"), version)
    assert caught.value.expected == "one of 1.0, 1.1, 2.0, 2.1"


def test_from_a_version_without_published_rules() -> None:
    with pytest.raises(EncodeError, match=r"no published rules .* from version 3\.0"):
        translate(general("3.0"), "2.1")


def test_frames_that_could_not_be_read_are_errors() -> None:
    whole = fishplate.encode(general("1.0", traction(39, M_TRACTION=3))).hex
    cut = fishplate.decode(
        whole[:-4], medium="radio", direction="to-train", version="1.0", strict=False
    )
    with pytest.raises(EncodeError, match="could not be read"):
        translate(cut, "2.1")
    with pytest.raises(EncodeError, match="expected a message or a tree"):
        translate(["no tree"], "2.1")  # type: ignore[arg-type]  # what is tested


UNKNOWN = {"NID_PACKET": 77, "Q_DIR": 1, "content": {"bits": 9, "hex": "AB80"}}


@pytest.mark.parametrize(("source", "to"), [("1.0", "2.1"), ("2.1", "1.0"), ("2.0", "2.1")])
def test_packets_of_an_unknown_number_are_dropped(source: str, to: str) -> None:
    result = translate(general(source, UNKNOWN), to)
    assert result.tree is not None
    assert result.tree["packets"] == []
    (change,) = result.changes
    assert (change.kind, change.path) == ("dropped", ("packets", 0))
    assert (change.clause, change.stated, change.lossy) == ("6.6.3.1.1", False, True)
    assert "9 bits" in change.message


def test_packets_that_could_not_be_read_are_dropped_on_the_other_ways() -> None:
    longer = {**traction(39, M_VOLTAGE=0), "surplus": {"bits": 2, "hex": "C0"}}
    (change,) = translate(general("2.1", longer), "1.0").changes
    assert (change.kind, change.clause, change.stated) == ("dropped", "6.6.3.1.1", False)
    assert "2 bits" in change.message


def test_padding_of_more_than_a_byte_is_dropped() -> None:
    # Header of 75 bits; 5 complete the byte (8.4.4.5), 8 more are too many.
    tree = general("1.0") | {"padding": {"bits": 13, "hex": "0000"}}
    result = translate(tree, "2.1")
    assert [(each.kind, each.path) for each in result.changes] == [("dropped", ("padding",))]
    assert result.tree is not None
    assert "padding" not in result.tree


def test_meanings_are_taken_as_codes_are() -> None:
    packet = traction(39) | {"M_TRACTION": "AC 25 kV 50 Hz, France high speed"}
    packet["D_TRACTION"] = "500 m"
    wanted = traction(39, M_VOLTAGE=1, NID_CTRACTION=13)
    assert only(general("1.0", packet), "2.1") == wanted


# --- how the rules are said --------------------------------------------------------------------


def test_every_kind_of_action_is_done_and_used() -> None:
    books = [book for route in ROUTES.values() for book in (route.to_train, route.to_track)]
    used = {type(action) for book in books for rule in book.rules.values() for action in rule.does}
    assert set(get_args(Action)) == set(DOES) == used


def test_rules_name_variables_that_there_are() -> None:
    known = {
        each.lineage
        for version in ("1.1", "2.0", "2.1")
        for each in fishplate.registry(version).variables.values()
    }
    for route in ROUTES.values():
        for book in (route.to_train, route.to_track):
            for rule in book.rules.values():
                named = re.findall(r"'([A-Z]\w*_\w+)'", repr(rule.does))
                assert set(named) <= known


def test_a_change_is_plain_data() -> None:
    (change, *_) = translate(general("1.0", traction(39, M_TRACTION=3)), "2.1").changes
    assert change.tree() == {
        "path": ["packets", 0, "M_TRACTION"],
        "kind": "mapped",
        "message": "M_TRACTION 3 (AC 25 kV 50 Hz, France high speed) becomes "
        "M_VOLTAGE 1 (AC 25 kV 50 Hz) and NID_CTRACTION 13",
        "clause": "6.6.3.2.3",
        "stated": True,
        "lossy": False,
    }
