/**
 * Limits of everything a person may enter, in one place. Field decorators refuse what is outside and write `minimum`,
 * `maximum` and `x-unit` into openapi.json, from which the screens take the same numbers.
 * They are wide on purpose: they catch slips of a power of ten and broken clients, not unusual circuits.
 */
export interface Limit {
  readonly unit: string;
  readonly minimum: number;
  readonly maximum: number;
  readonly integer?: boolean;
  /** Stable error code where `out_of_range` would say too little. */
  readonly code?: string;
}

export const LIMITS = {
  // Frequency and gain
  frequencyHz: { unit: 'Hz', minimum: 1e-3, maximum: 1e12 },
  gainBandwidthHz: { unit: 'Hz', minimum: 1, maximum: 1e13 },
  noiseCornerHz: { unit: 'Hz', minimum: 0, maximum: 1e12 },
  noiseGain: { unit: 'ratio', minimum: 1, maximum: 1e6 },
  /** Signed ratio; Ω for a transimpedance stage. */
  wantedGain: { unit: 'gain', minimum: -1e12, maximum: 1e12 },
  gainDb: { unit: 'dB', minimum: -300, maximum: 300 },
  toleranceDb: { unit: 'dB', minimum: 0.001, maximum: 100 },
  openLoopGainDb: { unit: 'dB', minimum: 1, maximum: 250 },
  phaseMarginDeg: { unit: 'deg', minimum: 1, maximum: 119, code: 'phase_margin_out_of_range' },
  // Parts
  resistanceOhm: { unit: 'Ω', minimum: 0, maximum: 1e12 },
  positiveResistanceOhm: { unit: 'Ω', minimum: 1e-3, maximum: 1e15 },
  capacitanceF: { unit: 'F', minimum: 0, maximum: 1 },
  positiveCapacitanceF: { unit: 'F', minimum: 1e-18, maximum: 1 },
  // Levels
  positiveRailV: { unit: 'V', minimum: 0.1, maximum: 1000 },
  negativeRailV: { unit: 'V', minimum: -1000, maximum: 0 },
  voltageV: { unit: 'V', minimum: 0, maximum: 1000 },
  signedVoltageV: { unit: 'V', minimum: -1000, maximum: 1000 },
  currentA: { unit: 'A', minimum: 0, maximum: 1000 },
  signedCurrentA: { unit: 'A', minimum: -1000, maximum: 1000 },
  /** V peak, V rms or dBm, as the source says. */
  sourceLevel: { unit: 'V or dBm', minimum: -300, maximum: 1000 },
  powerDbm: { unit: 'dBm', minimum: -300, maximum: 200 },
  powerW: { unit: 'W', minimum: 0, maximum: 1e6 },
  slewRateVPerS: { unit: 'V/s', minimum: 1, maximum: 1e14 },
  voltageNoiseVPerRtHz: { unit: 'V/√Hz', minimum: 0, maximum: 1 },
  currentNoiseAPerRtHz: { unit: 'A/√Hz', minimum: 0, maximum: 1 },
  /** V/√Hz, or A/√Hz where the source is a current. */
  inputNoise: { unit: 'V/√Hz', minimum: 1e-18, maximum: 1 },
  noiseFigureDb: { unit: 'dB', minimum: 0, maximum: 200 },
  temperatureK: { unit: 'K', minimum: 1, maximum: 1000 },
  // Policy
  derating: { unit: 'ratio', minimum: 0.05, maximum: 1 },
  temperatureFactor: { unit: 'ratio', minimum: 0.05, maximum: 1 },
  headroomTarget: { unit: 'ratio', minimum: 1, maximum: 1000 },
  marginDb: { unit: 'dB', minimum: 0, maximum: 60 },
  marginFraction: { unit: 'fraction', minimum: 0, maximum: 0.99 },
  phaseMarginLimitDeg: { unit: 'deg', minimum: 0, maximum: 90 },
  // Money and pieces
  unitPriceMicros: { unit: 'micro', minimum: 1, maximum: 1e12, integer: true },
  costMicros: { unit: 'micro', minimum: 0, maximum: 1e15, integer: true },
  quantity: { unit: 'pieces', minimum: 1, maximum: 1e9, integer: true },
  channels: { unit: 'channels', minimum: 1, maximum: 64, integer: true },
  // Requests
  version: { unit: 'version', minimum: 1, maximum: 1e12, integer: true },
  /** 0: there is none yet. */
  quoteVersion: { unit: 'version', minimum: 0, maximum: 1e12, integer: true },
  page: { unit: 'page', minimum: 1, maximum: 1e6, integer: true },
  pageSize: { unit: 'rows', minimum: 1, maximum: 500, integer: true },
  curvePoints: { unit: 'points', minimum: 2, maximum: 2001, integer: true },
} as const satisfies Record<string, Limit>;

export type LimitName = keyof typeof LIMITS;

/** Characters, counted as code points. */
export const TEXT_LIMITS = {
  name: 120,
  code: 24,
  partNumber: 60,
  shortText: 120,
  description: 4000,
  page: 24,
} as const;

/** Elements of a list. */
export const LIST_LIMITS = {
  stages: 24,
  devices: 400,
  priceBreaks: 20,
  members: 200,
} as const;
