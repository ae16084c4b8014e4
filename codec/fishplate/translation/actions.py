"""What each kind of action does to a packet or header: one function a kind, in one table.

Nothing here knows a packet, a message or a variable: the rules name them.
"""

from __future__ import annotations

from copy import deepcopy
from typing import TYPE_CHECKING, Any, NamedTuple

from fishplate.translation.tables import DEFAULTS
from fishplate.translation.vocabulary import (
    AtMost,
    Clear,
    Drop,
    Fill,
    Force,
    IgnoreBeside,
    Insert,
    JoinBits,
    JoinInto,
    Keep,
    LeaveOut,
    MapCodes,
    MoveDigits,
    OnlyOn,
    Reject,
    RejectEmpty,
    RejectWhere,
    Rename,
    Renumber,
    Replace,
    SplitBits,
    SplitOff,
)

if TYPE_CHECKING:
    from collections.abc import Callable, Mapping, Sequence

    from fishplate.errors import Path
    from fishplate.translation.piece import Piece, Tree
    from fishplate.translation.vocabulary import CodeTable, Row

FILLER_DIGIT = "F"


class Surroundings(NamedTuple):
    """What stands around a packet: the others of its message, its medium, what is stored."""

    medium: str
    packets: tuple[Tree, ...]
    stored: Mapping[str, Any]
    known: Mapping[str, Any]


def _title(piece: Piece) -> str:
    source = piece.report.source
    number = piece.number
    return source.packet(number) if piece.path[0] == "packets" else source.message(number)


def _keep(piece: Piece, _action: Keep, _around: Surroundings) -> None:
    piece.keeps_bits = True


def _reject(piece: Piece, action: Reject, _around: Surroundings) -> None:
    piece.refuse(f"{_title(piece)} is left out: {action.why}")


def _reject_where(piece: Piece, action: RejectWhere, _around: Surroundings) -> None:
    name = action.condition.variable
    for _, scope in piece.where(action.condition, action.scope):
        said = piece.report.source.said(name, scope[name], piece.scale)
        piece.refuse(f"{_title(piece)} is left out for {said}: {action.why}")
        return


def _reject_empty(piece: Piece, action: RejectEmpty, _around: Surroundings) -> None:
    if not piece.tree[action.series]:
        piece.refuse(f"{_title(piece)} is left out: {action.why}", stated=False)


def _only_on(piece: Piece, action: OnlyOn, around: Surroundings) -> None:
    if around.medium != action.medium:
        piece.refuse(f"{_title(piece)} is left out: {action.why}", stated=False)


def _ignore_beside(piece: Piece, action: IgnoreBeside, around: Surroundings) -> None:
    if any(each["NID_PACKET"] == action.number for each in around.packets):
        piece.refuse(f"{_title(piece)} is ignored: packet {action.number} is in the same message")


def _leave_out(piece: Piece, action: LeaveOut, _around: Surroundings) -> None:
    name = action.condition.variable
    for path, scope in piece.where(action.condition, action.scope):
        said = piece.report.source.said(name, scope[name], piece.scale)
        _leave(piece, path, scope, action.distance, f"{said} is left out: {action.why}")


def _leave(
    piece: Piece, path: Path, scope: Tree, distance: str, sentence: str, *, stated: bool = True
) -> None:
    piece.leave_out(scope, distance)
    piece.report.say("dropped", path, sentence, lossy=True, stated=stated)


def _at_most(piece: Piece, action: AtMost, _around: Surroundings) -> None:
    version = piece.report.target.version
    for path, scope in list(piece.scopes((action.series,)))[action.count :]:
        said = piece.report.source.all_said(scope.items(), piece.scale)
        sentence = f"{said} is left out: version {version} can name {action.count}"
        _leave(piece, path, scope, "", sentence, stated=False)


def _renumber(piece: Piece, action: Renumber, _around: Surroundings) -> None:
    piece.report.say(
        "renumbered",
        piece.path,
        f"{_title(piece)} becomes {piece.report.target.packet(action.number).rstrip(',')}",
        lossy=False,
    )
    piece.number = action.number
    piece.first = action.first
    piece.tree["NID_PACKET"] = action.number


def _rename(piece: Piece, action: Rename, _around: Surroundings) -> None:
    for _, scope in piece.scopes(action.scope):
        piece.set(scope, action.name, scope.pop(action.variable))


def _insert(piece: Piece, action: Insert, _around: Surroundings) -> None:
    target = piece.report.target
    for path, scope in piece.where(action.when, action.scope):
        piece.set(scope, action.variable, action.code)
        said = target.said(action.variable, action.code, piece.scale)
        piece.report.say("inserted", path, f"{said} is added", lossy=False)


def _force(piece: Piece, action: Force, _around: Surroundings) -> None:
    before = piece.tree[action.variable]
    piece.set(piece.tree, action.variable, action.code)
    if before != action.code:
        source, target = piece.report.source, piece.report.target
        sentence = (
            f"{source.said(action.variable, before, piece.scale)} becomes "
            f"{target.said(action.variable, action.code, piece.scale)}, whatever it was"
        )
        piece.report.say("mapped", (*piece.path, action.variable), sentence, lossy=True)


def _drop(piece: Piece, action: Drop, _around: Surroundings) -> None:
    name = action.variable
    for path, scope in piece.scopes(action.scope):
        if name in scope:
            value = scope.pop(name)
            _say_dropped(piece, (*path, name), name, value, lossy=value != action.neutral)


def _clear(piece: Piece, action: Clear, _around: Surroundings) -> None:
    value = piece.tree[action.series]
    piece.tree[action.series] = []
    if value:
        _say_dropped(piece, (*piece.path, action.series), action.series, value, lossy=True)


def _say_dropped(piece: Piece, path: Path, name: str, value: Any, *, lossy: bool) -> None:
    said = piece.report.source.said(name, value, piece.scale)
    version = piece.report.target.version
    verb = "have" if isinstance(value, list) else "has"
    sentence = f"{said} {verb} no place in version {version}"
    piece.report.say("dropped", path, sentence, lossy=lossy)


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
    lossy = (dict(back.becomes) if back else becomes) != given
    piece.report.say("mapped", path, sentence, lossy=lossy)


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
        _leave(piece, path, scope, action.distance, sentence, stated=action.told)
    elif action.missing == "whole":
        sentence = f"{_title(piece)} is left out: nothing in version {version} says {said}"
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


def _fill(piece: Piece, action: Fill, around: Surroundings) -> None:
    beside = partner(piece.path, around.packets, action.beside) if action.beside else None
    for name in action.names:
        if beside is not None:
            if name in beside:
                piece.set(piece.tree, name, deepcopy(beside[name]))
        else:
            _fill_one(piece, piece.tree, name, around)


def _fill_one(piece: Piece, tree: Tree, name: str, around: Surroundings) -> None:
    target = piece.report.target
    if name in around.stored:
        piece.set(tree, name, deepcopy(around.stored[name]))
        sentence = f"{target.said(name, tree[name], piece.scale)} is taken from what is stored"
        piece.report.say("kept", piece.path, sentence, lossy=False)
    elif name in DEFAULTS:
        default = DEFAULTS[name]
        piece.set(tree, name, deepcopy(default.value))
        sentence = f"{target.said(name, default.value, piece.scale)} is the default"
        piece.report.say("defaulted", piece.path, sentence, lossy=False, clause=default.clause)


def _join_into(piece: Piece, action: JoinInto, around: Surroundings) -> None:
    found = partner(piece.path, around.packets, action.number)
    title = _title(piece)
    if found is None:
        piece.refuse(f"{title} is left out: no packet {action.number} of the same message needs it")
        return
    piece.refused = True
    sentence = f"{title} is joined to packet {action.number}"
    lossy = not _same_way(found, piece.tree)
    piece.report.say("joined", piece.path, sentence, lossy=lossy)


def partner(path: Path, packets: Sequence[Tree], number: int) -> Tree | None:
    """Return the packet of this number that a packet gives values to, or takes them from.

    The first of one number belongs to the first of the other, and so on: those of the same
    Q_DIR before those that are left.
    """
    own = packets[int(path[1])]
    mine = [each for each in packets if each["NID_PACKET"] == own["NID_PACKET"]]
    others = [each for each in packets if each["NID_PACKET"] == number]
    for same in (True, False):
        for each in list(mine):
            fits = (other for other in others if not same or _same_way(each, other))
            found = next(fits, None)
            if found is None:
                continue
            if each is own:
                return found
            mine = [left for left in mine if left is not each]
            others = [left for left in others if left is not found]
    return None


def _same_way(one: Tree, other: Tree) -> bool:
    return bool(one.get("Q_DIR") == other.get("Q_DIR"))


def _split_off(piece: Piece, action: SplitOff, _around: Surroundings) -> None:
    packet = {"NID_PACKET": action.number, "Q_DIR": piece.tree["Q_DIR"]}
    packet |= {name: piece.tree.pop(name) for name in action.names if name in piece.tree}
    piece.split.append(packet)
    title = piece.report.target.packet(action.number).rstrip(",")
    sentence = f"{', '.join(name for name in packet if name in action.names)} go into {title}"
    piece.report.say("split", piece.path, sentence, lossy=False)


def _replace(piece: Piece, action: Replace, around: Surroundings) -> None:
    target = piece.report.target
    title = target.packet(action.number).rstrip(",")
    piece.report.say("replaced", piece.path, f"{_title(piece)} gives way to {title}", lossy=True)
    piece.number = action.number
    piece.tree.clear()
    piece.tree["NID_PACKET"] = action.number
    if action.series not in around.known:
        _fill_one(piece, piece.tree, action.series, around)
        return
    piece.set(piece.tree, action.series, deepcopy(around.known[action.series]))
    said = ", ".join(
        target.all_said(each.items(), piece.scale) for each in piece.tree[action.series]
    )
    sentence = f"{said}: that of the source, others are not known"
    piece.report.say("inserted", piece.path, sentence, lossy=False)


DOES: Mapping[type, Callable[[Piece, Any, Surroundings], None]] = {
    Keep: _keep,
    Reject: _reject,
    RejectWhere: _reject_where,
    RejectEmpty: _reject_empty,
    OnlyOn: _only_on,
    IgnoreBeside: _ignore_beside,
    LeaveOut: _leave_out,
    AtMost: _at_most,
    Renumber: _renumber,
    Rename: _rename,
    Insert: _insert,
    Force: _force,
    Drop: _drop,
    Clear: _clear,
    MapCodes: _map_codes,
    JoinBits: _join_bits,
    SplitBits: _split_bits,
    MoveDigits: _move_digits,
    Fill: _fill,
    JoinInto: _join_into,
    SplitOff: _split_off,
    Replace: _replace,
}
"""Each kind of action, and the function that does it."""
