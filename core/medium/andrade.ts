import { mustBePositive } from '../validity';

export interface AndradeInput {
  readonly viscosity_Pa_s: number;
  /** Temperature at which `viscosity_Pa_s` was measured. */
  readonly reference_K: number;
  /** B in ln η = A + B/T. */
  readonly slope_K: number;
  readonly temperature_K: number;
}

/**
 * Viscosity [Pa s] of a liquid by the exponential law, through one known point.
 *
 *     η = η_ref exp[B (1/T − 1/T_ref)]
 *
 * Source  Andrade 1934, in the form of Reid, Prausnitz & Poling 1987, chapter 9 (from memory).
 * Valid   some tens of kelvin around the known point; thick liquids bend away on deeper cooling.
 * Throws  RangeError for a non-positive input.
 */
export function andrade({ viscosity_Pa_s, reference_K, slope_K, temperature_K }: AndradeInput): number {
  mustBePositive('andrade', { viscosity_Pa_s, reference_K, slope_K, temperature_K });
  return viscosity_Pa_s * Math.exp(slope_K * (1 / temperature_K - 1 / reference_K));
}
