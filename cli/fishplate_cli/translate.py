"""`fishplate translate`: frames of one system version in another."""

from __future__ import annotations

from dataclasses import replace
from enum import StrEnum
from pathlib import Path
from textwrap import wrap
from typing import TYPE_CHECKING, Annotated, Any, NamedTuple

import typer

from fishplate.bits import to_bytes, to_hex
from fishplate.captures import CaptureDecoder, capture_line
from fishplate.errors import EncodeError, path_text
from fishplate.frames import encode_bits
from fishplate.translation import VERSIONS, translate
from fishplate.translation.stored import stored_values
from fishplate_cli.console import Complaints, coloured, style, visible, width, write
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
    from collections.abc import Iterable, Iterator, Mapping

    from fishplate.captures import Frame
    from fishplate.translation import Change, Translation

HELP = """\
Translate frames into another system version: 1.0, 1.1, 2.0 or 2.1.

The rules are those of SUBSET-026 chapter 6. They are published for data of X = 1 to the train and
for data to the track from X = 2; the opposite directions are their reverse, marked as derived.
What is mapped, defaulted, dropped or rejected is said with its clause: behind each frame, under
changes in json and jsonl, on standard error otherwise. One spare code in a message of X = 1 to the
train rejects the whole message, as 6.6.3.1.1 has it."""

NO_MAPPING = "expected one mapping of variables and their values"
MARK = "~"
INDENT = "  "


class As(StrEnum):
    """What is written."""

    TEXT = "text"
    JSON = "json"
    JSONL = "jsonl"
    HEX = "hex"
    CAPTURE = "capture"


class Translated(NamedTuple):
    """A frame, what it was translated to, and the frame that this makes, if anything is sent."""

    source: Frame
    translation: Translation
    frame: Frame | None


def _target(value: str) -> str:
    if value not in VERSIONS:
        raise typer.BadParameter(f"{value!r} is none of {', '.join(VERSIONS)}")
    return value


def command(
    inputs: Inputs,
    *,
    to: Annotated[
        str,
        typer.Option(
            "--to",
            metavar="X.Y",
            help=f"The version to translate into: {', '.join(VERSIONS)}.",
            callback=_target,
            show_default=False,
        ),
    ],
    view: Annotated[As, typer.Option("--as", help="What to write.")] = As.TEXT,
    stored: Annotated[
        Path | None,
        typer.Option(
            metavar="FILE",
            help="YAML with what the train has stored: variables of packet 3, NID_OPERATIONAL, "
            "telephone_numbers.",
            exists=True,
            dir_okay=False,
            show_default=False,
        ),
    ] = None,
    medium: MediumOption = None,
    direction: DirectionOption = None,
    version: VersionOption = None,
    issue: IssueOption = None,
    form: FormOption = None,
) -> None:
    """Translate frames."""
    check_frames(inputs)
    values = _stored(stored) if stored else None
    given = Given(medium, direction, version, issue, form)
    complaints = Complaints()
    translated = _translated(inputs, given, complaints, to, values)
    match view:
        case As.TEXT:
            _text(translated)
        case As.JSON:
            write_trees(_tree(each, full=False) for each in translated)
        case As.JSONL:
            for each in translated:
                write(dump(_tree(each, full=True)))
        case As.HEX | As.CAPTURE:
            _frames(translated, view, complaints)
    complaints.end()


def _stored(path: Path) -> Mapping[str, Any]:
    """Read the file of stored values; anything wrong with it is wrong usage."""
    from fishplate.trees import read_yaml  # noqa: PLC0415  only this option needs it

    try:
        found = list(read_yaml(path.read_text(encoding="utf-8-sig")))
        problem = found[0].problem if len(found) == 1 else EncodeError(NO_MAPPING)
        if problem is None:
            return stored_values(found[0].tree)
        reason = str(problem)
    except UnicodeDecodeError as error:
        reason = f"byte {error.start + 1} of the file is not UTF-8"
    except OSError as error:
        reason = error.strerror or str(error)
    except EncodeError as error:
        reason = str(error)
    raise typer.BadParameter(f"{visible(str(path))}: {visible(reason)}")


def _translated(
    inputs: list[str],
    given: Given,
    complaints: Complaints,
    to: str,
    stored: Mapping[str, Any] | None,
) -> Iterator[Translated]:
    """Yield what can be translated; the rest is complained of."""
    for frame in read_frames(inputs, given, complaints):
        if frame.problem:
            continue
        message = given.decode(frame)
        try:
            translation = translate(message, to, stored=stored)
            made = _frame(frame, translation.tree) if translation.tree else None
        except EncodeError as error:
            complaints.about_frame(frame, error)
            continue
        yield Translated(frame, translation, made)
        complaints.about_message(frame, message)


def _frame(source: Frame, tree: dict[str, Any]) -> Frame:
    value, bits = encode_bits(tree)
    radio = tree.get("medium") == "radio"
    return replace(
        source,
        data=to_bytes(value, bits),
        bits=bits,
        medium=tree.get("medium"),
        direction=tree.get("direction"),
        version=tree.get("version") if radio else None,
        flaw=None,
    )


def _frames(translated: Iterable[Translated], view: As, complaints: Complaints) -> None:
    """Write frames alone; what has changed goes to standard error."""
    for each in translated:
        if each.frame and view is As.CAPTURE:
            write(capture_line(each.frame))
        elif each.frame:
            write(to_hex(each.frame.value, each.frame.bits))
        for change in each.translation.changes:
            complaints.note(each.source.place, change_text(change))


def change_text(change: Change) -> str:
    """Return where, what, and on which ground."""
    grounds = [change.clause]
    if not change.stated:
        grounds.append("derived")
    if change.lossy:
        grounds.append("lossy")
    return f"{path_text(change.path)}: {change.message} [{', '.join(grounds)}]"


def _tree(each: Translated, *, full: bool) -> dict[str, Any]:
    """Return the translated tree with what stands beside it, and what has changed."""
    frame = each.source
    tree: dict[str, Any] = {}
    if frame.time is not None:
        tree["time"] = frame.time
    if frame.note:
        tree["note"] = frame.note
    if full and each.frame:
        tree["bits"] = each.frame.bits
    tree |= each.translation.tree or {}
    return {**tree, "changes": [change.tree() for change in each.translation.changes]}


def _text(translated: Iterable[Translated]) -> None:
    from fishplate_cli.view import View  # noqa: PLC0415  the other forms do without

    columns, colour = width(), coloured()
    view = View(columns, colour=colour)
    for number, each in enumerate(translated):
        if number:
            write("")
        if each.frame is None:
            title = f"frame {each.source.index}  nothing is left"
            write(style(title, "bold", colour=colour))
        else:
            for line in view.frame(each.frame, CaptureDecoder().decode(each.frame)):
                write(line)
        for change in each.translation.changes:
            text = visible(f"{MARK} {change_text(change)}")
            for line in wrap(text, columns, initial_indent=INDENT, subsequent_indent=INDENT * 2):
                write(style(line, "mark" if change.lossy else "faint", colour=colour))
