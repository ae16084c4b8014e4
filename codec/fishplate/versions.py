"""System versions: codes, names, and which layouts read which version."""

from __future__ import annotations

from functools import cache

from fishplate.engine.runtime import MODULES

DEFINED = {16: "1.0", 17: "1.1", 32: "2.0", 33: "2.1"}
"""M_VERSION codes that SUBSET-026 issue 3.6.0 (7.5.1.79) defines, with the version they name."""


def version_text(code: int) -> str:
    """Return the name of an M_VERSION code: X in its 3 high bits, Y in its 4 low bits."""
    return f"{code >> 4}.{code & 15}"


def defined_codes() -> frozenset[int]:
    """Return the M_VERSION codes that name a version of the standard."""
    return frozenset(DEFINED)


@cache
def closest_layouts(version: str) -> str | None:
    """Return the version whose layouts read `version`: itself, else the latest of the same X.

    Versions that differ in Y only are compatible (SUBSET-026 3.17.3); None when none fits.
    """
    if version in MODULES:
        return version
    same = [each for each in MODULES if each.partition(".")[0] == version.partition(".")[0]]
    return max(same, key=lambda each: int(each.partition(".")[2]), default=None)
