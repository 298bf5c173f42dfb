import { findMaterial } from '../materials/catalogue';
import type { Material } from '../materials/material';
import type { MediumRecipe } from '../scenario/scenario';
import { volumeFractions } from './volumeFractions';

export interface MediumShare {
  readonly material: Material;
  readonly volumeFraction: number;
}

/**
 * What a medium really holds: components of zero parts are left out, the same material twice is added up.
 * Throws RangeError for an unknown material, and as {@link volumeFractions}.
 */
export function mediumShares(recipe: MediumRecipe): readonly MediumShare[] {
  const fractionOf = new Map<string, number>();
  volumeFractions(recipe).forEach((volumeFraction, index) => {
    const { material } = recipe.components[index];
    if (volumeFraction > 0) fractionOf.set(material, (fractionOf.get(material) ?? 0) + volumeFraction);
  });
  return [...fractionOf].map(([id, volumeFraction]) => {
    const material = findMaterial(id);
    if (material === undefined) throw new RangeError(`mediumShares: material "${id}" is not in the catalogue`);
    return { material, volumeFraction };
  });
}
