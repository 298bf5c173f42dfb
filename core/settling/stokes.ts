import { GRAVITY_m_s2 } from '../constants';
import { mustBeFinite, mustBePositive } from '../validity';

/**
 * Velocity of a single sphere falling in a liquid at rest [m/s]; negative: it rises.
 *
 *     v = 2 Δρ g a²/(9 η)
 *
 * Source  Stokes 1851; Shaw, Introduction to Colloid and Surface Chemistry, 4th ed., chapter 2 (from memory).
 * Valid   Reynolds number below about 0.2: any pigment. No yield stress.
 * Throws  RangeError for a radius or viscosity that is not positive, or a density difference that is not finite.
 */
export function stokesVelocity(sphere: {
  readonly radius_m: number;
  readonly densityDifference_kg_m3: number;
  readonly viscosity_Pa_s: number;
}): number {
  const { radius_m, densityDifference_kg_m3, viscosity_Pa_s } = sphere;
  mustBePositive('stokesVelocity', { radius_m, viscosity_Pa_s });
  mustBeFinite('stokesVelocity', { densityDifference_kg_m3 });
  return (2 * densityDifference_kg_m3 * GRAVITY_m_s2 * radius_m ** 2) / (9 * viscosity_Pa_s);
}
