"""Receive, audio and supply stages of demonstration kit A by a second route: node voltages and search instead of the product's formulas.

Writes ClubBench.Planning.Tests/ReferenceValues/kit_a_receive.csv. Plain Python, no packages.
Every row moves one input (a part's value or a setting) by a factor; an empty name leaves the kit as it is.
"""
import csv
import math
import os

FREQUENCY = 10.1175e6
PITCH_LOAD = 32.0


def bisect(function, low, high):
    rising = function(high) > function(low)
    for _ in range(200):
        middle = 0.5 * (low + high)
        if (function(middle) > 0) == rising:
            high = middle
        else:
            low = middle
    return 0.5 * (low + high)


def peak(function, low, high):
    """Place of the maximum, by golden section."""
    g = (math.sqrt(5) - 1) / 2
    for _ in range(200):
        a, b = high - g * (high - low), low + g * (high - low)
        if function(a) > function(b):
            high = b
        else:
            low = a
    return 0.5 * (low + high)


def tuned_to(inductance, capacitance):
    """Frequency where the reactances cancel."""
    return bisect(lambda f: 2 * math.pi * f * inductance - 1 / (2 * math.pi * f * capacitance), 1e5, 1e9)


def front_end(p):
    inductance = 4.0e-9 * p["L8.turns"] ** 2
    tank = p["C19.capacitanceF"] + p["strayF"]
    x = 2 * math.pi * FREQUENCY * inductance
    needed = bisect(lambda c: x - 1 / (2 * math.pi * FREQUENCY * c), 1e-13, 1e-8)
    step = p["L8.turns"] / p["L8.linkTurns"]
    source, load, coil = 50 * step ** 2, 3000.0, p["coilQ"] * x
    most, least = tank + p["TC3.maximumCapacitanceF"], tank + p["TC3.minimumCapacitanceF"]
    fitted = min(max(needed, least), most)
    admittance = 1 / source + 1 / load + 1 / coil + 1j * (2 * math.pi * FREQUENCY * fitted - 1 / x)
    volts = (1 / source) / admittance
    return {
        "tunes-low": tuned_to(inductance, most),
        "tunes-high": tuned_to(inductance, least),
        "needed-capacitance": needed,
        "loaded-q": (source * load / (source + load)) / x,
        "loss": 10 * math.log10((1 / (4 * source)) / (abs(volts) ** 2 / load)),
    }


def tap(p):
    x = 2 * math.pi * FREQUENCY * p["L7.inductanceH"]
    needed = bisect(lambda c: x - 1 / (2 * math.pi * FREQUENCY * c), 1e-13, 1e-8)
    current = 1 / abs(complex(100 + x / p["inductorQ"], 0))
    line = complex(50 * (1j * x) / (50 + 1j * x))
    return {
        "needed-capacitance": needed,
        "reactance": x,
        "receive-loss": 10 * math.log10((1 / 200) / (current ** 2 * 50)),
        "transmit-return-loss": -20 * math.log10(abs((line - 50) / (line + 50))),
        "diode-current": math.sqrt(1.1 * 50) * math.sqrt(2) / x,
    }


def band_pass(p):
    r1, r2, r3 = p["R21.resistanceOhm"], p["R22.resistanceOhm"], p["R23.resistanceOhm"]
    c1, c2 = p["C25.capacitanceF"], p["C26.capacitanceF"]

    def gain(f):
        s = 2j * math.pi * f
        node = (1 / r1) / (1 / r1 + 1 / r2 + s * c1 + s * c2 + s * c1 * s * c2 * r3)
        return abs(node * s * c2 * r3)

    centre = peak(gain, 100, 5000)
    half = gain(centre) / math.sqrt(2)
    low = bisect(lambda f: gain(f) - half, 10, centre)
    high = bisect(lambda f: gain(f) - half, centre, 50000)
    figures = {"centre": centre, "section-q": centre / (high - low), "section-gain": gain(centre)}
    return figures if c1 == c2 else {"centre": centre}


def keying(p):
    a, b, c = p["R29.resistanceOhm"], p["R30.resistanceOhm"], p["C33.capacitanceF"]
    charge = bisect(lambda t: 1 - (2 / 3) * math.exp(-t / ((a + b) * c)) - 2 / 3, 0, 1)
    discharge = bisect(lambda t: 1 / 3 - (2 / 3) * math.exp(-t / (b * c)), 0, 1)
    return {"sidetone": 1 / (charge + discharge)}


def output(p):
    return {
        "output-corner": bisect(lambda f: 1 / math.sqrt(1 + (1 / (2 * math.pi * f * PITCH_LOAD * p["C28.capacitanceF"])) ** 2) - math.sqrt(0.5), 0.1, 1e5),
        "mute-time": bisect(lambda t: 1 - math.exp(-t / (p["R26.resistanceOhm"] * p["C31.capacitanceF"])) - (1 - math.exp(-1)), 0, 100),
    }


def supply(p):
    volts = 12.0 - p["diodeDropV"]
    drawn = 1.1 / p["transmitterEfficiencyRelative"] / volts + p["restCurrentA"]
    return {"drawn-current": drawn, "fuse-ratio": p["F1.ratedCurrentA"] / drawn, "headroom": volts - p["U7.voltageV"]}


def detector(p):
    return {"bypass-reactance": 1 / (2 * math.pi * 10.111e6 * p["C21.capacitanceF"])}


STAGES = {
    "A6": (tap, {"L7.inductanceH": 6.8e-6, "inductorQ": 40}),
    "A7": (front_end, {"L8.turns": 28, "L8.linkTurns": 3, "C19.capacitanceF": 47e-12, "TC3.minimumCapacitanceF": 8e-12, "TC3.maximumCapacitanceF": 40e-12, "strayF": 8e-12, "coilQ": 180}),
    "A8": (detector, {"C21.capacitanceF": 10e-9}),
    "A9": (band_pass, {"R21.resistanceOhm": 62e3, "R22.resistanceOhm": 3e3, "R23.resistanceOhm": 180e3, "C25.capacitanceF": 10e-9, "C26.capacitanceF": 10e-9}),
    "A10": (output, {"C28.capacitanceF": 220e-6, "R26.resistanceOhm": 1e6, "C31.capacitanceF": 100e-9}),
    "A11": (keying, {"R29.resistanceOhm": 10e3, "R30.resistanceOhm": 100e3, "C33.capacitanceF": 10e-9}),
    "A12": (supply, {"diodeDropV": 0.35, "restCurrentA": 0.08, "transmitterEfficiencyRelative": 0.5, "F1.ratedCurrentA": 1, "U7.voltageV": 8}),
}


def rows():
    for stage, (compute, kit) in STAGES.items():
        for name in [""] + list(kit):
            if name.endswith(("turns", "linkTurns")):
                factor = (kit[name] + 1) / kit[name]  # whole turns
            else:
                factor = 1.1
            moved = {k: v * (factor if k == name else 1) for k, v in kit.items()}
            for figure, value in compute(moved).items():
                yield [stage, name, repr(factor), figure, f"{value:.9g}"]


if __name__ == "__main__":
    here = os.path.dirname(os.path.abspath(__file__))
    path = os.path.join(here, "..", "ClubBench.Planning.Tests", "ReferenceValues", "kit_a_receive.csv")
    with open(path, "w", newline="", encoding="utf-8") as file:
        writer = csv.writer(file, lineterminator="\n")
        writer.writerow(["stage", "moved", "factor", "figure", "expected"])
        writer.writerows(rows())
