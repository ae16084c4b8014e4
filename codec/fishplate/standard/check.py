"""Checks of the declarations: a wrong one is found when the registry is built, with its place."""

from __future__ import annotations

from decimal import Decimal, InvalidOperation
from typing import TYPE_CHECKING

from fishplate.errors import Path, RegistryError
from fishplate.standard.vocabulary import (
    COUNT,
    SCALED,
    UNITS,
    Declarations,
    Direction,
    Eq,
    Field,
    Group,
    Header,
    In,
    Ne,
    Node,
    Opaque,
    Packet,
    RadioMessage,
    Repeat,
    Series,
    Text,
    Variable,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Iterable, Sequence

RESERVED_KEYS = frozenset(
    {
        "content",
        "surplus",
        "padding",
        "filler",
        "problems",
        "packets",
        "header",
        "accepted",
        "form",
        "evidence",
    }
)
"""Keys that a tree uses for itself, so that no field or set may take them."""

FIXED_WIDTHS = {"latin1": 8, "group-identity": 24, "version": 7}
NIBBLE = 4

PACKET_HEADS = (
    ("NID_PACKET", "Q_DIR", "L_PACKET"),
    ("NID_PACKET", "L_PACKET"),
)
MESSAGE_HEAD = ("NID_MESSAGE", "L_MESSAGE")
TELEGRAM_HEAD = ("Q_UPDOWN", "M_VERSION", "Q_MEDIA")


def check(declarations: Declarations) -> None:
    """Raise `RegistryError` for the first declaration that is wrong, naming its place."""
    _unique((each.name for each in declarations.variables), "variable", ())
    variables = {each.name: each for each in declarations.variables}
    for variable in declarations.variables:
        _check_variable(variable)
    if COUNT not in variables:
        raise RegistryError(f"no variable {COUNT}: repetitions cannot be counted")
    _unique((each.lineage for each in declarations.variables), "lineage", ())
    _unique(((each.direction, each.number) for each in declarations.packets), "packet", ())
    _unique(((each.direction, each.number) for each in declarations.messages), "message", ())
    _unique((each.medium for each in declarations.headers), "header", ())
    for packet in declarations.packets:
        _check_packet(packet, variables)
    known = {(each.direction, each.number) for each in declarations.packets}
    for message in declarations.messages:
        _check_message(message, variables, known)
    for header in declarations.headers:
        _check_header(header, variables)
    _check_notes(declarations, known)


def _check_notes(declarations: Declarations, packets: set[tuple[Direction, int]]) -> None:
    """Hold evidence and other forms to what is declared."""
    subjects: set[tuple[str | int, ...]] = {()}
    subjects |= {("variable", each.name) for each in declarations.variables}
    subjects |= {("packet", *each) for each in packets}
    subjects |= {("message", each.direction, each.number) for each in declarations.messages}
    for evidence in declarations.evidence:
        if evidence.subject not in subjects:
            what = " ".join(map(str, evidence.subject))
            raise RegistryError(f"evidence on {what}, which is not declared")
    for form in declarations.forms:
        if (form.direction, form.number) not in packets:
            raise RegistryError(f"other form of packet {form.number}, which is not declared")


def _unique(names: Iterable[object], what: str, path: Path) -> None:
    seen = set()
    for name in names:
        if name in seen:
            raise RegistryError(f"{what} {name} is declared twice", path=path)
        seen.add(name)


def _check_variable(variable: Variable) -> None:
    path = (variable.name,)
    if variable.bits < 1:
        raise RegistryError(f"width {variable.bits} is not positive", path=path)
    fixed = FIXED_WIDTHS.get(variable.coding, variable.bits)
    if variable.bits != fixed:
        raise RegistryError(
            f"width mismatch: coding {variable.coding} takes {fixed} bits, not {variable.bits}",
            path=path,
        )
    if variable.coding == "digits" and variable.bits % NIBBLE:
        raise RegistryError(f"width mismatch: digits do not fill {variable.bits} bits", path=path)
    if variable.unit not in UNITS:
        raise RegistryError(f"unit {variable.unit!r} is none of the vocabulary", path=path)
    if variable.resolution == SCALED:
        if variable.unit != "m":
            raise RegistryError("a scaled variable is in metres", path=path)
    elif variable.resolution:
        _check_resolution(variable.resolution, path)
    _check_codes(variable, path)


def _check_resolution(text: str, path: Path) -> None:
    try:
        step = Decimal(text)
    except InvalidOperation:
        raise RegistryError(f"resolution {text!r} is not a decimal number", path=path) from None
    if not step.is_finite() or step <= 0:
        raise RegistryError(f"resolution {text} is not positive", path=path)


def _check_codes(variable: Variable, path: Path) -> None:
    low = -(1 << variable.bits - 1) if variable.coding == "signed" else 0
    high = (1 << variable.bits) - 1 + low
    spans = [(each.first, each.last, each.label) for each in variable.codes]
    if variable.plain is not None:
        spans.append((*variable.plain, "plain numbers"))
    for first, last, label in spans:
        if not low <= first <= last <= high:
            raise RegistryError(
                f"width mismatch: codes {first} to {last} ({label}) do not fit "
                f"{variable.bits} bits",
                path=path,
            )
    last_taken = low - 1
    singles = [each for each in variable.codes if each.kind in {"value", "special", "spare"}]
    for codes in sorted(singles, key=lambda each: each.first):
        if codes.first <= last_taken:
            raise RegistryError(f"code {codes.first} is declared twice", path=path)
        last_taken = codes.last


class _Layout:
    """One pass over a layout, in wire order, with the variables read so far in each scope."""

    def __init__(self, variables: dict[str, Variable]) -> None:
        self.variables = variables

    def check(self, nodes: Sequence[Node], path: Path, read: dict[str, Variable]) -> None:
        """Check one scope; `read` holds the variables of the enclosing scopes."""
        self._scope(nodes, path, dict(read), set(), last_in_packet=True)

    def _scope(
        self,
        nodes: Sequence[Node],
        path: Path,
        read: dict[str, Variable],
        keys: set[str],
        *,
        last_in_packet: bool,
    ) -> None:
        if not nodes:
            raise RegistryError("no field in it", path=path)
        for index, node in enumerate(nodes):
            last = last_in_packet and index == len(nodes) - 1
            match node:
                case Field():
                    self._key(node.name, path, keys)
                    read[node.variable] = self._field(node, path, read)
                case When():
                    self._condition(node.condition, path, read)
                    # What is read under a condition may be absent behind it.
                    self._scope(node.nodes, path, dict(read), keys, last_in_packet=last)
                case Group() | Series() | Repeat():
                    self._key(node.name, path, keys)
                    inner = (*path, node.name)
                    if not _begins_with_field(node):
                        raise RegistryError("a set begins with a field", path=inner)
                    self._scope(node.nodes, inner, dict(read), set(), last_in_packet=False)
                case Text():
                    self._key(node.element, path, keys)
                    self._text(node, path)
                case Opaque():
                    self._key(node.name, path, keys)
                    if not last:
                        raise RegistryError(f"{node.name} is not the last of its packet", path=path)

    def _key(self, key: str, path: Path, keys: set[str]) -> None:
        if key in keys:
            raise RegistryError(f"key {key} stands twice in one scope", path=path)
        if key in RESERVED_KEYS:
            raise RegistryError(f"key {key} is reserved for the tree itself", path=path)
        keys.add(key)

    def _variable(self, name: str, path: Path) -> Variable:
        if name not in self.variables:
            raise RegistryError(f"unknown variable {name}", path=path)
        return self.variables[name]

    def _field(self, node: Field, path: Path, read: dict[str, Variable]) -> Variable:
        variable = self._variable(node.variable, path)
        if variable.name == COUNT or variable.coding == "latin1":
            raise RegistryError(f"{variable.name} cannot stand as a field", path=path)
        if variable.resolution == SCALED and "Q_SCALE" not in read:
            raise RegistryError(f"{variable.name} is scaled, but no Q_SCALE is read", path=path)
        return variable

    def _condition(self, condition: Eq | Ne | In, path: Path, read: dict[str, Variable]) -> None:
        self._variable(condition.variable, path)
        if condition.variable not in read:
            raise RegistryError(
                f"condition on {condition.variable}, which is not yet read", path=path
            )
        codes = condition.codes if isinstance(condition, In) else (condition.code,)
        bits = read[condition.variable].bits
        if not codes:
            raise RegistryError(f"condition on no code of {condition.variable}", path=path)
        for code in codes:
            if code < 0 or code >> bits:
                raise RegistryError(
                    f"width mismatch: {condition.variable} of {bits} bits is never {code}",
                    path=path,
                )

    def _text(self, node: Text, path: Path) -> None:
        self._variable(node.length, path)
        if self._variable(node.element, path).coding != "latin1":
            raise RegistryError(f"{node.element} is not a text character", path=path)


def _begins_with_field(node: Group | Series | Repeat) -> bool:
    return not isinstance(node.nodes[0], (When, Series, Repeat, Text)) if node.nodes else True


def _heads_with(nodes: Sequence[Node], names: Sequence[str]) -> bool:
    start = nodes[: len(names)]
    return [each.name if isinstance(each, Field) else "" for each in start] == list(names)


def _check_packet(packet: Packet, variables: dict[str, Variable]) -> None:
    path: Path = (f"{packet.direction} packet {packet.number}",)
    _Layout(variables).check(packet.nodes, path, {})
    _check_number(packet.number, variables["NID_PACKET"], path)
    measured = any(isinstance(each, Field) and each.name == "L_PACKET" for each in packet.nodes)
    heads = PACKET_HEADS if measured else (("NID_PACKET",),)
    if not measured and not all(isinstance(each, Field) for each in packet.nodes):
        raise RegistryError("without L_PACKET, only fixed variables may stand here", path=path)
    if not any(_heads_with(packet.nodes, head) for head in heads):
        raise RegistryError("a packet begins with NID_PACKET, [Q_DIR,] L_PACKET", path=path)


def _check_number(number: int, variable: Variable, path: Path) -> None:
    if not 0 <= number < 1 << variable.bits:
        raise RegistryError(f"width mismatch: the number does not fit {variable.name}", path=path)


def _check_message(
    message: RadioMessage, variables: dict[str, Variable], known: set[tuple[Direction, int]]
) -> None:
    path: Path = (f"{message.direction} message {message.number}",)
    _Layout(variables).check(message.nodes, path, {})
    _check_number(message.number, variables["NID_MESSAGE"], path)
    if not _heads_with(message.nodes, MESSAGE_HEAD):
        raise RegistryError("a message begins with NID_MESSAGE, L_MESSAGE", path=path)
    _only_fields(message.nodes, path)
    carried = [number for choice in message.required.packets for number in choice]
    carried += [each.packet for each in message.optional]
    for number in carried:
        if (message.direction, number) not in known:
            raise RegistryError(f"carries packet {number}, which is not declared", path=path)
    _unique(((each.packet, each.sender) for each in message.optional), "optional packet", path)


def _check_header(header: Header, variables: dict[str, Variable]) -> None:
    path: Path = (f"{header.medium} header",)
    _Layout(variables).check(header.nodes, path, {})
    if not _heads_with(header.nodes, TELEGRAM_HEAD):
        raise RegistryError("a header begins with Q_UPDOWN, M_VERSION, Q_MEDIA", path=path)
    fields = _only_fields(header.nodes, path)
    width = sum(variables[each.variable].bits for each in fields)
    if width != header.bits:
        raise RegistryError(
            f"width mismatch: fields take {width} bits, {header.bits} are declared", path=path
        )


def _only_fields(nodes: Sequence[Node], path: Path) -> list[Field]:
    fields = [each for each in nodes if isinstance(each, Field)]
    if len(fields) != len(nodes):
        raise RegistryError("only fixed variables may stand here", path=path)
    return fields
