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
        ("Q_DIR: !!bool x", "tag !!bool is not taken, write the value alone (line 1"),
        ("!!map x", "tag !!map is not taken"),
        ("a: ! x", "tag ! is not taken"),
        ('{"header": {"NID_MESSAGE": 1e999}, "time": NaN}', "NaN is not a JSON number"),
        ('oops\n{"header": {"NID_MESSAGE": 39}}\n', "say --from jsonl"),
    ],
)
def test_broken_trees_are_named(fishplate: Callable[..., Any], text: str, said: str) -> None:
    ended = fishplate("encode", "-", given=text)
    assert ended.code == 3
    assert ended.err.startswith("standard input")
    assert said in ended.err


@pytest.mark.parametrize(
    ("beside", "said"),
    [
        ({"time": [1]}, "time: "),
        ({"given": 1}, "given: "),
        ({"given": {"medium": "radio"}}, "given: expected direction or version"),
        ({"given": {"direction": "up"}}, "given.direction: "),
        ({"given": {"version": "two"}}, "given.version: "),
    ],
)
def test_what_stands_beside_a_tree_is_checked(
    fishplate: Callable[..., Any], vectors: Vectors, beside: dict[str, Any], said: str
) -> None:
    ended = fishplate("encode", "--as", "capture", json.dumps(vectors["01"]["tree"] | beside))
    assert (ended.code, ended.out) == (3, "")
    assert said in ended.err


def test_a_time_that_no_number_holds_is_named(
    fishplate: Callable[..., Any], vectors: Vectors
) -> None:
    text = json.dumps(vectors["01"]["tree"] | {"time": 0})
    text = text.replace('"time": 0', '"time": 1e99999999999999999999')
    ended = fishplate("encode", "--as", "capture", text)
    assert (ended.code, ended.out) == (3, "")
    assert "time: 1e99999999999999999999 is no number that can be held" in ended.err


@pytest.mark.parametrize("first", ["oops", "# comment", '{"header": oops', "{"])
def test_a_bad_first_line_does_not_decide_the_form(
    fishplate: Callable[..., Any], vectors: Vectors, first: str
) -> None:
    trees = [vectors[number]["tree"] for number in ("01", "02")]
    wanted = [vectors[number]["hex"].replace(" ", "") for number in ("01", "02")]
    lines = "".join(json.dumps(tree) + "\n" for tree in trees)
    ended = fishplate("encode", "-", given=f"{first}\n{lines}")
    assert ended.code == 3
    assert ended.out.split() == wanted
    assert ended.err.startswith("standard input line 1: not JSON")


def test_lines_of_json_within_other_forms_do_not_mislead(
    fishplate: Callable[..., Any], vectors: Vectors
) -> None:
    line = json.dumps(vectors["01"]["tree"])
    wanted = vectors["01"]["hex"].replace(" ", "")
    header, rest = line.split(' "packets": ')
    texts = {
        f"---\n{line}\n---\n{line}\n": 2,
        f"# comment\n{line}\n": 1,
        f"[\n{line},\n{line}\n]\n": 2,
        f'{header}\n"packets":\n{rest}\n': 1,
    }
    for text, count in texts.items():
        ended = fishplate("encode", "-", given=text)
        assert (ended.code, ended.out.split()) == (0, [wanted] * count), text


def test_raw_bits_hold_only_what_can_be_split(
    fishplate: Callable[..., Any], vectors: Vectors
) -> None:
    radio, telegram = (json.dumps(vectors[number]["tree"]) for number in ("01", "02"))
    message = bytes.fromhex(vectors["01"]["hex"])
    assert fishplate("encode", "--as", "bin", radio, radio).raw == message * 2
    for order in ([telegram, radio], [radio, telegram], [telegram, telegram, radio]):
        ended = fishplate("encode", "--as", "bin", *order)
        assert (ended.code, ended.raw) == (3, message)
        said = ended.err.splitlines()
        assert len(said) == order.count(telegram)
        assert all("tree 1: not written: among several frames" in line for line in said)


def test_plain_yaml_words_stay_text(fishplate: Callable[..., Any], vectors: Vectors) -> None:
    # 0049123 without quotes is a telephone number, not an octal one (vector 11, packet 42).
    text = yaml.safe_dump(vectors["11"]["tree"]).replace("'0049123'", "0049123")
    assert "'0049123'" not in text
    ended = fishplate("encode", "--from", "yaml", "-", given=text)
    assert ended.out.strip() == vectors["11"]["hex"].replace(" ", "")


@pytest.mark.parametrize("name", ["tree.json", "tree.yaml", "tree.jsonl"])
def test_true_and_false_are_no_codes(
    fishplate: Callable[..., Any], tmp_path: Path, name: str
) -> None:
    tree = {"header": {"NID_MESSAGE": 24, "T_TRAIN": 5, "M_ACK": True, "NID_LRBG": 5}}
    path = tmp_path / name
    path.write_text(json.dumps({**tree, "packets": []}) + "\n", encoding="utf-8")
    ended = fishplate("encode", path)
    assert ended.code == 3
    assert not ended.out
    assert "header.M_ACK: true and false are no codes" in ended.err
