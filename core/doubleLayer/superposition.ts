import { VACUUM_PERMITTIVITY_F_m } from '../constants';
import { mustBeFinite, mustBePositive } from '../validity';
import type { ChargedSpheres, ChargedSpheresInSalt } from './chargedSpheres';
import { curvatureFactor } from './curvatureFactor';
import { thermalVoltage } from './thermalVoltage';

export interface EffectiveSpheres extends Omit<ChargedSpheres, 'potential1_V' | 'potential2_V'> {
  /** Far-field potentials, defined by ψ(r) → ψ_eff (a/r) e^(−κ(r−a)). */
  readonly effectivePotential1_V: number;
  readonly effectivePotential2_V: number;
}

/**
 * Double-layer energy [J] of two spheres from the far ends of their double layers, any ions.
 *
 *     V = 4πε (a₁a₂/r) Ψ₁Ψ₂ e^(−κh),   r = a₁ + a₂ + h
 *
 * Source  Bell, Levine & McCartney, J. Colloid Interface Sci. 33 (1970) 335 (from memory).
 * Valid   κh above 1, any κa, any potential that the effective potentials Ψ are right for.
 * Throws  RangeError for a gap, radius, κ or permittivity that is not positive, or a non-finite potential.
 */
export function superposedEnergy({ gap_m, ...spheres }: EffectiveSpheres): number {
  mustBePositive('superposedEnergy', { gap_m });
  return prepareSuperposition(spheres)(gap_m);
}

/** As {@link superposedEnergy}, checked once and then asked at many gaps above zero: a curve needs thousands. */
export function prepareSuperposition(spheres: Omit<EffectiveSpheres, 'gap_m'>): (gap_m: number) => number {
  const { radius1_m, radius2_m, inverseDebyeLength_per_m, relativePermittivity } = spheres;
  const { effectivePotential1_V, effectivePotential2_V } = spheres;
  mustBePositive('prepareSuperposition', { radius1_m, radius2_m, inverseDebyeLength_per_m, relativePermittivity });
  mustBeFinite('prepareSuperposition', { effectivePotential1_V, effectivePotential2_V });
  const permittivity_F_m = relativePermittivity * VACUUM_PERMITTIVITY_F_m;
  const strength = 4 * Math.PI * permittivity_F_m * effectivePotential1_V * effectivePotential2_V; // J/m
  return (gap_m) => {
    const size_m = radius1_m * (radius2_m / (radius1_m + radius2_m + gap_m));
    return strength * size_m * Math.exp(-inverseDebyeLength_per_m * gap_m);
  };
}

/**
 * Double-layer energy [J] by linear superposition, for spheres of any κa in a symmetric z:z salt.
 *
 *     V = 4πε (kT/ze)² (a₁a₂/r) Y₁Y₂ e^(−κh)
 *     Y = 8 tanh(y/4) / ( 1 + [1 − (2κa+1)/(κa+1)² tanh²(y/4)]^½ ),   y = zeψ/kT
 *
 * Source  Bell, Levine & McCartney, J. Colloid Interface Sci. 33 (1970) 335 (from memory).
 * Valid   κh above 1, symmetric salt; κa as in {@link curvatureFactor}. Other salts: effectivePotential.ts with {@link superposedEnergy}.
 * Throws  RangeError for a non-finite potential, or another input that is not positive.
 */
export function superpositionEnergy(spheres: ChargedSpheresInSalt): number {
  const { potential1_V, potential2_V, inverseDebyeLength_per_m, temperature_K, valence } = spheres;
  mustBeFinite('superpositionEnergy', { potential1_V, potential2_V });
  mustBePositive('superpositionEnergy', { temperature_K, valence });
  const unit_V = thermalVoltage(temperature_K) / valence;
  const effective = (potential_V: number, radius_m: number): number => {
    const t = Math.tanh(potential_V / (4 * unit_V));
    return 4 * unit_V * t * curvatureFactor(inverseDebyeLength_per_m * radius_m, t);
  };
  return superposedEnergy({
    ...spheres,
    effectivePotential1_V: effective(potential1_V, spheres.radius1_m),
    effectivePotential2_V: effective(potential2_V, spheres.radius2_m),
  });
}
