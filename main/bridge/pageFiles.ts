import { readFile, realpath } from 'node:fs/promises';
import { extname, isAbsolute, relative, resolve, sep } from 'node:path';

export interface PageFile {
  readonly bytes: Uint8Array<ArrayBuffer>;
  readonly type: string;
}

const TYPES = new Map([
  ['.html', 'text/html; charset=utf-8'],
  ['.js', 'text/javascript; charset=utf-8'],
  ['.css', 'text/css; charset=utf-8'],
  ['.json', 'application/json; charset=utf-8'],
  ['.svg', 'image/svg+xml'],
  ['.png', 'image/png'],
  ['.woff2', 'font/woff2'],
]);

const isBelow = (root: string, path: string): boolean => {
  const way = relative(root, path);
  return way !== '' && way !== '..' && !way.startsWith(`..${sep}`) && !isAbsolute(way);
};

/** The path of a page's address as a file below `root`, or null. Decoded once; anything odd is refused. */
export function pagePath(root: string, pathname: string): { readonly path: string; readonly type: string } | null {
  let plain: string;
  try {
    plain = decodeURIComponent(pathname);
  } catch {
    return null;
  }
  if (!plain.startsWith('/') || plain.includes('\0') || /[\\:]/.test(plain) || plain.includes('//')) return null;
  // The dot keeps a path that starts with "/" from replacing the root.
  const path = resolve(root, `.${plain === '/' ? '/index.html' : plain}`);
  const type = TYPES.get(extname(path));
  return type !== undefined && !plain.split('/').includes('..') && isBelow(root, path) ? { path, type } : null;
}

/** Reads a file of the built page; null when there is none of this address. */
export async function readPageFile(root: string, pathname: string): Promise<PageFile | null> {
  const place = pagePath(root, pathname);
  if (place === null) return null;
  try {
    // A link may lead out of the folder.
    if (!isBelow(await realpath(root), await realpath(place.path))) return null;
    return { bytes: Uint8Array.from(await readFile(place.path)), type: place.type };
  } catch {
    return null;
  }
}
