"""`fishplate about`: what it finds, and what it says of it.

Facts that are asserted come from SUBSET-026 issue 3.6.0, by the clauses named beside them.
"""

from __future__ import annotations

import json
from typing import TYPE_CHECKING, Any

import pytest

from fishplate.standard import registry
from fishplate_cli.about import as_json
from fishplate_cli.describe import Description
from fishplate_cli.lookup import look_up

if TYPE_CHECKING:
    from collections.abc import Callable


@pytest.mark.parametrize(
    ("words", "titles"),
    [
        (["V_EMA"], ["V_EMA:"]),
        (["v_ema"], ["V_EMA:"]),
        (["V_LOA"], ["V_EMA:"]),  # its name up to issue 2.3.0
        (["packet", "15"], ["packet 15 to-train,"]),
        (["15"], ["packet 15 to-train,", "message 15 to-train,"]),
        (["44", "to-track"], ["packet 44 to-track,"]),
        (["packet 44"], ["packet 44 to-train,", "packet 44 to-track,"]),
        (["gradient", "profile"], ["packet 21 to-train,"]),
        (["message", "3"], ["message 3 to-train,"]),
        (["balise"], ["header of a balise telegram"]),
        (["loop"], ["header of a loop message"]),
        (["header"], ["header of a balise telegram", "header of a loop message"]),
        (["header", "loop"], ["header of a loop message"]),
    ],
)
def test_words_find_things(
    fishplate: Callable[..., Any], words: list[str], titles: list[str]
) -> None:
    ended = fishplate("about", *words)
    assert ended.code == 0
    heads = [part.splitlines()[0] for part in ended.out.split("\n\n")]
    assert [
        head for head, title in zip(heads, titles, strict=True) if not head.startswith(title)
    ] == []


def test_a_variable_is_described(fishplate: Callable[..., Any]) -> None:
    out = fishplate("about", "V_EMA").out
    # 7.5.1.157: 7 bits, 5 km/h a step, 121 to 127 spare; packets 12 and 15 (7.4.2.3, 7.4.2.4).
    for said in ("7.5.1.157", "7 bits", "5 km/h", "121 to 127  spare", "packet 12 ", "packet 15 "):
        assert said in out


def test_steps_and_single_bits_read_well(fishplate: Callable[..., Any]) -> None:
    # 7.5.1.45: the step is that of Q_SCALE (7.5.1.129); 7.5.1.142: one bit.
    out = fishplate("about", "L_ENDSECTION").out
    assert "step        0.1, 1 or 10 m, as the governing Q_SCALE says\n" in out
    assert "coding      1 bit, unsigned\n" in fishplate("about", "Q_UPDOWN").out


def test_a_packet_is_described(fishplate: Callable[..., Any]) -> None:
    out = fishplate("about", "packet", "15").out
    for said in ("7.4.2.4", "RBC", "when Q_OVERLAP = 1:", "sections, N_ITER times:"):
        assert said in out
    carried = out[out.index("carried by") :]
    # 8.7.2, 8.7.5 and 8.7.13: messages 3, 9 and 33.
    assert [line.split()[1] for line in carried.splitlines()[1:]] == ["3", "9", "33"]


def test_everything_declared_can_be_asked_about() -> None:
    book = registry("2.1")
    words = [[name] for name in book.variables]
    words += [["packet", str(number), way] for way, number in book.packets]
    words += [["message", str(number), way] for way, number in book.messages]
    for each in words:
        (found,) = look_up(book, each)
        lines = list(Description(book, 80).lines(found))
        assert max(map(len, lines)) <= 80, each
        assert json.loads(json.dumps(as_json(book, found)))["clause"]


@pytest.mark.parametrize(
    ("words", "said"),
    [
        (["V_EMB"], "V_EMA"),
        (["packet", "999"], "nothing is called"),
        (["gradeint", "profile"], "Gradient Profile"),
        ([""], "nothing is called"),
        (["--as", "json"], "say what to look up"),
        (["V_EMA", "--schema"], "no schema of its own"),
        (["44", "--schema"], "more than one thing"),
        (["V_EMA", "--version", "9.9"], "no registry"),
    ],
)
def test_what_is_not_there_is_wrong_usage(
    fishplate: Callable[..., Any], words: list[str], said: str
) -> None:
    ended = fishplate("about", *words)
    assert ended.code == 2
    assert said in " ".join(ended.err.split())


@pytest.mark.parametrize("words", [[], ["packet", "15"], ["message", "3"], ["balise"], ["loop"]])
def test_schema_is_json_schema(fishplate: Callable[..., Any], words: list[str]) -> None:
    ended = fishplate("about", "--schema", *words)
    assert ended.code == 0
    schema = json.loads(ended.out)
    assert schema["$schema"] == "https://json-schema.org/draft/2020-12/schema"
