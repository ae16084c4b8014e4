"""What the properties of whole frames share: drawing, damaging, reading them and walking them."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

import fishplate
from fishplate.errors import DecodeError
from fishplate.frames import encode_bits
from fishplate.standard import registry
from property.trees import USUAL, Maker, seeded

if TYPE_CHECKING:
    from collections.abc import Iterable

    from fishplate import FieldRow, Message
    from fishplate.standard.editions import Edition
    from fishplate.standard.vocabulary import Variable

    Tree = dict[str, Any]


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


def drawn(seed: int, edition: Edition = USUAL) -> tuple[Tree, int, int]:
    """Draw a frame and encode it."""
    tree = Maker(seeded(seed), most=31 if seed % 10 == 9 else 3, edition=edition).frame()
    return (tree, *encode_bits(tree))


def variable_of(row: FieldRow, message: Message) -> Variable:
    """Return the variable of a row, as the layouts declare it that its packet came in."""
    book = message.layouts.registry if message.layouts else registry()
    if row.path[0] == "packets" and int(row.path[1]) < len(message.packets):
        packet = message.packets[int(row.path[1])]
        book = registry(packet["form"]) if "form" in packet else book
    return book.variables[row.variable or ""]


def assert_tiles(rows: Iterable[FieldRow], value: int, size: int, message: Message) -> None:
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
            variable = variable_of(row, message)
            minus = variable.coding == "signed" and bits >> row.width - 1
            assert row.raw == (bits - (1 << row.width) if minus else bits)
            assert row.width == variable.bits
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


def assert_rows_are_the_tree(rows: Iterable[FieldRow], message: Message) -> None:
    """Assert that each row has its place in the tree, and that it holds what stands there."""
    tree = message.tree()
    for row in rows:
        if row.variable in ("N_ITER", "L_TEXT") or broken(tree, row.path):
            continue
        value = stored(tree, row.path)
        if row.variable is None:
            assert value == {"bits": row.width, "hex": row.raw}
        elif variable_of(row, message).coding == "digits":
            assert value == f"{row.raw:0{row.width // 4}X}".rstrip("F")
        else:
            assert value == row.raw


def mutated(seed: int, edition: Edition = USUAL) -> tuple[int, int, Tree]:
    """Draw a valid frame and damage it: flipped, cut, inserted, added and repeated bits."""
    tree, value, size = drawn(seed, edition)
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
