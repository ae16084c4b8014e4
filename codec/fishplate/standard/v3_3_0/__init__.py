"""SUBSET-026 issue 3.3.0 of 07/03/2012, which introduces system version 2.0."""

from __future__ import annotations

from fishplate.standard.compose import composed
from fishplate.standard.v3_3_0 import messages, packets, variables
from fishplate.standard.v3_6_0 import DECLARATIONS as V3_6_0
from fishplate.standard.vocabulary import Revision

DECLARATIONS = composed(
    V3_6_0,
    Revision(
        renamed=variables.RENAMED,
        amended_variables=variables.AMENDED,
        recoded=variables.RECODED,
        without_variables=variables.WITHOUT,
        packets=packets.PACKETS,
        amended_packets=packets.AMENDED,
        without_packets=packets.WITHOUT,
        messages=messages.MESSAGES,
        amended_messages=messages.AMENDED,
    ),
    layouts="v3_3_0",
    version="2.0",
    issue="3.3.0",
    date="07/03/2012",
)
