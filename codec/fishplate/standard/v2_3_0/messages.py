"""What the messages of SUBSET-026 issue 2.3.0 have otherwise than X = 1 today: literals only."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.v3_6_0.messages import TO_TRAIN_HEAD
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN, Optional, RadioMessage, Required

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Direction

COMMON_NUMBERS = (
    3, 5, 39, 51, 41, 42, 44, 45, 57, 58, 65, 66, 68, 70, 71, 72, 76, 79, 131, 138, 139, 140,
)  # fmt: skip
COMMON: tuple[Optional, ...] = tuple(map(Optional, COMMON_NUMBERS))

MESSAGES: tuple[RadioMessage, ...] = (
    RadioMessage(
        38,
        TO_TRAIN,
        "8.7.16",
        "Initiation of a communication session",
        (),
        nodes=TO_TRAIN_HEAD,
        version_invariant=True,
    ),
)

# Packet 49 in messages 33 and 37: a remark to the table (CR 382) says that trackside does not
# send it.
AMENDED: Mapping[tuple[Direction, int], Mapping[str, Any]] = MappingProxyType(
    {
        (TO_TRACK, 153): {"name": "Radio in-fill request"},
        (TO_TRACK, 154): {"name": "No compatible version"},
        (TO_TRACK, 159): {"required": Required(()), "optional": (Optional(3),)},
        (TO_TRAIN, 3): {
            "optional": (Optional(21), Optional(27), Optional(49), Optional(80), *COMMON)
        },
        (TO_TRAIN, 9): {"optional": (Optional(80),)},
        (TO_TRAIN, 24): {"optional": (Optional(21), Optional(27), *COMMON)},
        (TO_TRAIN, 28): {"optional": (Optional(49), *COMMON)},
        (TO_TRAIN, 32): {"name": "Configuration Determination"},
        (TO_TRAIN, 33): {
            "optional": (Optional(21), Optional(27), Optional(49), Optional(80), *COMMON)
        },
        (TO_TRAIN, 37): {
            "name": "In-fill MA",
            "optional": (Optional(21), Optional(27), Optional(49), Optional(80), *COMMON),
        },
    }
)
