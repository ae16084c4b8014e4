"""System versions 1.0 and 1.1 as chapter 6 of SUBSET-026 issue 3.6.0 (13/05/2016) lays them out.

Precedence: what chapter 6 says of a variable, packet or message (clauses 6.5.1.5 and 6.5.1.6)
replaces what chapters 7 and 8 say of it; all else that a version with X = 1 may use stays as
chapters 7 and 8 have it.
"""

from __future__ import annotations

from dataclasses import replace

from fishplate.standard.compose import composed
from fishplate.standard.v3_6_0 import DECLARATIONS as V3_6_0
from fishplate.standard.vocabulary import TO_TRAIN, Evidence, Revision
from fishplate.standard.x1_chapter6 import messages, packets, variables

CHAPTERS_7_AND_8 = V3_6_0
CHAPTER_6 = Revision(
    renamed=variables.RENAMED,
    variables=variables.VARIABLES,
    amended_variables=variables.AMENDED,
    recoded=variables.RECODED,
    without_variables=variables.WITHOUT,
    packets=packets.PACKETS,
    amended_packets=packets.AMENDED,
    without_packets=packets.WITHOUT,
    messages=messages.MESSAGES,
    amended_messages=messages.AMENDED,
    without_messages=messages.WITHOUT,
)
"""What comes before chapters 7 and 8."""

EVIDENCE = (
    Evidence(
        "weaker",
        "named in packet 3, but defined in no clause of chapter 6: as its successor is defined",
        ("variable", "Q_NVSRBKTRG"),
    ),
    Evidence(
        "inferred",
        "optional packets as in issue 3.6.0; issue 2.3.0 has packet 80 only",
        ("message", TO_TRAIN, 9),
    ),
)

DECLARATIONS = replace(
    composed(
        CHAPTERS_7_AND_8,
        CHAPTER_6,
        layouts="x1_chapter6",
        version="1.0",
        issue="3.6.0",
        date="13/05/2016",
    ),
    evidence=EVIDENCE,
)
