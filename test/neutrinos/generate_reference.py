"""Writes reference.json: R, s = d ln R/d ln y and ds/d ln y of the energy integral of a massive neutrino, to 25 digits.

    python3 test/neutrinos/generate_reference.py

The definition itself, by mpmath's tanh-sinh quadrature at 50 digits on pieces that end where the integrand changes
character; nothing is shared with the polynomials under test. With e^2 = x^2 + y^2 and f = x^2/(exp(x) + 1):
    F = int f e,   dF/d ln y = int f y^2/e,   d2F/(d ln y)^2 = int f (2 y^2/e - y^4/e^3),
    F(0) = 7 pi^4/120,   s = F'/F,   ds/d ln y = F''/F - s^2.
For large y, ds/d ln y is a small difference: the 50 digits leave 25 up to y = 1e9.
Checked here: F(0) by quadrature; another partition of the range; both derivatives by numerical differentiation of ln F.
"""
import json
import re
from pathlib import Path
from mpmath import mp, mpf, diff, exp, log, nstr, pi, quad, sqrt

mp.dps = 50
MASSLESS = 7 * pi**4 / 120


def pieces(y, factor):
    inner = [y * factor * k for k in (mpf(1) / 4, 1, 4, 16, 64, 256)]
    outer = [mpf(k) for k in (1, 4, 10, 20, 40, 80)]
    return [mpf(0)] + sorted({p for p in inner + outer if p < 80} | {mpf(80)}) + [mpf(160)]


def integral(weight, y, factor=1):
    return quad(lambda x: x * x / (exp(x) + 1) * weight(x), pieces(y, factor))


def energy(y, factor=1):
    return integral(lambda x: sqrt(x * x + y * y), y, factor)


def values(y):
    total = energy(y)
    first = integral(lambda x: y**2 / sqrt(x * x + y * y), y)
    second = integral(lambda x: y**2 * (2 * x * x + y * y) / sqrt(x * x + y * y) ** 3, y)
    slope = first / total
    return total / MASSLESS, slope, second / total - slope**2


def check():
    assert abs(integral(lambda x: x, mpf(1)) / MASSLESS - 1) < mpf(10) ** -40
    for y in map(mpf, ("0.003", "0.9", "7", "300")):
        ratio, slope, derivative = values(y)
        assert abs(energy(y, mpf("1.7")) / MASSLESS / ratio - 1) < mpf(10) ** -30
        assert abs(diff(lambda u: log(energy(exp(u))), log(y), h=mpf(10) ** -10) / slope - 1) < mpf(10) ** -8
        assert abs(diff(lambda u: log(energy(exp(u))), log(y), 2, h=mpf(10) ** -10) / derivative - 1) < mpf(10) ** -8


# Joins of the panels of table.ts: e = 4/(y + 4) a multiple of 1/20.
JOINS = [4 * (20 / i - 1) for i in range(1, 17)]
SPREAD = [10 ** (k / 2) for k in range(-12, 13)]
# The join with the form for small y at 3/4 and the start of that form at 1e-9, with neighbours, and values in between.
BESIDE = [0.75 - 2**-53, 0.75, 0.75 + 2**-53, 1e-9, 9.9e-10, 0.5, 0.02, 0.25, 2.4, 5.5, 13.7, 29, 50, 357.1, 3571, 0.1234, 1e-10, 1e9]


# Changes R(y e^d)/R(y) - 1: steps on either side of the lengths at which the rule for it changes, short ones and long ones.
STARTS = [1e-6, 1e-3, 0.3, 0.74, 1.0, 5.0, 76.0, 1e4]
STEPS = [1e-12, -3e-5, 0.05, -0.0501, 0.4, -1.0, 1.0, 1.001, -5.0]


def text(value):
    return nstr(value, 25, strip_zeros=False)


def value_row(y):
    ratio, slope, derivative = values(mpf(y))
    return {"y": y, "ratio": text(ratio), "slope": text(slope), "slopeDerivative": text(derivative)}


def change_row(y, d):
    change = energy(mpf(y) * exp(mpf(d))) / energy(mpf(y)) - 1
    return {"y": y, "d": d, "change": text(change)}


def main():
    check()
    content = {
        "values": [value_row(y) for y in sorted(set(JOINS + SPREAD + BESIDE))],
        "changes": [change_row(y, d) for y in STARTS for d in STEPS],
    }
    # The formatter writes 1e-6 where Python writes 1e-06.
    written = re.sub(r"(e-)0", r"\1", json.dumps(content, indent=2)) + "\n"
    Path(__file__).with_name("reference.json").write_text(written)


main()
