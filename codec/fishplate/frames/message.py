"""What decoding returns: a message of any medium, and the problems met on the way."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any, NamedTuple

from fishplate.frames.evidence import evidence_of

if TYPE_CHECKING:
    from collections.abc import Sequence

    from fishplate.engine.runtime import Codec
    from fishplate.errors import DecodeError, Path

Tree = dict[str, Any]

HARMLESS = frozenset({"unknown-packet", "newer-version"})
"""Problems after which every bit has still found its place."""


class Problem(NamedTuple):
    """One thing that was wrong with a frame: where, of what kind, in one sentence.

    `bit` counts from the start of the frame. `error` is what strict decoding would have raised.
    """

    path: Path
    bit: int
    kind: str
    error: DecodeError

    @property
    def message(self) -> str:
        """The sentence that says what is wrong."""
        return self.error.reason

    def tree(self) -> Tree:
        """Return the problem as plain data."""
        return {
            "path": list(self.path),
            "bit": self.bit,
            "kind": self.kind,
            "message": self.message,
        }


class Message:
    """One frame, decoded: a radio message, a balise telegram or a loop message.

    `header` and each of `packets` are plain dicts of raw codes under the standard's variable
    names. `version_from` says where the system version came from: ``"frame"``, ``"caller"``,
    ``"capture"`` (earlier frames), ``"inferred"`` (its layouts fit, the usual ones do not) or
    ``"assumed"``; `fitting` names all versions that fit where it was inferred, `told`
    the one that earlier frames named and this one does not fit. `padding`,
    `filler`, `surplus` and `content` are bits that no layout explains, as
    ``{"bits": n, "hex": "..."}``, or None. `size` is the length of the frame in bits.
    """

    # Defaults stand in the class: most frames never touch them, and setting them costs time.
    version: str = ""
    version_from: str = "assumed"
    issue: str = ""
    fitting: tuple[str, ...] = ()
    told: str = ""
    layouts: Codec | None = None
    padding: Tree | None = None
    filler: Tree | None = None
    surplus: Tree | None = None
    content: Tree | None = None
    problems: Sequence[Problem] = ()

    def __init__(self, medium: str | None, direction: str | None, size: int) -> None:
        self.medium = medium
        self.direction = direction
        self.size = size
        self.header: Tree = {}
        self.packets: list[Tree] = []

    def tree(self) -> Tree:
        """Return the message as plain data (the public form, also that of JSON and YAML).

        Header and packets are those of the message, not copies: changing one changes the other.
        """
        tree: Tree = {}
        for name in ("medium", "direction", "version", "issue", "header"):
            value = getattr(self, name)
            if value:
                tree[name] = value
        if self.packets or (self.header and self.content is None):
            tree["packets"] = self.packets
        for name in ("padding", "filler", "surplus", "content"):
            value = getattr(self, name)
            if value is not None:
                tree[name] = value
        if self.problems:
            tree["problems"] = [each.tree() for each in self.problems]
        evidence = self.evidence
        if evidence:
            tree["evidence"] = evidence
        return tree

    @property
    def evidence(self) -> list[Tree]:
        """What in this message rests on less than the published layouts of a known version.

        A list of ``{"path", "kind", "message"}``; kinds are ``"weaker"``, ``"inferred"`` and
        ``"memory"``.
        """
        return evidence_of(self)

    @property
    def complete(self) -> bool:
        """True when every bit found its place, even if a packet is not known."""
        return all(each.kind in HARMLESS for each in self.problems)

    def __repr__(self) -> str:
        what = self.header.get("NID_MESSAGE", self.header.get("NID_BG", ""))
        numbers = [each["NID_PACKET"] for each in self.packets]
        return f"<Message {self.medium} {what} packets {numbers}, {len(self.problems)} problems>"
