import { mPa_s_from_Pa_s, Pa_s_from_mPa_s } from '../quantities/convert';
import { mustBePositive } from '../validity';

export interface KnownViscosity {
  readonly viscosity_Pa_s: number;
  /** Temperature at which `viscosity_Pa_s` was measured. */
  readonly reference_K: number;
  readonly temperature_K: number;
}

/** Exponent and divisor of the chart, for viscosity in mPa s and temperature in K. */
const EXPONENT = 0.2661;
const DIVISOR_K = 233;

/**
 * Viscosity [Pa s] of a liquid above the temperature at which it is known, from one general curve for all liquids.
 *
 *     η^(−0.2661) = η_ref^(−0.2661) + (T − T_ref)/233,  η in mPa s, T in K
 *
 * Source  Lewis & Squires 1934, in the form of Reid, Prausnitz & Poling 1987, chapter 9 (from memory).
 * Valid   at or above the reference temperature, below boiling; 5–15 % as its users report; against
 *         handbook values glycols are off by 25–45 %, see the test.
 *         Downwards it diverges for thick liquids: there {@link andrade} takes over with the same slope.
 * Throws  RangeError below the reference temperature, or for a non-positive input.
 */
export function lewisSquires({ viscosity_Pa_s, reference_K, temperature_K }: KnownViscosity): number {
  mustBePositive('lewisSquires', { viscosity_Pa_s, reference_K, temperature_K });
  if (temperature_K < reference_K) {
    throw new RangeError(`lewisSquires: temperature_K ${temperature_K} lies below reference_K ${reference_K}`);
  }
  const chart = mPa_s_from_Pa_s(viscosity_Pa_s) ** -EXPONENT + (temperature_K - reference_K) / DIVISOR_K;
  return Pa_s_from_mPa_s(chart ** (-1 / EXPONENT));
}

/** The slope of {@link lewisSquires} at the reference, as Andrade's B = −T² d(ln η)/dT [K]. */
export function slopeAtReference({
  viscosity_Pa_s,
  reference_K,
}: Pick<KnownViscosity, 'viscosity_Pa_s' | 'reference_K'>): number {
  mustBePositive('slopeAtReference', { viscosity_Pa_s, reference_K });
  return (reference_K ** 2 * mPa_s_from_Pa_s(viscosity_Pa_s) ** EXPONENT) / (EXPONENT * DIVISOR_K);
}
