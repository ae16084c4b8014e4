"""Reading one frame: header, then packets as L_PACKET bounds them, then what is left.

The generated readers do the work; when one of them runs out of bits, the walk is asked where.
Every trouble goes through `FrameReader.trouble`, which raises it (strict) or notes it (lenient).
"""

from __future__ import annotations

from typing import TYPE_CHECKING

from fishplate.bits import blob
from fishplate.engine.runtime import codec
from fishplate.engine.walk import Cursor, Walk
from fishplate.errors import (
    DecodeError,
    LengthMismatch,
    Path,
    Truncated,
    Unknown,
    path_text,
)
from fishplate.frames.message import Message, Problem, Tree
from fishplate.frames.sizes import (
    END_FLAG,
    HEAD_NODES,
    HEADS,
    LENGTH_BITS,
    LONGEST_PACKET,
    READ_BITS,
    SHORTEST_PACKET,
)
from fishplate.standard.vocabulary import TO_TRAIN, Field

if TYPE_CHECKING:
    from collections.abc import Callable, Mapping, Sequence

    from fishplate.engine.runtime import Codec
    from fishplate.standard import Registry
    from fishplate.standard.vocabulary import Node


class FrameReader:
    """One frame being read: `n` holds its low `left` bits that are still to be read."""

    __slots__ = ("codec", "cut", "left", "message", "n", "problems", "size", "strict")

    def __init__(self, message: Message, codec: Codec, n: int, *, strict: bool) -> None:
        self.message = message
        self.codec = codec
        self.n = n
        self.size = self.left = message.size
        self.strict = strict
        self.problems: list[Problem] = []
        self.cut = False

    def trouble(self, error: DecodeError) -> None:
        """Raise an error, or note it as a problem when reading leniently."""
        if self.strict:
            raise error
        self.problems.append(Problem(error.path, error.bit or 0, error.kind, error))
        self.message.problems = self.problems

    def rest(self) -> Tree:
        """Take all bits that are left, unexplained."""
        bits = blob(self.n & (1 << self.left) - 1, self.left)
        self.left = 0
        return bits

    def surplus(self, width: int) -> Tree:
        """Cut off the last `width` bits: what follows from here on ends before them."""
        bits = blob(self.n & (1 << width) - 1, width)
        self.n >>= width
        self.size -= width
        self.left -= width
        return bits

    def message_nodes(self, number: int) -> Sequence[Node]:
        """Return the fixed fields of a radio message, as far as they are known."""
        found = self.registry.messages.get(self._key(number))
        return found.nodes if found else (Field("NID_MESSAGE"), Field("L_MESSAGE"))

    def locate(self, nodes: Sequence[Node], start: int, size: int, path: Path) -> Truncated:
        """Let the walk find where bits `start` to `start + size` run out."""
        value = self.n >> self.size - start - size & (1 << size) - 1
        cursor = Cursor(value, size, start)
        try:
            Walk(self.registry.variables, cursor).scope(nodes, path, {})
        except Truncated as error:
            return error
        raise AssertionError(f"the walk reads what the reader of {path} could not")

    def packets(self) -> None:
        """Read packets until the end flag, or until none can follow."""
        direction = self.message.direction or TO_TRAIN
        readers = self.codec.read_packet[direction]
        unmeasured = self.codec.unmeasured[direction]
        head = HEADS[direction]
        packets = self.message.packets
        n, left = self.n, self.left
        trimmed = left
        while left >= SHORTEST_PACKET:
            if trimmed - left > READ_BITS:
                n = self.n = n & (1 << left) - 1
                trimmed = left
            if left >= head:
                word = n >> left - head
                length = word & LONGEST_PACKET
                number = word >> head - 8 & 255
                reader = readers.get(number)
                if reader and head <= length <= left and number not in unmeasured:
                    part = n >> left - length & (1 << length) - 1
                    try:
                        tree, extra = reader(part, length)
                    except ValueError:
                        tree, extra = {}, 0
                    if extra or not tree:
                        tree = self._misfit(tree, part, extra, left)
                    packets.append(tree)
                    left -= length
                    continue
            self.left = left
            if not self._unusual(unmeasured, head):
                return
            left = self.left
        self.left = left

    def _unusual(self, unmeasured: Mapping[int, int], head: int) -> bool:
        """Read a packet off the beaten track; False when no packet can follow."""
        number = self._peek(8)
        if self._only_padding_left():
            return False
        if number in unmeasured:
            return self._without_length(number, unmeasured[number])
        if self.left < head:
            nodes = HEAD_NODES[self.message.direction or TO_TRAIN]
            self._cut(self.locate(nodes, self._here, self.left, self._path))
            return False
        length = self._peek(head) & LONGEST_PACKET
        if length > self.left:
            missing = length - self.left
            reason = f"L_PACKET is {length}, {missing} bits are missing"
            self._cut(Truncated(reason, missing=missing, path=self._path, bit=self._here))
            self.message.packets.append(self._kept(self.left))
            return False
        if length < head:
            self._length_trouble(f"L_PACKET is {length}, less than the {head} bits of its head")
            self.message.packets.append(self._kept(head))
            return True
        if number in self.codec.forms[self.message.direction or TO_TRAIN]:
            self._only_as_other_form(number, length)
            return True
        self.trouble(
            Unknown(
                f"packet {number} is not known {self.message.direction}; "
                f"its {length} bits are kept",
                kind="unknown-packet",
                path=self._path,
                bit=self._here,
            )
        )
        self.message.packets.append(self._kept(length))
        return True

    def _only_as_other_form(self, number: int, length: int) -> None:
        """Read a packet that its version knows in the form of another one alone."""
        form = self._other_form(number, self._peek(length), length)
        if form:
            self.message.packets.append(form)
            self.left -= length
            return
        version = self.codec.forms[self.message.direction or TO_TRAIN][number]
        self._length_trouble(
            f"L_PACKET is {length}, which does not fit packet {number} as in {version}"
        )
        self.message.packets.append(self._kept(length))

    def _misfit(self, tree: Tree, part: int, extra: int, left: int) -> Tree:
        """Read a packet that does not fit its layout: in another form of it, or as it stands."""
        head = HEADS[self.message.direction or TO_TRAIN]
        length = self.n >> left - head & LONGEST_PACKET
        number = self.n >> left - 8 & 255
        form = self._other_form(number, part, length)
        if form:
            return form
        if not tree:
            return self._too_short(left, length)
        self._too_long(tree, part, extra, left)
        return tree

    def _other_form(self, number: int, part: int, length: int) -> Tree | None:
        """Read a packet as another version lays it out, where it may come so and fits."""
        direction = self.message.direction or TO_TRAIN
        version = self.codec.forms[direction].get(number)
        if version is None:
            return None
        try:
            tree, extra = codec(version).read_packet[direction][number](part, length)
        except ValueError:
            return None
        return None if extra else {**tree, "form": version}

    def _only_padding_left(self) -> bool:
        """Tell whether the message ends in zeros; no radio message holds an empty packet 0."""
        whole = self.message.header.get("L_MESSAGE", 0) * 8 <= self.size
        return self.message.medium == "radio" and whole and not self._peek(self.left)

    def _without_length(self, number: int, width: int) -> bool:
        reader = self.codec.read_packet[self.message.direction or TO_TRAIN][number]
        if self.left < width:
            nodes = self.registry.packets[self._key(number)].nodes
            self._cut(self.locate(nodes, self._here, self.left, self._path))
            return False
        tree, _ = reader(self._peek(width), width)
        self.message.packets.append(tree)
        self.left -= width
        return number != END_FLAG or self.message.medium == "radio"

    def _too_short(self, left: int, length: int) -> Tree:
        """Keep a packet whose L_PACKET ends before its layout does."""
        self.left = left
        number = self._peek(8)
        nodes = self.registry.packets[self._key(number)].nodes
        here, path = self._here, self._path

        def reason() -> str:
            error = self.locate(nodes, here, length, path)
            return (
                f"L_PACKET is {length}, but the layout of packet {number} goes on: "
                f"{path_text(error.path[2:])} has no bits left"
            )

        # Walking a long packet takes many times as long as failing to read it.
        self._length_trouble(reason)
        return self._kept(length)

    def _too_long(self, tree: Tree, part: int, extra: int, left: int) -> None:
        """Keep the bits between the end of a layout and the end that L_PACKET gives."""
        self.left = left
        tree["surplus"] = blob(part & (1 << extra) - 1, extra)
        length = tree["L_PACKET"]
        number = tree["NID_PACKET"]
        self._length_trouble(
            f"L_PACKET is {length}, but the layout of packet {number} "
            f"takes {length - extra} bits: {extra} too many"
        )

    def _length_trouble(self, reason: str | Callable[[], str]) -> None:
        bit = self._here + HEADS[self.message.direction or TO_TRAIN] - LENGTH_BITS
        self.trouble(LengthMismatch(reason, path=(*self._path, "L_PACKET"), bit=bit))

    def _kept(self, width: int) -> Tree:
        """Take a packet of `width` bits as its head and unexplained content."""
        direction = self.message.direction or TO_TRAIN
        head = HEADS[direction]
        content = width - head
        word = self.n >> self.left - width & (1 << width) - 1
        self.left -= width
        packet: Tree = {"NID_PACKET": word >> width - 8}
        if direction == TO_TRAIN:
            packet["Q_DIR"] = word >> width - 10 & 3
        packet["L_PACKET"] = word >> content & LONGEST_PACKET
        packet["content"] = blob(word & (1 << content) - 1, content)
        return packet

    def _cut(self, error: Truncated) -> None:
        self.cut = True
        self.trouble(error)

    def _peek(self, width: int) -> int:
        return self.n >> self.left - width & (1 << width) - 1

    @property
    def _here(self) -> int:
        return self.size - self.left

    @property
    def _path(self) -> Path:
        return ("packets", len(self.message.packets))

    @property
    def registry(self) -> Registry:
        """The registry behind the generated readers."""
        return self.codec.registry

    def _key(self, number: int) -> tuple[str, int]:
        return self.message.direction or TO_TRAIN, number
