"""From the INPUT arguments to frames: files, standard input, and frames that were typed."""

from __future__ import annotations

import errno
import os
import re
import sys
from dataclasses import replace
from enum import StrEnum
from pathlib import Path
from typing import IO, TYPE_CHECKING, Annotated

import typer

from fishplate.captures import CaptureDecoder, Frame, form_by_name, read_literal, read_stream
from fishplate.errors import DecodeError, FishplateError
from fishplate.standard.editions import known_issues, prints
from fishplate.versions import NAME
from fishplate_cli.console import Complaints, Progress, shortened, visible

if TYPE_CHECKING:
    from collections.abc import Collection, Iterator, Sequence

    from fishplate.captures import Form
    from fishplate.frames import Message

STDIN = "-"
LITERAL = re.compile(
    r"\s*(?:0b[01\s]*[01]|base64:.*|0[xX].+|[0-9A-Fa-f\s]*[0-9A-Fa-f])\s*", re.DOTALL
)
TREE_SUFFIXES = frozenset({".yaml", ".yml"})
"""Files that hold authored trees and never frames."""
NEARLY_HEX = re.compile(r"\s*(?:0[xXbB])?[0-9A-Fa-f]{4}[^./\\]*")
SHOWN = 60
NAMED = 8
"""Keys and columns that are named where a file has some that mean nothing."""


class Medium(StrEnum):
    """What carried a frame."""

    BALISE = "balise"
    LOOP = "loop"
    RADIO = "radio"


class Direction(StrEnum):
    """Which way a frame went."""

    TO_TRAIN = "to-train"
    TO_TRACK = "to-track"


class FrameForm(StrEnum):
    """The forms a capture comes in."""

    HEX = "hex"
    JSONL = "jsonl"
    CSV = "csv"
    BIN = "bin"


def _version(value: str | None) -> str | None:
    if value is not None and not NAME.fullmatch(value):
        raise typer.BadParameter(f"{value!r} is not a system version such as 2.1")
    return value


def _issue(value: str | None) -> str | None:
    if value is not None and value not in known_issues():
        raise typer.BadParameter(f"{value!r} is none of {', '.join(known_issues())}")
    return value


Inputs = Annotated[
    list[str],
    typer.Argument(
        metavar="INPUT",
        help="Files, - for standard input, or frames: hex digits, 0b and bits, base64: and text.",
        show_default=False,
    ),
]
MediumOption = Annotated[
    Medium | None,
    typer.Option(help="The medium of frames that do not say it.", show_default=False),
]
DirectionOption = Annotated[
    Direction | None,
    typer.Option(help="The direction of frames that do not say it.", show_default=False),
]
VersionOption = Annotated[
    str | None,
    typer.Option(
        metavar="X.Y",
        help="The system version of radio messages where the capture does not say it.",
        callback=_version,
        show_default=False,
    ),
]
IssueOption = Annotated[
    str | None,
    typer.Option(
        metavar="N.N.N",
        help="Read versions as this issue of SUBSET-026 prints them (2.3.0 for 1.0).",
        callback=_issue,
        show_default=False,
    ),
]
FormOption = Annotated[
    FrameForm | None,
    typer.Option(
        "--from", help="The form of the input, where its name does not say it.", show_default=False
    ),
]


class Given:
    """What the caller said about frames that do not say it themselves."""

    def __init__(
        self,
        medium: Medium | None = None,
        direction: Direction | None = None,
        version: str | None = None,
        issue: str | None = None,
        form: FrameForm | None = None,
    ) -> None:
        if version and issue and not prints(issue, version):
            reason = f"issue {issue} does not lay out version {version}"
            raise typer.BadParameter(reason, param_hint="--issue")
        self.medium = medium.value if medium else None
        self.form: Form | None = form.value if form else None
        self.decoder = CaptureDecoder(
            medium=self.medium,
            direction=direction.value if direction else None,
            version=version,
            issue=issue,
        )

    def decode(self, frame: Frame) -> Message:
        """Decode a frame leniently, with what earlier frames of its capture said of versions."""
        return self.decoder.decode(frame)


def is_file(text: str) -> bool:
    """Tell whether an argument names a file; a folder is wrong usage."""
    if not os.path.exists(text):  # noqa: PTH110  says no to any text, however long
        return False
    if Path(text).is_dir():
        raise typer.BadParameter(f"{visible(text)} is a folder, a file is wanted")
    return True


def check_once(inputs: Sequence[str]) -> None:
    """Raise wrong usage where standard input is to be read more than once."""
    if list(inputs).count(STDIN) > 1:
        raise typer.BadParameter("standard input can be read only once")


def check_frames(inputs: Sequence[str]) -> None:
    """Raise wrong usage for an argument that is neither file nor frame."""
    check_once(inputs)
    for text in inputs:
        if text != STDIN and not is_file(text) and not LITERAL.fullmatch(text):
            raise typer.BadParameter(_neither(text))


def _neither(text: str) -> str:
    shown = visible(text if len(text) <= SHOWN else f"{text[:SHOWN]}…")
    if NEARLY_HEX.fullmatch(text):
        try:
            read_literal(text)
        except FishplateError as error:
            return f"{shown!r} is no file, and no frame: {error.reason}"
    return f"{shown!r} is no file, and no frame in hex, 0b or base64:"


def read_frames(inputs: Sequence[str], given: Given, complaints: Complaints) -> Iterator[Frame]:
    """Yield the frames of all inputs, numbered through; what cannot be read is complained of.

    A frame with a `problem` is yielded too: views that show places say there what is missing.
    """
    check_frames(inputs)
    index = 0
    for text in inputs:
        passed_over: dict[str, None] = {}
        name = "standard input" if text == STDIN else shortened(text)
        try:
            for frame in _frames_of(text, given):
                for problem in filter(None, (frame.problem, frame.flaw)):
                    complaints.about_frame(frame, problem)
                if frame.passed_over and len(passed_over) <= NAMED:
                    passed_over.update(dict.fromkeys(frame.passed_over))
                yield frame if frame.index == index else replace(frame, index=index)
                index += 1
        except (DecodeError, OSError) as error:
            reason = error.strerror if isinstance(error, OSError) else error
            complaints.say(name, reason or error)
        if passed_over:
            complaints.note(name, f"passed over, no part of a capture: {_listed(passed_over)}")


def _listed(names: Collection[str]) -> str:
    shown = [shortened(each) for each in names][:NAMED]
    return ", ".join(shown) + (" and more" if len(names) > NAMED else "")


def _frames_of(text: str, given: Given) -> Iterator[Frame]:
    if text == STDIN:
        yield from read_stream(stdin(), "standard input", form=given.form, medium=given.medium)
    elif is_file(text) and Path(text).suffix.lower() in TREE_SUFFIXES:
        yield Frame(source=text, problem=DecodeError("holds trees, which `encode` reads"))
    elif is_file(text):
        yield from _with_progress(text, given)
    else:
        try:
            yield read_literal(text)
        except DecodeError as error:
            yield Frame(source=text, problem=error)


def stdin() -> IO[bytes]:
    """Return standard input as bytes; raises `OSError` where there is none."""
    if sys.stdin is None:
        raise OSError(errno.EBADF, "closed")
    return sys.stdin.buffer


def _with_progress(path: str, given: Given) -> Iterator[Frame]:
    form = given.form or form_by_name(path)
    with Path(path).open("rb") as stream:
        regular = Path(path).is_file()
        progress = Progress(Path(path).name, os.fstat(stream.fileno()).st_size if regular else 0)
        try:
            for frame in read_stream(stream, path, form=form, medium=given.medium):
                if progress.wanted:
                    progress.at(stream.tell(), frame.index)
                yield frame
        finally:
            progress.end()
