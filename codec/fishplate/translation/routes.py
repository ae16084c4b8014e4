"""Which rules lead from one system version to another: literals only."""

from __future__ import annotations

from dataclasses import replace
from types import MappingProxyType
from typing import TYPE_CHECKING

from fishplate.translation import to_track, to_train
from fishplate.translation.vocabulary import Route, RuleBook

if TYPE_CHECKING:
    from collections.abc import Mapping

X1_PACKETS = "6.5.1.5.2"
X1_PACKETS_TO_TRACK = "6.5.1.5.2.1"
COMPATIBLE = "3.17.3"
NEEDS_1_1: Mapping[tuple[str, int], str] = MappingProxyType(
    {
        **{("balise", n): "6.5.1.7.1" for n in (2, 6, 135, 145, 200, 203, 206, 207, 239)},
        **{("loop", n): "6.5.1.7.2" for n in (206, 207, 239)},
        **{("radio", n): "6.5.1.7.4" for n in (203, 206, 207, 239)},
    }
)
"""The clauses that say which packets of X = 1 need 1.1; that of an RBC stands for radio, since
frames do not tell an RBC from a radio infill unit (6.5.1.7.3)."""

TO_TRAIN_2_1 = RuleBook(
    packets="6.6.3.2.3",
    messages="6.6.3.3.2",
    absent="6.6.3.2.3",
    stated=True,
    checked=True,
    rules=to_train.X1_TO_X2,
)
TO_TRAIN_2_0 = RuleBook(
    packets="6.6.3.2.3",
    messages="6.6.3.3.2",
    absent="6.6.3.2.3",
    stated=True,
    checked=True,
    # Spare, and issue 3.3.0 has a rule for it.
    passed=frozenset({("M_LOC", 3)}),
    rules=MappingProxyType({**to_train.X1_TO_X2, **to_train.X1_TO_X2_IN_3_3_0}),
)
FROM_1_1_TO_TRAIN_2_1 = replace(
    TO_TRAIN_2_1, rules=MappingProxyType({**TO_TRAIN_2_1.rules, **to_train.SHARED_WITH_1_1})
)
FROM_1_1_TO_TRAIN_2_0 = replace(
    TO_TRAIN_2_0, rules=MappingProxyType({**TO_TRAIN_2_0.rules, **to_train.SHARED_WITH_1_1})
)
TO_TRAIN_1_0 = RuleBook(
    packets="6.6.3.2.3",
    messages="6.6.3.3.2",
    absent=X1_PACKETS,
    stated=False,
    newer=NEEDS_1_1,
    rules=to_train.X2_TO_1_0,
)
TO_TRAIN_1_1 = RuleBook(
    packets="6.6.3.2.3",
    messages="6.6.3.3.2",
    absent=X1_PACKETS,
    stated=False,
    rules=to_train.X2_TO_1_1,
)

FROM_2_1 = RuleBook(
    packets="6.6.3.4.5",
    messages="6.6.3.4.5",
    absent=X1_PACKETS_TO_TRACK,
    stated=True,
    rules=to_track.X2_TO_X1,
)
FROM_2_0 = RuleBook(
    packets="6.6.3.4.5",
    messages="6.6.3.4.5",
    absent=X1_PACKETS_TO_TRACK,
    stated=True,
    rules=MappingProxyType({**to_track.X2_TO_X1, **to_track.X2_TO_X1_IN_3_3_0}),
)
TO_TRACK_2_1 = RuleBook(
    packets="6.6.3.4.5",
    messages="6.6.3.4.5",
    absent="6.6.3.4.5",
    stated=False,
    rules=to_track.X1_TO_X2,
)
TO_TRACK_2_0 = RuleBook(
    packets="6.6.3.4.5",
    messages="6.6.3.4.5",
    absent="6.6.3.4.5",
    stated=False,
    rules=MappingProxyType({**to_track.X1_TO_X2, **to_track.X1_TO_X2_IN_3_3_0}),
)

SAME_X = RuleBook(COMPATIBLE, COMPATIBLE, COMPATIBLE, stated=False)
WITHOUT_1_1 = RuleBook(COMPATIBLE, COMPATIBLE, "6.5.1.7", stated=False, newer=NEEDS_1_1)
VERSIONS_TO_NUMBERS = RuleBook(
    "6.6.4.1.2",
    "6.6.4.1.2",
    absent="6.6.4.1.2",
    stated=True,
    rules=to_track.FROM_2_1_TO_2_0,
)
NUMBERS_TO_VERSIONS = RuleBook(
    COMPATIBLE, COMPATIBLE, COMPATIBLE, stated=False, rules=to_track.FROM_2_0_TO_2_1
)

ROUTES: Mapping[tuple[str, str], Route] = MappingProxyType(
    {
        ("1.0", "2.0"): Route(TO_TRAIN_2_0, TO_TRACK_2_0),
        ("1.0", "2.1"): Route(TO_TRAIN_2_1, TO_TRACK_2_1),
        ("1.1", "2.0"): Route(FROM_1_1_TO_TRAIN_2_0, TO_TRACK_2_0),
        ("1.1", "2.1"): Route(FROM_1_1_TO_TRAIN_2_1, TO_TRACK_2_1),
        ("2.0", "1.0"): Route(TO_TRAIN_1_0, FROM_2_0),
        ("2.0", "1.1"): Route(TO_TRAIN_1_1, FROM_2_0),
        ("2.1", "1.0"): Route(TO_TRAIN_1_0, FROM_2_1),
        ("2.1", "1.1"): Route(TO_TRAIN_1_1, FROM_2_1),
        ("1.0", "1.1"): Route(SAME_X, SAME_X),
        ("1.1", "1.0"): Route(WITHOUT_1_1, WITHOUT_1_1),
        ("2.0", "2.1"): Route(SAME_X, NUMBERS_TO_VERSIONS),
        ("2.1", "2.0"): Route(SAME_X, VERSIONS_TO_NUMBERS),
    }
)
"""By source and target. A packet or message without a rule keeps its bits where the target has
it, and is left out where it has not."""

VERSIONS: tuple[str, ...] = tuple(sorted({version for pair in ROUTES for version in pair}))
