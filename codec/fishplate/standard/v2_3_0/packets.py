"""What the packets of SUBSET-026 issue 2.3.0 have otherwise than X = 1 today: literals only."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.v3_6_0.to_train import SCALED_HEAD, TEXT_DISPLAY
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN, Eq, Field, Packet, Series, When

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Direction

# In the names of X = 1 today: they are renamed with all the others.
PACKETS: tuple[Packet, ...] = (
    Packet(
        70,
        TO_TRAIN,
        "7.4.2.21",
        "Route Suitability Data",
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
                            When(Eq("Q_SUITABILITY", 0), (Field("M_LOADINGGAUGE"),)),
                            When(Eq("Q_SUITABILITY", 1), (Field("M_AXLELOAD"),)),
                            When(Eq("Q_SUITABILITY", 2), (Field("M_TRACTION"),)),
                        ),
                    ),
                ),
            ),
        ),
    ),
    Packet(
        76,
        TO_TRAIN,
        "7.4.2.24",
        "Packet for sending fixed text messages",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TEXTCLASS"),
            Field("Q_TEXTDISPLAY"),
            *TEXT_DISPLAY,
            Field("Q_TEXTCONFIRM"),
            Field("Q_TEXT"),
        ),
    ),
)

AMENDED: Mapping[tuple[Direction, int], Mapping[str, Any]] = MappingProxyType(
    {
        (TO_TRAIN, 3): {"clause": "7.4.2.1", "senders": ("Any",)},
        (TO_TRAIN, 12): {"senders": ("Balise",)},
        (TO_TRAIN, 15): {"senders": ("Radio",)},
        (TO_TRAIN, 27): {"clause": "7.4.2.7"},
        (TO_TRAIN, 39): {"clause": "7.4.2.8", "name": "Track Condition Change of traction power"},
        (TO_TRAIN, 42): {"senders": ("Any",)},
        (TO_TRAIN, 44): {"clause": "7.4.2.11"},
        (TO_TRAIN, 45): {"senders": ("Any",)},
        (TO_TRAIN, 46): {"senders": ("Any",)},
        (TO_TRAIN, 51): {"clause": "7.4.2.13"},
        (TO_TRAIN, 57): {"senders": ("Radio",)},
        (TO_TRAIN, 58): {"senders": ("Radio",)},
        (TO_TRAIN, 63): {"senders": ("Radio",)},
        (TO_TRAIN, 72): {"clause": "7.4.2.23", "senders": ("Any",)},
        (TO_TRAIN, 79): {"clause": "7.4.2.25", "senders": ("Any",)},
        (TO_TRAIN, 80): {"clause": "7.4.2.26"},
        (TO_TRAIN, 90): {"clause": "7.4.2.26.1"},
        (TO_TRAIN, 131): {"senders": ("Any",)},
        (TO_TRAIN, 133): {"name": "Radio in-fill area information"},
        (TO_TRAIN, 136): {"senders": ("Balise", "loop or infill radio")},
        (TO_TRAIN, 140): {"senders": ("Radio",)},
        (TO_TRAIN, 254): {"senders": ("Any",)},
        (TO_TRACK, 0): {"senders": ("Radio",)},
        (TO_TRACK, 1): {"senders": ("Radio",)},
        (TO_TRACK, 3): {
            "clause": "7.4.3.3",
            "name": "Onboard telephone numbers",
            "senders": ("Radio",),
        },
        (TO_TRACK, 4): {"senders": ("Radio",)},
        (TO_TRACK, 9): {"clause": "7.4.3.4.1", "senders": ("Radio",)},
        (TO_TRACK, 11): {"clause": "7.4.3.5", "senders": ("Radio",)},
        (TO_TRACK, 44): {"senders": ("Any",)},
        (TO_TRAIN, 255): {"clause": "7.4.4.1", "senders": ("Any",)},
    }
)

WITHOUT: tuple[tuple[Direction, int], ...] = (
    (TO_TRAIN, 2),
    (TO_TRAIN, 6),
    (TO_TRAIN, 135),
    (TO_TRAIN, 145),
    (TO_TRAIN, 200),
    (TO_TRAIN, 203),
    (TO_TRAIN, 206),
    (TO_TRAIN, 207),
    (TO_TRAIN, 239),
)
