import type { Result } from '../problem';
import { type HamakerAnswer, type HamakerQuestion, hamakerReport } from '../vanDerWaals/hamakerReport';

/** One slider drag asks for the same materials hundreds of times; the sum over frequencies is the costly part. */
const CAPACITY = 400;
const remembered = new Map<string, Result<HamakerAnswer>>();

const keyOf = ({ first, second, medium, temperature_K, route, entered_J }: HamakerQuestion): string =>
  JSON.stringify([
    first.id,
    second.id,
    medium.components.map(({ material, volumeFraction }) => [material.id, volumeFraction]),
    medium.staticPermittivity,
    temperature_K,
    route,
    entered_J,
  ]);

/** As `hamakerReport`, answered from memory when the same question was asked before. The answer never differs. */
export function rememberedHamakerReport(question: HamakerQuestion): Result<HamakerAnswer> {
  const key = keyOf(question);
  const known = remembered.get(key);
  if (known !== undefined) return known;
  const answer = hamakerReport(question);
  if (remembered.size >= CAPACITY) remembered.clear();
  remembered.set(key, answer);
  return answer;
}
