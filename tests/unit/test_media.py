"""Which medium, which direction, which version: what the bits say and what they leave open.

Clauses: SUBSET-026 issue 3.6.0, 8.4.2 and 8.4.3 (headers), 8.4.4 (radio messages); issue 4.0.0,
7.5.1.79 (M_VERSION). That two witnesses are asked, and that nothing is guessed, is the library's
contract.
"""

from __future__ import annotations

import pytest

from fishplate.errors import Ambiguous, DecodeError, Unknown
from fishplate.frames import encode_bits
from unit.wire import (
    END,
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
LAST = {"NID_PACKET": 255}


@pytest.mark.parametrize(
    ("text", "medium", "direction"),
    [
        (balise(END), "balise", "to-train"),
        (balise(END, version=32), "balise", "to-train"),
        (balise(packet(200, "1010"), END, version=16), "balise", "to-train"),
        (loop(END), "loop", "to-train"),
        (balise(END, "0" * 152), "balise", "to-train"),
        (general(), "radio", "to-train"),
        (ack(), "radio", "to-track"),
        (radio(200, ""), "radio", "to-track"),
        (radio(100, ""), "radio", "to-train"),
    ],
)
def test_the_medium_is_told_by_two_witnesses(text: str, medium: str, direction: str) -> None:
    message = decode(text, strict=False)
    assert (message.medium, message.direction) == (medium, direction)


# Neither a telegram that reaches its end flag, nor a message as long as L_MESSAGE says.
AMBIGUOUS = {
    "nothing": "",
    "one bit": "1",
    "too short to tell": "1" * 17,
    "telegram cut short": balise(TEMPORARY, END)[:-1],
    "telegram without end flag": balise(TEMPORARY),
    "telegram whose packet overshoots": balise(packet(66, field(9, 8), length=400), END),
    "message cut short": general(TEMPORARY)[:-8],
    "message with a byte too many": general(TEMPORARY) + "0" * 8,
    "message of half a byte more": general(TEMPORARY) + "0000",
    "all zeros": "0" * 400,
    "reserved version without end flag": balise(TEMPORARY, version=49),
    "version that is not valid, without end flag": balise(TEMPORARY, version=36),
    "version of another X, cut short": balise(TEMPORARY, END, version=64)[:-1],
    "down link": "0" + balise(END)[1:],
}


@pytest.mark.parametrize("case", AMBIGUOUS)
def test_what_is_ambiguous(case: str) -> None:
    text = AMBIGUOUS[case]
    with pytest.raises(Ambiguous, match="give the medium"):
        decode(text)
    message = decode(text, strict=False)
    assert message.medium is None
    assert [each.kind for each in message.problems] == ["ambiguous"]
    assert message.header == {}
    assert message.packets == []
    assert message.content is not None
    assert message.content["bits"] == len(text)
    assert not message.complete
    assert encode_bits(message) == (int(text or "0", 2), len(text))
    assert encode_bits(message.tree()) == (int(text or "0", 2), len(text))
    walked = rows(text, strict=False)
    assert [each.path for each in walked] == ([("content",)] if text else [])


def test_an_end_flag_inside_a_packet_is_no_witness() -> None:
    text = balise(packet(44, field(3, 9) + END + END))
    with pytest.raises(Ambiguous):
        decode(text)


def test_the_medium_given_is_believed() -> None:
    text = general(TEMPORARY)
    assert decode(text, medium="radio").packets == [REVOKED]
    message = decode(text, medium="balise", strict=False)
    assert message.medium == "balise"
    assert message.header["M_VERSION"] == 0b0011000
    with pytest.raises(DecodeError):
        decode(text, medium="balise")
    assert decode(balise(END), medium="balise").packets == [LAST]


@pytest.mark.parametrize(
    "given", [{"medium": "satellite"}, {"medium": ""}, {"direction": "up"}, {"medium": "Radio"}]
)
def test_a_wrong_argument_is_the_callers_mistake(given: dict[str, str]) -> None:
    with pytest.raises(ValueError, match=r"medium is|direction is"):
        decode(balise(END), **given)


def test_the_direction_given_is_believed() -> None:
    text = ack()
    with pytest.raises(Unknown, match="message 146 is not known to-train"):
        decode(text, medium="radio", direction="to-train")


ISSUES = {
    (16, "1.0"): "3.6.0",
    (17, "1.1"): "3.6.0",
    (32, "2.0"): "3.3.0",
    (33, "2.1"): "3.6.0",
    (34, "2.2"): "4.0.0",
    (35, "2.3"): "4.0.0",
    (48, "3.0"): "4.0.0",
}


@pytest.mark.parametrize(("code", "version"), ISSUES)
def test_versions_whose_layouts_are_known(code: int, version: str) -> None:
    for text in (balise(TEMPORARY, END, version=code), loop(TEMPORARY, END, version=code)):
        message = decode(text)
        assert message.version == version
        assert message.version_from == "frame"
        assert message.issue == ISSUES[code, version]
        assert not message.problems
        assert message.packets == [REVOKED, LAST]


@pytest.mark.parametrize(("code", "version"), [(49, "3.1"), (63, "3.15")])
def test_a_newer_version_is_read_and_said(code: int, version: str) -> None:
    text = balise(TEMPORARY, END, version=code)
    for given in ({"medium": "balise"}, {}):
        with pytest.raises(Unknown, match=f"{version} is not known") as caught:
            decode(text, **given)
        assert caught.value.kind == "newer-version"
        message = decode(text, **given, strict=False)
        assert message.version == version
        assert message.issue == "4.0.0"
        assert message.packets == [REVOKED, LAST]
        assert message.problems[0].path == ("header", "M_VERSION")
        assert message.problems[0].bit == 1
        assert message.complete
        assert encode_bits(message) == encode_bits(message.tree()) == (int(text, 2), len(text))


def test_a_packet_without_length_does_not_hide_the_end_flag() -> None:
    """Packet 0, 14 bits, has no L_PACKET and comes first (7.4.2.1.0 of issue 4.0.0)."""
    text = balise(field(0, 8) + field(9, 6), TEMPORARY, END, version=49)
    message = decode(text, strict=False)
    assert (message.medium, message.version) == ("balise", "3.1")
    assert message.packets == [{"NID_PACKET": 0, "NID_VBCMK": 9}, REVOKED, LAST]
    assert encode_bits(message) == (int(text, 2), len(text))


NOT_LAID_OUT = {
    (18, "1.2"): "M_VERSION 18, 1.2, is declared not valid",
    (31, "1.15"): "M_VERSION 31, 1.15, is declared not valid",
    (36, "2.4"): "M_VERSION 36, 2.4, is declared not valid",
    (47, "2.15"): "M_VERSION 47, 2.15, is declared not valid",
    (0, "0.0"): "there are no layouts for system version 0.0",
    (15, "0.15"): "there are no layouts for system version 0.15",
    (64, "4.0"): "there are no layouts for system version 4.0",
    (127, "7.15"): "there are no layouts for system version 7.15",
}


@pytest.mark.parametrize(("code", "version"), NOT_LAID_OUT)
def test_a_version_without_layouts_is_kept(code: int, version: str) -> None:
    text = balise(TEMPORARY, END, "11", version=code)
    for given in ({"medium": "balise"}, {}):  # the end flag is the witness where nothing is given
        with pytest.raises(Unknown) as caught:
            decode(text, **given)
        assert caught.value.kind == "unknown-version"
        assert caught.value.path == ("header", "M_VERSION")
        assert caught.value.bit == 1
        assert caught.value.reason.startswith(NOT_LAID_OUT[code, version])
        message = decode(text, **given, strict=False)
        assert message.medium == "balise"
        assert message.version == version
        assert message.issue == ""
        assert message.header["NID_BG"] == 1207, "the header is the same in every version"
        assert message.packets == []
        assert message.content is not None
        assert message.content["bits"] == 31 + 8 + 2
        assert not message.complete
        assert encode_bits(message) == encode_bits(message.tree()) == (int(text, 2), len(text))


def test_all_ones_reach_an_end_flag() -> None:
    """A loop message of version 7.15 whose first packet is the end flag: said, and all kept."""
    text = "1" * 400
    message = decode(text, strict=False)
    assert (message.medium, message.version) == ("loop", "7.15")
    assert [each.kind for each in message.problems] == ["unknown-version"]
    assert encode_bits(message) == (int(text, 2), 400)


def test_the_version_given_counts_over_radio() -> None:
    assert decode(general(), version="2.0").version == "2.0"
    assert decode(general(), version="2.0").version_from == "caller"
    message = decode(general(TEMPORARY), version="1.0")
    assert message.packets == [REVOKED]
    assert (message.version, message.issue) == ("1.0", "3.6.0")
    message = decode(general(TEMPORARY), version="4.0", strict=False)
    assert [each.kind for each in message.problems] == ["unknown-version"]
    assert message.header == {"NID_MESSAGE": 24, "L_MESSAGE": 14}
    assert encode_bits(message.tree()) == (int(general(TEMPORARY), 2), 112)


# --- a first byte that a telegram of an undefined version and a radio message share ------------

# 146 is 1 and 1.2, 150 is 1 and 1.6 (not valid); 132 is 1 and 0.4, 136 is 1 and 0.8 (older): the
# messages of these numbers are those of SUBSET-026 issue 3.6.0, 8.6.
SHARED = {18: 146, 22: 150, 4: 132, 8: 136}


@pytest.mark.parametrize("code", SHARED)
def test_the_end_flag_alone_speaks_for_a_telegram(code: int) -> None:
    text = balise(TEMPORARY, END, version=code)
    assert int(text[:8], 2) == SHARED[code]
    assert int(text[8:18], 2) * 8 != len(text), "the first witness is silent"
    message = decode(text, strict=False)
    assert message.medium == "balise"
    assert [each.kind for each in message.problems] == ["unknown-version"]
    assert encode_bits(message) == (int(text, 2), len(text))


def test_the_length_alone_speaks_for_a_message() -> None:
    message = decode(ack())
    assert (message.medium, message.header["NID_MESSAGE"]) == ("radio", 146)
    # T_TRAIN, NID_ENGINE, T_TRAIN; then a packet that nobody knows to the trackside.
    text = ack(packet_back(99, "0" * 6))
    message = decode(text, strict=False)
    assert message.medium == "radio"
    assert [each.kind for each in message.problems] == ["unknown-packet"]


def both(*, clean: bool) -> str:
    """Write message 146 whose NID_ENGINE begins with 255, where a balise's first packet stands.

    Both witnesses speak: 18 + T_TRAIN 32 = 50 bits is the length of a balise's header.
    """
    engine = END + field(9, 16)
    padding = "0" * 6 if clean else "1" * 14
    text = radio(146, field(5, 32) + engine + field(4, 32), padding=padding)
    assert text[50:58] == END
    assert int(text[8:18], 2) * 8 == len(text)
    return text


def test_both_witnesses_and_a_message_that_reads_cleanly() -> None:
    message = decode(both(clean=True))
    assert (message.medium, message.header["NID_MESSAGE"]) == ("radio", 146)
    assert not message.problems


def test_both_witnesses_contradict_each_other() -> None:
    text = both(clean=False)
    with pytest.raises(Ambiguous, match="give the medium"):
        decode(text)
    message = decode(text, strict=False)
    assert message.medium is None
    assert encode_bits(message) == (int(text, 2), len(text))


@pytest.mark.parametrize("clean", [True, False])
@pytest.mark.parametrize("medium", ["radio", "balise"])
def test_the_medium_given_settles_it(medium: str, clean: bool) -> None:  # noqa: FBT001
    text = both(clean=clean)
    message = decode(text, medium=medium, strict=False)
    assert message.medium == medium
    kinds = {"radio": [] if clean else ["truncated"], "balise": ["unknown-version"]}[medium]
    assert [each.kind for each in message.problems] == kinds
    assert encode_bits(message) == encode_bits(message.tree()) == (int(text, 2), len(text))


def test_neither_witness_speaks() -> None:
    text = balise(TEMPORARY, version=18)
    with pytest.raises(Ambiguous):
        decode(text)


def test_both_witnesses_of_a_version_that_is_not_valid() -> None:
    """1.2 and message 146 begin with the same byte (7.5.1.79, 8.6.7): here both lengths agree.

    L_MESSAGE is 27 bytes, as long as the frame; the bits behind it are ones, so that packets seem
    to end at once. As message 146 those ones are packets of no known number.
    """
    text = field(146, 8) + field(27, 10) + "1" * (27 * 8 - 18)
    with pytest.raises(Ambiguous, match="as in a telegram, and L_MESSAGE says 216 bits"):
        decode(text)
    assert decode(text, medium="balise", strict=False).version == "1.2"
    assert decode(text, medium="radio", strict=False).header["NID_MESSAGE"] == 146


@pytest.mark.parametrize("version", ["0.1", "1.5", "2.7", "4.0"])
def test_a_version_without_layouts_is_said_before_the_number(version: str) -> None:
    """Message 131 stands in issue 4.0.0 only: which numbers a version has is not known here."""
    message = decode(radio(131, "0" * 8), medium="radio", version=version, strict=False)
    assert [each.kind for each in message.problems] == ["unknown-version"]
    assert f"system version {version}" in message.problems[0].message


def test_a_newer_version_that_the_caller_names_is_said() -> None:
    """3.1 differs from 3.0 in Y only (issue 4.0.0, 7.5.1.79)."""
    message = decode(balise(END, version=48), medium="balise", version="3.1", strict=False)
    assert (message.version, message.issue) == ("3.1", "4.0.0")
    assert [each.kind for each in message.problems] == ["newer-version"]
