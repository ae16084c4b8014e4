"""Any bits at all: they end in a message that holds them all, or in one of our errors.

No clause is tested here but the library's own promise: ``encode(decode(x)) == x`` bit for bit, and
field rows that cover every bit, whatever the bits are and whatever is said beside them.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

import pytest
from hypothesis import given, settings
from hypothesis import strategies as st

import fishplate
from fishplate.errors import DecodeError, FishplateError
from fishplate.frames import encode_bits
from fishplate.standard.editions import EDITIONS
from property.reading import (
    assert_rows_are_the_tree,
    assert_tiles,
    decoded,
    gathered,
    mutated,
    rows_of,
)
from property.trees import USUAL, said_of

if TYPE_CHECKING:
    from fishplate.standard.editions import Edition

MEDIA = ("balise", "loop", "radio", None)
LATER = [each for each in EDITIONS if each != USUAL]

# Every edition; a later version of a known X, one that is not valid, one of no known X.
SAID: list[dict[str, str]] = [
    {},
    *({"version": each.version, "issue": each.issue} for each in EDITIONS),
    {"issue": "2.3.0"},
    {"version": "3.1"},
    {"version": "1.2"},
    {"version": "2.15"},
    {"version": "4.0"},
    {"version": "0.9"},
]


def check_any(value: int, size: int, medium: str | None, **more: str) -> None:
    """Check all that holds for every string of bits."""
    given: dict[str, Any] = {"medium": medium, **more}
    lenient = decoded(value, size, **given, strict=False)
    assert encode_bits(lenient) == encode_bits(lenient.tree()) == (value, size)
    rows = rows_of(value, size, **given, strict=False)
    assert_tiles(rows, value, size, lenient)
    assert_rows_are_the_tree(rows, lenient)
    if lenient.problems:
        first = lenient.problems[0]
        with pytest.raises(DecodeError) as caught:
            decoded(value, size, **given)
        assert (caught.value.kind, caught.value.path) == (first.kind, first.path)
        assert caught.value.reason == first.message
        seen, error = gathered(value, size, **given)
        assert str(error) == str(caught.value)
        at = 0
        for row in seen:
            assert row.offset == at
            at += row.width
        assert at <= size
    else:
        assert decoded(value, size, **given).tree() == lenient.tree()


@given(
    st.binary(max_size=200),
    st.integers(0, 7),
    st.sampled_from(MEDIA),
    st.sampled_from(SAID),
)
@settings(max_examples=200)
def test_any_bits_are_read_and_written_back(
    data: bytes, short: int, medium: str | None, said: dict[str, str]
) -> None:
    size = max(0, 8 * len(data) - short)
    check_any(int.from_bytes(data, "big") >> 8 * len(data) - size, size, medium, **said)


# A first bit 1 and M_VERSION: 1.0, 1.1, 2.0 to 2.3, 3.0; 3.1 and 4.0; 1.2 and 2.4; 0.4 and 0.9.
STARTS = (0x90, 0x91, 0xA0, 0xA1, 0xA2, 0xA3, 0xB0, 0xB1, 0xC0, 0x92, 0xA4, 0x84, 0x89)


@given(
    st.sampled_from(STARTS),
    st.binary(min_size=8, max_size=200),
    st.sampled_from(("balise", "loop", None)),
    st.sampled_from(({}, {"issue": "2.3.0"}, {"version": "2.3"})),
)
@settings(max_examples=250)
def test_any_bits_behind_a_telegrams_start(
    start: int, data: bytes, medium: str | None, said: dict[str, str]
) -> None:
    value = start << 8 * len(data) | int.from_bytes(data, "big")
    check_any(value, 8 * len(data) + 8, medium, **said)


@given(
    st.integers(0, 255),
    st.binary(min_size=3, max_size=200),
    st.booleans(),
    st.sampled_from(SAID),
)
@settings(max_examples=200)
def test_any_bits_behind_a_messages_start(
    number: int,
    data: bytes,
    fits: bool,  # noqa: FBT001
    said: dict[str, str],
) -> None:
    size = 8 * len(data) + 8
    value = number << size - 8 | int.from_bytes(data, "big")
    if fits:
        value = value & ~(1023 << size - 18) | size // 8 << size - 18
    for medium in ("radio", None):
        check_any(value, size, medium, **said)
    for direction in ("to-train", "to-track"):
        check_any(value, size, "radio", direction=direction, **said)


def check_damaged(seed: int, edition: Edition = USUAL) -> None:
    value, size, tree = mutated(seed, edition)
    check_any(value, size, **said_of(tree))
    check_any(value, size, None)


@pytest.mark.parametrize("seed", range(200))
def test_damaged_frames_are_read_and_written_back(seed: int) -> None:
    check_damaged(seed)


@pytest.mark.parametrize("edition", LATER, ids=" ".join)
def test_damaged_frames_of_every_edition_are_read_and_written_back(edition: Edition) -> None:
    for seed in range(80):
        check_damaged(seed, edition)


@pytest.mark.slow
@pytest.mark.parametrize("edition", EDITIONS, ids=" ".join)
def test_many_damaged_frames_are_read_and_written_back(edition: Edition) -> None:
    for seed in range(200, 4000 if edition == USUAL else 1000):
        check_damaged(seed, edition)


def test_errors_are_ours_for_odd_sizes() -> None:
    for size in (-1, 17, 1 << 40):
        with pytest.raises(FishplateError):
            fishplate.decode(b"\x90\x00", bits=size)
