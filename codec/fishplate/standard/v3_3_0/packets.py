"""What the packets of SUBSET-026 issue 3.3.0 have otherwise than issue 3.6.0: literals only."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.v3_6_0.to_track import HEAD as TO_TRACK_HEAD
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN, Field, Packet, Repeat

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Direction

PACKETS: tuple[Packet, ...] = (
    Packet(
        3,
        TO_TRACK,
        "7.4.3.3",
        "Onboard telephone numbers",
        ("RBC", "RIU"),
        nodes=(*TO_TRACK_HEAD, Repeat("telephone_numbers", (Field("NID_RADIO"),))),
    ),
)

AMENDED: Mapping[tuple[Direction, int], Mapping[str, Any]] = MappingProxyType(
    {
        (TO_TRAIN, 255): {"clause": "7.4.4.1"},
    }
)

WITHOUT: tuple[tuple[Direction, int], ...] = ((TO_TRAIN, 180), (TO_TRAIN, 181), (TO_TRACK, 2))
