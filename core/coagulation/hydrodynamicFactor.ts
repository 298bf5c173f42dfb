/**
 * Hydrodynamic factor B(u) of two approaching spheres [dimensionless]: how much slower than far apart they diffuse
 * together.
 *
 *     B = (6u² + 13u + 2)/(6u² + 4u),   u = h/a
 *
 * For unlike spheres u = h/ā with ā = 2a₁a₂/(a₁+a₂): exact in the lubrication limit, approximate between.
 *
 * Source  Honig, Roebersen & Wiersema, J. Colloid Interface Sci. 36 (1971) 97 (from memory).
 * Valid   any u > 0; against the exact bispherical series (Brenner 1961) −2.5 % at u = 0.03 to +3.0 % at u = 1.
 */
export const hydrodynamicFactor = (u: number): number => (6 * u * u + 13 * u + 2) / (6 * u * u + 4 * u);
