"""Makes again, with the standard library only and by other methods than the product, the values in ReferenceValues/
whose note names this file. Run: python3 resonators_and_windings.py"""
import cmath
import math
import statistics

MU0, RHO = 4e-7 * math.pi, 1.7241e-8


def trimmer_yield(l, tl, cf, tc, a, b, s1, s2, f1, f2, n=400):
    """Double integral: over L and Cfix on a grid of midpoints, over the stray in closed form."""
    total = 0.0
    for i in range(n):
        li = l * (1 - tl + 2 * tl * (i + 0.5) / n)
        need = [1 / ((2 * math.pi * f) ** 2 * li) for f in (f2, f1)]
        for j in range(n):
            c = cf * (1 - tc + 2 * tc * (j + 0.5) / n)
            low, high = need[1] - c - b, need[0] - c - a
            total += max(0.0, min(high, s2) - max(low, s1)) / (s2 - s1)
    return total / n / n


def skin_factor(d, f):
    """Exact: Re[ka J0(ka)/(2 J1(ka))] for a round wire, Bessel functions by their power series."""
    k = cmath.sqrt(-1j * 2 * math.pi * f * MU0 / RHO)
    z = k * d / 2

    def series(order):
        term = (z / 2) ** order / math.factorial(order)
        total, m = term, 0
        while abs(term) > 1e-25 * abs(total) or m < 5:
            m += 1
            term *= -(z / 2) ** 2 / (m * (m + order))
            total += term
        return total

    return (z * series(0) / (2 * series(1))).real


def divider(f, c1, c2, r):
    w = 2 * math.pi * f
    y = 1 / (1 / (1 / r + 1j * w * c2) + 1 / (1j * w * c1))
    return 1 / y.real, y.imag / w


def placed_circles(hole, d, gap):
    """Puts circles of diameter d one after the other against the wall until the gap would be entered."""
    r, angle, count = (hole - d) / 2, 0.0, 0
    step = math.acos(1 - d * d / (2 * r * r))
    while angle + step <= math.radians(360 - gap) + 1e-12:
        angle += step
        count += 1
    return count


def elliptic(k2):
    a, b, c, s, w = 1.0, math.sqrt(1 - k2), math.sqrt(k2), 0.0, 0.5
    while abs(c) > 1e-16:
        s += w * c * c
        a, b, c, w = (a + b) / 2, math.sqrt(a * b), (a - b) / 2, 2 * w
    k = math.pi / (2 * a)
    return k, k * (1 - s)


def loops(diameter, n, pitch, wire):
    """Sum over coaxial loops: Maxwell's mutual inductance, each loop's own with uniform current in the wire."""
    r = diameter / 2

    def mutual(x):
        k2 = 4 * r * r / (4 * r * r + x * x)
        big_k, big_e = elliptic(k2)
        k = math.sqrt(k2)
        return MU0 * r * ((2 / k - k) * big_k - 2 / k * big_e)

    own = MU0 * r * (math.log(16 * r / wire) - 1.75)
    return n * own + 2 * sum((n - m) * mutual(m * pitch) for m in range(1, n))


def copper_only_q(turns, index, outer, inner, height, overall, bare, f):
    """w L over the resistance of the straight wire, exact skin effect."""
    wire = turns * (outer - inner + 2 * height + math.pi * overall)
    return 2 * math.pi * f * index * turns ** 2 / (RHO * wire / (math.pi * bare ** 2 / 4) * skin_factor(bare, f))


def batch(boards, t, systematic=0.01):
    """Index from the boards left: mean, deviation, standard and expanded uncertainty in nH per turn squared."""
    indices = [uh * 1e3 / n ** 2 for uh, n in boards]
    mean, deviation = statistics.mean(indices), statistics.stdev(indices)
    u = math.hypot(deviation / math.sqrt(len(indices)), systematic * mean)
    return mean, deviation, u, t * u


def ferrite(turns, index, f, mu, loss, mu_initial, parallel=0.0):
    w = 2 * math.pi * f
    z = 1j * w * turns ** 2 * index * (mu - 1j * loss) / mu_initial
    return 1 / (1 / z + 1j * w * parallel)


def judgement(z, r):
    """Ratio, insertion and dissipation in dB of an impedance across a line matched at both ends, by the voltages at its load."""
    open_v, loaded = 0.5, (z * r / (z + r)) / (r + z * r / (z + r))
    reached = abs(loaded / open_v) ** 2
    taken = (abs(loaded) ** 2 * (1 / z).real) / (abs(loaded) ** 2 / r)
    return abs(z) / r, -10 * math.log10(reached), 10 * math.log10(1 + taken)


p = 1e-12
print("yields", *(round(trimmer_yield(*c), 4) for c in (
    (5.2e-6, .05, 56 * p, .05, 8 * p, 40 * p, 3 * p, 8 * p, 7.0e6, 7.2e6),
    (1.4e-6, .05, 68 * p, .02, 5 * p, 20 * p, 3 * p, 7 * p, 14.0e6, 14.35e6),
    (1.4e-6, .05, 68 * p, .02, 5 * p, 30 * p, 3 * p, 7 * p, 14.0e6, 14.35e6))))
print("skin factors", *(round(skin_factor(d * 1e-3, f * 1e6), 3) for d, f in ((.5, 1), (.5, 7.1), (.25, 1.8), (.8, 28))))
print("dividers", *(tuple(round(v, 4) for v in (rp, cp / p)) for rp, cp in (
    divider(7.1e6, 120 * p, 680 * p, 50), divider(14.2e6, 56 * p, 330 * p, 50), divider(7.1e6, 111.08 * p, 775.58 * p, 50))))
print("capacities", *(placed_circles(*c) for c in (
    (7.7, .566, 30), (7.7, .459, 30), (5.21, .367, 30), (9.4, .566, 30), (3.05, .297, 30), (7.7, .566, 0))))
print("loops", *(round(loops(*c) * 1e6, 4) for c in ((.01, 10, .001, .0008), (.008, 7, .0015, .00063), (.02, 15, .0012, .001))))
print("copper only Q", round(copper_only_q(33, 4.9e-9, 12.7e-3, 7.70e-3, 4.83e-3, .566e-3, .5e-3, 7.1e6), 1))
print("batch", *(round(v, 4) for v in batch([(5.30, 33), (5.45, 33), (5.38, 33), (5.02, 32), (5.52, 33), (5.41, 33)], 2.5706)))
for name, case in (
        ("choke 3.5 MHz", (10, 350e-9, 3.5e6, 500, 250, 800, 3 * p)), ("choke 7 MHz", (10, 350e-9, 7e6, 340, 270, 800, 3 * p)),
        ("choke 10 MHz", (10, 350e-9, 10e6, 265, 245, 800, 3 * p)), ("choke 14 MHz", (10, 350e-9, 14e6, 203, 203, 800, 3 * p)),
        ("choke 1 MHz", (10, 350e-9, 1e6, 711, 59, 800))):
    print(name, complex(round(ferrite(*case).real, 1), round(ferrite(*case).imag, 1)))
for name, case, r in (
        ("10 t FT37-43", (10, 350e-9, 1e6, 711, 59, 800), 50), ("5 t FT37-43", (5, 350e-9, 7e6, 340, 270, 800), 50),
        ("10 t FT37-61", (10, 55.3e-9, 5e6, 125, 1, 125), 50), ("8 t FT50-43", (8, 440e-9, 3.5e6, 500, 250, 800), 200)):
    z = ferrite(*case)
    print(name, complex(round(z.real, 2), round(z.imag, 2)), *(round(v, 3) for v in judgement(z, r)))
