"""Registries: what may be declared, that it is frozen, and how one is found."""

from __future__ import annotations

import dataclasses
from typing import TYPE_CHECKING

import pytest

from fishplate.errors import RegistryError
from fishplate.standard.build import Registry, build, registry
from fishplate.standard.editions import EDITIONS
from fishplate.standard.vocabulary import (
    Codes,
    Declarations,
    Eq,
    Field,
    Group,
    Opaque,
    Repeat,
    When,
)
from unit.invented import (
    BASE,
    FLAG,
    HEAD,
    message,
    unsigned,
    with_packet,
    with_variable,
)

if TYPE_CHECKING:
    from collections.abc import Callable

    from fishplate.standard.editions import Edition


def test_the_base_is_right() -> None:
    built = build(BASE)
    assert set(built.packets) == {
        ("to-train", 1),
        ("to-train", 2),
        ("to-train", 3),
        ("to-train", 255),
    }


RIGHT: dict[str, Callable[[], Declarations]] = {
    "the same key in two scopes": lambda: with_packet(
        Group("start", (FLAG,)), Group("end", (FLAG,)), FLAG
    ),
    "a variable twice under two keys": lambda: with_packet(FLAG, Field("Q_FLAG", key="Q_AGAIN")),
    "a condition on an enclosing scope": lambda: with_packet(
        FLAG, Repeat("steps", (Field("D_SHIFT"), When(Eq("Q_FLAG", 1), (Field("T_WAIT"),))))
    ),
    "a scale in an enclosing scope": lambda: with_packet(
        Field("Q_SCALE"), Repeat("steps", (Field("D_FAR"),))
    ),
    "opaque last in a condition that is last": lambda: with_packet(
        FLAG, When(Eq("Q_FLAG", 1), (Field("T_WAIT"), Opaque("data")))
    ),
    "the lowest and highest signed code": lambda: with_variable(
        unsigned(
            "D_SHIFT",
            16,
            coding="signed",
            codes=(Codes(-32768, -32768, "special", "low"), Codes(32767, 32767, "special", "high")),
        )
    ),
    "a packet back without Q_DIR": lambda: with_packet(head=(HEAD[0], HEAD[2])),
}


@pytest.mark.parametrize("case", RIGHT)
def test_what_looks_odd_and_is_right(case: str) -> None:
    assert isinstance(build(RIGHT[case]()), Registry)


@pytest.mark.parametrize("edition", EDITIONS, ids=" ".join)
def test_the_registry_is_frozen(edition: Edition) -> None:
    built = registry(edition.version, edition.issue)
    with pytest.raises(dataclasses.FrozenInstanceError):
        built.version = "3.0"  # type: ignore[misc]
    for mapping in (built.variables, built.packets, built.messages, built.headers):
        key = next(iter(mapping))
        with pytest.raises(TypeError):
            mapping[key] = None  # type: ignore[index]
        with pytest.raises(TypeError):
            del mapping[key]  # type: ignore[union-attr]
    for entry in (
        built.variables["NID_C"],
        built.packets["to-train", 15],
        built.messages["to-train", 3],
        built.headers["balise"],
        built.packets["to-train", 15].nodes[0],
        built.variables["M_ACK"].codes[0],
    ):
        name = dataclasses.fields(entry)[0].name
        with pytest.raises(dataclasses.FrozenInstanceError):
            setattr(entry, name, None)
        hash(entry)  # what is frozen through and through can be hashed


def test_a_registry_is_built_once() -> None:
    assert registry("2.1") is registry("2.1")
    assert registry("2.1", "3.6.0") == registry("2.1")
    assert registry() == registry("2.1")
    assert registry("1.0").packets == registry("1.1").packets
    assert registry("1.0").packets != registry("1.0", "2.3.0").packets


@pytest.mark.parametrize(
    ("version", "issue"), [("9.9", None), ("2.1", "9.9.9"), ("", None), ("3.6.0", None)]
)
def test_a_version_without_registry_is_refused(version: str, issue: str | None) -> None:
    with pytest.raises(RegistryError, match=r"2\.1 \(issue 3\.6\.0\)"):
        registry(version, issue)


def test_lineage_finds_a_renamed_variable() -> None:
    renamed = unsigned("T_PAUSE", 10, unit="s", resolution="0.1", lineage="T_WAIT")
    kept = tuple(each for each in BASE.variables if each.name != "T_WAIT")
    packets = tuple(each for each in BASE.packets if each.number != 2)
    messages = (message(8),)
    built = build(
        dataclasses.replace(BASE, variables=(*kept, renamed), packets=packets, messages=messages)
    )
    assert built.of_lineage("T_WAIT") is renamed
    assert registry("2.1").of_lineage("NID_C").name == "NID_C"
    with pytest.raises(RegistryError, match="no variable of lineage T_PAUSE"):
        built.of_lineage("T_PAUSE")


# Names by version, 2.1 to 1.0: SUBSET-026 issues 2.3.0, 3.3.0, 3.6.0 and 4.0.0, chapter 7.5, and
# issue 3.6.0, 6.5.1.5 for X = 1 as it is handled today.
LINEAGES = {
    "V_EMA": {"1.0": "V_EMA", "2.0": "V_LOA", "2.1": "V_EMA", "3.0": "V_EMA", "2.3.0": "V_LOA"},
    "NID_NTC": {"1.0": "NID_NTC", "2.0": "NID_NTC", "3.0": "NID_NTC", "2.3.0": "NID_STM"},
    "Q_LENGTH": {"2.0": "Q_LENGTH", "2.2": "Q_LENGTH", "3.0": "Q_INTEGRITY"},
    "Q_STATUS": {"2.0": "Q_STATUS", "3.0": "Q_STATUSLRBG"},
}


@pytest.mark.parametrize("lineage", LINEAGES)
def test_each_issue_has_its_own_name_for_a_lineage(lineage: str) -> None:
    for version, name in LINEAGES[lineage].items():
        book = registry("1.0", version) if version == "2.3.0" else registry(version)
        assert book.of_lineage(lineage).name == name, version
        assert name in book.variables
        others = {each for each in LINEAGES[lineage].values() if each != name}
        assert not others & book.variables.keys(), version


# Numbers of 206, 207, 239, 200 in issue 3.6.0, 6.5.1.5.21 to 6.5.1.5.25: the X = 1 form of the
# packets 68, 70, 39 and 0; 73 and 74 of issue 4.0.0 are 72 and 76 of issue 3.6.0.
@pytest.mark.parametrize(
    ("version", "number", "lineage"),
    [
        ("1.1", 200, 0),
        ("1.1", 206, 68),
        ("1.1", 207, 70),
        ("1.1", 239, 39),
        ("1.1", 68, 68),
        ("3.0", 73, 72),
        ("3.0", 74, 76),
        ("2.2", 73, 72),
        ("2.1", 72, 72),
    ],
)
def test_packets_that_were_renumbered(version: str, number: int, lineage: int) -> None:
    assert registry(version).packets["to-train", number].lineage == lineage
    assert ("to-train", 200) not in registry("2.1").packets


def test_packets_that_only_a_later_version_of_the_same_x_may_use() -> None:
    """1.1 (issue 3.6.0, 6.5.1.7.1 to 6.5.1.7.4)."""
    packets = registry("1.0").packets
    since = {key for key, each in packets.items() if each.since == "1.1"}
    assert since == {("to-train", number) for number in (2, 6, 135, 145, 200, 203, 206, 207, 239)}
    assert {each.since for key, each in packets.items() if key not in since} == {""}


def test_evidence_is_found_by_its_subject() -> None:
    assert registry("2.1").evidence == ()
    weaker = registry("3.0").evidence_of()
    assert [each.kind for each in weaker] == ["weaker"]
    assert "text conversion" in weaker[0].note
    assert [each.kind for each in registry("3.0").evidence_of("message", "to-train", 38)] == [
        "inferred"
    ]
    assert registry("3.0").evidence_of("message", "to-track", 38) == ()
    inferred = registry("2.2").evidence_of()
    assert [each.kind for each in inferred] == ["inferred"]
    assert "was not read" in inferred[0].note
