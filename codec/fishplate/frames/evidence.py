"""What in a decoded frame rests on less than the published layouts of a version that is known."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.engine.runtime import codec
from fishplate.standard.vocabulary import TO_TRAIN
from fishplate.versions import closest_layouts

if TYPE_CHECKING:
    from collections.abc import Iterator

    from fishplate.engine.runtime import Codec
    from fishplate.frames.message import Message

Tree = dict[str, Any]
Path = list[str | int]
Places = dict[tuple[str | int, ...], list[Path]]
"""What a message holds, as evidence names it, and where."""


def evidence_of(message: Message) -> list[Tree]:
    """Return what is to be said of a message, its packets and its variables, each with its path."""
    if message.medium is None or not closest_layouts(message.version):
        return []
    layouts = message.layouts or codec(message.version)
    return [
        {"path": path, "kind": kind, "message": note}
        for path, kind, note in _found(message, layouts)
    ]


def _found(message: Message, layouts: Codec) -> Iterator[tuple[Path, str, str]]:
    note = _version_note(message)
    if note:
        yield ["version"], "inferred", note
    subjects = _subjects(message) if layouts.evidence else {}
    for kind, note, subject in layouts.evidence:
        for path in subjects.get(subject, ()):
            yield path, kind, note
    for index, packet in enumerate(message.packets):
        if "form" in packet:
            form = packet["form"]
            note = f"laid out as in {form}, which its L_PACKET fits"
            if (message.direction or TO_TRAIN, packet["NID_PACKET"]) in _only(layouts):
                note = f"laid out as in {form}, which alone knows it"
            yield ["packets", index], "inferred", note
            for kind, sentence, subject in codec(form).evidence:
                if subject == ():
                    yield ["packets", index], kind, sentence


def _version_note(message: Message) -> str:
    """Say why a version was taken that nothing said, or another than the one named before."""
    others = [each for each in message.fitting if each != message.version]
    also = f"; {', '.join(others)} would fit as well" if others else ""
    if message.version_from == "inferred":
        if message.told:
            return f"{message.told}, named before, does not fit: {message.version} does{also}"
        return f"nothing says the version: the layouts of {message.version} fit{also}"
    if message.told:
        return f"{message.told}, named before, does not fit: {message.version} is assumed"
    return ""


def _only(layouts: Codec) -> set[tuple[str, int]]:
    """Return the packets that the version has no layout of its own for."""
    return {
        (direction, number)
        for direction, forms in layouts.forms.items()
        for number in forms
        if number not in layouts.read_packet[direction]
    }


def _subjects(message: Message) -> Places:
    """Return what the message holds, as evidence names it, and where."""
    direction = message.direction or TO_TRAIN
    places: Places = {(): [[]]}
    if "NID_MESSAGE" in message.header:
        places["message", direction, message.header["NID_MESSAGE"]] = [["header"]]
    _variables(message.header, ["header"], places)
    for index, packet in enumerate(message.packets):
        where: Path = ["packets", index]
        if "form" not in packet:
            places.setdefault(("packet", direction, packet["NID_PACKET"]), []).append(where)
        _variables(packet, where, places)
    return places


def _variables(value: object, where: Path, places: Places) -> None:
    """Note where each name stands, in sets too."""
    if isinstance(value, dict):
        for name, inner in value.items():
            places.setdefault(("variable", name), []).append([*where, name])
            _variables(inner, [*where, name], places)
    elif isinstance(value, list):
        for index, inner in enumerate(value):
            _variables(inner, [*where, index], places)
