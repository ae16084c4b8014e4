"""Codes and what they mean: one table drives both directions.

Source of every value: SUBSET-026 issue 3.6.0, chapter 7.5.1 (steps, ranges, special and spare
codes, labels), the clause of each variable as in ``fixtures/standard``. How a quantity is written
("120 km/h") is the library's own.
"""

from __future__ import annotations

from decimal import Decimal
from random import Random
from typing import TYPE_CHECKING

import pytest

from fishplate.errors import EncodeError
from fishplate.meaning import UNITS, explain, parse
from fishplate.standard import registry
from fishplate.standard.vocabulary import SCALED
from fishplate.standard.vocabulary import UNITS as DECLARED_UNITS

if TYPE_CHECKING:
    from fishplate.standard.vocabulary import Variable

VARIABLES = registry("2.1").variables

# variable, code, Q_SCALE, text, kind
BOTH_WAYS = [
    # plain numbers: code times step
    ("V_STATIC", 24, None, "120 km/h", "quantity"),
    ("V_STATIC", 0, None, "0 km/h", "quantity"),
    ("V_STATIC", 120, None, "600 km/h", "quantity"),
    ("T_EMA", 0, None, "0 s", "quantity"),
    ("T_EMA", 1022, None, "1022 s", "quantity"),
    ("T_TRAIN", 1, None, "0.01 s", "quantity"),
    ("T_TRAIN", 123456, None, "1234.56 s", "quantity"),
    ("T_TRAIN", 4294967294, None, "42949672.94 s", "quantity"),
    ("G_A", 254, None, "254 ‰", "quantity"),
    ("A_NVP12", 63, None, "3.15 m/s²", "quantity"),
    ("A_NVP12", 20, None, "1 m/s²", "quantity"),
    ("M_NVAVADH", 20, None, "1", "quantity"),
    ("M_NVAVADH", 1, None, "0.05", "quantity"),
    ("M_CURRENT", 1000, None, "10000 A", "quantity"),
    ("M_MCOUNT", 253, None, "253", "quantity"),
    ("L_PACKET", 390, None, "390 bits", "quantity"),
    ("L_MESSAGE", 176, None, "176 bytes", "quantity"),
    # distances: the step is the governing Q_SCALE's (7.5.1.129: 10 cm, 1 m, 10 m)
    ("D_GRADIENT", 1234, 0, "123.4 m", "quantity"),
    ("D_GRADIENT", 1234, 1, "1234 m", "quantity"),
    ("D_GRADIENT", 1234, 2, "12340 m", "quantity"),
    ("D_GRADIENT", 32767, 2, "327670 m", "quantity"),
    ("D_EMERGENCYSTOP", 5, 0, "0.5 m", "quantity"),
    ("D_REF", -32768, 0, "-3276.8 m", "quantity"),
    ("D_REF", -1, 1, "-1 m", "quantity"),
    ("D_REF", 32767, 2, "327670 m", "quantity"),
    # always metres, whatever the scale says
    ("L_TRAININT", 400, 0, "400 m", "quantity"),
    ("L_TRAININT", 400, 2, "400 m", "quantity"),
    ("Q_LOCACC", 12, 2, "12 m", "quantity"),
    ("Q_NVLOCACC", 12, 0, "12 m", "quantity"),
    # special codes
    ("T_EMA", 1023, None, "infinite", "special"),
    ("V_STATIC", 127, None, "speed profile ends at this D_STATIC", "special"),
    ("G_A", 255, None, "gradient description ends at this D_GRADIENT", "special"),
    ("D_LRBG", 32767, 0, "unknown", "special"),
    ("T_TRAIN", 4294967295, None, "unknown", "special"),
    ("NID_LRBG", 16777215, None, "unknown", "special"),
    ("M_MCOUNT", 255, None, "fits every message of the group", "special"),
    ("M_CURRENT", 1023, None, "no restriction of current consumption", "special"),
    # labels
    ("M_MODE", 0, None, "full supervision", "value"),
    ("M_MODE", 15, None, "passive shunting", "value"),
    ("M_ACK", 0, None, "no acknowledgement required", "value"),
    ("M_ACK", 1, None, "acknowledgement required", "value"),
    ("M_LEVEL", 1, None, "level NTC (see NID_NTC)", "value"),
    ("M_AXLELOADCAT", 10, None, "D4XL", "value"),
    ("NC_CDTRAIN", 2, None, "130 mm", "value"),
    ("M_NVEBCL", 3, None, "99.9 %", "value"),
    ("Q_SCALE", 0, None, "10 cm", "value"),
    ("Q_SCALE", 2, None, "10 m", "value"),
    ("D_VALIDNV", 32767, 1, "now, immediately applicable", "special"),
    # bit sets
    ("NC_TRAIN", 0, None, "none", "set"),
    ("NC_TRAIN", 1, None, "freight train braked in P", "set"),
    ("NC_TRAIN", 5, None, "freight train braked in P + passenger train", "set"),
    ("NC_TRAIN", 12, None, "passenger train + spare bit 8", "spare"),
    ("Q_MARQSTREASON", 9, None, "start selected by driver + track description deleted", "set"),
    # identities: NID_C in the 10 high, NID_BG in the 14 low bits (7.5.1.90)
    ("NID_LRBG", 16 << 14 | 257, None, "16/257", "identity"),
    ("NID_LRBG", 0, None, "0/0", "identity"),
    ("NID_LRBG", 1023 << 14 | 16382, None, "1023/16382", "identity"),
    # versions: X in the 3 high, Y in the 4 low bits (7.5.1.79)
    ("M_VERSION", 33, None, "2.1", "identity"),
    ("M_VERSION", 16, None, "1.0", "identity"),
]


@pytest.mark.parametrize(("name", "code", "scale", "text", "kind"), BOTH_WAYS)
def test_both_ways(name: str, code: int, scale: int | None, text: str, kind: str) -> None:
    meaning = explain(VARIABLES[name], code, scale)
    assert (meaning.text, meaning.kind) == (text, kind)
    assert parse(VARIABLES[name], text, scale) == code


# What else a person may write.
WRITTEN = [
    ("V_STATIC", "120km/h", None, 24),
    ("V_STATIC", "  120   KM/H ", None, 24),
    ("V_STATIC", "120.0 km/h", None, 24),
    ("V_STATIC", 24, None, 24),
    ("T_EMA", "2 min", None, 120),
    ("T_EMA", "0.1 h", None, 360),
    ("T_EMA", "INFINITE", None, 1023),
    ("T_TRAIN", "10 ms", None, 1),
    ("D_GRADIENT", "1.2 km", 1, 1200),
    ("D_GRADIENT", "1.2 km", 2, 120),
    ("D_GRADIENT", "50 cm", 0, 5),
    ("D_GRADIENT", "5 dm", 0, 5),
    ("L_TRAININT", "0.4 km", 0, 400),
    ("G_A", "6 permille", None, 6),
    ("G_A", "6 per mille", None, 6),
    ("G_A", "6‰", None, 6),
    ("A_NVP12", "0.55 m/s2", None, 11),
    ("A_NVP12", "0.55 m/s²", None, 11),
    ("M_CURRENT", "1.2 kA", None, 120),
    ("D_REF", "-20 m", 0, -200),
    ("D_REF", "+20 m", 1, 20),
    ("D_REF", -20, 1, -20),
    ("M_MODE", "On Sight", None, 1),
    ("M_MODE", "shunting", None, 3),  # whole label before the longer one that holds it
    ("M_LEVEL", "level NTC", None, 1),
    ("D_LEVELTR", "now", None, 32767),  # what stands before the comma
    ("Q_NEWCOUNTRY", "other country or region", None, 1),
    ("NC_CDTRAIN", "80 mm", None, 0),  # the quantity at the end of the label
    ("NC_CDTRAIN", "180 mm", None, 5),
    ("M_AXLELOADCAT", "d2", None, 7),
    ("NC_TRAIN", [], None, 0),
    ("NC_TRAIN", "none", None, 0),
    ("NC_TRAIN", ["passenger train"], None, 4),
    ("NC_TRAIN", ("passenger train", "FREIGHT TRAIN BRAKED IN G"), None, 6),
    ("NC_TRAIN", ["passenger train", "passenger train"], None, 4),
    ("NC_TRAIN", 16385, None, 16385),
    ("NID_LRBG", "16 / 257", None, 16 << 14 | 257),
    ("NID_LRBG", "UNKNOWN", None, 16777215),
    ("M_VERSION", "2.0", None, 32),
    ("M_VERSION", "3.0", None, 48),
    # digits stay texts: 64 bits do not survive every reader of JSON
    ("NID_RADIO", "0049 123 456", None, "0049123456"),
    ("NID_RADIO", "", None, ""),
    ("NID_RADIO", "use the short number stored on board", None, ""),
    ("NID_OPERATIONAL", "12345678", None, "12345678"),
]


@pytest.mark.parametrize(("name", "given", "scale", "code"), WRITTEN)
def test_other_ways_to_write_a_code(
    name: str, given: object, scale: int | None, code: int | str
) -> None:
    assert parse(VARIABLES[name], given, scale) == code


# What cannot be meant, and what the error has to name.
REFUSED = [
    # nearest representable values
    ("V_STATIC", "122 km/h", None, ("24 (120 km/h)", "25 (125 km/h)")),
    ("V_STATIC", "1000 km/h", None, ("120 (600 km/h)",)),
    ("V_STATIC", "605 km/h", None, ("120 (600 km/h)",)),  # 121 is spare
    ("V_STATIC", "635 km/h", None, ("120 (600 km/h)",)),  # 127 is no speed
    ("V_STATIC", "-5 km/h", None, ("0 (0 km/h)",)),
    ("T_EMA", "1023 s", None, ("1022 (1022 s)",)),  # 1023 means infinite
    ("G_A", "255 ‰", None, ("254 (254 ‰)",)),
    ("D_GRADIENT", "15 m", 2, ("1 (10 m)", "2 (20 m)")),
    ("D_GRADIENT", "0.05 m", 0, ("0 (0 m)", "1 (0.1 m)")),
    ("D_GRADIENT", "40 km", 1, ("32767 (32767 m)",)),
    ("D_REF", "-40 km", 1, ("-32768 (-32768 m)",)),
    ("D_REF", "-0.25 m", 0, ("-3 (-0.3 m)", "-2 (-0.2 m)")),
    ("M_CURRENT", "15 A", None, ("1 (10 A)", "2 (20 A)")),
    # units
    ("V_STATIC", "120", None, ("no unit", "km/h")),
    ("V_STATIC", "120 mph", None, ("'mph'", "km/h")),
    ("V_STATIC", "120 m", None, ("'m'", "km/h")),
    ("T_EMA", "5 m", None, ("'m'", "min")),
    ("M_MCOUNT", "5 m", None, ("'5 m' is not a number",)),
    ("NID_BG", "16/257", None, ("'16/257' is not a number",)),
    ("V_STATIC", "\uff1120 km/h", None, ("is not a number",)),  # a fullwidth digit
    # scales
    ("D_GRADIENT", "5 m", None, ("Q_SCALE",)),
    ("D_GRADIENT", "5 m", 3, ("Q_SCALE",)),
    # labels
    ("M_MODE", "sight seeing", None, ("full supervision", "and 4 more")),
    ("M_MODE", "supervision", None, ("full supervision", "limited supervision")),
    ("M_MODE", "1", None, ("full supervision",)),
    ("M_MODE", "", None, ("full supervision",)),
    ("M_AXLELOADCAT", "D", None, ("D2", "D3", "D4", "D4XL")),
    ("M_LEVEL", "spare", None, ("level 0",)),
    ("M_LEVEL", "NTC", None, ("level NTC (see NID_NTC)",)),
    # part of a label may mean its opposite: nothing but the short forms above may be left out
    ("NID_TSR", "revocable", None, ("non revocable",)),
    ("Q_LINKREACTION", "reaction", None, ("no reaction",)),
    ("T_MAR", "on", None, ("no request on this criterion",)),
    ("T_CYCRQST", "repetition", None, ("no repetition",)),
    ("Q_TEXT", "protected", None, ("level crossing not protected",)),
    ("M_VOLTAGE", "fitted", None, ("line not fitted with a traction system",)),
    ("M_LOC", "at balise groups", None, ("not at balise groups",)),
    ("Q_LENGTH", "integrity information", None, ("no integrity information",)),
    ("M_MODE", "leading", None, ("non leading",)),
    ("V_RELEASEDP", "on", None, ("release speed calculated on board",)),
    ("M_TRACKCOND", "powerless section", None, ("lower pantograph", "main power switch")),
    ("NC_TRAIN", ["freight train"], None, ("freight train braked in P", "braked in G")),
    ("NC_TRAIN", ["tram"], None, ("passenger train",)),
    ("NC_TRAIN", [4], None, ("label",)),
    ("NC_TRAIN", {"passenger train": True}, None, ("list of labels",)),
    # identities
    ("NID_LRBG", "1024/1", None, ("1023 and 16383",)),
    ("NID_LRBG", "1/16384", None, ("1023 and 16383",)),
    ("NID_LRBG", "257", None, ("NID_C/NID_BG",)),
    ("M_VERSION", "8.0", None, ("7 and 15",)),
    ("M_VERSION", "2.16", None, ("7 and 15",)),
    ("M_VERSION", "two", None, ("2.1",)),
    # types
    ("M_ACK", True, None, ("quote it",)),
    ("M_ACK", None, None, ("code or a meaning",)),
    ("V_STATIC", 120.0, None, ("code or a meaning",)),
    ("V_STATIC", ["120 km/h"], None, ("code or a meaning",)),
    ("NID_RADIO", 49123456, None, ("quote it",)),
    ("NID_RADIO", "12345678901234567", None, ("16 digits",)),
    ("NID_RADIO", "0049-123", None, ("16 digits",)),
    ("NID_OPERATIONAL", "train 5", None, ("8 digits",)),
]


@pytest.mark.parametrize(("name", "given", "scale", "named"), REFUSED)
def test_what_no_code_says(
    name: str, given: object, scale: int | None, named: tuple[str, ...]
) -> None:
    with pytest.raises(EncodeError) as caught:
        parse(VARIABLES[name], given, scale)
    for each in named:
        assert each in caught.value.reason
    assert name in caught.value.expected
    assert "\n" not in str(caught.value)


def test_an_error_does_not_offer_what_does_not_fit() -> None:
    with pytest.raises(EncodeError) as caught:
        parse(VARIABLES["V_STATIC"], "1000 km/h")
    assert "121" not in caught.value.reason


SPARE = [
    ("V_STATIC", 121, None, "spare"),
    ("V_STATIC", 126, None, "spare"),
    ("Q_SCALE", 3, None, "spare"),
    ("M_LEVEL", 7, None, "spare"),
    ("M_AXLELOADCAT", 127, None, "spare"),
    ("M_VERSION", 18, None, "1.2 (not valid)"),
    ("D_GRADIENT", 7, 3, "7 steps (Q_SCALE gives no unit)"),
    ("D_GRADIENT", 7, None, "7 steps (Q_SCALE gives no unit)"),
]


@pytest.mark.parametrize(("name", "code", "scale", "text"), SPARE)
def test_spare_codes_are_named_so(name: str, code: int, scale: int | None, text: str) -> None:
    meaning = explain(VARIABLES[name], code, scale)
    assert (meaning.text, meaning.kind) == (text, "spare")
    assert meaning.value is None


def test_quantities_are_exact() -> None:
    meaning = explain(VARIABLES["T_TRAIN"], 4294967293)
    assert meaning.value == Decimal("42949672.93")
    assert meaning.unit == "s"
    assert explain(VARIABLES["D_GRADIENT"], 3, 0).value == Decimal("0.3")
    assert explain(VARIABLES["A_NVP12"], 3).value == Decimal("0.15")
    assert explain(VARIABLES["M_CURRENT"], 100).text == "1000 A", "no exponent, zeros kept"


def test_digit_numbers() -> None:
    radio = VARIABLES["NID_RADIO"]
    assert explain(radio, 0x0049123456FFFFFF).text == "0049123456"
    assert explain(radio, 0xFFFFFFFFFFFFFFFF).text == "use the short number stored on board"
    assert explain(radio, 0x0049A23456FFFFFF).text == "0049A23456", "stray nibbles stay visible"
    assert explain(radio, "0049123456").text == "0049123456"
    assert explain(VARIABLES["NID_OPERATIONAL"], 0xFFFFFFFF).kind == "spare"


# --- every variable --------------------------------------------------------------------------


def codes_of(variable: Variable, most: int) -> list[int]:
    """Every code of a variable, or its edges, its labels, and random ones."""
    low = -(1 << variable.bits - 1) if variable.coding == "signed" else 0
    high = low + (1 << variable.bits) - 1
    if 1 << variable.bits <= most:
        return list(range(low, high + 1))
    random = Random(variable.name)  # noqa: S311  the same codes every time
    edges = {low, low + 1, -1, 0, 1, high - 1, high} | set(variable.plain or ())
    for each in variable.codes:
        edges |= {each.first - 1, each.first, each.first + 1, each.last, each.last + 1}
    drawn = {random.randint(low, high) for _ in range(60)}
    return sorted(code for code in edges | drawn if low <= code <= high)


def is_spare(variable: Variable, code: int) -> bool:
    """Tell from the declaration whether a code says nothing."""
    if variable.coding == "bitset":
        return False
    if any(each.kind == "spare" and each.first <= code <= each.last for each in variable.codes):
        return True
    if any(each.first <= code <= each.last for each in variable.codes):
        return False
    return variable.plain is not None and not variable.plain[0] <= code <= variable.plain[1]


def check_variable(name: str, most: int) -> None:
    variable = VARIABLES[name]
    scales = (0, 1, 2) if variable.resolution == SCALED else (None,)
    for code in codes_of(variable, most):
        for scale in scales:
            meaning = explain(variable, code, scale)
            assert meaning.text
            assert "\n" not in meaning.text
            if is_spare(variable, code):
                assert meaning.kind == "spare"
                continue
            if variable.coding == "latin1":
                continue  # characters are never written one by one
            assert meaning.kind != "spare" or variable.coding in ("bitset", "digits")
            again = parse(variable, meaning.text, scale)
            if variable.coding == "digits":
                assert isinstance(again, str)
                again = int(again.ljust(variable.bits // 4, "F"), 16)
            assert again == code, f"{meaning.text} is {again}, not {code}"


@pytest.mark.parametrize("name", VARIABLES)
def test_a_meaning_is_read_back_as_its_code(name: str) -> None:
    check_variable(name, 256)


@pytest.mark.slow
@pytest.mark.parametrize("name", VARIABLES)
def test_meanings_of_wider_variables_are_read_back(name: str) -> None:
    check_variable(name, 1 << 13)


@pytest.mark.parametrize("name", VARIABLES)
def test_no_part_of_a_label_is_read_as_a_label(name: str) -> None:
    """Leaving words out never gives a code, but for the short forms that are documented."""
    variable = VARIABLES[name]
    labels = {each.label.casefold() for each in variable.codes}
    for codes in variable.codes:
        words = codes.label.split(" ")
        for start in range(len(words)):
            for end in range(start + 1, len(words) + 1):
                part = " ".join(words[start:end])
                short = start == 0 and (
                    words[end - 1].endswith(",") or "(" in "".join(words[end : end + 1])
                )
                if part.casefold() in labels or short or part[0].isdigit() or part[-1].isdigit():
                    continue
                with pytest.raises(EncodeError):
                    parse(variable, part if variable.coding != "bitset" else [part])


def test_every_unit_can_be_written() -> None:
    """Each unit a variable may be declared in has words that people may write for it."""
    assert set(UNITS) == DECLARED_UNITS


def test_axle_loads_are_written_in_tonnes() -> None:
    """M_AXLELOAD counts steps of 0.5 t (SUBSET-026 issue 3.6.0, 6.5.1.5.27)."""
    axle_load = registry("1.0").variables["M_AXLELOAD"]
    assert parse(axle_load, "20 t") == 40
    assert parse(axle_load, "22500 kg") == 45
    assert explain(axle_load, 45).text == "22.5 t"
    with pytest.raises(EncodeError, match="nearest"):
        parse(axle_load, "20.2 t")
