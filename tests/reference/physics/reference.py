"""Figures of general-purpose libraries, as JSON on standard output, for the tests beside this file.

Needs Python 3 with SciPy (CODATA 2018) and Astropy. The names of units to compare come as JSON on
standard input: {"units": {"name in the unit language": "name in astropy.units"}, "redshifts": [...],
"planck": [[hertz, kelvin], ...]}.
"""

import json
import sys

import astropy
import astropy.units as u
import scipy
from astropy.constants import codata2018, iau2015
from astropy.cosmology import FlatLambdaCDM
from astropy.modeling.physical_models import BlackBody
from scipy.constants import physical_constants

# This one is not in the main name space.
u.add_enabled_units([u.cgs.statA])

SCIPY_NAMES = {
    "c": "speed of light in vacuum",
    "h": "Planck constant",
    "hbar": "reduced Planck constant",
    "q_e": "elementary charge",
    "k_B": "Boltzmann constant",
    "N_A": "Avogadro constant",
    "R_gas": "molar gas constant",
    "F_faraday": "Faraday constant",
    "sigma_SB": "Stefan-Boltzmann constant",
    "b_wien": "Wien wavelength displacement law constant",
    "G": "Newtonian constant of gravitation",
    "m_e": "electron mass",
    "m_p": "proton mass",
    "m_n": "neutron mass",
    "m_alpha": "alpha particle mass",
    "u_amu": "atomic mass constant",
    "alpha_fs": "fine-structure constant",
    "eps_0": "vacuum electric permittivity",
    "mu_0": "vacuum mag. permeability",
    "R_inf": "Rydberg constant",
    "a_0": "Bohr radius",
    "r_e": "classical electron radius",
    "lambda_C": "Compton wavelength",
    "sigma_T": "Thomson cross section",
    "mu_B": "Bohr magneton",
    "mu_N": "nuclear magneton",
    "G_F": "Fermi coupling constant",
    "Ry": "Rydberg constant times hc in eV",
}

ASTROPY_NAMES = {
    "c": codata2018.c,
    "h": codata2018.h,
    "hbar": codata2018.hbar,
    "q_e": codata2018.e,
    "k_B": codata2018.k_B,
    "N_A": codata2018.N_A,
    "R_gas": codata2018.R,
    "sigma_SB": codata2018.sigma_sb,
    "b_wien": codata2018.b_wien,
    "G": codata2018.G,
    "m_e": codata2018.m_e,
    "m_p": codata2018.m_p,
    "m_n": codata2018.m_n,
    "u_amu": codata2018.u,
    "alpha_fs": codata2018.alpha,
    "eps_0": codata2018.eps0,
    "mu_0": codata2018.mu0,
    "R_inf": codata2018.Ryd,
    "a_0": codata2018.a0,
    "sigma_T": codata2018.sigma_T,
    "mu_B": codata2018.muB,
    "M_sun": iau2015.M_sun,
    "R_sun": iau2015.R_sun,
    "L_sun": iau2015.L_sun,
    "GM_sun": iau2015.GM_sun,
    "M_earth": iau2015.M_earth,
    "R_earth": iau2015.R_earth,
    "GM_earth": iau2015.GM_earth,
    "M_jup": iau2015.M_jup,
    "R_jup": iau2015.R_jup,
    "GM_jup": iau2015.GM_jup,
    "au": iau2015.au,
    "pc": iau2015.pc,
}


def scipy_constants():
    """Value and uncertainty in the unit of the listing."""
    rows = {}
    for symbol, name in SCIPY_NAMES.items():
        value, _, uncertainty = physical_constants[name]
        rows[symbol] = {"value": value, "uncertainty": uncertainty}
    return rows


def astropy_constants():
    """Value and uncertainty in SI."""
    rows = {}
    for symbol, constant in ASTROPY_NAMES.items():
        si = constant.si
        rows[symbol] = {"value": si.value, "uncertainty": constant.uncertainty * (si.value / constant.value)}
    return rows


BASES = {"m": "length", "kg": "mass", "s": "time", "A": "current", "K": "temperature",
         "mol": "amount", "cd": "luminous intensity"}


def unit(name):
    """Factor to SI base units, and the exponents over them; angles and photons are pure numbers."""
    decomposed = u.Unit(name).decompose(bases=[u.m, u.kg, u.s, u.A, u.K, u.mol, u.cd, u.rad, u.ph])
    exponents = {}
    for base, power in zip(decomposed.bases, decomposed.powers):
        if base.name in BASES:
            exponents[BASES[base.name]] = str(power)
    return {"factor": float(decomposed.scale), "exponents": exponents}


def gaussian():
    """How many Gaussian units correspond to one of SI, as far as the library knows."""
    charge = codata2018.e_esu.value / codata2018.e.value
    return {
        "T": {"unit": "gauss", "count": (1 * u.T).to_value(u.G)},
        "C": {"unit": "esu", "count": charge},
        "A": {"unit": "statA", "count": charge},
        "Wb": {"unit": "Mx", "count": (1 * u.Wb).to_value(u.G * u.cm**2)},
        "A m^2": {"unit": "erg/gauss", "count": (1 * u.J / u.T).to_value(u.erg / u.G)},
    }


def cosmology(redshifts):
    """Distances in m, times in s and rates in 1/s of a flat universe without radiation."""
    model = FlatLambdaCDM(H0=70, Om0=0.3, Tcmb0=0)
    return [
        {
            "z": z,
            "hubble": model.H(z).si.value,
            "comoving": model.comoving_distance(z).si.value,
            "luminosity": model.luminosity_distance(z).si.value,
            "angular": model.angular_diameter_distance(z).si.value,
            "lookback": model.lookback_time(z).si.value,
        }
        for z in redshifts
    ]


def planck(points):
    """B_nu in W m^-2 Hz^-1 sr^-1 and B_lambda in W m^-3 sr^-1 at the wavelength of the frequency."""
    rows = []
    for hertz, kelvin in points:
        nu = hertz * u.Hz
        wavelength = nu.to(u.m, equivalencies=u.spectral())
        b_nu = BlackBody(temperature=kelvin * u.K, scale=1 * u.W / (u.m**2 * u.Hz * u.sr))(nu)
        b_lambda = BlackBody(temperature=kelvin * u.K, scale=1 * u.W / (u.m**3 * u.sr))(wavelength)
        rows.append(
            {
                "nu": hertz,
                "wavelength": wavelength.value,
                "temperature": kelvin,
                "perFrequency": b_nu.si.value,
                "perWavelength": b_lambda.si.value,
            }
        )
    return rows


def main():
    asked = json.load(sys.stdin)
    json.dump(
        {
            "versions": {"astropy": astropy.__version__, "scipy": scipy.__version__},
            "scipy": scipy_constants(),
            "astropy": astropy_constants(),
            "elementaryChargeEsu": codata2018.e_esu.value,
            "units": {name: unit(theirs) for name, theirs in asked["units"].items()},
            "gaussian": gaussian(),
            "cosmology": cosmology(asked["redshifts"]),
            "planck": planck(asked["planck"]),
        },
        sys.stdout,
    )


main()
