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
 * Valid   against the equation solved around one sphere, |ψ| up to 100 mV: 1:1 salt within 0.4 % from κa = 1 on, 3.4 % at
 *         κa = 0.3. Salts of ions of unlike valence: 2:1 within 3 % at κa = 10, 7 % at 3, 12 % at 1; sodium chloride with
 *         a tenth of its strength in calcium within 3 %.
 */
export function curvatureFactor(kappaRadius: number, saturation: number): number {
  const curvature = (2 * kappaRadius + 1) / (kappaRadius + 1) ** 2;
  return 2 / (1 + Math.sqrt(1 - curvature * saturation ** 2));
}
