"""Facts on what changed between issues of SUBSET-026, written by hand.

They stand in issues 2.3.0 (24/02/2006), 3.3.0 (07/03/2012), 3.6.0 (13/05/2016) and 4.0.0
(05/07/2023): packets in 7.4.2 and 7.4.3, variables in 7.5.1, messages in 8.6 and 8.7 of the two
issues that a row compares. Nothing here was taken from what our comparison says.
"""

from __future__ import annotations

from typing import NamedTuple

A, B, C = ("2.3.0", "3.3.0"), ("3.3.0", "3.6.0"), ("3.6.0", "4.0.0")
STEPS = (A, B, C)
DOWN, UP = "to-train", "to-track"


class Row(NamedTuple):
    """A packet whose rows differ; names of variables in wire order, a list as its N_ITER."""

    step: tuple[str, str]
    direction: str
    number: int
    new: str = ""
    gone: str = ""
    named: str = ""
    width: str = ""
    other: str = ""


TEXT = "Q_CONFTEXTDISPLAY Q_TEXTREPORT NID_TEXTMESSAGE NID_C NID_RBC"
BRAKES = "Q_NVGUIPERM Q_NVSBFBPERM Q_NVINHSMICPERM"
CURVES = (
    "A_NVMAXREDADH1 A_NVMAXREDADH2 A_NVMAXREDADH3 Q_NVLOCACC M_NVAVADH M_NVEBCL Q_NVKINT "
    "Q_NVKVINTSET A_NVP12 A_NVP23 V_NVKVINT M_NVKVINT M_NVKVINT N_ITER N_ITER "
    "L_NVKRINT M_NVKRINT N_ITER M_NVKTINT"
)
STM = "NID_STM>NID_NTC"

ROWS = (
    # One NID_C stands before N_ITER from 3.3.0 on (7.4.2.1.1): a list with one element at least.
    Row(
        A,
        DOWN,
        3,
        new=f"V_NVLIMSUPERV {BRAKES} {CURVES}",
        named="Q_NVSRBKTRG>Q_NVSBTSMPERM",
        other="list:N_ITER place:NID_C",
    ),
    Row(A, DOWN, 27, new="Q_DIFF NC_CDDIFF", other="condition:NC_DIFF"),
    Row(A, DOWN, 39, new="M_VOLTAGE NID_CTRACTION", gone="M_TRACTION"),
    Row(A, DOWN, 41, named=STM),
    Row(A, DOWN, 44, new="NID_NTC"),
    Row(A, DOWN, 46, named=STM),
    Row(A, DOWN, 51, new="D_TRACKINIT M_AXLELOADCAT", gone="M_AXLELOAD"),
    Row(
        A,
        DOWN,
        70,
        new="M_LINEGAUGE M_AXLELOADCAT M_VOLTAGE NID_CTRACTION",
        gone="M_LOADINGGAUGE M_AXLELOAD M_TRACTION",
    ),
    Row(A, DOWN, 72, new=TEXT, named=f"{STM} {STM}"),
    Row(A, DOWN, 76, new=TEXT, named=f"{STM} {STM}"),
    Row(A, DOWN, 79, width="M_POSITION:20>24"),
    Row(A, DOWN, 80, new="Q_MAMODE"),
    Row(A, UP, 0, named=STM),
    Row(A, UP, 1, named=f"NID_PRVBG>NID_PRVLRBG {STM}"),
    Row(
        A,
        UP,
        11,
        new="NC_CDTRAIN M_AXLELOADCAT N_AXLE M_VOLTAGE NID_CTRACTION",
        gone="NID_OPERATIONAL M_AXLELOAD M_TRACTION",
        named=STM,
    ),
    Row(B, DOWN, 12, named="V_LOA>V_EMA T_LOA>T_EMA"),
    Row(B, DOWN, 15, named="V_LOA>V_EMA T_LOA>T_EMA"),
    Row(C, DOWN, 45, new="Q_NETWORKTYPE", other="condition:NID_MN"),
    Row(C, DOWN, 70, new="M_LINEAXLELOADCAT", gone="M_AXLELOADCAT"),
    Row(C, UP, 0, named="Q_LENGTH>Q_INTEGRITY", width="M_MODE:4>5"),
    Row(C, UP, 1, named="Q_LENGTH>Q_INTEGRITY", width="M_MODE:4>5"),
)
"""Packets that both issues have under one number, with other rows; all others have the same."""

NEW_PACKETS: dict[tuple[str, str], set[tuple[str, int]]] = {
    A: {(DOWN, each) for each in (0, 2, 6, 13, 40, 52, 64, 69, 88, 135, 143, 145)} | {(UP, 5)},
    B: {(DOWN, 180), (DOWN, 181), (UP, 2)},
    C: {(DOWN, 31), (DOWN, 32), (UP, 10), (UP, 12)},
}
GONE_PACKETS: dict[tuple[str, str], set[tuple[str, int]]] = {A: set(), B: {(UP, 3)}, C: set()}
RENUMBERED: dict[tuple[str, str], set[tuple[int, int]]] = {
    A: set(),
    B: set(),
    C: {(72, 73), (76, 74)},
}


SENDERS = (
    # 2.3.0 says any, balise or radio; from 3.3.0 on each device is named.
    (A, 3, ("Any",), ("Balise", "RBC")),
    (A, 15, ("Radio",), ("RBC",)),
    (A, 45, ("Any",), ("Balise", "RBC", "RIU")),
    (C, 66, ("Any",), ("Balise", "RBC")),
    (C, 67, ("Balise",), ("Balise", "RBC")),
)


# Codes: what stood there and what stands there; a dash where the code is a plain number or is not
# spoken of, otherwise a word of what is said, or "spare" for spare codes.
CODES = (
    (B, "A_NVMAXREDADH1", 61, "-", "target"),
    (B, "A_NVMAXREDADH2", 62, "-", "indication"),
    (B, "A_NVMAXREDADH3", 63, "-", "display"),
    (C, "D_LOOP", 32767, "unknown", "-"),
    (C, "L_LOOP", 32767, "unknown", "-"),
    (C, "D_LRBG", 32767, "unknown", "beyond"),
    (C, "L_DOUBTOVER", 32767, "unknown", "beyond"),
    (C, "L_DOUBTUNDER", 32767, "unknown", "beyond"),
    (A, "D_VALIDNV", 32767, "-", "now"),
    (A, "L_TAFDISPLAY", 32767, "spare", "-"),
    (A, "M_ADHESION", 0, "70 %", "slippery"),
    (A, "M_ADHESION", 1, "100 %", "non slippery"),
    (A, "M_ERROR", 6, "no fatal", "safety critical"),
    (A, "M_ERROR", 7, "fatal", "double linking"),
    (A, "M_ERROR", 8, "spare", "double repositioning"),
    (C, "M_ERROR", 9, "spare", "odometer"),
    (C, "M_ERROR", 10, "spare", "odometer"),
    (C, "M_LEVEL", 4, "level 3", "spare"),
    (C, "M_LEVELTR", 4, "level 3", "spare"),
    (C, "M_LEVELTEXTDISPLAY", 4, "level 3", "not limited"),
    (C, "M_LEVELTEXTDISPLAY", 5, "not limited", "spare"),
    (A, "M_LOADINGGAUGE", 3, "-", "GB"),
    (A, "M_LOC", 3, "earlier value", "spare"),
    (A, "M_MAMODE", 2, "spare", "limited supervision"),
    (A, "M_MODE", 12, "STM European", "limited supervision"),
    (A, "M_MODE", 13, "STM National", "national system"),
    (A, "M_MODE", 15, "spare", "passive shunting"),
    (C, "M_MODE", 16, "-", "automatic driving"),
    (C, "M_MODE", 17, "-", "supervised manoeuvre"),
    (A, "M_MODETEXTDISPLAY", 3, "shunting", "spare"),
    (A, "M_MODETEXTDISPLAY", 12, "STM European", "limited supervision"),
    (B, "M_MODETEXTDISPLAY", 11, "non leading", "spare"),
    (C, "M_MODETEXTDISPLAY", 3, "spare", "automatic driving"),
    (C, "M_MODETEXTDISPLAY", 5, "spare", "supervised manoeuvre"),
    (A, "M_POSITION", 1048575, "no more", "-"),
    (A, "M_POSITION", 16777215, "-", "no more"),
    (A, "M_TRACKCOND", 0, "non stopping area, tunnel", "non stopping area"),
    (A, "M_TRACKCOND", 1, "non stopping", "tunnel stopping"),
    (A, "M_TRACKCOND", 2, "non stopping", "horn"),
    (A, "M_TRACKCOND", 10, "spare", "eddy current brake for emergency"),
    (A, "M_VERSION", 18, "reserved", "not valid"),
    (B, "M_VERSION", 33, "reserved", "2.1"),
    (C, "M_VERSION", 36, "reserved", "not valid"),
    (C, "M_VERSION", 48, "reserved", "3.0"),
    (A, "NC_DIFF", 0, "active tilting", "freight"),
    (A, "NC_DIFF", 1, "passive tilting", "freight"),
    (A, "NC_DIFF", 2, "cross wind", "passenger"),
    (A, "NC_TRAIN", 4, "cross wind", "passenger"),
    (A, "NID_BG", 16383, "repositioning", "unknown"),
    (A, "NID_OPERATIONAL", 0xFFFFFFFF, "unknown", "spare"),
    (A, "NID_RBC", 16383, "unknown", "last known"),
    (A, "NID_RIU", 16383, "unknown", "-"),
    (A, "Q_EMERGENCYSTOP", 3, "spare", "rejected"),
    (B, "Q_EMERGENCYSTOP", 2, "accepted", "not relevant"),
    (B, "Q_MAMODE", 1, "EOA", "SvL"),
    (C, "Q_MAMODE", 1, "SvL", "temporary SvL"),
    (B, "Q_MARQSTREASON", 2, "pre-indication", "perturbation"),
    (C, "Q_MARQSTREASON", 16, "level 2/3", "level 2 "),
    (A, "Q_NVEMRRLS", 1, "immediate", "below the permitted"),
    (B, "Q_ORIENTATION", 0, "passed", "reverse"),
    (C, "Q_STATUSLRBG", 2, "unknown", "no position"),
    (C, "Q_INTEGRITY", 1, "monitoring device", "external source"),
    (A, "Q_TEXT", 0, "-", "level crossing"),
    (A, "Q_TEXT", 2, "-", "spare"),
    (A, "Q_TEXTCONFIRM", 3, "spare", "emergency brake"),
    (A, "T_CYCRQST", 0, "continuous", "-"),
    (C, "V_TRAIN", 127, "spare", "standstill"),
)


ATTRIBUTES = (
    (B, "A_NVMAXREDADH1", "range", (0, 63), (0, 60)),
    (A, "D_VALIDNV", "range", (0, 32767), (0, 32766)),
    (A, "L_TAFDISPLAY", "range", (0, 32766), (0, 32767)),
    (A, "M_LOADINGGAUGE", "coding", "bitset", "unsigned"),
    (C, "M_MODE", "width", 4, 5),
    (A, "M_POSITION", "width", 20, 24),
    (A, "NID_RIU", "range", (0, 16382), (0, 16383)),
    (A, "NID_NTC", "name", "NID_STM", "NID_NTC"),
    (A, "NID_PRVLRBG", "name", "NID_PRVBG", "NID_PRVLRBG"),
    (A, "Q_NVSBTSMPERM", "name", "Q_NVSRBKTRG", "Q_NVSBTSMPERM"),
    (B, "T_EMA", "name", "T_LOA", "T_EMA"),
    (B, "V_EMA", "name", "V_LOA", "V_EMA"),
    (C, "Q_INTEGRITY", "name", "Q_LENGTH", "Q_INTEGRITY"),
    (C, "Q_STATUSLRBG", "name", "Q_STATUS", "Q_STATUSLRBG"),
)


class Sent(NamedTuple):
    """A message that differs: fields, required packets, optional packets (sender behind a /)."""

    step: tuple[str, str]
    direction: str
    number: int
    new: str = ""
    gone: str = ""
    named: str = ""
    required: tuple[str, str] | None = None
    options: str = ""
    dropped: str = ""


COMMON_230 = "3 5 39 41 42 44 45 51 57 58 65 66 68 70 71 72 76 79 131 138 139 140"
COMMON_330 = "3 5 39 40 41 42 44 45 51 52 57 58 64 65 66 68 69 70 71 72 76 79 88 131 138 139 140"


def by_sender(sender: str, packets: str) -> str:
    return " ".join(f"{each}/{sender}" for each in packets.split())


def ascending(packets: str) -> str:
    return " ".join(sorted(packets.split(), key=int))


MESSAGES = (
    Sent(A, DOWN, 3, options="40 52 64 69 88"),
    Sent(A, DOWN, 9, options="49"),
    Sent(A, DOWN, 15, new="D_REF"),
    Sent(
        A,
        DOWN,
        24,
        options=f"{by_sender('RBC', ascending(f'21 27 {COMMON_330}'))} 45/RIU 143/RIU 254/RIU",
        dropped=ascending(f"21 27 {COMMON_230}"),
    ),
    # 49 and the common list before, 3, 44 and 49 after (8.7.11).
    Sent(
        A,
        DOWN,
        28,
        dropped="5 39 41 42 45 51 57 58 65 66 68 70 71 72 76 79 131 138 139 140",
    ),
    Sent(A, DOWN, 33, options="40 52 64 69 88"),
    Sent(A, DOWN, 34, new="D_REF"),
    Sent(A, DOWN, 37, options="40 69 88", dropped="3 42 45 57 58 72 76 79 131 140"),
    Sent(A, UP, 132, new="Q_MARQSTREASON", gone="Q_TRACKDEL"),
    Sent(A, UP, 136, options="5"),
    Sent(A, UP, 157, options="5"),
    Sent(B, DOWN, 3, options="180"),
    Sent(B, DOWN, 24, options="180/RBC 44/RIU 180/RIU"),
    Sent(B, DOWN, 33, options="180"),
    Sent(B, DOWN, 37, options="52"),
    Sent(B, UP, 159, required=("", "2"), dropped="3"),
    Sent(C, DOWN, 3, options="31 32 67 73 74", dropped="72 76"),
    Sent(C, DOWN, 24, options=by_sender("RBC", "31 32 67 73 74"), dropped="72/RBC 76/RBC"),
    Sent(C, DOWN, 33, options="31 32 67 73 74", dropped="72 76"),
    Sent(C, DOWN, 37, dropped="66"),
    Sent(C, UP, 150, new="Q_DESK"),
    Sent(C, UP, 157, named="Q_STATUS>Q_STATUSLRBG", options="10 11"),
)
"""Messages that both issues have, with other variables or packets; all others have the same."""

NEW_MESSAGES: dict[tuple[str, str], set[tuple[str, int]]] = {
    A: {(UP, 158)},
    B: set(),
    C: {(UP, 131), (UP, 133), (DOWN, 4), (DOWN, 5), (DOWN, 7), (DOWN, 38)},
}
GONE_MESSAGES: dict[tuple[str, str], set[tuple[str, int]]] = {A: set(), B: {(DOWN, 38)}, C: set()}
