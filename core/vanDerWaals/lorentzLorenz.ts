import { mustBePositive } from '../validity';

/**
 * Polarizability volume per volume of matter ρα [dimensionless], from the refractive index.
 *
 *     ρ α = (3/4π) (n² − 1)/(n² + 2)
 *
 * Divided by the number density it is the polarizability volume of one molecule.
 *
 * Source  Lorentz–Lorenz, Born & Wolf, Principles of Optics, section 2.3.3 (from memory).
 * Valid   isotropic matter, index away from absorption bands.
 * Throws  RangeError for an index that is not positive.
 */
export function polarizabilityDensity(refractiveIndex: number): number {
  mustBePositive('polarizabilityDensity', { refractiveIndex });
  const square = refractiveIndex ** 2;
  return ((3 / (4 * Math.PI)) * (square - 1)) / (square + 2);
}
