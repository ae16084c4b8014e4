"""What the variables of SUBSET-026 issue 3.3.0 have otherwise than issue 3.6.0: literals only."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.standard.vocabulary import Codes

if TYPE_CHECKING:
    from collections.abc import Mapping

RENAMED: Mapping[str, str] = MappingProxyType({"V_EMA": "V_LOA", "T_EMA": "T_LOA"})
"""Names in issue 3.6.0 and those of this issue."""

AMENDED: Mapping[str, Mapping[str, Any]] = MappingProxyType(
    {
        "A_NVMAXREDADH1": {"plain": (0, 63), "codes": ()},
        "A_NVMAXREDADH2": {"plain": (0, 63), "codes": ()},
        "A_NVMAXREDADH3": {"plain": (0, 63), "codes": ()},
        "T_LOA": {"title": "validity time of the limit speed"},
        "V_LOA": {"title": "speed at the LOA"},
    }
)

RECODED: Mapping[str, tuple[Codes, ...]] = MappingProxyType(
    {
        "D_LOOP": (Codes(32767, 32767, "special", "distance not known"),),
        "L_LOOP": (Codes(32767, 32767, "special", "length not known"),),
        "M_ERROR": (Codes(6, 6, "value", "safety critical failure"),),
        "M_MODETEXTDISPLAY": (
            Codes(9, 10, "spare", "spare"),
            Codes(11, 11, "value", "non leading"),
        ),
        "M_VERSION": (Codes(33, 127, "range", "reserved for later versions (valid value)"),),
        "Q_EMERGENCYSTOP": (
            Codes(0, 0, "value", "conditional stop accepted, EOA updated"),
            Codes(1, 1, "value", "conditional stop accepted, EOA not updated"),
            Codes(2, 2, "value", "unconditional stop accepted"),
            Codes(3, 3, "value", "stop rejected"),
        ),
        "Q_MAMODE": (
            Codes(0, 0, "value", "profile start is the EOA, SvL kept from the MA"),
            Codes(1, 1, "value", "profile start is both EOA and SvL"),
        ),
        "Q_MARQSTREASON": (Codes(2, 2, "bit", "time before pre-indication location reached"),),
        "Q_ORIENTATION": (
            Codes(0, 0, "value", "passed in reverse direction"),
            Codes(1, 1, "value", "passed in nominal direction"),
        ),
    }
)

WITHOUT: tuple[str, ...] = ("Q_LSSMA", "T_LSSMA")
