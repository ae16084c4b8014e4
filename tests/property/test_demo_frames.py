"""The frames of the demo cut at every bit, and with every single bit turned over.

What is missing is worked out from the field rows of the whole frame, which the oracle tests hold
to the published tables.
"""

from __future__ import annotations

from dataclasses import replace
from pathlib import Path
from typing import Any

import pytest

import fishplate
from fishplate.errors import FishplateError, Truncated
from property.reading import packed, rows_of
from property.test_frames import end_of_content, expected_missing

DEMO = Path(__file__).resolve().parents[2] / "fixtures" / "demo"
OTHERS = ("run-1.0.jsonl", "run-3.0.jsonl", "border.jsonl")
FRAMES = [
    *fishplate.read_capture(DEMO / "run.jsonl"),
    *(
        # cut or spoilt, a radio message no longer has the frames before it to say its version
        replace(frame, version=message.version if message.medium == "radio" else None)
        for name in OTHERS
        for frame, message in fishplate.decode_frames(fishplate.read_capture(DEMO / name))
    ),
]
SAMPLE = 7
"""Every seventh bit by default, which meets every remainder of a byte; all of them when slow."""


def given(frame: fishplate.Frame) -> dict[str, Any]:
    return {"medium": frame.medium, "direction": frame.direction, "version": frame.version}


def check_cuts(frame: fishplate.Frame, step: int) -> None:
    value = int.from_bytes(frame.data) >> -frame.bits % 8
    rows = rows_of(value, frame.bits, **given(frame))
    end = end_of_content(rows, frame.bits)
    for cut in range(frame.index % step, frame.bits, step):
        data = packed(value >> frame.bits - cut, cut)
        message = fishplate.decode(data, bits=cut, strict=False, **given(frame))
        back = fishplate.encode(message)
        assert (len(back), back.tobytes()) == (cut, data)
        if cut >= end:
            assert not message.problems
            continue
        with pytest.raises(Truncated) as caught:
            fishplate.decode(data, bits=cut, **given(frame))
        assert caught.value.missing == expected_missing(rows, cut), cut
        assert [each.kind for each in message.problems] == ["truncated"]


def check_turned_bits(frame: fishplate.Frame, step: int) -> None:
    value = int.from_bytes(frame.data) >> -frame.bits % 8
    for bit in range(frame.index % step, frame.bits, step):
        data = packed(value ^ 1 << bit, frame.bits)
        message = fishplate.decode(data, bits=frame.bits, strict=False, **given(frame))
        back = fishplate.encode(message)
        assert (len(back), back.tobytes()) == (frame.bits, data)
        if message.problems:
            with pytest.raises(FishplateError) as caught:
                fishplate.decode(data, bits=frame.bits, **given(frame))
            assert str(caught.value) == str(message.problems[0].error)
        else:
            strict = fishplate.decode(data, bits=frame.bits, **given(frame))
            assert strict.tree() == message.tree()


@pytest.mark.parametrize("check", [check_cuts, check_turned_bits])
def test_some_bits_of_every_demo_frame(check: Any) -> None:
    for frame in FRAMES:
        check(frame, SAMPLE)


@pytest.mark.slow
@pytest.mark.parametrize("check", [check_cuts, check_turned_bits])
@pytest.mark.parametrize("index", range(len(FRAMES)))
def test_every_bit_of_every_demo_frame(index: int, check: Any) -> None:
    check(FRAMES[index], 1)
