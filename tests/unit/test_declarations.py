"""Wrong declarations fail when a registry is built, each with a sentence that names its place.

Each case spoils the invented issue in one way.
"""

from __future__ import annotations

import dataclasses
from typing import TYPE_CHECKING

import pytest

from fishplate.errors import RegistryError
from fishplate.standard.build import build
from fishplate.standard.vocabulary import (
    SCALED,
    Codes,
    Declarations,
    Eq,
    Field,
    Group,
    Header,
    In,
    Ne,
    Opaque,
    Optional,
    Repeat,
    Required,
    Series,
    Text,
    When,
)
from unit.invented import (
    BASE,
    FLAG,
    HEAD,
    again,
    header,
    message,
    packet,
    unsigned,
    with_codes,
    with_message,
    with_packet,
    with_variable,
    without,
)

if TYPE_CHECKING:
    from collections.abc import Callable


P9 = ("to-train packet 9",)

CASES: dict[str, tuple[Callable[[], Declarations], tuple[str, ...], str]] = {
    # variables
    "variable twice": (lambda: again("variables"), (), "variable NID_PACKET is declared twice"),
    "lineage twice": (
        lambda: with_variable(unsigned("V_NEW", 7, lineage="T_WAIT")),
        (),
        "lineage T_WAIT is declared twice",
    ),
    "width zero": (lambda: with_variable(unsigned("T_WAIT", 0)), ("T_WAIT",), "width 0"),
    "width negative": (lambda: with_variable(unsigned("T_WAIT", -3)), ("T_WAIT",), "width -3"),
    "character of 7 bits": (
        lambda: with_variable(unsigned("X_TEXT", 7, coding="latin1")),
        ("X_TEXT",),
        "width mismatch: coding latin1 takes 8 bits, not 7",
    ),
    "group identity of 23 bits": (
        lambda: with_variable(unsigned("NID_X", 23, coding="group-identity")),
        ("NID_X",),
        "width mismatch: coding group-identity takes 24 bits",
    ),
    "version of 8 bits": (
        lambda: with_variable(unsigned("M_VERSION", 8, coding="version")),
        ("M_VERSION",),
        "width mismatch: coding version takes 7 bits",
    ),
    "digits with half a nibble": (
        lambda: with_variable(unsigned("NID_X", 10, coding="digits")),
        ("NID_X",),
        "width mismatch: digits do not fill 10 bits",
    ),
    "scaled but no distance": (
        lambda: with_variable(unsigned("T_WAIT", 10, unit="s", resolution=SCALED)),
        ("T_WAIT",),
        "a scaled variable is in metres",
    ),
    "resolution is no number": (
        lambda: with_variable(unsigned("T_WAIT", 10, unit="s", resolution="a tenth")),
        ("T_WAIT",),
        "resolution 'a tenth' is not a decimal number",
    ),
    "resolution zero": (
        lambda: with_variable(unsigned("T_WAIT", 10, unit="s", resolution="0")),
        ("T_WAIT",),
        "resolution 0 is not positive",
    ),
    "resolution negative": (
        lambda: with_variable(unsigned("T_WAIT", 10, unit="s", resolution="-5")),
        ("T_WAIT",),
        "resolution -5 is not positive",
    ),
    "resolution infinite": (
        lambda: with_variable(unsigned("T_WAIT", 10, unit="s", resolution="Infinity")),
        ("T_WAIT",),
        "resolution",
    ),
    "resolution not a number": (
        lambda: with_variable(unsigned("T_WAIT", 10, unit="s", resolution="NaN")),
        ("T_WAIT",),
        "resolution",
    ),
    "unit unknown to meaning": (
        lambda: with_variable(unsigned("T_WAIT", 10, unit="furlong", resolution="1")),
        ("T_WAIT",),
        "unit",
    ),
    "code outside the width": (
        lambda: with_codes(Codes(4, 4, "value", "four")),
        ("Q_SCALE",),
        "width mismatch: codes 4 to 4 (four) do not fit 2 bits",
    ),
    "code below zero": (
        lambda: with_codes(Codes(-1, -1, "special", "none")),
        ("Q_SCALE",),
        "codes -1 to -1 (none) do not fit 2 bits",
    ),
    "signed code outside the width": (
        lambda: with_variable(
            unsigned("D_SHIFT", 16, coding="signed", codes=(Codes(32768, 32768, "spare", "x"),))
        ),
        ("D_SHIFT",),
        "codes 32768 to 32768 (x) do not fit 16 bits",
    ),
    "codes the wrong way round": (
        lambda: with_codes(Codes(2, 1, "spare", "spare")),
        ("Q_SCALE",),
        "codes 2 to 1",
    ),
    "plain numbers outside the width": (
        lambda: with_codes(plain=(0, 4)),
        ("Q_SCALE",),
        "codes 0 to 4 (plain numbers) do not fit 2 bits",
    ),
    "code twice": (
        lambda: with_codes(Codes(1, 1, "value", "one"), Codes(1, 1, "special", "ace")),
        ("Q_SCALE",),
        "code 1 is declared twice",
    ),
    "code inside a range of spares": (
        lambda: with_codes(Codes(1, 3, "spare", "spare"), Codes(2, 2, "value", "two")),
        ("Q_SCALE",),
        "code 2 is declared twice",
    ),
    # packets, messages and headers as a whole
    "packet twice": (lambda: again("packets"), (), "packet ('to-train', 1) is declared twice"),
    "message twice": (lambda: again("messages"), (), "message ('to-train', 7) is declared twice"),
    "header twice": (lambda: again("headers"), (), "header balise is declared twice"),
    "no N_ITER": (lambda: without("N_ITER"), (), "no variable N_ITER"),
    "packet number too large": (
        lambda: dataclasses.replace(BASE, packets=(*BASE.packets, packet(256, FLAG))),
        ("to-train packet 256",),
        "width mismatch: the number does not fit NID_PACKET",
    ),
    "message number too large": (
        lambda: dataclasses.replace(BASE, messages=(*BASE.messages, message(256))),
        ("to-train message 256",),
        "width mismatch: the number does not fit NID_MESSAGE",
    ),
    "packet without a head": (
        lambda: with_packet(FLAG, head=()),
        P9,
        "a packet begins with NID_PACKET, [Q_DIR,] L_PACKET",
    ),
    "packet with its head in another order": (
        lambda: with_packet(head=(Field("Q_DIR"), Field("NID_PACKET"), Field("L_PACKET"))),
        P9,
        "a packet begins with",
    ),
    "packet with L_PACKET too late": (
        lambda: with_packet(head=(Field("NID_PACKET"), Field("Q_FLAG"), Field("L_PACKET"))),
        P9,
        "a packet begins with",
    ),
    "packet without L_PACKET and of no fixed width": (
        lambda: with_packet(FLAG, When(Eq("Q_FLAG", 1), (Field("T_WAIT"),)), head=HEAD[:1]),
        P9,
        "L_PACKET",
    ),
    "message without a head": (
        lambda: with_message(FLAG, start=()),
        ("to-train message 9",),
        "a message begins with NID_MESSAGE, L_MESSAGE",
    ),
    "message with a list among its fixed variables": (
        lambda: with_message(Repeat("steps", (FLAG,))),
        ("to-train message 9",),
        "only fixed variables may stand here",
    ),
    "message that requires a packet nobody declared": (
        lambda: with_message(required=Required(((1,), (77,)))),
        ("to-train message 9",),
        "carries packet 77, which is not declared",
    ),
    "message with an optional packet nobody declared": (
        lambda: with_message(optional=(Optional(78),)),
        ("to-train message 9",),
        "carries packet 78, which is not declared",
    ),
    "optional packet twice": (
        lambda: with_message(optional=(Optional(1), Optional(1))),
        ("to-train message 9",),
        "optional packet (1, '') is declared twice",
    ),
    "header with wrong bits": (
        lambda: dataclasses.replace(BASE, headers=(header("loop", 25, Field("T_WAIT")),)),
        ("loop header",),
        "width mismatch: fields take 19 bits, 25 are declared",
    ),
    "header without its start": (
        lambda: dataclasses.replace(BASE, headers=(Header("loop", "0.0", 1, (FLAG,)),)),
        ("loop header",),
        "a header begins with Q_UPDOWN, M_VERSION, Q_MEDIA",
    ),
    "header with a condition": (
        lambda: dataclasses.replace(
            BASE, headers=(header("loop", 10, FLAG, When(Eq("Q_FLAG", 1), (Field("T_WAIT"),))),)
        ),
        ("loop header",),
        "only fixed variables may stand here",
    ),
    # layouts
    "unknown variable": (lambda: with_packet(Field("T_WAlT")), P9, "unknown variable T_WAlT"),
    "unknown variable inside a set": (
        lambda: with_packet(Series("steps", (Field("V_NONE"),))),
        (*P9, "steps"),
        "unknown variable V_NONE",
    ),
    "unknown variable in a condition": (
        lambda: with_packet(When(Eq("Q_NONE", 1), (FLAG,))),
        P9,
        "unknown variable Q_NONE",
    ),
    "unknown text variable": (
        lambda: with_packet(Text("L_TEXT", "X_NONE")),
        P9,
        "unknown variable X_NONE",
    ),
    "unknown text length": (
        lambda: with_packet(Text("L_NONE", "X_TEXT")),
        P9,
        "unknown variable L_NONE",
    ),
    "text of numbers": (
        lambda: with_packet(Text("L_TEXT", "T_WAIT")),
        P9,
        "T_WAIT is not a text character",
    ),
    "condition on a variable read later": (
        lambda: with_packet(When(Eq("Q_FLAG", 1), (Field("T_WAIT"),)), FLAG),
        P9,
        "condition on Q_FLAG, which is not yet read",
    ),
    "condition on a variable of an inner scope": (
        lambda: with_packet(Group("start", (FLAG,)), When(Ne("Q_FLAG", 0), (Field("T_WAIT"),))),
        P9,
        "condition on Q_FLAG, which is not yet read",
    ),
    "condition on a variable of the element of a list": (
        lambda: with_packet(Repeat("steps", (FLAG,)), When(Eq("Q_FLAG", 1), (Field("T_WAIT"),))),
        P9,
        "condition on Q_FLAG, which is not yet read",
    ),
    "condition on a variable that may be absent": (
        lambda: with_packet(
            FLAG,
            When(Eq("Q_FLAG", 1), (Field("T_WAIT"),)),
            When(Eq("T_WAIT", 3), (Field("D_SHIFT"),)),
        ),
        P9,
        "T_WAIT",
    ),
    "condition never true": (
        lambda: with_packet(FLAG, When(Eq("Q_FLAG", 2), (Field("T_WAIT"),))),
        P9,
        "width mismatch: Q_FLAG of 1 bits is never 2",
    ),
    "condition always true": (
        lambda: with_packet(FLAG, When(Ne("Q_FLAG", 5), (Field("T_WAIT"),))),
        P9,
        "width mismatch: Q_FLAG of 1 bits is never 5",
    ),
    "condition with one impossible code": (
        lambda: with_packet(Field("Q_SCALE"), When(In("Q_SCALE", (1, 9)), (FLAG,))),
        P9,
        "width mismatch: Q_SCALE of 2 bits is never 9",
    ),
    "condition of no codes": (
        lambda: with_packet(FLAG, When(In("Q_FLAG", ()), (Field("T_WAIT"),))),
        P9,
        "no code",
    ),
    "condition without fields": (
        lambda: with_packet(FLAG, When(Eq("Q_FLAG", 1), ())),
        P9,
        "no field in it",
    ),
    "key twice": (lambda: with_packet(FLAG, FLAG), P9, "key Q_FLAG stands twice in one scope"),
    "key twice across a condition": (
        lambda: with_packet(FLAG, Field("T_WAIT"), When(Eq("Q_FLAG", 1), (Field("T_WAIT"),))),
        P9,
        "key T_WAIT stands twice in one scope",
    ),
    "set named like a field": (
        lambda: with_packet(FLAG, Repeat("Q_FLAG", (Field("T_WAIT"),))),
        P9,
        "key Q_FLAG stands twice in one scope",
    ),
    "key of a key": (
        lambda: with_packet(FLAG, Field("T_WAIT", key="Q_FLAG")),
        P9,
        "key Q_FLAG stands twice in one scope",
    ),
    "reserved key": (
        lambda: with_packet(Field("T_WAIT", key="surplus")),
        P9,
        "key surplus is reserved",
    ),
    "reserved name of a set": (
        lambda: with_packet(Repeat("packets", (FLAG,))),
        P9,
        "key packets is reserved",
    ),
    "reserved name of opaque bits": (
        lambda: with_packet(Opaque("content")),
        P9,
        "key content is reserved",
    ),
    "reserved name of a group": (
        lambda: with_packet(Group("form", (FLAG,))),
        P9,
        "key form is reserved",
    ),
    "empty set": (lambda: with_packet(Repeat("steps", ())), (*P9, "steps"), "no field in it"),
    "set that begins with a condition": (  # no layout of the standard does
        lambda: with_packet(FLAG, Repeat("steps", (When(Eq("Q_FLAG", 1), (Field("T_WAIT"),)),))),
        (*P9, "steps"),
        "begin",
    ),
    "empty group": (lambda: with_packet(Group("start", ())), (*P9, "start"), "no field in it"),
    "empty message": (lambda: with_message(start=()), ("to-train message 9",), "no field in it"),
    "opaque not last": (lambda: with_packet(Opaque("data"), FLAG), P9, "data is not the last"),
    "opaque in a list": (
        lambda: with_packet(Repeat("steps", (Opaque("data"),))),
        (*P9, "steps"),
        "data is not the last",
    ),
    "opaque in a condition that is not last": (
        lambda: with_packet(FLAG, When(Eq("Q_FLAG", 1), (Opaque("data"),)), Field("T_WAIT")),
        P9,
        "data is not the last",
    ),
    "scaled without Q_SCALE": (
        lambda: with_packet(Field("D_FAR")),
        P9,
        "D_FAR is scaled, but no Q_SCALE is read",
    ),
    "scaled before Q_SCALE": (
        lambda: with_packet(Field("D_FAR"), Field("Q_SCALE")),
        P9,
        "D_FAR is scaled, but no Q_SCALE is read",
    ),
    "N_ITER as a field": (
        lambda: with_packet(Field("N_ITER")),
        P9,
        "N_ITER cannot stand as a field",
    ),
    "text character as a field": (
        lambda: with_packet(Field("X_TEXT")),
        P9,
        "X_TEXT cannot stand as a field",
    ),
}


@pytest.mark.parametrize("case", CASES)
def test_a_wrong_declaration_names_its_place(case: str) -> None:
    spoiled, path, reason = CASES[case]
    with pytest.raises(RegistryError) as caught:
        build(spoiled())
    assert caught.value.path == path
    assert reason in caught.value.reason
    assert "\n" not in str(caught.value)
