import { posix } from 'node:path';
import { parseSync, Visitor } from 'oxc-parser';
import type { Sources } from './sources';

/** One import or re-export as it stands in a file. */
interface Import {
  readonly from: string;
  readonly spelled: string;
  readonly typeOnly: boolean;
}

/** Who may import what. A target is a path in the house without its ending, or the name of a package. */
interface Row {
  readonly who: RegExp;
  readonly values: RegExp;
  readonly types: RegExp;
  readonly rule: string;
}

const anything = /./;
const forces = ['vanDerWaals', 'doubleLayer', 'stericLayer'];
const foundations = 'core/(constants|validity|problem)$';

/** Every row whose `who` fits a file has to be kept; `values` and `types` are the targets it may name. */
const rows: readonly Row[] = [
  {
    who: /^core\//,
    values: /^(core\/|mathjs\/number$)/,
    types: /^core\//,
    rule: 'core imports only core (and the parser of mathjs, in one file)',
  },
  {
    who: /^core\/(?!quantities\/arithmetic)/,
    values: /^(?!mathjs)/,
    types: /^(?!mathjs)/,
    rule: 'mathjs is imported by core/quantities/arithmetic only',
  },
  {
    who: /^core\/(?!quantities\/readQuantity)/,
    values: /^(?!core\/quantities\/arithmetic$)/,
    types: /^(?!core\/quantities\/arithmetic$)/,
    rule: 'core/quantities/arithmetic brings mathjs along: only readQuantity imports it',
  },
  {
    who: /^core\//,
    values: /^(?!core\/quantities\/readQuantity$)/,
    types: anything,
    rule: 'typed text is read by the renderer; core works on numbers',
  },
  ...forces.map((force) => ({
    who: new RegExp(`^core/${force}/`),
    values: new RegExp(`^(?!core/(${forces.filter((other) => other !== force).join('|')})/)`),
    types: new RegExp(`^(?!core/(${forces.filter((other) => other !== force).join('|')})/)`),
    rule: 'the three forces do not import one another',
  })),
  {
    who: new RegExp(`^core/(${forces.join('|')})/`),
    values: /^(?!core\/(pairEnergy|coagulation|settling|verdict|report|formulation|evaluate$))/,
    types: anything,
    rule: 'a force does not know what is made of it',
  },
  {
    who: /^core\/numerics\//,
    values: new RegExp(`^(core/numerics/|${foundations})`),
    types: new RegExp(`^(core/numerics/|${foundations})`),
    rule: 'numerics knows no chemistry',
  },
  {
    who: /^core\/quantities\//,
    values: new RegExp(`^(core/quantities/|mathjs|${foundations})`),
    types: new RegExp(`^(core/quantities/|mathjs|${foundations})`),
    rule: 'quantities knows units and no chemistry',
  },
  {
    who: /^core\/(constants|validity|problem)$/,
    values: new RegExp(`^${foundations}`),
    types: new RegExp(`^${foundations}`),
    rule: 'the foundations stand on nothing',
  },
  {
    who: /^main\/(?!commandLine\/[^/]+\.mjs$)/,
    values: /^(main\/|core\/|electron$|node:|package\.json$|assets\/demo\/)/,
    types: anything,
    rule: 'main imports main, core, electron, node and the demo scenario',
  },
  {
    who: /^main\//,
    values: anything,
    types: /^(main\/|core\/|electron$|node:|package\.json$)/,
    rule: 'main imports main, core, electron and node',
  },
  {
    who: /^main\/commandLine\/[^/]+\.mjs$/,
    values: /^(main\/commandLine\/|node:|vite$|@preact\/preset-vite$)/,
    types: anything,
    rule: 'a start script imports node, vite and its neighbours',
  },
  {
    who: /^main\/(loopback|commandLine)\//,
    values: /^(?!electron$)/,
    types: anything,
    rule: 'the loopback host and the command line run without Electron',
  },
  {
    who: /^renderer\//,
    values: /^(renderer\/|core\/|preact(\/|$)|@preact\/signals(\/|$)|chart\.js(\/|$)|package\.json$)/,
    types: /^(renderer\/|core\/|preact(\/|$)|@preact\/signals(\/|$)|chart\.js(\/|$)|main\/bridge\/contract$)/,
    rule: 'renderer imports renderer, core and its view packages; of main only the types of the bridge',
  },
  {
    who: /^renderer\/(?!charts\/)/,
    values: /^(?!chart\.js)/,
    types: /^(?!chart\.js)/,
    rule: 'chart.js is imported in renderer/charts only',
  },
  {
    who: /^renderer\/(?!worker\/)/,
    values: /^(?!core\/evaluate$)/,
    types: anything,
    rule: 'only the worker evaluates',
  },
];

const CODE = /^(core|main|renderer)\/.*\.(ts|tsx|mjs)$/;
const withoutEnding = (path: string): string => path.replace(/\.(ts|tsx)$/, '');

function importsIn(path: string, text: string): { readonly imports: readonly Import[]; readonly faults: string[] } {
  const faults: string[] = [];
  const parsed = parseSync(path, text);
  if (parsed.errors.length > 0) return { imports: [], faults: [`${path}: cannot be parsed`] };
  const imports: Import[] = [];
  const note = (spelled: string, typeOnly: boolean) => imports.push({ from: path, spelled, typeOnly });
  for (const { moduleRequest, entries } of parsed.module.staticImports) {
    note(moduleRequest.value, entries.length > 0 && entries.every(({ isType }) => isType));
  }
  for (const { entries } of parsed.module.staticExports) {
    for (const { moduleRequest, isType } of entries) if (moduleRequest !== null) note(moduleRequest.value, isType);
  }
  for (const { moduleRequest } of parsed.module.dynamicImports) {
    const asked = text.slice(moduleRequest.start, moduleRequest.end);
    const literal = /^(['"`])([^'"`$]*)\1$/.exec(asked)?.[2];
    if (literal !== undefined) note(literal, false);
    else if (!path.endsWith('.mjs')) faults.push(`${path}: imports a name that is only known when it runs`);
  }
  new Visitor({
    TSImportType: () => faults.push(`${path}: write "import type" instead of import() in a type`),
    TSImportEqualsDeclaration: () => faults.push(`${path}: write "import", not "import ="`),
  }).visit(parsed.program);
  return { imports, faults };
}

/** The target as a path in the house without its ending, or the name of the package. */
function targetOf({ from, spelled }: Import): string {
  const plain = spelled.replace(/\?.*$/, '');
  return plain.startsWith('.') ? withoutEnding(posix.join(posix.dirname(from), plain)) : plain;
}

function cyclesIn(edges: ReadonlyMap<string, readonly string[]>): string[] {
  const state = new Map<string, 'open' | 'closed'>();
  const path: string[] = [];
  const cycles: string[] = [];
  const visit = (file: string): void => {
    if (state.get(file) === 'closed') return;
    if (state.get(file) === 'open') {
      cycles.push(`import cycle: ${[...path.slice(path.indexOf(file)), file].join(' → ')}`);
      return;
    }
    state.set(file, 'open');
    path.push(file);
    for (const next of edges.get(file) ?? []) visit(next);
    path.pop();
    state.set(file, 'closed');
  };
  for (const file of edges.keys()) visit(file);
  return cycles;
}

/** Every breach of the rows above, and every import cycle, one line each. */
export function breachesOfLayers(sources: Sources): readonly string[] {
  const breaches: string[] = [];
  const edges = new Map<string, readonly string[]>();
  for (const [path, text] of sources) {
    if (!CODE.test(path)) continue;
    const { imports, faults } = importsIn(path, text);
    breaches.push(...faults);
    const who = withoutEnding(path);
    edges.set(who, [...new Set(imports.map(targetOf))]);
    for (const one of imports) {
      const target = targetOf(one);
      if (one.spelled.startsWith('.') && /\.tsx?$/.test(one.spelled))
        breaches.push(`${path}: leave the ending out of ${one.spelled}`);
      for (const { who: subject, values, types, rule } of rows) {
        if (!subject.test(who)) continue;
        const allowed = (one.typeOnly ? types : values).test(target);
        if (!allowed) breaches.push(`${path} imports ${one.typeOnly ? 'types from ' : ''}${target}: ${rule}`);
      }
    }
  }
  return [...breaches, ...cyclesIn(edges)];
}
