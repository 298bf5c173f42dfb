import { AVOGADRO_per_mol, BOLTZMANN_J_K, ELEMENTARY_CHARGE_C, VACUUM_PERMITTIVITY_F_m } from '../../../core/constants';

export interface ChargedPair {
  readonly radius1_m: number;
  readonly radius2_m: number;
  readonly hamakerConstant_J: number;
  readonly potential_V: number;
  readonly ionicStrength_mol_m3: number;
  readonly relativePermittivity: number;
  readonly temperature_K: number;
}

export interface ChargedSpheres extends Omit<ChargedPair, 'radius1_m' | 'radius2_m'> {
  readonly radius_m: number;
}

export const alike = ({ radius_m, ...rest }: ChargedSpheres): ChargedPair => ({
  radius1_m: radius_m,
  radius2_m: radius_m,
  ...rest,
});

/** V/A of Hamaker 1937; the series where the closed form would lose its digits. */
export function hamakerOverA(h_m: number, a1_m: number, a2_m: number): number {
  const inner = h_m * h_m + 2 * (a1_m + a2_m) * h_m;
  const outer = inner + 4 * a1_m * a2_m;
  const q = (4 * a1_m * a2_m) / outer;
  if (q > 0.3) return -((2 * a1_m * a2_m) / inner + (2 * a1_m * a2_m) / outer + Math.log(inner / outer)) / 6;
  let sum = 0;
  for (let n = 40; n >= 3; n -= 1) sum = sum * q + (0.5 - 1 / n);
  return -(sum * q ** 3) / 6;
}

export function inverseDebyeLength(
  pair: Pick<ChargedPair, 'ionicStrength_mol_m3' | 'relativePermittivity' | 'temperature_K'>,
) {
  const permittivity_F_m = pair.relativePermittivity * VACUUM_PERMITTIVITY_F_m;
  return Math.sqrt(
    (2 * AVOGADRO_per_mol * ELEMENTARY_CHARGE_C ** 2 * pair.ionicStrength_mol_m3) /
      (permittivity_F_m * BOLTZMANN_J_K * pair.temperature_K),
  );
}

/** Attraction after Hamaker and superposed double layers of a 1:1 salt after Gregory 1975, in kT. */
export function energyOf(pair: ChargedPair): (separation_m: number) => number {
  const { radius1_m, radius2_m, hamakerConstant_J, potential_V, relativePermittivity, temperature_K } = pair;
  const kT_J = BOLTZMANN_J_K * temperature_K;
  const kappa = inverseDebyeLength(pair);
  const gamma = Math.tanh((ELEMENTARY_CHARGE_C * potential_V) / (4 * kT_J));
  const mean_m = (2 * radius1_m * radius2_m) / (radius1_m + radius2_m);
  const repulsion_kT =
    (32 *
      Math.PI *
      relativePermittivity *
      VACUUM_PERMITTIVITY_F_m *
      mean_m *
      (kT_J / ELEMENTARY_CHARGE_C) ** 2 *
      gamma ** 2) /
    kT_J;
  return (h_m) =>
    (hamakerConstant_J / kT_J) * hamakerOverA(h_m, radius1_m, radius2_m) + repulsion_kT * Math.exp(-kappa * h_m);
}

/** Born repulsion of two equal spheres, n = 12, in units of A: Feke et al., J. Phys. Chem. 88 (1984) 5735 (from memory). */
export function bornOverA(h_m: number, radius_m: number, collisionDiameter_m: number): number {
  const r = 2 + h_m / radius_m;
  return (
    ((collisionDiameter_m / radius_m) ** 6 / (37_800 * r)) *
    ((r * r - 14 * r + 54) / (r - 2) ** 7 + (60 - 2 * r * r) / r ** 7 + (r * r + 14 * r + 54) / (r + 2) ** 7)
  );
}

export const deviation = (ours: number, theirs: number): number => Math.abs(ours / theirs - 1);
