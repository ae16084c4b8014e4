"""`encode_bits`: a tree back to the bits it came from, or to those it was authored to be.

L_PACKET and L_MESSAGE are computed; a given one that disagrees is an error unless forced. Where
a tree holds bits that no layout explains, it says what was on the wire: nothing is added then.
"""

from __future__ import annotations

from difflib import get_close_matches
from typing import TYPE_CHECKING, Any

from fishplate.bits import read_blob
from fishplate.engine.runtime import MISFITS, Codec, codec
from fishplate.engine.spell import Spelling, code_of
from fishplate.errors import EncodeError, Path
from fishplate.frames import quick
from fishplate.frames.forms import BESIDE, check_issue, check_version, layouts_of_packet
from fishplate.frames.message import Message, Tree
from fishplate.frames.sizes import (
    END_FLAG,
    HEAD_NAMES,
    HEADS,
    LONGEST_MESSAGE,
    LONGEST_PACKET,
    MESSAGE_START,
    TELEGRAM_SIZES,
)
from fishplate.standard import known_versions
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN
from fishplate.versions import (
    DEFAULT_VERSION,
    closest_layouts,
    no_layouts,
    told_version,
)

if TYPE_CHECKING:
    from collections.abc import Sequence

    from fishplate.standard.vocabulary import Node

KEYS = quick.KEYS | {"filler", "surplus", "content", "problems", "evidence"}
"""What a tree may hold at its top."""


def encode_bits(
    source: Message | Tree, *, length: int | None = None, force: bool = False
) -> tuple[int, int]:
    """Return value and width of the frame that a message or a tree of raw codes describes.

    `length` is the size in bits to which a telegram is filled with ones after its end flag.
    `force` writes L_PACKET, L_MESSAGE and padding as given, even where they are wrong. Raises
    `EncodeError` with the path of the first value that does not fit.
    """
    tree = source.tree() if isinstance(source, Message) else source
    if not force and (bits := quick.write_radio(tree)) is not None:
        return bits
    if not isinstance(tree, dict):
        raise EncodeError(f"expected a message or a tree, got {type(tree).__name__}")
    if not tree.keys() <= KEYS:
        _refuse_keys(tree)
    medium = tree.get("medium")
    if medium is None:
        medium = _medium_of(tree.get("header"))
    writer = _Writer(tree, _codec_of(tree), force=force)
    if medium is None:
        if set(tree) - {"problems", "content", "evidence"}:
            raise EncodeError("expected balise, loop or radio", path=("medium",), expected="medium")
        return read_blob(tree.get("content"), ("content",))
    if medium == "radio":
        return writer.radio()
    if medium in ("balise", "loop"):
        return writer.telegram(medium, length)
    raise EncodeError(
        f"expected balise, loop or radio, got {medium!r}",
        path=("medium",),
        expected="balise, loop or radio",
        got=medium,
    )


def _medium_of(header: object) -> str | None:
    if isinstance(header, dict):
        for key, medium in (("NID_MESSAGE", "radio"), ("NID_LOOP", "loop"), ("NID_BG", "balise")):
            if key in header:
                return medium
    return None


def _codec_of(tree: Tree) -> Codec:
    version = told_version(tree)
    closest = closest_layouts(version) if isinstance(version, str) else None
    # A frame that no layout explains may be of any version: all but its start is content.
    if closest is None and not ("content" in tree and isinstance(version, str)):
        said = "version" in tree
        raise EncodeError(
            no_layouts(str(version)),
            path=("version",) if said else ("header", "M_VERSION"),
            expected=", ".join(known_versions()),
            got=version,
        )
    issue = tree.get("issue")
    layouts = codec(closest or DEFAULT_VERSION, issue if isinstance(issue, str) else None)
    check_issue(issue, layouts)
    return layouts


def _refuse_keys(tree: Tree) -> None:
    for key in tree:
        if key not in KEYS:
            near = get_close_matches(str(key), sorted(KEYS), n=1)
            hint = f"; did you mean {near[0]}?" if near else ""
            raise EncodeError(
                f"not part of a tree{hint}", path=(str(key),), expected=", ".join(sorted(KEYS))
            )


class _Writer:
    """One frame being written: `value` holds its first `size` bits."""

    __slots__ = ("codec", "force", "size", "tree", "value")

    def __init__(self, tree: Tree, layouts: Codec, *, force: bool) -> None:
        self.tree = tree
        self.codec = layouts
        self.force = force
        self.value = self.size = 0

    def radio(self) -> tuple[int, int]:
        """Write a radio message."""
        tree = self.tree
        header: Any = tree.get("header")
        if header is None and "content" in tree:
            return read_blob(tree["content"], ("content",))
        number: Any = header.get("NID_MESSAGE") if isinstance(header, dict) else None
        if isinstance(header, dict) and type(number) is not int:
            raise EncodeError(
                f"expected the number of a message, got {number!r}",
                path=("header", "NID_MESSAGE"),
                expected="the number of a message",
                got=number,
            )
        direction = tree.get("direction") or self.codec.direction_of(number)
        if not isinstance(direction, str) or direction not in HEADS:
            raise EncodeError(
                f"expected {TO_TRAIN} or {TO_TRACK}, got {direction!r}",
                path=("direction",),
                expected=f"{TO_TRAIN} or {TO_TRACK}",
                got=direction,
            )
        writer = self.codec.write_message[direction].get(number)
        if writer is None or ("content" in tree and not tree.get("packets")):
            self._start_only(header, direction)
        else:
            try:
                self.value, self.size = writer(header)
            except MISFITS:
                nodes = self.codec.registry.messages[direction, number].nodes
                raise self._misfit(nodes, header, ("header",)) from None
        self.packets(direction)
        given = header.get("L_MESSAGE") if isinstance(header, dict) else None
        self._end_radio(given)
        return self.value, self.size

    def _start_only(self, header: object, direction: str) -> None:
        """Write the fixed part of a message that is not known, or was not all there."""
        number = header.get("NID_MESSAGE") if isinstance(header, dict) else None
        if isinstance(header, dict) and set(header) == {"NID_MESSAGE", "L_MESSAGE"}:
            variables = self.codec.registry.variables
            for name in ("NID_MESSAGE", "L_MESSAGE"):
                code = code_of(variables[name], header[name], ("header", name))
                self._add(code, variables[name].bits)
            return
        known = self.codec.registry.messages
        if isinstance(number, int) and (direction, number) in known:
            nodes = known[direction, number].nodes
            self._spell(nodes, header, ("header",))
            return
        raise EncodeError(
            f"message {number!r} is not known {direction}",
            path=("header", "NID_MESSAGE"),
            expected="the number of a message",
            got=number,
        )

    def _end_radio(self, given: object) -> None:
        tree = self.tree
        broken = "content" in tree
        if broken:
            self._add(*read_blob(tree["content"], ("content",)))
        elif "padding" in tree:
            self._add(*read_blob(tree["padding"], ("padding",)))
            if self.size % 8 and not self.force:
                raise EncodeError(
                    f"does not complete a byte: with it the message takes {self.size} bits; "
                    "leave it out to have it computed",
                    path=("padding",),
                    expected="whole bytes",
                    got=tree["padding"],
                )
        else:
            self._add(0, -self.size % 8)
        length = self.size // 8
        if given is not None and (broken or self.force or "surplus" in tree):
            variable = self.codec.registry.variables["L_MESSAGE"]
            length = code_of(variable, given, ("header", "L_MESSAGE"))
        elif given not in (None, length):
            raise _disagrees("L_MESSAGE", given, length, ("header", "L_MESSAGE"))
        if length > LONGEST_MESSAGE:
            raise EncodeError(
                f"the message takes {length} bytes, L_MESSAGE says {LONGEST_MESSAGE} at most",
                path=("packets",),
                expected=f"at most {LONGEST_MESSAGE} bytes",
                got=length,
            )
        if self.size >= MESSAGE_START:
            shift = self.size - MESSAGE_START
            self.value = self.value & ~(LONGEST_MESSAGE << shift) | length << shift
        if "surplus" in tree:
            self._add(*read_blob(tree["surplus"], ("surplus",)))

    def telegram(self, medium: str, length: int | None) -> tuple[int, int]:
        """Write a balise telegram or a loop message."""
        tree = self.tree
        header: Any = tree.get("header")
        if header is None and "content" in tree:
            return read_blob(tree["content"], ("content",))
        try:
            self.value, self.size = self.codec.write_header[medium](header)
        except MISFITS:
            nodes = self.codec.registry.headers[medium].nodes
            raise self._misfit(nodes, header, ("header",)) from None
        check_version(tree, header["M_VERSION"], force=self.force)
        last = self.packets(TO_TRAIN)
        if "content" in tree:
            self._add(*read_blob(tree["content"], ("content",)))
        elif "filler" in tree:
            self._add(*read_blob(tree["filler"], ("filler",)))
        else:
            if last != END_FLAG:
                self._add(END_FLAG, 8)
            self._fill(medium, length)
        if length is not None and self.size != length:
            raise EncodeError(
                f"the telegram takes {self.size} bits, {length} are wanted",
                expected=f"{length} bits",
                got=self.size,
            )
        return self.value, self.size

    def _fill(self, medium: str, length: int | None) -> None:
        if length is None and medium == "balise":
            length = next((each for each in TELEGRAM_SIZES if each >= self.size), None)
            if length is None:
                raise EncodeError(
                    f"the telegram takes {self.size} bits, the longest holds {TELEGRAM_SIZES[-1]}",
                    path=("packets",),
                    expected=f"at most {TELEGRAM_SIZES[-1]} bits",
                    got=self.size,
                )
        missing = max(0, (length or 0) - self.size)
        self._add((1 << missing) - 1, missing)

    def packets(self, direction: str) -> object:
        """Write all packets; return the number of the last one."""
        packets = self.tree.get("packets", ())
        if not isinstance(packets, (list, tuple)):
            raise EncodeError("expected a list of packets", path=("packets",), got=packets)
        writers = self.codec.write_packet[direction]
        unmeasured = self.codec.unmeasured[direction]
        head = HEADS[direction]
        number = None
        value, size = self.value, self.size
        for index, packet in enumerate(packets):
            try:
                number = packet["NID_PACKET"]
                part, width = writers[number](packet)
            except MISFITS:
                part, width = self._odd_packet(packet, direction, index)
            else:
                if number not in unmeasured:
                    part |= width << width - head
                    if packet.get("L_PACKET", width) != width or width > LONGEST_PACKET:
                        part, width = self._odd_packet(packet, direction, index)
            value = value << width | part
            size += width
        self.value, self.size = value, size
        return number

    def _odd_packet(self, packet: object, direction: str, index: int) -> tuple[int, int]:
        """Write a packet with unexplained bits or a length of its own, or say what is wrong."""
        path = ("packets", index)
        if not isinstance(packet, dict):
            raise EncodeError("expected a packet as a mapping", path=path, got=packet)
        number = packet.get("NID_PACKET")
        head = HEADS[direction]
        given = packet.get("L_PACKET")
        if "content" in packet:
            part, width = self._content_packet(packet, HEAD_NAMES[direction], path)
        else:
            layout = {key: value for key, value in packet.items() if key not in BESIDE}
            layouts = layouts_of_packet(self.codec, packet, direction, path)
            pieces = self._pieces_of(layouts, number, direction, layout, path)
            if "surplus" in packet:
                pieces.append(read_blob(packet["surplus"], (*path, "surplus")))
            part, width = _joined(pieces)
            if number in self.codec.unmeasured[direction]:
                return part, width
            if given not in (None, width) and not self.force:
                raise _disagrees("L_PACKET", given, width, (*path, "L_PACKET"))
        length = width if given is None else given
        variable = self.codec.registry.variables["L_PACKET"]
        code = code_of(variable, length, (*path, "L_PACKET"))
        return part | code << width - head, width

    def _content_packet(self, packet: Tree, head: Sequence[str], path: Path) -> tuple[int, int]:
        for key in packet:
            if key not in (*head, "content"):
                raise EncodeError(
                    "given beside content", path=(*path, key), expected="content alone"
                )
        variables = self.codec.registry.variables
        pieces = []
        for name in head[:-1]:
            if name not in packet:
                raise EncodeError("missing", path=(*path, name), expected=name)
            code = code_of(variables[name], packet[name], (*path, name))
            pieces.append((code, variables[name].bits))
        pieces.append((0, variables["L_PACKET"].bits))
        pieces.append(read_blob(packet["content"], (*path, "content")))
        return _joined(pieces)

    def _pieces_of(
        self, layouts: Codec, number: object, direction: str, layout: Tree, path: Path
    ) -> list[tuple[int, int]]:
        packets = layouts.registry.packets
        known = packets.get((direction, number)) if isinstance(number, int) else None
        if known is None:
            raise EncodeError(
                f"packet {number!r} is not known {direction}; give its bits as content",
                path=(*path, "NID_PACKET"),
                expected="the number of a packet",
                got=number,
            )
        return _spelt(layouts, known.nodes, layout, path)

    def _spell(self, nodes: Sequence[Node], tree: object, path: Path) -> None:
        self._add(*_joined(_spelt(self.codec, nodes, tree, path)))

    def _misfit(self, nodes: Sequence[Node], tree: object, path: Path) -> EncodeError:
        try:
            _spelt(self.codec, nodes, tree, path)
        except EncodeError as error:
            return error
        raise AssertionError(f"the walk writes what the writer of {path} could not")

    def _add(self, value: int, width: int) -> None:
        self.value = self.value << width | value
        self.size += width


def _spelt(
    layouts: Codec, nodes: Sequence[Node], tree: object, path: Path
) -> list[tuple[int, int]]:
    spelling = Spelling(layouts.registry.variables)
    spelling.scope(nodes, tree, path, {})
    return spelling.pieces


def _joined(pieces: Sequence[tuple[int, int]]) -> tuple[int, int]:
    value = size = 0
    for part, width in pieces:
        value = value << width | part
        size += width
    return value, size


def _disagrees(name: str, given: Any, computed: int, path: Path) -> EncodeError:
    return EncodeError(
        f"{name} is given as {given!r}, the content takes {computed}; leave it out or force it",
        path=path,
        expected=str(computed),
        got=given,
    )
