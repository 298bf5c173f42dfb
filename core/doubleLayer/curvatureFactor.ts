/**
 * By how much the far potential of a sphere exceeds that of a flat surface with the same potential [dimensionless], 1 to 2.
 *
 *     C = 2 / ( 1 + √(1 − (2κa+1)/(κa+1)² t²) ),   t = tanh(ze|ψ|/4kT)
 *
 * so that C · (4/z) t is the sphere's effective potential of Bell, Levine & McCartney. For salts that are not symmetric,
 * t is the flat surface's effective potential over the highest it can reach, which is tanh(ze|ψ|/4kT) for z:z.
 *
 * Source  Bell, Levine & McCartney, J. Colloid Interface Sci. 33 (1970) 335; sphere profile of Ohshima, Healy & White,
 *         J. Colloid Interface Sci. 90 (1982) 17 (both from memory). Our own extension to other salts.
 * Valid   κa above about 1; see the measured deviations in the tests.
 */
export function curvatureFactor(kappaRadius: number, saturation: number): number {
  const curvature = (2 * kappaRadius + 1) / (kappaRadius + 1) ** 2;
  return 2 / (1 + Math.sqrt(1 - curvature * saturation ** 2));
}
