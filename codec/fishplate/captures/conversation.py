"""Decoding the frames of a capture one after the other, with what they say of system versions.

A radio message does not say which system version it is of. In a capture, frames before it may:
message 32 names the version of the trackside, packet 2 of the train the versions it can speak,
packet 2 of a balise the version ordered for the area.
"""

from __future__ import annotations

from typing import TYPE_CHECKING

from fishplate.bits import BYTE
from fishplate.frames import decode
from fishplate.standard.editions import prints, version_key
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN
from fishplate.versions import closest_layouts, version_text

if TYPE_CHECKING:
    from collections.abc import Iterable, Iterator

    from fishplate.captures.frame import Frame
    from fishplate.frames import Message

TRACKSIDE_VERSION = 32
"""The message in which RBC or RIU names its system version (SUBSET-026 8.7.12)."""

VERSIONS = 2
"""To the train the version order (SUBSET-026 7.4.2.1), to the track the supported versions."""


class Heard:
    """What the frames of a capture have said so far of system versions."""

    def __init__(self) -> None:
        self.trackside: str | None = None
        self.ordered: str | None = None
        self.supported: tuple[str, ...] = ()
        self.inferred: str | None = None

    def hear(self, message: Message) -> None:
        """Take in what a message says, if it says anything of versions."""
        number = message.header.get("NID_MESSAGE")
        if number == TRACKSIDE_VERSION and "M_VERSION" in message.header:
            self.trackside = version_text(message.header["M_VERSION"])
        for packet in message.packets:
            if packet["NID_PACKET"] != VERSIONS or "content" in packet:
                continue
            if message.direction == TO_TRAIN:
                self.ordered = version_text(packet["M_VERSION"])
            else:
                codes = (each["M_VERSION"] for each in packet["versions"])
                self.supported = tuple(map(version_text, codes))

    def version(self, direction: str | None) -> str | None:
        """Return the version of radio messages this way; None where nothing has been said.

        A train that does not know the Y of the trackside speaks the highest below that it knows
        (versions that differ in Y only are compatible, SUBSET-026 3.17.3).
        """
        said = self.trackside or self.ordered
        if said is None or closest_layouts(said) is None:
            return None
        if direction != TO_TRACK or said in self.supported:
            return said
        x, y = version_key(said)
        below = [each for each in self.supported if (x, 0) <= version_key(each) < (x, y)]
        return max(below, key=version_key, default=said)


class CaptureDecoder:
    """Decodes frames leniently, one after the other; each source is a capture of its own.

    `medium`, `direction`, `version` (of radio messages) and `issue` hold for frames that do not
    say it themselves, `version` where no frame before them does either.
    """

    def __init__(
        self,
        *,
        medium: str | None = None,
        direction: str | None = None,
        version: str | None = None,
        issue: str | None = None,
    ) -> None:
        self.medium = medium
        self.direction = direction
        self.version = version
        self.issue = issue
        self.heard = Heard()
        self._source: str | None = None

    def decode(self, frame: Frame) -> Message:
        """Decode one frame; its `version_from` says ``"capture"`` where earlier frames told it."""
        if frame.source != self._source:
            self._source = frame.source
            self.heard = Heard()
        message = self._decoded(frame)
        self.heard.hear(message)
        return message

    def _decoded(self, frame: Frame) -> Message:
        medium = frame.medium or self.medium
        if frame.version is not None and medium == "radio":
            return self._read(frame, medium, frame.version)
        way = frame.direction or self.direction
        told = self.heard.version(way) if medium == "radio" and way else None
        if told is not None:
            message = self._read(frame, medium, told)
            if not message.problems:
                message.version_from = "capture"
                return message
        message = self._read(frame, medium, None)
        if message.medium != "radio":
            return message
        if frame.version is not None:
            return self._read(frame, "radio", frame.version)
        told = self.heard.version(message.direction)
        if told is not None:
            return self._as_told(frame, message, told)
        if self.version is not None:
            return self._read(frame, "radio", self.version)
        return self._as_before(frame, message)

    def _as_told(self, frame: Frame, message: Message, told: str) -> Message:
        """Read a frame in the version that earlier frames named, if that fits."""
        if told == message.version and not message.problems:
            message.version_from = "capture"
            return message
        again = self._read(frame, "radio", told)
        if not again.complete and not message.problems:
            # Of another trackside, or of a session whose beginning is missing.
            message.told = told
            return message
        again.version_from = "capture"
        return again

    def _as_before(self, frame: Frame, message: Message) -> Message:
        """Read a frame of which nothing says the version as the last one that only fitted some."""
        before = self.heard.inferred
        if message.version_from == "inferred" and before not in message.fitting:
            self.heard.inferred = message.version
            return message
        if before in (None, message.version):
            return message
        again = self._read(frame, "radio", before)
        if again.problems:
            return message
        again.version_from = "inferred"
        others = message.fitting or (message.version,)
        again.fitting = (again.version, *(each for each in others if each != again.version))
        return again

    def _read(self, frame: Frame, medium: str | None, version: str | None) -> Message:
        whole = len(frame.data) * BYTE == frame.bits
        issue = self.issue
        if issue and version and not prints(issue, version):
            # The issue is for the versions it prints; a capture may hold others beside them.
            issue = None
        return decode(
            frame.data,
            medium=medium,
            direction=frame.direction or self.direction,
            version=version,
            issue=issue,
            bits=None if whole else frame.bits,
            strict=False,
        )


def decode_frames(
    frames: Iterable[Frame],
    *,
    medium: str | None = None,
    direction: str | None = None,
    version: str | None = None,
    issue: str | None = None,
) -> Iterator[tuple[Frame, Message]]:
    """Yield the frames of a capture with the messages they decode to, leniently.

    Frames that could not be read (`Frame.problem`) are left out. The arguments hold for frames
    that do not say it themselves, as for `CaptureDecoder`.
    """
    decoder = CaptureDecoder(medium=medium, direction=direction, version=version, issue=issue)
    for frame in frames:
        if frame.problem is None:
            yield frame, decoder.decode(frame)
