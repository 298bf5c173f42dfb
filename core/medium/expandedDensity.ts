import { mustBePositive } from '../validity';

export interface KnownDensity {
  readonly density_kg_m3: number;
  /** Temperature at which `density_kg_m3` was measured. */
  readonly reference_K: number;
  readonly temperature_K: number;
}

/** Liquids run from 0.5e-3 (glycerol) over 1.0e-3 (esters, xylene) to 1.6e-3 1/K (pentane). */
export const TYPICAL_EXPANSION_per_K = 1.0e-3;

/**
 * Density [kg/m³] of an organic liquid or resin away from the temperature at which it is known.
 *
 *     ρ = ρ_ref / (1 + β (T − T_ref)),  β = 1.0e-3 1/K
 *
 * Source  common practice; β is the middle of handbook values, recalled.
 * Valid   where 1 + β (T − T_ref) stays near one; the spread of β is worth 1.5 % for 25 K.
 * Throws  RangeError for a non-positive input, or when the expansion comes out below zero.
 */
export function expandedDensity({ density_kg_m3, reference_K, temperature_K }: KnownDensity): number {
  const expansion = 1 + TYPICAL_EXPANSION_per_K * (temperature_K - reference_K);
  mustBePositive('expandedDensity', { density_kg_m3, reference_K, temperature_K, expansion });
  return density_kg_m3 / expansion;
}
