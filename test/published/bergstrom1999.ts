/**
 * Bergström, Stemme, Dahlfors, Arwin & Ödberg, Cellulose 6 (1999) 1-13, abstract, read: cellulose across water 8.0 zJ.
 */
/** In zJ. */
export const acrossWater = {
  rows: [{ first: 'cellulose', medium: 'water', second: 'cellulose', hamakerConstant_zJ: 8 }],
} as const;
