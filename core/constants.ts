/**
 * Physical constants, exact in the SI since 2019 where marked.
 * Source: CODATA 2018, Tiesinga, Mohr, Newell & Taylor, Rev. Mod. Phys. 93 (2021) 025010.
 */
export const BOLTZMANN_J_K = 1.380649e-23; // exact
export const ELEMENTARY_CHARGE_C = 1.602176634e-19; // exact
export const AVOGADRO_per_mol = 6.02214076e23; // exact
export const PLANCK_J_s = 6.62607015e-34; // exact
export const REDUCED_PLANCK_J_s = PLANCK_J_s / (2 * Math.PI);
export const LIGHT_SPEED_m_s = 299_792_458; // exact
export const GAS_CONSTANT_J_mol_K = BOLTZMANN_J_K * AVOGADRO_per_mol;
export const FARADAY_C_mol = ELEMENTARY_CHARGE_C * AVOGADRO_per_mol;
/** Relative standard uncertainty 1.5e-10. */
export const VACUUM_PERMITTIVITY_F_m = 8.854_187_8128e-12;
/** Standard acceleration of gravity, exact by definition (CGPM 1901). */
export const GRAVITY_m_s2 = 9.80665;
export const ZERO_CELSIUS_K = 273.15;
/** 1 debye = 1e-21 C m² s⁻¹ / c. */
export const DEBYE_C_m = 1e-21 / LIGHT_SPEED_m_s;

/**
 * Closest approach of two bare surfaces [m], the cut-off of the van der Waals energy at contact.
 * Source: Israelachvili, Intermolecular and Surface Forces, 3rd ed. 2011, section 13.13 (from memory).
 */
export const CONTACT_SEPARATION_m = 0.165e-9;
