import { create, type MathNode, parseDependencies } from 'mathjs/number';
import { add, divide, multiply, NoExactValue, negative, power, type Rational, rational, subtract } from './rational';
import type { Token } from './tokens';
import type { Dimension, Unit } from './units';

/**
 * Small sums typed into a field: `2*35 nm`, `(12+3)*2`, `0.2 µm + 40 nm`.
 *
 * mathjs parses; it never evaluates. Its own units are unsafe here (kT is a kilotesla, 0.1 um gives
 * 99.99999999999999 nm) and some of its functions, `config` among them, change the library from within an expression.
 * So it is given only numbers, stand-ins for units and six signs, and the tree it returns is worked out here over an
 * allow-list, in exact fractions.
 */
const { parse } = create({ parseDependencies });

const MAX_DEPTH = 20;
const MAX_NODES = 100;

/** Thrown and caught inside this room. */
export class Refusal extends Error {
  readonly code: 'not-understood' | 'too-complex' | 'mixed-units' | 'no-value';
  constructor(code: Refusal['code'], message: string) {
    super(message);
    this.code = code;
  }
}

/** A pure number, or an amount in the SI unit of its dimension. */
export interface Amount {
  readonly value: Rational;
  readonly dimension: Dimension | null;
}

export const inSI = (value: Rational, unit: Unit): Rational =>
  divide(multiply(add(value, rational(unit.offset)), rational(unit.factor)), rational(unit.divisor));

export const outOfSI = (value: Rational, unit: Unit): Rational =>
  subtract(divide(multiply(value, rational(unit.divisor)), rational(unit.factor)), rational(unit.offset));

const standIn = (index: number): string => `unit${index}`;

/** The expression for the parser: a unit binds to the number or bracket before it, closer than any sign. */
function expressionOf(tokens: readonly Token[], unitsSeen: Unit[]): string {
  const parts: string[] = [];
  const openings: number[] = [];
  let operandStart: number | null = null;
  for (const token of tokens) {
    if (token.kind === 'number') {
      operandStart = parts.length;
      parts.push(` ${token.decimal} `);
    } else if (token.kind === 'sign') {
      if (token.sign === '(') openings.push(parts.length);
      operandStart = token.sign === ')' ? (openings.pop() ?? null) : null;
      parts.push(token.sign);
    } else {
      if (operandStart === null) throw new Refusal('not-understood', 'A unit has to follow its number.');
      parts[operandStart] = `(${parts[operandStart]}`;
      parts.push(`*${standIn(unitsSeen.length)})`);
      unitsSeen.push(token.unit);
      operandStart = null;
    }
  }
  return parts.join('');
}

const MIXED = 'Numbers with and without a unit, or with units of different kinds, are mixed.';

function sameDimension(a: Amount, b: Amount): Dimension | null {
  if (a.dimension !== b.dimension) throw new Refusal('mixed-units', MIXED);
  return a.dimension;
}

function product(a: Amount, b: Amount): Amount {
  if (a.dimension !== null && b.dimension !== null) throw new Refusal('mixed-units', 'Two units are multiplied.');
  return { value: multiply(a.value, b.value), dimension: a.dimension ?? b.dimension };
}

function quotient(a: Amount, b: Amount): Amount {
  const value = divide(a.value, b.value);
  if (b.dimension === null) return { value, dimension: a.dimension };
  if (a.dimension === b.dimension) return { value, dimension: null };
  throw new Refusal('mixed-units', 'A number is divided by one of another unit.');
}

function raised(a: Amount, b: Amount): Amount {
  if (a.dimension !== null || b.dimension !== null) throw new Refusal('mixed-units', 'A unit is raised to a power.');
  return { value: power(a.value, b.value), dimension: null };
}

const binary = new Map<string, (a: Amount, b: Amount) => Amount>([
  ['add', (a, b) => ({ value: add(a.value, b.value), dimension: sameDimension(a, b) })],
  ['subtract', (a, b) => ({ value: subtract(a.value, b.value), dimension: sameDimension(a, b) })],
  ['multiply', product],
  ['divide', quotient],
  ['pow', raised],
]);

/** The fields of a mathjs node that are looked at; any other kind of node is refused. */
interface SeenNode {
  readonly type: string;
  readonly value?: unknown;
  readonly name?: string;
  readonly fn?: unknown;
  readonly implicit?: boolean;
  readonly content?: SeenNode;
  readonly args?: readonly SeenNode[];
}

function amountOf(root: SeenNode, unitsSeen: readonly Unit[]): Amount {
  let nodes = 0;
  const visit = (node: SeenNode, depth: number): Amount => {
    nodes += 1;
    if (depth > MAX_DEPTH || nodes > MAX_NODES) throw new Refusal('too-complex', 'The sum is too long.');
    if (node.type === 'ConstantNode' && typeof node.value === 'number' && Number.isFinite(node.value)) {
      return { value: rational(String(node.value)), dimension: null };
    }
    if (node.type === 'SymbolNode') {
      const unit = unitsSeen.find((_, index) => standIn(index) === node.name);
      if (unit !== undefined) return { value: inSI(rational('1'), unit), dimension: unit.dimension };
    }
    if (node.type === 'ParenthesisNode' && node.content !== undefined) return visit(node.content, depth + 1);
    if (node.type === 'OperatorNode' && typeof node.fn === 'string' && node.args !== undefined && !node.implicit) {
      const values = node.args.map((argument) => visit(argument, depth + 1));
      if (values.length === 1 && node.fn === 'unaryMinus') return { ...values[0], value: negative(values[0].value) };
      if (values.length === 1 && node.fn === 'unaryPlus') return values[0];
      const work = binary.get(node.fn);
      if (values.length === 2 && work !== undefined) return work(values[0], values[1]);
    }
    throw new Refusal('not-understood', 'The sum cannot be read.');
  };
  return visit(root, 1);
}

function worked(tokens: readonly Token[]): Amount {
  const unitsSeen: Unit[] = [];
  const expression = expressionOf(tokens, unitsSeen);
  let tree: MathNode;
  try {
    tree = parse(expression);
  } catch {
    throw new Refusal('not-understood', 'The sum cannot be read.');
  }
  try {
    return amountOf(tree as unknown as SeenNode, unitsSeen);
  } catch (error) {
    if (!(error instanceof NoExactValue)) throw error;
    throw error.why === 'too-complex'
      ? new Refusal('too-complex', 'The sum is too long, or its numbers are.')
      : new Refusal('no-value', 'The sum has no value: it divides by zero, or takes a root.');
  }
}

/**
 * Works a sum out. One unit at the very end counts for the whole (`4.1-1.0 g/cm³`); several belong each to its number.
 * `unitIfBare` is taken when no unit was typed. Throws {@link Refusal}.
 */
export function amountFrom(tokens: readonly Token[], unitIfBare: Unit | null): Amount {
  const typedUnits = tokens.flatMap((token) => (token.kind === 'unit' ? [token.unit] : []));
  const last = tokens.at(-1);
  const common = typedUnits.length === 1 && last?.kind === 'unit' ? last.unit : null;
  if (typedUnits.length > 0 && common === null) {
    if (typedUnits.some(({ offset }) => offset !== '0')) {
      throw new Refusal('mixed-units', 'Degrees cannot be added up with their unit at each number.');
    }
    return worked(tokens);
  }
  const pure = worked(common === null ? tokens : tokens.slice(0, -1));
  const unit = common ?? unitIfBare;
  return unit === null ? pure : { value: inSI(pure.value, unit), dimension: unit.dimension };
}
