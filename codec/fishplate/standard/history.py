"""What a variable, packet, message or header was in each edition of the standard.

Read off the registries: what two editions have alike is one form of it.
"""

from __future__ import annotations

from dataclasses import dataclass, replace
from functools import cache
from itertools import chain
from typing import TYPE_CHECKING

from fishplate.standard.build import Registry, registry
from fishplate.standard.comparison import Difference, Thing, counterparts, difference
from fishplate.standard.editions import EDITIONS, version_key
from fishplate.standard.fields import places
from fishplate.standard.vocabulary import Evidence, Packet, RadioMessage, Variable

if TYPE_CHECKING:
    from collections.abc import Sequence


@dataclass(frozen=True, slots=True)
class Stage:
    """One set of layouts and the system versions, ascending, that it lays out.

    `book` is the registry of the last of these versions.
    """

    versions: tuple[str, ...]
    book: Registry


@dataclass(frozen=True, slots=True)
class Form:
    """A thing as some stages have it alike; `difference` is that from the stage `against`.

    `beside` are further packets of the same lineage that one of the stages has.
    """

    thing: Thing
    stages: tuple[Stage, ...]
    against: Stage | None = None
    difference: Difference | None = None
    beside: tuple[tuple[Stage, Packet], ...] = ()


@dataclass(frozen=True, slots=True)
class History:
    """The forms of one thing in the order of stages, and the stages that do not have it."""

    forms: tuple[Form, ...]
    absent: tuple[Stage, ...]


@cache
def stages() -> tuple[Stage, ...]:
    """Return all layouts by version, then date of issue; those that are inferred come last."""
    layouts = dict.fromkeys(each.layouts for each in EDITIONS)
    found = []
    for name in layouts:
        editions = [each for each in EDITIONS if each.layouts == name]
        editions.sort(key=lambda each: version_key(each.version))
        last = editions[-1]
        found.append(
            Stage(tuple(each.version for each in editions), registry(last.version, last.issue))
        )
    return tuple(sorted(found, key=lambda each: (_is_inferred(each), *_age(each))))


def _is_inferred(stage: Stage) -> bool:
    return any(each.kind == "inferred" for each in stage.book.evidence_of())


def _age(stage: Stage) -> tuple[tuple[int, int], list[str]]:
    return version_key(stage.versions[0]), stage.book.date.split("/")[::-1]


def neighbour(stage: Stage, every: Sequence[Stage]) -> Stage | None:
    """Return the stage that one is best compared with, None for the first.

    The layouts for the highest version of an issue are compared with those of the issue before
    it; layouts for other versions with the nearest older layouts.
    """
    issues = [each for each in every if _leads_issue(each, every)]
    older = [each for each in issues if _age(each) < _age(stage)]
    return max(older, key=_age, default=None)


def _leads_issue(stage: Stage, every: Sequence[Stage]) -> bool:
    same = [each for each in every if each.book.issue == stage.book.issue]
    return stage is max(same, key=_age)


def history(thing: Thing, every: Sequence[Stage]) -> History:
    """Follow one thing through all stages.

    A form is told apart from the stage before it or from its `neighbour`, whichever is nearer to
    it, so that as little as possible is said twice.
    """
    forms: list[Form] = []
    seen: list[tuple[Stage, Thing]] = []
    absent = []
    for stage in every:
        same = counterparts(thing, stage.book)
        if not same:
            absent.append(stage)
            continue
        beside = tuple((stage, each) for each in same[1:] if isinstance(each, Packet))
        number = _alike(forms, stage, same[0])
        if number is None:
            forms.append(_form(stage, same[0], _candidates(stage, every, seen), beside))
        else:
            form = forms[number]
            forms[number] = replace(
                form, stages=(*form.stages, stage), beside=(*form.beside, *beside)
            )
        seen.append((stage, same[0]))
    return History(tuple(forms), tuple(absent))


def _alike(forms: Sequence[Form], stage: Stage, thing: Thing) -> int | None:
    for number, form in enumerate(forms):
        if difference(form.stages[0].book, form.thing, stage.book, thing) is None:
            return number
    return None


def _candidates(
    stage: Stage, every: Sequence[Stage], seen: Sequence[tuple[Stage, Thing]]
) -> list[tuple[Stage, Thing]]:
    best = neighbour(stage, every)
    return [*(each for each in seen if each[0] is best), *seen[-1:]]


def _form(
    stage: Stage,
    thing: Thing,
    candidates: Sequence[tuple[Stage, Thing]],
    beside: tuple[tuple[Stage, Packet], ...],
) -> Form:
    found = [
        (against, changed)
        for against, old in candidates
        if (changed := difference(against.book, old, stage.book, thing))
    ]
    if not found:
        return Form(thing, (stage,), beside=beside)
    against, changed = min(found, key=lambda each: _size(each[1]))
    return Form(thing, (stage,), against, changed, beside)


def _size(changed: Difference) -> int:
    aspects = sum(len(each.aspects) or 1 for each in changed.fields)
    options = len(changed.optional_new) + len(changed.optional_gone)
    return len(changed.attributes) + len(changed.codes) + aspects + options


def evidence_for(book: Registry, thing: Thing) -> tuple[Evidence, ...]:
    """Return why something rests on less than the published text: its issue, itself, its fields."""
    return (*book.evidence_of(), *own_evidence(book, thing))


def own_evidence(book: Registry, thing: Thing) -> tuple[Evidence, ...]:
    """Return the same without what holds for all of the issue."""
    own: tuple[Evidence, ...] = ()
    match thing:
        case Variable():
            return book.evidence_of("variable", thing.name)
        case Packet():
            own = book.evidence_of("packet", thing.direction, thing.number)
        case RadioMessage():
            own = book.evidence_of("message", thing.direction, thing.number)
    names = dict.fromkeys(each.variable for each in places(book, thing.nodes))
    return (*own, *chain.from_iterable(book.evidence_of("variable", name) for name in names))
