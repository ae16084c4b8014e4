"""The workload read and written by hand with bitstring 5.

Two ways to read: a call of `Reader.read_value` a field, and one of `Reader.read_list` a run of
fields of fixed width. Two to write: a call of `pack` a run, and one for the whole message.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from bitstring import Bits, Reader, pack

if TYPE_CHECKING:
    from collections.abc import Iterator

Tree = dict[str, Any]


def decode_by_value(data: bytes) -> Tree:
    """Read field by field."""
    read = Reader(Bits.from_bytes(data)).read_value
    header = {
        "NID_MESSAGE": read("u8"),
        "L_MESSAGE": read("u10"),
        "T_TRAIN": read("u32"),
        "M_ACK": read("u1"),
        "NID_LRBG": read("u24"),
    }
    p15 = _head(read)
    p15["V_EMA"] = read("u7")
    p15["T_EMA"] = read("u10")
    p15["sections"] = sections = []
    for _ in range(read("u5")):
        section = {"L_SECTION": read("u15"), "Q_SECTIONTIMER": read("u1")}
        if section["Q_SECTIONTIMER"]:
            section["T_SECTIONTIMER"] = read("u10")
            section["D_SECTIONTIMERSTOPLOC"] = read("u15")
        sections.append(section)
    p15["L_ENDSECTION"] = read("u15")
    p15["Q_SECTIONTIMER"] = flag = read("u1")
    if flag:
        p15["T_SECTIONTIMER"] = read("u10")
        p15["D_SECTIONTIMERSTOPLOC"] = read("u15")
    p15["Q_ENDTIMER"] = flag = read("u1")
    if flag:
        p15["T_ENDTIMER"] = read("u10")
        p15["D_ENDTIMERSTARTLOC"] = read("u15")
    p15["Q_DANGERPOINT"] = flag = read("u1")
    if flag:
        p15["D_DP"] = read("u15")
        p15["V_RELEASEDP"] = read("u7")
    p15["Q_OVERLAP"] = flag = read("u1")
    if flag:
        p15["D_STARTOL"] = read("u15")
        p15["T_OL"] = read("u10")
        p15["D_OL"] = read("u15")
        p15["V_RELEASEOL"] = read("u7")
    p21 = _head(read)
    p21["gradients"] = gradients = [_gradient(read)]
    gradients += [_gradient(read) for _ in range(read("u5"))]
    p27 = _head(read)
    p27["steps"] = steps = [_step(read)]
    steps += [_step(read) for _ in range(read("u5"))]
    return {"header": header, "packets": [p15, p21, p27]}


def _head(read: Any) -> Tree:
    return {
        "NID_PACKET": read("u8"),
        "Q_DIR": read("u2"),
        "L_PACKET": read("u13"),
        "Q_SCALE": read("u2"),
    }


def _gradient(read: Any) -> Tree:
    return {"D_GRADIENT": read("u15"), "Q_GDIR": read("u1"), "G_A": read("u8")}


def _step(read: Any) -> Tree:
    step = {"D_STATIC": read("u15"), "V_STATIC": read("u7"), "Q_FRONT": read("u1")}
    step["categories"] = categories = []
    for _ in range(read("u5")):
        category = {"Q_DIFF": read("u2")}
        if category["Q_DIFF"] == 0:
            category["NC_CDDIFF"] = read("u4")
        elif category["Q_DIFF"] in (1, 2):
            category["NC_DIFF"] = read("u4")
        category["V_DIFF"] = read("u7")
        categories.append(category)
    return step


HEADER = ("NID_MESSAGE", "L_MESSAGE", "T_TRAIN", "M_ACK", "NID_LRBG")
HEAD = ("NID_PACKET", "Q_DIR", "L_PACKET", "Q_SCALE")
TIMER = ("T_SECTIONTIMER", "D_SECTIONTIMERSTOPLOC")
END_TIMER = ("T_ENDTIMER", "D_ENDTIMERSTARTLOC")
OVERLAP = ("D_STARTOL", "T_OL", "D_OL", "V_RELEASEOL")
GRADIENT = ("D_GRADIENT", "Q_GDIR", "G_A")


def decode_by_list(data: bytes) -> Tree:
    """Read a run of fixed width at a time."""
    read = Reader(Bits.from_bytes(data)).read_list
    header = dict(zip(HEADER, read("u8,u10,u32,u1,u24"), strict=True))
    *values, count = read("u8,u2,u13,u2,u7,u10,u5")
    p15: Tree = dict(zip((*HEAD, "V_EMA", "T_EMA"), values, strict=True))
    p15["sections"] = sections = []
    for _ in range(count):
        length, flag = read("u15,u1")
        section = {"L_SECTION": length, "Q_SECTIONTIMER": flag}
        if flag:
            section.update(zip(TIMER, read("u10,u15"), strict=True))
        sections.append(section)
    p15["L_ENDSECTION"], flag = read("u15,u1")
    p15["Q_SECTIONTIMER"] = flag
    if flag:
        p15.update(zip(TIMER, read("u10,u15"), strict=True))
    for name, keys, widths in (
        ("Q_ENDTIMER", END_TIMER, "u10,u15"),
        ("Q_DANGERPOINT", ("D_DP", "V_RELEASEDP"), "u15,u7"),
        ("Q_OVERLAP", OVERLAP, "u15,u10,u15,u7"),
    ):
        (p15[name],) = read("u1")
        if p15[name]:
            p15.update(zip(keys, read(widths), strict=True))
    *values, count = read("u8,u2,u13,u2,u15,u1,u8,u5")
    p21: Tree = dict(zip(HEAD, values[:4], strict=True))
    p21["gradients"] = [dict(zip(GRADIENT, values[4:], strict=True))]
    for _ in range(count):
        p21["gradients"].append(dict(zip(GRADIENT, read("u15,u1,u8"), strict=True)))
    p27: Tree = dict(zip(HEAD, read("u8,u2,u13,u2"), strict=True))
    p27["steps"] = [_step_by_list(read)]
    (count,) = read("u5")
    p27["steps"] += [_step_by_list(read) for _ in range(count)]
    return {"header": header, "packets": [p15, p21, p27]}


def _step_by_list(read: Any) -> Tree:
    distance, speed, front, count = read("u15,u7,u1,u5")
    categories = []
    for _ in range(count):
        (kind,) = read("u2")
        if kind == 0:
            first, second = read("u4,u7")
            categories.append({"Q_DIFF": kind, "NC_CDDIFF": first, "V_DIFF": second})
        elif kind in (1, 2):
            first, second = read("u4,u7")
            categories.append({"Q_DIFF": kind, "NC_DIFF": first, "V_DIFF": second})
        else:
            (second,) = read("u7")
            categories.append({"Q_DIFF": kind, "V_DIFF": second})
    return {
        "D_STATIC": distance,
        "V_STATIC": speed,
        "Q_FRONT": front,
        "categories": categories,
    }


def encode_by_run(tree: Tree) -> bytes:
    """Pack a run of fixed width at a time and join them."""
    return bytes(Bits.from_joined([pack(*run) for run in _runs(tree)]).tobytes())


def encode_at_once(tree: Tree) -> bytes:
    """Pack the whole message in one call.

    bitstring keeps the formats it has parsed, so this is quick when the same shape comes again
    and again, and slower than a call a run (ten times slower than this) when it does not.
    """
    runs = list(_runs(tree))
    values = [value for run in runs for value in run[1:]]
    return bytes(pack(",".join([run[0] for run in runs]), *values).tobytes())


def _runs(tree: Tree) -> Iterator[tuple[Any, ...]]:
    p15, p21, p27 = tree["packets"]
    yield "u8,u10,u32,u1,u24", *tree["header"].values()
    yield from _authority_runs(p15)
    first, *further = p21["gradients"]
    values = [p21[key] for key in HEAD]
    yield "u8,u2,u13,u2,u15,u1,u8,u5", *values, *first.values(), len(further)
    for gradient in further:
        yield "u15,u1,u8", *gradient.values()
    yield "u8,u2,u13,u2", *[p27[key] for key in HEAD]
    first, *further = p27["steps"]
    yield from _step_runs(first)
    yield "u5", len(further)
    for step in further:
        yield from _step_runs(step)


def _authority_runs(p15: Tree) -> Iterator[tuple[Any, ...]]:
    values = [p15[key] for key in (*HEAD, "V_EMA", "T_EMA")]
    yield "u8,u2,u13,u2,u7,u10,u5", *values, len(p15["sections"])
    for section in p15["sections"]:
        yield "u15,u1,u10,u15" if section["Q_SECTIONTIMER"] else "u15,u1", *section.values()
    yield "u15,u1", p15["L_ENDSECTION"], p15["Q_SECTIONTIMER"]
    if p15["Q_SECTIONTIMER"]:
        yield "u10,u15", p15["T_SECTIONTIMER"], p15["D_SECTIONTIMERSTOPLOC"]
    for name, keys, run in (
        ("Q_ENDTIMER", END_TIMER, "u1,u10,u15"),
        ("Q_DANGERPOINT", ("D_DP", "V_RELEASEDP"), "u1,u15,u7"),
        ("Q_OVERLAP", OVERLAP, "u1,u15,u10,u15,u7"),
    ):
        if p15[name]:
            yield run, p15[name], *[p15[key] for key in keys]
        else:
            yield "u1", p15[name]


def _step_runs(step: Tree) -> Iterator[tuple[Any, ...]]:
    categories = step["categories"]
    yield "u15,u7,u1,u5", step["D_STATIC"], step["V_STATIC"], step["Q_FRONT"], len(categories)
    for category in categories:
        yield "u2,u4,u7" if category["Q_DIFF"] in (0, 1, 2) else "u2,u7", *category.values()
