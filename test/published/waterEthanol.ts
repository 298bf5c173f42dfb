/**
 * Water and ethanol at 25 °C by mass, the best measured pair of an alcohol and water; all from memory.
 * Permittivity: Åkerlöf, J. Am. Chem. Soc. 54 (1932) 4125. Viscosity: handbook table, edition not traced.
 */
export const permittivityOfMixtures = {
  source: 'Akerlof1932',
  where: 'table for ethanol and water, column of 25 °C',
  read: 'memory',
  rows: [
    { ethanol_percent: 20, relativePermittivity: 67 },
    { ethanol_percent: 40, relativePermittivity: 55 },
    { ethanol_percent: 60, relativePermittivity: 43.4 },
    { ethanol_percent: 80, relativePermittivity: 32.8 },
  ],
} as const;

export const viscosityOfMixtures = {
  source: 'HandbookFigure',
  where: 'viscosity of aqueous ethanol at 25 °C',
  read: 'memory',
  rows: [{ ethanol_percent: 40, viscosity_mPa_s: 2.35 }],
} as const;
