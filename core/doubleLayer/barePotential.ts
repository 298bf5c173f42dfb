import { brentRoot } from '../numerics/brentRoot';
import { mustBeFinite, mustBePositive, mustNotBeNegative } from '../validity';
import { flatEffectivePotential } from './effectivePotential';
import type { Ion } from './reducedField';

export interface SlipPlaneInIons {
  readonly ions: readonly Ion[];
  readonly zeta_V: number;
  /** Distance of the slip plane from the bare surface. */
  readonly slipPlane_m: number;
  readonly inverseDebyeLength_per_m: number;
  readonly temperature_K: number;
}

/** Beyond this no surface in a liquid is charged. */
const HIGHEST_V = 2;

/**
 * Potential of the bare surface [V] whose diffuse layer has fallen to zeta at the slip plane, any ions; null when no
 * surface, however highly charged, would still have that zeta so far out.
 *
 *     Ψ(ψ_d) = Ψ(ζ) e^(κΔ),   Ψ the far-field potential
 *
 * Both planes lie in one and the same diffuse layer, so their far fields differ only by the distance between them. In a
 * z:z salt this is Eversole and Boardman's tanh(zeζ/4kT) = tanh(zeψ_d/4kT) e^(−κΔ).
 *
 * Source  Eversole & Boardman, J. Chem. Phys. 9 (1941) 798 (from memory), extended by {@link flatEffectivePotential}.
 * Valid   flat surface, no charge between the two planes.
 * Throws  RangeError as {@link flatEffectivePotential}, or for a negative distance.
 */
export function barePotential(plane: SlipPlaneInIons): number | null {
  const { ions, zeta_V, slipPlane_m, inverseDebyeLength_per_m, temperature_K } = plane;
  mustBeFinite('barePotential', { zeta_V });
  mustNotBeNegative('barePotential', { slipPlane_m });
  mustBePositive('barePotential', { inverseDebyeLength_per_m });
  if (zeta_V === 0 || slipPlane_m === 0) return zeta_V;
  const logFar = (potential_V: number): number =>
    Math.log(Math.abs(flatEffectivePotential({ ions, potential_V, temperature_K }).effectivePotential_V));
  const sign = Math.sign(zeta_V);
  const wanted = logFar(zeta_V) + inverseDebyeLength_per_m * slipPlane_m;
  const excess = (height_V: number): number => logFar(sign * height_V) - wanted;
  if (excess(HIGHEST_V) <= 0) return null;
  return sign * brentRoot(excess, Math.abs(zeta_V), HIGHEST_V, 1e-12);
}
