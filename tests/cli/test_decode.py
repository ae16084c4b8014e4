"""`fishplate decode`: what it writes, and what it says when it cannot."""

from __future__ import annotations

import json
from pathlib import Path
from typing import TYPE_CHECKING, Any

import pytest
import yaml

if TYPE_CHECKING:
    from collections.abc import Callable

DEMO = Path(__file__).resolve().parents[2] / "fixtures" / "demo"


def capture(vector: dict[str, Any], **more: object) -> str:
    """One line of a capture with a frame worked by hand."""
    record = {
        "medium": vector["medium"],
        "direction": vector["direction"],
        "data": vector["hex"].replace(" ", ""),
        "bits": vector["bits"],
    }
    return json.dumps(record | more) + "\n"


def test_trees_are_those_worked_by_hand(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]]
) -> None:
    # Source of the expected trees: the clauses of SUBSET-026 3.6.0 that each vector names.
    lines = "".join(capture(vector) for vector in vectors.values())
    ended = fishplate("decode", "--as", "jsonl", "--from", "jsonl", "-", given=lines)
    assert ended.code == 0, ended.err
    trees = [json.loads(line) for line in ended.out.splitlines()]
    for tree, vector in zip(trees, vectors.values(), strict=True):
        assert tree.pop("bits") == vector["bits"]
        assert ("assumed" in tree) == (vector["medium"] == "radio")
        tree.pop("assumed", None)
        # Worked by hand are bits and values; where they rest on less, our registry says.
        tree.pop("evidence", None)
        assert tree == vector["tree"]


def test_every_view_holds_the_same_tree(
    fishplate: Callable[..., Any], frame: str, vectors: dict[str, dict[str, Any]]
) -> None:
    tree = vectors["01"]["tree"]
    assert json.loads(fishplate("decode", "--as", "json", frame).out) == tree
    assert yaml.safe_load(fishplate("decode", "--as", "yaml", frame).out) == tree
    several = json.loads(fishplate("decode", "--as", "json", frame, frame, frame).out)
    assert several == [tree, tree, tree]
    documents = fishplate("decode", "--as", "yaml", frame, frame).out
    assert list(yaml.safe_load_all(documents)) == [tree, tree]


@pytest.mark.parametrize("name", ["run.jsonl", "faulty.jsonl"])
def test_what_was_decoded_is_given_back(fishplate: Callable[..., Any], name: str) -> None:
    decoded = fishplate("decode", "--as", "jsonl", DEMO / name)
    again = fishplate("encode", "--as", "capture", "-", given=decoded.out)
    assert again.code == 0, again.err
    unreadable = {100} if name == "faulty.jsonl" else set()
    lines = (DEMO / name).read_text(encoding="utf-8").splitlines()
    kept = [line for number, line in enumerate(lines, 1) if number not in unreadable]
    assert again.out.splitlines() == kept
    assert decoded.code == (3 if unreadable else 0)


@pytest.mark.parametrize("time", ["12", "12.50", "0.10", "-3", "0.00000010", '"06:15"'])
@pytest.mark.parametrize("view", ["jsonl", "json", "yaml"])
def test_times_keep_their_digits(
    fishplate: Callable[..., Any], frame: str, time: str, view: str
) -> None:
    line = f'{{"time": {time}, "data": "{frame}"}}\n'
    decoded = fishplate("decode", "--as", view, "--from", "jsonl", "-", given=line)
    form = ("--from", "yaml") if view == "yaml" else ()
    again = fishplate("encode", "--as", "capture", *form, "-", given=decoded.out)
    assert again.out.startswith(f'{{"time": {time}, "medium": "radio"')


def test_text_wraps_and_names_bits(fishplate: Callable[..., Any]) -> None:
    ended = fishplate("decode", DEMO / "run.jsonl")
    assert ended.code == 0
    assert max(map(len, ended.out.splitlines())) <= 80
    assert "\x1b" not in ended.out


def test_problems_stand_where_they_belong(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]]
) -> None:
    whole = vectors["01"]["hex"].replace(" ", "")
    ended = fishplate("decode", "--medium", "radio", whole[:-4])
    assert ended.code == 3
    lines = ended.out.splitlines()
    # Packet 21 starts at bit 157: 75 bits of message 3 (SUBSET-026 8.7.2) and 82 of packet 15.
    place = next(index for index, line in enumerate(lines) if line.startswith("   157  packet 21"))
    assert "!!" in lines[place + 1]
    # Its 78 bits end at bit 235, 224 are there.
    assert "11 bits are missing" in lines[place + 1]
    assert ended.err.startswith(f"{whole[:40]}…: packets[1] at bit 157: ")


def test_an_unknown_packet_counts_as_decoded(fishplate: Callable[..., Any]) -> None:
    # Radio message 24 with a packet 201 of 23 bits, which SUBSET-026 3.6.0 does not define:
    # 8 + 10 + 32 + 1 + 24 = 75 bits of header, 8 + 2 + 13 bits of packet, 98 in all: 13 bytes.
    bits = f"{24:08b}{13:010b}{5:032b}{0:01b}{7:024b}{201:08b}{1:02b}{23:013b}{0:06b}"
    ended = fishplate("decode", f"0b{bits}")
    assert ended.code == 0
    assert ended.err == ""
    assert "!! packet 201 is not known" in ended.out


def test_spare_codes_are_marked(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]]
) -> None:
    tree = json.loads(json.dumps(vectors["01"]["tree"]))
    tree["packets"][0]["V_EMA"] = 121  # spare: SUBSET-026 7.5.1.157
    frame = fishplate("encode", json.dumps(tree)).out.strip()
    out = fishplate("decode", frame).out
    assert any("V_EMA" in line and "! spare (121)" in line for line in out.splitlines())


def test_stray_nibbles_of_a_number_are_marked(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]]
) -> None:
    tree = json.loads(json.dumps(vectors["11"]["tree"]))
    (packet,) = (each for each in tree["packets"] if each["NID_PACKET"] == 42)
    # A to E are not used: SUBSET-026 7.5.1.95.
    packet["NID_RADIO"] = "A" + packet["NID_RADIO"][1:]
    frame = fishplate("encode", json.dumps(tree)).out.strip()
    out = fishplate("decode", frame).out
    assert any("NID_RADIO" in line and "! A" in line for line in out.splitlines())


def test_the_header_is_shown_where_it_says_otherwise(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]]
) -> None:
    telegram = vectors["02"]
    bits = "".join(f"{byte:08b}" for byte in bytes.fromhex(telegram["hex"]))
    plain = fishplate("decode", "--from", "jsonl", "-", given=capture(telegram)).out
    for name in ("Q_UPDOWN", "M_VERSION", "Q_MEDIA"):
        assert name not in plain
    # 8.4.2.1: Q_UPDOWN is bit 0, M_VERSION bits 1 to 7, Q_MEDIA bit 8.
    for bit, said in ((0, "Q_UPDOWN down link"), (8, "Q_MEDIA loop")):
        turned = bits[:bit] + "01"[bits[bit] == "0"] + bits[bit + 1 :]
        data = int(turned, 2).to_bytes(len(bits) // 8).hex()
        given = capture(telegram, data=data)
        out = fishplate("decode", "--from", "jsonl", "-", given=given).out
        assert said in out


def test_a_version_is_told_to_radio_messages_only(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]], frame: str
) -> None:
    telegram = vectors["02"]
    for more in ({"medium": "balise"}, {"medium": None}):
        given = capture(telegram, **more)
        ended = fishplate("decode", "--version", "2.0", "--from", "jsonl", "-", given=given)
        assert ended.code == 0
        assert "system version 2.1" in ended.out
    assert "system version 2.0\n" in fishplate("decode", "--version", "2.0", frame).out


@pytest.mark.parametrize(
    ("number", "direction"), [("01", "to-train"), ("02", "to-train"), ("02", "to-track")]
)
@pytest.mark.parametrize("said", [{"version": "2.0"}, {"version": "2.1"}, {}])
def test_what_a_capture_says_of_a_frame_comes_back(
    fishplate: Callable[..., Any],
    vectors: dict[str, dict[str, Any]],
    number: str,
    said: dict[str, str],
    direction: str,
) -> None:
    vector = vectors[number]
    record = {"medium": vector["medium"], "direction": direction, **said}
    record |= {"data": vector["hex"].replace(" ", ""), "bits": vector["bits"]}
    line = json.dumps(record) + "\n"
    decoded = fishplate("decode", "--as", "jsonl", "--from", "jsonl", "-", given=line)
    again = fishplate("encode", "--as", "capture", "-", given=decoded.out)
    assert again.out == line


def test_nothing_decoded_is_an_empty_list(fishplate: Callable[..., Any]) -> None:
    ended = fishplate("decode", "--as", "json", "-", given="zz\n")
    assert (ended.code, ended.out) == (3, "[]\n")


def test_a_spare_direction_of_a_packet_is_named(fishplate: Callable[..., Any]) -> None:
    # Telegram header of 8.4.2.1 with the identity 0/0, then packet 127 of 23 bits with the
    # spare Q_DIR 3 (7.5.1.103) and the end flag.
    bits = f"1{33:07b}0{0:03b}{0:03b}{0:02b}{0:08b}{0:010b}{0:014b}1"
    bits += f"{127:08b}{3:02b}{23:013b}{255:08b}"
    out = fishplate("decode", f"0b{bits}").out
    assert "packet 127, not known (! Q_DIR 3 is spare, 23 bits)" in out


def test_given_direction_and_medium_are_used(
    fishplate: Callable[..., Any], vectors: dict[str, dict[str, Any]]
) -> None:
    loop = vectors["03"]
    text = loop["hex"].replace(" ", "")
    ended = fishplate("decode", "--as", "jsonl", "--medium", "loop", text)
    assert json.loads(ended.out)["medium"] == "loop"


def test_control_characters_reach_no_terminal(fishplate: Callable[..., Any], frame: str) -> None:
    line = json.dumps({"data": frame, "note": "\x1b[2Jgone\u202e", "time": "\x07"}) + "\n"
    for command in ("decode", "list", "fields"):
        out = fishplate(command, "--from", "jsonl", "-", given=line).out
        assert "\x1b" not in out
        assert "\x07" not in out
        assert "\u202e" not in out
