/**
 * Shaw, Introduction to Colloid and Surface Chemistry, 4th ed. 1992, chapter 8; from memory.
 * c = 3.84e-39 γ⁴/(z⁶ A²) mol/L in water at 25 °C, A in J; three digits.
 */
export const coagulationCoefficient = {
  temperature_degC: 25,
  relativePermittivity: 78.5,
  coefficient_mol_L_J2: 3.84e-39,
};
