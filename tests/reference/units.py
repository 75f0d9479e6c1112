"""Units by Astropy, and the electromagnetic correspondences by hand, as JSON.

Standard input: {"units": {name in the unit language: name in astropy.units}}. A factor is to coherent
SI; Gaussian units come out in kg, m and s with half powers, which is how Jackson's appendix states
them in g, cm and s.
"""

import json
import math
import sys

import astropy.units as u
from astropy.constants import codata2018, iau2015

# Not in the main name space.
u.add_enabled_units([u.cgs.statA])

BASES = {"m": "length", "kg": "mass", "s": "time", "A": "current", "K": "temperature",
         "mol": "amount", "cd": "luminous intensity"}
# In g, cm and s, with half powers; the library has dimensions of its own for them.
GAUSSIAN = {
    "gauss": u.g**0.5 * u.cm**-0.5 / u.s,
    "esu": u.g**0.5 * u.cm**1.5 / u.s,
    "statV": u.g**0.5 * u.cm**0.5 / u.s,
}


def unit(name):
    """Factor to SI base units and the exponents over them; angles and photons are pure numbers."""
    made = GAUSSIAN.get(name) or u.Unit(name)
    bases = [u.m, u.kg, u.s, u.A, u.K, u.mol, u.cd, u.rad, u.ph]
    decomposed = made.decompose(bases=bases)
    exponents = {
        BASES[base.name]: str(power)
        for base, power in zip(decomposed.bases, decomposed.powers)
        if base.name in BASES
    }
    return {"factor": float(decomposed.scale), "exponents": exponents}


c = 299792458.0
# How many Gaussian units correspond to one of SI, from energies and forces with mu_0 = 4 pi 1e-7:
# a charge from q^2/(4 pi eps_0 r^2) = Q^2/r^2, a field from B^2/(2 mu_0) = b^2/(8 pi), the rest from
# charge times potential, current times flux and so on.
mu0 = 4 * math.pi * 1e-7
eps0 = 1 / (mu0 * c * c)
newton, joule, metre = 1e5, 1e7, 1e2  # in dyn, erg, cm
charge = math.sqrt(1 / (4 * math.pi * eps0) * newton) * metre
potential = joule / charge
field = math.sqrt(8 * math.pi * (1 / (2 * mu0)) * joule / metre**3)
CORRESPONDENCES = {
    "C": charge,
    "A": charge,
    "V": potential,
    "V/m": potential / metre,
    "T": field,
    # H = B/mu_0 in SI, H = B in vacuum in Gaussian.
    "A/m": mu0 * field,
    # D = eps_0 E in SI, D = E in vacuum in Gaussian.
    "C/m^2": potential / metre / eps0,
    "Wb": field * metre**2,
    "A m^2": joule / field,
    "ohm": potential / charge,
    "S/m": charge / potential / metre,
    "F": charge / potential,
    "H": joule / charge**2,
    "C/m^3": charge / metre**3,
    "A/m^2": charge / metre**2,
    "C m": charge * metre,
    "T m": field * metre,
    "ohm m": potential / charge * metre,
}


def main():
    asked = json.load(sys.stdin)
    answer = {
        "units": {name: unit(theirs) for name, theirs in asked["units"].items()},
        "correspondences": CORRESPONDENCES,
        "esu": codata2018.e_esu.value / codata2018.e.value,
        "solarMassGM": iau2015.GM_sun.value,
    }
    json.dump(answer, sys.stdout)


main()
