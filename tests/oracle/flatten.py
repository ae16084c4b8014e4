"""Layout trees of the registry as flat rows, to be held against the published tables.

No source of its own: the tables come from SUBSET-026, see `oracle.editions`. A condition is
resolved to the row it looks at, so that "the Q_SECTIONTIMER of this section" and "that of the
end section" are told apart.
"""

from __future__ import annotations

from dataclasses import dataclass, field

from fishplate.standard import vocabulary
from oracle import tables

TEXT_DEPTH = -1

Seen = tuple[int, str, tuple[int, ...]]
"""A condition: order of the row it looks at, ``==`` or ``!=``, codes."""


@dataclass(frozen=True)
class Flat:
    """One row: its order in the packet, how many repetitions enclose it, when it is there."""

    order: int
    variable: str
    depth: int
    conditions: tuple[Seen, ...]


def from_table(rows: tuple[tables.Row, ...]) -> list[Flat]:
    """The rows of a published table."""
    flat: list[Flat] = []
    latest: dict[tuple[str, str], int] = {}
    for row in rows:
        conditions = tuple(
            (
                latest[term.variable, term.index],
                "!=" if term.sign == "!=" else "==",
                term.codes,
            )
            for term in row.terms
        )
        depth = TEXT_DEPTH if row.index == tables.TEXT_INDEX else row.depth
        flat.append(Flat(row.order, row.variable, depth, conditions))
        latest[row.variable, row.index] = row.order
    return flat


@dataclass
class Flattener:
    """Walks a layout tree; the innermost scope is the last of `scopes`."""

    rows: list[Flat] = field(default_factory=list)
    scopes: list[dict[str, int]] = field(default_factory=lambda: [{}])
    conditions: list[Seen] = field(default_factory=list)
    opaque: list[str] = field(default_factory=list)

    def add(self, variable: str, depth: int) -> None:
        """Note a row and remember where the variable was read."""
        order = len(self.rows) + 1
        self.rows.append(Flat(order, variable, depth, tuple(self.conditions)))
        self.scopes[-1][variable] = order

    def scoped(self, nodes: tuple[vocabulary.Node, ...], depth: int) -> None:
        """Walk nodes in a scope of their own."""
        self.scopes.append({})
        self.nodes(nodes, depth)
        self.scopes.pop()

    def nodes(self, nodes: tuple[vocabulary.Node, ...], depth: int) -> None:
        """Walk nodes in order."""
        for node in nodes:
            self.node(node, depth)

    def node(self, node: vocabulary.Node, depth: int) -> None:
        """Walk one node."""
        match node:
            case vocabulary.Field():
                self.add(node.variable, depth)
            case vocabulary.Group():
                self.scoped(node.nodes, depth)
            case vocabulary.Series():
                self.scoped(node.nodes, depth)
                self.add(vocabulary.COUNT, depth)
                self.scoped(node.nodes, depth + 1)
            case vocabulary.Repeat():
                self.add(vocabulary.COUNT, depth)
                self.scoped(node.nodes, depth + 1)
            case vocabulary.When():
                self.conditions.append(self.resolve(node.condition))
                self.nodes(node.nodes, depth)
                self.conditions.pop()
            case vocabulary.Text():
                self.add(node.length, depth)
                self.add(node.element, TEXT_DEPTH)
            case vocabulary.Opaque():
                self.opaque.append(node.name)
            case _:
                raise TypeError(node)

    def resolve(self, condition: vocabulary.Condition) -> Seen:
        """Find the row that the condition looks at: innermost scope first."""
        for scope in reversed(self.scopes):
            if condition.variable in scope:
                order = scope[condition.variable]
                break
        else:
            raise LookupError(condition.variable)
        match condition:
            case vocabulary.Eq():
                return order, "==", (condition.code,)
            case vocabulary.Ne():
                return order, "!=", (condition.code,)
            case vocabulary.In():
                return order, "==", condition.codes
        raise TypeError(condition)


def from_layout(nodes: tuple[vocabulary.Node, ...]) -> Flattener:
    """The rows of a declared layout, and the names of its opaque parts."""
    flattener = Flattener()
    flattener.nodes(nodes, 0)
    return flattener
