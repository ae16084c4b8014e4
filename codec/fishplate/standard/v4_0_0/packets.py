"""What the packets of SUBSET-026 issue 4.0.0 have otherwise than issue 3.6.0: literals only."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.compose import renamed_nodes
from fishplate.standard.v3_6_0.to_track import HEAD as TO_TRACK_HEAD
from fishplate.standard.v3_6_0.to_train import (
    DISPLAY_AND_CONFIRMATION,
    HEAD,
    SCALED_HEAD,
    SUITABILITIES,
)
from fishplate.standard.vocabulary import (
    TO_TRACK,
    TO_TRAIN,
    Eq,
    Field,
    In,
    Ne,
    Packet,
    Repeat,
    Text,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Direction

PACKETS: tuple[Packet, ...] = (
    Packet(
        31,
        TO_TRAIN,
        "7.4.2.7.1",
        "RBC transition order for RBC interfaced to FRMCS only",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("D_RBCTR"),
            Field("NID_C"),
            Field("NID_RBC"),
            Field("Q_SLEEPSESSION"),
        ),
    ),
    Packet(
        32,
        TO_TRAIN,
        "7.4.2.7.2",
        "Session Management for RBC interfaced to FRMCS only",
        ("Balise", "RBC"),
        nodes=(*HEAD, Field("Q_RBC"), Field("NID_C"), Field("NID_RBC"), Field("Q_SLEEPSESSION")),
    ),
    Packet(
        45,
        TO_TRAIN,
        "7.4.2.11.1",
        "Radio Network transition order",
        ("Balise", "RBC", "RIU"),
        nodes=(
            *HEAD,
            Field("Q_NETWORKTYPE"),
            When(In("Q_NETWORKTYPE", (1, 2)), (Field("NID_MN"),)),
        ),
    ),
    Packet(
        70,
        TO_TRAIN,
        "7.4.2.21",
        "Route Suitability Data",
        ("Any",),
        nodes=renamed_nodes(SUITABILITIES, {"M_AXLELOADCAT": "M_LINEAXLELOADCAT"}),
    ),
    Packet(
        73,
        TO_TRAIN,
        "7.4.2.23",
        "Packet for sending plain text messages",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TEXTCLASS"),
            Field("Q_TEXTDISPLAY"),
            *DISPLAY_AND_CONFIRMATION,
            Text("L_TEXT", "X_TEXT"),
        ),
        lineage=72,
    ),
    Packet(
        74,
        TO_TRAIN,
        "7.4.2.24",
        "Packet for sending fixed text messages",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TEXTCLASS"),
            Field("Q_TEXTDISPLAY"),
            *DISPLAY_AND_CONFIRMATION,
            Field("Q_TEXT"),
        ),
        lineage=76,
    ),
    Packet(
        10,
        TO_TRACK,
        "7.4.3.4.3",
        "Safe consist length information for Supervised Manoeuvre",
        ("RBC",),
        nodes=(
            *TO_TRACK_HEAD,
            Field("Q_SAFECONSISTLENGTH"),
            When(
                Eq("Q_SAFECONSISTLENGTH", 1),
                (
                    Field("L_CONSISTFRONTENGINENOM"),
                    Field("L_CONSISTFRONTENGINEMIN"),
                    Field("L_CONSISTFRONTENGINEMAX"),
                    Field("L_CONSISTREARENGINENOM"),
                    Field("L_CONSISTREARENGINEMIN"),
                    Field("L_CONSISTREARENGINEMAX"),
                ),
            ),
        ),
    ),
    Packet(
        12,
        TO_TRACK,
        "7.4.3.5.1",
        "Default train data for Supervised Manoeuvre",
        ("RBC",),
        nodes=(
            *TO_TRACK_HEAD,
            Field("NC_CDTRAIN"),
            Field("NC_TRAIN"),
            Field("V_MAXTRAIN"),
            Field("M_LOADINGGAUGE"),
            Field("M_AXLELOADCAT"),
            Field("M_AIRTIGHT"),
            Field("N_AXLE"),
            Repeat(
                "tractions",
                (Field("M_VOLTAGE"), When(Ne("M_VOLTAGE", 0), (Field("NID_CTRACTION"),))),
            ),
        ),
    ),
)

AMENDED: Mapping[tuple[Direction, int], Mapping[str, Any]] = MappingProxyType(
    {
        (TO_TRAIN, 15): {"name": "Level 2 Movement Authority"},
        (TO_TRAIN, 42): {"name": "Session Management for RBC interfaced to GSM-R"},
        (TO_TRAIN, 49): {"name": "List of Balise Groups for SH Area"},
        (TO_TRAIN, 63): {"name": "List of Balise Groups in SR Authority"},
        (TO_TRAIN, 64): {"name": "Inhibition of revocable TSRs from balises in level 2"},
        (TO_TRAIN, 66): {"senders": ("Balise", "RBC")},
        (TO_TRAIN, 67): {"senders": ("Balise", "RBC")},
        (TO_TRAIN, 90): {"name": "Track Ahead Free up to level 2 transition location"},
        (TO_TRAIN, 131): {"name": "RBC transition order for RBC interfaced to GSM-R"},
        (TO_TRACK, 9): {"name": "Level 2 transition information"},
    }
)

WITHOUT: tuple[tuple[Direction, int], ...] = ((TO_TRAIN, 72), (TO_TRAIN, 76))
