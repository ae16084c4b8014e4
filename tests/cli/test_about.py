"""`fishplate about`: what it finds, and what it says of it and of its past.

Facts that are asserted come from SUBSET-026, issue 3.6.0 where no other is named, by the clauses
named beside them.
"""

from __future__ import annotations

import json
from typing import TYPE_CHECKING, Any

import pytest

from fishplate.standard import registry
from fishplate.standard.comparison import compare
from fishplate.standard.history import neighbour, stages
from fishplate_cli.about import as_json
from fishplate_cli.compare import text_lines
from fishplate_cli.describe import Description
from fishplate_cli.lookup import look_up

if TYPE_CHECKING:
    from collections.abc import Callable


@pytest.mark.parametrize(
    ("words", "titles"),
    [
        (["V_EMA"], ["V_EMA:"]),
        (["v_ema"], ["V_EMA:"]),
        (["V_LOA"], ["V_EMA:"]),  # its name up to issue 3.3.0
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
    carried = carried[: carried.index("  history")]
    # 8.7.2, 8.7.5 and 8.7.13: messages 3, 9 and 33.
    assert [line.split()[1] for line in carried.splitlines()[1:]] == ["3", "9", "33"]


@pytest.mark.parametrize("version", ["2.1", "1.1", "3.0"])
def test_everything_declared_can_be_asked_about(version: str) -> None:
    book = registry(version)
    words = [[name] for name in book.variables]
    words += [["packet", str(number), way] for way, number in book.packets]
    words += [["message", str(number), way] for way, number in book.messages]
    for each in words:
        (found,) = look_up(book, each)
        lines = list(Description(book, 60).lines(found))
        assert max(map(len, lines)) <= 60, each
        data = json.loads(json.dumps(as_json(book, found)))
        assert data["clause"]
        assert data["history"]["forms"]


def past(text: str) -> str:
    return " ".join(text[text.index("  history") :].split())


def test_the_history_of_a_variable(fishplate: Callable[..., Any]) -> None:
    for word in ("V_EMA", "V_LOA"):
        said = past(fishplate("about", word).out)
        # 7.5.1.157 of 2.3.0, 3.3.0 and 3.6.0.
        assert "1.0 (issue 2.3.0), 2.0 (issue 3.3.0): is V_LOA" in said
        assert "name V_LOA → V_EMA" in said
    said = past(fishplate("about", "M_MODE").out)
    # 7.5.1.72 of 3.3.0 and 4.0.0.
    assert "code 15 spare → passive shunting" in said
    assert "3.0 (issue 4.0.0, weaker evidence), against 2.1 (issue 3.6.0): width 4 → 5 bits" in said
    assert "code 16 no such code → automatic driving" in said
    # 7.5.1.76 of 3.3.0: 20 bits before.
    assert "width 20 → 24 bits" in past(fishplate("about", "M_POSITION").out)


def test_the_history_of_packets_and_messages(fishplate: Callable[..., Any]) -> None:
    # 7.4.2.23: packet 72 becomes 73 in issue 4.0.0.
    for words in (["packet", "72"], ["packet", "73"]):
        assert "number 72 → 73" in past(fishplate("about", *words).out)
    # 8.6.3: Q_TRACKDEL up to 2.3.0 and in X = 1 (6.5.1.6), Q_MARQSTREASON from 3.3.0 on.
    said = past(fishplate("about", "message", "132").out)
    assert "gone Q_TRACKDEL (1 bit)" in said
    assert "new Q_MARQSTREASON (5 bits); behind NID_ENGINE" in said
    # 7.4.3.1 of 4.0.0.
    said = past(fishplate("about", "packet", "0", "to-track").out)
    assert "Q_INTEGRITY: named Q_LENGTH before" in said
    assert "M_MODE: 4 → 5 bits" in said
    # 7.4.2.20 and 6.5.1.5.23: 206 stands beside 68 in 1.1.
    assert "beside packet 206 in 1.1 (issue 3.6.0)" in past(fishplate("about", "packet 68").out)
    # 7.5.1.51: the same in all four issues, and chapter 6 does not mention it.
    assert "the same in every edition" in fishplate("about", "L_SECTION").out


@pytest.mark.parametrize(
    ("words", "where", "title"),
    [
        # 6.5.1.5.27, 6.5.1.5.22 of 3.6.0; 7.4.2.7.1, 7.5.1.112 of 4.0.0; 8.7.16 of 3.3.0.
        (["M_AXLELOAD"], "found in 1.0 and 1.1 (issue 3.6.0)", "M_AXLELOAD:"),
        (["packet", "203"], "found in 1.1 (issue 3.6.0)", "packet 203 to-train,"),
        (["packet", "31"], "found in 3.0 (issue 4.0.0, weaker evidence)", "packet 31 to-train,"),
        (["Q_INTEGRITY"], "found in 3.0 (issue 4.0.0, weaker evidence)", "Q_INTEGRITY:"),
        (["message", "38"], "found in 2.0 (issue 3.3.0)", "message 38 to-train,"),
    ],
)
def test_what_only_another_version_has_is_found_there(
    fishplate: Callable[..., Any], words: list[str], where: str, title: str
) -> None:
    ended = fishplate("about", *words)
    assert ended.code == 0
    note, text = ended.out.split("\n\n", 1)
    assert "is not in 2.1" in note
    assert where in " ".join(note.split())
    assert text.startswith(title)


@pytest.mark.parametrize(
    ("arguments", "title"),
    [
        # 7.5.1.157 of 2.3.0; what 3.0 calls packet 73 is 72 before (7.4.2.23).
        (["V_EMA", "--version", "1.0", "--issue", "2.3.0"], "V_LOA:"),
        (["V_EMA", "--issue", "2.3.0"], "V_LOA:"),
        (["V_LOA", "--version", "3.0"], "V_EMA:"),
        (["packet", "0", "to-track", "--issue", "4.0.0"], "packet 0 to-track, Position Report"),
        (["packet", "73", "--version", "2.0"], "packet 72 to-train,"),
        (["Q_INTEGRITY", "--version", "2.1"], "Q_LENGTH:"),
    ],
)
def test_version_and_issue_say_where_to_look(
    fishplate: Callable[..., Any], arguments: list[str], title: str
) -> None:
    ended = fishplate("about", *arguments)
    assert ended.code == 0
    assert ended.out.split("\n\n")[-1].startswith(title)


def test_what_evidence_there_is_is_said(fishplate: Callable[..., Any]) -> None:
    def said(*arguments: str) -> str:
        return " ".join(fishplate("about", *arguments).out.split())

    assert "defined in no clause of chapter 6" in said("Q_NVSRBKTRG", "--version", "1.0")
    assert "text conversion of its tables (weaker evidence)" in said("V_SM")
    inferred = said("packet", "45", "--version", "2.2")
    assert "chapter 6 of 4.0.0 was not read) (inferred)" in inferred
    assert "may also be laid out as in 3.0: L_PACKET tells which" in inferred
    assert "evidence" not in said("packet", "15")[: said("packet", "15").index("history")]
    # 6.5.1.7.1 to .4: from 1.1 on.
    assert "versions from version 1.1 on" in said("packet", "203")


def test_what_changed_between_two_editions(fishplate: Callable[..., Any]) -> None:
    ended = fishplate("about", "--between", "1.0@2.3.0", "2.0")
    assert ended.code == 0
    said = " ".join(ended.out.split())
    # 7.4.2.1.1, 7.5.1.76 and 8.7.6 of 3.3.0 against 2.3.0.
    for wanted in (
        "1.0 (issue 2.3.0) → 2.0 (issue 3.3.0)",
        "new V_NVLIMSUPERV (7 bits); behind V_NVONSIGHT",
        "field countries: N_ITER times → once, then N_ITER more",
        "M_POSITION width 20 → 24 bits",
        "message 15 to-train, Conditional Emergency Stop new D_REF (16 bits); behind Q_SCALE",
    ):
        assert wanted in said
    assert max(map(len, ended.out.splitlines())) <= 80


def test_comparisons_fit_narrow_terminals() -> None:
    every = stages()
    for stage in every:
        old = neighbour(stage, every)
        if old:
            lines = text_lines(compare(old.book, stage.book), 60)
            assert [line for line in lines if len(line) > 60] == []


def test_between_and_a_word_say_what_changed_of_it(fishplate: Callable[..., Any]) -> None:
    out = fishplate("about", "V_LOA", "--between", "2.0", "2.1").out
    assert out.splitlines()[2:5] == [
        "variables renamed (1)",
        "  V_EMA",
        "    name        V_LOA → V_EMA",
    ]
    assert "nothing differs" in fishplate("about", "D_LRBG", "--between", "2.0", "2.1").out


def test_what_changed_as_data(fishplate: Callable[..., Any]) -> None:
    """The shape that docs/how-to/compare-versions.md describes."""
    found = json.loads(fishplate("about", "--between", "2.1", "3.0", "--as", "json").out)
    assert found["before"] == {"version": "2.1", "issue": "3.6.0", "evidence": []}
    assert [each["kind"] for each in found["after"]["evidence"]] == ["weaker"]
    (text,) = [
        each
        for each in found["packets"]
        if each["state"] == "renumbered" and each["before"]["packet"] == 72
    ]
    assert text["after"]["packet"] == 73
    assert text["attributes"] == [{"what": "number", "before": 72, "after": 73}]
    (report,) = [each for each in found["messages"] if (each["after"] or {}).get("message") == 150]
    # 8.6.10 of issue 4.0.0; behind NID_ENGINE, as 8.6.10 of 3.6.0 ends its fixed variables.
    assert report["fields"] == [
        {
            "aspects": [],
            "before": None,
            "after": {
                "path": ["Q_DESK"],
                "variable": "Q_DESK",
                "bits": 1,
                "when": [],
                "repeats": "",
                "behind": ["NID_ENGINE"],
            },
        }
    ]
    (start,) = [each for each in found["messages"] if (each["after"] or {}).get("message") == 157]
    added = [each["packet"] for each in start["optional"]["new"]]
    assert added == [10, 11]  # 8.6.15 of issue 4.0.0
    (network,) = [each for each in found["packets"] if (each["after"] or {}).get("packet") == 45]
    conditions = [each["after"]["when"] for each in network["fields"] if each["aspects"]]
    assert conditions == [[{"variable": "Q_NETWORKTYPE", "one_of": [1, 2]}]]  # 7.4.2.11.1


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
        (["V_EMA", "--issue", "9.9.9"], "no registry"),
        (
            ["M_AXLELOAD", "--version", "3.0"],
            "only in 1.0 and 1.1 (issue 3.6.0), 1.0",
        ),
        (["--between", "2.0", "9.9"], "no registry"),
        (["--between", "2.0@2.3.0", "2.1"], "no registry"),
        (["--between", "x", "2.1"], "no registry"),
        (["--between", "2.0", "2.1", "--version", "2.1"], "write 1.0@2.3.0"),
        (["V_EMB", "--between", "2.0", "2.1"], "nothing is called"),
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
