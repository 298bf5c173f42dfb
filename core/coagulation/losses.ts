import { mustBePositive } from '../validity';

/** Encounters of one kind of particle with itself or with another. */
export interface Encounters {
  readonly collisionRate_m3_s: number;
  /** Of the kind itself, or for unlike particles of the more numerous kind. */
  readonly numberDensity_per_m3: number;
  readonly alike: boolean;
}

/**
 * Natural logarithm of the time [s] until a share of the single particles is lost, without barrier (W = 1).
 *
 *     alike:   n₁ = n₀/(1 + t/τ)², τ = 2/(K n₀):   t = τ [(1 − f)^(−1/2) − 1]
 *     unlike:  each of the rarer kind is caught by the more numerous, n = n₀ exp(−K n' t):   t = −ln(1 − f)/(K n')
 *
 * Source  von Smoluchowski 1917 (as {@link collisionRate}); the unlike case: pseudo-first order, own derivation.
 * Throws  RangeError for rates that are not positive or a share outside 0 to 1.
 */
function logTimeToLose(share: number, { collisionRate_m3_s, numberDensity_per_m3, alike }: Encounters): number {
  mustBePositive('logTimeToLose', { collisionRate_m3_s, numberDensity_per_m3, share });
  if (share >= 1) throw new RangeError(`logTimeToLose: share must be below one, got ${share}`);
  const logRate = Math.log(collisionRate_m3_s) + Math.log(numberDensity_per_m3);
  const progress = alike ? 2 * Math.expm1(-0.5 * Math.log1p(-share)) : -Math.log1p(-share);
  return Math.log(progress) - logRate;
}

/** ln of the stability ratio needed so that no more than `acceptedLoss` of the singles is lost within `time_s`. */
export function lnRequiredStabilityRatio(time_s: number, acceptedLoss: number, encounters: Encounters): number {
  mustBePositive('lnRequiredStabilityRatio', { time_s });
  return Math.log(time_s) - logTimeToLose(acceptedLoss, encounters);
}

/**
 * ln of the half-life [s] at a given ln W: the total count halves, t = 2W/(K n₀); for unlike particles half of the rarer
 * kind is caught, t = ln 2 · W/(K n').
 * Source  as above.
 */
export function lnHalfLife(
  lnStabilityRatio: number,
  { collisionRate_m3_s, numberDensity_per_m3, alike }: Encounters,
): number {
  mustBePositive('lnHalfLife', { collisionRate_m3_s, numberDensity_per_m3 });
  const logRate = Math.log(collisionRate_m3_s) + Math.log(numberDensity_per_m3);
  return lnStabilityRatio + Math.log(alike ? 2 : Math.LN2) - logRate;
}
