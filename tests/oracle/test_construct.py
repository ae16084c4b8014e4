"""fishplate against construct, in both directions, on packets declared by hand.

Source: SUBSET-026 issue 3.6.0, clauses 7.4.2 and 7.4.3, as written down in `oracle.structs`; the
bits are parsed and built by construct. Frames come from `oracle.frames`.
"""

from __future__ import annotations

from typing import Any

import bitstring
import pytest

import fishplate
from oracle import frames, naive, structs

SEEDS = range(24)
PACKETS = sorted(structs.STRUCTS)
IMPLIED = {"N_ITER", "L_TEXT"}
"""Variables that a tree does not hold: the lengths of lists and texts say them."""


class Wire(dict[str, Any]):
    """A packet for construct, which asks for absent fields too."""

    def __missing__(self, _key: str) -> None:
        return None


def to_wire(value: Any) -> Any:
    """A tree as construct wants it: structs of one condition nested, absent fields None."""
    if isinstance(value, list):
        return [to_wire(element) for element in value]
    if not isinstance(value, dict):
        return value
    wire = Wire({key: to_wire(each) for key, each in value.items()})
    return Wire(wire, **dict.fromkeys(structs.INLINE, wire))


def to_tree(value: Any) -> Any:
    """What construct parsed, as a tree of plain dicts and lists without absent fields."""
    if isinstance(value, list):
        return [to_tree(element) for element in value]
    if not isinstance(value, dict):
        return value
    tree: dict[str, Any] = {}
    for key, each in value.items():
        if each is None or key == "_io":
            continue
        if key in structs.INLINE:
            tree.update(to_tree(each))
        else:
            tree[key] = to_tree(each)
    return tree


def leaves(tree: Any) -> list[int | str]:
    """The values of a tree in order."""
    if isinstance(tree, dict):
        return [leaf for each in tree.values() for leaf in leaves(each)]
    if isinstance(tree, list):
        return [leaf for each in tree for leaf in leaves(each)]
    return [tree]


def packet_bits(frame: frames.Frame, number: int) -> tuple[int, str]:
    """Where the packet stands in the frame, and its bits."""
    for index, (found, start, end) in enumerate(frame.packets):
        if found == number:
            return index, frame.text[start:end]
    raise AssertionError(f"no packet {number}")


def parsed(direction: str, number: int, text: str) -> dict[str, Any]:
    """The packet as construct reads it."""
    octets = bytes.fromhex(naive.hex_text(text))
    found = structs.framed(structs.STRUCTS[direction, number]).parse(octets)
    assert found.rest == bytes(-len(text) % 8)
    tree: dict[str, Any] = to_tree(found.packet)
    return tree


def built(direction: str, number: int, tree: dict[str, Any], size: int) -> str:
    """The packet as construct writes it."""
    octets = structs.framed(structs.STRUCTS[direction, number]).build(
        {"packet": to_wire(tree), "rest": bytes(-size % 8)}
    )
    return "".join(f"{octet:08b}" for octet in octets)[:size]


def some_frames(direction: str, number: int) -> list[frames.Frame]:
    """Frames with the packet, every third one with spare codes."""
    return [
        frames.frame_with(seed, direction, number, spares=0.2 * (seed % 3 == 2)) for seed in SEEDS
    ]


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_construct_and_fishplate_parse_alike(direction: str, number: int) -> None:
    """The same bits give the same packet."""
    for frame in some_frames(direction, number):
        index, text = packet_bits(frame, number)
        bits = bitstring.Bits(bin=frame.text)
        message = fishplate.decode(bits, medium=frame.medium, direction=direction)
        assert message.tree()["packets"][index] == parsed(direction, number, text)


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_construct_builds_what_fishplate_parsed(direction: str, number: int) -> None:
    """construct writes the packet of a decoded tree as it came."""
    for frame in some_frames(direction, number):
        index, text = packet_bits(frame, number)
        bits = bitstring.Bits(bin=frame.text)
        message = fishplate.decode(bits, medium=frame.medium, direction=direction)
        assert built(direction, number, message.tree()["packets"][index], len(text)) == text


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_fishplate_builds_what_construct_parsed(direction: str, number: int) -> None:
    """fishplate writes the packet that construct read; the rest of the frame is its own."""
    for frame in some_frames(direction, number):
        index, text = packet_bits(frame, number)
        bits = bitstring.Bits(bin=frame.text)
        tree = fishplate.decode(bits, medium=frame.medium, direction=direction).tree()
        tree["packets"][index] = parsed(direction, number, text)
        assert fishplate.encode(tree).bin == frame.text


@pytest.mark.parametrize(("direction", "number"), PACKETS)
def test_structs_agree_with_the_tables(direction: str, number: int) -> None:
    """The structs themselves: the values of `oracle.naive`, and the same bits when built."""
    for frame in some_frames(direction, number):
        index, text = packet_bits(frame, number)
        _, start, end = frame.packets[index]
        tree = parsed(direction, number, text)
        # An empty text is a value in a tree and no bit on the wire.
        assert [leaf for leaf in leaves(tree) if leaf != ""] == [
            row.raw
            for row in naive.decode(frame.text, frame.medium, direction)
            if row.width and start <= row.offset < end and row.variable not in IMPLIED
        ]
        assert built(direction, number, tree, len(text)) == text
