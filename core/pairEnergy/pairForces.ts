/** The forces between two particles, each as an energy in joule against the gap between the bare surfaces. */
export interface PairForces {
  readonly thermalEnergy_J: number;
  /** Closest approach: bare contact, or the dry polymer of both layers. */
  readonly contact_m: number;
  /** Gaps at which a force sets in or changes its law; the grid puts a point on each. */
  readonly edges_m: readonly number[];
  /** Lengths over which the forces fall off. */
  readonly ranges_m: readonly number[];
  readonly vanDerWaals_J: (separation_m: number) => number;
  readonly doubleLayer_J: (separation_m: number) => number;
  readonly stericLayer_J: (separation_m: number) => number;
}

/** Their sum in kT. The forces are taken to act side by side without changing one another. */
export function totalEnergy(forces: PairForces): (separation_m: number) => number {
  const { vanDerWaals_J, doubleLayer_J, stericLayer_J, thermalEnergy_J } = forces;
  return (separation_m) =>
    (vanDerWaals_J(separation_m) + doubleLayer_J(separation_m) + stericLayer_J(separation_m)) / thermalEnergy_J;
}
