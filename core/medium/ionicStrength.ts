import type { IonState } from '../evaluation';

/**
 * Ionic strength [mol/m³].
 *
 *     I = ½ Σ cᵢ zᵢ²
 *
 * Source  Lewis & Randall 1921; IUPAC Gold Book, "ionic strength".
 */
export function ionicStrength(ions: readonly IonState[]): number {
  return ions.reduce((sum, { concentration_mol_m3, valence }) => sum + concentration_mol_m3 * valence ** 2, 0) / 2;
}
