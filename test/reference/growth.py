"""Reference values of linear growth, D (1 today) and f = d ln D/d ln a, to 17 digits: growth.json.

Three routes, none of them the engine's (which integrates dD = q dt/a^2, dq = (3/2) a^2 rho_s D dt by Picard's iteration):
  closed   flat, cold matter and constant w: D ~ a 2F1(-1/3w, (w-1)/2w; 1 - 5/6w; -(O_de/O_m) a^(-3w))
           (Silveira & Waga 1994, Phys. Rev. D 50, 4890; Padmanabhan 2003, Phys. Rep. 380, 235)
  integral cold matter, curvature and Lambda: D ~ E int da/(a E)^3 from 0 (Heath 1977, MNRAS 179, 351), by mpmath's quadrature
  ode      D'' + (2 + (E^2)'/2E^2) D' = (3/2) O_s D in N = ln a, by the Gauss-Legendre collocation method of 16 stages
           (Hairer, Norsett & Wanner, Solving Ordinary Differential Equations I, section II.7), at 34 digits, from a power of a
           far enough back; run twice with different steps, which must agree to 20 digits.
Neutrinos: F(y) = int x^2 sqrt(x^2 + y^2)/(e^x + 1) dx by the trapezoidal rule in ln x; rho - 3p = -(dF/d ln y) with its sign,
that is y^2 int x^2/sqrt(x^2 + y^2)/(e^x + 1) dx. Constants: CODATA 2018, IAU 2015, as the engine's definitions say.

Run: python3 growth.py > growth.json   (some three minutes; needs mpmath)
"""
import json
from functools import lru_cache

from mpmath import mp, mpf, exp, log, sqrt, pi, quad, hyp2f1, diff, matrix, lu_solve, legendre, polyroots

mp.dps = 34
D_ = lambda text: mpf(str(text))


# ---- closed form ------------------------------------------------------------------------------------------------------------
def closed(om, w, scales):
    om, w = D_(om), D_(w)
    form = lambda a: a * hyp2f1(-1 / (3 * w), (w - 1) / (2 * w), 1 - 5 / (6 * w), -(1 - om) / om * a ** (-3 * w))
    today = form(mpf(1))
    return [(a, form(D_(a)) / today, D_(a) * diff(form, D_(a)) / form(D_(a))) for a in scales]


# ---- integral ---------------------------------------------------------------------------------------------------------------
def integral(om, dark, scales):
    om, dark = D_(om), D_(dark)
    k = 1 - om - dark
    e2 = lambda a: om / a**3 + k / a**2 + dark
    # a = x^2: the integrand is then x^4 times a smooth function of x^2
    inner = lambda a: quad(lambda x: 2 * x / (x * x * sqrt(e2(x * x))) ** 3, [0, sqrt(a) / 2, sqrt(a)])

    def both(a):
        sum_ = inner(a)
        slope = (-3 * om / a**3 - 2 * k / a**2) / (2 * e2(a))  # d ln E/dN
        return sqrt(e2(a)) * sum_, slope + a / (a * sqrt(e2(a))) ** 3 / sum_

    today, _ = both(mpf(1))
    out = []
    for a in scales:
        d, f = both(D_(a))
        out.append((a, d / today, f))
    return out


# ---- neutrinos and photons --------------------------------------------------------------------------------------------------
C, G, K_B, HBAR = mpf(299792458), mpf("6.67430e-11"), mpf("1.380649e-23"), mpf("6.62607015e-34") / (2 * pi)
EV, MPC = mpf("1.602176634e-19"), mpf(149597870700) * 648000 / pi * 10**6
STEP = mpf(1) / 8
POINTS = [exp(STEP * i) for i in range(-240, 42)]
WEIGHTS = [STEP * x**3 / (exp(x) + 1) for x in POINTS]
F0 = 7 * pi**4 / 120


@lru_cache(maxsize=None)
def fermi(y):
    """F, y^2 int x^2/sqrt(x^2+y^2)/(e^x+1): the energy and its slope by ln y, over F(0)."""
    roots = [sqrt(x * x + y * y) for x in POINTS]
    return sum(w * r for w, r in zip(WEIGHTS, roots)) / F0, y * y * sum(w / r for w, r in zip(WEIGHTS, roots)) / F0


def radiation(h0, cmb, nu, masses):
    """Photons, massless neutrinos, and for each massive state (massless density, y today)."""
    h0, cmb, nu = D_(h0) * 1000 / MPC, D_(cmb), D_(nu)
    energy = pi**2 / 15 * (K_B * cmb) ** 4 / (HBAR * C) ** 3
    photons = energy / C**2 / (3 * h0**2 / (8 * pi * G))
    each = photons * mpf(7) / 8 * (mpf(4) / 11) ** (mpf(4) / 3) * nu / 3
    temperature = (mpf(4) / 11) ** (mpf(1) / 3) * (nu / 3) ** (mpf(1) / 4) * cmb
    states = [(each, D_(m) * EV / (K_B * temperature)) for m in masses]
    return photons, (3 - len(masses)) * each, states


# ---- differential equation --------------------------------------------------------------------------------------------------
STAGES = 16


def gauss_tableau():
    xs = sorted(mp.re(r) for r in polyroots(mp.taylor(lambda x: legendre(STAGES, x), 0, STAGES)[::-1], maxsteps=500, extraprec=400))
    c = [(1 + x) / 2 for x in xs]
    powers = matrix(STAGES, STAGES)
    for q in range(STAGES):
        for j in range(STAGES):
            powers[q, j] = c[j] ** q
    rows = [lu_solve(powers, matrix([ci ** (q + 1) / (q + 1) for q in range(STAGES)])) for ci in c]
    b = lu_solve(powers, matrix([mpf(1) / (q + 1) for q in range(STAGES)]))
    return c, rows, b


with mp.workdps(60):
    NODES, ROWS, B = gauss_tableau()


def ode(case, scales, parts=1):
    """case: om, curvature, h0, radiation (photons, massless, states), dark(N) -> (ln f, w), start N, power of the leading term."""
    photons, massless, states = case["radiation"]
    om, k = D_(case["om"]), D_(case["curvature"])
    cold = om - sum(m * fermi(y)[0] for m, y in states)
    dark = 1 - om - k - photons - massless

    def background(N):
        x = exp(-N)
        value = (photons + massless) * x**4 + cold * x**3 + k * x**2
        first = -4 * (photons + massless) * x**4 - 3 * cold * x**3 - 2 * k * x**2
        source = cold * x**3
        for m, y in states:
            energy, slope = fermi(y / x)
            value += m * energy * x**4
            first += m * (slope - 4 * energy) * x**4
            source += m * slope * x**4
        if dark != 0:
            ln, w = case["dark"](N)
            value += dark * exp(ln)
            first -= 3 * (1 + w) * dark * exp(ln)
        return 2 + first / (2 * value), mpf(3) / 2 * source / value

    N = mpf(case["start"])
    p, q = background(N)
    n = D_(case["power"])  # of E^2 early on; f' + (2 - n/2) f = q, q ~ a^(n-3)
    f = q / ((n - 3) + 2 - n / 2) if n > 3 else (-p + sqrt(p * p + 4 * q)) / 2
    D, V = mpf(1), f
    stops = sorted({log(D_(a)) for a in scales} | {mpf(0)})
    found = {}
    for stop in stops:
        steps = int(mp.ceil((stop - N) * 2 * parts))
        h = (stop - N) / max(1, steps)
        for i in range(steps):
            D, V = gauss_step(background, N + i * h, h, D, V)
        N = stop
        found[stop] = (D, V)
    today = found[mpf(0)][0]
    return [(a, found[log(D_(a))][0] / today, found[log(D_(a))][1] / found[log(D_(a))][0]) for a in scales]


def gauss_step(background, N, h, D, V):
    """Unknown: D'' at the stages; D' and D there by the tableau once and twice."""
    pq = [background(N + c * h) for c in NODES]
    A = matrix(STAGES, STAGES)
    for i in range(STAGES):
        for j in range(STAGES):
            A[i, j] = ROWS[i][j]
    A2 = A * A
    system, right = matrix(STAGES, STAGES), matrix(STAGES, 1)
    for i, (p, q) in enumerate(pq):
        for j in range(STAGES):
            system[i, j] = (1 if i == j else 0) + h * p * A[i, j] - h * h * q * A2[i, j]
        right[i] = -p * V + q * (D + h * NODES[i] * V)
    W = lu_solve(system, right)
    slopes = [V + h * sum(A[i, j] * W[j] for j in range(STAGES)) for i in range(STAGES)]
    return D + h * sum(B[j] * slopes[j] for j in range(STAGES)), V + h * sum(B[j] * W[j] for j in range(STAGES))


def linear_in_scale(w0, wa, hold=False):
    w0, wa = D_(w0), D_(wa)

    def dark(N):
        if hold and N > 0:
            return -3 * (1 + w0) * N, w0
        a = exp(N)
        return -3 * (1 + w0 + wa) * N - 3 * wa * (1 - a), w0 + wa * (1 - a)

    return dark


NONE = (mpf(0), mpf(0), [])
PAST = [1e-3, 0.05, 0.5, 1]
CLOSED = [(0.3, w) for w in (-1, -0.8, -1.2, -0.5, -0.035)]
INTEGRAL = [
    ("matter:0.3,dark:0.2,cmb:0", 0.3, 0.2, [0.01, 0.5, 1, 3, 100]),
    ("matter:0.3,dark:1.3,cmb:0", 0.3, 1.3, [0.01, 0.5, 1, 3, 100]),
    ("matter:0.3,dark:-0.1,cmb:0", 0.3, -0.1, [0.01, 0.5, 1, 2, 2.9]),
    ("matter:3,dark:0,cmb:0", 3, 0, [0.01, 0.5, 1, 1.4, 1.499]),
]
ODE = [
    ("h0:67.66,matter:0.3111", dict(om=0.3111, h0=67.66, masses=[0.06], law=(-1, 0)), PAST + [1e-6, 2, 20]),
    ("h0:70,matter:0.3,masses:0.5_0.5_0.5", dict(om=0.3, h0=70, masses=[0.5] * 3, law=(-1, 0)), PAST + [1e-5]),
    ("h0:70,matter:0.3,curvature:0.1,masses:0.1_10", dict(om=0.3, h0=70, masses=[0.1, 10], law=(-1, 0), curvature=0.1), PAST),
    ("h0:70,matter:0.3,masses:0,eos:cpl,w0:-0.9,wa:0.85", dict(om=0.3, h0=70, masses=[], law=(-0.9, 0.85)), PAST + [1e-5, 3]),
    ("h0:70,matter:0.3,eos:cpl,w0:-0.8,wa:-0.9", dict(om=0.3, h0=70, masses=[0.06], law=(-0.8, -0.9)), PAST + [3]),
    ("h0:70,matter:0.3,eos:cpl,w0:-0.8,wa:0.6,beyond:hold", dict(om=0.3, h0=70, masses=[0.06], law=(-0.8, 0.6, True)), PAST + [3, 30]),
    ("h0:70,matter:0.3,cmb:0,eos:constant,w:0.2", dict(om=0.3, h0=70, law=(0.2, 0), start=-90, power="3.6"), PAST),
]


def write(value):
    return mp.nstr(value, 17, min_fixed=0, max_fixed=0)


def rows(values):
    return [[float(a), write(d), write(f)] for a, d, f in values]


def main():
    out = []
    for om, w in CLOSED:
        law = "" if w == -1 else f",eos:constant,w:{w}"
        out.append({"code": f"matter:{om},cmb:0{law}", "route": "closed", "rows": rows(closed(om, w, PAST + [2, 10]))})
    for code, om, dark, scales in INTEGRAL:
        out.append({"code": code, "route": "integral", "rows": rows(integral(om, dark, scales))})
    for code, case, scales in ODE:
        rad = radiation(case["h0"], "2.7255", "3.044", case["masses"]) if "masses" in case else NONE
        full = {"curvature": 0, "start": -45, "power": 4, **case, "radiation": rad, "dark": linear_in_scale(*case["law"])}
        coarse, fine = ode(full, scales, 1), ode(full, scales, 2)
        for (_, d1, f1), (_, d2, f2) in zip(coarse, fine):
            assert abs(d1 / d2 - 1) < mpf(10) ** -20 and abs(f1 / f2 - 1) < mpf(10) ** -20, (code, d1 / d2 - 1, f1 / f2 - 1)
        out.append({"code": code, "route": "ode", "rows": rows(fine)})
    note = "rows: a, D, f; made by growth.py, which says how"
    print(json.dumps({"note": note, "cases": out}, indent=1))


if __name__ == "__main__":
    main()
