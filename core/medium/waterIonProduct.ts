import { mustBePositive, type Span } from '../validity';

export const waterIonProductValidity_K: Span = { from: 273.15, to: 333.15 };

/**
 * pK_w = −log₁₀(a_H⁺ a_OH⁻), activities in mol/L [-].
 *
 *     pK_w = 4470.99/T − 6.0875 + 0.01706 T,  T in K
 *
 * Source  Harned & Owen 1958, fit to cell measurements (from memory).
 * Valid   0–60 °C, see {@link waterIonProductValidity_K}; within 0.01. At 150 °C it is about 0.1 too high.
 * Throws  RangeError for a temperature that is not a positive number.
 */
export function waterIonProduct(temperature_K: number): number {
  mustBePositive('waterIonProduct', { temperature_K });
  return 4470.99 / temperature_K - 6.0875 + 0.01706 * temperature_K;
}
