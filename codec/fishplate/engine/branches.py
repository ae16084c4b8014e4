"""Sets of fields with few branches, unfolded: one straight run of fields for every way through.

An element such as a link or a timed section is a handful of fields, some of them conditional.
Unfolded, each way through is a run of known width, read or written in one piece.
"""

from __future__ import annotations

from collections import Counter
from dataclasses import dataclass, replace
from typing import TYPE_CHECKING

from fishplate.engine.source import RUN_BITS
from fishplate.engine.walk import holds
from fishplate.standard.vocabulary import Condition, Field, Node, When

if TYPE_CHECKING:
    from collections.abc import Iterator, Mapping, Sequence

    from fishplate.standard.vocabulary import Variable

MOST_WAYS = 8
WIDEST_CONDITION = 8
"""Conditions on wider variables are not followed code by code."""


@dataclass(frozen=True, slots=True)
class Unfolded:
    """Fields, and then, unless the end is reached, a condition with both ways on from it.

    `hits` and `misses` are the codes of its variable, of those still possible here, for which
    it holds and does not.
    """

    fields: tuple[Field, ...]
    condition: Condition | None = None
    hits: frozenset[int] = frozenset()
    misses: frozenset[int] = frozenset()
    true: Unfolded | None = None
    false: Unfolded | None = None

    def ways(self) -> int:
        """Count the ways through."""
        if self.true is None or self.false is None:
            return 1
        return self.true.ways() + self.false.ways()

    def width(self, variables: Mapping[str, Variable]) -> int:
        """Return the width of the widest way through, in bits."""
        return max(self._widths(variables))

    def usual_width(self, variables: Mapping[str, Variable]) -> int:
        """Return the width that most ways have, the narrower of two that stand equal."""
        counts = Counter(self._widths(variables))
        return max(counts, key=lambda width: (counts[width], -width))

    def _widths(self, variables: Mapping[str, Variable]) -> Iterator[int]:
        own = sum(variables[each.variable].bits for each in self.fields)
        if self.true is None or self.false is None:
            yield own
            return
        for branch in (self.true, self.false):
            yield from (own + width for width in branch._widths(variables))  # noqa: SLF001  same class


def unfold(nodes: Sequence[Node], variables: Mapping[str, Variable]) -> Unfolded | None:
    """Unfold a layout of fields and conditions; None when it is too wide or holds more."""
    if not _plain(nodes, variables):
        return None
    unfolded = _unfold(list(nodes), variables, {})
    if unfolded.ways() > MOST_WAYS or unfolded.width(variables) > RUN_BITS:
        return None
    return unfolded


def _plain(nodes: Sequence[Node], variables: Mapping[str, Variable]) -> bool:
    for node in nodes:
        if isinstance(node, When):
            narrow = variables[node.condition.variable].bits <= WIDEST_CONDITION
            if not narrow or not _plain(node.nodes, variables):
                return False
        elif not isinstance(node, Field) or variables[node.variable].coding == "digits":
            return False
    declared = {each.variable for each in nodes if isinstance(each, Field)}
    asked = {each.condition.variable for each in nodes if isinstance(each, When)}
    return asked <= declared


def _unfold(
    nodes: list[Node], variables: Mapping[str, Variable], possible: Mapping[str, frozenset[int]]
) -> Unfolded:
    fields: list[Field] = []
    for index, node in enumerate(nodes):
        if isinstance(node, Field):
            fields.append(node)
        elif isinstance(node, When):
            rest = nodes[index + 1 :]
            name = node.condition.variable
            codes = possible.get(name, frozenset(range(1 << variables[name].bits)))
            hits = frozenset(code for code in codes if holds(node.condition, {name: code}))
            inside = [*node.nodes, *rest]
            if hits in (codes, frozenset()):
                further = _unfold(inside if hits else rest, variables, possible)
                return replace(further, fields=(*fields, *further.fields))
            return Unfolded(
                tuple(fields),
                node.condition,
                hits,
                codes - hits,
                _unfold(inside, variables, {**possible, name: hits}),
                _unfold(rest, variables, {**possible, name: codes - hits}),
            )
    return Unfolded(tuple(fields))
