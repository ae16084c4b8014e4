"""Registries: declarations checked, frozen and kept, keyed by system version and issue."""

from __future__ import annotations

from dataclasses import dataclass
from functools import cache
from importlib import import_module
from types import MappingProxyType
from typing import TYPE_CHECKING

from fishplate.errors import RegistryError
from fishplate.standard.check import check

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import (
        Declarations,
        Header,
        Packet,
        RadioMessage,
        Variable,
    )

ISSUES: Mapping[tuple[str, str], str] = MappingProxyType(
    {("2.1", "3.6.0"): "fishplate.standard.v3_6_0"}
)
"""Where the declarations of a system version, as printed in an issue, are to be found."""

DEFAULT_VERSION = "2.1"


@dataclass(frozen=True, slots=True)
class Registry:
    """All variables and layouts of one system version, read-only.

    Packets and messages are keyed by direction and number, headers by medium.
    """

    version: str
    issue: str
    date: str
    variables: Mapping[str, Variable]
    packets: Mapping[tuple[str, int], Packet]
    messages: Mapping[tuple[str, int], RadioMessage]
    headers: Mapping[str, Header]

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
    )


def known_versions() -> tuple[str, ...]:
    """Return the system versions that have a registry, such as ``("2.1",)``."""
    return tuple(dict.fromkeys(version for version, _ in ISSUES))


@cache
def registry(version: str = DEFAULT_VERSION, issue: str | None = None) -> Registry:
    """Return the registry of a system version, as a given issue prints it where several do.

    Raises `RegistryError` when there is none.
    """
    for (known, printed), module in ISSUES.items():
        if known == version and issue in (None, printed):
            return build(import_module(module).DECLARATIONS)
    wanted = f"{version} as printed in issue {issue}" if issue else version
    offers = ", ".join(f"{known} (issue {printed})" for known, printed in ISSUES)
    raise RegistryError(f"no registry for system version {wanted}; there is {offers}")
