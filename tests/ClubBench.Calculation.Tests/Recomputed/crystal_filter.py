"""Crystal ladder filters recomputed another way: node voltages from the admittance matrix, solved by elimination.

Run from this folder: python3 crystal_filter.py > ../ReferenceValues/crystal-filter-nodal.csv
The product multiplies chain matrices; here every node between two crystals has an equation of its own. Widths are found by halving, with no grid in common.
"""
from math import acosh, cosh, log, log10, pi, sin, sinh, sqrt, tanh

SHAPES = ("equal", "butterworth", "chebyshev")


def solve(matrix, right):
    """Gaussian elimination with the largest pivot."""
    n = len(right)
    m = [row[:] + [right[i]] for i, row in enumerate(matrix)]
    for i in range(n):
        p = max(range(i, n), key=lambda r: abs(m[r][i]))
        m[i], m[p] = m[p], m[i]
        for r in range(i + 1, n):
            factor = m[r][i] / m[i][i]
            for c in range(i, n + 1):
                m[r][c] -= factor * m[i][c]
    x = [0j] * n
    for i in reversed(range(n)):
        x[i] = (m[i][n] - sum(m[i][c] * x[c] for c in range(i + 1, n))) / m[i][i]
    return x


def chebyshev(n, ripple):
    beta = -log(tanh(ripple * log(10) / 40))
    gamma = sinh(beta / (2 * n))
    a = [sin((2 * i + 1) * pi / (2 * n)) for i in range(n)]
    b = [gamma ** 2 + sin((i + 1) * pi / n) ** 2 for i in range(n)]
    g = [2 * a[0] / gamma]
    for i in range(1, n):
        g.append(4 * a[i - 1] * a[i] / (b[i - 1] * g[-1]))
    w3 = cosh(acosh(1 / sqrt(10 ** (ripple / 10) - 1)) / n)
    return [x * w3 for x in g]


def normalised(w, q, k):
    """Squared transmission of coupled resonators, w the distance from the middle over half the bandwidth."""
    n = len(k) + 1
    a = [[0j] * n for _ in range(n)]
    for i in range(n):
        a[i][i] = 1j * w + (1 / q if i in (0, n - 1) else 0)
        if i + 1 < n:
            a[i][i + 1] = a[i + 1][i] = 1j * k[i]
    last = solve(a, [1] + [0] * (n - 1))[-1]
    return (2 / q * abs(last)) ** 2


def equal_coupling(n):
    high = 3.0
    while normalised(high - 0.001, 1, [1] * (n - 1)) < 0.5:
        high -= 0.001  # from outside: the pass-band may dip below a half inside
    low = high - 0.001
    for _ in range(60):
        middle = (low + high) / 2
        low, high = (middle, high) if normalised(middle, 1, [1] * (n - 1)) > 0.5 else (low, middle)
    return 1 / low


def couplings(shape, n, ripple=0.0):
    if shape == "equal":
        k = equal_coupling(n)
        return 1 / k, [k] * (n - 1)
    g = [2 * sin((2 * i + 1) * pi / (2 * n)) for i in range(n)] if shape == "butterworth" else chebyshev(n, ripple)
    return g[0], [1 / sqrt(g[i] * g[i + 1]) for i in range(n - 1)]


def design(c):
    q, k = couplings(c["shape"], c["n"], c.get("ripple", 0))
    n, lm = c["n"], 1 / ((2 * pi * c["fs"]) ** 2 * c["cm"])
    shunt = [c["cm"] * c["fs"] / (x * c["bw"]) for x in k]
    s = [(1 / shunt[i - 1] if i else 0) + (1 / shunt[i] if i < n - 1 else 0) for i in range(n)]
    series = [0 if max(s) - x < 1e-9 * max(s) else 1 / (max(s) - x) for x in s]
    return dict(shunt=shunt, series=series, end=2 * pi * c["bw"] * lm / q, middle=c["fs"] * sqrt(1 + c["cm"] * max(s)))


def loss(f, c, d):
    w, n = 2 * pi * f, c["n"]
    y = [[0j] * (n + 1) for _ in range(n + 1)]
    for i in range(n):
        ws = 2 * pi * (c["fs"] + c.get("off", [0] * n)[i])
        lm = 1 / (ws ** 2 * c["cm"])
        z = 1 / (1 / (c["rm"] + 1j * lm * (w - ws) * (w + ws) / w) + 1j * w * c["c0"])
        if d["series"][i]:
            z += 1 / (1j * w * d["series"][i])
        for a, b, sign in ((i, i, 1), (i + 1, i + 1, 1), (i, i + 1, -1), (i + 1, i, -1)):
            y[a][b] += sign / z
    for i, shunt in enumerate(d["shunt"]):
        y[i + 1][i + 1] += 1j * w * shunt
    y[0][0] += 1 / d["end"]
    y[n][n] += 1 / d["end"]
    return -20 * log10(2 * abs(solve(y, [1 / d["end"]] + [0] * n)[n]))


def response(c, d):
    """Least loss and the widths between the outermost edges 3.01, 6 and 60 dB below it; none where a skirt takes more than 40 bandwidths."""
    step = c["bw"] / 100
    grid = [d["middle"] + i * step for i in range(-200, 201)]
    peak = min(grid, key=lambda f: loss(f, c, d))
    a, b = peak - step, peak + step
    for _ in range(80):
        left, right = a + (b - a) * 0.381966, b - (b - a) * 0.381966
        a, b = (a, right) if loss(left, c, d) < loss(right, c, d) else (left, b)
    least = loss((a + b) / 2, c, d)

    def edge(down, side):
        inside = [f for f in grid if loss(f, c, d) <= least + down]
        f = inside[0] if side < 0 else inside[-1]
        start = f
        while loss(f + side * step, c, d) <= least + down:
            f += side * step
            if abs(f - start) > 40 * c["bw"]:
                return None
        a, b = f, f + side * step
        for _ in range(60):
            m = (a + b) / 2
            a, b = (m, b) if loss(m, c, d) <= least + down else (a, m)
        return a

    def width(down):
        low, high = edge(down, -1), edge(down, 1)
        return None if low is None or high is None else high - low

    return least, [width(down) for down in (10 * log10(2), 6, 60)]


NINE = dict(fs=8.998e6, cm=17e-15, c0=4.2e-12, rm=12)
FIVE = dict(fs=4.9136e6, cm=12e-15, c0=3.5e-12, rm=25)
CASES = {
    "equal-4-500": FIVE | dict(shape="equal", n=4, bw=500),
    "chebyshev-6-2400": NINE | dict(shape="chebyshev", ripple=0.1, n=6, bw=2400),
    "chebyshev-6-3056": NINE | dict(shape="chebyshev", ripple=0.1, n=6, bw=3056),
    "butterworth-4-400": NINE | dict(shape="butterworth", n=4, bw=400),
    "equal-4-nine": NINE | dict(shape="equal", n=4, bw=500),
    "equal-4-nine-50": NINE | dict(shape="equal", n=4, bw=500, off=[0, 50, 0, 0]),
    "equal-4-nine-100": NINE | dict(shape="equal", n=4, bw=500, off=[0, 100, 0, 0]),
    "butterworth-2-1000": NINE | dict(shape="butterworth", n=2, bw=1000),
    "chebyshev-8-1200": FIVE | dict(shape="chebyshev", ripple=0.5, n=8, bw=1200, off=[5, -20, 13, 0, 40, -8, 2, -31]),
}

if __name__ == "__main__":
    print("case_id,shape,ripple_db,crystals,fs_hz,cm_ff,c0_pf,rm_ohm,width_hz,off_hz,expected_loss_db,expected_width3_hz,expected_width6_hz,expected_width60_hz,"
          "probe_hz,expected_probe_db,tolerance_db,tolerance_hz,source_id,locator,note")
    for name, c in CASES.items():
        d = design(c)
        least, (three, six, sixty) = response(c, d)
        probe = d["middle"] - 1.3 * c["bw"]
        off = " ".join(str(x) for x in c.get("off", []))
        print(f"{name},{c['shape']},{c.get('ripple', '')},{c['n']},{c['fs']:.0f},{c['cm']*1e15:g},{c['c0']*1e12:g},{c['rm']},{c['bw']},{off},{least:.7f},{three:.4f},{six:.4f},{f'{sixty:.4f}' if sixty else ''},"
              f"{probe:.4f},{loss(probe, c, d):.6f},1e-5,0.05,derived,nodal analysis,Recomputed/crystal_filter.py")
