"""What generated modules build on, and the table through which they are used."""

from __future__ import annotations

from dataclasses import dataclass
from functools import cache
from importlib import import_module
from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.errors import EncodeError
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN

if TYPE_CHECKING:
    from collections.abc import Callable, Mapping

    Reader = Callable[[int, int], tuple[dict[str, Any], int]]
    Writer = Callable[[dict[str, Any]], tuple[int, int]]

Tree = dict[str, Any]

FIRST_TO_TRACK = 128
"""Every issue numbers its radio messages to the trackside above this, to the train below."""


class Misfit(ValueError):
    """A value does not fit its layout; the walk finds out which and why."""


MISFITS = (EncodeError, KeyError, TypeError, ValueError, IndexError, AttributeError)
"""Everything a generated writer may raise on a tree that does not fit."""


@dataclass(frozen=True, slots=True)
class Codec:
    """The generated readers and writers of one issue, by direction and number, or medium.

    `unmeasured` gives the width of the packets that carry no L_PACKET, `versions` the system
    versions that the issue defines, by code of M_VERSION.
    """

    version: str
    issue: str
    read_packet: Mapping[str, Mapping[int, Reader]]
    write_packet: Mapping[str, Mapping[int, Writer]]
    read_message: Mapping[str, Mapping[int, Reader]]
    write_message: Mapping[str, Mapping[int, Writer]]
    read_header: Mapping[str, Reader]
    write_header: Mapping[str, Writer]
    unmeasured: Mapping[str, Mapping[int, int]]
    versions: Mapping[int, str]

    def direction_of(self, number: object) -> str:
        """Return the direction of a radio message, of an unknown one by its number."""
        for direction, messages in self.read_message.items():
            if number in messages:
                return direction
        return TO_TRACK if isinstance(number, int) and number >= FIRST_TO_TRACK else TO_TRAIN


MODULES: Mapping[str, str] = MappingProxyType({"2.1": "v3_6_0"})
"""The generated module of each system version."""


@cache
def codec(version: str) -> Codec:
    """Import the generated module of a system version and return its table."""
    name = f"fishplate.engine.generated.{MODULES[version]}"
    found: Codec = import_module(name).CODEC
    return found
