import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { parseSync } from 'oxc-parser';
import { describe, expect, it } from 'vitest';

/**
 * Every name in core that stores a physical number ends in its unit. The parser sees which names are numbers; whether
 * a number without a unit is dimensionless, only the list below can say: lengthen it with thought.
 */

/** Units as they stand after the one underscore: m³/s is m3_s, 1/m³ is per_m3. */
const units = [
  ...['m', 'mm', 'um', 'nm', 'm2', 'm3', 'per_m', 'per_m2', 'per_m3', 'per_nm2', 'A3'],
  ...['s', 'days', 'years', 'per_s', 'm_s', 'm2_s', 'm3_s', 'm_s2', 'm3_kg'],
  ...['K', 'degC', 'per_K', 'kT', 'J', 'zJ', 'eV', 'N', 'Pa', 'J_m2', 'J_m3', 'N_m', 'kT_nm', 'J_K', 'J_m', 'm2_J'],
  ...['V', 'mV', 'C', 'C_m', 'C_m2', 'F_m', 'F_m2', 'D', 'S_m', 'mS_cm'],
  ...[
    'mol',
    'mol_m2',
    'mol_m3',
    'mM',
    'per_mol',
    'kg_mol',
    'g_mol',
    'kg',
    'kg_m2',
    'kg_m3',
    'mg_m2',
    'J_mol',
    'm3_mol',
  ],
  ...['Pa_s', 'mPa_s', 'rad_s', 'rad2_s2', 'Hz', 'dH', 'percent', 'm2_V_s', 'um_cm_V_s', 'J6_m6', 'J_m6'],
];

/** Numbers without a dimension, and counts and places that are no physical quantities. */
const dimensionless = new Set([
  ...[
    'relativePermittivity',
    'staticPermittivity',
    'refractiveIndex',
    'volumeFraction',
    'massFraction',
    'moleFraction',
  ],
  ...['valence', 'strength', 'floryChi', 'pH', 'pKw', 'layerVolumeFraction', 'volumeParts'],
  ...['relativeUncertainty', 'acrossVacuum', 'acrossLiquid', 'kappaRadius', 'pecletNumber'],
  ...[
    'lnStabilityRatio',
    'lnRequiredStabilityRatio',
    'log10StabilityRatio',
    'requiredLog10StabilityRatio',
    'standardUncertaintyLog10W',
  ],
  ...['log10HalfLife_s'], // a logarithm, of the unit named
  ...['permittivity', 'mediumPermittivity', 'measuredRelativePermittivity', 'polarizabilityDensity', 'hamakerScale'],
  ...['fraction', 'share', 'pairedShare', 'hamakerShare', 'solids', 'acceptedLoss', 'acceptedClearLayer'],
  ...['log10WDown', 'log10WUp', 'x', 'q', 'rest'], // arguments of pure functions: the trilogarithm, 1 − q
  ...['pairIndex', 'kinds', 'digits', 'maxLength'],
  ...['reducedPotential', 'kappaGap', 'kappaRadiusSmaller', 'saturation'],
  ...['perFormula', 'form', 'first', 'second', 'weakestPair', 'schema', 'index', 'count', 'length'],
  // a number whose unit stands beside it, or is that of the span or table it belongs to
  ...['value', 'from', 'to', 'min', 'max', 'actual', 'needed', 'margin', 'current', 'downwardDoubt', 'upwardDoubt'],
]);

const hasUnit = (name: string): boolean => units.some((unit) => name.endsWith(`_${unit}`));
const isInOrder = (name: string): boolean => dimensionless.has(name) || hasUnit(name);

interface Node {
  readonly type: string;
  readonly [key: string]: unknown;
}

const isNode = (value: unknown): value is Node =>
  typeof value === 'object' && value !== null && typeof (value as { type?: unknown }).type === 'string';

const childrenOf = (node: Node): Node[] => Object.values(node).flat().filter(isNode);

/** `number`, and `number` or nothing. */
function isNumber(annotation: unknown): boolean {
  if (!isNode(annotation)) return false;
  if (annotation.type === 'TSTypeAnnotation') return isNumber(annotation.typeAnnotation);
  if (annotation.type === 'TSUnionType') {
    const options = childrenOf(annotation).filter(
      ({ type }) => type !== 'TSNullKeyword' && type !== 'TSUndefinedKeyword',
    );
    return options.length > 0 && options.every(isNumber);
  }
  return annotation.type === 'TSNumberKeyword';
}

const isFunction = ({ type }: Node): boolean => type === 'FunctionDeclaration' || type === 'ArrowFunctionExpression';

/** Names of number-typed properties anywhere, and of number-typed parameters of exported functions. */
function numbersIn(source: string): string[] {
  const names: string[] = [];
  const parameters = (fn: Node): void => {
    for (const parameter of Array.isArray(fn.params) ? fn.params : []) {
      const named = isNode(parameter) && parameter.type === 'AssignmentPattern' ? parameter.left : parameter;
      if (isNode(named) && named.type === 'Identifier' && isNumber(named.typeAnnotation))
        names.push(String(named.name));
    }
  };
  const visit = (node: Node): void => {
    if (node.type === 'TSPropertySignature' && isNode(node.key) && isNumber(node.typeAnnotation)) {
      names.push(String(node.key.name ?? node.key.value));
    }
    if (node.type === 'ExportNamedDeclaration' && isNode(node.declaration)) {
      const { declaration } = node;
      if (isFunction(declaration)) parameters(declaration);
      for (const declared of declaration.type === 'VariableDeclaration' ? childrenOf(declaration) : []) {
        if (isNode(declared.init) && isFunction(declared.init)) parameters(declared.init);
      }
    }
    childrenOf(node).forEach(visit);
  };
  const { program, errors } = parseSync('source.ts', source);
  if (errors.length > 0) throw new Error(errors[0].message);
  visit(program as unknown as Node);
  return names;
}

const badNamesIn = (source: string): string[] => numbersIn(source).filter((name) => !isInOrder(name));

const root = fileURLToPath(new URL('../../', import.meta.url));
/** Mathematics knows no units: its x, tolerance and order are numbers of any kind. */
const files = readdirSync(join(root, 'core'), { recursive: true, withFileTypes: true })
  .filter((entry) => entry.isFile() && entry.name.endsWith('.ts'))
  .map((entry) => relative(root, join(entry.parentPath, entry.name)))
  .filter((file) => !file.startsWith(join('core', 'numerics')))
  .sort();

describe('every number in core says its unit', () => {
  it.each(files)('%s', (file) => {
    expect(badNamesIn(readFileSync(join(root, file), 'utf8'))).toEqual([]);
  });
});

describe('the check itself', () => {
  it('reads real files: it finds the numbers of the evaluation', () => {
    const found = numbersIn(readFileSync(join(root, 'core/evaluation.ts'), 'utf8'));
    expect(found).toContain('viscosity_Pa_s');
    expect(found).toContain('debyeLength_m');
    expect(found.length).toBeGreaterThan(40);
  });

  it.each([
    ['a property', 'export interface A { readonly radius: number }', 'radius'],
    ['a property that may be null', 'interface A { radius: number | null }', 'radius'],
    ['a property of an inline type', 'export function f({ radius }: { readonly radius: number }): void {}', 'radius'],
    ['a parameter', 'export function f(radius: number): void {}', 'radius'],
    ['a parameter with a default', 'export function f(radius: number = 1): void {}', 'radius'],
    ['a parameter of an arrow', 'export const f = (radius: number) => radius;', 'radius'],
    ['a unit that is none', 'interface A { radius_furlong: number }', 'radius_furlong'],
    ['a unit without underscore', 'interface A { radiusNm: number }', 'radiusNm'],
  ])('catches %s', (_, source, name) => {
    expect(badNamesIn(source)).toEqual([name]);
  });

  it.each([
    ['a name with its unit', 'export interface A { readonly radius_m: number }'],
    ['a listed name', 'interface A { valence: number }'],
    ['other types', 'interface A { name: string; radii: Map<string, string>; law(x: number): number }'],
    ['what stays inside', 'function f(x: number): number { return x; }'],
  ])('passes %s', (_, source) => {
    expect(badNamesIn(source)).toEqual([]);
  });
});
