"""fishplate against a naive decoder, frame by frame.

Source: SUBSET-026 issue 3.6.0, chapters 7 and 8, in the tables of ``fixtures/standard/v3_6_0``.
`oracle.frames` writes random frames from these tables and `oracle.naive` reads them back; neither
shares code with fishplate. fishplate has to find the same variables at the same places with the
same codes, and to write every frame again bit for bit.
"""

from __future__ import annotations

import bitstring
import pytest

import fishplate
from oracle import frames, naive, tables

CHUNK = 100
DEFAULT_RUN = 4000
EACH_KIND = 6
SLOW_RUN = 60_000


def found_by_fishplate(frame: frames.Frame) -> list[naive.Found]:
    """The field rows of the library, without rows of no width.

    An empty text or empty outside data have no bit on the wire; the table has no row for them.
    """
    bits = bitstring.Bits(bin=frame.text)
    rows = fishplate.walk(bits, medium=frame.medium, direction=frame.direction)
    return [naive.Found(row.variable, row.offset, row.width, row.raw) for row in rows if row.width]


def found_naively(frame: frames.Frame) -> list[naive.Found]:
    """The same, from the tables alone."""
    rows = naive.decode(frame.text, frame.medium, frame.direction)
    return [row for row in rows if row.width]


def check(frame: frames.Frame) -> None:
    """Same rows, rows that tile the frame, and the same bits again."""
    bits = bitstring.Bits(bin=frame.text)
    expected = found_naively(frame)
    assert found_by_fishplate(frame) == expected
    message = fishplate.decode(bits, medium=frame.medium, direction=frame.direction)
    assert not message.problems
    assert fishplate.encode(message.tree()).bin == frame.text
    assert fishplate.encode(message).bin == frame.text
    found = fishplate.decode(bits)
    assert (found.medium, found.direction) == (frame.medium, frame.direction)
    assert found.tree() == message.tree()


@pytest.mark.parametrize("first", range(0, DEFAULT_RUN, CHUNK))
def test_random_frames(first: int) -> None:
    """Frames of every medium with codes that have a meaning; every second one with spare codes."""
    for seed in range(first, first + CHUNK):
        check(frames.random_frame(seed, spares=0.05 * (seed % 2)))


@pytest.mark.parametrize(("direction", "number"), sorted(tables.packet_rows()))
def test_every_packet(direction: str, number: int) -> None:
    """Each packet of chapter 7.4 several times."""
    for seed in range(EACH_KIND):
        check(frames.frame_with(seed, direction, number, spares=0.05 * (seed % 2)))


@pytest.mark.parametrize(("direction", "number"), sorted(tables.message_rows()))
def test_every_message(direction: str, number: int) -> None:
    """Each radio message of chapters 8.6 and 8.7 several times."""
    for seed in range(EACH_KIND):
        check(frames.message_frame(seed, direction, number))


def test_counts_of_31() -> None:
    """The largest N_ITER (7.5.1.80) in every set of every packet that stays within L_PACKET."""
    for direction, number in sorted(tables.packet_rows()):
        check(frames.frame_with(1, direction, number, many=1.0))


def test_lowest_and_highest_codes() -> None:
    """All bits zero and all bits one in every variable that no length or branch depends on."""
    for direction, number in sorted(tables.packet_rows()):
        for extreme in (0.0, 1.0):
            check(frames.frame_with(2, direction, number, extreme=extreme))


@pytest.mark.slow
@pytest.mark.parametrize("first", range(1_000_000, 1_000_000 + SLOW_RUN, 10 * CHUNK))
def test_many_more_random_frames(first: int) -> None:
    """The same as the default run, on other seeds."""
    for seed in range(first, first + 10 * CHUNK):
        check(frames.random_frame(seed, spares=0.05 * (seed % 2), many=0.02))


# --- the oracle itself -------------------------------------------------------------------------


def test_the_naive_decoder_tiles_every_frame() -> None:
    """Rows follow one another from the first bit to the last, without fishplate."""
    for seed in range(500):
        frame = frames.random_frame(seed)
        at = 0
        for row in naive.decode(frame.text, frame.medium, frame.direction):
            assert row.offset == at
            at += row.width
        assert at == len(frame.text)


def test_the_generator_reaches_everything() -> None:
    """The default run holds every message, every packet and every row of every layout."""
    packets: set[tuple[str, int]] = set()
    messages: set[tuple[str, int]] = set()
    branches: set[str | None] = set()
    for seed in range(DEFAULT_RUN):
        frame = frames.random_frame(seed)
        packets.update((frame.direction, number) for number, _, _ in frame.packets)
        if frame.medium == "radio":
            messages.add((frame.direction, int(frame.text[:8], 2)))
        rows = naive.decode(frame.text, frame.medium, frame.direction)
        branches.update(row.variable for row in rows)
    assert packets == set(tables.packet_rows())
    assert messages == set(tables.message_rows())
    # NID_CTRACTION, NC_DIFF and the like stand behind conditions: all were met. Every variable
    # of 7.5 is used by some layout.
    assert branches == {line["variable"] for line in tables.table("variables")} | {None}


def test_two_complement_by_hand() -> None:
    """D_REF (7.5.1.22) is signed: 16 bits, two's complement."""
    assert naive.number("1111111100111000", "signed") == -200  # 65536 - 200 = 65336 = FF38
    assert naive.number("1000000000000000", "signed") == -32768
    assert naive.number("0111111111111111", "signed") == 32767
    assert naive.number("1111111100111000", "unsigned") == 65336


def test_hex_text_by_hand() -> None:
    """Bits left aligned in whole bytes, unused low bits 0."""
    assert naive.hex_text("1") == "80"
    assert naive.hex_text("101000001111") == "A0F0"
    assert naive.hex_text("") == ""
