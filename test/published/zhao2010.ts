/**
 * Zhao, Johnston & co-workers, J. Chem. Theory Comput. 6 (2010) 491, abstract, read: copper phthalocyanine across
 * vacuum. The catalogue's response was fitted to it, so it proves nothing but the sum.
 */
/** In zJ. */
export const acrossVacuum = {
  rows: [{ first: 'pigment-blue-15', medium: 'vacuum', second: 'pigment-blue-15', hamakerConstant_zJ: 135.2 }],
} as const;
