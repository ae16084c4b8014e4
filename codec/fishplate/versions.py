"""System versions: codes, names, and which layouts read which version."""

from __future__ import annotations

import re
from functools import cache

from fishplate.engine.runtime import MODULES, codec
from fishplate.standard import registry

DEFAULT_VERSION = "2.1"
"""The version that is assumed where neither the frame nor the caller says one."""


NAME = re.compile(r"[0-7]\.(?:[0-9]|1[0-5])")
"""How a version is written: X of 3 bits, Y of 4 bits."""


def version_text(code: int) -> str:
    """Return the name of an M_VERSION code: X in its 3 high bits, Y in its 4 low bits."""
    return f"{code >> 4}.{code & 15}"


@cache
def defined_codes() -> frozenset[int]:
    """Return the M_VERSION codes that name a version of the standard (SUBSET-026 7.5.1.79)."""
    return frozenset(code for version in MODULES for code in codec(version).versions)


def is_declared_invalid(code: int) -> bool:
    """Tell whether the standard declares an M_VERSION code not valid (SUBSET-026 7.5.1.79)."""
    codes = registry(DEFAULT_VERSION).variables["M_VERSION"].codes
    return any(each.kind == "spare" and each.first <= code <= each.last for each in codes)


@cache
def closest_layouts(version: str) -> str | None:
    """Return the version whose layouts read `version`: itself, else the latest of the same X.

    Versions that differ in Y only are compatible (SUBSET-026 3.17.3); None when none fits, or
    when the text is no version at all.
    """
    if version in MODULES:
        return version
    if not NAME.fullmatch(version):
        return None
    same = [each for each in MODULES if each.partition(".")[0] == version.partition(".")[0]]
    return max(same, key=lambda each: int(each.partition(".")[2]), default=None)
