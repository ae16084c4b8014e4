"""Bits in and out: the only place that knows nibbles, bytes and padding.

Inside the library a run of bits is a pair: a non-negative integer and its width in bits, most
significant bit first. At the edge it is bytes, hex text, ``0b`` text, base64 text or
`bitstring.Bits`; in a tree it is ``{"bits": n, "hex": "..."}``, left aligned in whole bytes.
"""

from __future__ import annotations

import base64
import binascii
from functools import cache
from typing import TYPE_CHECKING, Any, Protocol, runtime_checkable

from fishplate.errors import DecodeError, EncodeError, Path

if TYPE_CHECKING:
    from collections.abc import Callable

    from bitstring import Bits

    Data = bytes | bytearray | memoryview | str | Bits

NIBBLE = 4
BYTE = 8
_BINARY = frozenset("01")
_HEX = frozenset("0123456789abcdefABCDEF")
_HEX_OF_BYTE = tuple(f"{octet:02X}" for octet in range(256))
_BLOB_KEYS = frozenset({"bits", "hex"})


@runtime_checkable
class _HasBits(Protocol):
    """What `bitstring.Bits` offers, so that bitstring need not be imported to recognise it."""

    def tobytes(self) -> bytes: ...

    def __len__(self) -> int: ...


def read_bits(data: object, size: int | None = None) -> tuple[int, int]:
    """Return value and width in bits of bytes, text or `bitstring.Bits`.

    `size` is the true length in bits where the last byte is padded. Raises `DecodeError` for
    text that is no hex, for half a byte, and for a size that does not belong to the data.
    """
    if isinstance(data, (bytes, bytearray, memoryview)):
        octets = bytes(data)
        value, width = int.from_bytes(octets), len(octets) * BYTE
    elif isinstance(data, str):
        value, width = read_text(data, whole_bytes=size is None)
    elif isinstance(data, _HasBits):
        width = len(data)
        value = int.from_bytes(data.tobytes()) >> -width % BYTE
    else:
        raise DecodeError(f"expected bytes, hex text or bitstring.Bits, got {type(data).__name__}")
    return (value, width) if size is None else _cut(value, width, size)


def _cut(value: int, width: int, size: int) -> tuple[int, int]:
    if type(size) is not int:
        raise TypeError(f"bits is a whole number, not {size!r}")
    if not 0 <= size <= width:
        raise DecodeError(f"{size} bits are claimed, {width} are there", bit=width)
    if width - size >= BYTE:
        raise DecodeError(f"{size} bits are claimed, but {width - size} more are there", bit=size)
    return value >> width - size, size


def read_text(text: str, *, whole_bytes: bool = True) -> tuple[int, int]:
    """Read a literal: hex digits with blanks and an optional ``0x``, ``0b...`` or ``base64:...``.

    ``0b`` with anything but 0 and 1 behind it is hex that begins with the byte 0B. Raises
    `DecodeError` naming the first character that does not belong.
    """
    text = text.strip()
    if text.startswith("0b"):
        digits = "".join(text[2:].split())
        if _BINARY.issuperset(digits):
            return int(digits or "0", 2), len(digits)
    if text[:7].lower() == "base64:":
        try:
            octets = base64.b64decode("".join(text[7:].split()), validate=True)
        except binascii.Error as error:
            raise DecodeError(f"not base64: {error}") from None
        return int.from_bytes(octets), len(octets) * BYTE
    start = 2 if text[:2] in {"0x", "0X"} else 0
    digits = _hex_digits(text, start)
    if whole_bytes and len(digits) % 2:
        raise DecodeError(
            f"odd number of hex digits ({len(digits)}): half a byte is missing, "
            "or the true number of bits has to be given",
            bit=len(digits) * NIBBLE,
        )
    return int(digits or "0", 16), len(digits) * NIBBLE


def _hex_digits(text: str, start: int) -> str:
    digits = "".join(text[start:].split())
    if not _HEX.issuperset(digits):
        for index, character in enumerate(text[start:], start):
            if character not in _HEX and not character.isspace():
                raise DecodeError(
                    f"character {index + 1} of the text is {character!r}, not a hex digit"
                )
    return digits


def to_bytes(value: int, size: int) -> bytes:
    """Return the bits left aligned in whole bytes, unused low bits 0."""
    return (value << -size % BYTE).to_bytes((size + BYTE - 1) // BYTE)


def to_hex(value: int, size: int) -> str:
    """Return the bits as upper-case hex, left aligned in whole bytes."""
    return to_bytes(value, size).hex().upper()


@cache
def _container() -> Callable[[bytes], Bits]:
    """Import bitstring when its container is first asked for: that costs 50 ms."""
    from bitstring import Bits  # noqa: PLC0415  see above

    return Bits.from_bytes


def to_bitstring(value: int, size: int) -> Bits:
    """Return the bits as the public container, `bitstring.Bits`."""
    whole = _container()(to_bytes(value, size))
    return whole[:size] if size % BYTE else whole


def blob(value: int, size: int) -> dict[str, Any]:
    """Return bits that no layout explains in the form a tree keeps them."""
    if size <= BYTE:
        return {"bits": size, "hex": _HEX_OF_BYTE[value << BYTE - size] if size else ""}
    return {"bits": size, "hex": to_hex(value, size)}


def read_blob(data: object, path: Path) -> tuple[int, int]:
    """Return value and width of ``{"bits": n, "hex": "..."}``; `EncodeError` for anything else."""
    if isinstance(data, dict) and data.keys() == _BLOB_KEYS:
        size, text = data["bits"], data["hex"]
        if type(size) is int and isinstance(text, str):
            try:
                octets = bytes.fromhex(text)
            except ValueError:
                octets = b""
            spare = len(octets) * BYTE - size
            value = int.from_bytes(octets)
            if 0 <= spare < BYTE and size >= 0 and not value & (1 << spare) - 1:
                return value >> spare, size
    raise EncodeError(
        'expected {"bits": n, "hex": "..."}: n bits in whole bytes of hex, left aligned',
        path=path,
        expected="bits and hex",
        got=data,
    )


def digits_text(value: int, nibbles: int) -> str:
    """Return decimal digits in nibbles without the F that pads them on the right."""
    return f"{value:0{nibbles}X}".rstrip("F")


def digits_value(text: str, nibbles: int) -> int:
    """Return the nibbles of a digit text, padded with F; `ValueError` when it is none."""
    if len(text) > nibbles or not _HEX.issuperset(text):
        raise ValueError(text)
    return int(text.ljust(nibbles, "F"), 16)
