"""The published fact tables as plain rows, and the order in which a packet's rows are met.

Source: SUBSET-026, chapters 7 and 8 (European Union Agency for Railways), in the tables of
``fixtures/standard``, one folder an issue; for versions with X = 1 chapter 6 too. Nothing of
fishplate is imported here.
"""

from __future__ import annotations

import csv
import functools
import re
from collections.abc import Callable, Mapping
from dataclasses import dataclass, field
from pathlib import Path

FIXTURES = Path(__file__).resolve().parents[2] / "fixtures"
DIRECTIONS = {"track-to-train": "to-train", "train-to-track": "to-track", "either": "to-train"}
"""What fishplate calls a direction; packet 255 is printed for either direction up to 3.3.0."""
FROM = "from "
"""How the note begins that says from whom a message may carry a packet; others are remarks."""
TEXT_INDEX = "1..L_TEXT"
END_FLAG = 255
OUTSIDE_DATA = 44
"""The packet whose data follow its identifiers for as long as L_PACKET says."""


Key = tuple[str, int]
"""Direction and number of a packet or message."""
Lines = tuple[dict[str, str], ...]


@dataclass(frozen=True)
class Term:
    """One comparison of a `present_when` column; `index` is the letters in its brackets."""

    variable: str
    index: str
    sign: str
    codes: tuple[int, ...]

    def holds(self, value: int) -> bool:
        """Compare."""
        return (value not in self.codes) if self.sign == "!=" else (value in self.codes)


@dataclass(frozen=True)
class Row:
    """One row of ``packet_fields.csv`` (or a fixed variable of a message or header)."""

    order: int
    variable: str
    index: str
    bits: int
    terms: tuple[Term, ...] = ()

    @property
    def depth(self) -> int:
        """How many repetitions enclose the row."""
        return len(self.index.split(",")) if self.index else 0


TERM = re.compile(
    r"^(?P<name>[A-Z_0-9]+)(?:\((?P<index>[a-z,]+)\))?\s*(?P<sign>==|!=|in)\s*(?P<codes>.+)$"
)


def terms(text: str) -> tuple[Term, ...]:
    """Read a condition such as ``Q_TRACKINIT==0 and Q_SUITABILITY(k)==2``."""
    text = text.replace("(the one just before)", "").strip()
    found = []
    for part in text.split(" and ") if text else ():
        match = TERM.match(part.strip())
        if match is None:
            raise ValueError(f"condition not understood: {part!r}")
        codes = tuple(int(code) for code in re.findall(r"\d+", match["codes"]))
        found.append(Term(match["name"], match["index"] or "", match["sign"], codes))
    return tuple(found)


@dataclass(frozen=True, eq=False)
class Tables:
    """The tables of one issue, or of one system version put together from several issues.

    `lines` holds the plain rows by the name of their table. `forms` are other tables by which a
    packet may be laid out too: where L_PACKET does not agree with the rows here, those decide.
    """

    name: str
    lines: Mapping[str, Lines]
    forms: Mapping[Key, Tables] = field(default_factory=dict)

    def table(self, name: str) -> Lines:
        """All rows of one table."""
        return self.lines[name]

    @functools.cached_property
    def packet_rows(self) -> Mapping[Key, tuple[Row, ...]]:
        """The rows of every packet by direction and number."""
        packets: dict[Key, list[Row]] = {}
        for line in self.table("packet_fields"):
            packets.setdefault(key_of(line, "packet"), []).append(
                Row(
                    int(line["order"]),
                    line["variable"],
                    line["index"],
                    int(line["bits"]),
                    terms(line["present_when"]),
                )
            )
        return {key: tuple(rows) for key, rows in packets.items()}

    @functools.cached_property
    def message_rows(self) -> Mapping[Key, tuple[Row, ...]]:
        """The fixed variables of every radio message."""
        messages: dict[Key, list[Row]] = {}
        for line in self.table("message_fields"):
            rows = messages.setdefault(key_of(line, "message"), [])
            if line["kind"] == "variable":
                rows.append(Row(int(line["order"]), line["name"], "", int(line["bits"])))
        return {key: tuple(rows) for key, rows in messages.items()}

    @functools.cached_property
    def required_packets(self) -> Mapping[Key, tuple[tuple[int, ...], ...]]:
        """The packets that follow the fixed variables; each entry lists the alternatives."""
        required: dict[Key, list[tuple[int, ...]]] = {}
        for line in self.table("message_fields"):
            entries = required.setdefault(key_of(line, "message"), [])
            if line["kind"] == "packet":
                entries.append(tuple(int(number) for number in line["name"].split("|")))
        return {key: tuple(entries) for key, entries in required.items()}

    @functools.cached_property
    def optional_packets(self) -> Mapping[Key, tuple[tuple[int, str], ...]]:
        """Packets a message may carry beyond the required ones, and from whom, if limited."""
        optional: dict[Key, list[tuple[int, str]]] = {}
        for line in self.table("message_optional_packets"):
            note = line["note"]
            sender = note.removeprefix(FROM) if note.startswith(FROM) else ""
            optional.setdefault(key_of(line, "message"), []).append((int(line["packet"]), sender))
        return {key: tuple(entries) for key, entries in optional.items()}

    @functools.cached_property
    def header_rows(self) -> Mapping[str, tuple[Row, ...]]:
        """The header of a balise telegram and of a loop message."""
        headers: dict[str, list[Row]] = {}
        for line in self.table("telegram_headers"):
            headers.setdefault(line["medium"], []).append(
                Row(int(line["order"]), line["variable"], "", int(line["bits"]))
            )
        return {medium: tuple(rows) for medium, rows in headers.items()}

    @functools.cached_property
    def coding(self) -> Mapping[str, str]:
        """The coding of every variable, in the words of ``variables.csv``."""
        return {line["variable"]: line["coding"] for line in self.table("variables")}

    @functools.cached_property
    def codes(self) -> Mapping[str, tuple[tuple[int, int, str, str], ...]]:
        """First and last code, kind and label of what has a meaning of its own, by variable."""
        codes: dict[str, list[tuple[int, int, str, str]]] = {
            line["variable"]: [] for line in self.table("variables")
        }
        for line in self.table("codes"):
            codes[line["variable"]].append(
                (int(line["code_first"]), int(line["code_last"]), line["kind"], line["label"])
            )
        return {name: tuple(sorted(rows)) for name, rows in codes.items()}


def key_of(line: Mapping[str, str], kind: str) -> Key:
    """Direction and number of a line that is about a ``packet`` or a ``message``."""
    return DIRECTIONS[line["direction"]], int(line[kind])


@functools.cache
def published(folder: str) -> Tables:
    """All tables of one folder of ``fixtures/standard``."""
    lines = {}
    for path in sorted((FIXTURES / "standard" / folder).glob("*.csv")):
        with path.open(encoding="utf-8", newline="") as file:
            lines[path.stem] = tuple(csv.DictReader(file))
    return Tables(folder, lines)


Take = Callable[[Row], int]
"""Called for each row present, in wire order; gives the row's value back."""


def visit(rows: tuple[Row, ...], take: Take) -> None:
    """Meet the rows of a packet in wire order, repeating and leaving out as the table says.

    A text row (index ``1..L_TEXT``) is met once: its length is L_TEXT times its bits.
    """
    _visit(rows, take, {})


def _visit(rows: tuple[Row, ...], take: Take, seen: dict[tuple[str, str], int]) -> None:
    position = 0
    while position < len(rows):
        row = rows[position]
        position += 1
        if not all(term.holds(seen[term.variable, term.index]) for term in row.terms):
            continue
        value = take(row)
        seen[row.variable, row.index] = value
        if row.variable == "N_ITER":
            end = position
            while end < len(rows) and _inside(rows[end], row):
                end += 1
            for _ in range(value):
                _visit(rows[position:end], take, seen)
            position = end


def _inside(row: Row, count: Row) -> bool:
    """Whether the row carries the letters of the count and at least one more."""
    if row.index == TEXT_INDEX or row.depth <= count.depth:
        return False
    return count.depth == 0 or row.index.startswith(f"{count.index},")
