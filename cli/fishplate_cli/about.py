"""`fishplate about`: what the standard says of a variable, a packet, a message or a header."""

from __future__ import annotations

import json
from dataclasses import asdict
from enum import StrEnum
from textwrap import wrap
from typing import TYPE_CHECKING, Annotated, Any

import typer

from fishplate.errors import RegistryError
from fishplate.standard import registry
from fishplate.standard.as_json import node_to_json
from fishplate.standard.comparison import compare
from fishplate.standard.editions import DEFAULT_VERSION, EDITIONS, version_key
from fishplate.standard.history import evidence_for, history, stages
from fishplate.standard.vocabulary import Header, Packet, RadioMessage, Variable
from fishplate_cli.compare import narrowed, text_lines
from fishplate_cli.compare_json import comparison_data, difference_data, reference
from fishplate_cli.console import visible, width, write
from fishplate_cli.describe import Description
from fishplate_cli.lookup import Answer, NotFoundError, carriers, find, look_up, users

if TYPE_CHECKING:
    from fishplate.standard import Registry
    from fishplate.standard.comparison import Comparison
    from fishplate.standard.history import Form, Stage
    from fishplate_cli.lookup import Found

HELP = """\
Say what a variable, packet, message or header is, and what it was in each edition of the standard.

WORD is a name (of any edition), a number, or part of the name of a packet or message; packet,
message, to-train and to-track narrow it down. What 2.1 does not know is looked for in the other
versions, unless --version or --issue says where to look.

--between A B says what changed from one edition to another, with WORD only of that. A and B are
system versions, 1.0@2.3.0 is version 1.0 as issue 2.3.0 printed it.

--schema prints the JSON Schema of authored trees; without WORD, that of any frame."""


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
    between: Annotated[
        tuple[str, str] | None,
        typer.Option(metavar="A B", help="Say what changed from A to B.", show_default=False),
    ] = None,
    version: Annotated[
        str | None,
        typer.Option(
            metavar="X.Y", help="The system version to look in (2.1).", show_default=False
        ),
    ] = None,
    issue: Annotated[
        str | None,
        typer.Option(
            metavar="N.N.N", help="The issue of SUBSET-026 to look in.", show_default=False
        ),
    ] = None,
) -> None:
    """Look something up."""
    if between:
        if version or issue or schema:
            reason = "takes no --version, --issue or --schema: write 1.0@2.3.0"
            raise typer.BadParameter(reason, param_hint="--between")
        _compare(*between, words or [], view)
        return
    book = _book(version, issue)
    if schema:
        write(_dumped(_schema(book, words or [])))
        return
    if not words:
        raise typer.BadParameter("say what to look up", param_hint="WORD")
    _describe(_found(book, words, only_here=bool(version or issue)), view)


def _describe(answer: Answer, view: As) -> None:
    if view is As.JSON:
        every = [as_json(answer.book, each) for each in answer.found]
        write(_dumped(every[0] if len(every) == 1 else every))
        return
    if answer.note:
        for line in (*wrap(visible(answer.note), width()), ""):
            write(line)
    description = Description(answer.book, width())
    for number, each in enumerate(answer.found):
        if number:
            write("")
        for line in description.lines(each):
            write(line)


def _dumped(data: Any) -> str:
    return json.dumps(data, indent=2, ensure_ascii=False)


def _book(version: str | None, issue: str | None) -> Registry:
    """Return the registry asked for; an issue alone means the latest version it introduces."""
    if version is None and issue is not None:
        printed = [each.version for each in EDITIONS if each.issue == issue]
        version = max(printed, key=version_key, default=DEFAULT_VERSION)
    try:
        return registry(version or DEFAULT_VERSION, issue)
    except RegistryError as error:
        hint = "--issue" if issue else "--version"
        raise typer.BadParameter(str(error), param_hint=hint) from None


def _found(book: Registry, words: list[str], *, only_here: bool) -> Answer:
    try:
        return find(book, words, only_here=only_here)
    except NotFoundError as error:
        raise typer.BadParameter(visible(str(error)), param_hint="WORD") from None


def _compare(first: str, second: str, words: list[str], view: As) -> None:
    comparison = compare(_edition(first), _edition(second))
    if words:
        comparison = _only(comparison, words)
    if view is As.JSON:
        write(_dumped(comparison_data(comparison)))
        return
    for line in text_lines(comparison, width()):
        write(line)


def _edition(text: str) -> Registry:
    version, _, issue = text.partition("@")
    try:
        return registry(version, issue or None)
    except RegistryError as error:
        raise typer.BadParameter(visible(str(error)), param_hint="--between") from None


def _only(comparison: Comparison, words: list[str]) -> Comparison:
    wanted: list[Found] = []
    reasons = []
    for book in (comparison.before, comparison.after):
        try:
            wanted += look_up(book, words)
        except NotFoundError as error:
            reasons.append(error)
    if not wanted:
        raise typer.BadParameter(visible(str(reasons[-1])), param_hint="WORD")
    return narrowed(comparison, wanted)


def _schema(book: Registry, words: list[str]) -> dict[str, Any]:
    from fishplate.models import json_schema  # noqa: PLC0415  loads pydantic

    if not words or words == ["frame"]:
        return json_schema("frame", version=book.version, issue=book.issue)
    answer = _found(book, words, only_here=True)
    match answer.found:
        case [Packet() | RadioMessage() as found]:
            kind = "packet" if isinstance(found, Packet) else "message"
            return json_schema(
                kind, found.direction, found.number, version=book.version, issue=book.issue
            )
        case [Header() as found]:
            kind = "telegram" if found.medium == "balise" else "loop"
            return json_schema(kind, version=book.version, issue=book.issue)
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
    """Return what is declared of one thing, and its history, as plain data."""
    data: dict[str, Any] = {"kind": _kind(found), "version": book.version, "issue": book.issue}
    data |= asdict(found)
    if not isinstance(found, Variable):
        data["nodes"] = [node_to_json(each) for each in found.nodes]
    if isinstance(found, Variable):
        data["used_in"] = [f"{_kind(each)} {_key(each)}" for each in users(book, found)]
    if isinstance(found, Packet):
        data["carried_by"] = [
            {"message": each.number, "how": how} for each, how in carriers(book, found)
        ]
    data["evidence"] = [
        {"kind": each.kind, "note": each.note} for each in evidence_for(book, found)
    ]
    past = history(found, stages())
    data["history"] = {
        "forms": [_form_data(each) for each in past.forms],
        "absent": [_stage_data(each) for each in past.absent],
    }
    return data


def _form_data(form: Form) -> dict[str, Any]:
    return {
        "editions": [_stage_data(each) for each in form.stages],
        "thing": reference(form.thing),
        "beside": [_stage_data(stage) | (reference(each) or {}) for stage, each in form.beside],
        "against": _stage_data(form.against) if form.against else None,
        "changes": difference_data(form.difference) if form.difference else None,
    }


def _stage_data(stage: Stage) -> dict[str, Any]:
    kinds = [each.kind for each in stage.book.evidence_of()]
    return {"versions": list(stage.versions), "issue": stage.book.issue, "evidence": kinds}
