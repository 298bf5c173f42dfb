import type { IonState } from '../evaluation';

/** An ion as the Poisson–Boltzmann equation sees it. */
export type Ion = Pick<IonState, 'valence' | 'concentration_mol_m3'>;

/** Taylor terms of (e^u − 1 − u)/u² kept below |u| = 1: the last, 1/20!, is under the rounding. */
const TERMS = 18;

/** (e^u − 1 − u)/u², which is ½ at u = 0. Summed as a series where the difference cancels. */
function secondRest(u: number): number {
  if (Math.abs(u) >= 1) return (Math.expm1(u) - u) / (u * u);
  let sum = 1;
  for (let n = TERMS; n >= 1; n--) sum = 1 + (sum * u) / (n + 2);
  return sum / 2;
}

/** (e^u − 1 − u − u²/2)/u³, which is 1/6 at u = 0. */
function thirdRest(u: number): number {
  if (Math.abs(u) >= 1) return (secondRest(u) - 0.5) / u;
  let sum = 1;
  for (let n = TERMS; n >= 1; n--) sum = 1 + (sum * u) / (n + 3);
  return sum / 6;
}

/** Σ c z², twice the ionic strength. */
export const screeningSum = (ions: readonly Ion[]): number =>
  ions.reduce((sum, { valence, concentration_mol_m3 }) => sum + concentration_mol_m3 * valence ** 2, 0);

/**
 * How much the squared field of a flat surface exceeds that of the linear theory, over the potential: s(y)/y, with
 * (dy/dx)² = y²(1 + s). Smooth through y = 0, where it measures the asymmetry of the salt.
 */
export function fieldExcessOverPotential(ions: readonly Ion[], reducedPotential: number): number {
  let sum = 0;
  for (const { valence, concentration_mol_m3 } of ions) {
    sum -= concentration_mol_m3 * valence ** 3 * thirdRest(-valence * reducedPotential);
  }
  return (2 * sum) / screeningSum(ions);
}

/**
 * Field at a flat surface, or anywhere before it, in units of κkT/e [dimensionless]; sign of the potential.
 *
 *     −dy/d(κx) = sgn(y) √( 2 Σ cᵢ(e^(−zᵢy) − 1) / Σ cᵢzᵢ² ),   y = eψ/kT
 *
 * In a neutral bulk Σ cᵢzᵢ = 0, so e^(−zy) − 1 may be replaced by e^(−zy) − 1 + zy, which does not cancel.
 *
 * Source  first integral of the Poisson–Boltzmann equation; Grahame, Chem. Rev. 41 (1947) 441 (from memory).
 * Valid   point ions, neutral bulk. Infinite when an exponent passes 709.
 */
export function reducedField(ions: readonly Ion[], reducedPotential: number): number {
  let sum = 0;
  for (const { valence, concentration_mol_m3 } of ions) {
    sum += concentration_mol_m3 * valence ** 2 * secondRest(-valence * reducedPotential);
  }
  return reducedPotential * Math.sqrt((2 * sum) / screeningSum(ions));
}
