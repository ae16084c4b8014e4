"""The YAML of authored trees: what is not quoted is text, but for a few plain words."""

from __future__ import annotations

import re
from typing import TYPE_CHECKING, Any

import yaml

from fishplate.errors import EncodeError
from fishplate.trees import NumberText

if TYPE_CHECKING:
    from collections.abc import Iterator

TAG = "tag:yaml.org,2002:"
DEEPEST = 50
MOST_NODES = 1_000_000
MOST_DIGITS = 1000
"""Digits of the longest number that is read as one."""


class Loader(yaml.SafeLoader):
    """Plain scalars are texts but for null, true, false, whole decimal numbers and fractions."""

    def compose_node(self, parent: yaml.Node | None, index: int) -> yaml.Node | None:
        """Compose a node, refusing a tag: nothing in a tree needs one."""
        event: Any = self.peek_event()  # type: ignore[no-untyped-call]
        tag = getattr(event, "tag", None)
        if tag is not None:
            shown = tag.replace(TAG, "!!")
            raise yaml.constructor.ConstructorError(
                problem=f"tag {shown} is not taken, write the value alone",
                problem_mark=event.start_mark,
            )
        return super().compose_node(parent, index)

    def construct_mapping(self, node: yaml.MappingNode, deep: bool = False) -> dict[Any, Any]:  # noqa: FBT001, FBT002
        """Build a mapping, refusing a key that stands twice."""
        seen = set()
        for key_node, _ in node.value:
            key = key_node.value if isinstance(key_node, yaml.ScalarNode) else None
            if key in seen:
                raise yaml.constructor.ConstructorError(
                    problem=f"key {key!r} stands twice", problem_mark=key_node.start_mark
                )
            seen.add(key)
        return super().construct_mapping(node, deep=deep)


Loader.yaml_implicit_resolvers = {}
Loader.yaml_constructors = {}
Loader.add_implicit_resolver(TAG + "null", re.compile(r"(?:null|~)?$"), ["n", "~", ""])
Loader.add_implicit_resolver(TAG + "bool", re.compile(r"(?:true|false)$"), ["t", "f"])
Loader.add_implicit_resolver(TAG + "int", re.compile(r"-?(?:0|[1-9][0-9]*)$"), list("-0123456789"))
Loader.add_implicit_resolver(
    TAG + "float", re.compile(r"-?(?:0|[1-9][0-9]*)\.[0-9]+$"), list("-0123456789")
)


def _integer(loader: Loader, node: yaml.ScalarNode) -> int:
    digits = loader.construct_scalar(node)
    if len(digits) > MOST_DIGITS:
        raise yaml.constructor.ConstructorError(
            problem=f"a number of {len(digits)} characters", problem_mark=node.start_mark
        )
    return int(digits)


def _fraction(loader: Loader, node: yaml.ScalarNode) -> NumberText:
    return NumberText(loader.construct_scalar(node))


for _name in ("null", "bool", "str", "seq", "map"):
    Loader.add_constructor(TAG + _name, yaml.SafeLoader.yaml_constructors[TAG + _name])
Loader.add_constructor(TAG + "int", _integer)
Loader.add_constructor(TAG + "float", _fraction)
Loader.add_constructor(None, yaml.SafeLoader.yaml_constructors[None])


def yaml_documents(text: str) -> Iterator[tuple[int, Any]]:
    """Yield the line and the content of each document; raises `EncodeError`."""
    try:
        loader = Loader(text)
        while loader.check_node() and (node := loader.get_node()):
            _bounded(node, 0, {})
            yield node.start_mark.line + 1, loader.construct_document(node)
    except yaml.MarkedYAMLError as error:
        mark = error.problem_mark or error.context_mark
        place = f" (line {mark.line + 1}, character {mark.column + 1})" if mark else ""
        raise EncodeError(f"not YAML as trees use it: {error.problem}{place}") from None
    except yaml.YAMLError as error:
        raise EncodeError(f"not YAML: {' '.join(str(error).split())}") from None
    except RecursionError:
        raise EncodeError("not YAML as trees use it: nested too deep") from None
    except (ValueError, OverflowError):
        raise EncodeError("not YAML: an escape that stands for no character") from None


def _bounded(node: yaml.Node, depth: int, sizes: dict[int, int]) -> int:
    """Count the nodes of a document, aliases followed; raises where it is out of all bounds."""
    if id(node) in sizes:
        size = sizes[id(node)]
    elif isinstance(node, yaml.CollectionNode):
        if depth > DEEPEST:
            raise yaml.constructor.ConstructorError(
                problem="nested too deep, or within itself", problem_mark=node.start_mark
            )
        children = (
            [each for pair in node.value for each in pair]
            if isinstance(node, yaml.MappingNode)
            else node.value
        )
        size = sizes[id(node)] = 1 + sum(_bounded(each, depth + 1, sizes) for each in children)
    else:
        size = 1
    if size > MOST_NODES:
        raise yaml.constructor.ConstructorError(
            problem="aliases make it larger than any frame", problem_mark=node.start_mark
        )
    return size
