/** German degree of hardness as defined in DIN 38409-6 (1986); from memory, as quoted in the trade to four digits. */
export const germanDegree = {
  source: 'Din38409',
  where: 'definition of the degree',
  read: 'memory',
  /** Half a unit of the last digit. */
  tolerance: 0.0003,
  rows: [{ hardness_dH: 1, alkalineEarth_mol_m3: 0.1783 }],
} as const;
