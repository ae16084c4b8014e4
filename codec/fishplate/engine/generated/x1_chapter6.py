"""Readers and writers of SUBSET-026, layouts x1_chapter6.

Written by ``python -m fishplate.engine.generate`` from the registry; never edit it.
"""

from __future__ import annotations

from fishplate.bits import blob, digits_text, digits_value, read_blob
from fishplate.engine.generated import v3_6_0
from fishplate.engine.runtime import Codec, Misfit, Tree


def read_to_train_3(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 45
    w0 = n >> p & 35184372088831
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 3, "Q_DIR": w0 >> 35 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 20 & 3, "D_VALIDNV": w0 >> 5 & 32767, "countries": s0}
    for p in range(p - 10, p - 10 * c0 - 1, -10):
        w = n >> p & 1023
        s0.append({"NID_C": w})
    p -= 59
    w1 = n >> p & 576460752303423487
    p -= 56
    w2 = n >> p & 72057594037927935
    p -= 16
    w3 = n >> p & 65535
    t0["V_NVSHUNT"] = w1 >> 52
    t0["V_NVSTFF"] = w1 >> 45 & 127
    t0["V_NVONSIGHT"] = w1 >> 38 & 127
    t0["V_NVUNFIT"] = w1 >> 31 & 127
    t0["V_NVREL"] = w1 >> 24 & 127
    t0["D_NVROLL"] = w1 >> 9 & 32767
    t0["Q_NVSRBKTRG"] = w1 >> 8 & 1
    t0["Q_NVEMRRLS"] = w1 >> 7 & 1
    t0["V_NVALLOWOVTRP"] = w1 & 127
    t0["V_NVSUPOVTRP"] = w2 >> 49
    t0["D_NVOVTRP"] = w2 >> 34 & 32767
    t0["T_NVOVTRP"] = w2 >> 26 & 255
    t0["D_NVPOTRP"] = w2 >> 11 & 32767
    t0["M_NVCONTACT"] = w2 >> 9 & 3
    t0["T_NVCONTACT"] = w2 >> 1 & 255
    t0["M_NVDERUN"] = w2 & 1
    t0["D_NVSTFF"] = w3 >> 1
    t0["Q_NVDRIVER_ADHES"] = w3 & 1
    return t0, p


def write_to_train_3(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["countries"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_VALIDNV"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | c0 >> 5:
        raise Misfit
    v = 3 << 37 | x0 << 35 | x1 << 20 | x2 << 5 | c0
    for e0 in s0:
        x3 = e0["NID_C"]
        if x3 >> 10 or len(e0) != 1:
            raise Misfit
        v = v << 10 | x3
    b += 10 * c0
    x4 = t["V_NVSHUNT"]
    x5 = t["V_NVSTFF"]
    x6 = t["V_NVONSIGHT"]
    x7 = t["V_NVUNFIT"]
    x8 = t["V_NVREL"]
    x9 = t["D_NVROLL"]
    x10 = t["Q_NVSRBKTRG"]
    x11 = t["Q_NVEMRRLS"]
    x12 = t["V_NVALLOWOVTRP"]
    if x4 >> 7 | x5 >> 7 | x6 >> 7 | x7 >> 7 | x8 >> 7 | x9 >> 15 | x10 >> 1 | x11 >> 1 | x12 >> 7 or len(t) != 23 + ("L_PACKET" in t):
        raise Misfit
    v = v << 59 | x4 << 52 | x5 << 45 | x6 << 38 | x7 << 31 | x8 << 24 | x9 << 9 | x10 << 8 | x11 << 7 | x12
    x13 = t["V_NVSUPOVTRP"]
    x14 = t["D_NVOVTRP"]
    x15 = t["T_NVOVTRP"]
    x16 = t["D_NVPOTRP"]
    x17 = t["M_NVCONTACT"]
    x18 = t["T_NVCONTACT"]
    x19 = t["M_NVDERUN"]
    if x13 >> 7 | x14 >> 15 | x15 >> 8 | x16 >> 15 | x17 >> 2 | x18 >> 8 | x19 >> 1:
        raise Misfit
    v = v << 56 | x13 << 49 | x14 << 34 | x15 << 26 | x16 << 11 | x17 << 9 | x18 << 1 | x19
    x20 = t["D_NVSTFF"]
    x21 = t["Q_NVDRIVER_ADHES"]
    if x20 >> 15 | x21 >> 1:
        raise Misfit
    v = v << 16 | x20 << 1 | x21
    return v, b + 176


def read_to_train_27(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 53
    w0 = n >> p & 9007199254740991
    c1 = w0 & 31
    t0: Tree = {"NID_PACKET": 27, "Q_DIR": w0 >> 43 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 28 & 3}
    s1: list[Tree] = []
    e0: Tree = {"D_STATIC": w0 >> 13 & 32767, "V_STATIC": w0 >> 6 & 127, "Q_FRONT": w0 >> 5 & 1, "categories": s1}
    for p in range(p - 11, p - 11 * c1 - 1, -11):
        w = n >> p & 2047
        s1.append({"NC_DIFF": w >> 7, "V_DIFF": w & 127})
    p -= 5
    w1 = n >> p & 31
    c0 = w1
    s0: list[Tree] = [e0]
    t0["steps"] = s0
    while c0:
        c0 -= 1
        if p > 1024:
            n &= (1 << p) - 1
        p -= 28
        w2 = n >> p & 268435455
        c2 = w2 & 31
        s2: list[Tree] = []
        e2: Tree = {"D_STATIC": w2 >> 13, "V_STATIC": w2 >> 6 & 127, "Q_FRONT": w2 >> 5 & 1, "categories": s2}
        for p in range(p - 11, p - 11 * c2 - 1, -11):
            w = n >> p & 2047
            s2.append({"NC_DIFF": w >> 7, "V_DIFF": w & 127})
        s0.append(e2)
    return t0, p


def write_to_train_27(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["steps"]
    c0 = len(s0) - 1
    e0 = s0[0]
    s1 = e0["categories"]
    c1 = len(s1)
    if not c1 and not isinstance(s1, (list, tuple)):
        raise Misfit
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = e0["D_STATIC"]
    x3 = e0["V_STATIC"]
    x4 = e0["Q_FRONT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 7 | x4 >> 1 | c1 >> 5:
        raise Misfit
    v = 27 << 45 | x0 << 43 | x1 << 28 | x2 << 13 | x3 << 6 | x4 << 5 | c1
    for e1 in s1:
        x5 = e1["NC_DIFF"]
        x6 = e1["V_DIFF"]
        if x5 >> 4 | x6 >> 7 or len(e1) != 2:
            raise Misfit
        v = v << 11 | x5 << 7 | x6
    b += 11 * c1
    if len(e0) != 4:
        raise Misfit
    if c0 >> 5:
        raise Misfit
    v = v << 5 | c0
    for e0 in s0[1:]:
        b0 = 0
        s2 = e0["categories"]
        c2 = len(s2)
        if not c2 and not isinstance(s2, (list, tuple)):
            raise Misfit
        x7 = e0["D_STATIC"]
        x8 = e0["V_STATIC"]
        x9 = e0["Q_FRONT"]
        if x7 >> 15 | x8 >> 7 | x9 >> 1 | c2 >> 5:
            raise Misfit
        v0 = x7 << 13 | x8 << 6 | x9 << 5 | c2
        for e2 in s2:
            x10 = e2["NC_DIFF"]
            x11 = e2["V_DIFF"]
            if x10 >> 4 | x11 >> 7 or len(e2) != 2:
                raise Misfit
            v0 = v0 << 11 | x10 << 7 | x11
        b0 += 11 * c2
        if len(e0) != 4:
            raise Misfit
        v = v << b0 + 28 | v0
        b += b0 + 28
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 58


def read_to_train_39(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 48
    w0 = n >> p & 281474976710655
    t0: Tree = {"NID_PACKET": 39, "Q_DIR": w0 >> 38 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 23 & 3, "D_TRACTION": w0 >> 8 & 32767, "M_TRACTION": w0 & 255}
    return t0, p


def write_to_train_39(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_TRACTION"]
    x3 = t["M_TRACTION"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 8 or len(t) != 5 + ("L_PACKET" in t):
        raise Misfit
    v = 39 << 40 | x0 << 38 | x1 << 23 | x2 << 8 | x3
    return v, b + 48


def read_to_train_44(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 32
    w0 = n >> p & 4294967295
    t0: Tree = {"NID_PACKET": 44, "Q_DIR": w0 >> 22 & 3, "L_PACKET": length, "NID_XUSER": w0 & 511}
    p -= 0
    w = n >> 0 & (1 << p) - 1
    t0["data"] = blob(w, p)
    p = 0
    return t0, p


def write_to_train_44(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["NID_XUSER"]
    if x0 >> 2 | x1 >> 9:
        raise Misfit
    v = 44 << 24 | x0 << 22 | x1
    w, c = read_blob(t["data"], ("data",))
    v = v << c | w
    b += c
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 32


def read_to_train_51(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 51, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_TRACKINIT": q0}
    if not q0:
        p -= 36
        w1 = n >> p & 68719476735
        c1 = w1 & 31
        s1: list[Tree] = []
        e0: Tree = {"D_AXLELOAD": w1 >> 21, "L_AXLELOAD": w1 >> 6 & 32767, "Q_FRONT": w1 >> 5 & 1, "categories": s1}
        for p in range(p - 14, p - 14 * c1 - 1, -14):
            w = n >> p & 16383
            s1.append({"M_AXLELOAD": w >> 7, "V_AXLELOAD": w & 127})
        p -= 5
        w2 = n >> p & 31
        c0 = w2
        s0: list[Tree] = [e0]
        t0["areas"] = s0
        while c0:
            c0 -= 1
            if p > 1024:
                n &= (1 << p) - 1
            p -= 36
            w3 = n >> p & 68719476735
            c2 = w3 & 31
            s2: list[Tree] = []
            e2: Tree = {"D_AXLELOAD": w3 >> 21, "L_AXLELOAD": w3 >> 6 & 32767, "Q_FRONT": w3 >> 5 & 1, "categories": s2}
            for p in range(p - 14, p - 14 * c2 - 1, -14):
                w = n >> p & 16383
                s2.append({"M_AXLELOAD": w >> 7, "V_AXLELOAD": w & 127})
            s0.append(e2)
    return t0, p


def write_to_train_51(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TRACKINIT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 51 << 18 | x0 << 16 | x1 << 1 | x2
    if not x2:
        s0 = t["areas"]
        c0 = len(s0) - 1
        e0 = s0[0]
        s1 = e0["categories"]
        c1 = len(s1)
        if not c1 and not isinstance(s1, (list, tuple)):
            raise Misfit
        x3 = e0["D_AXLELOAD"]
        x4 = e0["L_AXLELOAD"]
        x5 = e0["Q_FRONT"]
        if x3 >> 15 | x4 >> 15 | x5 >> 1 | c1 >> 5:
            raise Misfit
        v = v << 36 | x3 << 21 | x4 << 6 | x5 << 5 | c1
        for e1 in s1:
            x6 = e1["M_AXLELOAD"]
            x7 = e1["V_AXLELOAD"]
            if x6 >> 7 | x7 >> 7 or len(e1) != 2:
                raise Misfit
            v = v << 14 | x6 << 7 | x7
        b += 14 * c1
        if len(e0) != 4:
            raise Misfit
        if c0 >> 5:
            raise Misfit
        v = v << 5 | c0
        for e0 in s0[1:]:
            b0 = 0
            s2 = e0["categories"]
            c2 = len(s2)
            if not c2 and not isinstance(s2, (list, tuple)):
                raise Misfit
            x8 = e0["D_AXLELOAD"]
            x9 = e0["L_AXLELOAD"]
            x10 = e0["Q_FRONT"]
            if x8 >> 15 | x9 >> 15 | x10 >> 1 | c2 >> 5:
                raise Misfit
            v0 = x8 << 21 | x9 << 6 | x10 << 5 | c2
            for e2 in s2:
                x11 = e2["M_AXLELOAD"]
                x12 = e2["V_AXLELOAD"]
                if x11 >> 7 | x12 >> 7 or len(e2) != 2:
                    raise Misfit
                v0 = v0 << 14 | x11 << 7 | x12
            b0 += 14 * c2
            if len(e0) != 4:
                raise Misfit
            v = v << b0 + 36 | v0
            b += b0 + 36
        b += 41
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 26


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
        if q1 == 1:
            p -= 7
            w3 = n >> p & 127
            e0["M_AXLELOAD"] = w3
        if q1 == 2:
            p -= 8
            w4 = n >> p & 255
            e0["M_TRACTION"] = w4
        p -= 5
        w5 = n >> p & 31
        c0 = w5
        s0: list[Tree] = [e0]
        t0["suitabilities"] = s0
        while c0:
            c0 -= 1
            w = n >> p - 25 & 33554431
            if (w >> 8 & 3) == 1:
                p -= 24
                s0.append({"D_SUITABILITY": w >> 10, "Q_SUITABILITY": 1, "M_AXLELOAD": w >> 1 & 127})
            elif (w >> 8 & 3) == 2:
                p -= 25
                s0.append({"D_SUITABILITY": w >> 10, "Q_SUITABILITY": 2, "M_TRACTION": w & 255})
            else:
                p -= 17
                s0.append({"D_SUITABILITY": w >> 10, "Q_SUITABILITY": w >> 8 & 3})
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
        if x5 == 1:
            x6 = e0["M_AXLELOAD"]
            if x6 >> 7:
                raise Misfit
            v = v << 7 | x6
            b += 7
            k1 += 1
        if x5 == 2:
            x7 = e0["M_TRACTION"]
            if x7 >> 8:
                raise Misfit
            v = v << 8 | x7
            b += 8
            k1 += 1
        if len(e0) != k1:
            raise Misfit
        if c0 >> 5:
            raise Misfit
        v = v << 5 | c0
        for e0 in s0[1:]:
            x8 = e0["D_SUITABILITY"]
            x9 = e0["Q_SUITABILITY"]
            if x9 == 1:
                x10 = e0["M_AXLELOAD"]
                if x8 >> 15 | x10 >> 7 or len(e0) != 3:
                    raise Misfit
                v = v << 24 | x8 << 9 | x9 << 7 | x10
                b += 7
            else:
                if x9 == 2:
                    x11 = e0["M_TRACTION"]
                    if x8 >> 15 | x11 >> 8 or len(e0) != 3:
                        raise Misfit
                    v = v << 25 | x8 << 10 | x9 << 8 | x11
                    b += 8
                else:
                    if x8 >> 15 | x9 >> 2 or len(e0) != 2:
                        raise Misfit
                    v = v << 17 | x8 << 2 | x9
        b += 17 * c0
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
        x7 = g0["NID_NTC"]
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
        x12 = g1["NID_NTC"]
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


def read_to_train_79(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 79, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3}
    e0: Tree = {"Q_NEWCOUNTRY": q0}
    if q0:
        p -= 10
        w1 = n >> p & 1023
        e0["NID_C"] = w1
    p -= 50
    w2 = n >> p & 1125899906842623
    e0["NID_BG"] = w2 >> 36
    e0["D_POSOFF"] = w2 >> 21 & 32767
    e0["Q_MPOSITION"] = w2 >> 20 & 1
    e0["M_POSITION"] = w2 & 1048575
    p -= 5
    w3 = n >> p & 31
    c0 = w3
    s0: list[Tree] = [e0]
    t0["positions"] = s0
    while c0:
        c0 -= 1
        if p > 1024:
            n &= (1 << p) - 1
        p -= 1
        w4 = n >> p & 1
        q1 = w4
        e1: Tree = {"Q_NEWCOUNTRY": q1}
        if q1:
            p -= 10
            w5 = n >> p & 1023
            e1["NID_C"] = w5
        p -= 50
        w6 = n >> p & 1125899906842623
        e1["NID_BG"] = w6 >> 36
        e1["D_POSOFF"] = w6 >> 21 & 32767
        e1["Q_MPOSITION"] = w6 >> 20 & 1
        e1["M_POSITION"] = w6 & 1048575
        s0.append(e1)
    return t0, p


def write_to_train_79(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["positions"]
    c0 = len(s0) - 1
    e0 = s0[0]
    k0 = 5
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = e0["Q_NEWCOUNTRY"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 79 << 18 | x0 << 16 | x1 << 1 | x2
    if x2:
        x3 = e0["NID_C"]
        if x3 >> 10:
            raise Misfit
        v = v << 10 | x3
        b += 10
        k0 += 1
    if len(e0) != k0:
        raise Misfit
    x4 = e0["NID_BG"]
    x5 = e0["D_POSOFF"]
    x6 = e0["Q_MPOSITION"]
    x7 = e0["M_POSITION"]
    if x4 >> 14 | x5 >> 15 | x6 >> 1 | x7 >> 20 | c0 >> 5:
        raise Misfit
    v = v << 55 | x4 << 41 | x5 << 26 | x6 << 25 | x7 << 5 | c0
    for e0 in s0[1:]:
        b0 = 0
        k1 = 5
        x8 = e0["Q_NEWCOUNTRY"]
        if x8 >> 1:
            raise Misfit
        v0 = x8
        if x8:
            x9 = e0["NID_C"]
            if x9 >> 10:
                raise Misfit
            v0 = v0 << 10 | x9
            b0 += 10
            k1 += 1
        if len(e0) != k1:
            raise Misfit
        x10 = e0["NID_BG"]
        x11 = e0["D_POSOFF"]
        x12 = e0["Q_MPOSITION"]
        x13 = e0["M_POSITION"]
        if x10 >> 14 | x11 >> 15 | x12 >> 1 | x13 >> 20:
            raise Misfit
        v0 = v0 << 50 | x10 << 36 | x11 << 21 | x12 << 20 | x13
        v = v << b0 + 51 | v0
        b += b0 + 51
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 81


def read_to_train_80(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 49
    w0 = n >> p & 562949953421311
    p -= 35
    w1 = n >> p & 34359738367
    c0 = w1 & 31
    e0: Tree = {"D_MAMODE": w0 >> 9 & 32767, "M_MAMODE": w0 >> 7 & 3, "V_MAMODE": w0 & 127, "L_MAMODE": w1 >> 20, "L_ACKMAMODE": w1 >> 5 & 32767}
    s0: list[Tree] = [e0]
    t0: Tree = {"NID_PACKET": 80, "Q_DIR": w0 >> 39 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 24 & 3, "profiles": s0}
    for p in range(p - 54, p - 54 * c0 - 1, -54):
        w = n >> p & 18014398509481983
        s0.append({"D_MAMODE": w >> 39, "M_MAMODE": w >> 37 & 3, "V_MAMODE": w >> 30 & 127, "L_MAMODE": w >> 15 & 32767, "L_ACKMAMODE": w & 32767})
    return t0, p


def write_to_train_80(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["profiles"]
    c0 = len(s0) - 1
    e0 = s0[0]
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = e0["D_MAMODE"]
    x3 = e0["M_MAMODE"]
    x4 = e0["V_MAMODE"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 2 | x4 >> 7 or len(e0) != 5:
        raise Misfit
    v = 80 << 41 | x0 << 39 | x1 << 24 | x2 << 9 | x3 << 7 | x4
    x5 = e0["L_MAMODE"]
    x6 = e0["L_ACKMAMODE"]
    if x5 >> 15 | x6 >> 15 | c0 >> 5:
        raise Misfit
    v = v << 35 | x5 << 20 | x6 << 5 | c0
    for e0 in s0[1:]:
        x7 = e0["D_MAMODE"]
        x8 = e0["M_MAMODE"]
        x9 = e0["V_MAMODE"]
        x10 = e0["L_MAMODE"]
        x11 = e0["L_ACKMAMODE"]
        if x7 >> 15 | x8 >> 2 | x9 >> 7 | x10 >> 15 | x11 >> 15 or len(e0) != 5:
            raise Misfit
        v = v << 54 | x7 << 39 | x8 << 37 | x9 << 30 | x10 << 15 | x11
    b += 54 * c0
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 84


def read_to_train_200(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 29
    w0 = n >> p & 536870911
    t0: Tree = {"NID_PACKET": 200, "Q_DIR": w0 >> 19 & 3, "L_PACKET": length, "NID_VBCMK": w0 & 63}
    return t0, p


def write_to_train_200(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["NID_VBCMK"]
    if x0 >> 2 | x1 >> 6 or len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    v = 200 << 21 | x0 << 19 | x1
    return v, b + 29


def read_to_train_203(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 54
    w0 = n >> p & 18014398509481983
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 203, "Q_DIR": w0 >> 44 & 3, "L_PACKET": length, "Q_NVGUIPERM": w0 >> 30 & 1, "Q_NVSBFBPERM": w0 >> 29 & 1, "Q_NVINHSMICPERM": w0 >> 28 & 1, "A_NVMAXREDADH1": w0 >> 22 & 63, "A_NVMAXREDADH2": w0 >> 16 & 63, "A_NVMAXREDADH3": w0 >> 10 & 63, "M_NVAVADH": w0 >> 5 & 31, "M_NVEBCL": w0 >> 1 & 15, "Q_NVKINT": q0}
    if q0:
        p -= 2
        w1 = n >> p & 3
        q1 = w1
        e0: Tree = {"Q_NVKVINTSET": q1}
        if q1 == 1:
            p -= 12
            w2 = n >> p & 4095
            e0["A_NVP12"] = w2 >> 6
            e0["A_NVP23"] = w2 & 63
        p -= 14
        w3 = n >> p & 16383
        e1: Tree = {"V_NVKVINT": w3 >> 7, "M_NVKVINT": w3 & 127}
        if q1 == 1:
            p -= 7
            w4 = n >> p & 127
            e1["M_NVKVINT_P23"] = w4
        p -= 5
        w5 = n >> p & 31
        c1 = w5
        s1: list[Tree] = [e1]
        e0["speed_steps"] = s1
        while c1:
            c1 -= 1
            if p > 1024:
                n &= (1 << p) - 1
            p -= 14
            w6 = n >> p & 16383
            e2: Tree = {"V_NVKVINT": w6 >> 7, "M_NVKVINT": w6 & 127}
            if q1 == 1:
                p -= 7
                w7 = n >> p & 127
                e2["M_NVKVINT_P23"] = w7
            s1.append(e2)
        p -= 5
        w8 = n >> p & 31
        c0 = w8
        s0: list[Tree] = [e0]
        t0["kv_sets"] = s0
        while c0:
            c0 -= 1
            if p > 1024:
                n &= (1 << p) - 1
            p -= 2
            w9 = n >> p & 3
            q2 = w9
            e3: Tree = {"Q_NVKVINTSET": q2}
            if q2 == 1:
                p -= 12
                w10 = n >> p & 4095
                e3["A_NVP12"] = w10 >> 6
                e3["A_NVP23"] = w10 & 63
            p -= 14
            w11 = n >> p & 16383
            e4: Tree = {"V_NVKVINT": w11 >> 7, "M_NVKVINT": w11 & 127}
            if q2 == 1:
                p -= 7
                w12 = n >> p & 127
                e4["M_NVKVINT_P23"] = w12
            p -= 5
            w13 = n >> p & 31
            c2 = w13
            s2: list[Tree] = [e4]
            e3["speed_steps"] = s2
            while c2:
                c2 -= 1
                if p > 1024:
                    n &= (1 << p) - 1
                p -= 14
                w14 = n >> p & 16383
                e5: Tree = {"V_NVKVINT": w14 >> 7, "M_NVKVINT": w14 & 127}
                if q2 == 1:
                    p -= 7
                    w15 = n >> p & 127
                    e5["M_NVKVINT_P23"] = w15
                s2.append(e5)
            s0.append(e3)
        p -= 15
        w16 = n >> p & 32767
        c3 = w16 & 31
        e6: Tree = {"L_NVKRINT": w16 >> 10, "M_NVKRINT": w16 >> 5 & 31}
        s3: list[Tree] = [e6]
        t0["length_steps"] = s3
        for p in range(p - 10, p - 10 * c3 - 1, -10):
            w = n >> p & 1023
            s3.append({"L_NVKRINT": w >> 5, "M_NVKRINT": w & 31})
        p -= 5
        w17 = n >> p & 31
        t0["M_NVKTINT"] = w17
    return t0, p


def write_to_train_203(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 11
    x0 = t["Q_DIR"]
    x1 = t["Q_NVGUIPERM"]
    x2 = t["Q_NVSBFBPERM"]
    x3 = t["Q_NVINHSMICPERM"]
    x4 = t["A_NVMAXREDADH1"]
    x5 = t["A_NVMAXREDADH2"]
    x6 = t["A_NVMAXREDADH3"]
    x7 = t["M_NVAVADH"]
    x8 = t["M_NVEBCL"]
    x9 = t["Q_NVKINT"]
    if x0 >> 2 | x1 >> 1 | x2 >> 1 | x3 >> 1 | x4 >> 6 | x5 >> 6 | x6 >> 6 | x7 >> 5 | x8 >> 4 | x9 >> 1:
        raise Misfit
    v = 203 << 46 | x0 << 44 | x1 << 30 | x2 << 29 | x3 << 28 | x4 << 22 | x5 << 16 | x6 << 10 | x7 << 5 | x8 << 1 | x9
    if x9:
        s0 = t["kv_sets"]
        c0 = len(s0) - 1
        e0 = s0[0]
        k1 = 2
        x10 = e0["Q_NVKVINTSET"]
        if x10 >> 2:
            raise Misfit
        v = v << 2 | x10
        if x10 == 1:
            x11 = e0["A_NVP12"]
            x12 = e0["A_NVP23"]
            if x11 >> 6 | x12 >> 6:
                raise Misfit
            v = v << 12 | x11 << 6 | x12
            b += 12
            k1 += 2
        s1 = e0["speed_steps"]
        c1 = len(s1) - 1
        e1 = s1[0]
        k2 = 2
        x13 = e1["V_NVKVINT"]
        x14 = e1["M_NVKVINT"]
        if x13 >> 7 | x14 >> 7:
            raise Misfit
        v = v << 14 | x13 << 7 | x14
        if x10 == 1:
            x15 = e1["M_NVKVINT_P23"]
            if x15 >> 7:
                raise Misfit
            v = v << 7 | x15
            b += 7
            k2 += 1
        if len(e1) != k2:
            raise Misfit
        if c1 >> 5:
            raise Misfit
        v = v << 5 | c1
        for e1 in s1[1:]:
            b0 = 0
            k3 = 2
            x16 = e1["V_NVKVINT"]
            x17 = e1["M_NVKVINT"]
            if x16 >> 7 | x17 >> 7:
                raise Misfit
            v0 = x16 << 7 | x17
            if x10 == 1:
                x18 = e1["M_NVKVINT_P23"]
                if x18 >> 7:
                    raise Misfit
                v0 = v0 << 7 | x18
                b0 += 7
                k3 += 1
            if len(e1) != k3:
                raise Misfit
            v = v << b0 + 14 | v0
            b += b0 + 14
        if len(e0) != k1:
            raise Misfit
        if c0 >> 5:
            raise Misfit
        v = v << 5 | c0
        for e0 in s0[1:]:
            b1 = 0
            k4 = 2
            x19 = e0["Q_NVKVINTSET"]
            if x19 >> 2:
                raise Misfit
            v1 = x19
            if x19 == 1:
                x20 = e0["A_NVP12"]
                x21 = e0["A_NVP23"]
                if x20 >> 6 | x21 >> 6:
                    raise Misfit
                v1 = v1 << 12 | x20 << 6 | x21
                b1 += 12
                k4 += 2
            s2 = e0["speed_steps"]
            c2 = len(s2) - 1
            e2 = s2[0]
            k5 = 2
            x22 = e2["V_NVKVINT"]
            x23 = e2["M_NVKVINT"]
            if x22 >> 7 | x23 >> 7:
                raise Misfit
            v1 = v1 << 14 | x22 << 7 | x23
            if x19 == 1:
                x24 = e2["M_NVKVINT_P23"]
                if x24 >> 7:
                    raise Misfit
                v1 = v1 << 7 | x24
                b1 += 7
                k5 += 1
            if len(e2) != k5:
                raise Misfit
            if c2 >> 5:
                raise Misfit
            v1 = v1 << 5 | c2
            for e2 in s2[1:]:
                b2 = 0
                k6 = 2
                x25 = e2["V_NVKVINT"]
                x26 = e2["M_NVKVINT"]
                if x25 >> 7 | x26 >> 7:
                    raise Misfit
                v2 = x25 << 7 | x26
                if x19 == 1:
                    x27 = e2["M_NVKVINT_P23"]
                    if x27 >> 7:
                        raise Misfit
                    v2 = v2 << 7 | x27
                    b2 += 7
                    k6 += 1
                if len(e2) != k6:
                    raise Misfit
                v1 = v1 << b2 + 14 | v2
                b1 += b2 + 14
            if len(e0) != k4:
                raise Misfit
            v = v << b1 + 21 | v1
            b += b1 + 21
        s3 = t["length_steps"]
        c3 = len(s3) - 1
        e3 = s3[0]
        x28 = e3["L_NVKRINT"]
        x29 = e3["M_NVKRINT"]
        if x28 >> 5 | x29 >> 5 | c3 >> 5 or len(e3) != 2:
            raise Misfit
        v = v << 15 | x28 << 10 | x29 << 5 | c3
        for e3 in s3[1:]:
            x30 = e3["L_NVKRINT"]
            x31 = e3["M_NVKRINT"]
            if x30 >> 5 | x31 >> 5 or len(e3) != 2:
                raise Misfit
            v = v << 10 | x30 << 5 | x31
        b += 10 * c3
        x32 = t["M_NVKTINT"]
        if x32 >> 5:
            raise Misfit
        v = v << 5 | x32
        b += 46
        k0 += 3
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 54


def read_to_train_206(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 206, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_TRACKINIT": q0}
    if q0:
        p -= 15
        w1 = n >> p & 32767
        t0["D_TRACKINIT"] = w1
    if not q0:
        p -= 39
        w2 = n >> p & 549755813887
        c0 = w2 & 31
        e0: Tree = {"D_TRACKCOND": w2 >> 24, "L_TRACKCOND": w2 >> 9 & 32767, "M_TRACKCONDBC": w2 >> 5 & 15}
        s0: list[Tree] = [e0]
        t0["conditions"] = s0
        for p in range(p - 34, p - 34 * c0 - 1, -34):
            w = n >> p & 17179869183
            s0.append({"D_TRACKCOND": w >> 19, "L_TRACKCOND": w >> 4 & 32767, "M_TRACKCONDBC": w & 15})
    return t0, p


def write_to_train_206(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TRACKINIT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 206 << 18 | x0 << 16 | x1 << 1 | x2
    if x2:
        x3 = t["D_TRACKINIT"]
        if x3 >> 15:
            raise Misfit
        v = v << 15 | x3
        b += 15
        k0 += 1
    if not x2:
        s0 = t["conditions"]
        c0 = len(s0) - 1
        e0 = s0[0]
        x4 = e0["D_TRACKCOND"]
        x5 = e0["L_TRACKCOND"]
        x6 = e0["M_TRACKCONDBC"]
        if x4 >> 15 | x5 >> 15 | x6 >> 4 | c0 >> 5 or len(e0) != 3:
            raise Misfit
        v = v << 39 | x4 << 24 | x5 << 9 | x6 << 5 | c0
        for e0 in s0[1:]:
            x7 = e0["D_TRACKCOND"]
            x8 = e0["L_TRACKCOND"]
            x9 = e0["M_TRACKCONDBC"]
            if x7 >> 15 | x8 >> 15 | x9 >> 4 or len(e0) != 3:
                raise Misfit
            v = v << 34 | x7 << 19 | x8 << 4 | x9
        b += 34 * c0
        b += 39
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 26


def read_to_train_207(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 207, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_TRACKINIT": q0}
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
            p -= 7
            w4 = n >> p & 127
            e0["M_AXLELOADCAT"] = w4
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
            w = n >> p - 31 & 2147483647
            if (w >> 14 & 3) == 0:
                p -= 25
                s0.append({"D_SUITABILITY": w >> 16, "Q_SUITABILITY": 0, "M_LINEGAUGE": w >> 6 & 255})
            elif (w >> 14 & 3) == 1:
                p -= 24
                s0.append({"D_SUITABILITY": w >> 16, "Q_SUITABILITY": 1, "M_AXLELOADCAT": w >> 7 & 127})
            elif (w >> 14 & 3) == 2:
                if (w >> 10 & 15):
                    p -= 31
                    s0.append({"D_SUITABILITY": w >> 16, "Q_SUITABILITY": 2, "M_VOLTAGE": w >> 10 & 15, "NID_CTRACTION": w & 1023})
                else:
                    p -= 21
                    s0.append({"D_SUITABILITY": w >> 16, "Q_SUITABILITY": 2, "M_VOLTAGE": 0})
            else:
                p -= 17
                s0.append({"D_SUITABILITY": w >> 16, "Q_SUITABILITY": 3})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_207(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TRACKINIT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 207 << 18 | x0 << 16 | x1 << 1 | x2
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
            x7 = e0["M_AXLELOADCAT"]
            if x7 >> 7:
                raise Misfit
            v = v << 7 | x7
            b += 7
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
                    x13 = e0["M_AXLELOADCAT"]
                    if x10 >> 15 | x13 >> 7 or len(e0) != 3:
                        raise Misfit
                    v = v << 24 | x10 << 9 | x11 << 7 | x13
                    b += 7
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


def read_to_train_239(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 44
    w0 = n >> p & 17592186044415
    q0 = w0 & 15
    t0: Tree = {"NID_PACKET": 239, "Q_DIR": w0 >> 34 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 19 & 3, "D_TRACTION": w0 >> 4 & 32767, "M_VOLTAGE": q0}
    if q0:
        p -= 10
        w1 = n >> p & 1023
        t0["NID_CTRACTION"] = w1
    return t0, p


def write_to_train_239(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 5
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_TRACTION"]
    x3 = t["M_VOLTAGE"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 4:
        raise Misfit
    v = 239 << 36 | x0 << 34 | x1 << 19 | x2 << 4 | x3
    if x3:
        x4 = t["NID_CTRACTION"]
        if x4 >> 10:
            raise Misfit
        v = v << 10 | x4
        b += 10
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 44


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
        s1.append({"NID_NTC": w})
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
        x8 = e1["NID_NTC"]
        if x8 >> 8 or len(e1) != 1:
            raise Misfit
        v = v << 8 | x8
    b += 8 * c1
    if len(t) != 10 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 114


def read_message_132(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 25
    w1 = n >> p & 33554431
    t0: Tree = {"NID_MESSAGE": 132, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 1, "Q_TRACKDEL": w1 & 1}
    return t0, p


def write_message_132(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 132 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["Q_TRACKDEL"]
    if x1 >> 24 | x2 >> 1:
        raise Misfit
    v = v << 25 | x1 << 1 | x2
    return v, b + 75


def read_message_15(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 47
    w1 = n >> p & 140737488355327
    t0: Tree = {"NID_MESSAGE": 15, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 23, "NID_EM": w1 >> 19 & 15, "Q_SCALE": w1 >> 17 & 3, "Q_DIR": w1 >> 15 & 3, "D_EMERGENCYSTOP": w1 & 32767}
    return t0, p


def write_message_15(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 8 + ("L_MESSAGE" in t):
        raise Misfit
    v = 15 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["NID_EM"]
    x4 = t["Q_SCALE"]
    x5 = t["Q_DIR"]
    x6 = t["D_EMERGENCYSTOP"]
    if x2 >> 24 | x3 >> 4 | x4 >> 2 | x5 >> 2 | x6 >> 15:
        raise Misfit
    v = v << 47 | x2 << 23 | x3 << 19 | x4 << 17 | x5 << 15 | x6
    return v, b + 98


def read_message_34(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 58
    w1 = n >> p & 288230376151711743
    t0: Tree = {"NID_MESSAGE": 34, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 34, "Q_SCALE": w1 >> 32 & 3, "Q_DIR": w1 >> 30 & 3, "D_TAFDISPLAY": w1 >> 15 & 32767, "L_TAFDISPLAY": w1 & 32767}
    return t0, p


def write_message_34(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 8 + ("L_MESSAGE" in t):
        raise Misfit
    v = 34 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["Q_SCALE"]
    x4 = t["Q_DIR"]
    x5 = t["D_TAFDISPLAY"]
    x6 = t["L_TAFDISPLAY"]
    if x2 >> 24 | x3 >> 2 | x4 >> 2 | x5 >> 15 | x6 >> 15:
        raise Misfit
    v = v << 58 | x2 << 34 | x3 << 32 | x4 << 30 | x5 << 15 | x6
    return v, b + 109


CODEC = Codec(
    layouts="x1_chapter6",
    read_packet={
        "to-train": {
            2: v3_6_0.read_to_train_2,
            3: read_to_train_3,
            5: v3_6_0.read_to_train_5,
            6: v3_6_0.read_to_train_6,
            12: v3_6_0.read_to_train_12,
            15: v3_6_0.read_to_train_15,
            16: v3_6_0.read_to_train_16,
            21: v3_6_0.read_to_train_21,
            27: read_to_train_27,
            39: read_to_train_39,
            41: v3_6_0.read_to_train_41,
            42: v3_6_0.read_to_train_42,
            44: read_to_train_44,
            45: v3_6_0.read_to_train_45,
            46: v3_6_0.read_to_train_46,
            49: v3_6_0.read_to_train_49,
            51: read_to_train_51,
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
            79: read_to_train_79,
            80: read_to_train_80,
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
            145: v3_6_0.read_to_train_145,
            200: read_to_train_200,
            203: read_to_train_203,
            206: read_to_train_206,
            207: read_to_train_207,
            239: read_to_train_239,
            254: v3_6_0.read_to_train_254,
            255: v3_6_0.read_to_train_255,
        },
        "to-track": {
            0: v3_6_0.read_to_track_0,
            1: v3_6_0.read_to_track_1,
            3: read_to_track_3,
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
            15: read_message_15,
            16: v3_6_0.read_message_16,
            18: v3_6_0.read_message_18,
            24: v3_6_0.read_message_24,
            27: v3_6_0.read_message_27,
            28: v3_6_0.read_message_28,
            32: v3_6_0.read_message_32,
            33: v3_6_0.read_message_33,
            34: read_message_34,
            37: v3_6_0.read_message_37,
            39: v3_6_0.read_message_39,
            40: v3_6_0.read_message_40,
            41: v3_6_0.read_message_41,
            43: v3_6_0.read_message_43,
            45: v3_6_0.read_message_45,
        },
        "to-track": {
            129: v3_6_0.read_message_129,
            130: v3_6_0.read_message_130,
            132: read_message_132,
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
            2: v3_6_0.write_to_train_2,
            3: write_to_train_3,
            5: v3_6_0.write_to_train_5,
            6: v3_6_0.write_to_train_6,
            12: v3_6_0.write_to_train_12,
            15: v3_6_0.write_to_train_15,
            16: v3_6_0.write_to_train_16,
            21: v3_6_0.write_to_train_21,
            27: write_to_train_27,
            39: write_to_train_39,
            41: v3_6_0.write_to_train_41,
            42: v3_6_0.write_to_train_42,
            44: write_to_train_44,
            45: v3_6_0.write_to_train_45,
            46: v3_6_0.write_to_train_46,
            49: v3_6_0.write_to_train_49,
            51: write_to_train_51,
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
            79: write_to_train_79,
            80: write_to_train_80,
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
            145: v3_6_0.write_to_train_145,
            200: write_to_train_200,
            203: write_to_train_203,
            206: write_to_train_206,
            207: write_to_train_207,
            239: write_to_train_239,
            254: v3_6_0.write_to_train_254,
            255: v3_6_0.write_to_train_255,
        },
        "to-track": {
            0: v3_6_0.write_to_track_0,
            1: v3_6_0.write_to_track_1,
            3: write_to_track_3,
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
            15: write_message_15,
            16: v3_6_0.write_message_16,
            18: v3_6_0.write_message_18,
            24: v3_6_0.write_message_24,
            27: v3_6_0.write_message_27,
            28: v3_6_0.write_message_28,
            32: v3_6_0.write_message_32,
            33: v3_6_0.write_message_33,
            34: write_message_34,
            37: v3_6_0.write_message_37,
            39: v3_6_0.write_message_39,
            40: v3_6_0.write_message_40,
            41: v3_6_0.write_message_41,
            43: v3_6_0.write_message_43,
            45: v3_6_0.write_message_45,
        },
        "to-track": {
            129: v3_6_0.write_message_129,
            130: v3_6_0.write_message_130,
            132: write_message_132,
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
    since={"to-train": {2: "1.1", 6: "1.1", 135: "1.1", 145: "1.1", 200: "1.1", 203: "1.1", 206: "1.1", 207: "1.1", 239: "1.1"}, "to-track": {}},
    evidence=(('weaker', 'named in packet 3, but defined in no clause of chapter 6: as its successor is defined', ('variable', 'Q_NVSRBKTRG')), ('inferred', 'optional packets as in issue 3.6.0; issue 2.3.0 has packet 80 only', ('message', 'to-train', 9))),
)
