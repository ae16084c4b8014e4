"""JSON Schema against the models, the demo and an independent validator.

jsonschema shares nothing with ours. Clauses: SUBSET-026 issue 3.6.0.
"""

from __future__ import annotations

import copy
import json
import random
from pathlib import Path
from typing import TYPE_CHECKING, Any

import jsonschema
import pytest
import yaml

import fishplate
from fishplate.models import (
    codes_of,
    json_schema,
    loop_model,
    message_model,
    packet_model,
    telegram_model,
)
from fishplate.standard import registry
from fishplate.standard.editions import EDITIONS
from fishplate.trees import CONTEXT, read_yaml, split_context
from property.trees import Maker

if TYPE_CHECKING:
    from fishplate.standard.editions import Edition

REGISTRY = registry("2.1")
DEMO = Path(__file__).resolve().parents[2] / "fixtures" / "demo"


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


# One version for each set of layouts beside the usual one.
OTHERS = list({each.layouts: each for each in EDITIONS if each != EDITIONS[0]}.values())


@pytest.mark.parametrize("edition", OTHERS, ids=" ".join)
def test_models_schema_and_encoder_agree_in_every_edition(edition: Edition) -> None:
    version, issue = edition[:2]
    chance = random.Random(" ".join(edition))  # noqa: S311  repeatable test data
    for direction, number in sorted(registry(version, issue).messages):
        tree = Maker(chance, edition=edition).message(direction, number)
        bits = fishplate.encode(tree)
        given: dict[str, Any] = {"medium": "radio", "direction": direction}
        given |= {"version": version, "issue": issue}
        decoded = fishplate.decode(bits, **given).tree()
        model = message_model(number, direction, version, issue)
        for each in (tree, decoded):
            codes = model.model_validate(each).model_dump(exclude_none=True)
            assert fishplate.encode(codes) == bits, number
        assert codes_of(tree)["packets"] == tree["packets"]
        if number % 4 == 0 and tree["packets"]:
            validator = jsonschema.Draft202012Validator(
                json_schema("message", direction, number, version=version, issue=issue)
            )
            assert not [each.message for each in validator.iter_errors(tree)], number
            wrong = spoilt(tree, chance)
            with pytest.raises(fishplate.EncodeError):
                codes_of(wrong)
            assert list(validator.iter_errors(wrong))


@pytest.mark.parametrize("edition", OTHERS, ids=" ".join)
def test_schema_of_every_packet_of_every_edition(edition: Edition) -> None:
    version, issue = edition[:2]
    book = registry(version, issue)
    chance = random.Random(" ".join(edition))  # noqa: S311  repeatable test data
    for direction, number in sorted(book.packets):
        schema = json_schema("packet", direction, number, version=version, issue=issue)
        jsonschema.Draft202012Validator.check_schema(schema)
        validator = jsonschema.Draft202012Validator(schema)
        maker = Maker(chance, edition=edition)
        for tree in [maker.packet(direction, number) for _ in range(6)]:
            assert not [each.message for each in validator.iter_errors(tree)], number
            # The form of a packet may be left out, not be said wrong.
            if tree.pop("form", None):
                assert validator.is_valid(tree), number
                assert not validator.is_valid({**tree, "form": "1.0"}), number


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


@pytest.mark.parametrize("version", ["0.3", "1.2", "2.4", "4.0"])
def test_packets_need_layouts_of_the_version_announced(version: str) -> None:
    tree = next(each for _, each in documents() if each["medium"] == "balise")
    tree, _ = split_context(tree)
    tree["header"] = {**tree["header"], "M_VERSION": version}
    reason = rf"system version {version}(: | is declared not valid)"
    with pytest.raises(fishplate.EncodeError, match=reason):
        fishplate.encode(tree)


def test_the_schema_knows_what_stands_beside_a_tree() -> None:
    properties = json_schema("message", "to-train", 3)["properties"]
    assert set(CONTEXT) <= set(properties)
