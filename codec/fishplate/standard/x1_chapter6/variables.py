"""Variables of versions with X = 1 that chapter 6 lays out its own way: literals only.

SUBSET-026 issue 3.6.0, clauses 6.5.1.5 and 6.5.1.6; what stands here comes before chapters 7 and 8.
"""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.v3_6_0.variables import TRACK_CONDITIONS
from fishplate.standard.vocabulary import Codes, Variable

if TYPE_CHECKING:
    from collections.abc import Mapping

RENAMED: Mapping[str, str] = MappingProxyType({"Q_NVSBTSMPERM": "Q_NVSRBKTRG"})
"""Names in issue 3.6.0 and those of this issue."""

VARIABLES: tuple[Variable, ...] = (
    Variable(
        "M_AXLELOAD",
        "6.5.1.5.27",
        7,
        "unsigned",
        "axle load",
        unit="t",
        resolution="0.5",
        plain=(0, 80),
        codes=(
            Codes(0, 80, "range", "0.5 t steps"),
            Codes(81, 125, "spare", "spare"),
            Codes(126, 126, "special", "above 40 t"),
            Codes(127, 127, "spare", "spare"),
        ),
    ),
    Variable(
        "M_TRACKCONDBC",
        "6.5.1.5.32",
        4,
        "unsigned",
        "track condition type",
        codes=TRACK_CONDITIONS,
    ),
    Variable(
        "M_TRACTION",
        "6.5.1.5.33",
        8,
        "unsigned",
        "traction system type",
        codes=(
            Codes(0, 0, "value", "line not fitted with a traction system"),
            Codes(1, 1, "value", "DC 3 kV, Italy"),
            Codes(2, 2, "value", "AC 25 kV 50 Hz, France conventional"),
            Codes(3, 3, "value", "AC 25 kV 50 Hz, France high speed"),
            Codes(4, 4, "value", "valid but not interoperable"),
            Codes(5, 5, "value", "DC 1.5 kV, France"),
            Codes(6, 6, "value", "DC 1.5 kV, Netherlands"),
            Codes(7, 7, "value", "AC 25 kV 50 Hz, Netherlands conventional"),
            Codes(8, 8, "value", "AC 25 kV 50 Hz, Netherlands high speed"),
            Codes(9, 10, "value", "valid but not interoperable"),
            Codes(11, 11, "value", "AC 15 kV 16.7 Hz 600 A, Germany"),
            Codes(12, 12, "value", "AC 15 kV 16.7 Hz 780 A, Germany"),
            Codes(13, 13, "value", "AC 15 kV 16.7 Hz 900 A, Germany"),
            Codes(14, 14, "value", "valid but not interoperable"),
            Codes(15, 15, "value", "AC 15 kV 16.7 Hz 1500 A, Germany"),
            Codes(16, 25, "value", "valid but not interoperable"),
            Codes(26, 26, "value", "AC 25 kV 50 Hz, Italy"),
            Codes(27, 30, "value", "valid but not interoperable"),
            Codes(31, 31, "value", "AC 25 kV 50 Hz pantograph 1600, Spain high speed"),
            Codes(32, 32, "value", "DC 3 kV, Spain conventional 220 km/h"),
            Codes(33, 33, "value", "DC 3 kV, Spain conventional 160 km/h"),
            Codes(34, 34, "value", "AC 25 kV 50 Hz pantograph 1600/1950, Spain high speed"),
            Codes(35, 40, "value", "valid but not interoperable"),
            Codes(41, 41, "value", "AC 15 kV 16.7 Hz pantograph 1320/1450, Switzerland"),
            Codes(42, 42, "value", "AC 15 kV 16.7 Hz pantograph 1450/1600, Switzerland"),
            Codes(43, 43, "value", "AC 15 kV 16.7 Hz pantograph 1950, Switzerland"),
            Codes(44, 44, "value", "AC 15 kV 16.7 Hz pantograph 1320/1450/1600, Switzerland"),
            Codes(45, 45, "value", "AC 15 kV 16.7 Hz pantograph 1450/1600/1950, Switzerland"),
            Codes(46, 46, "value", "AC 15 kV 16.7 Hz pantograph 1320/1450/1600/1950, Switzerland"),
            Codes(47, 255, "value", "valid but not interoperable"),
        ),
    ),
    Variable(
        "Q_TRACKDEL",
        "6.5.1.5.35.1",
        1,
        "unsigned",
        "track description deleted",
        codes=(
            Codes(0, 0, "value", "no track description deleted"),
            Codes(1, 1, "value", "track description deleted"),
        ),
    ),
)

AMENDED: Mapping[str, Mapping[str, Any]] = MappingProxyType(
    {
        "D_VALIDNV": {"clause": "6.5.1.5.26", "plain": (0, 32767)},
        "M_ERROR": {"clause": "6.5.1.5.27.1"},
        "M_LOADINGGAUGE": {"clause": "6.5.1.5.27.2"},
        "M_MAMODE": {"clause": "6.5.1.5.28"},
        "M_MODE": {"clause": "6.5.1.5.28.1"},
        "M_MODETEXTDISPLAY": {"clause": "6.5.1.5.29"},
        "M_POSITION": {
            "clause": "6.5.1.5.30",
            "bits": 20,
            "plain": (0, 1048574),
            "codes": (
                Codes(0, 1048574, "range", "1 m steps"),
                Codes(
                    1048575, 1048575, "special", "no more position calculation after this reference"
                ),
            ),
        },
        "M_TRACKCOND": {"clause": "6.5.1.5.31"},
        "NC_DIFF": {"clause": "6.5.1.5.34"},
        "NC_TRAIN": {"clause": "6.5.1.5.34.1"},
        "NID_OPERATIONAL": {"clause": "6.5.1.5.34.2"},
        "Q_EMERGENCYSTOP": {"clause": "6.5.1.5.34.3"},
        "Q_TEXTCONFIRM": {"clause": "6.5.1.5.35"},
    }
)

RECODED: Mapping[str, tuple[Codes, ...]] = MappingProxyType(
    {
        "D_VALIDNV": (Codes(0, 32767, "range", 'distance by Q_SCALE, no "now" value'),),
        "M_ERROR": (
            Codes(6, 6, "value", "non safety critical failure"),
            Codes(7, 7, "value", "safety critical failure"),
            Codes(8, 255, "spare", "spare"),
        ),
        "M_LOADINGGAUGE": (
            Codes(0, 0, "value", "no gauge defined for the train"),
            Codes(1, 255, "value", "valid but not interoperable"),
        ),
        "M_MAMODE": (Codes(2, 3, "spare", "spare"),),
        "M_MODE": (
            Codes(
                12, 12, "value", "national system if level NTC reported, else limited supervision"
            ),
            Codes(15, 15, "spare", "spare"),
        ),
        "M_MODETEXTDISPLAY": (Codes(9, 13, "spare", "spare"),),
        "M_TRACKCOND": (
            Codes(0, 0, "value", "non stopping area, tunnel"),
            Codes(1, 1, "value", "non stopping area, bridge"),
            Codes(2, 2, "value", "non stopping area, other reason"),
            Codes(10, 15, "spare", "spare"),
        ),
        "NC_DIFF": (
            Codes(0, 0, "value", "cant deficiency 275 mm"),
            Codes(1, 1, "value", "80 mm"),
            Codes(2, 2, "value", "100 mm"),
            Codes(3, 3, "value", "130 mm"),
            Codes(4, 4, "value", "150 mm"),
            Codes(5, 5, "value", "165 mm"),
            Codes(6, 6, "value", "180 mm"),
            Codes(7, 7, "value", "225 mm"),
            Codes(8, 8, "value", "300 mm"),
            Codes(9, 9, "value", "freight train braked in P"),
            Codes(10, 10, "value", "freight train braked in G"),
            Codes(11, 11, "value", "passenger train"),
            Codes(12, 12, "value", "cant deficiency 245 mm"),
            Codes(13, 13, "value", "cant deficiency 210 mm"),
            Codes(14, 15, "spare", "spare"),
        ),
        "NC_TRAIN": (
            Codes(1, 1, "bit", "cant deficiency 275 mm"),
            Codes(2, 2, "bit", "80 mm"),
            Codes(4, 4, "bit", "100 mm"),
            Codes(8, 8, "bit", "130 mm"),
            Codes(16, 16, "bit", "150 mm"),
            Codes(32, 32, "bit", "165 mm"),
            Codes(64, 64, "bit", "180 mm"),
            Codes(128, 128, "bit", "225 mm"),
            Codes(256, 256, "bit", "300 mm"),
            Codes(512, 512, "bit", "freight train braked in P"),
            Codes(1024, 1024, "bit", "freight train braked in G"),
            Codes(2048, 2048, "bit", "passenger train"),
            Codes(4096, 4096, "bit", "cant deficiency 245 mm"),
            Codes(8192, 8192, "bit", "cant deficiency 210 mm"),
        ),
        "NID_OPERATIONAL": (Codes(4294967295, 4294967295, "special", "unknown"),),
        "Q_EMERGENCYSTOP": (
            Codes(0, 0, "value", "conditional stop accepted"),
            Codes(1, 1, "value", "conditional stop rejected"),
            Codes(3, 3, "spare", "spare"),
        ),
        "Q_TEXTCONFIRM": (
            Codes(1, 1, "value", "display until confirmed"),
            Codes(2, 2, "value", "service brake if unconfirmed at the end condition"),
            Codes(3, 3, "spare", "spare"),
        ),
    }
)

WITHOUT: tuple[str, ...] = (
    "D_CURRENT",
    "D_LX",
    "D_PBD",
    "D_PBDSR",
    "G_PBDSR",
    "L_LX",
    "L_PBDSR",
    "L_STOPLX",
    "M_CURRENT",
    "M_PLATFORM",
    "NC_CDDIFF",
    "NC_CDTRAIN",
    "NID_LX",
    "NID_TEXTMESSAGE",
    "N_AXLE",
    "Q_CONFTEXTDISPLAY",
    "Q_DIFF",
    "Q_LSSMA",
    "Q_LXSTATUS",
    "Q_MAMODE",
    "Q_MARQSTREASON",
    "Q_NVLOCACC",
    "Q_PBDSR",
    "Q_PLATFORM",
    "Q_STOPLX",
    "Q_TEXT",
    "Q_TEXTREPORT",
    "T_LSSMA",
    "V_LX",
    "V_NVLIMSUPERV",
)
