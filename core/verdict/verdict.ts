import { lnEscapeTime } from '../coagulation/wellEscape';
import { pairedShare } from '../coagulation/wellOccupation';
import type { CurvePoint, PairEvaluation, ParticleState, Verdict } from '../evaluation';
import type { PairDoubt } from '../formulation/doubt';
import { formulationModel } from '../formulation/formulationModel';
import { coagulationMarginOf } from '../formulation/pairRates';
import { particleSettling } from '../formulation/particleState';
import type { RequirementModel } from '../formulation/requirementModel';
import { type SolvedFormulation, type SolvedPair, solve } from '../formulation/solve';
import { totalEnergy } from '../pairEnergy/pairForces';
import type { Formulation } from '../scenario/scenario';
import { COAGULATION_LEVERS, coagulationLine } from './coagulationLine';
import { findLimits } from './findLimits';
import { FLOCCULATION_LEVERS, flocculationLine, flocculationMargin } from './flocculationLine';
import { worstOf } from './level';
import { notConsidered } from './notConsidered';
import { SETTLING_LEVERS, settlingLine, settlingMargin } from './settlingLine';

export interface VerdictQuestion {
  readonly formulation: Formulation;
  readonly solved: SolvedFormulation;
  readonly requirement: RequirementModel;
  /** One for each pair. */
  readonly doubts: readonly PairDoubt[];
  readonly pairs: readonly PairEvaluation[];
  readonly particles: readonly ParticleState[];
  readonly weakestPair: number;
}

const kindsOf = ({ first, second }: SolvedPair): readonly number[] => [first, second];

/** null for unlike particles, and where no barrier keeps the well apart from contact. */
function shareInPairs({ model, features, separation_m, first, second }: SolvedPair): number | null {
  const { barrier, outerMinimum } = features;
  if (first !== second || barrier === null || outerMinimum === null) return null;
  return pairedShare({
    energy_kT: totalEnergy(model.forces),
    radius_m: model.first.radius_m,
    from_m: barrier.separation_m,
    to_m: separation_m[separation_m.length - 1],
    numberDensity_per_m3: model.first.numberDensity_per_m3,
  });
}

/** A pair counts as parted where a tenth of the well's depth is left: farther out the time is that of a long walk. */
const PARTED_SHARE = 0.1;

function partedGap({ separation_m, model: { forces } }: SolvedPair, well: CurvePoint): number {
  const energy_kT = totalEnergy(forces);
  const beyond = separation_m.find(
    (gap_m) => gap_m > well.separation_m && energy_kT(gap_m) > PARTED_SHARE * well.energy_kT,
  );
  return beyond ?? separation_m[separation_m.length - 1];
}

function escapeTime({ model: { temperature_K, medium } }: SolvedFormulation, pair: SolvedPair): number | null {
  const { barrier, outerMinimum } = pair.features;
  if (barrier === null || outerMinimum === null) return null;
  const { first, second, forces } = pair.model;
  const lnTime = lnEscapeTime({
    energy_kT: totalEnergy(forces),
    radius1_m: first.radius_m,
    radius2_m: second.radius_m,
    barrier_m: barrier.separation_m,
    well_m: outerMinimum.separation_m,
    parted_m: partedGap(pair, outerMinimum),
    temperature_K,
    viscosity_Pa_s: medium.viscosity_Pa_s,
  });
  return lnTime / Math.LN10;
}

/** The pair whose reachable well is deepest. */
const deepestWell = (pairs: readonly SolvedPair[]): number => {
  const margins = pairs.map(flocculationMargin);
  return margins.indexOf(Math.min(...margins));
};

const firstToSettle = (particles: readonly ParticleState[], requirement: RequirementModel): number => {
  const margins = particles.map(({ settling }) => settlingMargin(settling, requirement));
  return margins.indexOf(Math.min(...margins));
};

/** Margin of a changed formulation; not a number when it cannot be evaluated, which counts as not holding. */
const marginOf =
  (margin: (solved: SolvedFormulation) => number) =>
  (formulation: Formulation): number => {
    const solved = solve(formulation);
    return solved.ok ? margin(solved.value) : Number.NaN;
  };

/** Settling asks nothing of the forces, so they are not worked out for it. */
function settlingMarginOf(formulation: Formulation, requirement: RequirementModel): number {
  const model = formulationModel(formulation);
  if (!model.ok) return Number.NaN;
  const { particles } = model.value;
  return Math.min(
    ...particles.map((particle) => settlingMargin(particleSettling(particle, model.value, requirement), requirement)),
  );
}

/** Three separate answers, each with its numbers, its margin and its limits; never one bare word. */
export function verdict(question: VerdictQuestion): Verdict {
  const { formulation, solved, requirement, doubts, pairs, particles, weakestPair } = question;
  const viscosity_mPa_s = 1000 * solved.model.medium.viscosity_Pa_s;
  const lever = (kinds: readonly number[]) => ({ formulation, kinds, viscosity_mPa_s });

  const weakest = solved.pairs[weakestPair];
  const coagulation = coagulationLine({
    pair: weakest,
    rates: pairs[weakestPair].rates,
    doubt: doubts[weakestPair],
    limits: findLimits(
      COAGULATION_LEVERS,
      lever(kindsOf(weakest)),
      marginOf((changed) =>
        Math.min(...changed.pairs.map((pair) => coagulationMarginOf({ solved: changed, pair, requirement }))),
      ),
    ),
  });

  const clinging = deepestWell(solved.pairs);
  const flocculation = flocculationLine({
    pair: solved.pairs[clinging],
    depthDoubt_kT: doubts[clinging].outerMinimum_kT,
    pairedShare: shareInPairs(solved.pairs[clinging]),
    log10EscapeTime_s: escapeTime(solved, solved.pairs[clinging]),
    limits: findLimits(
      FLOCCULATION_LEVERS,
      lever(kindsOf(solved.pairs[clinging])),
      marginOf((changed) => Math.min(...changed.pairs.map(flocculationMargin))),
    ),
  });

  const settler = firstToSettle(particles, requirement);
  const settling = settlingLine({
    particleName: particles[settler].name,
    settling: particles[settler].settling,
    requirement,
    viscosityMeasured: solved.model.medium.measured.includes('viscosity_Pa_s'),
    limits: findLimits(SETTLING_LEVERS, lever([settler]), (changed) => settlingMarginOf(changed, requirement)),
  });

  const lines = [coagulation, flocculation, settling];
  const solids = particles.reduce((sum, { volumeFraction }) => sum + volumeFraction, 0);
  return {
    level: worstOf(lines.map(({ level }) => level)),
    lines,
    notConsidered: notConsidered(formulation, solids),
  };
}
