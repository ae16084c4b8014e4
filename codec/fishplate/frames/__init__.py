"""Frames: the units off the wire (balise telegram, loop message, radio message), both ways."""

from __future__ import annotations

from fishplate.frames.decoding import decode
from fishplate.frames.encoding import encode_bits
from fishplate.frames.message import Message, Problem
from fishplate.frames.rows import FieldRow, walk

__all__ = ["FieldRow", "Message", "Problem", "decode", "encode_bits", "walk"]
