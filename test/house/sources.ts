import { readdirSync, readFileSync } from 'node:fs';
import { join, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';

/** Path from the project's root, with `/`, and the text. */
export type Sources = ReadonlyMap<string, string>;

export const root = fileURLToPath(new URL('../../', import.meta.url));

/** Made by tools, or not ours: never read by the house checks. */
const NOT_OURS = new Set(['node_modules', '.git', 'dist', 'test-results', 'playwright-report']);

function filesBelow(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    if (NOT_OURS.has(entry.name)) return [];
    const path = join(folder, entry.name);
    return entry.isDirectory() ? filesBelow(path) : [path];
  });
}

const TEXT = /\.(ts|tsx|mjs|cjs|js|json|css|html|md|yml|yaml|py)$|(^|\/)(\.gitignore|run)$/;

/** Every text file of the project. */
export function projectSources(): Sources {
  const paths = filesBelow(root).map((path) => relative(root, path).split(sep).join('/'));
  return new Map(paths.filter((path) => TEXT.test(path)).map((path) => [path, readFileSync(join(root, path), 'utf8')]));
}

export const topLevelNames = (): readonly string[] => readdirSync(root);
