"""Last scattering and the end of the drag epoch by integration: hydrogen with three levels (Peebles 1968, ApJ 153, 1, with the rate of
recombination of Pequignot, Petitjean & Boisson 1991, A&A 251, 680, times 1.125), helium by Saha's equation; massless neutrinos but for
0.06 eV. Run with Python 3, numpy and scipy. Prints N_eff, omega_b, omega_m, T_CMB, and z_* and z_d, both shifted so as to be 1089.92 and
1059.94 (Planck 2018, arXiv:1807.06209, Table 2) at the parameters there."""
import math

import numpy as np
from scipy.integrate import cumulative_trapezoid, solve_ivp
from scipy.interpolate import interp1d

C, K, H_PLANCK = 299792458.0, 1.380649e-23, 6.62607015e-34
M_E, M_H, G, THOMSON = 9.1093837e-31, 1.67353e-27, 6.6743e-11, 6.6524587e-29
MPC, EV = 3.0856775814913673e22, 1.602176634e-19
HELIUM, FUDGE = 0.2454, 1.125
ION_H, ION_HE = 13.598286 * EV, 24.587387 * EV
EXCITED = ION_H / 4
LYMAN = ION_H - EXCITED
WAVELENGTH = H_PLANCK * C / LYMAN
TWO_PHOTON = 8.2245809
LATE = 200


def epochs(nu, baryons, matter, cmb):
    h100 = 1e5 / MPC
    critical = 3 * h100**2 / (8 * math.pi * G)
    photons = 2.472975e-5 * (cmb / 2.7255) ** 4
    radiation = photons * (1 + 0.2271073 * nu)
    light = 0.06 / 93.04 * (nu / 3.044) ** 0.75
    rate = lambda z: h100 * np.sqrt(radiation * (1 + z) ** 4 + (matter - light) * (1 + z) ** 3)
    hydrogen = lambda z: (1 - HELIUM) * baryons * critical / M_H * (1 + z) ** 3
    helium = HELIUM / (4 * (1 - HELIUM))
    free = lambda temperature: (2 * math.pi * M_E * K * temperature / H_PLANCK**2) ** 1.5

    def saha_hydrogen(z):
        t = cmb * (1 + z)
        s = free(t) * math.exp(-ION_H / K / t) / hydrogen(z)
        return (-s + math.sqrt(s * s + 4 * s)) / 2 if s < 1e6 else 1

    def saha_helium(z):
        t = cmb * (1 + z)
        s = 4 * free(t) * math.exp(-ION_HE / K / t) / hydrogen(z)
        return (-1 - s + math.sqrt((1 + s) ** 2 + 4 * helium * s)) / (2 * helium)

    def change(z, state):
        x, t = state[0], cmb * (1 + z)
        recombination = FUDGE * 4.309e-19 * (t / 1e4) ** -0.6166 / (1 + 0.6703 * (t / 1e4) ** 0.53)
        ionization = recombination * free(t) * math.exp(-EXCITED / K / t)
        n, expansion = hydrogen(z), rate(z)
        escape = WAVELENGTH**3 / (8 * math.pi * expansion)
        electrons = x + helium * saha_helium(z)
        net = n * recombination * electrons * x - ionization * (1 - x) * math.exp(-LYMAN / K / t)
        ground = n * (1 - x) * escape
        return [net * (1 + TWO_PHOTON * ground) / (1 + (TWO_PHOTON + ionization) * ground) / (expansion * (1 + z))]

    start = 1800
    while saha_hydrogen(start) > 0.995:
        start -= 5
    solution = solve_ivp(change, (start, LATE), [saha_hydrogen(start)], "LSODA", rtol=1e-9, atol=1e-12, dense_output=True)
    z = np.linspace(LATE, 1500, 26001)
    electrons = np.array([(solution.sol(one)[0] if one < start else saha_hydrogen(one)) + helium * saha_helium(one) for one in z])
    depth = C * THOMSON * electrons * hydrogen(z) / (rate(z) * (1 + z))
    after = np.linspace(0, LATE, 2001)
    expansion = h100 * np.sqrt(radiation * (1 + after) ** 4 + matter * (1 + after) ** 3 + 0.31)
    depth_after = C * THOMSON * electrons[0] * hydrogen(after) / (expansion * (1 + after))
    load = lambda at: 0.75 * baryons / photons / (1 + at)

    def where(before, behind):
        total = np.trapezoid(behind, after) + cumulative_trapezoid(before, z, initial=0)
        return float(interp1d(total, z)(1))

    return where(depth, depth_after), where(depth / load(z), depth_after / load(after))


there = epochs(3.046, 0.02237, 0.143, 2.7255)
for nu in (2, 3.046, 4.5):
    for baryons in (0.015, 0.0224, 0.03):
        for matter in (0.08, 0.143, 0.25):
            for cmb in (2.7, 2.7255, 2.75) if matter == 0.143 else (2.7255,):
                scattering, drag = epochs(nu, baryons, matter, cmb)
                row = (nu, baryons, matter, cmb, round(scattering - there[0] + 1089.92, 2), round(drag - there[1] + 1059.94, 2))
                print(f"  [{', '.join(str(one) for one in row)}],")
