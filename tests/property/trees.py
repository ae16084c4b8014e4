"""Random trees of everything the registry declares, drawn node by node from its layouts.

The trees are valid bit for bit and mean nothing: any code may stand in any variable. `random`
may be a seeded `random.Random` or the one hypothesis hands out.
"""

from __future__ import annotations

from random import Random
from typing import TYPE_CHECKING, Any

from fishplate.standard import registry
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

    from fishplate.standard.vocabulary import Condition, Node

Tree = dict[str, Any]

REGISTRY = registry("2.1")
PACKETS = sorted(REGISTRY.packets)
MESSAGES = sorted(REGISTRY.messages)
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


class Maker:
    """Draws trees; `most` bounds N_ITER (31 makes the largest packets)."""

    def __init__(self, random: Random, most: int = 3) -> None:
        self.random = random
        self.most = most

    def code(self, name: str) -> int | str:
        """Draw a code: often one at the edges of the range."""
        variable = REGISTRY.variables[name]
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
                    most = (1 << REGISTRY.variables[node.length].bits) - 1
                    length = min(most, self.random.choice((0, 1, 5, 20, 10 * self.most, most)))
                    letters = [chr(self.random.randrange(256)) for _ in range(length)]
                    tree[node.element] = "".join(letters)
                case Opaque():
                    tree[node.name] = self.blob(self.random.choice((0, 1, 7, 8, 64, 133)))

    def _count(self) -> int:
        return self.random.choice((0, 0, 1, 1, 2, self.most))

    def packet(self, direction: str, number: int) -> Tree:
        """Draw a packet without L_PACKET, which the writer computes."""
        while True:
            tree = self.scope(REGISTRY.packets[direction, number].nodes)
            tree["NID_PACKET"] = number
            tree.pop("L_PACKET", None)
            if width_of(tree, direction) <= LONGEST_PACKET:
                return tree
            self.most = 1

    def packets(self, direction: str, most: int = 4) -> list[Tree]:
        """Draw some packets, of any kind but the end flag."""
        numbers = [n for way, n in PACKETS if way == direction and n != END_FLAG]
        if direction == "to-train":
            numbers.remove(VIRTUAL_COVER)  # it may only come first in a telegram
        count = self.random.randint(0, most)
        return [self.packet(direction, self.random.choice(numbers)) for _ in range(count)]

    def message(self, direction: str, number: int) -> Tree:
        """Draw a radio message."""
        header = self.scope(REGISTRY.messages[direction, number].nodes)
        header["NID_MESSAGE"] = number
        header.pop("L_MESSAGE")
        packets = self.packets(direction)
        while sum(width_of(each, direction) for each in packets) > 8 * LONGEST_MESSAGE - 1000:
            packets.pop()
        return _tree("radio", direction, header, packets)

    def telegram(self, medium: str) -> Tree:
        """Draw a balise telegram or a loop message, with any filler behind its end flag."""
        header = self.scope(REGISTRY.headers[medium].nodes)
        header |= {"Q_UPDOWN": 1, "M_VERSION": 33, "Q_MEDIA": int(medium == "loop")}
        packets = self.packets("to-train")
        if medium == "balise" and not self.random.randrange(5):
            packets.insert(0, self.packet("to-train", VIRTUAL_COVER))
        packets.append({"NID_PACKET": END_FLAG})
        tree = _tree(medium, "to-train", header, packets)
        tree["filler"] = self.blob(self.random.choice((0, 1, 8, 57)))
        return tree

    def frame(self) -> Tree:
        """Draw any frame."""
        kind = self.random.randrange(5)
        if kind < 2:
            return self.telegram(("balise", "loop")[kind])
        return self.message(*self.random.choice(MESSAGES))


def _tree(medium: str, direction: str, header: Tree, packets: list[Tree]) -> Tree:
    return {
        "medium": medium,
        "direction": direction,
        "version": "2.1",
        "issue": "3.6.0",
        "header": header,
        "packets": packets,
    }


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


def width_of(tree: Tree, direction: str) -> int:
    """Return how many bits a packet takes, counted over its layout."""
    return _width(REGISTRY.packets[direction, tree["NID_PACKET"]].nodes, tree, {})


def _width(nodes: Sequence[Node], tree: Tree, outer: Tree) -> int:
    codes = outer | tree
    bits = 0
    for node in nodes:
        match node:
            case Field():
                bits += REGISTRY.variables[node.variable].bits
                codes[node.variable] = tree.get(node.name, 0)
            case When():
                bits += _width(node.nodes, tree, codes) if true_of(node.condition, codes) else 0
            case Group():
                bits += _width(node.nodes, tree[node.name], codes)
            case Series() | Repeat():
                bits += REGISTRY.variables["N_ITER"].bits
                bits += sum(_width(node.nodes, each, codes) for each in tree[node.name])
            case Text():
                bits += REGISTRY.variables[node.length].bits + 8 * len(tree[node.element])
            case Opaque():
                bits += tree[node.name]["bits"]
    return bits
