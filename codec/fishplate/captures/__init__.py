"""Captures: frames in order as files and streams hold them, read and written in constant memory.

The only part of the library that opens files. A line that cannot be read becomes a frame with a
`problem` that names the line; it never ends the reading.
"""

from __future__ import annotations

from fishplate.captures.binary import measures_itself
from fishplate.captures.conversation import CaptureDecoder, decode_frames
from fishplate.captures.files import form_by_name, read_capture, read_literal, read_stream
from fishplate.captures.frame import FORMS, Form, Frame, Time, capture_line, time_text

__all__ = [
    "FORMS",
    "CaptureDecoder",
    "Form",
    "Frame",
    "Time",
    "capture_line",
    "decode_frames",
    "form_by_name",
    "measures_itself",
    "read_capture",
    "read_literal",
    "read_stream",
    "time_text",
]
