"""The rules of translation against the tables they are declared from, both ways.

Source: SUBSET-026 issue 3.6.0, 6.6.3.2.3 and 6.6.3.3.2 (data to the train), 6.6.3.4.5 (data to the
track), with what issue 3.3.0 says otherwise in the notes, in ``fixtures/standard/x1_chapter6``:
translations.csv and translation_maps.csv.
"""

from __future__ import annotations

import re
from typing import TYPE_CHECKING, Any

import pytest

from fishplate.engine.runtime import codec
from fishplate.translation import routes, tables, to_track, to_train
from fishplate.translation.consistency import is_spare
from fishplate.translation.report import Side
from fishplate.translation.vocabulary import CodeTable, Keep, MapCodes, Renumber, Replace
from oracle import tables as published

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.translation.vocabulary import Rule, Subject

CHAPTER_6 = published.published("x1_chapter6")
LINES = CHAPTER_6.table("translations")
MAPS = CHAPTER_6.table("translation_maps")
RULES: Mapping[str, Mapping[Subject, Rule]] = {
    "down": to_train.X1_TO_X2,
    "up": to_track.X2_TO_X1,
}
OLDER: Mapping[str, Mapping[Subject, Rule]] = {
    "down": to_train.X1_TO_X2_IN_3_3_0,
    "up": to_track.X2_TO_X1_IN_3_3_0,
}
BOOKS = {"down": routes.TO_TRAIN_2_1, "up": routes.FROM_2_1}
OF_3_3_0 = "3.3.0: "
NOT_LISTED = "not listed"
NOT_SAID_BY_AN_ACTION = {"N_ITER", "NID_C", "Q_FRONT", "Q_TRACKINIT", "L_PACKET", "NC_TRAIN"}
"""Counts, conditions and places that the rules speak of; layouts hold them."""
STAYS = {"L_TRAIN", "V_MAXTRAIN", "M_AIRTIGHT", "NID_NTC"}
"""What packet 11 takes over as it is."""


def subject(line: Mapping[str, str]) -> Any:
    return line["kind"], int(line["number"])


def test_rules_are_those_of_the_table() -> None:
    listed = {(line["direction"], *subject(line)): line["action"] for line in LINES}
    declared = {
        (way, *key): rule.says for way, rules in RULES.items() for key, rule in rules.items()
    }
    assert declared == listed
    assert len(listed) == len(LINES)


@pytest.mark.parametrize("line", LINES, ids=lambda line: f"{line['direction']}-{line['number']}")
def test_a_rule_does_what_its_line_says(line: Mapping[str, str]) -> None:
    way = line["direction"]
    rule = RULES[way][subject(line)]
    book = BOOKS[way]
    assert line["clause"] == (book.packets if line["kind"] == "packet" else book.messages)
    assert book.stated
    assert not rule.clause
    assert (rule.does == (Keep(),)) == (line["action"] == "unchanged")
    said = repr(rule.does)
    wanted = set(re.findall(r"\b[A-Z]+_[A-Z][A-Z0-9]*\b", line["rule"])) - NOT_SAID_BY_AN_ACTION
    for name in wanted - STAYS - {"NID_PACKET", "NID_RADIO", "Q_DIR"}:
        assert repr(name) in said, name


SET = re.compile(r"(\w+)\s*:=\s*(\d+)")


@pytest.mark.parametrize(
    ("way", "key", "name", "code"),
    [
        (line["direction"], subject(line), name, int(code))
        for line in LINES
        for name, code in SET.findall(line["rule"])
        if name != "N_ITER"
    ],
)
def test_codes_that_are_set(way: str, key: Any, name: str, code: int) -> None:
    for action in RULES[way][key].does:
        if name == "NID_PACKET" and isinstance(action, Renumber):
            assert action.number == code
            return
        if getattr(action, "variable", None) == name and hasattr(action, "code"):
            assert action.code == code
            return
    raise AssertionError(f"{name} is not set")


ARROW = re.compile(r"(\d+)[^,;>]*-> (\d+)")
OF_PACKETS = {
    ("down", ("packet", 68)): [(1, 0), (2, 0)],
}
"""Rules whose words name two codes at once."""


@pytest.mark.parametrize(
    ("way", "key", "arrows"),
    [
        (
            line["direction"],
            subject(line),
            OF_PACKETS.get(
                (line["direction"], subject(line)),
                [(int(first), int(last)) for first, last in ARROW.findall(line["rule"])],
            ),
        )
        for line in LINES
        if re.search(r"\d+[^,;>]*-> \d", line["rule"])
    ],
)
def test_codes_that_are_mapped(way: str, key: Any, arrows: list[tuple[int, int]]) -> None:
    found = {
        code: row.becomes[0][1]
        for action in RULES[way][key].does
        if isinstance(action, MapCodes)
        for row in action.table.rows
        for code in range(row.given[0][1], row.given[0][2] + 1)
    }
    assert found == dict(arrows)


def test_the_bit_of_deleted_track_description() -> None:
    # 6.6.3.4.5: Q_TRACKDEL is 1 if bit 8 of Q_MARQSTREASON is set.
    found = {
        code: row.becomes
        for row in tables.TRACK_DELETED.rows
        for code in range(row.given[0][1], row.given[0][2] + 1)
    }
    assert found == {code: (("Q_TRACKDEL", int(bool(code & 8))),) for code in range(32)}


def test_what_issue_3_3_0_says_otherwise() -> None:
    noted = {
        (line["direction"], *subject(line)): line["note"].removeprefix(OF_3_3_0)
        for line in LINES
        if line["note"].startswith(OF_3_3_0) and NOT_LISTED not in line["note"]
    }
    # Said of packet 2, which issue 3.3.0 has not: of its packet 3.
    noted["up", "packet", 3] = noted.pop(("up", "packet", 2))
    declared = {(way, *key): rule for way, rules in OLDER.items() for key, rule in rules.items()}
    assert declared.keys() == noted.keys()
    for key, note in noted.items():
        if note.endswith("unchanged"):
            assert declared[key].does == (Keep(),)
        else:
            assert declared[key].does != (Keep(),)


def test_packet_2_is_replaced_by_packet_3() -> None:
    (action,) = to_track.X2_TO_X1["packet", 2].does
    assert action == Replace(3, "telephone_numbers")


@pytest.mark.parametrize(
    "line", CHAPTER_6.table("codes"), ids=lambda line: f"{line['variable']}-{line['code_first']}"
)
def test_spare_codes_of_x_1_are_those_that_make_a_message_unusable(
    line: Mapping[str, str],
) -> None:
    # 3.16.1.1.1 with the codes of 6.5.1.5.26 to 6.5.1.5.35.1.
    side = Side(codec("1.1"), "to-train")
    spare = line["kind"] in {"spare", "spare_bit"}
    for code in (line["code_first"], line["code_last"]):
        assert is_spare(side, line["variable"], int(code)) == spare


def rows_of(table: CodeTable) -> set[tuple[str, str, int, int, str, int]]:
    return {
        (table.name, *row.given[0], name, code) for row in table.rows for name, code in row.becomes
    }


def test_maps_are_those_of_the_table() -> None:
    listed = {
        (
            line["table"],
            line["from_variable"],
            int(line["from_first"]),
            int(line["from_last"]),
            line["to_variable"],
            int(line["to_code"]),
        )
        for line in MAPS
    }
    assert len(listed) == len(MAPS)
    declared = set().union(
        *map(rows_of, (tables.TABLE_3, tables.TABLE_5, tables.TABLE_13, tables.TABLE_3D))
    )
    bits = tables.TABLE_3B
    ored = f"{bits.bit_set} bit (or)"
    declared |= {(bits.name, bits.variable, code, code, ored, bit) for code, bit in bits.codes}
    own = f"{bits.bit_set} bit"
    declared |= {(bits.name, own, bit, bit, ored, after) for bit, after in bits.bits}
    assert declared == listed


def test_tables_lead_somewhere_once() -> None:
    for table in (tables.TABLE_3, tables.TABLE_5, tables.TABLE_13, tables.TABLE_3D):
        codes = [code for row in table.rows for code in range(row.given[0][1], row.given[0][2] + 1)]
        assert len(codes) == len(set(codes))
