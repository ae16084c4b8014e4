"""Every proper prefix of a frame, and how many bits it lacks, worked out from the naive rows.

Source: SUBSET-026 issue 3.6.0 for fields and lengths (7.5.1.48 L_MESSAGE, 7.5.1.49 L_PACKET), by
way of `oracle.naive`; of the other issues and versions, those packets and messages whose rows are
not the ones of 3.6.0. What counts as missing is fishplate's own promise (`errors.Truncated`): the
bits to the end of the field being read, or to the end of the packet once its L_PACKET is known.
"""

from __future__ import annotations

import bitstring
import pytest

import fishplate
from oracle import editions, frames, naive

STRIDE = 5
"""Field rows are looked at for every fifth cut only; coprime to most widths."""
DEFAULT = editions.V3_6_0
LAID_OUT_ONCE = tuple(each for each in editions.ALL if not each.usable.forms)
"""Where a packet may come in two forms, a cut one does not say in which: those are left aside."""
PACKETS = [
    pytest.param(each, *key, id=f"{each.name}, packet {key[1]} {key[0]}")
    for each in LAID_OUT_ONCE
    for key, rows in sorted(each.usable.packet_rows.items())
    if each is DEFAULT or rows != DEFAULT.usable.packet_rows.get(key)
]
MESSAGES = [
    pytest.param(each, *key, id=f"{each.name}, message {key[1]}")
    for each in LAID_OUT_ONCE
    for key, rows in sorted(each.usable.message_rows.items())
    if each is DEFAULT or rows != DEFAULT.usable.message_rows.get(key)
]


def missing_bits(frame: frames.Frame, edition: editions.Edition) -> dict[int, int]:
    """Bits missing for each cut that leaves something unread; filling may be cut at will."""
    rows = naive.decode(frame.text, frame.medium, frame.direction, edition.usable)
    flag_ends = frame.packets[-1][2] if frame.medium != "radio" else len(frame.text)
    missing: dict[int, int] = {}
    for row in rows:
        if row.offset < flag_ends:
            end = row.offset + row.width
            missing.update({cut: end - cut for cut in range(row.offset, end)})
    for _, start, packet_end in frame.packets:
        for row in rows:
            if row.variable == "L_PACKET" and start <= row.offset < packet_end:
                known = range(row.offset + row.width, packet_end)
                missing.update({cut: packet_end - cut for cut in known})
    return missing


def check(frame: frames.Frame, edition: editions.Edition = DEFAULT) -> None:
    """Every cut raises, with the missing bits counted right; nothing else is cut."""
    expected = missing_bits(frame, edition)
    assert sorted(expected) == list(range(max(expected) + 1))
    for cut, missing in expected.items():
        bits = bitstring.Bits(bin=frame.text[:cut])
        with pytest.raises(fishplate.Truncated) as caught:
            fishplate.decode(
                bits,
                medium=frame.medium,
                direction=frame.direction,
                version=edition.version,
                issue=edition.issue,
            )
        assert caught.value.missing == missing, cut


def rows_until_trouble(
    frame: frames.Frame, edition: editions.Edition, cut: int
) -> tuple[list[naive.Found], int]:
    """The variables that strict walking gives, and the bits that its error misses."""
    bits = bitstring.Bits(bin=frame.text[:cut])
    rows = fishplate.walk(
        bits,
        medium=frame.medium,
        direction=frame.direction,
        version=edition.version,
        issue=edition.issue,
    )
    found = []
    try:
        for row in rows:
            if row.variable and row.width:
                one = naive.Found(row.variable, row.offset, row.width, row.raw)
                found.append(one)
    except fishplate.Truncated as error:
        return found, error.missing
    raise AssertionError(f"cut at {cut} and nothing was raised")


def check_rows(frame: frames.Frame, edition: editions.Edition) -> None:
    """Strict walking gives every variable that is there in full, then raises the same error.

    Bits without a variable have no end of their own and are left aside. Lenient decoding keeps
    every bit of the prefix.
    """
    whole = [
        row
        for row in naive.decode(frame.text, frame.medium, frame.direction, edition.usable)
        if row.variable and row.width
    ]
    for cut, missing in list(missing_bits(frame, edition).items())[::STRIDE]:
        there = [row for row in whole if row.offset + row.width <= cut]
        assert rows_until_trouble(frame, edition, cut) == (there, missing), cut
        bits = bitstring.Bits(bin=frame.text[:cut])
        message = fishplate.decode(
            bits,
            medium=frame.medium,
            direction=frame.direction,
            version=edition.version,
            issue=edition.issue,
            strict=False,
        )
        assert message.problems[0].kind == "truncated"
        assert fishplate.encode(message.tree()) == bits, cut


@pytest.mark.parametrize(("edition", "direction", "number"), PACKETS)
def test_every_prefix_of_every_packet(
    edition: editions.Edition, direction: str, number: int
) -> None:
    """A frame with each packet of chapter 7.4 (6.5.1.5 for X = 1), cut at each bit."""
    frame = frames.frame_with(0, direction, number, edition)
    check(frame, edition)
    check_rows(frame, edition)


@pytest.mark.parametrize(("edition", "direction", "number"), MESSAGES)
def test_every_prefix_of_every_message(
    edition: editions.Edition, direction: str, number: int
) -> None:
    """A frame of each radio message of 8.6 and 8.7 (6.5.1.6 for X = 1), cut at each bit."""
    frame = frames.message_frame(0, direction, number, edition)
    check(frame, edition)
    check_rows(frame, edition)


def test_every_prefix_of_some_telegrams() -> None:
    """Balise telegrams and loop messages, filling included."""
    found = 0
    for seed in range(60):
        frame = frames.random_frame(seed)
        if frame.medium != "radio":
            found += 1
            check(frame)
    assert found >= 10
