/**
 * A pair curve whose extrema are known: a cubic in q = exp(−h/λ),
 *
 *     V = s [ −q³ + 3/2 (q₁ + q₂) q² − 3 q₁ q₂ q ],   dV/dq = −3 s (q − q₁)(q − q₂),   q₁ < q₂
 *
 * with the barrier at q₂ (nearer), V = s q₂² (q₂ − 3 q₁)/2, the outer minimum at q₁ (farther), V = s q₁² (q₁ − 3 q₂)/2,
 * and the fall into contact beyond. The barrier stands below zero when q₂ < 3 q₁. Own algebra.
 */
export interface CubicCurve {
  readonly energy_kT: (separation_m: number) => number;
  readonly barrier: { readonly separation_m: number; readonly energy_kT: number };
  readonly outerMinimum: { readonly separation_m: number; readonly energy_kT: number };
}

export interface CubicPlaces {
  readonly range_m: number;
  readonly barrier_m: number;
  readonly outerMinimum_m: number;
}

/** Scaled so that the maximum stands at `top_kT`, above zero or below. */
export function cubicCurve({ range_m, barrier_m, outerMinimum_m }: CubicPlaces, top_kT: number): CubicCurve {
  // q is taken from the place of the barrier, so that q₂ = 1.
  const far = Math.exp((barrier_m - outerMinimum_m) / range_m);
  const scale_kT = top_kT / ((1 - 3 * far) / 2);
  const at = (q: number): number => scale_kT * q * (-q * q + 1.5 * (far + 1) * q - 3 * far);
  return {
    energy_kT: (separation_m) => at(Math.exp((barrier_m - separation_m) / range_m)),
    barrier: { separation_m: barrier_m, energy_kT: top_kT },
    outerMinimum: { separation_m: outerMinimum_m, energy_kT: (scale_kT * far ** 2 * (far - 3)) / 2 },
  };
}
