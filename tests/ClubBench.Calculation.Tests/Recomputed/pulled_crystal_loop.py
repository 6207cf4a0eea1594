"""Pulled crystal oscillator recomputed another way: zero of the 3x3 nodal admittance determinant.

Run from this folder: python3 pulled_crystal_loop.py > ../ReferenceValues/pulled-crystal-nodal.csv
Nodes: 1 oscillator terminal, 2 crystal/inductor junction, 3 inductor/variable capacitor junction; all admittances are imaginary (lossless).
"""
from fractions import Fraction
from math import pi, sqrt

P = 1e-12


def determinant(w, c):
    ws = 2 * pi * c["fs"]
    cm = c["n"] * c["cm"]
    c0 = c["n"] * c["c0"] + c["ch"]
    lm = 1 / (ws * ws * cm)
    y_crystal = w * c0 - 1 / (lm * (w - ws) * (w + ws) / w)
    y_coil = w * c["cls"] - 1 / (w * c["l"])
    y1, y2, y3 = w * c["cosc"], w * c["cn"], w * (c["cv"] + c["cvs"])
    rows = [
        [y1 + y_crystal, -y_crystal, 0.0],
        [-y_crystal, y2 + y_crystal + y_coil, -y_coil],
        [0.0, -y_coil, y3 + y_coil],
    ]
    m = [[Fraction(x) for x in row] for row in rows]  # exact sums: the products cancel almost completely
    return (m[0][0] * (m[1][1] * m[2][2] - m[1][2] * m[2][1]) - m[0][1] * (m[1][0] * m[2][2] - m[1][2] * m[2][0]))


def frequency(c):
    """Zero nearest to series resonance: walk out from it in both directions, then halve."""
    step, reach = 50.0, 200_000.0
    fp = c["fs"] * sqrt(1 + c["n"] * c["cm"] / (c["n"] * c["c0"] + c["ch"]))
    near, d = [], 7.0
    while d < reach:
        for low in (c["fs"] + d, c["fs"] - d - step):
            high = low + step
            if high < fp and (determinant(2 * pi * low, c) < 0) != (determinant(2 * pi * high, c) < 0):
                near.append((low, high))
        if near:
            break
        d += step
    low, high = near[0]
    sign = determinant(2 * pi * low, c) < 0
    for _ in range(60):
        mid = (low + high) / 2
        if (determinant(2 * pi * mid, c) < 0) == sign:
            low = mid
        else:
            high = mid
    return (low + high) / 2


def series(marked, load_pf, cm, c0):
    return marked / sqrt(1 + cm / (c0 + load_pf * P))


BASE = dict(fs=7.03e6, cm=18e-15, c0=4.5 * P, n=1, ch=0.0, l=22e-6, cls=0.0, cn=0.0, cvs=0.0, cosc=100 * P)
STRAY = dict(BASE, n=2, ch=1 * P, cls=1.5 * P, cn=2 * P)
KITS = {
    "kit-a-30m": dict(fs=series(10.12e6, 30, 20e-15, 4.5 * P), cm=20e-15, c0=4.5 * P, l=10e-6),
    "kit-a-20m-10uH": dict(fs=series(14.06e6, 30, 22e-15, 4.8 * P), cm=22e-15, c0=4.8 * P, l=10e-6),
    "kit-a-20m-6u8H": dict(fs=series(14.06e6, 30, 22e-15, 4.8 * P), cm=22e-15, c0=4.8 * P, l=6.8e-6),
    "kit-a-40m-10uH": dict(fs=series(7.03e6, 30, 16e-15, 4.2 * P), cm=16e-15, c0=4.2 * P, l=10e-6),
    "kit-a-40m-33uH": dict(fs=series(7.03e6, 30, 16e-15, 4.2 * P), cm=16e-15, c0=4.2 * P, l=33e-6),
}


def cases():
    for cv in (10, 30, 100):
        yield f"one-{cv}pF", dict(BASE, cv=cv * P)
    for cv in (10, 100):
        yield f"two-with-strays-{cv}pF", dict(STRAY, cv=cv * P)
    yield "two-with-strays-across-3pF-25pF", dict(STRAY, cv=25 * P, cvs=3 * P)
    for name, kit in KITS.items():
        for cv in (12, 50, 150):
            yield f"{name}-{cv}pF", BASE | kit | dict(n=2, cls=1.5 * P, cosc=75 * P, cv=cv * P)


print("case_id,fs_hz,cm_ff,c0_pf,crystals,holder_pf,series_uh,self_pf,node_pf,across_pf,oscillator_pf,variable_pf,expected_hz,tolerance_hz,source_id,locator,note")
for name, c in cases():
    print(f"{name},{c['fs']:.6f},{c['cm']*1e15:g},{c['c0']/P:g},{c['n']},{c['ch']/P:g},{c['l']*1e6:g},{c['cls']/P:g},{c['cn']/P:g},"
          f"{c['cvs']/P:g},{c['cosc']/P:g},{c['cv']/P:g},{frequency(c):.4f},0.01,derived,nodal determinant,Recomputed/pulled_crystal_loop.py")
