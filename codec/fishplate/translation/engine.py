"""Translating one frame: its header, then its packets, each by the rule that holds for it."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.bits import to_bytes
from fishplate.engine.runtime import codec
from fishplate.errors import DecodeError, EncodeError
from fishplate.frames import decode, encode_bits
from fishplate.frames.sizes import HEADS
from fishplate.standard.editions import reaches
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN
from fishplate.translation.actions import DOES
from fishplate.translation.consistency import first_fault, is_read, unexplained_bits
from fishplate.translation.length import keep_length
from fishplate.translation.piece import LENGTHS, Piece, Surroundings
from fishplate.translation.report import Report, Side
from fishplate.translation.vocabulary import Keep, Reject, Rule
from fishplate.versions import version_code

if TYPE_CHECKING:
    from collections.abc import Mapping, Sequence

    from fishplate.engine.runtime import Codec
    from fishplate.frames import Message
    from fishplate.standard.vocabulary import RadioMessage
    from fishplate.translation.report import Change
    from fishplate.translation.vocabulary import Route, Subject

Tree = dict[str, Any]

UNREAD: Tree = {"NID_PACKET": -1}
"""Stands for a packet that nothing can be taken from."""

LENGTH = "8.4.2.1"
"""The clause that puts the end flag into a telegram, whatever its length."""

COMPUTED = ("filler", "padding", "evidence")


class FrameTranslator:
    """One frame on its way from one version to another."""

    def __init__(self, message: Message, to: str, route: Route, stored: Mapping[str, Any]) -> None:
        layouts = codec(message.version, message.issue or None)
        self.message = message
        self.direction = message.direction or TO_TRAIN
        self.target = codec(to)
        self.book = route.to_track if self.direction == TO_TRACK else route.to_train
        self.report = Report(Side(layouts, self.direction), Side(self.target, self.direction))
        self.layouts = layouts
        # Named by lineage: what one packet takes from another, it takes under these names.
        packets = [self.report.source.lineages(each) for each in message.packets]
        self.around = Surroundings(
            medium=message.medium or "",
            packets=tuple(each if is_read(each) else UNREAD for each in packets),
            stored=stored,
            known={"versions": [{"M_VERSION": version_code(message.version)}]},
        )

    def translate(self) -> tuple[Tree | None, Sequence[Change]]:
        """Return the tree of the target (None: nothing is sent) and what has changed."""
        header = None if self._is_inconsistent() else self._header()
        if header is None:
            return None, self.report.changes
        packets: list[Tree] = []
        for place in range(len(self.message.packets)):
            self._packet(place, packets)
        if self._lacks_required(packets):
            return None, self.report.changes
        if "padding" in self._problem_places():
            self._set_rule(self.book.unread)
            sentence = "the bits behind the last packet are more than complete a byte: left out"
            self.report.say("dropped", ("padding",), sentence, lossy=True, stated=False)
        tree = {
            "medium": self.message.medium,
            "direction": self.direction,
            "version": self.target.version,
            "issue": self.target.issue,
            "header": header,
            "packets": packets,
        }
        found = _checked(tree, self.target)
        self._set_rule(LENGTH)
        keep_length(found, self.message, self.report)
        return found, self.report.changes

    def _is_inconsistent(self) -> bool:
        """Tell whether the message is rejected before anything is translated; and say so."""
        if not self.book.checked:
            return False
        fault = first_fault(self.message, self.report.source, self.book.passed)
        if fault is None:
            return False
        path, reason = fault
        self._set_rule(self.book.unread)
        sentence = f"the whole message is rejected: {reason}"
        self.report.say("rejected", path, sentence, lossy=True)
        return True

    def _header(self) -> Tree | None:
        header = self.message.header
        number = header.get("NID_MESSAGE")
        if number is None:
            return {**header, "M_VERSION": version_code(self.target.version)}
        piece = Piece(header, ("header",), self.report)
        self._apply(piece, ("message", number), self.book.messages)
        if not piece.refused and (self.direction, number) not in self.target.registry.messages:
            self._set_rule(self.book.absent)
            title = self.report.source.message(number)
            piece.refuse(f"{title} is left out: version {self.target.version} has no such message")
        return None if piece.refused else self.report.target.named(piece.tree)

    def _packet(self, place: int, packets: list[Tree]) -> None:
        packet = self.message.packets[place]
        path = ("packets", place)
        piece = Piece(packet, path, self.report)
        if not is_read(packet) and not self._is_rejected_unread(piece.number):
            self._say_unread(packet, place)
            return
        self._apply(piece, ("packet", piece.number), self.book.packets)
        if piece.refused or self._has_no_place(piece):
            return
        tree = self._relaid(piece) if piece.keeps_bits else self.report.target.named(piece.tree)
        if tree is None:
            return
        packets.insert(0 if piece.first else len(packets), tree)
        packets += [self.report.target.named(each) for each in piece.split]

    def _apply(self, piece: Piece, subject: Subject, clause: str) -> None:
        rule = self.book.rules.get(subject, Rule("", (Keep(),)))
        self._set_rule(rule.clause or clause)
        for action in rule.does:
            DOES[type(action)](piece, action, self.around)
            if piece.refused:
                return
        piece.prune()
        piece.say_what_differs()

    def _is_rejected_unread(self, number: int) -> bool:
        """Tell whether a rule rejects a packet whatever it holds."""
        rule = self.book.rules.get(("packet", number))
        return rule is not None and isinstance(rule.does[0], Reject)

    def _set_rule(self, clause: str) -> None:
        self.report.clause = clause
        self.report.stated = self.book.stated

    def _has_no_place(self, piece: Piece) -> bool:
        """Tell whether the target has not such a packet, or not in this message; and say so."""
        target, version = self.target.registry, self.target.version
        source = self.report.source
        found = target.packets.get((self.direction, piece.number))
        title = source.packet(piece.source["NID_PACKET"])
        later = found is not None and not reaches(version, found.since)
        if found is None or later:
            absent = self.book.absent
            key = (self.around.medium, piece.number)
            self._set_rule(self.book.newer.get(key, absent) if later else absent)
            sentence = f"{title} has no place in version {version}"
            self.report.say("dropped", piece.path, sentence, lossy=True)
            return True
        number = self.message.header.get("NID_MESSAGE", -1)
        ours = source.book.messages.get((self.direction, number))
        theirs = target.messages.get((self.direction, number))
        if self.book.stated or ours is None or theirs is None:
            return False
        if not _carries(ours, piece.source["NID_PACKET"]) or _carries(theirs, piece.number):
            return False
        self._set_rule(theirs.clause)
        sentence = f"{title} is left out: message {number} does not carry it in version {version}"
        self.report.say("dropped", piece.path, sentence, lossy=True)
        return True

    def _relaid(self, piece: Piece) -> Tree | None:
        """Read the bits of a packet with the layouts of the target, None where they do not fit."""
        number, direction = piece.number, self.direction
        part, width = self.layouts.write_packet[direction][number](piece.source)
        if number not in self.layouts.unmeasured[direction]:
            part |= width << width - HEADS[direction]
        try:
            tree, extra = self.target.read_packet[direction][number](part, width)
        except ValueError:
            tree, extra = {}, 0
        if tree and not extra:
            return {name: value for name, value in tree.items() if name not in LENGTHS}
        title = self.report.source.packet(number)
        sentence = f"{title} is left out: its bits do not fit version {self.target.version}"
        self.report.say("dropped", piece.path, sentence, lossy=True, stated=False)
        return None

    def _say_unread(self, packet: Tree, place: int) -> None:
        self._set_rule(self.book.unread)
        title = self.report.source.packet(packet["NID_PACKET"])
        bits = unexplained_bits(packet)
        sentence = f"{title} is left out: no layout explains {bits} bits of it"
        self.report.say("dropped", ("packets", place), sentence, lossy=True, stated=False)

    def _lacks_required(self, packets: Sequence[Tree]) -> bool:
        """Tell whether a message has lost a packet that it cannot be sent without; and say so."""
        key = (self.direction, self.message.header.get("NID_MESSAGE", -1))
        ours = self.report.source.book.messages.get(key)
        theirs = self.target.registry.messages.get(key)
        if ours is None or theirs is None or _lacking(ours, self.message.packets):
            return False
        missing = _lacking(theirs, packets)
        if missing:
            self._set_rule(theirs.clause)
            wanted = " or ".join(map(str, missing))
            title = self.report.source.message(key[1])
            sentence = f"{title} is left out: it is not sent without packet {wanted}"
            path = ("header", "NID_MESSAGE")
            self.report.say("rejected", path, sentence, lossy=True, stated=False)
        return bool(missing)

    def _problem_places(self) -> set[object]:
        return {each.path[0] for each in self.message.problems if each.path}


def _carries(message: RadioMessage, number: int) -> bool:
    required = {each for entry in message.required.packets for each in entry}
    return number in required or number in {each.packet for each in message.optional}


def _lacking(message: RadioMessage, packets: Sequence[Tree]) -> tuple[int, ...]:
    numbers = {each["NID_PACKET"] for each in packets}
    entries = message.required.packets
    return next((each for each in entries if numbers.isdisjoint(each)), ())


def _checked(tree: Tree, target: Codec) -> Tree:
    """Write the tree and read it again: in the order of its layouts, and without a problem."""
    value, bits = encode_bits(tree)
    try:
        read = decode(
            to_bytes(value, bits),
            medium=tree["medium"],
            direction=tree["direction"],
            version=target.version,
            bits=bits,
        )
    except DecodeError as error:
        reason = f"what it becomes cannot be read in version {target.version}: {error}"
        raise EncodeError(reason, path=error.path) from None
    found = {name: part for name, part in read.tree().items() if name not in COMPUTED}
    for part in (found["header"], *found["packets"]):
        for name in LENGTHS:
            part.pop(name, None)
    return found
