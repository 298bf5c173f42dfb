import type { Limit, SettlingState, VerdictLine } from '../evaluation';
import type { RequirementModel } from '../formulation/requirementModel';
import { levelOf } from './level';
import { number, timeSpan } from './words';

export const SETTLING_LEVERS = ['viscosity', 'diameter'] as const;

/** Velocity goes with the square of a size known to ±10 %, and with a viscosity known to ±5 % measured, ±35 % mixed. */
const SIZE_DOUBT = 0.2;
const MEASURED_VISCOSITY_DOUBT = 0.05;
const COMPUTED_VISCOSITY_DOUBT = 0.35;

export interface SettlingCase {
  readonly particleName: string;
  readonly settling: SettlingState;
  readonly requirement: RequirementModel;
  readonly viscosityMeasured: boolean;
  readonly limits: readonly Limit[];
}

const S_PER_DAY = 86_400;
const DAYS_PER_CENTURY = 36_525;
/** Shown instead of "never", so that every margin is a finite number. */
const LONGEST_days = 1000 * DAYS_PER_CENTURY;

export const settlingTime_days = (settling: SettlingState, requirement: RequirementModel): number =>
  staysSuspended(settling, requirement) ? LONGEST_days : Math.min(LONGEST_days, settling.timeToClear_s / S_PER_DAY);

/** Brownian motion alone keeps the particles spread over the whole height. */
const staysSuspended = (settling: SettlingState, requirement: RequirementModel): boolean =>
  settling.gravitationalLength_m >= requirement.fillHeight_m;

export const settlingMargin = (settling: SettlingState, requirement: RequirementModel): number =>
  Math.log10((settlingTime_days(settling, requirement) * S_PER_DAY) / requirement.shelfLife_s);

/** Will a clear layer form in the can? Judged for single particles in the medium at rest. */
export function settlingLine(one: SettlingCase): VerdictLine {
  const { settling, requirement, viscosityMeasured, particleName } = one;
  const time_days = settlingTime_days(settling, requirement);
  const doubt = Math.log10(
    1 + Math.hypot(SIZE_DOUBT, viscosityMeasured ? MEASURED_VISCOSITY_DOUBT : COMPUTED_VISCOSITY_DOUBT),
  );
  const layer = `a clear layer of ${number(100 * requirement.acceptedClearLayer, 2)} % of the fill height`;
  const speed_mm_per_day = Math.abs(settling.hinderedVelocity_m_s) * 1000 * S_PER_DAY;
  const way = settling.stokesVelocity_m_s < 0 ? 'rises' : 'settles';
  const statement = staysSuspended(settling, requirement)
    ? `${particleName}: Brownian motion keeps it suspended over the whole fill height.`
    : time_days >= LONGEST_days
      ? `${particleName}: matched to the density of the medium, it neither settles nor rises.`
      : `${particleName} ${way} by ${number(speed_mm_per_day, 2)} mm a day: ${layer} after ${timeSpan(Math.log10(time_days * S_PER_DAY))}; a yield stress of ${number(1000 * settling.suspendingYieldStress_Pa, 2)} mPa at rest, which is not counted, would hold it.`;
  return {
    subject: 'settling',
    level: levelOf(settlingMargin(settling, requirement), doubt, doubt),
    statement,
    margin: {
      quantity: 'time until the accepted clear layer',
      unit: 'days',
      actual: time_days,
      needed: requirement.shelfLife_s / S_PER_DAY,
      margin: time_days - requirement.shelfLife_s / S_PER_DAY,
    },
    limits: one.limits,
  };
}
