"""The workload read and written by hand with bitstruct in C: one call a run of fixed width.

cbitstruct (the same interface, rewritten) is taken where it is installed, else the extension
that bitstruct brings along. Runs are tuples, not dicts: reading into a dict from an offset fails
in bitstruct 8.24, and a dict literal of the tuple costs no more.
"""

from __future__ import annotations

from importlib import import_module
from importlib.util import find_spec
from typing import Any

Tree = dict[str, Any]

LIBRARY = "cbitstruct" if find_spec("cbitstruct") else "bitstruct"
compiled = import_module("cbitstruct" if LIBRARY == "cbitstruct" else "bitstruct.c").compile

HEADER = compiled("u8u10u32u1u24")
HEAD = compiled("u8u2u13u2")
START = compiled("u8u2u13u2u7u10u5")
SECTION = compiled("u15u1")
TIMER = compiled("u10u15")
DANGER = compiled("u15u7")
OVERLAP = compiled("u15u10u15u7")
GRADIENT = compiled("u15u1u8")
GRADIENTS = compiled("u8u2u13u2u15u1u8u5")
STEP = compiled("u15u7u1u5")
CATEGORY = compiled("u2u4u7")
NEITHER = compiled("u2u7")
FLAG = compiled("u1")
COUNT = compiled("u5")
KIND = compiled("u2")


def decode(data: bytes) -> Tree:
    """Read run by run."""
    number, length, time, ack, group = HEADER.unpack_from(data, 0)
    header = {
        "NID_MESSAGE": number,
        "L_MESSAGE": length,
        "T_TRAIN": time,
        "M_ACK": ack,
        "NID_LRBG": group,
    }
    p15, at = _authority(data, 75)
    number, way, length, scale, distance, up, slope, count = GRADIENTS.unpack_from(data, at)
    at += 54
    gradients = [{"D_GRADIENT": distance, "Q_GDIR": up, "G_A": slope}]
    for _ in range(count):
        distance, up, slope = GRADIENT.unpack_from(data, at)
        at += 24
        gradients.append({"D_GRADIENT": distance, "Q_GDIR": up, "G_A": slope})
    p21 = _head(number, way, length, scale)
    p21["gradients"] = gradients
    p27 = _head(*HEAD.unpack_from(data, at))
    first, at = _step(data, at + 25)
    p27["steps"] = steps = [first]
    (count,) = COUNT.unpack_from(data, at)
    at += 5
    for _ in range(count):
        step, at = _step(data, at)
        steps.append(step)
    return {"header": header, "packets": [p15, p21, p27]}


def _head(number: int, way: int, length: int, scale: int) -> Tree:
    return {"NID_PACKET": number, "Q_DIR": way, "L_PACKET": length, "Q_SCALE": scale}


def _authority(data: bytes, at: int) -> tuple[Tree, int]:
    number, way, length, scale, speed, time, count = START.unpack_from(data, at)
    at += 47
    p15 = _head(number, way, length, scale)
    p15["V_EMA"] = speed
    p15["T_EMA"] = time
    p15["sections"] = sections = []
    for _ in range(count):
        length, flag = SECTION.unpack_from(data, at)
        at += 16
        section = {"L_SECTION": length, "Q_SECTIONTIMER": flag}
        if flag:
            section["T_SECTIONTIMER"], section["D_SECTIONTIMERSTOPLOC"] = TIMER.unpack_from(
                data, at
            )
            at += 25
        sections.append(section)
    p15["L_ENDSECTION"], flag = SECTION.unpack_from(data, at)
    p15["Q_SECTIONTIMER"] = flag
    at += 16
    if flag:
        p15["T_SECTIONTIMER"], p15["D_SECTIONTIMERSTOPLOC"] = TIMER.unpack_from(data, at)
        at += 25
    (p15["Q_ENDTIMER"],) = FLAG.unpack_from(data, at)
    at += 1
    if p15["Q_ENDTIMER"]:
        p15["T_ENDTIMER"], p15["D_ENDTIMERSTARTLOC"] = TIMER.unpack_from(data, at)
        at += 25
    (p15["Q_DANGERPOINT"],) = FLAG.unpack_from(data, at)
    at += 1
    if p15["Q_DANGERPOINT"]:
        p15["D_DP"], p15["V_RELEASEDP"] = DANGER.unpack_from(data, at)
        at += 22
    (p15["Q_OVERLAP"],) = FLAG.unpack_from(data, at)
    at += 1
    if p15["Q_OVERLAP"]:
        values = OVERLAP.unpack_from(data, at)
        p15["D_STARTOL"], p15["T_OL"], p15["D_OL"], p15["V_RELEASEOL"] = values
        at += 47
    return p15, at


def _step(data: bytes, at: int) -> tuple[Tree, int]:
    distance, speed, front, count = STEP.unpack_from(data, at)
    at += 28
    categories: list[Tree] = []
    for _ in range(count):
        (kind,) = KIND.unpack_from(data, at)
        if kind in (0, 1, 2):
            _, which, limit = CATEGORY.unpack_from(data, at)
            name = "NC_DIFF" if kind else "NC_CDDIFF"
            categories.append({"Q_DIFF": kind, name: which, "V_DIFF": limit})
            at += 13
        else:
            _, limit = NEITHER.unpack_from(data, at)
            categories.append({"Q_DIFF": kind, "V_DIFF": limit})
            at += 9
    step = {"D_STATIC": distance, "V_STATIC": speed, "Q_FRONT": front, "categories": categories}
    return step, at


def encode(tree: Tree) -> bytes:
    """Write run by run into a buffer of the length that L_MESSAGE gives."""
    header = tree["header"]
    p15, p21, p27 = tree["packets"]
    out = bytearray(header["L_MESSAGE"])
    HEADER.pack_into(
        out,
        0,
        header["NID_MESSAGE"],
        header["L_MESSAGE"],
        header["T_TRAIN"],
        header["M_ACK"],
        header["NID_LRBG"],
    )
    at = _write_authority(out, 75, p15)
    at = _write_gradients(out, at, p21)
    HEAD.pack_into(out, at, p27["NID_PACKET"], p27["Q_DIR"], p27["L_PACKET"], p27["Q_SCALE"])
    first, *further = p27["steps"]
    at = _write_step(out, at + 25, first)
    COUNT.pack_into(out, at, len(further))
    at += 5
    for step in further:
        at = _write_step(out, at, step)
    return bytes(out)


def _write_authority(out: bytearray, at: int, p15: Tree) -> int:
    START.pack_into(
        out,
        at,
        p15["NID_PACKET"],
        p15["Q_DIR"],
        p15["L_PACKET"],
        p15["Q_SCALE"],
        p15["V_EMA"],
        p15["T_EMA"],
        len(p15["sections"]),
    )
    at += 47
    for section in p15["sections"]:
        SECTION.pack_into(out, at, section["L_SECTION"], section["Q_SECTIONTIMER"])
        at += 16
        if section["Q_SECTIONTIMER"]:
            TIMER.pack_into(out, at, section["T_SECTIONTIMER"], section["D_SECTIONTIMERSTOPLOC"])
            at += 25
    SECTION.pack_into(out, at, p15["L_ENDSECTION"], p15["Q_SECTIONTIMER"])
    at += 16
    if p15["Q_SECTIONTIMER"]:
        TIMER.pack_into(out, at, p15["T_SECTIONTIMER"], p15["D_SECTIONTIMERSTOPLOC"])
        at += 25
    FLAG.pack_into(out, at, p15["Q_ENDTIMER"])
    at += 1
    if p15["Q_ENDTIMER"]:
        TIMER.pack_into(out, at, p15["T_ENDTIMER"], p15["D_ENDTIMERSTARTLOC"])
        at += 25
    FLAG.pack_into(out, at, p15["Q_DANGERPOINT"])
    at += 1
    if p15["Q_DANGERPOINT"]:
        DANGER.pack_into(out, at, p15["D_DP"], p15["V_RELEASEDP"])
        at += 22
    FLAG.pack_into(out, at, p15["Q_OVERLAP"])
    at += 1
    if p15["Q_OVERLAP"]:
        OVERLAP.pack_into(out, at, p15["D_STARTOL"], p15["T_OL"], p15["D_OL"], p15["V_RELEASEOL"])
        at += 47
    return at


def _write_gradients(out: bytearray, at: int, p21: Tree) -> int:
    first, *further = p21["gradients"]
    GRADIENTS.pack_into(
        out,
        at,
        p21["NID_PACKET"],
        p21["Q_DIR"],
        p21["L_PACKET"],
        p21["Q_SCALE"],
        first["D_GRADIENT"],
        first["Q_GDIR"],
        first["G_A"],
        len(further),
    )
    at += 54
    for each in further:
        GRADIENT.pack_into(out, at, each["D_GRADIENT"], each["Q_GDIR"], each["G_A"])
        at += 24
    return at


def _write_step(out: bytearray, at: int, step: Tree) -> int:
    categories = step["categories"]
    STEP.pack_into(out, at, step["D_STATIC"], step["V_STATIC"], step["Q_FRONT"], len(categories))
    at += 28
    for category in categories:
        kind = category["Q_DIFF"]
        if kind in (0, 1, 2):
            which = category["NC_DIFF" if kind else "NC_CDDIFF"]
            CATEGORY.pack_into(out, at, kind, which, category["V_DIFF"])
            at += 13
        else:
            NEITHER.pack_into(out, at, kind, category["V_DIFF"])
            at += 9
    return at
