"""SUBSET-026 issue 4.0.0 of 05/07/2023, which introduces system versions 2.2, 2.3 and 3.0."""

from __future__ import annotations

from dataclasses import replace

from fishplate.standard.compose import composed
from fishplate.standard.v3_6_0 import DECLARATIONS as V3_6_0
from fishplate.standard.v4_0_0 import messages, packets, variables
from fishplate.standard.vocabulary import TO_TRAIN, Evidence, Revision

EVIDENCE = (
    Evidence("weaker", "issue 4.0.0 is declared from a text conversion of its tables"),
    Evidence(
        "inferred",
        "NID_LRBG added from the standard format 8.4.4.6.1: the conversion stops before it",
        ("message", TO_TRAIN, 38),
    ),
    Evidence(
        "inferred",
        "NID_MN depends on a misspelt Q_NETWORTYPE: taken as Q_NETWORKTYPE",
        ("packet", TO_TRAIN, 45),
    ),
    Evidence(
        "weaker",
        "printed in hours, in steps of 24; declared in days, with the same codes",
        ("variable", "T_VBC"),
    ),
)

DECLARATIONS = replace(
    composed(
        V3_6_0,
        Revision(
            renamed=variables.RENAMED,
            variables=variables.VARIABLES,
            amended_variables=variables.AMENDED,
            recoded=variables.RECODED,
            packets=packets.PACKETS,
            amended_packets=packets.AMENDED,
            without_packets=packets.WITHOUT,
            messages=messages.MESSAGES,
            amended_messages=messages.AMENDED,
        ),
        layouts="v4_0_0",
        version="3.0",
        issue="4.0.0",
        date="05/07/2023",
    ),
    evidence=EVIDENCE,
)
