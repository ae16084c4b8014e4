"""Which tables lay out which system version, and where they are published.

Source: SUBSET-026 (European Union Agency for Railways): 7.5.1.79 of each issue for the versions
it defines, 6.5.1 of issue 3.6.0 for those with X = 1. Nothing of fishplate is imported here.
"""

from __future__ import annotations

from typing import NamedTuple

from oracle import composed, tables


class Edition(NamedTuple):
    """One system version as one issue has it: its tables, and those that frames are drawn from."""

    version: str
    issue: str
    source: str
    tables: tables.Tables
    usable: tables.Tables

    @property
    def name(self) -> str:
        """For test identifiers: version, issue, where in SUBSET-026."""
        return f"{self.version}, SUBSET-026 {self.source}"

    @property
    def version_code(self) -> int:
        """M_VERSION: X in the 3 high bits, Y in the 4 low ones."""
        x, y = self.version.split(".")
        return int(x) << 4 | int(y)


def _printed(version: str, issue: str, folder: str) -> Edition:
    found = tables.published(folder)
    return Edition(version, issue, f"{issue} chapters 7, 8", found, found)


V2_3_0 = _printed("1.0", "2.3.0", "v2_3_0")
V3_3_0 = _printed("2.0", "3.3.0", "v3_3_0")
V3_6_0 = _printed("2.1", "3.6.0", "v3_6_0")
V4_0_0 = _printed("3.0", "4.0.0", "v4_0_0")
X1_0 = Edition(
    "1.0",
    "3.6.0",
    "3.6.0 chapters 6, 7, 8",
    composed.x1(),
    composed.without_packets(composed.x1(), composed.SINCE_1_1),
)
X1_1 = Edition("1.1", "3.6.0", "3.6.0 chapters 6, 7, 8", composed.x1(), composed.x1())
X2_2 = Edition("2.2", "4.0.0", "3.6.0 and 4.0.0, inferred", composed.x2(), composed.x2())
X2_3 = X2_2._replace(version="2.3")

PRINTED = (V2_3_0, V3_3_0, V3_6_0, V4_0_0)
"""Those that an issue prints as a whole in its chapters 7 and 8."""
ALL = (*PRINTED, X1_0, X1_1, X2_2, X2_3)
