"""Layouts as data: JSON and back, and every kind of node everywhere."""

from __future__ import annotations

import dataclasses
import json
import typing
from types import SimpleNamespace
from typing import TYPE_CHECKING, Any

import pytest

from fishplate.engine.generate import Module
from fishplate.engine.reading import ReaderSource
from fishplate.engine.runtime import MISFITS
from fishplate.engine.spell import Spelling
from fishplate.engine.walk import Cursor, Walk
from fishplate.engine.writing import WriterSource
from fishplate.errors import EncodeError, RegistryError
from fishplate.standard.as_json import node_from_json, node_to_json
from fishplate.standard.build import registry
from fishplate.standard.editions import EDITIONS
from fishplate.standard.vocabulary import (
    Condition,
    Eq,
    Field,
    Group,
    In,
    Ne,
    Node,
    Opaque,
    Packet,
    Repeat,
    Series,
    Text,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Callable, Sequence

REGISTRY = registry("2.1")
BOOKS = {each.layouts: registry(each.version, each.issue) for each in EDITIONS}
LAYOUTS = {
    f"{name} {what} {key}": layout
    for name, book in BOOKS.items()
    for what, layouts in (
        ("packet", book.packets),
        ("message", book.messages),
        ("header", book.headers),
    )
    for key, layout in layouts.items()
}


@pytest.mark.parametrize("name", LAYOUTS)
def test_every_layout_survives_json(name: str) -> None:
    nodes = LAYOUTS[name].nodes
    text = json.dumps([node_to_json(each) for each in nodes])
    assert tuple(node_from_json(each) for each in json.loads(text)) == nodes


@pytest.mark.parametrize(
    "data",
    [
        {},
        {"field": 3},
        {"field": None, "nodes": []},
        {"when": {"variable": "A", "equals": 1}},
        {"when": {"variable": "A"}, "nodes": []},
        {"when": {"variable": "A", "above": 1}, "nodes": []},
        {"text": "X_TEXT"},
        {"opaque": 1},
        {"nodes": []},
        {"choice": "a", "nodes": []},
    ],
)
def test_json_that_is_no_layout_is_refused(data: dict[str, Any]) -> None:
    with pytest.raises(RegistryError):
        node_from_json(data)


# One layout for each kind of node, each condition included: bits, and the tree they stand for.
# Worked by hand: NID_PACKET 8 bits, Q_DIR 2, L_PACKET 13, N_ITER 5, Q_SCALE 2, Q_FRONT 1,
# M_ACK 1, L_TEXT 8, X_TEXT 8 (SUBSET-026 issue 3.6.0, 7.5.1). The head of the packet below is
# 8 bits 00000101, 2 bits 01 and L_PACKET; what follows is given behind it.
KINDS: dict[type, tuple[Node, str, dict[str, Any]]] = {
    Field: (Field("Q_FRONT"), "1", {"Q_FRONT": 1}),
    Group: (Group("start", (Field("Q_SCALE"),)), "10", {"start": {"Q_SCALE": 2}}),
    Series: (
        Series("steps", (Field("Q_SCALE"),)),
        "01000101011",
        {"steps": [{"Q_SCALE": 1}, {"Q_SCALE": 2}, {"Q_SCALE": 3}]},
    ),
    Repeat: (
        Repeat("steps", (Field("Q_FRONT"), Field("Q_SCALE"))),
        "00010101011",
        {"steps": [{"Q_FRONT": 1, "Q_SCALE": 1}, {"Q_FRONT": 0, "Q_SCALE": 3}]},
    ),
    When: (When(Eq("Q_DIR", 1), (Field("M_ACK"),)), "1", {"M_ACK": 1}),
    Text: (
        Text("L_TEXT", "X_TEXT"),
        "000000100100000111100101",
        {"X_TEXT": "Aå"},
    ),
    Opaque: (Opaque("data"), "1010111", {"data": {"bits": 7, "hex": "AE"}}),
}
CONDITIONS: dict[type, tuple[Condition, Condition]] = {
    Eq: (Eq("Q_DIR", 1), Eq("Q_DIR", 2)),
    Ne: (Ne("Q_DIR", 0), Ne("Q_DIR", 1)),
    In: (In("Q_DIR", (0, 1)), In("Q_DIR", (0, 2))),
}
"""One that holds and one that does not, for Q_DIR = 1."""


def test_every_kind_of_node_has_its_case() -> None:
    assert set(KINDS) == set(typing.get_args(Node))
    assert set(CONDITIONS) == set(typing.get_args(Condition))


HEAD = (Field("NID_PACKET"), Field("Q_DIR"), Field("L_PACKET"))


def check_node(node: Node, body: str, tree: dict[str, Any]) -> None:
    """Check one node behind a packet's head, in both engines and both directions, and as JSON."""
    nodes = (*HEAD, node)
    size = 23 + len(body)
    text = f"{5:08b}01{size:013b}{body}"
    whole = {"NID_PACKET": 5, "Q_DIR": 1, "L_PACKET": size, **tree}
    cursor = Cursor(int(text, 2), size)
    assert Walk(REGISTRY.variables, cursor).scope(nodes, (), {}) == whole
    assert cursor.left == 0
    assert sum(row.width for row in cursor.rows) == size
    spelling = Spelling(REGISTRY.variables)
    spelling.scope(nodes, whole, (), {})
    written = "".join(f"{value:0{width}b}" for value, width in spelling.pieces if width)
    assert written[:10] + written[23:] == text[:10] + body
    read, write = compiled(nodes)
    assert read(int(text, 2), size) == (whole, 0)
    value, width = write(whole)
    assert width == size
    assert f"{value:0{size}b}" == written
    assert node_from_json(json.loads(json.dumps(node_to_json(node)))) == node
    for wrong in ({**whole, "Q_OTHER": 0}, {key: whole[key] for key in list(whole)[:-1]}):
        with pytest.raises(EncodeError):
            Spelling(REGISTRY.variables).scope(nodes, wrong, (), {})
        with pytest.raises(MISFITS):
            write(wrong)


def compiled(nodes: Sequence[Node]) -> tuple[Callable[..., Any], Callable[..., Any]]:
    """Build the generated module of a registry that has one packet of these nodes, and run it."""
    packet = Packet(5, "to-train", "0.0", "invented", ("Any",), tuple(nodes))
    invented = dataclasses.replace(REGISTRY, packets={("to-train", 5): packet})
    source = Module(invented, []).source()
    names: dict[str, Any] = {}
    exec(compile(source, "generated", "exec"), names)  # noqa: S102  our own generator's output
    return names["read_to_train_5"], names["write_to_train_5"]


@pytest.mark.parametrize("kind", KINDS, ids=lambda kind: kind.__name__)
def test_every_kind_of_node_is_handled_everywhere(kind: type) -> None:
    check_node(*KINDS[kind])


@pytest.mark.parametrize("kind", CONDITIONS, ids=lambda kind: kind.__name__)
def test_every_kind_of_condition_is_handled_everywhere(kind: type) -> None:
    holds, fails = CONDITIONS[kind]
    check_node(When(holds, (Field("Q_SCALE"),)), "11", {"Q_SCALE": 3})
    nodes = Group("rest", (Field("M_ACK"), When(fails, (Field("Q_SCALE"),)), Field("Q_FRONT")))
    check_node(nodes, "10", {"rest": {"M_ACK": 1, "Q_FRONT": 0}})


@pytest.mark.parametrize("kind", KINDS, ids=lambda kind: kind.__name__)
@pytest.mark.parametrize("kind_outside", [Group, Series, Repeat, When])
def test_nodes_nest_behind_a_field(kind: type, kind_outside: type) -> None:
    node, body, tree = KINDS[kind]
    if kind_outside is When:
        check_node(When(Eq("Q_DIR", 1), (node,)), body, tree)
    elif kind is not Opaque:  # which stands last in its packet, so in no set
        tree = {"Q_SCALE": 2} | tree
        inside: Any = tree
        body = f"10{body}"
        if kind_outside is Series:
            inside, body = [tree, tree], f"{body}00001{body}"
        elif kind_outside is Repeat:
            inside, body = [tree, tree, tree], f"00011{body * 3}"
        check_node(kind_outside("outer", (Field("Q_SCALE"), node)), body, {"outer": inside})


@pytest.mark.parametrize(
    "visitor",
    [
        lambda node: Walk(REGISTRY.variables, Cursor(0, 400)).scope([node], (), {}),
        lambda node: ReaderSource(REGISTRY.variables, [node]).lines,
        lambda node: WriterSource(REGISTRY.variables, [node]).lines,
    ],
    ids=["walk", "reading", "writing"],
)
def test_each_kind_leaves_a_mark(visitor: Callable[[Node], Any]) -> None:
    # A visitor that passes over an unknown kind in silence would drop bits.
    nothing = visitor(SimpleNamespace(nodes=(), name="unknown"))  # type: ignore[arg-type]
    for kind, (node, _, _) in KINDS.items():
        if kind is not When:
            assert visitor(node) != nothing, kind
