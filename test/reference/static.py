"""Late times of Omega_m = 6.75, Omega_DE = 1 (w = -1), no radiation, h0 = 70: a^3 E^2 = (a - 3/2)^2 (a + 3) comes to rest at a = 3/2.
Run with Python 3 and mpmath: age in Gyr, H in km/s/Mpc and conformal time in Gly at times from now in Gyr."""
from mpmath import diff, exp, log, mp, mpf, nstr, quad, sqrt

mp.dps = 40
REST = mpf(3) / 2
HUBBLE_TIME = mpf("3.0856775814913673e19") / 70 / (mpf(10) ** 9 * mpf("31557600"))


def integral(f):
    """Of f/(3/2 - a) from today to 3/2 - d, the pole taken out: d is small."""
    f0, slope = f(REST), diff(f, REST)
    regular = lambda a: (f(a) - f0) / (REST - a) if abs(REST - a) > 1e-18 else -slope
    whole = quad(regular, [1, 1.25, 1.5])
    return lambda d: whole - (quad(regular, [REST - d, REST]) if d > 1e-12 else 0) + f0 * log(mpf("0.5") / d)


of_time = lambda a: sqrt(a / (a + 3))
of_conformal = lambda a: 1 / sqrt(a * (a + 3))
elapsed, seen = integral(of_time), integral(of_conformal)
age = quad(lambda a: of_time(a) / (REST - a), [0, 0.01, 0.5, 1])
conformal = quad(lambda a: of_conformal(a) / (REST - a), [0, 0.0001, 0.01, 0.5, 1])
for time in [20, 100, 293, 500, 1000000]:
    wanted = mpf(time) / HUBBLE_TIME
    d = mpf("0.5") * exp(-wanted / of_time(REST))
    for _ in range(60):
        d *= exp((elapsed(d) - wanted) / of_time(REST))
    a = REST - d
    rate = 70 * d * sqrt((a + 3) / a**3)
    print(time, nstr(HUBBLE_TIME * age + time, 17), nstr(rate, 17), nstr(HUBBLE_TIME * (conformal + seen(d)), 17))
