"""`fishplate encode`: trees in every form, and everything that is wrong with one at once."""

from __future__ import annotations

import json
from typing import TYPE_CHECKING, Any

import pytest
import yaml

if TYPE_CHECKING:
    from collections.abc import Callable
    from pathlib import Path

Vectors = dict[str, dict[str, Any]]


def test_trees_become_the_bits_worked_by_hand(
    fishplate: Callable[..., Any], vectors: Vectors, tmp_path: Path
) -> None:
    # Source of the expected bits: the clauses of SUBSET-026 3.6.0 that each vector names.
    trees = [vector["tree"] for vector in vectors.values()]
    wanted = [vector["hex"].replace(" ", "") for vector in vectors.values()]
    texts = {
        "one.json": json.dumps(trees, indent=1),
        "many.jsonl": "".join(json.dumps(tree) + "\n\n" for tree in trees),
        "many.yaml": yaml.safe_dump_all(trees),
        "list.yml": yaml.safe_dump(trees),
    }
    for name, text in texts.items():
        (tmp_path / name).write_text(text, encoding="utf-8")
        for ended in (fishplate("encode", tmp_path / name), fishplate("encode", "-", given=text)):
            assert ended.code == 0, ended.err
            assert ended.out.split() == wanted, name


def test_forms_of_output(fishplate: Callable[..., Any], vectors: Vectors) -> None:
    vector = vectors["02"]
    tree = json.dumps(vector["tree"] | {"time": 7, "note": "n", "bits": 1, "assumed": []})
    data = bytes.fromhex(vector["hex"])
    bits = "".join(f"{byte:08b}" for byte in data)[: vector["bits"]]
    assert fishplate("encode", tree).out == f"{data.hex().upper()}\n"
    assert fishplate("encode", "--as", "bits", tree).out == f"{bits}\n"
    assert fishplate("encode", "--as", "bin", tree).raw == data
    line = fishplate("encode", "--as", "capture", tree).out
    assert list(json.loads(line).items()) == [
        ("time", 7),
        ("medium", "balise"),
        ("direction", "to-train"),
        ("data", data.hex().upper()),
        ("bits", 210),
        ("note", "n"),
    ]


def test_length_fills_with_ones(fishplate: Callable[..., Any], vectors: Vectors) -> None:
    tree = {key: value for key, value in vectors["02"]["tree"].items() if key != "filler"}
    short = fishplate("encode", "--as", "bits", json.dumps(tree)).out.strip()
    long = fishplate("encode", "--as", "bits", "--length", 830, json.dumps(tree)).out.strip()
    assert (len(short), len(long)) == (210, 830)
    assert long == short + "1" * 620
    wrong = fishplate("encode", "--length", 100, json.dumps(tree))
    assert wrong.code == 3
    assert "100 are wanted" in wrong.err


def test_lengths_are_held_to_unless_forced(fishplate: Callable[..., Any], vectors: Vectors) -> None:
    tree = json.loads(json.dumps(vectors["01"]["tree"]))
    tree["packets"][0]["L_PACKET"] = 90
    refused = fishplate("encode", json.dumps(tree))
    assert refused.code == 3
    assert "packets[0].L_PACKET: " in refused.err
    assert fishplate("encode", "--force", json.dumps(tree)).code == 0


def test_all_errors_are_named_and_the_rest_is_done(
    fishplate: Callable[..., Any], vectors: Vectors, tmp_path: Path
) -> None:
    good = json.loads(json.dumps(vectors["01"]["tree"]))
    bad = json.loads(json.dumps(good))
    bad["packets"][0]["V_EMA"] = "121 km/h"
    bad["packets"][1]["gradients"][0]["G_A"] = 999
    path = tmp_path / "trees.jsonl"
    path.write_text("".join(json.dumps(each) + "\n" for each in (good, bad, good)))
    ended = fishplate("encode", path)
    assert ended.code == 3
    assert len(ended.out.split()) == 2
    assert f"{path} line 2: packets[0].V_EMA: " in ended.err
    assert f"{path} line 2: packets[1].gradients[0].G_A: " in ended.err


@pytest.mark.parametrize(
    ("text", "said"),
    [
        ('{"header": {}, "header": {}}', "stands twice"),
        ("header: {A: 1}\nheader: {A: 2}\n", "stands twice"),
        ("[1, 2]", "tree 1: expected a tree"),
        ("a: [", "not YAML"),
        ("{", "not JSON"),
        ('{"header": {"NID_MESSAGE": 39, "T_TRAIN": 1}, "frobnicate": 1}', "frobnicate"),
        ("", "no tree in it"),
        ('{"header": {"NID_MESSAGE": 39}, "time": [1]}', "header"),
        ("a: !!python/object:os.system {}", "not YAML"),
        ("a: &a [*a]", "within itself"),
    ],
)
def test_broken_trees_are_named(fishplate: Callable[..., Any], text: str, said: str) -> None:
    ended = fishplate("encode", "-", given=text)
    assert ended.code == 3
    assert ended.err.startswith("standard input")
    assert said in ended.err


def test_plain_yaml_words_stay_text(fishplate: Callable[..., Any], vectors: Vectors) -> None:
    # 0049123 without quotes is a telephone number, not an octal one (vector 11, packet 42).
    text = yaml.safe_dump(vectors["11"]["tree"]).replace("'0049123'", "0049123")
    assert "'0049123'" not in text
    ended = fishplate("encode", "--from", "yaml", "-", given=text)
    assert ended.out.strip() == vectors["11"]["hex"].replace(" ", "")
