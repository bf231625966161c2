import { API_LIMITS } from '../../../api/limits';
import type { Policy } from '../../../api/types';
import type { QuantityUnit } from '../../../lib/quantity-units';

export type PolicyNumber = Exclude<keyof Policy, 'gbwCase'>;

export interface PolicyField {
  readonly key: PolicyNumber;
  readonly label: string;
  readonly hint: string;
  readonly unit: QuantityUnit;
  /** What stands inside the field when it is not the unit. */
  readonly suffix?: string;
  readonly minimum: number;
  readonly maximum: number;
  /** Shown = stored × this. */
  readonly factor: number;
}

/** A field with the server's limits, shown as `factor` times what is stored. */
function policyField(
  key: PolicyNumber,
  label: string,
  hint: string,
  shown: Pick<PolicyField, 'unit' | 'suffix'> & { readonly factor?: number },
): PolicyField {
  const { factor = 1, ...rest } = shown;
  const { minimum, maximum } = API_LIMITS.Policy[key];
  return { key, label, hint, ...rest, factor, minimum: minimum * factor, maximum: maximum * factor };
}

const times = (key: PolicyNumber, label: string, hint: string): PolicyField =>
  policyField(key, label, hint, { unit: 'number', suffix: '×' });
const decibels = (key: PolicyNumber, label: string, hint: string): PolicyField =>
  policyField(key, label, hint, { unit: 'dB' });
const percent = (key: PolicyNumber, label: string, hint: string): PolicyField =>
  policyField(key, label, hint, { unit: '%', factor: 100 });
const degrees = (key: PolicyNumber, label: string, hint: string): PolicyField =>
  policyField(key, label, hint, { unit: '°' });

export const POLICY_GROUPS: readonly { readonly title: string; readonly fields: readonly PolicyField[] }[] = [
  {
    title: 'Targets',
    fields: [
      times('headroomTarget', 'GBW headroom', 'Below this a stage is tight; below ×1 it is over.'),
      times('bandwidthTarget', 'Closed-loop bandwidth', 'Of the band’s top edge; below this tight.'),
      times('slewTarget', 'Slew headroom', 'Below this tight; below ×1 over.'),
    ],
  },
  {
    title: 'When the datasheet gives no minimum',
    fields: [
      times('gbwDerating', 'GBW from typical', 'Minimum = typical × this, marked as assumed.'),
      times('slewDerating', 'Slew rate from typical', 'Minimum = typical × this, marked as assumed.'),
      times('temperatureFactor', 'Hot case', 'Further factor on GBW in the case “minimum, hot”.'),
    ],
  },
  {
    title: 'Tight before the limit',
    fields: [
      decibels('levelMarginDb', 'Levels', 'Swing, compression and output current.'),
      decibels('noiseMarginDb', 'Noise figure', 'Within this of the limit.'),
      percent('budgetMargin', 'Noise density, power, cost', 'Within this part of the limit.'),
      percent('toleranceMargin', 'Gain, flatness, corners', 'Within this part of the tolerance or limit.'),
    ],
  },
  {
    title: 'Phase margin',
    fields: [
      degrees('phaseMarginOverDeg', 'Over below', 'At minimum and maximum GBW, the worse counts.'),
      degrees('phaseMarginTightDeg', 'Tight below', 'Not below the limit for over.'),
    ],
  },
];

export const CASE_LABELS = {
  typical: 'Typical devices',
  minimum: 'Minimum (the worst that may be delivered)',
  minimumHot: 'Minimum, hot',
} as const;
