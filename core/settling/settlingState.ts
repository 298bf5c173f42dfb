import { BOLTZMANN_J_K, GRAVITY_m_s2 } from '../constants';
import type { SettlingState } from '../evaluation';
import { mustBePositive, mustNotBeNegative } from '../validity';
import { hindrance } from './hinderedSettling';
import { stokesVelocity } from './stokes';
import { suspendingYieldStress } from './suspendingYieldStress';

export interface SettlingQuestion {
  readonly radius_m: number;
  /** Particle less medium. */
  readonly densityDifference_kg_m3: number;
  readonly viscosity_Pa_s: number;
  readonly temperature_K: number;
  /** Of all particles together. */
  readonly volumeFraction: number;
  readonly fillHeight_m: number;
  /** Share of the fill height, 0 to 1. */
  readonly acceptedClearLayer: number;
}

/** Longest gravitational length and time that are told apart from "never": beyond any can and any shelf life. */
const LONGEST_m = 1e6;

/**
 * How fast particles settle in a can at rest, and when the accepted clear layer has formed.
 *
 *     t = f H/v,   v hindered;   l = kT/(4/3 π a³ |Δρ| g),   Pe = a/l
 *
 * The gravitational length l is the height over which Brownian motion keeps particles up: as long as the can is filled,
 * they never settle.
 *
 * Source  laws in the imports; l: Perrin 1909 (from memory).
 * Throws  RangeError for an input that is not positive (a density difference may have either sign).
 */
export function settlingState(question: SettlingQuestion): SettlingState {
  const { radius_m, densityDifference_kg_m3, temperature_K, volumeFraction, fillHeight_m, acceptedClearLayer } =
    question;
  mustBePositive('settlingState', { radius_m, temperature_K, fillHeight_m, acceptedClearLayer });
  mustNotBeNegative('settlingState', { volumeFraction });
  const stokesVelocity_m_s = stokesVelocity(question);
  const weight_N = (4 / 3) * Math.PI * radius_m ** 3 * Math.abs(densityDifference_kg_m3) * GRAVITY_m_s2;
  const thermalEnergy_J = BOLTZMANN_J_K * temperature_K;
  const gravitationalLength_m = weight_N > thermalEnergy_J / LONGEST_m ? thermalEnergy_J / weight_N : LONGEST_m;
  const pecletNumber = radius_m / gravitationalLength_m;
  const hinderedVelocity_m_s = stokesVelocity_m_s * hindrance(volumeFraction, pecletNumber);
  return {
    stokesVelocity_m_s,
    hinderedVelocity_m_s,
    timeToClear_s: (acceptedClearLayer * fillHeight_m) / Math.abs(hinderedVelocity_m_s),
    pecletNumber,
    gravitationalLength_m,
    suspendingYieldStress_Pa: suspendingYieldStress(radius_m, densityDifference_kg_m3),
  };
}
