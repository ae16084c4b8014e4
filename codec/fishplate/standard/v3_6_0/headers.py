"""Headers of telegrams and loop messages, SUBSET-026 issue 3.6.0, clause 8.4: literals only."""

from __future__ import annotations

from fishplate.standard.vocabulary import Field, Header

HEADERS: tuple[Header, ...] = (
    Header(
        "balise",
        "8.4.2.1",
        50,
        (
            Field("Q_UPDOWN"),
            Field("M_VERSION"),
            Field("Q_MEDIA"),
            Field("N_PIG"),
            Field("N_TOTAL"),
            Field("M_DUP"),
            Field("M_MCOUNT"),
            Field("NID_C"),
            Field("NID_BG"),
            Field("Q_LINK"),
        ),
    ),
    Header(
        "loop",
        "8.4.3.1",
        33,
        (
            Field("Q_UPDOWN"),
            Field("M_VERSION"),
            Field("Q_MEDIA"),
            Field("NID_C"),
            Field("NID_LOOP"),
        ),
    ),
)
