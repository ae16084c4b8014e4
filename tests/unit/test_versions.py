"""System versions: M_VERSION holds X in its 3 high and Y in its 4 low bits.

Sources: SUBSET-026 issue 4.0.0, 7.5.1.79 (which codes are defined, not valid, reserved), issue
3.6.0, 3.17.3 (which versions go together).
"""

from __future__ import annotations

import pytest

import fishplate
from fishplate.standard.editions import EDITIONS, edition, known_versions, version_key
from fishplate.versions import (
    closest_layouts,
    defined_codes,
    is_declared_invalid,
    version_code,
    version_text,
)

CODES = {
    0b0010000: "1.0",
    0b0010001: "1.1",
    0b0100000: "2.0",
    0b0100001: "2.1",
    0b0100010: "2.2",
    0b0100011: "2.3",
    0b0000000: "0.0",
    0b0110000: "3.0",
    0b1111111: "7.15",
}


@pytest.mark.parametrize("code", CODES)
def test_a_code_names_its_version(code: int) -> None:
    assert version_text(code) == CODES[code]
    assert version_code(CODES[code]) == code


def test_codes_and_names_are_one_to_one() -> None:
    assert [version_code(version_text(code)) for code in range(128)] == list(range(128))


def test_the_defined_codes() -> None:
    """1.0, 1.1, 2.0 to 2.3 and 3.0 (issue 4.0.0, 7.5.1.79)."""
    assert defined_codes() == {16, 17, 32, 33, 34, 35, 48}
    assert known_versions() == ("1.0", "1.1", "2.0", "2.1", "2.2", "2.3", "3.0")


def test_the_codes_that_are_not_valid() -> None:
    """1.2 to 1.15 and 2.4 to 2.15 (issue 4.0.0, 7.5.1.79)."""
    assert {code for code in range(128) if is_declared_invalid(code)} == {
        *range(18, 32),
        *range(36, 48),
    }


def test_a_defined_version_is_no_message_number() -> None:
    """So the first byte of a telegram is never that of a radio message, in any issue."""
    starts = {0x80 | code for code in defined_codes()}
    numbers = {
        number
        for each in EDITIONS
        for _, number in fishplate.registry(each.version, each.issue).messages
    }
    assert not starts & numbers


@pytest.mark.parametrize(
    ("version", "layouts"),
    [
        ("1.0", "1.0"),
        ("1.1", "1.1"),
        ("2.0", "2.0"),
        ("2.1", "2.1"),
        ("2.2", "2.2"),
        ("2.3", "2.3"),
        ("3.0", "3.0"),
        # Reserved but valid: only Y differs from a version that is known.
        ("3.1", "3.0"),
        ("3.15", "3.0"),
        # Not valid.
        ("1.2", None),
        ("1.15", None),
        ("2.4", None),
        ("2.15", None),
        # Older ones, and those of an X that no issue lays out.
        ("0.0", None),
        ("0.15", None),
        ("4.0", None),
        ("7.15", None),
        # No versions at all.
        ("22.1", None),
        ("2.16", None),
        ("", None),
        ("two", None),
    ],
)
def test_the_layouts_that_read_a_version(version: str, layouts: str | None) -> None:
    assert closest_layouts(version) == layouts


# Introduced by: 1.0 issue 2.3.0, 1.1 and 2.0 issue 3.3.0, 2.1 issue 3.6.0, 2.2, 2.3 and 3.0 issue
# 4.0.0 (SUBSET-026, 7.5.1.79 of each). Versions with X = 1 are read as issue 3.6.0, 6.5.1.5 and
# 6.5.1.6, lays them out today.
ISSUES = {
    ("1.0", None): "3.6.0",
    ("1.0", "3.6.0"): "3.6.0",
    ("1.0", "2.3.0"): "2.3.0",
    ("1.1", None): "3.6.0",
    ("2.0", None): "3.3.0",
    ("2.1", None): "3.6.0",
    ("2.2", None): "4.0.0",
    ("2.3", None): "4.0.0",
    ("3.0", None): "4.0.0",
}


@pytest.mark.parametrize(("version", "issue"), ISSUES)
def test_the_issue_whose_layouts_a_version_has(version: str, issue: str | None) -> None:
    found = fishplate.registry(version, issue)
    assert (found.version, found.issue) == (version, ISSUES[version, issue])
    assert fishplate.registry(version, found.issue).packets == found.packets
    assert edition(version, issue) == (version, found.issue, found.layouts)


@pytest.mark.parametrize(
    ("version", "issue"),
    [("1.1", "2.3.0"), ("2.1", "3.3.0"), ("2.0", "3.6.0"), ("3.0", "3.6.0"), ("1.0", "9.9.9")],
)
def test_an_issue_that_does_not_print_a_version(version: str, issue: str) -> None:
    with pytest.raises(fishplate.RegistryError) as caught:
        fishplate.registry(version, issue)
    assert str(caught.value) == (
        f"no registry for system version {version} as printed in issue {issue}; there is "
        "1.0 (issue 2.3.0), 1.0 (issue 3.6.0), 1.1 (issue 3.6.0), 2.0 (issue 3.3.0), "
        "2.1 (issue 3.6.0), 2.2 (issue 4.0.0), 2.3 (issue 4.0.0), 3.0 (issue 4.0.0)"
    )


def test_each_edition_stands_once() -> None:
    assert len({each[:2] for each in EDITIONS}) == len(EDITIONS)


def test_versions_are_compared_by_numbers() -> None:
    assert version_key("2.10") > version_key("2.9")
    assert version_key("1.15") < version_key("2.0")
    assert edition("2.4") is None
    assert edition("9.9", "3.6.0") is None
