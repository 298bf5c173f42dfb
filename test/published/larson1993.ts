/**
 * Larson, Drummond, Chan & Grieser, J. Am. Chem. Soc. 115 (1993) 11885, abstract, read: rutile in water, Lifshitz
 * calculation 7 ± 1 and force measurement 6 ± 2, in 1e-20 J.
 */
/** In zJ. */
export const calculated = {
  rows: [{ first: 'tio2-rutile', medium: 'water', second: 'tio2-rutile', hamakerConstant_zJ: 70 }],
} as const;

/** Force microscope at the isoelectric point, in zJ. */
export const measured = {
  rows: [{ first: 'tio2-rutile', medium: 'water', second: 'tio2-rutile', low_zJ: 40, high_zJ: 80 }],
} as const;
