"""Times and distances of universes with a barotropic law, to 25 digits, into barotropic.json beside this file.

E^2 = Om a^-3 + (1 - Om) f + ..., f = u^(1/(1 - alpha)), u = 1 + 3 A (1 - alpha) ln a (alpha = 1: a^(3A)), no radiation, flat;
where u < 0: f = 0 for 0 < alpha < 1, u itself for alpha = 0. Parameters at their exact double values.
Route: tanh-sinh quadrature of dt = dN/E and dx = exp(-N) dN/E in N = ln a (mpmath.quad, 40 digits), cut at the edge u = 0,
with N - edge = s^6 next to it; turning points by bisection. Run: python3 barotropic.py
"""
import json, os
from mpmath import mp, mpf, quad, exp, sqrt, findroot, log, inf

mp.dps = 40
H = mpf(1) / 2

def model(Om, A, alpha):
    Om, A, alpha = mpf(Om), mpf(A), mpf(alpha)
    rate = 3 * A * (1 - alpha)
    edge = -1 / rate if rate else None
    def f(N, u=None):
        if alpha == 1: return exp(3 * A * N)
        if u is None: u = 1 + rate * N
        if alpha == 0: return u
        if u <= 0: return mpf(0)
        return u ** (1 / (1 - alpha))
    def E2(N, u=None): return Om * exp(-3 * N) + (1 - Om) * f(N, u)
    return E2, edge, rate, alpha

def integral(E2, lo, hi, edge, rate, weight):
    """between lo and hi, one of which may be infinite; an edge inside or at an end is approached in s, N - edge = +-s^6"""
    g = lambda N, u=None: exp(-weight * N) / sqrt(E2(N, u))
    if edge is None or not lo <= edge <= hi: return pieces(g, lo, hi)
    total = mpf(0)
    if lo < edge:
        near = max(lo, edge - 1)
        total += quad(lambda s: g(edge - s**6, -rate * s**6) * 6 * s**5, [0, (edge - near) ** (mpf(1) / 6)])
        if lo < near: total += pieces(g, lo, near)
    if hi > edge:
        near = min(hi, edge + 1)
        total += quad(lambda s: g(edge + s**6, rate * s**6) * 6 * s**5, [0, (near - edge) ** (mpf(1) / 6)])
        if hi > near: total += pieces(g, near, hi)
    return total

def pieces(g, lo, hi):
    points = [lo]
    if lo == -inf: points = [-inf, -40, -20, -10, -5, -2.5]; points = [p for p in points if p < hi]
    elif hi == inf:
        step = mpf(1); x = lo
        while x < lo + 2000: x = x + step; points.append(x); step *= 2
    else:
        n = int(hi - lo) + 1
        points = [lo + (hi - lo) * k / n for k in range(n)]
    return quad(g, points + [hi])

def turning(E2, lo, hi, edge, rate, weight):
    """from lo up to the root in (lo, hi): N = root - s^2"""
    mp.dps = 120
    root = findroot(lambda N: E2(N), (lo, hi), solver='anderson', tol=1e-220)
    g = lambda s: 2 * s * exp(-weight * (root - s * s)) / sqrt(E2(root - s * s)) if s else mpf(0)
    time = quad(g, [sqrt((root - lo)) * k / 4 for k in range(5)])
    mp.dps = 40
    return root, time

# code of the case: matter, A, alpha, what bounds the past, what bounds the future
CASES = [
    (0.3, 0.1, 0.3, 'a=0', None), (0.3, 0.1, 0.5, 'a=0', None), (0.3, 0.1, 0.75, 'a=0', 'a=inf'),
    (0.3, 0.1, 2.0, 'a=0', 'edge'), (0.3, 0.1, 0.0, 'a=0', None), (0.3, 0.1, -1.0, 'edge', None),
    (0.3, 0.1, 1.0, 'a=0', 'a=inf'), (0.3, -0.1, 2.0, 'edge', None), (0.3, -0.1, 0.5, 'a=0', None),
    (0.3, -0.1, -1.0, 'a=0', 'edge'), (0.3, -0.1, 0.0, 'a=0', 'turn'), (0.3, -0.4, -4.0, 'a=0', 'edge'),
    (0.3, 0.6, 1.25, 'a=0', 'edge'), (0.05, -0.3, 3.0, 'edge', None), (0.3, 0.3, 0.1, 'a=0', None),
]

def one(Om, A, alpha, past, future):
    E2, edge, rate, alpha = model(Om, A, alpha)
    values = {}
    lo = -inf if past == 'a=0' else edge
    for name, weight in (('age', 0), ('particleHorizon', 1)):
        values[name] = integral(E2, lo, mpf(0), edge, rate, weight)
    if future in ('a=inf', 'edge'):
        hi = inf if future == 'a=inf' else edge
        values['timeToEnd'] = integral(E2, mpf(0), hi, edge, rate, 0)
        values['eventHorizon'] = integral(E2, mpf(0), hi, edge, rate, 1)
    elif future == 'turn':
        root, t = turning(E2, mpf(0), mpf(10), edge, rate, 0)
        values['turnaroundScale'] = exp(root)
        values['timeToTurnaround'] = t
    elif A > 0 or alpha > 1:
        values['eventHorizon'] = integral(E2, mpf(0), inf, edge, rate, 1)
    return {'matter': Om, 'excess': A, 'alpha': float(alpha), 'values': {k: mp.nstr(v, 25) for k, v in values.items()}}

def closed(Om, Ode, A, alpha):
    """closed universe that turns round next to the edge u = 0: x = ln u, dt = e^x dx/(|rate| E), x = root + y^2"""
    mp.dps = 150
    Om, Ode, A, al = mpf(Om), mpf(Ode), mpf(A), mpf(alpha)
    rate, power = 3 * A * (1 - al), 1 / (1 - al)
    N = lambda x: (exp(x) - 1) / rate
    E2 = lambda x: Om * exp(-3 * N(x)) + (1 - Om - Ode) * exp(-2 * N(x)) + Ode * exp(power * x)
    low, high = mpf(-400), mpf(0)
    for _ in range(520):
        middle = (low + high) / 2
        low, high = (middle, high) if E2(middle) < 0 else (low, middle)
    root = (low + high) / 2
    edges = [mpf(0)] + [mpf(k) / 4 for k in range(1, int(4 * sqrt(-root)) + 1)] + [sqrt(-root)]
    time = quad(lambda y: 2 * y * exp(root + y * y) / (abs(rate) * sqrt(E2(root + y * y))) if y else mpf(0), edges)
    mp.dps = 40
    values = {'turnaroundScale': mp.nstr(exp(N(root)), 25), 'timeToTurnaround': mp.nstr(mp.re(time), 25)}
    return {'matter': float(Om), 'dark': float(Ode), 'excess': float(A), 'alpha': float(al), 'values': values}

CLOSED = [(1.0, 17.6, -0.009661675237793292, 0.8506860467605293), (0.3, 0.9, -0.02, 0.7), (0.3, 1.5, -0.1, -5.0), (0.3, 1.5, -0.1, 0.3)]

if __name__ == '__main__':
    out = [one(*case) for case in CASES] + [closed(*case) for case in CLOSED]
    path = os.path.join(os.path.dirname(os.path.abspath(__file__)), 'barotropic.json')
    with open(path, 'w') as file: json.dump(out, file, indent=1); file.write('\n')
