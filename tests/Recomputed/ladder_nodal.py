"""Ladder responses by nodal analysis, a second route beside the chain matrix of the product.

Writes ClubBench.Calculation.Tests/ReferenceValues/ladder_nodal.csv. Plain Python, no packages.
Every node voltage is an unknown; the admittance matrix is solved by Gaussian elimination with pivoting.
An arm is written kind:value[:value][:Q[:Q]] with kind C (to ground), L (in the line), LT (L||C in the line), CT (L+C to ground).
"""
import cmath
import csv
import math
import os

NETWORKS = {
    "cheby5": ["C:387.23e-12", "L:1.36503e-6", "C:717.46e-12", "L:1.36503e-6", "C:387.23e-12"],
    "cheby5-lossy": ["C:387.23e-12:1000", "L:1.36503e-6:150", "C:717.46e-12:1000", "L:1.36503e-6:150", "C:387.23e-12:1000"],
    "seven-30m": ["C:270e-12:1000", "L:0.900e-6:150", "C:510e-12:1000", "L:1.024e-6:150", "C:510e-12:1000", "L:0.900e-6:150", "C:270e-12:1000"],
    "trap5": ["C:200e-12:1000", "L:0.576e-6:150", "C:360e-12:1000", "LT:0.484e-6:62e-12:150:1000", "C:180e-12:1000"],
    "leads3": ["CT:6e-9:387e-12:100:1000", "L:1.365e-6:150", "CT:6e-9:387e-12:100:1000"],
}
FREQUENCIES_MHZ = [3.5, 7.1, 10.1, 14.2, 30.39]
ENDS_OHM = [(50.0, 50.0), (50.0, 25.0)]


def coil(w, value, q):
    return 1j * w * value * (1 - (1j / q if q else 0))


def capacitor(w, value, q):
    return (1 + (1j / q if q else 0)) / (1j * w * value)


def arm(text, w):
    """Returns (in the line?, admittance)."""
    kind, *numbers = text.split(":")
    n = [float(x) for x in numbers] + [0.0] * 4
    if kind == "C":
        return False, 1 / capacitor(w, n[0], n[1])
    if kind == "L":
        return True, 1 / coil(w, n[0], n[1])
    if kind == "LT":
        return True, 1 / coil(w, n[0], n[2]) + 1 / capacitor(w, n[1], n[3])
    return False, 1 / (coil(w, n[0], n[2]) + capacitor(w, n[1], n[3]))


def solve(matrix, right):
    n = len(right)
    rows = [row[:] + [right[i]] for i, row in enumerate(matrix)]
    for i in range(n):
        pivot = max(range(i, n), key=lambda r: abs(rows[r][i]))
        rows[i], rows[pivot] = rows[pivot], rows[i]
        for r in range(n):
            if r != i:
                factor = rows[r][i] / rows[i][i]
                rows[r] = [a - factor * b for a, b in zip(rows[r], rows[i])]
    return [rows[i][n] / rows[i][i] for i in range(n)]


def node_voltages(elements, frequency_hz, rs, rl, emf=1):
    """Returns (arms, voltage of every node) for a source of this electromotive force behind its resistance."""
    w = 2 * math.pi * frequency_hz
    arms = [arm(e, w) for e in elements]
    size = 1 + sum(1 for series, _ in arms if series)
    y = [[0j] * size for _ in range(size)]
    node = 0
    for series, admittance in arms:
        if series:
            for a, b, sign in ((node, node, 1), (node + 1, node + 1, 1), (node, node + 1, -1), (node + 1, node, -1)):
                y[a][b] += sign * admittance
            node += 1
        else:
            y[node][node] += admittance
    y[0][0] += 1 / rs
    y[size - 1][size - 1] += 1 / rl
    return arms, solve(y, [emf / rs + 0j] + [0j] * (size - 1))


def response(elements, frequency_hz, rs, rl):
    _, v = node_voltages(elements, frequency_hz, rs, rl)
    return 2 * v[-1] * cmath.sqrt(rs / rl), 2 * v[0] - 1


def main():
    here = os.path.dirname(os.path.abspath(__file__))
    target = os.path.join(here, "..", "ClubBench.Calculation.Tests", "ReferenceValues", "ladder_nodal.csv")
    with open(target, "w", newline="", encoding="utf-8") as file:
        out = csv.writer(file, lineterminator="\n")
        out.writerow(["case_id", "elements", "frequency_mhz", "source_ohm", "load_ohm", "s21_re", "s21_im", "s11_re", "s11_im",
                      "tolerance", "source_id", "locator", "note"])
        for name, elements in NETWORKS.items():
            for rs, rl in ENDS_OHM:
                for f in FREQUENCIES_MHZ:
                    s21, s11 = response(elements, f * 1e6, rs, rl)
                    out.writerow([f"{name}-{rl:g}-{f:g}", ";".join(elements), f, rs, rl, repr(s21.real), repr(s21.imag), repr(s11.real),
                                  repr(s11.imag), "1e-11", "derived", "nodal analysis", "made by Recomputed/ladder_nodal.py"])


if __name__ == "__main__":
    main()
