"""`fishplate decode`: frames to trees, or to text for people."""

from __future__ import annotations

from enum import StrEnum
from typing import TYPE_CHECKING, Annotated, Any

import typer

from fishplate.versions import DEFAULT_VERSION
from fishplate_cli.console import Complaints, coloured, width, write
from fishplate_cli.inputs import (
    DirectionOption,
    FormOption,
    Given,
    Inputs,
    IssueOption,
    MediumOption,
    VersionOption,
    check_frames,
    read_frames,
)
from fishplate_cli.json_output import dump, write_trees

if TYPE_CHECKING:
    from collections.abc import Callable, Iterable, Iterator

    from fishplate.captures import Frame
    from fishplate.frames import Message

    Decoded = Iterable[tuple[Frame, Message]]

HELP = """\
Say what frames mean, or write them as trees.

text is for people: every line begins with the bit it stands at, !! marks a problem and ! a
spare code. jsonl carries time, note and true bit length along, so that `encode` can give the
capture back."""


NOT_SAID_OF_IT = frozenset({"assumed", "inferred", "capture"})
"""Where the version of a frame came from when neither its line nor an option said it."""


class As(StrEnum):
    """What is written."""

    TEXT = "text"
    JSON = "json"
    JSONL = "jsonl"
    YAML = "yaml"


def command(
    inputs: Inputs,
    *,
    view: Annotated[As, typer.Option("--as", help="What to write.")] = As.TEXT,
    medium: MediumOption = None,
    direction: DirectionOption = None,
    version: VersionOption = None,
    issue: IssueOption = None,
    form: FormOption = None,
) -> None:
    """Decode frames."""
    check_frames(inputs)
    given = Given(medium, direction, version, issue, form)
    complaints = Complaints()
    if view is As.TEXT:
        _text(inputs, given, complaints)
    else:
        WRITERS[view](_decoded(inputs, given, complaints))
    complaints.end()


def _decoded(
    inputs: list[str], given: Given, complaints: Complaints
) -> Iterator[tuple[Frame, Message]]:
    for frame in read_frames(inputs, given, complaints):
        if frame.problem:
            continue
        message = given.decode(frame)
        yield frame, message
        complaints.about_message(frame, message)


def _text(inputs: list[str], given: Given, complaints: Complaints) -> None:
    from fishplate_cli.view import View  # noqa: PLC0415  the other forms do without

    view = View(width(), colour=coloured())
    for number, frame in enumerate(read_frames(inputs, given, complaints)):
        if number:
            write("")
        if frame.problem:
            for line in view.unreadable(frame):
                write(line)
            continue
        message = given.decode(frame)
        for line in view.frame(frame, message):
            write(line)
        complaints.about_message(frame, message)


def context(frame: Frame, message: Message, *, full: bool) -> dict[str, Any]:
    """Return what stands beside a tree: time and note, and in full bits and what was assumed."""
    beside: dict[str, Any] = {}
    if frame.time is not None:
        beside["time"] = frame.time
    if frame.note:
        beside["note"] = frame.note
    if full:
        beside["bits"] = frame.bits
        given = _given(frame, message)
        if given:
            beside["given"] = given
        if message.medium == "radio" and message.version_from in NOT_SAID_OF_IT:
            beside["assumed"] = ["version"]
    return beside


def _given(frame: Frame, message: Message) -> dict[str, str]:
    """Return what the capture said of a frame and its tree does not say, or says otherwise."""
    given = {}
    if frame.direction and frame.direction != message.direction:
        given["direction"] = frame.direction
    said = message.medium == "radio" and frame.version == message.version != DEFAULT_VERSION
    if frame.version and not said:
        given["version"] = frame.version
    return given


def _jsonl(decoded: Decoded) -> None:
    for frame, message in decoded:
        write(dump(context(frame, message, full=True) | message.tree()))


def _json(decoded: Decoded) -> None:
    trees = (context(frame, message, full=False) | message.tree() for frame, message in decoded)
    write_trees(trees)


def _yaml(decoded: Decoded) -> None:
    from fishplate_cli.yaml_output import dump as dump_yaml  # noqa: PLC0415  loads PyYAML

    for number, (frame, message) in enumerate(decoded):
        if number:
            write("---")
        write(dump_yaml(context(frame, message, full=False) | message.tree()))


WRITERS: dict[As, Callable[[Decoded], None]] = {
    As.JSON: _json,
    As.JSONL: _jsonl,
    As.YAML: _yaml,
}
