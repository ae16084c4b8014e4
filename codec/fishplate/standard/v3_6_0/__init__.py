"""SUBSET-026 issue 3.6.0 of 13/05/2016, which introduces system version 2.1."""

from __future__ import annotations

from fishplate.standard.v3_6_0.headers import HEADERS
from fishplate.standard.v3_6_0.messages import MESSAGES
from fishplate.standard.v3_6_0.to_track import PACKETS as TO_TRACK_PACKETS
from fishplate.standard.v3_6_0.to_train import PACKETS as TO_TRAIN_PACKETS
from fishplate.standard.v3_6_0.variables import VARIABLES
from fishplate.standard.vocabulary import Declarations

DECLARATIONS = Declarations(
    layouts="v3_6_0",
    version="2.1",
    issue="3.6.0",
    date="13/05/2016",
    variables=VARIABLES,
    packets=TO_TRAIN_PACKETS + TO_TRACK_PACKETS,
    messages=MESSAGES,
    headers=HEADERS,
)
