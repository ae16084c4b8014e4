"""fishplate against vectors worked by hand, and the vectors against themselves.

Source: ``fixtures/vectors``, each from clauses of SUBSET-026 issue 3.6.0 that it names. The first
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
from oracle import naive, tables

FOLDER = tables.FIXTURES / "vectors"
NAMES = sorted(path.stem for path in FOLDER.glob("*.yaml"))
AT_LEAST = 15
COMPUTED = ("L_PACKET", "L_MESSAGE")


@functools.cache
def loaded(name: str) -> dict[str, Any]:
    """One vector as it stands in its file."""
    vector: dict[str, Any] = yaml.safe_load((FOLDER / f"{name}.yaml").read_text(encoding="utf-8"))
    return vector


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
    """The files were found."""
    assert len(NAMES) >= AT_LEAST


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
    rows = naive.decode(text_of(vector), vector["medium"], vector["direction"])
    assert rows == rows_of(vector)


@pytest.mark.parametrize("name", NAMES)
def test_the_clauses_are_those_of_the_content(name: str) -> None:
    """Every packet, header or message of the vector has its clause named."""
    vector = loaded(name)
    direction = {ours: theirs for theirs, ours in tables.DIRECTIONS.items()}[vector["direction"]]
    clauses = {
        line["clause"]
        for line in tables.table("packets")
        if line["direction"] == direction
        if int(line["packet"]) in {packet["NID_PACKET"] for packet in vector["tree"]["packets"]}
    }
    clauses |= {
        line["clause"]
        for line in tables.table("messages")
        if line["direction"] == direction
        if int(line["message"]) == vector["tree"]["header"].get("NID_MESSAGE")
    }
    clauses |= {
        line["clause"]
        for line in tables.table("telegram_headers")
        if line["medium"] == vector["medium"]
    }
    assert clauses <= set(vector["clauses"])


# --- fishplate ---------------------------------------------------------------------------------


@pytest.mark.parametrize("name", NAMES)
def test_decode(name: str) -> None:
    """The bits give the tree."""
    vector = loaded(name)
    message = fishplate.decode(
        bits_of(vector), medium=vector["medium"], direction=vector["direction"]
    )
    assert message.tree() == vector["tree"]
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
    )
    assert message.tree() == vector["tree"]


@pytest.mark.parametrize("name", NAMES)
def test_medium_and_direction_are_found(name: str) -> None:
    """Every vector tells its medium and direction by itself."""
    vector = loaded(name)
    message = fishplate.decode(bits_of(vector))
    assert (message.medium, message.direction) == (vector["medium"], vector["direction"])
    assert message.tree() == vector["tree"]


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
    rows = fishplate.walk(bits_of(vector), medium=vector["medium"], direction=vector["direction"])
    found = [naive.Found(row.variable, row.offset, row.width, row.raw) for row in rows]
    assert found == rows_of(vector)
