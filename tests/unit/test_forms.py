"""Packets of 2.2 and 2.3 that come as 2.1 or as 3.0 lays them out: L_PACKET tells.

The layouts are those of SUBSET-026 issue 3.6.0 (2.1) and issue 4.0.0 (3.0), 7.4.2.11.1, 7.4.2.21,
7.4.2.23, 7.4.2.24, 7.4.3.1 and 7.4.3.2; all bits are put together by hand. That a version may use
both is inferred (chapter 6 of issue 4.0.0 was not read): this is the library's own contract.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

import pytest

import fishplate
from unit.wire import (
    END,
    balise,
    decode,
    field,
    general,
    packet,
    packet_back,
    position,
    report,
    rows,
)

if TYPE_CHECKING:
    from collections.abc import Iterator

VERSIONS = ("2.2", "2.3")
CODES = {"2.2": 34, "2.3": 35}

# Packet 45: NID_MN 24 in 2.1; in 3.0 Q_NETWORKTYPE 2 before it, and NID_MN for types 1 and 2 only.
NETWORK = field(0x90190F, 24)
# Packet 70: Q_SCALE 2, Q_TRACKINIT 1, D_SUITABILITY 15, Q_SUITABILITY 2; then for Q_SUITABILITY 1
# M_AXLELOADCAT 7 in 2.1, M_LINEAXLELOADCAT 16 in 3.0; N_ITER 5.
SUITABLE = field(1, 2) + "0" + field(700, 15) + field(1, 2)
# Packets 73 and 74: Q_SCALE 2, Q_TEXTCLASS 2, Q_TEXTDISPLAY 1, D_TEXTDISPLAY 15,
# M_MODETEXTDISPLAY 4, M_LEVELTEXTDISPLAY 3, L_TEXTDISPLAY 15, T_TEXTDISPLAY 10, mode, level,
# Q_TEXTCONFIRM 2; then L_TEXT 8 and characters, or Q_TEXT 8.
SHOWN = [(1, 2), (0, 2), (1, 1), (30, 15), (15, 4), (4, 3), (500, 15), (60, 10), (15, 4), (4, 3)]
DISPLAY = "".join(field(*each) for each in SHOWN) + field(0, 2)
SHOWN_TREE: dict[str, Any] = {
    "Q_SCALE": 1,
    "Q_TEXTCLASS": 0,
    "Q_TEXTDISPLAY": 1,
    "start": {"D_TEXTDISPLAY": 30, "M_MODETEXTDISPLAY": 15, "M_LEVELTEXTDISPLAY": 4},
    "end": {
        "L_TEXTDISPLAY": 500,
        "T_TEXTDISPLAY": 60,
        "M_MODETEXTDISPLAY": 15,
        "M_LEVELTEXTDISPLAY": 4,
    },
    "Q_TEXTCONFIRM": 0,
}
DOWN: dict[str, tuple[str, dict[str, Any]]] = {
    "45 as in 2.1": (packet(45, NETWORK), {"NID_PACKET": 45, "L_PACKET": 47, "NID_MN": "90190"}),
    "45 as in 3.0, without network": (
        packet(45, field(0, 2)),
        {"NID_PACKET": 45, "L_PACKET": 25, "Q_NETWORKTYPE": 0, "form": "3.0"},
    ),
    "45 as in 3.0, with one": (
        packet(45, field(2, 2) + NETWORK),
        {
            "NID_PACKET": 45,
            "L_PACKET": 49,
            "Q_NETWORKTYPE": 2,
            "NID_MN": "90190",
            "form": "3.0",
        },
    ),
    "70 as in 2.1": (
        packet(70, SUITABLE + field(5, 7) + field(0, 5)),
        {
            "NID_PACKET": 70,
            "L_PACKET": 55,
            "Q_SCALE": 1,
            "Q_TRACKINIT": 0,
            "suitabilities": [{"D_SUITABILITY": 700, "Q_SUITABILITY": 1, "M_AXLELOADCAT": 5}],
        },
    ),
    "70 as in 3.0": (
        packet(70, SUITABLE + field(5, 16) + field(0, 5)),
        {
            "NID_PACKET": 70,
            "L_PACKET": 64,
            "Q_SCALE": 1,
            "Q_TRACKINIT": 0,
            "suitabilities": [{"D_SUITABILITY": 700, "Q_SUITABILITY": 1, "M_LINEAXLELOADCAT": 5}],
            "form": "3.0",
        },
    ),
    "70 that is the same in both": (
        packet(70, field(1, 2) + "1" + field(90, 15)),
        {"NID_PACKET": 70, "L_PACKET": 41, "Q_SCALE": 1, "Q_TRACKINIT": 1, "D_TRACKINIT": 90},
    ),
    "73": (
        packet(73, DISPLAY + field(2, 8) + "0100111101001011"),
        {"NID_PACKET": 73, "L_PACKET": 108, **SHOWN_TREE, "X_TEXT": "OK", "form": "3.0"},
    ),
    "74": (
        packet(74, DISPLAY + field(1, 8)),
        {"NID_PACKET": 74, "L_PACKET": 92, **SHOWN_TREE, "Q_TEXT": 1, "form": "3.0"},
    ),
}
"""Packets to the train and their trees, without Q_DIR, which is 1 in all of them."""


def report_tree(number: int, length: int, integrity: str, **more: Any) -> dict[str, Any]:
    """The tree of `wire.position`."""
    return {
        "NID_PACKET": number,
        "L_PACKET": length,
        "Q_SCALE": 1,
        "NID_LRBG": 9050,
        **({"NID_PRVLRBG": 9051} if number else {}),
        "D_LRBG": 1200,
        "Q_DIRLRBG": 1,
        "Q_DLRBG": 1,
        "L_DOUBTOVER": 40,
        "L_DOUBTUNDER": 50,
        integrity: 0,
        "V_TRAIN": 24,
        "Q_DIRTRAIN": 1,
        "M_MODE": 0,
        "M_LEVEL": 3,
        **more,
    }


# 8 + 13 + 2 + 24 + 15 + 2 + 2 + 15 + 15 + 2 + 7 + 2 + 4 + 3 = 114 bits in 2.1, one more in 3.0;
# NID_PRVLRBG of packet 1 takes 24.
UP: dict[str, tuple[str, dict[str, Any]]] = {
    "0 as in 2.1": (position(), report_tree(0, 114, "Q_LENGTH")),
    "0 as in 3.0": (position(mode_bits=5), report_tree(0, 115, "Q_INTEGRITY", form="3.0")),
    "1 as in 2.1": (position(previous=True), report_tree(1, 138, "Q_LENGTH")),
    "1 as in 3.0": (
        position(previous=True, mode_bits=5),
        report_tree(1, 139, "Q_INTEGRITY", form="3.0"),
    ),
    "0 as in 2.1, with the length of the train": (
        position(integrity=1),
        report_tree(0, 129, "Q_LENGTH", L_TRAININT=400, Q_LENGTH=1),
    ),
    "0 as in 3.0, with the length of the train": (
        position(mode_bits=5, integrity=1),
        report_tree(0, 130, "Q_INTEGRITY", L_TRAININT=400, Q_INTEGRITY=1, form="3.0"),
    ),
}


def frames() -> Iterator[tuple[str, str, dict[str, Any], dict[str, str]]]:
    """Name, bits, the tree of the first packet, what is said beside the bits."""
    for version in VERSIONS:
        given = {"version": version}
        for name, (bits, body) in DOWN.items():
            tree = {**body, "Q_DIR": 1}
            yield f"{version} balise {name}", balise(bits, END, version=CODES[version]), tree, {}
            yield f"{version} radio {name}", general(bits), tree, given
        for name, (bits, tree) in UP.items():
            yield f"{version} {name}", report(bits), tree, given


FRAMES = {name: (text, tree, given) for name, text, tree, given in frames()}


@pytest.mark.parametrize("name", FRAMES)
def test_the_length_of_a_packet_tells_its_form(name: str) -> None:
    text, tree, given = FRAMES[name]
    message = decode(text, **given)
    assert message.packets[0] == tree
    assert message.version == name[:3]
    assert not message.problems
    assert "0b" + fishplate.encode(message).bin == "0b" + text
    assert fishplate.encode(message.tree()).bin == text


@pytest.mark.parametrize("name", FRAMES)
def test_a_packet_is_walked_in_the_form_it_came_in(name: str) -> None:
    text, tree, given = FRAMES[name]
    inside = [each for each in rows(text, **given) if each.path[:2] == ("packets", 0)]
    assert sum(each.width for each in inside) == tree["L_PACKET"]
    widths = {each.variable: each.width for each in inside}
    form = "form" in tree
    if "M_MODE" in tree:
        assert widths["M_MODE"] == (5 if form else 4)
    assert ("Q_INTEGRITY" in widths) == (form and "M_MODE" in tree)
    assert widths.get("M_LINEAXLELOADCAT", 16) == 16


@pytest.mark.parametrize("name", FRAMES)
def test_the_form_is_found_by_the_variables(name: str) -> None:
    text, tree, given = FRAMES[name]
    whole = decode(text, **given).tree()
    # The packet as somebody would author it: no form, no length; nothing said about evidence.
    whole["packets"][0] = {key: tree[key] for key in tree if key not in ("form", "L_PACKET")}
    whole.pop("evidence")
    assert fishplate.encode(whole).bin == text


@pytest.mark.parametrize("name", FRAMES)
def test_a_form_is_said_as_evidence(name: str) -> None:
    text, tree, given = FRAMES[name]
    message = decode(text, **given)
    said = [each for each in message.evidence if each["path"] == ["packets", 0]]
    # The layouts of 3.0 rest on weaker evidence, those of 2.1 do not.
    assert {each["kind"] for each in said} == {"inferred", *(["weaker"] if "form" in tree else [])}
    (note,) = (each["message"] for each in said if each["kind"] == "inferred")
    if tree["NID_PACKET"] in (73, 74):
        assert note == "laid out as in 3.0, which alone knows it"
    elif "form" in tree:
        assert note == "laid out as in 3.0, which its L_PACKET fits"
    else:
        assert note.startswith("as in 2.1 where L_PACKET fits that")
    assert message.tree()["evidence"] == message.evidence


@pytest.mark.parametrize(
    ("form", "own"),
    [("45 as in 3.0, with one", "45 as in 2.1"), ("70 as in 3.0", "70 as in 2.1")],
)
def test_other_versions_have_one_form_only(form: str, own: str) -> None:
    for name, version, reads in (
        (own, 33, True),
        (form, 33, False),
        (own, 48, False),
        (form, 48, True),
    ):
        bits, tree = DOWN[name]
        message = decode(balise(bits, END, version=version), strict=False)
        plain = {key: value for key, value in tree.items() if key != "form"} | {"Q_DIR": 1}
        assert (message.packets[0] == plain) is reads
        assert bool(message.problems) is not reads
        assert "form" not in message.packets[0]


# --- what fits neither form ---------------------------------------------------------------------

# One bit more or less than either form takes; 73 and 74 are known in one form only.
MISFITS: dict[str, tuple[str, dict[str, str]]] = {
    "45 a bit too long": (balise(packet(45, NETWORK + "0"), END, version=34), {}),
    "45 a bit too short": (balise(packet(45, NETWORK[:-1]), END, version=34), {}),
    "45 between the forms": (general(packet(45, NETWORK[:8])), {"version": "2.2"}),
    "45 without anything": (general(packet(45, "")), {"version": "2.3"}),
    "70 too long": (general(packet(70, SUITABLE + "0" * 40)), {"version": "2.2"}),
    "70 too short": (general(packet(70, SUITABLE + "0" * 3)), {"version": "2.2"}),
    "73 too short": (balise(packet(73, DISPLAY + field(9, 8)), END, version=35), {}),
    "73 too long": (balise(packet(73, DISPLAY + field(0, 8) + "101"), END, version=35), {}),
    "74 too short": (general(packet(74, DISPLAY)), {"version": "2.2"}),
    "0 too short": (report(packet_back(0, position()[21:-9])), {"version": "2.2"}),
    "0 too long": (report(packet_back(0, position()[21:] + "111")), {"version": "2.2"}),
    "1 too long": (report(packet_back(1, position(previous=True)[21:] + "00")), {"version": "2.2"}),
}


@pytest.mark.parametrize("name", MISFITS)
def test_what_fits_neither_form_is_kept_with_a_problem(name: str) -> None:
    text, given = MISFITS[name]
    with pytest.raises(fishplate.LengthMismatch) as caught:
        decode(text, **given)
    assert caught.value.path == ("packets", 0, "L_PACKET")
    message = decode(text, **given, strict=False)
    assert [each.kind for each in message.problems] == ["length-mismatch"]
    packet_tree = message.packets[0]
    assert ("content" in packet_tree) is not ("surplus" in packet_tree)
    assert "form" not in packet_tree
    assert fishplate.encode(message).bin == text
    assert fishplate.encode(message.tree()).bin == text
    walked = rows(text, **given, strict=False)
    assert sum(each.width for each in walked) == len(text)


@pytest.mark.parametrize("name", ["73 too short", "73 too long", "74 too short"])
def test_the_problem_names_the_only_form(name: str) -> None:
    text, given = MISFITS[name]
    (problem,) = decode(text, **given, strict=False).problems
    assert f"does not fit packet {name[:2]} as in 3.0" in problem.message


# --- forms that are asked for -------------------------------------------------------------------


def authored(version: str, packet_tree: dict[str, Any]) -> dict[str, Any]:
    header = {"NID_MESSAGE": 24, "T_TRAIN": 5, "M_ACK": 0, "NID_LRBG": 9}
    return {"medium": "radio", "version": version, "header": header, "packets": [packet_tree]}


OLD_45: dict[str, Any] = {"NID_PACKET": 45, "Q_DIR": 1, "NID_MN": "90190"}
NEW_45 = OLD_45 | {"Q_NETWORKTYPE": 1}


@pytest.mark.parametrize(
    ("tree", "bits"),
    [
        (OLD_45, packet(45, NETWORK)),
        (OLD_45 | {"form": "2.2"}, packet(45, NETWORK)),
        (NEW_45, packet(45, "01" + NETWORK)),
        (NEW_45 | {"form": "3.0"}, packet(45, "01" + NETWORK)),
        ({"NID_PACKET": 45, "Q_DIR": "nominal", "Q_NETWORKTYPE": 0}, packet(45, "00")),
        (
            {"NID_PACKET": 66, "Q_DIR": 1, "NID_TSR": 9},
            packet(66, field(9, 8)),
        ),
    ],
)
def test_a_form_may_be_said_or_left_out(tree: dict[str, Any], bits: str) -> None:
    assert fishplate.encode(authored("2.2", tree)).bin == general(bits)


@pytest.mark.parametrize(
    ("version", "tree"),
    [
        ("2.2", OLD_45 | {"form": "3.0"}),
        ("2.2", NEW_45 | {"form": "2.2"}),
        ("2.2", NEW_45 | {"form": "2.1"}),
        ("2.2", NEW_45 | {"form": "9.9"}),
        ("2.2", NEW_45 | {"form": 3.0}),
        ("2.2", NEW_45 | {"form": []}),
        ("2.2", {"NID_PACKET": 66, "Q_DIR": 1, "NID_TSR": 9, "form": "3.0"}),
        ("2.2", NEW_45 | {"NID_OTHER": 1}),
        ("2.1", OLD_45 | {"form": "3.0"}),
        ("2.1", NEW_45),
        ("3.0", NEW_45 | {"form": "2.1"}),
        ("3.0", OLD_45),
    ],
)
def test_a_form_that_does_not_fit_is_refused(version: str, tree: dict[str, Any]) -> None:
    with pytest.raises(fishplate.EncodeError) as caught:
        fishplate.encode(authored(version, tree))
    errors = (caught.value, *caught.value.others)
    assert all(each.path[:2] == ("packets", 0) for each in errors), str(caught.value)
