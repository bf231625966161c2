import { DEVICE_KINDS } from '../types';
import type {
  CurrentFeedbackDevice,
  DatasheetValue,
  Device,
  MatchedBlockDevice,
  VoltageFeedbackDevice,
} from '../types';
import type { IssueCollector, RangeName } from './issue-collector';

/** Phase margins from here on are no datasheet's: quoted ones end near 90°. */
const PHASE_MARGIN_LIMIT_DEG = 120;

type Sheet = DatasheetValue | undefined;

/** The columns of a datasheet value: at least one, each in range, min ≤ typ ≤ max. */
function sheet(found: IssueCollector, path: string, value: Sheet, range: RangeName): void {
  if (value === undefined || value === null) return;
  const { min, typ, max } = value;
  if (min === undefined && typ === undefined && max === undefined) {
    found.add('required', `${path}.typ`, 'At least one of minimum, typical and maximum is needed.');
    return;
  }
  for (const column of ['min', 'typ', 'max'] as const) {
    if (value[column] !== undefined) found.required(`${path}.${column}`, value[column], range);
  }
  order(found, path, value);
}

function order(found: IssueCollector, path: string, { min, typ, max }: DatasheetValue): void {
  const above = (low: number | undefined, high: number | undefined): boolean =>
    low !== undefined && high !== undefined && low > high;
  if (above(min, typ)) {
    found.add('min_above_typ', `${path}.min`, `The minimum (${min}) is above the typical value (${typ}).`);
  }
  if (above(typ, max)) {
    found.add('typ_above_max', `${path}.typ`, `The typical value (${typ}) is above the maximum (${max}).`);
  }
  if (typ === undefined && above(min, max)) {
    found.add('min_above_typ', `${path}.min`, `The minimum (${min}) is above the maximum (${max}).`);
  }
}

/** A value whose lower end is needed: min or typ has to be there. */
function spread(found: IssueCollector, path: string, value: Sheet, range: RangeName): void {
  if (value === undefined || value === null) {
    found.add('required', `${path}.typ`, 'A minimum or typical value is needed.');
    return;
  }
  sheet(found, path, value, range);
  if (value.min === undefined && value.typ === undefined && value.max !== undefined) {
    found.add('required', `${path}.typ`, 'A minimum or typical value is needed beside the maximum.');
  }
}

function amplifier(found: IssueCollector, path: string, device: VoltageFeedbackDevice | CurrentFeedbackDevice): void {
  sheet(found, `${path}.outputResistanceOhm`, device.outputResistanceOhm, 'resistanceOrZeroOhm');
  sheet(found, `${path}.inputResistanceOhm`, device.inputResistanceOhm, 'resistanceOhm');
  sheet(found, `${path}.commonModeCapacitanceF`, device.commonModeCapacitanceF, 'capacitanceOrZeroF');
  sheet(found, `${path}.slewRateVPerS`, device.slewRateVPerS, 'positive');
  sheet(found, `${path}.headroomPositiveV`, device.headroomPositiveV, 'notNegative');
  sheet(found, `${path}.headroomNegativeV`, device.headroomNegativeV, 'notNegative');
  sheet(found, `${path}.outputCurrentA`, device.outputCurrentA, 'positive');
  sheet(found, `${path}.inputOffsetVoltageV`, device.inputOffsetVoltageV, 'any');
  sheet(found, `${path}.inputBiasCurrentA`, device.inputBiasCurrentA, 'any');
  sheet(found, `${path}.voltageNoiseVPerRtHz`, device.voltageNoiseVPerRtHz, 'notNegative');
  sheet(found, `${path}.currentNoiseAPerRtHz`, device.currentNoiseAPerRtHz, 'notNegative');
  found.optional(`${path}.voltageNoiseCornerHz`, device.voltageNoiseCornerHz, 'frequencyOrZeroHz');
  found.optional(`${path}.currentNoiseCornerHz`, device.currentNoiseCornerHz, 'frequencyOrZeroHz');
  found.optional(`${path}.secondPoleHz`, device.secondPoleHz, 'frequencyHz');
}

function voltageFeedback(found: IssueCollector, path: string, device: VoltageFeedbackDevice): void {
  spread(found, `${path}.gainBandwidthHz`, device.gainBandwidthHz, 'frequencyHz');
  sheet(found, `${path}.openLoopGainDb`, device.openLoopGainDb, 'decibelOrZero');
  sheet(found, `${path}.differentialCapacitanceF`, device.differentialCapacitanceF, 'capacitanceOrZeroF');
  found.optional(`${path}.minimumStableGain`, device.minimumStableGain, 'gain');
  found.optional(`${path}.phaseMarginGain`, device.phaseMarginGain, 'gain');
  const margin = device.phaseMarginDeg;
  if (!found.optional(`${path}.phaseMarginDeg`, margin, 'any') || margin === undefined) return;
  if (margin > 0 && margin < PHASE_MARGIN_LIMIT_DEG) return;
  const limit = `above 0° and below ${PHASE_MARGIN_LIMIT_DEG}°`;
  found.add('phase_margin_out_of_range', `${path}.phaseMarginDeg`, `A phase margin has to be ${limit}.`);
}

function currentFeedback(found: IssueCollector, path: string, device: CurrentFeedbackDevice): void {
  spread(found, `${path}.referenceBandwidthHz`, device.referenceBandwidthHz, 'frequencyHz');
  found.required(`${path}.referenceNoiseGain`, device.referenceNoiseGain, 'gain');
  found.required(`${path}.referenceFeedbackOhm`, device.referenceFeedbackOhm, 'resistanceOhm');
  sheet(found, `${path}.invertingInputResistanceOhm`, device.invertingInputResistanceOhm, 'resistanceOrZeroOhm');
  sheet(found, `${path}.openLoopTransimpedanceOhm`, device.openLoopTransimpedanceOhm, 'resistanceOhm');
  sheet(found, `${path}.invertingBiasCurrentA`, device.invertingBiasCurrentA, 'any');
  sheet(found, `${path}.invertingCurrentNoiseAPerRtHz`, device.invertingCurrentNoiseAPerRtHz, 'notNegative');
}

function matchedBlock(found: IssueCollector, path: string, device: MatchedBlockDevice): void {
  found.required(`${path}.impedanceOhm`, device.impedanceOhm, 'resistanceOhm');
  if (device.gainDb === undefined)
    found.add('required', `${path}.gainDb.typ`, 'The gain is needed; negative is a loss.');
  sheet(found, `${path}.gainDb`, device.gainDb, 'decibel');
  sheet(found, `${path}.lowerCornerHz`, device.lowerCornerHz, 'frequencyHz');
  if (device.upperCornerHz) spread(found, `${path}.upperCornerHz`, device.upperCornerHz, 'frequencyHz');
  sheet(found, `${path}.noiseFigureDb`, device.noiseFigureDb, 'decibelOrZero');
  sheet(found, `${path}.outputP1dbDbm`, device.outputP1dbDbm, 'decibel');
  sheet(found, `${path}.outputIp3Dbm`, device.outputIp3Dbm, 'decibel');
}

/**
 * What is wrong with a device's values.
 *
 * @param path of the device, e.g. `devices.0`
 * @example a GBW of { min: 100e6, typ: 75e6 } adds min_above_typ at devices.0.gainBandwidthHz.min
 */
export function validateDevice(found: IssueCollector, path: string, device: Device): void {
  found.required(`${path}.channels`, device.channels, 'count');
  sheet(found, `${path}.supplyVoltageV`, device.supplyVoltageV, 'volt');
  sheet(found, `${path}.supplyCurrentA`, device.supplyCurrentA, 'notNegative');
  if (device.kind === 'matched-block') {
    matchedBlock(found, path, device);
    return;
  }
  if (!found.oneOf(`${path}.kind`, device.kind, DEVICE_KINDS)) return;
  amplifier(found, path, device);
  if (device.kind === 'voltage-feedback') voltageFeedback(found, path, device);
  else currentFeedback(found, path, device);
}
