"""What changed from one registry to another.

Nothing is declared here: variables and packets are followed through their lineage, messages
through their number, and every difference is read off the two declarations.
"""

from __future__ import annotations

from dataclasses import dataclass, replace
from typing import TYPE_CHECKING, Literal

from fishplate.standard.editions import reaches
from fishplate.standard.fields import CodeChange, FieldChange, code_changes, field_changes
from fishplate.standard.vocabulary import (
    TO_TRACK,
    Header,
    Optional,
    Packet,
    RadioMessage,
    Variable,
)

if TYPE_CHECKING:
    from collections.abc import Hashable, Iterable, Iterator, Sequence

    from fishplate.standard.build import Registry

Thing = Variable | Packet | RadioMessage | Header
Value = str | int | tuple[int, int] | tuple[str, ...] | tuple[tuple[int, ...], ...] | None
What = Literal[
    "name",
    "number",
    "clause",
    "title",
    "coding",
    "width",
    "unit",
    "step",
    "range",
    "senders",
    "invariant",
    "required",
]
"""``width`` in bits, ``step`` in the unit of the variable, ``range`` the codes that are plain
numbers, ``senders`` who transmits (or receives) it, ``required`` the packets of a message."""


@dataclass(frozen=True, slots=True)
class Attribute:
    """One attribute that two editions give differently."""

    what: What
    before: Value
    after: Value


@dataclass(frozen=True, slots=True)
class Difference:
    """One thing that is new (no `before`), gone (no `after`) or differs.

    `instead` is the number of a packet of the same lineage in the edition that lacks this one.
    """

    before: Thing | None
    after: Thing | None
    attributes: tuple[Attribute, ...] = ()
    codes: tuple[CodeChange, ...] = ()
    fields: tuple[FieldChange, ...] = ()
    optional_new: tuple[Optional, ...] = ()
    optional_gone: tuple[Optional, ...] = ()
    instead: int | None = None

    @property
    def thing(self) -> Thing:
        """What it is about, as the later edition has it where that has it."""
        found = self.after if self.after is not None else self.before
        if found is None:
            raise ValueError("a difference is about something")
        return found

    def of(self, what: What) -> Attribute | None:
        """Return the change of one attribute, if it changed."""
        return next((each for each in self.attributes if each.what == what), None)


@dataclass(frozen=True, slots=True)
class Comparison:
    """Everything that differs between two registries, in the order of names and numbers."""

    before: Registry
    after: Registry
    variables: tuple[Difference, ...]
    packets: tuple[Difference, ...]
    messages: tuple[Difference, ...]
    headers: tuple[Difference, ...]


def may_use(book: Registry, thing: Thing) -> bool:
    """Tell whether the version of a registry may use what its layouts hold (`Packet.since`)."""
    since = thing.since if isinstance(thing, Packet) else ""
    return reaches(book.version, since)


def counterparts(thing: Thing, book: Registry) -> list[Thing]:
    """Return what carries the same content in a registry, best match first."""
    match thing:
        case Variable():
            return [each for each in book.variables.values() if each.lineage == thing.lineage]
        case RadioMessage():
            message = book.messages.get((thing.direction, thing.number))
            return [message] if message else []
        case Header():
            header = book.headers.get(thing.medium)
            return [header] if header else []
    same = [
        each
        for each in book.packets.values()
        if (each.direction, each.lineage) == (thing.direction, thing.lineage)
        and may_use(book, each)
    ]
    same.sort(key=lambda each: (each.number != thing.number, each.number != each.lineage))
    return list(same)


def compare(before: Registry, after: Registry) -> Comparison:
    """Return everything that differs between two registries."""
    return Comparison(
        before,
        after,
        variables=_compared(before, after, before.variables.values(), after.variables.values()),
        packets=_compared(before, after, _usable(before), _usable(after)),
        messages=_compared(before, after, before.messages.values(), after.messages.values()),
        headers=_compared(before, after, before.headers.values(), after.headers.values()),
    )


def _usable(book: Registry) -> list[Packet]:
    return [each for each in book.packets.values() if may_use(book, each)]


def _compared(
    before: Registry, after: Registry, old: Iterable[Thing], new: Iterable[Thing]
) -> tuple[Difference, ...]:
    """Pair what is called alike, then what else has one lineage; the rest is gone or new."""
    left: list[Thing] = list(old)
    found = []
    unpaired = []
    for thing in new:
        pair = next((each for each in left if _called(each) == _called(thing)), None)
        if pair is None:
            unpaired.append(thing)
            continue
        left.remove(pair)
        found.append(difference(before, pair, after, thing))
    for thing in unpaired:
        pair = next((each for each in left if _lineage(each) == _lineage(thing)), None)
        if pair is None:
            found.append(Difference(None, thing, instead=_number(counterparts(thing, before))))
            continue
        left.remove(pair)
        found.append(difference(before, pair, after, thing))
    found += [Difference(each, None, instead=_number(counterparts(each, after))) for each in left]
    return tuple(sorted(filter(None, found), key=lambda each: _order(each.thing)))


def _called(thing: Thing) -> Hashable:
    match thing:
        case Variable():
            return thing.name, thing.lineage
        case Packet():
            return thing.direction, thing.number, thing.lineage
    return _lineage(thing)


def _lineage(thing: Thing) -> Hashable:
    match thing:
        case Variable() | Packet():
            return thing.lineage, getattr(thing, "direction", "")
        case RadioMessage():
            return thing.direction, thing.number
        case Header():
            return thing.medium


def _number(same: Sequence[Thing]) -> int | None:
    return next((each.number for each in same if isinstance(each, Packet)), None)


def _order(thing: Thing) -> tuple[bool, int, str]:
    match thing:
        case Packet() | RadioMessage():
            return thing.direction == TO_TRACK, thing.number, ""
        case Variable():
            return False, 0, thing.name
        case Header():
            return False, 0, thing.medium


def difference(before: Registry, old: Thing, after: Registry, new: Thing) -> Difference | None:
    """Compare one thing in two registries; None where they have it alike."""
    changed = Difference(old, new, attributes=tuple(_attributes(old, new)))
    if isinstance(old, Variable) and isinstance(new, Variable):
        changed = replace(changed, codes=code_changes(old, new))
    elif not isinstance(old, Variable) and not isinstance(new, Variable):
        changed = replace(changed, fields=field_changes(before, old.nodes, after, new.nodes))
    if isinstance(old, RadioMessage) and isinstance(new, RadioMessage):
        was, now = _options(before, old), _options(after, new)
        changed = replace(
            changed,
            optional_new=tuple(each for each in now if each not in was),
            optional_gone=tuple(each for each in was if each not in now),
        )
    return None if changed == Difference(old, new) else changed


def _options(book: Registry, message: RadioMessage) -> list[Optional]:
    """Return the optional packets that the version of a registry may use."""
    found = (
        (each, book.packets.get((message.direction, each.packet))) for each in message.optional
    )
    return [each for each, packet in found if packet is None or may_use(book, packet)]


def _attributes(old: Thing, new: Thing) -> Iterator[Attribute]:
    before, after = _facts(old), _facts(new)
    for what, value in before.items():
        unsaid = what == "senders" and not (value and after[what])
        if value != after[what] and not unsaid:
            yield Attribute(what, value, after[what])


def _facts(thing: Thing) -> dict[What, Value]:
    match thing:
        case Variable():
            return {
                "name": thing.name,
                "clause": thing.clause,
                "title": thing.title,
                "coding": thing.coding,
                "width": thing.bits,
                "unit": thing.unit,
                "step": thing.resolution,
                "range": thing.plain,
            }
        case Packet():
            return {
                "number": thing.number,
                "name": thing.name,
                "clause": thing.clause,
                "senders": thing.senders,
            }
        case RadioMessage():
            return {
                "name": thing.name,
                "clause": thing.clause,
                "senders": thing.senders,
                "invariant": thing.version_invariant,
                "required": thing.required.packets,
            }
        case Header():
            return {"clause": thing.clause, "width": thing.bits}
