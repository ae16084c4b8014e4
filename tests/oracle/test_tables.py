"""Every row of the published fact tables against the registry, both ways, issue by issue.

Source: SUBSET-026 issues 2.3.0, 3.3.0, 3.6.0 and 4.0.0, chapters 7 and 8, for versions 1.0 (on
request), 2.0, 2.1 and 3.0; issue 3.6.0, chapter 6 with 7 and 8, for 1.0 and 1.1; 2.2 and 2.3 are
inferred from issues 3.6.0 and 4.0.0 (see `oracle.composed`). The tables stand in
``fixtures/standard``. Both sides are turned into the same plain rows and compared as a whole:
nothing may be missing, nothing may be there besides, and order counts where the standard gives an
order. Test identifiers name version, document, issue and chapters.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

import pytest

import fishplate
from fishplate.standard.editions import EDITIONS
from oracle import editions, flatten, tables

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.build import Registry

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
TABLES = (
    "variables",
    "codes",
    "packets",
    "packet_fields",
    "messages",
    "message_fields",
    "message_optional_packets",
)
ROWS = {
    "v2_3_0": (176, 301, 48, 479, 37, 215, 133),
    "v3_3_0": (224, 458, 61, 640, 38, 223, 127),
    "v3_6_0": (226, 469, 63, 649, 37, 219, 132),
    "v4_0_0": (237, 500, 67, 686, 43, 261, 165),
}
"""How many rows each table holds; a copy cut short would make every comparison below easier."""
CHAPTER_6_ROWS = {
    "variables": 17,
    "codes": 143,
    "packets": 16,
    "packet_fields": 234,
    "translations": 94,
    "translation_maps": 107,
}
DATES = {
    "2.3.0": "24/02/2006",
    "3.3.0": "07/03/2012",
    "3.6.0": "13/05/2016",
    "4.0.0": "05/07/2023",
}
"""The dates on the issues."""

each_edition = pytest.mark.parametrize("edition", editions.ALL, ids=lambda each: each.name)
each_packet = pytest.mark.parametrize(
    ("edition", "direction", "number"),
    [
        pytest.param(each, *key, id=f"{each.name}, packet {key[1]} {key[0]}")
        for each in editions.ALL
        for key in sorted(each.tables.packet_rows)
    ],
)
each_message = pytest.mark.parametrize(
    ("edition", "direction", "number"),
    [
        pytest.param(each, *key, id=f"{each.name}, message {key[1]}")
        for each in editions.ALL
        for key in sorted(each.tables.message_rows)
    ],
)


def declared(edition: editions.Edition) -> Registry:
    """The registry under test."""
    return fishplate.registry(edition.version, edition.issue)


def both_ways(ours: Mapping[Any, object], published: Mapping[Any, object]) -> None:
    """Equal keys, equal values; a difference names the row."""
    assert sorted(map(str, ours.keys() - published.keys())) == [], "declared, not published"
    assert sorted(map(str, published.keys() - ours.keys())) == [], "published, not declared"
    assert {key: (ours[key], published[key]) for key in ours if ours[key] != published[key]} == {}


def senders(text: str) -> tuple[str, ...]:
    """``Balise, loop, RIU`` without regard to capitals (the tables write Loop and loop)."""
    return tuple(name.lower() for name in text.split(", ")) if text else ()


@pytest.mark.parametrize("folder", ROWS)
def test_the_tables_are_complete(folder: str) -> None:
    """The copied tables hold as many rows as the issue has variables, packets and messages."""
    book = tables.published(folder)
    assert tuple(len(book.table(name)) for name in TABLES) == ROWS[folder]
    assert len(book.header_rows["balise"]) == 10
    assert len(book.header_rows["loop"]) == 5


def test_the_tables_of_chapter_6_are_complete() -> None:
    """SUBSET-026 issue 3.6.0, chapter 6: as many rows as were extracted."""
    lines = tables.published("x1_chapter6").lines
    assert {name: len(rows) for name, rows in lines.items()} == CHAPTER_6_ROWS


@each_edition
def test_version_and_issue(edition: editions.Edition) -> None:
    """The registry says which version, issue and date it is of."""
    assert declared(edition).version == edition.version
    assert declared(edition).issue == edition.issue
    assert declared(edition).date == DATES[edition.issue]


@each_edition
def test_variables(edition: editions.Edition) -> None:
    """Clause, width, coding, unit, resolution, plain range and title: 7.5, or 6.5.1.5."""
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
        for line in edition.tables.table("variables")
    }
    variables = declared(edition).variables
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
        for name, variable in variables.items()
    }
    both_ways(ours, published)
    assert {name: one.name for name, one in variables.items()} == {name: name for name in ours}


@each_edition
def test_codes(edition: editions.Edition) -> None:
    """Every special, spare and enumerated code of 7.5, or 6.5.1.5, with its label."""
    ours = {
        name: tuple(
            sorted((code.first, code.last, code.kind, code.label) for code in variable.codes)
        )
        for name, variable in declared(edition).variables.items()
    }
    both_ways(ours, edition.tables.codes)


@each_edition
def test_packets(edition: editions.Edition) -> None:
    """Clause, name and who transmits each packet: 7.4, or 6.5.1.5. No packet besides."""
    published = {
        tables.key_of(line, "packet"): (
            line["clause"],
            line["name"],
            senders(line["transmitted_by_or_to"]),
        )
        for line in edition.tables.table("packets")
    }
    packets = declared(edition).packets
    ours = {
        key: (packet.clause, packet.name, tuple(name.lower() for name in packet.senders))
        for key, packet in packets.items()
    }
    both_ways(ours, published)
    assert {key: (each.direction, each.number) for key, each in packets.items()} == {
        key: key for key in edition.tables.packet_rows
    }


@each_packet
def test_packet_fields(edition: editions.Edition, direction: str, number: int) -> None:
    """Order, repetition, condition and width of each variable of a packet: 7.4, or 6.5.1.5."""
    published = edition.tables.packet_rows[direction, number]
    registry = declared(edition)
    packet = registry.packets[direction, number]
    assert [row.order for row in published] == list(range(1, len(published) + 1))
    flat = flatten.from_layout(packet.nodes)
    assert flat.rows == flatten.from_table(published)
    widths = [registry.variables[row.variable].bits for row in flat.rows]
    assert widths == [row.bits for row in published]
    assert flat.opaque == (["data"] if number == tables.OUTSIDE_DATA else [])


@each_edition
def test_messages(edition: editions.Edition) -> None:
    """Clause, name, addressee and version invariance of each radio message, 8.6 and 8.7.

    Issue 2.3.0 has no column that says who sends a message.
    """
    published = {
        tables.key_of(line, "message"): (
            line["clause"],
            line["name"],
            senders(line["transmitted_by_or_to"]),
            {"yes": True, "no": False}[line["version_invariant"]],
        )
        for line in edition.tables.table("messages")
    }
    messages = declared(edition).messages
    ours = {
        key: (
            message.clause,
            message.name,
            tuple(name.lower() for name in message.senders),
            message.version_invariant,
        )
        for key, message in messages.items()
    }
    both_ways(ours, published)
    assert {key: (each.direction, each.number) for key, each in messages.items()} == {
        key: key for key in edition.tables.message_rows
    }


@each_message
def test_message_fields(edition: editions.Edition, direction: str, number: int) -> None:
    """Fixed variables, required and optional packets of a radio message, in order: 8.6, 8.7."""
    published = edition.tables.message_rows[direction, number]
    registry = declared(edition)
    message = registry.messages[direction, number]
    flat = flatten.from_layout(message.nodes)
    assert flat.rows == flatten.from_table(published)
    assert [registry.variables[row.variable].bits for row in flat.rows] == [
        row.bits for row in published
    ]
    lines = [
        (line["kind"], int(line["order"]))
        for line in edition.tables.table("message_fields")
        if tables.key_of(line, "message") == (direction, number)
    ]
    kinds = ["variable"] * len(published) + ["packet"] * len(message.required.packets)
    assert lines == list(zip(kinds, range(1, len(kinds) + 1), strict=True))
    assert message.required.packets == edition.tables.required_packets[direction, number]
    optional = edition.tables.optional_packets.get((direction, number), ())
    assert [(one.packet, one.sender) for one in message.optional] == list(optional)


@pytest.mark.parametrize("medium", ["balise", "loop"])
@each_edition
def test_headers(edition: editions.Edition, medium: str) -> None:
    """The header of a balise telegram (50 bits) and of a loop message (33 bits), 8.4."""
    published = edition.tables.header_rows[medium]
    registry = declared(edition)
    header = registry.headers[medium]
    flat = flatten.from_layout(header.nodes)
    variables = registry.variables
    assert flat.rows == flatten.from_table(published)
    assert [variables[row.variable].bits for row in flat.rows] == [row.bits for row in published]
    assert sum(row.bits for row in published) == {"balise": 50, "loop": 33}[medium]
    assert header.bits == {"balise": 50, "loop": 33}[medium]
    assert {header.clause} == {
        line["clause"]
        for line in edition.tables.table("telegram_headers")
        if line["medium"] == medium
    }


@each_edition
def test_no_header_beyond_the_tables(edition: editions.Edition) -> None:
    """A radio message has no header of its own: its fixed variables are the message's."""
    assert set(declared(edition).headers) == {"balise", "loop"}


def test_every_edition_is_here() -> None:
    """No layouts of fishplate go without a comparison, and none are compared twice."""
    known = [(each.version, each.issue) for each in EDITIONS]
    here = [(each.version, each.issue) for each in editions.ALL]
    assert sorted(here) == sorted(known)


def test_remarks_are_no_senders() -> None:
    """8.7 of issue 2.3.0 remarks on packet 49 of messages 33 and 37 (CR 382): no sender."""
    book = tables.published("v2_3_0")
    remarks = [
        (int(line["message"]), int(line["packet"]))
        for line in book.table("message_optional_packets")
        if line["note"]
    ]
    assert remarks == [(33, 49), (37, 49)]
    assert {sender for some in book.optional_packets.values() for _, sender in some} == {""}


def test_end_of_information_goes_either_way_up_to_3_3_0() -> None:
    """7.4.4.1 of issues 2.3.0 and 3.3.0, 7.4.2.39 later; declared as one that a train reads."""
    found = {
        folder: [
            (line["direction"], line["clause"])
            for line in tables.published(folder).table("packets")
            if line["packet"] == str(tables.END_FLAG)
        ]
        for folder in ROWS
    }
    assert found == {
        "v2_3_0": [("either", "7.4.4.1")],
        "v3_3_0": [("either", "7.4.4.1")],
        "v3_6_0": [("track-to-train", "7.4.2.39")],
        "v4_0_0": [("track-to-train", "7.4.2.39")],
    }


@pytest.mark.parametrize("version", ["2.2", "2.3"])
def test_what_2_2_and_2_3_add_to_2_1(version: str) -> None:
    """Numbers that SUBSET-026 issue 4.0.0, chapters 7 and 8, has and 3.6.0 lacks; inferred."""
    old, new = fishplate.registry("2.1"), fishplate.registry(version)
    assert set(new.packets) - set(old.packets) == {
        *(("to-train", number) for number in (31, 32, 73, 74)),
        *(("to-track", number) for number in (10, 12)),
    }
    assert set(new.messages) - set(old.messages) == {
        *(("to-train", number) for number in (4, 5, 7, 38)),
        *(("to-track", number) for number in (131, 133)),
    }
    assert set(old.packets) <= set(new.packets)
    assert set(old.messages) <= set(new.messages)
    assert {each.kind for each in new.evidence_of()} == {"inferred"}


def test_flattening_tells_apart_what_it_should() -> None:
    """The comparison notices a moved condition, a changed width order and a lost repetition.

    SUBSET-026 issue 3.6.0, 7.4.2.4 and 7.4.2.7 (packets 15 and 27).
    """
    packets = tables.published("v3_6_0").packet_rows
    rows = packets["to-train", 15]
    flat = flatten.from_table(rows)
    # Row 10 looks at row 9 (the section), row 14 at row 13 (the end section): 7.4.2.4.
    assert flat[9].conditions == ((9, "==", (1,)),)
    assert flat[13].conditions == ((13, "==", (1,)),)
    assert [row.depth for row in flat[6:12]] == [0, 1, 1, 1, 1, 0]
    assert flatten.from_table(packets["to-train", 27])[18].depth == 2
