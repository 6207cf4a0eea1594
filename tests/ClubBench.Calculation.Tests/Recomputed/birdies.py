"""Birdies found another way: every product is followed across the band and halved where it meets the intermediate frequency; no linear equation is solved.

Run from this folder: python3 birdies.py > ../ReferenceValues/birdies-followed.csv
"""
from random import Random

SIDES = {"HighSide": lambda f, i: f + i, "LowSide": lambda f, i: f - i, "SumToIntermediate": lambda f, i: i - f}


def crossing(product, low, high):
    """Where a monotonous product is zero, or None where it keeps its sign (or is zero throughout: the wanted response)."""
    a, b = product(low), product(high)
    if abs(a) < 1e-6 and abs(b) < 1e-6 or (a < 0) == (b < 0):
        return None
    for _ in range(80):
        middle = (low + high) / 2
        low, high = (middle, high) if (product(middle) < 0) == (a < 0) else (low, middle)
    return (low + high) / 2


def birdies(side, mid, low, high, order=7):
    found = set()
    for m in range(order + 1):
        for n in range(-(order - m), order - m + 1):
            for target in (mid, -mid):
                f = crossing(lambda x: m * SIDES[side](x, mid) + n * x - target, low, high)
                if f:
                    found.add((round(f), m, abs(n)))
    return sorted(found)


if __name__ == "__main__":
    random = Random(20)
    print("case_id,side,if_mhz,low_mhz,high_mhz,expected,tolerance_hz,source_id,locator,note")
    for i in range(40):
        side = random.choice(sorted(SIDES))
        low = round(random.uniform(1.8, 28.5), 4)
        mid = round(random.uniform(low + 0.7, 40) if side == "SumToIntermediate" else random.uniform(0.455, low - 0.1 if side == "LowSide" else 11), 4)
        high = round(low + random.uniform(0.02, 0.5), 4)
        rows = birdies(side, mid * 1e6, low * 1e6, high * 1e6)
        print(f"followed-{i},{side},{mid},{low},{high},{' '.join(f'{f}:{m}:{n}' for f, m, n in rows)},1,derived,products followed across the band,Recomputed/birdies.py")
