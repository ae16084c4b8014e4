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
    MediumOption,
    VersionOption,
    check_frames,
    read_frames,
)
from fishplate_cli.wording import book_of, message_name, reference

if TYPE_CHECKING:
    from fishplate.captures import Frame
    from fishplate.frames import Message

HELP = """\
List frames, one line each: number, time, direction, what it is, its reference, its packets.

!! marks a frame with problems and names their kinds."""

DIRECTION = 8
WHAT = 11
REFERENCE = 16


def command(
    inputs: Inputs,
    *,
    medium: MediumOption = None,
    direction: DirectionOption = None,
    version: VersionOption = None,
    form: FormOption = None,
) -> None:
    """List frames."""
    check_frames(inputs)
    given = Given(medium, direction, version, form)
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
    text = f"{message.direction or '-':<{DIRECTION}}  {what:<{WHAT}}"
    text += f"  {reference(message, book):<{REFERENCE}}"
    text += f"  {name}, {packets}" if name else f"  {packets}"
    if message.problems:
        kinds = ", ".join(dict.fromkeys(each.kind for each in message.problems))
        text += style(f"  !! {kinds}", "problem", colour=colour)
    return text
