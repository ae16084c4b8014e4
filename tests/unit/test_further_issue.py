"""A further issue of the standard takes declarations only.

The invented issue of ``further/v9_9_9.py`` is put where an issue would stand: its declarations
among the others, one row in EDITIONS, its generated module beside the others. No line of code
changes; all bits below are put together by hand from that declaration.
"""

from __future__ import annotations

import importlib
import json
import pkgutil
import sys
from pathlib import Path
from typing import TYPE_CHECKING, Any

import jsonschema
import pytest
from typer.testing import CliRunner

import fishplate
import fishplate.engine.generated
import fishplate.standard
import fishplate_cli
from fishplate.engine import generate
from fishplate.models import json_schema, message_model, packet_model
from fishplate.standard.editions import EDITIONS, Edition
from fishplate_cli.app import app
from unit.wire import END, balise, decode, field, general, loop, packet, radio, rows

if TYPE_CHECKING:
    from collections.abc import Iterator

ROW = Edition("5.0", "9.9.9", "v9_9_9")
HERE = Path(__file__).parent


def every_module() -> list[Any]:
    """All modules of library and command line, loaded: so that none is missed below."""
    for package in (fishplate, fishplate_cli):
        for each in pkgutil.walk_packages(package.__path__, f"{package.__name__}."):
            if not each.name.endswith("__main__"):
                importlib.import_module(each.name)
    return [
        module
        for name, module in sorted(sys.modules.items())
        if name.partition(".")[0] in ("fishplate", "fishplate_cli")
    ]


def forget(modules: list[Any]) -> None:
    """Empty every cache, as a new process would find it."""
    for module in modules:
        for value in list(vars(module).values()):
            if hasattr(value, "cache_clear"):
                value.cache_clear()


@pytest.fixture(scope="module", autouse=True)
def sources(tmp_path_factory: pytest.TempPathFactory) -> Iterator[dict[str, str]]:
    """Put the issue in its place; give the sources of all generated modules there are then."""
    folder = tmp_path_factory.mktemp("generated")
    modules = every_module()
    with pytest.MonkeyPatch.context() as patch:
        patch.setattr(
            fishplate.standard, "__path__", [*fishplate.standard.__path__, str(HERE / "further")]
        )
        patch.setattr(
            fishplate.engine.generated,
            "__path__",
            [*fishplate.engine.generated.__path__, str(folder)],
        )
        for module in modules:
            if "EDITIONS" in vars(module):
                patch.setattr(module, "EDITIONS", (*EDITIONS, ROW))
        forget(modules)
        written = {each.name: each.source() for each in generate.modules()}
        (folder / "v9_9_9.py").write_text(written["v9_9_9"], encoding="utf-8")
        importlib.invalidate_caches()
        yield written
    for place in (fishplate.standard, fishplate.engine.generated):
        sys.modules.pop(f"{place.__name__}.v9_9_9", None)
        vars(place).pop("v9_9_9", None)
    forget(modules)


# Packet 190: Q_SCALE 2, V_END 7 (5 km/h a step), N_ITER 5, D_STATIC 15 and M_LANTERN 3.
LANTERNS = packet(
    190,
    field(1, 2) + field(24, 7) + field(2, 5) + field(300, 15) + "001" + field(900, 15) + "111",
)
LANTERNS_TREE = {
    "NID_PACKET": 190,
    "Q_DIR": 1,
    "L_PACKET": 73,
    "Q_SCALE": 1,
    "V_END": 24,
    "lanterns": [{"D_STATIC": 300, "M_LANTERN": 1}, {"D_STATIC": 900, "M_LANTERN": 7}],
}
# Packet 66, changed: NID_TSR 8, Q_FRONT 1, M_LANTERN 3.
REVOKED = packet(66, field(9, 8) + "1" + "000")
REVOKED_TREE = {
    "NID_PACKET": 66,
    "Q_DIR": 1,
    "L_PACKET": 35,
    "NID_TSR": 9,
    "Q_FRONT": 1,
    "M_LANTERN": 0,
}
# Packet 12 holds the renamed variable: Q_SCALE 2, V_MAIN 7, V_END 7, T_EMA 10, N_ITER 5,
# L_ENDSECTION 15, Q_SECTIONTIMER, Q_ENDTIMER, Q_DANGERPOINT, Q_OVERLAP 1 each (7.4.2.3).
SPEEDS = field(20, 7) + field(30, 7)
AUTHORITY = packet(
    12, field(1, 2) + SPEEDS + field(1023, 10) + field(0, 5) + field(800, 15) + "0000"
)
NEW = (LANTERNS, REVOKED, AUTHORITY)


@pytest.mark.parametrize(
    ("text", "medium", "version_from", "given"),
    [
        (balise(*NEW, END, version=80), "balise", "frame", {}),
        (loop(*NEW, END, version=80), "loop", "frame", {}),
        (general(*NEW), "radio", "caller", {"version": "5.0"}),
        (general(*NEW), "radio", "inferred", {}),
        (general(*NEW), "radio", "inferred", {"medium": "radio"}),
    ],
)
def test_it_is_read_and_written(
    text: str, medium: str, version_from: str, given: dict[str, str]
) -> None:
    message = decode(text, **given)
    assert (message.medium, message.version, message.issue) == (medium, "5.0", "9.9.9")
    assert message.version_from == version_from
    assert message.packets[:2] == [LANTERNS_TREE, REVOKED_TREE]
    assert message.packets[2]["V_END"] == 30
    assert not message.problems
    assert fishplate.encode(message).bin == fishplate.encode(message.tree()).bin == text
    assert (message.fitting == ("5.0",)) is (version_from == "inferred")


def test_it_is_walked_with_its_meanings() -> None:
    text = balise(*NEW, END, version=80)
    found = list(rows(text))
    assert sum(each.width for each in found) == len(text)
    meanings = {each.path: each.meaning for each in found}
    assert meanings["packets", 0, "lanterns", 0, "M_LANTERN"] == "amber"
    assert meanings["packets", 0, "lanterns", 1, "M_LANTERN"] == "unknown"
    assert meanings["packets", 0, "lanterns", 1, "D_STATIC"] == "900 m"
    assert meanings["packets", 0, "V_END"] == "120 km/h"
    assert meanings["packets", 1, "M_LANTERN"] == "dark"
    assert meanings["packets", 2, "V_END"] == "150 km/h"
    assert meanings["header", "M_VERSION"] == "5.0"


AUTHORED = {
    "NID_PACKET": 190,
    "Q_DIR": "nominal",
    "Q_SCALE": "1 m",
    "V_END": "120 km/h",
    "lanterns": [
        {"D_STATIC": "300 m", "M_LANTERN": "amber"},
        {"D_STATIC": "900 m", "M_LANTERN": "unknown"},
    ],
}


def test_it_is_authored_with_meanings() -> None:
    header = {"NID_MESSAGE": 24, "T_TRAIN": 5, "M_ACK": 0, "NID_LRBG": 9}
    tree = {"version": "5.0", "header": header, "packets": [AUTHORED]}
    assert fishplate.encode(tree).bin == general(LANTERNS)
    with pytest.raises(fishplate.EncodeError) as caught:
        fishplate.encode({**tree, "packets": [{**AUTHORED, "V_END": "3 km/h"}]})
    assert caught.value.path == ("packets", 0, "V_END")
    with pytest.raises(fishplate.EncodeError):
        fishplate.encode({**tree, "version": "2.1"})
    model = packet_model(190, version="5.0")
    codes = model.model_validate(AUTHORED).tree()
    assert codes == {key: LANTERNS_TREE[key] for key in LANTERNS_TREE if key != "L_PACKET"}


def test_it_has_a_schema() -> None:
    schema = json_schema("packet", "to-train", 190, version="5.0")
    jsonschema.Draft202012Validator.check_schema(schema)
    validator = jsonschema.Draft202012Validator(schema)
    for tree in (AUTHORED, LANTERNS_TREE):
        assert not list(validator.iter_errors(tree))
    assert list(validator.iter_errors({**AUTHORED, "V_EMA": "120 km/h"}))
    assert list(validator.iter_errors({**AUTHORED, "V_END": "3 furlongs"}))
    validator = jsonschema.Draft202012Validator(
        json_schema("packet", "to-train", 66, version="5.0")
    )
    assert validator.is_valid({"NID_PACKET": 66, "Q_DIR": 1, "NID_TSR": 9, "Q_FRONT": 0})
    assert not validator.is_valid({"NID_PACKET": 66, "Q_DIR": 1, "NID_TSR": 9, "Q_FRONT": 1})
    text = json.dumps(json_schema("message", "to-train", 24, version="5.0"))
    assert "M_LANTERN" in text
    assert "V_EMA" not in text
    assert "M_LANTERN" not in json.dumps(json_schema("message", "to-train", 24))
    assert "packet_190" in message_model(24, version="5.0").model_json_schema()["$defs"]


def test_the_command_line_knows_it() -> None:
    def said(*arguments: str) -> str:
        done = CliRunner().invoke(app, list(arguments))
        assert done.exit_code == 0, done.output
        return done.stdout

    assert "colour of the lantern" in said("about", "M_LANTERN", "--version", "5.0")
    assert "V_END" in said("about", "V_EMA")
    out = said("decode", "0b" + balise(*NEW, END, version=80))
    for words in ("Lanterns ahead", "amber", "120 km/h", "5.0"):
        assert words in out


def test_a_capture_that_tells_the_version() -> None:
    """Message 32 (8.7.12) names it: T_TRAIN, M_ACK, NID_LRBG, M_VERSION."""
    told = radio(32, field(5, 32) + "0" + field(9, 24) + field(80, 7))
    texts = (told, general())
    frames = []
    for text in texts:
        data = int(text, 2).to_bytes(len(text) // 8, "big")
        frames.append(fishplate.Frame(data, len(text), medium="radio", direction="to-train"))
    _, (_, second) = fishplate.decode_frames(frames)
    assert (second.version, second.version_from) == ("5.0", "capture")
    assert not second.problems
    assert decode(texts[1]).version == "2.1"


def test_its_version_is_known_everywhere() -> None:
    """5.1 differs from 5.0 in Y only; what the latest issue declares not valid stays so."""
    message = decode(balise(LANTERNS, END, version=81), strict=False)
    assert [each.kind for each in message.problems] == ["newer-version"]
    assert message.packets[0] == LANTERNS_TREE
    message = decode(balise(LANTERNS, END, version=36), strict=False)
    assert [each.kind for each in message.problems] == ["unknown-version"]
    book = fishplate.registry("5.0")
    assert fishplate.registry("5.0", "9.9.9") is not None
    assert (book.layouts, book.bases) == ("v9_9_9", ("v3_6_0",))
    assert book.of_lineage("V_EMA").name == "V_END"
    with pytest.raises(fishplate.RegistryError, match=r"5\.0 \(issue 9\.9\.9\)"):
        fishplate.registry("6.0")
    with pytest.raises(ValueError, match=r"issue is one of .*9\.9\.9"):
        decode(general(), issue="9.9.8")


def test_only_what_differs_is_generated(sources: dict[str, str]) -> None:
    own = sources["v9_9_9"]
    changed = {"to_train_190", "to_train_66", "to_train_12", "to_train_15"}
    for verb in ("read", "write"):
        found = {
            line.split("(")[0].removeprefix(f"def {verb}_")
            for line in own.splitlines()
            if line.startswith(f"def {verb}_")
        }
        assert found == changed
    assert "v3_6_0.read_to_train_21," in own


def test_nothing_else_has_changed(sources: dict[str, str]) -> None:
    assert sources.keys() == {each.layouts for each in EDITIONS} | {"v9_9_9"}
    for name, source in sources.items():
        if name != "v9_9_9":
            assert source == (generate.FOLDER / f"{name}.py").read_text(encoding="utf-8")
    assert fishplate.registry().of_lineage("V_EMA").name == "V_EMA"
    assert ("to-train", 190) not in fishplate.registry("3.0").packets
    with pytest.raises(fishplate.DecodeError):
        decode(balise(LANTERNS, END), medium="balise")
    assert decode(general()).version == "2.1"
