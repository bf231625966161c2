/** Stable codes of refused inputs; screens and scripts may rely on them. */
export const ENGINE_ISSUE_CODES = [
  'too_many_stages',
  'band_reversed',
  'feedback_resistor_missing',
  'inverting_fed_from_zero_ohm',
  'input_without_dc_return',
  'phase_margin_out_of_range',
  'min_above_typ',
  'typ_above_max',
  'device_kind_mismatch',
  'device_unknown',
  'not_finite',
  'out_of_range',
  'required',
] as const;
export type EngineIssueCode = (typeof ENGINE_ISSUE_CODES)[number];

/**
 * One thing that is wrong with an input.
 * `path` leads from the chain input to the value, dotted, e.g. `stages.1.feedbackOhm` or `devices.0.gainBandwidthHz.min`.
 */
export interface EngineIssue {
  readonly code: EngineIssueCode;
  readonly path: string;
  /** One sentence for people, with the limit that was broken. */
  readonly message: string;
}

/**
 * The only error that the engine throws on purpose: the input cannot be calculated. Carries every issue found.
 *
 * @example new EngineInputError([{ code: 'required', path: 'stages.0.gainOhm', message: 'Rg is needed.' }]).issues.length // 1
 */
export class EngineInputError extends Error {
  readonly issues: readonly EngineIssue[];

  constructor(issues: readonly EngineIssue[]) {
    super(issues.map((issue) => `${issue.path}: ${issue.message}`).join(' '));
    this.name = 'EngineInputError';
    this.issues = issues;
  }
}
