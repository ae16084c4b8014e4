"""Writes the source of a reader: bits to tree, one shift and mask a run of fixed fields.

A reader takes ``(n, p)``: an integer and how many of its low bits are still to be read. It
returns the tree and what is left. When the bits run out, a shift by a negative count raises
`ValueError`; the caller lets the walk find the place.
"""

from __future__ import annotations

from dataclasses import dataclass, field, replace
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


LONG_BITS = 1024
"""From here on it pays to cut off the bits that have been read, once an element."""


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


@dataclass(frozen=True)
class _Way:
    """How far an unfolded element has been followed: fields with their shift in the word.

    `left` bits of the word, `width` in all, are still ahead; `known` holds codes that the
    conditions passed have pinned down.
    """

    items: str
    width: int
    places: tuple[tuple[Field, int], ...] = ()
    known: Mapping[str, str] = field(default_factory=dict)

    @property
    def left(self) -> int:
        """Return how many bits of the word are still ahead."""
        return self.places[-1][1] if self.places else self.width

    def past(self, field: Field, bits: int) -> _Way:
        """Return the way after one more field."""
        return replace(self, places=(*self.places, (field, self.left - bits)))

    def knowing(self, variable: str, codes: frozenset[int]) -> _Way:
        """Return the way where the variable can only have these codes."""
        if len(codes) > 1:
            return self
        return replace(self, known={**self.known, variable: str(min(codes))})

    def shift_of(self, variable: str) -> int:
        """Return where a variable stands in the word."""
        return next(shift for each, shift in reversed(self.places) if each.variable == variable)


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
        self.line(f"while {count}:")
        self.line(f"    {count} -= 1")
        unfolded = unfold(node.nodes, self.variables)
        if unfolded:
            self.depth += 1
            width = unfolded.width(self.variables)
            self.line(f"w = n >> p - {width} & {_mask(width)}")
            self._way(unfolded, _Way(items, width))
            self.depth -= 1
            return
        # Shifting a long packet copies all of it: leave what has been read behind.
        self.line(f"    if p > {LONG_BITS}:")
        self.line("        n &= (1 << p) - 1")
        self._block(node.nodes, element)
        self.line(f"    {items}.append({element})")

    def _way(self, unfolded: Unfolded, way: _Way, keyword: str = "if") -> None:
        """Read an unfolded element out of the word ``w``, from here on down to every end."""
        for each in unfolded.fields:
            way = way.past(each, self.variables[each.variable].bits)
        true, false = unfolded.true, unfolded.false
        if true is None or false is None:
            self.line(f"p -= {way.width - way.left}")
            self.line(f"{way.items}.append({{{self._pairs(way)}}})")
            return
        self.line(f"{keyword} {self._test(unfolded, way)}:")
        name = unfolded.condition.variable if unfolded.condition else ""
        self.depth += 1
        self._way(true, way.knowing(name, unfolded.hits))
        self.depth -= 1
        way = way.knowing(name, unfolded.misses)
        if not false.fields and false.condition:
            self._way(false, way, "elif")
            return
        self.line("else:")
        self.depth += 1
        self._way(false, way)
        self.depth -= 1

    def _test(self, unfolded: Unfolded, way: _Way) -> str:
        """Return the condition as a test of the word itself, where that can be said."""
        condition, hits, misses = unfolded.condition, unfolded.hits, unfolded.misses
        if condition is None:
            raise AssertionError("an end has no condition")
        shift = way.shift_of(condition.variable)
        bits = self.variables[condition.variable].bits
        if shift + bits == way.width and max(hits) < min(misses):
            return f"w < {max(hits) + 1 << shift}"
        if bits == 1:
            return f"w & {1 << shift}" if 1 in hits else f"not w & {1 << shift}"
        return condition_text(condition, f"(w >> {shift} & {_mask(bits)})", bits)

    def _pairs(self, way: _Way) -> str:
        pairs = []
        for each, shift in way.places:
            variable = self.variables[each.variable]
            part = f"w >> {shift}" if shift else "w"
            if shift + variable.bits < way.width:
                part += f" & {_mask(variable.bits)}"
            value = way.known.get(each.variable, _value(variable, part))
            pairs.append(f'"{each.name}": {value}')
        return ", ".join(pairs)

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
            self.line(f"{each.local}: list[Tree] = [{each.first}]")
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
