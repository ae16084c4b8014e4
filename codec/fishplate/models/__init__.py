"""pydantic models of packets, messages, telegrams and loop messages, built when asked for.

They take authored input (codes or meanings), report all errors at once, each with its path,
and give JSON Schema. Decoding never needs them.
"""

from __future__ import annotations

from fishplate.models.frames import (
    codes_of,
    loop_model,
    message_model,
    packet_model,
    telegram_model,
)
from fishplate.models.schema import json_schema

__all__ = [
    "codes_of",
    "json_schema",
    "loop_model",
    "message_model",
    "packet_model",
    "telegram_model",
]
