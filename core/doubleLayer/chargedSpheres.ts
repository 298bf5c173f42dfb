import { VACUUM_PERMITTIVITY_F_m } from '../constants';

/** Two charged spheres in a medium. Gap, radii and potentials all belong to the same planes: here the slip planes. */
export interface ChargedSpheres {
  readonly gap_m: number;
  readonly radius1_m: number;
  readonly radius2_m: number;
  readonly potential1_V: number;
  readonly potential2_V: number;
  readonly inverseDebyeLength_per_m: number;
  readonly relativePermittivity: number;
}

/** What the non-linear theory asks for besides. */
export interface ChargedSpheresInSalt extends ChargedSpheres {
  readonly temperature_K: number;
  /** z of a symmetric z:z salt. */
  readonly valence: number;
}

/** Guards the formulas on the hot path: one expression, named only when it fails. Throws RangeError. */
export function mustBeSpheres(where: string, spheres: Omit<ChargedSpheres, 'potential1_V' | 'potential2_V'>): void {
  const { gap_m, radius1_m, radius2_m, inverseDebyeLength_per_m, relativePermittivity } = spheres;
  const positive =
    gap_m > 0 && radius1_m > 0 && radius2_m > 0 && inverseDebyeLength_per_m > 0 && relativePermittivity > 0;
  if (!positive || !(gap_m + radius1_m + radius2_m + inverseDebyeLength_per_m + relativePermittivity < Infinity)) {
    throw new RangeError(
      `${where}: gap_m, radius1_m, radius2_m, inverseDebyeLength_per_m and relativePermittivity must be finite and above zero, got ${gap_m}, ${radius1_m}, ${radius2_m}, ${inverseDebyeLength_per_m}, ${relativePermittivity}`,
    );
  }
}

/** As {@link mustBeSpheres}, for the two potentials. */
export function mustBePotentials(where: string, potential1_V: number, potential2_V: number): void {
  if (!(Math.abs(potential1_V) + Math.abs(potential2_V) < Infinity)) {
    throw new RangeError(
      `${where}: potential1_V and potential2_V must be finite, got ${potential1_V}, ${potential2_V}`,
    );
  }
}

/** πε a₁a₂/(a₁+a₂) [F]: with it and squared potentials, Derjaguin's energy of two spheres. */
export const derjaguinCapacity = (
  spheres: Pick<ChargedSpheres, 'radius1_m' | 'radius2_m' | 'relativePermittivity'>,
): number =>
  (Math.PI * spheres.relativePermittivity * VACUUM_PERMITTIVITY_F_m * spheres.radius1_m) /
  (1 + spheres.radius1_m / spheres.radius2_m);
