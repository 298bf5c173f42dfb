/** Kell, J. Chem. Eng. Data 20 (1975) 97, density of water at one atmosphere; from memory. */
export const waterDensityTable = {
  source: 'Kell1975',
  where: 'table of densities',
  read: 'memory',
  /** Half a unit of the last digit. */
  tolerance_kg_m3: 0.006,
  rows: [
    { temperature_degC: 0, density_kg_m3: 999.84 },
    { temperature_degC: 4, density_kg_m3: 999.97 },
    { temperature_degC: 20, density_kg_m3: 998.2 },
    { temperature_degC: 25, density_kg_m3: 997.05 },
    { temperature_degC: 60, density_kg_m3: 983.2 },
  ],
} as const;
