/** Above this the plain form keeps at least 13 digits: the loss is 6 ε/q² with ε = 1e-16. */
const seriesBelow = 0.25;
/** 0.25²⁶ is 2e-16 of the first term q³/6. */
const seriesEnd = 28;

/**
 * Hamaker's bracket [dimensionless] that spheres and plates share, as a function of q = 4 a₁ a₂/(R² − (a₁ − a₂)²).
 *
 *     B = q/(2(1 − q)) + q/2 + ln(1 − q) = Σ_{n≥3} q^n (1/2 − 1/n)
 *
 * The three terms cancel down to q³/6 for small q, so there the series is summed. `rest` is 1 − q, given separately
 * since near contact it is the small number that counts.
 *
 * Source  Hamaker, Physica 4 (1937) 1058 (from memory), rewritten in q; series: our own expansion.
 * Valid   0 < q < 1.
 */
export function hamakerBracket(q: number, rest: number): number {
  if (q > seriesBelow) return q / (2 * rest) + q / 2 + Math.log(rest);
  let sum = 0;
  for (let n = seriesEnd; n >= 3; n--) sum = sum * q + (0.5 - 1 / n);
  return sum * q ** 3;
}
