"""Which layouts write a tree, and each of its packets: those of its version, or another form."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.engine.runtime import MISFITS, codec
from fishplate.errors import EncodeError
from fishplate.standard.editions import EDITIONS

if TYPE_CHECKING:
    from fishplate.engine.runtime import Codec
    from fishplate.errors import Path

Tree = dict[str, Any]

BESIDE = frozenset({"content", "surplus", "form"})
"""Keys of a packet that are not its layout's."""


def layouts_of_packet(layouts: Codec, packet: Tree, direction: str, path: Path) -> Codec:
    """Return the layouts a packet is written by: its version's own, or those of its form."""
    number: Any = packet.get("NID_PACKET")
    own = layouts.version
    other = layouts.forms[direction].get(number) if isinstance(number, int) else None
    form = packet.get("form")
    if form not in (None, own, other):
        raise wrong_form(number, own, other, form, path)
    if other is None or form == own:
        return layouts
    if form == other or number not in layouts.write_packet[direction]:
        return codec(other)
    layout = {key: value for key, value in packet.items() if key not in BESIDE}
    try:
        codec(other).write_packet[direction][number](layout)
    except MISFITS:
        return layouts
    # Told by its variables: only what its own version cannot write comes here unmarked.
    return codec(other)


def wrong_form(
    number: object, own: str, other: str | None, form: object, path: Path
) -> EncodeError:
    """Return the error of a packet that does not come in the form it names."""
    return EncodeError(
        f"packet {number!r} of version {own} does not come in the form of {form!r}",
        path=(*path, "form"),
        expected=" or ".join(filter(None, (own, other))),
        got=form,
    )


def check_issue(issue: object, layouts: Codec) -> None:
    """Raise `EncodeError` where a tree asks for an issue that does not print its version."""
    if issue not in (None, layouts.issue):
        offers = [each.issue for each in EDITIONS if each.version == layouts.version]
        raise EncodeError(
            f"version {layouts.version} is not laid out in issue {issue!r}",
            path=("issue",),
            expected=" or ".join(offers),
            got=issue,
        )
