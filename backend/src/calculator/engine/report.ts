/**
 * What the calculator answers: finished figures, verdicts and sentences. Screens and documents only format and draw.
 * A figure is never NaN or infinite; `value: null` always carries a reason in words.
 */
import type { DatasheetValue, GbwCase, Grade, Stage, StageKind } from './types';

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
  | 'number'
  | 'deg'
  | 'V/s'
  | 'V/√Hz'
  | 'A/√Hz'
  | 'fraction';

/** `ratio` prints as ×0.974, `gain` as a signed gain (×10, −10), `number` plain (a noise gain of 11), `fraction` as %. `digits` = significant digits to print. */
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
  /** Why there is no amount; beside an amount: a remark on it, e.g. that the first break's price stands in. */
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

export interface CurveRequest extends FrequencyAxis {
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

/** A chain in one line, for lists. */
export interface ChainSummary {
  readonly verdict: Verdict;
  readonly lead: string;
  readonly text: string;
  readonly worstHeadroom: Figure;
  /** "S2 Gain"; null: no stage has a GBW. */
  readonly worstHeadroomStage: string | null;
  readonly gain: Figure;
  readonly cost: Money;
}
