/**
 * Bergström, Adv. Colloid Interface Sci. 70 (1997) 125-169, table of A1v1 and A1w1 at 298 K; from memory.
 *
 * Across water Bergström used the spectrum of Roth & Lenhoff (1996), which is not in the catalogue. The full-spectrum
 * response of water there does not stand for it: with single-band solids it raises every value, by 6 to 17 %.
 */
/** Like bodies across vacuum, in zJ. */
export const acrossVacuum = {
  rows: [
    { first: 'alumina-alpha', medium: 'vacuum', second: 'alumina-alpha', hamakerConstant_zJ: 152 },
    { first: 'calcite', medium: 'vacuum', second: 'calcite', hamakerConstant_zJ: 101 },
    { first: 'mgo', medium: 'vacuum', second: 'mgo', hamakerConstant_zJ: 121 },
    { first: 'mica', medium: 'vacuum', second: 'mica', hamakerConstant_zJ: 98.6 },
    { first: 'sic', medium: 'vacuum', second: 'sic', hamakerConstant_zJ: 248 },
    { first: 'si3n4', medium: 'vacuum', second: 'si3n4', hamakerConstant_zJ: 167 },
    { first: 'quartz', medium: 'vacuum', second: 'quartz', hamakerConstant_zJ: 88.6 },
    { first: 'silica-amorphous', medium: 'vacuum', second: 'silica-amorphous', hamakerConstant_zJ: 65 },
    { first: 'tio2-rutile', medium: 'vacuum', second: 'tio2-rutile', hamakerConstant_zJ: 153 },
    { first: 'zno', medium: 'vacuum', second: 'zno', hamakerConstant_zJ: 92.1 },
    { first: 'zns', medium: 'vacuum', second: 'zns', hamakerConstant_zJ: 152 },
    { first: 'zro2', medium: 'vacuum', second: 'zro2', hamakerConstant_zJ: 203 },
    { first: 'batio3', medium: 'vacuum', second: 'batio3', hamakerConstant_zJ: 180 },
  ],
} as const;

/** Like bodies across water, in zJ. */
export const acrossWater = {
  rows: [
    { first: 'alumina-alpha', medium: 'water', second: 'alumina-alpha', hamakerConstant_zJ: 36.7 },
    { first: 'mgo', medium: 'water', second: 'mgo', hamakerConstant_zJ: 22.1 },
    { first: 'sic', medium: 'water', second: 'sic', hamakerConstant_zJ: 109 },
    { first: 'quartz', medium: 'water', second: 'quartz', hamakerConstant_zJ: 10.2 },
    { first: 'tio2-rutile', medium: 'water', second: 'tio2-rutile', hamakerConstant_zJ: 53.5 },
    { first: 'zns', medium: 'water', second: 'zns', hamakerConstant_zJ: 48 },
    { first: 'batio3', medium: 'water', second: 'batio3', hamakerConstant_zJ: 80 },
  ],
} as const;
