import { STAGE_KINDS } from '../types';
import type { Device, DeviceKind, FeedbackStage, RcSectionStage, Stage } from '../types';
import type { IssueCollector } from './issue-collector';

/** What a stage sees in front of it, as far as refusals depend on it. */
export interface Front {
  /** Resistance of the ideal chain in front, Ω; 0 behind an amplifier without a resistor outside its loop. */
  readonly ohm: number;
  /** A DC path to ground exists to the left. */
  readonly dcReturn: boolean;
}

const KIND_TEXT: Readonly<Record<DeviceKind, string>> = {
  'voltage-feedback': 'a voltage-feedback amplifier',
  'current-feedback': 'a current-feedback amplifier',
  'matched-block': 'a matched block',
};

const TOPOLOGIES = {
  'voltage-feedback': ['non-inverting', 'follower', 'inverting', 'transimpedance'],
  'current-feedback': ['non-inverting', 'inverting'],
} as const;

function deviceOf(
  found: IssueCollector,
  path: string,
  stage: Exclude<Stage, RcSectionStage>,
  devices: readonly Device[],
): Device | null {
  const device = devices.find((candidate) => candidate?.id === stage.deviceId);
  if (!device) {
    found.add('device_unknown', `${path}.deviceId`, 'There is no such device.');
    return null;
  }
  if (device.kind === stage.kind) return device;
  const message = `This stage needs ${KIND_TEXT[stage.kind]}; ${device.partNumber} is ${KIND_TEXT[device.kind]}.`;
  found.add('device_kind_mismatch', `${path}.deviceId`, message);
  return null;
}

function section(found: IssueCollector, path: string, stage: RcSectionStage, front: Front): Front {
  found.optional(`${path}.seriesOhm`, stage.seriesOhm, 'resistanceOrZeroOhm');
  found.optional(`${path}.seriesF`, stage.seriesF, 'capacitanceF');
  found.optional(`${path}.shuntOhm`, stage.shuntOhm, 'resistanceOhm');
  found.optional(`${path}.shuntF`, stage.shuntF, 'capacitanceOrZeroF');
  return {
    ohm: front.ohm + (stage.seriesOhm ?? 0),
    dcReturn: Boolean(stage.shuntOhm) || (front.dcReturn && !stage.seriesF),
  };
}

function feedbackParts(found: IssueCollector, path: string, stage: FeedbackStage): void {
  found.optional(`${path}.feedbackF`, stage.feedbackF, 'capacitanceOrZeroF');
  found.optional(`${path}.strayF`, stage.strayF, 'capacitanceOrZeroF');
  found.optional(`${path}.terminationOhm`, stage.terminationOhm, 'resistanceOhm');
  found.optional(`${path}.couplingF`, stage.couplingF, 'capacitanceF');
  found.optional(`${path}.biasOhm`, stage.biasOhm, 'resistanceOhm');
  found.optional(`${path}.isolationOhm`, stage.isolationOhm, 'resistanceOrZeroOhm');
}

/** Rf: may be 0 only where a voltage-feedback output may be tied to the − input. */
function feedbackResistor(found: IssueCollector, path: string, stage: FeedbackStage): void {
  const mayBeZero =
    stage.kind === 'voltage-feedback' && (stage.topology === 'follower' || stage.topology === 'non-inverting');
  const missing = stage.feedbackOhm === undefined || stage.feedbackOhm === null;
  if (missing || (stage.feedbackOhm === 0 && !mayBeZero)) {
    found.add('feedback_resistor_missing', `${path}.feedbackOhm`, 'A feedback resistor is needed, above 0 Ω.');
    return;
  }
  found.required(`${path}.feedbackOhm`, stage.feedbackOhm, 'resistanceOrZeroOhm');
}

function invertingInput(found: IssueCollector, path: string, stage: FeedbackStage, front: Front): void {
  if (stage.topology === 'inverting') {
    if (stage.gainOhm === 0) {
      found.add(
        'inverting_fed_from_zero_ohm',
        `${path}.gainOhm`,
        'The gain resistor of an inverting stage cannot be 0 Ω.',
      );
      return;
    }
    found.required(`${path}.gainOhm`, stage.gainOhm, 'resistanceOhm');
    return;
  }
  if (front.ohm > 0) return;
  const message =
    'The inverting node is fed from 0 Ω: put a resistor behind the stage in front, or use an inverting stage.';
  found.add('inverting_fed_from_zero_ohm', `${path}.gainOhm`, message);
}

function plusInput(found: IssueCollector, path: string, stage: FeedbackStage, front: Front): void {
  if (stage.topology === 'non-inverting') found.optional(`${path}.gainOhm`, stage.gainOhm, 'resistanceOhm');
  const returned = stage.couplingF ? false : front.dcReturn || Boolean(stage.terminationOhm);
  if (returned || stage.biasOhm) return;
  const message = 'The + input has no DC return: a bias resistor to ground is needed behind the coupling capacitor.';
  found.add('input_without_dc_return', `${path}.biasOhm`, message);
}

function feedback(found: IssueCollector, path: string, stage: FeedbackStage, front: Front): Front {
  const known = found.oneOf(`${path}.topology`, stage.topology, TOPOLOGIES[stage.kind]);
  feedbackParts(found, path, stage);
  feedbackResistor(found, path, stage);
  if (known) {
    const inverting = stage.topology === 'inverting' || stage.topology === 'transimpedance';
    if (inverting) invertingInput(found, path, stage, front);
    else plusInput(found, path, stage, front);
  }
  return { ohm: stage.isolationOhm ?? 0, dcReturn: true };
}

/**
 * What is wrong with a stage, given what it sees in front; gives what the next one sees.
 *
 * @param path of the stage, e.g. `stages.1`
 * @example an inverting stage without Rf adds feedback_resistor_missing at stages.1.feedbackOhm
 */
export function validateStage(
  found: IssueCollector,
  path: string,
  stage: Stage,
  devices: readonly Device[],
  front: Front,
): Front {
  if (!found.oneOf(`${path}.kind`, stage.kind, STAGE_KINDS)) return front;
  if (stage.kind === 'rc-section') return section(found, path, stage, front);
  const device = deviceOf(found, path, stage, devices);
  if (stage.kind === 'matched-block') {
    const ohm = device?.kind === 'matched-block' ? device.impedanceOhm : 50;
    return { ohm, dcReturn: true };
  }
  return feedback(found, path, stage, front);
}
