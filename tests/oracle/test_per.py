"""fishplate against unaligned PER (ITU-T X.691), written and read by asn1tools.

Sources: SUBSET-026 issue 3.6.0, clauses 7.4.2, 7.4.3 and 8.4.2.1, for what the packets hold;
ITU-T X.691 for how `oracle.per_module` turns them into bits. Frames come from `oracle.frames`.
"""

from __future__ import annotations

import functools
from typing import Any

import asn1tools
import bitstring
import pytest

import fishplate
from oracle import frames, naive, per_module

SEEDS = range(16)
PACKETS = sorted(per_module.PACKETS)
END_FLAG = "11111111"
HEADER_BITS = 50


@functools.cache
def compiled() -> Any:
    """The ASN.1 module for unaligned PER."""
    return asn1tools.compile_string(per_module.MODULE, "uper")


def bits_of(octets: bytes, size: int) -> str:
    """The first bits of an encoding; PER completes its last byte with zeros."""
    text = "".join(f"{octet:08b}" for octet in octets)
    assert set(text[size:]) <= {"0"}
    assert len(text) - size < 8
    return text[:size]


def to_tree(value: dict[str, Any], number: int) -> dict[str, Any]:
    """An ASN.1 value in the names of the standard, presence bits as their qualifiers."""
    tree: dict[str, Any] = {}
    for name, each in value.items():
        if name in per_module.QUALIFIERS:
            tree[per_module.QUALIFIERS[name]] = int(bool(each))
            for inner in each.values():
                nested = inner if isinstance(inner, dict) else each
                tree.update(to_tree(nested, number))
        elif name == "authority":
            tree.update(to_tree(each, number))
        elif name == "first":
            elements = [each, *value["further"]]
            tree[per_module.SETS[number]] = [element(one, number) for one in elements]
        elif isinstance(each, list):
            if name != "further":
                tree[name] = [element(one, number) for one in each]
        else:
            tree[name.upper().replace("-", "_")] = each
    return tree


def element(value: dict[str, Any] | int, number: int) -> dict[str, Any]:
    """One element of a set; packet 2 train-to-track lists bare versions."""
    return {"M_VERSION": value} if isinstance(value, int) else to_tree(value, number)


def carried(direction: str, number: int) -> list[tuple[frames.Frame, int, str]]:
    """Frames with the packet, which of their packets it is, and its bits."""
    found = []
    for seed in SEEDS:
        frame = frames.frame_with(seed, direction, number, spares=0.2 * (seed % 3 == 2))
        numbers = [one for one, _, _ in frame.packets]
        index = numbers.index(number)
        _, start, end = frame.packets[index]
        found.append((frame, index, frame.text[start:end]))
    return found


def value_of(direction: str, number: int, text: str) -> dict[str, Any]:
    """The packet as PER reads it."""
    octets = bytes.fromhex(naive.hex_text(text))
    value: dict[str, Any] = compiled().decode(per_module.PACKETS[direction, number], octets)
    return value


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_per_and_fishplate_read_alike(direction: str, number: int) -> None:
    """The same bits give the same values."""
    for frame, index, text in carried(direction, number):
        message = fishplate.decode(
            bitstring.Bits(bin=frame.text), medium=frame.medium, direction=direction
        )
        ours = message.tree()["packets"][index]
        assert ours == to_tree(value_of(direction, number, text), number)


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_per_and_fishplate_write_alike(direction: str, number: int) -> None:
    """The same values give the same bits: PER's packet stands in fishplate's frame."""
    for frame, index, text in carried(direction, number):
        value = value_of(direction, number, text)
        octets = compiled().encode(per_module.PACKETS[direction, number], value)
        tree = fishplate.decode(
            bitstring.Bits(bin=frame.text), medium=frame.medium, direction=direction
        ).tree()
        tree["packets"][index] = to_tree(value, number)
        _, start, end = frame.packets[index]
        assert fishplate.encode(tree).bin[start:end] == bits_of(octets, len(text))


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_per_repeats_the_generated_bits(direction: str, number: int) -> None:
    """The module itself: what PER reads from a generated packet it writes again."""
    for _, _, text in carried(direction, number):
        value = value_of(direction, number, text)
        octets = compiled().encode(per_module.PACKETS[direction, number], value)
        assert bits_of(octets, len(text)) == text


def test_header_of_a_balise_telegram() -> None:
    """The 50 bits of 8.4.2.1, then the end flag (7.4.2.39)."""
    value = {
        "q-updown": 1,
        "m-version": 33,
        "q-media": 0,
        "n-pig": 1,
        "n-total": 1,
        "m-dup": 2,
        "m-mcount": 254,
        "nid-c": 1001,
        "nid-bg": 9,
        "q-link": 1,
    }
    text = bits_of(compiled().encode("BaliseHeader", value), HEADER_BITS) + END_FLAG
    tree = fishplate.decode(bitstring.Bits(bin=text), medium="balise").tree()
    assert tree["header"] == {name.upper().replace("-", "_"): code for name, code in value.items()}
    assert fishplate.encode(tree).bin == text
