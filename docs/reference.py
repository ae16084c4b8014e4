"""Write the reference pages from the registries, or check that the committed ones are current.

``python docs/reference.py`` writes, ``python docs/reference.py --check`` compares and ends with
code 1 when a page is missing, stale or left over.
"""

from __future__ import annotations

import argparse
import sys
from importlib import import_module
from pathlib import Path
from typing import TYPE_CHECKING, TypeVar

from fishplate.standard import registry
from fishplate.standard import vocabulary as v
from fishplate.standard.comparison import compare, difference
from fishplate.standard.fields import Place, places
from fishplate.standard.history import Stage, neighbour, own_evidence, stages
from fishplate_cli.compare import edition_label, said, state_groups, title
from fishplate_cli.console import counted
from fishplate_cli.describe import CODINGS, length_text
from fishplate_cli.lookup import condition_text, users
from fishplate_cli.wording import EVIDENCE

if TYPE_CHECKING:
    from collections.abc import Container, Iterable, Iterator, Mapping, Sequence

    from fishplate.standard import Registry
    from fishplate.standard.comparison import Difference, Thing

FOLDER = Path(__file__).parent / "reference"
NOTE = "<!-- Written by docs/reference.py from the registry: change the declarations instead. -->"

Sent = TypeVar("Sent", v.Packet, v.RadioMessage)

WHAT_REPEATS = {
    "series": "N\\_ITER of the list: so many further elements follow",
    "repeat": "N\\_ITER of the list: so many elements follow",
}
WAYS: dict[v.Direction, str] = {v.TO_TRAIN: "track to train", v.TO_TRACK: "train to track"}
MAIN = registry()
KINDS = {
    "value": "value",
    "special": "special meaning",
    "spare": "spare",
    "bit": "bit with this weight",
    "spare_bit": "spare bit with this weight",
    "range": "note on plain numbers",
}


def main(arguments: Sequence[str] | None = None) -> int:
    """Write or check; 0 when all pages are current afterwards, else 1."""
    parser = argparse.ArgumentParser(description=__doc__)
    parser.add_argument("--check", action="store_true", help="compare only, write nothing")
    check = parser.parse_args(arguments).check
    wanted = dict(pages())
    found = {path.relative_to(FOLDER).as_posix() for path in FOLDER.rglob("*.md")}
    wrong = sorted(found - wanted.keys())
    for name, text in wanted.items():
        path = FOLDER / name
        if path.is_file() and path.read_text(encoding="utf-8") == text:
            continue
        wrong.append(name)
        if not check:
            path.parent.mkdir(parents=True, exist_ok=True)
            path.write_text(text, encoding="utf-8", newline="\n")
    if not check:
        for name in found - wanted.keys():
            (FOLDER / name).unlink()
    for name in wrong:
        print(f"docs/reference/{name}: {'not current' if check else 'written'}", file=sys.stderr)
    return 1 if check and wrong else 0


def pages() -> Iterator[tuple[str, str]]:
    """Every page as name below docs/reference and text."""
    every = stages()
    yield "index.md", join(index(every))
    yield "differences.md", join(differences(every))
    for stage in every:
        book, name = stage.book, folder(stage.book)
        yield f"{name}/index.md", join(edition_index(stage))
        yield f"{name}/variables.md", join(variables(book))
        yield f"{name}/telegrams.md", join(telegrams(book))
        for direction in (v.TO_TRAIN, v.TO_TRACK):
            yield f"{name}/packets-{direction}.md", join(packets(book, direction))
            yield f"{name}/messages-{direction}.md", join(messages(book, direction))


def folder(book: Registry) -> str:
    """The folder of an edition: its issue, or the name of layouts that no issue prints as such."""
    printed = f"v{book.issue.replace('.', '_')}" == book.layouts
    return book.issue if printed else book.layouts.replace("_", "-")


def join(blocks: Iterable[str]) -> str:
    """Blocks of Markdown as one page."""
    return "\n\n".join([NOTE, *blocks]) + "\n"


def index(every: Sequence[Stage]) -> Iterator[str]:
    """The page that leads to every edition of the standard."""
    yield "# Reference"
    yield (
        "Written from the registries that the codec itself is generated from. Names, widths, codes,"
        " order and conditions are facts of SUBSET-026; titles and labels are our own words. The"
        " standard decides, not these pages."
    )
    yield table(
        ("system version", "issue", "layouts", "evidence"),
        (
            (
                " and ".join(stage.versions),
                f"{stage.book.issue} of {stage.book.date}",
                f"[{folder(stage.book)}]({folder(stage.book)}/index.md)",
                "; ".join(map(evidence, stage.book.evidence_of())) or "published",
            )
            for stage in every
        ),
    )
    yield toctree(["differences", *(f"{folder(stage.book)}/index" for stage in every)])


def evidence(what: v.Evidence) -> str:
    """On what something rests."""
    return f"**{EVIDENCE[what.kind]}**: {escape(what.note)}"


def edition_index(stage: Stage) -> Iterator[str]:
    """The page that leads to everything one edition declares."""
    book = stage.book
    versions = "version" if len(stage.versions) == 1 else "versions"
    yield f"# System {versions} {' and '.join(stage.versions)} (issue {book.issue})"
    declared = import_module(f"fishplate.standard.{book.layouts}").__doc__ or ""
    yield escape(declared.strip())
    yield from map(evidence, book.evidence_of())
    yield (
        f"{len(book.variables)} variables, {len(book.packets)} packets, {len(book.messages)} radio"
        f" messages and {len(book.headers)} headers."
    )
    yield (
        "**How to read the layouts.** Fields stand in the order of the wire, most significant bit"
        " first. `set[].NAME` is a field of each element of a list, `group.NAME` a field of a"
        " group. A list row is its N_ITER. Distances with a step set by Q_SCALE"
        " count 0.1 m, 1 m or 10 m."
    )
    layouts = (f"{kind}-{direction}" for kind in ("packets", "messages") for direction in WAYS)
    yield toctree(["telegrams", *layouts, "variables"])


def differences(every: Sequence[Stage]) -> Iterator[str]:
    """What changed from one edition to another."""
    yield "# Differences between editions"
    yield (
        "Found by comparing the registries; `fishplate about --between` compares any two editions."
        " *meaning* names fields whose variable has other codes, another range or step: what is"
        " other about it stands with the variable."
    )
    for stage in every:
        old = neighbour(stage, every)
        if old is None:
            continue
        yield f"## {edition_label(old.book)} to {edition_label(stage.book)}"
        for heading, found in state_groups(compare(old.book, stage.book)):
            yield f"### {heading.capitalize()}"
            yield table(("", "", ""), difference_rows(old.book, stage.book, found))


def difference_rows(
    before: Registry, after: Registry, found: Iterable[Difference]
) -> Iterator[tuple[str, str, str]]:
    """One row a difference, the thing named in the first of its rows."""
    for each in found:
        what = each.thing
        name, about = title(what), ""
        if isinstance(what, v.Variable):
            name, about = what.name, what.title
        cell = link(before if each.after is None else after, escape(name), *key(what))
        for label, text in list(said(each)) or [("", about)]:
            yield cell, label, escape(text)
            cell = ""


def toctree(names: Iterable[str]) -> str:
    """A table of contents."""
    return "\n".join(["```{toctree}", ":maxdepth: 1", "", *names, "```"])


def variables(book: Registry) -> Iterator[str]:
    """The variables that this edition has otherwise than the main one, with codes and places."""
    yield f"# Variables, {edition_label(book)}"
    every = sorted(book.variables.values(), key=lambda each: each.name)
    if same := [each.name for each in every if home(book, each.name) is not book]:
        names = ", ".join(link(book, escape(name), "variable", name) for name in same)
        yield f"As in {edition_label(MAIN)}: {names}. All others follow."
    for variable in every:
        if variable.name not in same:
            yield f"({target(book, 'variable', variable.name)})="
            yield f"## {variable.name}"
            yield from one_variable(book, variable)


def home(book: Registry, name: str) -> Registry:
    """The registry on whose page a variable stands: the main one where both have it alike."""
    main = MAIN.variables.get(name)
    variable = book.variables[name]
    differs = not main or difference(MAIN, main, book, variable) or own_evidence(book, variable)
    return book if differs else MAIN


def one_variable(book: Registry, variable: v.Variable) -> Iterator[str]:
    """What there is to say of one variable."""
    yield f"Clause {variable.clause}: {escape(variable.title)}."
    facts = [counted(variable.bits, "bit"), CODINGS[variable.coding]]
    if variable.unit:
        facts.append(f"a step is {step(variable)}")
    if variable.plain:
        facts.append(f"plain numbers are {span(*variable.plain)}")
    yield f"{'; '.join(facts)}."
    if variable.codes:
        meanings = (
            (span(each.first, each.last), KINDS[each.kind], escape(each.label))
            for each in variable.codes
        )
        yield table(("code", "kind", "meaning"), meanings)
    if variable.formerly:
        yield f"In earlier issues: {', '.join(map(code, variable.formerly))}."
    yield from map(evidence, own_evidence(book, variable))
    if used := users(book, variable):
        yield f"Used in {', '.join(use(book, each) for each in used)}."


def step(variable: v.Variable) -> str:
    """The size of one step with its unit."""
    if variable.resolution == v.SCALED:
        return "0.1, 1 or 10 m by Q_SCALE"
    return f"{variable.resolution} {variable.unit}".strip()


def span(first: int, last: int) -> str:
    """One code or a range of them."""
    return str(first) if first == last else f"{first} to {last}"


def key(what: Thing) -> tuple[object, ...]:
    """The parts of the link target of a variable, header, packet or message."""
    match what:
        case v.Variable():
            return "variable", what.name
        case v.Header():
            return "header", what.medium
        case v.Packet():
            return "packet", what.direction, what.number
        case v.RadioMessage():
            return "message", what.direction, what.number


def use(book: Registry, what: v.Header | v.Packet | v.RadioMessage) -> str:
    """A link to a layout that holds a variable."""
    kind, *rest = key(what)
    words = [*rest, kind] if isinstance(what, v.Header) else [kind, rest[1], rest[0]]
    return link(book, " ".join(map(str, words)), *key(what))


def by_number(found: Mapping[tuple[str, int], Sent]) -> list[Sent]:
    """Packets or messages sorted, track to train first."""
    order = list(WAYS)
    return sorted(found.values(), key=lambda each: (order.index(each.direction), each.number))


def telegrams(book: Registry) -> Iterator[str]:
    """The headers of balise telegrams and loop messages."""
    yield f"# Balise telegrams and loop messages, {edition_label(book)}"
    yield (
        "A header, packets, and packet 255 as the end flag. What follows the end flag is kept as"
        " `filler`. Radio messages have their fixed variables instead of a header."
    )
    for header in book.headers.values():
        yield f"({target(book, 'header', header.medium)})="
        yield f"## Header, {header.medium}"
        yield f"Clause {header.clause}. {length_text(book, header.nodes)}."
        yield layout(book, header.nodes)


def packets(book: Registry, direction: v.Direction) -> Iterator[str]:
    """The packets of one direction."""
    yield f"# Packets, {WAYS[direction]}, {edition_label(book)}"
    yield "What stands after the last field, up to L_PACKET, is kept as `surplus`."
    for packet in by_number(book.packets):
        if packet.direction == direction:
            yield from opening(book, packet)
            yield f"{length_text(book, packet.nodes)}."
            yield layout(book, packet.nodes)


def messages(book: Registry, direction: v.Direction) -> Iterator[str]:
    """The radio messages of one direction."""
    yield f"# Radio messages, {WAYS[direction]}, {edition_label(book)}"
    yield "Fixed variables, then the required packets in this order, then optional packets."
    for message in by_number(book.messages):
        if message.direction == direction:
            yield from opening(book, message)
            if message.version_invariant:
                yield "The same in every system version."
            yield layout(book, message.nodes)
            yield from attached(book, message)


def opening(book: Registry, what: v.Packet | v.RadioMessage) -> Iterator[str]:
    """Link target, heading, clause and senders of a packet or message."""
    kind = "Packet" if isinstance(what, v.Packet) else "Message"
    yield f"({target(book, *key(what))})="
    yield f"## {kind} {what.number}: {escape(what.name)}"
    way = "Sent by" if what.direction == v.TO_TRAIN else "Sent to"
    senders = ", ".join(map(escape, what.senders)) or "not said"
    since = f" From version {what.since} on." if isinstance(what, v.Packet) and what.since else ""
    yield f"Clause {what.clause}. {way}: {senders}.{since}"
    other = book.forms.get((what.direction, what.number)) if isinstance(what, v.Packet) else None
    if other:
        told = "" if other.only else ", where L\\_PACKET tells so"
        yield f"Laid out as in version {other.version}{told}."
    yield from map(evidence, own_evidence(book, what))


def attached(book: Registry, message: v.RadioMessage) -> Iterator[str]:
    """The packets that follow the fixed variables of a message."""

    def packet(number: int) -> str:
        return link(book, str(number), "packet", message.direction, number)

    if message.required.packets:
        entries = (" or ".join(map(packet, each)) for each in message.required.packets)
        yield f"Required packets: {', '.join(entries)}."
    if message.optional:
        entries = (
            packet(each.packet) + (f" ({escape(each.sender)} only)" if each.sender else "")
            for each in message.optional
        )
        yield f"Optional packets: {', '.join(entries)}."
    if not (message.required.packets or message.optional):
        yield "No packets."


def layout(book: Registry, nodes: Sequence[v.Node]) -> str:
    """A layout as a table in wire order."""
    found = places(book, nodes)
    lists = {each.path for each in found if each.repeats in WHAT_REPEATS}
    head = ("field", "bits", "present when", "title")
    return table(head, [row(book, each, lists) for each in found])


def row(book: Registry, place: Place, lists: Container[tuple[str, ...]]) -> tuple[str, ...]:
    """The row of one field, with `[]` behind the lists around it."""
    path = place.path
    inside = [f"{each}[]" if path[:n] in lists else each for n, each in enumerate(path[:-1], 1)]
    name = code(".".join([*inside, path[-1]]))
    present = escape(" and ".join(map(condition_text, place.when)))
    if place.repeats == "opaque":
        return name, "rest", present, "bits that no layout explains"
    text = WHAT_REPEATS.get(place.repeats, escape(book.variables[place.variable].title))
    bits = f"{place.bits} each" if place.repeats == "text" else str(place.bits)
    return link(book, name, "variable", place.variable), bits, present, text


def link(book: Registry, text: str, *parts: object) -> str:
    """A link to the section of a variable, header, packet or message."""
    return f"[{text}](#{target(book, *parts)})"


def target(book: Registry, *parts: object) -> str:
    """A link target that is unique over all editions."""
    owner = home(book, str(parts[1])) if parts[0] == "variable" else book
    return "-".join(map(str, (folder(owner), *parts))).lower()


def table(head: Sequence[str], body: Iterable[Sequence[str]]) -> str:
    """A Markdown table."""
    lines = [head, ["---"] * len(head), *body]
    return "\n".join(f"| {' | '.join(cells)} |" for cells in lines)


def code(text: str) -> str:
    """Text in code style."""
    return f"`{text}`"


def escape(text: str) -> str:
    """Text of ours without accidental Markdown."""
    for sign in "\\|_*<[":
        text = text.replace(sign, f"\\{sign}")
    return text


if __name__ == "__main__":
    sys.exit(main())
