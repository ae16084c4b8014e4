"""Writes the source of a reader: bits to tree, one shift and mask a run of fixed fields.

A reader takes ``(n, p)``: an integer and how many of its low bits are still to be read. It
returns the tree and what is left. When the bits run out, a shift by a negative count raises
`ValueError`; the caller lets the walk find the place.
"""

from __future__ import annotations

from dataclasses import dataclass
from typing import TYPE_CHECKING

from fishplate.engine.branches import Unfolded, unfold
from fishplate.engine.source import (
    RUN_BITS,
    Source,
    chunks,
    condition_text,
    condition_variables,
    fixed_fields,
)
from fishplate.standard.vocabulary import (
    COUNT,
    Eq,
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
    from collections.abc import Mapping, Sequence

    from fishplate.standard.vocabulary import Variable


@dataclass
class _Entry:
    """One value of a run: where it goes in the tree, or which local keeps it."""

    variable: Variable
    target: str = ""
    key: str = ""
    local: str = ""


@dataclass
class _Set:
    """A list that goes into the tree together with the run before it."""

    target: str
    key: str
    local: str
    first: str


class ReaderSource(Source):
    """The body of one reader function."""

    def __init__(
        self,
        variables: Mapping[str, Variable],
        nodes: Sequence[Node],
        known: Mapping[str, str] | None = None,
    ) -> None:
        """Write the body; `known` gives expressions for fields that need not be read again."""
        super().__init__(variables)
        self.known = known or {}
        self.pad = RUN_BITS if _looks_ahead(nodes, variables) else 0
        self.asked = condition_variables(nodes)
        self.made: set[str] = set()
        self.run: list[_Entry] = []
        self.sets: list[_Set] = []
        self.scope: dict[str, str] = {}
        tree = self.local("t")
        if self.pad:
            self.line(f"n <<= {self.pad}")
            self.line(f"p += {self.pad}")
        self._nodes(nodes, tree)
        self._flush(tree)
        if self.pad:
            self.line(f"if p < {self.pad}:")
            self.line("    raise Misfit")
            self.line(f"return {tree}, p - {self.pad}")
        else:
            self.line(f"return {tree}, p")

    def _nodes(self, nodes: Sequence[Node], target: str) -> None:
        for node in nodes:
            match node:
                case Field():
                    self._field(node, target)
                case When():
                    self._flush(target)
                    local = self.scope[node.condition.variable]
                    bits = self.variables[node.condition.variable].bits
                    self.line(f"if {condition_text(node.condition, local, bits)}:")
                    self._block(node.nodes, target)
                case Group():
                    self._group(node, target)
                case Series() | Repeat():
                    self._elements(node, target)
                case Text():
                    self._text(node, target)
                case Opaque():
                    self._opaque(node, target)

    def _opaque(self, node: Opaque, target: str) -> None:
        self._flush(target)
        self.line(f"p -= {self.pad}")
        self.line(f"w = n >> {self.pad} & (1 << p) - 1")
        self.line(f'{target}["{node.name}"] = blob(w, p)')
        self.line(f"p = {self.pad}")

    def _block(self, nodes: Sequence[Node], target: str) -> None:
        self.depth += 1
        scope = dict(self.scope)
        self._nodes(nodes, target)
        self._flush(target)
        self.scope = scope
        self.depth -= 1

    def _field(self, node: Field, target: str) -> None:
        local = ""
        if node.variable in self.asked:
            local = self.scope[node.variable] = self.local("q")
        self.run.append(_Entry(self.variables[node.variable], target, node.name, local))

    def _group(self, node: Group, target: str) -> None:
        self._flush(target)
        inner = self.local("g")
        scope = dict(self.scope)
        self._nodes(node.nodes, inner)
        self._flush(inner)
        self.scope = scope
        self.line(f'{target}["{node.name}"] = {inner}')

    def _elements(self, node: Series | Repeat, target: str) -> None:
        count = self.local("c")
        items = self.local("s")
        first = ""
        scope = dict(self.scope)
        if isinstance(node, Series):
            first = self.local("e")
            self._nodes(node.nodes, first)
            if not fixed_fields(node.nodes):
                self._flush(first)
        self.run.append(_Entry(self.variables[COUNT], local=count))
        self.sets.append(_Set(target, node.name, items, first))
        self._flush(target)
        self.scope = dict(scope)
        self._loop(node, count, items)
        self.scope = scope

    def _loop(self, node: Series | Repeat, count: str, items: str) -> None:
        element = self.local("e")
        fields = fixed_fields(node.nodes)
        width = sum(self.variables[each.variable].bits for each in fields or ())
        if fields and width <= RUN_BITS:
            self.line(f"for p in range(p - {width}, p - {width} * {count} - 1, -{width}):")
            self.depth += 1
            self.line(f"w = n >> p & {_mask(width)}")
            entries = [_Entry(self.variables[each.variable], "", each.name) for each in fields]
            parts = _parts(entries, "w", width)
            pairs = ", ".join(
                f'"{entry.key}": {part}' for entry, part in zip(entries, parts, strict=True)
            )
            self.line(f"{items}.append({{{pairs}}})")
            self.depth -= 1
            return
        self.line(f"for _ in range({count}):")
        unfolded = unfold(node.nodes, self.variables)
        if unfolded:
            self.depth += 1
            width = unfolded.width(self.variables)
            self.line(f"w = n >> p - {width} & {_mask(width)}")
            self._way(unfolded, [], width, width, items)
            self.depth -= 1
            return
        self._block(node.nodes, element)
        self.line(f"    {items}.append({element})")

    def _way(self, way: Unfolded, pairs: list[str], left: int, width: int, items: str) -> None:
        """Read one way through an unfolded element out of the word ``w``."""
        pairs = list(pairs)
        for field in way.fields:
            variable = self.variables[field.variable]
            left -= variable.bits
            part = f"w >> {left}" if left else "w"
            if pairs:
                part += f" & {_mask(variable.bits)}"
            value = _value(variable, part)
            if field.variable in self.asked:
                local = self.scope[field.variable] = self.local("q")
                self.line(f"{local} = {value}")
                value = local
            pairs.append(f'"{field.name}": {value}')
        if way.condition and way.true and way.false:
            name = way.condition.variable
            bits = self.variables[name].bits
            self.line(f"if {condition_text(way.condition, self.scope[name], bits)}:")
            self.depth += 1
            self._way(way.true, _known_code(way, pairs), left, width, items)
            self.depth -= 1
            self.line("else:")
            self.depth += 1
            self._way(way.false, pairs, left, width, items)
            self.depth -= 1
            return
        self.line(f"p -= {width - left}")
        self.line(f"{items}.append({{{', '.join(pairs)}}})")

    def _text(self, node: Text, target: str) -> None:
        length = self.local("c")
        self.run.append(_Entry(self.variables[node.length], local=length))
        self._flush(target)
        self.line(f"p -= 8 * {length}")
        self.line(
            f'{target}["{node.element}"] = '
            f'(n >> p & (1 << 8 * {length}) - 1).to_bytes({length}).decode("latin-1")'
        )

    def _flush(self, target: str) -> None:
        """Read the run: shifts first, then locals, then one dict literal a new target."""
        run, self.run = self.run, []
        pairs: dict[str, list[tuple[str, str]]] = {}
        for chunk in chunks(run):
            for entry, part in zip(chunk, self._shift(chunk), strict=True):
                value = _value(entry.variable, self.known.get(entry.key, part))
                if entry.local:
                    self.line(f"{entry.local} = {value}")
                    value = entry.local
                if entry.target:
                    pairs.setdefault(entry.target, []).append((entry.key, value))
        for name in reversed(pairs):
            if name != target:
                self._store(name, pairs[name])
        sets, self.sets = self.sets, []
        for each in sets:
            self.line(f"{each.local} = [{each.first}]")
            pairs.setdefault(each.target, []).append((each.key, each.local))
        if target in pairs:
            self._store(target, pairs[target])
        if target not in self.made:
            self._store(target, [])

    def _shift(self, chunk: Sequence[_Entry]) -> list[str]:
        width = sum(each.variable.bits for each in chunk)
        word = self.local("w")
        self.line(f"p -= {width}")
        self.line(f"{word} = n >> p & {_mask(width)}")
        return _parts(chunk, word, width)

    def _store(self, target: str, items: Sequence[tuple[str, str]]) -> None:
        if target in self.made:
            for key, value in items:
                self.line(f'{target}["{key}"] = {value}')
            return
        self.made.add(target)
        pairs = ", ".join(f'"{key}": {value}' for key, value in items)
        self.line(f"{target}: Tree = {{{pairs}}}")


def _looks_ahead(nodes: Sequence[Node], variables: Mapping[str, Variable]) -> bool:
    """Tell whether some element is read out of a word that may reach beyond the end."""
    for node in nodes:
        if isinstance(node, (Series, Repeat)) and not fixed_fields(node.nodes):
            if unfold(node.nodes, variables) or _looks_ahead(node.nodes, variables):
                return True
        elif isinstance(node, (Group, When)) and _looks_ahead(node.nodes, variables):
            return True
    return False


def _known_code(way: Unfolded, pairs: Sequence[str]) -> list[str]:
    """Write a code that the condition pins down as the number it is."""
    condition = way.condition
    if not isinstance(condition, Eq):
        return list(pairs)
    names = [each.name for each in way.fields if each.variable == condition.variable]
    return [
        f'"{names[-1]}": {condition.code}' if names and each.startswith(f'"{names[-1]}":') else each
        for each in pairs
    ]


def _parts(entries: Sequence[_Entry], word: str, width: int) -> list[str]:
    parts = []
    shift = width
    for index, entry in enumerate(entries):
        shift -= entry.variable.bits
        shifted = f"{word} >> {shift}" if shift else word
        parts.append(f"{shifted} & {_mask(entry.variable.bits)}" if index else shifted)
    return parts


def _mask(bits: int) -> int:
    return (1 << bits) - 1


def _value(variable: Variable, part: str) -> str:
    if variable.coding == "signed":
        half = 1 << variable.bits - 1
        return f"(({part}) ^ {half}) - {half}"
    if variable.coding == "digits":
        return f"digits_text({part}, {variable.bits // 4})"
    return part
