"""What two editions of the standard say differently, as lines of text."""

from __future__ import annotations

from dataclasses import replace
from textwrap import wrap
from types import MappingProxyType
from typing import TYPE_CHECKING

from fishplate.standard.history import own_evidence
from fishplate.standard.vocabulary import (
    COUNT,
    SCALED,
    TO_TRAIN,
    Header,
    Packet,
    RadioMessage,
    Variable,
)
from fishplate_cli.console import counted
from fishplate_cli.lookup import condition_text
from fishplate_cli.wording import EVIDENCE

if TYPE_CHECKING:
    from collections.abc import Iterable, Iterator, Sequence

    from fishplate.standard import Registry
    from fishplate.standard.comparison import Attribute, Comparison, Difference, Thing, Value
    from fishplate.standard.fields import CodeChange, FieldChange, Meaning, Place
    from fishplate.standard.vocabulary import Condition, Evidence, Optional

GAP = "  "
LABEL = 10
ARROW = "→"
SETS = ("variables", "packets", "messages", "headers")
REPEATS = MappingProxyType(
    {
        "": "once",
        "repeat": f"{COUNT} times",
        "series": f"once, then {COUNT} more",
        "text": "a text",
        "opaque": "the rest",
    }
)
KINDS = MappingProxyType({"special": "special: ", "spare_bit": "", "spare": ""})
Line = tuple[str, str]


def title(thing: Thing) -> str:
    """Name a thing in one line."""
    match thing:
        case Variable():
            return f"{thing.name}, {counted(thing.bits, 'bit')}: {thing.title}"
        case Packet():
            return f"packet {thing.number} {thing.direction}, {thing.name}"
        case RadioMessage():
            return f"message {thing.number} {thing.direction}, {thing.name}"
        case Header():
            unit = "telegram" if thing.medium == "balise" else "message"
            return f"header of a {thing.medium} {unit}"


def edition_label(book: Registry) -> str:
    """Name a version with the issue that prints it."""
    return f"{book.version} (issue {book.issue})"


def evidence_text(evidence: Evidence) -> str:
    """Say on what something rests."""
    subject = f"{evidence.subject[1]}: " if evidence.subject[:1] == ("variable",) else ""
    return f"{subject}{evidence.note} ({EVIDENCE[evidence.kind]})"


def said(difference: Difference) -> Iterator[Line]:
    """Yield what differs in a thing that both editions have, a label and a text each."""
    thing = difference.thing
    for attribute in difference.attributes:
        yield _attribute(attribute, difference)
    for code in difference.codes:
        yield _code(code, difference)
    yield from _fields(difference.fields)
    if difference.optional_new:
        yield "optional", f"new: {_options(difference.optional_new)}"
    if difference.optional_gone:
        yield "optional", f"gone: {_options(difference.optional_gone)}"
    if isinstance(thing, Packet) and difference.instead is not None:
        yield "related", f"packet {difference.instead} of the other edition"


def _attribute(change: Attribute, difference: Difference) -> Line:
    before, after = (_value(change, each) for each in (change.before, change.after))
    label: str = change.what
    if change.what == "senders":
        way = getattr(difference.thing, "direction", TO_TRAIN)
        label = "sent by" if way == TO_TRAIN else "sent to"
    if change.what == "width":
        after = f"{after} bits"
    return label, f"{before} {ARROW} {after}"


def _value(change: Attribute, value: Value) -> str:
    if value in (None, "", ()):
        return "none"
    if change.what == "step" and value == SCALED:
        return "by Q_SCALE"
    if change.what == "invariant":
        return "the same in every version" if value else "by version"
    if isinstance(value, tuple):
        return (" to " if change.what == "range" else ", ").join(map(_one, value))
    return str(value)


def _one(value: str | int | tuple[int, ...]) -> str:
    return " or ".join(map(str, value)) if isinstance(value, tuple) else str(value)


def _code(change: CodeChange, difference: Difference) -> Line:
    label = f"code {change.first}"
    if change.last != change.first:
        label = f"codes {change.first} to {change.last}"
    before = _meaning(change.before, difference.before, change.last)
    return label, f"{before} {ARROW} {_meaning(change.after, difference.after, change.last)}"


def _meaning(meaning: Meaning | None, variable: Thing | None, code: int) -> str:
    if meaning is not None:
        return f"{KINDS.get(meaning.kind, '')}{meaning.label}"
    if not isinstance(variable, Variable):
        return "nothing"
    if code >= 1 << variable.bits:
        return "no such code"
    first, last = variable.plain or (1, 0)
    return "a plain number" if first <= code <= last else "not said"


def _options(options: Iterable[Optional]) -> str:
    by_sender: dict[str, list[int]] = {}
    for each in options:
        by_sender.setdefault(each.sender, []).append(each.packet)
    return "; ".join(
        ", ".join(map(str, sorted(packets))) + (f" from the {sender} only" if sender else "")
        for sender, packets in by_sender.items()
    )


def _fields(changes: Sequence[FieldChange]) -> Iterator[Line]:
    for label, run in _runs(changes):
        first = run[0]
        behind = f"; behind {'.'.join(first.behind)}" if label == "new" and first.behind else ""
        yield label, f"{_when(first.when)}{', '.join(map(_place, run))}{behind}"
    for each in changes:
        if each.before and each.after and (text := _aspects(each.before, each.after, each)):
            yield "field", text
    other = [
        ".".join(each.after.path) for each in changes if each.after and "meaning" in each.aspects
    ]
    if other:
        yield "meaning", f"other codes, range or step: {', '.join(dict.fromkeys(other))}"


def _runs(changes: Sequence[FieldChange]) -> Iterator[tuple[str, list[Place]]]:
    """Yield new fields, and fields that are gone, as long as they follow one another."""
    run: list[Place] = []
    kind = ""
    for each in changes:
        now = "new" if each.before is None else "gone" if each.after is None else ""
        place = each.after or each.before
        follows = run and place and (place.behind, place.when) == (run[-1].path, run[-1].when)
        if run and not (follows and now == kind):
            yield kind, run
            run = []
        kind = now
        if now and place:
            run.append(place)
    if run:
        yield kind, run


def _place(place: Place) -> str:
    name = ".".join(place.path)
    match place.repeats:
        case "series" | "repeat":
            return f"{COUNT} of {name} ({place.bits} bits)"
        case "text":
            return f"{name} ({place.bits} bits each)"
        case "opaque":
            return f"{name} (as long as L_PACKET says)"
    return f"{name} ({counted(place.bits, 'bit')})"


def _when(conditions: Sequence[Condition]) -> str:
    if not conditions:
        return ""
    return f"when {' and '.join(map(condition_text, conditions))}: "


def _aspects(before: Place, after: Place, change: FieldChange) -> str:
    texts = []
    if "name" in change.aspects:
        texts.append(f"named {'.'.join(before.path)} before")
    if "width" in change.aspects:
        texts.append(f"{before.bits} {ARROW} {after.bits} bits")
    if "condition" in change.aspects:
        old, new = (_when(each.when).rstrip(": ") or "always" for each in (before, after))
        texts.append(f"{old} {ARROW} {new}")
    if "list" in change.aspects:
        texts.append(f"{REPEATS[before.repeats]} {ARROW} {REPEATS[after.repeats]}")
    if "place" in change.aspects:
        texts.append(f"moved behind {'.'.join(after.behind)}")
    return f"{'.'.join(after.path)}: {', '.join(texts)}" if texts else ""


def aligned(lines: Iterable[Line], width: int, indent: int) -> Iterator[str]:
    """Lay out labels and texts in two columns, `width` columns in all."""
    for label, text in lines:
        start = f"{'':{indent}}{label:<{LABEL}}{GAP}"
        rest = " " * (indent + LABEL + len(GAP))
        yield from wrap(text, width, initial_indent=start, subsequent_indent=rest)


def state(difference: Difference) -> str:
    """Say in one word what became of a thing."""
    if difference.before is None:
        return "new"
    if difference.after is None:
        return "gone"
    if isinstance(difference.thing, Variable) and difference.of("name"):
        return "renamed"
    return "renumbered" if difference.of("number") else "changed"


STATES = ("new", "gone", "renamed", "renumbered", "changed")


def text_lines(comparison: Comparison, width: int) -> Iterator[str]:
    """Yield a comparison as text, `width` columns wide."""
    before, after = comparison.before, comparison.after
    yield f"{edition_label(before)} {ARROW} {edition_label(after)}"
    for book in (before, after):
        for evidence in book.evidence_of():
            text = f"{edition_label(book)}: {evidence_text(evidence)}"
            yield from wrap(text, width, subsequent_indent=GAP)
    groups = state_groups(comparison)
    if not groups:
        yield "nothing differs"
    for heading, found in groups:
        yield ""
        yield f"{heading} ({len(found)})"
        for each in found:
            yield from _lines(comparison, each, width)


def state_groups(comparison: Comparison) -> list[tuple[str, list[Difference]]]:
    """Group differences by kind and by what became of it, each group under its heading."""
    every = [
        (f"{kind} {word}", [each for each in getattr(comparison, kind) if state(each) == word])
        for kind in SETS
        for word in STATES
    ]
    return [(heading, found) for heading, found in every if found]


def _lines(comparison: Comparison, difference: Difference, width: int) -> Iterator[str]:
    text = f"{title(difference.thing)}"
    if isinstance(difference.thing, Variable) and difference.before and difference.after:
        text = difference.thing.name
    yield from wrap(text, width, initial_indent=GAP, subsequent_indent=GAP * 3)
    yield from aligned(said(difference), width, 4)
    notes = [("evidence", evidence_text(each)) for each in evidence_about(comparison, difference)]
    yield from aligned(notes, width, 4)


def evidence_about(comparison: Comparison, difference: Difference) -> Iterator[Evidence]:
    """Yield why what is compared rests on less than the published text."""
    for book, thing in (
        (comparison.before, difference.before),
        (comparison.after, difference.after),
    ):
        if thing is not None:
            yield from own_evidence(book, thing)


def narrowed(comparison: Comparison, things: Sequence[Thing]) -> Comparison:
    """Leave only the differences of the given things."""

    def wanted(found: tuple[Difference, ...]) -> tuple[Difference, ...]:
        return tuple(each for each in found if each.before in things or each.after in things)

    return replace(
        comparison,
        variables=wanted(comparison.variables),
        packets=wanted(comparison.packets),
        messages=wanted(comparison.messages),
        headers=wanted(comparison.headers),
    )
