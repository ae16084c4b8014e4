"""Radio messages of versions with X = 1 that chapter 6 lays out its own way: literals only.

SUBSET-026 issue 3.6.0, clauses 6.5.1.5 and 6.5.1.6; what stands here comes before chapters 7 and 8.
"""

from __future__ import annotations

from dataclasses import replace
from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.v3_6_0.messages import POSITION, TO_TRACK_HEAD, TO_TRAIN_HEAD
from fishplate.standard.vocabulary import (
    TO_TRACK,
    TO_TRAIN,
    Field,
    Optional,
    RadioMessage,
    Required,
)

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Direction

COMMON_NUMBERS = (
    3, 5, 39, 51, 41, 42, 44, 45, 57, 58, 65, 66, 68, 70, 71, 72, 79, 131, 138, 139, 140, 203,
    206, 207, 239,
)  # fmt: skip
COMMON: tuple[Optional, ...] = tuple(map(Optional, COMMON_NUMBERS))

MESSAGES: tuple[RadioMessage, ...] = (
    RadioMessage(
        132,
        TO_TRACK,
        "8.6.3",
        "MA Request",
        ("RBC",),
        nodes=(*TO_TRACK_HEAD, Field("Q_TRACKDEL")),
        required=POSITION,
        optional=(Optional(9),),
    ),
    RadioMessage(
        15,
        TO_TRAIN,
        "8.7.6",
        "Conditional Emergency Stop",
        ("RBC",),
        nodes=(
            *TO_TRAIN_HEAD,
            Field("NID_EM"),
            Field("Q_SCALE"),
            Field("Q_DIR"),
            Field("D_EMERGENCYSTOP"),
        ),
    ),
    RadioMessage(
        34,
        TO_TRAIN,
        "8.7.14",
        "Track Ahead Free Request",
        ("RBC",),
        nodes=(
            *TO_TRAIN_HEAD,
            Field("Q_SCALE"),
            Field("Q_DIR"),
            Field("D_TAFDISPLAY"),
            Field("L_TAFDISPLAY"),
        ),
    ),
)

AMENDED: Mapping[tuple[Direction, int], Mapping[str, Any]] = MappingProxyType(
    {
        (TO_TRACK, 136): {"optional": (Optional(4), Optional(44))},
        (TO_TRACK, 157): {"optional": (Optional(4), Optional(44))},
        (TO_TRACK, 159): {"required": Required(((3,),))},
        (TO_TRAIN, 3): {
            "optional": (Optional(21), Optional(27), Optional(49), Optional(80), *COMMON)
        },
        (TO_TRAIN, 24): {
            "optional": (
                Optional(21, "RBC"),
                Optional(27, "RBC"),
                *(replace(each, sender="RBC") for each in COMMON),
                Optional(45, "RIU"),
                Optional(254, "RIU"),
            )
        },
        (TO_TRAIN, 28): {"optional": (Optional(49), *COMMON)},
        (TO_TRAIN, 33): {"optional": (Optional(21), Optional(27), Optional(80), *COMMON)},
        (TO_TRAIN, 37): {
            "optional": tuple(
                map(
                    Optional,
                    (5, 21, 27, 39, 41, 44, 51, 65, 66, 68, 70, 71, 80, 138, 139, 206, 207, 239),
                )
            )
        },
    }
)

WITHOUT: tuple[tuple[Direction, int], ...] = ((TO_TRACK, 158),)
