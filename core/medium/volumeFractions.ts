import type { MediumRecipe } from '../scenario/scenario';
import { mustBePositive, mustNotBeNegative } from '../validity';

/**
 * Volume fractions before mixing [-] of the components of a recipe, in its order; they add up to one.
 * Throws RangeError for negative parts, or when all parts are zero.
 */
export function volumeFractions({ components }: MediumRecipe): readonly number[] {
  for (const { volumeParts } of components) mustNotBeNegative('volumeFractions', { volumeParts });
  const totalParts = components.reduce((sum, { volumeParts }) => sum + volumeParts, 0);
  mustBePositive('volumeFractions', { totalParts });
  return components.map(({ volumeParts }) => volumeParts / totalParts);
}
