import { AVOGADRO_per_mol, ELEMENTARY_CHARGE_C, VACUUM_PERMITTIVITY_F_m } from '../constants';
import { mustBeFinite, mustBePositive } from '../validity';
import { thermalVoltage } from './thermalVoltage';

interface SymmetricSalt {
  readonly potential_V: number;
  /** z of the z:z salt. */
  readonly valence: number;
  readonly relativePermittivity: number;
  readonly temperature_K: number;
}

/** A·κ [J/m] at which energy and force vanish together, at κh = 1. */
function critical(where: string, { potential_V, valence, relativePermittivity, temperature_K }: SymmetricSalt) {
  mustBeFinite(where, { potential_V });
  mustBePositive(where, { valence, relativePermittivity, temperature_K });
  const permittivity_F_m = relativePermittivity * VACUUM_PERMITTIVITY_F_m;
  const unit_V = thermalVoltage(temperature_K) / valence;
  const gamma = Math.tanh(potential_V / (4 * unit_V));
  return {
    product_J_m: ((384 * Math.PI) / Math.E) * permittivity_F_m * (unit_V * gamma) ** 2,
    /** c over κ² of a z:z salt. */
    saltPerKappaSquared_mol_m: (permittivity_F_m * unit_V) / (2 * AVOGADRO_per_mol * ELEMENTARY_CHARGE_C * valence),
  };
}

/**
 * Critical coagulation concentration of a z:z salt [mol/m³], where the barrier between equal spheres sinks to zero.
 *
 *     κ = 384π ε (kT/ze)² γ² / (e A),   c = εkT κ² / (2 N_A e² z²),   γ = tanh(zeψ/4kT)
 *
 * (e in "e A" is Euler's number: the barrier vanishes at κh = 1.) The potential is held while salt is added; in practice it
 * falls, and the true concentration is lower. A closed form to compare with: the evaluation finds its limits on the full curve.
 *
 * Source  Derjaguin & Landau 1941; Verwey & Overbeek 1948; in this form Shaw, Introduction to Colloid and Surface Chemistry,
 *         as c = 3.84e-39 γ⁴/(z⁶A²) mol/L at 25 °C in water (from memory).
 * Valid   equal spheres, κa above 10, h ≪ a, no retardation, superposition of the double layers.
 * Throws  RangeError for a non-finite potential, or another input that is not positive.
 */
export function criticalCoagulationConcentration({
  hamakerConstant_J,
  ...salt
}: SymmetricSalt & { readonly hamakerConstant_J: number }): number {
  mustBePositive('criticalCoagulationConcentration', { hamakerConstant_J });
  const { product_J_m, saltPerKappaSquared_mol_m } = critical('criticalCoagulationConcentration', salt);
  return saltPerKappaSquared_mol_m * (product_J_m / hamakerConstant_J) ** 2;
}

/**
 * Hamaker constant [J] that a measured critical coagulation concentration stands for.
 *
 * Inverse of {@link criticalCoagulationConcentration}: formula, source and range there.
 */
export function hamakerConstantFromCoagulation({
  concentration_mol_m3,
  ...salt
}: SymmetricSalt & { readonly concentration_mol_m3: number }): number {
  mustBePositive('hamakerConstantFromCoagulation', { concentration_mol_m3 });
  const { product_J_m, saltPerKappaSquared_mol_m } = critical('hamakerConstantFromCoagulation', salt);
  return product_J_m / Math.sqrt(concentration_mol_m3 / saltPerKappaSquared_mol_m);
}
