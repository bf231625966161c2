/**
 * Raw numbers between the network analysis (`chain/`) and what is said about them (`checks/`, `working/`, `report/`).
 * Internal to the engine. Numbers are finite; what cannot be told is `{ value: null, reason }`.
 */
import type { GbwCase } from './types';

export type Maybe =
  { readonly value: number; readonly assumed?: boolean } | { readonly value: null; readonly reason: string };

/** A device value as used: with its column, page and whether it was assumed. */
export interface UsedValue {
  readonly value: number;
  /** `assumed`: the datasheet is silent and a rule fills in. */
  readonly basis: 'min' | 'typ' | 'max' | 'typ-derated' | 'assumed';
  /** "minimum", "typical × 0.7", "minimum × 0.8 (hot)" … */
  readonly text: string;
  readonly page?: string;
  readonly condition?: string;
}

/** One stage in one GBW case. Levels in V peak at the amplifier's own output pin, in front of the isolation resistor. */
export interface StageAnalysis {
  readonly stageId: string;
  /** GBW as used; null: the device has none. */
  readonly gbw: UsedValue | null;
  /** Ideal gain of the topology from its resistors: signed ratio; transimpedance in Ω (signed). */
  readonly signalGain: number;
  /** Midband resistive noise gain, coupling shorted, shunt capacitances removed, the resistance in front included. Null: none. */
  readonly noiseGain: number | null;
  /** |noise gain(j2πf)|. */
  readonly noiseGainOperating: number | null;
  readonly noiseGainTop: number | null;
  readonly headroomOperating: Maybe;
  readonly headroomTop: Maybe;
  /** Where |noise gain|·f = GBW / headroomTarget and = GBW: the lane of a stage with GBW. */
  readonly targetMetHz: number | null;
  readonly runsOutHz: number | null;
  /** GBW/NG; null for transimpedance and where there is no GBW. Current feedback: K/(2π·(Rf + NG·Rb)). */
  readonly cornerFirstOrderHz: Maybe;
  /** Loaded, exact; half power of the ideal gain. `operatingBeyond`: already under it at the operating frequency. */
  readonly cornerUpperHz: Maybe;
  readonly cornerLowerHz: Maybe;
  readonly operatingBeyondCorner: boolean;
  /** Node to node: V(node behind)/V(node in front); for the first stage referred to the EMF (or I: Ω). dB. */
  readonly idealGainDb: Maybe;
  readonly gainLowDb: Maybe;
  readonly gainOperatingDb: Maybe;
  readonly gainHighDb: Maybe;
  /** V(node behind)/EMF, dB (per I: dBΩ). */
  readonly runningGainDb: Maybe;
  readonly phaseDeg: Maybe;
  /** |T| of the loaded loop at the operating frequency. */
  readonly loopGain: Maybe;
  readonly vectorError: Maybe;
  readonly riseTimeS: Maybe;
  /** With ideal gain at the largest input. */
  readonly outputPeakV: Maybe;
  /** What a block would give into its own impedance, half its EMF: its available output. Null for other stages. */
  readonly matchedPeakV: Maybe | null;
  readonly outputNominalPeakV: Maybe;
  /** What the output can swing around its DC point, offset taken off. */
  readonly swingAvailableV: Maybe;
  readonly slewNeededVPerS: Maybe;
  readonly slewAvailable: UsedValue | null;
  readonly fullPowerBandwidthHz: Maybe;
  readonly outputCurrentPeakA: Maybe;
  readonly outputCurrentAvailable: UsedValue | null;
  /** At the amplifier's output. */
  readonly outputOffsetV: Maybe;
  /** Added by this stage, referred to the EMF (I), V²/Hz (A²/Hz), at the operating frequency. */
  readonly noiseAdded: Maybe;
  readonly supplyCurrentA: Maybe;
  readonly supplyPowerW: Maybe;
}

/** Stability does not depend on the GBW case: both ends of the GBW range are looked at and the worse counts. */
export interface StabilityAnalysis {
  readonly stageId: string;
  /** Null phase margin with `noCrossing`: |T| never crosses 1. */
  readonly atMinimum: StabilityPoint;
  readonly atMaximum: StabilityPoint;
  readonly worse: 'minimum' | 'maximum';
  readonly minimumGbw: UsedValue;
  readonly maximumGbw: UsedValue;
  readonly secondPoleHz: number | null;
  /** How the second pole is known; null = not known. */
  readonly secondPoleText: string | null;
  readonly outputResistanceKnown: boolean;
  readonly loadCapacitive: boolean;
}

export interface StabilityPoint {
  readonly noCrossing: boolean;
  /** Smallest over all crossings of |T| = 1, degrees, unwrapped; null without a crossing. */
  readonly phaseMarginDeg: number | null;
  readonly crossingHz: number | null;
  /** Smallest |noise gain| over the crossings. */
  readonly noiseGainAtCrossing: number | null;
  /** Peak of the stage's closed-loop gain over its ideal gain, ≥ 0 dB. */
  readonly peakingDb: number;
}

export interface ChainCaseAnalysis {
  readonly gbwCase: GbwCase;
  readonly stages: readonly StageAnalysis[];
  /** In the specification's gain basis, dB (dBΩ). */
  readonly idealGainDb: Maybe;
  readonly gainLowDb: Maybe;
  readonly gainOperatingDb: Maybe;
  readonly gainHighDb: Maybe;
  readonly flatnessDb: Maybe;
  /** Most negative gain over ideal in the band, and where. */
  readonly worstDroopDb: Maybe;
  readonly worstDroopHz: number;
  readonly cornerUpperHz: Maybe;
  readonly cornerLowerHz: Maybe;
  readonly operatingBeyondCorner: boolean;
  /** Chain corner ÷ lowest stage corner. */
  readonly shrinkage: Maybe;
  readonly phaseDeg: Maybe;
  readonly groupDelayS: Maybe;
  readonly riseTimeS: Maybe;
  /** Added density at the operating frequency, V/√Hz referred to the EMF (A/√Hz to I). */
  readonly inputNoise: Maybe;
  readonly noiseFigureDb: Maybe;
  readonly outputOffsetV: Maybe;
  /** V peak at the load at the largest input, ideal gain. */
  readonly outputPeakV: Maybe;
  readonly supplyCurrentA: Maybe;
  readonly supplyPowerW: Maybe;
  readonly inverted: boolean;
}

/** What the analysis of a whole chain gives to the report. */
export interface ChainAnalysis {
  readonly cases: Readonly<Record<GbwCase, ChainCaseAnalysis>>;
  /** One per feedback stage, by stage id. */
  readonly stability: ReadonlyMap<string, StabilityAnalysis>;
}
