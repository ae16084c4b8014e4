"""What the radio messages of SUBSET-026 issue 4.0.0 have otherwise than issue 3.6.0: literals only."""

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
    3, 5, 31, 32, 39, 40, 51, 41, 42, 44, 45, 52, 57, 58, 64, 65, 66, 67, 68, 69, 70, 71, 73,
    74, 79, 88, 131, 138, 139, 140, 180,
)  # fmt: skip
COMMON: tuple[Optional, ...] = tuple(map(Optional, COMMON_NUMBERS))

MESSAGES: tuple[RadioMessage, ...] = (
    RadioMessage(
        131,
        TO_TRACK,
        "8.6.2.1",
        "Request for Supervised Manoeuvre",
        ("RBC",),
        nodes=TO_TRACK_HEAD,
        required=Required(((0, 1), (10,))),
        optional=(Optional(12),),
    ),
    RadioMessage(
        133,
        TO_TRACK,
        "8.6.3.1",
        "Safe consist length information for Supervised Manoeuvre",
        ("RBC",),
        nodes=TO_TRACK_HEAD,
        required=Required(((0, 1), (10,))),
    ),
    RadioMessage(
        150,
        TO_TRACK,
        "8.6.10",
        "End of Mission",
        ("RBC",),
        nodes=(*TO_TRACK_HEAD, Field("Q_DESK")),
        required=POSITION,
    ),
    RadioMessage(
        4,
        TO_TRAIN,
        "8.7.2.1",
        "SM Authorisation",
        ("RBC",),
        nodes=(
            *TO_TRAIN_HEAD,
            Field("T_TRAIN", key="T_TRAIN_REFERENCE"),
            Field("Q_SCALE"),
            Field("D_REF"),
            Field("V_SM"),
        ),
        required=Required(((15,), (21,), (27,))),
        optional=tuple(
            map(
                Optional,
                (
                    3,
                    5,
                    31,
                    39,
                    40,
                    44,
                    45,
                    51,
                    58,
                    64,
                    65,
                    66,
                    67,
                    68,
                    69,
                    71,
                    73,
                    74,
                    79,
                    88,
                    131,
                    140,
                ),
            )
        ),
    ),
    RadioMessage(
        5,
        TO_TRAIN,
        "8.7.2.2",
        "SM Refused",
        ("RBC",),
        nodes=(*TO_TRAIN_HEAD, Field("T_TRAIN", key="T_TRAIN_REFERENCE")),
    ),
    RadioMessage(
        7,
        TO_TRAIN,
        "8.7.3.1",
        "Acknowledgement of safe consist length info for SM",
        ("RBC",),
        nodes=(*TO_TRAIN_HEAD, Field("T_TRAIN", key="T_TRAIN_REFERENCE")),
    ),
    RadioMessage(
        38,
        TO_TRAIN,
        "8.7.16",
        "Acknowledgement of session establishment",
        ("RBC", "RIU"),
        nodes=TO_TRAIN_HEAD,
    ),
)

AMENDED: Mapping[tuple[Direction, int], Mapping[str, Any]] = MappingProxyType(
    {
        (TO_TRACK, 157): {
            "optional": (Optional(4), Optional(5), Optional(10), Optional(11), Optional(44))
        },
        (TO_TRAIN, 3): {
            "optional": (Optional(21), Optional(27), Optional(49), Optional(80), *COMMON)
        },
        (TO_TRAIN, 24): {
            "optional": (
                Optional(21, "RBC"),
                Optional(27, "RBC"),
                *(replace(each, sender="RBC") for each in COMMON),
                Optional(44, "RIU"),
                Optional(45, "RIU"),
                Optional(143, "RIU"),
                Optional(180, "RIU"),
                Optional(254, "RIU"),
            )
        },
        (TO_TRAIN, 33): {
            "optional": (Optional(21), Optional(27), Optional(49), Optional(80), *COMMON)
        },
        (TO_TRAIN, 37): {
            "optional": tuple(
                map(
                    Optional,
                    (5, 21, 27, 39, 40, 41, 44, 49, 51, 52, 65, 68, 69, 70, 71, 80, 88, 138, 139),
                )
            )
        },
    }
)
