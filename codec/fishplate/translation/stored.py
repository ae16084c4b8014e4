"""What an on-board unit has stored, as the caller says it: codes or meanings to codes."""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.errors import EncodeError
from fishplate.meaning import parse
from fishplate.standard import registry
from fishplate.standard.editions import DEFAULT_VERSION
from fishplate.standard.vocabulary import TO_TRAIN, Field
from fishplate.translation.tables import DEFAULTS

if TYPE_CHECKING:
    from collections.abc import Mapping

NATIONAL_VALUES = 3
HEADER: Mapping[str, Any] = MappingProxyType(
    {"NID_MESSAGE": 24, "T_TRAIN": 0, "M_ACK": 0, "NID_LRBG": 0}
)
"""A general message, to hold packet 3 while it is read."""

RUNNING_NUMBER = "NID_OPERATIONAL"
NUMBERS = "telephone_numbers"
NUMBER = "NID_RADIO"


class Stored(dict[str, Any]):
    """Values that have been read: as codes, under the names of their variables."""


def stored_values(stored: Mapping[str, Any] | None) -> Stored:
    """Return what is stored as codes.

    Names are those of packet 3, any subset, and for data to the track NID_OPERATIONAL and
    `telephone_numbers`. Raises `EncodeError` with a path that begins with ``"stored"``.
    """
    if isinstance(stored, Stored):
        return stored
    if not stored:
        return Stored()
    given = dict(stored)
    variables = registry(DEFAULT_VERSION).variables
    values: dict[str, Any] = {}
    if RUNNING_NUMBER in given:
        number = given.pop(RUNNING_NUMBER)
        values[RUNNING_NUMBER] = _digits(variables[RUNNING_NUMBER], number, (RUNNING_NUMBER,))
    if NUMBERS in given:
        values[NUMBERS] = _telephone_numbers(given.pop(NUMBERS))
    return Stored(values | _national_values(given))


def _digits(variable: Any, given: object, path: tuple[str | int, ...]) -> str:
    try:
        return str(parse(variable, given))
    except EncodeError as error:
        raise EncodeError(error.reason, path=("stored", *path), got=given) from None


def _telephone_numbers(given: object) -> list[dict[str, str]]:
    if not isinstance(given, (list, tuple)):
        raise EncodeError("expected a list of numbers", path=("stored", NUMBERS), got=given)
    variable = registry(DEFAULT_VERSION).variables[NUMBER]
    numbers = (each.get(NUMBER) if isinstance(each, dict) else each for each in given)
    return [
        {NUMBER: _digits(variable, each, (NUMBERS, place))} for place, each in enumerate(numbers)
    ]


def _national_values(given: dict[str, Any]) -> dict[str, Any]:
    """Read packet 3, what is not given filled up with values that are not looked at."""
    from fishplate.models import codes_of  # noqa: PLC0415  only stored values need it

    if not given:
        return {}
    nodes = registry(DEFAULT_VERSION).packets[TO_TRAIN, NATIONAL_VALUES].nodes
    packet: dict[str, Any] = {each.name: 0 for each in nodes if isinstance(each, Field)}
    packet |= {"NID_PACKET": NATIONAL_VALUES, "countries": [{"NID_C": 0}]}
    packet |= {name: DEFAULTS[name].value for name in packet.keys() & DEFAULTS.keys()}
    del packet["L_PACKET"]
    packet |= {name: value for name, value in given.items() if name != "L_PACKET"}
    tree = {"medium": "radio", "version": DEFAULT_VERSION, "header": dict(HEADER)}
    try:
        read = codes_of({**tree, "packets": [packet]})["packets"][0]
    except EncodeError as error:
        path = ("stored", *error.path[2:])
        raise EncodeError(error.reason, path=path, expected=error.expected, got=error.got) from None
    return {name: value for name, value in read.items() if name in given}
