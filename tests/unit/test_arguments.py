"""What is handed to the library beside the bits: versions, directions, lengths, odd types."""

from __future__ import annotations

from typing import Any

import pytest

import fishplate
from fishplate.errors import path_text

GENERAL = {
    "header": {"NID_MESSAGE": 24, "T_TRAIN": 5, "M_ACK": 0, "NID_LRBG": 5},
    "packets": [],
}


def test_the_message_these_tests_change() -> None:
    """24, 10 bytes, T_TRAIN 5, M_ACK 0, NID_LRBG 5 (SUBSET-026 8.7.9), packed by hand."""
    bits = f"{24:08b}{10:010b}{5:032b}{0:01b}{5:024b}00000"
    assert fishplate.encode(GENERAL).bin == bits


@pytest.mark.parametrize(
    ("changes", "path"),
    [
        ({"version": "1.0"}, "version"),
        ({"version": "banana"}, "version"),
        ({"version": "2"}, "version"),
        ({"version": "2.1 "}, "version"),
        ({"version": []}, "version"),
        ({"version": ""}, "version"),
        ({"issue": "2.3.0"}, "issue"),
        ({"direction": [3]}, "direction"),
        ({"direction": "to-track"}, "header.NID_MESSAGE"),
        ({"medium": []}, "medium"),
        ({"medium": "train"}, "medium"),
        ({"header": {"NID_MESSAGE": [3]}}, "header.NID_MESSAGE"),
        ({"header": {"NID_MESSAGE": {}}}, "header.NID_MESSAGE"),
        ({"header": {"NID_MESSAGE": None}}, "header.NID_MESSAGE"),
        ({"header": []}, "header"),
        ({"packets": [{"NID_PACKET": [1]}]}, "packets[0]"),
        ({"packets": [[]]}, "packets[0]"),
    ],
)
def test_trees_that_say_what_cannot_be(changes: dict[str, Any], path: str) -> None:
    with pytest.raises(fishplate.EncodeError) as caught:
        fishplate.encode({**GENERAL, **changes})
    found = {path_text(each.path) for each in (caught.value, *caught.value.others)}
    assert path in found


@pytest.mark.parametrize("version", ["2", "2.banana", "2.1 ", "2.1.3", "", "8.0", "2.16", 2.1, []])
def test_versions_that_are_none(version: Any) -> None:
    data = fishplate.encode(GENERAL)
    with pytest.raises(ValueError, match="version is written as"):
        fishplate.decode(data, version=version)
    with pytest.raises(ValueError, match="version is written as"):
        fishplate.walk(data, version=version)


def test_a_later_version_over_radio_is_said() -> None:
    data = fishplate.encode(GENERAL)
    message = fishplate.decode(data, version="2.9", strict=False)
    assert [each.kind for each in message.problems] == ["newer-version"]
    assert message.complete
    assert fishplate.encode(message) == data
    assert not fishplate.decode(data, version="2.0").problems


@pytest.mark.parametrize("bits", ["80", 80.0, True, None.__class__])
def test_a_length_is_a_whole_number(bits: Any) -> None:
    with pytest.raises(TypeError, match="bits is a whole number"):
        fishplate.decode(fishplate.encode(GENERAL).tobytes(), bits=bits)


@pytest.mark.parametrize("given", [{"medium": "Radio"}, {"direction": "down"}, {"medium": 3}])
def test_words_that_are_none(given: dict[str, Any]) -> None:
    for call in (fishplate.decode, fishplate.walk):
        with pytest.raises(ValueError, match=r"is (one of|to-train)"):
            call(b"\x18", **given)


def test_a_tree_shares_with_its_message() -> None:
    message = fishplate.decode(fishplate.encode(GENERAL))
    message.tree()["header"]["T_TRAIN"] = 6
    assert message.header["T_TRAIN"] == 6
