"""`fishplate encode`: trees to frames."""

from __future__ import annotations

import sys
from decimal import Decimal
from enum import StrEnum
from itertools import chain
from typing import TYPE_CHECKING, Annotated, Any

import typer

from fishplate.authoring import author_bits
from fishplate.bits import to_bytes, to_hex
from fishplate.captures import Frame, capture_line, measures_itself
from fishplate.errors import EncodeError
from fishplate.frames import decode
from fishplate.standard.vocabulary import DIRECTIONS
from fishplate.trees import NumberText, is_left_out, split_context
from fishplate.versions import DEFAULT_VERSION, NAME
from fishplate_cli.authored import TreeForm, is_typed, read_trees
from fishplate_cli.console import Complaints, shortened, visible, write
from fishplate_cli.inputs import STDIN, check_once, is_file

if TYPE_CHECKING:
    from collections.abc import Iterable, Iterator

    from fishplate.trees import Authored

HELP = """\
Write trees (JSON, JSON Lines or YAML; codes or meanings) as frames.

Without --length a balise telegram is filled with ones to 210 or 830 bits, the shorter that holds
it. Time, note and bits beside a tree are not encoded; capture writes time and note again."""

NOT_SEPARABLE = (
    "not written: among several frames as raw bits, only radio messages of the length that their "
    "L_MESSAGE says can be told apart again"
)


class As(StrEnum):
    """What is written."""

    HEX = "hex"
    BITS = "bits"
    BIN = "bin"
    CAPTURE = "capture"


def command(
    inputs: Annotated[
        list[str],
        typer.Argument(
            metavar="INPUT",
            help="Files, - for standard input, or a tree typed as JSON.",
            show_default=False,
        ),
    ],
    *,
    view: Annotated[As, typer.Option("--as", help="What to write.")] = As.HEX,
    length: Annotated[
        int | None,
        typer.Option(
            metavar="BITS",
            min=1,
            help="Fill telegrams with ones to this size, such as 210 or 830.",
            show_default=False,
        ),
    ] = None,
    force: Annotated[
        bool, typer.Option("--force", help="Write lengths as given, even where they are wrong.")
    ] = False,
    form: Annotated[
        TreeForm | None,
        typer.Option(
            "--from",
            help="The form of the input, where its name does not say it.",
            show_default=False,
        ),
    ] = None,
) -> None:
    """Encode trees."""
    check_once(inputs)
    for text in inputs:
        if text != STDIN and not is_typed(text) and not is_file(text):
            raise typer.BadParameter(f"{visible(shortened(text))!r} is no file, and no JSON tree")
    complaints = Complaints()
    frames: Iterator[Frame] = chain.from_iterable(
        _frames(text, form, complaints, length=length, force=force) for text in inputs
    )
    if view is As.BIN:
        frames = _separable(frames, complaints)
    for frame in frames:
        _put(frame, view)
    complaints.end()


def _separable(frames: Iterable[Frame], complaints: Complaints) -> Iterator[Frame]:
    """Yield the only frame, or of several those that raw bits can be split into again."""
    held: Frame | None = None
    several = False
    for frame in frames:
        if held is None and not several and not measures_itself(frame):
            held = frame
            continue
        several = True
        for each in filter(None, (held, frame)):
            if measures_itself(each):
                yield each
            else:
                complaints.say(each.source, NOT_SEPARABLE)
        held = None
    if held is not None:
        yield held


def _put(frame: Frame, view: As) -> None:
    match view:
        case As.HEX:
            write(to_hex(frame.value, frame.bits))
        case As.BITS:
            write(f"{frame.value:0{frame.bits}b}" if frame.bits else "")
        case As.BIN:
            sys.stdout.flush()
            sys.stdout.buffer.write(frame.data)
        case As.CAPTURE:
            write(capture_line(frame))


def _frames(
    text: str, form: TreeForm | None, complaints: Complaints, *, length: int | None, force: bool
) -> Iterator[Frame]:
    name = "standard input" if text == STDIN else text if is_file(text) else "typed tree"
    found = False
    try:
        for authored in read_trees(text, form):
            found = True
            place = _place(name, authored)
            try:
                if authored.problem:
                    raise authored.problem
                if is_left_out(authored.tree):
                    continue
                yield _encoded(authored.tree, place, length=length, force=force)
            except EncodeError as error:
                for each in (error, *error.others):
                    complaints.say(place, each)
        if not found:
            complaints.say(name, "no tree in it")
    except OSError as error:
        complaints.say(name, error.strerror or error)


def _place(name: str, authored: Authored) -> str:
    if authored.line:
        return f"{name} line {authored.line}"
    return f"{name} tree {authored.document}"


def _encoded(authored: dict[str, Any], place: str, *, length: int | None, force: bool) -> Frame:
    tree, beside = split_context(authored)
    value, bits = author_bits(tree, length=length, force=force)
    data = to_bytes(value, bits)
    medium, direction = tree.get("medium"), tree.get("direction")
    if not (medium and direction):
        found = decode(data, bits=bits, medium=medium, direction=direction, strict=False)
        medium, direction = found.medium, found.direction
    version = tree.get("version")
    assumed = beside.get("assumed") or ()
    stated = medium == "radio" and version not in (None, DEFAULT_VERSION)
    stated = stated and "version" not in assumed
    given = _given(beside.get("given"))
    return Frame(
        data,
        bits,
        _time(beside.get("time")),
        medium,
        given.get("direction", direction),
        given.get("version", str(version) if stated else None),
        _note(beside.get("note")),
        source=place,
    )


def _given(given: object) -> dict[str, str]:
    """Return what a capture said of the frame, as `decode --as jsonl` keeps it."""
    if given is None:
        return {}
    if not isinstance(given, dict) or not given.keys() <= {"direction", "version"}:
        raise EncodeError("expected direction or version", path=("given",), got=given)
    if given.get("direction", DIRECTIONS[0]) not in DIRECTIONS:
        reason = f"expected {' or '.join(DIRECTIONS)}"
        raise EncodeError(reason, path=("given", "direction"), got=given["direction"])
    if not NAME.fullmatch(str(given.get("version", DEFAULT_VERSION))):
        reason = f"expected a version such as {DEFAULT_VERSION}"
        raise EncodeError(reason, path=("given", "version"), got=given["version"])
    return {name: str(value) for name, value in given.items()}


def _time(given: object) -> str | int | Decimal | None:
    if isinstance(given, NumberText):
        try:
            return Decimal(given)
        except ArithmeticError:
            reason = f"{shortened(given)} is no number that can be held"
            raise EncodeError(reason, path=("time",), got=given) from None
    if isinstance(given, bool) or not isinstance(given, (str, int, type(None))):
        raise EncodeError("expected text or seconds", path=("time",), got=given)
    return given


def _note(given: object) -> str:
    if not isinstance(given, (str, type(None))):
        raise EncodeError("expected text", path=("note",), got=given)
    return given or ""
