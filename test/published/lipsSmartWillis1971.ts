/**
 * Lips, Smart & Willis, Trans. Faraday Soc. 67 (1971) 2979 (journal from memory, values read in the abstract): latex of
 * 126 nm in water coagulates rapidly at 67 to 69 % of Smoluchowski's rate, measured absolutely by light scattering.
 */
export const rapidCoagulation = { diameter_m: 126e-9, efficiency: { low: 0.67, high: 0.69 } };
