import { ZERO_CELSIUS_K } from '../constants';
import { mustBePositive, type Span } from '../validity';

export const waterDensityValidity_K: Span = { from: ZERO_CELSIUS_K, to: ZERO_CELSIUS_K + 100 };

/**
 * Density of air-free water at atmospheric pressure [kg/m³].
 *
 *     ρ = (999.83952 + 16.945176 t − 7.9870401e-3 t² − 4.6170461e-5 t³ + 1.0556302e-7 t⁴ − 2.8054253e-10 t⁵)
 *         / (1 + 1.6879850e-2 t),  t in °C
 *
 * Source  Kell 1975 (from memory).
 * Valid   see {@link waterDensityValidity_K}; within 0.01 kg/m³ there.
 * Throws  RangeError for a temperature that is not above −59 °C, where the formula has its pole.
 */
export function waterDensity(temperature_K: number): number {
  const t = temperature_K - ZERO_CELSIUS_K; // °C
  const denominator = 1 + 1.687985e-2 * t;
  mustBePositive('waterDensity', { temperature_K, denominator });
  const numerator =
    999.83952 + t * (16.945176 + t * (-7.9870401e-3 + t * (-4.6170461e-5 + t * (1.0556302e-7 - 2.8054253e-10 * t))));
  return numerator / denominator;
}
