"""The walk: layouts read field by field, with path, offset and width of each.

This is the readable twin of the generated readers. Tests hold the two equal; errors get their
place here.
"""

from __future__ import annotations

from dataclasses import dataclass, field
from typing import TYPE_CHECKING, Any

from fishplate.bits import blob, digits_text
from fishplate.errors import Path, Truncated
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
    from collections.abc import Mapping, Sequence

    from fishplate.standard.vocabulary import Variable


@dataclass(frozen=True, slots=True)
class Row:
    """One field on the wire.

    `offset` counts bits from the start of the frame. `raw` is the code (signed for D_REF), a
    text for X_TEXT, hex for bits that no layout explains (`variable` is None then). `scale` is
    the code of the Q_SCALE that governs the field.
    """

    path: Path
    variable: str | None
    offset: int
    width: int
    raw: int | str
    scale: int | None = None


@dataclass(slots=True)
class Cursor:
    """Bits being read: `value` holds `size` bits of the frame from bit `start` on."""

    value: int
    size: int
    start: int = 0
    position: int = 0
    rows: list[Row] = field(default_factory=list)

    @property
    def left(self) -> int:
        """How many bits are still to be read."""
        return self.size - self.position

    @property
    def offset(self) -> int:
        """Where in the frame the next bit stands."""
        return self.start + self.position

    def take(self, width: int, path: Path) -> int:
        """Read `width` bits as an unsigned integer; raises `Truncated`."""
        if width > self.left:
            missing = width - self.left
            raise Truncated(
                f"{missing} of {width} bits are missing",
                missing=missing,
                path=path,
                bit=self.offset,
            )
        self.position += width
        return self.value >> self.size - self.position & (1 << width) - 1


def holds(condition: Condition, codes: Mapping[str, Any]) -> bool:
    """Tell whether a condition holds for the codes read so far."""
    code = codes[condition.variable]
    match condition:
        case Eq():
            return bool(code == condition.code)
        case Ne():
            return bool(code != condition.code)
        case In():
            return code in condition.codes


class Walk:
    """One reading of a layout: rows go to the cursor, values into the tree returned."""

    def __init__(self, variables: Mapping[str, Variable], cursor: Cursor) -> None:
        self.variables = variables
        self.cursor = cursor

    def scope(self, nodes: Sequence[Node], path: Path, codes: Mapping[str, Any]) -> dict[str, Any]:
        """Read one scope; `codes` holds what the enclosing scopes have read."""
        tree: dict[str, Any] = {}
        self._nodes(nodes, path, dict(codes), tree)
        return tree

    def _nodes(
        self, nodes: Sequence[Node], path: Path, codes: dict[str, Any], tree: dict[str, Any]
    ) -> None:
        for node in nodes:
            match node:
                case Field():
                    codes[node.variable] = tree[node.name] = self._field(
                        node.variable, (*path, node.name), codes
                    )
                case When():
                    if holds(node.condition, codes):
                        self._nodes(node.nodes, path, codes, tree)
                case Group():
                    tree[node.name] = self.scope(node.nodes, (*path, node.name), codes)
                case Series() | Repeat():
                    tree[node.name] = self._elements(node, (*path, node.name), codes)
                case Text():
                    length = self._code(node.length, (*path, node.length), codes)
                    tree[node.element] = self._text(node.element, length, (*path, node.element))
                case Opaque():
                    tree[node.name] = self.unexplained(self.cursor.left, (*path, node.name))

    def _elements(
        self, node: Series | Repeat, path: Path, codes: Mapping[str, Any]
    ) -> list[dict[str, Any]]:
        items = []
        if isinstance(node, Series):
            items.append(self.scope(node.nodes, (*path, 0), codes))
        count = self._code(COUNT, (*path, COUNT), codes)
        items += [
            self.scope(node.nodes, (*path, index), codes)
            for index in range(len(items), len(items) + count)
        ]
        return items

    def _field(self, name: str, path: Path, codes: Mapping[str, Any]) -> int | str:
        code = self._code(name, path, codes)
        variable = self.variables[name]
        if variable.coding == "digits":
            return digits_text(code, variable.bits // 4)
        return code

    def _code(self, name: str, path: Path, codes: Mapping[str, Any]) -> int:
        variable = self.variables[name]
        offset = self.cursor.offset
        code = self.cursor.take(variable.bits, path)
        if variable.coding == "signed":
            half = 1 << variable.bits - 1
            code = (code ^ half) - half
        self.cursor.rows.append(Row(path, name, offset, variable.bits, code, codes.get("Q_SCALE")))
        return code

    def _text(self, name: str, length: int, path: Path) -> str:
        width = self.variables[name].bits * length
        offset = self.cursor.offset
        text = self.cursor.take(width, path).to_bytes(length).decode("latin-1")
        if width:
            self.cursor.rows.append(Row(path, name, offset, width, text))
        return text

    def unexplained(self, width: int, path: Path) -> dict[str, Any]:
        """Read bits that no layout explains."""
        offset = self.cursor.offset
        bits = blob(self.cursor.take(width, path), width)
        if width:
            self.cursor.rows.append(Row(path, None, offset, width, bits["hex"]))
        return bits
