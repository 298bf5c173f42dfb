import { GRAVITY_m_s2 } from '../constants';
import { mustBeFinite, mustBePositive } from '../validity';

/** Yield stress over (2/3) a |Δρ| g at which a sphere just stays where it is. */
const CRITICAL_YIELD_NUMBER = 0.143;

/**
 * Smallest yield stress of the medium that holds a sphere up for good [Pa].
 *
 *     τ = 0.143 · (2/3) a |Δρ| g
 *
 * Source  Beris, Tsamopoulos, Armstrong & Brown, J. Fluid Mech. 158 (1985) 219 (from memory).
 * Valid   a single sphere in a Bingham fluid. A "yield stress" read off a flow curve may still creep over months.
 * Throws  RangeError for a radius that is not positive, or a density difference that is not finite.
 */
export function suspendingYieldStress(radius_m: number, densityDifference_kg_m3: number): number {
  mustBePositive('suspendingYieldStress', { radius_m });
  mustBeFinite('suspendingYieldStress', { densityDifference_kg_m3 });
  return CRITICAL_YIELD_NUMBER * (2 / 3) * radius_m * Math.abs(densityDifference_kg_m3) * GRAVITY_m_s2;
}
