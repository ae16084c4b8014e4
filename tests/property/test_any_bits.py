"""Noise and damage in bulk: every frame ends in a value or in one of our errors, in good time.

No clause is tested here but the library's own promise: whatever the bits, `decode` and `walk`
return or raise `FishplateError`, and no frame takes more than 20 times the work of the
benchmark's message (a movement authority of 176 bytes).
"""

from __future__ import annotations

import gc
from time import process_time
from typing import TYPE_CHECKING, Any

import pytest

import fishplate
from bench import workload
from fishplate.errors import FishplateError
from fishplate.frames import encode_bits
from fishplate.standard.editions import EDITIONS
from property.reading import mutated, packed
from property.trees import END_FLAG, USUAL, Maker, said_of, seeded

if TYPE_CHECKING:
    from collections.abc import Callable, Iterator

FEW_RANDOM, RANDOM = 5_000, 100_000
FEW_DAMAGED, DAMAGED = 1_000, 20_000
LONGEST = 9_000
TIMES = 20
MEDIA = ("balise", "loop", "radio", None)

Case = tuple[bytes, int, "dict[str, Any]"]
"""Bytes, bits, and what is said beside them."""

# First bytes of telegrams: 1.0, 1.1, 2.0 to 2.3, 3.0; 1.2, 2.4, 3.1, 4.0 and 0.4.
STARTS = (0x90, 0x91, 0xA0, 0xA1, 0xA2, 0xA3, 0xB0, 0x92, 0xA4, 0xB1, 0xC0, 0x84)


def said(medium: str | None) -> dict[str, Any]:
    return {"medium": medium} if medium else {}


def noise(seed: int) -> Case:
    """Random bits: any, or those that begin like a frame, or mostly zeros or ones."""
    random = seeded(seed)
    size = random.randint(0, LONGEST)
    value = random.getrandbits(size) if size else 0
    kind = random.randrange(6)
    if kind == 1:
        value &= random.getrandbits(size + 1)
    elif kind == 2:
        value = (value | random.getrandbits(size + 1)) & (1 << size) - 1
    elif kind >= 3 and size > 100:
        size -= size % 8
        value &= (1 << size) - 1
        start, width = (random.choice(STARTS), 8)
        if kind > 3:
            start, width = random.randrange(256) << 10 | min(1023, size // 8), 18
        value = value & (1 << size - width) - 1 | start << size - width
    medium = random.choice(MEDIA)
    beside = said(medium)
    if not random.randrange(3):
        edition = random.choice(EDITIONS)
        beside |= {"issue": edition.issue}
        # A telegram says its version itself.
        beside |= {"version": edition.version} if medium == "radio" else {}
    return packed(value, size), size, beside


def damage(seed: int) -> Case:
    """A valid frame of any edition with bits flipped, cut, inserted, added or repeated."""
    edition = EDITIONS[seed // 2 % len(EDITIONS)] if seed % 2 else USUAL
    value, size, tree = mutated(seed, edition)
    return packed(value, size), size, seeded(seed).choice((said_of(tree), {}))


def telegram(packets: bytes, bits: int) -> Case:
    """A telegram of the packets given as bits, no end flag behind them."""
    value, size = encode_bits(
        {
            "medium": "balise",
            "header": HEADER,
            "packets": [],
            "filler": {"bits": bits, "hex": packets.hex()},
        }
    )
    return packed(value, size), size, {"medium": "balise"}


HEADER = {
    "Q_UPDOWN": 1,
    "M_VERSION": 33,
    "Q_MEDIA": 0,
    "N_PIG": 0,
    "N_TOTAL": 0,
    "M_DUP": 0,
    "M_MCOUNT": 255,
    "NID_C": 300,
    "NID_BG": 1,
    "Q_LINK": 0,
}


def hostile() -> Iterator[Case]:
    """Frames made to cost as much as they can."""
    for size in (210, 830, 8184, LONGEST):
        for medium in MEDIA:
            yield packed((1 << size) - 1, size), size, said(medium)
            yield packed(0, size), size, said(medium)
    for head, width in ((b"\x69\x00\x17", 23), (b"\xfe\x00\x17", 23), (b"\x69\x00\x00", 23)):
        # Four hundred packets that hold nothing but their head: known ones with a layout that
        # goes on, unknown ones, and ones whose L_PACKET does not cover its head.
        bits = "".join(f"{int.from_bytes(head, 'big'):0{width}b}" for _ in range(390))
        size = len(bits)
        yield telegram(packed(int(bits, 2), size), size)
    for number, inner in ((15, "111"), (27, "111"), (5, "111"), (3, "1"), (70, "1"), (68, "1")):
        # N_ITER at its largest wherever it may stand.
        for filled in (8184, 8191):
            length = filled - 60
            text = f"{number:08b}01{length:013b}" + inner * length
            text = text[:length] + "11111111"
            yield telegram(packed(int(text, 2), len(text)), len(text))
    maker = Maker(seeded(0), most=31)
    while True:
        packet = maker.packet("to-train", 27)
        if len(packet["steps"]) > 20:
            break
    nested = {"steps": [{**each, "categories": []} for each in packet["steps"]] * 2}
    tree: dict[str, Any] = {"medium": "balise", "header": HEADER, "filler": {"bits": 0, "hex": ""}}
    category = {"Q_DIFF": 1, "NC_DIFF": 1, "V_DIFF": 1}
    steps = [{**each, "categories": [category] * 19} for each in nested["steps"][:32]]
    fullest = {"NID_PACKET": 27, "Q_DIR": 1, "Q_SCALE": 1, "steps": steps[:29]}
    value, size = encode_bits(tree | {"packets": [fullest, {"NID_PACKET": END_FLAG}]})
    yield packed(value, size), size, said("balise")
    yield packed(value, size), size, {}
    for cut in range(1, 60):
        yield packed(value >> cut, size - cut), size - cut, said("balise")


def ended(run: Callable[[], object]) -> object:
    """Return the value or our error; any other error is the test's failure."""
    try:
        return run()
    except FishplateError as error:
        return error


def check(case: Case) -> None:
    """Decode strictly and leniently, and write back what was read."""
    data, size, beside = case
    ended(lambda: fishplate.decode(data, bits=size, **beside))
    message = fishplate.decode(data, bits=size, **beside, strict=False)
    value, width = encode_bits(message)
    assert width == size
    assert packed(value, width) == data[: len(packed(value, width))] or size % 8
    assert value == int.from_bytes(data, "big") >> 8 * len(data) - size


def check_walk(case: Case) -> None:
    """Walk strictly and leniently."""
    data, size, beside = case
    ended(lambda: list(fishplate.walk(data, bits=size, **beside)))
    rows = list(fishplate.walk(data, bits=size, **beside, strict=False))
    assert sum(row.width for row in rows) == size


def check_all(cases: Iterator[Case]) -> None:
    """Check every case, and walk every tenth."""
    for index, case in enumerate(cases):
        check(case)
        if index % 10 == 0:
            check_walk(case)


def test_noise_ends_in_a_value_or_our_error() -> None:
    check_all(map(noise, range(FEW_RANDOM)))


def test_damage_ends_in_a_value_or_our_error() -> None:
    check_all(map(damage, range(FEW_DAMAGED)))


@pytest.mark.slow
def test_a_lot_of_noise_ends_in_a_value_or_our_error() -> None:
    check_all(map(noise, range(FEW_RANDOM, RANDOM)))


@pytest.mark.slow
def test_a_lot_of_damage_ends_in_a_value_or_our_error() -> None:
    check_all(map(damage, range(FEW_DAMAGED, DAMAGED)))


def test_hostile_frames_end_in_a_value_or_our_error() -> None:
    for case in hostile():
        check(case)
        check_walk(case)


# --- time ------------------------------------------------------------------------------------


def lenient(case: Case) -> None:
    data, size, beside = case
    fishplate.decode(data, bits=size, **beside, strict=False)


def strict(case: Case) -> None:
    data, size, beside = case
    ended(lambda: fishplate.decode(data, bits=size, **beside))


def seconds(run: Callable[[], object], times: int) -> float:
    start = process_time()
    for _ in range(times):
        run()
    return (process_time() - start) / times


def ratio(case: Case, decode: Callable[[Case], None], data: bytes) -> float:
    """Return how many benchmark messages one case takes, the smallest of several tries.

    Each try times the message right before and after, so that a slower moment meets both.
    """
    lowest = float("inf")
    for _ in range(7):
        before = seconds(lambda: fishplate.decode(data), 20)
        own = seconds(lambda: decode(case), 3)
        after = seconds(lambda: fishplate.decode(data), 20)
        lowest = min(lowest, own / min(before, after))
        if lowest < TIMES / 2:
            break
    return lowest


def slowest(cases: Iterator[Case], decode: Callable[[Case], None], keep: int) -> list[Case]:
    """Return the cases that took longest in one hasty measurement."""
    timed: list[tuple[float, int, Case]] = []
    for index, case in enumerate(cases):
        start = process_time()
        decode(case)
        timed.append((process_time() - start, index, case))
        if len(timed) > 20 * keep:
            timed = sorted(timed, reverse=True)[:keep]
    return [case for _, _, case in sorted(timed, reverse=True)[:keep]]


def allowed(case: Case, decode: Callable[[Case], None]) -> float:
    """Return the bound of a case made to hurt, a little above that of noise and damage.

    Lenient reading may also spend a third of the benchmark's message on every problem that it
    reports: four hundred packets that are all wrong are four hundred problems with a sentence
    each, and the time stays proportional to the frame.
    """
    most = 1.25 * TIMES
    if decode is strict:
        return most
    data, size, beside = case
    message = fishplate.decode(data, bits=size, **beside, strict=False)
    return most + len(message.problems) / 3


@pytest.mark.slow
@pytest.mark.parametrize("decode", [lenient, strict])
def test_no_frame_takes_more_than_twenty_times_the_benchmark(
    decode: Callable[[Case], None],
) -> None:
    value, size = encode_bits(workload.TREE)
    data = packed(value, size)
    gc.collect()
    gc.disable()  # a collection is the other objects' time, not the frame's
    try:
        made = [(case, allowed(case, decode)) for case in hostile()]
        found = slowest(map(noise, range(RANDOM)), decode, 30)
        found += slowest(map(damage, range(DAMAGED)), decode, 30)
        for case, most in [*made, *((case, TIMES) for case in found)]:
            times = ratio(case, decode, data)
            size = len(case[0])
            assert times <= most, f"{size} bytes as {case[2]}: {times:.1f} times {case[0].hex()}"
    finally:
        gc.enable()
