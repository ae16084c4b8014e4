"""Composing an issue from another: what is the same is declared once.

Precedence is explicit: what a revision declares comes before what it is composed from, and of
several revisions the last one wins.
"""

from __future__ import annotations

from dataclasses import replace
from typing import TYPE_CHECKING, Any, TypeVar, assert_never

from fishplate.errors import RegistryError
from fishplate.standard.vocabulary import (
    TO_TRACK,
    Codes,
    Condition,
    Declarations,
    Field,
    Group,
    Node,
    Opaque,
    Packet,
    RadioMessage,
    Repeat,
    Revision,
    Series,
    Text,
    Variable,
    When,
)

if TYPE_CHECKING:
    from collections.abc import Callable, Iterable, Mapping

    from fishplate.standard.vocabulary import Header

_Item = TypeVar("_Item", Variable, Packet, RadioMessage)


def composed(
    base: Declarations,
    *revisions: Revision,
    layouts: str,
    version: str,
    issue: str,
    date: str,
    beside: tuple[Declarations, ...] = (),
) -> Declarations:
    """Return the declarations of `base`, revised one revision after the other.

    `beside` are further declarations that the revisions take from. Evidence and other forms
    belong to one issue and are not taken over. Raises `RegistryError` where a revision amends or
    leaves out what is not there.
    """
    sources = (base, *beside)
    bases = dict.fromkeys(name for each in sources for name in (*each.bases, each.layouts))
    declared = replace(
        base,
        layouts=layouts,
        version=version,
        issue=issue,
        date=date,
        evidence=(),
        forms=(),
        bases=tuple(bases),
    )
    for revision in revisions:
        declared = _revised(declared, revision)
    return declared


def _revised(base: Declarations, revision: Revision) -> Declarations:
    names = revision.renamed
    _check_names(base, revision)
    variables = _merged(
        [_recoded(_renamed_variable(each, names), revision.recoded) for each in base.variables],
        lambda each: each.name,
        revision.variables,
        revision.amended_variables,
        revision.without_variables,
    )
    packets = _merged(
        [_with_nodes(each, names) for each in base.packets],
        _key,
        revision.packets,
        revision.amended_packets,
        revision.without_packets,
    )
    messages = _merged(
        [_with_nodes(each, names) for each in base.messages],
        _key,
        revision.messages,
        revision.amended_messages,
        revision.without_messages,
    )
    return replace(
        base,
        variables=tuple(sorted(variables, key=lambda each: each.name)),
        packets=tuple(sorted(packets, key=lambda each: (each.direction == TO_TRACK, each.number))),
        messages=tuple(
            sorted(messages, key=lambda each: (each.direction != TO_TRACK, each.number))
        ),
        headers=tuple(_renamed_header(each, names) for each in base.headers),
    )


def _check_names(base: Declarations, revision: Revision) -> None:
    """Hold renaming and new codes to variables that are there, once each."""
    there = {each.name for each in base.variables}
    for name in revision.renamed:
        if name not in there:
            raise RegistryError(f"{name} is renamed, but not there")
    named = [revision.renamed.get(each, each) for each in sorted(there)]
    for name in named:
        if named.count(name) > 1:
            raise RegistryError(f"{name} is the name of two variables after renaming")
    for name in revision.recoded:
        if name not in named:
            raise RegistryError(f"{name} has new codes, but is not there")


def _key(item: Packet | RadioMessage) -> tuple[str, int]:
    return item.direction, item.number


def _merged(
    items: Iterable[_Item],
    key: Callable[[_Item], Any],
    whole: Iterable[_Item],
    amended: Mapping[Any, Mapping[str, Any]],
    without: Iterable[Any],
) -> list[_Item]:
    """Leave out, replace or add, then amend; each item has its one key."""
    found = {key(each): each for each in items}
    for each in without:
        if found.pop(each, None) is None:
            raise RegistryError(f"{each} is left out, but not there")
    found |= {key(each): each for each in whole}
    for each, attributes in amended.items():
        if each not in found:
            raise RegistryError(f"{each} is amended, but not there")
        found[each] = replace(found[each], **attributes)
    return list(found.values())


def _renamed_variable(variable: Variable, names: Mapping[str, str]) -> Variable:
    """Give a variable its name in this issue; its lineage stays."""
    if variable.name not in names:
        return variable
    name = names[variable.name]
    former = tuple(each for each in variable.formerly if each != name)
    return replace(variable, name=name, formerly=former)


def _recoded(variable: Variable, recoded: Mapping[str, tuple[Codes, ...]]) -> Variable:
    new = recoded.get(variable.name)
    if new is None:
        return variable
    kept = [old for old in variable.codes if not any(_overlap(old, each) for each in new)]
    return replace(variable, codes=tuple(sorted((*kept, *new), key=lambda each: each.first)))


def _overlap(one: Codes, other: Codes) -> bool:
    return one.first <= other.last and other.first <= one.last


def _with_nodes(item: Any, names: Mapping[str, str]) -> Any:
    nodes = renamed_nodes(item.nodes, names)
    return item if nodes == item.nodes else replace(item, nodes=nodes)


def _renamed_header(header: Header, names: Mapping[str, str]) -> Header:
    return replace(header, nodes=renamed_nodes(header.nodes, names))


def renamed_nodes(nodes: tuple[Node, ...], names: Mapping[str, str]) -> tuple[Node, ...]:
    """Return a layout with other names for some of its variables."""
    return tuple(_renamed_node(each, names) for each in nodes)


def _renamed_node(node: Node, names: Mapping[str, str]) -> Node:
    match node:
        case Field():
            return replace(node, variable=names.get(node.variable, node.variable))
        case Group() | Series() | Repeat():
            return replace(node, nodes=renamed_nodes(node.nodes, names))
        case When():
            condition: Condition = node.condition
            variable = names.get(condition.variable, condition.variable)
            return When(replace(condition, variable=variable), renamed_nodes(node.nodes, names))
        case Text():
            return Text(names.get(node.length, node.length), names.get(node.element, node.element))
        case Opaque():
            return node
        case _ as unknown:
            assert_never(unknown)
