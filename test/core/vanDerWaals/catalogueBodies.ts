import { findMaterial } from '../../../core/materials/catalogue';
import type { Material } from '../../../core/materials/material';
import { bodyOf, type DielectricBody, type ResponseLevel, vacuum } from '../../../core/vanDerWaals/dielectricBody';
import { lifshitzNonRetarded } from '../../../core/vanDerWaals/lifshitzNonRetarded';
import { matchLevels } from '../../../core/vanDerWaals/matchLevels';

export const temperature_K = 298.15;

export interface System {
  readonly first: string;
  readonly medium: string;
  readonly second: string;
}

export function material(id: string): Material {
  const found = findMaterial(id);
  if (found === undefined) throw new Error(`the catalogue has no ${id}`);
  return found;
}

/** A catalogue material, or `vacuum`, as a body with its static permittivity at 25 °C. */
export function bodyNamed(id: string, level: ResponseLevel | null = null): DielectricBody {
  if (id === 'vacuum') return vacuum;
  const { conductor, staticPermittivity } = material(id);
  if (conductor) return bodyOf(material(id), Number.POSITIVE_INFINITY, level);
  if (staticPermittivity === null) throw new Error(`${id} has no static permittivity`);
  return bodyOf(material(id), staticPermittivity.value, level);
}

/** A of a system with responses of one level, in zJ as the tables print it. */
export function fullSum_zJ({ first, medium, second }: System): number {
  const ids = [first, medium, second].filter((id) => id !== 'vacuum');
  const { level } = matchLevels(ids.map(material));
  return (
    1e21 *
    lifshitzNonRetarded({
      first: bodyNamed(first, level),
      second: bodyNamed(second, level),
      medium: bodyNamed(medium, level),
      temperature_K,
    }).hamakerConstant_J
  );
}
