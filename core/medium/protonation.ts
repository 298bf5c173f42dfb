/**
 * Shares of the forms of an acid at a pH [-], from the most protonated to the least; they add up to one.
 *
 *     log₁₀(αᵢ/α₀) = i pH − (pKa₁ + … + pKaᵢ)
 *
 * Source  mass action; any textbook of analytical chemistry.
 * Valid   constants at 25 °C and low ionic strength, used as they stand elsewhere: 0.1 mol/L moves a pKa by
 *         0.1–0.5 (more for the highly charged), 25 K by up to 0.8 (amines).
 * Worked in logarithms, shifted to the largest, so that nothing overflows.
 */
export function protonation(pKa: readonly number[], pH: number): readonly number[] {
  const log10Weights = [0];
  for (const step of pKa) log10Weights.push(log10Weights[log10Weights.length - 1] + pH - step);
  const largest = Math.max(...log10Weights);
  const weights = log10Weights.map((log10Weight) => 10 ** (log10Weight - largest));
  const sum = weights.reduce((total, weight) => total + weight, 0);
  return weights.map((weight) => weight / sum);
}
