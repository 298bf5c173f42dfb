/** Malmberg & Maryott, J. Res. Natl. Bur. Stand. 56 (1956) 1, table of the permittivity of water; from memory. */
export const waterPermittivityTable = {
  source: 'MalmbergMaryott1956',
  where: 'table of smoothed values',
  read: 'memory',
  /** The authors give 0.1 %; the two decimals printed are finer. */
  tolerance: 0.001,
  rows: [
    { temperature_degC: 0, relativePermittivity: 87.74 },
    { temperature_degC: 20, relativePermittivity: 80.1 },
    { temperature_degC: 25, relativePermittivity: 78.3 },
    { temperature_degC: 50, relativePermittivity: 69.91 },
    { temperature_degC: 100, relativePermittivity: 55.72 },
  ],
} as const;
