import { m_from_mm, s_from_days } from '../quantities/convert';
import type { Requirement } from '../scenario/scenario';

/** What the candidates must survive, in SI. */
export interface RequirementModel {
  readonly shelfLife_s: number;
  /** Shares from 0 to 1. */
  readonly acceptedLoss: number;
  readonly fillHeight_m: number;
  readonly acceptedClearLayer: number;
}

export const requirementModel = (requirement: Requirement): RequirementModel => ({
  shelfLife_s: s_from_days(requirement.shelfLife_days),
  acceptedLoss: requirement.acceptedLoss_percent / 100,
  fillHeight_m: m_from_mm(requirement.fillHeight_mm),
  acceptedClearLayer: requirement.acceptedClearLayer_percent / 100,
});
