"""What both source writers share: lines, local names, runs of fields and condition texts."""

from __future__ import annotations

from typing import TYPE_CHECKING, Protocol, TypeVar

from fishplate.standard.vocabulary import (
    Condition,
    Eq,
    Field,
    Group,
    In,
    Ne,
    Node,
    Repeat,
    Series,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Iterator, Mapping, Sequence

    from fishplate.standard.vocabulary import Variable

RUN_BITS = 60
"""Widest run read or written in one piece: it stays in two 30-bit digits of a Python integer."""


class _Entry(Protocol):
    """One value of a run."""

    variable: Variable


_AnEntry = TypeVar("_AnEntry", bound=_Entry)


def chunks(run: Sequence[_AnEntry]) -> list[list[_AnEntry]]:
    """Split a run into pieces of at most `RUN_BITS` (a wider variable stands alone)."""
    pieces: list[list[_AnEntry]] = []
    width = RUN_BITS
    for entry in run:
        if width + entry.variable.bits > RUN_BITS:
            pieces.append([])
            width = 0
        pieces[-1].append(entry)
        width += entry.variable.bits
    return pieces


class Source:
    """Lines of Python under way: indentation, and local names that are never used twice."""

    def __init__(self, variables: Mapping[str, Variable]) -> None:
        self.variables = variables
        self.lines: list[str] = []
        self.depth = 1
        self._used: dict[str, int] = {}

    def line(self, text: str) -> None:
        """Add one line at the present depth."""
        self.lines.append("    " * self.depth + text)

    def local(self, stem: str) -> str:
        """Return a fresh local name that begins with `stem`."""
        self._used[stem] = self._used.get(stem, -1) + 1
        return f"{stem}{self._used[stem]}"


def fixed_fields(nodes: Sequence[Node]) -> list[Field] | None:
    """Return the nodes when they are plain fields only, so that their width is fixed."""
    fields = [each for each in nodes if isinstance(each, Field)]
    return fields if len(fields) == len(nodes) else None


def condition_variables(nodes: Sequence[Node]) -> set[str]:
    """Return the variables that some condition in the layout looks at."""
    return set(_condition_variables(nodes))


def _condition_variables(nodes: Sequence[Node]) -> Iterator[str]:
    for node in nodes:
        match node:
            case When():
                yield node.condition.variable
                yield from _condition_variables(node.nodes)
            case Group() | Series() | Repeat():
                yield from _condition_variables(node.nodes)


def condition_text(condition: Condition, local: str, bits: int) -> str:
    """Return the Python expression of a condition on a local name."""
    match condition:
        case Eq(code=code):
            if bits == 1:
                return local if code else f"not {local}"
            return f"{local} == {code}"
        case Ne(code=code):
            return local if code == 0 else f"{local} != {code}"
        case In(codes=codes):
            if codes == tuple(range(codes[0], codes[-1] + 1)):
                return f"{codes[0]} <= {local} <= {codes[-1]}"
            return f"{local} in {codes}"
