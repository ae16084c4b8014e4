"""Tables of the system versions that no issue prints as a whole, put together from those printed.

Sources, all SUBSET-026 (European Union Agency for Railways):

* versions with X = 1: issue 3.6.0, chapter 6, 6.5.1.5 (packets and variables) and 6.5.1.6
  (messages), in ``fixtures/standard/x1_chapter6``; all else from chapters 7 and 8 of the same
  issue. Lists of optional packets are those of issue 2.3.0, chapter 8, changed as 6.5.1.6 says.
* 2.2 and 2.3: inferred. Chapters 7 and 8 of issue 3.6.0, and what issue 4.0.0 numbers anew.

Nothing of fishplate is imported here.
"""

from __future__ import annotations

import functools
from typing import TYPE_CHECKING, Final

from oracle.tables import FROM, Key, Lines, Tables, key_of, published

if TYPE_CHECKING:
    from collections.abc import Callable, Iterable, Mapping

TO_TRAIN: Final = "to-train"
TO_TRACK: Final = "to-track"

# --- X = 1 -------------------------------------------------------------------------------------

X1_TO_TRAIN: Final = frozenset(
    (
        *(2, 3, 5, 6, 12, 15, 16, 21, 27, 39, 41, 42, 44, 45, 46, 49, 51, 57, 58, 63),
        *range(65, 69),
        *range(70, 73),
        *(79, 80, 90),
        *range(131, 142),
        *(145, 200, 203, 206, 207, 239, 254),
    )
)
"""Packets that may be used track to train with X = 1 (6.5.1.5.2)."""
END_FLAG: Final = 255
"""Ends the information of a balise or loop in X = 1 too."""
X1_TO_TRACK: Final = frozenset((0, 1, 3, 4, 9, 11, 44))
"""Packets that may be used train to track with X = 1 (6.5.1.5.2.1)."""
SINCE_1_1: Final = frozenset(
    (TO_TRAIN, number) for number in (2, 6, 135, 145, 200, 203, 206, 207, 239)
)
"""Packets that only version 1.1 may use (6.5.1.7.1 to 6.5.1.7.4)."""
NOT_USED: Final = frozenset({(TO_TRACK, 158)})
"""Messages that are not used with X = 1 (6.5.1.6.6.4)."""
NOT_COMMON: Final = (21, 27, 49, 80)
"""Optional packets of message 3 in 2.3.0 that come before those that many messages share."""
RENAMED: Final = {"Q_NVSBTSMPERM": "Q_NVSRBKTRG"}
"""Packet 3 of 6.5.1.5.4 names it as 2.3.0 does; 3.6.0 defines it under its new name (7.5.1.124)."""
DEFINED_AS: Final = {"M_TRACKCONDBC": ("v3_6_0", "M_TRACKCOND")} | {
    name: ("v2_3_0", name) for name in ("M_AXLELOAD", "M_TRACTION", "Q_TRACKDEL")
}
"""Where coding, unit and step stand of variables that only X = 1 has: chapter 6 lists codes."""


def _replaced(lines: Lines, others: Lines, kind: str, keep: Callable[[Key], bool]) -> Lines:
    """Lines whose packet the others do not declare and that may be kept, then the others."""
    declared = {key_of(line, kind) for line in others}
    kept = (
        line for line in lines if keep(key_of(line, kind)) and key_of(line, kind) not in declared
    )
    return (*kept, *others)


def _allowed(key: Key) -> bool:
    direction, number = key
    return number in (X1_TO_TRACK if direction == TO_TRACK else X1_TO_TRAIN | {END_FLAG})


def _x1_message_fields() -> Lines:
    """Fixed variables and required packets (6.5.1.6), order counted anew."""
    lines: list[dict[str, str]] = []
    order: dict[Key, int] = {}
    for line in published("v3_6_0").table("message_fields"):
        key = key_of(line, "message")
        changed = dict(line)
        if key in NOT_USED:
            continue
        if key in {(TO_TRAIN, 15), (TO_TRAIN, 34)} and line["name"] == "D_REF":
            continue
        if key == (TO_TRACK, 132) and line["name"] == "Q_MARQSTREASON":
            changed |= {"name": "Q_TRACKDEL", "bits": "1"}
        if key == (TO_TRACK, 159) and line["kind"] == "packet":
            changed |= {"name": "3"}
        order[key] = order.get(key, 0) + 1
        lines.append(changed | {"order": str(order[key])})
    return tuple(lines)


def _x1_optional_packets() -> Lines:
    """The lists that 6.5.1.6 gives; those of the other messages keep what X = 1 may use."""
    of_2_3_0 = published("v2_3_0").optional_packets[TO_TRAIN, 3]
    without = {*NOT_COMMON, 76}
    common = [number for number, _ in of_2_3_0 if number not in without]
    common += [203, 206, 207, 239]
    given: Mapping[int, Iterable[tuple[int, str]]] = {
        3: [(number, "") for number in (21, 27, 49, 80, *common)],
        24: [
            *((number, f"{FROM}RBC") for number in (21, 27, *common)),
            (45, f"{FROM}RIU"),
            (254, f"{FROM}RIU"),
        ],
        28: [(number, "") for number in (49, *common)],
        33: [(number, "") for number in (21, 27, 80, *common)],
        37: [
            (number, "")
            for number in (
                *(5, 21, 27, 39, 41, 44, 51, 65, 66, 68, 70, 71, 80, 138, 139),
                *(206, 207, 239),
            )
        ],
    }
    lines = [
        {
            "direction": "track-to-train",
            "message": str(message),
            "packet": str(number),
            "note": note,
        }
        for message, entries in given.items()
        for number, note in entries
    ]
    for line in published("v3_6_0").table("message_optional_packets"):
        direction, message = key_of(line, "message")
        if direction == TO_TRAIN and message in given:
            continue
        if _allowed((direction, int(line["packet"]))):
            lines.append(line)
    return tuple(lines)


def _x1_variables(used: frozenset[str]) -> Lines:
    """Chapter 6 for clause and width of its variables, chapter 7.5 for all else."""
    chapter_6 = published("x1_chapter6")
    own = {line["variable"]: line for line in chapter_6.table("variables")}
    plain = {
        line["variable"]: (line["code_first"], line["code_last"])
        for line in chapter_6.table("codes")
        if line["kind"] == "range"
    }
    lines = {
        RENAMED.get(line["variable"], line["variable"]): line
        for line in published("v3_6_0").table("variables")
    }
    for name, (folder, like) in DEFINED_AS.items():
        lines[name] = next(
            line for line in published(folder).table("variables") if line["variable"] == like
        )
    for name, line in own.items():
        first, last = plain.get(name, ("", ""))
        lines[name] = lines[name] | {
            "clause": line["clause"],
            "bits": line["bits"],
            "code_min": first,
            "code_max": last,
        }
    return tuple(lines[name] | {"variable": name} for name in sorted(used))


def _x1_codes(used: frozenset[str]) -> Lines:
    """Chapter 6 comes first, and wholly: no code of 7.5 stays beside its codes."""
    chapter_6 = published("x1_chapter6")
    own = {line["variable"] for line in chapter_6.table("variables")}
    lines = []
    for line in published("v3_6_0").table("codes"):
        name = RENAMED.get(line["variable"], line["variable"])
        if name in used and name not in own:
            lines.append(line | {"variable": name})
    return (*lines, *chapter_6.table("codes"))


def _names(*tables: Lines) -> frozenset[str]:
    """The variables that layouts use."""
    return frozenset(
        line.get("variable") or line["name"]
        for lines in tables
        for line in lines
        if line.get("kind") != "packet"
    )


@functools.cache
def x1() -> Tables:
    """Versions 1.0 and 1.1 as chapter 6 of issue 3.6.0 has them."""
    base, chapter_6 = published("v3_6_0"), published("x1_chapter6")
    packet_fields = _replaced(
        base.table("packet_fields"), chapter_6.table("packet_fields"), "packet", _allowed
    )
    packets = _replaced(base.table("packets"), chapter_6.table("packets"), "packet", _allowed)
    message_fields = _x1_message_fields()
    headers = base.table("telegram_headers")
    used = _names(packet_fields, message_fields, headers)
    return Tables(
        "x1_chapter6",
        {
            "packets": packets,
            "packet_fields": packet_fields,
            "messages": tuple(
                line for line in base.table("messages") if key_of(line, "message") not in NOT_USED
            ),
            "message_fields": message_fields,
            "message_optional_packets": _x1_optional_packets(),
            "telegram_headers": headers,
            "variables": _x1_variables(used),
            "codes": _x1_codes(used),
        },
    )


def without_packets(tables: Tables, keys: frozenset[Key]) -> Tables:
    """The same tables without some packets, also where a message may carry them."""
    named = {
        name: tuple(line for line in tables.table(name) if key_of(line, "packet") not in keys)
        for name in ("packets", "packet_fields", "message_optional_packets")
    }
    return Tables(tables.name, {**tables.lines, **named}, tables.forms)


# --- 2.2 and 2.3 -------------------------------------------------------------------------------

BOTH_FORMS: Final = ((TO_TRAIN, 45), (TO_TRAIN, 70), (TO_TRACK, 0), (TO_TRACK, 1))
"""Packets that 3.6.0 and 4.0.0 lay out differently under one number; L_PACKET tells the form."""
NEW_FORM_ONLY: Final = ((TO_TRAIN, 73), (TO_TRAIN, 74))
"""Text packets under their numbers of 4.0.0: levels and modes inside have the codes of 4.0.0."""


@functools.cache
def x2() -> Tables:
    """Versions 2.2 and 2.3: all of 3.6.0, and what has a number or name only in 4.0.0."""
    old, new = published("v3_6_0"), published("v4_0_0")
    lines = dict(old.lines)
    for name, kind in (
        ("packets", "packet"),
        ("packet_fields", "packet"),
        ("messages", "message"),
        ("message_fields", "message"),
    ):
        there = {key_of(line, kind) for line in old.table(name)}
        lines[name] += tuple(line for line in new.table(name) if key_of(line, kind) not in there)
    added = set(new.packet_rows) - set(old.packet_rows)
    lines["message_optional_packets"] += tuple(
        line
        for line in new.table("message_optional_packets")
        if key_of(line, "message") not in old.message_rows or key_of(line, "packet") in added
    )
    used = _names(lines["packet_fields"], lines["message_fields"])
    # M_VERSION alone comes from 4.0.0 although 3.6.0 has it: 2.2 and 2.3 are not defined there.
    taken = {name for name in used if name not in old.coding} | {"M_VERSION"}
    for name in ("variables", "codes"):
        lines[name] = (
            *(line for line in old.table(name) if line["variable"] not in taken),
            *(line for line in new.table(name) if line["variable"] in taken),
        )
    forms = dict.fromkeys((*BOTH_FORMS, *NEW_FORM_ONLY), new)
    return Tables("x2_inferred", lines, forms)
