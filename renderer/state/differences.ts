import type { Formulation } from '../../core/scenario/scenario';

/** One entry that differs from the formulation this one was copied from. */
export interface Difference {
  /** JSON pointer within the formulation: `/salts/0/concentration_mM`. */
  readonly path: string;
  readonly was: unknown;
}

const OWN_ENTRIES: readonly string[] = ['id', 'name', 'copiedFrom'];

function collect(now: unknown, was: unknown, path: string, found: Difference[]): void {
  if (Object.is(now, was)) return;
  const bothGroups = typeof now === 'object' && typeof was === 'object' && now !== null && was !== null;
  if (!bothGroups) {
    found.push({ path, was });
    return;
  }
  const before = new Map(Object.entries(was));
  const after = new Map(Object.entries(now));
  for (const key of new Set([...before.keys(), ...after.keys()])) {
    collect(after.get(key), before.get(key), `${path}/${key}`, found);
  }
}

/** What differs from the base, entry by entry; name and identity are not counted. */
export function differencesFromBase(formulation: Formulation, base: Formulation): readonly Difference[] {
  const found: Difference[] = [];
  for (const key of Object.keys(formulation) as (keyof Formulation)[]) {
    if (!OWN_ENTRIES.includes(key)) collect(formulation[key], base[key], `/${key}`, found);
  }
  return found;
}
