"""Readers and writers of SUBSET-026, layouts v3_6_0.

Written by ``python -m fishplate.engine.generate`` from the registry; never edit it.
"""

from __future__ import annotations

from fishplate.bits import blob, digits_text, digits_value, read_blob
from fishplate.engine.runtime import Codec, Misfit, Tree


def read_to_train_0(n: int, p: int) -> tuple[Tree, int]:
    p -= 14
    w0 = n >> p & 16383
    t0: Tree = {"NID_PACKET": 0, "NID_VBCMK": w0 & 63}
    return t0, p


def write_to_train_0(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["NID_VBCMK"]
    if x0 >> 6 or len(t) != 2:
        raise Misfit
    v = x0
    return v, b + 14


def read_to_train_2(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 30
    w0 = n >> p & 1073741823
    t0: Tree = {"NID_PACKET": 2, "Q_DIR": w0 >> 20 & 3, "L_PACKET": length, "M_VERSION": w0 & 127}
    return t0, p


def write_to_train_2(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["M_VERSION"]
    if x0 >> 2 | x1 >> 7 or len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    v = 2 << 22 | x0 << 20 | x1
    return v, b + 30


def read_to_train_3(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 55
    w0 = n >> p & 36028797018963967
    c0 = w0 & 31
    e0: Tree = {"NID_C": w0 >> 5 & 1023}
    s0: list[Tree] = [e0]
    t0: Tree = {"NID_PACKET": 3, "Q_DIR": w0 >> 45 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 30 & 3, "D_VALIDNV": w0 >> 15 & 32767, "countries": s0}
    for p in range(p - 10, p - 10 * c0 - 1, -10):
        w = n >> p & 1023
        s0.append({"NID_C": w})
    p -= 60
    w1 = n >> p & 1152921504606846975
    p -= 56
    w2 = n >> p & 72057594037927935
    p -= 59
    w3 = n >> p & 576460752303423487
    q0 = w3 & 1
    t0["V_NVSHUNT"] = w1 >> 53
    t0["V_NVSTFF"] = w1 >> 46 & 127
    t0["V_NVONSIGHT"] = w1 >> 39 & 127
    t0["V_NVLIMSUPERV"] = w1 >> 32 & 127
    t0["V_NVUNFIT"] = w1 >> 25 & 127
    t0["V_NVREL"] = w1 >> 18 & 127
    t0["D_NVROLL"] = w1 >> 3 & 32767
    t0["Q_NVSBTSMPERM"] = w1 >> 2 & 1
    t0["Q_NVEMRRLS"] = w1 >> 1 & 1
    t0["Q_NVGUIPERM"] = w1 & 1
    t0["Q_NVSBFBPERM"] = w2 >> 55
    t0["Q_NVINHSMICPERM"] = w2 >> 54 & 1
    t0["V_NVALLOWOVTRP"] = w2 >> 47 & 127
    t0["V_NVSUPOVTRP"] = w2 >> 40 & 127
    t0["D_NVOVTRP"] = w2 >> 25 & 32767
    t0["T_NVOVTRP"] = w2 >> 17 & 255
    t0["D_NVPOTRP"] = w2 >> 2 & 32767
    t0["M_NVCONTACT"] = w2 & 3
    t0["T_NVCONTACT"] = w3 >> 51
    t0["M_NVDERUN"] = w3 >> 50 & 1
    t0["D_NVSTFF"] = w3 >> 35 & 32767
    t0["Q_NVDRIVER_ADHES"] = w3 >> 34 & 1
    t0["A_NVMAXREDADH1"] = w3 >> 28 & 63
    t0["A_NVMAXREDADH2"] = w3 >> 22 & 63
    t0["A_NVMAXREDADH3"] = w3 >> 16 & 63
    t0["Q_NVLOCACC"] = w3 >> 10 & 63
    t0["M_NVAVADH"] = w3 >> 5 & 31
    t0["M_NVEBCL"] = w3 >> 1 & 15
    t0["Q_NVKINT"] = q0
    if q0:
        p -= 2
        w4 = n >> p & 3
        q1 = w4
        e2: Tree = {"Q_NVKVINTSET": q1}
        if q1 == 1:
            p -= 12
            w5 = n >> p & 4095
            e2["A_NVP12"] = w5 >> 6
            e2["A_NVP23"] = w5 & 63
        p -= 14
        w6 = n >> p & 16383
        e3: Tree = {"V_NVKVINT": w6 >> 7, "M_NVKVINT": w6 & 127}
        if q1 == 1:
            p -= 7
            w7 = n >> p & 127
            e3["M_NVKVINT_P23"] = w7
        p -= 5
        w8 = n >> p & 31
        c2 = w8
        s2: list[Tree] = [e3]
        e2["speed_steps"] = s2
        while c2:
            c2 -= 1
            if p > 1024:
                n &= (1 << p) - 1
            p -= 14
            w9 = n >> p & 16383
            e4: Tree = {"V_NVKVINT": w9 >> 7, "M_NVKVINT": w9 & 127}
            if q1 == 1:
                p -= 7
                w10 = n >> p & 127
                e4["M_NVKVINT_P23"] = w10
            s2.append(e4)
        p -= 5
        w11 = n >> p & 31
        c1 = w11
        s1: list[Tree] = [e2]
        t0["kv_sets"] = s1
        while c1:
            c1 -= 1
            if p > 1024:
                n &= (1 << p) - 1
            p -= 2
            w12 = n >> p & 3
            q2 = w12
            e5: Tree = {"Q_NVKVINTSET": q2}
            if q2 == 1:
                p -= 12
                w13 = n >> p & 4095
                e5["A_NVP12"] = w13 >> 6
                e5["A_NVP23"] = w13 & 63
            p -= 14
            w14 = n >> p & 16383
            e6: Tree = {"V_NVKVINT": w14 >> 7, "M_NVKVINT": w14 & 127}
            if q2 == 1:
                p -= 7
                w15 = n >> p & 127
                e6["M_NVKVINT_P23"] = w15
            p -= 5
            w16 = n >> p & 31
            c3 = w16
            s3: list[Tree] = [e6]
            e5["speed_steps"] = s3
            while c3:
                c3 -= 1
                if p > 1024:
                    n &= (1 << p) - 1
                p -= 14
                w17 = n >> p & 16383
                e7: Tree = {"V_NVKVINT": w17 >> 7, "M_NVKVINT": w17 & 127}
                if q2 == 1:
                    p -= 7
                    w18 = n >> p & 127
                    e7["M_NVKVINT_P23"] = w18
                s3.append(e7)
            s1.append(e5)
        p -= 15
        w19 = n >> p & 32767
        c4 = w19 & 31
        e8: Tree = {"L_NVKRINT": w19 >> 10, "M_NVKRINT": w19 >> 5 & 31}
        s4: list[Tree] = [e8]
        t0["length_steps"] = s4
        for p in range(p - 10, p - 10 * c4 - 1, -10):
            w = n >> p & 1023
            s4.append({"L_NVKRINT": w >> 5, "M_NVKRINT": w & 31})
        p -= 5
        w20 = n >> p & 31
        t0["M_NVKTINT"] = w20
    return t0, p


def write_to_train_3(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 34
    s0 = t["countries"]
    c0 = len(s0) - 1
    e0 = s0[0]
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_VALIDNV"]
    x3 = e0["NID_C"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 10 | c0 >> 5 or len(e0) != 1:
        raise Misfit
    v = 3 << 47 | x0 << 45 | x1 << 30 | x2 << 15 | x3 << 5 | c0
    for e0 in s0[1:]:
        x4 = e0["NID_C"]
        if x4 >> 10 or len(e0) != 1:
            raise Misfit
        v = v << 10 | x4
    b += 10 * c0
    x5 = t["V_NVSHUNT"]
    x6 = t["V_NVSTFF"]
    x7 = t["V_NVONSIGHT"]
    x8 = t["V_NVLIMSUPERV"]
    x9 = t["V_NVUNFIT"]
    x10 = t["V_NVREL"]
    x11 = t["D_NVROLL"]
    x12 = t["Q_NVSBTSMPERM"]
    x13 = t["Q_NVEMRRLS"]
    x14 = t["Q_NVGUIPERM"]
    if x5 >> 7 | x6 >> 7 | x7 >> 7 | x8 >> 7 | x9 >> 7 | x10 >> 7 | x11 >> 15 | x12 >> 1 | x13 >> 1 | x14 >> 1:
        raise Misfit
    v = v << 60 | x5 << 53 | x6 << 46 | x7 << 39 | x8 << 32 | x9 << 25 | x10 << 18 | x11 << 3 | x12 << 2 | x13 << 1 | x14
    x15 = t["Q_NVSBFBPERM"]
    x16 = t["Q_NVINHSMICPERM"]
    x17 = t["V_NVALLOWOVTRP"]
    x18 = t["V_NVSUPOVTRP"]
    x19 = t["D_NVOVTRP"]
    x20 = t["T_NVOVTRP"]
    x21 = t["D_NVPOTRP"]
    x22 = t["M_NVCONTACT"]
    if x15 >> 1 | x16 >> 1 | x17 >> 7 | x18 >> 7 | x19 >> 15 | x20 >> 8 | x21 >> 15 | x22 >> 2:
        raise Misfit
    v = v << 56 | x15 << 55 | x16 << 54 | x17 << 47 | x18 << 40 | x19 << 25 | x20 << 17 | x21 << 2 | x22
    x23 = t["T_NVCONTACT"]
    x24 = t["M_NVDERUN"]
    x25 = t["D_NVSTFF"]
    x26 = t["Q_NVDRIVER_ADHES"]
    x27 = t["A_NVMAXREDADH1"]
    x28 = t["A_NVMAXREDADH2"]
    x29 = t["A_NVMAXREDADH3"]
    x30 = t["Q_NVLOCACC"]
    x31 = t["M_NVAVADH"]
    x32 = t["M_NVEBCL"]
    x33 = t["Q_NVKINT"]
    if x23 >> 8 | x24 >> 1 | x25 >> 15 | x26 >> 1 | x27 >> 6 | x28 >> 6 | x29 >> 6 | x30 >> 6 | x31 >> 5 | x32 >> 4 | x33 >> 1:
        raise Misfit
    v = v << 59 | x23 << 51 | x24 << 50 | x25 << 35 | x26 << 34 | x27 << 28 | x28 << 22 | x29 << 16 | x30 << 10 | x31 << 5 | x32 << 1 | x33
    if x33:
        s1 = t["kv_sets"]
        c1 = len(s1) - 1
        e1 = s1[0]
        k1 = 2
        x34 = e1["Q_NVKVINTSET"]
        if x34 >> 2:
            raise Misfit
        v = v << 2 | x34
        if x34 == 1:
            x35 = e1["A_NVP12"]
            x36 = e1["A_NVP23"]
            if x35 >> 6 | x36 >> 6:
                raise Misfit
            v = v << 12 | x35 << 6 | x36
            b += 12
            k1 += 2
        s2 = e1["speed_steps"]
        c2 = len(s2) - 1
        e2 = s2[0]
        k2 = 2
        x37 = e2["V_NVKVINT"]
        x38 = e2["M_NVKVINT"]
        if x37 >> 7 | x38 >> 7:
            raise Misfit
        v = v << 14 | x37 << 7 | x38
        if x34 == 1:
            x39 = e2["M_NVKVINT_P23"]
            if x39 >> 7:
                raise Misfit
            v = v << 7 | x39
            b += 7
            k2 += 1
        if len(e2) != k2:
            raise Misfit
        if c2 >> 5:
            raise Misfit
        v = v << 5 | c2
        for e2 in s2[1:]:
            b0 = 0
            k3 = 2
            x40 = e2["V_NVKVINT"]
            x41 = e2["M_NVKVINT"]
            if x40 >> 7 | x41 >> 7:
                raise Misfit
            v0 = x40 << 7 | x41
            if x34 == 1:
                x42 = e2["M_NVKVINT_P23"]
                if x42 >> 7:
                    raise Misfit
                v0 = v0 << 7 | x42
                b0 += 7
                k3 += 1
            if len(e2) != k3:
                raise Misfit
            v = v << b0 + 14 | v0
            b += b0 + 14
        if len(e1) != k1:
            raise Misfit
        if c1 >> 5:
            raise Misfit
        v = v << 5 | c1
        for e1 in s1[1:]:
            b1 = 0
            k4 = 2
            x43 = e1["Q_NVKVINTSET"]
            if x43 >> 2:
                raise Misfit
            v1 = x43
            if x43 == 1:
                x44 = e1["A_NVP12"]
                x45 = e1["A_NVP23"]
                if x44 >> 6 | x45 >> 6:
                    raise Misfit
                v1 = v1 << 12 | x44 << 6 | x45
                b1 += 12
                k4 += 2
            s3 = e1["speed_steps"]
            c3 = len(s3) - 1
            e3 = s3[0]
            k5 = 2
            x46 = e3["V_NVKVINT"]
            x47 = e3["M_NVKVINT"]
            if x46 >> 7 | x47 >> 7:
                raise Misfit
            v1 = v1 << 14 | x46 << 7 | x47
            if x43 == 1:
                x48 = e3["M_NVKVINT_P23"]
                if x48 >> 7:
                    raise Misfit
                v1 = v1 << 7 | x48
                b1 += 7
                k5 += 1
            if len(e3) != k5:
                raise Misfit
            if c3 >> 5:
                raise Misfit
            v1 = v1 << 5 | c3
            for e3 in s3[1:]:
                b2 = 0
                k6 = 2
                x49 = e3["V_NVKVINT"]
                x50 = e3["M_NVKVINT"]
                if x49 >> 7 | x50 >> 7:
                    raise Misfit
                v2 = x49 << 7 | x50
                if x43 == 1:
                    x51 = e3["M_NVKVINT_P23"]
                    if x51 >> 7:
                        raise Misfit
                    v2 = v2 << 7 | x51
                    b2 += 7
                    k6 += 1
                if len(e3) != k6:
                    raise Misfit
                v1 = v1 << b2 + 14 | v2
                b1 += b2 + 14
            if len(e1) != k4:
                raise Misfit
            v = v << b1 + 21 | v1
            b += b1 + 21
        s4 = t["length_steps"]
        c4 = len(s4) - 1
        e4 = s4[0]
        x52 = e4["L_NVKRINT"]
        x53 = e4["M_NVKRINT"]
        if x52 >> 5 | x53 >> 5 | c4 >> 5 or len(e4) != 2:
            raise Misfit
        v = v << 15 | x52 << 10 | x53 << 5 | c4
        for e4 in s4[1:]:
            x54 = e4["L_NVKRINT"]
            x55 = e4["M_NVKRINT"]
            if x54 >> 5 | x55 >> 5 or len(e4) != 2:
                raise Misfit
            v = v << 10 | x54 << 5 | x55
        b += 10 * c4
        x56 = t["M_NVKTINT"]
        if x56 >> 5:
            raise Misfit
        v = v << 5 | x56
        b += 46
        k0 += 3
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 230


def read_to_train_5(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 41
    w0 = n >> p & 2199023255551
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 5, "Q_DIR": w0 >> 31 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 16 & 3}
    e0: Tree = {"D_LINK": w0 >> 1 & 32767, "Q_NEWCOUNTRY": q0}
    if q0:
        p -= 10
        w1 = n >> p & 1023
        e0["NID_C"] = w1
    p -= 23
    w2 = n >> p & 8388607
    e0["NID_BG"] = w2 >> 9
    e0["Q_LINKORIENTATION"] = w2 >> 8 & 1
    e0["Q_LINKREACTION"] = w2 >> 6 & 3
    e0["Q_LOCACC"] = w2 & 63
    p -= 5
    w3 = n >> p & 31
    c0 = w3
    s0: list[Tree] = [e0]
    t0["links"] = s0
    while c0:
        c0 -= 1
        w = n >> p - 49 & 562949953421311
        if w & 8589934592:
            p -= 49
            s0.append({"D_LINK": w >> 34, "Q_NEWCOUNTRY": 1, "NID_C": w >> 23 & 1023, "NID_BG": w >> 9 & 16383, "Q_LINKORIENTATION": w >> 8 & 1, "Q_LINKREACTION": w >> 6 & 3, "Q_LOCACC": w & 63})
        else:
            p -= 39
            s0.append({"D_LINK": w >> 34, "Q_NEWCOUNTRY": 0, "NID_BG": w >> 19 & 16383, "Q_LINKORIENTATION": w >> 18 & 1, "Q_LINKREACTION": w >> 16 & 3, "Q_LOCACC": w >> 10 & 63})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_5(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["links"]
    c0 = len(s0) - 1
    e0 = s0[0]
    k0 = 6
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = e0["D_LINK"]
    x3 = e0["Q_NEWCOUNTRY"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 1:
        raise Misfit
    v = 5 << 33 | x0 << 31 | x1 << 16 | x2 << 1 | x3
    if x3:
        x4 = e0["NID_C"]
        if x4 >> 10:
            raise Misfit
        v = v << 10 | x4
        b += 10
        k0 += 1
    if len(e0) != k0:
        raise Misfit
    x5 = e0["NID_BG"]
    x6 = e0["Q_LINKORIENTATION"]
    x7 = e0["Q_LINKREACTION"]
    x8 = e0["Q_LOCACC"]
    if x5 >> 14 | x6 >> 1 | x7 >> 2 | x8 >> 6 | c0 >> 5:
        raise Misfit
    v = v << 28 | x5 << 14 | x6 << 13 | x7 << 11 | x8 << 5 | c0
    for e0 in s0[1:]:
        x9 = e0["D_LINK"]
        x10 = e0["Q_NEWCOUNTRY"]
        if x10 == 1:
            x11 = e0["NID_C"]
            x12 = e0["NID_BG"]
            x13 = e0["Q_LINKORIENTATION"]
            x14 = e0["Q_LINKREACTION"]
            x15 = e0["Q_LOCACC"]
            if x9 >> 15 | x11 >> 10 | x12 >> 14 | x13 >> 1 | x14 >> 2 | x15 >> 6 or len(e0) != 7:
                raise Misfit
            v = v << 49 | x9 << 34 | x10 << 33 | x11 << 23 | x12 << 9 | x13 << 8 | x14 << 6 | x15
            b += 10
        else:
            x16 = e0["NID_BG"]
            x17 = e0["Q_LINKORIENTATION"]
            x18 = e0["Q_LINKREACTION"]
            x19 = e0["Q_LOCACC"]
            if x9 >> 15 | x10 >> 1 | x16 >> 14 | x17 >> 1 | x18 >> 2 | x19 >> 6 or len(e0) != 6:
                raise Misfit
            v = v << 39 | x9 << 24 | x10 << 23 | x16 << 9 | x17 << 8 | x18 << 6 | x19
    b += 39 * c0
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 69


def read_to_train_6(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 40
    w0 = n >> p & 1099511627775
    q0 = w0 >> 16 & 1
    t0: Tree = {"NID_PACKET": 6, "Q_DIR": w0 >> 30 & 3, "L_PACKET": length, "Q_VBCO": q0, "NID_VBCMK": w0 >> 10 & 63, "NID_C": w0 & 1023}
    if q0:
        p -= 8
        w1 = n >> p & 255
        t0["T_VBC"] = w1
    return t0, p


def write_to_train_6(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 5
    x0 = t["Q_DIR"]
    x1 = t["Q_VBCO"]
    x2 = t["NID_VBCMK"]
    x3 = t["NID_C"]
    if x0 >> 2 | x1 >> 1 | x2 >> 6 | x3 >> 10:
        raise Misfit
    v = 6 << 32 | x0 << 30 | x1 << 16 | x2 << 10 | x3
    if x1:
        x4 = t["T_VBC"]
        if x4 >> 8:
            raise Misfit
        v = v << 8 | x4
        b += 8
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 40


def read_to_train_12(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 54
    w0 = n >> p & 18014398509481983
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 12, "Q_DIR": w0 >> 44 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 29 & 3, "V_MAIN": w0 >> 22 & 127, "V_EMA": w0 >> 15 & 127, "T_EMA": w0 >> 5 & 1023, "sections": s0}
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
    x3 = t["V_EMA"]
    x4 = t["T_EMA"]
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


def read_to_train_13(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 13, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_NEWCOUNTRY": q0}
    if q0:
        p -= 10
        w1 = n >> p & 1023
        t0["NID_C"] = w1
    p -= 15
    w2 = n >> p & 32767
    q1 = w2 & 1
    t0["NID_BG"] = w2 >> 1
    e0: Tree = {"Q_NEWCOUNTRY": q1}
    if q1:
        p -= 10
        w3 = n >> p & 1023
        e0["NID_C"] = w3
    p -= 29
    w4 = n >> p & 536870911
    e0["NID_BG"] = w4 >> 15
    e0["D_SR"] = w4 & 32767
    p -= 5
    w5 = n >> p & 31
    c0 = w5
    s0: list[Tree] = [e0]
    t0["distances"] = s0
    while c0:
        c0 -= 1
        w = n >> p - 40 & 1099511627775
        if w & 549755813888:
            p -= 40
            s0.append({"Q_NEWCOUNTRY": 1, "NID_C": w >> 29 & 1023, "NID_BG": w >> 15 & 16383, "D_SR": w & 32767})
        else:
            p -= 30
            s0.append({"Q_NEWCOUNTRY": 0, "NID_BG": w >> 25 & 16383, "D_SR": w >> 10 & 32767})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_13(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 6
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_NEWCOUNTRY"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 13 << 18 | x0 << 16 | x1 << 1 | x2
    if x2:
        x3 = t["NID_C"]
        if x3 >> 10:
            raise Misfit
        v = v << 10 | x3
        b += 10
        k0 += 1
    s0 = t["distances"]
    c0 = len(s0) - 1
    e0 = s0[0]
    k1 = 3
    x4 = t["NID_BG"]
    x5 = e0["Q_NEWCOUNTRY"]
    if x4 >> 14 | x5 >> 1:
        raise Misfit
    v = v << 15 | x4 << 1 | x5
    if x5:
        x6 = e0["NID_C"]
        if x6 >> 10:
            raise Misfit
        v = v << 10 | x6
        b += 10
        k1 += 1
    if len(e0) != k1:
        raise Misfit
    x7 = e0["NID_BG"]
    x8 = e0["D_SR"]
    if x7 >> 14 | x8 >> 15 | c0 >> 5:
        raise Misfit
    v = v << 34 | x7 << 20 | x8 << 5 | c0
    for e0 in s0[1:]:
        x9 = e0["Q_NEWCOUNTRY"]
        if x9 == 1:
            x10 = e0["NID_C"]
            x11 = e0["NID_BG"]
            x12 = e0["D_SR"]
            if x10 >> 10 | x11 >> 14 | x12 >> 15 or len(e0) != 4:
                raise Misfit
            v = v << 40 | x9 << 39 | x10 << 29 | x11 << 15 | x12
            b += 10
        else:
            x13 = e0["NID_BG"]
            x14 = e0["D_SR"]
            if x9 >> 1 | x13 >> 14 | x14 >> 15 or len(e0) != 3:
                raise Misfit
            v = v << 30 | x9 << 29 | x13 << 15 | x14
    b += 30 * c0
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 75


def read_to_train_15(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 47
    w0 = n >> p & 140737488355327
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 15, "Q_DIR": w0 >> 37 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 22 & 3, "V_EMA": w0 >> 15 & 127, "T_EMA": w0 >> 5 & 1023, "sections": s0}
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
    x2 = t["V_EMA"]
    x3 = t["T_EMA"]
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


def read_to_train_16(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 40
    w0 = n >> p & 1099511627775
    t0: Tree = {"NID_PACKET": 16, "Q_DIR": w0 >> 30 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 15 & 3, "L_SECTION": w0 & 32767}
    return t0, p


def write_to_train_16(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["L_SECTION"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 or len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    v = 16 << 32 | x0 << 30 | x1 << 15 | x2
    return v, b + 40


def read_to_train_21(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 54
    w0 = n >> p & 18014398509481983
    c0 = w0 & 31
    e0: Tree = {"D_GRADIENT": w0 >> 14 & 32767, "Q_GDIR": w0 >> 13 & 1, "G_A": w0 >> 5 & 255}
    s0: list[Tree] = [e0]
    t0: Tree = {"NID_PACKET": 21, "Q_DIR": w0 >> 44 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 29 & 3, "gradients": s0}
    for p in range(p - 24, p - 24 * c0 - 1, -24):
        w = n >> p & 16777215
        s0.append({"D_GRADIENT": w >> 9, "Q_GDIR": w >> 8 & 1, "G_A": w & 255})
    return t0, p


def write_to_train_21(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["gradients"]
    c0 = len(s0) - 1
    e0 = s0[0]
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = e0["D_GRADIENT"]
    x3 = e0["Q_GDIR"]
    x4 = e0["G_A"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 1 | x4 >> 8 | c0 >> 5 or len(e0) != 3:
        raise Misfit
    v = 21 << 46 | x0 << 44 | x1 << 29 | x2 << 14 | x3 << 13 | x4 << 5 | c0
    for e0 in s0[1:]:
        x5 = e0["D_GRADIENT"]
        x6 = e0["Q_GDIR"]
        x7 = e0["G_A"]
        if x5 >> 15 | x6 >> 1 | x7 >> 8 or len(e0) != 3:
            raise Misfit
        v = v << 24 | x5 << 9 | x6 << 8 | x7
    b += 24 * c0
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 54


def read_to_train_27(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 53
    w0 = n >> p & 9007199254740991
    c1 = w0 & 31
    t0: Tree = {"NID_PACKET": 27, "Q_DIR": w0 >> 43 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 28 & 3}
    s1: list[Tree] = []
    e0: Tree = {"D_STATIC": w0 >> 13 & 32767, "V_STATIC": w0 >> 6 & 127, "Q_FRONT": w0 >> 5 & 1, "categories": s1}
    while c1:
        c1 -= 1
        w = n >> p - 13 & 8191
        if w < 2048:
            p -= 13
            s1.append({"Q_DIFF": 0, "NC_CDDIFF": w >> 7 & 15, "V_DIFF": w & 127})
        elif w < 6144:
            p -= 13
            s1.append({"Q_DIFF": w >> 11, "NC_DIFF": w >> 7 & 15, "V_DIFF": w & 127})
        else:
            p -= 9
            s1.append({"Q_DIFF": 3, "V_DIFF": w >> 4 & 127})
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
        while c2:
            c2 -= 1
            w = n >> p - 13 & 8191
            if w < 2048:
                p -= 13
                s2.append({"Q_DIFF": 0, "NC_CDDIFF": w >> 7 & 15, "V_DIFF": w & 127})
            elif w < 6144:
                p -= 13
                s2.append({"Q_DIFF": w >> 11, "NC_DIFF": w >> 7 & 15, "V_DIFF": w & 127})
            else:
                p -= 9
                s2.append({"Q_DIFF": 3, "V_DIFF": w >> 4 & 127})
        s0.append(e2)
    if p < 60:
        raise Misfit
    return t0, p - 60


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
        x5 = e1["Q_DIFF"]
        if x5 == 0:
            x6 = e1["NC_CDDIFF"]
            x7 = e1["V_DIFF"]
            if x6 >> 4 | x7 >> 7 or len(e1) != 3:
                raise Misfit
            v = v << 13 | x5 << 11 | x6 << 7 | x7
        else:
            if 1 <= x5 <= 2:
                x8 = e1["NC_DIFF"]
                x9 = e1["V_DIFF"]
                if x8 >> 4 | x9 >> 7 or len(e1) != 3:
                    raise Misfit
                v = v << 13 | x5 << 11 | x8 << 7 | x9
            else:
                x10 = e1["V_DIFF"]
                if x5 >> 2 | x10 >> 7 or len(e1) != 2:
                    raise Misfit
                v = v << 9 | x5 << 7 | x10
                b += -4
    b += 13 * c1
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
        x11 = e0["D_STATIC"]
        x12 = e0["V_STATIC"]
        x13 = e0["Q_FRONT"]
        if x11 >> 15 | x12 >> 7 | x13 >> 1 | c2 >> 5:
            raise Misfit
        v0 = x11 << 13 | x12 << 6 | x13 << 5 | c2
        for e2 in s2:
            x14 = e2["Q_DIFF"]
            if x14 == 0:
                x15 = e2["NC_CDDIFF"]
                x16 = e2["V_DIFF"]
                if x15 >> 4 | x16 >> 7 or len(e2) != 3:
                    raise Misfit
                v0 = v0 << 13 | x14 << 11 | x15 << 7 | x16
            else:
                if 1 <= x14 <= 2:
                    x17 = e2["NC_DIFF"]
                    x18 = e2["V_DIFF"]
                    if x17 >> 4 | x18 >> 7 or len(e2) != 3:
                        raise Misfit
                    v0 = v0 << 13 | x14 << 11 | x17 << 7 | x18
                else:
                    x19 = e2["V_DIFF"]
                    if x14 >> 2 | x19 >> 7 or len(e2) != 2:
                        raise Misfit
                    v0 = v0 << 9 | x14 << 7 | x19
                    b0 += -4
        b0 += 13 * c2
        if len(e0) != 4:
            raise Misfit
        v = v << b0 + 28 | v0
        b += b0 + 28
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 58


def read_to_train_39(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 44
    w0 = n >> p & 17592186044415
    q0 = w0 & 15
    t0: Tree = {"NID_PACKET": 39, "Q_DIR": w0 >> 34 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 19 & 3, "D_TRACTION": w0 >> 4 & 32767, "M_VOLTAGE": q0}
    if q0:
        p -= 10
        w1 = n >> p & 1023
        t0["NID_CTRACTION"] = w1
    return t0, p


def write_to_train_39(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 5
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_TRACTION"]
    x3 = t["M_VOLTAGE"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 4:
        raise Misfit
    v = 39 << 36 | x0 << 34 | x1 << 19 | x2 << 4 | x3
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


def read_to_train_40(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 50
    w0 = n >> p & 1125899906842623
    t0: Tree = {"NID_PACKET": 40, "Q_DIR": w0 >> 40 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 25 & 3, "D_CURRENT": w0 >> 10 & 32767, "M_CURRENT": w0 & 1023}
    return t0, p


def write_to_train_40(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_CURRENT"]
    x3 = t["M_CURRENT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 10 or len(t) != 5 + ("L_PACKET" in t):
        raise Misfit
    v = 40 << 42 | x0 << 40 | x1 << 25 | x2 << 10 | x3
    return v, b + 50


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
        e0["NID_NTC"] = w1
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
            s0.append({"M_LEVELTR": 1, "NID_NTC": w >> 15 & 255, "L_ACKLEVELTR": w & 32767})
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
        x4 = e0["NID_NTC"]
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
            x7 = e0["NID_NTC"]
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


def read_to_train_42(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 48
    w0 = n >> p & 281474976710655
    p -= 64
    w1 = n >> p & 18446744073709551615
    p -= 1
    w2 = n >> p & 1
    t0: Tree = {"NID_PACKET": 42, "Q_DIR": w0 >> 38 & 3, "L_PACKET": length, "Q_RBC": w0 >> 24 & 1, "NID_C": w0 >> 14 & 1023, "NID_RBC": w0 & 16383, "NID_RADIO": digits_text(w1, 16), "Q_SLEEPSESSION": w2}
    return t0, p


def write_to_train_42(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_RBC"]
    x2 = t["NID_C"]
    x3 = t["NID_RBC"]
    if x0 >> 2 | x1 >> 1 | x2 >> 10 | x3 >> 14 or len(t) != 7 + ("L_PACKET" in t):
        raise Misfit
    v = 42 << 40 | x0 << 38 | x1 << 24 | x2 << 14 | x3
    x4 = digits_value(t["NID_RADIO"], 16)
    v = v << 64 | x4
    x5 = t["Q_SLEEPSESSION"]
    if x5 >> 1:
        raise Misfit
    v = v << 1 | x5
    return v, b + 113


def read_to_train_44(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 32
    w0 = n >> p & 4294967295
    q0 = w0 & 511
    t0: Tree = {"NID_PACKET": 44, "Q_DIR": w0 >> 22 & 3, "L_PACKET": length, "NID_XUSER": q0}
    if q0 == 102:
        p -= 8
        w1 = n >> p & 255
        t0["NID_NTC"] = w1
    p -= 0
    w = n >> 0 & (1 << p) - 1
    t0["data"] = blob(w, p)
    p = 0
    return t0, p


def write_to_train_44(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["NID_XUSER"]
    if x0 >> 2 | x1 >> 9:
        raise Misfit
    v = 44 << 24 | x0 << 22 | x1
    if x1 == 102:
        x2 = t["NID_NTC"]
        if x2 >> 8:
            raise Misfit
        v = v << 8 | x2
        b += 8
        k0 += 1
    w, c = read_blob(t["data"], ("data",))
    v = v << c | w
    b += c
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 32


def read_to_train_45(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 47
    w0 = n >> p & 140737488355327
    t0: Tree = {"NID_PACKET": 45, "Q_DIR": w0 >> 37 & 3, "L_PACKET": length, "NID_MN": digits_text(w0 & 16777215, 6)}
    return t0, p


def write_to_train_45(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = digits_value(t["NID_MN"], 6)
    if x0 >> 2 or len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    v = 45 << 39 | x0 << 37 | x1
    return v, b + 47


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
        e0["NID_NTC"] = w1
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
            s0.append({"M_LEVELTR": 1, "NID_NTC": w & 255})
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
        x2 = e0["NID_NTC"]
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
            x4 = e0["NID_NTC"]
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


def read_to_train_49(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 28
    w0 = n >> p & 268435455
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 49, "Q_DIR": w0 >> 18 & 3, "L_PACKET": length, "groups": s0}
    while c0:
        c0 -= 1
        w = n >> p - 25 & 33554431
        if w & 16777216:
            p -= 25
            s0.append({"Q_NEWCOUNTRY": 1, "NID_C": w >> 14 & 1023, "NID_BG": w & 16383})
        else:
            p -= 15
            s0.append({"Q_NEWCOUNTRY": 0, "NID_BG": w >> 10 & 16383})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_49(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["groups"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = t["Q_DIR"]
    if x0 >> 2 | c0 >> 5:
        raise Misfit
    v = 49 << 20 | x0 << 18 | c0
    for e0 in s0:
        x1 = e0["Q_NEWCOUNTRY"]
        if x1 == 1:
            x2 = e0["NID_C"]
            x3 = e0["NID_BG"]
            if x2 >> 10 | x3 >> 14 or len(e0) != 3:
                raise Misfit
            v = v << 25 | x1 << 24 | x2 << 14 | x3
            b += 10
        else:
            x4 = e0["NID_BG"]
            if x1 >> 1 | x4 >> 14 or len(e0) != 2:
                raise Misfit
            v = v << 15 | x1 << 14 | x4
    b += 15 * c0
    if len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 28


def read_to_train_51(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 51, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_TRACKINIT": q0}
    if q0:
        p -= 15
        w1 = n >> p & 32767
        t0["D_TRACKINIT"] = w1
    if not q0:
        p -= 36
        w2 = n >> p & 68719476735
        c1 = w2 & 31
        s1: list[Tree] = []
        e0: Tree = {"D_AXLELOAD": w2 >> 21, "L_AXLELOAD": w2 >> 6 & 32767, "Q_FRONT": w2 >> 5 & 1, "categories": s1}
        for p in range(p - 14, p - 14 * c1 - 1, -14):
            w = n >> p & 16383
            s1.append({"M_AXLELOADCAT": w >> 7, "V_AXLELOAD": w & 127})
        p -= 5
        w3 = n >> p & 31
        c0 = w3
        s0: list[Tree] = [e0]
        t0["areas"] = s0
        while c0:
            c0 -= 1
            if p > 1024:
                n &= (1 << p) - 1
            p -= 36
            w4 = n >> p & 68719476735
            c2 = w4 & 31
            s2: list[Tree] = []
            e2: Tree = {"D_AXLELOAD": w4 >> 21, "L_AXLELOAD": w4 >> 6 & 32767, "Q_FRONT": w4 >> 5 & 1, "categories": s2}
            for p in range(p - 14, p - 14 * c2 - 1, -14):
                w = n >> p & 16383
                s2.append({"M_AXLELOADCAT": w >> 7, "V_AXLELOAD": w & 127})
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
    if x2:
        x3 = t["D_TRACKINIT"]
        if x3 >> 15:
            raise Misfit
        v = v << 15 | x3
        b += 15
        k0 += 1
    if not x2:
        s0 = t["areas"]
        c0 = len(s0) - 1
        e0 = s0[0]
        s1 = e0["categories"]
        c1 = len(s1)
        if not c1 and not isinstance(s1, (list, tuple)):
            raise Misfit
        x4 = e0["D_AXLELOAD"]
        x5 = e0["L_AXLELOAD"]
        x6 = e0["Q_FRONT"]
        if x4 >> 15 | x5 >> 15 | x6 >> 1 | c1 >> 5:
            raise Misfit
        v = v << 36 | x4 << 21 | x5 << 6 | x6 << 5 | c1
        for e1 in s1:
            x7 = e1["M_AXLELOADCAT"]
            x8 = e1["V_AXLELOAD"]
            if x7 >> 7 | x8 >> 7 or len(e1) != 2:
                raise Misfit
            v = v << 14 | x7 << 7 | x8
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
            x9 = e0["D_AXLELOAD"]
            x10 = e0["L_AXLELOAD"]
            x11 = e0["Q_FRONT"]
            if x9 >> 15 | x10 >> 15 | x11 >> 1 | c2 >> 5:
                raise Misfit
            v0 = x9 << 21 | x10 << 6 | x11 << 5 | c2
            for e2 in s2:
                x12 = e2["M_AXLELOADCAT"]
                x13 = e2["V_AXLELOAD"]
                if x12 >> 7 | x13 >> 7 or len(e2) != 2:
                    raise Misfit
                v0 = v0 << 14 | x12 << 7 | x13
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


def read_to_train_52(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 52, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_TRACKINIT": q0}
    if q0:
        p -= 15
        w1 = n >> p & 32767
        t0["D_TRACKINIT"] = w1
    if not q0:
        p -= 60
        w2 = n >> p & 1152921504606846975
        c0 = w2 & 31
        e0: Tree = {"D_PBD": w2 >> 45, "Q_GDIR": w2 >> 44 & 1, "G_PBDSR": w2 >> 36 & 255, "Q_PBDSR": w2 >> 35 & 1, "D_PBDSR": w2 >> 20 & 32767, "L_PBDSR": w2 >> 5 & 32767}
        s0: list[Tree] = [e0]
        t0["restrictions"] = s0
        for p in range(p - 55, p - 55 * c0 - 1, -55):
            w = n >> p & 36028797018963967
            s0.append({"D_PBD": w >> 40, "Q_GDIR": w >> 39 & 1, "G_PBDSR": w >> 31 & 255, "Q_PBDSR": w >> 30 & 1, "D_PBDSR": w >> 15 & 32767, "L_PBDSR": w & 32767})
    return t0, p


def write_to_train_52(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TRACKINIT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 52 << 18 | x0 << 16 | x1 << 1 | x2
    if x2:
        x3 = t["D_TRACKINIT"]
        if x3 >> 15:
            raise Misfit
        v = v << 15 | x3
        b += 15
        k0 += 1
    if not x2:
        s0 = t["restrictions"]
        c0 = len(s0) - 1
        e0 = s0[0]
        x4 = e0["D_PBD"]
        x5 = e0["Q_GDIR"]
        x6 = e0["G_PBDSR"]
        x7 = e0["Q_PBDSR"]
        x8 = e0["D_PBDSR"]
        x9 = e0["L_PBDSR"]
        if x4 >> 15 | x5 >> 1 | x6 >> 8 | x7 >> 1 | x8 >> 15 | x9 >> 15 | c0 >> 5 or len(e0) != 6:
            raise Misfit
        v = v << 60 | x4 << 45 | x5 << 44 | x6 << 36 | x7 << 35 | x8 << 20 | x9 << 5 | c0
        for e0 in s0[1:]:
            x10 = e0["D_PBD"]
            x11 = e0["Q_GDIR"]
            x12 = e0["G_PBDSR"]
            x13 = e0["Q_PBDSR"]
            x14 = e0["D_PBDSR"]
            x15 = e0["L_PBDSR"]
            if x10 >> 15 | x11 >> 1 | x12 >> 8 | x13 >> 1 | x14 >> 15 | x15 >> 15 or len(e0) != 6:
                raise Misfit
            v = v << 55 | x10 << 40 | x11 << 39 | x12 << 31 | x13 << 30 | x14 << 15 | x15
        b += 55 * c0
        b += 60
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 26


def read_to_train_57(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 49
    w0 = n >> p & 562949953421311
    t0: Tree = {"NID_PACKET": 57, "Q_DIR": w0 >> 39 & 3, "L_PACKET": length, "T_MAR": w0 >> 18 & 255, "T_TIMEOUTRQST": w0 >> 8 & 1023, "T_CYCRQST": w0 & 255}
    return t0, p


def write_to_train_57(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["T_MAR"]
    x2 = t["T_TIMEOUTRQST"]
    x3 = t["T_CYCRQST"]
    if x0 >> 2 | x1 >> 8 | x2 >> 10 | x3 >> 8 or len(t) != 5 + ("L_PACKET" in t):
        raise Misfit
    v = 57 << 41 | x0 << 39 | x1 << 18 | x2 << 8 | x3
    return v, b + 49


def read_to_train_58(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 56
    w0 = n >> p & 72057594037927935
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 58, "Q_DIR": w0 >> 46 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 31 & 3, "T_CYCLOC": w0 >> 23 & 255, "D_CYCLOC": w0 >> 8 & 32767, "M_LOC": w0 >> 5 & 7, "locations": s0}
    for p in range(p - 16, p - 16 * c0 - 1, -16):
        w = n >> p & 65535
        s0.append({"D_LOC": w >> 1, "Q_LGTLOC": w & 1})
    return t0, p


def write_to_train_58(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["locations"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["T_CYCLOC"]
    x3 = t["D_CYCLOC"]
    x4 = t["M_LOC"]
    if x0 >> 2 | x1 >> 2 | x2 >> 8 | x3 >> 15 | x4 >> 3 | c0 >> 5:
        raise Misfit
    v = 58 << 48 | x0 << 46 | x1 << 31 | x2 << 23 | x3 << 8 | x4 << 5 | c0
    for e0 in s0:
        x5 = e0["D_LOC"]
        x6 = e0["Q_LGTLOC"]
        if x5 >> 15 | x6 >> 1 or len(e0) != 2:
            raise Misfit
        v = v << 16 | x5 << 1 | x6
    b += 16 * c0
    if len(t) != 7 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 56


def read_to_train_63(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 28
    w0 = n >> p & 268435455
    c0 = w0 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 63, "Q_DIR": w0 >> 18 & 3, "L_PACKET": length, "groups": s0}
    while c0:
        c0 -= 1
        w = n >> p - 25 & 33554431
        if w & 16777216:
            p -= 25
            s0.append({"Q_NEWCOUNTRY": 1, "NID_C": w >> 14 & 1023, "NID_BG": w & 16383})
        else:
            p -= 15
            s0.append({"Q_NEWCOUNTRY": 0, "NID_BG": w >> 10 & 16383})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_train_63(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["groups"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = t["Q_DIR"]
    if x0 >> 2 | c0 >> 5:
        raise Misfit
    v = 63 << 20 | x0 << 18 | c0
    for e0 in s0:
        x1 = e0["Q_NEWCOUNTRY"]
        if x1 == 1:
            x2 = e0["NID_C"]
            x3 = e0["NID_BG"]
            if x2 >> 10 | x3 >> 14 or len(e0) != 3:
                raise Misfit
            v = v << 25 | x1 << 24 | x2 << 14 | x3
            b += 10
        else:
            x4 = e0["NID_BG"]
            if x1 >> 1 | x4 >> 14 or len(e0) != 2:
                raise Misfit
            v = v << 15 | x1 << 14 | x4
    b += 15 * c0
    if len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 28


def read_to_train_64(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 23
    w0 = n >> p & 8388607
    t0: Tree = {"NID_PACKET": 64, "Q_DIR": w0 >> 13 & 3, "L_PACKET": length}
    return t0, p


def write_to_train_64(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    if x0 >> 2 or len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    v = 64 << 15 | x0 << 13
    return v, b + 23


def read_to_train_65(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 48
    w0 = n >> p & 281474976710655
    p -= 23
    w1 = n >> p & 8388607
    t0: Tree = {"NID_PACKET": 65, "Q_DIR": w0 >> 38 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 23 & 3, "NID_TSR": w0 >> 15 & 255, "D_TSR": w0 & 32767, "L_TSR": w1 >> 8, "Q_FRONT": w1 >> 7 & 1, "V_TSR": w1 & 127}
    return t0, p


def write_to_train_65(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["NID_TSR"]
    x3 = t["D_TSR"]
    if x0 >> 2 | x1 >> 2 | x2 >> 8 | x3 >> 15 or len(t) != 8 + ("L_PACKET" in t):
        raise Misfit
    v = 65 << 40 | x0 << 38 | x1 << 23 | x2 << 15 | x3
    x4 = t["L_TSR"]
    x5 = t["Q_FRONT"]
    x6 = t["V_TSR"]
    if x4 >> 15 | x5 >> 1 | x6 >> 7:
        raise Misfit
    v = v << 23 | x4 << 8 | x5 << 7 | x6
    return v, b + 71


def read_to_train_66(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 31
    w0 = n >> p & 2147483647
    t0: Tree = {"NID_PACKET": 66, "Q_DIR": w0 >> 21 & 3, "L_PACKET": length, "NID_TSR": w0 & 255}
    return t0, p


def write_to_train_66(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["NID_TSR"]
    if x0 >> 2 | x1 >> 8 or len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    v = 66 << 23 | x0 << 21 | x1
    return v, b + 31


def read_to_train_67(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 60
    w0 = n >> p & 1152921504606846975
    c0 = w0 & 31
    e0: Tree = {"D_TRACKCOND": w0 >> 20 & 32767, "L_TRACKCOND": w0 >> 5 & 32767}
    s0: list[Tree] = [e0]
    t0: Tree = {"NID_PACKET": 67, "Q_DIR": w0 >> 50 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 35 & 3, "areas": s0}
    for p in range(p - 30, p - 30 * c0 - 1, -30):
        w = n >> p & 1073741823
        s0.append({"D_TRACKCOND": w >> 15, "L_TRACKCOND": w & 32767})
    return t0, p


def write_to_train_67(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["areas"]
    c0 = len(s0) - 1
    e0 = s0[0]
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = e0["D_TRACKCOND"]
    x3 = e0["L_TRACKCOND"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 15 | c0 >> 5 or len(e0) != 2:
        raise Misfit
    v = 67 << 52 | x0 << 50 | x1 << 35 | x2 << 20 | x3 << 5 | c0
    for e0 in s0[1:]:
        x4 = e0["D_TRACKCOND"]
        x5 = e0["L_TRACKCOND"]
        if x4 >> 15 | x5 >> 15 or len(e0) != 2:
            raise Misfit
        v = v << 30 | x4 << 15 | x5
    b += 30 * c0
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 60


def read_to_train_68(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 68, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_TRACKINIT": q0}
    if q0:
        p -= 15
        w1 = n >> p & 32767
        t0["D_TRACKINIT"] = w1
    if not q0:
        p -= 39
        w2 = n >> p & 549755813887
        c0 = w2 & 31
        e0: Tree = {"D_TRACKCOND": w2 >> 24, "L_TRACKCOND": w2 >> 9 & 32767, "M_TRACKCOND": w2 >> 5 & 15}
        s0: list[Tree] = [e0]
        t0["conditions"] = s0
        for p in range(p - 34, p - 34 * c0 - 1, -34):
            w = n >> p & 17179869183
            s0.append({"D_TRACKCOND": w >> 19, "L_TRACKCOND": w >> 4 & 32767, "M_TRACKCOND": w & 15})
    return t0, p


def write_to_train_68(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TRACKINIT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 68 << 18 | x0 << 16 | x1 << 1 | x2
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
        x6 = e0["M_TRACKCOND"]
        if x4 >> 15 | x5 >> 15 | x6 >> 4 | c0 >> 5 or len(e0) != 3:
            raise Misfit
        v = v << 39 | x4 << 24 | x5 << 9 | x6 << 5 | c0
        for e0 in s0[1:]:
            x7 = e0["D_TRACKCOND"]
            x8 = e0["L_TRACKCOND"]
            x9 = e0["M_TRACKCOND"]
            if x7 >> 15 | x8 >> 15 | x9 >> 4 or len(e0) != 3:
                raise Misfit
            v = v << 34 | x7 << 19 | x8 << 4 | x9
        b += 34 * c0
        b += 39
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 26


def read_to_train_69(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 26
    w0 = n >> p & 67108863
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 69, "Q_DIR": w0 >> 16 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 1 & 3, "Q_TRACKINIT": q0}
    if q0:
        p -= 15
        w1 = n >> p & 32767
        t0["D_TRACKINIT"] = w1
    if not q0:
        p -= 41
        w2 = n >> p & 2199023255551
        c0 = w2 & 31
        e0: Tree = {"D_TRACKCOND": w2 >> 26, "L_TRACKCOND": w2 >> 11 & 32767, "M_PLATFORM": w2 >> 7 & 15, "Q_PLATFORM": w2 >> 5 & 3}
        s0: list[Tree] = [e0]
        t0["platforms"] = s0
        for p in range(p - 36, p - 36 * c0 - 1, -36):
            w = n >> p & 68719476735
            s0.append({"D_TRACKCOND": w >> 21, "L_TRACKCOND": w >> 6 & 32767, "M_PLATFORM": w >> 2 & 15, "Q_PLATFORM": w & 3})
    return t0, p


def write_to_train_69(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_TRACKINIT"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1:
        raise Misfit
    v = 69 << 18 | x0 << 16 | x1 << 1 | x2
    if x2:
        x3 = t["D_TRACKINIT"]
        if x3 >> 15:
            raise Misfit
        v = v << 15 | x3
        b += 15
        k0 += 1
    if not x2:
        s0 = t["platforms"]
        c0 = len(s0) - 1
        e0 = s0[0]
        x4 = e0["D_TRACKCOND"]
        x5 = e0["L_TRACKCOND"]
        x6 = e0["M_PLATFORM"]
        x7 = e0["Q_PLATFORM"]
        if x4 >> 15 | x5 >> 15 | x6 >> 4 | x7 >> 2 | c0 >> 5 or len(e0) != 4:
            raise Misfit
        v = v << 41 | x4 << 26 | x5 << 11 | x6 << 7 | x7 << 5 | c0
        for e0 in s0[1:]:
            x8 = e0["D_TRACKCOND"]
            x9 = e0["L_TRACKCOND"]
            x10 = e0["M_PLATFORM"]
            x11 = e0["Q_PLATFORM"]
            if x8 >> 15 | x9 >> 15 | x10 >> 4 | x11 >> 2 or len(e0) != 4:
                raise Misfit
            v = v << 36 | x8 << 21 | x9 << 6 | x10 << 2 | x11
        b += 36 * c0
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


def read_to_train_71(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 56
    w0 = n >> p & 72057594037927935
    t0: Tree = {"NID_PACKET": 71, "Q_DIR": w0 >> 46 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 31 & 3, "D_ADHESION": w0 >> 16 & 32767, "L_ADHESION": w0 >> 1 & 32767, "M_ADHESION": w0 & 1}
    return t0, p


def write_to_train_71(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_ADHESION"]
    x3 = t["L_ADHESION"]
    x4 = t["M_ADHESION"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 15 | x4 >> 1 or len(t) != 6 + ("L_PACKET" in t):
        raise Misfit
    v = 71 << 48 | x0 << 46 | x1 << 31 | x2 << 16 | x3 << 1 | x4
    return v, b + 56


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


def write_to_train_72(t: Tree) -> tuple[int, int]:
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
    v = 72 << 42 | x0 << 40 | x1 << 25 | x2 << 23 | x3 << 22 | x4 << 7 | x5 << 3 | x6
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


def write_to_train_76(t: Tree) -> tuple[int, int]:
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
    v = 76 << 42 | x0 << 40 | x1 << 25 | x2 << 23 | x3 << 22 | x4 << 7 | x5 << 3 | x6
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
    p -= 54
    w2 = n >> p & 18014398509481983
    e0["NID_BG"] = w2 >> 40
    e0["D_POSOFF"] = w2 >> 25 & 32767
    e0["Q_MPOSITION"] = w2 >> 24 & 1
    e0["M_POSITION"] = w2 & 16777215
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
        p -= 54
        w6 = n >> p & 18014398509481983
        e1["NID_BG"] = w6 >> 40
        e1["D_POSOFF"] = w6 >> 25 & 32767
        e1["Q_MPOSITION"] = w6 >> 24 & 1
        e1["M_POSITION"] = w6 & 16777215
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
    if x4 >> 14 | x5 >> 15 | x6 >> 1 | x7 >> 24 | c0 >> 5:
        raise Misfit
    v = v << 59 | x4 << 45 | x5 << 30 | x6 << 29 | x7 << 5 | c0
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
        if x10 >> 14 | x11 >> 15 | x12 >> 1 | x13 >> 24:
            raise Misfit
        v0 = v0 << 54 | x10 << 40 | x11 << 25 | x12 << 24 | x13
        v = v << b0 + 55 | v0
        b += b0 + 55
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 85


def read_to_train_80(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 49
    w0 = n >> p & 562949953421311
    p -= 36
    w1 = n >> p & 68719476735
    c0 = w1 & 31
    e0: Tree = {"D_MAMODE": w0 >> 9 & 32767, "M_MAMODE": w0 >> 7 & 3, "V_MAMODE": w0 & 127, "L_MAMODE": w1 >> 21, "L_ACKMAMODE": w1 >> 6 & 32767, "Q_MAMODE": w1 >> 5 & 1}
    s0: list[Tree] = [e0]
    t0: Tree = {"NID_PACKET": 80, "Q_DIR": w0 >> 39 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 24 & 3, "profiles": s0}
    for p in range(p - 55, p - 55 * c0 - 1, -55):
        w = n >> p & 36028797018963967
        s0.append({"D_MAMODE": w >> 40, "M_MAMODE": w >> 38 & 3, "V_MAMODE": w >> 31 & 127, "L_MAMODE": w >> 16 & 32767, "L_ACKMAMODE": w >> 1 & 32767, "Q_MAMODE": w & 1})
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
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 2 | x4 >> 7 or len(e0) != 6:
        raise Misfit
    v = 80 << 41 | x0 << 39 | x1 << 24 | x2 << 9 | x3 << 7 | x4
    x5 = e0["L_MAMODE"]
    x6 = e0["L_ACKMAMODE"]
    x7 = e0["Q_MAMODE"]
    if x5 >> 15 | x6 >> 15 | x7 >> 1 | c0 >> 5:
        raise Misfit
    v = v << 36 | x5 << 21 | x6 << 6 | x7 << 5 | c0
    for e0 in s0[1:]:
        x8 = e0["D_MAMODE"]
        x9 = e0["M_MAMODE"]
        x10 = e0["V_MAMODE"]
        x11 = e0["L_MAMODE"]
        x12 = e0["L_ACKMAMODE"]
        x13 = e0["Q_MAMODE"]
        if x8 >> 15 | x9 >> 2 | x10 >> 7 | x11 >> 15 | x12 >> 15 | x13 >> 1 or len(e0) != 6:
            raise Misfit
        v = v << 55 | x8 << 40 | x9 << 38 | x10 << 31 | x11 << 16 | x12 << 1 | x13
    b += 55 * c0
    if len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 85


def read_to_train_88(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 48
    w0 = n >> p & 281474976710655
    p -= 16
    w1 = n >> p & 65535
    q0 = w1 & 1
    t0: Tree = {"NID_PACKET": 88, "Q_DIR": w0 >> 38 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 23 & 3, "NID_LX": w0 >> 15 & 255, "D_LX": w0 & 32767, "L_LX": w1 >> 1, "Q_LXSTATUS": q0}
    if q0:
        p -= 8
        w2 = n >> p & 255
        q1 = w2 & 1
        t0["V_LX"] = w2 >> 1
        t0["Q_STOPLX"] = q1
        if q1:
            p -= 15
            w3 = n >> p & 32767
            t0["L_STOPLX"] = w3
    return t0, p


def write_to_train_88(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 7
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["NID_LX"]
    x3 = t["D_LX"]
    if x0 >> 2 | x1 >> 2 | x2 >> 8 | x3 >> 15:
        raise Misfit
    v = 88 << 40 | x0 << 38 | x1 << 23 | x2 << 15 | x3
    x4 = t["L_LX"]
    x5 = t["Q_LXSTATUS"]
    if x4 >> 15 | x5 >> 1:
        raise Misfit
    v = v << 16 | x4 << 1 | x5
    if x5:
        x6 = t["V_LX"]
        x7 = t["Q_STOPLX"]
        if x6 >> 7 | x7 >> 1:
            raise Misfit
        v = v << 8 | x6 << 1 | x7
        if x7:
            x8 = t["L_STOPLX"]
            if x8 >> 15:
                raise Misfit
            v = v << 15 | x8
            b += 15
            k0 += 1
        b += 8
        k0 += 2
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 64


def read_to_train_90(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 24
    w0 = n >> p & 16777215
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 90, "Q_DIR": w0 >> 14 & 3, "L_PACKET": length, "Q_NEWCOUNTRY": q0}
    if q0:
        p -= 10
        w1 = n >> p & 1023
        t0["NID_C"] = w1
    p -= 14
    w2 = n >> p & 16383
    t0["NID_BG"] = w2
    return t0, p


def write_to_train_90(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_NEWCOUNTRY"]
    if x0 >> 2 | x1 >> 1:
        raise Misfit
    v = 90 << 16 | x0 << 14 | x1
    if x1:
        x2 = t["NID_C"]
        if x2 >> 10:
            raise Misfit
        v = v << 10 | x2
        b += 10
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    x3 = t["NID_BG"]
    if x3 >> 14:
        raise Misfit
    v = v << 14 | x3
    return v, b + 38


def read_to_train_131(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 14
    w1 = n >> p & 16383
    p -= 64
    w2 = n >> p & 18446744073709551615
    p -= 1
    w3 = n >> p & 1
    t0: Tree = {"NID_PACKET": 131, "Q_DIR": w0 >> 40 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 25 & 3, "D_RBCTR": w0 >> 10 & 32767, "NID_C": w0 & 1023, "NID_RBC": w1, "NID_RADIO": digits_text(w2, 16), "Q_SLEEPSESSION": w3}
    return t0, p


def write_to_train_131(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_RBCTR"]
    x3 = t["NID_C"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 10 or len(t) != 8 + ("L_PACKET" in t):
        raise Misfit
    v = 131 << 42 | x0 << 40 | x1 << 25 | x2 << 10 | x3
    x4 = t["NID_RBC"]
    if x4 >> 14:
        raise Misfit
    v = v << 14 | x4
    x5 = digits_value(t["NID_RADIO"], 16)
    v = v << 64 | x5
    x6 = t["Q_SLEEPSESSION"]
    if x6 >> 1:
        raise Misfit
    v = v << 1 | x6
    return v, b + 129


def read_to_train_132(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 24
    w0 = n >> p & 16777215
    t0: Tree = {"NID_PACKET": 132, "Q_DIR": w0 >> 14 & 3, "L_PACKET": length, "Q_ASPECT": w0 & 1}
    return t0, p


def write_to_train_132(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_ASPECT"]
    if x0 >> 2 | x1 >> 1 or len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    v = 132 << 16 | x0 << 14 | x1
    return v, b + 24


def read_to_train_133(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 64
    w1 = n >> p & 18446744073709551615
    p -= 39
    w2 = n >> p & 549755813887
    t0: Tree = {"NID_PACKET": 133, "Q_DIR": w0 >> 40 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 25 & 3, "Q_RIU": w0 >> 24 & 1, "NID_C": w0 >> 14 & 1023, "NID_RIU": w0 & 16383, "NID_RADIO": digits_text(w1, 16), "D_INFILL": w2 >> 24, "NID_C_BG": w2 >> 14 & 1023, "NID_BG": w2 & 16383}
    return t0, p


def write_to_train_133(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["Q_RIU"]
    x3 = t["NID_C"]
    x4 = t["NID_RIU"]
    if x0 >> 2 | x1 >> 2 | x2 >> 1 | x3 >> 10 | x4 >> 14 or len(t) != 10 + ("L_PACKET" in t):
        raise Misfit
    v = 133 << 42 | x0 << 40 | x1 << 25 | x2 << 24 | x3 << 14 | x4
    x5 = digits_value(t["NID_RADIO"], 16)
    v = v << 64 | x5
    x6 = t["D_INFILL"]
    x7 = t["NID_C_BG"]
    x8 = t["NID_BG"]
    if x6 >> 15 | x7 >> 10 | x8 >> 14:
        raise Misfit
    v = v << 39 | x6 << 24 | x7 << 14 | x8
    return v, b + 153


def read_to_train_134(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 54
    w0 = n >> p & 18014398509481983
    p -= 20
    w1 = n >> p & 1048575
    t0: Tree = {"NID_PACKET": 134, "Q_DIR": w0 >> 44 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 29 & 3, "NID_LOOP": w0 >> 15 & 16383, "D_LOOP": w0 & 32767, "L_LOOP": w1 >> 5, "Q_LOOPDIR": w1 >> 4 & 1, "Q_SSCODE": w1 & 15}
    return t0, p


def write_to_train_134(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["NID_LOOP"]
    x3 = t["D_LOOP"]
    if x0 >> 2 | x1 >> 2 | x2 >> 14 | x3 >> 15 or len(t) != 8 + ("L_PACKET" in t):
        raise Misfit
    v = 134 << 46 | x0 << 44 | x1 << 29 | x2 << 15 | x3
    x4 = t["L_LOOP"]
    x5 = t["Q_LOOPDIR"]
    x6 = t["Q_SSCODE"]
    if x4 >> 15 | x5 >> 1 | x6 >> 4:
        raise Misfit
    v = v << 20 | x4 << 5 | x5 << 4 | x6
    return v, b + 74


def read_to_train_135(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 23
    w0 = n >> p & 8388607
    t0: Tree = {"NID_PACKET": 135, "Q_DIR": w0 >> 13 & 3, "L_PACKET": length}
    return t0, p


def write_to_train_135(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    if x0 >> 2 or len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    v = 135 << 15 | x0 << 13
    return v, b + 23


def read_to_train_136(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 24
    w0 = n >> p & 16777215
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 136, "Q_DIR": w0 >> 14 & 3, "L_PACKET": length, "Q_NEWCOUNTRY": q0}
    if q0:
        p -= 10
        w1 = n >> p & 1023
        t0["NID_C"] = w1
    p -= 14
    w2 = n >> p & 16383
    t0["NID_BG"] = w2
    return t0, p


def write_to_train_136(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 4
    x0 = t["Q_DIR"]
    x1 = t["Q_NEWCOUNTRY"]
    if x0 >> 2 | x1 >> 1:
        raise Misfit
    v = 136 << 16 | x0 << 14 | x1
    if x1:
        x2 = t["NID_C"]
        if x2 >> 10:
            raise Misfit
        v = v << 10 | x2
        b += 10
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    x3 = t["NID_BG"]
    if x3 >> 14:
        raise Misfit
    v = v << 14 | x3
    return v, b + 38


def read_to_train_137(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 24
    w0 = n >> p & 16777215
    t0: Tree = {"NID_PACKET": 137, "Q_DIR": w0 >> 14 & 3, "L_PACKET": length, "Q_SRSTOP": w0 & 1}
    return t0, p


def write_to_train_137(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SRSTOP"]
    if x0 >> 2 | x1 >> 1 or len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    v = 137 << 16 | x0 << 14 | x1
    return v, b + 24


def read_to_train_138(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 55
    w0 = n >> p & 36028797018963967
    t0: Tree = {"NID_PACKET": 138, "Q_DIR": w0 >> 45 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 30 & 3, "D_STARTREVERSE": w0 >> 15 & 32767, "L_REVERSEAREA": w0 & 32767}
    return t0, p


def write_to_train_138(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_STARTREVERSE"]
    x3 = t["L_REVERSEAREA"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 15 or len(t) != 5 + ("L_PACKET" in t):
        raise Misfit
    v = 138 << 47 | x0 << 45 | x1 << 30 | x2 << 15 | x3
    return v, b + 55


def read_to_train_139(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 47
    w0 = n >> p & 140737488355327
    t0: Tree = {"NID_PACKET": 139, "Q_DIR": w0 >> 37 & 3, "L_PACKET": length, "Q_SCALE": w0 >> 22 & 3, "D_REVERSE": w0 >> 7 & 32767, "V_REVERSE": w0 & 127}
    return t0, p


def write_to_train_139(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_SCALE"]
    x2 = t["D_REVERSE"]
    x3 = t["V_REVERSE"]
    if x0 >> 2 | x1 >> 2 | x2 >> 15 | x3 >> 7 or len(t) != 5 + ("L_PACKET" in t):
        raise Misfit
    v = 139 << 39 | x0 << 37 | x1 << 22 | x2 << 7 | x3
    return v, b + 47


def read_to_train_140(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 55
    w0 = n >> p & 36028797018963967
    t0: Tree = {"NID_PACKET": 140, "Q_DIR": w0 >> 45 & 3, "L_PACKET": length, "NID_OPERATIONAL": digits_text(w0 & 4294967295, 8)}
    return t0, p


def write_to_train_140(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = digits_value(t["NID_OPERATIONAL"], 8)
    if x0 >> 2 or len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    v = 140 << 47 | x0 << 45 | x1
    return v, b + 55


def read_to_train_141(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 32
    w0 = n >> p & 4294967295
    t0: Tree = {"NID_PACKET": 141, "Q_DIR": w0 >> 22 & 3, "L_PACKET": length, "Q_GDIR": w0 >> 8 & 1, "G_TSR": w0 & 255}
    return t0, p


def write_to_train_141(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_GDIR"]
    x2 = t["G_TSR"]
    if x0 >> 2 | x1 >> 1 | x2 >> 8 or len(t) != 4 + ("L_PACKET" in t):
        raise Misfit
    v = 141 << 24 | x0 << 22 | x1 << 8 | x2
    return v, b + 32


def read_to_train_143(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 48
    w0 = n >> p & 281474976710655
    p -= 64
    w1 = n >> p & 18446744073709551615
    t0: Tree = {"NID_PACKET": 143, "Q_DIR": w0 >> 38 & 3, "L_PACKET": length, "Q_RIU": w0 >> 24 & 1, "NID_C": w0 >> 14 & 1023, "NID_RIU": w0 & 16383, "NID_RADIO": digits_text(w1, 16)}
    return t0, p


def write_to_train_143(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    x1 = t["Q_RIU"]
    x2 = t["NID_C"]
    x3 = t["NID_RIU"]
    if x0 >> 2 | x1 >> 1 | x2 >> 10 | x3 >> 14 or len(t) != 6 + ("L_PACKET" in t):
        raise Misfit
    v = 143 << 40 | x0 << 38 | x1 << 24 | x2 << 14 | x3
    x4 = digits_value(t["NID_RADIO"], 16)
    v = v << 64 | x4
    return v, b + 112


def read_to_train_145(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 23
    w0 = n >> p & 8388607
    t0: Tree = {"NID_PACKET": 145, "Q_DIR": w0 >> 13 & 3, "L_PACKET": length}
    return t0, p


def write_to_train_145(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    if x0 >> 2 or len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    v = 145 << 15 | x0 << 13
    return v, b + 23


def read_to_train_180(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 24
    w0 = n >> p & 16777215
    q0 = w0 & 1
    t0: Tree = {"NID_PACKET": 180, "Q_DIR": w0 >> 14 & 3, "L_PACKET": length, "Q_LSSMA": q0}
    if q0:
        p -= 8
        w1 = n >> p & 255
        t0["T_LSSMA"] = w1
    return t0, p


def write_to_train_180(t: Tree) -> tuple[int, int]:
    b = 0
    k0 = 3
    x0 = t["Q_DIR"]
    x1 = t["Q_LSSMA"]
    if x0 >> 2 | x1 >> 1:
        raise Misfit
    v = 180 << 16 | x0 << 14 | x1
    if x1:
        x2 = t["T_LSSMA"]
        if x2 >> 8:
            raise Misfit
        v = v << 8 | x2
        b += 8
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 24


def read_to_train_181(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 23
    w0 = n >> p & 8388607
    t0: Tree = {"NID_PACKET": 181, "Q_DIR": w0 >> 13 & 3, "L_PACKET": length}
    return t0, p


def write_to_train_181(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    if x0 >> 2 or len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    v = 181 << 15 | x0 << 13
    return v, b + 23


def read_to_train_254(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 23
    w0 = n >> p & 8388607
    t0: Tree = {"NID_PACKET": 254, "Q_DIR": w0 >> 13 & 3, "L_PACKET": length}
    return t0, p


def write_to_train_254(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_DIR"]
    if x0 >> 2 or len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    v = 254 << 15 | x0 << 13
    return v, b + 23


def read_to_train_255(n: int, p: int) -> tuple[Tree, int]:
    p -= 8
    w0 = n >> p & 255
    t0: Tree = {"NID_PACKET": 255}
    return t0, p


def write_to_train_255(t: Tree) -> tuple[int, int]:
    b = 0
    if len(t) != 1:
        raise Misfit
    v = 255
    return v, b + 8


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
        x13 = t["NID_NTC"]
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
    t0: Tree = {"NID_PACKET": 1, "L_PACKET": length, "Q_SCALE": w0 >> 24 & 3, "NID_LRBG": w0 & 16777215, "NID_PRVLRBG": w1 >> 34, "D_LRBG": w1 >> 19 & 32767, "Q_DIRLRBG": w1 >> 17 & 3, "Q_DLRBG": w1 >> 15 & 3, "L_DOUBTOVER": w1 & 32767, "L_DOUBTUNDER": w2 >> 2, "Q_LENGTH": q0}
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
        x14 = t["NID_NTC"]
        if x14 >> 8:
            raise Misfit
        v = v << 8 | x14
        b += 8
        k0 += 1
    if len(t) != k0 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 138


def read_to_track_2(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 33
    w0 = n >> p & 8589934591
    c0 = w0 & 31
    e0: Tree = {"M_VERSION": w0 >> 5 & 127}
    s0: list[Tree] = [e0]
    t0: Tree = {"NID_PACKET": 2, "L_PACKET": length, "versions": s0}
    for p in range(p - 7, p - 7 * c0 - 1, -7):
        w = n >> p & 127
        s0.append({"M_VERSION": w})
    return t0, p


def write_to_track_2(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["versions"]
    c0 = len(s0) - 1
    e0 = s0[0]
    x0 = e0["M_VERSION"]
    if x0 >> 7 | c0 >> 5 or len(e0) != 1:
        raise Misfit
    v = 2 << 25 | x0 << 5 | c0
    for e0 in s0[1:]:
        x1 = e0["M_VERSION"]
        if x1 >> 7 or len(e0) != 1:
            raise Misfit
        v = v << 7 | x1
    b += 7 * c0
    if len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 33


def read_to_track_4(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 29
    w0 = n >> p & 536870911
    t0: Tree = {"NID_PACKET": 4, "L_PACKET": length, "M_ERROR": w0 & 255}
    return t0, p


def write_to_track_4(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["M_ERROR"]
    if x0 >> 8 or len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    v = 4 << 21 | x0
    return v, b + 29


def read_to_track_5(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 53
    w0 = n >> p & 9007199254740991
    t0: Tree = {"NID_PACKET": 5, "L_PACKET": length, "NID_OPERATIONAL": digits_text(w0 & 4294967295, 8)}
    return t0, p


def write_to_track_5(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = digits_value(t["NID_OPERATIONAL"], 8)
    if len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    v = 5 << 45 | x0
    return v, b + 53


def read_to_track_9(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 45
    w0 = n >> p & 35184372088831
    t0: Tree = {"NID_PACKET": 9, "L_PACKET": length, "NID_LTRBG": w0 & 16777215}
    return t0, p


def write_to_track_9(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["NID_LTRBG"]
    if x0 >> 24 or len(t) != 2 + ("L_PACKET" in t):
        raise Misfit
    v = 9 << 37 | x0
    return v, b + 45


def read_to_track_11(n: int, p: int) -> tuple[Tree, int]:
    length = p
    n <<= 60
    p += 60
    p -= 59
    w0 = n >> p & 576460752303423487
    p -= 32
    w1 = n >> p & 4294967295
    c0 = w1 & 31
    s0: list[Tree] = []
    t0: Tree = {"NID_PACKET": 11, "L_PACKET": length, "NC_CDTRAIN": w0 >> 34 & 15, "NC_TRAIN": w0 >> 19 & 32767, "L_TRAIN": w0 >> 7 & 4095, "V_MAXTRAIN": w0 & 127, "M_LOADINGGAUGE": w1 >> 24, "M_AXLELOADCAT": w1 >> 17 & 127, "M_AIRTIGHT": w1 >> 15 & 3, "N_AXLE": w1 >> 5 & 1023, "tractions": s0}
    while c0:
        c0 -= 1
        w = n >> p - 14 & 16383
        if (w >> 10 & 15):
            p -= 14
            s0.append({"M_VOLTAGE": w >> 10, "NID_CTRACTION": w & 1023})
        else:
            p -= 4
            s0.append({"M_VOLTAGE": 0})
    p -= 5
    w2 = n >> p & 31
    c1 = w2
    s1: list[Tree] = []
    t0["national_systems"] = s1
    for p in range(p - 8, p - 8 * c1 - 1, -8):
        w = n >> p & 255
        s1.append({"NID_NTC": w})
    if p < 60:
        raise Misfit
    return t0, p - 60


def write_to_track_11(t: Tree) -> tuple[int, int]:
    b = 0
    s0 = t["tractions"]
    c0 = len(s0)
    if not c0 and not isinstance(s0, (list, tuple)):
        raise Misfit
    x0 = t["NC_CDTRAIN"]
    x1 = t["NC_TRAIN"]
    x2 = t["L_TRAIN"]
    x3 = t["V_MAXTRAIN"]
    if x0 >> 4 | x1 >> 15 | x2 >> 12 | x3 >> 7:
        raise Misfit
    v = 11 << 51 | x0 << 34 | x1 << 19 | x2 << 7 | x3
    x4 = t["M_LOADINGGAUGE"]
    x5 = t["M_AXLELOADCAT"]
    x6 = t["M_AIRTIGHT"]
    x7 = t["N_AXLE"]
    if x4 >> 8 | x5 >> 7 | x6 >> 2 | x7 >> 10 | c0 >> 5:
        raise Misfit
    v = v << 32 | x4 << 24 | x5 << 17 | x6 << 15 | x7 << 5 | c0
    for e0 in s0:
        x8 = e0["M_VOLTAGE"]
        if x8:
            x9 = e0["NID_CTRACTION"]
            if x8 >> 4 | x9 >> 10 or len(e0) != 2:
                raise Misfit
            v = v << 14 | x8 << 10 | x9
            b += 10
        else:
            if x8 >> 4 or len(e0) != 1:
                raise Misfit
            v = v << 4 | x8
    b += 4 * c0
    s1 = t["national_systems"]
    c1 = len(s1)
    if not c1 and not isinstance(s1, (list, tuple)):
        raise Misfit
    if c1 >> 5:
        raise Misfit
    v = v << 5 | c1
    for e1 in s1:
        x10 = e1["NID_NTC"]
        if x10 >> 8 or len(e1) != 1:
            raise Misfit
        v = v << 8 | x10
    b += 8 * c1
    if len(t) != 11 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 96


def read_to_track_44(n: int, p: int) -> tuple[Tree, int]:
    length = p
    p -= 30
    w0 = n >> p & 1073741823
    t0: Tree = {"NID_PACKET": 44, "L_PACKET": length, "NID_XUSER": w0 & 511}
    p -= 0
    w = n >> 0 & (1 << p) - 1
    t0["data"] = blob(w, p)
    p = 0
    return t0, p


def write_to_track_44(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["NID_XUSER"]
    if x0 >> 9:
        raise Misfit
    v = 44 << 22 | x0
    w, c = read_blob(t["data"], ("data",))
    v = v << c | w
    b += c
    if len(t) != 3 + ("L_PACKET" in t):
        raise Misfit
    return v, b + 30


def read_message_129(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 129, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_129(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 129 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_130(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 130, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_130(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 130 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_132(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 29
    w1 = n >> p & 536870911
    t0: Tree = {"NID_MESSAGE": 132, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 5, "Q_MARQSTREASON": w1 & 31}
    return t0, p


def write_message_132(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 132 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["Q_MARQSTREASON"]
    if x1 >> 24 | x2 >> 5:
        raise Misfit
    v = v << 29 | x1 << 5 | x2
    return v, b + 79


def read_message_136(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 136, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_136(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 136 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_137(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 56
    w1 = n >> p & 72057594037927935
    t0: Tree = {"NID_MESSAGE": 137, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 32, "T_TRAIN_REFERENCE": w1 & 4294967295}
    return t0, p


def write_message_137(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 137 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["T_TRAIN_REFERENCE"]
    if x1 >> 24 | x2 >> 32:
        raise Misfit
    v = v << 56 | x1 << 32 | x2
    return v, b + 106


def read_message_138(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 56
    w1 = n >> p & 72057594037927935
    t0: Tree = {"NID_MESSAGE": 138, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 32, "T_TRAIN_REFERENCE": w1 & 4294967295}
    return t0, p


def write_message_138(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 138 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["T_TRAIN_REFERENCE"]
    if x1 >> 24 | x2 >> 32:
        raise Misfit
    v = v << 56 | x1 << 32 | x2
    return v, b + 106


def read_message_146(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 56
    w1 = n >> p & 72057594037927935
    t0: Tree = {"NID_MESSAGE": 146, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 32, "T_TRAIN_REFERENCE": w1 & 4294967295}
    return t0, p


def write_message_146(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 146 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["T_TRAIN_REFERENCE"]
    if x1 >> 24 | x2 >> 32:
        raise Misfit
    v = v << 56 | x1 << 32 | x2
    return v, b + 106


def read_message_147(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 30
    w1 = n >> p & 1073741823
    t0: Tree = {"NID_MESSAGE": 147, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 6, "NID_EM": w1 >> 2 & 15, "Q_EMERGENCYSTOP": w1 & 3}
    return t0, p


def write_message_147(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 147 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["NID_EM"]
    x3 = t["Q_EMERGENCYSTOP"]
    if x1 >> 24 | x2 >> 4 | x3 >> 2:
        raise Misfit
    v = v << 30 | x1 << 6 | x2 << 2 | x3
    return v, b + 80


def read_message_149(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 149, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_149(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 149 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_150(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 150, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_150(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 150 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_153(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 49
    w1 = n >> p & 562949953421311
    t0: Tree = {"NID_MESSAGE": 153, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 25, "NID_C": w1 >> 15 & 1023, "NID_BG": w1 >> 1 & 16383, "Q_INFILL": w1 & 1}
    return t0, p


def write_message_153(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 6 + ("L_MESSAGE" in t):
        raise Misfit
    v = 153 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["NID_C"]
    x3 = t["NID_BG"]
    x4 = t["Q_INFILL"]
    if x1 >> 24 | x2 >> 10 | x3 >> 14 | x4 >> 1:
        raise Misfit
    v = v << 49 | x1 << 25 | x2 << 15 | x3 << 1 | x4
    return v, b + 99


def read_message_154(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 154, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_154(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 154 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_155(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 155, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_155(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 155 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_156(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 156, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_156(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 156 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_157(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 26
    w1 = n >> p & 67108863
    t0: Tree = {"NID_MESSAGE": 157, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 2, "Q_STATUS": w1 & 3}
    return t0, p


def write_message_157(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 157 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["Q_STATUS"]
    if x1 >> 24 | x2 >> 2:
        raise Misfit
    v = v << 26 | x1 << 2 | x2
    return v, b + 76


def read_message_158(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 32
    w1 = n >> p & 4294967295
    t0: Tree = {"NID_MESSAGE": 158, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1 >> 8, "NID_TEXTMESSAGE": w1 & 255}
    return t0, p


def write_message_158(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 158 << 42 | x0
    x1 = t["NID_ENGINE"]
    x2 = t["NID_TEXTMESSAGE"]
    if x1 >> 24 | x2 >> 8:
        raise Misfit
    v = v << 32 | x1 << 8 | x2
    return v, b + 82


def read_message_159(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 159, "L_MESSAGE": w0 >> 32 & 1023, "T_TRAIN": w0 & 4294967295, "NID_ENGINE": w1}
    return t0, p


def write_message_159(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    if x0 >> 32 or len(t) != 3 + ("L_MESSAGE" in t):
        raise Misfit
    v = 159 << 42 | x0
    x1 = t["NID_ENGINE"]
    if x1 >> 24:
        raise Misfit
    v = v << 24 | x1
    return v, b + 74


def read_message_2(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 41
    w1 = n >> p & 2199023255551
    t0: Tree = {"NID_MESSAGE": 2, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 17, "Q_SCALE": w1 >> 15 & 3, "D_SR": w1 & 32767}
    return t0, p


def write_message_2(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 6 + ("L_MESSAGE" in t):
        raise Misfit
    v = 2 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["Q_SCALE"]
    x4 = t["D_SR"]
    if x2 >> 24 | x3 >> 2 | x4 >> 15:
        raise Misfit
    v = v << 41 | x2 << 17 | x3 << 15 | x4
    return v, b + 92


def read_message_3(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 3, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_3(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 3 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_6(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 6, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_6(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 6 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_8(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 56
    w1 = n >> p & 72057594037927935
    t0: Tree = {"NID_MESSAGE": 8, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 32, "T_TRAIN_REFERENCE": w1 & 4294967295}
    return t0, p


def write_message_8(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 8 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["T_TRAIN_REFERENCE"]
    if x2 >> 24 | x3 >> 32:
        raise Misfit
    v = v << 56 | x2 << 32 | x3
    return v, b + 107


def read_message_9(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 9, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_9(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 9 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_15(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 48
    w1 = n >> p & 281474976710655
    p -= 15
    w2 = n >> p & 32767
    t0: Tree = {"NID_MESSAGE": 15, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 24, "NID_EM": w1 >> 20 & 15, "Q_SCALE": w1 >> 18 & 3, "D_REF": ((w1 >> 2 & 65535) ^ 32768) - 32768, "Q_DIR": w1 & 3, "D_EMERGENCYSTOP": w2}
    return t0, p


def write_message_15(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 9 + ("L_MESSAGE" in t):
        raise Misfit
    v = 15 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["NID_EM"]
    x4 = t["Q_SCALE"]
    x5 = t["D_REF"]
    x6 = t["Q_DIR"]
    if x2 >> 24 | x3 >> 4 | x4 >> 2 | x5 + 32768 >> 16 | x6 >> 2:
        raise Misfit
    v = v << 48 | x2 << 24 | x3 << 20 | x4 << 18 | (x5 & 65535) << 2 | x6
    x7 = t["D_EMERGENCYSTOP"]
    if x7 >> 15:
        raise Misfit
    v = v << 15 | x7
    return v, b + 114


def read_message_16(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 28
    w1 = n >> p & 268435455
    t0: Tree = {"NID_MESSAGE": 16, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 4, "NID_EM": w1 & 15}
    return t0, p


def write_message_16(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 16 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["NID_EM"]
    if x2 >> 24 | x3 >> 4:
        raise Misfit
    v = v << 28 | x2 << 4 | x3
    return v, b + 79


def read_message_18(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 28
    w1 = n >> p & 268435455
    t0: Tree = {"NID_MESSAGE": 18, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 4, "NID_EM": w1 & 15}
    return t0, p


def write_message_18(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 18 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["NID_EM"]
    if x2 >> 24 | x3 >> 4:
        raise Misfit
    v = v << 28 | x2 << 4 | x3
    return v, b + 79


def read_message_24(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 24, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_24(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 24 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_27(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 56
    w1 = n >> p & 72057594037927935
    t0: Tree = {"NID_MESSAGE": 27, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 32, "T_TRAIN_REFERENCE": w1 & 4294967295}
    return t0, p


def write_message_27(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 27 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["T_TRAIN_REFERENCE"]
    if x2 >> 24 | x3 >> 32:
        raise Misfit
    v = v << 56 | x2 << 32 | x3
    return v, b + 107


def read_message_28(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 56
    w1 = n >> p & 72057594037927935
    t0: Tree = {"NID_MESSAGE": 28, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 32, "T_TRAIN_REFERENCE": w1 & 4294967295}
    return t0, p


def write_message_28(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 28 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["T_TRAIN_REFERENCE"]
    if x2 >> 24 | x3 >> 32:
        raise Misfit
    v = v << 56 | x2 << 32 | x3
    return v, b + 107


def read_message_32(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 31
    w1 = n >> p & 2147483647
    t0: Tree = {"NID_MESSAGE": 32, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 7, "M_VERSION": w1 & 127}
    return t0, p


def write_message_32(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 32 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["M_VERSION"]
    if x2 >> 24 | x3 >> 7:
        raise Misfit
    v = v << 31 | x2 << 7 | x3
    return v, b + 82


def read_message_33(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 42
    w1 = n >> p & 4398046511103
    t0: Tree = {"NID_MESSAGE": 33, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 18, "Q_SCALE": w1 >> 16 & 3, "D_REF": ((w1 & 65535) ^ 32768) - 32768}
    return t0, p


def write_message_33(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 6 + ("L_MESSAGE" in t):
        raise Misfit
    v = 33 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["Q_SCALE"]
    x4 = t["D_REF"]
    if x2 >> 24 | x3 >> 2 | x4 + 32768 >> 16:
        raise Misfit
    v = v << 42 | x2 << 18 | x3 << 16 | (x4 & 65535)
    return v, b + 93


def read_message_34(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 59
    w1 = n >> p & 576460752303423487
    p -= 15
    w2 = n >> p & 32767
    t0: Tree = {"NID_MESSAGE": 34, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 35, "Q_SCALE": w1 >> 33 & 3, "D_REF": ((w1 >> 17 & 65535) ^ 32768) - 32768, "Q_DIR": w1 >> 15 & 3, "D_TAFDISPLAY": w1 & 32767, "L_TAFDISPLAY": w2}
    return t0, p


def write_message_34(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 9 + ("L_MESSAGE" in t):
        raise Misfit
    v = 34 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["Q_SCALE"]
    x4 = t["D_REF"]
    x5 = t["Q_DIR"]
    x6 = t["D_TAFDISPLAY"]
    if x2 >> 24 | x3 >> 2 | x4 + 32768 >> 16 | x5 >> 2 | x6 >> 15:
        raise Misfit
    v = v << 59 | x2 << 35 | x3 << 33 | (x4 & 65535) << 17 | x5 << 15 | x6
    x7 = t["L_TAFDISPLAY"]
    if x7 >> 15:
        raise Misfit
    v = v << 15 | x7
    return v, b + 125


def read_message_37(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 37, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_37(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 37 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_39(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 39, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_39(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 39 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_40(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 40, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_40(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 40 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_41(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 41, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_41(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 41 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_43(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 24
    w1 = n >> p & 16777215
    t0: Tree = {"NID_MESSAGE": 43, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1}
    return t0, p


def write_message_43(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 4 + ("L_MESSAGE" in t):
        raise Misfit
    v = 43 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    if x2 >> 24:
        raise Misfit
    v = v << 24 | x2
    return v, b + 75


def read_message_45(n: int, p: int) -> tuple[Tree, int]:
    p -= 51
    w0 = n >> p & 2251799813685247
    p -= 25
    w1 = n >> p & 33554431
    t0: Tree = {"NID_MESSAGE": 45, "L_MESSAGE": w0 >> 33 & 1023, "T_TRAIN": w0 >> 1 & 4294967295, "M_ACK": w0 & 1, "NID_LRBG": w1 >> 1, "Q_ORIENTATION": w1 & 1}
    return t0, p


def write_message_45(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["T_TRAIN"]
    x1 = t["M_ACK"]
    if x0 >> 32 | x1 >> 1 or len(t) != 5 + ("L_MESSAGE" in t):
        raise Misfit
    v = 45 << 43 | x0 << 1 | x1
    x2 = t["NID_LRBG"]
    x3 = t["Q_ORIENTATION"]
    if x2 >> 24 | x3 >> 1:
        raise Misfit
    v = v << 25 | x2 << 1 | x3
    return v, b + 76


def read_balise(n: int, p: int) -> tuple[Tree, int]:
    p -= 50
    w0 = n >> p & 1125899906842623
    t0: Tree = {"Q_UPDOWN": w0 >> 49, "M_VERSION": w0 >> 42 & 127, "Q_MEDIA": w0 >> 41 & 1, "N_PIG": w0 >> 38 & 7, "N_TOTAL": w0 >> 35 & 7, "M_DUP": w0 >> 33 & 3, "M_MCOUNT": w0 >> 25 & 255, "NID_C": w0 >> 15 & 1023, "NID_BG": w0 >> 1 & 16383, "Q_LINK": w0 & 1}
    return t0, p


def write_balise(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_UPDOWN"]
    x1 = t["M_VERSION"]
    x2 = t["Q_MEDIA"]
    x3 = t["N_PIG"]
    x4 = t["N_TOTAL"]
    x5 = t["M_DUP"]
    x6 = t["M_MCOUNT"]
    x7 = t["NID_C"]
    x8 = t["NID_BG"]
    x9 = t["Q_LINK"]
    if x0 >> 1 | x1 >> 7 | x2 >> 1 | x3 >> 3 | x4 >> 3 | x5 >> 2 | x6 >> 8 | x7 >> 10 | x8 >> 14 | x9 >> 1 or len(t) != 10:
        raise Misfit
    v = x0 << 49 | x1 << 42 | x2 << 41 | x3 << 38 | x4 << 35 | x5 << 33 | x6 << 25 | x7 << 15 | x8 << 1 | x9
    return v, b + 50


def read_loop(n: int, p: int) -> tuple[Tree, int]:
    p -= 33
    w0 = n >> p & 8589934591
    t0: Tree = {"Q_UPDOWN": w0 >> 32, "M_VERSION": w0 >> 25 & 127, "Q_MEDIA": w0 >> 24 & 1, "NID_C": w0 >> 14 & 1023, "NID_LOOP": w0 & 16383}
    return t0, p


def write_loop(t: Tree) -> tuple[int, int]:
    b = 0
    x0 = t["Q_UPDOWN"]
    x1 = t["M_VERSION"]
    x2 = t["Q_MEDIA"]
    x3 = t["NID_C"]
    x4 = t["NID_LOOP"]
    if x0 >> 1 | x1 >> 7 | x2 >> 1 | x3 >> 10 | x4 >> 14 or len(t) != 5:
        raise Misfit
    v = x0 << 32 | x1 << 25 | x2 << 24 | x3 << 14 | x4
    return v, b + 33


CODEC = Codec(
    layouts="v3_6_0",
    read_packet={
        "to-train": {
            0: read_to_train_0,
            2: read_to_train_2,
            3: read_to_train_3,
            5: read_to_train_5,
            6: read_to_train_6,
            12: read_to_train_12,
            13: read_to_train_13,
            15: read_to_train_15,
            16: read_to_train_16,
            21: read_to_train_21,
            27: read_to_train_27,
            39: read_to_train_39,
            40: read_to_train_40,
            41: read_to_train_41,
            42: read_to_train_42,
            44: read_to_train_44,
            45: read_to_train_45,
            46: read_to_train_46,
            49: read_to_train_49,
            51: read_to_train_51,
            52: read_to_train_52,
            57: read_to_train_57,
            58: read_to_train_58,
            63: read_to_train_63,
            64: read_to_train_64,
            65: read_to_train_65,
            66: read_to_train_66,
            67: read_to_train_67,
            68: read_to_train_68,
            69: read_to_train_69,
            70: read_to_train_70,
            71: read_to_train_71,
            72: read_to_train_72,
            76: read_to_train_76,
            79: read_to_train_79,
            80: read_to_train_80,
            88: read_to_train_88,
            90: read_to_train_90,
            131: read_to_train_131,
            132: read_to_train_132,
            133: read_to_train_133,
            134: read_to_train_134,
            135: read_to_train_135,
            136: read_to_train_136,
            137: read_to_train_137,
            138: read_to_train_138,
            139: read_to_train_139,
            140: read_to_train_140,
            141: read_to_train_141,
            143: read_to_train_143,
            145: read_to_train_145,
            180: read_to_train_180,
            181: read_to_train_181,
            254: read_to_train_254,
            255: read_to_train_255,
        },
        "to-track": {
            0: read_to_track_0,
            1: read_to_track_1,
            2: read_to_track_2,
            4: read_to_track_4,
            5: read_to_track_5,
            9: read_to_track_9,
            11: read_to_track_11,
            44: read_to_track_44,
        },
    },
    read_message={
        "to-train": {
            2: read_message_2,
            3: read_message_3,
            6: read_message_6,
            8: read_message_8,
            9: read_message_9,
            15: read_message_15,
            16: read_message_16,
            18: read_message_18,
            24: read_message_24,
            27: read_message_27,
            28: read_message_28,
            32: read_message_32,
            33: read_message_33,
            34: read_message_34,
            37: read_message_37,
            39: read_message_39,
            40: read_message_40,
            41: read_message_41,
            43: read_message_43,
            45: read_message_45,
        },
        "to-track": {
            129: read_message_129,
            130: read_message_130,
            132: read_message_132,
            136: read_message_136,
            137: read_message_137,
            138: read_message_138,
            146: read_message_146,
            147: read_message_147,
            149: read_message_149,
            150: read_message_150,
            153: read_message_153,
            154: read_message_154,
            155: read_message_155,
            156: read_message_156,
            157: read_message_157,
            158: read_message_158,
            159: read_message_159,
        },
    },
    read_header={"balise": read_balise, "loop": read_loop},
    write_packet={
        "to-train": {
            0: write_to_train_0,
            2: write_to_train_2,
            3: write_to_train_3,
            5: write_to_train_5,
            6: write_to_train_6,
            12: write_to_train_12,
            13: write_to_train_13,
            15: write_to_train_15,
            16: write_to_train_16,
            21: write_to_train_21,
            27: write_to_train_27,
            39: write_to_train_39,
            40: write_to_train_40,
            41: write_to_train_41,
            42: write_to_train_42,
            44: write_to_train_44,
            45: write_to_train_45,
            46: write_to_train_46,
            49: write_to_train_49,
            51: write_to_train_51,
            52: write_to_train_52,
            57: write_to_train_57,
            58: write_to_train_58,
            63: write_to_train_63,
            64: write_to_train_64,
            65: write_to_train_65,
            66: write_to_train_66,
            67: write_to_train_67,
            68: write_to_train_68,
            69: write_to_train_69,
            70: write_to_train_70,
            71: write_to_train_71,
            72: write_to_train_72,
            76: write_to_train_76,
            79: write_to_train_79,
            80: write_to_train_80,
            88: write_to_train_88,
            90: write_to_train_90,
            131: write_to_train_131,
            132: write_to_train_132,
            133: write_to_train_133,
            134: write_to_train_134,
            135: write_to_train_135,
            136: write_to_train_136,
            137: write_to_train_137,
            138: write_to_train_138,
            139: write_to_train_139,
            140: write_to_train_140,
            141: write_to_train_141,
            143: write_to_train_143,
            145: write_to_train_145,
            180: write_to_train_180,
            181: write_to_train_181,
            254: write_to_train_254,
            255: write_to_train_255,
        },
        "to-track": {
            0: write_to_track_0,
            1: write_to_track_1,
            2: write_to_track_2,
            4: write_to_track_4,
            5: write_to_track_5,
            9: write_to_track_9,
            11: write_to_track_11,
            44: write_to_track_44,
        },
    },
    write_message={
        "to-train": {
            2: write_message_2,
            3: write_message_3,
            6: write_message_6,
            8: write_message_8,
            9: write_message_9,
            15: write_message_15,
            16: write_message_16,
            18: write_message_18,
            24: write_message_24,
            27: write_message_27,
            28: write_message_28,
            32: write_message_32,
            33: write_message_33,
            34: write_message_34,
            37: write_message_37,
            39: write_message_39,
            40: write_message_40,
            41: write_message_41,
            43: write_message_43,
            45: write_message_45,
        },
        "to-track": {
            129: write_message_129,
            130: write_message_130,
            132: write_message_132,
            136: write_message_136,
            137: write_message_137,
            138: write_message_138,
            146: write_message_146,
            147: write_message_147,
            149: write_message_149,
            150: write_message_150,
            153: write_message_153,
            154: write_message_154,
            155: write_message_155,
            156: write_message_156,
            157: write_message_157,
            158: write_message_158,
            159: write_message_159,
        },
    },
    write_header={"balise": write_balise, "loop": write_loop},
    unmeasured={"to-train": {0: 14, 255: 8}, "to-track": {}},
    forms={"to-train": {}, "to-track": {}},
    since={"to-train": {}, "to-track": {}},
    evidence=(),
)
