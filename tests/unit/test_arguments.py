"""What is handed to the library beside the bits: versions, directions, lengths, odd types."""

from __future__ import annotations

from typing import Any

import pytest

import fishplate
from fishplate.errors import path_text

GENERAL: dict[str, Any] = {
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
        ({"version": "0.9"}, "version"),
        ({"version": "1.2"}, "version"),
        ({"version": "2.15"}, "version"),
        ({"version": "4.0"}, "version"),
        ({"version": "banana"}, "version"),
        ({"version": "2"}, "version"),
        ({"version": "2.1 "}, "version"),
        ({"version": []}, "version"),
        ({"version": ""}, "version"),
        ({"issue": "2.3.0"}, "issue"),
        ({"issue": "4.0.0"}, "issue"),
        ({"version": "1.1", "issue": "2.3.0"}, "issue"),
        ({"issue": "nine"}, "issue"),
        ({"issue": []}, "issue"),
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


@pytest.mark.parametrize("version", ["1.0", "1.1", "2.0", "2.1", "2.2", "2.3", "3.0"])
def test_a_message_that_every_version_knows(version: str) -> None:
    """Message 24 has the same fixed part in every issue (SUBSET-026, clause 8.7)."""
    data = fishplate.encode(GENERAL)
    message = fishplate.decode(data, version=version)
    assert (message.version, message.version_from) == (version, "caller")
    assert not message.problems
    assert message.header == {**GENERAL["header"], "L_MESSAGE": 10}
    assert fishplate.encode(message) == data
    assert fishplate.encode({**GENERAL, "version": version}) == data


def test_a_later_version_over_radio_is_said() -> None:
    """3.1 is reserved but valid (issue 4.0.0, 7.5.1.79): only Y differs from 3.0."""
    data = fishplate.encode(GENERAL)
    message = fishplate.decode(data, version="3.1", strict=False)
    assert [each.kind for each in message.problems] == ["newer-version"]
    assert "with the layouts of 3.0" in message.problems[0].message
    assert message.complete
    assert message.header == {**GENERAL["header"], "L_MESSAGE": 10}
    assert fishplate.encode(message) == data


@pytest.mark.parametrize(
    ("version", "reason"),
    [
        ("2.9", "system version 2.9 is declared not valid"),
        ("1.2", "system version 1.2 is declared not valid"),
        ("4.0", "no layouts for system version 4.0"),
        ("0.9", "no layouts for system version 0.9"),
    ],
)
def test_a_version_over_radio_that_nobody_lays_out(version: str, reason: str) -> None:
    data = fishplate.encode(GENERAL)
    with pytest.raises(fishplate.Unknown, match=reason):
        fishplate.decode(data, version=version)
    message = fishplate.decode(data, version=version, strict=False)
    assert [each.kind for each in message.problems] == ["unknown-version"]
    assert message.header == {"NID_MESSAGE": 24, "L_MESSAGE": 10}
    assert message.content is not None
    assert message.content["bits"] == 62
    assert not message.complete
    assert fishplate.encode(message) == fishplate.encode(message.tree()) == data


@pytest.mark.parametrize("issue", ["2", "3.6", "9.9.9", "", 3.6, []])
def test_issues_that_are_none(issue: Any) -> None:
    data = fishplate.encode(GENERAL)
    for call in (fishplate.decode, fishplate.walk):
        with pytest.raises(ValueError, match="issue is one of"):
            call(data, issue=issue)


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
