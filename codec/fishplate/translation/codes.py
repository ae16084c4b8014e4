"""What the actions that change codes do: tables of codes, bit sets, digits.

Nothing here knows a packet, a message or a variable: the rules name them.
"""

from __future__ import annotations

from types import MappingProxyType
from typing import TYPE_CHECKING, Any

from fishplate.translation.vocabulary import JoinBits, Lowest, MapCodes, MoveDigits, SplitBits

if TYPE_CHECKING:
    from collections.abc import Callable, Mapping

    from fishplate.errors import Path
    from fishplate.translation.piece import Piece, Surroundings, Tree
    from fishplate.translation.vocabulary import CodeTable, Row

FILLER_DIGIT = "F"


def _map_codes(piece: Piece, action: MapCodes, _around: Surroundings) -> None:
    names = list(dict.fromkeys(name for row in action.table.rows for name, _, _ in row.given))
    for path, scope in list(piece.where(action.when, action.scope)):
        given = {name: scope[name] for name in names if name in scope}
        if not given:
            continue
        row = _row_of(action.table, given)
        if row is None:
            _missing(piece, action, path, scope, given)
            if piece.refused:
                return
            continue
        becomes = dict(row.becomes)
        if becomes != given:
            _say_mapped(piece, action, (*path, next(iter(given))), given, becomes)
        for name in given:
            del scope[name]
        for name, code in becomes.items():
            piece.set(scope, name, code)


def _say_mapped(piece: Piece, action: MapCodes, path: Path, given: Tree, becomes: Tree) -> None:
    source, target = piece.report.source, piece.report.target
    sentence = source.say_becomes(given, target, becomes, piece.scale)
    if action.note:
        sentence = f"{sentence}: {action.note}"
    back = _row_of(action.back, becomes) if action.back else None
    lossy = action.guess or (dict(back.becomes) if back else becomes) != given
    piece.report.say("mapped", path, sentence, lossy=lossy, stated=not action.guess)


def _row_of(table: CodeTable, codes: Tree) -> Row | None:
    for row in table.rows:
        if all(first <= codes.get(name, -1) <= last for name, first, last in row.given):
            return row
    return None


def _missing(piece: Piece, action: MapCodes, path: Path, scope: Tree, given: Tree) -> None:
    said = piece.report.source.all_said(given.items(), piece.scale)
    version = piece.report.target.version
    if action.missing == "element":
        verb = "has" if len(given) == 1 else "have"
        sentence = f"{said} {verb} no counterpart in version {version}: left out"
        piece.drop(path, scope, sentence, action.distance, stated=action.told)
    elif action.missing == "whole":
        sentence = f"{piece.title} is left out: nothing in version {version} says {said}"
        piece.refuse(sentence, stated=action.told)


def _join_bits(piece: Piece, action: JoinBits, _around: Surroundings) -> None:
    table, tree = action.table, piece.tree
    code, bits = tree.pop(table.variable), tree[table.bit_set]
    joined = dict(table.codes).get(code, 0)
    for before, after in table.bits:
        joined |= after if bits & before else 0
    named = sum(bit for bit, _ in table.bits)
    source, target = piece.report.source, piece.report.target
    given = {table.variable: code, table.bit_set: bits}
    piece.report.say(
        "mapped",
        (*piece.path, table.variable),
        source.say_becomes(given, target, {table.bit_set: joined}),
        lossy=code not in dict(table.codes) or bool(bits & ~named),
    )
    piece.set(tree, table.bit_set, joined)


def _split_bits(piece: Piece, action: SplitBits, _around: Surroundings) -> None:
    table, tree = action.table, piece.tree
    bits = tree[table.bit_set]
    found = [code for code, bit in table.codes if bits & bit]
    # Classes rise with what they allow, so the last one holds all that the train can do.
    code = max(found, default=action.otherwise)
    rest = sum(before for before, after in table.bits if bits & after)
    named = sum(bit for _, bit in (*table.codes, *table.bits))
    source, target = piece.report.source, piece.report.target
    becomes = {table.variable: code, table.bit_set: rest}
    piece.report.say(
        "mapped",
        (*piece.path, table.bit_set),
        source.say_becomes({table.bit_set: bits}, target, becomes),
        lossy=len(found) != 1 or bool(bits & ~named),
    )
    piece.set(tree, table.variable, code)
    piece.set(tree, table.bit_set, rest)


def _move_digits(piece: Piece, action: MoveDigits, _around: Surroundings) -> None:
    name = action.variable
    before = piece.tree[name]
    after = before.replace(FILLER_DIGIT, "")
    if after != before:
        sentence = f"{name} {before} becomes {after or 'no digits'}: F goes to the right end"
        piece.report.say("mapped", (*piece.path, name), sentence, lossy=True)
        piece.set(piece.tree, name, after)


def _lowest(piece: Piece, action: Lowest, _around: Surroundings) -> None:
    """Leave out all but the lowest of the elements that have come to say the same."""
    found: dict[tuple[object, ...], tuple[Path, Tree]] = {}
    for path, scope in list(piece.scopes(action.scope)):
        if action.variable not in scope:
            continue
        key = (*path[:-1], scope[action.variable])
        kept = found.setdefault(key, (path, scope))
        if kept[1] is scope:
            continue
        higher, lower = sorted((kept, (path, scope)), key=lambda each: -each[1][action.code])
        found[key] = lower
        target = piece.report.target
        said = target.said(action.variable, scope[action.variable], piece.scale)
        sentence = (
            f"{said} has {target.said(action.code, lower[1][action.code], piece.scale)} too: "
            f"{target.said(action.code, higher[1][action.code], piece.scale)} is left out"
        )
        piece.drop(*higher, sentence, stated=False)


CODE_ACTIONS: Mapping[type, Callable[[Piece, Any, Surroundings], None]] = MappingProxyType(
    {
        MapCodes: _map_codes,
        Lowest: _lowest,
        JoinBits: _join_bits,
        SplitBits: _split_bits,
        MoveDigits: _move_digits,
    }
)
"""Each of these kinds of action, and the function that does it."""
