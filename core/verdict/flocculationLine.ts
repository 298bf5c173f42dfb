import type { CurvePoint, Limit, VerdictLine } from '../evaluation';
import type { SolvedPair } from '../formulation/solve';
import { levelOf } from './level';
import { number, timeSpan } from './words';

export const FLOCCULATION_LEVERS = ['salt', 'layerThickness', 'diameter'] as const;

/**
 * Depth of the well that a pair can fall into without crossing a barrier, in kT. Below 2 kT heat shakes pairs apart at
 * once; beyond 5 kT they stay together between two stirrings (common practice; compare the second virial coefficient).
 */
export const HARMLESS_DEPTH_kT = 2;
export const FLOCCULATED_DEPTH_kT = 5;

export interface FlocculationCase {
  readonly pair: SolvedPair;
  readonly depthDoubt_kT: number;
  /** Share of particles found in pairs at equilibrium in the well at this loading, 0 to 1; null when there is no well. */
  readonly pairedShare: number | null;
  /** log₁₀ of the mean time [s] after which heat parts such a pair; null when there is no well to leave. */
  readonly log10EscapeTime_s: number | null;
  readonly limits: readonly Limit[];
}

/** Without a barrier the well that is reached is contact itself. */
export const reachableWell = ({ features }: SolvedPair): CurvePoint | null =>
  features.barrier === null ? (features.primaryMinimum ?? features.outerMinimum) : features.outerMinimum;

export const flocculationMargin = (pair: SolvedPair): number =>
  FLOCCULATED_DEPTH_kT + (reachableWell(pair)?.energy_kT ?? 0);

const escapeInWords = (log10Time_s: number | null): string =>
  log10Time_s === null ? '' : ` Left alone, a pair parts after ${timeSpan(log10Time_s)}.`;

/** Beyond a third the count of pairs alone says too little: triplets and networks form. */
function shareInWords(pairedShare: number | null): string {
  if (pairedShare === null) return '';
  const words = pairedShare > 1 / 3 ? 'more than a third' : `about ${number(100 * pairedShare, 2)} %`;
  return ` At this loading ${words} of the particles sit in it at any time.`;
}

function statement({ pair, pairedShare, log10EscapeTime_s }: FlocculationCase): string {
  const well = reachableWell(pair);
  if (well === null) return 'No well outside the barrier: the particles do not cling to one another.';
  const depth = `${number(-well.energy_kT, 2)} kT deep at a gap of ${number(well.separation_m * 1e9, 2)} nm`;
  if (pair.features.barrier === null && pair.features.primaryMinimum !== null) {
    return `Nothing keeps the particles from contact, a well ${depth}: stirring will not part them.`;
  }
  const share = `${escapeInWords(log10EscapeTime_s)}${shareInWords(pairedShare)}`;
  if (-well.energy_kT < HARMLESS_DEPTH_kT) return `The outer well is ${depth}: heat alone parts the particles.${share}`;
  if (-well.energy_kT < FLOCCULATED_DEPTH_kT) {
    return `The outer well is ${depth}: loose, reversible flocs that stirring breaks; they raise the viscosity at rest and keep sediment soft.${share}`;
  }
  return `The outer well is ${depth}: the particles flocculate, reversibly while sheared, for good when left alone.${share}`;
}

/** Will the particles cling together, at arm's length, in the outer minimum? */
export function flocculationLine(one: FlocculationCase): VerdictLine {
  const depth_kT = -(reachableWell(one.pair)?.energy_kT ?? 0);
  const margin_kT = FLOCCULATED_DEPTH_kT - depth_kT;
  // Between the two depths nothing is settled, whatever the doubt.
  const doubt_kT = Math.max(one.depthDoubt_kT, FLOCCULATED_DEPTH_kT - HARMLESS_DEPTH_kT);
  return {
    subject: 'flocculation',
    level: levelOf(margin_kT, doubt_kT, one.depthDoubt_kT),
    statement: statement(one),
    margin: {
      quantity: 'depth of the outer minimum',
      unit: 'kT',
      actual: depth_kT,
      needed: FLOCCULATED_DEPTH_kT,
      margin: margin_kT,
    },
    limits: one.limits,
  };
}
