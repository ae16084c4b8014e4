"""`fishplate translate`.

Rules: SUBSET-026 issue 3.6.0, 6.6.3.2.3 and 6.6.3.3.2 (``fixtures/standard/x1_chapter6``); the
translations themselves are tested in ``tests/unit``.
"""

from __future__ import annotations

import json
from pathlib import Path
from typing import TYPE_CHECKING, Any

import pytest

if TYPE_CHECKING:
    from collections.abc import Callable

DEMO = Path(__file__).resolve().parents[2] / "fixtures" / "demo"

TRACTION = (
    # Message 24 of 15 bytes, T_TRAIN 7, LRBG 905/9060; packet 39: Q_DIR 1, L_PACKET 48, Q_SCALE 1,
    # D_TRACTION 500, M_TRACTION 3. Packed by hand from the widths of 8.7.11 and 6.5.1.5.7:
    # 8 10 32 1 24, 8 2 13 2 15 8.
    f"{24:08b}{16:010b}{7:032b}{0:01b}{905 << 14 | 9060:024b}"
    f"{39:08b}{1:02b}{48:013b}{1:02b}{500:015b}{3:08b}"
    "00000"
)
CHANGED = (
    # The same in 2.1 (7.4.2.9.1): L_PACKET 54, M_VOLTAGE 1 in 4 bits, NID_CTRACTION 13 in 10:
    # 75 + 54 bits are 16 bytes and a bit: 17 bytes.
    f"{24:08b}{17:010b}{7:032b}{0:01b}{905 << 14 | 9060:024b}"
    f"{39:08b}{1:02b}{54:013b}{1:02b}{500:015b}{1:04b}{13:010b}"
    "0000000"
)


def in_hex(bits: str) -> str:
    return f"{int(bits, 2):0{len(bits) // 4}X}"


STOP = {
    "medium": "radio",
    "direction": "to-train",
    "version": "2.1",
    "header": {
        "NID_MESSAGE": 15,
        "T_TRAIN": 7,
        "M_ACK": 1,
        "NID_LRBG": 9060,
        "NID_EM": 9,
        "Q_SCALE": 1,
        "D_REF": 50,
        "Q_DIR": 1,
        "D_EMERGENCYSTOP": 400,
    },
}


@pytest.fixture
def capture(tmp_path: Path) -> Path:
    """A capture of 1.0 with one frame."""
    path = tmp_path / "run.jsonl"
    line = {
        "time": "06:15:07",
        "medium": "radio",
        "direction": "to-train",
        "version": "1.0",
        "data": in_hex(TRACTION),
        "bits": len(TRACTION),
        "note": "new wire",
    }
    path.write_text(json.dumps(line) + "\n", encoding="utf-8")
    return path


def test_hex_is_the_frame_worked_by_hand(fishplate: Callable[..., Any], capture: Path) -> None:
    ended = fishplate("translate", "--to", "2.1", "--as", "hex", capture)
    assert (ended.code, ended.out) == (0, in_hex(CHANGED) + "\n")
    assert "packets[0].M_TRACTION: M_TRACTION 3 (AC 25 kV 50 Hz, France high speed)" in ended.err
    assert "[6.6.3.2.3]" in ended.err


def test_a_capture_keeps_what_stands_beside(fishplate: Callable[..., Any], capture: Path) -> None:
    ended = fishplate("translate", "--to", "2.1", "--as", "capture", capture)
    assert ended.code == 0
    assert json.loads(ended.out) == {
        "time": "06:15:07",
        "medium": "radio",
        "direction": "to-train",
        "version": "2.1",
        "data": in_hex(CHANGED),
        "bits": len(CHANGED),
        "note": "new wire",
    }


def test_jsonl_carries_the_changes(fishplate: Callable[..., Any], capture: Path) -> None:
    ended = fishplate("translate", "--to", "2.1", "--as", "jsonl", capture)
    assert (ended.code, ended.err) == (0, "")
    tree = json.loads(ended.out)
    assert (tree["time"], tree["note"], tree["bits"]) == ("06:15:07", "new wire", len(CHANGED))
    assert (tree["version"], tree["packets"][0]["NID_CTRACTION"]) == ("2.1", 13)
    (change,) = tree["changes"]
    assert (change["kind"], change["path"]) == ("mapped", ["packets", 0, "M_TRACTION"])
    assert (change["stated"], change["lossy"]) == (True, False)


def test_json_is_the_tree_or_the_list(fishplate: Callable[..., Any], capture: Path) -> None:
    one = json.loads(fishplate("translate", "--to", "2.1", "--as", "json", capture).out)
    two = json.loads(fishplate("translate", "--to", "2.1", "--as", "json", capture, capture).out)
    assert two == [one, one]
    none = fishplate("translate", "--to", "2.1", "--as", "json", "-", given="")
    assert json.loads(none.out) == []


def test_text_shows_the_frame_and_then_what_has_changed(
    fishplate: Callable[..., Any], capture: Path
) -> None:
    ended = fishplate("translate", "--to", "2.1", capture)
    lines = ended.out.splitlines()
    assert (ended.code, ended.err) == (0, "")
    assert max(map(len, lines)) <= 80
    assert any(line.split()[-2:] == ["NID_CTRACTION", "13"] for line in lines)
    text = " ".join(ended.out.split())
    assert text.endswith(
        "~ packets[0].M_TRACTION: M_TRACTION 3 (AC 25 kV 50 Hz, France high speed) becomes "
        "M_VOLTAGE 1 (AC 25 kV 50 Hz) and NID_CTRACTION 13 [6.6.3.2.3]"
    )


def test_derived_and_lossy_changes_are_marked(fishplate: Callable[..., Any]) -> None:
    out = fishplate("translate", "--to", "1.0", DEMO / "run.jsonl").out
    text = " ".join(out.split())
    assert "packet 76, Packet for sending fixed text messages, has no place in version 1.0" in text
    assert "[6.5.1.5.2, derived, lossy]" in text
    assert max(map(len, out.splitlines())) <= 80


def test_a_message_that_is_not_sent(fishplate: Callable[..., Any], tmp_path: Path) -> None:
    # A conditional stop with a shifted reference cannot be said with X = 1 (6.6.3.3.2 has D_REF 0).
    path = tmp_path / "stop.jsonl"
    path.write_text(fishplate("encode", "--as", "capture", json.dumps(STOP)).out, encoding="utf-8")
    text = fishplate("translate", "--to", "1.0", path)
    assert text.code == 0
    assert "nothing is left" in text.out
    assert "shifted location" in " ".join(text.out.split())
    captured = fishplate("translate", "--to", "1.0", "--as", "capture", path)
    assert (captured.code, captured.out) == (0, "")
    assert "shifted location" in captured.err
    line = json.loads(fishplate("translate", "--to", "1.0", "--as", "jsonl", path).out)
    assert [each["kind"] for each in line["changes"]] == ["rejected"]
    assert "header" not in line


def test_one_spare_code_leaves_nothing(fishplate: Callable[..., Any], capture: Path) -> None:
    # 6.6.3.1.1 and 3.16.1.1.1: Q_DIR 3, in bits 84 and 85 behind a header of 75 and NID_PACKET.
    line = json.loads(capture.read_text(encoding="utf-8"))
    line["data"] = in_hex(TRACTION[:83] + "11" + TRACTION[85:])
    capture.write_text(json.dumps(line) + "\n", encoding="utf-8")
    ended = fishplate("translate", "--to", "2.1", capture)
    assert ended.code == 0
    text = " ".join(ended.out.split())
    assert "nothing is left" in text
    assert "packets[0].Q_DIR: the whole message is rejected: Q_DIR 3 (spare)" in text
    assert "[6.6.3.1.1, lossy]" in text


def test_another_issue_is_not_translated(fishplate: Callable[..., Any], tmp_path: Path) -> None:
    path = tmp_path / "older.txt"
    path.write_text(in_hex(TRACTION) + "\n", encoding="utf-8")
    given = ("--medium", "radio", "--direction", "to-train", "--version", "1.0")
    ended = fishplate("translate", "--to", "2.1", *given, "--issue", "2.3.0", path)
    assert (ended.code, ended.out) == (3, "")
    assert "read it without issue 2.3.0" in " ".join(ended.err.split())


def test_a_telegram_keeps_its_length(fishplate: Callable[..., Any], tmp_path: Path) -> None:
    # Header 50, packet 254 23, end flag 8 bits; ones up to 830 (SUBSET-036 4.3.1.2) and to a byte.
    header = f"1{16:07b}0" + "000" + "000" + "00" + f"{255:08b}" + f"{905:010b}{9060:014b}1"
    bits = header + f"{254:08b}01{23:013b}" + "1" * 8
    path = tmp_path / "telegram.txt"
    path.write_text(in_hex(bits.ljust(832, "1")) + "\n", encoding="utf-8")
    given = ("--medium", "balise", "--as", "jsonl")
    tree = json.loads(fishplate("translate", "--to", "2.1", *given, path).out)
    assert tree["header"]["M_VERSION"] == 33
    assert (tree["bits"], tree["filler"]["bits"]) == (832, 832 - 81)


def test_the_demo_is_translated_whole(fishplate: Callable[..., Any], tmp_path: Path) -> None:
    ended = fishplate("translate", "--to", "1.0", "--as", "capture", DEMO / "run.jsonl")
    assert ended.code == 0
    # Message 158 is not sent to X = 1 (6.6.3.4.5).
    lines = ended.out.splitlines()
    assert len(lines) == len((DEMO / "run.jsonl").read_text(encoding="utf-8").splitlines()) - 1
    path = tmp_path / "old.jsonl"
    path.write_text(ended.out, encoding="utf-8")
    listed = fishplate("list", path)
    assert (listed.code, listed.err) == (0, "")
    assert "!!" not in listed.out


def test_stored_values(fishplate: Callable[..., Any], tmp_path: Path) -> None:
    stored = tmp_path / "values.yaml"
    stored.write_text('NID_OPERATIONAL: "9092"\n', encoding="utf-8")
    out = fishplate(
        "translate", "--to", "1.0", "--as", "jsonl", "--stored", stored, DEMO / "run.jsonl"
    ).out
    trees = [json.loads(line) for line in out.splitlines()]
    found = [
        packet["NID_OPERATIONAL"]
        for tree in trees
        if tree.get("direction") == "to-track" and "packets" in tree
        for packet in tree["packets"]
        if packet["NID_PACKET"] == 11
    ]
    assert found
    assert set(found) == {"9092"}


@pytest.mark.parametrize(
    ("text", "said"),
    [
        ("V_NVLIMSUPERV: fast\n", "V_NVLIMSUPERV"),
        ("- 1\n", "values.yaml"),
        ("a: 1\n---\nb: 2\n", "one mapping"),
        ("V_NVLIMSUPERV: true\n", "V_NVLIMSUPERV"),
        (b"\xff", "not UTF-8"),
    ],
)
def test_a_wrong_file_of_stored_values_is_wrong_usage(
    fishplate: Callable[..., Any], tmp_path: Path, capture: Path, text: str | bytes, said: str
) -> None:
    stored = tmp_path / "values.yaml"
    stored.write_bytes(text if isinstance(text, bytes) else text.encode())
    ended = fishplate("translate", "--to", "2.1", "--stored", stored, capture)
    assert (ended.code, ended.out) == (2, "")
    # The message stands in a frame that breaks its lines.
    assert said in ended.err.replace("\n", "").replace(" │", "").replace("│ ", "")


@pytest.mark.parametrize("version", ["3.0", "2.2", "7"])
def test_a_version_without_rules_is_wrong_usage(
    fishplate: Callable[..., Any], capture: Path, version: str
) -> None:
    ended = fishplate("translate", "--to", version, capture)
    assert ended.code == 2
    assert "1.0, 1.1, 2.0, 2.1" in ended.err


def test_the_version_is_wanted(fishplate: Callable[..., Any], capture: Path) -> None:
    assert fishplate("translate", capture).code == 2


def test_frames_that_cannot_be_translated_are_named(
    fishplate: Callable[..., Any], capture: Path, tmp_path: Path
) -> None:
    path = tmp_path / "mixed.jsonl"
    good = capture.read_text(encoding="utf-8")
    other = json.dumps({**json.loads(good), "version": "3.0", "data": in_hex(CHANGED), "bits": 136})
    cut = json.dumps({**json.loads(good), "data": in_hex(TRACTION)[:-8], "bits": 96})
    path.write_text(good + other + "\n" + cut + "\nno frame\n" + good, encoding="utf-8")
    ended = fishplate("translate", "--to", "2.1", "--as", "hex", path)
    assert ended.code == 3
    assert ended.out == f"{in_hex(CHANGED)}\n" * 2
    named = [line for line in ended.err.splitlines() if "M_TRACTION" not in line]
    assert "line 2" in named[0]
    assert "no published rules to translate from version 3.0" in named[0]
    assert "line 3" in named[1]
    assert "could not be read" in named[1]
    assert "line 4" in named[2]


def test_the_help_carries_the_caution(fishplate: Callable[..., Any]) -> None:
    ended = fishplate("translate", "--help")
    assert ended.code == 0
    assert "EN 50128" in ended.out
