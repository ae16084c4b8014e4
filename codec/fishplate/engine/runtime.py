"""What generated modules build on, and the table through which they are used."""

from __future__ import annotations

from dataclasses import dataclass, replace
from functools import cache
from importlib import import_module
from typing import TYPE_CHECKING, Any

from fishplate.errors import EncodeError
from fishplate.standard import registry
from fishplate.standard.editions import Edition, edition
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN

if TYPE_CHECKING:
    from collections.abc import Callable, Mapping

    from fishplate.standard import Registry

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

    `unmeasured` gives the width of the packets that carry no L_PACKET, `forms` the other version
    that may lay out a packet, `since` the first version that may use it where not all may.
    `evidence` is that of the registry: kind, note and subject. `version` and `issue` say as which
    edition the layouts are used.
    """

    layouts: str
    read_packet: Mapping[str, Mapping[int, Reader]]
    write_packet: Mapping[str, Mapping[int, Writer]]
    read_message: Mapping[str, Mapping[int, Reader]]
    write_message: Mapping[str, Mapping[int, Writer]]
    read_header: Mapping[str, Reader]
    write_header: Mapping[str, Writer]
    unmeasured: Mapping[str, Mapping[int, int]]
    forms: Mapping[str, Mapping[int, str]]
    since: Mapping[str, Mapping[int, str]]
    evidence: tuple[tuple[str, str, tuple[str | int, ...]], ...]
    version: str = ""
    issue: str = ""

    @property
    def registry(self) -> Registry:
        """The registry behind the readers and writers."""
        return registry(self.version, self.issue)

    def direction_of(self, number: object) -> str:
        """Return the direction of a radio message, of an unknown one by its number."""
        for direction, messages in self.read_message.items():
            if number in messages:
                return direction
        return TO_TRACK if isinstance(number, int) and number >= FIRST_TO_TRACK else TO_TRAIN


@cache
def codec(version: str, issue: str | None = None) -> Codec:
    """Return the generated readers and writers of a system version.

    They are those of the issue where it prints that version, else those the version is used with
    anyway. Raises `KeyError` for a version without layouts.
    """
    found = edition(version, issue)
    if found is None:
        raise KeyError(version)
    return _of_edition(found)


@cache
def _of_edition(found: Edition) -> Codec:
    module = import_module(f"fishplate.engine.generated.{found.layouts}")
    generated: Codec = module.CODEC
    return replace(generated, version=found.version, issue=found.issue)
