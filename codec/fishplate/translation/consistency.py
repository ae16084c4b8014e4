"""The check that stands before translation: one code without meaning makes a message unusable.

SUBSET-026 6.6.3.1.1 has it made on the form of the source, 3.16.1.1.1 says what fails it.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.translation.report import METRES
from fishplate.translation.tables import SPARE_DIGITS

if TYPE_CHECKING:
    from collections.abc import Iterator

    from fishplate.errors import Path
    from fishplate.frames import Message
    from fishplate.translation.report import Side

Tree = dict[str, Any]

UNEXPLAINED = ("content", "surplus")


def is_read(packet: Tree) -> bool:
    """Tell whether a layout explains all bits of a packet."""
    return not any(name in packet for name in UNEXPLAINED)


def unexplained_bits(packet: Tree) -> int:
    """Return how many bits of a packet no layout explains."""
    return int(next(packet[name]["bits"] for name in UNEXPLAINED if name in packet))


def first_fault(
    message: Message, source: Side, passed: frozenset[tuple[str, int]]
) -> tuple[Path, str] | None:
    """Return place and reason of the first thing that makes a message unusable.

    A packet of a number the source has not does not: it is passed over (8.5.2). Nor does a code
    of `passed`.
    """
    found = next(_spare_codes(message.header, ("header",), source, passed), None)
    for place, packet in enumerate(message.packets):
        path: Path = ("packets", place)
        if found:
            return found
        number = packet["NID_PACKET"]
        if is_read(packet):
            found = next(_spare_codes(packet, path, source, passed), None)
        elif (source.direction, number) in source.book.packets:
            title = source.packet(number)
            bits = unexplained_bits(packet)
            return path, f"of {title} {bits} bits do not fit its layout"
    return found


def _spare_codes(
    scope: Tree, path: Path, source: Side, passed: frozenset[tuple[str, int]]
) -> Iterator[tuple[Path, str]]:
    for name, value in scope.items():
        if isinstance(value, dict):
            yield from _spare_codes(value, (*path, name), source, passed)
        elif isinstance(value, list):
            for place, each in enumerate(value):
                yield from _spare_codes(each, (*path, name, place), source, passed)
        elif (name, value) not in passed and is_spare(source, name, value):
            lineage = source.book.variables[name].lineage
            yield (*path, name), f"{source.said(lineage, value, METRES)} makes it unusable"


def is_spare(source: Side, name: str, code: int | str) -> bool:
    """Tell whether a code of a variable has no meaning on this side."""
    variable = source.book.variables.get(name)
    if variable is None:
        return False
    if isinstance(code, str):
        return not SPARE_DIGITS.get(name, frozenset()).isdisjoint(code)
    if any(each.kind == "spare" and each.first <= code <= each.last for each in variable.codes):
        return True
    found = source.meaning(variable.lineage, code, METRES)
    return found is not None and found.kind == "spare"
