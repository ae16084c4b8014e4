"""Whole frames: there and back, field rows, prefixes, any bits.

Clauses tested: SUBSET-026 issue 3.6.0, 8.4.1 to 8.4.4 (how telegrams, loop messages and radio
messages are composed), 7.5.1.57 (L_PACKET counts the bits of its packet, header included),
7.5.1.55 (L_MESSAGE counts bytes). What the library promises about broken input is its own
contract, said in the documentation.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

import pytest
from hypothesis import given
from hypothesis import strategies as st

import fishplate
from fishplate.engine.walk import Cursor, Walk
from fishplate.errors import DecodeError, FishplateError, Truncated, path_text
from fishplate.frames import encode_bits
from property.trees import (
    END_FLAG,
    HEADS,
    MESSAGES,
    PACKETS,
    REGISTRY,
    VIRTUAL_COVER,
    Maker,
    seeded,
    width_of,
)

if TYPE_CHECKING:
    from collections.abc import Iterable
    from random import Random

    from fishplate import FieldRow, Message

    Tree = dict[str, Any]

MEDIA = ("balise", "loop", "radio", None)
FEW = range(150)
MANY = range(150, 3000)


def packed(value: int, size: int) -> bytes:
    """Return bits left aligned in whole bytes."""
    return (value << -size % 8).to_bytes((size + 7) // 8, "big")


def decoded(value: int, size: int, **given: Any) -> Message:
    return fishplate.decode(packed(value, size), bits=size, **given)


def rows_of(value: int, size: int, **given: Any) -> list[FieldRow]:
    return list(fishplate.walk(packed(value, size), bits=size, **given))


def gathered(value: int, size: int, **given: Any) -> tuple[list[FieldRow], DecodeError | None]:
    """Walk strictly; return the rows there are, and the error at their end."""
    rows: list[FieldRow] = []
    try:
        rows.extend(fishplate.walk(packed(value, size), bits=size, **given))
    except DecodeError as error:
        return rows, error
    return rows, None


def drawn(seed: int) -> tuple[Tree, int, int]:
    """Draw a frame and encode it."""
    maker = Maker(seeded(seed), most=31 if seed % 10 == 9 else 3)
    tree = maker.frame()
    return (tree, *encode_bits(tree))


def assert_tiles(rows: Iterable[FieldRow], value: int, size: int) -> None:
    """Assert that rows cover every bit once, in order, and say what stands there."""
    at = 0
    for row in rows:
        assert row.offset == at
        assert row.width > 0
        at += row.width
        bits = value >> size - at & (1 << row.width) - 1
        if row.variable is None:
            assert row.raw == packed(bits, row.width).hex().upper()
        elif row.variable == "X_TEXT":
            assert row.raw == bits.to_bytes(row.width // 8, "big").decode("latin-1")
        else:
            signed = REGISTRY.variables[row.variable].coding == "signed"
            minus = signed and bits >> row.width - 1
            assert row.raw == (bits - (1 << row.width) if minus else bits)
            assert row.width == REGISTRY.variables[row.variable].bits
    assert at == size


def stored(tree: Any, path: tuple[str | int, ...]) -> Any:
    for step in path:
        tree = tree[step]
    return tree


def broken(tree: Tree, path: tuple[str | int, ...]) -> bool:
    """Tell whether a row lies in what the tree keeps as unexplained bits.

    The rows there show the fields before the break, which the tree does not hold.
    """
    if path[0] == "packets":
        return "packets" not in tree or "content" in tree["packets"][path[1]]
    return path[0] in ("header", "content") and "content" in tree


def assert_rows_are_the_tree(rows: Iterable[FieldRow], tree: Tree) -> None:
    """Assert that each row has its place in the tree, and that it holds what stands there."""
    for row in rows:
        if row.variable in ("N_ITER", "L_TEXT") or broken(tree, row.path):
            continue
        value = stored(tree, row.path)
        if row.variable is None:
            assert value == {"bits": row.width, "hex": row.raw}
        elif REGISTRY.variables[row.variable].coding == "digits":
            assert value == f"{row.raw:0{row.width // 4}X}".rstrip("F")
        else:
            assert value == row.raw


def check_valid(tree: Tree, value: int, size: int) -> None:
    given = {"medium": tree["medium"], "direction": tree["direction"]}
    message = decoded(value, size, **given)
    again = message.tree()
    assert "problems" not in again
    assert again["header"].items() >= tree["header"].items()
    assert len(again["packets"]) == len(tree["packets"])
    for packet, authored in zip(again["packets"], tree["packets"], strict=True):
        assert {key: packet[key] for key in packet if key != "L_PACKET"} == authored
    assert again.get("filler") == tree.get("filler")
    assert encode_bits(message) == encode_bits(again) == (value, size)
    rows = rows_of(value, size, **given)
    assert_tiles(rows, value, size)
    assert_rows_are_the_tree(rows, again)


@pytest.mark.parametrize("seed", FEW)
def test_valid_frames_come_back(seed: int) -> None:
    check_valid(*drawn(seed))


@pytest.mark.slow
def test_many_valid_frames_come_back() -> None:
    for seed in MANY:
        check_valid(*drawn(seed))


@given(st.randoms(use_true_random=False))
def test_drawn_frames_come_back(random: Random) -> None:
    tree = Maker(random).frame()
    check_valid(tree, *encode_bits(tree))


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_every_packet_comes_back_in_a_frame(direction: str, number: int) -> None:
    maker = Maker(seeded(number), most=5)
    tree = maker.telegram("balise")
    tree["packets"] = [{"NID_PACKET": END_FLAG}]
    if direction == "to-track":
        tree = maker.message("to-track", 136)
        tree["packets"] = []
    if number != END_FLAG:
        tree["packets"].insert(0, maker.packet(direction, number))
    check_valid(tree, *encode_bits(tree))


@pytest.mark.parametrize(("direction", "number"), MESSAGES)
def test_every_message_comes_back(direction: str, number: int) -> None:
    for seed in range(4):
        tree = Maker(seeded(seed)).message(direction, number)
        check_valid(tree, *encode_bits(tree))


# --- proper prefixes ------------------------------------------------------------------------


def end_of_content(rows: list[FieldRow], size: int) -> int:
    """Return where the last bit stands that a prefix may not lose: the end flag's in telegrams."""
    return rows[-1].offset if rows[-1].path == ("filler",) else size


def expected_missing(rows: list[FieldRow], cut: int) -> int:
    """Return the bits missing after `cut`, worked out from the rows of the whole frame.

    To the end of the packet once its L_PACKET is read, else to the end of the field; a cut
    between two fields counts as one in the second.
    """
    at = next(row for row in rows if row.offset <= cut < row.offset + row.width)
    if at.path[0] == "packets":
        inside = [row for row in rows if row.path[:2] == at.path[:2]]
        if any(row.variable == "L_PACKET" and row.offset + row.width <= cut for row in inside):
            return inside[-1].offset + inside[-1].width - cut
    return at.offset + at.width - cut


def check_prefixes(seed: int, cuts: int | None = None) -> None:
    """Check prefixes of one frame: all of them, or `cuts` of them."""
    tree, value, size = drawn(seed)
    given = {"medium": tree["medium"], "direction": tree["direction"]}
    rows = rows_of(value, size, **given)
    end = end_of_content(rows, size)
    every = range(end)
    for cut in seeded(seed).sample(every, min(cuts, end)) if cuts else every:
        part = value >> size - cut
        with pytest.raises(Truncated) as caught:
            decoded(part, cut, **given)
        assert caught.value.missing == expected_missing(rows, cut), cut
        assert caught.value.bit is not None
        assert caught.value.bit <= cut
        seen, error = gathered(part, cut, **given)
        assert str(error) == str(caught.value)
        assert seen == [row for row in rows if row.offset + row.width <= cut], cut
        lenient = decoded(part, cut, **given, strict=False)
        assert lenient.problems[0].kind == "truncated"
        assert encode_bits(lenient) == (part, cut)


@pytest.mark.parametrize("seed", range(60))
def test_proper_prefixes_are_truncated(seed: int) -> None:
    check_prefixes(seed, cuts=80)


@pytest.mark.slow
@pytest.mark.parametrize("seed", range(60, 160))
def test_every_proper_prefix_is_truncated(seed: int) -> None:
    check_prefixes(seed)


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_a_packet_cut_by_its_length_names_the_field_at_the_cut(direction: str, number: int) -> None:
    # L_PACKET shorter than the layout: the first field without bits is named, wherever in nested
    # sets it stands. The walk over the packet alone says which it is.
    nodes = REGISTRY.packets[direction, number].nodes
    if number == END_FLAG or (direction, number) == ("to-train", VIRTUAL_COVER):
        return  # these two have no L_PACKET
    head = HEADS[direction]
    for seed in range(12):
        random = seeded(f"{direction} {number} {seed}")
        packet = Maker(random, most=31 if seed % 3 == 0 else 4).packet(direction, number)
        value, size = encode_bits(_carrying(direction, packet))
        start = 50 if direction == "to-train" else 74
        width = width_of(packet, direction)
        layout = width - packet.get("data", {"bits": 0})["bits"]
        if layout == head:
            return  # nothing to cut
        length = random.randrange(head, layout)
        value = value & ~(8191 << size - start - head) | length << size - start - head
        part = value >> size - start - length & (1 << length) - 1
        with pytest.raises(Truncated) as cut:
            Walk(REGISTRY.variables, Cursor(part, length)).scope(nodes, (), {})
        medium = "balise" if direction == "to-train" else "radio"
        message = decoded(value, size, medium=medium, direction=direction, strict=False)
        assert message.problems[0].path == ("packets", 0, "L_PACKET")
        assert f": {path_text(cut.value.path)} has no bits left" in message.problems[0].message


def _carrying(direction: str, packet: Tree) -> Tree:
    maker = Maker(seeded(0))
    if direction == "to-train":
        tree = maker.telegram("balise")
        return tree | {"packets": [packet, {"NID_PACKET": END_FLAG}]}
    return maker.message("to-track", 136) | {"packets": [packet]}


# --- any bits -------------------------------------------------------------------------------


def check_any(value: int, size: int, medium: str | None, direction: str | None = None) -> None:
    """Check all that holds for every string of bits."""
    given = {"medium": medium, "direction": direction}
    lenient = decoded(value, size, **given, strict=False)
    assert encode_bits(lenient) == encode_bits(lenient.tree()) == (value, size)
    rows = rows_of(value, size, **given, strict=False)
    assert_tiles(rows, value, size)
    assert_rows_are_the_tree(rows, lenient.tree())
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


@given(st.binary(max_size=200), st.integers(0, 7), st.sampled_from(MEDIA))
def test_any_bits_are_read_and_written_back(data: bytes, short: int, medium: str | None) -> None:
    size = max(0, 8 * len(data) - short)
    check_any(int.from_bytes(data, "big") >> 8 * len(data) - size, size, medium)


@given(
    st.sampled_from((0x90, 0x91, 0xA0, 0xA1, 0xA2, 0xB0)),
    st.binary(min_size=8, max_size=200),
    st.sampled_from(("balise", "loop", None)),
)
def test_any_bits_behind_a_telegrams_start(start: int, data: bytes, medium: str | None) -> None:
    check_any(start << 8 * len(data) | int.from_bytes(data, "big"), 8 * len(data) + 8, medium)


@given(st.integers(0, 255), st.binary(min_size=3, max_size=200), st.booleans())
def test_any_bits_behind_a_messages_start(number: int, data: bytes, fits: bool) -> None:  # noqa: FBT001
    size = 8 * len(data) + 8
    value = number << size - 8 | int.from_bytes(data, "big")
    if fits:
        value = value & ~(1023 << size - 18) | size // 8 << size - 18
    for medium in ("radio", None):
        check_any(value, size, medium)
    for direction in ("to-train", "to-track"):
        check_any(value, size, "radio", direction)


def mutated(seed: int) -> tuple[int, int, Tree]:
    """Draw a valid frame and damage it: flipped, cut, inserted, added and repeated bits."""
    tree, value, size = drawn(seed)
    random = seeded(f"damage {seed}")
    for _ in range(random.choice((1, 1, 1, 2, 5))):
        at = random.randrange(size + 1)
        low = value & (1 << size - at) - 1
        high = value >> size - at
        kind = random.randrange(5)
        if kind == 0 and at < size:
            value ^= 1 << size - at - 1
        elif kind == 1:
            value, size = high, at
        elif kind == 2:
            extra = random.randrange(1, 40)
            value = (high << extra | random.getrandbits(extra)) << size - at | low
            size += extra
        elif kind == 3:
            extra = random.randrange(1, 70)
            value = value << extra | random.choice((0, (1 << extra) - 1, random.getrandbits(extra)))
            size += extra
        elif at:
            value = high << size - at << at | low << at | high
            size += at
        if not size:
            break
    return value, size, tree


@pytest.mark.parametrize("seed", range(200))
def test_damaged_frames_are_read_and_written_back(seed: int) -> None:
    value, size, tree = mutated(seed)
    check_any(value, size, tree["medium"], tree["direction"])
    check_any(value, size, None)


@pytest.mark.slow
def test_many_damaged_frames_are_read_and_written_back() -> None:
    for seed in range(200, 4000):
        value, size, tree = mutated(seed)
        check_any(value, size, tree["medium"], tree["direction"])
        check_any(value, size, None)


def test_errors_are_ours_for_odd_sizes() -> None:
    for size in (-1, 17, 1 << 40):
        with pytest.raises(FishplateError):
            fishplate.decode(b"\x90\x00", bits=size)
