"""The published fact tables as plain rows, and the order in which a packet's rows are met.

Source: SUBSET-026 issue 3.6.0, chapters 7 and 8 (European Union Agency for Railways), in the
tables of ``fixtures/standard/v3_6_0``. Nothing of fishplate is imported here.
"""

from __future__ import annotations

import csv
import functools
import re
from collections.abc import Callable, Mapping
from dataclasses import dataclass
from pathlib import Path

FIXTURES = Path(__file__).resolve().parents[2] / "fixtures"
FOLDER = FIXTURES / "standard" / "v3_6_0"
DIRECTIONS = {"track-to-train": "to-train", "train-to-track": "to-track"}
TEXT_INDEX = "1..L_TEXT"
END_FLAG = 255
OUTSIDE_DATA = 44
"""The packet whose data follow its identifiers for as long as L_PACKET says."""


@functools.cache
def table(name: str) -> tuple[dict[str, str], ...]:
    """All rows of one table."""
    with (FOLDER / f"{name}.csv").open(encoding="utf-8", newline="") as file:
        return tuple(csv.DictReader(file))


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


@functools.cache
def packet_rows() -> Mapping[tuple[str, int], tuple[Row, ...]]:
    """The rows of every packet by direction and number."""
    packets: dict[tuple[str, int], list[Row]] = {}
    for line in table("packet_fields"):
        key = (DIRECTIONS[line["direction"]], int(line["packet"]))
        packets.setdefault(key, []).append(
            Row(
                int(line["order"]),
                line["variable"],
                line["index"],
                int(line["bits"]),
                terms(line["present_when"]),
            )
        )
    return {key: tuple(rows) for key, rows in packets.items()}


@functools.cache
def message_rows() -> Mapping[tuple[str, int], tuple[Row, ...]]:
    """The fixed variables of every radio message."""
    messages: dict[tuple[str, int], list[Row]] = {}
    for line in table("message_fields"):
        key = (DIRECTIONS[line["direction"]], int(line["message"]))
        rows = messages.setdefault(key, [])
        if line["kind"] == "variable":
            rows.append(Row(int(line["order"]), line["name"], "", int(line["bits"])))
    return {key: tuple(rows) for key, rows in messages.items()}


@functools.cache
def required_packets() -> Mapping[tuple[str, int], tuple[tuple[int, ...], ...]]:
    """The packets that follow the fixed variables; each entry lists the alternatives."""
    required: dict[tuple[str, int], list[tuple[int, ...]]] = {}
    for line in table("message_fields"):
        entries = required.setdefault((DIRECTIONS[line["direction"]], int(line["message"])), [])
        if line["kind"] == "packet":
            entries.append(tuple(int(number) for number in line["name"].split("|")))
    return {key: tuple(entries) for key, entries in required.items()}


@functools.cache
def optional_packets() -> Mapping[tuple[str, int], tuple[tuple[int, str], ...]]:
    """Packets a message may carry beyond the required ones, with their note."""
    optional: dict[tuple[str, int], list[tuple[int, str]]] = {}
    for line in table("message_optional_packets"):
        key = (DIRECTIONS[line["direction"]], int(line["message"]))
        optional.setdefault(key, []).append((int(line["packet"]), line["note"]))
    return {key: tuple(entries) for key, entries in optional.items()}


@functools.cache
def header_rows() -> Mapping[str, tuple[Row, ...]]:
    """The header of a balise telegram and of a loop message."""
    headers: dict[str, list[Row]] = {}
    for line in table("telegram_headers"):
        headers.setdefault(line["medium"], []).append(
            Row(int(line["order"]), line["variable"], "", int(line["bits"]))
        )
    return {medium: tuple(rows) for medium, rows in headers.items()}


@functools.cache
def coding() -> Mapping[str, str]:
    """The coding of every variable, in the words of ``variables.csv``."""
    return {line["variable"]: line["coding"] for line in table("variables")}


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
