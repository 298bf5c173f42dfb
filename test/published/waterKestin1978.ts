/** Kestin, Sokolov & Wakeham, J. Phys. Chem. Ref. Data 7 (1978) 941, viscosity of water; from memory. */
export const waterViscosityTable = {
  source: 'Kestin1978',
  where: 'table of recommended values at atmospheric pressure',
  read: 'memory',
  /** Half a unit of the last digit recalled, 0.5 % for the least. */
  tolerance: 0.005,
  rows: [
    { temperature_degC: 0, viscosity_mPa_s: 1.792 },
    { temperature_degC: 20, viscosity_mPa_s: 1.002 },
    { temperature_degC: 25, viscosity_mPa_s: 0.89 },
    { temperature_degC: 50, viscosity_mPa_s: 0.547 },
    { temperature_degC: 90, viscosity_mPa_s: 0.315 },
  ],
} as const;
