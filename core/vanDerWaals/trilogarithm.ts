/** Apéry's constant, ζ(3) = Li₃(1). */
export const APERY = 1.2020569031595942;
const ZETA_2 = Math.PI ** 2 / 6;

/** Up to here the plain series needs 40 terms for full double precision: 0.5⁴⁰/40³ is 1e-17. */
const seriesReach = 0.5;
const seriesTerms = 40;
const inverseCubes = Float64Array.from({ length: seriesTerms }, (_, index) => 1 / (index + 1) ** 3);

/** ζ(3 − k)/k! for k = 4, 6, … 16; the odd ones between vanish. From ζ(1 − 2m) = −B₂ₘ/(2m). */
const nearOneCoefficients = Float64Array.of(
  -1 / 12 / 24,
  1 / 120 / 720,
  -1 / 252 / 40_320,
  1 / 240 / 3_628_800,
  -1 / 132 / 479_001_600,
  691 / 32_760 / 87_178_291_200,
  -1 / 12 / 20_922_789_888_000,
);

/**
 * Trilogarithm Li₃(x) [dimensionless] on −1 ≤ x ≤ 1: the sum over reflections in the Lifshitz formula.
 *
 *     Li₃(x) = Σ_{s≥1} x^s / s³
 *
 * Three forms, all exact to a few units in the last place:
 *     |x| ≤ ½   the series itself
 *     x > ½     with μ = ln x:  ζ(3) + ζ(2) μ + (μ²/2)(3/2 − ln(−μ)) − μ³/12 + Σ_{k=4,6,…} ζ(3−k) μ^k/k!
 *     x < −½    duplication:    Li₃(x) = Li₃(x²)/4 − Li₃(−x)
 *
 * Source  Lewin, Polylogarithms and Associated Functions, 1981, chapter 7; DLMF 25.12.12 for the form near 1
 *         (both from memory; checked against 30-digit values in test/reference/vanDerWaals).
 * Throws  RangeError outside −1 … 1: reflections cannot exceed one, so that is a bug of ours.
 */
export function trilogarithm(x: number): number {
  if (!(x >= -1 && x <= 1)) throw new RangeError(`trilogarithm: x must lie between -1 and 1, got ${x}`);
  if (x > seriesReach) return nearOne(x);
  if (x < -seriesReach) {
    const square = x * x;
    return (square > seriesReach ? nearOne(square) : series(square)) / 4 - nearOne(-x);
  }
  return series(x);
}

function series(x: number): number {
  const size = Math.abs(x);
  let sum = 0;
  let power = x;
  for (let index = 0; index < seriesTerms; index++) {
    sum += power * inverseCubes[index];
    power *= x;
    // Later terms add less than 1e-17 of the first.
    if (Math.abs(power) < 1e-17 * size) break;
  }
  return sum;
}

function nearOne(x: number): number {
  if (x === 1) return APERY;
  const mu = Math.log(x);
  const square = mu * mu;
  let tail = 0;
  for (let index = nearOneCoefficients.length - 1; index >= 0; index--) {
    tail = tail * square + nearOneCoefficients[index];
  }
  return APERY + ZETA_2 * mu + (square / 2) * (1.5 - Math.log(-mu)) - (mu * square) / 12 + square * square * tail;
}
