import type { StaticPermittivity } from '../materials/material';
import { isWithin, mustBePositive } from '../validity';

/** The polynomial of {@link StaticPermittivity} and the span it was fitted in. */
export type PermittivityPolynomial = NonNullable<StaticPermittivity['temperaturePolynomial']>;

/**
 * Static relative permittivity of a liquid from its handbook polynomial [-].
 *
 *     inside the span:  ε_r = Σ cᵢ Tⁱ
 *     outside:          ln ε_r continued as a straight line in T, with the value and slope at the end of the span
 *
 * Source  CRC 2014, table of the permittivity of liquids, for the polynomials; the straight line is common practice,
 *         since ln ε_r of most liquids is nearly linear in T. A polynomial of second or third degree turns round.
 * Valid   the span of the polynomial.
 * Throws  RangeError for a temperature that is not a positive number.
 */
export function polynomialPermittivity(
  { coefficients, valid_K }: PermittivityPolynomial,
  temperature_K: number,
): number {
  mustBePositive('polynomialPermittivity', { temperature_K });
  const valueAt = (at_K: number) => coefficients.reduceRight((sum, coefficient) => sum * at_K + coefficient, 0);
  if (isWithin(valid_K, temperature_K)) return valueAt(temperature_K);
  const end_K = temperature_K < valid_K.from ? valid_K.from : valid_K.to;
  const slopeAtEnd =
    coefficients.reduceRight((sum, coefficient, power) => sum * end_K + power * coefficient, 0) / end_K;
  return valueAt(end_K) * Math.exp((slopeAtEnd / valueAt(end_K)) * (temperature_K - end_K));
}
