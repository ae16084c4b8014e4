"""One packet or header while it is translated: its scopes, what is left out, what is to come."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any, NamedTuple

from fishplate.engine.walk import holds
from fishplate.translation.report import METRES, declared_otherwise, same_meaning

if TYPE_CHECKING:
    from collections.abc import Iterator, Mapping, Sequence

    from fishplate.errors import Path
    from fishplate.standard.vocabulary import Condition
    from fishplate.translation.report import Report

Tree = dict[str, Any]

LENGTHS = ("L_PACKET", "L_MESSAGE")
FURTHEST = 32767
"""The most that 15 bits of a distance can say."""


class Surroundings(NamedTuple):
    """What stands around a packet: the others of its message, its medium, what is stored."""

    medium: str
    packets: tuple[Tree, ...]
    stored: Mapping[str, Any]
    known: Mapping[str, Any]


class Piece:
    """A tree under the names of lineages, which actions change in place.

    Elements that are left out stay in their lists, marked, until `prune`: places do not shift.
    """

    def __init__(self, tree: Tree, path: Path, report: Report) -> None:
        self.source = tree
        self.path = path
        self.report = report
        self.tree = report.source.lineages(tree)
        for name in LENGTHS:
            self.tree.pop(name, None)
        self.number: int = tree["NID_PACKET" if "NID_PACKET" in tree else "NID_MESSAGE"]
        self.keeps_bits = False
        self.refused = False
        self.first = False
        self.split: list[Tree] = []
        self.left: dict[int, str] = {}
        self.touched: set[tuple[int, str]] = set()
        self._kept = list(self._doubtful(self.tree, path))

    @property
    def scale(self) -> int | None:
        """The code of Q_SCALE that governs distances here."""
        code = self.tree.get("Q_SCALE")
        return code if isinstance(code, int) else None

    @property
    def title(self) -> str:
        """Number and name of the packet or message."""
        source = self.report.source
        if self.path[0] == "packets":
            return source.packet(self.number)
        return source.message(self.number)

    def scopes(self, names: Sequence[str]) -> Iterator[tuple[Path, Tree]]:
        """Yield the scopes that these sets lead to, with their paths; none that is left out."""
        found: list[tuple[Path, Tree]] = [(self.path, self.tree)]
        for name in names:
            inner: list[tuple[Path, Tree]] = []
            for path, scope in found:
                value = scope.get(name, [])
                if isinstance(value, dict):
                    inner.append(((*path, name), value))
                else:
                    inner += [((*path, name, place), each) for place, each in enumerate(value)]
            found = inner
        for path, scope in found:
            if id(scope) not in self.left:
                yield path, scope

    def where(self, condition: Condition | None, names: Sequence[str]) -> Iterator[Any]:
        """Yield the scopes in which a condition holds, all of them without one."""
        for path, scope in self.scopes(names):
            if condition is None or (condition.variable in scope and holds(condition, scope)):
                yield path, scope

    def set(self, scope: Tree, name: str, value: Any) -> None:
        """Give a variable a value that a rule sets."""
        scope[name] = value
        self.touched.add((id(scope), name))

    def drop(
        self, path: Path, scope: Tree, sentence: str, distance: str = "", *, stated: bool = True
    ) -> None:
        """Leave out an element; `distance` counts from it to the next one."""
        self.left[id(scope)] = distance
        self.report.say("dropped", path, sentence, lossy=True, stated=stated)

    def refuse(self, sentence: str, *, clause: str = "", stated: bool = True) -> None:
        """Take over nothing of it."""
        self.refused = True
        self.report.say("rejected", self.path, sentence, lossy=True, clause=clause, stated=stated)

    def prune(self) -> None:
        """Take out what is left out, and refuse a packet of which nothing remains."""
        if self.left:
            self._prune(self.tree, self.path)

    def _prune(self, scope: Tree, path: Path) -> None:
        for name, value in scope.items():
            if not isinstance(value, list):
                continue
            marks = [self.left[id(each)] for each in value if id(each) in self.left]
            if marks:
                scope[name] = self._chained(value, marks[0], (*path, name))
                if marks[0] and not scope[name]:
                    title = self.report.source.packet(self.source["NID_PACKET"])
                    self.refuse(f"{title} is left out: nothing of it remains")
            for place, each in enumerate(scope[name]):
                if isinstance(each, dict):
                    self._prune(each, (*path, name, place))

    def _chained(self, elements: list[Tree], distance: str, path: Path) -> list[Tree]:
        """Return the elements that stay, each where it was along the track."""
        kept: list[Tree] = []
        carried = 0
        for place, each in enumerate(elements):
            if id(each) in self.left:
                carried += each[distance] if distance else 0
                continue
            if carried:
                further = each[distance] + carried
                if further > FURTHEST:
                    sentence = f"left out with all behind it: {distance} {further} has no code"
                    self.report.say("dropped", (*path, place), sentence, lossy=True, stated=False)
                    break
                self._say_further(distance, each[distance], further, (*path, place))
                self.set(each, distance, further)
                carried = 0
            kept.append(each)
        return kept

    def _say_further(self, distance: str, before: int, further: int, path: Path) -> None:
        source = self.report.source
        sentence = (
            f"{source.said(distance, before, self.scale)} becomes "
            f"{source.said(distance, further, self.scale)}: it stays where it is"
        )
        self.report.say("mapped", (*path, distance), sentence, lossy=False, stated=False)

    def say_what_differs(self) -> None:
        """Report codes that stay as they are and mean something else to the target."""
        if self.refused:
            return
        source, target = self.report.source, self.report.target
        for scope, path, name, code in self._kept:
            if id(scope) in self.left or (id(scope), name) in self.touched:
                continue
            if scope.get(name) != code:
                continue
            before, after = (each.meaning(name, code, METRES) for each in (source, target))
            if before is None or after is None or same_meaning(before, after):
                continue
            scaled = target.meaning(name, code, self._scale_of(scope))
            reads = "is spare" if after.kind == "spare" else f"reads {(scaled or after).text}"
            self.report.say(
                "differs",
                (*path, name),
                f"{source.said(name, code, self._scale_of(scope))} stays, and {reads} "
                f"in version {target.version}",
                lossy=False,
                clause=target.variables[name].clause,
                stated=False,
            )

    def _scale_of(self, scope: Tree) -> int | None:
        code = scope.get("Q_SCALE", self.scale)
        return code if isinstance(code, int) else METRES

    def _doubtful(self, scope: Tree, path: Path) -> Iterator[tuple[Tree, Path, str, Any]]:
        """Yield the codes of variables that the two sides declare differently."""
        names = declared_otherwise(self.report.source.key, self.report.target.key)
        for name, value in scope.items():
            if isinstance(value, dict):
                yield from self._doubtful(value, (*path, name))
            elif isinstance(value, list):
                for place, each in enumerate(value):
                    yield from self._doubtful(each, (*path, name, place))
            elif name in names:
                yield scope, path, name, value
