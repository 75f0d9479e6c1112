"""Coefficients of a plasma and figures of the IAU, stated by hand in SI, as JSON.

One particle per cm^3, 1 eV and 1 gauss; results in the units of the printed coefficients. mu_0 is
4 pi 1e-7 to all digits, as the correspondence of Gaussian and SI units has it.
"""
import json
from math import log10, pi, sqrt

from scipy.constants import physical_constants as table

c, h, k, e = 299792458.0, 6.62607015e-34, 1.380649e-23, 1.602176634e-19
m_e, m_p = table["electron mass"][0], table["proton mass"][0]
sigma_T = table["Thomson cross section"][0]
mu0 = 4 * pi * 1e-7
eps0 = 1 / (mu0 * c**2)
coulomb = e**2 / (4 * pi * eps0)
n, T, B = 1e6, e, 1e-4
cm = 1e-2


def gyro(m):
    return e * B / m


def oscillation(m):
    return e * sqrt(n / (eps0 * m))


def thermal(m):
    return sqrt(T / m)


debye = sqrt(eps0 * T / n) / e
alfven = B / sqrt(mu0 * n * m_p)
magnetic = B**2 / (2 * mu0)

plasma = {
    "omega_ce": gyro(m_e),
    "f_ce": gyro(m_e) / (2 * pi),
    "omega_ci": gyro(m_p),
    "f_ci": gyro(m_p) / (2 * pi),
    "omega_pe": oscillation(m_e),
    "f_pe": oscillation(m_e) / (2 * pi),
    "omega_pi": oscillation(m_p),
    "f_pi": oscillation(m_p) / (2 * pi),
    "de_broglie": h / (2 * pi) / (m_e * thermal(m_e)) / cm,
    "approach": coulomb / T / cm,
    "gyroradius_e": thermal(m_e) / gyro(m_e) / cm,
    "gyroradius_i": thermal(m_p) / gyro(m_p) / cm,
    "inertial_e": c / oscillation(m_e) / cm,
    "inertial_i": c / oscillation(m_p) / cm,
    "debye": debye / cm,
    "thermal_e": thermal(m_e) / cm,
    "thermal_i": thermal(m_p) / cm,
    "alfven": alfven / cm,
    "mass_ratio": (m_e / m_p) ** 0.5,
    "sphere": 4 / 3 * pi * debye**3 * n,
    "alfven_c": alfven / c,
    "pe_ce": oscillation(m_e) / gyro(m_e),
    "pi_ci": oscillation(m_p) / gyro(m_p),
    "beta": n * T / magnetic,
    "magnetic_rest": magnetic / (n * m_p * c**2),
    "bohm": T / (16 * e * B) / cm**2,
    "kelvin": e / k,
    "collisions_e": 4 / 3 * sqrt(2 * pi) * n * coulomb**2 / (m_e**2 * thermal(m_e) ** 3),
    "collisions_i": 4 / 3 * sqrt(pi) * n * coulomb**2 / (m_p**2 * thermal(m_p) ** 3),
    "cyclotron": 4 * sigma_T * c * n * magnetic * T / (m_e * c**2) * cm**3,
    "bremsstrahlung": sqrt(2 * pi / 3)
    * thermal(m_e)
    * (64 / sqrt(3))
    * coulomb**3
    / (h * m_e * c**3)
    * n**2
    * cm**3,
    # As a time: an SI resistivity over 4 pi eps_0 of the Gaussian one.
    "resistivity": 4 / 3 * sqrt(2 * pi) * coulomb / (m_e * thermal(m_e) ** 3),
}

# IAU 2015 Resolutions B2 and B3, IAU 2012 Resolution B2.
au, GM, L, R = 149597870700.0, 1.3271244e20, 3.828e26, 6.957e8
parsec = au * 648000 / pi
sigma = 2 * pi**5 * k**4 / (15 * h**3 * c**2)
iau = {
    "irradiance": 1361 * 4 * pi * au**2,
    "length": GM / c**2,
    "time": GM / c**3,
    "zero point": 3.0128e28 / (4 * pi * 100 * parsec**2),
    "magnitude": -2.5 * log10(L / 3.0128e28),
    "temperature": (L / (4 * pi * sigma)) ** 0.25 / R**0.5,
    "parsec": parsec,
    "year": 2 * pi * au * sqrt(au / GM) / 86400,
    "julian year": 365.25 * 86400,
}

print(json.dumps({"plasma": plasma, "iau": iau}))
