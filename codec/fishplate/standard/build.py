"""Registries: declarations checked, frozen and kept, keyed by system version and issue."""

from __future__ import annotations

from dataclasses import dataclass, replace
from functools import cache
from importlib import import_module
from types import MappingProxyType
from typing import TYPE_CHECKING

from fishplate.errors import RegistryError
from fishplate.standard.check import check
from fishplate.standard.editions import DEFAULT_VERSION, EDITIONS, Edition, edition

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import (
        Declarations,
        Evidence,
        Header,
        OtherForm,
        Packet,
        RadioMessage,
        Variable,
    )


@dataclass(frozen=True, slots=True)
class Registry:
    """All variables and layouts of one system version, read-only.

    Packets and messages are keyed by direction and number, headers by medium. `evidence` says
    what rests on less than the published layouts, `forms` which other version may lay out a
    packet, keyed as packets are. `layouts` names the declarations, `bases` what they are composed
    from.
    """

    version: str
    issue: str
    date: str
    variables: Mapping[str, Variable]
    packets: Mapping[tuple[str, int], Packet]
    messages: Mapping[tuple[str, int], RadioMessage]
    headers: Mapping[str, Header]
    evidence: tuple[Evidence, ...]
    forms: Mapping[tuple[str, int], OtherForm]
    layouts: str
    bases: tuple[str, ...]

    def evidence_of(self, *subject: str | int) -> tuple[Evidence, ...]:
        """Return what is said of a packet, a message, a variable, or (nothing given) of all."""
        return tuple(each for each in self.evidence if each.subject == subject)

    def of_lineage(self, name: str) -> Variable:
        """Return the variable that carries this lineage, whatever this issue calls it."""
        for variable in self.variables.values():
            if variable.lineage == name:
                return variable
        raise RegistryError(f"no variable of lineage {name} in issue {self.issue}")


def build(declarations: Declarations) -> Registry:
    """Check declarations and freeze them; raises `RegistryError` on the first wrong one."""
    check(declarations)
    return Registry(
        version=declarations.version,
        issue=declarations.issue,
        date=declarations.date,
        variables=MappingProxyType({each.name: each for each in declarations.variables}),
        packets=MappingProxyType(
            {(each.direction, each.number): each for each in declarations.packets}
        ),
        messages=MappingProxyType(
            {(each.direction, each.number): each for each in declarations.messages}
        ),
        headers=MappingProxyType({each.medium: each for each in declarations.headers}),
        evidence=declarations.evidence,
        forms=MappingProxyType(
            {(each.direction, each.number): each for each in declarations.forms}
        ),
        layouts=declarations.layouts,
        bases=declarations.bases,
    )


@cache
def registry(version: str = DEFAULT_VERSION, issue: str | None = None) -> Registry:
    """Return the registry of a system version, as a given issue prints it where several do.

    Raises `RegistryError` when there is none.
    """
    found = edition(version, issue)
    if found is None or issue not in (None, found.issue):
        wanted = f"{version} as printed in issue {issue}" if issue else version
        offers = ", ".join(f"{each.version} (issue {each.issue})" for each in sorted(EDITIONS))
        raise RegistryError(f"no registry for system version {wanted}; there is {offers}")
    return _of_edition(found)


@cache
def _of_edition(found: Edition) -> Registry:
    declared = import_module(f"fishplate.standard.{found.layouts}").DECLARATIONS
    return build(replace(declared, version=found.version))
