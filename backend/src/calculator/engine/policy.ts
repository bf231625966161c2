import type { Policy } from './types';

/**
 * The team's margins where a project sets none. Every threshold is a field of its own.
 * Source: common practice throughout (process spread of about ±30 % for the deratings).
 *
 * @example DEFAULT_POLICY.gbwDerating // 0.7
 */
export const DEFAULT_POLICY: Policy = {
  gbwCase: 'minimum',
  gbwDerating: 0.7,
  temperatureFactor: 1,
  slewDerating: 0.7,
  headroomTarget: 3,
  bandwidthTarget: 2,
  slewTarget: 2,
  levelMarginDb: 1,
  noiseMarginDb: 0.5,
  budgetMargin: 0.1,
  toleranceMargin: 0.2,
  phaseMarginOverDeg: 30,
  phaseMarginTightDeg: 45,
};

/**
 * A whole policy from the fields that somebody set; the rest from {@link DEFAULT_POLICY}.
 *
 * @example policyFrom({ headroomTarget: 5 }).headroomTarget // 5
 */
export function policyFrom(fields: Partial<Policy>): Policy {
  return { ...DEFAULT_POLICY, ...fields };
}
