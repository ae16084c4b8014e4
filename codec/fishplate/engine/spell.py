"""The walk over a tree: layouts written value by value, with the path of each.

This is the readable twin of the generated writers. Tests hold the two equal; errors get their
path here.
"""

from __future__ import annotations

from difflib import get_close_matches
from typing import TYPE_CHECKING, Any

from fishplate.bits import digits_value, read_blob
from fishplate.engine.walk import holds
from fishplate.errors import EncodeError, Path
from fishplate.standard.vocabulary import (
    COUNT,
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

if TYPE_CHECKING:
    from collections.abc import Iterator, Mapping, Sequence

    from fishplate.standard.vocabulary import Variable

COMPUTED = frozenset({"L_PACKET", "L_MESSAGE"})
"""Lengths that a tree may leave out; they are written as 0 here and filled in by the frame."""

MISSING = object()


class Spelling:
    """One writing of a layout: `pieces` holds value and width of each field, in wire order."""

    def __init__(self, variables: Mapping[str, Variable]) -> None:
        self.variables = variables
        self.pieces: list[tuple[int, int]] = []

    def scope(
        self, nodes: Sequence[Node], tree: object, path: Path, codes: Mapping[str, Any]
    ) -> None:
        """Write one scope; raises `EncodeError` for the first value that does not fit."""
        if not isinstance(tree, dict):
            raise EncodeError(
                f"expected a mapping, got {_shown(tree)}", path=path, expected="mapping", got=tree
            )
        used: set[str] = set()
        self._nodes(nodes, tree, path, dict(codes), used)
        for key in tree:
            if key not in used:
                raise _superfluous(key, nodes, tree, path)

    def _nodes(
        self,
        nodes: Sequence[Node],
        tree: dict[str, Any],
        path: Path,
        codes: dict[str, Any],
        used: set[str],
    ) -> None:
        for node in nodes:
            match node:
                case When():
                    if holds(node.condition, codes):
                        self._nodes(node.nodes, tree, path, codes, used)
                case Field():
                    used.add(node.name)
                    given = tree.get(node.name, MISSING)
                    codes[node.variable] = self._field(node, given, (*path, node.name))
                case Group():
                    used.add(node.name)
                    inner = (*path, node.name)
                    self.scope(node.nodes, self._present(tree, node.name, path), inner, codes)
                case Series() | Repeat():
                    used.add(node.name)
                    items = self._present(tree, node.name, path)
                    self._elements(node, items, (*path, node.name), codes)
                case Text():
                    used.add(node.element)
                    text = self._present(tree, node.element, path)
                    self._text(node, text, (*path, node.element))
                case Opaque():
                    used.add(node.name)
                    data = self._present(tree, node.name, path)
                    self.pieces.append(read_blob(data, (*path, node.name)))

    def _present(self, tree: dict[str, Any], key: str, path: Path) -> Any:
        if key not in tree:
            raise EncodeError("missing", path=(*path, key), expected=key)
        return tree[key]

    def _field(self, node: Field, given: object, path: Path) -> object:
        variable = self.variables[node.variable]
        if node.name in COMPUTED:
            if given is not MISSING:
                code_of(variable, given, path)
            self.pieces.append((0, variable.bits))
            return 0
        if given is MISSING:
            raise EncodeError("missing", path=path, expected=expectation(variable))
        code = code_of(variable, given, path)
        self.pieces.append((code & (1 << variable.bits) - 1, variable.bits))
        return code

    def _elements(
        self, node: Series | Repeat, items: object, path: Path, codes: Mapping[str, Any]
    ) -> None:
        if not isinstance(items, (list, tuple)):
            raise EncodeError(
                f"expected a list, got {_shown(items)}", path=path, expected="list", got=items
            )
        first = 1 if isinstance(node, Series) else 0
        most = first + (1 << self.variables[COUNT].bits) - 1
        if not first <= len(items) <= most:
            raise EncodeError(
                f"expected {first} to {most} elements, got {len(items)}",
                path=path,
                expected=f"{first} to {most} elements",
                got=len(items),
            )
        for index in range(first):
            self.scope(node.nodes, items[index], (*path, index), codes)
        self.pieces.append((len(items) - first, self.variables[COUNT].bits))
        for index in range(first, len(items)):
            self.scope(node.nodes, items[index], (*path, index), codes)

    def _text(self, node: Text, text: object, path: Path) -> None:
        most = (1 << self.variables[node.length].bits) - 1
        if not isinstance(text, str):
            raise EncodeError(
                f"expected a text, got {_shown(text)}", path=path, expected="text", got=text
            )
        try:
            octets = text.encode("latin-1")
        except UnicodeEncodeError as error:
            raise EncodeError(
                f"character {text[error.start]!r} is not in ISO 8859-1",
                path=path,
                expected="ISO 8859-1",
                got=text,
            ) from None
        if len(octets) > most:
            raise EncodeError(
                f"expected at most {most} characters, got {len(octets)}",
                path=path,
                expected=f"at most {most} characters",
                got=len(octets),
            )
        self.pieces.append((len(octets), self.variables[node.length].bits))
        self.pieces.append((int.from_bytes(octets), 8 * len(octets)))


def expectation(variable: Variable) -> str:
    """Say what codes a variable takes."""
    if variable.coding == "digits":
        return f"at most {variable.bits // 4} digits as text"
    low = -(1 << variable.bits - 1) if variable.coding == "signed" else 0
    return f"a code from {low} to {low + (1 << variable.bits) - 1} ({variable.bits} bits)"


def code_of(variable: Variable, given: object, path: Path) -> int:
    """Return the code of a tree's value; raises `EncodeError` when it is none of the variable's."""
    expected = expectation(variable)
    error = EncodeError(
        f"expected {expected}, got {_shown(given)}", path=path, expected=expected, got=given
    )
    if variable.coding == "digits":
        if not isinstance(given, str):
            raise error
        try:
            return digits_value(given, variable.bits // 4)
        except ValueError:
            raise error from None
    if not isinstance(given, int):
        raise error
    low = -(1 << variable.bits - 1) if variable.coding == "signed" else 0
    if not 0 <= given - low < 1 << variable.bits:
        raise error
    return int(given)


def _superfluous(
    key: object, nodes: Sequence[Node], tree: Mapping[str, Any], path: Path
) -> EncodeError:
    here = (*path, str(key))
    conditions = [text for name, text in conditional_keys(nodes) if name == key]
    if conditions:
        reason = f"given, but only there when {' or '.join(conditions)}"
        return EncodeError(reason, path=here, expected=conditions[0], got=tree[str(key)])
    near = get_close_matches(str(key), all_keys(nodes), n=1)
    hint = f"; did you mean {near[0]}?" if near else ""
    return EncodeError(f"not part of this layout{hint}", path=here, expected="", got=key)


def all_keys(nodes: Sequence[Node]) -> list[str]:
    """Return every key that one scope of a layout may hold."""
    keys: list[str] = []
    for node in nodes:
        match node:
            case When():
                keys += all_keys(node.nodes)
            case Text():
                keys.append(node.element)
            case _:
                keys.append(node.name)
    return keys


def conditional_keys(nodes: Sequence[Node], outer: str = "") -> Iterator[tuple[str, str]]:
    """Yield the keys of one scope that depend on conditions, with those conditions as text."""
    for node in nodes:
        if isinstance(node, When):
            condition = condition_words(node.condition)
            text = f"{outer} and {condition}" if outer else condition
            for key in all_keys([each for each in node.nodes if not isinstance(each, When)]):
                yield key, text
            yield from conditional_keys(node.nodes, text)


def condition_words(condition: Condition) -> str:
    """Write a condition as people read it."""
    match condition:
        case Eq():
            return f"{condition.variable} = {condition.code}"
        case Ne():
            return f"{condition.variable} is not {condition.code}"
        case In():
            return f"{condition.variable} is one of {', '.join(map(str, condition.codes))}"


def _shown(value: object) -> str:
    text = repr(value)
    return text if len(text) <= 60 else f"{text[:57]}..."  # noqa: PLR2004  fits one line
