/**
 * Hough & White, Adv. Colloid Interface Sci. 14 (1980) 3-41, tables of A at 25 °C; from memory.
 *
 * For silica, quartz, polystyrene, PMMA, PTFE and the alkanes the oscillators in the catalogue come from the same
 * paper, so agreement there shows the formula and the sum, not the data.
 */
/** Like bodies across vacuum, in zJ (1e-21 J). */
export const acrossVacuum = {
  rows: [
    { first: 'pentane', medium: 'vacuum', second: 'pentane', hamakerConstant_zJ: 37.5 },
    { first: 'heptane', medium: 'vacuum', second: 'heptane', hamakerConstant_zJ: 43.2 },
    { first: 'decane', medium: 'vacuum', second: 'decane', hamakerConstant_zJ: 48.2 },
    { first: 'hexadecane', medium: 'vacuum', second: 'hexadecane', hamakerConstant_zJ: 52.3 },
    { first: 'quartz', medium: 'vacuum', second: 'quartz', hamakerConstant_zJ: 88.3 },
    { first: 'alumina-alpha', medium: 'vacuum', second: 'alumina-alpha', hamakerConstant_zJ: 156 },
    { first: 'polystyrene', medium: 'vacuum', second: 'polystyrene', hamakerConstant_zJ: 65.8 },
    { first: 'pvc', medium: 'vacuum', second: 'pvc', hamakerConstant_zJ: 77.8 },
    { first: 'water', medium: 'vacuum', second: 'water', hamakerConstant_zJ: 37 },
  ],
} as const;

/** Like bodies across water, in zJ. */
export const acrossWater = {
  rows: [
    { first: 'pentane', medium: 'water', second: 'pentane', hamakerConstant_zJ: 3.36 },
    { first: 'hexane', medium: 'water', second: 'hexane', hamakerConstant_zJ: 3.6 },
    { first: 'heptane', medium: 'water', second: 'heptane', hamakerConstant_zJ: 3.86 },
    { first: 'octane', medium: 'water', second: 'octane', hamakerConstant_zJ: 4.1 },
    { first: 'decane', medium: 'water', second: 'decane', hamakerConstant_zJ: 4.62 },
    { first: 'dodecane', medium: 'water', second: 'dodecane', hamakerConstant_zJ: 5.02 },
    { first: 'hexadecane', medium: 'water', second: 'hexadecane', hamakerConstant_zJ: 5.4 },
    { first: 'silica-amorphous', medium: 'water', second: 'silica-amorphous', hamakerConstant_zJ: 8.49 },
    { first: 'quartz', medium: 'water', second: 'quartz', hamakerConstant_zJ: 17 },
    { first: 'calcite', medium: 'water', second: 'calcite', hamakerConstant_zJ: 22.3 },
    { first: 'alumina-alpha', medium: 'water', second: 'alumina-alpha', hamakerConstant_zJ: 53.2 },
    { first: 'pmma', medium: 'water', second: 'pmma', hamakerConstant_zJ: 10.5 },
    { first: 'polystyrene', medium: 'water', second: 'polystyrene', hamakerConstant_zJ: 9.5 },
    { first: 'polyisoprene', medium: 'water', second: 'polyisoprene', hamakerConstant_zJ: 7.43 },
    { first: 'pvc', medium: 'water', second: 'pvc', hamakerConstant_zJ: 13 },
    { first: 'ptfe', medium: 'water', second: 'ptfe', hamakerConstant_zJ: 3.33 },
  ],
} as const;

/** Quartz, a water film, vacuum. */
export const quartzWaterFilm = {
  rows: [{ first: 'quartz', medium: 'water', second: 'vacuum', hamakerConstant_zJ: -18.3 }],
} as const;

/** Oil, a water film, vacuum; the digits are recalled with little confidence. */
export const oilWaterFilms = {
  rows: [
    { first: 'pentane', medium: 'water', second: 'vacuum', hamakerConstant_zJ: 1.53 },
    { first: 'heptane', medium: 'water', second: 'vacuum', hamakerConstant_zJ: -1.18 },
    { first: 'octane', medium: 'water', second: 'vacuum', hamakerConstant_zJ: -2.01 },
  ],
} as const;
