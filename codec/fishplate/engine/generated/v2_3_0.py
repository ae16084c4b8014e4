"""Readers and writers of SUBSET-026, layouts v2_3_0.

Written by ``python -m fishplate.engine.generate`` from the registry; never edit it.
"""

from __future__ import annotations

from fishplate.bits import digits_text, digits_value
from fishplate.engine.generated import v3_6_0
from fishplate.engine.generated import x1_chapter6
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


def read_to_train_41(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 43
    w0 = n >> p & 8796093022207
    q0 = w0 & 7
    t0: Tree = {"NID_PACKET": 41, "Q_DIR": w0 >> 33 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 18 & 3, "D_LEVELTR": w0 >> 3 & 32767}
    e0: Tree = {"M_LEVELTR": q0}
    if q0 == 1:
        p -= 8
        w1 = n >> p & 255
        e0["NID_STM"] = w1
    p -= 15
    w2 = n >> p & 32767
    e0["L_ACKLEVELTR"] = w2
    p -= 5
    w3 = n >> p & 31
    c0 = w3
    s0: list[Tree] = [e0]
    t0["levels"] = s0
    while c0:
        c0 -= 1
        w = n >> p - 26 & 67108863
        if (w >> 23 & 7) == 1:
            p -= 26
            s0.append({"M_LEVELTR": 1, "NID_STM": w >> 15 & 255, "L_ACKLEVELTR": w & 32767})
        else:
            p -= 18
            s0.append({"M_LEVELTR": w >> 23, "L_ACKLEVELTR": w >> 8 & 32767})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_41(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["levels"]
    c0 = len(s0) - 1
    e0 = s0[0]
    k0 = 2
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_LEVELTR"]
    x3 = e0["M_LEVELTR"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 3:
        raise Misfit
    v = 41 << 35 | x0 << 33 | x1 << 18 | x2 << 3 | x3
    if x3 == 1:
        x4 = e0["NID_STM"]
        if x4 >> 8:
            raise Misfit
        v = v << 8 | x4
        b += 8
        k0 += 1
    if len(e0) != k0:
        raise Misfit
    x5 = e0["L_ACKLEVELTR"]
    if x5 >> 15 | c0 >> 5:
        raise Misfit
    v = v << 20 | x5 << 5 | c0
    for e0 in s0[1:]:
        x6 = e0["M_LEVELTR"]
        if x6 == 1:
            x7 = e0["NID_STM"]
            x8 = e0["L_ACKLEVELTR"]
            if x7 >> 8 | x8 >> 15 or len(e0) != 3:
                raise Misfit
            v = v << 26 | x6 << 23 | x7 << 15 | x8
            b += 8
        else:
            x9 = e0["L_ACKLEVELTR"]
            if x6 >> 3 | x9 >> 15 or len(e0) != 2:
                raise Misfit
            v = v << 18 | x6 << 15 | x9
    b += 18 * c0
    if len(t) != 5 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 63


def read_to_train_46(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 7
    t0: Tree = {"NID_PACKET": 46, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length}
    e0: Tree = {"M_LEVELTR": q0}
    if q0 == 1:
        p -= 8
        w1 = n >> p & 255
        e0["NID_STM"] = w1
    p -= 5
    w2 = n >> p & 31
    c0 = w2
    s0: list[Tree] = [e0]
    t0["levels"] = s0
    while c0:
        c0 -= 1
        w = n >> p - 11 & 2047
        if (w >> 8 & 7) == 1:
            p -= 11
            s0.append({"M_LEVELTR": 1, "NID_STM": w & 255})
        else:
            p -= 3
            s0.append({"M_LEVELTR": w >> 8})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_46(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["levels"]
    c0 = len(s0) - 1
    e0 = s0[0]
    k0 = 1
    x0 = t["Q_DIR"]
    x1 = e0["M_LEVELTR"]
    if x0 >> 2 | x1 >> 3:
        raise Misfit
    v = 46 << 18 | x0 << 16 | x1
    if x1 == 1:
        x2 = e0["NID_STM"]
        if x2 >> 8:
            raise Misfit
        v = v << 8 | x2
        b += 8
        k0 += 1
    if len(e0) != k0:
        raise Misfit
    if c0 >> 5:
        raise Misfit
    v = v << 5 | c0
    for e0 in s0[1:]:
        x3 = e0["M_LEVELTR"]
        if x3 == 1:
            x4 = e0["NID_STM"]
            if x4 >> 8 or len(e0) != 2:
                raise Misfit
            v = v << 11 | x3 << 8 | x4
            b += 8
        else:
            if x3 >> 3 or len(e0) != 1:
                raise Misfit
            v = v << 3 | x3
    b += 3 * c0
    if len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 31


def read_to_train_70(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 70, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_TRACKINIT": q0}
    if q0:
        p -= 15
        w1 = n >> p & 32767
        t0["D_TRACKINIT"] = w1
    if not q0:
        p -= 17
        w2 = n >> p & 131071
        q1 = w2 & 3
        e0: Tree = {"D_SUITABILITY": w2 >> 2, "Q_SUITABILITY": q1}
        if q1 == 0:
            p -= 8
            w3 = n >> p & 255
            e0["M_LOADINGGAUGE"] = w3
        if q1 == 1:
            p -= 7
            w4 = n >> p & 127
            e0["M_AXLELOAD"] = w4
        if q1 == 2:
            p -= 8
            w5 = n >> p & 255
            e0["M_TRACTION"] = w5
        p -= 5
        w6 = n >> p & 31
        c0 = w6
        s0: list[Tree] = [e0]
        t0["suitabilities"] = s0
        while c0:
            c0 -= 1
            w = n >> p - 25 & 33554431
            if (w >> 8 & 3) == 0:
                p -= 25
                s0.append({"D_SUITABILITY": w >> 10, "Q_SUITABILITY": 0, "M_LOADINGGAUGE": w & 255})
            elif (w >> 8 & 3) == 1:
                p -= 24
                s0.append({"D_SUITABILITY": w >> 10, "Q_SUITABILITY": 1, "M_AXLELOAD": w >> 1 & 127})
            elif (w >> 8 & 3) == 2:
                p -= 25
                s0.append({"D_SUITABILITY": w >> 10, "Q_SUITABILITY": 2, "M_TRACTION": w & 255})
            else:
                p -= 17
                s0.append({"D_SUITABILITY": w >> 10, "Q_SUITABILITY": 3})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_70(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TRACKINIT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 70 << 18 | x0 << 16 | x1 << 1 | x2
    if x2:
        x3 = t["D_TRACKINIT"]
        if x3 >> 15:
            raise Misfit
        v = v << 15 | x3
        b += 15
        k0 += 1
    if not x2:
        s0 = t["suitabilities"]
        c0 = len(s0) - 1
        e0 = s0[0]
        k1 = 2
        x4 = e0["D_SUITABILITY"]
        x5 = e0["Q_SUITABILITY"]
        if x4 >> 15 | x5 >> 2:
            raise Misfit
        v = v << 17 | x4 << 2 | x5
        if x5 == 0:
            x6 = e0["M_LOADINGGAUGE"]
            if x6 >> 8:
                raise Misfit
            v = v << 8 | x6
            b += 8
            k1 += 1
        if x5 == 1:
            x7 = e0["M_AXLELOAD"]
            if x7 >> 7:
                raise Misfit
            v = v << 7 | x7
            b += 7
            k1 += 1
        if x5 == 2:
            x8 = e0["M_TRACTION"]
            if x8 >> 8:
                raise Misfit
            v = v << 8 | x8
            b += 8
            k1 += 1
        if len(e0) != k1:
            raise Misfit
        if c0 >> 5:
            raise Misfit
        v = v << 5 | c0
        for e0 in s0[1:]:
            x9 = e0["D_SUITABILITY"]
            x10 = e0["Q_SUITABILITY"]
            if x10 == 0:
                x11 = e0["M_LOADINGGAUGE"]
                if x9 >> 15 | x11 >> 8 or len(e0) != 3:
                    raise Misfit
                v = v << 25 | x9 << 10 | x10 << 8 | x11
            else:
                if x10 == 1:
                    x12 = e0["M_AXLELOAD"]
                    if x9 >> 15 | x12 >> 7 or len(e0) != 3:
                        raise Misfit
                    v = v << 24 | x9 << 9 | x10 << 7 | x12
                    b += -1
                else:
                    if x10 == 2:
                        x13 = e0["M_TRACTION"]
                        if x9 >> 15 | x13 >> 8 or len(e0) != 3:
                            raise Misfit
                        v = v << 25 | x9 << 10 | x10 << 8 | x13
                    else:
                        if x9 >> 15 | x10 >> 2 or len(e0) != 2:
                            raise Misfit
                        v = v << 17 | x9 << 2 | x10
                        b += -8
        b += 25 * c0
        b += 22
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 26


def read_to_train_72(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 28
    w0 = n >> p & 268435455
    t0: Tree = {"NID_PACKET": 72, "Q_DIR": w0 >> 18 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 3 & 3, "Q_TEXTCLASS": w0 >> 1 & 3, "Q_TEXTDISPLAY": w0 & 1}
    p -= 22
    w1 = n >> p & 4194303
    q0 = w1 & 7
    g0: Tree = {"D_TEXTDISPLAY": w1 >> 7, "M_MODETEXTDISPLAY": w1 >> 3 & 15, "M_LEVELTEXTDISPLAY": q0}
    if q0 == 1:
        p -= 8
        w2 = n >> p & 255
        g0["NID_STM"] = w2
    t0["start"] = g0
    p -= 32
    w3 = n >> p & 4294967295
    q1 = w3 & 7
    g1: Tree = {"L_TEXTDISPLAY": w3 >> 17, "T_TEXTDISPLAY": w3 >> 7 & 1023, "M_MODETEXTDISPLAY": w3 >> 3 & 15, "M_LEVELTEXTDISPLAY": q1}
    if q1 == 1:
        p -= 8
        w4 = n >> p & 255
        g1["NID_STM"] = w4
    t0["end"] = g1
    p -= 10
    w5 = n >> p & 1023
    c0 = w5 & 255
    t0["Q_TEXTCONFIRM"] = w5 >> 8
    p -= 8 * c0
    t0["X_TEXT"] = (n >> p & (1 << 8 * c0) - 1).to_bytes(c0).decode("latin-1")
    return t0, p


def write_to_train_72(t: Tree) -> tuple[int, int]:
    b = 0
    g0 = t["start"]
    k0 = 3
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TEXTCLASS"]
    x3 = t["Q_TEXTDISPLAY"]
    x4 = g0["D_TEXTDISPLAY"]
    x5 = g0["M_MODETEXTDISPLAY"]
    x6 = g0["M_LEVELTEXTDISPLAY"]
    if x0 >> 2 | x1 >> 2 | x2 >> 2 | x3 >> 1 | x4 >> 15 | x5 >> 4 | x6 >> 3:
        raise Misfit
    v = 72 << 42 | x0 << 40 | x1 << 25 | x2 << 23 | x3 << 22 | x4 << 7 | x5 << 3 | x6
    if x6 == 1:
        x7 = g0["NID_STM"]
        if x7 >> 8:
            raise Misfit
        v = v << 8 | x7
        b += 8
        k0 += 1
    if len(g0) != k0:
        raise Misfit
    g1 = t["end"]
    k1 = 4
    x8 = g1["L_TEXTDISPLAY"]
    x9 = g1["T_TEXTDISPLAY"]
    x10 = g1["M_MODETEXTDISPLAY"]
    x11 = g1["M_LEVELTEXTDISPLAY"]
    if x8 >> 15 | x9 >> 10 | x10 >> 4 | x11 >> 3:
        raise Misfit
    v = v << 32 | x8 << 17 | x9 << 7 | x10 << 3 | x11
    if x11 == 1:
        x12 = g1["NID_STM"]
        if x12 >> 8:
            raise Misfit
        v = v << 8 | x12
        b += 8
        k1 += 1
    if len(g1) != k1:
        raise Misfit
    x14 = t["X_TEXT"].encode("latin-1")
    c0 = len(x14)
    x13 = t["Q_TEXTCONFIRM"]
    if x13 >> 2 | c0 >> 8:
        raise Misfit
    v = v << 10 | x13 << 8 | c0
    v = v << 8 * c0 | int.from_bytes(x14)
    b += 8 * c0
    if len(t) != 9 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 92


def read_to_train_76(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 28
    w0 = n >> p & 268435455
    t0: Tree = {"NID_PACKET": 76, "Q_DIR": w0 >> 18 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 3 & 3, "Q_TEXTCLASS": w0 >> 1 & 3, "Q_TEXTDISPLAY": w0 & 1}
    p -= 22
    w1 = n >> p & 4194303
    q0 = w1 & 7
    g0: Tree = {"D_TEXTDISPLAY": w1 >> 7, "M_MODETEXTDISPLAY": w1 >> 3 & 15, "M_LEVELTEXTDISPLAY": q0}
    if q0 == 1:
        p -= 8
        w2 = n >> p & 255
        g0["NID_STM"] = w2
    t0["start"] = g0
    p -= 32
    w3 = n >> p & 4294967295
    q1 = w3 & 7
    g1: Tree = {"L_TEXTDISPLAY": w3 >> 17, "T_TEXTDISPLAY": w3 >> 7 & 1023, "M_MODETEXTDISPLAY": w3 >> 3 & 15, "M_LEVELTEXTDISPLAY": q1}
    if q1 == 1:
        p -= 8
        w4 = n >> p & 255
        g1["NID_STM"] = w4
    t0["end"] = g1
    p -= 10
    w5 = n >> p & 1023
    t0["Q_TEXTCONFIRM"] = w5 >> 8
    t0["Q_TEXT"] = w5 & 255
    return t0, p


def write_to_train_76(t: Tree) -> tuple[int, int]:
    b = 0
    g0 = t["start"]
    k0 = 3
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TEXTCLASS"]
    x3 = t["Q_TEXTDISPLAY"]
    x4 = g0["D_TEXTDISPLAY"]
    x5 = g0["M_MODETEXTDISPLAY"]
    x6 = g0["M_LEVELTEXTDISPLAY"]
    if x0 >> 2 | x1 >> 2 | x2 >> 2 | x3 >> 1 | x4 >> 15 | x5 >> 4 | x6 >> 3:
        raise Misfit
    v = 76 << 42 | x0 << 40 | x1 << 25 | x2 << 23 | x3 << 22 | x4 << 7 | x5 << 3 | x6
    if x6 == 1:
        x7 = g0["NID_STM"]
        if x7 >> 8:
            raise Misfit
        v = v << 8 | x7
        b += 8
        k0 += 1
    if len(g0) != k0:
        raise Misfit
    g1 = t["end"]
    k1 = 4
    x8 = g1["L_TEXTDISPLAY"]
    x9 = g1["T_TEXTDISPLAY"]
    x10 = g1["M_MODETEXTDISPLAY"]
    x11 = g1["M_LEVELTEXTDISPLAY"]
    if x8 >> 15 | x9 >> 10 | x10 >> 4 | x11 >> 3:
        raise Misfit
    v = v << 32 | x8 << 17 | x9 << 7 | x10 << 3 | x11
    if x11 == 1:
        x12 = g1["NID_STM"]
        if x12 >> 8:
            raise Misfit
        v = v << 8 | x12
        b += 8
        k1 += 1
    if len(g1) != k1:
        raise Misfit
    x13 = t["Q_TEXTCONFIRM"]
    x14 = t["Q_TEXT"]
    if x13 >> 2 | x14 >> 8 or len(t) != 9 + ("L_PACKET" in t):
        raise Misfit
    v = v << 10 | x13 << 8 | x14
    return v, b + 92


def read_to_track_0(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 47
    w0 = n >> p & 140737488355327
    p -= 51
    w1 = n >> p & 2251799813685247
    q0 = w1 & 3
    t0: Tree = {"NID_PACKET": 0, "L_PACKET": length, "Q_SCALE": w0 >> 24 & 3, "NID_LRBG": w0 & 16777215, "D_LRBG": w1 >> 36, "Q_DIRLRBG": w1 >> 34 & 3, "Q_DLRBG": w1 >> 32 & 3, "L_DOUBTOVER": w1 >> 17 & 32767, "L_DOUBTUNDER": w1 >> 2 & 32767, "Q_LENGTH": q0}
    if 1 <= q0 <= 2:
        p -= 15
        w2 = n >> p & 32767
        t0["L_TRAININT"] = w2
    p -= 16
    w3 = n >> p & 65535
    q1 = w3 & 7
    t0["V_TRAIN"] = w3 >> 9
    t0["Q_DIRTRAIN"] = w3 >> 7 & 3
    t0["M_MODE"] = w3 >> 3 & 15
    t0["M_LEVEL"] = q1
    if q1 == 1:
        p -= 8
        w4 = n >> p & 255
        t0["NID_STM"] = w4
    return t0, p


def write_to_track_0(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 13
    x0 = t["Q_SCALE"]
    x1 = t["NID_LRBG"]
    if x0 >> 2 | x1 >> 24:
        raise Misfit
    v = x0 << 24 | x1
    x2 = t["D_LRBG"]
    x3 = t["Q_DIRLRBG"]
    x4 = t["Q_DLRBG"]
    x5 = t["L_DOUBTOVER"]
    x6 = t["L_DOUBTUNDER"]
    x7 = t["Q_LENGTH"]
    if x2 >> 15 | x3 >> 2 | x4 >> 2 | x5 >> 15 | x6 >> 15 | x7 >> 2:
        raise Misfit
    v = v << 51 | x2 << 36 | x3 << 34 | x4 << 32 | x5 << 17 | x6 << 2 | x7
    if 1 <= x7 <= 2:
        x8 = t["L_TRAININT"]
        if x8 >> 15:
            raise Misfit
        v = v << 15 | x8
        b += 15
        k0 += 1
    x9 = t["V_TRAIN"]
    x10 = t["Q_DIRTRAIN"]
    x11 = t["M_MODE"]
    x12 = t["M_LEVEL"]
    if x9 >> 7 | x10 >> 2 | x11 >> 4 | x12 >> 3:
        raise Misfit
    v = v << 16 | x9 << 9 | x10 << 7 | x11 << 3 | x12
    if x12 == 1:
        x13 = t["NID_STM"]
        if x13 >> 8:
            raise Misfit
        v = v << 8 | x13
        b += 8
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 114


def read_to_track_1(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 47
    w0 = n >> p & 140737488355327
    p -= 58
    w1 = n >> p & 288230376151711743
    p -= 17
    w2 = n >> p & 131071
    q0 = w2 & 3
    t0: Tree = {"NID_PACKET": 1, "L_PACKET": length, "Q_SCALE": w0 >> 24 & 3, "NID_LRBG": w0 & 16777215, "NID_PRVBG": w1 >> 34, "D_LRBG": w1 >> 19 & 32767, "Q_DIRLRBG": w1 >> 17 & 3, "Q_DLRBG": w1 >> 15 & 3, "L_DOUBTOVER": w1 & 32767, "L_DOUBTUNDER": w2 >> 2, "Q_LENGTH": q0}
    if 1 <= q0 <= 2:
        p -= 15
        w3 = n >> p & 32767
        t0["L_TRAININT"] = w3
    p -= 16
    w4 = n >> p & 65535
    q1 = w4 & 7
    t0["V_TRAIN"] = w4 >> 9
    t0["Q_DIRTRAIN"] = w4 >> 7 & 3
    t0["M_MODE"] = w4 >> 3 & 15
    t0["M_LEVEL"] = q1
    if q1 == 1:
        p -= 8
        w5 = n >> p & 255
        t0["NID_STM"] = w5
    return t0, p


def write_to_track_1(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 14
    x0 = t["Q_SCALE"]
    x1 = t["NID_LRBG"]
    if x0 >> 2 | x1 >> 24:
        raise Misfit
    v = 1 << 39 | x0 << 24 | x1
    x2 = t["NID_PRVBG"]
    x3 = t["D_LRBG"]
    x4 = t["Q_DIRLRBG"]
    x5 = t["Q_DLRBG"]
    x6 = t["L_DOUBTOVER"]
    if x2 >> 24 | x3 >> 15 | x4 >> 2 | x5 >> 2 | x6 >> 15:
        raise Misfit
    v = v << 58 | x2 << 34 | x3 << 19 | x4 << 17 | x5 << 15 | x6
    x7 = t["L_DOUBTUNDER"]
    x8 = t["Q_LENGTH"]
    if x7 >> 15 | x8 >> 2:
        raise Misfit
    v = v << 17 | x7 << 2 | x8
    if 1 <= x8 <= 2:
        x9 = t["L_TRAININT"]
        if x9 >> 15:
            raise Misfit
        v = v << 15 | x9
        b += 15
        k0 += 1
    x10 = t["V_TRAIN"]
    x11 = t["Q_DIRTRAIN"]
    x12 = t["M_MODE"]
    x13 = t["M_LEVEL"]
    if x10 >> 7 | x11 >> 2 | x12 >> 4 | x13 >> 3:
        raise Misfit
    v = v << 16 | x10 << 9 | x11 << 7 | x12 << 3 | x13
    if x13 == 1:
        x14 = t["NID_STM"]
        if x14 >> 8:
            raise Misfit
        v = v << 8 | x14
        b += 8
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 138


def read_to_track_11(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 53
    w0 = n >> p & 9007199254740991
    p -= 56
    w1 = n >> p & 72057594037927935
    c0 = w1 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 11, "L_PACKET": length, "NID_OPERATIONAL": digits_text(w0 & 4294967295, 8), "NC_TRAIN": w1 >> 41, "L_TRAIN": w1 >> 29 & 4095, "V_MAXTRAIN": w1 >> 22 & 127, "M_LOADINGGAUGE": w1 >> 14 & 255, "M_AXLELOAD": w1 >> 7 & 127, "M_AIRTIGHT": w1 >> 5 & 3, "tractions": s0}
    for p in range(p - 8, p - 8 * c0 - 1, -8):
        w = n >> p & 255
        s0.append({"M_TRACTION": w})
    p -= 5
    w2 = n >> p & 31
    c1 = w2
    s1: list[Tree] = []
    t0["national_systems"] = s1
    for p in range(p - 8, p - 8 * c1 - 1, -8):
        w = n >> p & 255
        s1.append({"NID_STM": w})
    return t0, p


def write_to_track_11(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["tractions"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = digits_value(t["NID_OPERATIONAL"], 8)
    v = 11 << 45 | x0
    x1 = t["NC_TRAIN"]
    x2 = t["L_TRAIN"]
    x3 = t["V_MAXTRAIN"]
    x4 = t["M_LOADINGGAUGE"]
    x5 = t["M_AXLELOAD"]
    x6 = t["M_AIRTIGHT"]
    if x1 >> 15 | x2 >> 12 | x3 >> 7 | x4 >> 8 | x5 >> 7 | x6 >> 2 | c0 >> 5:
        raise Misfit
    v = v << 56 | x1 << 41 | x2 << 29 | x3 << 22 | x4 << 14 | x5 << 7 | x6 << 5 | c0
    for e0 in s0:
        x7 = e0["M_TRACTION"]
        if x7 >> 8 or len(e0) != 1:
            raise Misfit
        v = v << 8 | x7
    b += 8 * c0
    s1 = t["national_systems"]
    c1 = len(s1)
    if not c1 and not isinstance(s1, (list, tuple)):
        raise Misfit
    if c1 >> 5:
        raise Misfit
    v = v << 5 | c1
    for e1 in s1:
        x8 = e1["NID_STM"]
        if x8 >> 8 or len(e1) != 1:
            raise Misfit
        v = v << 8 | x8
    b += 8 * c1
    if len(t) != 10 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 114


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
    layouts="v2_3_0",
    read_packet={
        "to-train": {
            3: x1_chapter6.read_to_train_3,
            5: v3_6_0.read_to_train_5,
            12: read_to_train_12,
            15: read_to_train_15,
            16: v3_6_0.read_to_train_16,
            21: v3_6_0.read_to_train_21,
            27: x1_chapter6.read_to_train_27,
            39: x1_chapter6.read_to_train_39,
            41: read_to_train_41,
            42: v3_6_0.read_to_train_42,
            44: x1_chapter6.read_to_train_44,
            45: v3_6_0.read_to_train_45,
            46: read_to_train_46,
            49: v3_6_0.read_to_train_49,
            51: x1_chapter6.read_to_train_51,
            57: v3_6_0.read_to_train_57,
            58: v3_6_0.read_to_train_58,
            63: v3_6_0.read_to_train_63,
            65: v3_6_0.read_to_train_65,
            66: v3_6_0.read_to_train_66,
            67: v3_6_0.read_to_train_67,
            68: v3_6_0.read_to_train_68,
            70: read_to_train_70,
            71: v3_6_0.read_to_train_71,
            72: read_to_train_72,
            76: read_to_train_76,
            79: x1_chapter6.read_to_train_79,
            80: x1_chapter6.read_to_train_80,
            90: v3_6_0.read_to_train_90,
            131: v3_6_0.read_to_train_131,
            132: v3_6_0.read_to_train_132,
            133: v3_6_0.read_to_train_133,
            134: v3_6_0.read_to_train_134,
            136: v3_6_0.read_to_train_136,
            137: v3_6_0.read_to_train_137,
            138: v3_6_0.read_to_train_138,
            139: v3_6_0.read_to_train_139,
            140: v3_6_0.read_to_train_140,
            141: v3_6_0.read_to_train_141,
            254: v3_6_0.read_to_train_254,
            255: v3_6_0.read_to_train_255,
        },
        "to-track": {
            0: read_to_track_0,
            1: read_to_track_1,
            3: x1_chapter6.read_to_track_3,
            4: v3_6_0.read_to_track_4,
            9: v3_6_0.read_to_track_9,
            11: read_to_track_11,
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
            15: x1_chapter6.read_message_15,
            16: v3_6_0.read_message_16,
            18: v3_6_0.read_message_18,
            24: v3_6_0.read_message_24,
            27: v3_6_0.read_message_27,
            28: v3_6_0.read_message_28,
            32: v3_6_0.read_message_32,
            33: v3_6_0.read_message_33,
            34: x1_chapter6.read_message_34,
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
            132: x1_chapter6.read_message_132,
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
            159: v3_6_0.read_message_159,
        },
    },
    read_header={"balise": v3_6_0.read_balise, "loop": v3_6_0.read_loop},
    write_packet={
        "to-train": {
            3: x1_chapter6.write_to_train_3,
            5: v3_6_0.write_to_train_5,
            12: write_to_train_12,
            15: write_to_train_15,
            16: v3_6_0.write_to_train_16,
            21: v3_6_0.write_to_train_21,
            27: x1_chapter6.write_to_train_27,
            39: x1_chapter6.write_to_train_39,
            41: write_to_train_41,
            42: v3_6_0.write_to_train_42,
            44: x1_chapter6.write_to_train_44,
            45: v3_6_0.write_to_train_45,
            46: write_to_train_46,
            49: v3_6_0.write_to_train_49,
            51: x1_chapter6.write_to_train_51,
            57: v3_6_0.write_to_train_57,
            58: v3_6_0.write_to_train_58,
            63: v3_6_0.write_to_train_63,
            65: v3_6_0.write_to_train_65,
            66: v3_6_0.write_to_train_66,
            67: v3_6_0.write_to_train_67,
            68: v3_6_0.write_to_train_68,
            70: write_to_train_70,
            71: v3_6_0.write_to_train_71,
            72: write_to_train_72,
            76: write_to_train_76,
            79: x1_chapter6.write_to_train_79,
            80: x1_chapter6.write_to_train_80,
            90: v3_6_0.write_to_train_90,
            131: v3_6_0.write_to_train_131,
            132: v3_6_0.write_to_train_132,
            133: v3_6_0.write_to_train_133,
            134: v3_6_0.write_to_train_134,
            136: v3_6_0.write_to_train_136,
            137: v3_6_0.write_to_train_137,
            138: v3_6_0.write_to_train_138,
            139: v3_6_0.write_to_train_139,
            140: v3_6_0.write_to_train_140,
            141: v3_6_0.write_to_train_141,
            254: v3_6_0.write_to_train_254,
            255: v3_6_0.write_to_train_255,
        },
        "to-track": {
            0: write_to_track_0,
            1: write_to_track_1,
            3: x1_chapter6.write_to_track_3,
            4: v3_6_0.write_to_track_4,
            9: v3_6_0.write_to_track_9,
            11: write_to_track_11,
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
            15: x1_chapter6.write_message_15,
            16: v3_6_0.write_message_16,
            18: v3_6_0.write_message_18,
            24: v3_6_0.write_message_24,
            27: v3_6_0.write_message_27,
            28: v3_6_0.write_message_28,
            32: v3_6_0.write_message_32,
            33: v3_6_0.write_message_33,
            34: x1_chapter6.write_message_34,
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
            132: x1_chapter6.write_message_132,
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
            159: v3_6_0.write_message_159,
        },
    },
    write_header={"balise": v3_6_0.write_balise, "loop": v3_6_0.write_loop},
    unmeasured={"to-train": {255: 8}, "to-track": {}},
    forms={"to-train": {}, "to-track": {}},
    since={"to-train": {}, "to-track": {}},
    evidence=(('inferred', 'what follows Q_TRACKINIT is indented without a condition: taken as for Q_TRACKINIT = 0', ('packet', 'to-train', 51)), ('inferred', 'NID_STM is worded to depend on M_LEVELTR, which is not in the packet: taken as the M_LEVELTEXTDISPLAY before it', ('packet', 'to-train', 72))),
)
