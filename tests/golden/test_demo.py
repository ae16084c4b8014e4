"""The demo in `fixtures/demo/`: captures up to date, clean run clean, frames true to the plan.

The plan of the line is the outside source here: positions, speeds and gradients of the frames
are added up from raw codes and compared with `plan.yaml`, which no encoder has touched.
"""

from __future__ import annotations

import importlib.util
import json
import sys
from datetime import datetime
from functools import cache
from itertools import pairwise
from pathlib import Path
from typing import TYPE_CHECKING, Any

import pytest

import fishplate

if TYPE_CHECKING:
    from collections.abc import Iterator
    from types import ModuleType

DEMO = Path(__file__).resolve().parents[2] / "fixtures" / "demo"
TABLES = DEMO.parent / "standard"
LINES = {
    "run.jsonl": "",
    "run-1.0.jsonl": "",
    "run-3.0.jsonl": "",
    "border.jsonl": "side_line",
}
"""The captures without faults, and the key under which `plan.yaml` holds their line."""
WRITTEN = (*LINES, "faulty.jsonl", "faults.txt", "versions.txt", "frames.hex")
KINDS = {"truncated", "unknown-packet", "unknown-message", "unknown-version", "length-mismatch"}
NOT_HEX = "not hex"
# 0.1 m, 1 m, 10 m a step, in decimetres: SUBSET-026 7.5.1.129.
STEP = (1, 10, 100)
END_OF_GRADIENTS = 255  # 7.5.1.37
END_OF_SPEEDS = 127  # 7.5.1.171


@cache
def build() -> ModuleType:
    """Import the script that builds the demo."""
    spec = importlib.util.spec_from_file_location("demo_build", DEMO / "build.py")
    assert spec is not None
    assert spec.loader is not None
    module = importlib.util.module_from_spec(spec)
    # dataclasses look their module up by name
    with pytest.MonkeyPatch.context() as patch:
        patch.setitem(sys.modules, "demo_build", module)
        spec.loader.exec_module(module)
    return module


@cache
def outputs() -> dict[str, str]:
    """Build the written files again."""
    text: dict[str, str] = build().outputs()
    return text


@cache
def plan(key: str = "") -> dict[str, Any]:
    """Read the plan of the line, or of the line under a key."""
    found: dict[str, Any] = build().read_yaml(DEMO / "plan.yaml")[0]
    return found[key] if key else found


def lines(name: str) -> list[dict[str, Any]]:
    """Read a capture as plain JSON."""
    return [json.loads(line) for line in (DEMO / name).read_text("utf-8").splitlines()]


@cache
def decoded(name: str) -> tuple[tuple[fishplate.Frame, fishplate.Message], ...]:
    """Decode a capture as a whole, as the library reads it from disk."""
    return tuple(fishplate.decode_frames(fishplate.read_capture(DEMO / name)))


@cache
def clean_trees(name: str = "run.jsonl") -> tuple[dict[str, Any], ...]:
    """Give the trees of a capture without faults."""
    return tuple(message.tree() for _, message in decoded(name))


def kilometre(name: str, group: int) -> int:
    """Give the place of a group in decimetres."""
    place: int = plan(LINES[name])["groups"][group]["km"]
    return 10 * place


def placed(name: str = "run.jsonl") -> Iterator[tuple[int, int, dict[str, Any]]]:
    """Yield every packet to the train with frame number and reference in decimetres."""
    for number, tree in enumerate(clean_trees(name)):
        if tree["direction"] != "to-train":
            continue
        header = tree["header"]
        reference = None
        if tree["medium"] == "balise":
            reference = kilometre(name, header["NID_BG"])
        elif tree["medium"] == "radio" and header["NID_LRBG"] != (1 << 24) - 1:
            reference = kilometre(name, header["NID_LRBG"] & 0x3FFF)
            if "D_REF" in header:
                reference += STEP[header["Q_SCALE"]] * header["D_REF"]
        for packet in tree["packets"]:
            if packet["NID_PACKET"] == 136:
                reference = kilometre(name, packet["NID_BG"])
            if reference is not None:
                yield number, reference, packet


def cumulated(
    reference: int, packet: dict[str, Any], series: str, increment: str
) -> list[tuple[int, dict[str, Any]]]:
    """Turn increments into places: SUBSET-026 3.6.3.2.2 and 3.6.3.2.6."""
    places = []
    for element in packet[series]:
        reference += STEP[packet["Q_SCALE"]] * element[increment]
        places.append((reference, element))
    return places


def expected(rows: list[dict[str, Any]], key: str, start: int, end: int) -> list[tuple[int, int]]:
    """Cut the plan to a stretch: place in decimetres and value."""
    ends = [10 * row["km"] for row in rows[1:]] + [10**9]
    return [
        (max(10 * row["km"], start), row[key])
        for row, stop in zip(rows, ends, strict=True)
        if stop > start and 10 * row["km"] < end
    ]


@pytest.mark.parametrize("name", WRITTEN)
def test_written_file_is_up_to_date(name: str) -> None:
    assert (DEMO / name).read_text("utf-8") == outputs()[name]


@pytest.mark.parametrize("name", LINES)
def test_run_is_long_enough_and_in_order(name: str) -> None:
    frames = lines(name)
    assert len(frames) >= 45
    assert all("version" not in frame for frame in frames)
    times = [datetime.fromisoformat(frame["time"]) for frame in frames]
    assert all(a <= b for a, b in pairwise(times))
    for frame in frames:
        assert len(frame["data"]) == 2 * -(-frame["bits"] // 8)
        assert frame["data"] == frame["data"].upper()


def test_run_shows_what_it_promises() -> None:
    media = {tree["medium"] for tree in clean_trees()}
    sizes = {frame["bits"] for frame in lines("run.jsonl") if frame["medium"] == "balise"}
    packets = {p["NID_PACKET"] for t in clean_trees() for p in t["packets"]}
    messages = {t["header"].get("NID_MESSAGE") for t in clean_trees()}
    conditions = {
        c["M_TRACKCOND"] for _, _, p in placed() if p["NID_PACKET"] == 68 for c in p["conditions"]
    }
    assert media == {"balise", "loop", "radio"}
    assert sizes == {210, 830}
    assert len(conditions) >= 6
    assert packets >= {3, 5, 12, 15, 21, 27, 41, 42, 57, 58, 65, 66, 68, 69, 71, 72, 76, 79, 80}
    assert packets >= {0, 2, 11, 88, 134, 136, 254, 255}
    assert messages >= {2, 3, 6, 8, 9, 15, 16, 18, 24, 32, 33, 34, 39}
    assert messages >= {129, 132, 136, 137, 146, 147, 149, 150, 155, 156, 158, 159}


@pytest.mark.parametrize("name", LINES)
def test_run_decodes_without_a_problem_and_encodes_back(name: str) -> None:
    assert len(decoded(name)) == len(lines(name))
    for frame, message in decoded(name):
        assert not message.problems
        version = message.version if message.medium == "radio" else None
        strict = fishplate.decode(
            frame.data,
            medium=frame.medium,
            direction=frame.direction,
            version=version,
            bits=frame.bits,
        )
        assert strict.tree() == message.tree()
        back = fishplate.encode(message)
        assert len(back) == frame.bits
        assert back.tobytes() == frame.data


@pytest.mark.parametrize("name", LINES)
def test_radio_stamps_agree_with_the_capture(name: str) -> None:
    # T_TRAIN counts steps of 10 ms: SUBSET-026 7.5.1.154.
    zero = datetime.fromisoformat(plan()["clock"])
    for frame, tree in zip(lines(name), clean_trees(name), strict=True):
        if tree["medium"] == "radio":
            passed = datetime.fromisoformat(frame["time"]) - zero
            assert tree["header"]["T_TRAIN"] * 10 == round(passed.total_seconds() * 1000)


@pytest.mark.parametrize("name", LINES)
def test_every_group_of_the_plan_is_read_completely(name: str) -> None:
    line = plan(LINES[name])
    read: dict[int, list[int]] = {}
    for tree in clean_trees(name):
        if tree["medium"] == "balise":
            header = tree["header"]
            read.setdefault(header["NID_BG"], []).append(header["N_PIG"])
            assert header["N_TOTAL"] == line["groups"][header["NID_BG"]]["balises"] - 1
    assert read == {
        group: list(range(row["balises"]))[:: -1 if group in line["reversed_groups"] else 1]
        for group, row in line["groups"].items()
        if row.get("read", True)
    }


@pytest.mark.parametrize(("name", "least"), [*zip(LINES, (20, 20, 20, 8), strict=True)])
def test_linking_distances_add_up_to_the_plan(name: str, least: int) -> None:
    reverse = plan(LINES[name])["reversed_groups"]
    seen = 0
    for number, reference, packet in placed(name):
        if packet["NID_PACKET"] == 5:
            for place, link in cumulated(reference, packet, "links", "D_LINK"):
                seen += 1
                assert place == kilometre(name, link["NID_BG"]), (number, link)
                assert (link["Q_LINKORIENTATION"] == 0) == (link["NID_BG"] in reverse)
    assert seen >= least


@pytest.mark.parametrize(("name", "least"), [*zip(LINES, (16, 16, 18, 6), strict=True)])
def test_gradients_and_speeds_follow_the_plan(name: str, least: int) -> None:
    line = plan(LINES[name])
    seen = 0
    for number, reference, packet in placed(name):
        if packet["NID_PACKET"] == 21:
            places = cumulated(reference, packet, "gradients", "D_GRADIENT")
            end, last = places[-1]
            assert last["G_A"] == END_OF_GRADIENTS
            rows, key = line["gradients"], "slope"
            values = [(p, e["G_A"] if e["Q_GDIR"] else -e["G_A"]) for p, e in places[:-1]]
        elif packet["NID_PACKET"] == 27:
            places = cumulated(reference, packet, "steps", "D_STATIC")
            end, last = places[-1]
            assert last["V_STATIC"] == END_OF_SPEEDS
            rows, key = line["speeds"], "speed"
            values = [(p, 5 * e["V_STATIC"]) for p, e in places[:-1]]
        else:
            continue
        seen += 1
        assert values == expected(rows, key, reference, end), number
    assert seen >= least


@pytest.mark.parametrize(("name", "least"), [*zip(LINES, (10, 10, 11, 3), strict=True)])
def test_authorities_end_at_a_place_of_the_plan(name: str, least: int) -> None:
    known = {10 * row["km"] for row in plan(LINES[name])["places"]}
    seen = 0
    for number, reference, packet in placed(name):
        if packet["NID_PACKET"] in {12, 15}:
            length = sum(section["L_SECTION"] for section in packet["sections"])
            length += packet["L_ENDSECTION"]
            seen += 1
            assert reference + STEP[packet["Q_SCALE"]] * length in known, number
    assert seen >= least


def test_faults_are_many_and_each_changes_its_frame_only() -> None:
    faults = build().faults()
    assert len(faults) >= 12
    assert len({tuple(fault["concerns"]) for fault in faults}) >= 12
    changed = {fault["frame"] for fault in faults}
    assert len(changed) == len(faults)
    clean, faulty = lines("run.jsonl"), lines("faulty.jsonl")
    assert len(clean) == len(faulty)
    for number, (a, b) in enumerate(zip(clean, faulty, strict=True)):
        assert (a == b) == (number not in changed), number
        assert a["time"] == b["time"]


def test_faults_in_the_bits_are_found_and_the_others_can_be_read() -> None:
    faulty = lines("faulty.jsonl")
    for fault in build().faults():
        frame = faulty[fault["frame"]]
        keywords = {key: frame[key] for key in ("medium", "direction", "bits")}
        kinds = KINDS & set(fault["concerns"])
        if kinds or NOT_HEX in fault["concerns"]:
            with pytest.raises(fishplate.FishplateError):
                fishplate.decode(frame["data"], **keywords)
        else:
            assert not fishplate.decode(frame["data"], **keywords).problems
        if kinds:
            problems = fishplate.decode(frame["data"], strict=False, **keywords).problems
            assert kinds <= {problem.kind for problem in problems}, fault


def test_line_that_is_not_hex_does_not_end_the_reading() -> None:
    bad = {f["frame"] for f in build().faults() if NOT_HEX in f["concerns"]}
    frames = list(fishplate.read_capture(DEMO / "faulty.jsonl"))
    assert len(frames) == len(lines("faulty.jsonl"))
    assert {number for number, frame in enumerate(frames) if frame.problem} == bad
