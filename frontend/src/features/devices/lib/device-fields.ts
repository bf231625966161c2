import type { DeviceKind } from '../../../api/types';
import {
  ALL,
  MIN_TYP,
  optional,
  required,
  SINGLE,
  TYP_MAX,
  type DeviceField,
  type DeviceFieldGroup,
} from './device-field';

const NOISE_UNKNOWN = 'Noise of the whole chain is unknown.';
const OFFSET_UNKNOWN = 'DC offset at the output is unknown.';
const ZERO_CAPACITANCE = '0 pF is assumed, and marked.';
const WHITE = 'Noise is taken as white.';

const secondPole = (label: string, without: string): DeviceField =>
  optional('secondPoleHz', label, 'MHz', SINGLE, without, { symbol: 'f2' });

const OUTPUT_RESISTANCE = optional(
  'outputResistanceOhm',
  'Open-loop output resistance',
  'Ω',
  TYP_MAX,
  'Response uses 0 Ω, marked; stability with a capacitive load is unknown.',
  { symbol: 'Ro' },
);

const GAIN_BANDWIDTH: DeviceFieldGroup = {
  title: 'Gain-bandwidth',
  fields: [
    required('gainBandwidthHz', 'Gain-bandwidth product', 'MHz', ALL, { symbol: 'GBW' }),
    optional('openLoopGainDb', 'DC open-loop gain', 'dB', MIN_TYP, '120 dB is assumed, and marked.', { symbol: 'A0' }),
  ],
};

const REFERENCE_BANDWIDTH: DeviceFieldGroup = {
  title: 'Bandwidth in the reference circuit',
  fields: [
    required('referenceBandwidthHz', '−3 dB bandwidth', 'MHz', ALL, { symbol: 'BW' }),
    required('referenceNoiseGain', 'Noise gain it is given at', 'number', SINGLE, {
      placeholder: 'a gain of −2 means 3',
    }),
    required('referenceFeedbackOhm', 'Feedback resistor it is given with', 'Ω', SINGLE, { symbol: 'Rf' }),
    optional(
      'invertingInputResistanceOhm',
      'Resistance into the inverting input',
      'Ω',
      TYP_MAX,
      '0 Ω is assumed, and marked: bandwidth then does not fall with noise gain.',
      { symbol: 'Rb' },
    ),
    optional(
      'openLoopTransimpedanceOhm',
      'DC open-loop transimpedance',
      'kΩ',
      MIN_TYP,
      '1 MΩ is assumed, and marked.',
      { symbol: 'Z0' },
    ),
  ],
};

const STABILITY: DeviceFieldGroup = {
  title: 'Stability',
  fields: [
    optional(
      'minimumStableGain',
      'Minimum stable noise gain',
      'number',
      SINGLE,
      'Noise gain is not held against the maker’s limit.',
      { placeholder: '1 = unity-gain stable' },
    ),
    optional(
      'phaseMarginDeg',
      'Phase margin',
      '°',
      SINGLE,
      'Without it and without a second pole, stability may stay unknown.',
    ),
    optional(
      'phaseMarginGain',
      'Noise gain it is given at',
      'number',
      SINGLE,
      'The minimum stable noise gain is taken, else 1.',
    ),
    secondPole('Second pole', 'It follows from the phase margin; where both are given, the second pole counts.'),
    OUTPUT_RESISTANCE,
  ],
};

const STABILITY_CURRENT_FEEDBACK: DeviceFieldGroup = {
  title: 'Stability',
  fields: [secondPole('Second pole', 'Stability may stay unknown.'), OUTPUT_RESISTANCE],
};

const OUTPUT: DeviceFieldGroup = {
  title: 'Output',
  fields: [
    optional('slewRateVPerS', 'Slew rate', 'V/µs', MIN_TYP, 'Slew and full-power bandwidth are unknown.', {
      symbol: 'SR',
    }),
    optional('headroomPositiveV', 'Output to positive rail, closest', 'V', TYP_MAX, 'Swing is unknown.'),
    optional('headroomNegativeV', 'Output to negative rail, closest', 'V', TYP_MAX, 'Swing is unknown.'),
    optional('outputCurrentA', 'Output current', 'mA', MIN_TYP, 'Whether it can drive its load is unknown.'),
  ],
};

const INPUT_COMMON: readonly DeviceField[] = [
  optional(
    'inputResistanceOhm',
    'Input resistance, + pin to ground',
    'MΩ',
    MIN_TYP,
    'Infinite is assumed, and marked.',
  ),
  optional('commonModeCapacitanceF', 'Input capacitance, each pin to ground', 'pF', TYP_MAX, ZERO_CAPACITANCE),
];

const OFFSET_AND_BIAS: readonly DeviceField[] = [
  optional('inputOffsetVoltageV', 'Input offset voltage', 'mV', TYP_MAX, OFFSET_UNKNOWN, { symbol: 'Vos' }),
  optional('inputBiasCurrentA', 'Input bias current', 'µA', TYP_MAX, OFFSET_UNKNOWN, { symbol: 'Ib' }),
];

const INPUT: DeviceFieldGroup = {
  title: 'Input',
  fields: [
    ...INPUT_COMMON,
    optional('differentialCapacitanceF', 'Input capacitance, between the pins', 'pF', TYP_MAX, ZERO_CAPACITANCE),
    ...OFFSET_AND_BIAS,
  ],
};

const INPUT_CURRENT_FEEDBACK: DeviceFieldGroup = {
  title: 'Input',
  fields: [
    ...INPUT_COMMON,
    ...OFFSET_AND_BIAS,
    optional('invertingBiasCurrentA', 'Bias current of the inverting input', 'µA', TYP_MAX, OFFSET_UNKNOWN, {
      symbol: 'Ib−',
    }),
  ],
};

const VOLTAGE_NOISE: readonly DeviceField[] = [
  optional('voltageNoiseVPerRtHz', 'Voltage noise', 'nV/√Hz', TYP_MAX, NOISE_UNKNOWN, { symbol: 'en' }),
  optional('voltageNoiseCornerHz', '1/f corner of voltage noise', 'kHz', SINGLE, WHITE),
];

const currentNoise = (label: string): DeviceField =>
  optional('currentNoiseAPerRtHz', label, 'pA/√Hz', TYP_MAX, NOISE_UNKNOWN, { symbol: 'in' });

const CURRENT_NOISE_CORNER = optional('currentNoiseCornerHz', '1/f corner of current noise', 'kHz', SINGLE, WHITE);

const NOISE: DeviceFieldGroup = {
  title: 'Noise',
  fields: [...VOLTAGE_NOISE, currentNoise('Current noise, each input'), CURRENT_NOISE_CORNER],
};

const NOISE_CURRENT_FEEDBACK: DeviceFieldGroup = {
  title: 'Noise',
  fields: [
    ...VOLTAGE_NOISE,
    currentNoise('Current noise, + input'),
    optional('invertingCurrentNoiseAPerRtHz', 'Current noise, − input', 'pA/√Hz', TYP_MAX, NOISE_UNKNOWN, {
      symbol: 'in−',
    }),
    CURRENT_NOISE_CORNER,
  ],
};

const SUPPLY: DeviceFieldGroup = {
  title: 'Supply',
  fields: [
    optional(
      'supplyVoltageV',
      'Total supply, positive minus negative rail',
      'V',
      ALL,
      'Whether it runs from the chain’s supply is unknown.',
    ),
    optional(
      'supplyCurrentA',
      'Quiescent current of one amplifier or block',
      'mA',
      TYP_MAX,
      'Supply current and power of the chain are unknown.',
    ),
  ],
};

const MATCHED: readonly DeviceFieldGroup[] = [
  {
    title: 'Gain and corners',
    fields: [
      required('impedanceOhm', 'Matched to', 'Ω', SINGLE, { symbol: 'Z0', placeholder: '50' }),
      required('gainDb', 'Power gain (negative = loss)', 'dB', ALL),
      optional('lowerCornerHz', 'Lower −3 dB corner', 'MHz', TYP_MAX, 'Taken as flat downwards.'),
      optional('upperCornerHz', 'Upper −3 dB corner', 'MHz', MIN_TYP, 'Taken as flat upwards.'),
    ],
  },
  {
    title: 'Noise',
    fields: [
      optional(
        'noiseFigureDb',
        'Noise figure',
        'dB',
        TYP_MAX,
        'Noise of the whole chain is unknown, unless the block is a loss.',
        { symbol: 'NF' },
      ),
    ],
  },
  {
    title: 'Output',
    fields: [
      optional('outputP1dbDbm', 'Output power at 1 dB compression', 'dBm', MIN_TYP, 'Compression is unknown.', {
        symbol: 'P1dB',
      }),
      optional('outputIp3Dbm', 'Output third-order intercept', 'dBm', MIN_TYP, 'The intercept is not known.', {
        symbol: 'OIP3',
      }),
    ],
  },
  SUPPLY,
];

export const FIELD_GROUPS: Readonly<Record<DeviceKind, readonly DeviceFieldGroup[]>> = {
  'voltage-feedback': [GAIN_BANDWIDTH, STABILITY, OUTPUT, INPUT, NOISE, SUPPLY],
  'current-feedback': [
    REFERENCE_BANDWIDTH,
    STABILITY_CURRENT_FEEDBACK,
    OUTPUT,
    INPUT_CURRENT_FEEDBACK,
    NOISE_CURRENT_FEEDBACK,
    SUPPLY,
  ],
  'matched-block': MATCHED,
};

export const fieldsOf = (kind: DeviceKind): readonly DeviceField[] =>
  FIELD_GROUPS[kind].flatMap((group) => group.fields);
