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

const factorField = (key: PolicyNumber, label: string, hint: string, maximum: number): PolicyField => ({
  key,
  label,
  hint,
  unit: 'number',
  suffix: '×',
  minimum: 0.05,
  maximum,
  factor: 1,
});

const targetField = (key: PolicyNumber, label: string, hint: string): PolicyField => ({
  key,
  label,
  hint,
  unit: 'number',
  suffix: '×',
  minimum: 1,
  maximum: 1000,
  factor: 1,
});

const percentField = (key: PolicyNumber, label: string, hint: string): PolicyField => ({
  key,
  label,
  hint,
  unit: '%',
  minimum: 0,
  maximum: 99,
  factor: 100,
});

export const POLICY_GROUPS: readonly { readonly title: string; readonly fields: readonly PolicyField[] }[] = [
  {
    title: 'Targets',
    fields: [
      targetField('headroomTarget', 'GBW headroom', 'Below this a stage is tight; below ×1 it is over.'),
      targetField('bandwidthTarget', 'Closed-loop bandwidth', 'Of the band’s top edge; below this tight.'),
      targetField('slewTarget', 'Slew headroom', 'Below this tight; below ×1 over.'),
    ],
  },
  {
    title: 'When the datasheet gives no minimum',
    fields: [
      factorField('gbwDerating', 'GBW from typical', 'Minimum = typical × this, marked as assumed.', 1),
      factorField('slewDerating', 'Slew rate from typical', 'Minimum = typical × this, marked as assumed.', 1),
      factorField('temperatureFactor', 'Hot case', 'Further factor on GBW in the case “minimum, hot”.', 1),
    ],
  },
  {
    title: 'Tight before the limit',
    fields: [
      {
        key: 'levelMarginDb',
        label: 'Levels',
        hint: 'Swing, compression and output current.',
        unit: 'dB',
        minimum: 0,
        maximum: 60,
        factor: 1,
      },
      {
        key: 'noiseMarginDb',
        label: 'Noise figure',
        hint: 'Within this of the limit.',
        unit: 'dB',
        minimum: 0,
        maximum: 60,
        factor: 1,
      },
      percentField('budgetMargin', 'Noise density, power, cost', 'Within this part of the limit.'),
      percentField('toleranceMargin', 'Gain, flatness, corners', 'Within this part of the tolerance or limit.'),
    ],
  },
  {
    title: 'Phase margin',
    fields: [
      {
        key: 'phaseMarginOverDeg',
        label: 'Over below',
        hint: 'At minimum and maximum GBW, the worse counts.',
        unit: '°',
        minimum: 0,
        maximum: 90,
        factor: 1,
      },
      {
        key: 'phaseMarginTightDeg',
        label: 'Tight below',
        hint: 'Not below the limit for over.',
        unit: '°',
        minimum: 0,
        maximum: 90,
        factor: 1,
      },
    ],
  },
];

export const CASE_LABELS = {
  typical: 'Typical devices',
  minimum: 'Minimum (the worst that may be delivered)',
  minimumHot: 'Minimum, hot',
} as const;
