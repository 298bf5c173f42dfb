import { mustNotBeNegative } from '../validity';

export interface CombiningInput {
  /** Of each body with itself across vacuum. */
  readonly first_J: number;
  readonly second_J: number;
  readonly medium_J: number;
}

/**
 * Hamaker constant A₁₃₂ [J] from those of the three substances across vacuum.
 *
 *     A₁₃₂ = (√A₁₁ − √A₃₃)(√A₂₂ − √A₃₃)
 *
 * Source  Israelachvili, Intermolecular and Surface Forces, 3rd ed. 2011, eq. 13.30 (from memory).
 * Valid   last resort: 20 to 80 % below the full sum for the solids and liquids of the catalogue, most often by a third;
 *         worst where the part of frequency zero matters, as for silica, polystyrene and oils in water.
 * Throws  RangeError for a negative input.
 */
export function combiningRule({ first_J, second_J, medium_J }: CombiningInput): number {
  mustNotBeNegative('combiningRule', { first_J, second_J, medium_J });
  const root3 = Math.sqrt(medium_J);
  return (Math.sqrt(first_J) - root3) * (Math.sqrt(second_J) - root3);
}
