"""Readers and writers of SUBSET-026, layouts v3_3_0.

Written by ``python -m fishplate.engine.generate`` from the registry; never edit it.
"""

from __future__ import annotations

from fishplate.bits import digits_text, digits_value
from fishplate.engine.generated import v3_6_0
from fishplate.engine.runtime import Codec, Misfit, Tree


def read_to_train_12(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 54
    w0 = n >> p & 18014398509481983
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 12, "Q_DIR": w0 >> 44 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 29 & 3, "V_MAIN": w0 >> 22 & 127, "V_LOA": w0 >> 15 & 127, "T_LOA": w0 >> 5 & 1023, "sections": s0}
    while c0:
        c0 -= 1
        w = n >> p - 41 & 2199023255551
        if w & 33554432:
            p -= 41
            s0.append({"L_SECTION": w >> 26, "Q_SECTIONTIMER": 1, "T_SECTIONTIMER": w >> 15 & 1023, "D_SECTIONTIMERSTOPLOC": w & 32767})
        else:
            p -= 16
            s0.append({"L_SECTION": w >> 26, "Q_SECTIONTIMER": 0})
    p -= 16
    w1 = n >> p & 65535
    q0 = w1 & 1
    t0["L_ENDSECTION"] = w1 >> 1
    t0["Q_SECTIONTIMER"] = q0
    if q0:
        p -= 25
        w2 = n >> p & 33554431
        t0["T_SECTIONTIMER"] = w2 >> 15
        t0["D_SECTIONTIMERSTOPLOC"] = w2 & 32767
    p -= 1
    w3 = n >> p & 1
    q1 = w3
    t0["Q_ENDTIMER"] = q1
    if q1:
        p -= 25
        w4 = n >> p & 33554431
        t0["T_ENDTIMER"] = w4 >> 15
        t0["D_ENDTIMERSTARTLOC"] = w4 & 32767
    p -= 1
    w5 = n >> p & 1
    q2 = w5
    t0["Q_DANGERPOINT"] = q2
    if q2:
        p -= 22
        w6 = n >> p & 4194303
        t0["D_DP"] = w6 >> 7
        t0["V_RELEASEDP"] = w6 & 127
    p -= 1
    w7 = n >> p & 1
    q3 = w7
    t0["Q_OVERLAP"] = q3
    if q3:
        p -= 47
        w8 = n >> p & 140737488355327
        t0["D_STARTOL"] = w8 >> 32
        t0["T_OL"] = w8 >> 22 & 1023
        t0["D_OL"] = w8 >> 7 & 32767
        t0["V_RELEASEOL"] = w8 & 127
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_12(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 12
    s0 = t["sections"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["V_MAIN"]
    x3 = t["V_LOA"]
    x4 = t["T_LOA"]
    if x0 >> 2 | x1 >> 2 | x2 >> 7 | x3 >> 7 | x4 >> 10 | c0 >> 5:
        raise Misfit
    v = 12 << 46 | x0 << 44 | x1 << 29 | x2 << 22 | x3 << 15 | x4 << 5 | c0
    for e0 in s0:
        x5 = e0["L_SECTION"]
        x6 = e0["Q_SECTIONTIMER"]
        if x6 == 1:
            x7 = e0["T_SECTIONTIMER"]
            x8 = e0["D_SECTIONTIMERSTOPLOC"]
            if x5 >> 15 | x7 >> 10 | x8 >> 15 or len(e0) != 4:
                raise Misfit
            v = v << 41 | x5 << 26 | x6 << 25 | x7 << 15 | x8
            b += 25
        else:
            if x5 >> 15 | x6 >> 1 or len(e0) != 2:
                raise Misfit
            v = v << 16 | x5 << 1 | x6
    b += 16 * c0
    x9 = t["L_ENDSECTION"]
    x10 = t["Q_SECTIONTIMER"]
    if x9 >> 15 | x10 >> 1:
        raise Misfit
    v = v << 16 | x9 << 1 | x10
    if x10:
        x11 = t["T_SECTIONTIMER"]
        x12 = t["D_SECTIONTIMERSTOPLOC"]
        if x11 >> 10 | x12 >> 15:
            raise Misfit
        v = v << 25 | x11 << 15 | x12
        b += 25
        k0 += 2
    x13 = t["Q_ENDTIMER"]
    if x13 >> 1:
        raise Misfit
    v = v << 1 | x13
    if x13:
        x14 = t["T_ENDTIMER"]
        x15 = t["D_ENDTIMERSTARTLOC"]
        if x14 >> 10 | x15 >> 15:
            raise Misfit
        v = v << 25 | x14 << 15 | x15
        b += 25
        k0 += 2
    x16 = t["Q_DANGERPOINT"]
    if x16 >> 1:
        raise Misfit
    v = v << 1 | x16
    if x16:
        x17 = t["D_DP"]
        x18 = t["V_RELEASEDP"]
        if x17 >> 15 | x18 >> 7:
            raise Misfit
        v = v << 22 | x17 << 7 | x18
        b += 22
        k0 += 2
    x19 = t["Q_OVERLAP"]
    if x19 >> 1:
        raise Misfit
    v = v << 1 | x19
    if x19:
        x20 = t["D_STARTOL"]
        x21 = t["T_OL"]
        x22 = t["D_OL"]
        x23 = t["V_RELEASEOL"]
        if x20 >> 15 | x21 >> 10 | x22 >> 15 | x23 >> 7:
            raise Misfit
        v = v << 47 | x20 << 32 | x21 << 22 | x22 << 7 | x23
        b += 47
        k0 += 4
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 73


def read_to_train_15(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 47
    w0 = n >> p & 140737488355327
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 15, "Q_DIR": w0 >> 37 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 22 & 3, "V_LOA": w0 >> 15 & 127, "T_LOA": w0 >> 5 & 1023, "sections": s0}
    while c0:
        c0 -= 1
        w = n >> p - 41 & 2199023255551
        if w & 33554432:
            p -= 41
            s0.append({"L_SECTION": w >> 26, "Q_SECTIONTIMER": 1, "T_SECTIONTIMER": w >> 15 & 1023, "D_SECTIONTIMERSTOPLOC": w & 32767})
        else:
            p -= 16
            s0.append({"L_SECTION": w >> 26, "Q_SECTIONTIMER": 0})
    p -= 16
    w1 = n >> p & 65535
    q0 = w1 & 1
    t0["L_ENDSECTION"] = w1 >> 1
    t0["Q_SECTIONTIMER"] = q0
    if q0:
        p -= 25
        w2 = n >> p & 33554431
        t0["T_SECTIONTIMER"] = w2 >> 15
        t0["D_SECTIONTIMERSTOPLOC"] = w2 & 32767
    p -= 1
    w3 = n >> p & 1
    q1 = w3
    t0["Q_ENDTIMER"] = q1
    if q1:
        p -= 25
        w4 = n >> p & 33554431
        t0["T_ENDTIMER"] = w4 >> 15
        t0["D_ENDTIMERSTARTLOC"] = w4 & 32767
    p -= 1
    w5 = n >> p & 1
    q2 = w5
    t0["Q_DANGERPOINT"] = q2
    if q2:
        p -= 22
        w6 = n >> p & 4194303
        t0["D_DP"] = w6 >> 7
        t0["V_RELEASEDP"] = w6 & 127
    p -= 1
    w7 = n >> p & 1
    q3 = w7
    t0["Q_OVERLAP"] = q3
    if q3:
        p -= 47
        w8 = n >> p & 140737488355327
        t0["D_STARTOL"] = w8 >> 32
        t0["T_OL"] = w8 >> 22 & 1023
        t0["D_OL"] = w8 >> 7 & 32767
        t0["V_RELEASEOL"] = w8 & 127
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_15(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 11
    s0 = t["sections"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["V_LOA"]
    x3 = t["T_LOA"]
    if x0 >> 2 | x1 >> 2 | x2 >> 7 | x3 >> 10 | c0 >> 5:
        raise Misfit
    v = 15 << 39 | x0 << 37 | x1 << 22 | x2 << 15 | x3 << 5 | c0
    for e0 in s0:
        x4 = e0["L_SECTION"]
        x5 = e0["Q_SECTIONTIMER"]
        if x5 == 1:
            x6 = e0["T_SECTIONTIMER"]
            x7 = e0["D_SECTIONTIMERSTOPLOC"]
            if x4 >> 15 | x6 >> 10 | x7 >> 15 or len(e0) != 4:
                raise Misfit
            v = v << 41 | x4 << 26 | x5 << 25 | x6 << 15 | x7
            b += 25
        else:
            if x4 >> 15 | x5 >> 1 or len(e0) != 2:
                raise Misfit
            v = v << 16 | x4 << 1 | x5
    b += 16 * c0
    x8 = t["L_ENDSECTION"]
    x9 = t["Q_SECTIONTIMER"]
    if x8 >> 15 | x9 >> 1:
        raise Misfit
    v = v << 16 | x8 << 1 | x9
    if x9:
        x10 = t["T_SECTIONTIMER"]
        x11 = t["D_SECTIONTIMERSTOPLOC"]
        if x10 >> 10 | x11 >> 15:
            raise Misfit
        v = v << 25 | x10 << 15 | x11
        b += 25
        k0 += 2
    x12 = t["Q_ENDTIMER"]
    if x12 >> 1:
        raise Misfit
    v = v << 1 | x12
    if x12:
        x13 = t["T_ENDTIMER"]
        x14 = t["D_ENDTIMERSTARTLOC"]
        if x13 >> 10 | x14 >> 15:
            raise Misfit
        v = v << 25 | x13 << 15 | x14
        b += 25
        k0 += 2
    x15 = t["Q_DANGERPOINT"]
    if x15 >> 1:
        raise Misfit
    v = v << 1 | x15
    if x15:
        x16 = t["D_DP"]
        x17 = t["V_RELEASEDP"]
        if x16 >> 15 | x17 >> 7:
            raise Misfit
        v = v << 22 | x16 << 7 | x17
        b += 22
        k0 += 2
    x18 = t["Q_OVERLAP"]
    if x18 >> 1:
        raise Misfit
    v = v << 1 | x18
    if x18:
        x19 = t["D_STARTOL"]
        x20 = t["T_OL"]
        x21 = t["D_OL"]
        x22 = t["V_RELEASEOL"]
        if x19 >> 15 | x20 >> 10 | x21 >> 15 | x22 >> 7:
            raise Misfit
        v = v << 47 | x19 << 32 | x20 << 22 | x21 << 7 | x22
        b += 47
        k0 += 4
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 66


def read_to_track_3(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 26
    w0 = n >> p & 67108863
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 3, "L_PACKET": length, "telephone_numbers": s0}
    while c0:
        c0 -= 1
        if p > 1024:
            n &= (1 << p) - 1
        p -= 64
        w1 = n >> p & 18446744073709551615
        e0: Tree = {"NID_RADIO": digits_text(w1, 16)}
        s0.append(e0)
    return t0, p


def write_to_track_3(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["telephone_numbers"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    if c0 >> 5:
        raise Misfit
    v = 3 << 18 | c0
    for e0 in s0:
        x0 = digits_value(e0["NID_RADIO"], 16)
        if len(e0) != 1:
            raise Misfit
        v = v << 64 | x0
    b += 64 * c0
    if len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 26


def read_message_38(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 38, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_38(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 38 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


CODEC = Codec(
    layouts="v3_3_0",
    read_packet={
        "to-train": {
            0: v3_6_0.read_to_train_0,
            2: v3_6_0.read_to_train_2,
            3: v3_6_0.read_to_train_3,
            5: v3_6_0.read_to_train_5,
            6: v3_6_0.read_to_train_6,
            12: read_to_train_12,
            13: v3_6_0.read_to_train_13,
            15: read_to_train_15,
            16: v3_6_0.read_to_train_16,
            21: v3_6_0.read_to_train_21,
            27: v3_6_0.read_to_train_27,
            39: v3_6_0.read_to_train_39,
            40: v3_6_0.read_to_train_40,
            41: v3_6_0.read_to_train_41,
            42: v3_6_0.read_to_train_42,
            44: v3_6_0.read_to_train_44,
            45: v3_6_0.read_to_train_45,
            46: v3_6_0.read_to_train_46,
            49: v3_6_0.read_to_train_49,
            51: v3_6_0.read_to_train_51,
            52: v3_6_0.read_to_train_52,
            57: v3_6_0.read_to_train_57,
            58: v3_6_0.read_to_train_58,
            63: v3_6_0.read_to_train_63,
            64: v3_6_0.read_to_train_64,
            65: v3_6_0.read_to_train_65,
            66: v3_6_0.read_to_train_66,
            67: v3_6_0.read_to_train_67,
            68: v3_6_0.read_to_train_68,
            69: v3_6_0.read_to_train_69,
            70: v3_6_0.read_to_train_70,
            71: v3_6_0.read_to_train_71,
            72: v3_6_0.read_to_train_72,
            76: v3_6_0.read_to_train_76,
            79: v3_6_0.read_to_train_79,
            80: v3_6_0.read_to_train_80,
            88: v3_6_0.read_to_train_88,
            90: v3_6_0.read_to_train_90,
            131: v3_6_0.read_to_train_131,
            132: v3_6_0.read_to_train_132,
            133: v3_6_0.read_to_train_133,
            134: v3_6_0.read_to_train_134,
            135: v3_6_0.read_to_train_135,
            136: v3_6_0.read_to_train_136,
            137: v3_6_0.read_to_train_137,
            138: v3_6_0.read_to_train_138,
            139: v3_6_0.read_to_train_139,
            140: v3_6_0.read_to_train_140,
            141: v3_6_0.read_to_train_141,
            143: v3_6_0.read_to_train_143,
            145: v3_6_0.read_to_train_145,
            254: v3_6_0.read_to_train_254,
            255: v3_6_0.read_to_train_255,
        },
        "to-track": {
            0: v3_6_0.read_to_track_0,
            1: v3_6_0.read_to_track_1,
            3: read_to_track_3,
            4: v3_6_0.read_to_track_4,
            5: v3_6_0.read_to_track_5,
            9: v3_6_0.read_to_track_9,
            11: v3_6_0.read_to_track_11,
            44: v3_6_0.read_to_track_44,
        },
    },
    read_message={
        "to-train": {
            2: v3_6_0.read_message_2,
            3: v3_6_0.read_message_3,
            6: v3_6_0.read_message_6,
            8: v3_6_0.read_message_8,
            9: v3_6_0.read_message_9,
            15: v3_6_0.read_message_15,
            16: v3_6_0.read_message_16,
            18: v3_6_0.read_message_18,
            24: v3_6_0.read_message_24,
            27: v3_6_0.read_message_27,
            28: v3_6_0.read_message_28,
            32: v3_6_0.read_message_32,
            33: v3_6_0.read_message_33,
            34: v3_6_0.read_message_34,
            37: v3_6_0.read_message_37,
            38: read_message_38,
            39: v3_6_0.read_message_39,
            40: v3_6_0.read_message_40,
            41: v3_6_0.read_message_41,
            43: v3_6_0.read_message_43,
            45: v3_6_0.read_message_45,
        },
        "to-track": {
            129: v3_6_0.read_message_129,
            130: v3_6_0.read_message_130,
            132: v3_6_0.read_message_132,
            136: v3_6_0.read_message_136,
            137: v3_6_0.read_message_137,
            138: v3_6_0.read_message_138,
            146: v3_6_0.read_message_146,
            147: v3_6_0.read_message_147,
            149: v3_6_0.read_message_149,
            150: v3_6_0.read_message_150,
            153: v3_6_0.read_message_153,
            154: v3_6_0.read_message_154,
            155: v3_6_0.read_message_155,
            156: v3_6_0.read_message_156,
            157: v3_6_0.read_message_157,
            158: v3_6_0.read_message_158,
            159: v3_6_0.read_message_159,
        },
    },
    read_header={"balise": v3_6_0.read_balise, "loop": v3_6_0.read_loop},
    write_packet={
        "to-train": {
            0: v3_6_0.write_to_train_0,
            2: v3_6_0.write_to_train_2,
            3: v3_6_0.write_to_train_3,
            5: v3_6_0.write_to_train_5,
            6: v3_6_0.write_to_train_6,
            12: write_to_train_12,
            13: v3_6_0.write_to_train_13,
            15: write_to_train_15,
            16: v3_6_0.write_to_train_16,
            21: v3_6_0.write_to_train_21,
            27: v3_6_0.write_to_train_27,
            39: v3_6_0.write_to_train_39,
            40: v3_6_0.write_to_train_40,
            41: v3_6_0.write_to_train_41,
            42: v3_6_0.write_to_train_42,
            44: v3_6_0.write_to_train_44,
            45: v3_6_0.write_to_train_45,
            46: v3_6_0.write_to_train_46,
            49: v3_6_0.write_to_train_49,
            51: v3_6_0.write_to_train_51,
            52: v3_6_0.write_to_train_52,
            57: v3_6_0.write_to_train_57,
            58: v3_6_0.write_to_train_58,
            63: v3_6_0.write_to_train_63,
            64: v3_6_0.write_to_train_64,
            65: v3_6_0.write_to_train_65,
            66: v3_6_0.write_to_train_66,
            67: v3_6_0.write_to_train_67,
            68: v3_6_0.write_to_train_68,
            69: v3_6_0.write_to_train_69,
            70: v3_6_0.write_to_train_70,
            71: v3_6_0.write_to_train_71,
            72: v3_6_0.write_to_train_72,
            76: v3_6_0.write_to_train_76,
            79: v3_6_0.write_to_train_79,
            80: v3_6_0.write_to_train_80,
            88: v3_6_0.write_to_train_88,
            90: v3_6_0.write_to_train_90,
            131: v3_6_0.write_to_train_131,
            132: v3_6_0.write_to_train_132,
            133: v3_6_0.write_to_train_133,
            134: v3_6_0.write_to_train_134,
            135: v3_6_0.write_to_train_135,
            136: v3_6_0.write_to_train_136,
            137: v3_6_0.write_to_train_137,
            138: v3_6_0.write_to_train_138,
            139: v3_6_0.write_to_train_139,
            140: v3_6_0.write_to_train_140,
            141: v3_6_0.write_to_train_141,
            143: v3_6_0.write_to_train_143,
            145: v3_6_0.write_to_train_145,
            254: v3_6_0.write_to_train_254,
            255: v3_6_0.write_to_train_255,
        },
        "to-track": {
            0: v3_6_0.write_to_track_0,
            1: v3_6_0.write_to_track_1,
            3: write_to_track_3,
            4: v3_6_0.write_to_track_4,
            5: v3_6_0.write_to_track_5,
            9: v3_6_0.write_to_track_9,
            11: v3_6_0.write_to_track_11,
            44: v3_6_0.write_to_track_44,
        },
    },
    write_message={
        "to-train": {
            2: v3_6_0.write_message_2,
            3: v3_6_0.write_message_3,
            6: v3_6_0.write_message_6,
            8: v3_6_0.write_message_8,
            9: v3_6_0.write_message_9,
            15: v3_6_0.write_message_15,
            16: v3_6_0.write_message_16,
            18: v3_6_0.write_message_18,
            24: v3_6_0.write_message_24,
            27: v3_6_0.write_message_27,
            28: v3_6_0.write_message_28,
            32: v3_6_0.write_message_32,
            33: v3_6_0.write_message_33,
            34: v3_6_0.write_message_34,
            37: v3_6_0.write_message_37,
            38: write_message_38,
            39: v3_6_0.write_message_39,
            40: v3_6_0.write_message_40,
            41: v3_6_0.write_message_41,
            43: v3_6_0.write_message_43,
            45: v3_6_0.write_message_45,
        },
        "to-track": {
            129: v3_6_0.write_message_129,
            130: v3_6_0.write_message_130,
            132: v3_6_0.write_message_132,
            136: v3_6_0.write_message_136,
            137: v3_6_0.write_message_137,
            138: v3_6_0.write_message_138,
            146: v3_6_0.write_message_146,
            147: v3_6_0.write_message_147,
            149: v3_6_0.write_message_149,
            150: v3_6_0.write_message_150,
            153: v3_6_0.write_message_153,
            154: v3_6_0.write_message_154,
            155: v3_6_0.write_message_155,
            156: v3_6_0.write_message_156,
            157: v3_6_0.write_message_157,
            158: v3_6_0.write_message_158,
            159: v3_6_0.write_message_159,
        },
    },
    write_header={"balise": v3_6_0.write_balise, "loop": v3_6_0.write_loop},
    unmeasured={"to-train": {0: 14, 255: 8}, "to-track": {}},
    forms={"to-train": {}, "to-track": {}},
    since={"to-train": {}, "to-track": {}},
    evidence=(),
)
