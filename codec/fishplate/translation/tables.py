"""Tables of codes of chapter 6 (SUBSET-026 issue 3.6.0, 6.6.3), and defaults: literals only.

Tables 3, 5 and 13 are those of data to the train (6.6.3.2.3), 3b and 3d those of train data
(6.6.3.4.5). The other tables are rules of one or two codes, named for their variable.
"""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING

from fishplate.translation.vocabulary import BitTable, CodeTable, Default, Row, reverse

if TYPE_CHECKING:
    from collections.abc import Mapping


TABLE_3 = CodeTable(
    "3",
    (
        Row((("NC_DIFF", 0, 0),), (("Q_DIFF", 0), ("NC_CDDIFF", 9))),
        Row((("NC_DIFF", 1, 1),), (("Q_DIFF", 0), ("NC_CDDIFF", 0))),
        Row((("NC_DIFF", 2, 2),), (("Q_DIFF", 0), ("NC_CDDIFF", 1))),
        Row((("NC_DIFF", 3, 3),), (("Q_DIFF", 0), ("NC_CDDIFF", 2))),
        Row((("NC_DIFF", 4, 4),), (("Q_DIFF", 0), ("NC_CDDIFF", 3))),
        Row((("NC_DIFF", 5, 5),), (("Q_DIFF", 0), ("NC_CDDIFF", 4))),
        Row((("NC_DIFF", 6, 6),), (("Q_DIFF", 0), ("NC_CDDIFF", 5))),
        Row((("NC_DIFF", 7, 7),), (("Q_DIFF", 0), ("NC_CDDIFF", 7))),
        Row((("NC_DIFF", 8, 8),), (("Q_DIFF", 0), ("NC_CDDIFF", 10))),
        Row((("NC_DIFF", 9, 9),), (("Q_DIFF", 1), ("NC_DIFF", 0))),
        Row((("NC_DIFF", 10, 10),), (("Q_DIFF", 1), ("NC_DIFF", 1))),
        Row((("NC_DIFF", 11, 11),), (("Q_DIFF", 1), ("NC_DIFF", 2))),
        Row((("NC_DIFF", 12, 12),), (("Q_DIFF", 0), ("NC_CDDIFF", 8))),
        Row((("NC_DIFF", 13, 13),), (("Q_DIFF", 0), ("NC_CDDIFF", 6))),
    ),
)

TABLE_5 = CodeTable(
    "5",
    (
        Row((("M_AXLELOAD", 0, 32),), (("M_AXLELOADCAT", 0),)),
        Row((("M_AXLELOAD", 33, 34),), (("M_AXLELOADCAT", 1),)),
        Row((("M_AXLELOAD", 35, 36),), (("M_AXLELOADCAT", 2),)),
        Row((("M_AXLELOAD", 37, 40),), (("M_AXLELOADCAT", 4),)),
        Row((("M_AXLELOAD", 41, 45),), (("M_AXLELOADCAT", 7),)),
        Row((("M_AXLELOAD", 46, 80),), (("M_AXLELOADCAT", 11),)),
        Row((("M_AXLELOAD", 126, 126),), (("M_AXLELOADCAT", 11),)),
    ),
)

TABLE_13 = CodeTable(
    "13",
    (
        Row((("M_TRACTION", 0, 0),), (("M_VOLTAGE", 0),)),
        Row((("M_TRACTION", 1, 1),), (("M_VOLTAGE", 3), ("NID_CTRACTION", 10))),
        Row((("M_TRACTION", 2, 2),), (("M_VOLTAGE", 1), ("NID_CTRACTION", 12))),
        Row((("M_TRACTION", 3, 3),), (("M_VOLTAGE", 1), ("NID_CTRACTION", 13))),
        Row((("M_TRACTION", 5, 5),), (("M_VOLTAGE", 4), ("NID_CTRACTION", 14))),
        Row((("M_TRACTION", 6, 6),), (("M_VOLTAGE", 4), ("NID_CTRACTION", 1))),
        Row((("M_TRACTION", 7, 7),), (("M_VOLTAGE", 1), ("NID_CTRACTION", 2))),
        Row((("M_TRACTION", 8, 8),), (("M_VOLTAGE", 1), ("NID_CTRACTION", 3))),
        Row((("M_TRACTION", 11, 11),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 19))),
        Row((("M_TRACTION", 12, 12),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 20))),
        Row((("M_TRACTION", 13, 13),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 21))),
        Row((("M_TRACTION", 15, 15),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 22))),
        Row((("M_TRACTION", 26, 26),), (("M_VOLTAGE", 1), ("NID_CTRACTION", 11))),
        Row((("M_TRACTION", 31, 31),), (("M_VOLTAGE", 1), ("NID_CTRACTION", 18))),
        Row((("M_TRACTION", 32, 32),), (("M_VOLTAGE", 3), ("NID_CTRACTION", 15))),
        Row((("M_TRACTION", 33, 33),), (("M_VOLTAGE", 3), ("NID_CTRACTION", 16))),
        Row((("M_TRACTION", 34, 34),), (("M_VOLTAGE", 1), ("NID_CTRACTION", 17))),
        Row((("M_TRACTION", 41, 41),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 4))),
        Row((("M_TRACTION", 42, 42),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 5))),
        Row((("M_TRACTION", 43, 43),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 6))),
        Row((("M_TRACTION", 44, 44),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 7))),
        Row((("M_TRACTION", 45, 45),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 8))),
        Row((("M_TRACTION", 46, 46),), (("M_VOLTAGE", 2), ("NID_CTRACTION", 9))),
    ),
)

TABLE_3D = CodeTable(
    "3d",
    (
        Row((("M_AXLELOADCAT", 0, 0),), (("M_AXLELOAD", 32),)),
        Row((("M_AXLELOADCAT", 1, 1),), (("M_AXLELOAD", 34),)),
        Row((("M_AXLELOADCAT", 2, 2),), (("M_AXLELOAD", 36),)),
        Row((("M_AXLELOADCAT", 3, 3),), (("M_AXLELOAD", 36),)),
        Row((("M_AXLELOADCAT", 4, 4),), (("M_AXLELOAD", 40),)),
        Row((("M_AXLELOADCAT", 5, 5),), (("M_AXLELOAD", 40),)),
        Row((("M_AXLELOADCAT", 6, 6),), (("M_AXLELOAD", 40),)),
        Row((("M_AXLELOADCAT", 7, 7),), (("M_AXLELOAD", 45),)),
        Row((("M_AXLELOADCAT", 8, 8),), (("M_AXLELOAD", 45),)),
        Row((("M_AXLELOADCAT", 9, 9),), (("M_AXLELOAD", 45),)),
        Row((("M_AXLELOADCAT", 10, 10),), (("M_AXLELOAD", 45),)),
        Row((("M_AXLELOADCAT", 11, 11),), (("M_AXLELOAD", 50),)),
        Row((("M_AXLELOADCAT", 12, 12),), (("M_AXLELOAD", 50),)),
    ),
)

TABLE_3B = BitTable(
    "3b",
    "NC_CDTRAIN",
    "NC_TRAIN",
    (
        (0, 2),
        (1, 4),
        (2, 8),
        (3, 16),
        (4, 32),
        (5, 64),
        (6, 8192),
        (7, 128),
        (8, 4096),
        (9, 1),
        (10, 256),
    ),
    (
        (1, 512),
        (2, 1024),
        (4, 2048),
    ),
)

TABLE_3_BACKWARDS = reverse(TABLE_3)
NOT_REPLACING = CodeTable(
    "3, backwards, Q_DIFF 2",
    # X = 1 cannot say that a category does not replace the cant deficiency profile.
    (
        Row((("Q_DIFF", 2, 2), ("NC_DIFF", 0, 0)), (("NC_DIFF", 9),)),
        Row((("Q_DIFF", 2, 2), ("NC_DIFF", 1, 1)), (("NC_DIFF", 10),)),
        Row((("Q_DIFF", 2, 2), ("NC_DIFF", 2, 2)), (("NC_DIFF", 11),)),
    ),
)
TABLE_13_BACKWARDS = reverse(TABLE_13)

NO_MORE_POSITION = CodeTable(
    "M_POSITION", (Row((("M_POSITION", 1048575, 1048575),), (("M_POSITION", 16777215),)),)
)
NO_MORE_POSITION_BACKWARDS = CodeTable(
    "M_POSITION, backwards",
    # A position that 20 bits cannot hold ends the calculation too: counting on would be wrong.
    (Row((("M_POSITION", 1048575, 16777215),), (("M_POSITION", 1048575),)),),
)
FROM_NOW_ON = CodeTable(
    "D_VALIDNV, backwards",
    # X = 1 has no code for it: there 32767 is a distance, and 0 the place of reading.
    (Row((("D_VALIDNV", 32767, 32767),), (("D_VALIDNV", 0),)),),
)
NON_STOPPING = CodeTable("M_TRACKCOND", (Row((("M_TRACKCOND", 1, 2),), (("M_TRACKCOND", 0),)),))
PASSIVE_SHUNTING = CodeTable("M_MODE", (Row((("M_MODE", 15, 15),), (("M_MODE", 3),)),))
NATIONAL_SYSTEM = CodeTable("M_MODE, backwards", (Row((("M_MODE", 12, 12),), (("M_MODE", 13),)),))
SAFETY_CRITICAL = CodeTable("M_ERROR", (Row((("M_ERROR", 6, 6),), (("M_ERROR", 7),)),))
SAFETY_CRITICAL_BACKWARDS = reverse(SAFETY_CRITICAL)
EMERGENCY_BRAKE = CodeTable(
    "Q_TEXTCONFIRM, backwards", (Row((("Q_TEXTCONFIRM", 3, 3),), (("Q_TEXTCONFIRM", 2),)),)
)
TRACK_DELETED = CodeTable(
    "Q_TRACKDEL",
    (
        Row((("Q_MARQSTREASON", 0, 7),), (("Q_TRACKDEL", 0),)),
        Row((("Q_MARQSTREASON", 8, 15),), (("Q_TRACKDEL", 1),)),
        Row((("Q_MARQSTREASON", 16, 23),), (("Q_TRACKDEL", 0),)),
        Row((("Q_MARQSTREASON", 24, 31),), (("Q_TRACKDEL", 1),)),
    ),
)
TRACK_DELETED_BACKWARDS = CodeTable(
    "Q_TRACKDEL, backwards",
    (
        Row((("Q_TRACKDEL", 0, 0),), (("Q_MARQSTREASON", 0),)),
        Row((("Q_TRACKDEL", 1, 1),), (("Q_MARQSTREASON", 8),)),
    ),
)
STOP_ANSWER = CodeTable(
    "Q_EMERGENCYSTOP",
    (
        Row((("Q_EMERGENCYSTOP", 0, 0),), (("Q_EMERGENCYSTOP", 0),)),
        Row((("Q_EMERGENCYSTOP", 1, 1),), (("Q_EMERGENCYSTOP", 0),)),
        Row((("Q_EMERGENCYSTOP", 2, 2),), (("Q_EMERGENCYSTOP", 2),)),
        Row((("Q_EMERGENCYSTOP", 3, 3),), (("Q_EMERGENCYSTOP", 1),)),
    ),
)
STOP_ANSWER_BACKWARDS = CodeTable(
    "Q_EMERGENCYSTOP, backwards",
    (
        Row((("Q_EMERGENCYSTOP", 0, 0),), (("Q_EMERGENCYSTOP", 0),)),
        Row((("Q_EMERGENCYSTOP", 1, 1),), (("Q_EMERGENCYSTOP", 3),)),
        Row((("Q_EMERGENCYSTOP", 2, 2),), (("Q_EMERGENCYSTOP", 2),)),
    ),
)

NEW_IN_X2: tuple[str, ...] = ("V_NVLIMSUPERV", "Q_NVLOCACC")
"""National values that packet 3 of X = 1 and packet 203 have not."""

BRAKING: tuple[str, ...] = (
    "Q_NVGUIPERM",
    "Q_NVSBFBPERM",
    "Q_NVINHSMICPERM",
    "A_NVMAXREDADH1",
    "A_NVMAXREDADH2",
    "A_NVMAXREDADH3",
    "M_NVAVADH",
    "M_NVEBCL",
    "Q_NVKINT",
    "kv_sets",
    "length_steps",
    "M_NVKTINT",
)
"""What packet 203 says."""

DEFAULTS: Mapping[str, Default] = MappingProxyType(
    {
        "V_NVLIMSUPERV": Default(20, "A.3.2"),
        "Q_NVLOCACC": Default(12, "A.3.2"),
        "Q_NVGUIPERM": Default(0, "A.3.2", stated=False),
        "Q_NVSBFBPERM": Default(0, "A.3.2", stated=False),
        "Q_NVINHSMICPERM": Default(0, "A.3.2", stated=False),
        "A_NVMAXREDADH1": Default(20, "A.3.2", stated=False),
        "A_NVMAXREDADH2": Default(14, "A.3.2", stated=False),
        "A_NVMAXREDADH3": Default(14, "A.3.2", stated=False),
        "M_NVAVADH": Default(0, "A.3.2", stated=False),
        "M_NVEBCL": Default(9, "A.3.2", stated=False),
        "Q_NVKINT": Default(
            0, "A.3.2", stated=False, note="A.3.2 has factors, and no steps to say them in"
        ),
        "NID_OPERATIONAL": Default("", "6.5.1.5.34.2", stated=False),
        "telephone_numbers": Default([], "6.5.1.5.25.1", stated=False),
    }
)
"""Default national values (100 km/h, 12 m, 1.0 and 0.7 m/s2, 99.9999999 %), and what a train
that has stored neither running number nor telephone numbers sends: unknown, and none. Of those of
packet 3, 6.6.3.2.3 [1a] has the first two taken; the others keep what is stored ([2])."""

SPARE_DIGITS: Mapping[str, frozenset[str]] = MappingProxyType(
    {"NID_OPERATIONAL": frozenset("ABCDE")}
)
"""Digits without meaning (7.5.1.92); in telephone numbers they are merely not used (7.5.1.95)."""

SAME_IN_OTHER_WORDS: frozenset[frozenset[str]] = frozenset(
    map(
        frozenset,
        (
            ("unknown", "distance not known"),
            ("unknown", "length not known"),
            ("safety critical failure", "safety critical fault"),
            ("reverse", "passed in reverse direction"),
            ("nominal", "passed in nominal direction"),
            ("display until confirmed", "required"),
            (
                "service brake if unconfirmed at the end condition",
                "required, else service brake at the end condition",
            ),
            ("profile start is the EOA, SvL kept from the MA", "SvL derived from the MA"),
            ("profile start is both EOA and SvL", "start of the mode profile is the SvL"),
            (
                "conditional stop accepted, EOA updated",
                "conditional stop accepted, EOA/LOA updated",
            ),
            (
                "conditional stop accepted, EOA not updated",
                "conditional stop accepted, EOA/LOA not updated",
            ),
            # What a rule leaves as it is although one side says it more exactly.
            ("non stopping area, tunnel", "non stopping area"),
            (
                "national system if level NTC reported, else limited supervision",
                "limited supervision",
            ),
        ),
    )
)
"""Labels of one code in two issues that mean the same."""
