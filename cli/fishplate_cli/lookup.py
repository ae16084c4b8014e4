"""Finding what a person asks about: variables, packets, messages and headers, by number or name."""

from __future__ import annotations

import re
from difflib import get_close_matches
from typing import TYPE_CHECKING, NamedTuple

from fishplate.standard.comparison import counterparts
from fishplate.standard.editions import EDITIONS, reaches
from fishplate.standard.history import stages
from fishplate.standard.vocabulary import (
    COUNT,
    Eq,
    Field,
    Group,
    Header,
    In,
    Ne,
    Opaque,
    Packet,
    RadioMessage,
    Repeat,
    Series,
    Text,
    Variable,
    When,
)
from fishplate_cli.wording import EVIDENCE

if TYPE_CHECKING:
    from collections.abc import Iterator, Sequence

    from fishplate.standard import Registry
    from fishplate.standard.history import Stage
    from fishplate.standard.vocabulary import Condition, Node

Found = Variable | Packet | RadioMessage | Header

KINDS = ("packet", "message", "header", "variable")
WAYS = ("to-train", "to-track")
HEADER_WORDS = {"balise": "balise", "telegram": "balise", "loop": "loop"}
CLOSE = 5
MOST = 8


class NotFoundError(Exception):
    """Nothing bears that name; `close` lists names that look like it."""

    def __init__(self, words: str, close: Sequence[str], where: str = "") -> None:
        hint = f"; close to it: {', '.join(close)}" if close else ""
        super().__init__(f"nothing is called {words!r}{where}{hint}")


class Answer(NamedTuple):
    """What was found, in which registry, and a sentence on why that is not the one asked."""

    book: Registry
    found: list[Found]
    note: str = ""


def find(book: Registry, words: Sequence[str], *, only_here: bool) -> Answer:
    """Look in one registry, and then in the others; raises `NotFoundError`.

    With `only_here`, what only another one knows is followed back to this one.
    """
    try:
        return Answer(book, look_up(book, words))
    except NotFoundError as error:
        others = [(stage, there) for stage in _by_preference() if (there := _there(stage, words))]
        if not others:
            raise
        asked = " ".join(words)
        if not only_here:
            stage, there = others[0]
            where = stage_label(stage, there[0])
            return Answer(
                stage.book, there, f"{asked!r} is not in {book.version}; found in {where}"
            )
        for stage, there in others:
            here = [same[0] for each in there if (same := counterparts(each, book))]
            if here:
                where = stage_label(stage, there[0])
                note = f"{asked!r} is of {where}; in {book.version} this carries it"
                return Answer(book, list(dict.fromkeys(here)), note)
        places = ", ".join(stage_label(each, found[0]) for each, found in others)
        where = f" in {book.version} (issue {book.issue}), only in {places}"
        raise NotFoundError(asked, (), where) from error


def _by_preference() -> list[Stage]:
    """Return the layouts in the order in which versions are tried where nothing says which."""
    order = [each.layouts for each in EDITIONS]
    return sorted(stages(), key=lambda each: order.index(each.book.layouts))


def _there(stage: Stage, words: Sequence[str]) -> list[Found]:
    try:
        return look_up(stage.book, words)
    except NotFoundError:
        return []


def stage_label(stage: Stage, thing: Found | None = None) -> str:
    """Name the versions of a stage (of these, the ones that may use a thing) and its issue."""
    since = thing.since if isinstance(thing, Packet) else ""
    versions = [each for each in stage.versions if reaches(each, since)]
    kinds = [EVIDENCE[each.kind] for each in stage.book.evidence_of()]
    return f"{' and '.join(versions)} ({', '.join([f'issue {stage.book.issue}', *kinds])})"


def look_up(book: Registry, words: Sequence[str]) -> list[Found]:
    """Return everything that the words name; raises `NotFoundError`."""
    left = [part for word in words for part in word.split()]
    ways = [each for each in left if each.lower() in WAYS]
    left = [each for each in left if each.lower() not in WAYS]
    kind = left[0].lower() if len(left) > 1 and left[0].lower() in KINDS else ""
    if kind:
        left = left[1:]
    found = [
        each
        for each in _named(book, " ".join(left))
        if (not kind or _kind(each) == kind)
        and (not ways or getattr(each, "direction", "") == ways[0].lower())
    ]
    if not found:
        raise NotFoundError(" ".join(words), _close(book, " ".join(left)))
    return found


def _kind(found: Found) -> str:
    match found:
        case Packet():
            return "packet"
        case RadioMessage():
            return "message"
        case Header():
            return "header"
    return "variable"


def _layouts(book: Registry) -> list[Packet | RadioMessage]:
    every: list[Packet | RadioMessage] = [*book.packets.values(), *book.messages.values()]
    return sorted(every, key=lambda each: (isinstance(each, RadioMessage), each.number))


def _named(book: Registry, words: str) -> list[Found]:
    """Return what bears a number or a name: exactly, else by whole words of it."""
    if re.fullmatch(r"\d{1,3}", words):
        return [each for each in _layouts(book) if each.number == int(words)]
    upper = words.upper().replace(" ", "_")
    if upper in book.variables:
        return [book.variables[upper]]
    renamed = [each for each in book.variables.values() if upper in (*each.formerly, each.lineage)]
    if renamed:
        return list(renamed)
    if words.lower() in ("header", "headers"):
        return list(book.headers.values())
    if words.lower() in HEADER_WORDS:
        return [book.headers[HEADER_WORDS[words.lower()]]]
    wanted = words.lower()
    exact: list[Found] = [each for each in _layouts(book) if each.name.lower() == wanted]
    if exact:
        return exact
    if not wanted:
        return []
    whole = re.compile(rf"(?<!\w){re.escape(wanted)}")
    return [each for each in _layouts(book) if whole.search(each.name.lower())]


def _close(book: Registry, words: str) -> list[str]:
    names = {each.name.lower(): each.name for each in _layouts(book)}
    names |= {each.lower(): each for each in book.variables}
    names |= {each: each for each in HEADER_WORDS}
    close = [names[each] for each in get_close_matches(words.lower(), names, CLOSE, 0.6)]
    wanted = words.upper().replace(" ", "_")
    inside = [each for each in book.variables if wanted and wanted in each][: MOST - len(close)]
    return list(dict.fromkeys([*close, *inside]))


def variables_in(nodes: Sequence[Node]) -> Iterator[str]:
    """Yield the variables of a layout, in wire order, some more than once."""
    for node in nodes:
        match node:
            case Field():
                yield node.variable
            case Text():
                yield from (node.length, node.element)
            case Opaque():
                pass
            case Series() | Repeat():
                yield from variables_in(node.nodes)
                yield COUNT
            case Group() | When():
                yield from variables_in(node.nodes)


def users(book: Registry, variable: Variable) -> list[Packet | RadioMessage | Header]:
    """Return the layouts that hold a variable."""
    every: list[Packet | RadioMessage | Header] = [*book.headers.values(), *_layouts(book)]
    return [each for each in every if variable.name in variables_in(each.nodes)]


def carriers(book: Registry, packet: Packet) -> list[tuple[RadioMessage, str]]:
    """Return the messages that carry a packet, and whether they must or may."""
    found = []
    for message in book.messages.values():
        if message.direction != packet.direction:
            continue
        if any(packet.number in entry for entry in message.required.packets):
            found.append((message, "required"))
        elif any(each.packet == packet.number for each in message.optional):
            found.append((message, "optional"))
    return sorted(found, key=lambda each: each[0].number)


def condition_text(condition: Condition) -> str:
    """Write a condition in signs."""
    match condition:
        case Eq():
            return f"{condition.variable} = {condition.code}"
        case Ne():
            return f"{condition.variable} ≠ {condition.code}"
        case In():
            return f"{condition.variable} = {' or '.join(map(str, condition.codes))}"
