import { forEachGaussPoint } from '../numerics/gaussLegendre';
import { logAdd } from '../numerics/logIntegral';
import { mustBePositive } from '../validity';

export interface Well {
  /** Energy in kT against the gap between the surfaces. */
  readonly energy_kT: (separation_m: number) => number;
  readonly radius_m: number;
  /** Ends of the well: the barrier, and where the energy has died away. */
  readonly from_m: number;
  readonly to_m: number;
  readonly numberDensity_per_m3: number;
}

const PANELS = 120;

/**
 * Share of equal particles that sit in pairs at equilibrium in an outer well [0 to 1].
 *
 *     β = 2π ∫ r² (e^(−V) − 1) dr over the attractive part,   n₂ = β n₁²,   n = n₁ + 2 n₂,   share = 1 − n₁/n
 *
 * Source  equilibrium of doublets from the second virial coefficient, Hill 1960 (from memory); own quadrature.
 * Valid   shares up to about a third: beyond, triplets and networks form, and the share is a lower bound.
 * Throws  RangeError for an input that is not positive.
 */
export function pairedShare({ energy_kT, radius_m, from_m, to_m, numberDensity_per_m3 }: Well): number {
  mustBePositive('pairedShare', { radius_m, from_m, to_m, numberDensity_per_m3 });
  let logBeta = Number.NEGATIVE_INFINITY;
  const start = Math.log(from_m);
  const step = (Math.log(to_m) - start) / PANELS;
  for (let panel = 0; panel < PANELS; panel += 1) {
    forEachGaussPoint(start + panel * step, start + (panel + 1) * step, (logSeparation, weight) => {
      const separation_m = Math.exp(logSeparation);
      const depth = -energy_kT(separation_m);
      if (depth <= 0) return;
      // ln(e^d − 1) = d + ln(1 − e^(−d))
      const excess = depth + Math.log(-Math.expm1(-depth));
      const shell = 2 * Math.log(2 * radius_m + separation_m) + logSeparation;
      logBeta = logAdd(logBeta, excess + shell + Math.log(2 * Math.PI * weight));
    });
  }
  // 2 β n: twice the doublets per single, were all others single.
  const x = Math.exp(Math.min(logBeta + Math.log(2 * numberDensity_per_m3), 600));
  // 1 − n₁/n with n₁/n = (√(1 + 4x) − 1)/2x, written so that small x keeps its digits and no x gives more than one.
  return Math.tanh(Math.asinh(2 * Math.sqrt(x)) / 2) ** 2;
}
