"""Layouts as JSON and back: nothing in a layout is hidden in code."""

from __future__ import annotations

from typing import Any

from fishplate.errors import RegistryError
from fishplate.standard.vocabulary import (
    Condition,
    Eq,
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

_SETS: dict[str, type[Group | Series | Repeat]] = {
    "group": Group,
    "series": Series,
    "repeat": Repeat,
}


def node_to_json(node: Node) -> dict[str, Any]:
    """Write one layout node as plain dicts, lists, strings and integers."""
    match node:
        case Field():
            return {"field": node.variable} | ({"key": node.key} if node.key else {})
        case Group() | Series() | Repeat():
            kind = type(node).__name__.lower()
            return {kind: node.name, "nodes": [node_to_json(each) for each in node.nodes]}
        case When():
            nodes = [node_to_json(each) for each in node.nodes]
            return {"when": _condition_to_json(node.condition), "nodes": nodes}
        case Text():
            return {"text": node.element, "length": node.length}
        case Opaque():
            return {"opaque": node.name}


def node_from_json(data: dict[str, Any]) -> Node:
    """Read one layout node back; raises `RegistryError` for anything else."""
    match data:
        case {"field": str(variable)}:
            return Field(variable, key=data.get("key", ""))
        case {"when": dict(condition), "nodes": list(nodes)}:
            return When(_condition_from_json(condition), _nodes(nodes))
        case {"text": str(element), "length": str(length)}:
            return Text(length, element)
        case {"opaque": str(name)}:
            return Opaque(name)
        case {"nodes": list(nodes)}:
            for kind, cls in _SETS.items():
                if kind in data:
                    return cls(data[kind], _nodes(nodes))
    raise RegistryError(f"not a layout node: {data}")


def _nodes(data: list[dict[str, Any]]) -> tuple[Node, ...]:
    return tuple(node_from_json(each) for each in data)


def _condition_to_json(condition: Condition) -> dict[str, Any]:
    match condition:
        case Eq():
            return {"variable": condition.variable, "equals": condition.code}
        case Ne():
            return {"variable": condition.variable, "differs": condition.code}
        case In():
            return {"variable": condition.variable, "one_of": list(condition.codes)}


def _condition_from_json(data: dict[str, Any]) -> Condition:
    match data:
        case {"variable": str(variable), "equals": int(code)}:
            return Eq(variable, code)
        case {"variable": str(variable), "differs": int(code)}:
            return Ne(variable, code)
        case {"variable": str(variable), "one_of": list(codes)}:
            return In(variable, tuple(codes))
    raise RegistryError(f"not a condition: {data}")
