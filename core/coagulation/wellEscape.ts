import { BOLTZMANN_J_K } from '../constants';
import { forEachGaussPoint } from '../numerics/gaussLegendre';
import { logAdd } from '../numerics/logIntegral';
import { mustBePositive } from '../validity';
import { hydrodynamicFactor } from './hydrodynamicFactor';

export interface BoundPair {
  /** Energy in kT against the gap between the surfaces. */
  readonly energy_kT: (separation_m: number) => number;
  readonly radius1_m: number;
  readonly radius2_m: number;
  /** The barrier, taken as a wall that the pair does not cross. */
  readonly barrier_m: number;
  /** Bottom of the well, where the pair starts. */
  readonly well_m: number;
  /** Gap at which the pair counts as parted. */
  readonly parted_m: number;
  readonly temperature_K: number;
  readonly viscosity_Pa_s: number;
}

/** In ln h, on each side of the bottom: agrees with 20 digits to 1e-12 for wells of 1.5 to 25 kT. */
const PANELS = 64;

/**
 * Natural logarithm of the mean time [s] that a pair stays in an outer well before heat parts it.
 *
 *     t = ∫_well^parted B(h) e^V/(D r²) ∫_barrier^h r'² e^(−V) dh' dh,   r = a₁ + a₂ + h,   D = (kT/6πη)(1/a₁ + 1/a₂)
 *
 * Mean first passage with the barrier as a reflecting wall, in the log domain. The inner
 * integral is carried along from panel to panel.
 *
 * Source  Kramers, Physica 7 (1940) 284, in the exact one-dimensional form (from memory); B: {@link hydrodynamicFactor}.
 * Valid   dilute pairs at rest. For shallow wells the time is that of diffusing to `parted_m`, and so depends on it.
 * Throws  RangeError for an input that is not positive, or gaps that are not in rising order.
 */
export function lnEscapeTime(pair: BoundPair): number {
  const { energy_kT, radius1_m, radius2_m, barrier_m, well_m, parted_m, temperature_K, viscosity_Pa_s } = pair;
  mustBePositive('lnEscapeTime', { radius1_m, radius2_m, barrier_m, temperature_K, viscosity_Pa_s });
  if (!(barrier_m < well_m && well_m < parted_m && parted_m < Number.POSITIVE_INFINITY)) {
    throw new RangeError(
      `lnEscapeTime: gaps must rise from barrier to well to parted: ${barrier_m}, ${well_m}, ${parted_m}`,
    );
  }
  const reach_m = radius1_m + radius2_m;
  const meanRadius_m = (2 * radius1_m * radius2_m) / reach_m;
  /** ln of r² e^(−V) h, the weight of being at a gap, per unit of ln h. */
  const logPresence = (logGap: number): number => {
    const gap_m = Math.exp(logGap);
    return 2 * Math.log(reach_m + gap_m) - energy_kT(gap_m) + logGap;
  };
  /** ln of B e^V h/r², the resistance of a gap, per unit of ln h. */
  const logResistance = (logGap: number): number => {
    const gap_m = Math.exp(logGap);
    return (
      Math.log(hydrodynamicFactor(gap_m / meanRadius_m)) + energy_kT(gap_m) - 2 * Math.log(reach_m + gap_m) + logGap
    );
  };
  const logPresenceBetween = (from: number, to: number): number => {
    let sum = Number.NEGATIVE_INFINITY;
    forEachGaussPoint(from, to, (x, weight) => {
      sum = logAdd(sum, logPresence(x) + Math.log(weight));
    });
    return sum;
  };
  let inside = Number.NEGATIVE_INFINITY;
  let time = Number.NEGATIVE_INFINITY;
  const walk = (from: number, to: number, counts: boolean): void => {
    const step = (to - from) / PANELS;
    for (let panel = 0; panel < PANELS; panel += 1) {
      const start = from + panel * step;
      if (counts) {
        forEachGaussPoint(start, start + step, (x, weight) => {
          const upToHere = logAdd(inside, logPresenceBetween(start, x));
          time = logAdd(time, logResistance(x) + Math.log(weight) + upToHere);
        });
      }
      inside = logAdd(inside, logPresenceBetween(start, start + step));
    }
  };
  walk(Math.log(barrier_m), Math.log(well_m), false);
  walk(Math.log(well_m), Math.log(parted_m), true);
  const mobility = (BOLTZMANN_J_K * temperature_K) / (6 * Math.PI * viscosity_Pa_s);
  return time - Math.log(mobility * (1 / radius1_m + 1 / radius2_m));
}
