"""Bits in and out: one case table for every form, in both directions where there are two."""

from __future__ import annotations

import base64
import re

import bitstring
import pytest

from fishplate import bits
from fishplate.errors import DecodeError, EncodeError

# Text, and the bits it stands for ('0101' text), worked by hand.
TEXTS = {
    "A5": "10100101",
    "a5": "10100101",
    "0xA5": "10100101",
    "0Xa5": "10100101",
    " 0x A5 \n 0f ": "1010010100001111",
    "00 00": "0000000000000000",
    "0b101": "101",
    "0b 0001 0": "00010",
    # Hex that begins with the byte 0B: a capital B, or other than binary digits behind it.
    "0B00": "0000101100000000",
    "0b44": "0000101101000100",
    "0b": "",
    "": "",
    "  ": "",
    "base64:pQ8=": "1010010100001111",
    "BASE64: pQ 8=": "1010010100001111",
    "base64:": "",
}


@pytest.mark.parametrize("text", TEXTS)
def test_text_is_read(text: str) -> None:
    expected = TEXTS[text]
    assert bits.read_text(text) == (int(expected or "0", 2), len(expected))
    assert bits.read_bits(text) == bits.read_text(text)


WRONG = {
    "A": "odd number of hex digits (1)",
    "0xABC": "odd number of hex digits (3)",
    "AG": "character 2 of the text is 'G', not a hex digit",
    "0x12 3z": "character 7 of the text is 'z', not a hex digit",
    "12,34": "character 3 of the text is ',', not a hex digit",
    "é0": "character 1 of the text is 'é', not a hex digit",
    "٣٣": "character 1 of the text is '٣', not a hex digit",
    "0b012": "odd number of hex digits (5)",
    "base64:p": "not base64",
    "base64:p*8=": "not base64",
    "-1": "character 1 of the text is '-', not a hex digit",
    "1_0": "character 2 of the text is '_', not a hex digit",
    "0x0x12": "character 4 of the text is 'x', not a hex digit",
}


@pytest.mark.parametrize("text", WRONG)
def test_wrong_text_is_refused(text: str) -> None:
    with pytest.raises(DecodeError) as caught:
        bits.read_text(text)
    assert WRONG[text] in str(caught.value)


FORMS = {
    "bytes": b"\xa5\x0f",
    "bytearray": bytearray(b"\xa5\x0f"),
    "memoryview": memoryview(b"\xa5\x0f"),
    "hex": "a50f",
    "binary": "0b1010010100001111",
    "base64": "base64:" + base64.b64encode(b"\xa5\x0f").decode(),
    "Bits": bitstring.Bits("0xa50f"),
    "BitArray": bitstring.BitArray("0xa50f"),
}


@pytest.mark.parametrize("form", FORMS)
def test_every_form_gives_the_same_bits(form: str) -> None:
    assert bits.read_bits(FORMS[form]) == (0xA50F, 16)
    for size in range(9, 17):
        assert bits.read_bits(FORMS[form], size) == (0xA50F >> 16 - size, size)


@pytest.mark.parametrize("size", range(12))
def test_bitstrings_of_any_length(size: int) -> None:
    value = (1 << size) - 1
    given = bitstring.Bits("0b" + "1" * size) if size else bitstring.Bits()
    assert bits.read_bits(given) == (value, size)
    back = bits.to_bitstring(value, size)
    assert isinstance(back, bitstring.Bits)
    assert back == given
    assert len(back) == size


@pytest.mark.parametrize(
    ("data", "size", "reason"),
    [
        (b"\xa5", 9, "9 bits are claimed, 8 are there"),
        (b"\xa5", -1, "-1 bits are claimed"),
        (b"\xa5\x00", 8, "8 bits are claimed, but 8 more are there"),
        (b"\xa5\x00", 3, "3 bits are claimed, but 13 more are there"),
        ("A", 5, "5 bits are claimed, 4 are there"),
        (b"", 1, "1 bits are claimed, 0 are there"),
    ],
)
def test_a_size_that_does_not_belong(data: bytes | str, size: int, reason: str) -> None:
    with pytest.raises(DecodeError) as caught:
        bits.read_bits(data, size)
    assert reason in str(caught.value)


def test_half_a_byte_is_fine_when_the_size_is_given() -> None:
    assert bits.read_bits("ABC", 12) == (0xABC, 12)
    assert bits.read_bits("ABC", 9) == (0xABC >> 3, 9)


@pytest.mark.parametrize("data", [None, 5, 1.5, ["A5"], {"bits": 8, "hex": "A5"}, object()])
def test_other_types_are_refused(data: object) -> None:
    with pytest.raises(DecodeError, match=r"expected bytes, hex text or bitstring\.Bits"):
        bits.read_bits(data)


# Bits as '0101' text, and how a tree keeps them: left aligned, upper case, whole bytes.
BLOBS = {
    "": "",
    "1": "80",
    "0": "00",
    "1010": "A0",
    "10101111": "AF",
    "101011110": "AF00",
    "0000000011": "00C0",
    "1111111111111": "FFF8",
}


@pytest.mark.parametrize("text", BLOBS)
def test_unexplained_bits_both_ways(text: str) -> None:
    value, size = int(text or "0", 2), len(text)
    tree = {"bits": size, "hex": BLOBS[text]}
    assert bits.blob(value, size) == tree
    assert bits.read_blob(tree, ()) == (value, size)
    assert bits.to_hex(value, size) == BLOBS[text]
    assert bits.to_bytes(value, size) == bytes.fromhex(BLOBS[text])


@pytest.mark.parametrize(
    "data",
    [
        None,
        "A5",
        {},
        {"bits": 8},
        {"hex": "A5"},
        {"bits": "8", "hex": "A5"},
        {"bits": 8, "hex": 0xA5},
        {"bits": 8, "hex": "A5", "note": "x"},
        {"bits": 9, "hex": "A5"},
        {"bits": 8, "hex": "A5A5"},
        {"bits": -1, "hex": ""},
        {"bits": 8, "hex": "G5"},
        {"bits": 3, "hex": "FF"},
        {"bits": 8, "hex": "0b10100101"},
        {"bits": 8, "hex": "base64:pQ=="},
    ],
)
def test_what_is_no_unexplained_bits(data: object) -> None:
    # Unused low bits are 0 and the text is hex: two texts never stand for the same bits.
    with pytest.raises(EncodeError) as caught:
        bits.read_blob(data, ("packets", 0, "content"))
    assert caught.value.path == ("packets", 0, "content")
    assert caught.value.got == data


# Decimal digits in nibbles, left adjusted, the rest F: NID_RADIO, NID_MN, NID_OPERATIONAL
# (SUBSET-026 issue 3.6.0, 7.5.1.95, 7.5.1.91.1, 7.5.1.92).
@pytest.mark.parametrize(
    ("text", "nibbles", "value"),
    [
        ("", 4, 0xFFFF),
        ("0", 4, 0x0FFF),
        ("0049", 4, 0x0049),
        ("123456", 6, 0x123456),
        ("9", 16, 0x9FFFFFFFFFFFFFFF),
        ("1A", 4, 0x1AFF),
    ],
)
def test_digits_both_ways(text: str, nibbles: int, value: int) -> None:
    assert bits.digits_value(text, nibbles) == value
    assert bits.digits_text(value, nibbles) == text


@pytest.mark.parametrize("text", ["12345", "1 2", "x", "-1", "٣"])
def test_what_is_no_digits(text: str) -> None:
    with pytest.raises(ValueError, match=re.escape(text)):
        bits.digits_value(text, 4)
