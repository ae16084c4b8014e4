"""Models and JSON Schema: authored trees in, trees of codes out, all errors at once.

JSON Schema is checked with jsonschema, a validator that shares nothing with ours. Resolutions
and special codes: SUBSET-026 issue 3.6.0, clause 7.5.1.
"""

from __future__ import annotations

import copy
import json
import random
from pathlib import Path
from typing import Any

import jsonschema
import pytest
import yaml

import fishplate
from fishplate.errors import path_text
from fishplate.models import (
    codes_of,
    json_schema,
    loop_model,
    message_model,
    packet_model,
    telegram_model,
)
from fishplate.standard import registry
from fishplate.trees import read_yaml, split_context
from property.trees import Maker

REGISTRY = registry("2.1")
DEMO = Path(__file__).resolve().parents[2] / "fixtures" / "demo"

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


def documents() -> list[tuple[str, dict[str, Any]]]:
    found = []
    for path in sorted((DEMO / "line").glob("*.yaml")):
        trees = read_yaml(path.read_text(encoding="utf-8"))
        found += [(f"{path.stem} line {each.line}", each.tree) for each in trees]
    return found


def schema_of(tree: dict[str, Any]) -> dict[str, Any]:
    header = tree["header"]
    if tree["medium"] == "radio":
        return json_schema("message", tree["direction"], header["NID_MESSAGE"])
    return json_schema("telegram" if tree["medium"] == "balise" else "loop")


def test_the_demo_satisfies_models_and_schema() -> None:
    trees = documents()
    assert len(trees) >= 45
    validators: dict[str, jsonschema.Draft202012Validator] = {}
    for name, tree in trees:
        schema = schema_of(tree)
        validator = validators.setdefault(schema["title"], jsonschema.Draft202012Validator(schema))
        errors = [each.message for each in validator.iter_errors(tree)]
        assert not errors, (name, errors[:2])
        content, _ = split_context(tree)
        codes = codes_of(content)
        assert not list(validator.iter_errors(codes)), name
        assert codes_of(codes) == codes, name


def spoilt(tree: dict[str, Any], chance: random.Random) -> dict[str, Any]:
    """Take a key out of a packet, put one in, or make a value too large."""
    tree = copy.deepcopy(tree)
    packet = chance.choice(tree["packets"])
    keys = [key for key, value in packet.items() if isinstance(value, int)]
    keys = [key for key in keys if key not in ("NID_PACKET", "L_PACKET")]
    kind = chance.choice(["missing", "superfluous", "large"]) if keys else "superfluous"
    if kind == "missing":
        del packet[chance.choice(keys)]
    elif kind == "superfluous":
        packet["X_NONE"] = 1
    else:
        packet[chance.choice(keys)] = 1 << 40
    return tree


@pytest.mark.parametrize(("direction", "number"), sorted(REGISTRY.messages))
def test_models_schema_and_encoder_agree(direction: str, number: int) -> None:
    """What models and schema accept is encoded; what they refuse is refused."""
    chance = random.Random(f"{direction} {number}")  # noqa: S311  repeatable test data
    validator = jsonschema.Draft202012Validator(json_schema("message", direction, number))
    model = message_model(number, direction)
    for _ in range(4):
        tree = Maker(chance).message(direction, number)
        codes = model.model_validate(tree).model_dump(exclude_none=True)
        assert fishplate.encode(codes) == fishplate.encode(tree)
        assert not [each.message for each in validator.iter_errors(tree)]
        if tree["packets"]:
            wrong = spoilt(tree, chance)
            with pytest.raises(fishplate.EncodeError):
                codes_of(wrong)
            assert list(validator.iter_errors(wrong))


@pytest.mark.parametrize(("direction", "number"), sorted(REGISTRY.packets))
def test_schema_of_every_packet(direction: str, number: int) -> None:
    chance = random.Random(f"{direction} {number}")  # noqa: S311  repeatable test data
    schema = json_schema("packet", direction, number)
    jsonschema.Draft202012Validator.check_schema(schema)
    validator = jsonschema.Draft202012Validator(schema)
    for _ in range(10):
        tree = Maker(chance).packet(direction, number)
        assert not [each.message for each in validator.iter_errors(tree)]
    from_model = packet_model(number, direction).model_json_schema()
    assert from_model["properties"].keys() == schema["properties"].keys()


@pytest.mark.parametrize("kind", ["telegram", "loop", "frame"])
def test_schemas_are_schemas(kind: str) -> None:
    schema = json_schema(kind)
    assert schema["$schema"] == "https://json-schema.org/draft/2020-12/schema"
    jsonschema.Draft202012Validator.check_schema(schema)
    json.dumps(schema)


def test_schema_of_any_frame_takes_the_demo() -> None:
    validator = jsonschema.Draft202012Validator(json_schema("frame"))
    for name, tree in documents()[::9]:
        assert validator.is_valid(tree), name


@pytest.mark.parametrize("model", [telegram_model(), loop_model(), message_model(3)])
def test_models_carry_the_schema(model: Any) -> None:
    schema = model.model_json_schema()
    assert "packet_21" in schema["$defs"]
    jsonschema.Draft202012Validator.check_schema(schema)


def test_schema_names_what_there_is() -> None:
    with pytest.raises(KeyError):
        json_schema("packet", "to-train", 201)
    with pytest.raises(ValueError, match="no schema"):
        json_schema("packet")


def test_models_are_built_once() -> None:
    assert packet_model(15) is packet_model(15)


def test_national_values_need_the_second_factor_for_passenger_sets_only() -> None:
    """M_NVKVINT stands twice for Q_NVKVINTSET = 1 (7.4.2.1.1): a condition on an outer scope."""
    chance = random.Random(3)  # noqa: S311  repeatable test data
    validator = jsonschema.Draft202012Validator(json_schema("packet", "to-train", 3))
    tree = Maker(chance).packet("to-train", 3)
    tree["Q_NVKINT"] = 1
    step = {"V_NVKVINT": 0, "M_NVKVINT": 45}
    sets = [{"Q_NVKVINTSET": 0, "speed_steps": [step]}]
    tree |= {"kv_sets": sets, "length_steps": [{"L_NVKRINT": 0, "M_NVKRINT": 18}], "M_NVKTINT": 22}
    model = packet_model(3)
    assert validator.is_valid(tree)
    assert model.model_validate(tree).tree()["kv_sets"] == sets
    tree["kv_sets"] = [{"Q_NVKVINTSET": 1, "A_NVP12": 10, "A_NVP23": 20, "speed_steps": [step]}]
    assert not validator.is_valid(tree)
    assert "M_NVKVINT_P23" in str(errors_in(model, tree))
    tree["kv_sets"][0]["speed_steps"] = [{**step, "M_NVKVINT_P23": 50}]
    assert validator.is_valid(tree)
    model.model_validate(tree)


def errors_in(model: Any, tree: dict[str, Any]) -> list[tuple[str | int, ...]]:
    with pytest.raises(ValueError, match="validation error") as caught:
        model.model_validate(tree)
    return [each["loc"] for each in caught.value.errors()]  # type: ignore[attr-defined]  # pydantic's


def test_the_schema_takes_the_demo_as_an_ordinary_yaml_reader_sees_it() -> None:
    """An editor takes 2.1 for a number and knows nothing of our loader."""
    validator = jsonschema.Draft202012Validator(json_schema("frame"))
    for path in sorted((DEMO / "line").glob("*.yaml")):
        tree = next(iter(yaml.safe_load_all(path.read_text(encoding="utf-8"))))
        assert validator.is_valid(tree), path.name


def test_short_forms_of_labels_are_in_the_schema() -> None:
    validator = jsonschema.Draft202012Validator(json_schema("packet", "to-train", 41))
    tree = {
        "NID_PACKET": 41,
        "Q_DIR": "nominal",
        "Q_SCALE": "1 m",
        "D_LEVELTR": "now",
        "levels": [{"M_LEVELTR": "level NTC", "NID_NTC": 3, "L_ACKLEVELTR": "100 m"}],
    }
    assert validator.is_valid(tree)
    assert packet_model(41).model_validate(tree).tree()["levels"][0]["M_LEVELTR"] == 1
    del tree["levels"][0]["NID_NTC"]
    assert not validator.is_valid(tree)


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


@pytest.mark.parametrize("version", ["1.0", "3.0"])
def test_packets_need_layouts_of_the_version_announced(version: str) -> None:
    tree = next(each for _, each in documents() if each["medium"] == "balise")
    tree, _ = split_context(tree)
    tree["header"] = {**tree["header"], "M_VERSION": version}
    with pytest.raises(fishplate.EncodeError, match=f"no layouts for system version {version}"):
        fishplate.encode(tree)
