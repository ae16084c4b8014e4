"""A naive decoder that works on a text of ``0`` and ``1`` characters.

Source: the tables of SUBSET-026 in ``fixtures/standard``, of the issue or version it is given, and
nothing else: no code of fishplate is used. Slow and plain on purpose. It reads valid frames only.
"""

from __future__ import annotations

from typing import NamedTuple

from oracle import editions, tables

PACKET_0_TO_TRAIN = ("to-train", 0)
END = ("to-train", tables.END_FLAG)
NO_LENGTH = {PACKET_0_TO_TRAIN, END}


class Found(NamedTuple):
    """One variable on the wire; bits no table explains have `variable` None and hex as `raw`."""

    variable: str | None
    offset: int
    width: int
    raw: int | str


def hex_text(text: str) -> str:
    """Hex digits of the bits, left aligned in whole bytes."""
    padded = text + "0" * (-len(text) % 8)
    return "".join(f"{int(padded[at : at + 4], 2):X}" for at in range(0, len(padded), 4))


def number(text: str, coding: str) -> int:
    """The value of the bits: two's complement where the coding is ``signed``."""
    value = int(text, 2)
    if coding == "signed" and text[0] == "1":
        value -= 1 << len(text)
    return value


class Reader:
    """A place in the text and what has been found so far."""

    def __init__(self, text: str, book: tables.Tables) -> None:
        self.text = text
        self.book = book
        self.at = 0
        self.found: list[Found] = []

    def take(self, row: tables.Row) -> int:
        """Read one row of a table."""
        if row.index == tables.TEXT_INDEX:
            return self._take_text(row)
        bits = self._next(row.bits)
        value = number(bits, self.book.coding[row.variable])
        self.found.append(Found(row.variable, self.at - row.bits, row.bits, value))
        return value

    def _take_text(self, row: tables.Row) -> int:
        length = int(self.found[-1].raw)
        bits = self._next(length * row.bits)
        octets = bytes(int(bits[at : at + 8], 2) for at in range(0, len(bits), 8))
        start = self.at - len(bits)
        self.found.append(Found(row.variable, start, len(bits), octets.decode("iso8859-1")))
        return length

    def unexplained(self, end: int) -> None:
        """Keep the bits up to `end` as they are."""
        if end > self.at:
            bits = self._next(end - self.at)
            self.found.append(Found(None, end - len(bits), len(bits), hex_text(bits)))

    def _next(self, count: int) -> str:
        if self.at + count > len(self.text):
            raise ValueError(f"{count} bits wanted at {self.at} of {len(self.text)}")
        self.at += count
        return self.text[self.at - count : self.at]

    def packet(self, direction: str) -> int:
        """Read one packet and give its number."""
        key = (direction, int(self.text[self.at : self.at + 8], 2))
        candidates = [self.book] if key in self.book.packet_rows else []
        if key in self.book.forms:
            candidates.append(self.book.forms[key])
        start, first = self.at, len(self.found)
        for book in candidates:
            if self._fits(book, key, start, last=book is candidates[-1]):
                return key[1]
            self.at = start
            del self.found[first:]
        raise ValueError(f"packet {key} is in no table")

    def _fits(self, book: tables.Tables, key: tables.Key, start: int, *, last: bool) -> bool:
        """Read a packet by these tables; tell whether it ends where its L_PACKET says.

        The last candidate need not: outside data follow the rows of packet 44.
        """
        first, own = len(self.found), self.book
        self.book = book
        try:
            tables.visit(book.packet_rows[key], self.take)
        except ValueError:
            if last:
                raise
            return False
        finally:
            self.book = own
        if key in NO_LENGTH:
            return True
        length = next(row.raw for row in self.found[first:] if row.variable == "L_PACKET")
        end = start + int(length)
        if last:
            self.unexplained(end)
        return self.at == end


def decode(
    text: str, medium: str, direction: str, book: tables.Tables = editions.V3_6_0.tables
) -> list[Found]:
    """All variables of one frame in wire order."""
    return (_radio if medium == "radio" else _telegram)(Reader(text, book), medium, direction)


def _telegram(reader: Reader, medium: str, direction: str) -> list[Found]:
    tables.visit(reader.book.header_rows[medium], reader.take)
    while reader.packet(direction) != tables.END_FLAG:
        pass
    reader.unexplained(len(reader.text))
    return reader.found


def _radio(reader: Reader, _medium: str, direction: str) -> list[Found]:
    number_of_message = int(reader.text[:8], 2)
    tables.visit(reader.book.message_rows[direction, number_of_message], reader.take)
    while len(reader.text) - reader.at >= 8:
        reader.packet(direction)
    reader.unexplained(len(reader.text))
    return reader.found
