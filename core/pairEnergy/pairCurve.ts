import type { PairCurve } from '../evaluation';
import type { PairForces } from './pairForces';

/** The energy curve and its parts in kT on the given gaps. The total is the sum of the parts, point by point. */
export function pairCurve(forces: PairForces, separation_m: Float64Array): PairCurve {
  const { thermalEnergy_J } = forces;
  const inKT = (energy_J: (separation_m: number) => number): Float64Array =>
    separation_m.map((gap_m) => energy_J(gap_m) / thermalEnergy_J);
  const vanDerWaals_kT = inKT(forces.vanDerWaals_J);
  const doubleLayer_kT = inKT(forces.doubleLayer_J);
  const stericLayer_kT = inKT(forces.stericLayer_J);
  const total_kT = separation_m.map(
    (_, index) => vanDerWaals_kT[index] + doubleLayer_kT[index] + stericLayer_kT[index],
  );
  return { separation_m, total_kT, vanDerWaals_kT, doubleLayer_kT, stericLayer_kT };
}
