"""`walk`: every field of a frame with its place, its code and its meaning."""

from __future__ import annotations

from dataclasses import dataclass
from functools import lru_cache
from typing import TYPE_CHECKING

from fishplate.bits import read_bits
from fishplate.engine.runtime import codec
from fishplate.engine.walk import Cursor, Row, Walk
from fishplate.errors import DecodeError, Path, Truncated
from fishplate.frames.decoding import decode
from fishplate.frames.sizes import HEAD_NODES, HEADS
from fishplate.meaning import Meaning, explain
from fishplate.standard import registry
from fishplate.standard.editions import DEFAULT_VERSION
from fishplate.standard.vocabulary import TO_TRAIN, Field, Opaque
from fishplate.versions import closest_layouts

if TYPE_CHECKING:
    from collections.abc import Iterator, Sequence
    from decimal import Decimal

    from fishplate.bits import Data
    from fishplate.engine.runtime import Codec
    from fishplate.frames.message import Message
    from fishplate.standard.vocabulary import Node, Packet


NOT_EXPLAINED = "not explained"


@dataclass(frozen=True, slots=True)
class FieldRow:
    """One field of a frame, in wire order.

    `offset` and `width` are in bits from the start of the frame. `raw` is the code (D_REF
    signed), a text for X_TEXT, hex for bits that no layout explains (`variable` is None then).
    `scale` is the code of the governing Q_SCALE, `meaning` what people read; `value` is the
    physical value in `unit` where the code is a quantity, None for labels and special meanings.
    """

    path: Path
    variable: str | None
    offset: int
    width: int
    raw: int | str
    meaning: str
    scale: int | None = None
    value: Decimal | None = None
    unit: str = ""


def walk(
    data: Data,
    *,
    medium: str | None = None,
    direction: str | None = None,
    version: str | None = None,
    issue: str | None = None,
    bits: int | None = None,
    strict: bool = True,
) -> Iterator[FieldRow]:
    """Return an iterator over the field rows of one frame; arguments as for `decode`.

    The rows cover every bit once. On broken input strict walking yields what stands before the
    trouble and then raises it; lenient walking goes on, with rows for bits that no layout
    explains.
    """
    message = decode(
        data,
        medium=medium,
        direction=direction,
        version=version,
        issue=issue,
        bits=bits,
        strict=False,
    )
    return walk_message(message, *read_bits(data, bits), strict=strict)


def walk_message(message: Message, value: int, size: int, *, strict: bool) -> Iterator[FieldRow]:
    """Yield the field rows of a frame that has been decoded leniently before."""
    frame = _Frame(message, value, size)
    if strict and message.problems:
        error = message.problems[0].error
        yield from map(frame.field_row, frame.rows_before(error))
        raise error
    yield from map(frame.field_row, frame.rows())


@lru_cache(maxsize=4096)
def _meaning(version: str, issue: str, name: str, raw: int | str, scale: int | None) -> Meaning:
    return explain(registry(version, issue).variables[name], raw, scale)


class _Frame:
    """A decoded message beside its bits: the message says which layouts apply where."""

    def __init__(self, message: Message, value: int, size: int) -> None:
        self.message = message
        self.value = value
        self.size = size
        self.layouts = message.layouts or codec(DEFAULT_VERSION)
        self.registry = self.layouts.registry
        self.unmeasured = self.layouts.unmeasured[self._direction]
        self.forms: dict[object, Codec] = {
            index: codec(packet["form"])
            for index, packet in enumerate(message.packets)
            if "form" in packet
        }

    def field_row(self, row: Row) -> FieldRow:
        place = (row.path, row.variable, row.offset, row.width, row.raw)
        if row.variable is None:
            return FieldRow(*place, NOT_EXPLAINED)
        layouts = self.layouts
        if self.forms and row.path[0] == "packets":
            layouts = self.forms.get(row.path[1], layouts)
        meaning = _meaning(layouts.version, layouts.issue, row.variable, row.raw, row.scale)
        return FieldRow(*place, meaning.text, row.scale, meaning.value, meaning.unit)

    def _cursor(self, start: int, size: int) -> Cursor:
        return Cursor(self.value >> self.size - start - size & (1 << size) - 1, size, start)

    def rows(self) -> list[Row]:
        """Return rows that cover the whole frame."""
        surplus = self.message.surplus["bits"] if self.message.surplus else 0
        cursor = self._cursor(0, self.size - surplus)
        self._header(cursor)
        for index in range(len(self.message.packets)):
            self._packet(cursor, index)
        for name in ("padding", "filler", "content"):
            if getattr(self.message, name):
                self._walk(cursor).unexplained(cursor.left, (name,))
        behind = self._cursor(self.size - surplus, surplus)
        self._walk(behind).unexplained(surplus, ("surplus",))
        return cursor.rows + behind.rows

    def rows_before(self, error: DecodeError) -> list[Row]:
        """Return the rows of everything that could be read before the trouble."""
        cursor = self._cursor(0, self.size)
        match error.path:
            case ("header", *_) if not self.message.packets and self.message.content:
                self._until_it_ends(cursor, self._header_nodes(), ("header",))
            case ("packets", int(index), *_):
                self._header(cursor)
                for each in range(min(index, len(self.message.packets))):
                    self._packet(cursor, each)
                self._broken_packet(cursor, index)
            case ("padding",):
                self._header(cursor)
                for each in range(len(self.message.packets)):
                    self._packet(cursor, each)
            case ("header", *_):
                self._header(cursor)
        return cursor.rows

    def _walk(self, cursor: Cursor) -> Walk:
        return Walk(self.registry.variables, cursor)

    def _header(self, cursor: Cursor) -> None:
        """Add the header, or as much of it as there is."""
        if self.message.medium is not None:
            self._until_it_ends(cursor, self._header_nodes(), ("header",))

    def _header_nodes(self) -> Sequence[Node]:
        if self.message.medium != "radio":
            return self.registry.headers[self.message.medium or "balise"].nodes
        number = self.message.header.get("NID_MESSAGE", self.value >> max(0, self.size - 8))
        known = self.registry.messages.get((self._direction, number))
        if closest_layouts(self.message.version) is None:
            known = None
        return known.nodes if known else (Field("NID_MESSAGE"), Field("L_MESSAGE"))

    @property
    def _direction(self) -> str:
        return self.message.direction or TO_TRAIN

    def _packet(self, cursor: Cursor, index: int) -> None:
        packet = self.message.packets[index]
        path = ("packets", index)
        if "content" in packet:
            self._kept_packet(cursor, index)
            return
        book = self.forms[index].registry if index in self.forms else self.registry
        nodes = book.packets[self._direction, packet["NID_PACKET"]].nodes
        width = packet.get("L_PACKET", cursor.left)
        inner = self._cursor(cursor.position, width)
        Walk(book.variables, inner).scope(nodes, path, {})
        if "surplus" in packet:
            self._walk(inner).unexplained(inner.left, (*path, "surplus"))
        cursor.rows += inner.rows
        cursor.position += inner.position

    def _kept_packet(self, cursor: Cursor, index: int) -> None:
        """Add a packet kept as content: the fields before the trouble, then the rest as it is."""
        packet = self.message.packets[index]
        path = ("packets", index)
        known = self._only_layout(packet["NID_PACKET"])
        width = HEADS[self._direction] + packet["content"]["bits"]
        inner = self._cursor(cursor.position, width)
        self._until_it_ends(
            inner, _explained(known.nodes) if known else HEAD_NODES[self._direction], path
        )
        self._walk(inner).unexplained(inner.left, (*path, "content"))
        cursor.rows += inner.rows
        cursor.position += inner.position

    def _only_layout(self, number: int) -> Packet | None:
        """Return the layout of a packet that is cut: None where it may have come in two forms."""
        key = (self._direction, number)
        return None if key in self.registry.forms else self.registry.packets.get(key)

    def _broken_packet(self, cursor: Cursor, index: int) -> None:
        """Add the rows of a packet up to where its bits run out, or its head where it is whole."""
        packets = self.message.packets
        path = ("packets", index)
        nodes: Sequence[Node] = HEAD_NODES[self._direction]
        width = cursor.left
        number = self.value >> max(0, cursor.left - 8) & 255
        if index == len(packets) and number in self.unmeasured:
            nodes = self.registry.packets[self._direction, number].nodes
        if index < len(packets):
            known = self._only_layout(packets[index]["NID_PACKET"])
            if known and "surplus" in packets[index]:
                self._packet(cursor, index)
                cursor.rows.pop()
                return
            if known:
                nodes = _explained(known.nodes)
                width = min(width, max(packets[index]["L_PACKET"], HEADS[self._direction]))
        inner = self._cursor(cursor.position, width)
        self._until_it_ends(inner, nodes, path)
        cursor.rows += inner.rows

    def _until_it_ends(self, cursor: Cursor, nodes: Sequence[Node], path: Path) -> None:
        try:
            self._walk(cursor).scope(nodes, path, {})
        except Truncated:
            # The trouble itself is raised by the caller, after the rows read so far.
            return


def _explained(nodes: Sequence[Node]) -> list[Node]:
    """Return a layout without the part that nothing explains: cut, it is no field of its own."""
    return [each for each in nodes if not isinstance(each, Opaque)]
