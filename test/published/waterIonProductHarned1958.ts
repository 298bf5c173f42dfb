/** Harned & Owen, The Physical Chemistry of Electrolytic Solutions, 3rd ed. 1958, pK_w from cells; from memory. */
export const waterIonProductTable = {
  source: 'Harned1958',
  where: 'table of the ion product of water',
  read: 'memory',
  /** The fit follows the cell measurements within a hundredth. */
  tolerance: 0.01,
  rows: [
    { temperature_degC: 0, pKw: 14.944 },
    { temperature_degC: 20, pKw: 14.167 },
    { temperature_degC: 25, pKw: 13.996 },
    { temperature_degC: 40, pKw: 13.535 },
    { temperature_degC: 60, pKw: 13.017 },
  ],
} as const;
