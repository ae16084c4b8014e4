"""`fishplate encode`: trees to frames."""

from __future__ import annotations

import io
import sys
from decimal import Decimal
from enum import StrEnum
from pathlib import Path
from typing import IO, TYPE_CHECKING, Annotated, Any, cast

import typer

from fishplate.authoring import author_bits
from fishplate.bits import to_bytes, to_hex
from fishplate.captures import Frame, capture_line
from fishplate.captures.lines import read_lines
from fishplate.errors import EncodeError
from fishplate.frames import decode
from fishplate.trees import (
    Authored,
    NumberText,
    parse_json,
    read_json,
    read_json_lines,
    read_yaml,
    split_context,
)
from fishplate.versions import DEFAULT_VERSION
from fishplate_cli.console import Complaints, shortened, visible, write
from fishplate_cli.inputs import STDIN, is_file, stdin

if TYPE_CHECKING:
    from collections.abc import Iterable, Iterator

HELP = """\
Write trees (JSON, JSON Lines or YAML; codes or meanings) as frames.

Without --length a balise telegram is filled with ones to 210 or 830 bits, the shorter that holds
it. Time, note and bits beside a tree are not encoded; capture writes time and note again."""

LONGEST_LINE = 1 << 20
"""Bytes of the longest line with a tree on it: trees are many times longer than their frames."""

JSON_STARTS = ("{", "[")
SUFFIXES = {".json": "json", ".jsonl": "jsonl", ".ndjson": "jsonl", ".yaml": "yaml", ".yml": "yaml"}


class As(StrEnum):
    """What is written."""

    HEX = "hex"
    BITS = "bits"
    BIN = "bin"
    CAPTURE = "capture"


class TreeForm(StrEnum):
    """The forms trees come in."""

    JSON = "json"
    JSONL = "jsonl"
    YAML = "yaml"


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
    for text in inputs:
        if text != STDIN and not text.lstrip().startswith(JSON_STARTS) and not is_file(text):
            raise typer.BadParameter(f"{visible(shortened(text))!r} is no file, and no JSON tree")
    complaints = Complaints()
    for text in inputs:
        for frame in _frames(text, form, complaints, length=length, force=force):
            _put(frame, view)
    complaints.end()


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
        for authored in _trees(text, form):
            found = True
            place = _place(name, authored)
            try:
                if authored.problem:
                    raise authored.problem
                yield _encoded(authored.tree, length=length, force=force)
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


def _encoded(authored: dict[str, Any], *, length: int | None, force: bool) -> Frame:
    tree, beside = split_context(authored)
    value, bits = author_bits(tree, length=length, force=force)
    data = to_bytes(value, bits)
    medium, direction = tree.get("medium"), tree.get("direction")
    if not (medium and direction):
        found = decode(data, bits=bits, medium=medium, direction=direction, strict=False)
        medium, direction = found.medium, found.direction
    version = tree.get("version")
    stated = medium == "radio" and version not in (None, DEFAULT_VERSION)
    return Frame(
        data,
        bits,
        _time(beside.get("time")),
        medium,
        direction,
        str(version) if stated else None,
        _note(beside.get("note")),
    )


def _time(given: object) -> str | int | Decimal | None:
    if isinstance(given, NumberText):
        return Decimal(given)
    if isinstance(given, bool) or not isinstance(given, (str, int, type(None))):
        raise EncodeError("expected text or seconds", path=("time",), got=given)
    return given


def _note(given: object) -> str:
    if not isinstance(given, (str, type(None))):
        raise EncodeError("expected text", path=("note",), got=given)
    return given or ""


def _trees(text: str, form: TreeForm | None) -> Iterator[Authored]:
    if text == STDIN:
        yield from _from_stream(stdin(), form)
    elif is_file(text):
        suffix = Path(text).suffix.lower()
        known = TreeForm(SUFFIXES[suffix]) if suffix in SUFFIXES else None
        with Path(text).open("rb") as stream:
            yield from _from_stream(stream, form or known)
    else:
        yield from read_json(text)


def _from_stream(stream: IO[bytes], form: TreeForm | None) -> Iterator[Authored]:
    if form is None:
        form, stream = _sniffed(stream)
    if form is TreeForm.JSONL:
        yield from read_json_lines(_numbered(stream))
        return
    try:
        text = stream.read().decode("utf-8-sig")
    except UnicodeDecodeError as error:
        problem = EncodeError(f"byte {error.start + 1} of the file is not UTF-8")
        yield Authored(1, 0, None, problem)
        return
    yield from read_yaml(text) if form is TreeForm.YAML else read_json(text)


def _sniffed(stream: IO[bytes]) -> tuple[TreeForm, IO[bytes]]:
    """Tell the form by the first line that holds anything; return the stream unread."""
    start = b""
    while (line := stream.readline(LONGEST_LINE)) and not line.strip():
        start += line
    again = cast("IO[bytes]", _Again(start + line, stream))
    text = line.decode(errors="replace").removeprefix("\ufeff").lstrip()
    if not text.startswith(JSON_STARTS):
        return TreeForm.YAML, again
    try:
        whole = isinstance(parse_json(text), dict)
    except EncodeError:
        return TreeForm.JSON, again
    return TreeForm.JSONL if whole else TreeForm.JSON, again


class _Again:
    """A stream whose beginning has been looked at already."""

    def __init__(self, start: bytes, stream: IO[bytes]) -> None:
        self.start = io.BytesIO(start)
        self.stream = stream

    def readline(self, size: int = -1) -> bytes:
        return self.start.readline(size) or self.stream.readline(size)

    def read(self) -> bytes:
        return self.start.read() + self.stream.read()


def _numbered(stream: IO[bytes]) -> Iterable[tuple[int, str, EncodeError | None]]:
    for line in read_lines(stream, LONGEST_LINE):
        problem = EncodeError(line.problem.reason) if line.problem else None
        yield line.number, line.text, problem
