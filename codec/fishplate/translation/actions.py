"""What each kind of action does to a packet or header: one function a kind, in one table.

Nothing here knows a packet, a message or a variable: the rules name them.
"""

from __future__ import annotations

from copy import deepcopy
from typing import TYPE_CHECKING, Any

from fishplate.translation.codes import CODE_ACTIONS
from fishplate.translation.partners import covers, partner, same_way, served
from fishplate.translation.tables import DEFAULTS
from fishplate.translation.vocabulary import (
    AtMost,
    Clear,
    Drop,
    Fill,
    Force,
    IgnoreBeside,
    Insert,
    JoinInto,
    Keep,
    LeaveOut,
    OnlyOn,
    Reject,
    RejectEmpty,
    RejectWhere,
    Rename,
    Renumber,
    Replace,
    SharedWith,
    SplitOff,
)

if TYPE_CHECKING:
    from collections.abc import Callable, Mapping

    from fishplate.errors import Path
    from fishplate.translation.piece import Piece, Surroundings, Tree


def _keep(piece: Piece, _action: Keep, _around: Surroundings) -> None:
    piece.keeps_bits = True


def _reject(piece: Piece, action: Reject, _around: Surroundings) -> None:
    piece.refuse(f"{piece.title} is left out: {action.why}")


def _reject_where(piece: Piece, action: RejectWhere, _around: Surroundings) -> None:
    name = action.condition.variable
    for _, scope in piece.where(action.condition, action.scope):
        said = piece.report.source.said(name, scope[name], piece.scale)
        piece.refuse(f"{piece.title} is left out for {said}: {action.why}")
        return


def _reject_empty(piece: Piece, action: RejectEmpty, _around: Surroundings) -> None:
    if not piece.tree[action.series]:
        piece.refuse(f"{piece.title} is left out: {action.why}", stated=False)


def _only_on(piece: Piece, action: OnlyOn, around: Surroundings) -> None:
    if around.medium != action.medium:
        piece.refuse(f"{piece.title} is left out: {action.why}", stated=False)


def _ignore_beside(piece: Piece, action: IgnoreBeside, around: Surroundings) -> None:
    if any(each["NID_PACKET"] == action.number for each in around.packets):
        piece.refuse(f"{piece.title} is ignored: packet {action.number} is in the same message")


def _leave_out(piece: Piece, action: LeaveOut, _around: Surroundings) -> None:
    name = action.condition.variable
    for path, scope in piece.where(action.condition, action.scope):
        said = piece.report.source.said(name, scope[name], piece.scale)
        piece.drop(path, scope, f"{said} is left out: {action.why}", action.distance)


def _at_most(piece: Piece, action: AtMost, _around: Surroundings) -> None:
    version = piece.report.target.version
    for path, scope in list(piece.scopes((action.series,)))[action.count :]:
        said = piece.report.source.all_said(scope.items(), piece.scale)
        sentence = f"{said} is left out: version {version} can name {action.count}"
        piece.drop(path, scope, sentence, stated=False)


def _renumber(piece: Piece, action: Renumber, _around: Surroundings) -> None:
    piece.report.say(
        "renumbered",
        piece.path,
        f"{piece.title} becomes {piece.report.target.packet(action.number).rstrip(',')}",
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
    elements = piece.tree[action.series]
    piece.tree[action.series] = []
    if elements:
        source, target = piece.report.source, piece.report.target
        said = "; ".join(source.all_said(each.items(), piece.scale) for each in elements)
        sentence = f"{said}: not sent, {target.one(piece.tree)} is sent without any"
        piece.report.say("dropped", (*piece.path, action.series), sentence, lossy=True)


def _say_dropped(piece: Piece, path: Path, name: str, value: Any, *, lossy: bool) -> None:
    said = piece.report.source.said(name, value, piece.scale)
    verb = "are" if isinstance(value, list) else "is"
    sentence = f"{said} {verb} left out: {piece.report.target.one(piece.tree)} has none"
    piece.report.say("dropped", path, sentence, lossy=lossy)


def _shared_with(piece: Piece, action: SharedWith, _around: Surroundings) -> None:
    other = piece.report.source.packet(action.number).rstrip(",")
    sentence = f"{piece.title} keeps the number that {other} gets too: which it was is not told"
    piece.report.say("differs", piece.path, sentence, lossy=True, stated=False)


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
        note = f": {default.note}" if default.note else ""
        sentence = f"{target.said(name, default.value, piece.scale)} is the default{note}"
        piece.report.say(
            "defaulted",
            piece.path,
            sentence,
            lossy=False,
            clause=default.clause,
            stated=default.stated,
        )


def _join_into(piece: Piece, action: JoinInto, around: Surroundings) -> None:
    number = action.number
    takers = served(piece.path, around.packets, number)
    if not takers:
        alone = all(each["NID_PACKET"] != number for each in around.packets)
        what = "is in" if alone else "for its direction takes its values from it in"
        sentence = f"{piece.title} is left out: no packet {number} {what} the same message"
        piece.refuse(sentence, clause=action.alone if alone else "", stated=alone)
        return
    piece.refused = True
    own = around.packets[int(piece.path[1])]
    sentence = f"{piece.title} is joined to packet {number}"
    if not all(covers(own, each) for each in takers):
        sentence += " for both directions, although it is for one of them only"
    lossy = not all(same_way(own, each) for each in takers)
    piece.report.say("joined", piece.path, sentence, lossy=lossy)


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
    held = any(value for value in piece.tree.values() if isinstance(value, list))
    piece.report.say("replaced", piece.path, f"{piece.title} gives way to {title}", lossy=held)
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
    SharedWith: _shared_with,
    Fill: _fill,
    JoinInto: _join_into,
    SplitOff: _split_off,
    Replace: _replace,
    **CODE_ACTIONS,
}
"""Each kind of action, and the function that does it."""
