"""Whole frames: there and back, field rows, prefixes.

Clauses tested: SUBSET-026 issue 3.6.0, 8.4.1 to 8.4.4 (how telegrams, loop messages and radio
messages are composed; alike in issues 2.3.0, 3.3.0 and 4.0.0), 7.5.1.57 (L_PACKET counts the bits
of its packet, header included), 7.5.1.55 (L_MESSAGE counts bytes). Every edition is drawn.
"""

from __future__ import annotations

import json
from typing import TYPE_CHECKING, Any

import pytest
from hypothesis import given
from hypothesis import strategies as st

from fishplate.engine.walk import Cursor, Walk
from fishplate.errors import Truncated, path_text
from fishplate.frames import encode_bits
from fishplate.standard.editions import EDITIONS
from fishplate.standard.editions import edition as edition_of
from property.reading import (
    assert_rows_are_the_tree,
    assert_tiles,
    decoded,
    drawn,
    gathered,
    rows_of,
)
from property.trees import END_FLAG, HEADS, USUAL, VIRTUAL_COVER, Maker, book_of, said_of, seeded

if TYPE_CHECKING:
    from random import Random

    from fishplate import FieldRow
    from fishplate.standard.editions import Edition

    Tree = dict[str, Any]

FEW = range(150)
MANY = range(150, 3000)
LATER = [each for each in EDITIONS if each != USUAL]
PACKETS = [(each, *key) for each in EDITIONS for key in sorted(book_of(each).packets)]
MESSAGES = [(each, *key) for each in EDITIONS for key in sorted(book_of(each).messages)]


def check_valid(tree: Tree, value: int, size: int) -> None:
    said = said_of(tree)
    message = decoded(value, size, **said)
    again = message.tree()
    assert "problems" not in again
    assert (again["version"], again["issue"]) == (tree["version"], tree["issue"])
    assert again["header"].items() >= tree["header"].items()
    assert len(again["packets"]) == len(tree["packets"])
    for packet, authored in zip(again["packets"], tree["packets"], strict=True):
        assert {key: packet[key] for key in packet if key != "L_PACKET"} == authored
    assert again.get("filler") == tree.get("filler")
    assert encode_bits(message) == encode_bits(again) == (value, size)
    assert json.loads(json.dumps(again)) == again
    rows = rows_of(value, size, **said)
    assert_tiles(rows, value, size, message)
    assert_rows_are_the_tree(rows, message)


@pytest.mark.parametrize("seed", FEW)
def test_valid_frames_come_back(seed: int) -> None:
    check_valid(*drawn(seed))


@pytest.mark.parametrize("edition", LATER, ids=" ".join)
def test_valid_frames_of_every_edition_come_back(edition: Edition) -> None:
    for seed in FEW[:80]:
        check_valid(*drawn(seed, edition))


@pytest.mark.slow
@pytest.mark.parametrize("edition", EDITIONS, ids=" ".join)
def test_many_valid_frames_come_back(edition: Edition) -> None:
    for seed in MANY if edition == USUAL else MANY[:1000]:
        check_valid(*drawn(seed, edition))


@given(st.sampled_from(EDITIONS), st.randoms(use_true_random=False))
def test_drawn_frames_come_back(edition: Edition, random: Random) -> None:
    tree = Maker(random, edition=edition).frame()
    check_valid(tree, *encode_bits(tree))


@pytest.mark.parametrize(("edition", "direction", "number"), PACKETS)
def test_every_packet_comes_back_in_a_frame(edition: Edition, direction: str, number: int) -> None:
    # A packet that comes in two forms is met in both: the seeds draw either.
    for seed in range(4 if (direction, number) in book_of(edition).forms else 1):
        maker = Maker(seeded(f"{number} {seed}"), most=5, edition=edition)
        tree = maker.telegram("balise")
        tree["packets"] = [{"NID_PACKET": END_FLAG}]
        if direction == "to-track":
            tree = maker.message("to-track", 136)
            tree["packets"] = []
        if number != END_FLAG:
            tree["packets"].insert(0, maker.packet(direction, number))
        check_valid(tree, *encode_bits(tree))


@pytest.mark.parametrize("edition", EDITIONS, ids=" ".join)
def test_the_makers_draw_both_forms(edition: Edition) -> None:
    maker = Maker(seeded(0), edition=edition)
    for key, form in book_of(edition).forms.items():
        found = {maker.packet(*key).get("form") for _ in range(40)}
        assert found == ({form.version} if form.only else {None, form.version})


@pytest.mark.parametrize(("edition", "direction", "number"), MESSAGES)
def test_every_message_comes_back(edition: Edition, direction: str, number: int) -> None:
    for seed in range(4 if edition == USUAL else 2):
        tree = Maker(seeded(seed), edition=edition).message(direction, number)
        check_valid(tree, *encode_bits(tree))


# --- a version that is not said ----------------------------------------------------------------


def check_inferred(seed: int, edition: Edition) -> bool:
    """Check that an inferred version reads as it does when it is said; False if none is.

    The version a message was drawn of is among those that fit, unless its packets may only be used
    by a later one, or come in another form, which is not tried.
    """
    random = seeded(seed)
    maker = Maker(random, edition=edition)
    tree = maker.message(*random.choice(sorted(book_of(edition).messages)))
    value, size = encode_bits(tree)
    message = decoded(value, size, medium="radio", strict=False)
    assert encode_bits(message) == (value, size)
    if message.version_from != "inferred":
        assert message.version == USUAL.version
        return False
    assert message.version == message.fitting[0]
    for version in message.fitting:
        said = decoded(value, size, medium="radio", direction=message.direction, version=version)
        assert not said.problems
        if version == message.version:
            assert (said.header, said.packets) == (message.header, message.packets)
            assert (said.issue, said.padding) == (message.issue, message.padding)
    rows = rows_of(value, size, medium="radio")
    assert_tiles(rows, value, size, message)
    assert_rows_are_the_tree(rows, message)
    declared = book_of(edition)
    keys = [(message.direction or "", each["NID_PACKET"]) for each in tree["packets"]]
    later = any(declared.packets[key].since not in ("", edition.version) for key in keys)
    told_by_length = any("form" in each for each in tree["packets"])
    if edition == edition_of(edition.version) and not later and not told_by_length:
        assert edition.version in message.fitting
    return True


@pytest.mark.parametrize("edition", LATER, ids=" ".join)
def test_an_inferred_version_reads_as_when_it_is_said(edition: Edition) -> None:
    assert sum(check_inferred(seed, edition) for seed in range(40)) > 1


@pytest.mark.slow
@pytest.mark.parametrize("edition", LATER, ids=" ".join)
def test_many_inferred_versions_read_as_when_they_are_said(edition: Edition) -> None:
    assert sum(check_inferred(seed, edition) for seed in range(40, 1000)) > 30


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


def check_prefixes(seed: int, cuts: int | None = None, edition: Edition = USUAL) -> None:
    """Check prefixes of one frame: all of them, or `cuts` of them."""
    tree, value, size = drawn(seed, edition)
    given = said_of(tree)
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
        whole = [row for row in rows if row.offset + row.width <= cut]
        at = next(row.path[:2] for row in rows if cut < row.offset + row.width)
        forms = book_of(edition).forms
        number = tree["packets"][at[1]]["NID_PACKET"] if at[0] == "packets" else None
        if (tree["direction"], number) in forms:
            # Which form it is can be told only when all of it is there.
            seen, whole = ([row for row in each if row.path[:2] != at] for each in (seen, whole))
        assert seen == whole, cut
        lenient = decoded(part, cut, **given, strict=False)
        assert lenient.problems[0].kind == "truncated"
        assert encode_bits(lenient) == (part, cut)


@pytest.mark.parametrize("seed", range(60))
def test_proper_prefixes_are_truncated(seed: int) -> None:
    check_prefixes(seed, cuts=80)


@pytest.mark.parametrize("edition", LATER, ids=" ".join)
def test_proper_prefixes_of_every_edition_are_truncated(edition: Edition) -> None:
    for seed in range(12):
        check_prefixes(seed, cuts=40, edition=edition)


@pytest.mark.slow
@pytest.mark.parametrize("edition", LATER, ids=" ".join)
def test_more_proper_prefixes_of_every_edition_are_truncated(edition: Edition) -> None:
    for seed in range(12, 36):
        check_prefixes(seed, cuts=100, edition=edition)


@pytest.mark.slow
@pytest.mark.parametrize("seed", range(60, 160))
def test_every_proper_prefix_is_truncated(seed: int) -> None:
    check_prefixes(seed)


@pytest.mark.parametrize(("edition", "direction", "number"), PACKETS)
def test_a_packet_cut_by_its_length_names_the_field_at_the_cut(
    edition: Edition, direction: str, number: int
) -> None:
    # L_PACKET shorter than the layout: the first field without bits is named, wherever in nested
    # sets it stands. The walk over the packet alone says which it is.
    book = book_of(edition)
    if number == END_FLAG or (direction, number) == ("to-train", VIRTUAL_COVER):
        return  # these two have no L_PACKET
    if (direction, number) in book.forms:
        return  # cut, it may still be another form; tests/unit/test_forms.py asks what it is then
    nodes = book.packets[direction, number].nodes
    head = HEADS[direction]
    for seed in range(12 if edition == USUAL else 4):
        random = seeded(f"{direction} {number} {seed}")
        maker = Maker(random, most=31 if seed % 3 == 0 else 4, edition=edition)
        packet = maker.packet(direction, number)
        tree = _carrying(edition, direction, packet)
        value, size = encode_bits(tree)
        start = 50 if direction == "to-train" else 74
        width = maker.width_of(packet, direction)
        layout = width - packet.get("data", {"bits": 0})["bits"]
        if layout == head:
            return  # nothing to cut
        length = random.randrange(head, layout)
        value = value & ~(8191 << size - start - head) | length << size - start - head
        part = value >> size - start - length & (1 << length) - 1
        with pytest.raises(Truncated) as cut:
            Walk(book.variables, Cursor(part, length)).scope(nodes, (), {})
        message = decoded(value, size, **said_of(tree), strict=False)
        assert message.problems[0].path == ("packets", 0, "L_PACKET")
        assert f": {path_text(cut.value.path)} has no bits left" in message.problems[0].message


def _carrying(edition: Edition, direction: str, packet: Tree) -> Tree:
    maker = Maker(seeded(0), edition=edition)
    if direction == "to-train":
        tree = maker.telegram("balise")
        return tree | {"packets": [packet, {"NID_PACKET": END_FLAG}]}
    return maker.message("to-track", 136) | {"packets": [packet]}
