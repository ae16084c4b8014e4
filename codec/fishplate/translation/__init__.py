"""Translating frames between system versions with X = 1 and X = 2, and between their Y.

The rules are those of SUBSET-026 issue 3.6.0, chapter 6 (6.6.3, 6.6.4), as data. They are stated
for data with X = 1 to the train, and for data to the track from X = 2; the opposite directions
are their reverse, and each change says so.
"""

from __future__ import annotations

from copy import deepcopy
from dataclasses import dataclass
from typing import TYPE_CHECKING, Any

from fishplate.authoring import author_bits
from fishplate.bits import to_bytes
from fishplate.errors import EncodeError
from fishplate.frames import Message, decode
from fishplate.standard import registry
from fishplate.standard.editions import edition
from fishplate.translation.engine import FrameTranslator
from fishplate.translation.report import Change
from fishplate.translation.routes import ROUTES, VERSIONS
from fishplate.translation.stored import stored_values
from fishplate.versions import told_version

if TYPE_CHECKING:
    from collections.abc import Mapping

__all__ = ["VERSIONS", "Change", "Translation", "translate"]

Tree = dict[str, Any]


@dataclass(frozen=True, slots=True)
class Translation:
    """A frame in another system version, and what has changed on the way.

    `tree` is None where the whole message is rejected or not sent. Lengths and padding are left
    to the encoder; `filler` stands in it where a balise telegram keeps a length that the encoder
    would not choose.
    """

    tree: Tree | None
    changes: tuple[Change, ...]

    @property
    def lossy(self) -> bool:
        """True where something of the source cannot be got back."""
        return any(each.lossy for each in self.changes)


def translate(
    source: Message | Tree, to: str, *, stored: Mapping[str, Any] | None = None
) -> Translation:
    """Translate a message, or a tree of codes or meanings, into another system version.

    `to` is 1.0, 1.1, 2.0 or 2.1. `stored` are values the on-board unit holds and the message may
    lack: those of packet 3, any subset, codes or meanings; for data to the track NID_OPERATIONAL
    and `telephone_numbers`. Without them defaults are taken, and reported. Raises `EncodeError`
    where the frame could not be read, where a version has no rules or was read as another issue
    lays it out, or where the result does not fit its medium.
    """
    message = source if isinstance(source, Message) else _message_of(source)
    if message.version == to and edition(to):
        tree = source.tree() if isinstance(source, Message) else source
        return Translation(deepcopy(tree), ())
    _check_version(to, ("version",), "to")
    _check_read(message)
    _check_version(message.version, ("version",), "from")
    _check_issue(message)
    route = ROUTES[message.version, to]
    found, changes = FrameTranslator(message, to, route, stored_values(stored)).translate()
    return Translation(found, tuple(changes))


def _message_of(tree: Any) -> Message:
    """Read a tree as the message it describes."""
    if not isinstance(tree, dict):
        raise EncodeError(f"expected a message or a tree, got {type(tree).__name__}")
    unsaid = {name: value for name, value in tree.items() if name != "version"}
    tree = {**tree, "version": tree.get("version") or told_version(unsaid)}
    value, bits = author_bits(tree)
    return decode(
        to_bytes(value, bits),
        medium=tree.get("medium"),
        direction=tree.get("direction"),
        version=tree["version"],
        issue=tree.get("issue"),
        bits=bits,
        strict=False,
    )


def _check_version(version: str, path: tuple[str], way: str) -> None:
    if version not in VERSIONS:
        raise EncodeError(
            f"there are no published rules to translate {way} version {version}",
            path=path,
            expected=f"one of {', '.join(VERSIONS)}",
            got=version,
        )


def _check_issue(message: Message) -> None:
    """Raise for a source that was read as another issue lays its version out."""
    expected = registry(message.version).issue
    if message.issue != expected:
        raise EncodeError(
            f"chapter 6 translates version {message.version} as it lays it out: "
            f"read it without issue {message.issue}",
            path=("issue",),
            expected=expected,
            got=message.issue,
        )


def _check_read(message: Message) -> None:
    """Raise for a frame whose header or whose end could not be read."""
    if message.content is None and message.surplus is None and message.header:
        return
    first = next(iter(message.problems), None)
    reason = f": {first.message}" if first else ""
    path = first.path if first else ()
    raise EncodeError(f"a frame that could not be read is not translated{reason}", path=path)
