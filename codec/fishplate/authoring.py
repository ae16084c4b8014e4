"""`encode`: trees of codes or of meanings to bits."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.bits import to_bitstring
from fishplate.errors import EncodeError
from fishplate.frames import Message, encode_bits

if TYPE_CHECKING:
    from bitstring import Bits


def encode(
    source: Message | dict[str, Any], *, length: int | None = None, force: bool = False
) -> Bits:
    """Encode a message or a tree, of codes or of meanings, to `bitstring.Bits`.

    `length` is the size in bits to which a telegram is filled with ones after its end flag
    (without it 210 or 830). `force` writes L_PACKET and L_MESSAGE as given even where they are
    wrong. Raises `EncodeError`: its `path` names the first value that does not fit, its
    `others` the further ones.
    """
    return to_bitstring(*author_bits(source, length=length, force=force))


def author_bits(
    source: Message | dict[str, Any], *, length: int | None = None, force: bool = False
) -> tuple[int, int]:
    """Do as `encode`, returning value and width in bits."""
    try:
        return encode_bits(source, length=length, force=force)
    except EncodeError:
        if isinstance(source, Message):
            raise
        from fishplate.models import codes_of  # noqa: PLC0415  only authored meanings need it

        return encode_bits(codes_of(source), length=length, force=force)
