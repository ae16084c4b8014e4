"""System versions: codes, names, and which layouts read which version."""

from __future__ import annotations

import re
from functools import cache
from typing import TYPE_CHECKING, Any

from fishplate.standard import known_versions, registry
from fishplate.standard.editions import DEFAULT_VERSION, edition, version_key

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Codes

__all__ = [
    "DEFAULT_VERSION",
    "NAME",
    "closest_layouts",
    "declared_as",
    "defined_codes",
    "is_declared_invalid",
    "no_layouts",
    "told_version",
    "version_code",
    "version_text",
]

NAME = re.compile(r"[0-7]\.(?:[0-9]|1[0-5])")
"""How a version is written: X of 3 bits, Y of 4 bits."""


def version_text(code: int) -> str:
    """Return the name of an M_VERSION code: X in its 3 high bits, Y in its 4 low bits."""
    return f"{code >> 4}.{code & 15}"


def version_code(version: str) -> int:
    """Return the M_VERSION code of a version."""
    x, y = version_key(version)
    return x << 4 | y


def told_version(tree: Mapping[str, Any]) -> object:
    """Return the version a tree is of: as it says itself, else its M_VERSION, else the usual one.

    M_VERSION of a telegram may be a code or a text such as ``"2.1"``.
    """
    if "version" in tree:
        return tree["version"]
    header = tree.get("header")
    code = header.get("M_VERSION") if isinstance(header, dict) else None
    if code is None or "NID_MESSAGE" in tree["header"]:
        return DEFAULT_VERSION
    if type(code) is int:
        return version_text(code)
    return str(code) if NAME.fullmatch(str(code)) else DEFAULT_VERSION


@cache
def defined_codes() -> frozenset[int]:
    """Return the M_VERSION codes of the versions that have layouts."""
    return frozenset(map(version_code, known_versions()))


def declared_as(code: int) -> Codes | None:
    """Return what the latest issue declares an M_VERSION code to be (7.5.1.79)."""
    codes = registry(known_versions()[-1]).variables["M_VERSION"].codes
    return next((each for each in codes if each.first <= code <= each.last), None)


def is_declared_invalid(code: int) -> bool:
    """Tell whether the latest issue declares an M_VERSION code not valid."""
    declared = declared_as(code)
    return declared is not None and declared.kind == "spare"


def no_layouts(version: str) -> str:
    """Say why a version cannot be read or written."""
    reason = f"there are no layouts for system version {version}"
    if not NAME.fullmatch(version):
        return f"{version!r} is no system version"
    declared = declared_as(version_code(version))
    if declared is None:
        return reason
    if declared.kind == "spare":
        return f"system version {version} is declared not valid"
    return f"{reason}: {declared.label}"


@cache
def closest_layouts(version: str) -> str | None:
    """Return the version whose layouts read `version`: itself, else the latest of the same X.

    Versions that differ in Y only are compatible (SUBSET-026 3.17.3); None when none fits, when
    the standard declares the version not valid, or when the text is no version at all.
    """
    if edition(version):
        return version
    if not NAME.fullmatch(version) or is_declared_invalid(version_code(version)):
        return None
    same = [each for each in known_versions() if version_key(each)[0] == version_key(version)[0]]
    return same[-1] if same else None
