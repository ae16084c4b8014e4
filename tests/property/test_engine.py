"""Generated readers and writers against the walk and the spelling, on every layout.

Clauses tested: SUBSET-026 issues 2.3.0, 3.3.0, 3.6.0 and 4.0.0, 7.4.2 and 7.4.3 (packets), 8.4
(headers), 8.6 and 8.7 (radio messages), and issue 3.6.0, 6.5.1.5 and 6.5.1.6 (X = 1), as the
registries declare them. Each set of layouts is used with the first version that has it. Both
engines read the same declaration, so this holds them to each other; the checks against the
published tables are in ``tests/oracle``.
"""

from __future__ import annotations

import copy
from typing import TYPE_CHECKING, Any, NamedTuple

import pytest
from hypothesis import given
from hypothesis import strategies as st

from fishplate.engine.runtime import MISFITS, Codec, codec
from fishplate.engine.spell import Spelling
from fishplate.engine.walk import Cursor, Walk
from fishplate.errors import EncodeError, Truncated
from fishplate.standard.editions import EDITIONS
from property.trees import COMPUTED, HEADS, USUAL, Maker, book_of, seeded

if TYPE_CHECKING:
    from collections.abc import Callable, Iterator, Sequence
    from random import Random

    from fishplate.standard import Registry
    from fishplate.standard.editions import Edition
    from fishplate.standard.vocabulary import Node

    Tree = dict[str, Any]


class Layout(NamedTuple):
    """One layout of an edition: a packet or message by direction, a header by medium."""

    edition: Edition
    kind: str
    first: str
    number: int

    @property
    def book(self) -> Registry:
        """The registry that declares it."""
        return book_of(self.edition)

    @property
    def codec(self) -> Codec:
        """The readers and writers that are generated from it."""
        return codec(self.edition.version, self.edition.issue)

    @property
    def nodes(self) -> Sequence[Node]:
        """What is declared."""
        if self.kind == "header":
            return self.book.headers[self.first].nodes
        if self.kind == "packet":
            return self.book.packets[self.first, self.number].nodes
        return self.book.messages[self.first, self.number].nodes

    @property
    def read(self) -> Callable[..., Any]:
        """The generated reader."""
        if self.kind == "header":
            return self.codec.read_header[self.first]
        readers = self.codec.read_packet if self.kind == "packet" else self.codec.read_message
        return readers[self.first][self.number]

    @property
    def write(self) -> Callable[..., Any]:
        """The generated writer."""
        if self.kind == "header":
            return self.codec.write_header[self.first]
        writers = self.codec.write_packet if self.kind == "packet" else self.codec.write_message
        return writers[self.first][self.number]

    @property
    def measured(self) -> bool:
        """Whether it is a packet with L_PACKET, which its reader does not read again."""
        return self.kind == "packet" and self.number not in self.codec.unmeasured[self.first]

    def tree(self, random: Random, most: int = 3) -> Tree:
        """Draw a tree of it, lengths left out."""
        maker = Maker(random, most, self.edition)
        if self.kind == "packet":
            tree = maker.packet(self.first, self.number)
            while "form" in tree:
                tree = maker.packet(self.first, self.number)
            return tree
        frame = maker.telegram(self.first) if self.kind == "header" else None
        header: Tree = (frame or maker.message(self.first, self.number))["header"]
        return header

    def __str__(self) -> str:
        return f"{self.edition.layouts} {self.kind} {self.first} {self.number}"


def layouts_of(edition: Edition) -> Iterator[Layout]:
    """Yield all layouts that an edition has readers for."""
    book = book_of(edition)
    for key in sorted(book.packets):
        if key not in book.forms or not book.forms[key].only:
            yield Layout(edition, "packet", *key)
    for key in sorted(book.messages):
        yield Layout(edition, "message", *key)
    for medium in book.headers:
        yield Layout(edition, "header", medium, 0)


EVERY = {each.layouts: each for each in reversed(EDITIONS)}
LAYOUTS = [layout for each in EVERY.values() for layout in layouts_of(each)]
MANY_SEEDS = range(25, 400)


def seeds_of(edition: Edition) -> range:
    """Return as many seeds as an edition gets by default: the usual one most."""
    return range(25 if edition == USUAL else 10)


def test_every_set_of_layouts_is_met() -> None:
    assert {each.edition.layouts for each in LAYOUTS} == {each.layouts for each in EDITIONS}
    assert EVERY["x1_chapter6"].version == "1.0"


def spelled(layout: Layout, tree: Tree) -> tuple[int, int]:
    """Return value and width as the spelling writes them."""
    spelling = Spelling(layout.book.variables)
    spelling.scope(layout.nodes, tree, (), {})
    value = width = 0
    for part, bits in spelling.pieces:
        assert 0 <= part < 1 << bits
        value, width = value << bits | part, width + bits
    return value, width


def walked(layout: Layout, value: int, width: int) -> tuple[Tree, int, Cursor]:
    """Return the tree and the bits left as the walk reads them."""
    cursor = Cursor(value, width)
    tree = Walk(layout.book.variables, cursor).scope(layout.nodes, (), {})
    return tree, cursor.left, cursor


def with_length(layout: Layout, value: int, width: int) -> int:
    """Fill in L_PACKET, which a reader of a packet does not read again."""
    return value | width << width - HEADS[layout.first] if layout.measured else value


def attempt(
    function: Callable[..., Any],
    refusals: type[Exception] | tuple[type[Exception], ...],
    *arguments: object,
) -> Any:
    """Return what a function returns, None where it refuses."""
    try:
        return function(*arguments)
    except refusals:
        return None


def check_layout(layout: Layout, seeds: range) -> None:
    read, write = layout.read, layout.write
    for seed in seeds:
        tree = layout.tree(seeded(seed), most=31 if seed % 5 == 4 else 3)
        value, width = write(tree)
        assert (value, width) == spelled(layout, tree)
        value = with_length(layout, value, width)
        again, left, cursor = walked(layout, value, width)
        assert read(value, width) == (again, left)
        assert left == 0
        stored = {key: each for key, each in again.items() if key not in COMPUTED}
        assert stored == tree
        at = 0
        for row in cursor.rows:
            assert row.offset == at
            at += row.width
        assert at == width


@pytest.mark.parametrize("layout", LAYOUTS, ids=str)
def test_generated_code_agrees_with_walk_and_spelling(layout: Layout) -> None:
    check_layout(layout, seeds_of(layout.edition))


@pytest.mark.slow
@pytest.mark.parametrize("layout", LAYOUTS, ids=str)
def test_generated_code_agrees_on_many_trees(layout: Layout) -> None:
    # What another edition has as the usual one does is the same function: fewer trees will do.
    check_layout(layout, MANY_SEEDS if layout.edition == USUAL else MANY_SEEDS[:100])


@given(st.sampled_from(LAYOUTS), st.randoms(use_true_random=False))
def test_generated_code_agrees_on_drawn_trees(layout: Layout, random: Random) -> None:
    tree = layout.tree(random)
    value, width = layout.write(tree)
    assert (value, width) == spelled(layout, tree)
    value = with_length(layout, value, width)
    again, left, _ = walked(layout, value, width)
    assert layout.read(value, width) == (again, left)


@pytest.mark.parametrize("layout", LAYOUTS, ids=str)
def test_readers_fail_exactly_where_the_walk_does(layout: Layout) -> None:
    # Any bits behind the identifier, any length: the reader gives what the walk gives, or both
    # run out of bits. A packet of fixed width is only read when all of it is there.
    kind, first, number = layout[1:]
    head = HEADS[first] if kind == "packet" else 8
    random = seeded(f"{kind} {first} {number}")
    for _ in range(60 if layout.edition == USUAL else 25):
        width = head + random.choice((random.randrange(40), random.randrange(600)))
        if kind == "packet" and not layout.measured:
            width = max(width, layout.codec.unmeasured[first][number])
        value = random.getrandbits(width)
        if random.randrange(3) == 0:
            value &= random.getrandbits(width) & random.getrandbits(width)
        if kind != "header":
            value = value & (1 << width - 8) - 1 | number << width - 8
        if layout.measured:
            length = width - head
            value = value & ~(8191 << length) | width << length
        assert attempt(layout.read, ValueError, value, width) == attempt(
            lambda *bits: walked(*bits)[:2], Truncated, layout, value, width
        )


def faults(tree: Tree, random: Random) -> Iterator[Tree]:
    """Yield copies of a tree, each with one thing wrong (or merely unusual)."""
    for _ in range(12):
        broken = copy.deepcopy(tree)
        scopes = list(_scopes(broken))
        scope = random.choice(scopes)
        key = random.choice([*scope, "NID_OTHER"])
        change = random.randrange(5)
        if change == 0:
            scope.pop(key, None)
        elif change == 1:
            scope[random.choice(("NID_OTHER", "T_SECTIONTIMER", "surplus", "X_TEXT"))] = 0
        elif isinstance(scope.get(key), list):
            scope[key] = random.choice(
                ([], scope[key] * 40, {}, "", "text", None, 3, [None], [{}], tuple(scope[key]))
            )
        else:
            wrong: tuple[object, ...] = (None, "", "12", 1.0, 1.5, b"", [], {}, True, -1, 1 << 64)
            scope[key] = random.choice((*wrong, 1 << 70, "€", "0x", "F" * 17, "x" * 300))
        yield broken


def _scopes(tree: Tree) -> Iterator[Tree]:
    yield tree
    for each in tree.values():
        for item in each if isinstance(each, list) else [each]:
            if isinstance(item, dict):
                yield from _scopes(item)


@pytest.mark.parametrize("layout", LAYOUTS, ids=str)
def test_writers_refuse_exactly_what_the_spelling_refuses(layout: Layout) -> None:
    number, write = layout.number, layout.write
    for seed in range(8 if layout.edition == USUAL else 4):
        random = seeded(seed)
        tree = layout.tree(random)
        for broken in faults(tree, random):
            if broken.get("NID_PACKET", number) != number:
                continue  # the table of writers is asked by number
            if broken.get("NID_MESSAGE", number) != number:
                continue
            expected = attempt(spelled, EncodeError, layout, broken)
            assert attempt(write, (*MISFITS, EncodeError), broken) == expected, broken
