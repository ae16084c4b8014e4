"""Which system version the radio messages of a capture are read in (SUBSET-026 8.7.12, 7.4.2.1).

Frames are authored here; what is expected is what the authored frames say, never what was decoded.
"""

from __future__ import annotations

from typing import Any

import pytest

import fishplate
from fishplate.captures import CaptureDecoder, Frame

POSITION = {
    "NID_PACKET": 0,
    "Q_SCALE": 1,
    "NID_LRBG": "905/9051",
    "D_LRBG": 30,
    "Q_DIRLRBG": 1,
    "Q_DLRBG": 1,
    "L_DOUBTOVER": 3,
    "L_DOUBTUNDER": 3,
    "Q_LENGTH": 0,
    "V_TRAIN": 20,
    "Q_DIRTRAIN": 1,
    "M_MODE": 0,
    "M_LEVEL": 3,
}


def frame(tree: dict[str, Any], source: str = "capture", **said: str) -> Frame:
    bits = fishplate.encode(tree)
    return Frame(bits.tobytes(), len(bits), source=source, **said)  # type: ignore[arg-type]


def trackside(version: str) -> Frame:
    """Message 32: the version of the RBC; it is laid out the same in every version."""
    header = {"NID_MESSAGE": 32, "T_TRAIN": 1, "M_ACK": 0, "NID_LRBG": 0, "M_VERSION": version}
    return frame({"medium": "radio", "header": header})


def supported(*versions: str) -> Frame:
    """Message 159 with packet 2: the versions of the train."""
    header = {"NID_MESSAGE": 159, "T_TRAIN": 1, "NID_ENGINE": 9091}
    packet = {"NID_PACKET": 2, "versions": [{"M_VERSION": each} for each in versions]}
    return frame({"medium": "radio", "header": header, "packets": [packet]})


def ordered(version: str) -> Frame:
    """A balise telegram with packet 2: the version ordered for the area."""
    header = {
        "Q_UPDOWN": 1,
        "M_VERSION": "2.1",
        "Q_MEDIA": 0,
        "N_PIG": 0,
        "N_TOTAL": 0,
        "M_DUP": 0,
        "M_MCOUNT": 255,
        "NID_C": 905,
        "NID_BG": 9050,
        "Q_LINK": 1,
    }
    packet = {"NID_PACKET": 2, "Q_DIR": 2, "M_VERSION": version}
    return frame({"medium": "balise", "header": header, "packets": [packet]})


def request(version: str, **fields: int) -> Frame:
    """Message 132, whose reason takes 1 bit in X = 1 and 5 bits in X = 2 (8.6.3, 6.5.1.6)."""
    header = {"NID_MESSAGE": 132, "T_TRAIN": 1, "NID_ENGINE": 9091, **fields}
    packets = [POSITION]
    return frame({"medium": "radio", "version": version, "header": header, "packets": packets})


def acknowledged() -> Frame:
    """Message 146, laid out the same in every version."""
    header = {"NID_MESSAGE": 146, "T_TRAIN": 2, "NID_ENGINE": 9091, "T_TRAIN_REFERENCE": 1}
    return frame({"medium": "radio", "header": header})


def versions(frames: list[Frame], **said: str) -> list[tuple[str, str]]:
    return [
        (message.version, message.version_from)
        for _, message in fishplate.decode_frames(frames, **said)
    ]


@pytest.mark.parametrize("version", ["1.0", "1.1", "2.0", "2.1", "2.2", "2.3", "3.0"])
def test_message_32_names_the_version(version: str) -> None:
    found = versions([trackside(version), acknowledged()])
    assert found == [("2.1", "assumed"), (version, "capture")]


def test_the_last_message_32_counts() -> None:
    frames = [trackside("2.1"), acknowledged(), trackside("1.0"), acknowledged()]
    assert versions(frames)[1::2] == [("2.1", "capture"), ("1.0", "capture")]


def test_a_train_without_the_y_of_the_trackside_speaks_its_own() -> None:
    frames = [trackside("2.1"), supported("1.0", "2.0"), acknowledged()]
    assert versions(frames)[-1] == ("2.0", "capture")


def test_a_train_with_the_version_of_the_trackside_speaks_it() -> None:
    frames = [trackside("1.0"), supported("2.1", "1.1", "1.0"), acknowledged()]
    assert versions(frames)[-1] == ("1.0", "capture")


def test_an_ordered_version_counts_until_a_message_32() -> None:
    frames = [ordered("2.0"), acknowledged(), trackside("2.1"), acknowledged()]
    assert versions(frames)[1::2] == [("2.0", "capture"), ("2.1", "capture")]


def test_what_a_frame_says_itself_comes_first() -> None:
    said = Frame(acknowledged().data, acknowledged().bits, version="2.0", source="capture")
    assert versions([trackside("1.0"), said])[-1] == ("2.0", "caller")


def test_the_capture_comes_before_the_caller() -> None:
    frames = [acknowledged(), trackside("1.0"), acknowledged()]
    found = versions(frames, version="2.0")
    assert found == [("2.0", "caller"), ("2.0", "caller"), ("1.0", "capture")]


def test_a_frame_of_another_trackside_is_read_as_it_fits() -> None:
    """After the border, one more request still goes to the RBC with X = 2."""
    frames = [trackside("1.0"), request("2.1", Q_MARQSTREASON=1), request("1.0", Q_TRACKDEL=1)]
    assert versions(frames)[1:] == [("2.1", "assumed"), ("1.0", "capture")]


def test_nothing_said_and_only_one_version_fits() -> None:
    assert versions([request("1.0", Q_TRACKDEL=0)]) == [("1.0", "inferred")]


def test_what_fits_one_version_only_settles_the_frames_behind_it() -> None:
    """Cut out of a session: message 146 fits every version, 132 only the one with 1 bit."""
    frames = [acknowledged(), request("1.0", Q_TRACKDEL=0), acknowledged()]
    found = [message for _, message in fishplate.decode_frames(frames)]
    assert [each.version for each in found] == ["2.1", "1.0", "1.0"]
    assert [each.version_from for each in found] == ["assumed", "inferred", "inferred"]
    assert found[-1].fitting == ("1.0", "2.1")


def test_what_was_inferred_gives_way_to_what_fits_alone() -> None:
    """The 1 bit of X = 1 and the 5 bits of X = 2 in turn."""
    frames = [request("1.0", Q_TRACKDEL=0), request("2.1", Q_MARQSTREASON=1), acknowledged()]
    assert versions(frames) == [("1.0", "inferred"), ("2.1", "assumed"), ("1.0", "inferred")]


def test_each_source_is_a_capture_of_its_own() -> None:
    other = Frame(acknowledged().data, acknowledged().bits, source="other")
    assert versions([trackside("1.0"), acknowledged(), other])[1:] == [
        ("1.0", "capture"),
        ("2.1", "assumed"),
    ]


def test_a_version_without_layouts_does_not_hide_what_can_be_read() -> None:
    """Message 32 with 1.5, which is declared not valid (7.5.1.79)."""
    found = versions([trackside("1.5"), acknowledged()])
    assert found[-1] == ("2.1", "assumed")


def test_a_newer_version_is_read_and_said() -> None:
    """3.1 differs from 3.0 in Y only (issue 4.0.0, 7.5.1.79)."""
    _, (_, message) = fishplate.decode_frames([trackside("3.1"), acknowledged()])
    assert (message.version, message.version_from, message.issue) == ("3.1", "capture", "4.0.0")
    assert [each.kind for each in message.problems] == ["newer-version"]


def test_the_direction_said_spares_a_second_reading() -> None:
    """A frame whose line says medium and direction is read in the version heard at once."""
    known = Frame(
        acknowledged().data,
        acknowledged().bits,
        medium="radio",
        direction="to-track",
        source="capture",
    )
    assert versions([trackside("1.0"), known])[-1] == ("1.0", "capture")


def test_a_cut_message_32_says_nothing() -> None:
    whole = trackside("1.0")
    cut = Frame(whole.data[:8], 64, medium="radio", source="capture")
    decoder = CaptureDecoder()
    assert decoder.decode(cut).problems
    assert decoder.decode(acknowledged()).version_from == "assumed"


def test_frames_that_could_not_be_read_are_left_out() -> None:
    broken = Frame(problem=fishplate.DecodeError("not hex"), source="capture")
    assert [each for each, _ in fishplate.decode_frames([broken, acknowledged()])] == [
        acknowledged()
    ]
