import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { parseSync } from 'oxc-parser';
import { describe, expect, it } from 'vitest';

/**
 * The stand-in for Electron may lack what Electron has, and then says so; it may not have what Electron lacks. Its
 * members are compared with the declarations that come with the Electron version in use.
 */
const fileOf = (path: string): string => fileURLToPath(new URL(`../../../${path}`, import.meta.url));

interface Node {
  readonly type: string;
  readonly [key: string]: unknown;
}
const isNode = (value: unknown): value is Node =>
  typeof value === 'object' && value !== null && typeof (value as { type?: unknown }).type === 'string';
const childrenOf = (node: Node): Node[] => Object.values(node).flat().filter(isNode);

const nameOf = (node: unknown): string => (isNode(node) ? String(node.name ?? node.value ?? '') : '');

interface Declared {
  readonly members: ReadonlySet<string>;
  readonly parent: string;
}

/** Every class and interface of a source with the names of its public members. */
function declarationsIn(path: string): Map<string, Declared> {
  const { program, errors } = parseSync(path, readFileSync(path, 'utf8'));
  if (errors.length > 0) throw new Error(`${path}: ${errors[0].message}`);
  const found = new Map<string, Declared>();
  const visit = (node: Node): void => {
    if (/^(ClassDeclaration|TSInterfaceDeclaration)$/.test(node.type) && isNode(node.id) && isNode(node.body)) {
      const members = childrenOf(node.body)
        .filter(({ key }) => isNode(key) && key.type !== 'PrivateIdentifier')
        .map(({ key }) => nameOf(key));
      const known = found.get(nameOf(node.id));
      found.set(nameOf(node.id), {
        members: new Set([...(known?.members ?? []), ...members]),
        parent: nameOf(node.superClass),
      });
    }
    childrenOf(node).forEach(visit);
  };
  visit(program as unknown as Node);
  return found;
}

const electron = declarationsIn(fileOf('node_modules/electron/electron.d.ts'));

function isDeclared(type: string, member: string): boolean {
  const declared = electron.get(type);
  return declared !== undefined && (declared.members.has(member) || isDeclared(declared.parent, member));
}

/** Said in so many words: what tests look at, and what the parts of the stand-in tell one another. */
const OWN: Readonly<Record<string, readonly string[]>> = {
  App: ['recentDocuments'],
  BrowserWindow: ['front'],
  WebContents: ['mayNavigate', 'mayOpen', 'page', 'destroyed'],
  IpcMain: ['_invokeHandlers'],
  Session: ['permissionHandlers'],
  Dialog: ['asked'],
  Shell: ['opened'],
};

const classes = [
  ['app.mjs', 'App', 'App'],
  ['browserWindow.mjs', 'Window', 'BrowserWindow'],
  ['webContents.mjs', 'WebContents', 'WebContents'],
  ['ipcMain.mjs', 'IpcMain', 'IpcMain'],
  ['protocol.mjs', 'Session', 'Session'],
  ['menu.mjs', 'Menu', 'Menu'],
] as const;

const objects = [
  ['dialog', 'Dialog'],
  ['protocol', 'Protocol'],
  ['shell', 'Shell'],
  ['clipboard', 'Clipboard'],
  ['screen', 'Screen'],
  ['nativeTheme', 'NativeTheme'],
  ['net', 'Net'],
] as const;

const inventedIn = (members: Iterable<string>, type: string): string[] =>
  [...members].filter((name) => name !== 'constructor' && !isDeclared(type, name) && !(OWN[type] ?? []).includes(name));

describe('the stand-in for Electron has no member of its own invention', () => {
  it.each(classes)('%s: %s is like %s', (file, own, type) => {
    const members = declarationsIn(fileOf(`test/app/standIn/${file}`)).get(own)?.members ?? new Set();
    expect(members.size).toBeGreaterThan(1);
    expect(inventedIn(members, type)).toEqual([]);
  });

  it.each(objects)('%s is like %s', async (name, type) => {
    const address = new URL('../../app/standIn/electron.mjs', import.meta.url).href;
    const standIn: Readonly<Record<string, object>> = await import(address);
    const members = Object.keys(standIn[name] ?? {}).filter((key) => !key.startsWith('_'));
    expect(members.length).toBeGreaterThan(0);
    expect(inventedIn(members, type)).toEqual([]);
  });

  it('and the check finds one that was planted', () => {
    expect(isDeclared('BrowserWindow', 'setTitle')).toBe(true);
    expect(isDeclared('BrowserWindow', 'isDestroyed')).toBe(true);
    expect(inventedIn(['setTitle', 'setMood'], 'BrowserWindow')).toEqual(['setMood']);
  });
});
