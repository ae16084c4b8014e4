"""The words in which translation is declared: tables of codes and a closed set of actions.

Everything here is frozen data. Names of variables are those of their lineage, whatever the issue
of either side calls them. `scope` names the sets that lead to the scopes an action works in; ()
is the packet or header itself.
"""

from __future__ import annotations

from dataclasses import dataclass, field
from types import MappingProxyType
from typing import TYPE_CHECKING, Any, Literal

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import Condition

Given = tuple[str, int, int]
"""A variable and the first and last code (inclusive) that a row holds for."""

Becomes = tuple[tuple[str, int], ...]
"""Variables and the codes they get."""

Missing = Literal["keep", "element", "whole"]
"""What becomes of a code that a table does not name: kept as it is, its element left out, or the
whole packet or message rejected."""


@dataclass(frozen=True, slots=True)
class Row:
    """One row of a table: where all of `given` hold, their variables give way to `becomes`."""

    given: tuple[Given, ...]
    becomes: Becomes


@dataclass(frozen=True, slots=True)
class CodeTable:
    """A table of codes, under the number chapter 6 gives it or a name of our own."""

    name: str
    rows: tuple[Row, ...]


@dataclass(frozen=True, slots=True)
class BitTable:
    """A bit set put together from codes and bits, as table 3b does.

    Rows of `codes` say which bit of the set a code of `variable` sets; rows of `bits` which bit
    the bit of the same set on the other side becomes.
    """

    name: str
    variable: str
    bit_set: str
    codes: tuple[tuple[int, int], ...]
    bits: tuple[tuple[int, int], ...]


@dataclass(frozen=True, slots=True)
class Default:
    """A value that is taken where none is given, and the clause that gives it.

    `stated` is False where the clause does not say that it is taken here.
    """

    value: Any
    clause: str
    stated: bool = True
    note: str = ""


@dataclass(frozen=True, slots=True)
class Keep:
    """The bits stay as they are; they are read with the layouts of the target."""


@dataclass(frozen=True, slots=True)
class Reject:
    """The packet or message is not taken over, or not sent."""

    why: str


@dataclass(frozen=True, slots=True)
class RejectWhere:
    """As `Reject`, where the condition holds in one of the scopes."""

    condition: Condition
    why: str
    scope: tuple[str, ...] = ()


@dataclass(frozen=True, slots=True)
class RejectEmpty:
    """As `Reject`, where a set is empty that the target cannot say empty."""

    series: str
    why: str


@dataclass(frozen=True, slots=True)
class OnlyOn:
    """As `Reject`, unless this medium carries the frame."""

    medium: str
    why: str


@dataclass(frozen=True, slots=True)
class IgnoreBeside:
    """The packet is ignored where this one is in the same message."""

    number: int


@dataclass(frozen=True, slots=True)
class LeaveOut:
    """Elements are left out where the condition holds.

    `distance` counts from one element to the next: what is left out is added to the element that
    follows, which stays where it is.
    """

    condition: Condition
    why: str
    scope: tuple[str, ...]
    distance: str = ""


@dataclass(frozen=True, slots=True)
class AtMost:
    """A set holds no more elements than this; those behind are left out."""

    series: str
    count: int


@dataclass(frozen=True, slots=True)
class Renumber:
    """The packet becomes one of another number; `first` puts it in front of all others."""

    number: int
    first: bool = False


@dataclass(frozen=True, slots=True)
class Rename:
    """A variable goes by another name, its code stays."""

    variable: str
    name: str
    scope: tuple[str, ...] = ()


@dataclass(frozen=True, slots=True)
class Insert:
    """A variable that the source has not gets this code, where the condition holds."""

    variable: str
    code: int
    scope: tuple[str, ...] = ()
    when: Condition | None = None


@dataclass(frozen=True, slots=True)
class Force:
    """A variable gets this code, whatever it was."""

    variable: str
    code: int


@dataclass(frozen=True, slots=True)
class Drop:
    """A variable or set that the target has not is left out.

    `neutral` is what the target takes it for: only something else is lost.
    """

    variable: str
    neutral: Any = None
    scope: tuple[str, ...] = ()


@dataclass(frozen=True, slots=True)
class Clear:
    """A set is emptied: the target sends it without elements."""

    series: str


@dataclass(frozen=True, slots=True)
class MapCodes:
    """Codes are replaced by those of a table; `back` is the table that leads back.

    `missing` says what becomes of codes that the table does not name, `told` whether chapter 6
    says so itself; `distance` is that of `LeaveOut`. `note` is said beside what the codes mean.
    A `guess` chooses between what the source does not tell apart: it is not stated, and lossy.
    """

    table: CodeTable
    back: CodeTable | None = None
    scope: tuple[str, ...] = ()
    missing: Missing = "keep"
    told: bool = False
    distance: str = ""
    when: Condition | None = None
    note: str = ""
    guess: bool = False


@dataclass(frozen=True, slots=True)
class Lowest:
    """Of elements that say the same of `variable`, the one with the lowest `code` stays."""

    variable: str
    code: str
    scope: tuple[str, ...]


@dataclass(frozen=True, slots=True)
class SharedWith:
    """The packet keeps its number, which that of another number gets too."""

    number: int


@dataclass(frozen=True, slots=True)
class JoinBits:
    """A code and a bit set become one bit set."""

    table: BitTable


@dataclass(frozen=True, slots=True)
class SplitBits:
    """The reverse of `JoinBits`.

    Of several codes that are set the highest counts, `otherwise` where none is.
    """

    table: BitTable
    otherwise: int


@dataclass(frozen=True, slots=True)
class MoveDigits:
    """Digits F of a number go to its right end, the others to the left."""

    variable: str


@dataclass(frozen=True, slots=True)
class Fill:
    """Values come from the packet `beside`, else from what is stored, else from the defaults.

    A name without default is taken over only where it is given.
    """

    names: tuple[str, ...]
    beside: int | None = None


@dataclass(frozen=True, slots=True)
class JoinInto:
    """The packet gives its values to those of this number in the same message, and goes.

    `alone` is the clause that holds where there is none.
    """

    number: int
    alone: str = ""


@dataclass(frozen=True, slots=True)
class SplitOff:
    """Values go into a packet of their own, behind this one."""

    number: int
    names: tuple[str, ...]


@dataclass(frozen=True, slots=True)
class Replace:
    """The packet gives way to one of another number that holds a set known from elsewhere."""

    number: int
    series: str


Action = (
    Keep
    | Reject
    | RejectWhere
    | RejectEmpty
    | OnlyOn
    | IgnoreBeside
    | LeaveOut
    | AtMost
    | Renumber
    | Rename
    | Insert
    | Force
    | Drop
    | Clear
    | MapCodes
    | Lowest
    | SharedWith
    | JoinBits
    | SplitBits
    | MoveDigits
    | Fill
    | JoinInto
    | SplitOff
    | Replace
)

Subject = tuple[Literal["packet", "message"], int]


@dataclass(frozen=True, slots=True)
class Rule:
    """What becomes of one packet or message: the action chapter 6 names, and what it comes to."""

    says: str
    does: tuple[Action, ...] = (Keep(),)
    clause: str = ""


def _nothing() -> Mapping[Any, Any]:
    return MappingProxyType({})


@dataclass(frozen=True, slots=True)
class RuleBook:
    """The rules for one direction of travel from one set of versions to another.

    `packets` and `messages` are the clauses that hold where a rule names none, `absent` the one
    that says which packets the target has, `newer`, by medium and number, those that say which
    need a later version of its X. `unread` is the clause about data that cannot be read; with
    `checked` one such thing rejects the whole message, as does a spare code that is not
    `passed`. `stated` is False where the rules are derived: as the reverse of stated ones, or
    because versions of the same X are compatible.
    """

    packets: str
    messages: str
    absent: str
    stated: bool
    checked: bool = False
    passed: frozenset[tuple[str, int]] = frozenset()
    unread: str = "6.6.3.1.1"
    newer: Mapping[tuple[str, int], str] = field(default_factory=_nothing)
    rules: Mapping[Subject, Rule] = field(default_factory=_nothing)


@dataclass(frozen=True, slots=True)
class Route:
    """The rule books from one version to another."""

    to_train: RuleBook
    to_track: RuleBook


def reverse(table: CodeTable) -> CodeTable:
    """Return a table read backwards: of several codes that become the same the last one."""
    rows: dict[Becomes, Row] = {}
    for row in table.rows:
        given = tuple((name, code, code) for name, code in row.becomes)
        rows[row.becomes] = Row(given, tuple((name, last) for name, _, last in row.given))
    return CodeTable(f"{table.name}, backwards", tuple(rows.values()))
