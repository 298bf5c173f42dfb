/**
 * Ackler, French & Chiang, J. Colloid Interface Sci. 179 (1996) 460-469, full spectral method; from memory, low
 * confidence in the digits.
 */
/** Like bodies across vacuum, in zJ. */
export const acrossVacuum = {
  rows: [
    { first: 'mica', medium: 'vacuum', second: 'mica', hamakerConstant_zJ: 69.6 },
    { first: 'alumina-alpha', medium: 'vacuum', second: 'alumina-alpha', hamakerConstant_zJ: 145 },
    { first: 'silica-amorphous', medium: 'vacuum', second: 'silica-amorphous', hamakerConstant_zJ: 66 },
    { first: 'si3n4', medium: 'vacuum', second: 'si3n4', hamakerConstant_zJ: 174 },
    { first: 'tio2-rutile', medium: 'vacuum', second: 'tio2-rutile', hamakerConstant_zJ: 181 },
  ],
} as const;

/** Like bodies across water, in zJ. */
export const acrossWater = {
  rows: [
    { first: 'alumina-alpha', medium: 'water', second: 'alumina-alpha', hamakerConstant_zJ: 27.5 },
    { first: 'si3n4', medium: 'water', second: 'si3n4', hamakerConstant_zJ: 45 },
  ],
} as const;
