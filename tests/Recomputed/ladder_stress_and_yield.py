"""Stress, yield, input impedance and slopes of the five-element Chebyshev filter (20 dB return loss, edge 8.0 MHz, 50 ohm) by nodal
analysis, a second route beside the chain matrix of the product; two resistive pads. Prints what the tests expect. Run: python3 ladder_stress_and_yield.py"""
import cmath
import math
import random

from ladder_nodal import node_voltages, solve

C, L, MIDDLE = 387.23e-12, 1.36503e-6, 717.46e-12


def filter_arms(factors=(1, 1, 1, 1, 1), coil_q=150, capacitor_q=1000):
    values = [v * x for v, x in zip((C, L, MIDDLE, L, C), factors)]
    return [f"{'L' if k % 2 else 'C'}:{v}:{coil_q if k % 2 else capacitor_q}" for k, v in enumerate(values)]


def stress(load_ohm, coil_q=150, capacitor_q=1000):
    """Peak volt and ampere of every arm and the watts delivered, 5 W available at 7.1 MHz."""
    arms, v = node_voltages(filter_arms(coil_q=coil_q, capacitor_q=capacitor_q), 7.1e6, 50, load_ohm, math.sqrt(8 * 50 * 5))
    node, told = 0, []
    for series, admittance in arms:
        across = v[node] - v[node + 1] if series else v[node]
        node += 1 if series else 0
        told.append((round(abs(across), 3), round(abs(across * admittance), 4)))
    return told, round(abs(v[-1]) ** 2 / 2 / load_ohm, 4)


def decibels(elements, frequency_hz):
    """Loss and return loss between 50 ohm ends."""
    _, v = node_voltages(elements, frequency_hz, 50, 50, 1)
    return -20 * math.log10(abs(2 * v[-1])), -20 * math.log10(abs(2 * v[0] - 1))


def good(elements):
    if min(decibels(elements, f)[0] for f in (14.0e6, 14.6e6)) < 23 or min(decibels(elements, f)[0] for f in (21.0e6, 21.9e6)) < 43:
        return False
    return min(decibels(elements, (7.0 + 0.3 * k / 16) * 1e6)[1] for k in range(17)) >= 17


def share_good(coil, capacitor, boards=4000):
    draw = random.Random(1)
    return sum(good(filter_arms([1 + draw.uniform(-1, 1) * (coil if k % 2 else capacitor) for k in range(5)])) for _ in range(boards)) / boards


def lossless(elements, frequency_hz, source_ohm, load_ohm):
    """Loss, return loss and the voltage at the load for one volt, lossless parts."""
    _, v = node_voltages(elements, frequency_hz, source_ohm, load_ohm, 1)
    passed = abs(2 * v[-1]) * math.sqrt(source_ohm / load_ohm)
    return -20 * math.log10(passed), -20 * math.log10(abs(2 * v[0] - 1)), v[-1]


def input_impedance(load_ohm):
    _, v = node_voltages(filter_arms(coil_q=0, capacitor_q=0), 7.1e6, 50, load_ohm, 1)
    return v[0] / ((1 - v[0]) / 50)


def reflection(frequency_hz):
    _, v = node_voltages(filter_arms(coil_q=0, capacitor_q=0), frequency_hz, 50, 50, 1)
    return 2 * v[0] - 1


def with_leads(lead_henry=6e-9):
    """The lossless filter with an inductance in every capacitor to ground."""
    return [f"L:{L}" if k % 2 else f"CT:{lead_henry}:{MIDDLE if k == 2 else C}" for k in range(5)]


def group_delay(frequency_hz, step=1e-5):
    ratio = (lossless(filter_arms(coil_q=0, capacitor_q=0), frequency_hz * (1 + step), 50, 50)[2]
             / lossless(filter_arms(coil_q=0, capacitor_q=0), frequency_hz * (1 - step), 50, 50)[2])
    return -cmath.phase(ratio) / (2 * math.pi * frequency_hz * 2 * step)


def gain_slopes(frequency_hz, step=1e-5):
    """dB for one per cent more of the first three parts."""
    def gain(k, factor):
        return -lossless(filter_arms([factor if i == k else 1 for i in range(5)], 0, 0), frequency_hz, 50, 50)[0]
    return [round((gain(k, 1 + step) - gain(k, 1 - step)) / (2 * step) / 100, 5) for k in range(3)]


def pad(outer, inner):
    y = [[1 / 50 + 1 / outer + 1 / inner, -1 / inner], [-1 / inner, 1 / 50 + 1 / outer + 1 / inner]]
    v = solve(y, [1 / 50, 0])
    return -20 * math.log10(2 * v[1]), -20 * math.log10(abs(2 * v[0] - 1))


if __name__ == "__main__":
    print("50 ohm", *stress(50))
    print("25 ohm", *stress(25))
    print("50 ohm, lossless", *stress(50, 0, 0))
    for tolerances in ((0.05, 0.05), (0.10, 0.05), (0.05, 0.02), (0.03, 0.02)):
        print("coils and capacitors", tolerances, share_good(*tolerances))
    print("input impedance", *(complex(round(z.real, 3), round(z.imag, 3)) for z in map(input_impedance, (25, 50 + 20j, 50))))
    print("reflection", *(complex(round(r.real, 5), round(r.imag, 5)) for r in (reflection(f * 1e6) for f in (3.5, 7.1, 8.0, 14.2))))
    print("leads of 6 nH", *(round(lossless(with_leads(), f * 1e6, 50, 50)[0], 3) for f in (14.2, 21.3, 28.4, 150)))
    for source, load in ((50, 25), (50, 100), (12.5, 50)):
        print("ends", source, load, *(round(x, 4) for x in lossless(filter_arms(coil_q=0, capacitor_q=0), 7.1e6, source, load)[:2]))
    print("group delay, ns", *(round(1e9 * group_delay(f), 3) for f in (1.0e6, 7.1e6, 8.0e6)))
    print("slopes of the gain", *map(gain_slopes, (7.3e6, 8.0e6, 14.2e6)))
    print("pads", *(tuple(round(x, 3) for x in pad(*p)) for p in ((300, 18), (62, 240))))
