"""fishplate against vectors worked by hand, and the vectors against themselves.

Source: ``fixtures/vectors``, each from clauses of the issue of SUBSET-026 that it names. The first
half redoes the arithmetic of every file without fishplate, the second half uses fishplate.
"""

from __future__ import annotations

import copy
import functools
from typing import Any

import bitstring
import pytest
import yaml

import fishplate
from oracle import editions, naive, tables

FOLDER = tables.FIXTURES / "vectors"
FILES = {path.stem: path for path in sorted(FOLDER.rglob("*.yaml"))}
NAMES = sorted(FILES)
AT_LEAST = 30
COMPUTED = ("L_PACKET", "L_MESSAGE")
EDITIONS = {(each.version, each.issue): each for each in editions.ALL}


@functools.cache
def loaded(name: str) -> dict[str, Any]:
    """One vector as it stands in its file."""
    vector: dict[str, Any] = yaml.safe_load(FILES[name].read_text(encoding="utf-8"))
    return vector


def edition_of(vector: dict[str, Any]) -> editions.Edition:
    """The version and issue that the vector is of."""
    return EDITIONS[vector["tree"]["version"], vector["tree"]["issue"]]


def said_of(vector: dict[str, Any]) -> dict[str, Any]:
    """What `decode` is told of the version; of 2.1 nothing."""
    edition = edition_of(vector)
    if edition is editions.V3_6_0:
        return {}
    return {"version": edition.version, "issue": edition.issue}


def tree_of(message: fishplate.Message) -> dict[str, Any]:
    """The tree without what it says of the evidence that our declarations rest on."""
    return {key: value for key, value in message.tree().items() if key != "evidence"}


def text_of(vector: dict[str, Any]) -> str:
    """All bits of the frame, from the lines of the fields."""
    return "".join(bits for _, _, _, bits in vector["fields"])


def rows_of(vector: dict[str, Any]) -> list[naive.Found]:
    """The fields with their offsets."""
    rows, offset = [], 0
    for variable, code, width, _ in vector["fields"]:
        rows.append(naive.Found(variable, offset, width, code))
        offset += width
    return rows


def bits_of(vector: dict[str, Any]) -> bitstring.Bits:
    """The frame from its hex digits."""
    return bitstring.Bits(f"0x{vector['hex']}")[: vector["bits"]]


# --- the vectors themselves --------------------------------------------------------------------


def test_there_are_enough() -> None:
    """The files were found, some of them for each version that an issue prints, and for X = 1."""
    assert len(NAMES) >= AT_LEAST
    found = {edition_of(loaded(name)).version for name in NAMES}
    assert found >= {"1.0", "1.1", "2.1", "3.0"}


@pytest.mark.parametrize("name", NAMES)
def test_each_line_and_their_sum(name: str) -> None:
    """Code, width and bits of a line agree; the lines make up `bits` and `hex`."""
    vector = loaded(name)
    assert vector["name"] == name
    for variable, code, width, bits in vector["fields"]:
        assert len(bits) == width
        if variable is None:
            assert naive.hex_text(bits) == code
        elif variable == "X_TEXT":
            assert bits == "".join(f"{octet:08b}" for octet in code.encode("iso8859-1"))
        else:
            # Two's complement: a negative code is counted down from 2 to the width.
            assert int(bits, 2) == (code if code >= 0 else (1 << width) + code)
    assert len(text_of(vector)) == vector["bits"]
    assert naive.hex_text(text_of(vector)) == vector["hex"]


@pytest.mark.parametrize("name", NAMES)
def test_the_published_tables_say_the_same(name: str) -> None:
    """Variables, order and widths are those of the tables: the naive decoder finds every line."""
    vector = loaded(name)
    rows = naive.decode(
        text_of(vector), vector["medium"], vector["direction"], edition_of(vector).usable
    )
    assert rows == rows_of(vector)


@pytest.mark.parametrize("name", NAMES)
def test_the_clauses_are_those_of_the_content(name: str) -> None:
    """Every packet, header or message of the vector has its clause named."""
    vector = loaded(name)
    book, direction = edition_of(vector).usable, vector["direction"]
    packets = {(direction, packet["NID_PACKET"]) for packet in vector["tree"]["packets"]}
    number = vector["tree"]["header"].get("NID_MESSAGE")
    clauses = {
        line["clause"] for line in book.table("packets") if tables.key_of(line, "packet") in packets
    }
    clauses |= {
        line["clause"]
        for line in book.table("messages")
        if tables.key_of(line, "message") == (direction, number)
    }
    clauses |= {
        line["clause"]
        for line in book.table("telegram_headers")
        if line["medium"] == vector["medium"]
    }
    assert clauses <= set(vector["clauses"])


# --- fishplate ---------------------------------------------------------------------------------


@pytest.mark.parametrize("name", NAMES)
def test_decode(name: str) -> None:
    """The bits give the tree."""
    vector = loaded(name)
    message = fishplate.decode(
        bits_of(vector),
        medium=vector["medium"],
        direction=vector["direction"],
        **said_of(vector),
    )
    assert tree_of(message) == vector["tree"]
    assert message.size == vector["bits"]


@pytest.mark.parametrize("name", NAMES)
def test_decode_from_hex(name: str) -> None:
    """The hex digits and the true length give the tree too."""
    vector = loaded(name)
    message = fishplate.decode(
        vector["hex"],
        bits=vector["bits"],
        medium=vector["medium"],
        direction=vector["direction"],
        **said_of(vector),
    )
    assert tree_of(message) == vector["tree"]


@pytest.mark.parametrize("name", NAMES)
def test_medium_and_direction_are_found(name: str) -> None:
    """Every vector tells its medium and direction by itself."""
    vector = loaded(name)
    message = fishplate.decode(bits_of(vector), **said_of(vector))
    assert (message.medium, message.direction) == (vector["medium"], vector["direction"])
    assert tree_of(message) == vector["tree"]


@pytest.mark.parametrize("name", NAMES)
def test_encode(name: str) -> None:
    """The tree gives the bits."""
    vector = loaded(name)
    assert fishplate.encode(copy.deepcopy(vector["tree"])) == bits_of(vector)


@pytest.mark.parametrize("name", NAMES)
def test_encode_computes_the_lengths(name: str) -> None:
    """Without L_PACKET and L_MESSAGE in the tree the same bits come out."""
    vector = loaded(name)
    tree = copy.deepcopy(vector["tree"])
    for part in (tree["header"], *tree["packets"]):
        for variable in COMPUTED:
            part.pop(variable, None)
    assert fishplate.encode(tree) == bits_of(vector)


@pytest.mark.parametrize("name", NAMES)
def test_field_rows(name: str) -> None:
    """Field rows are the lines of the file, bit for bit."""
    vector = loaded(name)
    rows = fishplate.walk(
        bits_of(vector),
        medium=vector["medium"],
        direction=vector["direction"],
        **said_of(vector),
    )
    found = [naive.Found(row.variable, row.offset, row.width, row.raw) for row in rows]
    assert found == rows_of(vector)
