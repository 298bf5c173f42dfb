import { VACUUM_PERMITTIVITY_F_m } from '../constants';
import { mustBeFinite, mustBePositive } from '../validity';
import { debyeLength } from './debyeLength';
import { type Ion, reducedField, screeningSum } from './reducedField';
import { thermalVoltage } from './thermalVoltage';

/**
 * Charge of a flat surface [C/m²] whose diffuse layer starts at `potential_V`, any ions.
 *
 *     σ = sgn(ψ) √( 2ε kT Σ nᵢ (e^(−zᵢeψ/kT) − 1) )
 *
 * Source  Grahame, Chem. Rev. 41 (1947) 441 (from memory).
 * Valid   point ions of a neutral bulk; a density above about 0.3 C/m² (two charges per nm²) is beyond what point ions mean.
 * Throws  RangeError when no ions are given, for a non-finite potential, another input that is not positive, or a charge
 *         beyond the number range (several volts).
 */
export function flatSurfaceCharge(surface: {
  readonly ions: readonly Ion[];
  readonly potential_V: number;
  readonly relativePermittivity: number;
  readonly temperature_K: number;
}): number {
  const { ions, potential_V, relativePermittivity, temperature_K } = surface;
  mustBeFinite('flatSurfaceCharge', { potential_V });
  const ionicStrength_mol_m3 = screeningSum(ions) / 2;
  const kappa = 1 / debyeLength({ ionicStrength_mol_m3, relativePermittivity, temperature_K }); // 1/m
  const unit_V = thermalVoltage(temperature_K);
  const field_V_m = kappa * unit_V * reducedField(ions, potential_V / unit_V);
  const charge_C_m2 = relativePermittivity * VACUUM_PERMITTIVITY_F_m * field_V_m;
  mustBeFinite('flatSurfaceCharge', { charge_C_m2 });
  return charge_C_m2;
}

/**
 * Charge of a sphere [C/m²] whose diffuse layer starts at `potential_V`, symmetric z:z salt.
 *
 *     σ = (εκkT/ze) [ 2 sinh(y/2) + (4/κa) tanh(y/4) ],   y = zeψ/kT
 *
 * Source  Loeb, Overbeek & Wiersema, The Electrical Double Layer Around a Spherical Colloid Particle, 1961; derived by
 *         Ohshima, Healy & White, J. Colloid Interface Sci. 90 (1982) 17 (both from memory).
 * Valid   κa above 0.5: within 5 %.
 * Throws  RangeError for a non-finite potential, another input that is not positive, or a charge beyond the number range.
 */
export function sphereSurfaceCharge(sphere: {
  readonly radius_m: number;
  readonly potential_V: number;
  readonly inverseDebyeLength_per_m: number;
  readonly relativePermittivity: number;
  readonly temperature_K: number;
  readonly valence: number;
}): number {
  const { radius_m, potential_V, inverseDebyeLength_per_m, relativePermittivity, temperature_K, valence } = sphere;
  mustBeFinite('sphereSurfaceCharge', { potential_V });
  mustBePositive('sphereSurfaceCharge', {
    radius_m,
    inverseDebyeLength_per_m,
    relativePermittivity,
    temperature_K,
    valence,
  });
  const unit_V = thermalVoltage(temperature_K) / valence;
  const y = potential_V / unit_V;
  const field = 2 * Math.sinh(y / 2) + (4 * Math.tanh(y / 4)) / (inverseDebyeLength_per_m * radius_m);
  const charge_C_m2 = relativePermittivity * VACUUM_PERMITTIVITY_F_m * inverseDebyeLength_per_m * unit_V * field;
  mustBeFinite('sphereSurfaceCharge', { charge_C_m2 });
  return charge_C_m2;
}
