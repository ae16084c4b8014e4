"""Packets declared by hand with construct, to be held against fishplate.

Source: SUBSET-026 issue 3.6.0, clauses 7.4.2 and 7.4.3, written from the published packet tables
field by field. The library under comparison is construct; fishplate is not imported here.

The structs work on a stream of single bits (a byte of value 0 or 1 each), as construct's
``BitStruct`` gives it to what it encloses. `framed` makes the ``BitStruct``.
"""

from __future__ import annotations

from typing import Any

from construct import (
    Adapter,
    BitsInteger,
    BitStruct,
    Const,
    Construct,
    GreedyBytes,
    If,
    PrefixedArray,
    Sequence,
    Struct,
    this,
)

COUNT = BitsInteger(5)
"""N_ITER, 7.5.1.80."""


def bits(name: str, width: int) -> Construct:
    """An unsigned variable."""
    return name / BitsInteger(width)


class FirstAndFurther(Adapter):
    """One element, N_ITER, then as many further ones: a list of all of them."""

    def _decode(self, obj: Any, context: Any, path: Any) -> list[Any]:
        return [obj[0], *obj[1]]

    def _encode(self, obj: Any, context: Any, path: Any) -> list[Any]:
        return [obj[0], list(obj[1:])]


class Latin1(Adapter):
    """Character codes of ISO 8859-1 as a text."""

    def _decode(self, obj: Any, context: Any, path: Any) -> str:
        return bytes(obj).decode("iso8859-1")

    def _encode(self, obj: Any, context: Any, path: Any) -> list[int]:
        return list(obj.encode("iso8859-1"))


def series(name: str, *fields: Construct) -> Construct:
    """A set whose first element always stands."""
    element = Struct(*fields)
    return name / FirstAndFurther(Sequence(element, PrefixedArray(COUNT, element)))


def repeat(name: str, *fields: Construct) -> Construct:
    """A set that N_ITER counts in full."""
    return name / PrefixedArray(COUNT, Struct(*fields))


def head(number: int) -> tuple[Construct, ...]:
    """The header of a track-to-train packet without a scale."""
    return (
        "NID_PACKET" / Const(number, BitsInteger(8)),
        bits("Q_DIR", 2),
        bits("L_PACKET", 13),
    )


def scaled(number: int) -> tuple[Construct, ...]:
    """The header of a track-to-train packet that holds distances."""
    return (*head(number), bits("Q_SCALE", 2))


def to_track(number: int) -> tuple[Construct, ...]:
    """The header of a train-to-track packet."""
    return ("NID_PACKET" / Const(number, BitsInteger(8)), bits("L_PACKET", 13))


def group_identity() -> tuple[Construct, ...]:
    """Q_NEWCOUNTRY, NID_C where it says so, NID_BG."""
    return (
        bits("Q_NEWCOUNTRY", 1),
        "NID_C" / If(this.Q_NEWCOUNTRY == 1, BitsInteger(10)),
        bits("NID_BG", 14),
    )


def of_passenger_trains(context: Any) -> bool:
    """Whether the Kv set around a step says so; construct nests first and further steps apart."""
    while "Q_NVKVINTSET" not in context:
        context = context["_"]
    return bool(context["Q_NVKVINTSET"] == 1)


# 7.4.2.1.1. A Kv step has a second factor when the set is one of conventional passenger trains.
KV_SET = (
    bits("Q_NVKVINTSET", 2),
    "A_NVP12" / If(this.Q_NVKVINTSET == 1, BitsInteger(6)),
    "A_NVP23" / If(this.Q_NVKVINTSET == 1, BitsInteger(6)),
    series(
        "speed_steps",
        bits("V_NVKVINT", 7),
        bits("M_NVKVINT", 7),
        "M_NVKVINT_P23" / If(of_passenger_trains, BitsInteger(7)),
    ),
)
PACKET_3 = Struct(
    *scaled(3),
    bits("D_VALIDNV", 15),
    series("countries", bits("NID_C", 10)),
    bits("V_NVSHUNT", 7),
    bits("V_NVSTFF", 7),
    bits("V_NVONSIGHT", 7),
    bits("V_NVLIMSUPERV", 7),
    bits("V_NVUNFIT", 7),
    bits("V_NVREL", 7),
    bits("D_NVROLL", 15),
    bits("Q_NVSBTSMPERM", 1),
    bits("Q_NVEMRRLS", 1),
    bits("Q_NVGUIPERM", 1),
    bits("Q_NVSBFBPERM", 1),
    bits("Q_NVINHSMICPERM", 1),
    bits("V_NVALLOWOVTRP", 7),
    bits("V_NVSUPOVTRP", 7),
    bits("D_NVOVTRP", 15),
    bits("T_NVOVTRP", 8),
    bits("D_NVPOTRP", 15),
    bits("M_NVCONTACT", 2),
    bits("T_NVCONTACT", 8),
    bits("M_NVDERUN", 1),
    bits("D_NVSTFF", 15),
    bits("Q_NVDRIVER_ADHES", 1),
    bits("A_NVMAXREDADH1", 6),
    bits("A_NVMAXREDADH2", 6),
    bits("A_NVMAXREDADH3", 6),
    bits("Q_NVLOCACC", 6),
    bits("M_NVAVADH", 5),
    bits("M_NVEBCL", 4),
    bits("Q_NVKINT", 1),
    "factors"
    / If(
        this.Q_NVKINT == 1,
        Struct(
            series("kv_sets", *KV_SET),
            series("length_steps", bits("L_NVKRINT", 5), bits("M_NVKRINT", 5)),
            bits("M_NVKTINT", 5),
        ),
    ),
)

PACKET_5 = Struct(  # 7.4.2.2
    *scaled(5),
    series(
        "links",
        bits("D_LINK", 15),
        *group_identity(),
        bits("Q_LINKORIENTATION", 1),
        bits("Q_LINKREACTION", 2),
        bits("Q_LOCACC", 6),
    ),
)

SECTION_TIMER = (
    bits("Q_SECTIONTIMER", 1),
    "T_SECTIONTIMER" / If(this.Q_SECTIONTIMER == 1, BitsInteger(10)),
    "D_SECTIONTIMERSTOPLOC" / If(this.Q_SECTIONTIMER == 1, BitsInteger(15)),
)
AUTHORITY = (
    bits("V_EMA", 7),
    bits("T_EMA", 10),
    repeat("sections", bits("L_SECTION", 15), *SECTION_TIMER),
    bits("L_ENDSECTION", 15),
    *SECTION_TIMER,
    bits("Q_ENDTIMER", 1),
    "T_ENDTIMER" / If(this.Q_ENDTIMER == 1, BitsInteger(10)),
    "D_ENDTIMERSTARTLOC" / If(this.Q_ENDTIMER == 1, BitsInteger(15)),
    bits("Q_DANGERPOINT", 1),
    "D_DP" / If(this.Q_DANGERPOINT == 1, BitsInteger(15)),
    "V_RELEASEDP" / If(this.Q_DANGERPOINT == 1, BitsInteger(7)),
    bits("Q_OVERLAP", 1),
    "D_STARTOL" / If(this.Q_OVERLAP == 1, BitsInteger(15)),
    "T_OL" / If(this.Q_OVERLAP == 1, BitsInteger(10)),
    "D_OL" / If(this.Q_OVERLAP == 1, BitsInteger(15)),
    "V_RELEASEOL" / If(this.Q_OVERLAP == 1, BitsInteger(7)),
)
PACKET_12 = Struct(*scaled(12), bits("V_MAIN", 7), *AUTHORITY)  # 7.4.2.3
PACKET_15 = Struct(*scaled(15), *AUTHORITY)  # 7.4.2.4

PACKET_21 = Struct(  # 7.4.2.6
    *scaled(21),
    series("gradients", bits("D_GRADIENT", 15), bits("Q_GDIR", 1), bits("G_A", 8)),
)

PACKET_27 = Struct(  # 7.4.2.7
    *scaled(27),
    series(
        "steps",
        bits("D_STATIC", 15),
        bits("V_STATIC", 7),
        bits("Q_FRONT", 1),
        repeat(
            "categories",
            bits("Q_DIFF", 2),
            "NC_CDDIFF" / If(this.Q_DIFF == 0, BitsInteger(4)),
            "NC_DIFF" / If((this.Q_DIFF == 1) | (this.Q_DIFF == 2), BitsInteger(4)),
            bits("V_DIFF", 7),
        ),
    ),
)

PACKET_68 = Struct(  # 7.4.2.20
    *scaled(68),
    bits("Q_TRACKINIT", 1),
    "D_TRACKINIT" / If(this.Q_TRACKINIT == 1, BitsInteger(15)),
    "profile"
    / If(
        this.Q_TRACKINIT == 0,
        Struct(
            series(
                "conditions",
                bits("D_TRACKCOND", 15),
                bits("L_TRACKCOND", 15),
                bits("M_TRACKCOND", 4),
            )
        ),
    ),
)

DISPLAY_LIMIT = (
    bits("M_MODETEXTDISPLAY", 4),
    bits("M_LEVELTEXTDISPLAY", 3),
    "NID_NTC" / If(this.M_LEVELTEXTDISPLAY == 1, BitsInteger(8)),
)
PACKET_72 = Struct(  # 7.4.2.23
    *scaled(72),
    bits("Q_TEXTCLASS", 2),
    bits("Q_TEXTDISPLAY", 1),
    "start" / Struct(bits("D_TEXTDISPLAY", 15), *DISPLAY_LIMIT),
    "end" / Struct(bits("L_TEXTDISPLAY", 15), bits("T_TEXTDISPLAY", 10), *DISPLAY_LIMIT),
    bits("Q_TEXTCONFIRM", 2),
    "Q_CONFTEXTDISPLAY" / If(this.Q_TEXTCONFIRM != 0, BitsInteger(1)),
    "Q_TEXTREPORT" / If(this.Q_TEXTCONFIRM != 0, BitsInteger(1)),
    "NID_TEXTMESSAGE" / If(this.Q_TEXTREPORT == 1, BitsInteger(8)),
    "NID_C" / If(this.Q_TEXTREPORT == 1, BitsInteger(10)),
    "NID_RBC" / If(this.Q_TEXTREPORT == 1, BitsInteger(14)),
    "X_TEXT" / Latin1(PrefixedArray(BitsInteger(8), BitsInteger(8))),
)

PACKET_79 = Struct(  # 7.4.2.25
    *scaled(79),
    series(
        "positions",
        *group_identity(),
        bits("D_POSOFF", 15),
        bits("Q_MPOSITION", 1),
        bits("M_POSITION", 24),
    ),
)

PACKET_80 = Struct(  # 7.4.2.26
    *scaled(80),
    series(
        "profiles",
        bits("D_MAMODE", 15),
        bits("M_MAMODE", 2),
        bits("V_MAMODE", 7),
        bits("L_MAMODE", 15),
        bits("L_ACKMAMODE", 15),
        bits("Q_MAMODE", 1),
    ),
)

PACKET_0_TO_TRACK = Struct(  # 7.4.3.1
    *to_track(0),
    bits("Q_SCALE", 2),
    bits("NID_LRBG", 24),
    bits("D_LRBG", 15),
    bits("Q_DIRLRBG", 2),
    bits("Q_DLRBG", 2),
    bits("L_DOUBTOVER", 15),
    bits("L_DOUBTUNDER", 15),
    bits("Q_LENGTH", 2),
    "L_TRAININT" / If((this.Q_LENGTH == 1) | (this.Q_LENGTH == 2), BitsInteger(15)),
    bits("V_TRAIN", 7),
    bits("Q_DIRTRAIN", 2),
    bits("M_MODE", 4),
    bits("M_LEVEL", 3),
    "NID_NTC" / If(this.M_LEVEL == 1, BitsInteger(8)),
)

PACKET_11_TO_TRACK = Struct(  # 7.4.3.5
    *to_track(11),
    bits("NC_CDTRAIN", 4),
    bits("NC_TRAIN", 15),
    bits("L_TRAIN", 12),
    bits("V_MAXTRAIN", 7),
    bits("M_LOADINGGAUGE", 8),
    bits("M_AXLELOADCAT", 7),
    bits("M_AIRTIGHT", 2),
    bits("N_AXLE", 10),
    repeat(
        "tractions",
        bits("M_VOLTAGE", 4),
        "NID_CTRACTION" / If(this.M_VOLTAGE != 0, BitsInteger(10)),
    ),
    repeat("national_systems", bits("NID_NTC", 8)),
)

STRUCTS: dict[tuple[str, int], Construct] = {
    ("to-train", 3): PACKET_3,
    ("to-train", 5): PACKET_5,
    ("to-train", 12): PACKET_12,
    ("to-train", 15): PACKET_15,
    ("to-train", 21): PACKET_21,
    ("to-train", 27): PACKET_27,
    ("to-train", 68): PACKET_68,
    ("to-train", 72): PACKET_72,
    ("to-train", 79): PACKET_79,
    ("to-train", 80): PACKET_80,
    ("to-track", 0): PACKET_0_TO_TRACK,
    ("to-track", 11): PACKET_11_TO_TRACK,
}
INLINE = {"factors", "profile"}
"""Structs that only hold what one condition governs; their fields belong to the packet."""


def framed(packet: Construct) -> Construct:
    """The packet, then what completes the last byte."""
    return BitStruct("packet" / packet, "rest" / GreedyBytes)
