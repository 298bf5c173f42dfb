import { mustBeFinite, mustBePositive } from '../validity';
import { hydrodynamicFactor } from './hydrodynamicFactor';

export interface BarrierQuestion {
  readonly lnRequiredStabilityRatio: number;
  /** 2a₁a₂/(a₁+a₂) */
  readonly meanRadius_m: number;
  /** Range of the repulsion: the Debye length, or the thickness of the polymer layer. */
  readonly repulsionRange_m: number;
}

/** Steps of the fixed point; each gains a digit or more, since the barrier enters only by its logarithm. */
const STEPS = 60;

/**
 * Barrier [kT] that a stability ratio asks for, by the saddle-point estimate of Fuchs' integral.
 *
 *     ln W = V + ln[ 2 B(u)/(u + 2)² · √(2π/V)/κa ],   u = 1/κa the place, V(κa)² the curvature of the barrier
 *
 * Source  Reerink & Overbeek, Discuss. Faraday Soc. 18 (1954) 74, with the hydrodynamic factor; own derivation.
 * Valid   barriers above a few kT; within about 1 kT of the full integral for bare spheres of 50 to 150 nm.
 *         Zero where no barrier is needed.
 * Throws  RangeError for lengths that are not positive.
 */
export function requiredBarrier(question: BarrierQuestion): number {
  const { lnRequiredStabilityRatio, meanRadius_m, repulsionRange_m } = question;
  mustBeFinite('requiredBarrier', { lnRequiredStabilityRatio });
  mustBePositive('requiredBarrier', { meanRadius_m, repulsionRange_m });
  const u = repulsionRange_m / meanRadius_m;
  const place = Math.log((2 * hydrodynamicFactor(u) * u) / (u + 2) ** 2) + 0.5 * Math.log(2 * Math.PI);
  let barrier_kT = Math.max(1, lnRequiredStabilityRatio);
  for (let step = 0; step < STEPS; step += 1) {
    barrier_kT = Math.max(0.5, lnRequiredStabilityRatio - place + 0.5 * Math.log(barrier_kT));
  }
  return barrier_kT > 0.5 ? barrier_kT : 0;
}
