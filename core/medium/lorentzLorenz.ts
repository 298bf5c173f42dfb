import { mustBePositive } from '../validity';

export interface IndexShare {
  readonly volumeFraction: number;
  readonly refractiveIndex: number;
}

/**
 * Refractive index of a mixed liquid [-].
 *
 *     (n² − 1)/(n² + 2) = Σ φᵢ (nᵢ² − 1)/(nᵢ² + 2)
 *
 * Source  Born & Wolf 1999, section 2.3.3, Lorentz–Lorenz relation with additive refraction (from memory).
 * Valid   no change of volume on mixing; within about 0.005 for common solvents.
 * Throws  RangeError for an index or share that is not above zero.
 */
export function lorentzLorenz(shares: readonly IndexShare[]): number {
  let refraction = 0;
  for (const { volumeFraction, refractiveIndex } of shares) {
    mustBePositive('lorentzLorenz', { volumeFraction, refractiveIndex });
    const squared = refractiveIndex ** 2;
    refraction += (volumeFraction * (squared - 1)) / (squared + 2);
  }
  return Math.sqrt((1 + 2 * refraction) / (1 - refraction));
}
