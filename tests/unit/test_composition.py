"""Composing one issue from another: what a revision may say, what comes first, what is refused.

The issues here are invented: small ones beside these tests, and changes of declared ones.
"""

from __future__ import annotations

import dataclasses
from types import MappingProxyType
from typing import TYPE_CHECKING, Any

import pytest

from fishplate.errors import RegistryError
from fishplate.standard.build import build
from fishplate.standard.compose import composed
from fishplate.standard.vocabulary import (
    Codes,
    Declarations,
    Eq,
    Evidence,
    Field,
    Group,
    Header,
    In,
    Ne,
    Opaque,
    OtherForm,
    Packet,
    Repeat,
    Required,
    Revision,
    Series,
    Text,
    When,
)
from unit.invented import BASE, HEAD, message, packet, unsigned, with_codes, with_packet

if TYPE_CHECKING:
    from collections.abc import Mapping

    from fishplate.standard.vocabulary import RadioMessage, Variable


def revised(*revisions: Revision, base: Declarations = BASE, **more: Any) -> Declarations:
    names: dict[str, Any] = {
        "layouts": "later",
        "version": "9.1",
        "issue": "2",
        "date": "02/01/2031",
    }
    return composed(base, *revisions, **names, **more)


def variable_of(declared: Declarations, name: str) -> Variable:
    (found,) = (each for each in declared.variables if each.name == name)
    return found


def packet_of(declared: Declarations, number: int) -> Packet:
    (found,) = (each for each in declared.packets if each.number == number)
    return found


def message_of(declared: Declarations, number: int) -> RadioMessage:
    (found,) = (each for each in declared.messages if each.number == number)
    return found


def test_without_a_revision_all_stays() -> None:
    later = revised()
    assert (later.layouts, later.version, later.issue) == ("later", "9.1", "2")
    assert later.date == "02/01/2031"
    assert set(later.variables) == set(BASE.variables)
    assert set(later.packets) == set(BASE.packets)
    assert set(later.messages) == set(BASE.messages)
    assert later.headers == BASE.headers
    build(later)


def test_a_composed_issue_names_what_it_is_made_of() -> None:
    later = revised()
    assert later.bases == ("invented",)
    beside = dataclasses.replace(BASE, layouts="beside", bases=("older", "invented"))
    latest = revised(base=later, beside=(beside,))
    assert latest.bases == ("invented", "later", "older", "beside"), "each once, as they are met"


def test_evidence_and_forms_stay_behind() -> None:
    base = dataclasses.replace(
        BASE,
        evidence=(Evidence("weaker", "torn page"),),
        forms=(OtherForm("to-train", 1, "9.2"),),
    )
    assert (revised(base=base).evidence, revised(base=base).forms) == ((), ())


# --- renamed ------------------------------------------------------------------------------------

# One layout with the variable Q_FLAG in every place a name may stand.
EVERYWHERE = (
    Field("Q_FLAG"),
    Field("Q_FLAG", key="Q_AGAIN"),
    Group("start", (Field("Q_FLAG"),)),
    Series("steps", (Field("Q_FLAG"),)),
    Repeat("more", (Field("Q_FLAG"), When(Eq("Q_FLAG", 1), (Field("T_WAIT"),)))),
    When(Ne("Q_FLAG", 0), (Field("Q_FLAG", key="Q_THIRD"),)),
    When(In("Q_FLAG", (1,)), (Field("D_SHIFT"),)),
    When(Eq("Q_FLAG", 1), (Opaque("data"),)),
)


def test_a_renamed_variable_has_its_new_name_wherever_it_stands() -> None:
    later = revised(Revision(renamed={"Q_FLAG": "Q_SIGN"}), base=with_packet(*EVERYWHERE))
    assert packet_of(later, 9).nodes == (
        *HEAD,
        Field("Q_SIGN"),
        Field("Q_SIGN", key="Q_AGAIN"),
        Group("start", (Field("Q_SIGN"),)),
        Series("steps", (Field("Q_SIGN"),)),
        Repeat("more", (Field("Q_SIGN"), When(Eq("Q_SIGN", 1), (Field("T_WAIT"),)))),
        When(Ne("Q_SIGN", 0), (Field("Q_SIGN", key="Q_THIRD"),)),
        When(In("Q_SIGN", (1,)), (Field("D_SHIFT"),)),
        When(Eq("Q_SIGN", 1), (Opaque("data"),)),
    )
    build(later)


def test_texts_messages_and_headers_are_renamed_too() -> None:
    names = {"L_TEXT": "L_LETTERS", "X_TEXT": "X_LETTER", "D_SHIFT": "D_MOVE", "N_X": "N_Y"}
    later = revised(Revision(renamed=names))
    assert packet_of(later, 3).nodes == (*HEAD, Text("L_LETTERS", "X_LETTER"))
    assert message_of(later, 8).nodes[-1] == Field("D_MOVE")
    header: Header = later.headers[0]
    assert header.nodes[-1] == Field("N_Y")
    build(later)


def test_a_renamed_variable_keeps_its_lineage_and_all_else() -> None:
    later = revised(Revision(renamed={"T_WAIT": "T_PAUSE"}))
    before, after = variable_of(BASE, "T_WAIT"), variable_of(later, "T_PAUSE")
    assert after == dataclasses.replace(before, name="T_PAUSE", lineage="T_WAIT")
    assert build(later).of_lineage("T_WAIT") is after
    assert "T_WAIT" not in build(later).variables
    assert variable_of(BASE, "T_WAIT") is before, "the issue beside it is untouched"


def test_a_former_name_that_is_taken_up_again_is_no_former_one() -> None:
    named = unsigned("T_WAIT", 10, formerly=("T_PAUSE", "T_REST"))
    base = dataclasses.replace(
        BASE, variables=tuple(named if v.name == "T_WAIT" else v for v in BASE.variables)
    )
    later = revised(Revision(renamed={"T_WAIT": "T_PAUSE"}), base=base)
    assert variable_of(later, "T_PAUSE").formerly == ("T_REST",)


def test_a_name_that_another_variable_has_is_refused() -> None:
    """Two variables of one name would be one too few."""
    with pytest.raises(RegistryError):
        build(revised(Revision(renamed={"T_WAIT": "D_SHIFT"})))


# --- recoded ------------------------------------------------------------------------------------

OLD = (Codes(0, 0, "value", "zero"), Codes(1, 2, "value", "few"), Codes(3, 3, "spare", "spare"))
RECODED: Mapping[str, tuple[tuple[Codes, ...], tuple[Codes, ...]]] = MappingProxyType(
    {
        "in place of the same code": (
            (Codes(0, 0, "value", "none"),),
            (Codes(0, 0, "value", "none"), *OLD[1:]),
        ),
        "in place of a range it falls into": (
            (Codes(1, 1, "value", "one"),),
            (OLD[0], Codes(1, 1, "value", "one"), OLD[2]),
        ),
        "in place of all it reaches": (
            (Codes(0, 1, "value", "low"),),
            (Codes(0, 1, "value", "low"), OLD[2]),
        ),
        "two at once, in order of codes": (
            (Codes(3, 3, "value", "three"), Codes(0, 0, "value", "none")),
            (Codes(0, 0, "value", "none"), OLD[1], Codes(3, 3, "value", "three")),
        ),
        "all of them": ((Codes(0, 3, "spare", "spare"),), (Codes(0, 3, "spare", "spare"),)),
    }
)


@pytest.mark.parametrize("case", RECODED)
def test_new_codes_stand_in_place_of_those_they_overlap(case: str) -> None:
    new, expected = RECODED[case]
    later = revised(Revision(recoded={"Q_SCALE": new}), base=with_codes(*OLD))
    assert variable_of(later, "Q_SCALE").codes == expected
    build(later)


def test_codes_are_given_under_the_new_name() -> None:
    on = (Codes(1, 1, "value", "lit"),)
    later = revised(Revision(renamed={"Q_FLAG": "Q_SIGN"}, recoded={"Q_SIGN": on}))
    assert variable_of(later, "Q_SIGN").codes == (Codes(0, 0, "value", "off"), *on)


# --- declared whole, amended, left out ----------------------------------------------------------


def test_what_is_declared_whole_replaces_or_is_added() -> None:
    wide = unsigned("T_WAIT", 12, unit="s", resolution="1")
    fresh = unsigned("M_FRESH", 3)
    later = revised(
        Revision(
            variables=(wide, fresh),
            packets=(packet(2, Field("M_FRESH")), packet(7, Field("T_WAIT"))),
            messages=(message(8, Field("M_FRESH")), message(9)),
        )
    )
    assert variable_of(later, "T_WAIT") == wide
    assert variable_of(later, "M_FRESH") == fresh
    assert packet_of(later, 2).nodes == (*HEAD, Field("M_FRESH"))
    assert [each.number for each in later.packets] == [1, 2, 3, 7, 255]
    assert [each.number for each in later.messages] == [7, 8, 9]
    build(later)


def test_a_packet_of_the_other_direction_is_another_packet() -> None:
    back = Packet(2, "to-track", "0.0", "back", ("RBC",), (HEAD[0], HEAD[2], Field("Q_FLAG")))
    later = build(revised(Revision(packets=(back,))))
    assert later.packets["to-track", 2] == back
    assert later.packets["to-train", 2] in BASE.packets


def test_single_attributes_are_amended() -> None:
    later = revised(
        Revision(
            amended_variables={"T_WAIT": {"bits": 11, "title": "pause"}},
            amended_packets={("to-train", 1): {"name": "renamed", "since": "9.1"}},
            amended_messages={("to-train", 7): {"required": Required()}},
        )
    )
    before = variable_of(BASE, "T_WAIT")
    assert variable_of(later, "T_WAIT") == dataclasses.replace(before, bits=11, title="pause")
    assert packet_of(later, 1) == dataclasses.replace(
        packet_of(BASE, 1), name="renamed", since="9.1"
    )
    assert message_of(later, 7) == dataclasses.replace(message_of(BASE, 7), required=Required())


def test_what_is_left_out_is_gone() -> None:
    later = revised(
        Revision(
            without_variables=("D_SHIFT",),
            without_packets=(("to-train", 3),),
            without_messages=(("to-train", 8),),
            amended_messages={("to-train", 7): {"optional": ()}},
        )
    )
    book = build(later)
    assert "D_SHIFT" not in book.variables
    assert ("to-train", 3) not in book.packets
    assert set(book.messages) == {("to-train", 7)}


NOT_THERE = {
    "variable amended": Revision(amended_variables={"T_NONE": {"bits": 3}}),
    "variable amended under its old name": Revision(
        renamed={"T_WAIT": "T_PAUSE"}, amended_variables={"T_WAIT": {"bits": 3}}
    ),
    "packet amended": Revision(amended_packets={("to-train", 77): {"name": "x"}}),
    "packet of the other direction amended": Revision(
        amended_packets={("to-track", 1): {"name": "x"}}
    ),
    "message amended": Revision(amended_messages={("to-train", 77): {"name": "x"}}),
    "variable left out": Revision(without_variables=("T_NONE",)),
    "packet left out": Revision(without_packets=(("to-track", 1),)),
    "message left out": Revision(without_messages=(("to-train", 9),)),
    "left out and amended": Revision(
        without_packets=(("to-train", 1),), amended_packets={("to-train", 1): {"name": "x"}}
    ),
}


@pytest.mark.parametrize("case", NOT_THERE)
def test_what_is_not_there_is_neither_amended_nor_left_out(case: str) -> None:
    with pytest.raises(RegistryError, match=r"is (amended|left out), but not there"):
        revised(NOT_THERE[case])


def test_a_revision_of_what_is_not_there_by_renaming_or_recoding_is_refused() -> None:
    """A misspelt name would be passed over in silence."""
    for wrong in (
        Revision(renamed={"T_WAlT": "T_PAUSE"}),
        Revision(recoded={"Q_FlAG": (Codes(0, 0, "value", "off"),)}),
    ):
        with pytest.raises(RegistryError):
            build(revised(wrong))


def test_left_out_but_still_in_use_is_found_when_the_registry_is_built() -> None:
    with pytest.raises(RegistryError, match="unknown variable T_WAIT"):
        build(revised(Revision(without_variables=("T_WAIT",))))
    with pytest.raises(RegistryError, match="carries packet 3, which is not declared"):
        build(revised(Revision(without_packets=(("to-train", 3),))))


# --- precedence ---------------------------------------------------------------------------------


def test_the_last_revision_wins() -> None:
    first = Revision(
        variables=(unsigned("T_WAIT", 12),),
        packets=(packet(2, Field("T_WAIT")),),
        recoded={"Q_FLAG": (Codes(1, 1, "value", "lit"),)},
        amended_messages={("to-train", 8): {"name": "first", "clause": "1.1"}},
    )
    second = Revision(
        variables=(unsigned("T_WAIT", 13),),
        packets=(packet(2, Field("D_SHIFT")),),
        recoded={"Q_FLAG": (Codes(1, 1, "value", "dark"),)},
        amended_messages={("to-train", 8): {"name": "second"}},
    )
    later = revised(first, second)
    assert variable_of(later, "T_WAIT").bits == 13
    assert packet_of(later, 2).nodes[-1] == Field("D_SHIFT")
    assert variable_of(later, "Q_FLAG").codes[1].label == "dark"
    assert (message_of(later, 8).name, message_of(later, 8).clause) == ("second", "1.1")
    other = revised(second, first)
    assert variable_of(other, "T_WAIT").bits == 12
    assert packet_of(other, 2).nodes[-1] == Field("T_WAIT")
    assert message_of(other, 8).name == "first"


def test_what_is_amended_comes_before_what_is_declared_whole() -> None:
    later = revised(
        Revision(
            variables=(unsigned("T_WAIT", 12),),
            amended_variables={"T_WAIT": {"title": "pause"}},
        )
    )
    assert (variable_of(later, "T_WAIT").bits, variable_of(later, "T_WAIT").title) == (12, "pause")


def test_a_later_revision_speaks_of_the_names_of_the_earlier_one() -> None:
    first = Revision(renamed={"T_WAIT": "T_PAUSE"})
    later = revised(first, Revision(renamed={"T_PAUSE": "T_REST"}))
    assert variable_of(later, "T_REST").lineage == "T_WAIT"
    with pytest.raises(RegistryError, match="T_WAIT is amended, but not there"):
        revised(first, Revision(amended_variables={"T_WAIT": {"bits": 1}}))


# --- what is said of declarations ---------------------------------------------------------------


@pytest.mark.parametrize(
    "subject",
    [
        ("packet", "to-train", 77),
        ("packet", "to-track", 1),
        ("message", "to-train", 1),
        ("variable", "T_WAlT"),
        ("variable", "to-train", 1),
        ("header", "balise"),
    ],
)
def test_evidence_on_what_nobody_declared_is_refused(subject: tuple[str | int, ...]) -> None:
    evidence = (Evidence("memory", "invented", subject),)
    what = " ".join(map(str, subject))
    with pytest.raises(RegistryError, match=f"evidence on {what}, which is not declared"):
        build(dataclasses.replace(BASE, evidence=evidence))


@pytest.mark.parametrize(
    "subject",
    [(), ("packet", "to-train", 1), ("message", "to-train", 7), ("variable", "T_WAIT")],
)
def test_evidence_is_found_in_the_registry(subject: tuple[str | int, ...]) -> None:
    evidence = Evidence("memory", "invented", subject)
    book = build(dataclasses.replace(BASE, evidence=(evidence,)))
    assert book.evidence == book.evidence_of(*subject) == (evidence,)
    assert book.evidence_of("packet", "to-train", 2) == ()


@pytest.mark.parametrize("key", [("to-track", 1), ("to-train", 77)])
def test_another_form_of_what_nobody_declared_is_refused(key: tuple[Any, int]) -> None:
    forms = (OtherForm(*key, "9.1"),)
    with pytest.raises(RegistryError, match=f"other form of packet {key[1]}, which is not"):
        build(dataclasses.replace(BASE, forms=forms))
