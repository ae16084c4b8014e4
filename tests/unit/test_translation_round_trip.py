"""Translating there and back: what comes back, and what is said where it does not.

Source: SUBSET-026 issue 3.6.0, chapter 6, in ``fixtures/standard/x1_chapter6``: 6.6.3.2.3 and
6.6.3.3.2 (to the train, X = 1 to X = 2), 6.6.3.4.5 (to the track, X = 2 to X = 1). Trees are drawn
from the layouts of every version, without spare codes (3.16.1.1.1) where it is not said.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

import pytest

import fishplate
from fishplate.errors import EncodeError
from fishplate.standard import registry
from fishplate.standard.editions import edition
from fishplate.translation import VERSIONS, translate
from fishplate.translation.routes import ROUTES
from property.trees import END_FLAG, Maker, seeded
from unit.translated import UsableMaker

if TYPE_CHECKING:
    from collections.abc import Iterator, Sequence

    from fishplate.errors import Path
    from fishplate.translation import Change

Tree = dict[str, Any]

TOO_LONG = "the longest holds 830"
LENGTHS = ("L_PACKET", "L_MESSAGE")
PAIRS = sorted(ROUTES)

LOST_FROM_1_0 = {
    # Message and packet, its direction, and the variable, set or packet that says what is lost.
    # To the train, stated (6.6.3.2.3, 6.6.3.3.2):
    ("to-train", 39, "packets"): "M_TRACTION is not in table 13",
    ("to-train", 51, "M_AXLELOAD"): "table 5 takes ranges of loads to categories",
    ("to-train", 68, "M_TRACKCOND"): "tunnel, bridge and other reason become one",
    ("to-train", 70, "packets"): "rejected, with exceptions",
    ("to-train", 70, "suitabilities"): "only traction systems of table 13 are taken over",
    ("to-train", 140, "NID_OPERATIONAL"): "digits F go to the right end",
    ("to-train", 40, "NID_LRBG"): "message: unknown whatever was received",
    ("to-train", 41, "NID_LRBG"): "message: unknown whatever was received",
    # To the train, where chapter 6 is silent:
    ("to-train", 3, "packets"): "no area is named",
    ("to-train", 3, "D_VALIDNV"): "32767, a distance, has become: now",
    ("to-train", 27, "categories"): "of a category that stands twice the lower speed comes back",
    ("to-train", 51, "categories"): "of loads that become one category the lower speed comes back",
    ("to-train", 44, "packets"): "too short for the NID_NTC that X = 2 reads with NID_XUSER 102",
    # To the track, derived as the reverse of 6.6.3.4.5:
    ("to-track", 0, "M_MODE"): "12 at level NTC has become 13",
    ("to-track", 1, "M_MODE"): "as packet 0",
    ("to-track", 3, "packets"): "gives way to packet 2",
    ("to-track", 2, "packets"): "gives way to packet 3",
    ("to-track", 4, "packets"): "failures that X = 2 does not report, and spare codes",
    ("to-track", 11, "packets"): "spare axle loads",
    ("to-track", 11, "NID_OPERATIONAL"): "train data of X = 2 do not carry it",
    ("to-track", 11, "M_LOADINGGAUGE"): "no gauge is interoperable",
    ("to-track", 11, "M_AXLELOAD"): "ranges of loads become categories",
    ("to-track", 11, "NC_TRAIN"): "X = 2 has one cant deficiency class",
    ("to-track", 11, "tractions"): "no traction list is sent to X = 1",
}
"""All that does not come back from 1.0 to 2.1 to 1.0, by direction, number, and place."""


SHORT = {"bits": 4, "hex": "A0"}
RARE = [
    ("to-track", 4, "M_ERROR", 6),
    ("to-track", 4, "M_ERROR", 8),
    ("to-track", 11, "M_AXLELOAD", 81),
    ("to-train", 44, "NID_XUSER", 102),
    ("to-train", 140, "NID_OPERATIONAL", "F9092"),
    ("to-train", 3, "D_VALIDNV", 32767),
]
"""Codes that drawing at random does not meet, or that are spare."""


def plain(tree: Tree) -> Tree:
    """A packet or header without its computed length."""
    return {name: value for name, value in tree.items() if name not in LENGTHS}


def frames_of(version: str, seeds: range, maker: type[Maker] = UsableMaker) -> Iterator[Tree]:
    """Frames of a version, each with packets that it may use."""
    found = edition(version)
    assert found is not None
    for seed in seeds:
        tree = maker(seeded(f"{version} {seed}"), edition=found).frame()
        newer = later_packets(version, tree["direction"])
        tree["packets"] = [each for each in tree["packets"] if each["NID_PACKET"] not in newer]
        if len(tree["packets"]) > 1 or tree["medium"] == "radio":
            yield tree


def later_packets(version: str, direction: str) -> set[int]:
    """Numbers of the packets that need a later version of the same X (6.5.1.7)."""
    packets = registry(version).packets
    return {
        number
        for (way, number), packet in packets.items()
        if way == direction and packet.since > version
    }


def exists(path: Path, tree: Any) -> bool:
    """Tell whether a path leads somewhere in a tree."""
    for step in path:
        try:
            tree = tree[step]
        except (KeyError, IndexError, TypeError):
            return False
    return True


def translated(tree: Tree, to: str) -> Any:
    """The translation, None for a telegram that is too long afterwards."""
    try:
        return translate(tree, to)
    except EncodeError as error:
        if TOO_LONG not in error.reason:
            raise
        return None


@pytest.mark.parametrize(("source", "to"), PAIRS)
def test_a_frame_of_any_codes_is_translated_or_rejected(source: str, to: str) -> None:
    rejected = 0
    for tree in frames_of(source, range(40), Maker):
        result = translated(tree, to)
        if result is not None and result.tree is None:
            assert result.lossy
            rejected += any(each.clause == "6.6.3.1.1" for each in result.changes)
    # To the train from X = 1 a single spare code is enough (6.6.3.1.1).
    assert (rejected > 5) == (source < "2.0" <= to)


@pytest.mark.parametrize(("source", "to"), PAIRS)
def test_every_result_can_be_sent(source: str, to: str) -> None:
    done = 0
    for tree in frames_of(source, range(60)):
        result = translated(tree, to)
        if result is None:
            continue
        for change in result.changes:
            assert exists(change.path, tree) or change.path[-1] == "Q_DIR", change
            assert change.message
            assert change.clause[0].isdecimal() or change.clause == "A.3.2"
        if result.tree is None:
            assert result.lossy
            continue
        message = fishplate.decode(
            fishplate.encode(result.tree),
            medium=tree["medium"],
            direction=tree["direction"],
            version=to,
        )
        assert (message.version, message.issue) == (to, registry(to).issue)
        done += 1
    assert done > 20


def lost_at(changes: Sequence[Change], start: Path) -> bool:
    """Tell whether something under a path is said to be lost."""
    return any(each.lossy and each.path[: len(start)] == start for each in changes)


def check_what_comes_back(tree: Tree, there: Any, back: Any) -> None:
    """Compare the header and the first packet: what differs was said to be lost."""
    changes = [*there.changes, *back.changes]
    if back.tree is None:
        assert back.lossy
        return
    if not lost_at(changes, ("header",)):
        assert plain(back.tree["header"]) == plain(tree["header"])
    # The only packet of the source may be several on the way: what is lost of it is at place 0,
    # of a packet split from it at place 1.
    if not lost_at(changes, ("packets",)):
        wanted = list(map(plain, tree["packets"]))
        found = list(map(plain, back.tree["packets"]))
        # What 1.1 says in a packet of its own comes back so, although it was a default.
        if len(found) > len(wanted) and any(each.kind == "split" for each in back.changes):
            del found[1]
        assert found == wanted


def single_packets(tree: Tree) -> Iterator[Tree]:
    """Frames of one packet each, so that places stay where they are."""
    for packet in tree["packets"]:
        if packet["NID_PACKET"] != END_FLAG:
            end = [{"NID_PACKET": END_FLAG}] if tree["medium"] != "radio" else []
            whole = {**tree, "packets": [packet, *end]}
            whole.pop("filler", None)
            yield whole


def there_and_back(tree: Tree, to: str) -> tuple[Any, Any] | None:
    there = translated(tree, to)
    if there is None or there.tree is None:
        return None
    back = translated(there.tree, tree["version"])
    return None if back is None else (there, back)


@pytest.mark.parametrize(
    ("source", "to"),
    [
        ("1.0", "2.1"),
        ("1.0", "2.0"),
        ("1.1", "2.1"),
        ("1.1", "2.0"),
        ("2.1", "1.1"),
        ("2.0", "1.1"),
        ("2.1", "2.0"),
    ],
)
def test_what_is_not_said_to_be_lost_comes_back(source: str, to: str) -> None:
    done = 0
    for tree in frames_of(source, range(150)):
        for single in single_packets(tree):
            both = there_and_back(single, to)
            if both is not None:
                check_what_comes_back(single, *both)
                done += 1
    assert done > 100


def test_only_what_is_listed_is_lost_from_1_0_to_2_1_and_back() -> None:
    met: set[tuple[str, int, str]] = set()
    for direction, number in sorted(registry("1.0").packets):
        if number in later_packets("1.0", direction) or number == END_FLAG:
            continue
        for seed in range(40):
            met |= losses(of_packet(direction, number, seed))
    for direction, number in sorted(registry("1.0").messages):
        for seed in range(12):
            met |= losses(of_message(direction, number, seed))
    assert met - LOST_FROM_1_0.keys() == set()
    for direction, number, name, code in RARE:
        tree = of_packet(direction, number, 0)
        tree["packets"][0] |= {name: code} | ({"data": SHORT} if name == "NID_XUSER" else {})
        met |= losses(tree)
    assert met == LOST_FROM_1_0.keys()


def of_packet(direction: str, number: int, seed: int) -> Tree:
    """A message of 1.0 that holds one packet."""
    found = edition("1.0")
    assert found is not None
    maker = UsableMaker(seeded(f"{direction} {number} {seed}"), edition=found)
    carrier = 24 if direction == "to-train" else 154
    tree = maker.message(direction, carrier)
    return {**tree, "packets": [maker.packet(direction, number)]}


def of_message(direction: str, number: int, seed: int) -> Tree:
    """A message of 1.0 without packets."""
    found = edition("1.0")
    assert found is not None
    maker = UsableMaker(seeded(f"message {number} {seed}"), edition=found)
    tree = maker.message(direction, number)
    return {**tree, "packets": []}


def losses(tree: Tree) -> set[tuple[str, int, str]]:
    """Direction, number of packet or message, and place of all that is lost on the way."""
    there = translated(tree, "2.1")
    found = losses_of(there, tree)
    if there.tree is not None:
        found |= losses_of(translated(there.tree, "1.0"), there.tree)
    return found


def losses_of(translation: Any, tree: Tree) -> set[tuple[str, int, str]]:
    found = set()
    for change in translation.changes:
        if change.lossy:
            place: Any = tree["header"]
            if change.path[0] == "packets":
                place = tree["packets"][change.path[1]]
            number = place.get("NID_PACKET", place.get("NID_MESSAGE"))
            names = [step for step in change.path if isinstance(step, str)]
            name = "NID_MESSAGE" if names == ["header"] else names[-1]
            found.add((tree["direction"], number, name))
    return found


def test_versions_are_those_of_the_routes() -> None:
    assert VERSIONS == ("1.0", "1.1", "2.0", "2.1")
    assert len(ROUTES) == len(VERSIONS) * (len(VERSIONS) - 1)
