"""Models of whole frames and of packets, and what turns authored trees into trees of codes."""

from __future__ import annotations

from contextlib import suppress
from functools import cache, partial
from typing import TYPE_CHECKING, Annotated, Any, Literal

from pydantic import BeforeValidator, ValidationError, create_model

from fishplate.engine.runtime import codec
from fishplate.errors import EncodeError, Path
from fishplate.frames.encoding import KEYS
from fishplate.frames.forms import check_issue, wrong_form
from fishplate.frames.sizes import HEAD_NODES
from fishplate.models.schema import (
    content_packet_schema,
    message_schema,
    packet_schema,
    telegram_schema,
)
from fishplate.models.scopes import Bits, Scope, custom_error, scope_model
from fishplate.standard import registry
from fishplate.standard.vocabulary import DIRECTIONS, TO_TRACK, TO_TRAIN, Node
from fishplate.versions import DEFAULT_VERSION, closest_layouts, no_layouts, told_version

if TYPE_CHECKING:
    from collections.abc import Callable, Sequence

    from fishplate.standard import Registry


@cache
def packet_model(
    number: int,
    direction: str = TO_TRAIN,
    version: str = DEFAULT_VERSION,
    issue: str | None = None,
    *,
    form: bool = False,
) -> type[Scope]:
    """Return the model of one packet; `KeyError` when the registry holds none.

    As the `form` of a packet of another version, it may say so.
    """
    layouts = registry(version, issue)
    other = layouts.forms.get((direction, number))
    if other and other.only:
        return packet_model(number, direction, other.version, form=True)
    packet = layouts.packets[direction, number]
    name = f"Packet{number}{'ToTrain' if direction == TO_TRAIN else 'ToTrack'}"
    extra: dict[str, Any] = {"surplus": Bits}
    if form:
        extra["form"] = Literal[version]
    model = scope_model(layouts, packet.nodes, name, extra)
    model.declared = partial(packet_schema, layouts, direction, number)
    return model


@cache
def message_model(
    number: int,
    direction: str | None = None,
    version: str = DEFAULT_VERSION,
    issue: str | None = None,
) -> type[Scope]:
    """Return the model of one radio message; `KeyError` when the registry holds none."""
    layouts = registry(version, issue)
    if direction is None:
        direction = codec(version, issue).direction_of(number)
    nodes = layouts.messages[direction, number].nodes
    schema = partial(message_schema, layouts, direction, number)
    return _frame_model(layouts, f"Message{number}", "radio", direction, nodes, schema)


@cache
def telegram_model(version: str = DEFAULT_VERSION, issue: str | None = None) -> type[Scope]:
    """Return the model of a balise telegram."""
    return _telegram_model("balise", version, issue)


@cache
def loop_model(version: str = DEFAULT_VERSION, issue: str | None = None) -> type[Scope]:
    """Return the model of a loop message."""
    return _telegram_model("loop", version, issue)


def _telegram_model(medium: str, version: str, issue: str | None) -> type[Scope]:
    layouts = registry(version, issue)
    nodes = layouts.headers[medium].nodes
    schema = partial(telegram_schema, layouts, medium)
    return _frame_model(layouts, medium.capitalize(), medium, TO_TRAIN, nodes, schema)


def _frame_model(
    layouts: Registry,
    name: str,
    medium: str,
    direction: str,
    nodes: tuple[Node, ...],
    schema: Callable[[], dict[str, Any]],
) -> type[Scope]:
    header = scope_model(layouts, nodes, f"{name}Header")
    packet = Annotated[Any, BeforeValidator(_packet_validator(direction, layouts))]
    rests = ("padding", "surplus", "content") if medium == "radio" else ("filler", "content")
    fields: dict[str, Any] = {
        "medium": (Literal[medium], medium),
        "direction": (Literal[direction], direction),
        "version": (Annotated[str, BeforeValidator(str)], layouts.version),
        "issue": (Annotated[str, BeforeValidator(str)], layouts.issue),
        "header": (header, ...),
        "packets": (list[packet], []),
        **dict.fromkeys(rests, (Bits, None)),
        "problems": (list[Any], None),
        "evidence": (list[Any], None),
    }
    model = create_model(name, __base__=Scope, **fields)
    model.declared = schema
    return model


def _packet_validator(direction: str, layouts: Registry) -> Callable[[Any], dict[str, Any]]:
    known = layouts.packets

    def validate(value: Any) -> dict[str, Any]:
        if isinstance(value, Scope):
            return value.tree()
        if not isinstance(value, dict):
            raise custom_error(f"expected a packet as a mapping, got {value!r}")
        if "content" in value:
            return content_packet_model(direction).model_validate(value).tree()
        number = value.get("NID_PACKET")
        if not isinstance(number, int) or (direction, number) not in known:
            reason = f"packet {number!r} is not known {direction}; give its bits as content"
            raise custom_error(reason)
        own, *others = _models_of(layouts, direction, number, value.get("form"))
        for other in others:
            # Errors are those of the form whose variables the packet has.
            foreign = value.keys() - own.model_fields.keys()
            if foreign and foreign <= other.model_fields.keys():
                return other.model_validate(value).tree()
            with suppress(ValidationError):
                return other.model_validate(value).tree()
        return own.model_validate(value).tree()

    return validate


def _models_of(
    layouts: Registry, direction: str, number: int, said: object
) -> Sequence[type[Scope]]:
    """Return the models a packet may follow, the version's own layout first."""
    form = layouts.forms.get((direction, number))
    other_version = form.version if form else None
    if said not in (None, layouts.version, other_version):
        error = wrong_form(number, layouts.version, other_version, said, ())
        raise custom_error(f"{error.reason}; expected {error.expected}")
    own = packet_model(number, direction, layouts.version, layouts.issue, form=bool(form))
    if form is None or said == layouts.version:
        return [own]
    other = packet_model(number, direction, form.version, form=True)
    return [other] if form.only or said == form.version else [own, other]


@cache
def content_packet_model(direction: str, version: str = DEFAULT_VERSION) -> type[Scope]:
    """Return the model of a packet that is kept as unexplained bits."""
    nodes = HEAD_NODES[direction]
    model = scope_model(registry(version), nodes, "ContentPacket", {"content": Bits})
    model.declared = partial(content_packet_schema, direction)
    return model


def codes_of(tree: object) -> dict[str, Any]:
    """Return an authored tree, of codes or of meanings, as a tree of codes.

    Raises one `EncodeError` for all that is wrong: its `path` is that of the first error, its
    `others` are the further ones.
    """
    if not isinstance(tree, dict):
        raise EncodeError(f"expected a mapping, got {type(tree).__name__}", got=tree)
    model = _model_for(tree)
    try:
        validated = model.model_validate(tree)
    except ValidationError as error:
        raise _encode_error(error) from None
    unsaid = {"version", "issue"} - tree.keys()
    return validated.model_dump(exclude_none=True, exclude={"problems", "evidence"} | unsaid)


def _model_for(tree: dict[str, Any]) -> type[Scope]:
    given = told_version(tree)
    closest = closest_layouts(given) if isinstance(given, str) else None
    if closest is None and "content" not in tree:
        # All other errors would be those of a version that is not meant.
        path = ("version",) if "version" in tree else ("header", "M_VERSION")
        raise EncodeError(no_layouts(str(given)), path=path, got=given)
    version = closest or DEFAULT_VERSION
    issue = tree["issue"] if isinstance(tree.get("issue"), str) else None
    check_issue(tree.get("issue"), codec(version, issue))
    header = tree.get("header")
    if not isinstance(header, dict):
        found = [f"; {each} is not part of a tree" for each in tree if each not in KEYS]
        reason = "expected the header as a mapping" + "".join(found)
        raise EncodeError(reason, path=("header",), got=header)
    medium = tree.get("medium")
    if medium == "loop" or (medium is None and "NID_LOOP" in header):
        return loop_model(version, issue)
    if medium == "balise" or (medium is None and "NID_BG" in header and "Q_UPDOWN" in header):
        return telegram_model(version, issue)
    if medium not in (None, "radio"):
        reason = f"expected balise, loop or radio, got {medium!r}"
        raise EncodeError(reason, path=("medium",), expected="balise, loop or radio", got=medium)
    number = header.get("NID_MESSAGE")
    direction = tree.get("direction")
    if direction is not None and direction not in DIRECTIONS:
        reason = f"expected {TO_TRAIN} or {TO_TRACK}, got {direction!r}"
        raise EncodeError(reason, path=("direction",), got=direction)
    try:
        return message_model(number, direction, version, issue)
    except (KeyError, TypeError):
        raise EncodeError(
            f"message {number!r} is not known"
            + (f" {direction}" if direction else "")
            + _other_way(number, direction, version),
            path=("header", "NID_MESSAGE"),
            expected="the number of a radio message",
            got=number,
        ) from None


def _other_way(number: object, direction: object, version: str) -> str:
    if not direction or not isinstance(number, int):
        return ""
    other = codec(version).direction_of(number)
    known = (other, number) in registry(version).messages
    return f"; it is sent {other}" if known and other != direction else ""


def _encode_error(error: ValidationError) -> EncodeError:
    errors = []
    for each in error.errors(include_url=False):
        path: Path = each["loc"]
        expected = each.get("ctx", {}).get("expected", "")
        errors.append(EncodeError(each["msg"], path=path, expected=expected, got=each["input"]))
    first, *others = errors
    first.others = tuple(others)
    return first
