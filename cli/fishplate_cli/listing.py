"""`fishplate list`: one line a frame."""

from __future__ import annotations

from typing import TYPE_CHECKING

from fishplate.frames.sizes import END_FLAG
from fishplate_cli.console import Complaints, coloured, counted, shown_time, style, write
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
from fishplate_cli.wording import NOT_SURE, book_of, message_name, reference, same_in_every_version

if TYPE_CHECKING:
    from fishplate.captures import Frame
    from fishplate.frames import Message
    from fishplate.standard import Registry

HELP = """\
List frames, one line each: number, time, direction, system version, what it is, its reference,
its packets. ? marks a version that is assumed or inferred, any a message that is
the same in every version.

!! marks a frame with problems and names their kinds."""

DIRECTION = 8
VERSION = 4
WHAT = 11
REFERENCE = 16


def command(
    inputs: Inputs,
    *,
    medium: MediumOption = None,
    direction: DirectionOption = None,
    version: VersionOption = None,
    issue: IssueOption = None,
    form: FormOption = None,
) -> None:
    """List frames."""
    check_frames(inputs)
    given = Given(medium, direction, version, issue, form)
    complaints = Complaints()
    colour = coloured()
    time_width = 1
    for frame in read_frames(inputs, given, complaints):
        if frame.problem:
            where = f"line {frame.line} " if frame.line else ""
            mark = style(f"!! {where}not readable", "problem", colour=colour)
            write(f"{frame.index:>4}  {'-':<{time_width}}  {mark}")
            continue
        message = given.decode(frame)
        time = shown_time(frame) or "-"
        time_width = max(time_width, len(time))
        write(f"{frame.index:>4}  {time:<{time_width}}  {line(frame, message, colour=colour)}")
        complaints.about_message(frame, message)
    complaints.end()


def line(frame: Frame, message: Message, *, colour: bool) -> str:
    """Return what the line says after number and time."""
    book = book_of(message)
    header = message.header
    name = ""
    match message.medium:
        case "radio" if "NID_MESSAGE" in header:
            what = f"message {header['NID_MESSAGE']}"
            name = message_name(message, book)
        case "balise" if header:
            what = f"balise {header['N_PIG'] + 1}/{header['N_TOTAL'] + 1}"
        case None:
            what = counted(frame.bits, "bit")
        case _:
            what = message.medium
    numbers = [each["NID_PACKET"] for each in message.packets if each["NID_PACKET"] != END_FLAG]
    packets = f"packets {' '.join(map(str, numbers))}" if numbers else "no packets"
    text = f"{message.direction or '-':<{DIRECTION}}  {_version(message, book):<{VERSION}}"
    text += f"  {what:<{WHAT}}"
    text += f"  {reference(message, book):<{REFERENCE}}"
    text += f"  {name}, {packets}" if name else f"  {packets}"
    if message.problems:
        kinds = ", ".join(dict.fromkeys(each.kind for each in message.problems))
        text += style(f"  !! {kinds}", "problem", colour=colour)
    return text


def _version(message: Message, book: Registry) -> str:
    if same_in_every_version(message, book):
        return "any"
    if not message.version or message.medium is None:
        return "-"
    return message.version + ("?" if message.version_from in NOT_SURE else "")
