import { ZERO_CELSIUS_K } from '../constants';
import { mustBePositive, type Span } from '../validity';

export const waterPermittivityValidity_K: Span = { from: ZERO_CELSIUS_K, to: ZERO_CELSIUS_K + 100 };

/**
 * Static relative permittivity of water [-].
 *
 *     ε_r = 87.740 − 0.40008 t + 9.398e-4 t² − 1.410e-6 t³,  t in °C
 *
 * Source  Malmberg & Maryott 1956, the cubic of the abstract (from memory).
 * Valid   0–100 °C at atmospheric pressure, see {@link waterPermittivityValidity_K}; their stated error is 0.1 %.
 * Throws  RangeError for a temperature that is not a positive number.
 */
export function waterPermittivity(temperature_K: number): number {
  mustBePositive('waterPermittivity', { temperature_K });
  const t = temperature_K - ZERO_CELSIUS_K; // °C
  return 87.74 + t * (-0.40008 + t * (9.398e-4 - 1.41e-6 * t));
}
