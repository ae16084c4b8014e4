"""What the variables of SUBSET-026 issue 4.0.0 have otherwise than issue 3.6.0: literals only."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.vocabulary import Codes, Variable

if TYPE_CHECKING:
    from collections.abc import Mapping

RENAMED: Mapping[str, str] = MappingProxyType(
    {"Q_LENGTH": "Q_INTEGRITY", "Q_STATUS": "Q_STATUSLRBG"}
)
"""Names in issue 3.6.0 and those of this issue."""

VARIABLES: tuple[Variable, ...] = (
    Variable(
        "L_CONSISTFRONTENGINEMAX",
        "7.5.1.42.1",
        12,
        "unsigned",
        "longest consist ahead of the engine",
        unit="m",
        resolution="1",
        plain=(0, 4095),
    ),
    Variable(
        "L_CONSISTFRONTENGINEMIN",
        "7.5.1.42.2",
        12,
        "unsigned",
        "shortest consist ahead of the engine",
        unit="m",
        resolution="1",
        plain=(0, 4095),
    ),
    Variable(
        "L_CONSISTFRONTENGINENOM",
        "7.5.1.42.3",
        12,
        "unsigned",
        "nominal consist ahead of the engine",
        unit="m",
        resolution="1",
        plain=(0, 4095),
    ),
    Variable(
        "L_CONSISTREARENGINEMAX",
        "7.5.1.42.4",
        12,
        "unsigned",
        "longest consist behind the engine",
        unit="m",
        resolution="1",
        plain=(0, 4095),
    ),
    Variable(
        "L_CONSISTREARENGINEMIN",
        "7.5.1.42.5",
        12,
        "unsigned",
        "shortest consist behind the engine",
        unit="m",
        resolution="1",
        plain=(0, 4095),
    ),
    Variable(
        "L_CONSISTREARENGINENOM",
        "7.5.1.42.6",
        12,
        "unsigned",
        "nominal consist behind the engine",
        unit="m",
        resolution="1",
        plain=(0, 4095),
    ),
    Variable(
        "M_LINEAXLELOADCAT",
        "7.5.1.67.2",
        16,
        "bitset",
        "axle load categories allowed on the line",
        codes=(
            Codes(1, 1, "bit", "A"),
            Codes(2, 2, "bit", "HS17"),
            Codes(4, 4, "bit", "B1"),
            Codes(8, 8, "bit", "B2"),
            Codes(16, 16, "bit", "C2"),
            Codes(32, 32, "bit", "C3"),
            Codes(64, 64, "bit", "C4"),
            Codes(128, 128, "bit", "D2"),
            Codes(256, 256, "bit", "D3"),
            Codes(512, 512, "bit", "D4"),
            Codes(1024, 1024, "bit", "D4XL"),
            Codes(2048, 2048, "bit", "E4"),
            Codes(4096, 4096, "bit", "E5"),
            Codes(0, 0, "spare", "spare"),
            Codes(8192, 8192, "spare_bit", "spare bit"),
            Codes(16384, 16384, "spare_bit", "spare bit"),
            Codes(32768, 32768, "spare_bit", "spare bit"),
        ),
    ),
    Variable(
        "Q_DESK",
        "7.5.1.102.2",
        1,
        "unsigned",
        "desk state",
        codes=(Codes(0, 0, "value", "desks closed"), Codes(1, 1, "value", "a desk is open")),
    ),
    Variable(
        "Q_SAFECONSISTLENGTH",
        "7.5.1.112.1",
        1,
        "unsigned",
        "safe consist length available",
        codes=(Codes(0, 0, "value", "not available"), Codes(1, 1, "value", "available")),
    ),
    Variable(
        "Q_NETWORKTYPE",
        "7.5.1.120.1",
        2,
        "unsigned",
        "radio system of the trackside",
        codes=(
            Codes(0, 0, "value", "FRMCS"),
            Codes(1, 1, "value", "FRMCS and GSM-R"),
            Codes(2, 2, "value", "GSM-R"),
            Codes(3, 3, "spare", "spare"),
        ),
    ),
    Variable(
        "V_SM",
        "7.5.1.170.1",
        7,
        "unsigned",
        "supervised manoeuvre speed",
        unit="km/h",
        resolution="5",
        plain=(0, 120),
        codes=(Codes(121, 127, "spare", "spare"),),
    ),
)

AMENDED: Mapping[str, Mapping[str, Any]] = MappingProxyType(
    {
        "D_LOOP": {"plain": (0, 32767), "codes": ()},
        "L_LOOP": {"plain": (0, 32767), "codes": ()},
        "M_MODE": {"bits": 5},
        "Q_INTEGRITY": {"formerly": ("Q_LENGTH",)},
        "Q_STATUSLRBG": {"formerly": ("Q_STATUS",)},
    }
)

RECODED: Mapping[str, tuple[Codes, ...]] = MappingProxyType(
    {
        "D_LRBG": (Codes(32767, 32767, "special", "unknown or beyond the range"),),
        "L_DOUBTOVER": (Codes(32767, 32767, "special", "unknown or beyond the range"),),
        "L_DOUBTUNDER": (Codes(32767, 32767, "special", "unknown or beyond the range"),),
        "M_ERROR": (
            Codes(9, 9, "value", "odometer accuracy, impairment threshold reached"),
            Codes(10, 10, "value", "odometer accuracy, safety threshold reached"),
            Codes(11, 255, "spare", "spare"),
        ),
        "M_LEVEL": (Codes(4, 7, "spare", "spare"),),
        "M_LEVELTEXTDISPLAY": (
            Codes(4, 4, "special", "not limited by level"),
            Codes(5, 7, "spare", "spare"),
        ),
        "M_LEVELTR": (Codes(4, 7, "spare", "spare"),),
        "M_MODE": (
            Codes(16, 16, "value", "automatic driving"),
            Codes(17, 17, "value", "supervised manoeuvre"),
            Codes(18, 31, "spare", "spare"),
        ),
        "M_MODETEXTDISPLAY": (
            Codes(3, 3, "value", "automatic driving"),
            Codes(5, 5, "value", "supervised manoeuvre"),
        ),
        "M_VERSION": (
            Codes(34, 34, "value", "2.2"),
            Codes(35, 35, "value", "2.3"),
            Codes(36, 47, "spare", "not valid"),
            Codes(48, 48, "value", "3.0"),
            Codes(49, 127, "range", "reserved for later versions (valid value)"),
        ),
        "Q_INTEGRITY": (Codes(1, 1, "value", "integrity confirmed by external source"),),
        "Q_MAMODE": (
            Codes(0, 0, "value", "no temporary SvL from the mode profile"),
            Codes(1, 1, "value", "start of the mode profile is a temporary SvL"),
        ),
        "Q_MARQSTREASON": (
            Codes(16, 16, "bit", "track ahead free up to the level 2 transition location"),
        ),
        "Q_STATUSLRBG": (
            Codes(0, 0, "value", "invalid position referred to an LRBG"),
            Codes(1, 1, "value", "valid position referred to an LRBG"),
            Codes(2, 2, "value", "no position referred to an LRBG"),
        ),
        "Q_SUITABILITY": (Codes(1, 1, "value", "axle load"),),
        "V_TRAIN": (Codes(121, 126, "spare", "spare"), Codes(127, 127, "special", "standstill")),
    }
)
