import { collisionRate } from '../coagulation/collisionRate';
import { type Encounters, lnHalfLife, lnRequiredStabilityRatio } from '../coagulation/losses';
import { requiredBarrier } from '../coagulation/requiredBarrier';
import type { PairRates } from '../evaluation';
import type { SolvedFormulation, SolvedPair } from './solve';

/** Where neither a double layer nor a polymer layer repels, the barrier would still have to be about this wide. */
const SHORT_RANGE_m = 1e-9;

export interface RateQuestion {
  readonly solved: SolvedFormulation;
  readonly pair: SolvedPair;
  readonly requirement: { readonly shelfLife_s: number; readonly acceptedLoss: number };
}

function encountersOf({ model }: SolvedFormulation, { model: pair, first, second }: SolvedPair): Encounters {
  return {
    collisionRate_m3_s: collisionRate({
      radius1_m: pair.first.radius_m,
      radius2_m: pair.second.radius_m,
      temperature_K: model.temperature_K,
      viscosity_Pa_s: model.medium.viscosity_Pa_s,
    }),
    numberDensity_per_m3: Math.max(pair.first.numberDensity_per_m3, pair.second.numberDensity_per_m3),
    alike: first === second,
  };
}

const log10 = (natural: number): number => natural / Math.LN10;

/** Decades by which the stability ratio exceeds what the shelf life asks for. */
export function coagulationMarginOf({ solved, pair, requirement }: RateQuestion): number {
  const encounters = encountersOf(solved, pair);
  const needed = lnRequiredStabilityRatio(requirement.shelfLife_s, requirement.acceptedLoss, encounters);
  return log10(pair.lnStabilityRatio - needed);
}

/** Rates of one pair at the loading given, and what the shelf life asks for. */
export function pairRates(question: RateQuestion): PairRates {
  const { solved, pair, requirement } = question;
  const encounters = encountersOf(solved, pair);
  const lnRequired = lnRequiredStabilityRatio(requirement.shelfLife_s, requirement.acceptedLoss, encounters);
  const halfLife = lnHalfLife(pair.lnStabilityRatio, encounters);
  const { first, second, doubleLayer } = pair.model;
  const layers_m = Math.max(first.layer?.thickness_m ?? 0, second.layer?.thickness_m ?? 0);
  const screening_m = doubleLayer === null ? null : solved.model.medium.debyeLength_m;
  return {
    lnStabilityRatio: pair.lnStabilityRatio,
    log10StabilityRatio: log10(pair.lnStabilityRatio),
    collisionRate_m3_s: encounters.collisionRate_m3_s,
    halfLife_s: Math.exp(halfLife),
    log10HalfLife_s: log10(halfLife),
    requiredLog10StabilityRatio: log10(lnRequired),
    requiredBarrier_kT: requiredBarrier({
      lnRequiredStabilityRatio: lnRequired,
      meanRadius_m: (2 * first.radius_m * second.radius_m) / (first.radius_m + second.radius_m),
      repulsionRange_m: screening_m ?? (layers_m > 0 ? layers_m : SHORT_RANGE_m),
    }),
  };
}
