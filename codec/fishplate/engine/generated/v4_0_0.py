"""Readers and writers of SUBSET-026, layouts v4_0_0.

Written by ``python -m fishplate.engine.generate`` from the registry; never edit it.
"""

from __future__ import annotations

from fishplate.bits import digits_text, digits_value
from fishplate.engine.generated import v3_6_0
from fishplate.engine.runtime import Codec, Misfit, Tree


def read_to_train_31(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 15
    w1 = n >> p & 32767
    t0: Tree = {"NID_PACKET": 31, "Q_DIR": w0 >> 40 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 25 & 3, "D_RBCTR": w0 >> 10 & 32767, "NID_C": w0 & 1023, "NID_RBC": w1 >> 1, "Q_SLEEPSESSION": w1 & 1}
    return t0, p


def write_to_train_31(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_RBCTR"]
    x3 = t["NID_C"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 10 or len(t) != 7 + ("L_PACKET" in t):
        raise Misfit
    v = 31 << 42 | x0 << 40 | x1 << 25 | x2 << 10 | x3
    x4 = t["NID_RBC"]
    x5 = t["Q_SLEEPSESSION"]
    if x4 >> 14 | x5 >> 1:
        raise Misfit
    v = v << 15 | x4 << 1 | x5
    return v, b + 65


def read_to_train_32(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 49
    w0 = n >> p & 562949953421311
    t0: Tree = {"NID_PACKET": 32, "Q_DIR": w0 >> 39 & 3, "L_PACKET": length, "Q_RBC": w0 >> 25 & 1, "NID_C": w0 >> 15 & 1023, "NID_RBC": w0 >> 1 & 16383, "Q_SLEEPSESSION": w0 & 1}
    return t0, p


def write_to_train_32(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_RBC"]
    x2 = t["NID_C"]
    x3 = t["NID_RBC"]
    x4 = t["Q_SLEEPSESSION"]
    if x0 >> 2 | x1 >> 1 | x2 >> 10 | x3 >> 14 | x4 >> 1 or len(t) != 6 + ("L_PACKET" in t):
        raise Misfit
    v = 32 << 41 | x0 << 39 | x1 << 25 | x2 << 15 | x3 << 1 | x4
    return v, b + 49


def read_to_train_45(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 25
    w0 = n >> p & 33554431
    q0 = w0 & 3
    t0: Tree = {"NID_PACKET": 45, "Q_DIR": w0 >> 15 & 3, "L_PACKET": length, "Q_NETWORKTYPE": q0}
    if 1 <= q0 <= 2:
        p -= 24
        w1 = n >> p & 16777215
        t0["NID_MN"] = digits_text(w1, 6)
    return t0, p


def write_to_train_45(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 3
    x0 = t["Q_DIR"]
    x1 = t["Q_NETWORKTYPE"]
    if x0 >> 2 | x1 >> 2:
        raise Misfit
    v = 45 << 17 | x0 << 15 | x1
    if 1 <= x1 <= 2:
        x2 = digits_value(t["NID_MN"], 6)
        v = v << 24 | x2
        b += 24
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 25


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
            e0["M_LINEGAUGE"] = w3
        if q1 == 1:
            p -= 16
            w4 = n >> p & 65535
            e0["M_LINEAXLELOADCAT"] = w4
        if q1 == 2:
            p -= 4
            w5 = n >> p & 15
            q2 = w5
            e0["M_VOLTAGE"] = q2
            if q2:
                p -= 10
                w6 = n >> p & 1023
                e0["NID_CTRACTION"] = w6
        p -= 5
        w7 = n >> p & 31
        c0 = w7
        s0: list[Tree] = [e0]
        t0["suitabilities"] = s0
        while c0:
            c0 -= 1
            w = n >> p - 33 & 8589934591
            if (w >> 16 & 3) == 0:
                p -= 25
                s0.append({"D_SUITABILITY": w >> 18, "Q_SUITABILITY": 0, "M_LINEGAUGE": w >> 8 & 255})
            elif (w >> 16 & 3) == 1:
                p -= 33
                s0.append({"D_SUITABILITY": w >> 18, "Q_SUITABILITY": 1, "M_LINEAXLELOADCAT": w & 65535})
            elif (w >> 16 & 3) == 2:
                if (w >> 12 & 15):
                    p -= 31
                    s0.append({"D_SUITABILITY": w >> 18, "Q_SUITABILITY": 2, "M_VOLTAGE": w >> 12 & 15, "NID_CTRACTION": w >> 2 & 1023})
                else:
                    p -= 21
                    s0.append({"D_SUITABILITY": w >> 18, "Q_SUITABILITY": 2, "M_VOLTAGE": 0})
            else:
                p -= 17
                s0.append({"D_SUITABILITY": w >> 18, "Q_SUITABILITY": 3})
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
            x6 = e0["M_LINEGAUGE"]
            if x6 >> 8:
                raise Misfit
            v = v << 8 | x6
            b += 8
            k1 += 1
        if x5 == 1:
            x7 = e0["M_LINEAXLELOADCAT"]
            if x7 >> 16:
                raise Misfit
            v = v << 16 | x7
            b += 16
            k1 += 1
        if x5 == 2:
            x8 = e0["M_VOLTAGE"]
            if x8 >> 4:
                raise Misfit
            v = v << 4 | x8
            if x8:
                x9 = e0["NID_CTRACTION"]
                if x9 >> 10:
                    raise Misfit
                v = v << 10 | x9
                b += 10
                k1 += 1
            b += 4
            k1 += 1
        if len(e0) != k1:
            raise Misfit
        if c0 >> 5:
            raise Misfit
        v = v << 5 | c0
        for e0 in s0[1:]:
            x10 = e0["D_SUITABILITY"]
            x11 = e0["Q_SUITABILITY"]
            if x11 == 0:
                x12 = e0["M_LINEGAUGE"]
                if x10 >> 15 | x12 >> 8 or len(e0) != 3:
                    raise Misfit
                v = v << 25 | x10 << 10 | x11 << 8 | x12
                b += 8
            else:
                if x11 == 1:
                    x13 = e0["M_LINEAXLELOADCAT"]
                    if x10 >> 15 | x13 >> 16 or len(e0) != 3:
                        raise Misfit
                    v = v << 33 | x10 << 18 | x11 << 16 | x13
                    b += 16
                else:
                    if x11 == 2:
                        x14 = e0["M_VOLTAGE"]
                        if x14:
                            x15 = e0["NID_CTRACTION"]
                            if x10 >> 15 | x14 >> 4 | x15 >> 10 or len(e0) != 4:
                                raise Misfit
                            v = v << 31 | x10 << 16 | x11 << 14 | x14 << 10 | x15
                            b += 14
                        else:
                            if x10 >> 15 | x14 >> 4 or len(e0) != 3:
                                raise Misfit
                            v = v << 21 | x10 << 6 | x11 << 4 | x14
                            b += 4
                    else:
                        if x10 >> 15 | x11 >> 2 or len(e0) != 2:
                            raise Misfit
                        v = v << 17 | x10 << 2 | x11
        b += 17 * c0
        b += 22
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 26


def read_to_train_73(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 28
    w0 = n >> p & 268435455
    t0: Tree = {"NID_PACKET": 73, "Q_DIR": w0 >> 18 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 3 & 3, "Q_TEXTCLASS": w0 >> 1 & 3, "Q_TEXTDISPLAY": w0 & 1}
    p -= 22
    w1 = n >> p & 4194303
    q0 = w1 & 7
    g0: Tree = {"D_TEXTDISPLAY": w1 >> 7, "M_MODETEXTDISPLAY": w1 >> 3 & 15, "M_LEVELTEXTDISPLAY": q0}
    if q0 == 1:
        p -= 8
        w2 = n >> p & 255
        g0["NID_NTC"] = w2
    t0["start"] = g0
    p -= 32
    w3 = n >> p & 4294967295
    q1 = w3 & 7
    g1: Tree = {"L_TEXTDISPLAY": w3 >> 17, "T_TEXTDISPLAY": w3 >> 7 & 1023, "M_MODETEXTDISPLAY": w3 >> 3 & 15, "M_LEVELTEXTDISPLAY": q1}
    if q1 == 1:
        p -= 8
        w4 = n >> p & 255
        g1["NID_NTC"] = w4
    t0["end"] = g1
    p -= 2
    w5 = n >> p & 3
    q2 = w5
    t0["Q_TEXTCONFIRM"] = q2
    if q2:
        p -= 2
        w6 = n >> p & 3
        q3 = w6 & 1
        t0["Q_CONFTEXTDISPLAY"] = w6 >> 1
        t0["Q_TEXTREPORT"] = q3
        if q3:
            p -= 32
            w7 = n >> p & 4294967295
            t0["NID_TEXTMESSAGE"] = w7 >> 24
            t0["NID_C"] = w7 >> 14 & 1023
            t0["NID_RBC"] = w7 & 16383
    p -= 8
    w8 = n >> p & 255
    c0 = w8
    p -= 8 * c0
    t0["X_TEXT"] = (n >> p & (1 << 8 * c0) - 1).to_bytes(c0).decode("latin-1")
    return t0, p


def write_to_train_73(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 9
    g0 = t["start"]
    k1 = 3
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TEXTCLASS"]
    x3 = t["Q_TEXTDISPLAY"]
    x4 = g0["D_TEXTDISPLAY"]
    x5 = g0["M_MODETEXTDISPLAY"]
    x6 = g0["M_LEVELTEXTDISPLAY"]
    if x0 >> 2 | x1 >> 2 | x2 >> 2 | x3 >> 1 | x4 >> 15 | x5 >> 4 | x6 >> 3:
        raise Misfit
    v = 73 << 42 | x0 << 40 | x1 << 25 | x2 << 23 | x3 << 22 | x4 << 7 | x5 << 3 | x6
    if x6 == 1:
        x7 = g0["NID_NTC"]
        if x7 >> 8:
            raise Misfit
        v = v << 8 | x7
        b += 8
        k1 += 1
    if len(g0) != k1:
        raise Misfit
    g1 = t["end"]
    k2 = 4
    x8 = g1["L_TEXTDISPLAY"]
    x9 = g1["T_TEXTDISPLAY"]
    x10 = g1["M_MODETEXTDISPLAY"]
    x11 = g1["M_LEVELTEXTDISPLAY"]
    if x8 >> 15 | x9 >> 10 | x10 >> 4 | x11 >> 3:
        raise Misfit
    v = v << 32 | x8 << 17 | x9 << 7 | x10 << 3 | x11
    if x11 == 1:
        x12 = g1["NID_NTC"]
        if x12 >> 8:
            raise Misfit
        v = v << 8 | x12
        b += 8
        k2 += 1
    if len(g1) != k2:
        raise Misfit
    x13 = t["Q_TEXTCONFIRM"]
    if x13 >> 2:
        raise Misfit
    v = v << 2 | x13
    if x13:
        x14 = t["Q_CONFTEXTDISPLAY"]
        x15 = t["Q_TEXTREPORT"]
        if x14 >> 1 | x15 >> 1:
            raise Misfit
        v = v << 2 | x14 << 1 | x15
        if x15:
            x16 = t["NID_TEXTMESSAGE"]
            x17 = t["NID_C"]
            x18 = t["NID_RBC"]
            if x16 >> 8 | x17 >> 10 | x18 >> 14:
                raise Misfit
            v = v << 32 | x16 << 24 | x17 << 14 | x18
            b += 32
            k0 += 3
        b += 2
        k0 += 2
    x19 = t["X_TEXT"].encode("latin-1")
    c0 = len(x19)
    if c0 >> 8:
        raise Misfit
    v = v << 8 | c0
    v = v << 8 * c0 | int.from_bytes(x19)
    b += 8 * c0
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 92


def read_to_train_74(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 28
    w0 = n >> p & 268435455
    t0: Tree = {"NID_PACKET": 74, "Q_DIR": w0 >> 18 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 3 & 3, "Q_TEXTCLASS": w0 >> 1 & 3, "Q_TEXTDISPLAY": w0 & 1}
    p -= 22
    w1 = n >> p & 4194303
    q0 = w1 & 7
    g0: Tree = {"D_TEXTDISPLAY": w1 >> 7, "M_MODETEXTDISPLAY": w1 >> 3 & 15, "M_LEVELTEXTDISPLAY": q0}
    if q0 == 1:
        p -= 8
        w2 = n >> p & 255
        g0["NID_NTC"] = w2
    t0["start"] = g0
    p -= 32
    w3 = n >> p & 4294967295
    q1 = w3 & 7
    g1: Tree = {"L_TEXTDISPLAY": w3 >> 17, "T_TEXTDISPLAY": w3 >> 7 & 1023, "M_MODETEXTDISPLAY": w3 >> 3 & 15, "M_LEVELTEXTDISPLAY": q1}
    if q1 == 1:
        p -= 8
        w4 = n >> p & 255
        g1["NID_NTC"] = w4
    t0["end"] = g1
    p -= 2
    w5 = n >> p & 3
    q2 = w5
    t0["Q_TEXTCONFIRM"] = q2
    if q2:
        p -= 2
        w6 = n >> p & 3
        q3 = w6 & 1
        t0["Q_CONFTEXTDISPLAY"] = w6 >> 1
        t0["Q_TEXTREPORT"] = q3
        if q3:
            p -= 32
            w7 = n >> p & 4294967295
            t0["NID_TEXTMESSAGE"] = w7 >> 24
            t0["NID_C"] = w7 >> 14 & 1023
            t0["NID_RBC"] = w7 & 16383
    p -= 8
    w8 = n >> p & 255
    t0["Q_TEXT"] = w8
    return t0, p


def write_to_train_74(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 9
    g0 = t["start"]
    k1 = 3
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TEXTCLASS"]
    x3 = t["Q_TEXTDISPLAY"]
    x4 = g0["D_TEXTDISPLAY"]
    x5 = g0["M_MODETEXTDISPLAY"]
    x6 = g0["M_LEVELTEXTDISPLAY"]
    if x0 >> 2 | x1 >> 2 | x2 >> 2 | x3 >> 1 | x4 >> 15 | x5 >> 4 | x6 >> 3:
        raise Misfit
    v = 74 << 42 | x0 << 40 | x1 << 25 | x2 << 23 | x3 << 22 | x4 << 7 | x5 << 3 | x6
    if x6 == 1:
        x7 = g0["NID_NTC"]
        if x7 >> 8:
            raise Misfit
        v = v << 8 | x7
        b += 8
        k1 += 1
    if len(g0) != k1:
        raise Misfit
    g1 = t["end"]
    k2 = 4
    x8 = g1["L_TEXTDISPLAY"]
    x9 = g1["T_TEXTDISPLAY"]
    x10 = g1["M_MODETEXTDISPLAY"]
    x11 = g1["M_LEVELTEXTDISPLAY"]
    if x8 >> 15 | x9 >> 10 | x10 >> 4 | x11 >> 3:
        raise Misfit
    v = v << 32 | x8 << 17 | x9 << 7 | x10 << 3 | x11
    if x11 == 1:
        x12 = g1["NID_NTC"]
        if x12 >> 8:
            raise Misfit
        v = v << 8 | x12
        b += 8
        k2 += 1
    if len(g1) != k2:
        raise Misfit
    x13 = t["Q_TEXTCONFIRM"]
    if x13 >> 2:
        raise Misfit
    v = v << 2 | x13
    if x13:
        x14 = t["Q_CONFTEXTDISPLAY"]
        x15 = t["Q_TEXTREPORT"]
        if x14 >> 1 | x15 >> 1:
            raise Misfit
        v = v << 2 | x14 << 1 | x15
        if x15:
            x16 = t["NID_TEXTMESSAGE"]
            x17 = t["NID_C"]
            x18 = t["NID_RBC"]
            if x16 >> 8 | x17 >> 10 | x18 >> 14:
                raise Misfit
            v = v << 32 | x16 << 24 | x17 << 14 | x18
            b += 32
            k0 += 3
        b += 2
        k0 += 2
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    x19 = t["Q_TEXT"]
    if x19 >> 8:
        raise Misfit
    v = v << 8 | x19
    return v, b + 92


def read_to_track_0(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 47
    w0 = n >> p & 140737488355327
    p -= 51
    w1 = n >> p & 2251799813685247
    q0 = w1 & 3
    t0: Tree = {"NID_PACKET": 0, "L_PACKET": length, "Q_SCALE": w0 >> 24 & 3, "NID_LRBG": w0 & 16777215, "D_LRBG": w1 >> 36, "Q_DIRLRBG": w1 >> 34 & 3, "Q_DLRBG": w1 >> 32 & 3, "L_DOUBTOVER": w1 >> 17 & 32767, "L_DOUBTUNDER": w1 >> 2 & 32767, "Q_INTEGRITY": q0}
    if 1 <= q0 <= 2:
        p -= 15
        w2 = n >> p & 32767
        t0["L_TRAININT"] = w2
    p -= 17
    w3 = n >> p & 131071
    q1 = w3 & 7
    t0["V_TRAIN"] = w3 >> 10
    t0["Q_DIRTRAIN"] = w3 >> 8 & 3
    t0["M_MODE"] = w3 >> 3 & 31
    t0["M_LEVEL"] = q1
    if q1 == 1:
        p -= 8
        w4 = n >> p & 255
        t0["NID_NTC"] = w4
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
    x7 = t["Q_INTEGRITY"]
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
    if x9 >> 7 | x10 >> 2 | x11 >> 5 | x12 >> 3:
        raise Misfit
    v = v << 17 | x9 << 10 | x10 << 8 | x11 << 3 | x12
    if x12 == 1:
        x13 = t["NID_NTC"]
        if x13 >> 8:
            raise Misfit
        v = v << 8 | x13
        b += 8
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 115


def read_to_track_1(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 47
    w0 = n >> p & 140737488355327
    p -= 58
    w1 = n >> p & 288230376151711743
    p -= 17
    w2 = n >> p & 131071
    q0 = w2 & 3
    t0: Tree = {"NID_PACKET": 1, "L_PACKET": length, "Q_SCALE": w0 >> 24 & 3, "NID_LRBG": w0 & 16777215, "NID_PRVLRBG": w1 >> 34, "D_LRBG": w1 >> 19 & 32767, "Q_DIRLRBG": w1 >> 17 & 3, "Q_DLRBG": w1 >> 15 & 3, "L_DOUBTOVER": w1 & 32767, "L_DOUBTUNDER": w2 >> 2, "Q_INTEGRITY": q0}
    if 1 <= q0 <= 2:
        p -= 15
        w3 = n >> p & 32767
        t0["L_TRAININT"] = w3
    p -= 17
    w4 = n >> p & 131071
    q1 = w4 & 7
    t0["V_TRAIN"] = w4 >> 10
    t0["Q_DIRTRAIN"] = w4 >> 8 & 3
    t0["M_MODE"] = w4 >> 3 & 31
    t0["M_LEVEL"] = q1
    if q1 == 1:
        p -= 8
        w5 = n >> p & 255
        t0["NID_NTC"] = w5
    return t0, p


def write_to_track_1(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 14
    x0 = t["Q_SCALE"]
    x1 = t["NID_LRBG"]
    if x0 >> 2 | x1 >> 24:
        raise Misfit
    v = 1 << 39 | x0 << 24 | x1
    x2 = t["NID_PRVLRBG"]
    x3 = t["D_LRBG"]
    x4 = t["Q_DIRLRBG"]
    x5 = t["Q_DLRBG"]
    x6 = t["L_DOUBTOVER"]
    if x2 >> 24 | x3 >> 15 | x4 >> 2 | x5 >> 2 | x6 >> 15:
        raise Misfit
    v = v << 58 | x2 << 34 | x3 << 19 | x4 << 17 | x5 << 15 | x6
    x7 = t["L_DOUBTUNDER"]
    x8 = t["Q_INTEGRITY"]
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
    if x10 >> 7 | x11 >> 2 | x12 >> 5 | x13 >> 3:
        raise Misfit
    v = v << 17 | x10 << 10 | x11 << 8 | x12 << 3 | x13
    if x13 == 1:
        x14 = t["NID_NTC"]
        if x14 >> 8:
            raise Misfit
        v = v << 8 | x14
        b += 8
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 139


def read_to_track_10(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 22
    w0 = n >> p & 4194303
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 10, "L_PACKET": length, "Q_SAFECONSISTLENGTH": q0}
    if q0:
        p -= 60
        w1 = n >> p & 1152921504606846975
        p -= 12
        w2 = n >> p & 4095
        t0["L_CONSISTFRONTENGINENOM"] = w1 >> 48
        t0["L_CONSISTFRONTENGINEMIN"] = w1 >> 36 & 4095
        t0["L_CONSISTFRONTENGINEMAX"] = w1 >> 24 & 4095
        t0["L_CONSISTREARENGINENOM"] = w1 >> 12 & 4095
        t0["L_CONSISTREARENGINEMIN"] = w1 & 4095
        t0["L_CONSISTREARENGINEMAX"] = w2
    return t0, p


def write_to_track_10(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 2
    x0 = t["Q_SAFECONSISTLENGTH"]
    if x0 >> 1:
        raise Misfit
    v = 10 << 14 | x0
    if x0:
        x1 = t["L_CONSISTFRONTENGINENOM"]
        x2 = t["L_CONSISTFRONTENGINEMIN"]
        x3 = t["L_CONSISTFRONTENGINEMAX"]
        x4 = t["L_CONSISTREARENGINENOM"]
        x5 = t["L_CONSISTREARENGINEMIN"]
        if x1 >> 12 | x2 >> 12 | x3 >> 12 | x4 >> 12 | x5 >> 12:
            raise Misfit
        v = v << 60 | x1 << 48 | x2 << 36 | x3 << 24 | x4 << 12 | x5
        x6 = t["L_CONSISTREARENGINEMAX"]
        if x6 >> 12:
            raise Misfit
        v = v << 12 | x6
        b += 72
        k0 += 6
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 22


def read_to_track_12(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 55
    w0 = n >> p & 36028797018963967
    p -= 24
    w1 = n >> p & 16777215
    c0 = w1 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 12, "L_PACKET": length, "NC_CDTRAIN": w0 >> 30 & 15, "NC_TRAIN": w0 >> 15 & 32767, "V_MAXTRAIN": w0 >> 8 & 127, "M_LOADINGGAUGE": w0 & 255, "M_AXLELOADCAT": w1 >> 17, "M_AIRTIGHT": w1 >> 15 & 3, "N_AXLE": w1 >> 5 & 1023, "tractions": s0}
    while c0:
        c0 -= 1
        w = n >> p - 14 & 16383
        if (w >> 10 & 15):
            p -= 14
            s0.append({"M_VOLTAGE": w >> 10, "NID_CTRACTION": w & 1023})
        else:
            p -= 4
            s0.append({"M_VOLTAGE": 0})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_track_12(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["tractions"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = t["NC_CDTRAIN"]
    x1 = t["NC_TRAIN"]
    x2 = t["V_MAXTRAIN"]
    x3 = t["M_LOADINGGAUGE"]
    if x0 >> 4 | x1 >> 15 | x2 >> 7 | x3 >> 8:
        raise Misfit
    v = 12 << 47 | x0 << 30 | x1 << 15 | x2 << 8 | x3
    x4 = t["M_AXLELOADCAT"]
    x5 = t["M_AIRTIGHT"]
    x6 = t["N_AXLE"]
    if x4 >> 7 | x5 >> 2 | x6 >> 10 | c0 >> 5:
        raise Misfit
    v = v << 24 | x4 << 17 | x5 << 15 | x6 << 5 | c0
    for e0 in s0:
        x7 = e0["M_VOLTAGE"]
        if x7:
            x8 = e0["NID_CTRACTION"]
            if x7 >> 4 | x8 >> 10 or len(e0) != 2:
                raise Misfit
            v = v << 14 | x7 << 10 | x8
            b += 10
        else:
            if x7 >> 4 or len(e0) != 1:
                raise Misfit
            v = v << 4 | x7
    b += 4 * c0
    if len(t) != 9 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 79


def read_message_131(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 131, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_131(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 131 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_133(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 133, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_133(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 133 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_150(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 25
    w1 = n >> p & 33554431
    t0: Tree = {"NID_MESSAGE": 150, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 1, "Q_DESK": w1 & 1}
    return t0, p


def write_message_150(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 150 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["Q_DESK"]
    if x1 >> 24 | x2 >> 1:
        raise Misfit
    v = v << 25 | x1 << 1 | x2
    return v, b + 75


def read_message_157(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 26
    w1 = n >> p & 67108863
    t0: Tree = {"NID_MESSAGE": 157, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 2, "Q_STATUSLRBG": w1 & 3}
    return t0, p


def write_message_157(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 157 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["Q_STATUSLRBG"]
    if x1 >> 24 | x2 >> 2:
        raise Misfit
    v = v << 26 | x1 << 2 | x2
    return v, b + 76


def read_message_4(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 58
    w1 = n >> p & 288230376151711743
    p -= 23
    w2 = n >> p & 8388607
    t0: Tree = {"NID_MESSAGE": 4, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 34, "T_TRAIN_REFERENCE": w1 >> 2 & 4294967295, "Q_SCALE": w1 & 3, "D_REF": ((w2 >> 7) ^ 32768) - 32768, "V_SM": w2 & 127}
    return t0, p


def write_message_4(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 8 + ("L_MESSAGE" in t):
        raise Misfit
    v = 4 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["T_TRAIN_REFERENCE"]
    x4 = t["Q_SCALE"]
    if x2 >> 24 | x3 >> 32 | x4 >> 2:
        raise Misfit
    v = v << 58 | x2 << 34 | x3 << 2 | x4
    x5 = t["D_REF"]
    x6 = t["V_SM"]
    if x5 + 32768 >> 16 | x6 >> 7:
        raise Misfit
    v = v << 23 | (x5 & 65535) << 7 | x6
    return v, b + 132


def read_message_5(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 56
    w1 = n >> p & 72057594037927935
    t0: Tree = {"NID_MESSAGE": 5, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 32, "T_TRAIN_REFERENCE": w1 & 4294967295}
    return t0, p


def write_message_5(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 5 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["T_TRAIN_REFERENCE"]
    if x2 >> 24 | x3 >> 32:
        raise Misfit
    v = v << 56 | x2 << 32 | x3
    return v, b + 107


def read_message_7(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 56
    w1 = n >> p & 72057594037927935
    t0: Tree = {"NID_MESSAGE": 7, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 32, "T_TRAIN_REFERENCE": w1 & 4294967295}
    return t0, p


def write_message_7(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 7 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["T_TRAIN_REFERENCE"]
    if x2 >> 24 | x3 >> 32:
        raise Misfit
    v = v << 56 | x2 << 32 | x3
    return v, b + 107


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
    layouts="v4_0_0",
    read_packet={
        "to-train": {
            0: v3_6_0.read_to_train_0,
            2: v3_6_0.read_to_train_2,
            3: v3_6_0.read_to_train_3,
            5: v3_6_0.read_to_train_5,
            6: v3_6_0.read_to_train_6,
            12: v3_6_0.read_to_train_12,
            13: v3_6_0.read_to_train_13,
            15: v3_6_0.read_to_train_15,
            16: v3_6_0.read_to_train_16,
            21: v3_6_0.read_to_train_21,
            27: v3_6_0.read_to_train_27,
            31: read_to_train_31,
            32: read_to_train_32,
            39: v3_6_0.read_to_train_39,
            40: v3_6_0.read_to_train_40,
            41: v3_6_0.read_to_train_41,
            42: v3_6_0.read_to_train_42,
            44: v3_6_0.read_to_train_44,
            45: read_to_train_45,
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
            70: read_to_train_70,
            71: v3_6_0.read_to_train_71,
            73: read_to_train_73,
            74: read_to_train_74,
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
            180: v3_6_0.read_to_train_180,
            181: v3_6_0.read_to_train_181,
            254: v3_6_0.read_to_train_254,
            255: v3_6_0.read_to_train_255,
        },
        "to-track": {
            0: read_to_track_0,
            1: read_to_track_1,
            2: v3_6_0.read_to_track_2,
            4: v3_6_0.read_to_track_4,
            5: v3_6_0.read_to_track_5,
            9: v3_6_0.read_to_track_9,
            10: read_to_track_10,
            11: v3_6_0.read_to_track_11,
            12: read_to_track_12,
            44: v3_6_0.read_to_track_44,
        },
    },
    read_message={
        "to-train": {
            2: v3_6_0.read_message_2,
            3: v3_6_0.read_message_3,
            4: read_message_4,
            5: read_message_5,
            6: v3_6_0.read_message_6,
            7: read_message_7,
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
            131: read_message_131,
            132: v3_6_0.read_message_132,
            133: read_message_133,
            136: v3_6_0.read_message_136,
            137: v3_6_0.read_message_137,
            138: v3_6_0.read_message_138,
            146: v3_6_0.read_message_146,
            147: v3_6_0.read_message_147,
            149: v3_6_0.read_message_149,
            150: read_message_150,
            153: v3_6_0.read_message_153,
            154: v3_6_0.read_message_154,
            155: v3_6_0.read_message_155,
            156: v3_6_0.read_message_156,
            157: read_message_157,
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
            12: v3_6_0.write_to_train_12,
            13: v3_6_0.write_to_train_13,
            15: v3_6_0.write_to_train_15,
            16: v3_6_0.write_to_train_16,
            21: v3_6_0.write_to_train_21,
            27: v3_6_0.write_to_train_27,
            31: write_to_train_31,
            32: write_to_train_32,
            39: v3_6_0.write_to_train_39,
            40: v3_6_0.write_to_train_40,
            41: v3_6_0.write_to_train_41,
            42: v3_6_0.write_to_train_42,
            44: v3_6_0.write_to_train_44,
            45: write_to_train_45,
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
            70: write_to_train_70,
            71: v3_6_0.write_to_train_71,
            73: write_to_train_73,
            74: write_to_train_74,
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
            180: v3_6_0.write_to_train_180,
            181: v3_6_0.write_to_train_181,
            254: v3_6_0.write_to_train_254,
            255: v3_6_0.write_to_train_255,
        },
        "to-track": {
            0: write_to_track_0,
            1: write_to_track_1,
            2: v3_6_0.write_to_track_2,
            4: v3_6_0.write_to_track_4,
            5: v3_6_0.write_to_track_5,
            9: v3_6_0.write_to_track_9,
            10: write_to_track_10,
            11: v3_6_0.write_to_track_11,
            12: write_to_track_12,
            44: v3_6_0.write_to_track_44,
        },
    },
    write_message={
        "to-train": {
            2: v3_6_0.write_message_2,
            3: v3_6_0.write_message_3,
            4: write_message_4,
            5: write_message_5,
            6: v3_6_0.write_message_6,
            7: write_message_7,
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
            131: write_message_131,
            132: v3_6_0.write_message_132,
            133: write_message_133,
            136: v3_6_0.write_message_136,
            137: v3_6_0.write_message_137,
            138: v3_6_0.write_message_138,
            146: v3_6_0.write_message_146,
            147: v3_6_0.write_message_147,
            149: v3_6_0.write_message_149,
            150: write_message_150,
            153: v3_6_0.write_message_153,
            154: v3_6_0.write_message_154,
            155: v3_6_0.write_message_155,
            156: v3_6_0.write_message_156,
            157: write_message_157,
            158: v3_6_0.write_message_158,
            159: v3_6_0.write_message_159,
        },
    },
    write_header={"balise": v3_6_0.write_balise, "loop": v3_6_0.write_loop},
    unmeasured={"to-train": {0: 14, 255: 8}, "to-track": {}},
    forms={"to-train": {}, "to-track": {}},
    since={"to-train": {}, "to-track": {}},
    evidence=(('weaker', 'issue 4.0.0 is declared from a text conversion of its tables', ()), ('inferred', 'NID_LRBG added from the standard format 8.4.4.6.1: the conversion stops before it', ('message', 'to-train', 38)), ('inferred', 'NID_MN depends on a misspelt Q_NETWORTYPE: taken as Q_NETWORKTYPE', ('packet', 'to-train', 45)), ('weaker', 'printed in hours, in steps of 24; declared in days, with the same codes', ('variable', 'T_VBC'))),
)
