/**
 * ln(1 − e^(−x)) for x > 0 [dimensionless], to the last digits at both ends.
 *
 * Near 0 the difference 1 − e^(−x) cancels, far out it rounds to 1: the two branches meet at ln 2, where both are good.
 * Source  Mächler, "Accurately computing log(1 − exp(−|a|))", note to the R package Rmpfr, 2012 (from memory).
 */
export const logOneMinusExp = (x: number): number =>
  x > Math.LN2 ? Math.log1p(-Math.exp(-x)) : Math.log(-Math.expm1(-x));
