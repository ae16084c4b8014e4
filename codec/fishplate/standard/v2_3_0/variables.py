"""What the variables of SUBSET-026 issue 2.3.0 have otherwise than X = 1 today: literals only."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.vocabulary import Codes, Variable

if TYPE_CHECKING:
    from collections.abc import Mapping

RENAMED: Mapping[str, str] = MappingProxyType(
    {"NID_NTC": "NID_STM", "NID_PRVLRBG": "NID_PRVBG", "T_EMA": "T_LOA", "V_EMA": "V_LOA"}
)
"""Names in X = 1 today and those of this issue."""

VARIABLES: tuple[Variable, ...] = (
    Variable("Q_TEXT", "7.5.1.136", 8, "unsigned", "fixed text number", plain=(0, 255)),
)

AMENDED: Mapping[str, Mapping[str, Any]] = MappingProxyType(
    {
        "D_VALIDNV": {"clause": "7.5.1.36", "codes": ()},
        "L_TAFDISPLAY": {"plain": (0, 32766)},
        "M_AXLELOAD": {
            "clause": "7.5.1.62",
            "codes": (
                Codes(81, 125, "spare", "spare"),
                Codes(126, 126, "special", "above 40 t"),
                Codes(127, 127, "spare", "spare"),
            ),
        },
        "M_ERROR": {"clause": "7.5.1.64"},
        "M_LOADINGGAUGE": {
            "clause": "7.5.1.68",
            "coding": "bitset",
            "codes": (
                Codes(1, 1, "bit", "profile X (to be assigned)"),
                Codes(2, 2, "bit", "profile Y (to be assigned)"),
                Codes(4, 4, "bit", "further profile (to be assigned)"),
                Codes(8, 8, "bit", "further profile (to be assigned)"),
                Codes(16, 16, "bit", "further profile (to be assigned)"),
                Codes(32, 32, "bit", "further profile (to be assigned)"),
                Codes(64, 64, "bit", "further profile (to be assigned)"),
                Codes(128, 128, "bit", "further profile (to be assigned)"),
            ),
        },
        "M_MAMODE": {"clause": "7.5.1.70"},
        "M_MODE": {"clause": "7.5.1.72"},
        "M_MODETEXTDISPLAY": {"clause": "7.5.1.73"},
        "M_POSITION": {
            "clause": "7.5.1.76",
            "codes": (
                Codes(1048575, 1048575, "special", "no more position report after this reference"),
            ),
        },
        "M_TRACKCOND": {"clause": "7.5.1.77"},
        "M_TRACTION": {"clause": "7.5.1.78"},
        "NC_DIFF": {"clause": "7.5.1.83"},
        "NC_TRAIN": {"clause": "7.5.1.84"},
        "NID_OPERATIONAL": {"clause": "7.5.1.92"},
        "NID_PRVBG": {"title": "previous balise group"},
        "NID_RIU": {"plain": (0, 16382)},
        "NID_STM": {"title": "STM number"},
        "Q_EMERGENCYSTOP": {"clause": "7.5.1.107"},
        "Q_TEXTCONFIRM": {"clause": "7.5.1.138"},
        "Q_TRACKDEL": {"clause": "7.5.1.140"},
        "T_LOA": {"title": "validity time of the limit speed"},
        "V_LOA": {"title": "speed at the LOA"},
    }
)

RECODED: Mapping[str, tuple[Codes, ...]] = MappingProxyType(
    {
        "L_TAFDISPLAY": (Codes(32767, 32767, "spare", "spare"),),
        "M_ADHESION": (Codes(0, 0, "value", "70 %"), Codes(1, 1, "value", "100 %")),
        "M_ERROR": (
            Codes(1, 1, "value", "balise message consistency error"),
            Codes(2, 2, "value", "unlinked group consistency error"),
            Codes(5, 5, "value", "radio link error"),
            Codes(6, 6, "value", "no fatal error"),
            Codes(7, 7, "value", "fatal error (sleeping or non leading equipment)"),
        ),
        "M_LEVEL": (Codes(1, 1, "value", "level STM (see NID_STM)"),),
        "M_LEVELTEXTDISPLAY": (Codes(1, 1, "value", "level STM (see NID_STM)"),),
        "M_LEVELTR": (Codes(1, 1, "value", "level STM (see NID_STM)"),),
        "M_LOC": (
            Codes(1, 1, "value", "at every balise group"),
            Codes(2, 2, "value", "stop reporting at balise groups"),
            Codes(3, 3, "value", "keep the earlier value"),
            Codes(4, 7, "spare", "spare"),
        ),
        "M_MODE": (Codes(12, 12, "value", "STM European"), Codes(13, 13, "value", "STM National")),
        "M_MODETEXTDISPLAY": (
            Codes(3, 3, "value", "shunting"),
            Codes(5, 5, "value", "sleeping"),
            Codes(9, 9, "value", "system failure"),
            Codes(10, 10, "value", "isolation"),
            Codes(11, 11, "value", "non leading"),
            Codes(12, 12, "value", "STM European"),
            Codes(13, 13, "value", "STM National"),
        ),
        "M_TRACTION": (Codes(0, 255, "range", "to be assigned (no value listed)"),),
        "M_VERSION": (
            Codes(0, 15, "range", "older systems"),
            Codes(16, 16, "value", "1.0 (class 1)"),
            Codes(17, 127, "range", "reserved for later versions (valid value)"),
        ),
        "NC_DIFF": (
            Codes(0, 0, "value", "active tilting"),
            Codes(1, 1, "value", "passive tilting"),
            Codes(2, 2, "value", "cross wind sensitive"),
            Codes(3, 15, "spare", "spare"),
        ),
        "NC_TRAIN": (
            Codes(1, 1, "bit", "active tilting"),
            Codes(2, 2, "bit", "passive tilting"),
            Codes(4, 4, "bit", "cross wind sensitive"),
            Codes(8, 8, "spare_bit", "spare bit"),
            Codes(16, 16, "spare_bit", "spare bit"),
            Codes(32, 32, "spare_bit", "spare bit"),
            Codes(64, 64, "spare_bit", "spare bit"),
            Codes(128, 128, "spare_bit", "spare bit"),
            Codes(256, 256, "spare_bit", "spare bit"),
            Codes(512, 512, "spare_bit", "spare bit"),
            Codes(1024, 1024, "spare_bit", "spare bit"),
            Codes(2048, 2048, "spare_bit", "spare bit"),
            Codes(4096, 4096, "spare_bit", "spare bit"),
            Codes(8192, 8192, "spare_bit", "spare bit"),
        ),
        "NID_BG": (
            Codes(
                16383,
                16383,
                "special",
                "accept only groups with repositioning data for the running direction (linking only)",
            ),
        ),
        "NID_RBC": (Codes(16383, 16383, "special", "unknown"),),
        "NID_RIU": (Codes(16383, 16383, "special", "unknown"),),
        "Q_EMERGENCYSTOP": (
            Codes(0, 0, "value", "conditional stop taken into account"),
            Codes(1, 1, "value", "conditional stop ignored"),
        ),
        "Q_NVEMRRLS": (
            Codes(0, 0, "value", "release at standstill only"),
            Codes(1, 1, "value", "immediate release possible"),
        ),
        "Q_ORIENTATION": (
            Codes(0, 0, "value", "passed in reverse direction"),
            Codes(1, 1, "value", "passed in nominal direction"),
        ),
        "Q_SLEEPSESSION": (Codes(1, 1, "value", "consider the order when sleeping"),),
        "Q_SUITABILITY": (Codes(2, 2, "value", "traction power"),),
        "Q_TEXTDISPLAY": (
            Codes(0, 0, "value", "any one condition is enough"),
            Codes(1, 1, "value", "all conditions are needed"),
        ),
        "T_CYCRQST": (Codes(0, 0, "special", "continuous request"),),
        "T_MAR": (Codes(255, 255, "special", "not relevant"),),
        "T_TIMEOUTRQST": (Codes(1023, 1023, "special", "not relevant"),),
    }
)

WITHOUT: tuple[str, ...] = (
    "A_NVMAXREDADH1",
    "A_NVMAXREDADH2",
    "A_NVMAXREDADH3",
    "A_NVP12",
    "A_NVP23",
    "L_NVKRINT",
    "M_AXLELOADCAT",
    "M_LINEGAUGE",
    "M_NVAVADH",
    "M_NVEBCL",
    "M_NVKRINT",
    "M_NVKTINT",
    "M_NVKVINT",
    "M_TRACKCONDBC",
    "M_VOLTAGE",
    "NID_CTRACTION",
    "NID_VBCMK",
    "Q_NVGUIPERM",
    "Q_NVINHSMICPERM",
    "Q_NVKINT",
    "Q_NVKVINTSET",
    "Q_NVSBFBPERM",
    "Q_VBCO",
    "T_VBC",
    "V_NVKVINT",
)
