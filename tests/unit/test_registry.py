"""Registries: what may be declared, that it is frozen, and how one is found."""

from __future__ import annotations

import dataclasses
from typing import TYPE_CHECKING

import pytest

from fishplate.errors import RegistryError
from fishplate.standard.build import Registry, build, known_versions, registry
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


def test_the_registry_is_frozen() -> None:
    built = registry("2.1")
    with pytest.raises(dataclasses.FrozenInstanceError):
        built.version = "3.0"  # type: ignore[misc]
    for mapping in (built.variables, built.packets, built.messages, built.headers):
        key = next(iter(mapping))
        with pytest.raises(TypeError):
            mapping[key] = None  # type: ignore[index]
        with pytest.raises(TypeError):
            del mapping[key]  # type: ignore[attr-defined]
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
    assert known_versions() == ("2.1",)


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
