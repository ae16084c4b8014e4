"""fishplate: what ETCS balises, loops and radio block centres send, from bits to values and back.

An engineering aid, not a qualified tool: see the caution in the documentation.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

if TYPE_CHECKING:
    from fishplate.authoring import encode
    from fishplate.captures import Frame, decode_frames, read_capture
    from fishplate.errors import (
        Ambiguous,
        DecodeError,
        EncodeError,
        FishplateError,
        LengthMismatch,
        RegistryError,
        Truncated,
        Unknown,
    )
    from fishplate.frames import FieldRow, Message, Problem, decode, walk
    from fishplate.standard import Registry, registry
    from fishplate.translation import Change, Translation, translate

__version__ = "0.1.0"

_HOMES = {
    "encode": "fishplate.authoring",
    "Frame": "fishplate.captures",
    "decode_frames": "fishplate.captures",
    "read_capture": "fishplate.captures",
    "FieldRow": "fishplate.frames",
    "Message": "fishplate.frames",
    "Problem": "fishplate.frames",
    "decode": "fishplate.frames",
    "walk": "fishplate.frames",
    "Change": "fishplate.translation",
    "Translation": "fishplate.translation",
    "translate": "fishplate.translation",
    "Registry": "fishplate.standard",
    "registry": "fishplate.standard",
    "Ambiguous": "fishplate.errors",
    "DecodeError": "fishplate.errors",
    "EncodeError": "fishplate.errors",
    "FishplateError": "fishplate.errors",
    "LengthMismatch": "fishplate.errors",
    "RegistryError": "fishplate.errors",
    "Truncated": "fishplate.errors",
    "Unknown": "fishplate.errors",
}
"""Where each public name lives: it is imported when it is first asked for."""

__all__ = [
    "Ambiguous",
    "Change",
    "DecodeError",
    "EncodeError",
    "FieldRow",
    "FishplateError",
    "Frame",
    "LengthMismatch",
    "Message",
    "Problem",
    "Registry",
    "RegistryError",
    "Translation",
    "Truncated",
    "Unknown",
    "decode",
    "decode_frames",
    "encode",
    "read_capture",
    "registry",
    "translate",
    "walk",
]


def __getattr__(name: str) -> Any:
    if name not in _HOMES:
        raise AttributeError(f"module {__name__!r} has no attribute {name!r}")
    from importlib import import_module  # noqa: PLC0415  only when a name is first asked for

    value = getattr(import_module(_HOMES[name]), name)
    globals()[name] = value
    return value


def __dir__() -> list[str]:
    return sorted({*globals(), *__all__})
