/**
 * Israelachvili, Intermolecular and Surface Forces, 3rd ed. 2011, chapter 14, water at 25 °C; all from memory.
 * The coefficients have three digits, the Bjerrum length two.
 */
export const debyeLengths = {
  temperature_degC: 25,
  relativePermittivity: 78.5,
  /** Debye length in nm is the coefficient over √c, with c in mol/L. */
  rows: [
    { salt: '1:1', valences: [1, -1], parts: [1, 1], coefficient: 0.304 },
    { salt: '2:1', valences: [2, -1], parts: [1, 2], coefficient: 0.176 },
    { salt: '1:2', valences: [1, -2], parts: [2, 1], coefficient: 0.176 },
    { salt: '2:2', valences: [2, -2], parts: [1, 1], coefficient: 0.152 },
  ],
} as const;

export const bjerrumLengthOfWater_nm = 0.71;

/** σ = 0.117 √c sinh(ψ/51.4 mV) C/m², 1:1 salt, c in mol/L. */
export const grahame = { coefficient_C_m2: 0.117, potential_mV: 51.4 };
