import { ZERO_CELSIUS_K } from '../constants';
import { Pa_s_from_mPa_s } from '../quantities/convert';
import { mustBePositive, type Span } from '../validity';

/** The authors go from −8 to 150 °C; below freezing and above boiling the liquid is not what a formulator stores. */
export const waterViscosityValidity_K: Span = { from: ZERO_CELSIUS_K, to: ZERO_CELSIUS_K + 100 };

const VISCOSITY_AT_20_DEGC_mPa_s = 1.002;

/**
 * Dynamic viscosity of water [Pa s].
 *
 *     log₁₀(η/η₂₀) = (20 − t)/(t + 96) · [1.2378 − 1.303e-3 d + 3.06e-6 d² + 2.55e-8 d³],  d = 20 − t,  t in °C,
 *     η₂₀ = 1.002 mPa s
 *
 * Source  Kestin, Sokolov & Wakeham 1978 (from memory). A shorter form with 1.2364, 1.37e-3 and 5.7e-6 is also quoted;
 *         it is meant for 0–40 °C and lies 2 % low at 90 °C.
 * Valid   see {@link waterViscosityValidity_K}; within about 0.5 %.
 * Throws  RangeError for a temperature that is not above −96 °C, where the formula has its pole.
 */
export function waterViscosity(temperature_K: number): number {
  const degreesAbovePole_K = temperature_K - ZERO_CELSIUS_K + 96;
  mustBePositive('waterViscosity', { temperature_K, degreesAbovePole_K });
  const below = 20 - (temperature_K - ZERO_CELSIUS_K); // K
  const log10Ratio =
    (below / degreesAbovePole_K) * (1.2378 + below * (-1.303e-3 + below * (3.06e-6 + 2.55e-8 * below)));
  return Pa_s_from_mPa_s(VISCOSITY_AT_20_DEGC_mPa_s * 10 ** log10Ratio);
}
