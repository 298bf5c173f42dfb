import { mustNotBeNegative } from '../validity';

const CALCIUM_OXIDE_mg_dH = 10; // per litre and degree
const CALCIUM_OXIDE_g_mol = 56.0774;

/**
 * Calcium and magnesium together [mol/m³] in water of a given hardness in German degrees.
 *
 *     c = 10 mg/L CaO per degree / 56.0774 g/mol = 0.1783 mmol/L per degree
 *
 * Source  definition of the German degree, DIN 38409-6 (from memory); molar mass from standard atomic weights 2021.
 * Throws  RangeError for a negative hardness.
 */
export function waterHardness(hardness_dH: number): number {
  mustNotBeNegative('waterHardness', { hardness_dH });
  return (hardness_dH * CALCIUM_OXIDE_mg_dH) / CALCIUM_OXIDE_g_mol;
}
