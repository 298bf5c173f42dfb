import { mustBePositive, mustNotBeNegative } from '../validity';

/** Above this sedimentation Péclet number particles no longer feel Brownian motion while they settle past each other. */
const CROSSOVER_PECLET = 1e8;
const EXPONENT_BROWNIAN = 5.6;
const EXPONENT_NON_BROWNIAN = 4.48;

/**
 * Share of its lone velocity with which a sphere settles among others [dimensionless].
 *
 *     (1 − φ)ⁿ,   n = 5.6 for Brownian particles, 4.48 beyond a Péclet number of 1e8
 *
 * Source  form: Richardson & Zaki, Trans. Inst. Chem. Eng. 32 (1954) 35; exponents 5.6 ± 0.1 and 4.48 ± 0.04:
 *         Brzinski & Durian, Phys. Rev. Fluids 3 (2018) 124303 (abstract).
 * Valid   equal, stable, unflocculated spheres up to φ of about 0.5.
 * Throws  RangeError for a share that is negative or not below one, or a Péclet number that is not positive.
 */
export function hindrance(volumeFraction: number, pecletNumber: number): number {
  mustNotBeNegative('hindrance', { volumeFraction });
  mustBePositive('hindrance', { pecletNumber });
  if (volumeFraction >= 1) throw new RangeError(`hindrance: volumeFraction must be below one, got ${volumeFraction}`);
  const exponent = pecletNumber < CROSSOVER_PECLET ? EXPONENT_BROWNIAN : EXPONENT_NON_BROWNIAN;
  return (1 - volumeFraction) ** exponent;
}
