"""What the radio messages of SUBSET-026 issue 3.3.0 have otherwise than issue 3.6.0: literals only."""

from __future__ import annotations

from dataclasses import replace
from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.v3_6_0.messages import TO_TRAIN_HEAD
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN, Optional, RadioMessage, Required

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Direction

COMMON_NUMBERS = (
    3, 5, 39, 40, 51, 41, 42, 44, 45, 52, 57, 58, 64, 65, 66, 68, 69, 70, 71, 72, 76, 79, 88,
    131, 138, 139, 140,
)  # fmt: skip
COMMON: tuple[Optional, ...] = tuple(map(Optional, COMMON_NUMBERS))

MESSAGES: tuple[RadioMessage, ...] = (
    RadioMessage(
        38,
        TO_TRAIN,
        "8.7.16",
        "Initiation of a communication session",
        ("RBC",),
        nodes=TO_TRAIN_HEAD,
        version_invariant=True,
    ),
)

AMENDED: Mapping[tuple[Direction, int], Mapping[str, Any]] = MappingProxyType(
    {
        (TO_TRACK, 159): {"required": Required(()), "optional": (Optional(3),)},
        (TO_TRAIN, 3): {
            "optional": (Optional(21), Optional(27), Optional(49), Optional(80), *COMMON)
        },
        (TO_TRAIN, 24): {
            "optional": (
                Optional(21, "RBC"),
                Optional(27, "RBC"),
                *(replace(each, sender="RBC") for each in COMMON),
                Optional(45, "RIU"),
                Optional(143, "RIU"),
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
                    (5, 21, 27, 39, 40, 41, 44, 49, 51, 65, 66, 68, 69, 70, 71, 80, 88, 138, 139),
                )
            )
        },
    }
)
