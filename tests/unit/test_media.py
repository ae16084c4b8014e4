"""Which medium, which direction, which version: what the bits say and what they leave open.

Clauses: SUBSET-026 issue 3.6.0, 8.4.2 and 8.4.3 (headers), 8.4.4 (radio messages), 7.5.1.79
(M_VERSION). That two witnesses are asked, and that nothing is guessed, is the library's contract.
"""

from __future__ import annotations

import pytest

from fishplate.errors import Ambiguous, DecodeError, Unknown
from fishplate.frames import encode_bits
from unit.wire import END, TEMPORARY, ack, balise, decode, field, general, loop, packet, radio, rows

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
    "all ones": "1" * 400,
    "version code that is not defined": balise(END, version=34),
    "version code of another X": balise(END, version=48),
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


@pytest.mark.parametrize(("code", "version"), [(32, "2.0"), (33, "2.1")])
def test_versions_whose_layouts_are_known(code: int, version: str) -> None:
    message = decode(balise(TEMPORARY, END, version=code))
    assert message.version == version
    assert message.issue == "3.6.0"
    assert not message.problems
    assert message.packets == [REVOKED, LAST]


def test_a_newer_version_is_read_and_said() -> None:
    text = balise(TEMPORARY, END, version=34)
    with pytest.raises(Unknown, match=r"2\.2 is not known") as caught:
        decode(text, medium="balise")
    assert caught.value.kind == "newer-version"
    message = decode(text, medium="balise", strict=False)
    assert message.version == "2.2"
    assert message.packets == [REVOKED, LAST]
    assert message.problems[0].path == ("header", "M_VERSION")
    assert message.problems[0].bit == 1
    assert message.complete
    assert encode_bits(message) == (int(text, 2), len(text))


@pytest.mark.parametrize(("code", "version"), [(16, "1.0"), (17, "1.1"), (48, "3.0"), (0, "0.0")])
def test_a_version_without_layouts_is_kept(code: int, version: str) -> None:
    text = balise(TEMPORARY, END, "11", version=code)
    with pytest.raises(Unknown) as caught:
        decode(text, medium="balise")
    assert caught.value.kind == "unknown-version"
    assert caught.value.path == ("header", "M_VERSION")
    message = decode(text, medium="balise", strict=False)
    assert message.version == version
    assert message.header["NID_BG"] == 1207, "the header is the same in every version"
    assert message.packets == []
    assert message.content is not None
    assert message.content["bits"] == 31 + 8 + 2
    assert encode_bits(message.tree()) == (int(text, 2), len(text))
    if code in (16, 17):
        assert decode(text, strict=False).medium == "balise"


def test_the_version_given_counts_over_radio() -> None:
    assert decode(general(), version="2.0").version == "2.0"
    assert decode(general(), version="2.0").version_from == "caller"
    message = decode(general(TEMPORARY), version="1.0", strict=False)
    assert [each.kind for each in message.problems] == ["unknown-version"]
    assert message.header == {"NID_MESSAGE": 24, "L_MESSAGE": 14}
    assert encode_bits(message.tree()) == (int(general(TEMPORARY), 2), 112)
