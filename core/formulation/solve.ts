import { lnStabilityRatio } from '../coagulation/stabilityRatio';
import type { CurveFeatures } from '../evaluation';
import { findFeatures } from '../pairEnergy/curveFeatures';
import { totalEnergy } from '../pairEnergy/pairForces';
import { separationGrid } from '../pairEnergy/separationGrid';
import { done, type Result } from '../problem';
import type { Formulation } from '../scenario/scenario';
import { type FormulationModel, formulationModel } from './formulationModel';
import { type PairModel, pairModel } from './pairModel';

/** What decides about a pair: the shape of its energy curve and the rate at which it sticks. */
export interface SolvedPair {
  /** Indices into the model's particles. */
  readonly first: number;
  readonly second: number;
  readonly model: PairModel;
  readonly separation_m: Float64Array;
  readonly features: CurveFeatures;
  readonly lnStabilityRatio: number;
}

export interface SolvedFormulation {
  readonly model: FormulationModel;
  readonly pairs: readonly SolvedPair[];
}

/** Every pair of kinds, each once: 1–1, 1–2, 2–2. */
export function pairIndices(kinds: number): readonly (readonly [number, number])[] {
  const pairs: [number, number][] = [];
  for (let first = 0; first < kinds; first += 1) {
    for (let second = first; second < kinds; second += 1) pairs.push([first, second]);
  }
  return pairs;
}

/** Features and rate are worked out when first asked for: a limit search needs only one of them. */
function solvePair(model: PairModel, first: number, second: number): SolvedPair {
  const energy_kT = totalEnergy(model.forces);
  let separation_m: Float64Array | undefined;
  let features: CurveFeatures | undefined;
  let logRatio: number | undefined;
  return {
    first,
    second,
    model,
    get separation_m() {
      separation_m ??= separationGrid(model.forces);
      return separation_m;
    },
    get features() {
      features ??= findFeatures(energy_kT, this.separation_m);
      return features;
    },
    get lnStabilityRatio() {
      logRatio ??= lnStabilityRatio({
        energy_kT,
        radius1_m: model.first.radius_m,
        radius2_m: model.second.radius_m,
        contact_m: model.forces.contact_m,
      });
      return logRatio;
    },
  };
}

/**
 * The core of an evaluation, without doubts, limits and words: light enough to be asked hundreds of times while a limit
 * is searched. `hamakerScale` moves the Hamaker constant by its doubt.
 */
export function solve(formulation: Formulation, hamakerScale = 1): Result<SolvedFormulation> {
  const built = formulationModel(formulation);
  if (!built.ok) return built;
  const model = built.value;
  const pairs: SolvedPair[] = [];
  for (const [first, second] of pairIndices(model.particles.length)) {
    const pair = pairModel(model, model.particles[first], model.particles[second], {
      hamaker: formulation.hamaker,
      doubleLayerModel: formulation.doubleLayerModel,
      hamakerScale,
    });
    if (!pair.ok) return pair;
    pairs.push(solvePair(pair.value, first, second));
  }
  return done({ model, pairs });
}
