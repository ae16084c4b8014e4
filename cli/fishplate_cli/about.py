"""`fishplate about`: what the standard says of a variable, a packet, a message or a header."""

from __future__ import annotations

import json
from dataclasses import asdict
from enum import StrEnum
from typing import TYPE_CHECKING, Annotated, Any

import typer

from fishplate.errors import RegistryError
from fishplate.standard import registry
from fishplate.standard.as_json import node_to_json
from fishplate.standard.vocabulary import Header, Packet, RadioMessage, Variable
from fishplate_cli.console import visible, width, write
from fishplate_cli.describe import Description
from fishplate_cli.lookup import NotFoundError, carriers, look_up, users

if TYPE_CHECKING:
    from fishplate.standard import Registry
    from fishplate_cli.lookup import Found

HELP = """\
Say what a variable, packet, message or header is: bits, codes, clause, and where it is used.

WORD is a name (also one of an earlier issue), a number, or part of the name of a packet or
message; packet, message, to-train and to-track narrow it down. --schema prints the JSON Schema of
authored trees instead; without WORD, that of any frame."""


class As(StrEnum):
    """What is written."""

    TEXT = "text"
    JSON = "json"


def command(
    words: Annotated[
        list[str] | None,
        typer.Argument(metavar="WORD", help="What to look up.", show_default=False),
    ] = None,
    *,
    view: Annotated[As, typer.Option("--as", help="What to write.")] = As.TEXT,
    schema: Annotated[bool, typer.Option("--schema", help="Print the JSON Schema.")] = False,
    version: Annotated[
        str, typer.Option(metavar="X.Y", help="The system version to look in.")
    ] = "2.1",
) -> None:
    """Look something up."""
    try:
        book = registry(version)
    except RegistryError as error:
        raise typer.BadParameter(str(error), param_hint="--version") from None
    if schema:
        write(json.dumps(_schema(book, words or []), indent=2, ensure_ascii=False))
        return
    if not words:
        raise typer.BadParameter("say what to look up", param_hint="WORD")
    found = _found(book, words)
    if view is As.JSON:
        every = [as_json(book, each) for each in found]
        write(json.dumps(every[0] if len(every) == 1 else every, indent=2, ensure_ascii=False))
        return
    description = Description(book, width())
    for number, each in enumerate(found):
        if number:
            write("")
        for line in description.lines(each):
            write(line)


def _found(book: Registry, words: list[str]) -> list[Found]:
    try:
        return look_up(book, words)
    except NotFoundError as error:
        raise typer.BadParameter(visible(str(error)), param_hint="WORD") from None


def _schema(book: Registry, words: list[str]) -> dict[str, Any]:
    from fishplate.models import json_schema  # noqa: PLC0415  loads pydantic

    if not words or words == ["frame"]:
        return json_schema("frame", version=book.version)
    match _found(book, words):
        case [Packet() | RadioMessage() as found]:
            kind = "packet" if isinstance(found, Packet) else "message"
            return json_schema(kind, found.direction, found.number, version=book.version)
        case [Header() as found]:
            kind = "telegram" if found.medium == "balise" else "loop"
            return json_schema(kind, version=book.version)
        case [Variable()]:
            reason = "a variable has no schema of its own: name the packet or message it stands in"
        case several:
            names = "; ".join(f"{_kind(each)} {_key(each)}" for each in several)
            reason = f"that is more than one thing, name one: {names}"
    raise typer.BadParameter(reason, param_hint="WORD")


def _kind(found: Found) -> str:
    return "message" if isinstance(found, RadioMessage) else type(found).__name__.lower()


def _key(found: Found) -> str:
    match found:
        case Packet() | RadioMessage():
            return f"{found.number} {found.direction}"
        case Header():
            return found.medium
    return found.name


def as_json(book: Registry, found: Found) -> dict[str, Any]:
    """Return what is declared of one thing as plain data."""
    data: dict[str, Any] = {"kind": _kind(found), "issue": book.issue} | asdict(found)
    if not isinstance(found, Variable):
        data["nodes"] = [node_to_json(each) for each in found.nodes]
    if isinstance(found, Variable):
        data["used_in"] = [f"{_kind(each)} {_key(each)}" for each in users(book, found)]
    if isinstance(found, Packet):
        data["carried_by"] = [
            {"message": each.number, "how": how} for each, how in carriers(book, found)
        ]
    return data
