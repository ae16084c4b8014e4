"""Rules for data to the track (SUBSET-026 issue 3.6.0, 6.6.3.4.5 and 6.6.4.1.2): literals only."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING

from fishplate.standard.vocabulary import Eq, In, Ne
from fishplate.translation.tables import (
    NATIONAL_SYSTEM,
    PASSIVE_SHUNTING,
    SAFETY_CRITICAL,
    SAFETY_CRITICAL_BACKWARDS,
    STOP_ANSWER,
    STOP_ANSWER_BACKWARDS,
    TABLE_3B,
    TABLE_3D,
    TABLE_5,
    TABLE_13,
    TABLE_13_BACKWARDS,
    TRACK_DELETED,
    TRACK_DELETED_BACKWARDS,
)
from fishplate.translation.vocabulary import (
    Clear,
    Drop,
    Fill,
    Force,
    Insert,
    JoinBits,
    MapCodes,
    Reject,
    RejectWhere,
    Replace,
    Rule,
    SplitBits,
)

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.translation.vocabulary import Subject

UNCHANGED_MESSAGES = (
    129, 130, 136, 137, 138, 146, 149, 150, 153, 154, 155, 156, 157, 159,
)  # fmt: skip
UNKNOWN_AXLES = 1023

POSITION = Rule("unchanged, value mapped", (MapCodes(PASSIVE_SHUNTING),))

X2_TO_X1: Mapping[Subject, Rule] = MappingProxyType(
    {
        ("packet", 0): POSITION,
        ("packet", 1): POSITION,
        ("packet", 2): Rule("translated", (Replace(3, "telephone_numbers"),)),
        ("packet", 4): Rule(
            "unchanged, value mapped",
            (
                RejectWhere(In("M_ERROR", (7, 8)), "X = 1 has no such error"),
                MapCodes(SAFETY_CRITICAL, SAFETY_CRITICAL_BACKWARDS),
            ),
        ),
        ("packet", 5): Rule(
            "not relevant", (Reject("with X = 1 the train data carry the running number"),)
        ),
        ("packet", 9): Rule("unchanged"),
        ("packet", 11): Rule(
            "translated",
            (
                Fill(("NID_OPERATIONAL",)),
                JoinBits(TABLE_3B),
                Force("M_LOADINGGAUGE", 0),
                MapCodes(TABLE_3D, TABLE_5, missing="whole"),
                Drop("N_AXLE", UNKNOWN_AXLES),
                Clear("tractions"),
            ),
        ),
        ("message", 132): Rule("translated", (MapCodes(TRACK_DELETED, TRACK_DELETED_BACKWARDS),)),
        ("message", 147): Rule("translated", (MapCodes(STOP_ANSWER, STOP_ANSWER_BACKWARDS),)),
        **{("message", number): Rule("unchanged") for number in UNCHANGED_MESSAGES},
        ("message", 158): Rule("not relevant", (Reject("X = 1 reports no texts"),)),
    }
)
"""From 2.1 to X = 1."""

X2_TO_X1_IN_3_3_0: Mapping[Subject, Rule] = MappingProxyType(
    {
        ("packet", 3): Rule("unchanged"),
        ("message", 147): Rule(
            "translated",
            (
                MapCodes(STOP_ANSWER, STOP_ANSWER_BACKWARDS, when=Ne("Q_EMERGENCYSTOP", 3)),
                MapCodes(
                    STOP_ANSWER,
                    STOP_ANSWER_BACKWARDS,
                    when=Eq("Q_EMERGENCYSTOP", 3),
                    note="2.0 does not say whether the stop was conditional; of an unconditional "
                    "one X = 1 reports 2",
                    guess=True,
                ),
            ),
        ),
    }
)
"""What issue 3.3.0 says otherwise: from 2.0 to X = 1."""

IN_NATIONAL_SYSTEM = Rule(
    "unchanged, value mapped", (MapCodes(NATIONAL_SYSTEM, when=Eq("M_LEVEL", 1)),)
)

X1_TO_X2: Mapping[Subject, Rule] = MappingProxyType(
    {
        ("packet", 0): IN_NATIONAL_SYSTEM,
        ("packet", 1): IN_NATIONAL_SYSTEM,
        ("packet", 3): Rule("translated", (Replace(2, "versions"),)),
        ("packet", 4): Rule(
            "unchanged, value mapped",
            (
                RejectWhere(Eq("M_ERROR", 6), "X = 2 reports no such failure"),
                MapCodes(SAFETY_CRITICAL_BACKWARDS, SAFETY_CRITICAL),
            ),
        ),
        ("packet", 11): Rule(
            "translated",
            (
                Drop("NID_OPERATIONAL", ""),
                SplitBits(TABLE_3B, otherwise=0),
                Force("M_LOADINGGAUGE", 0),
                MapCodes(TABLE_5, TABLE_3D, missing="whole"),
                Insert("N_AXLE", UNKNOWN_AXLES),
                MapCodes(TABLE_13, TABLE_13_BACKWARDS, ("tractions",), missing="element"),
            ),
        ),
        ("message", 132): Rule("translated", (MapCodes(TRACK_DELETED_BACKWARDS, TRACK_DELETED),)),
        ("message", 147): Rule(
            "translated", (MapCodes(STOP_ANSWER_BACKWARDS, STOP_ANSWER, missing="whole"),)
        ),
    }
)
"""The reverse, to 2.1."""

X1_TO_X2_IN_3_3_0: Mapping[Subject, Rule] = MappingProxyType({("packet", 3): Rule("unchanged")})
"""What is otherwise in the reverse, to 2.0."""

FROM_2_1_TO_2_0: Mapping[Subject, Rule] = MappingProxyType(
    {("packet", 2): Rule("translated", (Replace(3, "telephone_numbers"),), "6.6.4.1.2")}
)
FROM_2_0_TO_2_1: Mapping[Subject, Rule] = MappingProxyType(
    {("packet", 3): Rule("translated", (Replace(2, "versions"),), "6.6.4.1.2")}
)
