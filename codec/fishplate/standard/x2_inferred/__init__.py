"""System versions 2.2 and 2.3, inferred.

Chapter 6 of issue 4.0.0, which says what they share with 2.1, was not read.
They are taken to be version 2.1 plus the packets and messages whose numbers are new in issue
4.0.0. Packets that both versions lay out, each its own way, may come in either form.
"""

from __future__ import annotations

from dataclasses import replace

from fishplate.standard.compose import composed
from fishplate.standard.v3_6_0 import DECLARATIONS as V3_6_0
from fishplate.standard.v4_0_0 import DECLARATIONS as V4_0_0
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN, Evidence, OtherForm, Revision

NEW_PACKETS = (
    (TO_TRAIN, 31),
    (TO_TRAIN, 32),
    (TO_TRAIN, 73),
    (TO_TRAIN, 74),
    (TO_TRACK, 10),
    (TO_TRACK, 12),
)
NEW_MESSAGES = (
    (TO_TRAIN, 4),
    (TO_TRAIN, 5),
    (TO_TRAIN, 7),
    (TO_TRAIN, 38),
    (TO_TRACK, 131),
    (TO_TRACK, 133),
)
TAKEN_VARIABLES = (
    "L_CONSISTFRONTENGINEMAX",
    "L_CONSISTFRONTENGINEMIN",
    "L_CONSISTFRONTENGINENOM",
    "L_CONSISTREARENGINEMAX",
    "L_CONSISTREARENGINEMIN",
    "L_CONSISTREARENGINENOM",
    "M_VERSION",
    "Q_SAFECONSISTLENGTH",
    "V_SM",
)

FORMS = (
    OtherForm(TO_TRAIN, 45, "3.0"),
    OtherForm(TO_TRAIN, 70, "3.0"),
    OtherForm(TO_TRAIN, 73, "3.0", only=True),
    OtherForm(TO_TRAIN, 74, "3.0", only=True),
    OtherForm(TO_TRACK, 0, "3.0"),
    OtherForm(TO_TRACK, 1, "3.0"),
)
"""73 and 74 are read as 3.0 only: their codes of levels and modes are not those of 72 and 76."""

TAKEN = {
    *(("packet", *key) for key in NEW_PACKETS),
    *(("message", *key) for key in NEW_MESSAGES),
    *(("variable", name) for name in TAKEN_VARIABLES),
}
"""What comes from issue 4.0.0, as evidence names it."""

EVIDENCE = (
    Evidence(
        "inferred",
        "layouts of 2.1, with the packets and messages that issue 4.0.0 adds "
        "(chapter 6 of 4.0.0 was not read)",
    ),
    *(each for each in V4_0_0.evidence if each.subject in TAKEN),
    *(
        Evidence("inferred", "new in issue 4.0.0, taken over from a text conversion", (kind, *key))
        for kind, keys in (("packet", NEW_PACKETS), ("message", NEW_MESSAGES))
        for key in keys
    ),
    *(
        Evidence(
            "inferred",
            "as in 2.1 where L_PACKET fits that; 3.0 has another layout",
            ("packet", each.direction, each.number),
        )
        for each in FORMS
        if not each.only
    ),
)

_ISSUE_4 = {(each.direction, each.number): each for each in V4_0_0.messages}

CARRIED_TOO = {
    (each.direction, each.number): {
        "optional": each.optional
        + tuple(
            option
            for option in _ISSUE_4[each.direction, each.number].optional
            if (each.direction, option.packet) in NEW_PACKETS
        )
    }
    for each in V3_6_0.messages
}
"""Optional packets of each message: those of 2.1, then the new ones of 4.0.0."""

DECLARATIONS = replace(
    composed(
        V3_6_0,
        Revision(
            variables=tuple(each for each in V4_0_0.variables if each.name in TAKEN_VARIABLES),
            packets=tuple(
                each for each in V4_0_0.packets if (each.direction, each.number) in NEW_PACKETS
            ),
            messages=tuple(
                each for each in V4_0_0.messages if (each.direction, each.number) in NEW_MESSAGES
            ),
            amended_messages=CARRIED_TOO,
        ),
        layouts="x2_inferred",
        version="2.2",
        issue="4.0.0",
        date="05/07/2023",
        beside=(V4_0_0,),
    ),
    evidence=EVIDENCE,
    forms=FORMS,
)
