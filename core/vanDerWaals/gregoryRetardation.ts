/**
 * Factor [dimensionless] by which retardation weakens the dispersion part between two spheres.
 *
 *     f = 1/(1 + 14 h/λ)
 *
 * It applies to all frequencies but zero, which light's finite speed does not touch.
 *
 * Source  Gregory, J. Colloid Interface Sci. 83 (1981) 138, eq. 21 (from memory).
 * Valid   h below about a fifth of the radius. Against the exact theory it weakens too much beyond 5 to 10 nm.
 * Throws  RangeError for a negative gap or a wavelength that is not positive.
 */
export function gregoryRetardation(separation_m: number, wavelength_m: number): number {
  if (!(separation_m >= 0 && wavelength_m > 0)) {
    throw new RangeError(
      `gregoryRetardation: separation_m must not be negative and wavelength_m must be above zero, got ${separation_m}, ${wavelength_m}`,
    );
  }
  return 1 / (1 + (14 * separation_m) / wavelength_m);
}
