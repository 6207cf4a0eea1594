"""Best filters out of single parts or pairs by trying every combination with nodal analysis, a second route beside the search of the product.
Prints combinations, smallest margin in dB, picofarads and turns. Run: python3 low_pass_search.py"""
import itertools
import math

from ladder_nodal import response

E12 = [10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82]
E24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91]
FIVE = ([387.23, 717.46, 387.23], [1365.03, 1365.03], 4.0, (7.0, 7.3), 20, {2: 24, 3: 44})
SEVEN = ([163.66, 359.00, 359.00, 163.66], [714.87, 838.45, 714.87], 3.0, (14.0, 14.35), 24, {2: 40, 3: 60})


def turns_around(nanohenry, index):
    below = math.floor(math.sqrt(nanohenry / index))
    return range(max(1, below - 2), below + 3) if below < 10 else (below, below + 1)


def near(values, exact, window):
    return [v for v in values if abs(v / exact - 1) <= window]


def margin(picofarads, turns, index, band, return_loss, harmonics, enough=-math.inf):
    """Smallest margin; no further looked at once it is below enough."""
    parts = [f"C:{picofarads[0] * 1e-12}"]
    for n, pf in zip(turns, picofarads[1:]):
        parts += [f"L:{index * n * n * 1e-9}", f"C:{pf * 1e-12}"]
    smallest = math.inf
    for k, wanted in harmonics.items():
        for edge in band:
            smallest = min(smallest, -20 * math.log10(abs(response(parts, k * edge * 1e6, 50, 50)[0])) - wanted)
    for i in range(17):
        if smallest < enough:
            return smallest
        f = band[0] + (band[1] - band[0]) * i / 16
        smallest = min(smallest, -20 * math.log10(abs(response(parts, f * 1e6, 50, 50)[1])) - return_loss)
    return smallest


def best(design, series, window, pairs=False):
    exact, coils, index, band, return_loss, harmonics = design
    singles = [m * d for d in (0.1, 1, 10, 100) for m in series]
    values = sorted({round(a + b, 6) for a in [0, *singles] for b in singles}) if pairs else singles
    places = [near(values, pf, window) for pf in exact] + [turns_around(nh, index) for nh in coils]
    tried, most, found = 0, -math.inf, None
    for parts in itertools.product(*places):
        tried += 1
        smallest = margin(parts[:len(exact)], parts[len(exact):], index, band, return_loss, harmonics, most)
        if smallest > most:
            most, found = smallest, parts
    return tried, round(most, 4), found


if __name__ == "__main__":
    print(*best(FIVE, E12, 0.12, pairs=True))
    print(*best(FIVE, E12, 0.15))
    print(*best(SEVEN, E12, 0.15))
    print(*best(SEVEN, E24, 0.12))
