"""What changed in the codes of a variable and in the fields of a layout, from one to another."""

from __future__ import annotations

from collections import Counter
from dataclasses import dataclass, replace
from difflib import SequenceMatcher
from itertools import pairwise
from typing import TYPE_CHECKING, Literal, assert_never

from fishplate.standard.vocabulary import (
    COUNT,
    CodeKind,
    Condition,
    Field,
    Group,
    Opaque,
    Repeat,
    Series,
    Text,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Hashable, Iterable, Iterator

    from fishplate.standard.build import Registry
    from fishplate.standard.vocabulary import Node, Variable

Aspect = Literal["name", "width", "condition", "list", "place", "meaning"]
"""What a field that stays has otherwise: ``list`` how often an element stands there, ``place``
where on the wire, ``meaning`` the codes, range, step or coding of its variable."""


@dataclass(frozen=True, slots=True)
class Meaning:
    """What a code means."""

    kind: CodeKind
    label: str


@dataclass(frozen=True, slots=True)
class CodeChange:
    """The codes `first` to `last` (inclusive), and what is said of them; None where nothing is."""

    first: int
    last: int
    before: Meaning | None
    after: Meaning | None


@dataclass(frozen=True, slots=True)
class Place:
    """One field of a layout: `bits` wide, there when all of `when` hold.

    `path` leads to it; for a list it names the list, and the place is that of its N_ITER.
    `repeats` is ``series`` or ``repeat`` for that N_ITER, ``text`` for the characters of a text,
    ``opaque`` for bits without a layout (no variable, 0 bits), else empty. `behind` is the path of
    the field before it on the wire.
    """

    path: tuple[str, ...]
    variable: str
    bits: int
    when: tuple[Condition, ...] = ()
    repeats: str = ""
    behind: tuple[str, ...] = ()


@dataclass(frozen=True, slots=True)
class FieldChange:
    """A field that is new (no `before`), gone (no `after`) or differs in some aspects."""

    before: Place | None
    after: Place | None
    aspects: tuple[Aspect, ...] = ()


def code_changes(old: Variable, new: Variable) -> tuple[CodeChange, ...]:
    """Return the codes that two declarations of a variable explain differently."""
    every = (*old.codes, *new.codes)
    edges = sorted({each.first for each in every} | {each.last + 1 for each in every})
    found: list[CodeChange] = []
    for first, past in pairwise(edges):
        before, after = _meaning(old, first), _meaning(new, first)
        if before == after:
            continue
        last = found[-1] if found else None
        if last and (last.last + 1, last.before, last.after) == (first, before, after):
            found[-1] = replace(last, last=past - 1)
        else:
            found.append(CodeChange(first, past - 1, before, after))
    return tuple(found)


def _meaning(variable: Variable, code: int) -> Meaning | None:
    """Say what is declared of a code; a note on plain numbers adds nothing to `plain`."""
    first, last = variable.plain or (1, 0)
    for each in variable.codes:
        if each.first <= code <= each.last:
            noted = each.kind == "range" and first <= code <= last
            return None if noted else Meaning(each.kind, each.label)
    return None


def places(book: Registry, nodes: Iterable[Node]) -> tuple[Place, ...]:
    """Return the fields of a layout as they follow on the wire, lists at their N_ITER."""
    found: list[Place] = []
    for each in _places(book, nodes, (), ()):
        found.append(replace(each, behind=found[-1].path if found else ()))
    return tuple(found)


def _places(
    book: Registry, nodes: Iterable[Node], prefix: tuple[str, ...], when: tuple[Condition, ...]
) -> Iterator[Place]:
    def place(name: str, variable: str, repeats: str = "") -> Place:
        bits = book.variables[variable].bits if variable else 0
        return Place((*prefix, name), variable, bits, when, repeats)

    for node in nodes:
        match node:
            case Field():
                yield place(node.name, node.variable)
            case Group():
                yield from _places(book, node.nodes, (*prefix, node.name), when)
            case Series():
                yield from _places(book, node.nodes, (*prefix, node.name), when)
                yield place(node.name, COUNT, "series")
            case Repeat():
                yield place(node.name, COUNT, "repeat")
                yield from _places(book, node.nodes, (*prefix, node.name), when)
            case When():
                yield from _places(book, node.nodes, prefix, (*when, node.condition))
            case Text():
                yield place(node.length, node.length)
                yield place(node.element, node.element, "text")
            case Opaque():
                yield place(node.name, "", "opaque")
            case _ as unknown:
                assert_never(unknown)


def field_changes(
    before: Registry, old: Iterable[Node], after: Registry, new: Iterable[Node]
) -> tuple[FieldChange, ...]:
    """Return the fields that two layouts have differently, in the order of the wire."""
    was = _keyed(before, places(before, old))
    now = _keyed(after, places(after, new))
    found: list[FieldChange] = []
    matcher = SequenceMatcher(None, list(was), list(now), autojunk=False)
    for tag, i1, i2, j1, j2 in matcher.get_opcodes():
        found += [FieldChange(was[key], None) for key in list(was)[i1:i2] if key not in now]
        for key in list(now)[j1:j2]:
            if key not in was:
                found.append(FieldChange(None, now[key]))
                continue
            aspects = _aspects(before, was[key], after, now[key], moved=tag != "equal")
            if aspects:
                found.append(FieldChange(was[key], now[key], aspects))
    return tuple(found)


def _keyed(book: Registry, fields: Iterable[Place]) -> dict[Hashable, Place]:
    """Key fields by path, in names of lineage; the second of one path counts as another."""
    times: Counter[tuple[str, ...]] = Counter()
    found: dict[Hashable, Place] = {}
    for each in fields:
        path = each.path
        if path[-1] == each.variable:
            path = (*path[:-1], book.variables[each.variable].lineage)
        found[path, times[path]] = each
        times[path] += 1
    return found


def _aspects(
    before: Registry, old: Place, after: Registry, new: Place, *, moved: bool
) -> tuple[Aspect, ...]:
    found: dict[Aspect, bool] = {
        "name": old.path != new.path or old.variable != new.variable,
        "width": old.bits != new.bits,
        "condition": _conditions(before, old) != _conditions(after, new),
        "list": old.repeats != new.repeats,
        "place": moved,
        "meaning": bool(new.variable) and _reads_otherwise(before, old, after, new),
    }
    return tuple(aspect for aspect, holds in found.items() if holds)


def _conditions(book: Registry, place: Place) -> list[Condition]:
    return [
        replace(each, variable=book.variables[each.variable].lineage)
        if each.variable in book.variables
        else each
        for each in place.when
    ]


def _reads_otherwise(before: Registry, old: Place, after: Registry, new: Place) -> bool:
    was, now = before.variables[old.variable], after.variables[new.variable]
    return _scale(was) != _scale(now) or bool(code_changes(was, now))


def _scale(variable: Variable) -> tuple[object, ...]:
    return variable.coding, variable.unit, variable.resolution, variable.plain
