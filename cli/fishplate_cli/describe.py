"""What `fishplate about` says of a variable, a packet, a message or a header, as text."""

from __future__ import annotations

from textwrap import wrap
from types import MappingProxyType
from typing import TYPE_CHECKING

from fishplate.standard.history import evidence_for, history, own_evidence, stages
from fishplate.standard.vocabulary import (
    COUNT,
    SCALED,
    Field,
    Group,
    Header,
    Opaque,
    Packet,
    RadioMessage,
    Repeat,
    Series,
    Text,
    Variable,
    When,
)
from fishplate_cli.compare import aligned, evidence_text, said, title
from fishplate_cli.console import counted
from fishplate_cli.lookup import carriers, condition_text, stage_label, users

if TYPE_CHECKING:
    from collections.abc import Iterable, Iterator, Sequence

    from fishplate.standard import Registry
    from fishplate.standard.history import Form, History
    from fishplate.standard.vocabulary import Codes, Node
    from fishplate_cli.lookup import Found

GAP = "  "
BITS = 6
NAME = 26
CODINGS = MappingProxyType(
    {
        "unsigned": "unsigned",
        "signed": "signed, two's complement",
        "bitset": "a set of bits",
        "digits": "decimal digits in nibbles, left adjusted, filled with F",
        "latin1": "one ISO 8859-1 character",
        "group-identity": "NID_C in 10 bits, NID_BG in 14",
        "version": "X in 3 bits, Y in 4",
    }
)
KINDS = MappingProxyType(
    {"special": "special", "spare": "spare", "spare_bit": "spare bit", "bit": "bit"}
)


class Description:
    """Writes descriptions from one registry, `width` columns wide."""

    def __init__(self, book: Registry, width: int) -> None:
        self.book = book
        self.width = width

    def lines(self, found: Found) -> Iterator[str]:
        """Yield the lines about one thing, and about its forms in other editions."""
        yield from self._here(found)
        yield from self._history(history(found, stages()))

    def _here(self, found: Found) -> Iterator[str]:
        match found:
            case Variable():
                yield from self._variable(found)
            case Packet():
                yield from self._packet(found)
            case RadioMessage():
                yield from self._message(found)
            case Header():
                yield title(found)
                yield from self._fact("clause", found.clause)
                yield from self._fact("length", counted(found.bits, "bit"))
                yield from self._evidence(found)
                yield from self._layout(found.nodes)

    def _fact(self, name: str, text: str) -> Iterator[str]:
        start = f"{GAP}{name:<10}{GAP}"
        yield from wrap(text, self.width, initial_indent=start, subsequent_indent=" " * len(start))

    def _evidence(self, found: Found) -> Iterator[str]:
        for each in evidence_for(self.book, found):
            yield from self._fact("evidence", evidence_text(each))

    def _history(self, past: History) -> Iterator[str]:
        if len(past.forms) == 1 and not past.absent:
            yield from self._fact("history", "the same in every edition")
            return
        yield f"{GAP}history"
        for form in past.forms:
            editions = ", ".join(stage_label(each, form.thing) for each in form.stages)
            heading = (
                editions
                if form.against is None
                else f"{editions}, against {stage_label(form.against)}"
            )
            yield from wrap(
                f"{heading}:", self.width, initial_indent=GAP * 2, subsequent_indent=GAP * 4
            )
            yield from aligned(self._form(form), self.width, 3 * len(GAP))
        if past.absent:
            text = f"not in {', '.join(map(stage_label, past.absent))}"
            yield from wrap(text, self.width, initial_indent=GAP * 2, subsequent_indent=GAP * 4)

    def _form(self, form: Form) -> Iterator[tuple[str, str]]:
        if form.difference is None:
            yield "is", f"{title(form.thing)} ({form.thing.clause})"
        else:
            yield from said(form.difference)
        for stage, packet in form.beside:
            yield "beside", f"packet {packet.number} in {stage_label(stage, packet)}"
        for stage in form.stages:
            if stage.book.layouts != self.book.layouts:
                for each in own_evidence(stage.book, form.thing):
                    yield "evidence", f"{' and '.join(stage.versions)}: {evidence_text(each)}"

    def _variable(self, variable: Variable) -> Iterator[str]:
        yield from wrap(f"{variable.name}: {variable.title}", self.width, subsequent_indent=GAP)
        yield from self._fact("clause", variable.clause)
        yield from self._fact(
            "coding", f"{counted(variable.bits, 'bit')}, {CODINGS[variable.coding]}"
        )
        if variable.unit:
            step = f"{variable.resolution or 1} {variable.unit}"
            if variable.resolution == SCALED:
                step = f"0.1, 1 or 10 {variable.unit}, as the governing Q_SCALE says"
            yield from self._fact("step", step)
        if variable.plain:
            yield from self._fact("numbers", f"codes {variable.plain[0]} to {variable.plain[1]}")
        if variable.formerly:
            yield from self._fact("formerly", ", ".join(variable.formerly))
        yield from self._evidence(variable)
        if variable.codes:
            yield f"{GAP}codes"
            yield from self._codes(variable.codes)
        used = [title(each) for each in users(self.book, variable)]
        if used:
            yield f"{GAP}stands in"
            yield from self._list(used)

    def _codes(self, codes: Iterable[Codes]) -> Iterator[str]:
        for each in codes:
            numbers = str(each.first)
            if each.last != each.first:
                numbers = f"{each.first} to {each.last}"
            kind = KINDS.get(each.kind, "")
            label = each.label if not kind or each.label == kind else f"{kind}: {each.label}"
            start = f"{numbers:>16}{GAP}"
            yield from wrap(label, self.width, initial_indent=start, subsequent_indent=" " * 18)

    def _list(self, texts: Iterable[str]) -> Iterator[str]:
        for text in texts:
            yield from wrap(text, self.width, initial_indent=GAP * 2, subsequent_indent=GAP * 4)

    def _packet(self, packet: Packet) -> Iterator[str]:
        yield from wrap(title(packet), self.width, subsequent_indent=GAP)
        yield from self._fact("clause", packet.clause)
        word = "sent by" if packet.direction == "to-train" else "sent to"
        yield from self._fact(word, ", ".join(packet.senders))
        if packet.since:
            yield from self._fact("versions", f"from version {packet.since} on")
        other = self.book.forms.get((packet.direction, packet.number))
        if other:
            text = f"laid out as in {other.version}"
            if not other.only:
                text = f"may also be {text}: L_PACKET tells which"
            yield from self._fact("forms", text)
        yield from self._fact("length", length_text(self.book, packet.nodes))
        yield from self._evidence(packet)
        yield from self._layout(packet.nodes)
        carried = [f"{title(each)} ({how})" for each, how in carriers(self.book, packet)]
        if carried:
            yield f"{GAP}carried by"
            yield from self._list(carried)

    def _message(self, message: RadioMessage) -> Iterator[str]:
        yield from wrap(title(message), self.width, subsequent_indent=GAP)
        yield from self._fact("clause", message.clause)
        word = "sent by" if message.direction == "to-train" else "sent to"
        yield from self._fact(word, ", ".join(message.senders))
        if message.version_invariant:
            yield from self._fact("versions", "declared the same in every system version")
        yield from self._fact("length", f"{length_text(self.book, message.nodes)}, then packets")
        yield from self._evidence(message)
        yield from self._layout(message.nodes)
        if message.required.packets:
            yield f"{GAP}required packets, in this order"
            yield from self._list(
                " or ".join(self._packet_name(message, each) for each in entry)
                for entry in message.required.packets
            )
        if message.optional:
            yield f"{GAP}optional packets"
            yield from self._list(
                self._packet_name(message, each.packet)
                + (f" (from the {each.sender} only)" if each.sender else "")
                for each in message.optional
            )
        if not message.required.packets and not message.optional:
            yield f"{GAP}no packets"

    def _packet_name(self, message: RadioMessage, number: int) -> str:
        found = self.book.packets.get((message.direction, number))
        return f"packet {number}, {found.name}" if found else f"packet {number}"

    def _layout(self, nodes: Sequence[Node]) -> Iterator[str]:
        yield f"{GAP}layout"
        yield from self._nodes(nodes, 0)

    def _nodes(self, nodes: Sequence[Node], depth: int) -> Iterator[str]:
        for node in nodes:
            match node:
                case Field():
                    yield from self._field(node.variable, node.name, depth)
                case When():
                    yield self._said(depth, f"when {condition_text(node.condition)}:")
                    yield from self._nodes(node.nodes, depth + 1)
                case Group():
                    yield self._said(depth, f"{node.name}:")
                    yield from self._nodes(node.nodes, depth + 1)
                case Series():
                    yield self._said(depth, f"{node.name}, once:")
                    yield from self._nodes(node.nodes, depth + 1)
                    yield from self._field(COUNT, COUNT, depth)
                    yield self._said(depth, f"{node.name}, {COUNT} more of the same")
                case Repeat():
                    yield from self._field(COUNT, COUNT, depth)
                    yield self._said(depth, f"{node.name}, {COUNT} times:")
                    yield from self._nodes(node.nodes, depth + 1)
                case Text():
                    yield from self._field(node.length, node.length, depth)
                    yield self._said(depth, f"{node.length} times:")
                    yield from self._field(node.element, node.element, depth + 1)
                case Opaque():
                    yield self._said(depth, f"{node.name}: the rest of the packet")

    def _said(self, depth: int, text: str) -> str:
        return f"{'':{BITS}}{GAP}{GAP * depth}{text}"

    def _field(self, name: str, key: str, depth: int) -> Iterator[str]:
        variable = self.book.variables[name]
        label = f"{GAP * depth}{key}"
        start = f"{variable.bits:>{BITS}}{GAP}{label:<{NAME}}{GAP}"
        yield from wrap(
            variable.title,
            self.width,
            initial_indent=start,
            subsequent_indent=" " * (BITS + NAME + 2 * len(GAP)),
        )


def length_text(book: Registry, nodes: Sequence[Node]) -> str:
    """Say how long a layout is in bits, or at least is."""
    bits, fixed = _size(book, nodes)
    return counted(bits, "bit") if fixed else f"{bits} bits or more"


def _size(book: Registry, nodes: Iterable[Node]) -> tuple[int, bool]:
    """Return the bits that are always there, and whether there can be no more."""
    total, fixed = 0, True
    for node in nodes:
        match node:
            case Field():
                total += book.variables[node.variable].bits
            case Group():
                bits, same = _size(book, node.nodes)
                total, fixed = total + bits, fixed and same
            case Series():
                total += _size(book, node.nodes)[0] + book.variables[COUNT].bits
                fixed = False
            case Repeat():
                total, fixed = total + book.variables[COUNT].bits, False
            case Text():
                total, fixed = total + book.variables[node.length].bits, False
            case _:
                fixed = False
    return total, fixed
