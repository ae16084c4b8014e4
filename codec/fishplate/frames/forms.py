"""Which layouts write a tree, and each of its packets: those of its version, or another form."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.engine.runtime import MISFITS, codec
from fishplate.errors import EncodeError
from fishplate.standard.editions import EDITIONS, edition
from fishplate.versions import closest_layouts, version_code, version_text

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


def _layouts(version: str) -> str | None:
    """Return the layouts a version is read with; versions may share them."""
    closest = closest_layouts(version)
    found = edition(closest) if closest else None
    return found.layouts if found else None


def check_version(tree: Tree, code: int, *, force: bool) -> None:
    """Raise `EncodeError` for a telegram authored in one version that names another language."""
    said = tree.get("version")
    # With filler or content a tree says what was on the wire, however it was read.
    on_the_wire = "filler" in tree or "content" in tree
    if said is None or on_the_wire or force or _layouts(said) == _layouts(version_text(code)):
        return
    raise EncodeError(
        f"names version {version_text(code)}, the tree is of version {said}; "
        "leave version out or force it",
        path=("header", "M_VERSION"),
        expected=str(version_code(said)),
        got=code,
    )
