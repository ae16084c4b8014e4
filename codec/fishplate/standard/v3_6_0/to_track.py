"""Train to track packets of SUBSET-026 issue 3.6.0, clause 7.4.3: literals only.

Names of sets (`sections`, `links`, ...) and keys for variables that stand twice are our own.
"""

from __future__ import annotations

from fishplate.standard.vocabulary import (
    TO_TRACK,
    Eq,
    Field,
    In,
    Ne,
    Node,
    Opaque,
    Packet,
    Repeat,
    Series,
    When,
)

HEAD = (Field("NID_PACKET"), Field("L_PACKET"))
SCALED_HEAD = (*HEAD, Field("Q_SCALE"))

POSITION: tuple[Node, ...] = (
    Field("D_LRBG"),
    Field("Q_DIRLRBG"),
    Field("Q_DLRBG"),
    Field("L_DOUBTOVER"),
    Field("L_DOUBTUNDER"),
    Field("Q_LENGTH"),
    When(In("Q_LENGTH", (1, 2)), (Field("L_TRAININT"),)),
    Field("V_TRAIN"),
    Field("Q_DIRTRAIN"),
    Field("M_MODE"),
    Field("M_LEVEL"),
    When(Eq("M_LEVEL", 1), (Field("NID_NTC"),)),
)

PACKETS: tuple[Packet, ...] = (
    Packet(
        0,
        TO_TRACK,
        "7.4.3.1",
        "Position Report",
        ("RBC", "RIU"),
        nodes=(*SCALED_HEAD, Field("NID_LRBG"), *POSITION),
    ),
    Packet(
        1,
        TO_TRACK,
        "7.4.3.2",
        "Position Report based on two balise groups",
        ("RBC", "RIU"),
        nodes=(*SCALED_HEAD, Field("NID_LRBG"), Field("NID_PRVLRBG"), *POSITION),
    ),
    Packet(
        2,
        TO_TRACK,
        "7.4.3.3",
        "Onboard supported system versions",
        ("RBC", "RIU"),
        nodes=(*HEAD, Series("versions", (Field("M_VERSION"),))),
    ),
    Packet(4, TO_TRACK, "7.4.3.4", "Error reporting", ("RBC",), nodes=(*HEAD, Field("M_ERROR"))),
    Packet(
        5,
        TO_TRACK,
        "7.4.3.4.1",
        "Train running number",
        ("RBC",),
        nodes=(*HEAD, Field("NID_OPERATIONAL")),
    ),
    Packet(
        9,
        TO_TRACK,
        "7.4.3.4.2",
        "Level 2/3 transition information",
        ("RBC",),
        nodes=(*HEAD, Field("NID_LTRBG")),
    ),
    Packet(
        11,
        TO_TRACK,
        "7.4.3.5",
        "Validated train data",
        ("RBC",),
        nodes=(
            *HEAD,
            Field("NC_CDTRAIN"),
            Field("NC_TRAIN"),
            Field("L_TRAIN"),
            Field("V_MAXTRAIN"),
            Field("M_LOADINGGAUGE"),
            Field("M_AXLELOADCAT"),
            Field("M_AIRTIGHT"),
            Field("N_AXLE"),
            Repeat(
                "tractions",
                (Field("M_VOLTAGE"), When(Ne("M_VOLTAGE", 0), (Field("NID_CTRACTION"),))),
            ),
            Repeat("national_systems", (Field("NID_NTC"),)),
        ),
    ),
    Packet(
        44,
        TO_TRACK,
        "7.4.3.6",
        "Data used by applications outside the ERTMS/ETCS system",
        ("RBC", "RIU"),
        nodes=(*HEAD, Field("NID_XUSER"), Opaque("data")),
    ),
)
