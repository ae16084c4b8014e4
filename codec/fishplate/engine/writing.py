"""Writes the source of a writer: tree to bits, one range check and one shift a run of fields.

A writer takes a tree and returns value and width. Anything that does not fit (a missing or
superfluous key, a value out of range or of the wrong type) raises one of `runtime.MISFITS`; the
caller lets the walk find the place. L_PACKET and L_MESSAGE are left 0 for the caller to fill in.
"""

from __future__ import annotations

from dataclasses import dataclass, replace
from typing import TYPE_CHECKING

from fishplate.engine.branches import Unfolded, unfold
from fishplate.engine.source import (
    Source,
    chunks,
    condition_text,
    condition_variables,
    fixed_fields,
)
from fishplate.standard.vocabulary import (
    COUNT,
    Condition,
    Field,
    Group,
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

LENGTHS = ("L_PACKET", "L_MESSAGE")


@dataclass
class _Entry:
    """One value of a run: the expression that gives it and its width."""

    variable: Variable
    expression: str
    local: str = ""
    in_range: bool = False
    """True where a condition has compared the value with a code; shifting it shows its type."""


class WriterSource(Source):
    """The body of one writer function."""

    def __init__(
        self,
        variables: Mapping[str, Variable],
        nodes: Sequence[Node],
        known: Mapping[str, str] | None = None,
    ) -> None:
        """Write the body; `known` gives expressions for fields that need not be looked up."""
        super().__init__(variables)
        self.known = known or {}
        self.asked = condition_variables(nodes)
        self.run: list[_Entry] = []
        self.misfits: list[str] = []
        """Conditions to be checked together with the ranges of the run under way."""
        self.scope: dict[str, str] = {}
        self.width = 0
        self.counters: dict[str, str] = {}
        self.v, self.b = "v", "b"
        self.fresh: dict[str, int] = {}
        self._start("v", "b")
        self._scope(nodes, "t")
        self._flush()
        self.line(f"return v, b + {self.width}" if self.width else "return v, b")

    def _start(self, value: str, width: str) -> None:
        """Begin an accumulator: the first run is not shifted in, but put there."""
        self.v, self.b = value, width
        self.line(f"{width} = 0")
        self.fresh[value] = self.depth

    def _scope(self, nodes: Sequence[Node], source: str) -> None:
        """Write one dict and hold the number of its keys to what the layout asks for."""
        outer = dict(self.scope)
        keys = sum(self._keys(each) for each in nodes)
        counter = ""
        if any(isinstance(each, When) for each in nodes):
            counter = self.counters[source] = self.local("k")
            self.line(f"{counter} = {keys}")
        self._nodes(nodes, source)
        expected = counter or str(keys)
        for name in LENGTHS:
            if any(isinstance(each, Field) and each.name == name for each in nodes):
                expected += f' + ("{name}" in {source})'
        misfit = f"len({source}) != {expected}"
        if self.run and not counter:
            self.misfits.append(misfit)
        else:
            self._misfit(misfit)
        self.scope = outer

    def _keys(self, node: Node) -> int:
        if isinstance(node, When):
            return 0
        return 0 if isinstance(node, Field) and node.name in LENGTHS else 1

    def _nodes(self, nodes: Sequence[Node], source: str) -> None:
        for node in nodes:
            match node:
                case Field():
                    self._field(node, source)
                case When():
                    self._when(node, source)
                case Group():
                    inner = self.local("g")
                    self.line(f'{inner} = {source}["{node.name}"]')
                    self._scope(node.nodes, inner)
                case Series() | Repeat():
                    self._elements(node, source)
                case Text():
                    self._text(node, source)
                case Opaque():
                    self._flush()
                    self.line(f'w, c = read_blob({source}["{node.name}"], ("{node.name}",))')
                    self.line(f"{self.v} = {self.v} << c | w")
                    self.line(f"{self.b} += c")

    def _misfit(self, condition: str) -> None:
        self.line(f"if {condition}:")
        self.line("    raise Misfit")

    def _field(self, node: Field, source: str) -> None:
        variable = self.variables[node.variable]
        if node.name in LENGTHS:
            self.run.append(_Entry(variable, "0"))
            return
        expression = self.known.get(node.name, f'{source}["{node.name}"]')
        local = "" if expression.isdigit() else self.local("x")
        if node.variable in self.asked:
            self.scope[node.variable] = local
        self.run.append(_Entry(variable, expression, local))

    def _when(self, node: When, source: str) -> None:
        self._flush()
        local = self.scope[node.condition.variable]
        bits = self.variables[node.condition.variable].bits
        self.line(f"if {condition_text(node.condition, local, bits)}:")
        self.depth += 1
        scope, width = dict(self.scope), self.width
        self.width = 0
        self._nodes(node.nodes, source)
        self._flush()
        if self.width:
            self.line(f"{self.b} += {self.width}")
        keys = sum(self._keys(each) for each in node.nodes)
        if keys:
            self.line(f"{self.counters[source]} += {keys}")
        self.scope, self.width = scope, width
        self.depth -= 1

    def _elements(self, node: Series | Repeat, source: str) -> None:
        items, count, element = self.local("s"), self.local("c"), self.local("e")
        self.line(f'{items} = {source}["{node.name}"]')
        rest = items
        if isinstance(node, Series):
            self.line(f"{count} = len({items}) - 1")
            self.line(f"{element} = {items}[0]")
            self._scope(node.nodes, element)
            rest = f"{items}[1:]"
        else:
            self.line(f"{count} = len({items})")
            self._misfit(f"not {count} and not isinstance({items}, (list, tuple))")
        self.run.append(_Entry(self.variables[COUNT], count, count))
        self._flush()
        outer = self.width
        self.line(f"for {element} in {rest}:")
        self.depth += 1
        self.width = 0
        apart = fixed_fields(node.nodes) is None
        unfolded = unfold(node.nodes, self.variables) if apart else None
        if unfolded:
            usual = unfolded.usual_width(self.variables)
            self._way(unfolded, [], element, usual)
            self.depth -= 1
            self.line(f"{self.b} += {usual} * {count}")
            self.width = outer
            return
        outer_v, outer_b = self.v, self.b
        if apart:
            # An element of varying width is put together apart: small integers are fast.
            self._start(self.local("v"), self.local("b"))
        self._scope(node.nodes, element)
        self._flush()
        width = self.width
        if apart:
            total = f"{self.b} + {width}" if width else self.b
            self.line(f"{outer_v} = {outer_v} << {total} | {self.v}")
            self.line(f"{outer_b} += {total}")
            self.v, self.b = outer_v, outer_b
        self.depth -= 1
        if width and not apart:
            self.line(f"{self.b} += {width} * {count}")
        self.width = outer

    def _way(self, way: Unfolded, entries: list[_Entry], element: str, usual: int) -> None:
        """Write one way through an unfolded element as one run.

        The loop adds the usual width for every element; other ways put that right.
        """
        entries = list(entries)
        for field in way.fields:
            variable = self.variables[field.variable]
            local = self.local("x")
            self.line(f'{local} = {element}["{field.name}"]')
            if field.variable in self.asked:
                self.scope[field.variable] = local
            entries.append(_Entry(variable, local, local))
        if way.condition and way.true and way.false:
            local = self.scope[way.condition.variable]
            # Not the shorter test of one bit for truth: any text is true.
            self.line(f"if {condition_text(way.condition, local, bits=0)}:")
            self.depth += 1
            self._way(way.true, _compared(entries, way.condition), element, usual)
            self.depth -= 1
            self.line("else:")
            self.depth += 1
            self._way(way.false, entries, element, usual)
            self.depth -= 1
            return
        checks = " | ".join(_check(each) for each in entries if not each.in_range)
        self._misfit(f"{checks} or len({element}) != {len(entries)}")
        width = sum(each.variable.bits for each in entries)
        self.line(f"{self.v} = {self.v} << {width}{_word(entries, width)}")
        if width != usual:
            self.line(f"{self.b} += {width - usual}")

    def _text(self, node: Text, source: str) -> None:
        text, count = self.local("x"), self.local("c")
        self.line(f'{text} = {source}["{node.element}"].encode("latin-1")')
        self.line(f"{count} = len({text})")
        self.run.append(_Entry(self.variables[node.length], count, count))
        self._flush()
        self.line(f"{self.v} = {self.v} << 8 * {count} | int.from_bytes({text})")
        self.line(f"{self.b} += 8 * {count}")

    def _flush(self) -> None:
        """Look the values of the run up, hold them to their ranges, shift them in."""
        run, self.run = self.run, []
        for chunk in chunks(run):
            for entry in chunk:
                if entry.local and entry.local != entry.expression:
                    self.line(f"{entry.local} = {_looked_up(entry)}")
            checks = [_check(each) for each in chunk if each.local and _checked(each.variable)]
            misfits, self.misfits = self.misfits, []
            if checks:
                misfits = [" | ".join(checks), *misfits]
            if misfits:
                self._misfit(" or ".join(misfits))
            width = sum(each.variable.bits for each in chunk)
            word = _word(chunk, width)
            begun = self.fresh.pop(self.v, None)
            if begun is not None:
                if begun != self.depth:
                    raise AssertionError("a scope has to begin with a field that is always there")
                self.line(f"{self.v} = {word.removeprefix(' | ') or 0}")
            else:
                self.line(f"{self.v} = {self.v} << {width}{word}")
            self.width += width


def _compared(entries: Sequence[_Entry], condition: Condition) -> list[_Entry]:
    """Return the entries as they are known where the condition holds."""
    if isinstance(condition, Ne):
        return list(entries)
    name = condition.variable
    return [replace(each, in_range=each.variable.name == name) for each in entries]


def _looked_up(entry: _Entry) -> str:
    if entry.variable.coding == "digits":
        return f"digits_value({entry.expression}, {entry.variable.bits // 4})"
    return entry.expression


def _checked(variable: Variable) -> bool:
    return variable.coding != "digits"


def _check(entry: _Entry) -> str:
    bits = entry.variable.bits
    if entry.variable.coding == "signed":
        return f"{entry.local} + {1 << bits - 1} >> {bits}"
    return f"{entry.local} >> {bits}"


def _word(chunk: Sequence[_Entry], width: int) -> str:
    terms = ""
    shift = width
    for entry in chunk:
        bits = entry.variable.bits
        shift -= bits
        value = entry.local or entry.expression
        if value == "0":
            continue
        if entry.variable.coding == "signed":
            value = f"({value} & {(1 << bits) - 1})"
        terms += f" | {value} << {shift}" if shift else f" | {value}"
    return terms
