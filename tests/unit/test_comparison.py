"""What changed from one edition to another, against the facts of `issue_facts.py` beside this.

Both ways: what they name is found, and nothing else is. Sources are named there.
"""

from __future__ import annotations

import csv
from functools import cache
from pathlib import Path

import pytest

from fishplate import registry
from fishplate.standard.build import build
from fishplate.standard.comparison import Comparison, Difference, compare, difference
from fishplate.standard.vocabulary import (
    Codes,
    Field,
    Packet,
    RadioMessage,
    Repeat,
    Series,
    Variable,
)
from unit import invented
from unit.issue_facts import (
    ATTRIBUTES,
    CODES,
    DOWN,
    GONE_MESSAGES,
    GONE_PACKETS,
    MESSAGES,
    NEW_MESSAGES,
    NEW_PACKETS,
    RENUMBERED,
    ROWS,
    SENDERS,
    STEPS,
    UP,
    A,
    B,
    C,
    Row,
    Sent,
)

WAIT = (Field("T_WAIT"),)
FACTS = Path(__file__).resolve().parents[2] / "fixtures" / "standard"
EDITIONS = {"2.3.0": ("1.0", "2.3.0"), "3.3.0": ("2.0",), "3.6.0": ("2.1",), "4.0.0": ("3.0",)}


@cache
def compared(step: tuple[str, str]) -> Comparison:
    before, after = (registry(*EDITIONS[each]) for each in step)
    return compare(before, after)


def row_of(step: tuple[str, str], found: Difference) -> Row:
    """Say in the terms of the table what the comparison found."""
    thing = found.thing
    assert isinstance(thing, Packet)
    both = [(each.before, each.after, each.aspects) for each in found.fields]
    stayed = [(old, new, aspects) for old, new, aspects in both if old and new]
    return Row(
        step,
        thing.direction,
        thing.number,
        new=" ".join(new.variable for old, new, _ in both if new and not old),
        gone=" ".join(old.variable for old, new, _ in both if old and not new),
        named=" ".join(f"{old.variable}>{new.variable}" for old, new, a in stayed if "name" in a),
        width=" ".join(
            f"{new.variable}:{old.bits}>{new.bits}" for old, new, a in stayed if "width" in a
        ),
        other=" ".join(
            sorted(
                f"{each}:{new.variable}"
                for old, new, aspects in stayed
                for each in aspects
                if each in {"condition", "list", "place"}
            )
        ),
    )


@pytest.mark.parametrize("step", STEPS, ids="-".join)
def test_packets_differ_as_printed(step: tuple[str, str]) -> None:
    found = [each for each in compared(step).packets if each.before and each.after]
    rows = [row_of(step, each) for each in found if not each.of("number")]
    differ = [row for row in rows if any(row[3:])]
    assert differ == [row for row in ROWS if row.step == step]


@pytest.mark.parametrize("step", STEPS, ids="-".join)
def test_packets_come_go_and_are_renumbered_as_printed(step: tuple[str, str]) -> None:
    new, gone, renumbered = set(), set(), set()
    for each in compared(step).packets:
        assert isinstance(each.thing, Packet)
        key = (each.thing.direction, each.thing.number)
        number = each.of("number")
        if each.before is None:
            new.add(key)
        elif each.after is None:
            gone.add(key)
        elif number:
            # The text packets keep their rows (7.4.2.23 and 7.4.2.24 of issue 4.0.0).
            assert {a for field in each.fields for a in field.aspects} <= {"meaning"}
            renumbered.add((number.before, number.after))
    assert (new, gone, renumbered) == (NEW_PACKETS[step], GONE_PACKETS[step], RENUMBERED[step])


@pytest.mark.parametrize(
    ("step", "way", "number", "field", "behind"),
    [
        # 7.4.2.1.1, 7.4.3.5, 7.4.2.23 and 7.4.2.13 of 3.3.0; 7.4.2.11.1 of 4.0.0.
        (A, DOWN, 3, "V_NVLIMSUPERV", "V_NVONSIGHT"),
        (A, DOWN, 3, "Q_NVGUIPERM", "Q_NVEMRRLS"),
        (A, UP, 11, "NC_CDTRAIN", "L_PACKET"),
        (A, DOWN, 72, "Q_CONFTEXTDISPLAY", "Q_TEXTCONFIRM"),
        (A, DOWN, 51, "D_TRACKINIT", "Q_TRACKINIT"),
        (C, DOWN, 45, "Q_NETWORKTYPE", "L_PACKET"),
    ],
)
def test_a_new_field_says_where_it_stands(
    step: tuple[str, str], way: str, number: int, field: str, behind: str
) -> None:
    (found,) = [each for each in compared(step).packets if _key(each) == (way, number)]
    (new,) = [each.after for each in found.fields if each.after and each.after.path[-1] == field]
    assert new.behind[-1] == behind


def _key(found: Difference) -> tuple[str, int]:
    assert isinstance(found.thing, Packet | RadioMessage)
    return found.thing.direction, found.thing.number


@pytest.mark.parametrize(("step", "number", "before", "after"), SENDERS)
def test_senders_differ_as_printed(
    step: tuple[str, str], number: int, before: tuple[str, ...], after: tuple[str, ...]
) -> None:
    (found,) = [each for each in compared(step).packets if _key(each) == (DOWN, number)]
    senders = found.of("senders")
    assert senders
    assert (senders.before, senders.after) == (before, after)


def test_names_and_clauses_differ_as_printed() -> None:
    def of(step: tuple[str, str], number: int, what: str) -> tuple[object, object]:
        (found,) = [each for each in compared(step).packets if _key(each) == (DOWN, number)]
        (change,) = [each for each in found.attributes if each.what == what]
        return change.before, change.after

    assert of(B, 255, "clause") == ("7.4.4.1", "7.4.2.39")
    assert of(C, 15, "name") == ("Level 2/3 Movement Authority", "Level 2 Movement Authority")
    for number in (42, 45, 49, 63, 90, 131):
        before, after = of(C, number, "name")
        assert before != after


@pytest.mark.parametrize(("step", "name", "code", "before", "after"), CODES)
def test_codes_differ_as_printed(
    step: tuple[str, str], name: str, code: int, before: str, after: str
) -> None:
    (found,) = [each for each in compared(step).variables if _name(each) == name]
    (change,) = [each for each in found.codes if each.first <= code <= each.last]
    for meaning, said in ((change.before, before), (change.after, after)):
        if said == "-":
            assert meaning is None
        elif said == "spare":
            assert meaning is not None
            assert meaning.kind in {"spare", "spare_bit"}
        else:
            assert meaning is not None
            assert said in f"{meaning.label} "


def _name(found: Difference) -> str:
    assert isinstance(found.thing, Variable)
    return found.thing.name


@pytest.mark.parametrize(("step", "name", "what", "before", "after"), ATTRIBUTES)
def test_variables_differ_as_printed(
    step: tuple[str, str], name: str, what: str, before: object, after: object
) -> None:
    (found,) = [each for each in compared(step).variables if _name(each) == name]
    (change,) = [each for each in found.attributes if each.what == what]
    assert (change.before, change.after) == (before, after)


@pytest.mark.parametrize("step", STEPS, ids="-".join)
def test_variables_change_their_name_and_width_nowhere_else(step: tuple[str, str]) -> None:
    wanted = {(name, what) for each, name, what, *_ in ATTRIBUTES if each == step}
    found = {
        (_name(each), change.what)
        for each in compared(step).variables
        for change in each.attributes
        if change.what in {"name", "width", "coding"}
    }
    assert found == {each for each in wanted if each[1] != "range"}


@pytest.mark.parametrize("step", STEPS, ids="-".join)
def test_variables_come_and_go_as_in_the_fact_tables(step: tuple[str, str]) -> None:
    """The names are those of clause 7.5.1 in each issue, by the copied fact tables."""
    before, after = (_names(each) for each in step)
    renames = {each[3] for each in ATTRIBUTES if each[0] == step and each[2] == "name"}
    renamed = {each[4] for each in ATTRIBUTES if each[0] == step and each[2] == "name"}
    found = compared(step).variables
    assert {_name(each) for each in found if each.before is None} == after - before - renamed
    assert {_name(each) for each in found if each.after is None} == before - after - renames


def _names(issue: str) -> set[str]:
    path = FACTS / f"v{issue.replace('.', '_')}" / "variables.csv"
    with path.open(encoding="utf-8", newline="") as lines:
        return {row["variable"] for row in csv.DictReader(lines)}


def test_the_variables_that_issue_4_adds_are_known_by_name() -> None:
    """7.5.1 of issue 4.0.0; M_LINEAXLELOADCAT stands in packet 70 alone."""
    new = {_name(each) for each in compared(C).variables if each.before is None}
    consist = {
        f"L_CONSIST{end}ENGINE{bound}"
        for end in ("FRONT", "REAR")
        for bound in ("NOM", "MIN", "MAX")
    }
    others = {"M_LINEAXLELOADCAT", "Q_DESK", "Q_NETWORKTYPE", "Q_SAFECONSISTLENGTH", "V_SM"}
    assert new == consist | others


def sent_of(step: tuple[str, str], found: Difference) -> Sent:
    direction, number = _key(found)
    fields = [(each.before, each.after, each.aspects) for each in found.fields]
    required = found.of("required")
    optional = [
        {f"{each.packet}/{each.sender}".rstrip("/") for each in packets}
        for packets in (found.optional_new, found.optional_gone)
    ]
    options, dropped = (" ".join(sorted(each, key=_numerically)) for each in optional)
    return Sent(
        step,
        direction,
        number,
        new=" ".join(new.variable for old, new, _ in fields if new and not old),
        gone=" ".join(old.variable for old, new, _ in fields if old and not new),
        named=" ".join(
            f"{old.variable}>{new.variable}"
            for old, new, a in fields
            if old and new and "name" in a
        ),
        required=(_numbers(required.before), _numbers(required.after)) if required else None,
        options=options,
        dropped=dropped,
    )


def _numbers(packets: object) -> str:
    assert isinstance(packets, tuple)
    return " ".join("|".join(map(str, each)) for each in packets)


def _numerically(text: str) -> tuple[str, int]:
    number, _, sender = text.partition("/")
    return sender, int(number)


@pytest.mark.parametrize("step", STEPS, ids="-".join)
def test_messages_differ_as_printed(step: tuple[str, str]) -> None:
    found = [sent_of(step, each) for each in compared(step).messages if each.before and each.after]
    assert [each for each in found if any(each[3:])] == [
        each for each in MESSAGES if each.step == step
    ]


@pytest.mark.parametrize("step", STEPS, ids="-".join)
def test_messages_come_and_go_as_printed(step: tuple[str, str]) -> None:
    found = compared(step).messages
    assert {_key(each) for each in found if each.before is None} == NEW_MESSAGES[step]
    assert {_key(each) for each in found if each.after is None} == GONE_MESSAGES[step]


def test_message_32_was_renamed() -> None:
    (found,) = [each for each in compared(A).messages if _key(each) == (DOWN, 32)]
    name = found.of("name")
    assert name
    assert name.before == "Configuration Determination"


def test_balise_and_loop_headers_keep_their_rows() -> None:
    """50 and 33 bits in all four issues (8.4.2.1, 8.4.3.1)."""
    for step in STEPS:
        for each in compared(step).headers:
            assert not each.attributes
            assert {aspect for field in each.fields for aspect in field.aspects} == {"meaning"}


def test_version_1_1_may_use_what_1_0_may_not() -> None:
    """SUBSET-026 3.6.0, 6.5.1.7.1 to 6.5.1.7.4."""
    found = compare(registry("1.0"), registry("1.1"))
    assert (found.variables, found.headers) == ((), ())
    carried = {each.packet for message in found.messages for each in message.optional_new}
    assert carried == {203, 206, 207, 239}  # what an RBC may send of them
    assert not any(each.fields or each.optional_gone for each in found.messages)
    assert {_key(each)[1]: each.instead for each in found.packets if each.before is None} == {
        **dict.fromkeys((2, 6, 135, 145, 200, 203)),
        206: 68,
        207: 70,
        239: 39,
    }
    assert all(each.before is None for each in found.packets)


def test_the_form_of_x_2_under_a_number_of_its_own_is_found_again() -> None:
    """6.6.3.2.3 of 3.6.0: 200 becomes 0 without Q_DIR and L_PACKET; 206, 207, 239 go to 68 …."""
    found = compare(registry("1.1"), registry("2.0"))
    (marker,) = [each for each in found.packets if _key(each) == (DOWN, 0)]
    number = marker.of("number")
    assert number
    assert (number.before, number.after) == (200, 0)
    gone = [each.before for each in marker.fields if each.after is None]
    assert [each.variable for each in gone if each] == ["Q_DIR", "L_PACKET"]
    lost = {_key(each)[1]: each.instead for each in found.packets if each.after is None}
    assert lost == {203: None, 206: 68, 207: 70, 239: 39}


def test_nothing_differs_from_itself() -> None:
    found = compare(registry("3.0"), registry("3.0"))
    assert (found.variables, found.packets, found.messages, found.headers) == ((), (), (), ())


def test_a_field_that_moves_and_a_list_that_needs_no_element() -> None:
    """An invented issue: nothing here depends on what the printed ones happen to change."""
    old = build(invented.with_packet(Field("Q_FLAG"), Field("Q_UPDOWN"), Series("times", WAIT)))
    new = build(invented.with_packet(Field("Q_UPDOWN"), Field("Q_FLAG"), Repeat("times", WAIT)))
    changed = difference(old, old.packets[DOWN, 9], new, new.packets[DOWN, 9])
    assert changed
    found = {each.after.path: each.aspects for each in changed.fields if each.after}
    assert found.pop(("times",)) == ("list", "place")
    ((moved, aspects),) = found.items()
    assert moved in {("Q_FLAG",), ("Q_UPDOWN",)}
    assert aspects == ("place",)


def test_codes_that_change_alike_are_one_change() -> None:
    """A spare range that gains two meanings in its middle, in an invented issue."""
    old = build(invented.with_codes(Codes(0, 3, "spare", "spare")))
    new = build(
        invented.with_codes(
            Codes(0, 0, "spare", "spare"),
            Codes(1, 2, "value", "far"),
            Codes(3, 3, "spare", "spare"),
        )
    )
    (found,) = compare(old, new).variables
    assert [(each.first, each.last) for each in found.codes] == [(1, 2)]
