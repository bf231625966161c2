/**
 * Wire types under the names that screens use. Engine shapes first (see backend/src/calculator/engine), then the rows
 * of the features.
 */

/** Which device values a figure is computed with. */
export type GbwCase = 'typical' | 'minimum' | 'minimumHot';
export const GBW_CASES: readonly GbwCase[] = ['typical', 'minimum', 'minimumHot'];

export type Grade = 'general-purpose' | 'rf';
export type Lifecycle = 'active' | 'not-recommended' | 'last-time-buy' | 'obsolete';
export type DeviceKind = 'voltage-feedback' | 'current-feedback' | 'matched-block';

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

export type StageKind = 'voltage-feedback' | 'current-feedback' | 'rc-section' | 'matched-block';
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
}

export type Verdict = 'clear' | 'tight' | 'over' | 'unknown';

export type Unit =
  | 'Hz'
  | 'V'
  | 'A'
  | 'W'
  | 'Ω'
  | 'F'
  | 's'
  | 'dB'
  | 'dBΩ'
  | 'ratio'
  | 'gain'
  | 'deg'
  | 'V/s'
  | 'V/√Hz'
  | 'A/√Hz'
  | 'fraction';

/** `ratio` prints as ×0.974, `gain` as a signed gain (×10, −10), `fraction` as %. `digits` = significant digits to print. */
export interface Figure {
  readonly value: number | null;
  readonly unit: Unit;
  readonly digits: number;
  /** Why there is no value; always there when value is null. */
  readonly reason?: string;
  /** True when a value that the datasheet does not give went into it. */
  readonly assumed?: boolean;
}

export interface Money {
  /** Millionths of the currency unit, an integer. */
  readonly amountMicros: number | null;
  /** ISO 4217. */
  readonly currency: string;
  readonly reason?: string;
}

export const STAGE_FIGURES = [
  'signalGain',
  'noiseGain',
  'noiseGainOperating',
  'noiseGainTop',
  'gbwHave',
  'gbwUsedOperating',
  'gbwUsedTop',
  'gbwUsed',
  'gbwLeft',
  'headroomOperating',
  'headroomTop',
  'headroom',
  'cornerFirstOrder',
  'cornerUpper',
  'cornerLower',
  'bandwidthRatio',
  'idealGain',
  'gainLow',
  'gainOperating',
  'gainHigh',
  'droopLow',
  'droopOperating',
  'droopHigh',
  'runningGain',
  'phase',
  'loopGain',
  'vectorError',
  'phaseMargin',
  'peaking',
  'riseTime',
  'outputLevel',
  'swingAvailable',
  'swingHeadroom',
  'slewNeeded',
  'slewAvailable',
  'slewHeadroom',
  'fullPowerBandwidth',
  'outputCurrent',
  'outputCurrentHeadroom',
  'outputOffset',
  'noiseAdded',
  'noiseShare',
  'supplyCurrent',
  'supplyPower',
] as const;
export type StageFigureKey = (typeof STAGE_FIGURES)[number];

export const CHAIN_FIGURES = [
  'idealGain',
  'gainLow',
  'gainOperating',
  'gainHigh',
  'droopOperating',
  'flatness',
  'worstDroop',
  'cornerUpper',
  'cornerLower',
  'shrinkage',
  'phase',
  'groupDelay',
  'riseTime',
  'worstHeadroom',
  'inputNoise',
  'noiseFigure',
  'outputOffset',
  'outputLevel',
  'supplyCurrent',
  'supplyPower',
] as const;
export type ChainFigureKey = (typeof CHAIN_FIGURES)[number];

export const CHECK_IDS = [
  'gbw',
  'bandwidth',
  'lower-corner',
  'stability',
  'slew',
  'swing',
  'compression',
  'output-current',
  'supply-voltage',
  'gain',
  'flatness',
  'upper-corner',
  'chain-lower-corner',
  'loop-gain',
  'input-noise',
  'noise-figure',
  'output-offset',
  'supply-current',
  'supply-power',
  'cost',
  'polarity',
  'feedback-resistor',
] as const;
export type CheckId = (typeof CHECK_IDS)[number];

/** Something that would help, with the figure it would give, computed. `stages` (if there) replaces the stage as a whole. */
export interface Remedy {
  readonly sentence: string;
  readonly verdict: Verdict;
  /** Short label of a button that applies it. */
  readonly action?: string;
  readonly stages?: readonly Stage[];
}

export interface Check {
  readonly id: CheckId;
  /** Two or three words for tables, e.g. "GBW limit". */
  readonly title: string;
  readonly verdict: Verdict;
  readonly actual: Figure | null;
  readonly limit: Figure | null;
  /** What is limiting, where, by how much. */
  readonly sentence: string;
  readonly remedies: readonly Remedy[];
}

export interface VerdictReport {
  readonly verdict: Verdict;
  /** "S2 spends more than it has." Empty when clear and nothing is to be said. */
  readonly lead: string;
  readonly text: string;
  readonly checkId: CheckId | null;
  readonly stageId: string | null;
}

/** A mark beside the verdict that never changes it. */
export interface DataMark {
  readonly kind: 'assumed' | 'typical-only' | 'not-verified' | 'lifecycle' | 'quote-lapsed' | 'caution';
  readonly text: string;
}

/** A stage's row on the shared frequency axis; null = not known or not limited on that side. */
export interface Lane {
  readonly lowerHz: number | null;
  /** Solid to here: the team's target is still met. */
  readonly solidToHz: number | null;
  /** Tick: the device runs out of gain for this noise gain, or the −3 dB corner. */
  readonly cornerHz: number | null;
  /** Open tick: the same for the typical device. */
  readonly typicalCornerHz: number | null;
  readonly bandLowHz: number;
  readonly bandHighHz: number;
  /** One sentence for screen readers. */
  readonly description: string;
}

export interface StageCaseReport {
  readonly figures: Readonly<Record<StageFigureKey, Figure>>;
  /** "minimum, p. 4" · "typical × 0.7, assumed" · "has no GBW (current feedback)". */
  readonly gbwBasis: string;
  readonly lane: Lane;
}

export interface StageReport {
  readonly stageId: string;
  /** S1, S2 … */
  readonly label: string;
  readonly name: string;
  readonly kind: StageKind;
  readonly topology: string | null;
  readonly deviceId: string | null;
  readonly partNumber: string | null;
  readonly grade: Grade | null;
  readonly hasGbw: boolean;
  /** The frequency at this stage that corresponds to the chain's operating frequency. */
  readonly operatingHz: number;
  /** Of the project's case. */
  readonly verdict: VerdictReport;
  readonly checks: readonly Check[];
  readonly marks: readonly DataMark[];
  readonly unitCost: Money;
  readonly cases: Readonly<Record<GbwCase, StageCaseReport>>;
}

export interface ChainCaseReport {
  readonly figures: Readonly<Record<ChainFigureKey, Figure>>;
  readonly lane: Lane;
  readonly worstHeadroomStageId: string | null;
  readonly worstHeadroomHz: number | null;
  readonly worstDroopHz: number | null;
}

/** One of the headline figures with its requirement beside it. */
export interface HeadlineItem {
  readonly key: 'gain' | 'flatness' | 'bandwidth' | 'headroom' | 'noise' | 'cost';
  readonly label: string;
  readonly figure: Figure | null;
  readonly money: Money | null;
  /** Null: nothing is required, nothing checked. */
  readonly verdict: Verdict | null;
  /** "limit 1.00 dB" · "0.88 under 9.00" · "S2 at 7 MHz; target ×3". */
  readonly requirement: string;
  readonly chainFigure: ChainFigureKey | null;
}

export interface FrequencyAxis {
  readonly fromHz: number;
  readonly toHz: number;
}

export interface ChainReport {
  readonly calculatorVersion: string;
  /** The project's case: verdicts stay on it. */
  readonly gbwCase: GbwCase;
  readonly verdict: VerdictReport;
  readonly checks: readonly Check[];
  readonly stages: readonly StageReport[];
  readonly cases: Readonly<Record<GbwCase, ChainCaseReport>>;
  /** Per case, in the order gain, flatness, bandwidth, headroom, noise, cost. */
  readonly headline: Readonly<Record<GbwCase, readonly HeadlineItem[]>>;
  readonly axis: FrequencyAxis;
  readonly polarity: 'in-phase' | 'inverted';
  readonly cost: Money;
  /** Which gain basis the chain figures are in, in words. */
  readonly gainBasisText: string;
}

// --- On request -----------------------------------------------------------------------------------------------------

export interface CurveCase {
  readonly gainDb: readonly (number | null)[];
  readonly phaseDeg: readonly (number | null)[];
}

export interface Curves {
  readonly frequenciesHz: readonly number[];
  readonly chain: Readonly<Record<GbwCase, CurveCase>>;
  readonly idealGainDb: number | null;
  readonly stages: readonly {
    readonly stageId: string;
    readonly label: string;
    readonly idealGainDb: number | null;
    readonly cases: Readonly<Record<GbwCase, CurveCase>>;
  }[];
}

export interface CurveRequest {
  readonly fromHz: number;
  readonly toHz: number;
  /** 2 to 2001. */
  readonly points: number;
}

export interface WorkingRequest {
  /** Null: a figure of the chain. */
  readonly stageId: string | null;
  /** A StageFigureKey or ChainFigureKey, or 'unitCost' / 'cost'. */
  readonly figure: string;
  readonly gbwCase: GbwCase;
}

export interface WorkingDatum {
  readonly label: string;
  readonly value: string;
  /** Where it is from: device and column, the set-up, the specification, the policy. */
  readonly origin: string;
  readonly assumed: boolean;
  readonly page?: string;
  readonly condition?: DatasheetValue['condition'];
}

export interface WorkingStep {
  readonly formula: string;
  readonly substituted: string;
  readonly result: string;
}

/** How a figure came about. */
export interface Working {
  readonly title: string;
  readonly gbwCase: GbwCase;
  readonly result: string;
  readonly steps: readonly WorkingStep[];
  readonly data: readonly WorkingDatum[];
  readonly assumptions: readonly string[];
  readonly validity: readonly string[];
  /** Published source, or "common practice". */
  readonly source: string;
}

/** One line of "what passes here": what a device in this place must bring. */
export interface StageNeed {
  readonly id: string;
  readonly text: string;
  readonly figure: Figure | null;
  readonly money: Money | null;
}

/** A device tried in this very stage, everything re-evaluated. */
export interface CandidateReport {
  readonly deviceId: string;
  readonly partNumber: string;
  readonly grade: Grade;
  readonly current: boolean;
  readonly gbwHave: Figure;
  readonly headroom: Figure;
  readonly cornerUpper: Figure;
  readonly droopOperating: Figure;
  readonly verdict: Verdict;
  /** Why it is not clear: the sentence of the worst check; empty when clear. */
  readonly reason: string;
  readonly chainVerdict: Verdict;
  /** What the chain becomes, e.g. "flatness 0.27 dB, passes" or "cost 11.60 over 9.00". */
  readonly chainText: string;
  readonly unitCost: Money;
  readonly chainCost: Money;
}

export interface CandidatesReport {
  readonly stageId: string;
  readonly needs: readonly StageNeed[];
  /** Cheapest that pass first; then tight, unknown, over; by cost within. */
  readonly candidates: readonly CandidateReport[];
}

// --- Rows of the features -------------------------------------------------------------------------------------------

export type Role = 'designer' | 'buyer' | 'lead' | 'admin';

export interface SessionUser {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
}

export interface DemoAccount {
  readonly userId: string;
  readonly name: string;
  readonly roles: readonly Role[];
  readonly title: string;
}

export interface Session {
  readonly user: SessionUser | null;
  readonly demo: boolean;
  readonly setupNeeded: boolean;
  readonly demoAccounts: readonly DemoAccount[];
  readonly version: string;
}

export interface UserRow {
  readonly id: string;
  readonly name: string;
  readonly roles: readonly Role[];
  readonly active: boolean;
  readonly email?: string;
  /** Whether a password has been chosen; for administrators only. */
  readonly hasPassword?: boolean;
  readonly version: number;
  readonly can: { readonly edit: boolean };
}

export interface PasswordLink {
  readonly path: string;
  readonly expiresAt: string;
}

export interface PersonRef {
  readonly id: string;
  readonly name: string;
}

export interface ProjectRow {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly open: boolean;
  readonly memberCount: number;
  readonly chainCount: number;
  readonly currency: string;
  readonly buildQuantity: number;
  readonly updatedAt: string;
  readonly can: { readonly edit: boolean };
}

export interface Project {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly description: string | null;
  readonly open: boolean;
  readonly members: readonly PersonRef[];
  readonly policy: Policy;
  readonly currency: string;
  readonly buildQuantity: number;
  readonly chainCount: number;
  readonly version: number;
  readonly updatedAt: string;
  readonly can: {
    readonly edit: boolean;
    readonly setPolicy: boolean;
    readonly createChain: boolean;
    readonly delete: boolean;
  };
}

export interface OptionSummary {
  readonly verdict: Verdict;
  readonly lead: string;
  readonly text: string;
  readonly worstHeadroom: Figure;
  /** "S2 Gain". */
  readonly worstHeadroomStage: string | null;
  readonly gain: Figure;
  readonly cost: Money;
  readonly costLimit: Money | null;
  readonly reason?: string;
}

export interface ChainRow {
  readonly id: string;
  readonly name: string;
  readonly version: number;
  readonly updatedAt: string;
  readonly summary: OptionSummary;
  readonly options: readonly { readonly id: string; readonly name: string; readonly summary: OptionSummary }[];
  readonly specificationText: string;
}

export interface ChainOptionRow {
  readonly id: string;
  readonly name: string;
  readonly position: number;
  readonly version: number;
  readonly updatedAt: string;
  readonly summary: OptionSummary;
}

export interface Chain {
  readonly id: string;
  readonly projectId: string;
  readonly projectCode: string;
  readonly projectName: string;
  readonly name: string;
  readonly version: number;
  readonly specification: Specification;
  readonly policy: Policy;
  readonly currency: string;
  readonly buildQuantity: number;
  readonly options: readonly ChainOptionRow[];
  readonly can: { readonly edit: boolean };
}

/** What the server adds to a device's engine fields. */
export interface DeviceRecord {
  readonly version: number;
  readonly datasheet?: { readonly revision: string; readonly title?: string } | null;
  /** Day on which the lifecycle was looked up, YYYY-MM-DD. */
  readonly lifecycleDate?: string | null;
  readonly enteredBy: PersonRef;
  readonly verifiedBy: PersonRef | null;
  readonly notes?: string | null;
  readonly updatedAt: string;
  readonly can: {
    readonly edit: boolean;
    readonly delete: boolean;
    readonly verify: boolean;
    readonly editQuote: boolean;
  };
}

export type DeviceDto = Device & DeviceRecord;

export interface DeviceList {
  readonly items: readonly DeviceDto[];
  readonly total: number;
}

export interface DeviceUse {
  readonly project: string;
  readonly chain: string;
  readonly option: string;
  readonly stage: string;
  readonly projectId?: string;
  readonly chainId?: string;
  readonly optionId?: string;
}

export interface DeviceUses {
  readonly where: readonly DeviceUse[];
  readonly hiddenCount: number;
}

export interface OptionDto {
  readonly id: string;
  readonly chainId: string;
  readonly name: string;
  readonly position: number;
  readonly version: number;
  readonly updatedAt: string;
  readonly stages: readonly Stage[];
  readonly devices: readonly DeviceDto[];
  readonly can: { readonly edit: boolean; readonly delete: boolean };
}

export interface DeskChain {
  readonly projectId: string;
  readonly projectCode: string;
  readonly chainId: string;
  readonly chainName: string;
  readonly optionId: string;
  readonly optionName: string;
  readonly lead: string;
  readonly text: string;
  readonly worstHeadroom: Figure;
  readonly stage: string | null;
}

export interface Desk {
  readonly overChains: readonly DeskChain[];
  readonly waiting: readonly unknown[];
  readonly counts: { readonly projects: number; readonly chains: number; readonly devices: number };
}

export interface CalculationRequest {
  readonly specification: Specification;
  readonly policy?: Partial<Policy>;
  readonly stages: readonly Stage[];
  readonly devices?: readonly Device[];
  readonly currency: string;
  readonly buildQuantity: number;
  readonly include?: { readonly curves?: CurveRequest; readonly working?: WorkingRequest };
}

export interface CalculationResponse {
  readonly report: ChainReport;
  readonly curves: Curves | null;
  readonly working: Working | null;
}
