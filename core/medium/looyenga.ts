import { mustBePositive } from '../validity';

export interface PermittivityShare {
  readonly volumeFraction: number;
  readonly relativePermittivity: number;
}

/**
 * Static relative permittivity of a mixed liquid [-].
 *
 *     ε^(1/3) = Σ φᵢ εᵢ^(1/3)
 *
 * Source  Looyenga 1965 (from memory; equation number not recalled).
 * Valid   derived for small contrast without structure in the liquid; expect ±10 % for mixed solvents. Ethanol in water
 *         comes out 5–12 % too low, see the test: alcohols and glycols lie nearer to the mean by mass.
 * Throws  RangeError for a permittivity or share that is not above zero.
 */
export function looyenga(shares: readonly PermittivityShare[]): number {
  let root = 0;
  for (const { volumeFraction, relativePermittivity } of shares) {
    mustBePositive('looyenga', { volumeFraction, relativePermittivity });
    root += volumeFraction * Math.cbrt(relativePermittivity);
  }
  return root ** 3;
}
