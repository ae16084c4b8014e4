"""The workload of every benchmark: one movement authority as a radio message of 176 bytes.

Message 3 with packet 15 (5 sections with timers, end timer, danger point, overlap), packet 21
(12 gradients) and packet 27 (a step and ten changes, 2 train categories each): 190 stored
integers, the one padding bit included, in 53 sets. The values are invented and describe no line.
"""

from __future__ import annotations

from typing import Any

Tree = dict[str, Any]

BYTES = 176
INTEGERS = 190
SETS = 53


def _section(index: int) -> Tree:
    return {
        "L_SECTION": 900 + 37 * index,
        "Q_SECTIONTIMER": 1,
        "T_SECTIONTIMER": 240 + 11 * index,
        "D_SECTIONTIMERSTOPLOC": 310 + 5 * index,
    }


def _gradient(index: int) -> Tree:
    return {"D_GRADIENT": 450 * index, "Q_GDIR": index % 2, "G_A": 3 * index}


def _step(index: int) -> Tree:
    return {
        "D_STATIC": 600 * index,
        "V_STATIC": 8 + 2 * index,
        "Q_FRONT": index % 2,
        "categories": [
            {"Q_DIFF": 0, "NC_CDDIFF": index % 10, "V_DIFF": 10 + 2 * index},
            {"Q_DIFF": 1 + index % 2, "NC_DIFF": index % 3, "V_DIFF": 6 + 2 * index},
        ],
    }


TREE: Tree = {
    "medium": "radio",
    "direction": "to-train",
    "version": "2.1",
    "issue": "3.6.0",
    "header": {
        "NID_MESSAGE": 3,
        "L_MESSAGE": BYTES,
        "T_TRAIN": 1_234_567,
        "M_ACK": 0,
        "NID_LRBG": 300 << 14 | 1207,
    },
    "packets": [
        {
            "NID_PACKET": 15,
            "Q_DIR": 1,
            "L_PACKET": 390,
            "Q_SCALE": 1,
            "V_EMA": 0,
            "T_EMA": 1023,
            "sections": [_section(index) for index in range(5)],
            "L_ENDSECTION": 1400,
            "Q_SECTIONTIMER": 1,
            "T_SECTIONTIMER": 300,
            "D_SECTIONTIMERSTOPLOC": 250,
            "Q_ENDTIMER": 1,
            "T_ENDTIMER": 90,
            "D_ENDTIMERSTARTLOC": 700,
            "Q_DANGERPOINT": 1,
            "D_DP": 65,
            "V_RELEASEDP": 5,
            "Q_OVERLAP": 1,
            "D_STARTOL": 620,
            "T_OL": 60,
            "D_OL": 180,
            "V_RELEASEOL": 4,
        },
        {
            "NID_PACKET": 21,
            "Q_DIR": 1,
            "L_PACKET": 318,
            "Q_SCALE": 1,
            "gradients": [_gradient(index) for index in range(12)],
        },
        {
            "NID_PACKET": 27,
            "Q_DIR": 1,
            "L_PACKET": 624,
            "Q_SCALE": 1,
            "steps": [_step(index) for index in range(11)],
        },
    ],
    "padding": {"bits": 1, "hex": "00"},
}


def integers(tree: object) -> int:
    """Count the stored integers of headers and packets."""
    if isinstance(tree, dict):
        return sum(integers(each) for each in tree.values())
    if isinstance(tree, list):
        return sum(integers(each) for each in tree)
    return int(isinstance(tree, int))


def bare(tree: Tree) -> Tree:
    """Return what every decoder of the benchmark gives: header and packets."""
    return {"header": tree["header"], "packets": tree["packets"]}
