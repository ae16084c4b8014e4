"""What in a decoded frame rests on less than the published layouts of a version that is known."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.standard.vocabulary import TO_TRAIN

if TYPE_CHECKING:
    from collections.abc import Iterator

    from fishplate.engine.runtime import Codec
    from fishplate.frames.message import Message

Tree = dict[str, Any]


def evidence_of(message: Message) -> list[Tree]:
    """Return what is to be said of a message, its packets and its variables, each with its path."""
    layouts = message.layouts
    if layouts is None or message.medium is None:
        return []
    return [
        {"path": path, "kind": kind, "message": note}
        for path, kind, note in _found(message, layouts)
    ]


def _found(message: Message, layouts: Codec) -> Iterator[tuple[list[str | int], str, str]]:
    if message.version_from == "inferred":
        others = [each for each in message.fitting if each != message.version]
        also = f"; {', '.join(others)} would fit as well" if others else ""
        note = f"nothing says the version: the layouts of {message.version} fit{also}"
        yield ["version"], "inferred", note
    subjects = _subjects(message)
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


def _only(layouts: Codec) -> set[tuple[str, int]]:
    """Return the packets that the version has no layout of its own for."""
    return {
        (direction, number)
        for direction, forms in layouts.forms.items()
        for number in forms
        if number not in layouts.read_packet[direction]
    }


def _subjects(message: Message) -> dict[tuple[str | int, ...], list[list[str | int]]]:
    """Return what the message holds, as evidence names it, and where."""
    direction = message.direction or TO_TRAIN
    places: dict[tuple[str | int, ...], list[list[str | int]]] = {(): [[]]}
    if "NID_MESSAGE" in message.header:
        places["message", direction, message.header["NID_MESSAGE"]] = [["header"]]
    for index, packet in enumerate(message.packets):
        where: list[str | int] = ["packets", index]
        if "form" not in packet:
            places.setdefault(("packet", direction, packet["NID_PACKET"]), []).append(where)
        for name in packet:
            places.setdefault(("variable", name), []).append([*where, name])
    return places
