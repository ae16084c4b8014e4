"""Rules for data to the train (SUBSET-026 issue 3.6.0, 6.6.3.2.3 and 6.6.3.3.2): literals only."""

from __future__ import annotations

from dataclasses import replace
from types import MappingProxyType
from typing import TYPE_CHECKING

from fishplate.standard.vocabulary import Eq, In, Ne
from fishplate.translation.tables import (
    BRAKING,
    DEFAULTS,
    EMERGENCY_BRAKE,
    FROM_NOW_ON,
    NEW_IN_X2,
    NO_MORE_POSITION,
    NO_MORE_POSITION_BACKWARDS,
    NON_STOPPING,
    NOT_REPLACING,
    TABLE_3,
    TABLE_3_BACKWARDS,
    TABLE_3D,
    TABLE_5,
    TABLE_13,
    TABLE_13_BACKWARDS,
)
from fishplate.translation.vocabulary import (
    AtMost,
    Drop,
    Fill,
    Force,
    IgnoreBeside,
    Insert,
    JoinInto,
    LeaveOut,
    Lowest,
    MapCodes,
    MoveDigits,
    OnlyOn,
    Reject,
    RejectEmpty,
    RejectWhere,
    Rename,
    Renumber,
    Rule,
    SharedWith,
    SplitOff,
)

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.translation.vocabulary import Subject

CATEGORIES = ("steps", "categories")
AREAS = ("areas", "categories")
SUITABILITIES = ("suitabilities",)
UNKNOWN_GROUP = 16777215

UNCHANGED_PACKETS = (
    2, 5, 6, 12, 15, 16, 21, 41, 42, 44, 45, 46, 49, 57, 58, 63, 65, 66, 67, 71, 90, 131, 132, 133,
    134, 135, 136, 137, 138, 139, 141, 145, 254,
)  # fmt: skip
UNCHANGED_MESSAGES = (2, 3, 6, 8, 9, 16, 18, 24, 27, 28, 33, 37, 32, 39, 43, 45)

X1_TO_X2: Mapping[Subject, Rule] = MappingProxyType(
    {
        **{("packet", number): Rule("unchanged") for number in UNCHANGED_PACKETS},
        ("packet", 3): Rule(
            "translated",
            (
                RejectEmpty("countries", "it names no area, and with X = 2 it has to name one"),
                Fill(NEW_IN_X2),
                Fill(BRAKING, beside=203),
            ),
        ),
        ("packet", 27): Rule(
            "unchanged, variables mapped",
            (MapCodes(TABLE_3, TABLE_3_BACKWARDS, CATEGORIES),),
        ),
        ("packet", 39): Rule(
            "translated",
            (
                IgnoreBeside(239),
                MapCodes(TABLE_13, TABLE_13_BACKWARDS, missing="whole", told=True),
            ),
        ),
        ("packet", 51): Rule(
            "translated",
            (
                Insert("D_TRACKINIT", 0, when=Eq("Q_TRACKINIT", 1)),
                MapCodes(TABLE_5, TABLE_3D, AREAS),
            ),
        ),
        ("packet", 68): Rule(
            "unchanged, variables mapped",
            (IgnoreBeside(206), MapCodes(NON_STOPPING, scope=("conditions",))),
        ),
        ("packet", 70): Rule(
            "rejected, with exceptions",
            (
                IgnoreBeside(207),
                LeaveOut(
                    Ne("Q_SUITABILITY", 2),
                    "of X = 1 only the traction system is taken over",
                    ("suitabilities",),
                    "D_SUITABILITY",
                ),
                MapCodes(
                    TABLE_13,
                    TABLE_13_BACKWARDS,
                    ("suitabilities",),
                    missing="element",
                    told=True,
                    distance="D_SUITABILITY",
                ),
            ),
        ),
        ("packet", 72): Rule(
            "unchanged, variables added",
            (
                Insert("Q_CONFTEXTDISPLAY", 0, when=Ne("Q_TEXTCONFIRM", 0)),
                Insert("Q_TEXTREPORT", 0, when=Ne("Q_TEXTCONFIRM", 0)),
            ),
        ),
        ("packet", 76): Rule("rejected", (Reject("X = 1 is not to use it"),)),
        ("packet", 79): Rule(
            "unchanged, value mapped",
            (MapCodes(NO_MORE_POSITION, NO_MORE_POSITION_BACKWARDS, ("positions",)),),
        ),
        ("packet", 80): Rule("translated", (Insert("Q_MAMODE", 1, ("profiles",)),)),
        ("packet", 140): Rule("translated", (MoveDigits("NID_OPERATIONAL"),)),
        ("packet", 200): Rule(
            "translated",
            (
                OnlyOn("balise", "only balises mark what is covered"),
                Renumber(0, first=True),
                Drop("Q_DIR", 2),
            ),
        ),
        ("packet", 203): Rule("translated", (JoinInto(3, alone="6.5.1.7.5"),)),
        ("packet", 206): Rule(
            "translated",
            (Rename("M_TRACKCONDBC", "M_TRACKCOND", ("conditions",)), Renumber(68)),
        ),
        ("packet", 207): Rule("translated", (Renumber(70),)),
        ("packet", 239): Rule("translated", (Renumber(39),)),
        **{("message", number): Rule("unchanged") for number in UNCHANGED_MESSAGES},
        ("message", 15): Rule("translated", (Insert("D_REF", 0),)),
        ("message", 34): Rule("translated", (Insert("D_REF", 0),)),
        ("message", 40): Rule("unchanged, value forced", (Force("NID_LRBG", UNKNOWN_GROUP),)),
        ("message", 41): Rule("unchanged, value forced", (Force("NID_LRBG", UNKNOWN_GROUP),)),
        ("message", 38): Rule("(not in 3.6.0)", (Reject("issue 3.6.0 has it no more"),)),
    }
)
"""From X = 1 to 2.1."""

X1_TO_X2_IN_3_3_0: Mapping[Subject, Rule] = MappingProxyType(
    {
        ("packet", 58): Rule(
            "unchanged",
            (RejectWhere(Eq("M_LOC", 3), "issue 3.3.0 rejects it with M_LOC 3"),),
        ),
        ("packet", 140): Rule("unchanged"),
        ("message", 40): Rule("unchanged"),
        ("message", 41): Rule("unchanged"),
        ("message", 38): Rule("unchanged"),
    }
)
"""What issue 3.3.0 says otherwise: from X = 1 to 2.0."""

SHARED_WITH_1_1: Mapping[Subject, Rule] = MappingProxyType(
    {
        ("packet", number): replace(
            X1_TO_X2["packet", number], does=(*X1_TO_X2["packet", number].does, SharedWith(other))
        )
        for number, other in ((39, 239), (68, 206), (70, 207))
    }
)
"""What 1.1 adds: of these packets it has a newer form, which gets their number."""

SHIFTED = RejectWhere(
    Ne("D_REF", 0), "its distances count from a shifted location, which X = 1 cannot say"
)
NO_TEXT_IN_LS = "its display is bound to limited supervision, which X = 1 has not"

X2_TO_1_0: Mapping[Subject, Rule] = MappingProxyType(
    {
        ("packet", 3): Rule(
            "translated",
            (
                AtMost("countries", 31),
                MapCodes(FROM_NOW_ON),
                *(Drop(name, DEFAULTS[name].value) for name in NEW_IN_X2),
                *(Drop(name, DEFAULTS[name].value) for name in BRAKING if name in DEFAULTS),
                *(Drop(name) for name in BRAKING if name not in DEFAULTS),
            ),
        ),
        ("packet", 27): Rule(
            "unchanged, variables mapped",
            (
                MapCodes(
                    NOT_REPLACING,
                    scope=CATEGORIES,
                    missing="element",
                    when=Eq("Q_DIFF", 2),
                    note="with X = 1 it may replace the speed for the cant deficiency",
                    guess=True,
                ),
                MapCodes(
                    TABLE_3_BACKWARDS,
                    TABLE_3,
                    CATEGORIES,
                    missing="element",
                    when=In("Q_DIFF", (0, 1, 3)),
                ),
                Lowest("NC_DIFF", "V_DIFF", CATEGORIES),
            ),
        ),
        ("packet", 39): Rule(
            "translated", (MapCodes(TABLE_13_BACKWARDS, TABLE_13, missing="whole"),)
        ),
        ("packet", 51): Rule(
            "translated",
            (
                RejectWhere(
                    Ne("D_TRACKINIT", 0),
                    "the initial state begins further on, and with X = 1 it begins at once",
                ),
                Drop("D_TRACKINIT", 0),
                MapCodes(TABLE_3D, TABLE_5, AREAS, missing="element"),
                Lowest("M_AXLELOAD", "V_AXLELOAD", AREAS),
            ),
        ),
        ("packet", 68): Rule(
            "unchanged, variables mapped",
            (
                LeaveOut(
                    In("M_TRACKCOND", (1, 2, 10)),
                    "packet 68 of X = 1 has no such condition",
                    ("conditions",),
                    "D_TRACKCOND",
                ),
            ),
        ),
        ("packet", 70): Rule(
            "rejected, with exceptions",
            (
                LeaveOut(
                    In("Q_SUITABILITY", (0, 3)),
                    "X = 1 has no interoperable loading gauge",
                    SUITABILITIES,
                    "D_SUITABILITY",
                ),
                MapCodes(
                    TABLE_3D,
                    TABLE_5,
                    SUITABILITIES,
                    missing="element",
                    distance="D_SUITABILITY",
                ),
                MapCodes(
                    TABLE_13_BACKWARDS,
                    TABLE_13,
                    ("suitabilities",),
                    missing="element",
                    distance="D_SUITABILITY",
                ),
            ),
        ),
        ("packet", 72): Rule(
            "unchanged, variables added",
            (
                RejectWhere(Eq("M_MODETEXTDISPLAY", 12), NO_TEXT_IN_LS, ("start",)),
                RejectWhere(Eq("M_MODETEXTDISPLAY", 12), NO_TEXT_IN_LS, ("end",)),
                MapCodes(EMERGENCY_BRAKE),
                Drop("Q_CONFTEXTDISPLAY", 0),
                Drop("Q_TEXTREPORT", 0),
                Drop("NID_TEXTMESSAGE"),
                Drop("NID_C"),
                Drop("NID_RBC"),
            ),
        ),
        ("packet", 79): Rule(
            "unchanged, value mapped",
            (MapCodes(NO_MORE_POSITION_BACKWARDS, NO_MORE_POSITION, ("positions",)),),
        ),
        ("packet", 80): Rule(
            "translated",
            (
                LeaveOut(
                    Eq("M_MAMODE", 2),
                    "X = 1 has no limited supervision",
                    ("profiles",),
                    "D_MAMODE",
                ),
                Drop("Q_MAMODE", 1, ("profiles",)),
            ),
        ),
        ("message", 15): Rule("translated", (SHIFTED, Drop("D_REF", 0))),
        ("message", 34): Rule("translated", (SHIFTED, Drop("D_REF", 0))),
    }
)
"""The reverse, to 1.0."""

X2_TO_1_1: Mapping[Subject, Rule] = MappingProxyType(
    {
        **X2_TO_1_0,
        ("packet", 0): Rule("translated", (Insert("Q_DIR", 2), Renumber(200))),
        ("packet", 3): Rule(
            "translated",
            (
                AtMost("countries", 31),
                MapCodes(FROM_NOW_ON),
                SplitOff(203, BRAKING),
                *(Drop(name, DEFAULTS[name].value) for name in NEW_IN_X2),
            ),
        ),
        ("packet", 39): Rule("translated", (Renumber(239),)),
        ("packet", 68): Rule(
            "translated",
            (Rename("M_TRACKCOND", "M_TRACKCONDBC", ("conditions",)), Renumber(206)),
        ),
        ("packet", 70): Rule("translated", (Renumber(207),)),
    }
)
"""The reverse, to 1.1, which has packets of its own for it."""
