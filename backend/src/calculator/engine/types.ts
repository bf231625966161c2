/**
 * What the calculator takes in: readonly plain data, SI units throughout (Hz, V, A, Ω, F, s, W, K).
 * Decibels only where a name ends in `Db` or `Dbm`. Every optional value that is absent is *unknown*, never zero.
 */

/** Which device values a figure is computed with. */
export type GbwCase = 'typical' | 'minimum' | 'minimumHot';
export const GBW_CASES: readonly GbwCase[] = ['typical', 'minimum', 'minimumHot'];

export type Grade = 'general-purpose' | 'rf';
export type Lifecycle = 'active' | 'not-recommended' | 'last-time-buy' | 'obsolete';
export const DEVICE_KINDS = ['voltage-feedback', 'current-feedback', 'matched-block'] as const;
export type DeviceKind = (typeof DEVICE_KINDS)[number];

/** A datasheet value with the columns that the datasheet gives; at least one of them. Unit as the owning name says. */
export interface DatasheetValue {
  readonly min?: number;
  readonly typ?: number;
  readonly max?: number;
  /** Test condition in the datasheet's words, e.g. "G = 2, RL = 100 Ω". */
  readonly condition?: string;
  /** Datasheet page, e.g. "4". */
  readonly page?: string;
}

/** A step of a quote: from this quantity on, one piece costs this many millionths of the currency unit. */
export interface PriceBreak {
  readonly quantity: number;
  readonly unitPriceMicros: number;
}

export interface Quote {
  /** ISO 4217. */
  readonly currency: string;
  /** Ascending quantities, at least one. */
  readonly breaks: readonly PriceBreak[];
  readonly reference?: string;
  readonly validUntil?: string;
}

interface DeviceBase {
  readonly id: string;
  readonly partNumber: string;
  readonly maker?: string;
  readonly grade: Grade;
  readonly package?: string;
  readonly lifecycle?: Lifecycle;
  readonly channels: number;
  /** True once a second person compared the values with the datasheet. */
  readonly verified?: boolean;
  /** Total supply, positive minus negative rail. */
  readonly supplyVoltageV?: DatasheetValue;
  /** Quiescent current of one amplifier or block. */
  readonly supplyCurrentA?: DatasheetValue;
  readonly quote?: Quote;
}

/** What both operational-amplifier kinds share. */
interface AmplifierBase extends DeviceBase {
  readonly outputResistanceOhm?: DatasheetValue;
  /** Resistance of the + pin to ground. Absent: infinite, marked assumed. */
  readonly inputResistanceOhm?: DatasheetValue;
  /** Capacitance of each input pin to ground. Absent: 0, marked assumed. */
  readonly commonModeCapacitanceF?: DatasheetValue;
  readonly slewRateVPerS?: DatasheetValue;
  /** Closest approach of the output to the positive / negative rail; the larger value is the worse. */
  readonly headroomPositiveV?: DatasheetValue;
  readonly headroomNegativeV?: DatasheetValue;
  readonly outputCurrentA?: DatasheetValue;
  readonly inputOffsetVoltageV?: DatasheetValue;
  readonly voltageNoiseVPerRtHz?: DatasheetValue;
  readonly voltageNoiseCornerHz?: number;
  readonly currentNoiseCornerHz?: number;
}

export interface VoltageFeedbackDevice extends AmplifierBase {
  readonly kind: 'voltage-feedback';
  readonly gainBandwidthHz: DatasheetValue;
  readonly openLoopGainDb?: DatasheetValue;
  /** Smallest noise gain at which the maker calls it stable; 1 = unity-gain stable. */
  readonly minimumStableGain?: number;
  /** Phase margin quoted at the noise gain `phaseMarginGain` (absent: the minimum stable gain, else 1). */
  readonly phaseMarginDeg?: number;
  readonly phaseMarginGain?: number;
  /** Takes precedence over the phase margin. */
  readonly secondPoleHz?: number;
  /** Capacitance between the input pins. */
  readonly differentialCapacitanceF?: DatasheetValue;
  readonly inputBiasCurrentA?: DatasheetValue;
  /** Of each input. */
  readonly currentNoiseAPerRtHz?: DatasheetValue;
}

export interface CurrentFeedbackDevice extends AmplifierBase {
  readonly kind: 'current-feedback';
  /** −3 dB bandwidth in the reference circuit: noise gain `referenceNoiseGain`, feedback `referenceFeedbackOhm`. */
  readonly referenceBandwidthHz: DatasheetValue;
  /** A gain of −2 means 3. */
  readonly referenceNoiseGain: number;
  readonly referenceFeedbackOhm: number;
  /** Resistance looking into the inverting input. */
  readonly invertingInputResistanceOhm?: DatasheetValue;
  readonly openLoopTransimpedanceOhm?: DatasheetValue;
  readonly secondPoleHz?: number;
  readonly inputBiasCurrentA?: DatasheetValue;
  readonly invertingBiasCurrentA?: DatasheetValue;
  readonly currentNoiseAPerRtHz?: DatasheetValue;
  readonly invertingCurrentNoiseAPerRtHz?: DatasheetValue;
}

export interface MatchedBlockDevice extends DeviceBase {
  readonly kind: 'matched-block';
  readonly impedanceOhm: number;
  /** Power gain in a system of `impedanceOhm`; negative = loss. */
  readonly gainDb: DatasheetValue;
  /** First-order −3 dB corners. Absent: flat on that side. */
  readonly lowerCornerHz?: DatasheetValue;
  readonly upperCornerHz?: DatasheetValue;
  readonly noiseFigureDb?: DatasheetValue;
  readonly outputP1dbDbm?: DatasheetValue;
  readonly outputIp3Dbm?: DatasheetValue;
}

export type Device = VoltageFeedbackDevice | CurrentFeedbackDevice | MatchedBlockDevice;
export type AmplifierDevice = VoltageFeedbackDevice | CurrentFeedbackDevice;

// --- Stages ---------------------------------------------------------------------------------------------------------

export const STAGE_KINDS = ['voltage-feedback', 'current-feedback', 'rc-section', 'matched-block'] as const;
export type StageKind = (typeof STAGE_KINDS)[number];
export type VoltageFeedbackTopology = 'non-inverting' | 'follower' | 'inverting' | 'transimpedance';
export type CurrentFeedbackTopology = 'non-inverting' | 'inverting';

interface StageBase {
  /** Made by whoever edits (UUID). */
  readonly id: string;
  readonly name: string;
}

/** Resistors are the truth; the wanted gain is kept beside them. Order of the parts as in docs/calculator.md. */
interface FeedbackStageBase extends StageBase {
  readonly deviceId: string;
  /** Signed ratio (−10), for transimpedance Ω (negative); null = resistors were typed. */
  readonly wantedGain?: number | null;
  readonly feedbackOhm: number;
  /** To ground (non-inverting) or from the node in front (inverting). Null: open (follower) or absent (transimpedance). */
  readonly gainOhm?: number | null;
  readonly feedbackF?: number;
  /** Stray capacitance of the inverting node to ground, added to the device's own. */
  readonly strayF?: number;
  readonly terminationOhm?: number | null;
  readonly couplingF?: number | null;
  /** From the + pin to ground behind the coupling capacitor (non-inverting topologies). */
  readonly biasOhm?: number | null;
  /** Series resistor outside the loop: isolation or back-termination. */
  readonly isolationOhm?: number;
}

export interface VoltageFeedbackStage extends FeedbackStageBase {
  readonly kind: 'voltage-feedback';
  readonly topology: VoltageFeedbackTopology;
}

export interface CurrentFeedbackStage extends FeedbackStageBase {
  readonly kind: 'current-feedback';
  readonly topology: CurrentFeedbackTopology;
}

/** Passive section from left to right: series R, series C, then shunt R and shunt C to ground. */
export interface RcSectionStage extends StageBase {
  readonly kind: 'rc-section';
  readonly seriesOhm?: number;
  readonly seriesF?: number | null;
  readonly shuntOhm?: number | null;
  readonly shuntF?: number;
}

export interface MatchedBlockStage extends StageBase {
  readonly kind: 'matched-block';
  readonly deviceId: string;
}

export type FeedbackStage = VoltageFeedbackStage | CurrentFeedbackStage;
export type Stage = FeedbackStage | RcSectionStage | MatchedBlockStage;
export const MAXIMUM_STAGES = 24;

// --- Specification --------------------------------------------------------------------------------------------------

/** How the level numbers of a voltage source are to be read. */
export type LevelKind = 'peak-emf' | 'rms-emf' | 'available-power';

export interface VoltageSource {
  readonly kind: 'voltage';
  /** Series resistance, > 0. */
  readonly resistanceOhm: number;
  readonly levelKind: LevelKind;
  /** V peak, V rms or dBm as `levelKind` says. */
  readonly nominalLevel?: number;
  readonly largestLevel?: number;
}

export interface CurrentSource {
  readonly kind: 'current';
  /** Shunt resistance, finite, > 0. */
  readonly resistanceOhm: number;
  readonly capacitanceF: number;
  /** A peak. */
  readonly nominalLevel?: number;
  readonly largestLevel?: number;
  /** Dark plus ambient current. */
  readonly dcCurrentA?: number;
}

export type Source = VoltageSource | CurrentSource;

export interface Load {
  /** Null: open. */
  readonly resistanceOhm: number | null;
  readonly capacitanceF?: number;
}

export type GainBasis = 'voltage' | 'transducer' | 'transimpedance';

export interface Band {
  readonly lowHz: number;
  readonly operatingHz: number;
  readonly highHz: number;
}

export interface Supply {
  /** Positive rail. */
  readonly positiveV: number;
  /** Negative rail, ≤ 0; 0 = single supply. */
  readonly negativeV: number;
}

/** Each absent requirement is no check. */
export interface Requirements {
  /** At the operating frequency, in dB (dBΩ for transimpedance). */
  readonly gainDb?: { readonly target: number; readonly tolerance: number };
  readonly minimumGainDb?: number;
  readonly maximumGainDb?: number;
  readonly flatnessDb?: number;
  readonly upperCornerHz?: number;
  readonly lowerCornerHz?: number;
  readonly loopGainDb?: number;
  /** Added noise referred to the EMF, V/√Hz (A/√Hz for a current source). */
  readonly inputNoise?: number;
  readonly noiseFigureDb?: number;
  readonly outputOffsetV?: number;
  readonly supplyCurrentA?: number;
  readonly supplyPowerW?: number;
  /** Millionths of the currency unit, per board. */
  readonly costMicros?: number;
  readonly polarity?: 'in-phase' | 'inverted';
}

export interface Specification {
  readonly source: Source;
  readonly load: Load;
  readonly gainBasis: GainBasis;
  readonly band: Band;
  readonly supply: Supply;
  /** Absent: 298.15 K. */
  readonly ambientK?: number;
  readonly requirements: Requirements;
}

/** The team's margins; every threshold is a field of its own. Defaults in `policy.ts`. */
export interface Policy {
  readonly gbwCase: GbwCase;
  /** Minimum GBW (bandwidth) where only typical is given = typical × this. Common practice 0.7. */
  readonly gbwDerating: number;
  /** Further factor of the minimum-hot case. */
  readonly temperatureFactor: number;
  readonly slewDerating: number;
  readonly headroomTarget: number;
  readonly bandwidthTarget: number;
  readonly slewTarget: number;
  /** Swing, compression and output current: tight within this many dB of the limit. */
  readonly levelMarginDb: number;
  readonly noiseMarginDb: number;
  /** Noise density, power, cost: tight within this fraction of the limit. */
  readonly budgetMargin: number;
  /** Gain, flatness, corners: tight within this fraction of tolerance or limit. */
  readonly toleranceMargin: number;
  readonly phaseMarginOverDeg: number;
  readonly phaseMarginTightDeg: number;
}

/** Everything that one calculation takes. */
export interface ChainInput {
  readonly specification: Specification;
  readonly policy: Policy;
  /** 0 to 24, in signal order. */
  readonly stages: readonly Stage[];
  /** At least the devices that the stages name. */
  readonly devices: readonly Device[];
  /** ISO 4217 currency of the project. */
  readonly currency: string;
  /** Boards per build. */
  readonly buildQuantity: number;
  /** Plain date (YYYY-MM-DD) on which quotes are judged lapsed. Absent: no quote is. The calculator has no clock. */
  readonly today?: string;
}
