/**
 * Hydrodynamic factor B(x) of two approaching spheres [dimensionless]: how much slower than far apart they diffuse
 * together.
 *
 *     B = (6x² + 13x + 2)/(6x² + 4x),   x = h/a
 *
 * For unlike spheres x = h/ā with ā = 2a₁a₂/(a₁+a₂): exact in the lubrication limit, approximate between.
 *
 * Source  Honig, Roebersen & Wiersema, J. Colloid Interface Sci. 36 (1971) 97 (from memory).
 * Valid   any x > 0; against the exact bispherical series (Brenner 1961) −2.5 % at x = 0.03 to +3.0 % at x = 1.
 */
export const hydrodynamicFactor = (x: number): number => (6 * x * x + 13 * x + 2) / (6 * x * x + 4 * x);
