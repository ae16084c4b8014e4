"""The words in which the standard is declared: variables, codes and a closed set of layout nodes.

Everything here is frozen data. Conditions and counts are data too, never callables, so that
decoder, encoder, walk, models, schema and documentation all read the same declaration.
"""

from __future__ import annotations

from dataclasses import dataclass, field
from types import MappingProxyType
from typing import TYPE_CHECKING, Any, Final, Literal

if TYPE_CHECKING:
    from collections.abc import Mapping

Coding = Literal["unsigned", "signed", "bitset", "digits", "latin1", "group-identity", "version"]
"""How the bits of a variable are read.

``signed`` is two's complement; ``digits`` are decimal digits in nibbles, left adjusted and
padded with F; ``group-identity`` holds NID_C in its 10 high and NID_BG in its 14 low bits;
``version`` holds X in its 3 high and Y in its 4 low bits.
"""

CodeKind = Literal["value", "special", "spare", "bit", "spare_bit", "range"]
"""``value`` an enumerated meaning, ``special`` a code that is not a number, ``spare`` a code
without meaning, ``bit`` and ``spare_bit`` the weight of one bit of a bit set, ``range`` a note
on codes that are plain numbers."""

UNITS: Final = frozenset(
    {"", "A", "bit", "byte", "character", "day", "km/h", "m", "m/s2", "permille", "s", "t"}
)
"""The units a variable may be declared in; metres per second squared is ``m/s2``."""

SCALED: Final = "scale"
"""The resolution of a distance whose step is set by the governing Q_SCALE (0.1, 1 or 10 m)."""

TO_TRAIN: Final = "to-train"
TO_TRACK: Final = "to-track"
Direction = Literal["to-train", "to-track"]
DIRECTIONS: Final = (TO_TRAIN, TO_TRACK)
MEDIA: Final = ("balise", "loop", "radio")


@dataclass(frozen=True, slots=True)
class Codes:
    """The meaning of the codes `first` to `last` (inclusive) of one variable."""

    first: int
    last: int
    kind: CodeKind
    label: str


@dataclass(frozen=True, slots=True)
class Variable:
    """One variable of the standard.

    `resolution` is the size of one step in `unit` (a decimal number as text, or `SCALED`);
    `plain` the codes that are plain numbers. `lineage` names what stays the same when an issue
    of the standard renames a variable; `formerly` lists the names it had in earlier issues.
    """

    name: str
    clause: str
    bits: int
    coding: Coding
    title: str
    unit: str = ""
    resolution: str = ""
    plain: tuple[int, int] | None = None
    codes: tuple[Codes, ...] = ()
    formerly: tuple[str, ...] = ()
    lineage: str = ""

    def __post_init__(self) -> None:
        """Take the name as the lineage where none is declared."""
        if not self.lineage:
            object.__setattr__(self, "lineage", self.name)


@dataclass(frozen=True, slots=True)
class Eq:
    """True when the variable, read earlier in this or an enclosing scope, equals `code`."""

    variable: str
    code: int


@dataclass(frozen=True, slots=True)
class Ne:
    """True when the variable, read earlier in this or an enclosing scope, differs from `code`."""

    variable: str
    code: int


@dataclass(frozen=True, slots=True)
class In:
    """True when the variable, read earlier in this or an enclosing scope, is one of `codes`."""

    variable: str
    codes: tuple[int, ...]


Condition = Eq | Ne | In


@dataclass(frozen=True, slots=True)
class Field:
    """One variable; `key` names it where the variable stands twice in one scope."""

    variable: str
    key: str = ""

    @property
    def name(self) -> str:
        """The key under which the value stands in a tree."""
        return self.key or self.variable


@dataclass(frozen=True, slots=True)
class Group:
    """A named scope for variables that stand twice, such as start and end of a text display."""

    name: str
    nodes: tuple[Node, ...]


@dataclass(frozen=True, slots=True)
class Series:
    """One mandatory element, then N_ITER, then that many further elements of the same layout."""

    name: str
    nodes: tuple[Node, ...]


@dataclass(frozen=True, slots=True)
class Repeat:
    """N_ITER, then that many elements."""

    name: str
    nodes: tuple[Node, ...]


@dataclass(frozen=True, slots=True)
class When:
    """Nodes that are there only when the condition holds."""

    condition: Condition
    nodes: tuple[Node, ...]


@dataclass(frozen=True, slots=True)
class Text:
    """A text: the number of characters in variable `length`, then each one as `element`."""

    length: str
    element: str


@dataclass(frozen=True, slots=True)
class Opaque:
    """The rest of the packet, bits that no layout explains."""

    name: str


Node = Field | Group | Series | Repeat | When | Text | Opaque

COUNT: Final = "N_ITER"


@dataclass(frozen=True, slots=True)
class Packet:
    """One packet of one direction; `senders` says who transmits it (or to whom it goes).

    `lineage` is the number under which the same content is known in issue 3.6.0 where this one
    carries it under another. `since` names the first system version that may use the packet,
    where that is not the first one of its X.
    """

    number: int
    direction: Direction
    clause: str
    name: str
    senders: tuple[str, ...]
    nodes: tuple[Node, ...]
    lineage: int = -1
    since: str = ""

    def __post_init__(self) -> None:
        """Take the number as the lineage where none is declared."""
        if self.lineage < 0:
            object.__setattr__(self, "lineage", self.number)


@dataclass(frozen=True, slots=True)
class Optional:
    """A packet that a message may carry beyond the required ones, and from whom, if limited."""

    packet: int
    sender: str = ""


@dataclass(frozen=True, slots=True)
class Required:
    """Packets that follow the fixed variables in this order; each entry lists alternatives."""

    packets: tuple[tuple[int, ...], ...] = ()


@dataclass(frozen=True, slots=True)
class RadioMessage:
    """One radio message: fixed variables, then required packets, then optional ones."""

    number: int
    direction: Direction
    clause: str
    name: str
    senders: tuple[str, ...]
    nodes: tuple[Node, ...]
    required: Required = Required()
    optional: tuple[Optional, ...] = ()
    version_invariant: bool = False


@dataclass(frozen=True, slots=True)
class Header:
    """The fixed variables of a balise telegram or a loop message, `bits` wide in all."""

    medium: Literal["balise", "loop"]
    clause: str
    bits: int
    nodes: tuple[Node, ...]


EvidenceKind = Literal["weaker", "inferred", "memory"]
"""``weaker``: declared from less than the published layout; ``inferred``: from what other issues
say; ``memory``: from memory, not checked against any text."""


@dataclass(frozen=True, slots=True)
class Evidence:
    """Why something rests on less than the published text that lays it out.

    `subject` is empty for all of an issue; else ``("packet", direction, number)``,
    ``("message", direction, number)`` or ``("variable", name)``.
    """

    kind: EvidenceKind
    note: str
    subject: tuple[str | int, ...] = ()


@dataclass(frozen=True, slots=True)
class OtherForm:
    """A packet that may also come as another system version lays it out: L_PACKET tells.

    With `only`, it comes in no other way.
    """

    direction: Direction
    number: int
    version: str
    only: bool = False


@dataclass(frozen=True, slots=True)
class Declarations:
    """All that one issue of the standard declares, before it is checked and frozen.

    `layouts` is the name of the module that holds it, `bases` are those it is composed from.
    """

    layouts: str
    version: str
    issue: str
    date: str
    variables: tuple[Variable, ...]
    packets: tuple[Packet, ...]
    messages: tuple[RadioMessage, ...]
    headers: tuple[Header, ...]
    evidence: tuple[Evidence, ...] = ()
    forms: tuple[OtherForm, ...] = ()
    bases: tuple[str, ...] = ()


def _nothing() -> Mapping[Any, Any]:
    return MappingProxyType({})


@dataclass(frozen=True, slots=True)
class Revision:
    """What one issue declares otherwise than the issue it is composed from.

    `renamed` maps names of variables to those of this issue, wherever they stand. The tuples
    `variables`, `packets` and `messages` are declared whole, in place of what has their name or
    number, or beside it; the `amended` ones say single attributes of what else stays the same,
    the `without` ones what is left out. `recoded` gives codes that stand in place of those they
    overlap, the others stay. Names are those of this issue.
    """

    renamed: Mapping[str, str] = field(default_factory=_nothing)
    variables: tuple[Variable, ...] = ()
    amended_variables: Mapping[str, Mapping[str, Any]] = field(default_factory=_nothing)
    recoded: Mapping[str, tuple[Codes, ...]] = field(default_factory=_nothing)
    without_variables: tuple[str, ...] = ()
    packets: tuple[Packet, ...] = ()
    amended_packets: Mapping[tuple[Direction, int], Mapping[str, Any]] = field(
        default_factory=_nothing
    )
    without_packets: tuple[tuple[Direction, int], ...] = ()
    messages: tuple[RadioMessage, ...] = ()
    amended_messages: Mapping[tuple[Direction, int], Mapping[str, Any]] = field(
        default_factory=_nothing
    )
    without_messages: tuple[tuple[Direction, int], ...] = ()
