"""A small invented issue of a standard, for the tests beside this file to spoil or to extend.

One header, four packets, two messages; the functions give copies that differ in one place.
"""

from __future__ import annotations

import dataclasses
from typing import Any

from fishplate.standard.vocabulary import (
    SCALED,
    Codes,
    Declarations,
    Eq,
    Field,
    Header,
    Node,
    Optional,
    Packet,
    RadioMessage,
    Required,
    Series,
    Text,
    Variable,
    When,
)


def unsigned(name: str, bits: int, **more: Any) -> Variable:
    return Variable(name, "0.0", bits, more.pop("coding", "unsigned"), name, **more)


VARIABLES = (
    unsigned("NID_PACKET", 8),
    unsigned("NID_MESSAGE", 8),
    unsigned("Q_DIR", 2),
    unsigned("L_PACKET", 13),
    unsigned("L_MESSAGE", 10),
    unsigned("L_TEXT", 8),
    unsigned("N_ITER", 5),
    unsigned("Q_SCALE", 2),
    unsigned("Q_FLAG", 1, codes=(Codes(0, 0, "value", "off"), Codes(1, 1, "value", "on"))),
    unsigned("Q_UPDOWN", 1),
    unsigned("M_VERSION", 7, coding="version"),
    unsigned("Q_MEDIA", 1),
    unsigned("D_FAR", 15, unit="m", resolution=SCALED),
    unsigned("X_TEXT", 8, coding="latin1"),
    unsigned("T_WAIT", 10, unit="s", resolution="0.1"),
    unsigned("D_SHIFT", 16, coding="signed", unit="m", resolution="1"),
)
HEAD: tuple[Node, ...] = (Field("NID_PACKET"), Field("Q_DIR"), Field("L_PACKET"))
START: tuple[Node, ...] = (Field("NID_MESSAGE"), Field("L_MESSAGE"))


def packet(number: int, *nodes: Node, head: tuple[Node, ...] = HEAD) -> Packet:
    return Packet(number, "to-train", "0.0", f"packet {number}", ("Any",), (*head, *nodes))


def message(number: int, *nodes: Node, **more: Any) -> RadioMessage:
    start = more.pop("start", START)
    return RadioMessage(number, "to-train", "0.0", "message", ("RBC",), (*start, *nodes), **more)


def header(medium: Any, bits: int, *nodes: Node) -> Header:
    start = (Field("Q_UPDOWN"), Field("M_VERSION"), Field("Q_MEDIA"))
    return Header(medium, "0.0", bits, (*start, *nodes))


BASE = Declarations(
    layouts="invented",
    version="9.0",
    issue="invented",
    date="01/01/2031",
    variables=VARIABLES,
    packets=(
        packet(1, Field("Q_SCALE"), Series("steps", (Field("D_FAR"),))),
        packet(2, Field("Q_FLAG"), When(Eq("Q_FLAG", 1), (Field("T_WAIT"),))),
        packet(3, Text("L_TEXT", "X_TEXT")),
        packet(255, head=(Field("NID_PACKET"),)),
    ),
    messages=(
        message(7, required=Required(((1, 2),)), optional=(Optional(3),)),
        message(8, Field("D_SHIFT")),
    ),
    headers=(header("balise", 24, Field("M_VERSION", "M_OTHER"), Field("Q_DIR"), Field("N_X")),),
)
BASE = dataclasses.replace(
    BASE,
    variables=(*VARIABLES, unsigned("N_X", 6)),
)


def with_variable(*changed: Variable) -> Declarations:
    """Put variables in, in place of those of the same name."""
    names = {each.name for each in changed}
    kept = tuple(each for each in BASE.variables if each.name not in names)
    return dataclasses.replace(BASE, variables=kept + changed)


def with_packet(*nodes: Node, **more: Any) -> Declarations:
    return dataclasses.replace(BASE, packets=(*BASE.packets, packet(9, *nodes, **more)))


def with_message(*nodes: Node, **more: Any) -> Declarations:
    return dataclasses.replace(BASE, messages=(*BASE.messages, message(9, *nodes, **more)))


def without(name: str) -> Declarations:
    kept = tuple(each for each in BASE.variables if each.name != name)
    return dataclasses.replace(BASE, variables=kept)


def again(field: str) -> Declarations:
    """Declare the first of a kind twice."""
    entries = getattr(BASE, field)
    twice: dict[str, Any] = {field: (*entries, entries[0])}
    return dataclasses.replace(BASE, **twice)


def with_codes(*codes: Codes, **more: Any) -> Declarations:
    return with_variable(unsigned("Q_SCALE", 2, codes=codes, **more))


FLAG = Field("Q_FLAG")
