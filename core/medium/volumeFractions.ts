import { findMaterial } from '../materials/catalogue';
import type { Material } from '../materials/material';
import type { MediumRecipe } from '../scenario/scenario';
import { mustBePositive, mustNotBeNegative } from '../validity';

export interface MediumShare {
  readonly material: Material;
  readonly volumeFraction: number;
}

/**
 * The components of a medium with their volume fractions before mixing [-], which add up to one. Components of zero
 * parts are left out; the same material twice is added up.
 * Throws RangeError for an unknown material, negative parts, or when all parts are zero.
 */
export function volumeFractions(recipe: MediumRecipe): readonly MediumShare[] {
  const partsOf = new Map<string, number>();
  for (const { material, volumeParts } of recipe.components) {
    mustNotBeNegative('volumeFractions', { volumeParts });
    if (volumeParts > 0) partsOf.set(material, (partsOf.get(material) ?? 0) + volumeParts);
  }
  const totalParts = [...partsOf.values()].reduce((sum, parts) => sum + parts, 0);
  mustBePositive('volumeFractions', { totalParts });
  return [...partsOf].map(([id, parts]) => {
    const material = findMaterial(id);
    if (material === undefined) throw new RangeError(`volumeFractions: material "${id}" is not in the catalogue`);
    return { material, volumeFraction: parts / totalParts };
  });
}
