"""`fishplate fields` and `fishplate list`."""

from __future__ import annotations

import json
from itertools import accumulate
from pathlib import Path
from typing import TYPE_CHECKING, Any

import pytest

if TYPE_CHECKING:
    from collections.abc import Callable

DEMO = Path(__file__).resolve().parents[2] / "fixtures" / "demo"
NUMBERS = [f"{number:02}" for number in range(1, 25)]


@pytest.mark.parametrize("number", NUMBERS)
def test_rows_are_those_worked_by_hand(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]], number: str
) -> None:
    # Source of variables, codes and widths: the clauses of SUBSET-026 3.6.0 named in the vector.
    vector = vectors[number]
    line = json.dumps(
        {
            "medium": vector["medium"],
            "direction": vector["direction"],
            "data": vector["hex"].replace(" ", ""),
            "bits": vector["bits"],
        }
    )
    ended = fishplate("fields", "--as", "jsonl", "--from", "jsonl", "-", given=line)
    assert ended.code == 0, ended.err
    rows = [json.loads(each) for each in ended.out.splitlines()]
    wanted = vector["fields"]
    offsets = accumulate((width for _, _, width, _ in wanted), initial=0)
    assert [(row["variable"], row["raw"], row["offset"], row["width"]) for row in rows] == [
        (name, raw, offset, width)
        for (name, raw, width, _), offset in zip(wanted, offsets, strict=False)
    ]
    keys = ["frame", "path", "variable", "offset", "width", "raw", "meaning"]
    assert all(list(row) == keys and row["frame"] == 0 for row in rows)


def test_text_has_a_line_a_field(fishplate: Callable[..., Any], frame: str) -> None:
    ended = fishplate("fields", frame)
    lines = ended.out.splitlines()
    assert max(map(len, lines)) <= 80
    # T_EMA of packet 15 in message 3: 75 + 8 + 2 + 13 + 2 + 7 bits before it.
    assert any(line.split()[:4] == ["107", "10", "T_EMA", "1023"] for line in lines)


@pytest.mark.parametrize("name", ["run.jsonl", "faulty.jsonl"])
def test_text_keeps_to_the_width(fishplate: Callable[..., Any], name: str) -> None:
    lines = fishplate("fields", DEMO / name).out.splitlines()
    assert max(map(len, lines)) <= 80


def test_a_text_is_shown_whole(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]]
) -> None:
    tree = json.loads(json.dumps(vectors["10"]["tree"]))
    text = " ".join(["sound horn"] * 20)
    tree["packets"][0]["X_TEXT"] = text
    del tree["packets"][0]["L_PACKET"]
    del tree["filler"]
    frame = fishplate("encode", "--length", "2600", json.dumps(tree)).out.strip()
    out = fishplate("fields", "--medium", "balise", frame).out
    assert text in " ".join(out.split())
    assert max(map(len, out.splitlines())) <= 80


def test_list_has_a_line_a_frame(
    fishplate: Callable[..., Any], frame: str, vectors: dict[str, dict[str, Any]]
) -> None:
    telegram = vectors["02"]
    lines = [
        json.dumps({"data": frame, "time": "06:15"}),
        json.dumps({"data": telegram["hex"].replace(" ", ""), "bits": telegram["bits"]}),
        "{",
        json.dumps({"data": frame[:-2], "medium": "radio"}),
    ]
    given = "\n".join(lines)
    ended = fishplate("list", "--from", "jsonl", "-", given=given)
    assert ended.code == 3
    first, second, third, fourth = ended.out.splitlines()
    # Vector 01: NID_LRBG 16/257; vector 02: balise 1 of 2 of group 1000/12 with packet 41.
    # A radio message that says no version is taken to be 2.1; the telegram says 2.1 itself.
    assert first.split()[:5] == ["0", "06:15", "to-train", "2.1?", "message"]
    assert second.split()[:4] == ["1", "-", "to-train", "2.1"]
    assert "LRBG 16/257" in first
    assert first.endswith("packets 15 21")
    assert "balise 1/2" in second
    assert "group 1000/12" in second
    assert second.endswith("packets 41")
    assert "!! line 3" in third
    assert fourth.endswith("!! truncated")
    assert "standard input line 3: not JSON" in ended.err
    assert "standard input line 4: packets[1]" in ended.err


def test_frames_are_numbered_through_all_inputs(fishplate: Callable[..., Any], frame: str) -> None:
    ended = fishplate("fields", "--as", "jsonl", frame, "-", frame, given=f"{frame}\nzz\n")
    numbers = [json.loads(line)["frame"] for line in ended.out.splitlines()]
    assert sorted(set(numbers)) == [0, 1, 3]
