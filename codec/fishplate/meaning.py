"""What codes mean, and which code a person means: exact, both ways.

A code becomes a physical quantity (`Decimal` with a unit), a special meaning, a label, a set of
labels, an identity or a version; a text a person writes becomes the code. Distances take the
step of the Q_SCALE that governs them: 0 is 0.1 m, 1 is 1 m, 2 is 10 m (SUBSET-026 7.5.1.129).
"""

from __future__ import annotations

import re
from collections import Counter
from decimal import Decimal
from fractions import Fraction
from functools import cache
from types import MappingProxyType
from typing import TYPE_CHECKING, Literal, NamedTuple

from fishplate.errors import EncodeError
from fishplate.standard.vocabulary import SCALED, Codes, Variable

if TYPE_CHECKING:
    from collections.abc import Iterator, Mapping

Kind = Literal["quantity", "value", "special", "spare", "set", "identity", "text"]

SCALE_STEPS: Mapping[int, str] = MappingProxyType({0: "0.1", 1: "1", 2: "10"})
"""Metres a step, by code of Q_SCALE."""

UNIT_TEXTS = MappingProxyType(
    {
        "permille": "‰",
        "m/s2": "m/s²",
        "bit": "bits",
        "byte": "bytes",
        "character": "characters",
        "day": "days",
    }
)
"""How units are written where the declared word is not what people read."""

UNITS: Mapping[str, Mapping[str, Fraction]] = MappingProxyType(
    {
        "m": {
            "m": Fraction(1),
            "km": Fraction(1000),
            "dm": Fraction(1, 10),
            "cm": Fraction(1, 100),
        },
        "km/h": {"km/h": Fraction(1)},
        "s": {"s": Fraction(1), "min": Fraction(60), "h": Fraction(3600), "ms": Fraction(1, 1000)},
        "permille": {"‰": Fraction(1), "permille": Fraction(1), "per mille": Fraction(1)},
        "m/s2": {"m/s2": Fraction(1), "m/s²": Fraction(1)},
        "A": {"A": Fraction(1), "kA": Fraction(1000)},
        "bit": {"bit": Fraction(1), "bits": Fraction(1)},
        "byte": {"byte": Fraction(1), "bytes": Fraction(1)},
        "character": {"character": Fraction(1), "characters": Fraction(1)},
        "day": {"day": Fraction(1), "days": Fraction(1)},
        "t": {"t": Fraction(1), "kg": Fraction(1, 1000)},
        "": {"": Fraction(1)},
    }
)
"""Units a person may write for each declared unit, and how many of the declared one they are."""

NUMBER = re.compile(r"(?P<number>[+-]?[0-9]+(?:\.[0-9]+)?)\s*(?P<unit>.*)", re.DOTALL)
IDENTITY = re.compile(r"([0-9]+)\s*/\s*([0-9]+)")
VERSION = re.compile(r"([0-9]+)\.([0-9]+)")
LEADING_WORDS = re.compile(r"[^,(]+(?=,| \()")
QUANTITY_AT_END = re.compile(r"\D+ (\d+ \w+)")
NO_BIT = "none"
NO_DIGITS = "no digits"
JOIN = " + "


class Meaning(NamedTuple):
    """What one code means: `text` for people, and the quantity where it is one."""

    text: str
    kind: Kind
    value: Decimal | None = None
    unit: str = ""


def explain(variable: Variable, code: int | str, scale: int | None = None) -> Meaning:
    """Say what a code (a text for X_TEXT and digit numbers) of a variable means."""
    if isinstance(code, str):
        return Meaning(code, "text")
    if variable.coding == "digits":
        return _explain_digits(variable, code)
    if variable.coding == "bitset":
        return _explain_bits(variable, code)
    found = _codes_of(variable, code)
    if variable.coding == "version":
        text = f"{code >> 4}.{code & 15}"
        if found is not None and found.kind == "spare":
            return Meaning(f"{text} ({found.label})", "spare")
        return Meaning(text, "identity")
    if found is not None and found.kind != "range":
        kind: Kind = "value" if found.kind == "value" else "special"
        return Meaning(found.label, "spare" if found.kind == "spare" else kind)
    if variable.coding == "group-identity":
        return Meaning(f"{code >> 14}/{code & 16383}", "identity")
    return _explain_number(variable, code, scale)


def _explain_number(variable: Variable, code: int, scale: int | None) -> Meaning:
    step = _step(variable, scale)
    if step is None:
        return Meaning(f"{code} steps (Q_SCALE gives no unit)", "spare")
    value = code * Decimal(step)
    unit = UNIT_TEXTS.get(variable.unit, variable.unit)
    text = f"{plain_number(value)} {unit}".rstrip()
    if variable.plain and not variable.plain[0] <= code <= variable.plain[1]:
        return Meaning(f"{text} (out of range)", "spare")
    return Meaning(text, "quantity", value, variable.unit)


def plain_number(value: Decimal) -> str:
    """Write a decimal without exponent and without zeros that say nothing."""
    text = f"{value:f}"
    return text.rstrip("0").rstrip(".") if "." in text else text


def _step(variable: Variable, scale: int | None) -> str | None:
    if variable.resolution == SCALED:
        return SCALE_STEPS.get(-1 if scale is None else scale)
    return variable.resolution or "1"


def _codes_of(variable: Variable, code: int) -> Codes | None:
    notes = None
    for codes in variable.codes:
        if codes.first <= code <= codes.last:
            if codes.kind != "range":
                return codes
            notes = codes
    return notes


def _explain_digits(variable: Variable, code: int) -> Meaning:
    found = _codes_of(variable, code)
    if found is not None:
        return Meaning(found.label, "spare" if found.kind == "spare" else "special")
    digits = f"{code:0{variable.bits // 4}X}".rstrip("F") or NO_DIGITS
    return Meaning(digits, "text" if digits.isdecimal() or digits == NO_DIGITS else "spare")


def _explain_bits(variable: Variable, code: int) -> Meaning:
    labels = []
    kind: Kind = "set"
    for bit in variable.codes:
        if bit.kind in {"bit", "spare_bit"} and code & bit.first:
            labels.append(bit.label if bit.kind == "bit" else f"{bit.label} {bit.first}")
            kind = "spare" if bit.kind == "spare_bit" else kind
    return Meaning(JOIN.join(labels) or NO_BIT, kind)


def parse(variable: Variable, given: object, scale: int | None = None) -> int | str:
    """Return the code of what a person wrote: a code, a quantity, a label, an identity.

    Integers are codes, texts are meanings, lists are bit sets; digit numbers stay texts. Raises
    `EncodeError`, naming the nearest codes or the labels there are.
    """
    if variable.coding == "digits":
        return _parse_digits(variable, given)
    if isinstance(given, bool):
        raise _error(variable, given, "expected a code or a meaning, got yes or no: quote it")
    if isinstance(given, int):
        return given
    if variable.coding == "bitset":
        return _parse_bits(variable, given)
    if not isinstance(given, str):
        raise _error(variable, given, f"expected a code or a meaning, got {given!r}")
    text = " ".join(given.split())
    by_label = _by_label(variable, text)
    if by_label is not None:
        return by_label
    if variable.coding == "group-identity" and (match := IDENTITY.fullmatch(text)):
        return _joined(variable, given, match, 10, 14)
    if variable.coding == "version" and (match := VERSION.fullmatch(text)):
        return _joined(variable, given, match, 3, 4)
    match = NUMBER.fullmatch(text)
    if match is None or variable.coding in {"group-identity", "version"} or _only_labels(variable):
        raise _error(variable, given, _no_such_label(variable, text))
    return _parse_number(variable, text, match, scale)


def _parse_number(variable: Variable, text: str, match: re.Match[str], scale: int | None) -> int:
    factors = UNITS[variable.unit]
    unit = match["unit"].strip()
    if unit and not variable.unit:
        raise _error(variable, text, f"{text!r} is not a number")
    factor = {name.casefold(): each for name, each in factors.items()}.get(unit.casefold())
    if factor is None:
        names = " or ".join(factors)
        if unit.startswith(","):
            raise _error(variable, text, f"{text!r}: write decimals with a point")
        reason = f"{text!r} is in {unit!r}, expected {names}" if unit else f"{text!r} has no unit"
        hint = "" if unit else f": write {text} {next(iter(factors))}, or the code as a number"
        raise _error(variable, text, reason + hint)
    step = _step(variable, scale)
    if step is None:
        raise _error(variable, text, f"{text!r} needs a Q_SCALE of 0, 1 or 2 to govern it")
    steps = Fraction(match["number"]) * factor / Fraction(step)
    low, high = _plain_range(variable)
    code = int(steps) if steps.denominator == 1 else None
    if code is not None and low <= code <= high and _is_number(variable, code):
        return code
    raise _error(variable, text, _nearest(variable, text, steps, scale))


def _nearest(variable: Variable, text: str, steps: Fraction, scale: int | None) -> str:
    low, high = _plain_range(variable)
    below = min(max(steps.numerator // steps.denominator, low), high)
    codes = sorted({below, min(max(below + 1, low), high)} if below < steps else {below})
    offers = " and ".join(f"{code} ({explain(variable, code, scale).text})" for code in codes)
    word = "nearest is" if len(codes) == 1 else "nearest are"
    return f"no code says {text!r}: {word} {offers}"


def _is_number(variable: Variable, code: int) -> bool:
    found = _codes_of(variable, code)
    return found is None or found.kind == "range"


def _plain_range(variable: Variable) -> tuple[int, int]:
    if variable.plain is not None:
        return variable.plain
    low = -(1 << variable.bits - 1) if variable.coding == "signed" else 0
    return low, low + (1 << variable.bits) - 1


def _only_labels(variable: Variable) -> bool:
    """Tell whether every code of the variable is a label, so that no number can be meant."""
    return variable.plain is None and any(each.kind == "value" for each in variable.codes)


def _labels(variable: Variable) -> Iterator[tuple[str, int]]:
    for codes in variable.codes:
        if codes.kind in {"value", "special", "bit"} and codes.first == codes.last:
            yield codes.label, codes.first


@cache
def _label_table(variable: Variable) -> dict[str, int]:
    """Return the code of every label, and of every short form that only one label has.

    Short forms are what stands before a comma or a bracket ("now" for "now, on receipt"), and
    the quantity at the end of a label that begins with words. Nothing else may be left out: a
    "no" or "not" somewhere in a label turns its meaning round.
    """
    labels = [(label.casefold(), code) for label, code in _labels(variable)]
    shorts = [(short, code) for label, code in labels for short in _short_forms(label)]
    counts = Counter(short for short, _ in shorts)
    table = {short: code for short, code in shorts if counts[short] == 1}
    return table | dict(labels)


def accepted_labels(variable: Variable) -> list[str]:
    """Return every label of a variable as people may write it, short forms included."""
    table = _label_table(variable)
    whole = [label for label, _ in _labels(variable)]
    shorts = [short for label in whole for short in _short_forms(label)]
    return whole + [each for each in shorts if each.casefold() in table and each not in whole]


def _short_forms(label: str) -> Iterator[str]:
    if match := LEADING_WORDS.match(label):
        yield match[0]
    if match := QUANTITY_AT_END.fullmatch(label):
        yield match[1]


def _by_label(variable: Variable, text: str) -> int | None:
    return _label_table(variable).get(text.casefold())


def _no_such_label(variable: Variable, text: str) -> str:
    labels = [label for label, _ in _labels(variable)]
    form = "" if _only_labels(variable) or variable.coding == "bitset" else _form(variable)
    if not labels:
        return f"{text!r} is not {form}"
    held = [each for each in labels if text.casefold() in each.casefold()]
    if len(held) > 1:
        return f"{text!r} may be {_listed(held)}"
    return f"{text!r} is not {form + ' or ' if form else ''}one of {_listed(labels)}"


def _form(variable: Variable) -> str:
    forms = {"group-identity": "NID_C/NID_BG", "version": "a version as X.Y"}
    return forms.get(variable.coding, f"a number{' with its unit' if variable.unit else ''}")


def _listed(labels: list[str]) -> str:
    most = 12
    shown = "; ".join(labels[:most])
    return f"{shown}; and {len(labels) - most} more" if len(labels) > most else shown


def _joined(variable: Variable, given: object, match: re.Match[str], high: int, low: int) -> int:
    first, second = int(match[1]), int(match[2])
    if first >> high or second >> low:
        most = f"{(1 << high) - 1} and {(1 << low) - 1}"
        raise _error(variable, given, f"{match[0]!r} is too large: {most} are the most")
    return first << low | second


def _parse_digits(variable: Variable, given: object) -> str:
    nibbles = variable.bits // 4
    if not isinstance(given, str):
        raise _error(variable, given, f"expected digits as text, got {given!r}: quote it")
    labels = [each for each in variable.codes if each.label.casefold() == given.casefold()]
    if labels:
        return f"{labels[0].first:0{nibbles}X}".rstrip("F")
    text = "" if given == NO_DIGITS else "".join(given.split()).upper()
    if len(text) > nibbles or not re.fullmatch("[0-9A-F]*", text):
        raise _error(variable, given, f"{given!r} is not at most {nibbles} digits")
    return text


def _parse_bits(variable: Variable, given: object) -> int:
    if isinstance(given, str):
        given = [] if given.strip().casefold() == NO_BIT else given.split(JOIN)
    if not isinstance(given, (list, tuple)):
        raise _error(variable, given, f"expected a code or a list of labels, got {given!r}")
    code = 0
    for item in given:
        code |= _parse_bit(variable, item)
    return code


def _parse_bit(variable: Variable, item: object) -> int:
    if not isinstance(item, str):
        raise _error(variable, item, f"expected a label, got {item!r}")
    text = " ".join(item.split())
    for bit in variable.codes:
        if bit.kind == "spare_bit" and text.casefold() == f"{bit.label} {bit.first}".casefold():
            return bit.first
    found = _by_label(variable, text)
    if found is None:
        raise _error(variable, item, _no_such_label(variable, text))
    return found


def _error(variable: Variable, given: object, reason: str) -> EncodeError:
    return EncodeError(reason, expected=f"a code or meaning of {variable.name}", got=given)
