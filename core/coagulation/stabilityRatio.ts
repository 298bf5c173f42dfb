import { logAdd, logIntegral } from '../numerics/logIntegral';
import { mustBePositive } from '../validity';
import { hydrodynamicFactor } from './hydrodynamicFactor';

export interface ApproachingPair {
  /** Energy in kT against the gap between the surfaces. */
  readonly energy_kT: (separation_m: number) => number;
  readonly radius1_m: number;
  readonly radius2_m: number;
  /** Gap at which a pair counts as caught. */
  readonly contact_m: number;
  /** How the liquid between the spheres slows them, against h/ā; {@link hydrodynamicFactor} when not given. */
  readonly hydrodynamics?: (gapOverRadius: number) => number;
}

/** Beyond this many radii the energy is taken as zero and the rest of the integral is closed. */
const FAR_RADII = 1e3;

/**
 * Natural logarithm of the stability ratio W: how many times slower particles stick than free encounters would let them.
 *
 *     W = (a₁ + a₂) ∫ B(h) exp(V/kT)/(a₁ + a₂ + h)² dh,   from contact outwards
 *
 * Integrated in ln h in the log domain, so that barriers of thousands of kT neither overflow nor lose digits.
 * Starting at contact (0.165 nm for bare spheres) instead of zero leaves out a stretch in which van der Waals attraction
 * makes the integrand vanish. For attraction alone it changes ln W by less than 1e-12 for A of 1e-20 J and 100 nm, by
 * 5e-9 for 5e-21 J and 25 nm, and by 0.002 for 1e-21 J and 25 nm, where contact itself is but 3 kT deep.
 *
 * Source  Fuchs, Z. Phys. 89 (1934) 736; hydrodynamic factor see {@link hydrodynamicFactor}.
 * Valid   dilute pairs; a repulsion that reaches beyond the mean gap is many-bodied.
 * Throws  RangeError for an input that is not positive, or an energy that is not a number.
 */
export function lnStabilityRatio({
  energy_kT,
  radius1_m,
  radius2_m,
  contact_m,
  hydrodynamics = hydrodynamicFactor,
}: ApproachingPair): number {
  mustBePositive('lnStabilityRatio', { radius1_m, radius2_m, contact_m });
  const reach_m = radius1_m + radius2_m;
  const meanRadius_m = (2 * radius1_m * radius2_m) / reach_m;
  const far_m = FAR_RADII * Math.max(radius1_m, radius2_m, contact_m);
  const logIntegrand = (logSeparation: number): number => {
    const separation_m = Math.exp(logSeparation);
    const energy = energy_kT(separation_m);
    if (Number.isNaN(energy)) throw new RangeError(`lnStabilityRatio: no energy at a gap of ${separation_m} m`);
    return (
      energy +
      Math.log(hydrodynamics(separation_m / meanRadius_m)) -
      2 * Math.log1p(separation_m / reach_m) +
      logSeparation -
      Math.log(reach_m)
    );
  };
  const near = logIntegral(logIntegrand, Math.log(contact_m), Math.log(far_m));
  // Out there B − 1 falls as 1/h, so that on average half of it is left.
  const slowing = (1 + hydrodynamics(far_m / meanRadius_m)) / 2;
  const rest = Math.log((slowing * reach_m) / (reach_m + far_m));
  return logAdd(near, rest);
}
