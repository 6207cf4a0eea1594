#!/usr/bin/env python3
"""Independent recomputation of kit A's transmit stages, plain Python, other methods than the product's.

Oscillator: zero of the determinant of the nodal admittance matrix (product: loop reactance).
Filter: nodal analysis by Gaussian elimination (product: chain matrix).
Writes kit-a-transmit.csv and kit-a-new-bands.csv into ../ClubBench.Planning.Tests/ReferenceValues: each named row as printed, and with one input moved by 10 %.
Run: python3 kit_a_transmit.py
"""
import cmath, csv, math, os

PI2 = 2 * math.pi


def determinant(m):
    m = [row[:] for row in m]
    det = 1
    for i in range(len(m)):
        p = max(range(i, len(m)), key=lambda r: abs(m[r][i]))
        if p != i:
            m[i], m[p], det = m[p], m[i], -det
        det *= m[i][i]
        for r in range(i + 1, len(m)):
            k = m[r][i] / m[i][i]
            m[r] = [a - k * b for a, b in zip(m[r], m[i])]
    return det


def oscillator(marked=10.12e6, cm=20e-15, c0=4.5e-12, n=2, l=10e-6, cl=1.5e-12, cv=150e-12, cosc=75e-12, load=30e-12):
    """Nodes: oscillator terminal, junction crystal/choke, junction choke/variable; lossless, so the determinant is real times j^3."""
    fs = marked / math.sqrt(1 + cm / (c0 + load))
    fp = fs * math.sqrt(1 + cm / c0)
    lm = 1 / ((PI2 * fs) ** 2 * cm)

    def b(f):
        """Determinant times the series reactance: the pole at series resonance is multiplied away, so every sign change is a root."""
        w = PI2 * f
        series = lm * (w - (PI2 * fs) ** 2 / w)
        ychoke = w * cl - 1 / (w * l)
        full = lambda x: determinant([[x + w * cosc, -x, 0], [-x, x + ychoke, -ychoke], [0, -ychoke, ychoke + w * cv]])
        # the determinant is linear in the crystal's susceptance x: full(x) = full(0) + x (full(1) - full(0))
        zero, one = full(0.0), full(1.0)
        return zero * series + n * (w * c0 * series - 1) * (one - zero)

    lo, hi, steps = fs * 0.985, fp * (1 - 1e-9), 20000
    last, roots = b(lo), []
    for i in range(1, steps + 1):
        f = lo + (hi - lo) * i / steps
        v = b(f)
        if last * v < 0:
            a, c = f - (hi - lo) / steps, f
            for _ in range(80):
                m = 0.5 * (a + c)
                a, c = (m, c) if b(a) * b(m) > 0 else (a, m)
            roots.append(0.5 * (a + c))
        last = v
    assert len(roots) == 1, roots
    return roots[0]


def parallel_series(a, b):
    return a * b / (a + b)


def ladder(f, caps, coils, ql=150, qc=1000, r=50):
    """Nodal: voltages at every capacitor node, source current 1/r behind r, load r. Returns loss and return loss in dB."""
    w = PI2 * f
    n = len(caps)
    y = [[0j] * n for _ in range(n)]
    for i, c in enumerate(caps):
        y[i][i] += 1 / ((1 / (1j * w * c)) * (1 + 1j / qc))
    for i, l in enumerate(coils):
        g = 1 / (1j * w * l * (1 - 1j / ql))
        y[i][i] += g; y[i + 1][i + 1] += g; y[i][i + 1] -= g; y[i + 1][i] -= g
    y[0][0] += 1 / r
    y[-1][-1] += 1 / r
    rhs = [1 / r] + [0j] * (n - 1)
    for i in range(n):
        for k in range(i + 1, n):
            q = y[k][i] / y[i][i]
            y[k] = [a - q * b for a, b in zip(y[k], y[i])]
            rhs[k] -= q * rhs[i]
    v = [0j] * n
    for i in reversed(range(n)):
        v[i] = (rhs[i] - sum(y[i][k] * v[k] for k in range(i + 1, n))) / y[i][i]
    return -20 * math.log10(abs(2 * v[-1])), -20 * math.log10(abs(2 * v[0] - 1))


def cutoff(caps, coils, start):
    base = ladder(start, caps, coils)[0]
    lo, hi = start, start
    while ladder(hi, caps, coils)[0] < base + 10 * math.log10(2):
        lo, hi = hi, hi * 1.01
    for _ in range(60):
        m = 0.5 * (lo + hi)
        lo, hi = (m, hi) if ladder(m, caps, coils)[0] < base + 10 * math.log10(2) else (lo, m)
    return lo


def toroid(al_nh, turns):
    return al_nh * 1e-9 * turns * turns


rows = []


def row(case, stage, change, factor, figure, at, expected, tolerance, note=""):
    rows.append(dict(case_id=case, stage=stage, change=change, factor=factor, figure=figure, at_hz=at, expected=repr(expected), tolerance_relative=tolerance, source_id="derived", locator="kit_a_transmit.py", note=note))


# A1
def a1(case, change="", factor=1.0, **kw):
    cosc = parallel_series(kw.pop("c1", 150e-12), kw.pop("c2", 150e-12))
    low = oscillator(cv=kw.get("cvmax", 150e-12), cosc=cosc, **{k: v for k, v in kw.items() if k in ("marked", "cm", "c0", "n", "l", "cl")})
    high = oscillator(cv=kw.get("cvmin", 12e-12), cosc=cosc, **{k: v for k, v in kw.items() if k in ("marked", "cm", "c0", "n", "l", "cl")})
    row(f"A1 lowest frequency{case}", "A1", change, factor, "lowest-frequency", "", low, 1e-8)
    row(f"A1 highest frequency{case}", "A1", change, factor, "highest-frequency", "", high, 1e-8)
    row(f"A1 span{case}", "A1", change, factor, "span", "", high - low, 1e-4)


a1("")
a1(", choke 10 % larger", "L1.inductanceH", 1.1, l=11e-6)
a1(", motional capacitance 10 % larger", "X1.motionalCapacitanceF;X2.motionalCapacitanceF", 1.1, cm=22e-15)
a1(", feedback capacitor 10 % larger", "C1.capacitanceF", 1.1, c1=165e-12)
one_low, one_high = oscillator(n=1, cv=150e-12), oscillator(n=1, cv=12e-12)
row("A1 one crystal, lowest frequency", "A1", "", 1.0, "one-crystal-low", "", one_low, 1e-8)
row("A1 one crystal, highest frequency", "A1", "", 1.0, "one-crystal-high", "", one_high, 1e-8)


def offset(cv, c5=100e-12, **kw):
    return oscillator(cv=cv, cosc=parallel_series(150e-12, 150e-12 + c5), **kw) - oscillator(cv=cv, **kw)


row("A1 receive offset at 50 pF", "A1", "", 1.0, "receive-offset", "", offset(50e-12), 1e-4)
row("A1 receive offset at the top", "A1", "", 1.0, "offset-top", "", offset(12e-12), 1e-4)
row("A1 receive offset at the bottom", "A1", "", 1.0, "offset-bottom", "", offset(150e-12), 1e-4)
row("A1 receive offset, capacitor 10 % larger", "A1", "C5.capacitanceF", 1.1, "receive-offset", "", offset(50e-12, c5=110e-12), 1e-4)

# A3: f = 1/(2 pi sqrt(LC)); load through the squared turns ratio; power from the peak swing
L2 = toroid(4.0, 24)


def a3(case, change="", factor=1.0, l=L2, c=82e-12, tmin=5e-12, tmax=30e-12, stray=10e-12, link=4, swing=9.0, f=10.12e6):
    lo = 1 / (PI2 * math.sqrt(l * (c + stray + tmax)))
    hi = 1 / (PI2 * math.sqrt(l * (c + stray + tmin)))
    load = 12 * (24 / link) ** 2
    row(f"A3 tunes from{case}", "A3", change, factor, "tunes-low", "", lo, 1e-9)
    row(f"A3 tunes up to{case}", "A3", change, factor, "tunes-high", "", hi, 1e-9)
    row(f"A3 load at the collector{case}", "A3", change, factor, "load", "", load, 1e-9)
    row(f"A3 available power{case}", "A3", change, factor, "available-power", "", min(swing ** 2 / 2 / load, 0.03 ** 2 * load / 2), 1e-9)


a3("")
a3(", tank capacitor 10 % larger", "C11.capacitanceF", 1.1, c=90.2e-12)
a3(", swing 10 % larger", "settings.peakSwingV", 1.1, swing=9.9)
row("A3 needed capacitance at 10.12 MHz", "A3", "", 1.0, "needed-capacitance", 10.12e6, 1 / ((PI2 * 10.12e6) ** 2 * L2), 1e-9)
row("A3 reactance at 10.12 MHz", "A3", "", 1.0, "reactance", 10.12e6, PI2 * 10.12e6 * L2, 1e-9)


# A4: half the squared swing over the load; direct flux from Ampere's law; permeability of mix 43 at 10 MHz by log interpolation is the table's own row
def a4(case, change="", factor=1.0, sat=0.8, eta=0.6, turns=10):
    power = (12 - 0.35 - sat) ** 2 / 100
    current = power / eta / 12
    gauss = 0.4 * math.pi * 800 * turns * current / 2.15
    row(f"A4 output power{case}", "A4", change, factor, "output-power", "", power, 1e-9)
    row(f"A4 supply current{case}", "A4", change, factor, "supply-current", "", current, 1e-9)
    row(f"A4 flux share of the choke{case}", "A4", change, factor, "choke-bias", "", gauss / 2900, 2e-3)


a4("")
a4(", saturation voltage 10 % higher", "settings.saturationVoltageV", 1.1, sat=0.88)
a4(", efficiency 10 % better", "settings.efficiencyRelative", 1.1, eta=0.66)
z = PI2 * 10e6 * 100 * 350e-9 * complex(245, 265) / 800
row("A4 choke impedance at 10 MHz", "A4", "", 1.0, "choke-impedance", 10e6, abs(z), 2e-3)

# A5
CAPS = [270e-12, 510e-12, 510e-12, 270e-12]
COILS = [toroid(4.0, 15), toroid(4.0, 16), toroid(4.0, 15)]
for case, change, factor, caps in (("", "", 1.0, CAPS), (", C16 10 % larger", "C16.capacitanceF", 1.1, [270e-12, 561e-12, 510e-12, 270e-12])):
    for f, what in ((10.10e6, "at 10.10 MHz"), (20.26e6, "at 2f"), (30.39e6, "at 3f")):
        loss, rl = ladder(f, caps, COILS)
        row(f"A5 loss {what}{case}", "A5", change, factor, "passes-loss", f, loss, 1e-6)
        if f < 11e6:
            row(f"A5 return loss {what}{case}", "A5", change, factor, "passes-return-loss", f, rl, 1e-6)
row("A5 cut-off", "A5", "", 1.0, "cut-off", "", cutoff(CAPS, COILS, 10.116e6), 1e-6)

# the kept filter on the new bands, and the named conversions
for case, caps, coils, f in (
    ("30 m filter on 20 m", CAPS, COILS, 14.06e6),
    ("30 m filter on 40 m, 2f", CAPS, COILS, 14.06e6),
    ("20 m filter at 14.05 MHz", [200e-12, 360e-12, 360e-12, 200e-12], [toroid(3.0, 15), toroid(3.0, 16), toroid(3.0, 15)], 14.05e6),
    ("20 m filter at 28.1 MHz", [200e-12, 360e-12, 360e-12, 200e-12], [toroid(3.0, 15), toroid(3.0, 16), toroid(3.0, 15)], 28.1e6),
    ("40 m filter at 7.03 MHz", [390e-12, 750e-12, 750e-12, 390e-12], [toroid(4.9, 16), toroid(4.9, 17), toroid(4.9, 16)], 7.03e6),
    ("40 m filter at 14.06 MHz", [390e-12, 750e-12, 750e-12, 390e-12], [toroid(4.9, 16), toroid(4.9, 17), toroid(4.9, 16)], 14.06e6),
):
    loss, rl = ladder(f, caps, coils)
    row(f"A5 {case}: loss", "", "", 1.0, "loss", f, loss, 1e-6)
    row(f"A5 {case}: return loss", "", "", 1.0, "return-loss", f, rl, 1e-6)

# A1 on the new bands
for case, kw in (
    ("20 m, 10 uH kept", dict(marked=14.06e6, cm=22e-15, c0=4.8e-12, l=10e-6)),
    ("20 m, 6.8 uH", dict(marked=14.06e6, cm=22e-15, c0=4.8e-12, l=6.8e-6)),
    ("40 m, 10 uH kept", dict(marked=7.03e6, cm=16e-15, c0=4.2e-12, l=10e-6)),
    ("40 m, 33 uH", dict(marked=7.03e6, cm=16e-15, c0=4.2e-12, l=33e-6)),
):
    row(f"A1 {case}: lowest", "", "", 1.0, "lowest-frequency", "", oscillator(cv=150e-12, **kw), 1e-8)
    row(f"A1 {case}: highest", "", "", 1.0, "highest-frequency", "", oscillator(cv=12e-12, **kw), 1e-8)
    row(f"A1 {case}: offset at 50 pF with 100 pF", "", "", 1.0, "receive-offset", "", offset(50e-12, **kw), 1e-4)

here = os.path.dirname(os.path.abspath(__file__))
for name, part in (("kit-a-transmit", [r for r in rows if r["stage"]]), ("kit-a-new-bands", [r for r in rows if not r["stage"]])):
    with open(os.path.join(here, "..", "ClubBench.Planning.Tests", "ReferenceValues", name + ".csv"), "w", newline="") as out:
        writer = csv.DictWriter(out, fieldnames=list(rows[0]), lineterminator="\n")
        writer.writeheader()
        writer.writerows(part)
print(len(rows), "rows")
