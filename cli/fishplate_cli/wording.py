"""How codes, bits and whole frames are named in text."""

from __future__ import annotations

import json
from functools import lru_cache
from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.bits import BYTE
from fishplate.errors import path_text
from fishplate.meaning import explain
from fishplate.standard import registry
from fishplate.standard.editions import DEFAULT_VERSION, edition
from fishplate.versions import closest_layouts, version_text
from fishplate_cli.console import counted, visible

if TYPE_CHECKING:
    from collections.abc import Iterator

    from fishplate.frames import FieldRow, Message
    from fishplate.standard import Registry
    from fishplate.standard.vocabulary import Variable

WAYS = MappingProxyType({"to-train": "to train", "to-track": "to track"})
IN_HEADING = MappingProxyType(
    {
        "radio": frozenset({"NID_MESSAGE"}),
        "balise": frozenset({"N_PIG", "N_TOTAL", "NID_C", "NID_BG"}),
        "loop": frozenset({"NID_C", "NID_LOOP"}),
    }
)
"""Variables of the header that the heading of a frame is written from."""

UP_LINK = 1
"""Q_UPDOWN of what is sent to trains (SUBSET-026 7.5.1.142)."""

Q_MEDIA = MappingProxyType({"balise": 0, "loop": 1})
"""Q_MEDIA by what the heading calls the medium (SUBSET-026 7.5.1.119)."""

NOT_SURE = frozenset({"assumed", "inferred"})
"""Where a system version came from that the heading of a frame does not leave unsaid."""

CODED = frozenset({"special", "spare", "value"})
SPARE = "!"
EVIDENCE = MappingProxyType(
    {"weaker": "weaker evidence", "inferred": "inferred", "memory": "from memory"}
)
"""How kinds of evidence are named in front of what they are about."""

SHOWN_HEX = 32
POSITION_REPORTS = (0, 1)


def book_of(message: Message) -> Registry:
    """Return the registry whose layouts read the message."""
    return message.layouts.registry if message.layouts else registry(DEFAULT_VERSION)


def book_of_packet(packet: dict[str, Any], book: Registry) -> Registry:
    """Return the registry whose layouts read a packet: another one for another form of it."""
    return registry(packet["form"]) if "form" in packet else book


@lru_cache(maxsize=4096)
def said(variable: Variable, raw: int | str, scale: int | None = None) -> str:
    """Say what a code means, with the code itself where the meaning hides it."""
    if isinstance(raw, str):
        return quoted(raw)
    meaning = explain(variable, raw, scale)
    text = meaning.text
    hidden = meaning.kind in CODED and variable.coding != "digits"
    if hidden and variable.bits > 1 and "(" not in text:
        text = f"{text} ({raw})"
    return f"{SPARE} {text}" if meaning.kind == "spare" else text


def quoted(text: str) -> str:
    """Return a text in quotes, control characters as escapes."""
    return visible(json.dumps(text, ensure_ascii=False))


def unexplained(raw: str, bits: int) -> str:
    """Say how many bits there are and what they hold, shortened."""
    if not bits:
        return "none"
    value = int(raw, 16) >> -bits % 8
    if value == 0:
        return f"{counted(bits, 'bit')}, all 0"
    if value == (1 << bits) - 1:
        return f"{counted(bits, 'bit')}, all 1"
    return f"{bits} bits, {raw[:SHOWN_HEX]}{'…' if len(raw) > SHOWN_HEX else ''}"


def row_text(row: FieldRow, book: Registry) -> str:
    """Say what one field row holds."""
    if row.variable is None:
        return unexplained(str(row.raw), row.width)
    return said(book.variables[row.variable], row.raw, row.scale)


def heading(message: Message, book: Registry) -> tuple[str, str]:
    """Return what came which way, and what it is."""
    way = WAYS.get(message.direction or "", "")
    first = "  ".join(filter(None, (message.medium, way, counted(message.size, "bit"))))
    version = ""
    if message.version and message.medium:
        source = f" ({message.version_from})" if message.version_from in NOT_SURE else ""
        version = f"; system version {message.version}{source}"
        if same_in_every_version(message, book):
            version = "; the same in every system version"
        if message.issue and message.issue != _usual_issue(message.version):
            version += f" (issue {message.issue})"
    return first, f"{_what(message, book)}{version}"


def _usual_issue(version: str) -> str:
    """Return the issue whose layouts a version is read with unless another is asked for."""
    found = edition(closest_layouts(version) or DEFAULT_VERSION)
    return found.issue if found else ""


def evidence_lines(message: Message, before: set[str]) -> Iterator[str]:
    """Yield what in a message rests on less than published layouts, one sentence each.

    What holds for all of a version is said once: `before` keeps what has been.
    """
    for each in message.evidence:
        place = path_text(tuple(each["path"]))
        text = f"{EVIDENCE[each['kind']]}: {each['message']}"
        if place:
            yield f"{text} [{place}]"
        elif text not in before:
            before.add(text)
            yield text


def _what(message: Message, book: Registry) -> str:
    header = message.header
    match message.medium:
        case "radio" if "NID_MESSAGE" in header:
            number = header["NID_MESSAGE"]
            return f"message {number}, {message_name(message, book)}"
        case "balise" if header:
            place = f"balise {header['N_PIG'] + 1} of {header['N_TOTAL'] + 1}"
            return f"balise group {header['NID_C']}/{header['NID_BG']}, {place}"
        case "loop" if header:
            return f"loop {header['NID_C']}/{header['NID_LOOP']}"
        case None:
            return "not recognised"
    return f"{message.medium}, header not readable"


def same_in_every_version(message: Message, book: Registry) -> bool:
    """Tell whether a radio message is laid out the same in every system version.

    One that only some versions fit is not: number 38 had another meaning before it was taken back.
    """
    if message.version_from == "inferred":
        return False
    found = book.messages.get((message.direction or "", message.header.get("NID_MESSAGE", -1)))
    return found is not None and found.version_invariant


def message_name(message: Message, book: Registry) -> str:
    """Return the name of a radio message."""
    found = book.messages.get((message.direction or "", message.header.get("NID_MESSAGE", -1)))
    return found.name if found else "not known"


def in_heading(row: FieldRow, message: Message, book: Registry) -> bool:
    """Tell whether the heading says the same as a field of the header; never for spare codes."""
    return _agrees(row, message) and not row_text(row, book).startswith(SPARE)


def _agrees(row: FieldRow, message: Message) -> bool:
    match row.variable:
        case "M_VERSION" if message.medium != "radio":
            return version_text(int(row.raw)) == message.version
        case "Q_MEDIA":
            return row.raw == Q_MEDIA.get(message.medium or "")
        case "Q_UPDOWN":
            return row.raw == UP_LINK and message.direction == "to-train"
        case "L_MESSAGE":
            return int(row.raw) * BYTE == message.size
    return row.variable in IN_HEADING.get(message.medium or "", ())


def packet_title(packet: dict[str, Any], direction: str, book: Registry) -> str:
    """Return number, name, validity direction and length of a packet."""
    book = book_of_packet(packet, book)
    number = packet["NID_PACKET"]
    found = book.packets.get((direction, number))
    known = []
    if "Q_DIR" in packet:
        meaning = explain(book.variables["Q_DIR"], packet["Q_DIR"])
        spare = f"{SPARE} Q_DIR {packet['Q_DIR']} is spare"
        known.append(spare if meaning.kind == "spare" else meaning.text)
    if "L_PACKET" in packet:
        known.append(counted(packet["L_PACKET"], "bit"))
    name = found.name if found else "not known"
    return f"packet {number}, {name}" + (f" ({', '.join(known)})" if known else "")


def reference(message: Message, book: Registry) -> str:
    """Return the identity a frame counts from: group, loop, last relevant group, or engine."""
    header = message.header
    if message.medium == "balise" and header:
        return f"group {header['NID_C']}/{header['NID_BG']}"
    if message.medium == "loop" and header:
        return f"loop {header['NID_C']}/{header['NID_LOOP']}"
    reports = (each for each in message.packets if each["NID_PACKET"] in POSITION_REPORTS)
    report = next(reports, {}) if message.direction == "to-track" else {}
    lrbg = header.get("NID_LRBG", report.get("NID_LRBG"))
    if lrbg is not None:
        return f"LRBG {said(book.variables['NID_LRBG'], lrbg).partition(' (')[0]}"
    return f"engine {header['NID_ENGINE']}" if "NID_ENGINE" in header else "-"
