"""The workload declared with construct, as a user of construct would.

The packets stand in a fixed order here, so construct is spared the choice by NID_PACKET.
"""

from __future__ import annotations

from typing import Any

from construct import (
    BitsInteger,
    Bitwise,
    Construct,
    If,
    Padding,
    PrefixedArray,
    Struct,
    bits2bytes,
    bytes2bits,
    this,
)

Tree = dict[str, Any]

COUNT = BitsInteger(5)


def _fields(text: str) -> list[Construct]:
    pairs = (each.split(":") for each in text.split())
    return [name / BitsInteger(int(width)) for name, width in pairs]


def _when(condition: Any, text: str) -> list[Construct]:
    pairs = (each.split(":") for each in text.split())
    return [name / If(condition, BitsInteger(int(width))) for name, width in pairs]


SECTION = [
    *_fields("L_SECTION:15 Q_SECTIONTIMER:1"),
    *_when(this.Q_SECTIONTIMER == 1, "T_SECTIONTIMER:10 D_SECTIONTIMERSTOPLOC:15"),
]
HEAD = "NID_PACKET:8 Q_DIR:2 L_PACKET:13 Q_SCALE:2"
AUTHORITY = Struct(
    *_fields(HEAD + " V_EMA:7 T_EMA:10"),
    "sections" / PrefixedArray(COUNT, Struct(*SECTION)),
    *_fields("L_ENDSECTION:15 Q_SECTIONTIMER:1"),
    *_when(this.Q_SECTIONTIMER == 1, "T_SECTIONTIMER:10 D_SECTIONTIMERSTOPLOC:15"),
    *_fields("Q_ENDTIMER:1"),
    *_when(this.Q_ENDTIMER == 1, "T_ENDTIMER:10 D_ENDTIMERSTARTLOC:15"),
    *_fields("Q_DANGERPOINT:1"),
    *_when(this.Q_DANGERPOINT == 1, "D_DP:15 V_RELEASEDP:7"),
    *_fields("Q_OVERLAP:1"),
    *_when(this.Q_OVERLAP == 1, "D_STARTOL:15 T_OL:10 D_OL:15 V_RELEASEOL:7"),
)
GRADIENT = Struct(*_fields("D_GRADIENT:15 Q_GDIR:1 G_A:8"))
GRADIENTS = Struct(*_fields(HEAD), "first" / GRADIENT, "further" / PrefixedArray(COUNT, GRADIENT))
CATEGORY = Struct(
    *_fields("Q_DIFF:2"),
    *_when(this.Q_DIFF == 0, "NC_CDDIFF:4"),
    *_when((this.Q_DIFF == 1) | (this.Q_DIFF == 2), "NC_DIFF:4"),
    *_fields("V_DIFF:7"),
)
STEP = Struct(
    *_fields("D_STATIC:15 V_STATIC:7 Q_FRONT:1"), "categories" / PrefixedArray(COUNT, CATEGORY)
)
SPEEDS = Struct(*_fields(HEAD), "first" / STEP, "further" / PrefixedArray(COUNT, STEP))
INNER = Struct(
    "header" / Struct(*_fields("NID_MESSAGE:8 L_MESSAGE:10 T_TRAIN:32 M_ACK:1 NID_LRBG:24")),
    "authority" / AUTHORITY,
    "gradients" / GRADIENTS,
    "speeds" / SPEEDS,
    Padding(1),
)
AS_USED = Bitwise(INNER)
BEST = INNER.compile()


def decode_as_used(data: bytes) -> Any:
    """Parse with the BitStruct."""
    return AS_USED.parse(data)


def decode_best(data: bytes) -> Any:
    """Unfold the bits once and parse them with the compiled struct."""
    return BEST.parse(bytes2bits(data))


def encode_as_used(tree: Tree) -> bytes:
    """Build with the BitStruct."""
    return bytes(AS_USED.build(tree))


def encode_best(tree: Tree) -> bytes:
    """Build single bits with the compiled struct and fold them once."""
    return bytes(bits2bytes(BEST.build(tree)))


def to_ours(parsed: Any) -> Tree:
    """Bring a parsed container into the shape that all decoders are compared in."""
    plain = _plain(parsed)
    for name, key in (("gradients", "gradients"), ("speeds", "steps")):
        packet = plain[name]
        packet[key] = [packet.pop("first"), *packet.pop("further")]
    names = ("authority", "gradients", "speeds")
    return {"header": plain["header"], "packets": [plain[name] for name in names]}


def from_ours(tree: Tree) -> Tree:
    """Bring the workload into the shape construct builds from, before the clock starts."""
    authority, gradients, speeds = (dict(each) for each in tree["packets"])
    absent = {"NC_CDDIFF": None, "NC_DIFF": None}  # construct looks these up even where not built
    speeds["steps"] = [
        step | {"categories": [absent | each for each in step["categories"]]}
        for step in speeds["steps"]
    ]
    for packet, key in ((gradients, "gradients"), (speeds, "steps")):
        packet["first"], *packet["further"] = packet.pop(key)
    return {
        "header": tree["header"],
        "authority": authority,
        "gradients": gradients,
        "speeds": speeds,
    }


def _plain(value: Any) -> Any:
    if isinstance(value, dict):
        return {
            key: _plain(each) for key, each in value.items() if key != "_io" and each is not None
        }
    return [_plain(each) for each in value] if isinstance(value, list) else value
