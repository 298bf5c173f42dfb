import { mustBeFinite, mustBePositive, mustNotBeNegative } from '../validity';
import { logOneMinusExp } from './logOneMinusExp';
import { thermalVoltage } from './thermalVoltage';

interface SlipPlane {
  /** Distance of the plane of shear from the plane where the diffuse layer starts. */
  readonly slipPlane_m: number;
  readonly inverseDebyeLength_per_m: number;
  readonly temperature_K: number;
  /** z of a symmetric z:z salt. */
  readonly valence: number;
}

/** −ln tanh(w/2), its own inverse. In it the fall of the potential across the layer is a plain sum: no digits are lost. */
const logCoth = (w: number): number => Math.log1p(Math.exp(-w)) - logOneMinusExp(w);

function guarded(where: string, plane: SlipPlane, potential: Readonly<Record<string, number>>) {
  const { slipPlane_m, inverseDebyeLength_per_m, temperature_K, valence } = plane;
  mustBeFinite(where, potential);
  mustNotBeNegative(where, { slipPlane_m });
  mustBePositive(where, { inverseDebyeLength_per_m, temperature_K, valence });
  return {
    fall: slipPlane_m * inverseDebyeLength_per_m,
    unit_V: (2 * thermalVoltage(temperature_K)) / valence,
  };
}

/**
 * Potential at the start of the diffuse layer [V] that gives this zeta at the slip plane; null when none can.
 *
 *     tanh(zeζ/4kT) = tanh(zeψ_d/4kT) e^(−κΔ)
 *
 * Far out the potential of the strongest charge is bounded: a zeta above that bound means that Δ is too large, or that
 * the zeta is wrong.
 *
 * Source  Gouy–Chapman potential profile; used for zeta by Eversole & Boardman, J. Chem. Phys. 9 (1941) 798 (from memory).
 * Valid   flat surface (radius of several Debye lengths), symmetric salt; other salts only for |ζ| below about 25 mV.
 * Throws  RangeError for a non-finite potential, a negative distance, or another input that is not positive.
 */
export function surfacePotentialFromZeta({ zeta_V, ...plane }: SlipPlane & { readonly zeta_V: number }): number | null {
  const { fall, unit_V } = guarded('surfacePotentialFromZeta', plane, { zeta_V });
  if (zeta_V === 0 || fall === 0) return zeta_V;
  const left = logCoth(Math.abs(zeta_V) / unit_V) - fall;
  return left > 0 ? Math.sign(zeta_V) * unit_V * logCoth(left) : null;
}

/**
 * Zeta [V]: potential at the slip plane of a surface whose diffuse layer starts at `surfacePotential_V`.
 *
 * Formula, source and range as {@link surfacePotentialFromZeta}, of which it is the inverse.
 */
export function zetaFromSurfacePotential({
  surfacePotential_V,
  ...plane
}: SlipPlane & { readonly surfacePotential_V: number }): number {
  const { fall, unit_V } = guarded('zetaFromSurfacePotential', plane, { surfacePotential_V });
  if (surfacePotential_V === 0 || fall === 0) return surfacePotential_V;
  return Math.sign(surfacePotential_V) * unit_V * logCoth(logCoth(Math.abs(surfacePotential_V) / unit_V) + fall);
}
