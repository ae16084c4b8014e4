"""System versions: M_VERSION holds X in its 3 high and Y in its 4 low bits.

Source: SUBSET-026 issue 3.6.0, 7.5.1.79 (the codes), 3.17.3 (which versions go together).
"""

from __future__ import annotations

import pytest

from fishplate.versions import closest_layouts, defined_codes, version_text

CODES = {
    0b0010000: "1.0",
    0b0010001: "1.1",
    0b0100000: "2.0",
    0b0100001: "2.1",
    0b0000000: "0.0",
    0b0110000: "3.0",
    0b1111111: "7.15",
}


@pytest.mark.parametrize("code", CODES)
def test_a_code_names_its_version(code: int) -> None:
    assert version_text(code) == CODES[code]


def test_the_defined_codes() -> None:
    assert defined_codes() == {16, 17, 32, 33}


@pytest.mark.parametrize(
    ("version", "layouts"),
    [
        ("2.1", "2.1"),
        ("2.0", "2.1"),
        ("2.2", "2.1"),
        ("2.15", "2.1"),
        ("1.0", None),
        ("1.1", None),
        ("3.0", None),
        ("22.1", None),
        ("", None),
        ("two", None),
    ],
)
def test_the_layouts_that_read_a_version(version: str, layouts: str | None) -> None:
    assert closest_layouts(version) == layouts
