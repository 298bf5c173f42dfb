import { london } from './london';
import type { MolecularMatter } from './molecularMatter';

export interface MolecularBodies {
  readonly first: MolecularMatter;
  readonly second: MolecularMatter;
  readonly medium: readonly { readonly matter: MolecularMatter; readonly volumeFraction: number }[];
}

/**
 * Hamaker constant A₁₃₂ [J] by summing London's attraction over all pairs of molecules.
 *
 *     A_ij = π² ρ_i ρ_j C_ij,   A₁₃₂ = A₁₂ + A₃₃ − A₁₃ − A₂₃
 *
 * In a mixed medium each kind of molecule counts with its volume fraction. Keesom's and Debye's terms are left out:
 * in a liquid the dipoles hold one another, and summed by pairs they would give 15e-20 J for water alone.
 *
 * Source  Hamaker, Physica 4 (1937) 1058; London, Trans. Faraday Soc. 33 (1937) 8 (both from memory).
 * Valid   trends among molecular liquids, −16 to +25 % across vacuum; much worse for dense, highly refracting solids,
 *         where the molecules are not independent.
 */
export function molecularHamaker({ first, second, medium }: MolecularBodies): number {
  let across = pairSum(first, second);
  for (const { matter, volumeFraction } of medium) {
    across -= volumeFraction * (pairSum(first, matter) + pairSum(second, matter));
    for (const other of medium) {
      across += volumeFraction * other.volumeFraction * pairSum(matter, other.matter);
    }
  }
  return across;
}

/** π² ρ_i ρ_j C_ij: with ρα in place of α, London's C is already per square of volume. */
function pairSum(one: MolecularMatter, other: MolecularMatter): number {
  return (
    Math.PI ** 2 *
    london({
      polarizabilityVolume1_m3: one.polarizabilityDensity,
      polarizabilityVolume2_m3: other.polarizabilityDensity,
      ionizationEnergy1_J: one.characteristicEnergy_J,
      ionizationEnergy2_J: other.characteristicEnergy_J,
    })
  );
}
