import { mustBePositive } from '../validity';

export interface ViscosityShare {
  readonly moleFraction: number;
  readonly viscosity_Pa_s: number;
}

/**
 * Viscosity of a mixed liquid [Pa s], without the interaction term.
 *
 *     ln η = Σ xᵢ ln ηᵢ   (G = 0)
 *
 * Source  Grunberg & Nissan 1949, equation 1 with G = 0, since G is unknown for most pairs (from memory).
 * Valid   ±30–50 % for mixed organic solvents; alcohols and glycols in water can be two to three times thicker.
 * Throws  RangeError for a viscosity or share that is not above zero.
 */
export function grunbergNissan(shares: readonly ViscosityShare[]): number {
  let logarithm = 0;
  for (const { moleFraction, viscosity_Pa_s } of shares) {
    mustBePositive('grunbergNissan', { moleFraction, viscosity_Pa_s });
    logarithm += moleFraction * Math.log(viscosity_Pa_s);
  }
  return Math.exp(logarithm);
}
