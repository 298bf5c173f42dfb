/**
 * Faure et al., Langmuir 27 (2011), abstract, read: iron oxides across water 33 to 39 zJ, across hexane and toluene
 * 9 to 29 zJ. The catalogue's iron oxides were fitted to the values across water, so those rows prove nothing but
 * the sum; those across toluene are a true check.
 */
/** In zJ; the fit was made to these. */
export const acrossWater = {
  rows: [
    { first: 'hematite', medium: 'water', second: 'hematite', hamakerConstant_zJ: 39 },
    { first: 'magnetite', medium: 'water', second: 'magnetite', hamakerConstant_zJ: 33 },
  ],
} as const;

/** In zJ. */
export const acrossToluene = {
  rows: [
    { first: 'hematite', medium: 'toluene', second: 'hematite', low_zJ: 9, high_zJ: 29 },
    { first: 'magnetite', medium: 'toluene', second: 'magnetite', low_zJ: 9, high_zJ: 29 },
  ],
} as const;
