"""Trees with one thing wrong each, and what the error has to say about it."""

from __future__ import annotations

import copy
from typing import Any

from unit.test_encoding import AUTHORITY, GENERAL, HEADER, REVOKED, Tree, message, telegram


def changed(**changes: Any) -> Tree:
    """Change one packet 12; a value of ... takes the key out."""
    packet = copy.deepcopy(AUTHORITY) | changes
    return message(REVOKED, {key: each for key, each in packet.items() if each is not ...})


def header(**changes: Any) -> Tree:
    fields = GENERAL | changes
    kept = {key: each for key, each in fields.items() if each is not ...}
    return {"medium": "radio", "header": kept, "packets": [REVOKED]}


SECTION = {"L_SECTION": 1200, "Q_SECTIONTIMER": 0}
P1: tuple[str | int, ...] = ("packets", 1)

# Tree, path of the error, a part of its sentence, expected, got.
REFUSED: dict[str, tuple[Tree, tuple[str | int, ...], str, str, Any]] = {
    "missing": (changed(V_EMA=...), (*P1, "V_EMA"), "missing", "0 to 127", None),
    "missing set": (changed(sections=...), (*P1, "sections"), "missing", "sections", None),
    "missing in an element": (
        changed(sections=[SECTION, {"L_SECTION": 5}]),
        (*P1, "sections", 1, "Q_SECTIONTIMER"),
        "missing",
        "0 to 1",
        None,
    ),
    "missing because a condition holds": (
        changed(Q_OVERLAP=1),
        (*P1, "D_STARTOL"),
        "missing",
        "0 to 32767",
        None,
    ),
    "superfluous because a condition fails": (
        changed(D_DP=5),
        (*P1, "D_DP"),
        "only there when Q_DANGERPOINT = 1",
        "Q_DANGERPOINT = 1",
        5,
    ),
    "superfluous in an element": (
        changed(sections=[SECTION | {"T_SECTIONTIMER": 5}]),
        (*P1, "sections", 0, "T_SECTIONTIMER"),
        "only there when Q_SECTIONTIMER = 1",
        "Q_SECTIONTIMER = 1",
        5,
    ),
    "superfluous altogether": (changed(NID_BG=5), (*P1, "NID_BG"), "not part", "", "NID_BG"),
    "mistyped": (
        changed(V_EMAA=0),
        (*P1, "V_EMAA"),
        "did you mean V_EMA?",
        "",
        "V_EMAA",
    ),
    "mistyped set": (
        changed(section=[]),
        (*P1, "section"),
        "did you mean sections?",
        "",
        "section",
    ),
    "N_ITER stored": (changed(N_ITER=1), (*P1, "N_ITER"), "not part", "", "N_ITER"),
    "one too large": (
        changed(V_EMA=128),
        (*P1, "V_EMA"),
        "expected a code from 0 to 127 (7 bits), got 128",
        "0 to 127",
        128,
    ),
    "below zero": (changed(V_EMA=-1), (*P1, "V_EMA"), "got -1", "0 to 127", -1),
    "a huge number": (changed(V_EMA=1 << 80), (*P1, "V_EMA"), "got 1208", "0 to 127", 1 << 80),
    "a text": (changed(V_EMA="fast"), (*P1, "V_EMA"), "got 'fast'", "0 to 127", "fast"),
    "a fraction": (changed(V_EMA=1.0), (*P1, "V_EMA"), "got 1.0", "0 to 127", 1.0),
    "nothing": (changed(V_EMA=None), (*P1, "V_EMA"), "got None", "0 to 127", None),
    "a list for a code": (changed(V_EMA=[1]), (*P1, "V_EMA"), "got [1]", "0 to 127", [1]),
    "a code for a list": (changed(sections=3), (*P1, "sections"), "expected a list", "list", 3),
    "a mapping for a list": (
        changed(sections=SECTION),
        (*P1, "sections"),
        "expected a list",
        "list",
        SECTION,
    ),
    "an empty mapping for a list": (
        changed(sections={}),
        (*P1, "sections"),
        "expected a list",
        "list",
        {},
    ),
    "an empty text for a list": (
        changed(sections=""),
        (*P1, "sections"),
        "expected a list",
        "list",
        "",
    ),
    "an element that is none": (
        changed(sections=[SECTION, 5]),
        (*P1, "sections", 1),
        "expected a mapping",
        "mapping",
        5,
    ),
    "a list too long": (
        changed(sections=[SECTION] * 32),
        (*P1, "sections"),
        "expected 0 to 31 elements, got 32",
        "0 to 31 elements",
        32,
    ),
    "a series too long": (
        message(
            {"NID_PACKET": 49, "Q_DIR": 1, "groups": []},
            {
                "NID_PACKET": 21,
                "Q_DIR": 1,
                "Q_SCALE": 1,
                "gradients": [{"D_GRADIENT": 0, "Q_GDIR": 0, "G_A": 1}] * 33,
            },
        ),
        (*P1, "gradients"),
        "expected 1 to 32 elements, got 33",
        "1 to 32 elements",
        33,
    ),
    "a series of nothing": (
        message(REVOKED, {"NID_PACKET": 21, "Q_DIR": 1, "Q_SCALE": 1, "gradients": []}),
        (*P1, "gradients"),
        "expected 1 to 32 elements, got 0",
        "1 to 32 elements",
        0,
    ),
    "L_PACKET that disagrees": (
        changed(L_PACKET=5),
        (*P1, "L_PACKET"),
        "given as 5, the content takes 89",
        "89",
        5,
    ),
    "L_PACKET that is no number": (
        changed(L_PACKET="long"),
        (*P1, "L_PACKET"),
        "got 'long'",
        "0 to 8191",
        "long",
    ),
    "L_MESSAGE that disagrees": (
        header(L_MESSAGE=15),
        ("header", "L_MESSAGE"),
        "given as 15, the content takes 14",
        "14",
        15,
    ),
    "a header with something missing": (
        header(M_ACK=...),
        ("header", "M_ACK"),
        "missing",
        "0 to 1",
        None,
    ),
    "a header with something more": (
        header(M_LEVEL=0),
        ("header", "M_LEVEL"),
        "not part",
        "",
        "M_LEVEL",
    ),
    "a header with something too large": (
        header(NID_LRBG=1 << 24),
        ("header", "NID_LRBG"),
        "got 16777216",
        "0 to 16777215",
        1 << 24,
    ),
    "D_REF below its range": (
        {
            "medium": "radio",
            "header": GENERAL | {"NID_MESSAGE": 33, "D_REF": -32769, "Q_SCALE": 1},
            "packets": [],
        },
        ("header", "D_REF"),
        "-32768 to 32767",
        "-32768 to 32767",
        -32769,
    ),
    "no header": (
        {"medium": "balise", "packets": []},
        ("header",),
        "expected a mapping",
        "mapping",
        None,
    ),
    "a message without a number": (
        header(NID_MESSAGE=...),
        ("header", "NID_MESSAGE"),
        "",
        "number of a message",
        None,
    ),
    "a message nobody knows": (
        header(NID_MESSAGE=99),
        ("header", "NID_MESSAGE"),
        "message 99 is not known to-train",
        "number of a message",
        99,
    ),
    "a packet nobody knows": (
        message(REVOKED, {"NID_PACKET": 201, "Q_DIR": 1}),
        (*P1, "NID_PACKET"),
        "packet 201 is not known to-train; give its bits as content",
        "number of a packet",
        201,
    ),
    "a packet of the other direction": (
        message(REVOKED, {"NID_PACKET": 11, "Q_DIR": 1}),
        (*P1, "NID_PACKET"),
        "packet 11 is not known to-train",
        "number of a packet",
        11,
    ),
    "a packet without a number": (
        message(REVOKED, {"Q_DIR": 1}),
        (*P1, "NID_PACKET"),
        "",
        "number of a packet",
        None,
    ),
    "a packet whose number is a text": (
        message(REVOKED, {"NID_PACKET": "66", "Q_DIR": 1, "NID_TSR": 1}),
        (*P1, "NID_PACKET"),
        "",
        "number of a packet",
        "66",
    ),
    "a packet that is none": (message(REVOKED, 5), P1, "expected a packet", "", 5),  # type: ignore[arg-type]
    "packets that are no list": (
        message() | {"packets": 5},
        ("packets",),
        "expected a list of packets",
        "",
        5,
    ),
    "content beside fields": (
        message(REVOKED, REVOKED | {"content": {"bits": 0, "hex": ""}}),
        (*P1, "NID_TSR"),
        "given beside content",
        "content alone",
        None,
    ),
    "content that is none": (
        message(REVOKED, {"NID_PACKET": 201, "Q_DIR": 1, "content": "A5"}),
        (*P1, "content"),
        "bits",
        "bits and hex",
        "A5",
    ),
    "surplus that is none": (
        message(REVOKED, REVOKED | {"surplus": 5}),
        (*P1, "surplus"),
        "bits",
        "bits and hex",
        5,
    ),
    "data that is none": (
        message(REVOKED, {"NID_PACKET": 44, "Q_DIR": 1, "NID_XUSER": 5, "data": "A5"}),
        (*P1, "data"),
        "bits",
        "bits and hex",
        "A5",
    ),
    "padding that completes no byte": (
        message(REVOKED, padding={"bits": 5, "hex": "00"}),
        ("padding",),
        "does not complete a byte",
        "whole bytes",
        {"bits": 5, "hex": "00"},
    ),
    "a letter outside ISO 8859-1": (
        message(
            REVOKED,
            {
                "NID_PACKET": 72,
                "Q_DIR": 1,
                "Q_SCALE": 1,
                "Q_TEXTCLASS": 0,
                "Q_TEXTDISPLAY": 0,
                "start": {"D_TEXTDISPLAY": 0, "M_MODETEXTDISPLAY": 0, "M_LEVELTEXTDISPLAY": 0},
                "end": {
                    "L_TEXTDISPLAY": 10,
                    "T_TEXTDISPLAY": 10,
                    "M_MODETEXTDISPLAY": 0,
                    "M_LEVELTEXTDISPLAY": 0,
                },
                "Q_TEXTCONFIRM": 0,
                "X_TEXT": "5 €",
            },
        ),
        (*P1, "X_TEXT"),
        "'€' is not in ISO 8859-1",
        "ISO 8859-1",
        "5 €",
    ),
    "a number as digits": (
        {
            "direction": "to-track",
            "header": {"NID_MESSAGE": 146, "T_TRAIN": 5, "NID_ENGINE": 9, "T_TRAIN_REFERENCE": 4},
            "packets": [{"NID_PACKET": 5, "NID_OPERATIONAL": 1234567}],
        },
        ("packets", 0, "NID_OPERATIONAL"),
        "at most 8 digits as text",
        "at most 8 digits as text",
        1234567,
    ),
    "too many digits": (
        {
            "direction": "to-track",
            "header": {"NID_MESSAGE": 146, "T_TRAIN": 5, "NID_ENGINE": 9, "T_TRAIN_REFERENCE": 4},
            "packets": [{"NID_PACKET": 5, "NID_OPERATIONAL": "123456789"}],
        },
        ("packets", 0, "NID_OPERATIONAL"),
        "at most 8 digits as text",
        "at most 8 digits as text",
        "123456789",
    ),
    "a medium nobody knows": (
        {"medium": "satellite", "header": HEADER},
        ("medium",),
        "got 'satellite'",
        "balise, loop or radio",
        "satellite",
    ),
    "no medium": ({"packets": []}, ("medium",), "expected balise, loop or radio", "medium", None),
    "a direction nobody knows": (
        message(REVOKED, direction="sideways"),
        ("direction",),
        "got 'sideways'",
        "to-train or to-track",
        "sideways",
    ),
    "a key at the top": (
        message(REVOKED) | {"packet": []},
        ("packet",),
        "did you mean packets?",
        "packets",
        None,
    ),
    "a telegram for no balise": (
        telegram(*[REVOKED] * 30),
        ("packets",),
        "988 bits, the longest holds 830",
        "at most 830 bits",
        988,
    ),
    "a message too long": (
        message(
            *[
                {
                    "NID_PACKET": 44,
                    "Q_DIR": 1,
                    "NID_XUSER": 5,
                    "data": {"bits": 8000, "hex": "00" * 1000},
                }
            ]
            * 2
        ),
        ("packets",),
        "L_MESSAGE says 1023 at most",
        "at most 1023 bytes",
        2018,
    ),
    "a packet too long": (
        message(
            REVOKED,
            {
                "NID_PACKET": 44,
                "Q_DIR": 1,
                "NID_XUSER": 5,
                "data": {"bits": 8192, "hex": "00" * 1024},
            },
        ),
        (*P1, "L_PACKET"),
        "got 8224",
        "0 to 8191",
        8224,
    ),
}
