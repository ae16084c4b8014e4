"""What translating says of itself: changes, each in one sentence with its clause."""

from __future__ import annotations

from dataclasses import dataclass
from functools import cache
from types import MappingProxyType
from typing import TYPE_CHECKING, Any, Literal

from fishplate.bits import digits_value
from fishplate.meaning import Meaning, explain
from fishplate.standard import registry
from fishplate.translation.tables import SAME_IN_OTHER_WORDS

if TYPE_CHECKING:
    from collections.abc import Iterable, Mapping

    from fishplate.engine.runtime import Codec
    from fishplate.errors import Path
    from fishplate.standard.vocabulary import Variable

Kind = Literal[
    "mapped",
    "inserted",
    "defaulted",
    "kept",
    "dropped",
    "rejected",
    "renumbered",
    "joined",
    "split",
    "replaced",
    "differs",
    "lengthened",
]
"""``mapped``: a code gives way to another; ``inserted``: a value that the target adds;
``defaulted``: a default is taken; ``kept``: a stored value is; ``dropped``: the target has no
place for it; ``rejected``: a rule refuses, ignores or does not send it; ``renumbered``: the packet
gets another number; ``joined``: a packet goes into another one; ``split``: values go into a packet
of their own; ``replaced``: a packet gives way to another; ``differs``: a code stays and reads
otherwise, or no longer tells what it told; ``lengthened``: a telegram takes more room."""

METRES = 1
"""The Q_SCALE distances are worded with where only their kind of meaning counts."""


@dataclass(frozen=True, slots=True)
class Change:
    """One thing that translating changed or left out.

    `path` leads to its place in the source tree. `clause` is that of SUBSET-026 issue 3.6.0 it
    rests on; `stated` is False where the rule is derived, as the reverse of a stated one or where
    the standard is silent. `lossy`: something of the source cannot be got back from the result.
    """

    kind: Kind
    path: Path
    message: str
    clause: str
    stated: bool
    lossy: bool

    def tree(self) -> dict[str, Any]:
        """Return the change as plain data."""
        return {
            "path": list(self.path),
            "kind": self.kind,
            "message": self.message,
            "clause": self.clause,
            "stated": self.stated,
            "lossy": self.lossy,
        }


class Side:
    """How one side of a translation names variables, packets and messages, and words codes."""

    def __init__(self, layouts: Codec, direction: str) -> None:
        self.version = layouts.version
        self.key = (layouts.version, layouts.issue)
        self.direction = direction
        self.layouts = layouts
        self.book = layouts.registry
        self.variables = by_lineage(*self.key)

    def name(self, lineage: str) -> str:
        """Return what this side calls a variable; names of sets stay."""
        found = self.variables.get(lineage)
        return found.name if found else lineage

    def named(self, tree: Mapping[str, Any]) -> dict[str, Any]:
        """Return a tree in this side's names."""
        return renamed(tree, self.name)

    def lineages(self, tree: Mapping[str, Any]) -> dict[str, Any]:
        """Return a tree of this side's names in those of their lineage."""
        known = self.book.variables
        return renamed(tree, lambda name: known[name].lineage if name in known else name)

    def said(self, lineage: str, code: Any, scale: int | None = None) -> str:
        """Return name, code and meaning; a set by the number of its elements."""
        if isinstance(code, (list, dict)):
            return f"{lineage} ({len(code)} element{'s' if len(code) != 1 else ''})"
        name = self.name(lineage)
        meaning = self.meaning(lineage, code, scale)
        if isinstance(code, str):
            return f"{name} {code}" if meaning is None or code else f"{name} ({meaning.text})"
        text = "" if meaning is None or meaning.text == str(code) else f" ({meaning.text})"
        return f"{name} {code}{text}"

    def all_said(self, codes: Iterable[tuple[str, Any]], scale: int | None = None) -> str:
        """Return several of them in one phrase."""
        return " and ".join(self.said(name, code, scale) for name, code in codes)

    def say_becomes(
        self,
        given: Mapping[str, Any],
        other: Side,
        becomes: Mapping[str, Any],
        scale: int | None = None,
    ) -> str:
        """Say which codes of this side give way to which of the other."""
        verb = "becomes" if len(given) == 1 else "become"
        before = self.all_said(given.items(), scale)
        return f"{before} {verb} {other.all_said(becomes.items(), scale)}"

    def meaning(self, lineage: str, code: Any, scale: int | None = None) -> Meaning | None:
        """Return what a code means here, None for a name that is no variable."""
        return meaning(*self.key, lineage, code, scale)

    def packet(self, number: int) -> str:
        """Return number and name of a packet."""
        found = self.book.packets.get((self.direction, number))
        return f"packet {number}, {found.name}," if found else f"packet {number}"

    def one(self, tree: Mapping[str, Any]) -> str:
        """Return what a packet or header is of, by number and version."""
        number = tree.get("NID_PACKET")
        what = f"message {tree['NID_MESSAGE']}" if number is None else f"packet {number}"
        return f"{what} of version {self.version}"

    def message(self, number: int) -> str:
        """Return number and name of a radio message."""
        found = self.book.messages.get((self.direction, number))
        return f"message {number}, {found.name}," if found else f"message {number}"


def renamed(tree: Mapping[str, Any], name: Any) -> dict[str, Any]:
    """Return a copy of a tree, each of its keys as `name` gives it."""
    return {name(key): _renamed_value(value, name) for key, value in tree.items()}


def _renamed_value(value: Any, name: Any) -> Any:
    if isinstance(value, dict):
        return renamed(value, name)
    if isinstance(value, list):
        return [_renamed_value(each, name) for each in value]
    return value


@cache
def by_lineage(version: str, issue: str) -> Mapping[str, Variable]:
    """Return the variables of an edition by the lineage they carry."""
    found = registry(version, issue).variables.values()
    return MappingProxyType({each.lineage: each for each in found})


@cache
def meaning(
    version: str, issue: str, lineage: str, code: int | str, scale: int | None
) -> Meaning | None:
    """Return what a code means in an edition; None for a name that is no variable there."""
    variable = by_lineage(version, issue).get(lineage)
    if variable is None or (isinstance(code, str) and variable.coding != "digits"):
        return None
    if isinstance(code, str):
        code = digits_value(code, variable.bits // 4)
    return explain(variable, code, scale)


@cache
def declared_otherwise(source: tuple[str, str], target: tuple[str, str]) -> frozenset[str]:
    """Return the variables, by lineage, whose codes two editions declare differently."""
    ours, theirs = by_lineage(*source), by_lineage(*target)
    return frozenset(
        name
        for name in ours.keys() & theirs.keys()
        if (ours[name].codes, ours[name].plain) != (theirs[name].codes, theirs[name].plain)
    )


WORDED = frozenset({"value", "special", "set"})
"""Kinds of meaning that a label says, and not a number."""


def same_meaning(one: Meaning, other: Meaning) -> bool:
    """Tell whether two editions mean the same by a code."""
    if one.kind != other.kind:
        return False
    if one.kind not in WORDED or one.text == other.text:
        return True
    return frozenset((one.text, other.text)) in SAME_IN_OTHER_WORDS


class Report:
    """Changes in the order they are made; `clause` and `stated` are those of the rule at work."""

    def __init__(self, source: Side, target: Side) -> None:
        self.source = source
        self.target = target
        self.changes: list[Change] = []
        self.clause = ""
        self.stated = True

    def say(
        self,
        kind: Kind,
        path: Path,
        sentence: str,
        *,
        lossy: bool,
        clause: str = "",
        stated: bool = True,
    ) -> None:
        """Note a change; `stated` only says what the rule at work does not say itself."""
        here = tuple(self.source.name(step) if isinstance(step, str) else step for step in path)
        self.changes.append(
            Change(kind, here, sentence, clause or self.clause, self.stated and stated, lossy)
        )
