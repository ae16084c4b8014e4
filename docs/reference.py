"""Write the reference pages from the registry, or check that the committed ones are current.

``python docs/reference.py`` writes, ``python docs/reference.py --check`` compares and ends with
code 1 when a page is missing, stale or left over.
"""

from __future__ import annotations

import argparse
import sys
from collections import defaultdict
from pathlib import Path
from typing import TYPE_CHECKING, TypeVar

from fishplate.standard import known_versions, registry
from fishplate.standard import vocabulary as v

if TYPE_CHECKING:
    from collections.abc import Iterable, Iterator, Mapping, Sequence

    from fishplate.standard import Registry

FOLDER = Path(__file__).parent / "reference"
NOTE = "<!-- Written by docs/reference.py from the registry: change the declarations instead. -->"

Sent = TypeVar("Sent", v.Packet, v.RadioMessage)

WAYS: dict[v.Direction, str] = {v.TO_TRAIN: "track to train", v.TO_TRACK: "train to track"}
CODINGS = {
    "unsigned": "unsigned number",
    "signed": "signed number, two's complement",
    "bitset": "set of bits",
    "digits": "decimal digits in nibbles, left adjusted, padded with F",
    "latin1": "character of ISO 8859-1",
    "group-identity": "NID_C in the 10 high bits, NID_BG in the 14 low bits",
    "version": "X in the 3 high bits, Y in the 4 low bits",
}
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
    registries = [registry(version) for version in known_versions()]
    yield "index.md", join(index(registries))
    for book in registries:
        yield f"{book.issue}/index.md", join(issue_index(book))
        yield f"{book.issue}/variables.md", join(variables(book))
        yield f"{book.issue}/telegrams.md", join(telegrams(book))
        for direction in (v.TO_TRAIN, v.TO_TRACK):
            yield f"{book.issue}/packets-{direction}.md", join(packets(book, direction))
            yield f"{book.issue}/messages-{direction}.md", join(messages(book, direction))


def join(blocks: Iterable[str]) -> str:
    """Blocks of Markdown as one page."""
    return "\n\n".join([NOTE, *blocks]) + "\n"


def index(registries: Sequence[Registry]) -> Iterator[str]:
    """The page that leads to every issue of the standard."""
    yield "# Reference"
    yield (
        "Written from the registry that the codec itself is generated from. Names, widths, codes,"
        " order and conditions are facts of SUBSET-026; titles and labels are our own words. The"
        " standard decides, not these pages."
    )
    yield toctree(f"{book.issue}/index" for book in registries)


def issue_index(book: Registry) -> Iterator[str]:
    """The page that leads to everything one issue declares."""
    yield f"# SUBSET-026 issue {book.issue} (system version {book.version})"
    yield (
        f"{len(book.variables)} variables, {len(book.packets)} packets, {len(book.messages)} radio"
        f" messages and {len(book.headers)} headers."
    )
    yield (
        "**How to read the layouts.** Fields stand in the order of the wire, most significant bit"
        " first. `set[].NAME` is a field of each element of a list, `group.NAME` a field of a"
        " group. A list row says where its N_ITER stands. Distances with a step set by Q_SCALE"
        " count 0.1 m, 1 m or 10 m."
    )
    layouts = (f"{kind}-{direction}" for kind in ("packets", "messages") for direction in WAYS)
    yield toctree(["telegrams", *layouts, "variables"])


def toctree(names: Iterable[str]) -> str:
    """A table of contents."""
    return "\n".join(["```{toctree}", ":maxdepth: 1", "", *names, "```"])


def variables(book: Registry) -> Iterator[str]:
    """All variables with their codes and the places that hold them."""
    places = uses(book)
    yield f"# Variables (issue {book.issue})"
    for variable in sorted(book.variables.values(), key=lambda each: each.name):
        yield f"({target(book, 'variable', variable.name)})="
        yield f"## {variable.name}"
        yield f"Clause {variable.clause}: {escape(variable.title)}."
        yield table(
            ("bits", "coding", "step", "plain numbers"),
            [
                (
                    str(variable.bits),
                    CODINGS[variable.coding],
                    step(variable),
                    span(*variable.plain) if variable.plain else "",
                )
            ],
        )
        if variable.codes:
            meanings = (
                (span(each.first, each.last), KINDS[each.kind], escape(each.label))
                for each in variable.codes
            )
            yield table(("code", "kind", "meaning"), meanings)
        if variable.formerly:
            yield f"In earlier issues: {', '.join(map(code, variable.formerly))}."
        if used := places[variable.name]:
            yield f"Used in {', '.join(used)}."


def step(variable: v.Variable) -> str:
    """The size of one step with its unit."""
    if variable.resolution == v.SCALED:
        return "0.1, 1 or 10 m by Q_SCALE"
    return f"{variable.resolution} {variable.unit}".strip()


def span(first: int, last: int) -> str:
    """One code or a range of them."""
    return str(first) if first == last else f"{first} to {last}"


def uses(book: Registry) -> Mapping[str, list[str]]:
    """Links to headers, packets and messages, by the variable that they hold."""
    found: dict[str, list[str]] = defaultdict(list)
    for header in book.headers.values():
        for name in names(header.nodes):
            found[name].append(link(book, f"{header.medium} header", "header", header.medium))
    sent: list[v.Packet | v.RadioMessage] = [*by_number(book.packets), *by_number(book.messages)]
    for each in sent:
        kind, direction, number = key(each)
        for name in dict.fromkeys(names(each.nodes)):
            text = f"{kind} {number} {direction}"
            found[name].append(link(book, text, kind, direction, number))
    return found


def key(what: v.Packet | v.RadioMessage) -> tuple[object, ...]:
    """The parts of the link target of a packet or message."""
    kind = "packet" if isinstance(what, v.Packet) else "message"
    return kind, what.direction, what.number


def by_number(found: Mapping[tuple[str, int], Sent]) -> list[Sent]:
    """Packets or messages sorted, track to train first."""
    order = list(WAYS)
    return sorted(found.values(), key=lambda each: (order.index(each.direction), each.number))


def names(nodes: Iterable[v.Node]) -> Iterator[str]:
    """The variables of a layout in wire order, N_ITER and text lengths included."""
    for node in nodes:
        match node:
            case v.Field(variable=variable):
                yield variable
            case v.Series() | v.Repeat():
                yield v.COUNT
                yield from names(node.nodes)
            case v.Group() | v.When():
                yield from names(node.nodes)
            case v.Text(length=length, element=element):
                yield from (length, element)
            case v.Opaque():
                pass


def telegrams(book: Registry) -> Iterator[str]:
    """The headers of balise telegrams and loop messages."""
    yield f"# Balise telegrams and loop messages (issue {book.issue})"
    yield (
        "A header, packets, and packet 255 as the end flag. What follows the end flag is kept as"
        " `filler`. Radio messages have their fixed variables instead of a header."
    )
    for header in book.headers.values():
        yield f"({target(book, 'header', header.medium)})="
        yield f"## Header, {header.medium}"
        yield f"Clause {header.clause}. {length(book, header.nodes)}"
        yield layout(book, header.nodes)


def packets(book: Registry, direction: v.Direction) -> Iterator[str]:
    """The packets of one direction."""
    yield f"# Packets, {WAYS[direction]} (issue {book.issue})"
    yield "What stands after the last field, up to L_PACKET, is kept as `surplus`."
    for packet in by_number(book.packets):
        if packet.direction == direction:
            yield from opening(book, packet)
            yield length(book, packet.nodes)
            yield layout(book, packet.nodes)


def messages(book: Registry, direction: v.Direction) -> Iterator[str]:
    """The radio messages of one direction."""
    yield f"# Radio messages, {WAYS[direction]} (issue {book.issue})"
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
    yield f"Clause {what.clause}. {way}: {', '.join(map(escape, what.senders))}."


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
    return table(("field", "bits", "present when", "title"), rows(book, nodes))


Row = tuple[str, str, str, str]


def rows(
    book: Registry, nodes: Sequence[v.Node], prefix: str = "", when: tuple[str, ...] = ()
) -> Iterator[Row]:
    """One row a field, list, text or opaque part; `when` holds the conditions around it."""
    present = " and ".join(when)
    for node in nodes:
        match node:
            case v.Field():
                yield field_row(book, prefix + node.name, node.variable, present)
            case v.Group():
                yield from rows(book, node.nodes, f"{prefix}{node.name}.", when)
            case v.Series() | v.Repeat():
                yield list_row(book, node, prefix, present)
                yield from rows(book, node.nodes, f"{prefix}{node.name}[].", when)
            case v.When():
                yield from rows(book, node.nodes, prefix, (*when, condition(node.condition)))
            case v.Text():
                yield field_row(book, prefix + node.length, node.length, present)
                _, bits, *_ = field_row(book, "", node.element, present)
                yield (
                    code(prefix + node.element),
                    f"{node.length} times {bits}",
                    present,
                    "the text",
                )
            case v.Opaque():
                yield (code(prefix + node.name), "rest", present, "bits that no layout explains")


def field_row(book: Registry, place: str, name: str, present: str) -> Row:
    """The row of one variable."""
    variable = book.variables[name]
    return (
        link(book, code(place), "variable", name),
        str(variable.bits),
        present,
        escape(variable.title),
    )


def list_row(book: Registry, node: v.Series | v.Repeat, prefix: str, present: str) -> Row:
    """The row that says how often the elements of a list stand there."""
    bits = book.variables[v.COUNT].bits
    if isinstance(node, v.Series):
        text = f"list: one element, {v.COUNT} ({bits} bits), then {v.COUNT} further elements"
    else:
        text = f"list: {v.COUNT} ({bits} bits), then {v.COUNT} elements"
    return code(f"{prefix}{node.name}"), "", present, escape(text)


def condition(what: v.Condition) -> str:
    """A condition in words."""
    match what:
        case v.Eq(variable=name, code=value):
            return f"{escape(name)} = {value}"
        case v.Ne(variable=name, code=value):
            return f"{escape(name)} ≠ {value}"
        case v.In(variable=name, codes=values):
            return f"{escape(name)} = {' or '.join(map(str, values))}"


def length(book: Registry, nodes: Sequence[v.Node]) -> str:
    """The size of a layout in bits, or the least it can have."""
    bits, fixed = size(book, nodes)
    return f"{bits} bits." if fixed else f"At least {bits} bits."


def size(book: Registry, nodes: Iterable[v.Node]) -> tuple[int, bool]:
    """Bits that are always there, and whether there can be no more."""
    total, fixed = 0, True
    for node in nodes:
        match node:
            case v.Field(variable=name):
                total += book.variables[name].bits
            case v.Group() | v.Series():
                inner, inner_fixed = size(book, node.nodes)
                total += inner
                fixed = fixed and inner_fixed
            case v.Text(length=name):
                total += book.variables[name].bits
        if isinstance(node, v.Series | v.Repeat):
            total += book.variables[v.COUNT].bits
        fixed = fixed and isinstance(node, v.Field | v.Group)
    return total, fixed


def link(book: Registry, text: str, *parts: object) -> str:
    """A link to the section of a variable, header, packet or message."""
    return f"[{text}](#{target(book, *parts)})"


def target(book: Registry, *parts: object) -> str:
    """A link target that is unique over all issues."""
    return "-".join(map(str, (book.issue, *parts))).lower()


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
