"""fishplate against a naive decoder, frame by frame, in every system version.

Source: SUBSET-026 issues 2.3.0, 3.3.0, 3.6.0 and 4.0.0, chapters 7 and 8, and chapter 6 of issue
3.6.0 for X = 1, in the tables of ``fixtures/standard`` (2.2 and 2.3 inferred, `oracle.composed`).
`oracle.frames` writes random frames from these tables and `oracle.naive` reads them back; neither
shares code with fishplate. fishplate has to find the same variables at the same places with the
same codes, and to write every frame again bit for bit.
"""

from __future__ import annotations

import bitstring
import pytest

import fishplate
from oracle import editions, frames, naive

CHUNK = 100
DEFAULT_RUN = 4000
OTHER_RUN = 1500
"""Random frames by default: in 2.1, and in each of the other versions."""
EACH_KIND = 6
OTHERS_EACH_KIND = 3
SLOW_RUN, OTHER_SLOW_RUN = 60_000, 10_000
DEFAULT = editions.V3_6_0


def run_of(edition: editions.Edition) -> int:
    """How many random frames the default run has."""
    return DEFAULT_RUN if edition is DEFAULT else OTHER_RUN


def seeds_of(edition: editions.Edition) -> range:
    """Seeds for frames that are made to hold one packet or message."""
    return range(EACH_KIND if edition is DEFAULT else OTHERS_EACH_KIND)


def found_by_fishplate(frame: frames.Frame, edition: editions.Edition) -> list[naive.Found]:
    """The field rows of the library, without rows of no width.

    An empty text or empty outside data have no bit on the wire; the table has no row for them.
    """
    rows = fishplate.walk(
        bitstring.Bits(bin=frame.text),
        medium=frame.medium,
        direction=frame.direction,
        version=edition.version,
        issue=edition.issue,
    )
    return [naive.Found(row.variable, row.offset, row.width, row.raw) for row in rows if row.width]


def found_naively(frame: frames.Frame, edition: editions.Edition) -> list[naive.Found]:
    """The same, from the tables alone."""
    rows = naive.decode(frame.text, frame.medium, frame.direction, edition.usable)
    return [row for row in rows if row.width]


def check(frame: frames.Frame, edition: editions.Edition) -> None:
    """Same rows, rows that tile the frame, and the same bits again."""
    bits = bitstring.Bits(bin=frame.text)
    version, issue = edition.version, edition.issue
    assert found_by_fishplate(frame, edition) == found_naively(frame, edition)
    message = fishplate.decode(
        bits, medium=frame.medium, direction=frame.direction, version=version, issue=issue
    )
    assert not message.problems
    assert (message.version, message.issue) == (version, issue)
    assert fishplate.encode(message.tree()).bin == frame.text
    assert fishplate.encode(message).bin == frame.text
    found = fishplate.decode(bits, version=version, issue=issue)
    assert (found.medium, found.direction) == (frame.medium, frame.direction)
    assert found.tree() == message.tree()
    # A telegram says its version (7.5.1.79), not its issue; a radio message that fits 2.1 is taken
    # for 2.1.
    if edition is DEFAULT or (frame.medium != "radio" and edition is not editions.V2_3_0):
        found = fishplate.decode(bits)
        assert (found.medium, found.direction) == (frame.medium, frame.direction)
        assert found.tree() == message.tree()


@pytest.mark.parametrize(
    ("edition", "first"),
    [
        pytest.param(edition, first, id=f"{edition.name}, {first}")
        for edition in editions.ALL
        for first in range(0, run_of(edition), CHUNK)
    ],
)
def test_random_frames(edition: editions.Edition, first: int) -> None:
    """Frames of every medium with codes that have a meaning; every second one with spare codes."""
    for seed in range(first, first + CHUNK):
        check(frames.random_frame(seed, edition, spares=0.05 * (seed % 2)), edition)


@pytest.mark.parametrize(
    ("edition", "direction", "number"),
    [
        pytest.param(edition, *key, id=f"{edition.name}, packet {key[1]} {key[0]}")
        for edition in editions.ALL
        for key in sorted(edition.usable.packet_rows)
    ],
)
def test_every_packet(edition: editions.Edition, direction: str, number: int) -> None:
    """Each packet of chapter 7.4 (6.5.1.5 for X = 1) several times."""
    for seed in seeds_of(edition):
        spares = 0.05 * (seed % 2)
        check(frames.frame_with(seed, direction, number, edition, spares=spares), edition)


@pytest.mark.parametrize(
    ("edition", "direction", "number"),
    [
        pytest.param(edition, *key, id=f"{edition.name}, message {key[1]}")
        for edition in editions.ALL
        for key in sorted(edition.usable.message_rows)
    ],
)
def test_every_message(edition: editions.Edition, direction: str, number: int) -> None:
    """Each radio message of chapters 8.6 and 8.7 (6.5.1.6 for X = 1) several times."""
    for seed in seeds_of(edition):
        check(frames.message_frame(seed, direction, number, edition), edition)


each_edition = pytest.mark.parametrize("edition", editions.ALL, ids=lambda each: each.name)


@each_edition
def test_counts_of_31(edition: editions.Edition) -> None:
    """The largest N_ITER (7.5.1.80) in every set of every packet that stays within L_PACKET."""
    for direction, number in sorted(edition.usable.packet_rows):
        check(frames.frame_with(1, direction, number, edition, many=1.0), edition)


@each_edition
def test_lowest_and_highest_codes(edition: editions.Edition) -> None:
    """All bits zero and all bits one in every variable that no length or branch depends on."""
    for direction, number in sorted(edition.usable.packet_rows):
        for extreme in (0.0, 1.0):
            check(frames.frame_with(2, direction, number, edition, extreme=extreme), edition)


MORE = [
    pytest.param(edition, first, id=f"{edition.name} from {first}")
    for edition in editions.ALL
    for first in range(
        1_000_000,
        1_000_000 + (SLOW_RUN if edition is DEFAULT else OTHER_SLOW_RUN),
        10 * CHUNK,
    )
]


@pytest.mark.slow
@pytest.mark.parametrize(("edition", "first"), MORE)
def test_many_more_random_frames(edition: editions.Edition, first: int) -> None:
    """The same as the default run, on other seeds."""
    for seed in range(first, first + 10 * CHUNK):
        check(frames.random_frame(seed, edition, spares=0.05 * (seed % 2), many=0.02), edition)


# --- forms told by L_PACKET --------------------------------------------------------------------


@pytest.mark.parametrize("edition", [editions.X2_2, editions.X2_3], ids=lambda each: each.name)
@pytest.mark.parametrize(
    ("key", "of_4_0_0"),
    [
        (("to-train", 45), "Q_NETWORKTYPE"),
        (("to-train", 70), "M_LINEAXLELOADCAT"),
        (("to-track", 0), "Q_INTEGRITY"),
        (("to-track", 1), "Q_INTEGRITY"),
    ],
)
def test_both_forms_are_met(edition: editions.Edition, key: tuple[str, int], of_4_0_0: str) -> None:
    """Packets that 3.6.0 and 4.0.0 lay out differently (7.4) come in both ways, and are told.

    The packet says so in its tree where it is laid out as in 4.0.0, that is 3.0.
    """
    seen = set()
    for seed in range(40):
        frame = frames.frame_with(seed, *key, edition)
        check(frame, edition)
        names = {row.variable for row in found_naively(frame, edition)}
        bits = bitstring.Bits(bin=frame.text)
        message = fishplate.decode(bits, version=edition.version)
        (packet,) = (each for each in message.tree()["packets"] if each["NID_PACKET"] == key[1])
        form = packet.get("form")
        if of_4_0_0 in names:
            assert form == "3.0"
        seen.add(form)
    assert seen == {None, "3.0"}


@pytest.mark.parametrize("edition", [editions.X2_2, editions.X2_3], ids=lambda each: each.name)
@pytest.mark.parametrize("number", [73, 74])
def test_text_packets_are_those_of_4_0_0(edition: editions.Edition, number: int) -> None:
    """7.4.2.23 and 7.4.2.24 of issue 4.0.0: new numbers, levels and modes coded as in 3.0."""
    frame = frames.frame_with(0, "to-train", number, edition)
    packet = fishplate.decode(bitstring.Bits(bin=frame.text)).tree()["packets"][0]
    assert (packet["NID_PACKET"], packet["form"]) == (number, "3.0")


# --- the oracle itself -------------------------------------------------------------------------


@each_edition
def test_the_naive_decoder_tiles_every_frame(edition: editions.Edition) -> None:
    """Rows follow one another from the first bit to the last, without fishplate."""
    for seed in range(100):
        frame = frames.random_frame(seed, edition)
        at = 0
        for row in naive.decode(frame.text, frame.medium, frame.direction, edition.usable):
            assert row.offset == at
            at += row.width
        assert at == len(frame.text)


@each_edition
def test_the_generator_reaches_everything(edition: editions.Edition) -> None:
    """The default run holds every message, every packet and every row of every layout."""
    book = edition.usable
    packets: set[tuple[str, int]] = set()
    messages: set[tuple[str, int]] = set()
    media: set[str] = set()
    branches: set[str | None] = set()
    for seed in range(run_of(edition)):
        frame = frames.random_frame(seed, edition)
        packets.update((frame.direction, number) for number, _, _ in frame.packets)
        media.add(frame.medium)
        if frame.medium == "radio":
            messages.add((frame.direction, int(frame.text[:8], 2)))
        rows = naive.decode(frame.text, frame.medium, frame.direction, book)
        branches.update(row.variable for row in rows)
    assert media == {"balise", "loop", "radio"}
    assert packets == set(book.packet_rows)
    assert messages == set(book.message_rows)
    # NID_CTRACTION, NC_DIFF and the like stand behind conditions: all were met.
    expected = {row.variable for rows in book.packet_rows.values() for row in rows}
    expected |= {row.variable for rows in book.message_rows.values() for row in rows}
    expected |= {row.variable for rows in book.header_rows.values() for row in rows}
    expected |= {row.variable for key, form in book.forms.items() for row in form.packet_rows[key]}
    assert branches == expected | {None}


@pytest.mark.parametrize("edition", editions.PRINTED, ids=lambda each: each.name)
def test_every_variable_is_used(edition: editions.Edition) -> None:
    """Every variable of 7.5 stands in some layout of the same issue."""
    book = edition.tables
    used = {row.variable for rows in book.packet_rows.values() for row in rows}
    used |= {row.variable for rows in book.message_rows.values() for row in rows}
    used |= {row.variable for rows in book.header_rows.values() for row in rows}
    assert used == set(book.coding)


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
