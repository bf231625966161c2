import type { Maybe, UsedValue } from '../analysis';
import { TWO_PI } from '../constants';
import type { MutableComplex } from '../complex';
import { headroomNegativeFor, headroomPositiveFor, outputCurrentFor } from '../devices/amplifier-values';
import { slewFor } from '../devices/used-values';
import type { PreparedStage } from '../stages/prepare-stage';
import type { AmplifierDevice, ChainInput, Policy, Source, Supply } from '../types';
import { availablePowerToPeakEmf } from '../units';
import { known, mapMaybe, notEntered, unknown } from '../maybe';
import type { ChainResponse } from './response';

/** Peak source EMF in V (current source: peak current in A) at a level as the source states it. */
export function sourcePeak(source: Source, level: number): number {
  if (source.kind === 'current' || source.levelKind === 'peak-emf') return level;
  if (source.levelKind === 'rms-emf') return level * Math.SQRT2;
  return availablePowerToPeakEmf(level, source.resistanceOhm);
}

/** Peak level in of the largest or nominal input per unit ideal EMF gain: what `IdealChain` voltages are multiplied by. */
export function inputPeak(source: Source, which: 'largest' | 'nominal'): Maybe {
  const level = which === 'largest' ? source.largestLevel : source.nominalLevel;
  if (level === undefined) return unknown(`The ${which} input level is not entered.`);
  const peak = sourcePeak(source, level);
  return known(source.kind === 'current' ? peak * source.resistanceOhm : peak);
}

/** Levels of one stage. All V and A peak. */
export interface StageLevels {
  readonly outputPeakV: Maybe;
  /** A block's into its own impedance. */
  readonly matchedPeakV: Maybe | null;
  readonly outputNominalPeakV: Maybe;
  readonly swingAvailableV: Maybe;
  readonly slewNeededVPerS: Maybe;
  readonly slewAvailable: UsedValue | null;
  readonly fullPowerBandwidthHz: Maybe;
  readonly outputCurrentPeakA: Maybe;
  readonly outputCurrentAvailable: UsedValue | null;
}

const NOT_AN_AMPLIFIER = unknown('Not an operational amplifier.');

/** The amplifier of a feedback stage, else null. */
export function amplifierOf(stage: PreparedStage): AmplifierDevice | null {
  return stage.device && stage.device.kind !== 'matched-block' ? stage.device : null;
}

/** What the output can swing around its DC point (mid-supply on a single supply), offset taken off, V peak. */
export function swingAvailable(device: AmplifierDevice, supply: Supply, offset: Maybe): Maybe {
  const positive = headroomPositiveFor(device);
  const negative = headroomNegativeFor(device);
  if (!positive) return notEntered('output swing headroom from the positive rail', device);
  if (!negative) return notEntered('output swing headroom from the negative rail', device);
  const restV = supply.negativeV === 0 ? supply.positiveV / 2 : 0;
  const upV = supply.positiveV - positive.value - restV;
  const downV = restV - supply.negativeV - negative.value;
  return known(Math.min(upV, downV) - (offset.value ?? 0), offset.value === null);
}

/** |YL in front of Riso + feedback network| at the solved frequency: what the amplifier's output pin drives, S. */
function drivenAdmittance(response: ChainResponse, k: number, omega: number): number {
  const { network } = response;
  const { loop } = network.stages[k - 1];
  if (!loop) return 0;
  const { admittanceRe: yRe, admittanceIm: yIm } = network.loads[k];
  const dRe = 1 + yRe * loop.isolationOhm;
  const dIm = yIm * loop.isolationOhm;
  const squared = dRe * dRe + dIm * dIm;
  const feedback: MutableComplex = { re: 0, im: 0 };
  loop.feedbackAdmittance(omega, feedback);
  return Math.hypot((yRe * dRe + yIm * dIm) / squared + feedback.re, (yIm * dRe - yRe * dIm) / squared + feedback.im);
}

/**
 * Level, swing, slew and output current of every stage: ideal gain at the largest input, judged at the band's top edge.
 * Slew needed = 2π·f·Vpk; full-power bandwidth = SR/(2π·Vpk). Solves the network at the top edge.
 * Source: derivative of a sine; e.g. A. S. Sedra, K. C. Smith, Microelectronic Circuits, ch. 2 (from memory).
 *
 * @example 1 V peak at 7 MHz needs 44 V/µs
 */
export function stageLevels(input: ChainInput, response: ChainResponse, offsets: readonly Maybe[]): StageLevels[] {
  const { source, band, supply } = input.specification;
  const largest = inputPeak(source, 'largest');
  const nominal = inputPeak(source, 'nominal');
  const omega = TWO_PI * band.highHz;
  response.solve(band.highHz);
  return response.network.prepared.map((stage, index) => {
    const gain = Math.abs(response.ideal.pin[index + 1]);
    const outputPeakV = mapMaybe(largest, (peak) => peak * gain);
    const outputNominalPeakV = mapMaybe(nominal, (peak) => peak * gain);
    const device = amplifierOf(stage);
    if (!device) {
      const halfEmf = Math.abs(response.ideal.emf[index + 1]) / 2;
      const matchedPeakV = stage.block ? mapMaybe(largest, (peak) => peak * halfEmf) : null;
      return passiveLevels(outputPeakV, outputNominalPeakV, matchedPeakV);
    }
    const admittance = drivenAdmittance(response, index + 1, omega);
    return {
      outputPeakV,
      matchedPeakV: null,
      outputNominalPeakV,
      swingAvailableV: swingAvailable(device, supply, offsets[index]),
      ...slewLevels(device, input.policy, outputPeakV, omega),
      outputCurrentPeakA: mapMaybe(outputPeakV, (peak) => peak * admittance),
      outputCurrentAvailable: outputCurrentFor(device),
    };
  });
}

function slewLevels(device: AmplifierDevice, policy: Policy, outputPeakV: Maybe, omega: number) {
  const slewAvailable = slewFor(device, policy);
  const fullPower = (peak: number): number => (slewAvailable ? slewAvailable.value / (TWO_PI * peak) : NaN);
  return {
    slewNeededVPerS: mapMaybe(outputPeakV, (peak) => omega * peak),
    slewAvailable,
    fullPowerBandwidthHz: slewAvailable ? mapMaybe(outputPeakV, fullPower) : notEntered('slew rate', device),
  };
}

function passiveLevels(outputPeakV: Maybe, outputNominalPeakV: Maybe, matchedPeakV: Maybe | null): StageLevels {
  return {
    outputPeakV,
    matchedPeakV,
    outputNominalPeakV,
    swingAvailableV: NOT_AN_AMPLIFIER,
    slewNeededVPerS: NOT_AN_AMPLIFIER,
    slewAvailable: null,
    fullPowerBandwidthHz: NOT_AN_AMPLIFIER,
    outputCurrentPeakA: NOT_AN_AMPLIFIER,
    outputCurrentAvailable: null,
  };
}
