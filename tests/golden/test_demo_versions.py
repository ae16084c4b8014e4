"""The demo in other system versions: each frame is of the version its story says.

The outside sources are the plan of the side line (sessions and groups with their versions) and
the published tables in `fixtures/standard/`; no expectation comes from the decoder.
"""

from __future__ import annotations

import csv
import os
import re
from datetime import datetime
from functools import cache
from pathlib import Path
from typing import TYPE_CHECKING, Any

import pytest
from typer.testing import CliRunner

from fishplate_cli.app import app
from golden.test_demo import DEMO, TABLES, build, decoded, lines, plan

if TYPE_CHECKING:
    from collections.abc import Iterator

TEXT = Path(__file__).parent / "text" / "list-border.txt"
WRITE = os.environ.get("FISHPLATE_GOLDEN") == "write"
NOT_SHOWN = {31, 32}
"""Packets of 4.0.0 for RBCs on FRMCS only: the README says why the demo has none."""


def rows(issue: str, table: str) -> list[dict[str, str]]:
    """Read a published table."""
    with (TABLES / issue / f"{table}.csv").open(encoding="utf-8", newline="") as file:
        return list(csv.DictReader(file))


def direction(row: dict[str, str]) -> str:
    """Translate the direction of a table."""
    return "to-train" if row["direction"] == "track-to-train" else "to-track"


def numbers(issue: str, table: str) -> set[tuple[str, int]]:
    """Direction and number of every packet or message of a table."""
    return {(direction(row), int(row[table[:-1]])) for row in rows(issue, table)}


@cache
def invariant() -> set[tuple[str, int]]:
    """Give the messages that are the same in every version: SUBSET-026 issue 3.6.0 8.6 and 8.7."""
    return {
        (direction(row), int(row["message"]))
        for row in rows("v3_6_0", "messages")
        if row["version_invariant"] == "yes"
    }


def version_of_code(code: int) -> str:
    """X in the 3 high bits of M_VERSION, Y in the 4 low bits: SUBSET-026 7.5.1.79."""
    return f"{code // 16}.{code % 16}"


def packets(name: str) -> Iterator[tuple[str, dict[str, Any]]]:
    """Yield the packets of a capture with their direction."""
    for _, message in decoded(name):
        for packet in message.packets:
            yield str(message.direction), packet


def told(time: str) -> str:
    """Give the version that the plan says a radio message of the side line has at a time."""
    now = datetime.fromisoformat(time)
    (version,) = (
        session["version"]
        for session in plan("side_line")["sessions"]
        if datetime.fromisoformat(session["from"]) <= now <= datetime.fromisoformat(session["to"])
    )
    return str(version)


def test_border_frames_are_of_the_version_the_plan_says() -> None:
    groups = plan("side_line")["groups"]
    seen = set()
    for line, (_, message) in zip(lines("border.jsonl"), decoded("border.jsonl"), strict=True):
        if message.medium == "balise":
            expected = groups[message.header["NID_BG"]]["version"]
            assert version_of_code(message.header["M_VERSION"]) == expected, line["note"]
        elif (message.direction, message.header["NID_MESSAGE"]) in invariant():
            continue
        else:
            expected = told(line["time"])
            assert message.version_from == "capture", line["note"]
        assert message.version == expected, line["note"]
        seen.add((message.medium, expected))
    radio = {("radio", "1.0"), ("radio", "2.1")}
    assert seen == {("balise", "1.0"), ("balise", "1.1"), ("balise", "2.1")} | radio


def test_border_sessions_open_with_the_version_of_the_plan() -> None:
    """155, 32 naming the version, 159: SUBSET-026 3.5.3.7; packet 3 in X = 1: 6.5.1.5.25.1."""
    known = [
        (line["time"], message)
        for line, (_, message) in zip(lines("border.jsonl"), decoded("border.jsonl"), strict=True)
        if message.medium == "radio"
    ]
    for session in plan("side_line")["sessions"]:
        inside = [message for time, message in known if session["from"] <= time <= session["to"]]
        opening = [message.header["NID_MESSAGE"] for message in inside[:4]]
        assert opening == [155, 32, 159, 129]
        assert version_of_code(inside[1].header["M_VERSION"]) == session["version"]
        (answer,) = inside[2].packets
        assert answer["NID_PACKET"] == (3 if session["version"] == "1.0" else 2)


def test_border_orders_the_version_of_the_area() -> None:
    """Packet 2 in a balise of X = 1 needs M_VERSION 1.1: SUBSET-026 issue 3.6.0 6.5.1.7.1."""
    orders = [
        (message.header["NID_BG"], message.version, version_of_code(packet["M_VERSION"]))
        for _, message in decoded("border.jsonl")
        for packet in message.packets
        if message.direction == "to-train" and packet["NID_PACKET"] == 2
    ]
    assert orders == [(9069, "1.1", "1.0"), (9072, "2.1", "2.1")]


@pytest.mark.parametrize(
    ("name", "versions"), [("run-1.0.jsonl", {"1.0", "1.1"}), ("run-3.0.jsonl", {"3.0"})]
)
def test_run_is_of_its_version(name: str, versions: set[str]) -> None:
    found = {message.medium: set[str]() for _, message in decoded(name)}
    for _, message in decoded(name):
        found[message.medium].add(str(message.version))
    main = min(versions)
    assert found == {"balise": versions, "loop": {main}, "radio": {main}}


def test_groups_announce_one_version_and_1_1_only_where_a_packet_needs_it() -> None:
    """SUBSET-026 issue 3.6.0 6.5.1.7.1 to 6.5.1.7.4: what balises may send from 1.1 on."""
    since_1_1 = {2, 6, 135, 145, 200, 203, 206, 207, 239}
    for name in ("run-1.0.jsonl", "border.jsonl"):
        announced: dict[int, set[str]] = {}
        needed: dict[int, set[int]] = {}
        for _, message in decoded(name):
            held = {packet["NID_PACKET"] for packet in message.packets}
            if message.medium == "balise" and str(message.version).startswith("1."):
                group = message.header["NID_BG"]
                announced.setdefault(group, set()).add(str(message.version))
                needed.setdefault(group, set()).update(held & since_1_1)
            elif message.version == "1.0" and message.direction == "to-train":
                assert not held & {203, 206, 207, 239}
        assert announced == {g: {"1.1"} if held else {"1.0"} for g, held in needed.items()}


def test_every_packet_of_one_version_alone_is_shown() -> None:
    """What X = 1 (chapter 6 of 3.6.0) or 3.0 (4.0.0) has and 2.1 (3.6.0) has not."""
    base = numbers("v3_6_0", "packets")
    first = numbers("x1_chapter6", "packets") - base
    third = numbers("v4_0_0", "packets") - base
    assert first == {("to-track", 3), *(("to-train", n) for n in (200, 203, 206, 207, 239))}
    shown = {
        (way, packet["NID_PACKET"])
        for name in ("run-1.0.jsonl", "border.jsonl")
        for way, packet in packets(name)
    }
    assert first <= shown
    shown = {(way, packet["NID_PACKET"]) for way, packet in packets("run-3.0.jsonl")}
    assert third - shown == {("to-train", number) for number in NOT_SHOWN}
    readme = (DEMO / "README.md").read_text("utf-8")
    assert "Packets 31 and 32 are not shown" in readme


def test_no_frame_holds_a_packet_its_version_does_not_know() -> None:
    """Packets of X = 1: SUBSET-026 issue 3.6.0 6.5.1.5.2 and 6.5.1.5.2.1; of 3.0: 4.0.0 7.4."""
    not_in_x1 = {0, 13, 40, 52, 64, 69, 76, 88, 143, 180, 181}
    for way, packet in packets("run-1.0.jsonl"):
        number = packet["NID_PACKET"]
        assert number not in not_in_x1 if way == "to-train" else number in {0, 1, 3, 4, 9, 11, 44}
    third = numbers("v4_0_0", "packets")
    assert all((way, p["NID_PACKET"]) in third for way, p in packets("run-3.0.jsonl"))


def test_messages_of_issue_4_and_of_version_1_stand_where_the_story_says() -> None:
    def sent(name: str) -> set[tuple[str, int]]:
        return {
            (str(message.direction), message.header["NID_MESSAGE"])
            for _, message in decoded(name)
            if message.medium == "radio"
        }

    assert sent("run-3.0.jsonl") - sent("run.jsonl") == {
        ("to-track", 131),
        ("to-train", 4),
        ("to-train", 38),
    }
    assert sent("run.jsonl") - sent("run-1.0.jsonl") == {("to-track", 158)}
    # Table 7 of 4.0.0: not a message of the run, so not in its version either
    assert sent("run-3.0.jsonl") <= numbers("v4_0_0", "messages")


def test_run_1_0_says_by_hand_what_chapter_6_says() -> None:
    """Codes worked out from the tables of SUBSET-026 issue 3.6.0 6.6.3.2.3 and 6.6.3.4.5."""
    found = {(way, packet["NID_PACKET"]): packet for way, packet in packets("run-1.0.jsonl")}
    # 20 t, 130 mm or passenger train: tables 3b and 3d
    train = found["to-track", 11]
    assert (train["M_AXLELOAD"], train["NC_TRAIN"], train["M_LOADINGGAUGE"]) == (40, 8 | 2048, 0)
    assert train["tractions"] == []
    # 22.5 t and 25 t: table 5
    areas = found["to-train", 51]["areas"]
    assert [each["M_AXLELOAD"] for each in areas[0]["categories"]] == [45, 50]
    # 130 mm and freight train braked in G: table 3
    steps = [
        [each["NC_DIFF"] for each in step["categories"]]
        for way, packet in packets("run-1.0.jsonl")
        if packet["NID_PACKET"] == 27
        for step in packet["steps"]
        if step["categories"]
    ]
    assert steps == [[3, 10], [3, 10]]
    # 16 bits of set, A to D4: 7.5.1.67.2 of 4.0.0
    later = {(way, packet["NID_PACKET"]): packet for way, packet in packets("run-3.0.jsonl")}
    suitability = later["to-train", 70]["suitabilities"][1]
    assert suitability["M_LINEAXLELOADCAT"] == (1 << 10) - 1


def test_frames_left_out_and_added_are_those_of_the_plan() -> None:
    run = [frame["time"] for frame in lines("run.jsonl")]
    for each in build().versions():
        left = {one["time"] for one in each["left_out"]}
        added = (
            {one["time"] for one in build().read_yaml(DEMO / each["added"])}
            if ("added" in each)
            else set()
        )
        times = [frame["time"] for frame in lines(each["capture"])]
        assert sorted({*run} - left | added) == times


def test_readme_counts_the_frames() -> None:
    readme = (DEMO / "README.md").read_text("utf-8")
    for name in ("run.jsonl", "run-1.0.jsonl", "run-3.0.jsonl", "border.jsonl"):
        (count,) = re.findall(rf"\| `{re.escape(name)}` \| [^|\n]*?(\d+) frames", readme)
        assert int(count) == len(lines(name)), name


def test_list_of_the_border_looks_as_agreed() -> None:
    """It pins wording and look only, never facts; see test_text.py."""
    done = CliRunner().invoke(app, ["list", str(DEMO / "border.jsonl")])
    assert done.exit_code == 0
    assert not done.stderr
    if WRITE:
        TEXT.write_text(done.stdout, encoding="utf-8")
    assert done.stdout == TEXT.read_text(encoding="utf-8"), "FISHPLATE_GOLDEN=write"
