"""Which declarations lay out which system version, as which issue prints them: literals only."""

from __future__ import annotations

from typing import NamedTuple


class Edition(NamedTuple):
    """One system version as one issue of the standard prints it.

    `layouts` names the module of its declarations, and that of its generated readers.
    """

    version: str
    issue: str
    layouts: str


DEFAULT_VERSION = "2.1"
"""The version that is assumed where neither the frame nor the caller says one."""

EDITIONS: tuple[Edition, ...] = (
    Edition("2.1", "3.6.0", "v3_6_0"),
    Edition("2.0", "3.3.0", "v3_3_0"),
    Edition("1.0", "3.6.0", "x1_chapter6"),
    Edition("1.1", "3.6.0", "x1_chapter6"),
    Edition("1.0", "2.3.0", "v2_3_0"),
    Edition("3.0", "4.0.0", "v4_0_0"),
    Edition("2.2", "4.0.0", "x2_inferred"),
    Edition("2.3", "4.0.0", "x2_inferred"),
)
"""The first edition of a version is the one that is used unless an issue is asked for.

Where nothing says which version a radio message is of, they are tried in this order.
"""


def edition(version: str, issue: str | None = None) -> Edition | None:
    """Return the edition of a system version; None where it has no layouts.

    It is that of the given issue where this prints the version, else the one it is used with.
    """
    found = [each for each in EDITIONS if each.version == version]
    return next((each for each in found if each.issue == issue), found[0] if found else None)


def first_version(issue: str | None) -> str:
    """Return the version taken where none is said: the usual one, or the first of an issue."""
    found = (each.version for each in EDITIONS if each.issue == issue)
    return next(found, DEFAULT_VERSION)


def known_versions() -> tuple[str, ...]:
    """Return the system versions that have layouts, in ascending order."""
    return tuple(sorted({each.version for each in EDITIONS}, key=version_key))


def prints(issue: str, version: str) -> bool:
    """Tell whether an issue lays out a version; true of a version that no issue lays out."""
    issues = {each.issue for each in EDITIONS if each.version == version}
    return not issues or issue in issues


def known_issues() -> tuple[str, ...]:
    """Return the issues of SUBSET-026 that have layouts, in ascending order."""
    return tuple(sorted({each.issue for each in EDITIONS}))


def reaches(version: str, since: str) -> bool:
    """Tell whether a version may use what is for `since` and later (all of it where empty)."""
    return not since or version_key(version) >= version_key(since)


def version_key(version: str) -> tuple[int, int]:
    """Return X and Y of a version, to compare it with others."""
    x, _, y = version.partition(".")
    return int(x), int(y)
