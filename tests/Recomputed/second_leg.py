"""Recomputes randomly drawn cases from formulas of its own, with numpy and scipy. Knows nothing of the library it checks.

Reads a JSON object {"area": name, "cases": [...]} from standard input and writes a JSON list of results, one list of numbers a case.
"""
import json
import sys

import numpy as np
from scipy import optimize, signal

TAU = 2 * np.pi


def low_pass(case):
    """Loss of an ideal filter from its poles: order, ripple in dB (0 for the flattest), frequency over the edge."""
    order, ripple, multiple = int(case["order"]), case["rippleDb"], case["multiple"]
    zeros, poles, gain = signal.buttap(order) if ripple == 0 else signal.cheb1ap(order, ripple)
    s = 1j * multiple
    h = gain * np.prod(s - np.asarray(zeros)) / np.prod(s - np.asarray(poles))
    return [-20 * np.log10(abs(h) / 1.0)]


def arm_admittance(arm, w):
    """Admittance of one arm of a ladder; losses as series resistances that keep the Q."""
    coil = arm["henry"] * w * (1j + 1 / arm["coilQ"]) if arm["henry"] else None
    capacitor = (1 / arm["capacitorQ"] - 1j) / (w * arm["farad"]) if arm["farad"] else None
    if coil is None:
        return 1 / capacitor
    if capacitor is None:
        return 1 / coil
    return 1 / coil + 1 / capacitor if arm["series"] else 1 / (coil + capacitor)


def ladder(case):
    """Loss and return loss by the node equations: every series arm opens a new node."""
    w = TAU * case["hertz"]
    nodes = 1 + sum(1 for a in case["arms"] if a["series"])
    y = np.zeros((nodes, nodes), complex)
    node = 0
    for arm in case["arms"]:
        a = arm_admittance(arm, w)
        if arm["series"]:
            y[node, node] += a
            y[node + 1, node + 1] += a
            y[node, node + 1] -= a
            y[node + 1, node] -= a
            node += 1
        else:
            y[node, node] += a
    rs, rl = case["source"], case["load"]
    y[0, 0] += 1 / rs
    y[-1, -1] += 1 / rl
    current = np.zeros(nodes, complex)
    current[0] = 1 / rs
    v = np.linalg.solve(y, current)
    reflection = 2 * v[0] - 1
    return [-20 * np.log10(abs(v[-1]) * 2 * np.sqrt(rs / rl)), -20 * np.log10(abs(reflection))]


def crystal(case):
    """Frequency of a pulled oscillator: the root of the loop's reactance between a fifth of series resonance and parallel resonance."""
    n = case["count"]
    fs, cm, c0 = case["seriesHz"], n * case["motionalF"], n * case["staticF"] + case["holderF"]
    lm = 1 / ((TAU * fs) ** 2 * cm)

    def reactance(f):
        w = TAU * f
        arm = 1j * lm * (w - (TAU * fs) ** 2 / w)
        x_tal = 1 / (1 / arm + 1j * w * c0)
        own = case["coilF"]
        coil = 1 / (1 / (1j * w * case["henry"]) + 1j * w * own) if case["henry"] else 0
        far = coil + 1 / (1j * w * case["variableF"])
        far = 1 / (1 / far + 1j * w * case["nodeF"]) if case["nodeF"] else far
        return (1 / (1j * w * case["oscillatorF"]) + x_tal + far).imag

    top = fs * np.sqrt(1 + cm / c0)
    return [optimize.brentq(reactance, 0.2 * fs, top * (1 - 1e-13), xtol=1e-9, rtol=1e-15, maxiter=500)]


def coupled(case):
    """Loss of resonators coupled at their tops, by the node equations."""
    w, w0 = TAU * case["hertz"], TAU * case["centerHz"]
    n = len(case["nodesF"])
    y = np.zeros((n, n), complex)
    for i, c in enumerate(case["nodesF"]):
        y[i, i] += 1j * w * c + 1 / (w0 * case["henry"] / case["unloadedQ"] + 1j * w * case["henry"])
    for i in range(n - 1):
        c = 1j * w * case["couplingF"]
        y[i, i] += c
        y[i + 1, i + 1] += c
        y[i, i + 1] -= c
        y[i + 1, i] -= c
    y[0, 0] += 1 / case["endOhm"]
    y[-1, -1] += 1 / case["endOhm"]
    current = np.zeros(n, complex)
    current[0] = 1 / case["endOhm"]
    return [-20 * np.log10(2 * abs(np.linalg.solve(y, current)[-1]))]


MAN_MADE = {"city": (76.8, 27.7), "residential": (72.5, 27.7), "rural": (67.2, 27.7), "quietRural": (53.6, 28.6)}


def noise(case):
    """Man-made noise by the constants of Recommendation ITU-R P.372, a chain by Friis, and what the chain adds to the site."""
    c, d = MAN_MADE[case["site"]]
    outside = c - d * np.log10(case["hertz"] / 1e6)
    factor, gain = 1.0, 1.0
    for stage in case["stages"]:
        factor += (10 ** (stage["noiseDb"] / 10) - 1) / gain
        gain *= 10 ** (stage["gainDb"] / 10)
    added = 10 * np.log10(1 + (factor - 1) / 10 ** (outside / 10))
    return [outside, 10 * np.log10(factor), added]


AREAS = {"low-pass": low_pass, "ladder": ladder, "crystal": crystal, "coupled": coupled, "noise": noise}

task = json.load(sys.stdin)
json.dump([[float(x) for x in AREAS[task["area"]](case)] for case in task["cases"]], sys.stdout)
