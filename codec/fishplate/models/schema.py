"""JSON Schema (2020-12) of packets, messages, telegrams and loop messages, from the layouts.

The schema is for authored input: codes as integers, quantities with their unit, labels in full
or in their short form; time and note may stand beside a frame. It asks for a conditional field
exactly when its condition holds.
"""

from __future__ import annotations

from dataclasses import dataclass
from typing import TYPE_CHECKING, Any

from fishplate.engine.spell import COMPUTED, all_keys
from fishplate.meaning import UNITS, accepted_labels, parse
from fishplate.standard import registry as registry_of
from fishplate.standard.editions import DEFAULT_VERSION
from fishplate.standard.vocabulary import (
    COUNT,
    TO_TRAIN,
    Condition,
    Field,
    Group,
    In,
    Ne,
    Node,
    Opaque,
    Repeat,
    Series,
    Text,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Iterator, Sequence

    from fishplate.standard import Registry
    from fishplate.standard.vocabulary import Variable

DIALECT = "https://json-schema.org/draft/2020-12/schema"
Schema = dict[str, Any]

BITS_SCHEMA: Schema = {
    "type": "object",
    "description": "bits that no layout explains, left aligned in whole bytes",
    "properties": {
        "bits": {"type": "integer", "minimum": 0},
        "hex": {"type": "string", "pattern": "^([0-9A-Fa-f]{2})*$"},
    },
    "required": ["bits", "hex"],
    "additionalProperties": False,
}


BESIDE: Schema = {
    "time": {"type": ["string", "number"]},
    "note": {"type": "string"},
    "bits": {"type": "integer", "minimum": 0},
    "frame": {"type": "integer", "minimum": 0},
    "given": {"type": "object"},
    "assumed": {"type": "array"},
    "source": {"type": "string"},
    "changes": {"type": "array"},
}
"""What is known about a frame and may stand beside its tree."""


def variable_schema(variable: Variable) -> Schema:
    """Return the schema of one variable: its codes, quantities and labels."""
    about = f"{variable.title} (SUBSET-026 {variable.clause}, {variable.bits} bits)"
    labels = [] if variable.coding == "bitset" else accepted_labels(variable)
    if variable.coding == "digits":
        most = variable.bits // 4
        choices: list[Schema] = [{"type": "string", "pattern": f"^[0-9A-F]{{0,{most}}}$"}]
    else:
        low = -(1 << variable.bits - 1) if variable.coding == "signed" else 0
        high = low + (1 << variable.bits) - 1
        choices = [{"type": "integer", "minimum": low, "maximum": high}]
        choices += _texts(variable)
    if labels:
        choices.append({"enum": labels})
    return {"description": about, "anyOf": choices}


def _texts(variable: Variable) -> list[Schema]:
    if variable.coding == "bitset":
        bits = [each for each in variable.codes if each.kind in {"bit", "spare_bit"}]
        names = [
            each.label if each.kind == "bit" else f"{each.label} {each.first}" for each in bits
        ]
        return [{"type": "array", "items": {"enum": names}}, {"const": "none"}]
    if variable.coding == "group-identity":
        return [{"type": "string", "pattern": "^[0-9]+ ?/ ?[0-9]+$"}]
    if variable.coding == "version":
        # Ordinary YAML and JSON take 2.1 for a number.
        return [{"type": "string", "pattern": r"^[0-9]+\.[0-9]+$"}, {"type": "number"}]
    if variable.unit or variable.resolution:
        units = "|".join(UNITS[variable.unit])
        sign = "-?" if variable.coding == "signed" else ""
        return [{"type": "string", "pattern": rf"^{sign}[0-9]+(\.[0-9]+)? *({units})$"}]
    return []


@dataclass(frozen=True, slots=True)
class _Ruled:
    """What a condition rules: one schema where it holds, another where it does not."""

    condition: Condition
    then: Schema
    otherwise: Schema

    def schema(self, registry: Registry) -> Schema:
        """Return the rule as a schema of the scope that holds the condition's variable."""
        test = _condition_schema(registry, self.condition)
        return {"if": test, "then": self.then, "else": self.otherwise}

    def inside(self, key: str) -> _Ruled:
        """Return the rule as seen from the scope around the set `key`."""
        then: Schema = {"properties": {key: {"items": self.then}}}
        return _Ruled(self.condition, then, {"properties": {key: {"items": self.otherwise}}})


def scope_schema(registry: Registry, nodes: Sequence[Node], extra: Schema | None = None) -> Schema:
    """Return the schema of one scope of a layout, with its conditions."""
    schema, _ = _open_scope(registry, nodes, extra)
    return schema


def _open_scope(
    registry: Registry, nodes: Sequence[Node], extra: Schema | None = None
) -> tuple[Schema, list[_Ruled]]:
    """Return a scope's schema, and what an enclosing scope has to rule in it."""
    properties: Schema = {}
    ruled: list[_Ruled] = []
    required = _scope(registry, nodes, properties, ruled)
    own = {each.variable for each in _fields(nodes)}
    conditions = [each.schema(registry) for each in ruled if each.condition.variable in own]
    schema: Schema = {
        "type": "object",
        "properties": properties | (extra or {}),
        "required": required,
        "additionalProperties": False,
    }
    if conditions:
        schema["allOf"] = conditions
    return schema, [each for each in ruled if each.condition.variable not in own]


def _fields(nodes: Sequence[Node]) -> Iterator[Field]:
    for node in nodes:
        if isinstance(node, Field):
            yield node
        elif isinstance(node, When):
            yield from _fields(node.nodes)


def _scope(
    registry: Registry, nodes: Sequence[Node], properties: Schema, ruled: list[_Ruled]
) -> list[str]:
    """Fill in the properties of a scope; return the keys that are always there."""
    required = []
    for node in nodes:
        if isinstance(node, When):
            inner: list[_Ruled] = []
            then: Schema = {"required": _scope(registry, node.nodes, properties, inner)}
            if inner:
                then["allOf"] = [each.schema(registry) for each in inner]
            absent = dict.fromkeys(all_keys(node.nodes), False)
            ruled.append(_Ruled(node.condition, then, {"properties": absent}))
            continue
        (key,) = all_keys([node])
        if isinstance(node, (Series, Repeat)):
            properties[key], further = _set_schema(registry, node)
            ruled += [each.inside(key) for each in further]
        else:
            properties[key] = _node_schema(registry, node)
        if key not in COMPUTED:
            required.append(key)
    return required


def _node_schema(registry: Registry, node: Node) -> Schema:
    match node:
        case Field():
            return variable_schema(registry.variables[node.variable])
        case Group():
            return scope_schema(registry, node.nodes)
        case Text():
            most = (1 << registry.variables[node.length].bits) - 1
            return {"type": "string", "maxLength": most, "pattern": "^[\\u0000-\\u00ff]*$"}
        case Opaque():
            return BITS_SCHEMA
    raise AssertionError(f"{node} is no node that stands for a key")


def _set_schema(registry: Registry, node: Series | Repeat) -> tuple[Schema, list[_Ruled]]:
    first = 1 if isinstance(node, Series) else 0
    most = first + (1 << registry.variables[COUNT].bits) - 1
    element, further = _open_scope(registry, node.nodes)
    schema = {"type": "array", "items": element, "minItems": first, "maxItems": most}
    return schema, further


def _condition_schema(registry: Registry, condition: Condition) -> Schema:
    variable = registry.variables[condition.variable]
    codes = condition.codes if isinstance(condition, In) else (condition.code,)
    spellings: list[int | str] = list(codes)
    spellings += [each for each in accepted_labels(variable) if parse(variable, each) in codes]
    test: Schema = {"enum": spellings}
    if isinstance(condition, Ne):
        test = {"not": test}
    return {"properties": {condition.variable: test}, "required": [condition.variable]}


def packet_schema(registry: Registry, direction: str, number: int) -> Schema:
    """Return the schema of one packet."""
    packet = registry.packets[direction, number]
    schema = scope_schema(registry, packet.nodes, {"surplus": BITS_SCHEMA})
    schema["properties"]["NID_PACKET"] = {"const": number}
    title = f"packet {number} {direction}: {packet.name} (SUBSET-026 {packet.clause})"
    return {"title": title, **schema}


def content_packet_schema(direction: str) -> Schema:
    """Return the schema of a packet that is kept as unexplained bits."""
    properties: Schema = {
        "NID_PACKET": {"type": "integer", "minimum": 0, "maximum": 255},
        "L_PACKET": {"type": "integer", "minimum": 0, "maximum": 8191},
        "content": BITS_SCHEMA,
    }
    if direction == TO_TRAIN:
        properties["Q_DIR"] = {"type": "integer", "minimum": 0, "maximum": 3}
    return {
        "title": "a packet kept as unexplained bits",
        "type": "object",
        "properties": properties,
        "required": [key for key in properties if key != "L_PACKET"],
        "additionalProperties": False,
    }


def _frame(registry: Registry, medium: str, direction: str, header: Schema, title: str) -> Schema:
    """Return the schema of a frame: header, packets of one direction, unexplained bits."""
    only = {key for key, form in registry.forms.items() if form.only}
    keys = sorted(key for key in registry.packets if key[0] == direction and key not in only)
    numbers = [number for _, number in keys]
    definitions = {
        f"packet_{number}": packet_schema(registry, direction, number) for number in numbers
    }
    definitions |= _forms(registry, direction)
    for _, number in registry.forms.keys() & set(keys):
        definitions[f"packet_{number}"]["properties"]["form"] = {"const": registry.version}
    definitions["content_packet"] = content_packet_schema(direction)
    rests = ("padding", "surplus", "content") if medium == "radio" else ("filler", "content")
    return {
        "title": title,
        "type": "object",
        "properties": {
            "medium": {"const": medium},
            "direction": {"const": direction},
            "version": {"type": ["string", "number"]},
            "issue": {"type": "string"},
            "header": header,
            "packets": {
                "type": "array",
                "items": {"anyOf": [{"$ref": f"#/$defs/{name}"} for name in definitions]},
            },
            **dict.fromkeys(rests, BITS_SCHEMA),
            "problems": {"type": "array"},
            "evidence": {"type": "array"},
            **BESIDE,
        },
        "required": ["medium", "header"],
        "additionalProperties": False,
        "$defs": definitions,
    }


def _forms(registry: Registry, direction: str) -> dict[str, Schema]:
    """Return the schemas of packets that may come as another version lays them out."""
    schemas = {}
    for (way, number), form in registry.forms.items():
        if way == direction:
            name = f"packet_{number}_as_{form.version.replace('.', '_')}"
            schemas[name] = _form_schema(direction, number, form.version)
    return schemas


def _form_schema(direction: str, number: int, version: str) -> Schema:
    schema = packet_schema(registry_of(version), direction, number)
    schema["properties"]["form"] = {"const": version}
    return schema


def message_schema(registry: Registry, direction: str, number: int) -> Schema:
    """Return the schema of one radio message."""
    message = registry.messages[direction, number]
    header = scope_schema(registry, message.nodes)
    header["properties"]["NID_MESSAGE"] = {"const": number}
    title = f"message {number} {direction}: {message.name} (SUBSET-026 {message.clause})"
    return _frame(registry, "radio", direction, header, title)


def telegram_schema(registry: Registry, medium: str) -> Schema:
    """Return the schema of a balise telegram or a loop message."""
    header = registry.headers[medium]
    title = f"{medium} frame (SUBSET-026 {header.clause})"
    return _frame(registry, medium, TO_TRAIN, scope_schema(registry, header.nodes), title)


def frame_schema(registry: Registry) -> Schema:
    """Return the schema of any frame."""
    choices = [telegram_schema(registry, medium) for medium in registry.headers]
    choices += [message_schema(registry, *key) for key in registry.messages]
    definitions: Schema = {}
    for choice in choices:
        way = choice["properties"]["direction"]["const"].replace("-", "_")
        for name, definition in choice.pop("$defs").items():
            definitions[f"{way}_{name}"] = definition
        for item in choice["properties"]["packets"]["items"]["anyOf"]:
            item["$ref"] = item["$ref"].replace("#/$defs/", f"#/$defs/{way}_")
    return {"title": "any frame", "anyOf": choices, "$defs": definitions}


def json_schema(
    kind: str,
    direction: str = TO_TRAIN,
    number: int | None = None,
    version: str = DEFAULT_VERSION,
    issue: str | None = None,
) -> Schema:
    """Return the JSON Schema of a ``packet`` or ``message``, ``telegram``, ``loop`` or ``frame``.

    Packets and messages are named by direction and number. Raises `KeyError` for one that the
    registry of this system version does not hold.
    """
    registry = registry_of(version, issue)
    match kind, number:
        case "packet", int():
            form = registry.forms.get((direction, number))
            schema = packet_schema(registry, direction, number)
            if form:
                other = _form_schema(direction, number, form.version)
                schema = other if form.only else {"anyOf": [schema, other]}
        case "message", int():
            schema = message_schema(registry, direction, number)
        case "telegram", None:
            schema = telegram_schema(registry, "balise")
        case "loop", None:
            schema = telegram_schema(registry, "loop")
        case "frame", None:
            schema = frame_schema(registry)
        case _:
            raise ValueError(f"no schema of kind {kind!r} with number {number}")
    return {"$schema": DIALECT, **schema}
