/**
 * CRC Handbook of Chemistry and Physics, 95th edition 2014.
 * Permittivity: the measured point that the table of liquids prints beside each polynomial, read in the open data files
 * of the chemicals library 1.5.2. Viscosity: table of the viscosity of liquids at several temperatures, from memory.
 */
export const permittivityPoints = {
  source: 'CRC2014',
  where: 'permittivity of liquids, column of values at one temperature',
  read: 'transcription',
  /** Point and polynomial come from different fits of scattered measurements: the table is good to 1–2 %. */
  tolerance: 0.02,
  rows: [
    { material: 'water', temperature_K: 293.2, relativePermittivity: 80.1 },
    { material: 'methanol', temperature_K: 293.2, relativePermittivity: 33 },
    { material: 'ethanol', temperature_K: 293.2, relativePermittivity: 25.3 },
    { material: 'ethylene-glycol', temperature_K: 293.2, relativePermittivity: 41.4 },
    { material: 'propylene-glycol', temperature_K: 303.2, relativePermittivity: 27.5 },
    { material: 'glycerol', temperature_K: 293.2, relativePermittivity: 46.53 },
    { material: 'acetone', temperature_K: 293.2, relativePermittivity: 21.01 },
    { material: 'ethyl-acetate', temperature_K: 293.2, relativePermittivity: 6.0814 },
    { material: 'toluene', temperature_K: 296.35, relativePermittivity: 2.379 },
    { material: 'hexane', temperature_K: 293.2, relativePermittivity: 1.8865 },
    { material: 'dichloromethane', temperature_K: 298, relativePermittivity: 8.93 },
    { material: 'thf', temperature_K: 295.2, relativePermittivity: 7.52 },
    { material: 'dmf', temperature_K: 293.2, relativePermittivity: 38.25 },
  ],
} as const;

export const viscosityOfLiquids = {
  source: 'CRC2014',
  where: 'viscosity of liquids, columns of −25 to 100 °C',
  read: 'memory',
  rows: [
    { material: 'toluene', temperature_degC: 0, viscosity_mPa_s: 0.778 },
    { material: 'toluene', temperature_degC: 50, viscosity_mPa_s: 0.424 },
    { material: 'toluene', temperature_degC: 75, viscosity_mPa_s: 0.333 },
    { material: 'ethanol', temperature_degC: 0, viscosity_mPa_s: 1.786 },
    { material: 'ethanol', temperature_degC: 50, viscosity_mPa_s: 0.694 },
    { material: '1-butanol', temperature_degC: 0, viscosity_mPa_s: 5.185 },
    { material: '1-butanol', temperature_degC: 50, viscosity_mPa_s: 1.394 },
    { material: 'ethylene-glycol', temperature_degC: 50, viscosity_mPa_s: 6.55 },
    { material: 'ethylene-glycol', temperature_degC: 75, viscosity_mPa_s: 3.34 },
    { material: 'propylene-glycol', temperature_degC: 0, viscosity_mPa_s: 248 },
    { material: 'propylene-glycol', temperature_degC: 50, viscosity_mPa_s: 11.3 },
    { material: 'glycerol', temperature_degC: 50, viscosity_mPa_s: 152 },
    { material: 'glycerol', temperature_degC: 75, viscosity_mPa_s: 39.8 },
  ],
} as const;
