"""The length of a balise telegram, which translating keeps where it can."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.bits import BYTE, to_hex
from fishplate.frames import encode_bits
from fishplate.frames.sizes import TELEGRAM_SIZES

if TYPE_CHECKING:
    from fishplate.frames import Message
    from fishplate.translation.report import Report

Tree = dict[str, Any]

NO_FILLER: Tree = {"bits": 0, "hex": ""}


def keep_length(tree: Tree, message: Message, report: Report) -> None:
    """Fill a balise telegram to the length it had, where the encoder would choose another.

    What does not fit that length gets the next one there is, and that is a change.
    """
    if message.medium != "balise":
        return
    size = message.size
    _, usual = encode_bits(tree)
    _, needed = encode_bits({**tree, "filler": NO_FILLER})
    if needed <= _room(size):
        if size != usual:
            tree["filler"] = _ones(size - needed)
    elif usual > size:
        sentence = f"it takes {needed} bits: the telegram of {size} bits becomes one of {usual}"
        report.say("lengthened", ("packets",), sentence, lossy=False, stated=False)


def _room(size: int) -> int:
    """Return what a telegram holds; bits that only complete its last byte are no room."""
    return next((each for each in TELEGRAM_SIZES if 0 <= size - each < BYTE), size)


def _ones(bits: int) -> Tree:
    return {"bits": bits, "hex": to_hex((1 << bits) - 1, bits)}
