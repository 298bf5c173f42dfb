/**
 * Walstra, Physical Chemistry of Foods, 2003, table 12.2; read in an excerpt of the book.
 */
/** Like bodies, in zJ, two digits. */
export const table12_2 = {
  rows: [
    { first: 'water', medium: 'vacuum', second: 'water', hamakerConstant_zJ: 37 },
    { first: 'ethanol', medium: 'vacuum', second: 'ethanol', hamakerConstant_zJ: 42 },
    { first: 'pentane', medium: 'vacuum', second: 'pentane', hamakerConstant_zJ: 38 },
    { first: 'decane', medium: 'vacuum', second: 'decane', hamakerConstant_zJ: 48 },
    { first: 'decane', medium: 'water', second: 'decane', hamakerConstant_zJ: 4.6 },
    { first: 'hexadecane', medium: 'vacuum', second: 'hexadecane', hamakerConstant_zJ: 52 },
    { first: 'polystyrene', medium: 'vacuum', second: 'polystyrene', hamakerConstant_zJ: 65 },
    { first: 'polystyrene', medium: 'water', second: 'polystyrene', hamakerConstant_zJ: 9 },
  ],
} as const;
