"""Random frames over the published tables, written bit by bit as text; fishplate is not used.

Source: SUBSET-026 in the tables of `oracle.editions`. Codes are drawn from those that chapter 7.5
(chapter 6 for versions with X = 1) gives a meaning; with `spares` above zero, now and then any
code at all. What a packet says is not meant to make sense on a line, only to be valid bit for bit.
"""

from __future__ import annotations

import functools
import random
from dataclasses import dataclass, field

from oracle import editions, tables

LONGEST_PACKET = 8191
LONGEST_MESSAGE = 8 * 1023
MANY = 31
POSITION_REPORT = 136
"""A message to the track (8.6.4 in all issues) to carry any packet, behind packet 0 or 1."""


@dataclass
class Frame:
    """A frame as text, and where its packets lie: (number, first bit, end)."""

    medium: str
    direction: str
    text: str
    packets: list[tuple[int, int, int]] = field(default_factory=list)


@functools.cache
def ranges(book: tables.Tables, variable: str, kind: str) -> tuple[tuple[int, int], ...]:
    """First and last of the codes of one kind."""
    return tuple((first, last) for first, last, found, _ in book.codes[variable] if found == kind)


@functools.cache
def first_code(book: tables.Tables, variable: str) -> int:
    """The lowest code that is not spare."""
    code = 0
    for first, last in sorted(ranges(book, variable, "spare")):
        if first <= code <= last:
            code = last + 1
    return code


class Maker:
    """Draws values and writes them, most significant bit first."""

    def __init__(
        self,
        rng: random.Random,
        edition: editions.Edition = editions.V3_6_0,
        *,
        spares: float = 0.0,
        many: float = 0.05,
        extreme: float | None = None,
    ) -> None:
        """`spares`, `many`: how often any code, how often a large N_ITER.

        `extreme` 0 or 1 fills every variable with that bit instead.
        """
        self.rng = rng
        self.edition = edition
        self.book = edition.usable
        self.spares = spares
        self.many = many
        self.extreme = extreme

    def code(self, variable: str, bits: int) -> int:
        """Draw a code of a variable, as the unsigned number on the wire."""
        rng = self.rng
        if self.extreme is not None:
            return ((1 << bits) - 1) * int(self.extreme)
        if rng.random() < self.spares:
            return rng.getrandbits(bits)
        if self.book.coding[variable] == "bitset":
            weights = [first for first, _ in ranges(self.book, variable, "bit")]
            return sum(weight for weight in weights if rng.random() < 0.5) or 1
        if self.book.coding[variable] == "bcd_left_F_padded":
            return self.digits(bits // 4)
        special = ranges(self.book, variable, "special")
        if special and rng.random() < 0.1:
            return rng.choice(special)[0]
        if rng.random() < 0.1:
            return self.within(variable, bits, (0, 1, (1 << bits) - 1, (1 << bits - 1)))
        return self.within(variable, bits, ())

    def within(self, variable: str, bits: int, candidates: tuple[int, ...]) -> int:
        """Draw one of the candidates, or any code if there are none, that is not spare."""
        spare = ranges(self.book, variable, "spare")
        for _ in range(8):
            code = self.rng.choice(candidates) if candidates else self.rng.getrandbits(bits)
            if not any(first <= code <= last for first, last in spare):
                return code
        return first_code(self.book, variable)

    def digits(self, places: int) -> int:
        """Draw a decimal number in nibbles, left adjusted, the rest F."""
        count = self.rng.randint(1, places)
        text = "".join(self.rng.choice("0123456789") for _ in range(count))
        return int(text.ljust(places, "F"), 16)

    def count(self) -> int:
        """Draw an N_ITER: mostly small, sometimes the largest."""
        if self.rng.random() < self.many:
            return self.rng.choice((30, MANY))
        return self.rng.choice((0, 0, 1, 1, 2, 3, 4))

    def letters(self, count: int) -> str:
        """Draw characters of ISO 8859-1 that can be printed."""
        printable = (*range(0x20, 0x7F), *range(0xA0, 0x100))
        return "".join(f"{self.rng.choice(printable):08b}" for _ in range(count))

    def fields(self, rows: tuple[tables.Row, ...], fixed: dict[str, int]) -> str:
        """Write the rows of one layout."""
        parts: list[str] = []

        def take(row: tables.Row) -> int:
            if row.index == tables.TEXT_INDEX:
                parts.append(self.letters(int(parts[-1], 2)))
                return 0
            if row.variable in fixed:
                value = fixed[row.variable]
            elif row.variable == "N_ITER":
                value = self.count()
            else:
                value = self.code(row.variable, row.bits)
            parts.append(f"{value:0{row.bits}b}")
            return value

        tables.visit(rows, take)
        return "".join(parts)

    def packet(self, direction: str, number: int) -> str:
        """Write one packet, its L_PACKET right; in its other form, if any, every second time."""
        form = self.edition.usable.forms.get((direction, number))
        if form is None or self.rng.random() < 0.5:
            return self._packet(direction, number)
        self.book = form
        try:
            return self._packet(direction, number)
        finally:
            self.book = self.edition.usable

    def _packet(self, direction: str, number: int) -> str:
        rows = self.book.packet_rows[direction, number]
        before = 0
        for row in rows:
            if row.variable == "L_PACKET":
                break
            before += row.bits
        else:
            return self.fields(rows, {"NID_PACKET": number})
        many = self.many
        while True:
            text = self.fields(rows, {"NID_PACKET": number, "L_PACKET": 0})
            if number == tables.OUTSIDE_DATA:
                text += self.noise(self.rng.choice((0, 1, 7, 8, 40, 133)))
            if len(text) <= LONGEST_PACKET:
                break
            self.many = 0.0
        self.many = many
        return f"{text[:before]}{len(text):013b}{text[before + 13 :]}"

    def noise(self, count: int) -> str:
        """Write bits without a meaning."""
        return f"{self.rng.getrandbits(count):0{count}b}" if count else ""

    def telegram(self, medium: str) -> Frame:
        """Write a balise telegram or a loop message of any length."""
        header = self.fields(
            self.book.header_rows[medium],
            {
                "Q_UPDOWN": 1,
                "M_VERSION": self.edition.version_code,
                "Q_MEDIA": int(medium == "loop"),
            },
        )
        sent = senders_packets(self.book, medium)
        numbers = [self.rng.choice(sent) for _ in range(self.rng.randint(0, 4))]
        marker = ("to-train", 0) in self.book.packet_rows
        if marker and medium == "balise" and self.rng.random() < 0.1:
            numbers.insert(0, 0)
        frame = self.join(medium, "to-train", header, [*numbers, tables.END_FLAG], None)
        size = len(frame.text)
        long_enough = [length for length in (210, 830) if length >= size]
        if medium == "balise" and long_enough and self.rng.random() < 0.7:
            fill = long_enough[0] - size
        else:
            fill = self.rng.choice((0, 0, 1, 7, 8, 61))
        frame.text += "1" * fill if self.rng.random() < 0.7 else self.noise(fill)
        return frame

    def message(self, direction: str, number: int) -> Frame:
        """Write a radio message with its required packets and some of its optional ones."""
        rows = self.book.message_rows[direction, number]
        header = self.fields(rows, {"NID_MESSAGE": number, "L_MESSAGE": 0})
        alternatives = self.book.required_packets[direction, number]
        required = [self.rng.choice(some) for some in alternatives]
        optional = list(self.book.optional_packets.get((direction, number), ()))
        sender = self.rng.choice(sorted({sender for _, sender in optional})) if optional else ""
        extra = [packet for packet, said in optional if said == sender]
        self.rng.shuffle(extra)
        numbers = [*required, *extra[: self.rng.choice((0, 1, 2, 3, 6))]]
        many = self.many
        frame = self.join("radio", direction, header, numbers, LONGEST_MESSAGE)
        while len(frame.packets) < len(required):
            self.many = 0.0
            frame = self.join("radio", direction, header, numbers, LONGEST_MESSAGE)
        self.many = many
        missing = -len(frame.text) % 8
        return complete(frame, self.noise(missing) if self.rng.random() < 0.5 else "0" * missing)

    def join(
        self, medium: str, direction: str, header: str, numbers: list[int], limit: int | None
    ) -> Frame:
        """Write the packets behind the header, as many as stay within the limit."""
        frame = Frame(medium, direction, header)
        for number in numbers:
            text = self.packet(direction, number)
            if limit is not None and len(frame.text) + len(text) > limit:
                break
            start = len(frame.text)
            frame.text += text
            frame.packets.append((number, start, len(frame.text)))
        return frame


@functools.cache
def senders_packets(book: tables.Tables, medium: str) -> tuple[int, ...]:
    """Packets that a balise or a loop may transmit, without packet 0 and the end flag."""
    numbers = []
    for line in book.table("packets"):
        senders = {name.lower() for name in line["transmitted_by_or_to"].split(", ")}
        direction, number = tables.key_of(line, "packet")
        apart = number in {0, tables.END_FLAG}
        if direction == "to-train" and senders & {medium, "any"} and not apart:
            numbers.append(number)
    return tuple(numbers)


def random_frame(
    seed: int,
    edition: editions.Edition = editions.V3_6_0,
    *,
    spares: float = 0.0,
    many: float = 0.05,
) -> Frame:
    """One frame of any kind; the same seed gives the same frame."""
    # A seed is a test case here, not a secret.
    rng = random.Random(seed)  # noqa: S311
    maker = Maker(rng, edition, spares=spares, many=many)
    if rng.random() < 0.4:
        return maker.telegram(rng.choice(("balise", "balise", "balise", "loop")))
    direction, number = rng.choice(sorted(edition.usable.message_rows))
    return maker.message(direction, number)


def message_frame(
    seed: int, direction: str, number: int, edition: editions.Edition = editions.V3_6_0
) -> Frame:
    """A frame of one radio message; every second seed with spare codes."""
    rng = random.Random(f"{seed} message {direction} {number}")  # noqa: S311
    return Maker(rng, edition, spares=0.05 * (seed % 2)).message(direction, number)


def frame_with(
    seed: int,
    direction: str,
    number: int,
    edition: editions.Edition = editions.V3_6_0,
    *,
    spares: float = 0.0,
    many: float = 0.05,
    extreme: float | None = None,
) -> Frame:
    """A frame that carries the packet: first in a telegram, or in a train position report."""
    rng = random.Random(f"{seed} {direction} {number}")  # noqa: S311
    maker = Maker(rng, edition, spares=spares, many=many, extreme=extreme)
    if direction == "to-track":
        rows = maker.book.message_rows[direction, POSITION_REPORT]
        header = maker.fields(rows, {"NID_MESSAGE": POSITION_REPORT, "L_MESSAGE": 0})
        numbers = [number] if number in {0, 1} else [rng.choice((0, 1)), number]
        frame = maker.join("radio", direction, header, numbers, LONGEST_MESSAGE)
        return complete(frame, "0" * (-len(frame.text) % 8))
    header = maker.fields(
        maker.book.header_rows["balise"],
        {"Q_UPDOWN": 1, "M_VERSION": edition.version_code, "Q_MEDIA": 0},
    )
    numbers = [tables.END_FLAG] if number == tables.END_FLAG else [number, tables.END_FLAG]
    return maker.join("balise", direction, header, numbers, None)


def complete(frame: Frame, padding: str) -> Frame:
    """Pad a radio message and write its L_MESSAGE (bits 8 to 17) in bytes."""
    text = frame.text + padding
    frame.text = f"{text[:8]}{len(text) // 8:010b}{text[18:]}"
    return frame
