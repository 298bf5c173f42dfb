/**
 * Weber & Kaufhold 2021, kaolinite; read second-hand.
 */
/** In zJ. */
export const acrossVacuum = {
  rows: [{ first: 'kaolin', medium: 'vacuum', second: 'kaolin', hamakerConstant_zJ: 75.4 }],
} as const;

/** In zJ. */
export const acrossWater = {
  rows: [{ first: 'kaolin', medium: 'water', second: 'kaolin', hamakerConstant_zJ: 7.3 }],
} as const;
