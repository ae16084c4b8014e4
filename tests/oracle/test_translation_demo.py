"""The demo run translated to version 1 is the demo run authored in version 1.

`run-1.0.jsonl` was authored by hand, packet by packet, from what SUBSET-026 issue 3.6.0, 6.6.3 says
of each (`fixtures/demo/versions.yaml`); `translate` had no part in it. Where the two differ, the
message alone does not hold what the author knew.
"""

from __future__ import annotations

from pathlib import Path
from typing import Any

import pytest

import fishplate

DEMO = Path(__file__).resolve().parents[2] / "fixtures" / "demo"
STORED = {"NID_OPERATIONAL": "9092", "telephone_numbers": ["9050909101", "9050909102"]}
"""What the train of the demo knows beside its messages (fixtures/demo/README.md)."""

OTHERWISE = {
    0: "the version order names the version of the area, which is another one",
    17: "message 32 names the version of the trackside, which is another one",
    27: "the traction systems of country 905 are in no row of table 13: packets 39, 70 fall away",
}
"""Frames that the author said otherwise, and why."""

LEFT_OUT = {37: "message 158 is not used in version 1 (6.5.1.6.6.4)"}


def messages(name: str) -> dict[Any, tuple[int, fishplate.Message]]:
    frames = fishplate.decode_frames(fishplate.read_capture(DEMO / name))
    return {frame.time: (frame.index, message) for frame, message in frames}


RUN, AUTHORED = messages("run.jsonl"), messages("run-1.0.jsonl")


@pytest.mark.parametrize("time", RUN)
def test_translated_and_authored_are_the_same_bits(time: str) -> None:
    index, message = RUN[time]
    if index in LEFT_OUT:
        assert time not in AUTHORED
        assert fishplate.translate(message, "1.0").tree is None
        return
    _, authored = AUTHORED[time]
    found = fishplate.translate(message, authored.version, stored=STORED).tree
    assert found is not None
    same = fishplate.encode(found) == fishplate.encode(authored)
    assert same == (index not in OTHERWISE)
