/**
 * Factor [dimensionless] by which dissolved ions weaken the part of frequency zero.
 *
 *     s = (1 + 2κh) e^(−2κh)
 *
 * Source  Mahanty & Ninham, Dispersion Forces, 1976; Parsegian, Van der Waals Forces, 2006, level 1 (from memory).
 * Valid   linear response of the ions; plates, used here at the gap of the spheres.
 * Throws  RangeError for a negative or infinite input.
 */
export function zeroFrequencyScreening(inverseDebyeLength_per_m: number, separation_m: number): number {
  if (!(inverseDebyeLength_per_m >= 0 && separation_m >= 0 && inverseDebyeLength_per_m * separation_m < Infinity)) {
    throw new RangeError(
      `zeroFrequencyScreening: inverseDebyeLength_per_m and separation_m must be finite and not negative, got ${inverseDebyeLength_per_m}, ${separation_m}`,
    );
  }
  const twice = 2 * inverseDebyeLength_per_m * separation_m;
  return (1 + twice) * Math.exp(-twice);
}
