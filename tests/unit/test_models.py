"""Models: authored trees in, trees of codes out, all errors at once.

Resolutions and special codes: SUBSET-026 issue 3.6.0, clause 7.5.1.
"""

from __future__ import annotations

import copy
from typing import Any

import pytest

import fishplate
from fishplate.errors import path_text
from fishplate.models import (
    codes_of,
    packet_model,
)

AUTHORITY: dict[str, Any] = {
    "medium": "radio",
    "direction": "to-train",
    "header": {
        "NID_MESSAGE": 3,
        "T_TRAIN": "1234.56 s",
        "M_ACK": "acknowledgement required",
        "NID_LRBG": "16/257",
    },
    "packets": [
        {
            "NID_PACKET": 15,
            "Q_DIR": "nominal",
            "Q_SCALE": "1 m",
            "V_EMA": "120 km/h",
            "T_EMA": "infinite",
            "sections": [{"L_SECTION": "1.2 km", "Q_SECTIONTIMER": "no section timer"}],
            "L_ENDSECTION": "800 m",
            "Q_SECTIONTIMER": 0,
            "Q_ENDTIMER": 0,
            "Q_DANGERPOINT": 0,
            "Q_OVERLAP": 0,
        }
    ],
}


def authority(**changes: object) -> dict[str, Any]:
    """Return the authored message with keys of its packet changed (None takes one out)."""
    tree = copy.deepcopy(AUTHORITY)
    for key, value in changes.items():
        tree["packets"][0][key] = value
        if value is None:
            del tree["packets"][0][key]
    return tree


def errors_of(tree: dict[str, Any]) -> dict[str, str]:
    with pytest.raises(fishplate.EncodeError) as caught:
        codes_of(tree)
    found = (caught.value, *caught.value.others)
    return {path_text(each.path): each.reason for each in found}


def test_meanings_become_codes() -> None:
    tree = codes_of(AUTHORITY)
    assert tree["header"] == {
        "NID_MESSAGE": 3,
        "T_TRAIN": 123456,  # steps of 0.01 s (7.5.1.154)
        "M_ACK": 1,
        "NID_LRBG": 16 * 2**14 + 257,  # NID_C in the 10 high bits, NID_BG in the 14 low (7.5.1.90)
    }
    (packet,) = tree["packets"]
    assert packet["V_EMA"] == 24  # steps of 5 km/h (7.5.1.157)
    assert packet["T_EMA"] == 1023  # 7.5.1.146
    assert packet["sections"] == [{"L_SECTION": 1200, "Q_SECTIONTIMER": 0}]


@pytest.mark.parametrize(
    ("scale", "text", "code"),
    [(0, "120.5 m", 1205), (1, "1205 m", 1205), (2, "12.05 km", 1205), ("10 m", "50 m", 5)],
)
def test_distances_take_the_scale_of_their_packet(scale: object, text: str, code: int) -> None:
    tree = authority(Q_SCALE=scale, L_ENDSECTION=text, sections=[])
    assert codes_of(tree)["packets"][0]["L_ENDSECTION"] == code


def test_integrity_length_is_never_scaled() -> None:
    """L_TRAININT is in metres whatever Q_SCALE says (7.5.1.57)."""
    model = packet_model(0, "to-track")
    tree: dict[str, Any] = {
        "NID_PACKET": 0,
        "Q_SCALE": "10 m",
        "NID_LRBG": "unknown",
        "D_LRBG": "120 m",
        "Q_DIRLRBG": "nominal",
        "Q_DLRBG": "nominal",
        "L_DOUBTOVER": "10 m",
        "L_DOUBTUNDER": "unknown",
        "Q_LENGTH": "integrity confirmed by driver",
        "L_TRAININT": "397 m",
        "V_TRAIN": "0 km/h",
        "Q_DIRTRAIN": "unknown",
        "M_MODE": "on sight",
        "M_LEVEL": "level NTC",
        "NID_NTC": 5,
    }
    packet = model.model_validate(tree).tree()
    assert (packet["L_TRAININT"], packet["D_LRBG"], packet["L_DOUBTUNDER"]) == (397, 12, 32767)


def test_bit_sets_digits_and_texts() -> None:
    packet = {
        "NID_PACKET": 11,
        "NC_CDTRAIN": "130 mm",
        "NC_TRAIN": ["passenger train", "freight train braked in G"],
        "L_TRAIN": "400 m",
        "V_MAXTRAIN": "200 km/h",
        "M_LOADINGGAUGE": "GB",
        "M_AXLELOADCAT": "d2",
        "M_AIRTIGHT": "Not Fitted",
        "N_AXLE": 32,
        "tractions": [{"M_VOLTAGE": "AC 25 kV 50 Hz", "NID_CTRACTION": 5}],
        "national_systems": [],
    }
    codes = packet_model(11, "to-track").model_validate(packet).tree()
    assert codes["NC_TRAIN"] == 4 + 2  # 7.5.1.84
    assert codes["M_AXLELOADCAT"] == 7  # 7.5.1.62
    running = packet_model(140).model_validate(
        {"NID_PACKET": 140, "Q_DIR": 1, "NID_OPERATIONAL": "0049 123"}
    )
    assert running.tree()["NID_OPERATIONAL"] == "0049123"


def test_all_errors_at_once_with_paths() -> None:
    tree = authority(
        V_EMA="122 km/h",
        Q_OVERLAP=1,
        D_OL="100 m",
        L_ENDSECTION=None,
        V_EMAX=3,
        sections=[{"L_SECTION": "1200.5 m", "Q_SECTIONTIMER": 0, "T_SECTIONTIMER": 5}],
    )
    tree["header"]["T_TRAIN"] = "12.345 s"
    tree["header"]["M_ACK"] = True
    tree["packets"].append({"NID_PACKET": 201, "Q_DIR": 1})
    found = errors_of(tree)
    assert set(found) == {
        "header.T_TRAIN",
        "header.M_ACK",
        "packets[0].V_EMA",
        "packets[0].V_EMAX",
        "packets[0].L_ENDSECTION",
        "packets[0].D_STARTOL",
        "packets[0].T_OL",
        "packets[0].V_RELEASEOL",
        "packets[0].sections[0].L_SECTION",
        "packets[0].sections[0].T_SECTIONTIMER",
        "packets[1]",
    }
    assert "24 (120 km/h) and 25 (125 km/h)" in found["packets[0].V_EMA"]
    assert "1200 (1200 m) and 1201 (1201 m)" in found["packets[0].sections[0].L_SECTION"]
    assert "1234 (12.34 s) and 1235 (12.35 s)" in found["header.T_TRAIN"]
    assert "Q_OVERLAP = 1" in found["packets[0].T_OL"]
    assert "Q_SECTIONTIMER = 1" in found["packets[0].sections[0].T_SECTIONTIMER"]
    assert "did you mean V_EMA?" in found["packets[0].V_EMAX"]


@pytest.mark.parametrize(
    ("value", "said"),
    [
        ("605 km/h", "nearest is 120 (600 km/h)"),
        ("-5 km/h", "nearest is 0 (0 km/h)"),
        ("120", "has no unit"),
        ("120 m", "expected km/h"),
        ("fast", "'fast' is not a number with its unit"),
        (300, "from 0 to 127"),
        (1.5, "1.5"),
        (None, "None"),
        ([], "[]"),
    ],
)
def test_values_that_do_not_fit(value: object, said: str) -> None:
    tree = authority()
    tree["packets"][0]["V_EMA"] = value
    found = errors_of(tree)
    assert list(found) == ["packets[0].V_EMA"]
    assert said in found["packets[0].V_EMA"]


@pytest.mark.parametrize(
    ("tree", "path"),
    [
        ({}, "header"),
        ({"header": {"NID_MESSAGE": 99}}, "header.NID_MESSAGE"),
        ({"header": {"NID_MESSAGE": 132}, "direction": "to-train"}, "header.NID_MESSAGE"),
        ({"medium": "radio", "header": {"NID_MESSAGE": "3"}}, "header.NID_MESSAGE"),
        ({"medium": "radio", "header": {"NID_MESSAGE": [3]}}, "header.NID_MESSAGE"),
        ({**AUTHORITY, "packet": []}, "packet"),
        ({**AUTHORITY, "packets": 15}, "packets"),
        ({**AUTHORITY, "packets": [15]}, "packets[0]"),
        ({**AUTHORITY, "padding": {"bits": 5}}, "padding"),
        ({**AUTHORITY, "padding": {"bits": 5, "hex": "0G"}}, "padding"),
    ],
)
def test_trees_that_are_none(tree: dict[str, Any], path: str) -> None:
    assert path in errors_of(tree)


def test_a_condition_on_a_wrong_value_is_not_judged() -> None:
    """One mistake gives one error, not a trail of missing and superfluous fields."""
    found = errors_of(authority(Q_OVERLAP="perhaps"))
    assert list(found) == ["packets[0].Q_OVERLAP"]


def test_unknown_packets_are_authored_as_content() -> None:
    tree = authority()
    content = {"NID_PACKET": 201, "Q_DIR": 1, "content": {"bits": 4, "hex": "A0"}}
    tree["packets"].append(content)
    assert codes_of(tree)["packets"][1] == content
    assert fishplate.decode(fishplate.encode(tree), strict=False).packets[1] == {
        **content,
        "L_PACKET": 8 + 2 + 13 + 4,
    }


def test_models_are_built_once() -> None:
    assert packet_model(15) is packet_model(15)


@pytest.mark.parametrize(
    ("tree", "path", "said"),
    [
        ({**AUTHORITY, "medum": "radio"}, "medum", "did you mean medium?"),
        ({"medium": "euroloop", "header": {"Q_UPDOWN": 1}}, "medium", "balise, loop or radio"),
        (authority(L_ENDSECTION="1,2 km"), "packets[0].L_ENDSECTION", "with a point"),
    ],
)
def test_mistakes_are_explained(tree: dict[str, Any], path: str, said: str) -> None:
    assert said in errors_of(tree)[path]


def test_a_form_that_a_packet_does_not_come_in() -> None:
    """Packet 45 of 2.2 comes as in 2.1 or as in 3.0 (SUBSET-026 issue 4.0.0, 7.4.2.11.1)."""
    packet = {"NID_PACKET": 45, "Q_DIR": "nominal", "Q_NETWORKTYPE": "FRMCS", "form": "2.0"}
    header = {"NID_MESSAGE": 24, "T_TRAIN": 1, "M_ACK": 0, "NID_LRBG": 0}
    found = errors_of({"version": "2.2", "header": header, "packets": [packet]})
    assert list(found) == ["packets[0]"]
    assert "does not come in the form of '2.0'; expected 2.2 or 3.0" in found["packets[0]"]
    packet = {"NID_PACKET": 45, "Q_DIR": "nominal", "Q_NETWORKTYPE": 9}
    found = errors_of({"version": "2.2", "header": header, "packets": [packet]})
    assert list(found) == ["packets[0].Q_NETWORKTYPE"]


def test_a_variable_of_another_version_is_named_with_it() -> None:
    """Q_INTEGRITY stands in place of Q_LENGTH in issue 4.0.0 (SUBSET-026 7.5.1.112)."""
    packet = {"NID_PACKET": 0, "Q_SCALE": "1 m", "Q_INTEGRITY": 0}
    header = {"NID_MESSAGE": 136, "T_TRAIN": 1, "NID_ENGINE": 9091}
    found = errors_of({"header": header, "packets": [packet]})
    said = found["packets[0].Q_INTEGRITY"]
    assert said == ("not part of this layout; Q_INTEGRITY is of 3.0, the tree is read as 2.1")
