"""Packets of versions with X = 1 that chapter 6 lays out its own way: literals only.

SUBSET-026 issue 3.6.0, clauses 6.5.1.5 and 6.5.1.6; what stands here comes before chapters 7 and 8.
"""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.compose import renamed_nodes
from fishplate.standard.v3_6_0.to_track import HEAD as TO_TRACK_HEAD
from fishplate.standard.v3_6_0.to_train import (
    CONDITIONS,
    CONVERSION_MODEL,
    HEAD,
    SCALED_HEAD,
    SUITABILITIES,
    TEXT_DISPLAY,
    TRACTION_CHANGE,
)
from fishplate.standard.vocabulary import (
    TO_TRACK,
    TO_TRAIN,
    Eq,
    Field,
    Opaque,
    Packet,
    Repeat,
    Series,
    Text,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Direction

PACKETS: tuple[Packet, ...] = (
    Packet(
        3,
        TO_TRAIN,
        "6.5.1.5.4",
        "National Values",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("D_VALIDNV"),
            Repeat("countries", (Field("NID_C"),)),
            Field("V_NVSHUNT"),
            Field("V_NVSTFF"),
            Field("V_NVONSIGHT"),
            Field("V_NVUNFIT"),
            Field("V_NVREL"),
            Field("D_NVROLL"),
            Field("Q_NVSRBKTRG"),
            Field("Q_NVEMRRLS"),
            Field("V_NVALLOWOVTRP"),
            Field("V_NVSUPOVTRP"),
            Field("D_NVOVTRP"),
            Field("T_NVOVTRP"),
            Field("D_NVPOTRP"),
            Field("M_NVCONTACT"),
            Field("T_NVCONTACT"),
            Field("M_NVDERUN"),
            Field("D_NVSTFF"),
            Field("Q_NVDRIVER_ADHES"),
        ),
    ),
    Packet(
        27,
        TO_TRAIN,
        "6.5.1.5.6",
        "International Static Speed Profile",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Series(
                "steps",
                (
                    Field("D_STATIC"),
                    Field("V_STATIC"),
                    Field("Q_FRONT"),
                    Repeat("categories", (Field("NC_DIFF"), Field("V_DIFF"))),
                ),
            ),
        ),
    ),
    Packet(
        39,
        TO_TRAIN,
        "6.5.1.5.7",
        "Track Condition Change of traction system",
        ("Any",),
        nodes=(*SCALED_HEAD, Field("D_TRACTION"), Field("M_TRACTION")),
    ),
    Packet(
        44,
        TO_TRAIN,
        "6.5.1.5.9",
        "Data used by applications outside the ERTMS/ETCS system",
        ("Any",),
        nodes=(*HEAD, Field("NID_XUSER"), Opaque("data")),
    ),
    Packet(
        51,
        TO_TRAIN,
        "6.5.1.5.10",
        "Axle Load Speed Profile",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TRACKINIT"),
            When(
                Eq("Q_TRACKINIT", 0),
                (
                    Series(
                        "areas",
                        (
                            Field("D_AXLELOAD"),
                            Field("L_AXLELOAD"),
                            Field("Q_FRONT"),
                            Repeat("categories", (Field("M_AXLELOAD"), Field("V_AXLELOAD"))),
                        ),
                    ),
                ),
            ),
        ),
    ),
    Packet(
        70,
        TO_TRAIN,
        "6.5.1.5.14",
        "Route Suitability data",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TRACKINIT"),
            When(Eq("Q_TRACKINIT", 1), (Field("D_TRACKINIT"),)),
            When(
                Eq("Q_TRACKINIT", 0),
                (
                    Series(
                        "suitabilities",
                        (
                            Field("D_SUITABILITY"),
                            Field("Q_SUITABILITY"),
                            When(Eq("Q_SUITABILITY", 1), (Field("M_AXLELOAD"),)),
                            When(Eq("Q_SUITABILITY", 2), (Field("M_TRACTION"),)),
                        ),
                    ),
                ),
            ),
        ),
    ),
    Packet(
        72,
        TO_TRAIN,
        "6.5.1.5.15",
        "Packet for sending plain text messages",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TEXTCLASS"),
            Field("Q_TEXTDISPLAY"),
            *TEXT_DISPLAY,
            Field("Q_TEXTCONFIRM"),
            Text("L_TEXT", "X_TEXT"),
        ),
    ),
    Packet(
        80,
        TO_TRAIN,
        "6.5.1.5.18",
        "Mode profile",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Series(
                "profiles",
                (
                    Field("D_MAMODE"),
                    Field("M_MAMODE"),
                    Field("V_MAMODE"),
                    Field("L_MAMODE"),
                    Field("L_ACKMAMODE"),
                ),
            ),
        ),
    ),
    Packet(
        11,
        TO_TRACK,
        "6.5.1.5.25.2",
        "Validated train data",
        ("RBC",),
        nodes=(
            *TO_TRACK_HEAD,
            Field("NID_OPERATIONAL"),
            Field("NC_TRAIN"),
            Field("L_TRAIN"),
            Field("V_MAXTRAIN"),
            Field("M_LOADINGGAUGE"),
            Field("M_AXLELOAD"),
            Field("M_AIRTIGHT"),
            Repeat("tractions", (Field("M_TRACTION"),)),
            Repeat("national_systems", (Field("NID_NTC"),)),
        ),
    ),
    Packet(
        200,
        TO_TRAIN,
        "6.5.1.5.21",
        "Virtual Balise Cover marker",
        ("Balise",),
        nodes=(*HEAD, Field("NID_VBCMK")),
        lineage=0,
        since="1.1",
    ),
    Packet(
        203,
        TO_TRAIN,
        "6.5.1.5.22",
        "National Values for braking curves",
        ("Balise", "RBC"),
        nodes=(
            *HEAD,
            Field("Q_NVGUIPERM"),
            Field("Q_NVSBFBPERM"),
            Field("Q_NVINHSMICPERM"),
            Field("A_NVMAXREDADH1"),
            Field("A_NVMAXREDADH2"),
            Field("A_NVMAXREDADH3"),
            Field("M_NVAVADH"),
            Field("M_NVEBCL"),
            Field("Q_NVKINT"),
            *CONVERSION_MODEL,
        ),
        since="1.1",
    ),
    Packet(
        206,
        TO_TRAIN,
        "6.5.1.5.23",
        "Track Condition",
        ("Any",),
        nodes=renamed_nodes(CONDITIONS, {"M_TRACKCOND": "M_TRACKCONDBC"}),
        lineage=68,
        since="1.1",
    ),
    Packet(
        207,
        TO_TRAIN,
        "6.5.1.5.24",
        "Route Suitability Data",
        ("Any",),
        nodes=SUITABILITIES,
        lineage=70,
        since="1.1",
    ),
    Packet(
        239,
        TO_TRAIN,
        "6.5.1.5.25",
        "Track Condition Change of traction system",
        ("Any",),
        nodes=TRACTION_CHANGE,
        lineage=39,
        since="1.1",
    ),
    Packet(
        3,
        TO_TRACK,
        "6.5.1.5.25.1",
        "On-board telephone numbers",
        ("RBC", "RIU"),
        nodes=(*TO_TRACK_HEAD, Repeat("telephone_numbers", (Field("NID_RADIO"),))),
    ),
)

AMENDED: Mapping[tuple[Direction, int], Mapping[str, Any]] = MappingProxyType(
    {
        (TO_TRAIN, 2): {"since": "1.1"},
        (TO_TRAIN, 6): {"since": "1.1"},
        (TO_TRAIN, 79): {"clause": "6.5.1.5.17"},
        (TO_TRAIN, 135): {"since": "1.1"},
        (TO_TRAIN, 145): {"since": "1.1"},
    }
)

WITHOUT: tuple[tuple[Direction, int], ...] = (
    (TO_TRAIN, 0),
    (TO_TRAIN, 13),
    (TO_TRAIN, 40),
    (TO_TRAIN, 52),
    (TO_TRAIN, 64),
    (TO_TRAIN, 69),
    (TO_TRAIN, 76),
    (TO_TRAIN, 88),
    (TO_TRAIN, 143),
    (TO_TRAIN, 180),
    (TO_TRAIN, 181),
    (TO_TRACK, 2),
    (TO_TRACK, 5),
)
