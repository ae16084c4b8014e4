"""Every row of the published fact tables against the registry, both ways.

Source: SUBSET-026 issue 3.6.0, chapters 7 and 8, in the tables of ``fixtures/standard/v3_6_0``.
Both sides are turned into the same plain rows and compared as a whole: nothing may be missing,
nothing may be there besides, and order counts where the standard gives an order.
"""

from __future__ import annotations

import functools
from typing import TYPE_CHECKING

import pytest

import fishplate
from oracle import flatten, tables

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard import vocabulary
    from fishplate.standard.build import Registry

VERSION = "2.1"
CODINGS = {
    "unsigned": "unsigned",
    "signed": "signed",
    "bitset": "bitset",
    "latin1": "latin1",
    "bcd_left_F_padded": "digits",
    "nid_c_10_nid_bg_14": "group-identity",
    "version_3_4": "version",
}
"""The codings of the tables, and what fishplate calls them."""
VARIABLES, PACKETS, MESSAGES, PACKET_ROWS, CODE_ROWS = 226, 63, 37, 649, 469
"""How many rows the tables hold; a copy cut short would make every comparison below easier."""


@functools.cache
def declared() -> Registry:
    """The registry under test."""
    return fishplate.registry(VERSION)


def both_ways(ours: Mapping[object, object], published: Mapping[object, object]) -> None:
    """Equal keys, equal values; a difference names the row."""
    assert sorted(map(str, ours.keys() - published.keys())) == [], "declared, not published"
    assert sorted(map(str, published.keys() - ours.keys())) == [], "published, not declared"
    assert {key: (ours[key], published[key]) for key in ours if ours[key] != published[key]} == {}


def senders(text: str) -> tuple[str, ...]:
    """``Balise, loop, RIU`` without regard to capitals (the tables write Loop and loop)."""
    return tuple(name.lower() for name in text.split(", "))


def test_the_tables_are_complete() -> None:
    """The copied tables hold as many rows as the issue has variables, packets and messages."""
    assert len(tables.table("variables")) == VARIABLES
    assert len(tables.table("packets")) == PACKETS
    assert len(tables.table("messages")) == MESSAGES
    assert len(tables.table("packet_fields")) == PACKET_ROWS
    assert len(tables.table("codes")) == CODE_ROWS
    assert len(tables.header_rows()["balise"]) == 10
    assert len(tables.header_rows()["loop"]) == 5


def test_version_and_issue() -> None:
    """Issue 3.6.0 introduces system version 2.1."""
    assert declared().version == VERSION
    assert declared().issue == "3.6.0"


def test_variables() -> None:
    """Clause, width, coding, unit, resolution, plain range and title of chapter 7.5."""
    published = {
        line["variable"]: (
            line["clause"],
            int(line["bits"]),
            CODINGS[line["coding"]],
            line["unit"],
            line["resolution"],
            (int(line["code_min"]), int(line["code_max"])) if line["code_min"] else None,
            line["title"],
        )
        for line in tables.table("variables")
    }
    ours = {
        name: (
            variable.clause,
            variable.bits,
            variable.coding,
            variable.unit,
            variable.resolution,
            variable.plain,
            variable.title,
        )
        for name, variable in declared().variables.items()
    }
    both_ways(ours, published)
    assert {name: one.name for name, one in declared().variables.items()} == {
        name: name for name in ours
    }


def test_codes() -> None:
    """Every special, spare and enumerated code of chapter 7.5 with its label."""
    published: dict[str, list[tuple[int, int, str, str]]] = {
        line["variable"]: [] for line in tables.table("variables")
    }
    for line in tables.table("codes"):
        published[line["variable"]].append(
            (int(line["code_first"]), int(line["code_last"]), line["kind"], line["label"])
        )
    ours = {
        name: sorted((code.first, code.last, code.kind, code.label) for code in variable.codes)
        for name, variable in declared().variables.items()
    }
    both_ways(ours, {name: sorted(codes) for name, codes in published.items()})


def test_packets() -> None:
    """Clause, name and who transmits each packet, chapter 7.4."""
    published = {
        (tables.DIRECTIONS[line["direction"]], int(line["packet"])): (
            line["clause"],
            line["name"],
            senders(line["transmitted_by_or_to"]),
        )
        for line in tables.table("packets")
    }
    ours = {
        key: (packet.clause, packet.name, tuple(name.lower() for name in packet.senders))
        for key, packet in declared().packets.items()
    }
    both_ways(ours, published)
    for (direction, number), packet in declared().packets.items():
        assert (packet.direction, packet.number) == (direction, number)


@pytest.mark.parametrize(("direction", "number"), sorted(tables.packet_rows()))
def test_packet_fields(direction: str, number: int) -> None:
    """Order, repetition, condition and width of each variable of a packet, chapter 7.4."""
    published = tables.packet_rows()[direction, number]
    packet = declared().packets[direction, number]
    assert [row.order for row in published] == list(range(1, len(published) + 1))
    flat = flatten.from_layout(packet.nodes)
    assert flat.rows == flatten.from_table(published)
    widths = [declared().variables[row.variable].bits for row in flat.rows]
    assert widths == [row.bits for row in published]
    assert flat.opaque == (["data"] if number == tables.OUTSIDE_DATA else [])


def test_no_packet_beyond_the_tables() -> None:
    """The registry holds the packets of the tables and no others."""
    assert set(declared().packets) == set(tables.packet_rows())


def test_messages() -> None:
    """Clause, name, addressee and version invariance of each radio message, 8.6 and 8.7."""
    published = {
        (tables.DIRECTIONS[line["direction"]], int(line["message"])): (
            line["clause"],
            line["name"],
            senders(line["transmitted_by_or_to"]),
            line["version_invariant"] == "yes",
        )
        for line in tables.table("messages")
    }
    ours = {
        key: (
            message.clause,
            message.name,
            tuple(name.lower() for name in message.senders),
            message.version_invariant,
        )
        for key, message in declared().messages.items()
    }
    both_ways(ours, published)
    for (direction, number), message in declared().messages.items():
        assert (message.direction, message.number) == (direction, number)


@pytest.mark.parametrize(("direction", "number"), sorted(tables.message_rows()))
def test_message_fields(direction: str, number: int) -> None:
    """Fixed variables, required and optional packets of a radio message, in order."""
    published = tables.message_rows()[direction, number]
    message = declared().messages[direction, number]
    flat = flatten.from_layout(message.nodes)
    assert flat.rows == flatten.from_table(published)
    assert [declared().variables[row.variable].bits for row in flat.rows] == [
        row.bits for row in published
    ]
    assert message.required.packets == tables.required_packets()[direction, number]
    optional = tables.optional_packets().get((direction, number), ())
    assert [(one.packet, one.sender) for one in message.optional] == [
        (packet, note.removeprefix("from ")) for packet, note in optional
    ]


@pytest.mark.parametrize("medium", ["balise", "loop"])
def test_headers(medium: str) -> None:
    """The header of a balise telegram (50 bits) and of a loop message (33 bits), 8.4."""
    published = tables.header_rows()[medium]
    header = declared().headers[medium]
    flat = flatten.from_layout(header.nodes)
    variables: Mapping[str, vocabulary.Variable] = declared().variables
    assert flat.rows == flatten.from_table(published)
    assert [variables[row.variable].bits for row in flat.rows] == [row.bits for row in published]
    assert sum(row.bits for row in published) == {"balise": 50, "loop": 33}[medium]
    assert {header.clause} == {
        line["clause"] for line in tables.table("telegram_headers") if line["medium"] == medium
    }


def test_no_header_beyond_the_tables() -> None:
    """A radio message has no header of its own: its fixed variables are the message's."""
    assert set(declared().headers) == {"balise", "loop"}


def test_flattening_tells_apart_what_it_should() -> None:
    """The comparison notices a moved condition, a changed width order and a lost repetition."""
    rows = tables.packet_rows()["to-train", 15]
    flat = flatten.from_table(rows)
    # Row 10 looks at row 9 (the section), row 14 at row 13 (the end section): 7.4.2.4.
    assert flat[9].conditions == ((9, "==", (1,)),)
    assert flat[13].conditions == ((13, "==", (1,)),)
    assert [row.depth for row in flat[6:12]] == [0, 1, 1, 1, 1, 0]
    assert flatten.from_table(tables.packet_rows()["to-train", 27])[18].depth == 2
