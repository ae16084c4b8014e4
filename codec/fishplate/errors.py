"""Errors: who is at fault, where, and what was expected.

Every error fishplate raises on purpose is a `FishplateError`. `RegistryError` blames our own
declarations, `DecodeError` the bits off the wire, `EncodeError` the values handed over. Each
carries `path` (keys and indices from the root of the tree) and `bit` (offset in bits from the
start of the frame, where there is one), and reads as one line.
"""

from __future__ import annotations

import copyreg
from typing import TYPE_CHECKING

if TYPE_CHECKING:
    from collections.abc import Callable, Sequence

Path = tuple[str | int, ...]


def path_text(path: Sequence[str | int]) -> str:
    """Write a path as people do: ``packets[0].sections[1].L_SECTION``."""
    text = ""
    for step in path:
        if isinstance(step, int):
            text += f"[{step}]"
        else:
            text += f".{step}" if text else step
    return text


class FishplateError(Exception):
    """Base of all errors raised on purpose.

    `reason` is the sentence without the place, `path` and `bit` are the place. A reason that
    takes work to find may be given as a function: it is called when the reason is first read.
    """

    def __init__(
        self, reason: str | Callable[[], str], *, path: Path = (), bit: int | None = None
    ) -> None:
        super().__init__()
        self._reason = reason
        self.path = path
        self.bit = bit

    @property
    def reason(self) -> str:
        """The sentence without the place."""
        if not isinstance(self._reason, str):
            self._reason = self._reason()
        return self._reason

    def __reduce__(self) -> tuple[Callable[..., object], tuple[type], dict[str, object]]:
        """Pickle with the reason worked out."""
        return copyreg.__newobj__, (type(self),), {**self.__dict__, "_reason": self.reason}  # type: ignore[attr-defined]  # how pickle itself makes objects

    def __repr__(self) -> str:
        return f"{type(self).__name__}({str(self)!r})"

    def __str__(self) -> str:
        place = path_text(self.path)
        if self.bit is not None:
            place = f"{place} at bit {self.bit}" if place else f"bit {self.bit}"
        return f"{place}: {self.reason}" if place else self.reason


class RegistryError(FishplateError):
    """A declaration of ours is wrong: found when a registry is built, never while decoding."""


class DecodeError(FishplateError):
    """The bits handed over cannot be read as what they claim to be."""

    kind = "unreadable"


class Truncated(DecodeError):
    """The bits end too early.

    `missing` counts the bits that are missing to the end of the field being read, or to the
    end that L_PACKET promises once it is known.
    """

    kind = "truncated"

    def __init__(
        self, reason: str, *, missing: int, path: Path = (), bit: int | None = None
    ) -> None:
        super().__init__(reason, path=path, bit=bit)
        self.missing = missing


class Unknown(DecodeError):
    """A packet, message or system version that no registry describes."""

    kind = "unknown"

    def __init__(self, reason: str, *, kind: str, path: Path = (), bit: int | None = None) -> None:
        super().__init__(reason, path=path, bit=bit)
        self.kind = kind


class LengthMismatch(DecodeError):
    """L_PACKET or L_MESSAGE disagrees with the content, or with what was handed over."""

    kind = "length-mismatch"


class Ambiguous(DecodeError):
    """Medium, direction or version cannot be told from the bits: it has to be given."""

    kind = "ambiguous"


class EncodeError(FishplateError):
    """A value cannot be written: `path` says where, `expected` and `got` what.

    `others` holds further errors where a whole tree was checked at once.
    """

    def __init__(
        self,
        reason: str,
        *,
        path: Path = (),
        expected: str = "",
        got: object = None,
        others: tuple[EncodeError, ...] = (),
    ) -> None:
        super().__init__(reason, path=path)
        self.expected = expected
        self.got = got
        self.others = others
