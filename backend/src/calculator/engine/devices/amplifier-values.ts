import type { UsedValue } from '../analysis';
import { ASSUMED_OPEN_LOOP_GAIN_DB, ASSUMED_OPEN_LOOP_TRANSIMPEDANCE_OHM } from '../constants';
import type {
  AmplifierDevice,
  CurrentFeedbackDevice,
  DatasheetValue,
  Device,
  Policy,
  VoltageFeedbackDevice,
} from '../types';
import { currentFeedbackSecondPole } from './second-pole';
import { transimpedanceBandwidthOf } from './transimpedance-bandwidth';
import { DeviceCorner, columnOf, referenceBandwidthFor } from './used-values';

const isMinimumCase = (corner: DeviceCorner): boolean => corner === 'minimum' || corner === 'minimumHot';

/**
 * A value of which more is worse (noise, offset, bias and supply current), as a corner counts with it: the maximum in the
 * minimum cases where the datasheet gives it, else the typical value; null when not entered.
 *
 * @example upperWorst({ typ: 4e-3, max: 5e-3 }, 'minimum')?.value // 5e-3
 */
export function upperWorst(sheet: DatasheetValue | undefined, corner: DeviceCorner): UsedValue | null {
  return columnOf(sheet, isMinimumCase(corner) ? ['max', 'typ', 'min'] : ['typ', 'max', 'min']);
}

/**
 * A value of which less is worse (open-loop gain, gain of a block): the minimum in the minimum cases where given, else
 * typical; null when not entered.
 *
 * @example lowerWorst({ min: 90, typ: 100 }, 'typical')?.value // 100
 */
export function lowerWorst(sheet: DatasheetValue | undefined, corner: DeviceCorner): UsedValue | null {
  return columnOf(sheet, isMinimumCase(corner) ? ['min', 'typ', 'max'] : ['typ', 'min', 'max']);
}

/**
 * A parasitic without a side that is always the worse (Ro, Rb, Rin, capacitances): typical, else maximum, else minimum.
 *
 * @example parasitic({ max: 3e-12 })?.value // 3e-12
 */
export function parasitic(sheet: DatasheetValue | undefined): UsedValue | null {
  return columnOf(sheet, ['typ', 'max', 'min']);
}

function assumedValue(value: number, text: string): UsedValue {
  return { value, basis: 'assumed', text };
}

/** Open-loop output resistance, Ω; 0 assumed when the datasheet is silent. */
export function outputResistanceFor(device: AmplifierDevice): UsedValue {
  return parasitic(device.outputResistanceOhm) ?? assumedValue(0, 'not entered, 0 Ω assumed');
}

/** DC open-loop gain in dB; 120 dB assumed when the datasheet is silent. */
export function openLoopGainDbFor(device: VoltageFeedbackDevice, corner: DeviceCorner): UsedValue {
  return (
    lowerWorst(device.openLoopGainDb, corner) ?? assumedValue(ASSUMED_OPEN_LOOP_GAIN_DB, 'not entered, 120 dB assumed')
  );
}

/** DC open-loop transimpedance, Ω; 1 MΩ assumed when the datasheet is silent. */
export function openLoopTransimpedanceFor(device: CurrentFeedbackDevice, corner: DeviceCorner): UsedValue {
  return (
    lowerWorst(device.openLoopTransimpedanceOhm, corner) ??
    assumedValue(ASSUMED_OPEN_LOOP_TRANSIMPEDANCE_OHM, 'not entered, 1 MΩ assumed')
  );
}

/** Resistance into the inverting input, Ω; 0 assumed when the datasheet is silent. */
export function invertingInputResistanceFor(device: CurrentFeedbackDevice): UsedValue {
  return parasitic(device.invertingInputResistanceOhm) ?? assumedValue(0, 'not entered, 0 Ω assumed');
}

/**
 * K = Z0·ωz of a current-feedback amplifier in a corner, Ω·rad/s; see {@link transimpedanceBandwidthOf}.
 *
 * @example transimpedanceBandwidthFor(device, DEFAULT_POLICY, 'minimum') / (2 * Math.PI * 1000) // ≈ bandwidth with Rf 1 kΩ
 */
export function transimpedanceBandwidthFor(
  device: CurrentFeedbackDevice,
  policy: Policy,
  corner: DeviceCorner,
): number {
  return transimpedanceBandwidthOf({
    bandwidthHz: referenceBandwidthFor(device, policy, corner).value,
    noiseGain: device.referenceNoiseGain,
    feedbackOhm: device.referenceFeedbackOhm,
    invertingInputOhm: invertingInputResistanceFor(device).value,
    outputOhm: outputResistanceFor(device).value,
    openLoopOhm: openLoopTransimpedanceFor(device, corner).value,
    secondPoleHz: currentFeedbackSecondPole(device).frequencyHz,
  });
}

/** Closest approach to the positive rail, V: the maximum, else typical; null when not entered. */
export function headroomPositiveFor(device: AmplifierDevice): UsedValue | null {
  return columnOf(device.headroomPositiveV, ['max', 'typ', 'min']);
}

/** Closest approach to the negative rail, V: the maximum, else typical; null when not entered. */
export function headroomNegativeFor(device: AmplifierDevice): UsedValue | null {
  return columnOf(device.headroomNegativeV, ['max', 'typ', 'min']);
}

/** Largest output current, A: the minimum, else typical; null when not entered. */
export function outputCurrentFor(device: AmplifierDevice): UsedValue | null {
  return columnOf(device.outputCurrentA, ['min', 'typ', 'max']);
}

/** Quiescent current of one amplifier or block, A; a passive block (loss, nothing entered) draws none; null: not entered. */
export function supplyCurrentFor(device: Device, corner: DeviceCorner): UsedValue | null {
  const used = upperWorst(device.supplyCurrentA, corner);
  if (used || device.kind !== 'matched-block') return used;
  const gainDb = lowerWorst(device.gainDb, corner)?.value ?? Infinity;
  return gainDb <= 0 ? assumedValue(0, 'passive') : null;
}
