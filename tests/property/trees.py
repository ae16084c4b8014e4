"""Random trees of everything the registry declares, drawn node by node from its layouts.

The trees are valid bit for bit and mean nothing: any code may stand in any variable. `random`
may be a seeded `random.Random` or the one hypothesis hands out. Every edition of the standard has
its own trees; packets that may come as another version lays them out come in both forms.
"""

from __future__ import annotations

from random import Random
from typing import TYPE_CHECKING, Any

from fishplate.engine.spell import Spelling
from fishplate.engine.walk import Cursor, Walk
from fishplate.errors import Truncated
from fishplate.standard import registry
from fishplate.standard.editions import EDITIONS, Edition, edition
from fishplate.standard.vocabulary import (
    Eq,
    Field,
    Group,
    In,
    Ne,
    Opaque,
    Repeat,
    Series,
    Text,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Sequence

    from fishplate.standard import Registry
    from fishplate.standard.vocabulary import Condition, Node

Tree = dict[str, Any]

USUAL = EDITIONS[0]
REGISTRY = registry(USUAL.version, USUAL.issue)
END_FLAG = 255
VIRTUAL_COVER = 0
LONGEST_PACKET = 8191
LONGEST_MESSAGE = 1023
HEADS = {"to-train": 23, "to-track": 21}
"""NID_PACKET 8, Q_DIR 2 (to the train only), L_PACKET 13 (SUBSET-026 7.4.2 and 7.4.3)."""

COMPUTED = ("L_PACKET", "L_MESSAGE")


def seeded(seed: object) -> Random:
    """Return a source of random numbers that always gives the same ones."""
    return Random(str(seed))  # noqa: S311  a seed is a test case here, not a secret


def true_of(condition: Condition, codes: Tree) -> bool:
    """Tell whether a condition holds (written again here, the engine has its own)."""
    if isinstance(condition, Eq):
        return bool(codes[condition.variable] == condition.code)
    if isinstance(condition, Ne):
        return bool(codes[condition.variable] != condition.code)
    assert isinstance(condition, In)
    return codes[condition.variable] in condition.codes


def book_of(each: Edition) -> Registry:
    """Return the registry of an edition."""
    return registry(each.version, each.issue)


def said_of(tree: Tree) -> dict[str, str]:
    """Return what has to be said beside the bits of a tree: nothing that they say themselves."""
    said = {"medium": tree["medium"], "direction": tree["direction"]}
    version, issue = tree["version"], tree["issue"]
    if tree["medium"] == "radio" and version != USUAL.version:
        said["version"] = version
    usual = edition(version)
    if usual is None or usual.issue != issue:
        said["issue"] = issue
    return said


class Maker:
    """Draws trees of one edition; `most` bounds N_ITER (31 makes the largest packets)."""

    def __init__(self, random: Random, most: int = 3, edition: Edition = USUAL) -> None:
        self.random = random
        self.most = most
        self.edition = edition
        self.book = book_of(edition)
        self.codes = self.book

    def code(self, name: str) -> int | str:
        """Draw a code: often one at the edges of the range."""
        variable = self.codes.variables[name]
        bits = variable.bits
        if variable.coding == "digits":
            count = self.random.randint(0, bits // 4)
            return "".join(self.random.choice("0123456789") for _ in range(count))
        low = -(1 << bits - 1) if variable.coding == "signed" else 0
        edges = (0, 1, (1 << bits - 1) - 1, 1 << bits - 1, (1 << bits) - 1)
        if self.random.random() < 0.3:
            return low + self.random.choice(edges)
        return low + self.random.randrange(1 << bits)

    def flag(self, name: str, codes: Sequence[int]) -> int | str:
        """Draw a code that a condition asks about: mostly one of those it names."""
        if self.random.randrange(4):
            return self.random.choice(codes)
        return self.code(name)

    def blob(self, bits: int) -> Tree:
        """Draw unexplained bits, as a tree keeps them."""
        value = self.random.randrange(1 << bits) << -bits % 8
        return {"bits": bits, "hex": value.to_bytes((bits + 7) // 8, "big").hex().upper()}

    def scope(self, nodes: Sequence[Node], outer: Tree | None = None) -> Tree:
        """Draw one scope of a layout."""
        tree: Tree = {}
        self._nodes(nodes, tree, dict(outer or {}), _asked(nodes))
        return tree

    def _nodes(
        self, nodes: Sequence[Node], tree: Tree, codes: Tree, asked: dict[str, list[int]]
    ) -> None:
        for node in nodes:
            match node:
                case Field():
                    name = node.variable
                    code = self.flag(name, asked[name]) if name in asked else self.code(name)
                    tree[node.name] = codes[name] = code
                case When():
                    if true_of(node.condition, codes):
                        self._nodes(node.nodes, tree, codes, asked)
                case Group():
                    tree[node.name] = self.scope(node.nodes, codes)
                case Series() | Repeat():
                    count = self._count() + isinstance(node, Series)
                    tree[node.name] = [self.scope(node.nodes, codes) for _ in range(count)]
                case Text():
                    most = (1 << self.codes.variables[node.length].bits) - 1
                    length = min(most, self.random.choice((0, 1, 5, 20, 10 * self.most, most)))
                    letters = [chr(self.random.randrange(256)) for _ in range(length)]
                    tree[node.element] = "".join(letters)
                case Opaque():
                    tree[node.name] = self.blob(self.random.choice((0, 1, 7, 8, 64, 133)))

    def _count(self) -> int:
        return self.random.choice((0, 0, 1, 1, 2, self.most))

    def packet(self, direction: str, number: int) -> Tree:
        """Draw a packet without L_PACKET, which the writer computes."""
        form = self.book.forms.get((direction, number))
        if form and form.only:
            return self._packet(registry(form.version), direction, number) | {"form": form.version}
        if form and self.random.randrange(2):
            tree = self._packet(registry(form.version), direction, number)
            if not self._fits_own_layout(registry(form.version), tree, direction):
                return tree | {"form": form.version}
        return self._packet(self.book, direction, number)

    def _packet(self, book: Registry, direction: str, number: int) -> Tree:
        self.codes = book
        try:
            while True:
                tree = self.scope(book.packets[direction, number].nodes)
                tree["NID_PACKET"] = number
                tree.pop("L_PACKET", None)
                if width_of(tree, direction, book) <= LONGEST_PACKET:
                    return tree
                self.most = 1
        finally:
            self.codes = self.book

    def _fits_own_layout(self, book: Registry, tree: Tree, direction: str) -> bool:
        """Tell whether the bits of another form may as well be the version's own."""
        nodes = book.packets[direction, tree["NID_PACKET"]].nodes
        spelling = Spelling(book.variables)
        spelling.scope(nodes, tree, (), {})
        value = size = 0
        for part, bits in spelling.pieces:
            value, size = value << bits | part, size + bits
        cursor = Cursor(value, size)
        own = self.book.packets[direction, tree["NID_PACKET"]].nodes
        try:
            Walk(self.book.variables, cursor).scope(own, (), {})
        except Truncated:
            return False
        return cursor.left == 0

    def packets(self, direction: str, most: int = 4) -> list[Tree]:
        """Draw some packets, of any kind but the end flag."""
        # Packet 0 to the train may only come first in a telegram.
        special = (END_FLAG, VIRTUAL_COVER) if direction == "to-train" else ()
        numbers = [n for way, n in sorted(self.book.packets) if way == direction]
        numbers = [n for n in numbers if n not in special]
        count = self.random.randint(0, most)
        return [self.packet(direction, self.random.choice(numbers)) for _ in range(count)]

    def message(self, direction: str, number: int) -> Tree:
        """Draw a radio message."""
        header = self.scope(self.book.messages[direction, number].nodes)
        header["NID_MESSAGE"] = number
        header.pop("L_MESSAGE")
        packets = self.packets(direction)
        while sum(self.width_of(each, direction) for each in packets) > 8 * LONGEST_MESSAGE - 1000:
            packets.pop()
        return self._tree("radio", direction, header, packets)

    def telegram(self, medium: str) -> Tree:
        """Draw a balise telegram or a loop message, with any filler behind its end flag."""
        header = self.scope(self.book.headers[medium].nodes)
        x, _, y = self.edition.version.partition(".")
        code = int(x) << 4 | int(y)
        header |= {"Q_UPDOWN": 1, "M_VERSION": code, "Q_MEDIA": int(medium == "loop")}
        packets = self.packets("to-train")
        covered = ("to-train", VIRTUAL_COVER) in self.book.packets
        if medium == "balise" and covered and not self.random.randrange(5):
            packets.insert(0, self.packet("to-train", VIRTUAL_COVER))
        packets.append({"NID_PACKET": END_FLAG})
        tree = self._tree(medium, "to-train", header, packets)
        tree["filler"] = self.blob(self.random.choice((0, 1, 8, 57)))
        return tree

    def frame(self) -> Tree:
        """Draw any frame."""
        kind = self.random.randrange(5)
        if kind < 2:
            return self.telegram(("balise", "loop")[kind])
        return self.message(*self.random.choice(sorted(self.book.messages)))

    def _tree(self, medium: str, direction: str, header: Tree, packets: list[Tree]) -> Tree:
        return {
            "medium": medium,
            "direction": direction,
            "version": self.edition.version,
            "issue": self.edition.issue,
            "header": header,
            "packets": packets,
        }

    def width_of(self, tree: Tree, direction: str) -> int:
        """Return how many bits a packet takes, counted over the layout of its form."""
        book = registry(tree["form"]) if "form" in tree else self.book
        return width_of(tree, direction, book)


def _asked(nodes: Sequence[Node]) -> dict[str, list[int]]:
    """Return the codes that the conditions of a layout name, by variable."""
    asked: dict[str, list[int]] = {}
    for node in nodes:
        if isinstance(node, When):
            condition = node.condition
            codes = condition.codes if isinstance(condition, In) else (condition.code,)
            asked.setdefault(condition.variable, []).extend(codes)
        if isinstance(node, (When, Group, Series, Repeat)):
            for name, codes_inside in _asked(node.nodes).items():
                asked.setdefault(name, []).extend(codes_inside)
    return asked


def width_of(tree: Tree, direction: str, book: Registry = REGISTRY) -> int:
    """Return how many bits a packet takes, counted over its layout."""
    return _width(book, book.packets[direction, tree["NID_PACKET"]].nodes, tree, {})


def _width(book: Registry, nodes: Sequence[Node], tree: Tree, outer: Tree) -> int:
    codes = outer | tree
    bits = 0
    for node in nodes:
        match node:
            case Field():
                bits += book.variables[node.variable].bits
                codes[node.variable] = tree.get(node.name, 0)
            case When():
                if true_of(node.condition, codes):
                    bits += _width(book, node.nodes, tree, codes)
            case Group():
                bits += _width(book, node.nodes, tree[node.name], codes)
            case Series() | Repeat():
                bits += book.variables["N_ITER"].bits
                bits += sum(_width(book, node.nodes, each, codes) for each in tree[node.name])
            case Text():
                bits += book.variables[node.length].bits + 8 * len(tree[node.element])
            case Opaque():
                bits += tree[node.name]["bits"]
    return bits
