"""Relations of Gaussian electromagnetism, stated by hand in SI.

Every field comes in tesla, every charge is in coulomb, and mu_0 is 4 pi 1e-7 N/A^2 to all digits,
which is what the correspondence of the two conventions rests on. So nothing here has a Gaussian form,
and a lost 4 pi or c on either side shows.
"""
from math import pi, sin, sqrt

from astropy.constants import codata2018
from scipy.constants import physical_constants as table

c, h, k, e = 299792458.0, 6.62607015e-34, 1.380649e-23, 1.602176634e-19
G = codata2018.G.value
m_e = table["electron mass"][0]
sigma_T = table["Thomson cross section"][0]
mu0 = 4 * pi * 1e-7
eps0 = 1 / (mu0 * c**2)
coulomb = e**2 / (4 * pi * eps0)


def pressure(B):
    return B**2 / (2 * mu0)


def plasma(n_e):
    return e * sqrt(n_e / (eps0 * m_e))


def bremsstrahlung(T, Z, n_e, n_i, g_B):
    # Rybicki & Lightman 1979, eq. 5.15a, with e^2 as the Coulomb coupling.
    speed = sqrt(2 * pi * k * T / (3 * m_e))
    return speed * 32 * pi * coulomb**3 / (3 * h * m_e * c**3) * Z * Z * n_e * n_i * g_B


def absorbed(f_osc):
    """Cross-section of a line integrated over frequency."""
    return e**2 / (4 * eps0 * m_e * c) * f_osc


gaussian = {
    # Twice the magnetic pressure of the dipole is (2 pi times) that of matter in free fall.
    "magnetospheric_radius_gaussian": lambda mu_dip, M, Mdot: (
        (8 * pi * mu_dip**2 / (2 * mu0)) ** 2 / (2 * G * M * Mdot**2)
    )
    ** (1 / 7),
    "dipole_field_gaussian": lambda I_mom, P, Pdot, R: sqrt(
        mu0 / (4 * pi) * 3 * c**3 * I_mom * P * Pdot / (8 * pi**2)
    )
    / R**3,
    "blandford_znajek_power": lambda kappa_bz, Phi_bh, Omega_H: kappa_bz * (Phi_bh * Omega_H) ** 2 / (mu0 * c),
    "goldreich_julian_density": lambda B, P: 2 * eps0 * (2 * pi / P) * B / e,
    "critical_field_gaussian": lambda: 2 * pi * m_e**2 * c**2 / (e * h),
    "cyclotron_frequency_gaussian": lambda B: e * B / m_e / (2 * pi),
    "synchrotron_critical_gaussian": lambda gamma_e, B, theta_p: 1.5 * gamma_e**2 * e * B / m_e * sin(theta_p) / (2 * pi),
    "synchrotron_power_gaussian": lambda gamma_e, B: 4 / 3 * sigma_T * c * (gamma_e - 1) * (gamma_e + 1) * pressure(B),
    "synchrotron_cooling_gaussian": lambda B, gamma_e: m_e * c / (4 / 3 * sigma_T * gamma_e * pressure(B)),
    "bremsstrahlung_emissivity": bremsstrahlung,
    "bremsstrahlung_cooling": lambda T, n_e, g_B: 3 * n_e * k * T / bremsstrahlung(T, 1, n_e, n_e, g_B),
    "integrated_cross_section_gaussian": absorbed,
    "larmor_gaussian": lambda acc: mu0 * (e * acc) ** 2 / (6 * pi * c),
    "dispersion_delay_gaussian": lambda DM, nu: (plasma(1.0) / (2 * pi * nu)) ** 2 * DM / (2 * c),
    "rotation_measure_gaussian": lambda n_e, B_par, L: plasma(n_e) ** 2 * (e * B_par / m_e) * L / (8 * pi**2 * c**3),
    "plasma_frequency_gaussian": lambda n_e: plasma(n_e) / (2 * pi),
    "debye_length_gaussian": lambda T_e, n_e: sqrt(k * T_e / m_e) / plasma(n_e),
    "gyroradius_rel_gaussian": lambda E_p, Z, B: E_p / (Z * e * B * c),
    "alfven_speed_gaussian": lambda B, rho: B / sqrt(mu0 * rho),
    "magnetisation_gaussian": lambda B, rho: 2 * pressure(B) / (rho * c * c),
    "plasma_beta_gaussian": lambda n, T, B: n * k * T / pressure(B),
    "magnetic_pressure_gaussian": pressure,
    "exb_drift_gaussian": lambda E_f, B: E_f / B,
    "skin_depth_electron": lambda n_e: c / plasma(n_e),
    "hillas_energy_gaussian": lambda Z, beta, B, R: Z * e * (beta * c) * B * R,
    "bohm_diffusion_gaussian": lambda E_p, Z, B: E_p / (Z * e * B * c) * c / 3,
    "gunn_peterson": lambda f_osc, lam, n_HI, H: absorbed(f_osc) * lam * n_HI / H,
}
