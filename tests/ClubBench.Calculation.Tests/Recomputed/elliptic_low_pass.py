"""Elliptic low-pass recomputed another way: theta functions for sn and cd, Durand-Kerner roots for the natural modes.

Run from this folder: python3 elliptic_low_pass.py > ../ReferenceValues/elliptic-recomputed.csv
The product computes sn and cd by the Landen transformation and its modes in closed form; nothing of that is used here.
"""
import cmath
import random
from math import asin, cos, log10, pi, sin, sqrt


def agm(a, b):
    for _ in range(12):
        a, b = (a + b) / 2, sqrt(a * b)
    return a


def quarter(k_complement):
    return pi / (2 * agm(1.0, k_complement))


def cd(share, k):
    """cd(share K, k) by Jacobi's theta functions."""
    kc = sqrt(1 - k * k)
    q = cmath.exp(-pi * quarter(k) / quarter(kc)).real
    z = share * pi / 2
    theta2 = lambda x: 2 * sum(q ** ((n + 0.5) ** 2) * cos((2 * n + 1) * x) for n in range(40))
    theta3 = lambda x: 1 + 2 * sum(q ** (n * n) * cos(2 * n * x) for n in range(1, 40))
    return theta3(0) / theta2(0) * theta2(z) / theta3(z)


def product(a, b):
    out = [0.0] * (len(a) + len(b) - 1)
    for i, x in enumerate(a):
        for j, y in enumerate(b):
            out[i + j] += x * y
    return out


def roots(coefficients):
    c = [x / coefficients[-1] for x in coefficients]
    n = len(c) - 1
    z = [(1.1 * cmath.exp(1j * (2 * pi * i / n + 0.4))) for i in range(n)]
    for _ in range(300):
        moved = 0.0
        for i in range(n):
            value = 0
            for x in reversed(c):
                value = value * z[i] + x
            for j in range(n):
                if j != i:
                    value /= z[i] - z[j]
            z[i] -= value
            moved = max(moved, abs(value))
        if moved < 1e-14:
            break
    return z


def filter_of(n, rho, degrees):
    k = sin(degrees * pi / 180)
    zeros = [cd((2 * i - 1) / n, k) for i in range(1, n // 2 + 1)]
    notches = [1 / (k * w) for w in zeros]
    f, p = [0.0, 1.0], [1.0]                       # in x = s^2 where even
    for w in zeros:
        f = product(f, [w * w, 0.0, 1.0])
    for w in notches:
        p = product(p, [w * w, 0.0, 1.0])
    at = lambda poly, s: sum(c * s ** i for i, c in enumerate(poly))
    eps = rho / sqrt(1 - rho * rho)
    scale = eps * abs(at(p, 1j)) / abs(at(f, 1j))   # ripple reached at the edge
    edge = 1j / k
    loss = 10 * log10(1 + (scale * abs(at(f, edge)) / abs(at(p, edge))) ** 2)
    # |E|^2 = |F|^2 + |P|^2/scale^2 on the axis; in s: F(s)F(-s) + P(s)P(-s)/scale^2.
    mirrored = [c * (-1) ** i for i, c in enumerate(f)]
    ff, pp = product(f, mirrored), product(p, p)
    balance = [x + (pp[i] / scale ** 2 if i < len(pp) else 0.0) for i, x in enumerate(ff)]
    left = [-cmath.sqrt(x) for x in roots(balance[::2])]    # only even powers are left
    upper = sorted((s for s in left if s.imag > 1e-6), key=lambda s: -s.real)
    real = min(left, key=lambda s: abs(s.imag)).real
    return notches, zeros, upper, real, loss


def row(case, n, rho, degrees):
    notches, zeros, upper, real, loss = filter_of(n, rho, degrees)
    text = lambda values: ";".join(f"{v:.12g}" for v in values)
    modes = [x for s in upper for x in (s.real, s.imag)] + [real]
    return f"{case},{n},{rho:.6f},{degrees:.5f},{text(notches)},{text(zeros)},{text(modes)},{loss:.9f},1e-7,1e-6,derived,theta functions and root finding,made by Recomputed/elliptic_low_pass.py"


if __name__ == "__main__":
    draw = random.Random(7)
    print("case_id,order,reflection,angle_degrees,notches,zeros,modes,stop_loss_db,relative_tolerance,loss_tolerance,source_id,locator,note")
    for number in range(210):
        print(row(f"random {number + 1}", draw.choice((3, 5, 7)), round(draw.uniform(0.02, 0.5), 6), round(draw.uniform(5, 75), 5)))
