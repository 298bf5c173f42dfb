import { BOLTZMANN_J_K } from '../constants';
import { mustBePositive } from '../validity';

export interface CollisionPair {
  readonly radius1_m: number;
  readonly radius2_m: number;
  readonly temperature_K: number;
  readonly viscosity_Pa_s: number;
}

/**
 * Rate constant of Brownian encounters [m³/s], the collision kernel of Smoluchowski.
 *
 *     K = (2kT/3η) (a₁ + a₂)²/(a₁a₂);   8kT/3η for equal spheres, with dn/dt = −½ K n² of the total count
 *
 * Source  von Smoluchowski, Z. Phys. Chem. 92 (1917) 129.
 * Valid   dilute, no forces and no hydrodynamic interaction: those are in the stability ratio.
 * Throws  RangeError for an input that is not positive.
 */
export function collisionRate({ radius1_m, radius2_m, temperature_K, viscosity_Pa_s }: CollisionPair): number {
  mustBePositive('collisionRate', { radius1_m, radius2_m, temperature_K, viscosity_Pa_s });
  const shape = (radius1_m + radius2_m) ** 2 / (radius1_m * radius2_m);
  return ((2 * BOLTZMANN_J_K * temperature_K) / (3 * viscosity_Pa_s)) * shape;
}
