"""Standard relations stated by hand in plain SI floats, with constants from SciPy (CODATA 2018) and
nominal solar values from Astropy. Reads {id, givens: [[symbol, value, astropy unit]], unit} from
standard input; prints the value of each relation in its unit. Nothing of the product is used."""
import json
import math
import sys
from math import cos, exp, log, pi, sin, sqrt

import astropy.units as u
from astropy.constants import codata2018, iau2015
from relations_gaussian import gaussian
from scipy.constants import physical_constants as table

c, h, k, e = 299792458.0, 6.62607015e-34, 1.380649e-23, 1.602176634e-19
hbar = h / (2 * pi)
G = codata2018.G.value
m_e, m_p, m_n = (table[f"{name} mass"][0] for name in ("electron", "proton", "neutron"))
m_u = table["atomic mass constant"][0]
sigma_T = table["Thomson cross section"][0]
alpha = table["fine-structure constant"][0]
eps0 = table["vacuum electric permittivity"][0]
mu0 = table["vacuum mag. permeability"][0]
rydberg = table["Rydberg constant"][0]
sigma = 2 * pi**5 * k**4 / (15 * h**3 * c**2)
a_rad = 4 * sigma / c


def si(value, unit):
    """A value in SI; masses of bodies are nominal GM over G (IAU 2015 Resolution B3)."""
    masses = {"solMass": iau2015.GM_sun, "earthMass": iau2015.GM_earth, "jupiterMass": iau2015.GM_jup}
    for name, parameter in masses.items():
        if name in unit:
            rest = u.Unit(unit.replace(name, "kg"))
            return (value * rest).si.value * parameter.value / G
    return (value * u.Unit(unit)).si.value


def schwarzschild(M):
    return 2 * G * M / c**2


def eddington(M):
    # Radiation force on an electron balances gravity on a proton, at any radius.
    return M * m_p * G / (sigma_T / (4 * pi * c))


def thermal_speed(T, m):
    return sqrt(2 * k * T / m)


relations = {
    "eddington_luminosity": lambda M: eddington(M),
    "eddington_luminosity_opacity": lambda M, kappa: 4 * pi * c * G * M / kappa,
    "eddington_accretion_rate": lambda M, eta: eddington(M) / (eta * c * c),
    "salpeter_time": lambda eta: eta / (1 - eta) * c * c / (eddington(1.0)),
    "schwarzschild_radius": lambda M: schwarzschild(M),
    "gravitational_radius": lambda M: schwarzschild(M) / 2,
    "gravitational_time": lambda M: schwarzschild(M) / (2 * c),
    "kerr_horizon": lambda M, a_spin: schwarzschild(M) / 2 * (1 + math.sqrt((1 - a_spin) * (1 + a_spin))),
    "isco_efficiency": lambda x_isco: 1 - (1 - 2 / (3 * x_isco)) ** 0.5,
    "bondi_rate": lambda M, lambda_B, rho, c_s: lambda_B * 4 * pi * (G * M / c_s**2) ** 2 * rho * c_s,
    "bondi_radius": lambda M, c_s: G * M / c_s / c_s,
    "bondi_hoyle_rate": lambda M, rho, c_s, v: 4 * pi * G**2 * M**2 * rho * math.hypot(c_s, v) ** -3,
    "accretion_luminosity": lambda M, Mdot, R: G * M / R * Mdot,
    "disc_effective_temperature": lambda M, Mdot, R, R_in: (
        3 * G * M * Mdot / (8 * pi * R**3) * (1 - sqrt(R_in / R)) / sigma
    )
    ** 0.25,
    "disc_aspect_ratio": lambda c_s, R, M: c_s / sqrt(G * M / R),
    "disc_viscous_time": lambda R, alpha_v, c_s, H: R * R / (alpha_v * c_s * H),
    "corotation_radius": lambda M, P: (G * M / (2 * pi / P) ** 2) ** (1 / 3),
    "light_cylinder": lambda P: c / (2 * pi / P),
    "spindown_luminosity": lambda I_mom, Pdot, P: I_mom * (2 * pi / P) * (2 * pi * Pdot / P**2),
    "characteristic_age": lambda P, Pdot: P / Pdot / 2,
    "surface_redshift": lambda M, R: (1 - schwarzschild(M) / R) ** -0.5 - 1,
    "compactness_gr": lambda M, R: schwarzschild(M) / (2 * R),
    "breakup_frequency": lambda M, R: sqrt(G * M / R) / (2 * pi * R),
    "tidal_disruption_radius": lambda R_star, M_bh, M_star: R_star * math.exp(math.log(M_bh / M_star) / 3),
    "tde_fallback_time": lambda R_star, M_bh, M_star: 2
    * pi
    * ((R_star * (M_bh / M_star) ** (1 / 3)) ** 2 / (2 * R_star)) ** 1.5
    / sqrt(G * M_bh),
    "tde_peak_rate": lambda M_star, t_fb: M_star / t_fb / 3,
    "hills_mass": lambda R_star, M_star: sqrt((c * c * R_star / (2 * G)) ** 3 / M_star),
    "hawking_temperature": lambda M: hbar * c / (4 * pi * k * schwarzschild(M)),
    "hawking_lifetime": lambda M: 640 * pi * schwarzschild(M) ** 3 / (hbar * G) * c**2,
    "bh_entropy": lambda M: pi * schwarzschild(M) ** 2 * c**3 / (G * hbar),
    "roche_lobe_eggleton": lambda a_sep, q: a_sep * 0.49 / (0.6 + q ** (-2 / 3) * log(1 + q ** (1 / 3))),
    "critical_field_si": lambda: m_e**2 * c**2 / (e * hbar),
    "rotational_energy": lambda I_mom, P: I_mom * (2 * pi / P) ** 2 / 2,
    "blast_deceleration_radius": lambda E_iso, n, Gamma: (E_iso / (4 / 3 * pi * n * m_p * c**2 * Gamma**2)) ** (1 / 3),
    "beaming_corrected_energy": lambda E_iso, theta_j: E_iso * 2 * sin(theta_j / 2) ** 2,
    "planck_radiance": lambda nu, T: 2 * h * nu**3 / c**2 / math.expm1(h * nu / k / T),
    "rayleigh_jeans": lambda nu, T: 2 * k * T * (nu / c) ** 2,
    "wien_peak_wavelength": lambda T: h * c / (4.965114231744276303 * k * T),
    "wien_peak_frequency": lambda T: 2.821439372122078893 * k * T / h,
    "blackbody_luminosity": lambda R, T: 4 * pi * R * R * sigma * T**4,
    "radiation_energy_density": lambda T: a_rad * T**4,
    "photon_number_density": lambda T: 2.404113806319188571 / pi**2 * (k * T / (hbar * c)) ** 3,
    "photon_energy": lambda lam: 2 * pi * hbar * c / lam,
    "compton_shift": lambda theta: h / m_e / c * 2 * sin(theta / 2) ** 2,
    "thomson_optical_depth": lambda n_e, L: L / (1 / (n_e * sigma_T)),
    "sz_y": lambda n_e, T_e, L: k * T_e / (m_e * c * c) * sigma_T * n_e * L,
    "electron_scattering_opacity": lambda X_H: sigma_T / m_p * (1 + X_H) / 2,
    "photon_mean_free_path": lambda kappa, rho: 1 / kappa / rho,
    "cyclotron_frequency_si": lambda B: e * B / m_e / (2 * pi),
    "synchrotron_critical_si": lambda gamma_e, B, theta_p: 1.5 * gamma_e**2 * (e * B / m_e) * sin(theta_p) / (2 * pi),
    "synchrotron_power_si": lambda gamma_e, B: 4 / 3 * sigma_T * c * (gamma_e**2 - 1) * B**2 / mu0 / 2,
    "synchrotron_cooling_si": lambda B, gamma_e: gamma_e * m_e * c**2 / (4 / 3 * sigma_T * c * gamma_e**2 * B**2 / (2 * mu0)),
    "inverse_compton_power": lambda gamma_e, U_ph: 4 / 3 * sigma_T * c * U_ph * (gamma_e - 1) * (gamma_e + 1),
    "inverse_compton_cooling": lambda U_ph, gamma_e: m_e * c**2 / (4 / 3 * sigma_T * c * U_ph * gamma_e),
    "inverse_compton_energy": lambda gamma_e, eps_ph: eps_ph * gamma_e * gamma_e / 0.75,
    "pair_threshold": lambda eps_ph, theta: (m_e * c**2) ** 2 / (eps_ph * sin(theta / 2) ** 2),
    "compactness_radiative": lambda L, R: sigma_T * L / (m_e * c**3 * R),
    "apparent_speed": lambda beta, theta: sin(theta) / (1 / beta - cos(theta)),
    "kinetic_lorentz_factor": lambda E_k: (E_k + m_e * c**2) / (m_e * c**2),
    "hydrogenic_energy": lambda Z, n_q: 0.5 * m_e * (alpha * c * Z / n_q) ** 2,
    "rydberg_wavelength": lambda n_lo, n_up: 1 / (rydberg / (1 + m_e / m_p) * (n_lo**-2 - n_up**-2)),
    "doppler_b": lambda T, m_ion: thermal_speed(T, m_ion),
    "thermal_fwhm": lambda T, m_ion: 2 * sqrt(log(2)) * thermal_speed(T, m_ion),
    "saha": lambda g_up, g_lo, T, chi: 2 * g_up / g_lo * (h / sqrt(2 * pi * m_e * k * T)) ** -3 * exp(-chi / k / T),
    "boltzmann_ratio": lambda g_up, g_lo, dE, T: g_up / g_lo / exp(dE / (k * T)),
    "integrated_cross_section_si": lambda f_osc: pi * (e**2 / (4 * pi * eps0 * m_e * c)) * f_osc,
    "larmor_si": lambda acc: 2 / 3 * (e**2 / (4 * pi * eps0)) * acc**2 / c**3,
    "flux_from_luminosity": lambda L, d: L / (4 * pi * d * d),
    "dispersion_delay_si": lambda DM, nu: DM * (e / (2 * pi * nu)) ** 2 / (2 * eps0 * m_e * c),
    "rotation_measure_si": lambda n_e, B_par, L: e**3 * n_e * B_par * L / (8 * pi**2 * eps0 * m_e**2 * c**3),
    "ssa_temperature": lambda gamma_e: gamma_e * m_e * c**2 / k / 3,
    "kelvin_helmholtz_time": lambda M, R, L: (G * M * M / R) / L,
    "dynamical_time_star": lambda R, M: 1 / sqrt(G * M / R**3),
    "freefall_time": lambda rho: sqrt(3 * pi / 32 / (G * rho)),
    "nuclear_time": lambda f_core, eps_nuc, M, L: f_core * eps_nuc * M * c**2 / L,
    "central_pressure_bound": lambda M, R: G / (8 * pi) * (M / R**2) ** 2,
    "virial_temperature_star": lambda M, mu, R: mu * m_u / k * (G * M / R) / 5,
    "effective_temperature": lambda L, R: sqrt(sqrt(L / (4 * pi * R**2) / sigma)),
    "surface_gravity": lambda M, R: G * M / (R * R),
    "pressure_scale_height": lambda T, mu, g: k * T / (mu * m_u) / g,
    "adiabatic_sound_speed": lambda gamma_ad, T, mu: sqrt(gamma_ad * k * T / mu / m_u),
    "isothermal_sound_speed": lambda T, mu: sqrt(k * T / mu / m_u),
    "radiation_to_gas_pressure": lambda T, mu, rho: (a_rad * T**4 / 3) / (rho * k * T / (mu * m_u)),
    "nabla_rad": lambda kappa, L, P, M, T: 3 / (16 * pi * a_rad * c) * kappa * L * P / (G * M * T**4),
    "escape_speed": lambda M, R: sqrt(2 * G * M) / sqrt(R),
    "degenerate_pressure_nr": lambda rho, mu_e: (3 / pi) ** (2 / 3) * h**2 / (20 * m_e) * (rho / mu_e / m_u) ** (5 / 3),
    "degenerate_pressure_ur": lambda rho, mu_e: (3 / pi) ** (1 / 3) * h * c / 8 * (rho / mu_e / m_u) ** (4 / 3),
    "relativity_parameter": lambda rho, mu_e: h / (2 * m_e * c) * (3 / pi * rho / mu_e / m_u) ** (1 / 3),
    "gamow_energy": lambda m_r, Z1, Z2: 2 * m_r * (pi * alpha * c * Z1 * Z2) ** 2,
    "gamow_peak": lambda m_r, Z1, Z2, T: (sqrt(2 * m_r * (pi * alpha * c * Z1 * Z2) ** 2) * k * T / 2) ** (2 / 3),
    "gamow_width": lambda E_0, T: 4 / sqrt(3) * sqrt(E_0 * k * T),
    "diffusion_time_supernova": lambda kappa, M_ej, v_ej: sqrt(2 * kappa * M_ej / 13.8 / (c * v_ej)),
    "kepler_period": lambda a_sep, M1, M2: 2 * pi / sqrt(G * (M1 + M2) / a_sep**3),
    "circular_speed": lambda M, r: sqrt(G * M / r),
    "vis_viva": lambda M, r, a_sep: sqrt(2 * (G * M / r - G * M / (2 * a_sep))),
    "hill_radius": lambda a_sep, ecc, m, M: a_sep * (1 - ecc) * (m / M / 3) ** (1 / 3),
    "virial_mass": lambda sigma_v, R: 5 * R / G * sigma_v**2,
    "apsidal_precession_gr": lambda M, a_sep, ecc: 3 * pi * schwarzschild(M) / (a_sep * (1 - ecc) * (1 + ecc)),
    "light_deflection": lambda M, b_imp: 2 * schwarzschild(M) / b_imp,
    "shapiro_delay": lambda M, r_1, r_2, b_imp: schwarzschild(M) / c * (log(4) + log(r_1) + log(r_2) - 2 * log(b_imp)),
    "einstein_radius": lambda M, D_ls, D_l, D_s: sqrt(2 * schwarzschild(M) * D_ls / D_l / D_s),
    "sphere_of_influence": lambda M, sigma_v: G * M / sigma_v**2,
    "jeans_length": lambda c_s, rho: sqrt(pi * c_s * c_s / G / rho),
    "jeans_mass": lambda c_s, rho: 4 / 3 * pi * rho * (sqrt(pi * c_s * c_s / G / rho) / 2) ** 3,
    "bonnor_ebert_mass": lambda c_s, P_ext: 1.182 * c_s**4 / sqrt(G**3 * P_ext),
    "binding_energy_sphere": lambda M, R: 0.6 * G * M * M / R,
    "plasma_frequency_si": lambda n_e: e * sqrt(n_e / eps0 / m_e) / (2 * pi),
    "debye_length_si": lambda T_e, n_e: sqrt(eps0 * k * T_e / n_e) / e,
    "gyroradius_rel_si": lambda E_p, Z, B: E_p / c / (Z * e * B),
}

if __name__ == "__main__":
    relations.update(gaussian)
    answers = {}
    for task in json.load(sys.stdin):
        values = {name: si(value, unit) for name, value, unit in task["givens"]}
        answers[task["id"]] = relations[task["id"]](**values) / si(1.0, task["unit"])
    print(json.dumps(answers))
