/**
 * Drexler, Nanosystems, 1992, table 3.9, read in a public copy of the text: two-point form across vacuum with
 * ħω = 2 aJ for every substance, at 300 K.
 */
export const table3_9 = {
  temperature_K: 300,
  rows: [
    {
      name: 'PTFE',
      refractiveIndex: 1.35,
      staticPermittivity: 2.1,
      frequency_Hz: 3018380000000000,
      hamakerConstant_zJ: 38,
    },
    {
      name: 'polyethylene',
      refractiveIndex: 1.52,
      staticPermittivity: 2.3,
      frequency_Hz: 3018380000000000,
      hamakerConstant_zJ: 76,
    },
    {
      name: 'diamond',
      refractiveIndex: 2.4,
      staticPermittivity: 5.5,
      frequency_Hz: 3018380000000000,
      hamakerConstant_zJ: 340,
    },
    {
      name: 'fused silica',
      refractiveIndex: 1.49,
      staticPermittivity: 3.8,
      frequency_Hz: 3018380000000000,
      hamakerConstant_zJ: 69,
    },
    {
      name: 'water',
      refractiveIndex: 1.33,
      staticPermittivity: 78.5,
      frequency_Hz: 3018380000000000,
      hamakerConstant_zJ: 37,
    },
    {
      name: 'glycerol',
      refractiveIndex: 1.47,
      staticPermittivity: 42.5,
      frequency_Hz: 3018380000000000,
      hamakerConstant_zJ: 66,
    },
  ],
} as const;
