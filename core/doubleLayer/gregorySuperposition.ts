import { mustBeFinite, mustBePositive } from '../validity';
import { type ChargedSpheresInSalt, derjaguinCapacity, mustBeSpheres } from './chargedSpheres';
import { thermalVoltage } from './thermalVoltage';

/**
 * Double-layer energy [J] by linear superposition, for spheres much larger than the Debye length.
 *
 *     V = 64πε a₁a₂/(a₁+a₂) (kT/ze)² γ₁γ₂ e^(−κh),   γ = tanh(zeψ/4kT)
 *
 * Source  Gregory, J. Colloid Interface Sci. 51 (1975) 44 (from memory).
 * Valid   any potential, symmetric z:z salt, κh above 1, κa above about 10, h ≪ a: what superposition.ts becomes for large
 *         κa. Kept to compare with.
 * Throws  RangeError for a non-finite potential, or another input that is not positive.
 */
export function gregorySuperpositionEnergy(spheres: ChargedSpheresInSalt): number {
  const { gap_m, potential1_V, potential2_V, inverseDebyeLength_per_m, temperature_K, valence } = spheres;
  mustBeSpheres('gregorySuperpositionEnergy', spheres);
  mustBeFinite('gregorySuperpositionEnergy', { potential1_V, potential2_V });
  mustBePositive('gregorySuperpositionEnergy', { temperature_K, valence });
  const unit_V = thermalVoltage(temperature_K) / valence;
  const gamma = (potential_V: number): number => Math.tanh(potential_V / (4 * unit_V));
  const strength = 64 * unit_V ** 2 * gamma(potential1_V) * gamma(potential2_V);
  return derjaguinCapacity(spheres) * strength * Math.exp(-inverseDebyeLength_per_m * gap_m);
}
