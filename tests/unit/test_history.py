"""What something was in each edition: the order of editions, forms, evidence.

The facts asserted are those of SUBSET-026, by the issues and clauses named beside them.
"""

from __future__ import annotations

from fishplate import registry
from fishplate.standard.history import evidence_for, history, neighbour, stages
from fishplate.standard.vocabulary import Packet, Variable

DOWN = "to-train"


def test_stages_follow_one_another() -> None:
    every = stages()
    versions = [each.versions for each in every]
    assert versions == [("1.0",), ("1.0", "1.1"), ("2.0",), ("2.1",), ("3.0",), ("2.2", "2.3")]
    issues = [each.book.issue for each in every]
    assert issues == ["2.3.0", "3.6.0", "3.3.0", "3.6.0", "4.0.0", "4.0.0"]
    nearest = [neighbour(each, every) for each in every]
    assert nearest == [None, every[0], every[0], every[2], every[3], every[3]]


def test_a_renamed_variable_has_its_forms() -> None:
    """V_LOA in 2.3.0 and 3.3.0 (7.5.1.157), V_EMA from 3.6.0 on, chapter 6 included."""
    past = history(registry("2.1").variables["V_EMA"], stages())
    old, new = past.forms
    assert [each.book.issue for each in old.stages] == ["2.3.0", "3.3.0"]
    assert isinstance(old.thing, Variable)
    assert old.thing.name == "V_LOA"
    assert [each.versions[0] for each in new.stages] == ["1.0", "2.1", "3.0", "2.2"]
    assert new.difference
    assert {each.what for each in new.difference.attributes} == {"name", "title"}
    assert past.absent == ()


def test_a_renumbered_packet_is_followed_from_either_end() -> None:
    for version, number in (("2.1", 72), ("3.0", 73)):
        past = history(registry(version).packets[DOWN, number], stages())
        numbers = {
            stage.versions: form.thing.number
            for form in past.forms
            for stage in form.stages
            if isinstance(form.thing, Packet)
        }
        assert numbers == {
            ("1.0",): 72,
            ("1.0", "1.1"): 72,
            ("2.0",): 72,
            ("2.1",): 72,
            ("3.0",): 73,
            ("2.2", "2.3"): number,
        }
        beside = [packet.number for form in past.forms for _, packet in form.beside]
        assert beside == [145 - number]


def test_a_packet_that_only_one_stage_has() -> None:
    """203 is in X = 1 only (6.5.1.5.22)."""
    past = history(registry("1.1").packets[DOWN, 203], stages())
    (form,) = past.forms
    assert form.difference is None
    assert [each.versions for each in form.stages] == [("1.0", "1.1")]
    assert len(past.absent) == 5


def test_evidence_is_that_of_issue_thing_and_fields() -> None:
    book = registry("1.0")
    (note,) = evidence_for(book, book.packets[DOWN, 3])
    assert note.subject == ("variable", "Q_NVSRBKTRG")
    assert evidence_for(registry("2.1"), registry("2.1").packets[DOWN, 3]) == ()
    inferred = evidence_for(registry("2.2"), registry("2.2").packets[DOWN, 31])
    assert [each.kind for each in inferred] == ["inferred", "inferred"]
