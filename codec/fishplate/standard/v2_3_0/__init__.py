"""System version 1.0 as SUBSET-026 issue 2.3.0 of 24/02/2006 printed it.

Declared from X = 1 as it is handled today, which repeats most of its layouts. Clause 8.5 of this
issue does not say who sends a message.
"""

from __future__ import annotations

from dataclasses import replace

from fishplate.standard.compose import composed
from fishplate.standard.v2_3_0 import messages, packets, variables
from fishplate.standard.vocabulary import TO_TRAIN, Evidence, Revision
from fishplate.standard.x1_chapter6 import DECLARATIONS as X1

NO_SENDERS = {
    (each.direction, each.number): {"senders": ()} | dict(messages.AMENDED.get(key, {}))
    for each in (*X1.messages, *messages.MESSAGES)
    for key in [(each.direction, each.number)]
}

EVIDENCE = (
    Evidence(
        "inferred",
        "what follows Q_TRACKINIT is indented without a condition: taken as for Q_TRACKINIT = 0",
        ("packet", TO_TRAIN, 51),
    ),
    Evidence(
        "inferred",
        "NID_STM is worded to depend on M_LEVELTR, which is not in the packet: taken as the "
        "M_LEVELTEXTDISPLAY before it",
        ("packet", TO_TRAIN, 72),
    ),
)

DECLARED = composed(
    X1,
    Revision(packets=packets.PACKETS),
    Revision(
        renamed=variables.RENAMED,
        variables=variables.VARIABLES,
        amended_variables=variables.AMENDED,
        recoded=variables.RECODED,
        without_variables=variables.WITHOUT,
        amended_packets=packets.AMENDED,
        without_packets=packets.WITHOUT,
        messages=messages.MESSAGES,
        amended_messages=NO_SENDERS,
    ),
    layouts="v2_3_0",
    version="1.0",
    issue="2.3.0",
    date="24/02/2006",
)

DECLARATIONS = replace(DECLARED, evidence=EVIDENCE)
