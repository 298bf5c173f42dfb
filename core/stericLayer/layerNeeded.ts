import { brentRoot } from '../numerics/brentRoot';
import { mustBePositive } from '../validity';

export interface LayerQuestion {
  /** Attraction in joule against the gap between the bare surfaces; it may only weaken with the gap. */
  readonly attraction_J: (separation_m: number) => number;
  readonly thermalEnergy_J: number;
  /** Depth of well that is put up with. */
  readonly toleratedDepth_kT: number;
  /** Closest approach of the bare surfaces. */
  readonly contact_m: number;
}

const FARTHEST_m = 1e-3;

/**
 * Thinnest layer [m], the same on both particles, that keeps the attraction between their cores below a tolerated depth
 * where the layers touch; zero when bare contact is no deeper.
 *
 *     |V(2δ)| = n kT, solved on the full energy
 *
 * Near-contact forms such as δ = A a/(24 n kT) ask for two to three times too much once δ is no longer small against a.
 *
 * Source  criterion after Napper, Polymeric Stabilization of Colloidal Dispersions, 1983 (from memory); own root.
 * Valid   layers that repel from first touch on (χ below 0.5); the root is exact to 1e-12.
 * Throws  RangeError for an input that is not positive, or an attraction still too deep at a gap of 1 mm.
 */
export function layerNeeded({ attraction_J, thermalEnergy_J, toleratedDepth_kT, contact_m }: LayerQuestion): number {
  mustBePositive('layerNeeded', { thermalEnergy_J, toleratedDepth_kT, contact_m });
  const excess_kT = (logGap: number): number => -attraction_J(Math.exp(logGap)) / thermalEnergy_J - toleratedDepth_kT;
  const nearest = Math.log(contact_m);
  if (excess_kT(nearest) <= 0) return 0;
  return Math.exp(brentRoot(excess_kT, nearest, Math.log(FARTHEST_m))) / 2;
}
