"""One pydantic model a scope of a layout: a packet, a header, an element of a set.

Conditions, missing and superfluous keys are judged together with the values, so that one
validation names all that is wrong.
"""

from __future__ import annotations

from collections.abc import Callable  # noqa: TC003  pydantic evaluates annotations of a model
from contextvars import ContextVar
from difflib import get_close_matches
from functools import partial
from typing import TYPE_CHECKING, Annotated, Any, ClassVar

from pydantic import (
    BaseModel,
    BeforeValidator,
    ConfigDict,
    ValidationError,
    ValidatorFunctionWrapHandler,
    create_model,
    model_validator,
)
from pydantic import Field as Limits
from pydantic_core import InitErrorDetails, PydanticCustomError

from fishplate.bits import read_blob
from fishplate.engine.spell import COMPUTED, all_keys, code_of, conditional_keys
from fishplate.engine.walk import holds
from fishplate.errors import EncodeError
from fishplate.meaning import parse
from fishplate.models.schema import DIALECT, scope_schema
from fishplate.standard import known_versions, registry
from fishplate.standard.vocabulary import (
    COUNT,
    Field,
    Group,
    Node,
    Opaque,
    Repeat,
    Series,
    Text,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Iterator, Mapping, Sequence

    from fishplate.standard import Registry
    from fishplate.standard.vocabulary import Variable

_scale: ContextVar[int | None] = ContextVar("_scale", default=None)
"""The code of the Q_SCALE that governs the scope being validated."""

_outer: ContextVar[Mapping[str, object] | None] = ContextVar("_outer", default=None)
"""The codes of the enclosing scopes, which conditions may look at."""


def custom_error(reason: str, expected: str = "") -> PydanticCustomError:
    """Return an error that pydantic shows with our sentence."""
    # Braces would be taken for placeholders of a template.
    return PydanticCustomError("fishplate", "{reason}", {"reason": reason, "expected": expected})


class Scope(BaseModel):
    """Base of all models: holds a scope of a layout to its conditions."""

    model_config = ConfigDict(extra="forbid")

    nodes: ClassVar[tuple[Node, ...]] = ()
    registry_used: ClassVar[Any] = None
    declared: ClassVar[Callable[[], dict[str, Any]]]

    @model_validator(mode="wrap")
    @classmethod
    def _judge(cls, value: Any, handler: ValidatorFunctionWrapHandler) -> Scope:
        if not isinstance(value, dict):
            return handler(value)  # type: ignore[no-any-return]  # pydantic's handler is untyped
        codes = {**(_outer.get() or {}), **cls._codes(value)}
        errors = [_details(*each) for each in cls._misplaced(value, codes)]
        scale = codes.get("Q_SCALE")
        outer_token = _outer.set(codes)
        scale_token = _scale.set(scale if isinstance(scale, int) else None)
        result: Any = None
        try:
            result = handler(value)
        except ValidationError as error:
            keys = list(cls.model_fields)
            found = error.errors(include_url=False)
            # The model of a whole frame has no layout of its own.
            used = getattr(cls, "registry_used", None)
            errors += [_copied(each, keys, used) for each in found]
        finally:
            _outer.reset(outer_token)
            _scale.reset(scale_token)
        if errors:
            raise ValidationError.from_exception_data(cls.__name__, errors)
        return result  # type: ignore[no-any-return]  # pydantic's handler is untyped

    @classmethod
    def _codes(cls, value: Mapping[str, Any]) -> dict[str, object]:
        """Return the codes that can be made out, for conditions to look at."""
        codes: dict[str, object] = {}
        for node in _fields(cls.nodes):
            if node.name in value:
                variable = cls.registry_used.variables[node.variable]
                try:
                    codes[node.variable] = parse(variable, value[node.name])
                except EncodeError:
                    # The field's own validator reports it; no condition can be judged by it.
                    codes[node.variable] = None
        return codes

    @classmethod
    def _misplaced(
        cls, value: Mapping[str, Any], codes: Mapping[str, object]
    ) -> Iterator[tuple[str, str, object]]:
        """Yield key, reason and value of what is missing, or there against a condition."""
        for key, conditions, present in _asked(cls.nodes, codes):
            if present is None:
                continue
            if present and key not in value and key not in COMPUTED:
                because = f", since {conditions}" if conditions else ""
                yield key, f"missing{because}", None
            elif not present and key in value:
                yield key, f"given, but only there when {conditions}", value[key]

    def tree(self) -> dict[str, Any]:
        """Return the scope as a tree of codes."""
        return self.model_dump(exclude_none=True)

    @classmethod
    def model_json_schema(cls, *_arguments: Any, **_options: Any) -> dict[str, Any]:
        """Return the schema that the layout declares, conditions included."""
        return {"$schema": DIALECT, **cls.declared()}


def _fields(nodes: Sequence[Node]) -> Iterator[Field]:
    for node in nodes:
        if isinstance(node, Field):
            yield node
        elif isinstance(node, When):
            yield from _fields(node.nodes)


def _asked(
    nodes: Sequence[Node], codes: Mapping[str, object]
) -> Iterator[tuple[str, str, bool | None]]:
    """Yield each key of a scope, its conditions in words, and whether it is to be there.

    None means that it cannot be told, because a variable it depends on is wrong itself.
    """
    texts: dict[str, str] = {}
    for key, text in conditional_keys(nodes):
        texts[key] = f"{texts[key]} or {text}" if key in texts else text
    present: dict[str, bool | None] = {}
    _presence(nodes, codes, present, there=True)
    for key, there in present.items():
        yield key, texts.get(key, ""), there


def _presence(
    nodes: Sequence[Node],
    codes: Mapping[str, object],
    present: dict[str, bool | None],
    *,
    there: bool | None,
) -> None:
    for node in nodes:
        if isinstance(node, When):
            inside = there
            if inside:
                known = codes.get(node.condition.variable) is not None
                inside = holds(node.condition, codes) if known else None
            _presence(node.nodes, codes, present, there=inside)
        else:
            (key,) = all_keys([node])
            present[key] = present.get(key) or there


def _details(key: str, reason: str, value: object) -> InitErrorDetails:
    return InitErrorDetails(type=custom_error(reason), loc=(key,), input=value)


def _copied(error: Any, keys: Sequence[str], used: Registry | None) -> InitErrorDetails:
    """Carry an error of pydantic over; its own sentences are kept."""
    reason = error["msg"]
    context = error.get("ctx", {})
    match error["type"]:
        case "extra_forbidden":
            name = str(error["loc"][-1])
            near = get_close_matches(name, keys, n=1)
            hint = f"; did you mean {near[0]}?" if near else ""
            reason = f"not part of this layout{_elsewhere(name, used) or hint}"
        case "list_type":
            reason = f"expected a list, got {error['input']!r}"
        case "too_short" | "too_long":
            limit = context.get("min_length", context.get("max_length"))
            word = "at least" if error["type"] == "too_short" else "at most"
            reason = f"expected {word} {limit} elements, got {context['actual_length']}"
        case "model_type" | "dict_type" | "model_attributes_type":
            reason = f"expected a mapping, got {error['input']!r}"
        case "literal_error":
            reason = f"expected {context['expected']}, got {error['input']!r}"
        case "invalid_key":
            reason = "expected a key that is text"
        case "missing":
            reason = "missing"
    details = custom_error(reason, context.get("expected", ""))
    return InitErrorDetails(type=details, loc=error["loc"], input=error["input"])


def _as_pydantic(function: Callable[[Any], Any]) -> BeforeValidator:
    def validate(value: Any) -> Any:
        try:
            return function(value)
        except EncodeError as error:
            raise custom_error(error.reason, error.expected) from None

    return BeforeValidator(validate)


def _field_type(variable: Variable) -> Any:
    def convert(value: object) -> int | str:
        code = parse(variable, value, _scale.get())
        code_of(variable, code, ())
        return code

    kind = str if variable.coding == "digits" else int
    return Annotated[kind, _as_pydantic(convert)]


def _text_type(length: Variable) -> Any:
    most = (1 << length.bits) - 1

    def convert(value: object) -> str:
        if not isinstance(value, str):
            raise EncodeError(f"expected a text, got {value!r}: quote it")
        wrong = [each for each in value if ord(each) > 0xFF]  # noqa: PLR2004  ISO 8859-1
        if wrong:
            raise EncodeError(f"character {wrong[0]!r} is not in ISO 8859-1")
        if len(value) > most:
            raise EncodeError(f"expected at most {most} characters, got {len(value)}")
        return value

    return Annotated[str, _as_pydantic(convert)]


def _checked_bits(value: object) -> object:
    read_blob(value, ())
    return value


Bits = Annotated[dict[str, Any], _as_pydantic(_checked_bits)]
"""Bits that no layout explains."""


def _elsewhere(name: str, used: Registry | None) -> str:
    """Say which other versions have a variable that the one used lacks."""
    if used is None or name in used.variables:
        return ""
    others = [each for each in known_versions() if name in registry(each).variables]
    known = f"; {name} is of {', '.join(others)}" if others else ""
    return f"{known}, the tree is read as {used.version}" if known else ""


def scope_model(
    registry: Registry, nodes: tuple[Node, ...], name: str, extra: Mapping[str, Any] | None = None
) -> type[Scope]:
    """Build the model of one scope; `extra` adds fields that are not the layout's."""
    fields: dict[str, Any] = {}
    for key, kind in _types(registry, nodes, name):
        fields[key] = (kind, None)
    for key, kind in (extra or {}).items():
        fields[key] = (kind, None)
    model = create_model(name, __base__=Scope, **fields)
    model.nodes = nodes
    model.registry_used = registry
    model.declared = partial(scope_schema, registry, nodes)
    return model


def _types(registry: Registry, nodes: Sequence[Node], name: str) -> Iterator[tuple[str, Any]]:
    for node in nodes:
        match node:
            case Field():
                yield node.name, _field_type(registry.variables[node.variable])
            case When():
                yield from _types(registry, node.nodes, name)
            case Group():
                yield node.name, scope_model(registry, node.nodes, f"{name}_{node.name}")
            case Series() | Repeat():
                first = 1 if isinstance(node, Series) else 0
                most = first + (1 << registry.variables[COUNT].bits) - 1
                element = scope_model(registry, node.nodes, f"{name}_{node.name}")
                yield node.name, Annotated[list[element], Limits(min_length=first, max_length=most)]  # type: ignore[valid-type]
            case Text():
                yield node.element, _text_type(registry.variables[node.length])
            case Opaque():
                yield node.name, Bits
