import type { DataMark } from '../report';
import type { DatasheetValue, Device } from '../types';
import { isFeedbackStage } from './facts';
import type { ChainFacts, StageFacts } from './facts';

const LIFECYCLE_TEXT: Readonly<Record<string, string>> = {
  'not-recommended': 'not recommended for new designs',
  'last-time-buy': 'last-time buy',
  obsolete: 'obsolete',
};

/** Marks beside a stage's verdict about the quality of its data; they never change the verdict. */
export function stageMarks(facts: ChainFacts, stage: StageFacts): readonly DataMark[] {
  const { device } = stage;
  if (!device) return [];
  return [
    ...assumedMarks(stage, device),
    ...typicalOnlyMarks(device, facts.policy.gbwDerating),
    ...recordMarks(device),
    ...quoteMarks(stage),
    ...cautionMarks(stage),
  ];
}

function assumedMarks(stage: StageFacts, device: Device): readonly DataMark[] {
  if (device.kind === 'matched-block') return [];
  const isVoltageFeedback = device.kind === 'voltage-feedback';
  const silent: readonly (readonly [boolean, string])[] = [
    [isVoltageFeedback && !device.openLoopGainDb, 'open-loop gain 120 dB'],
    [isVoltageFeedback && !device.differentialCapacitanceF, 'no differential input capacitance'],
    [!device.outputResistanceOhm, 'no output resistance'],
    [!device.inputResistanceOhm, 'infinite input resistance'],
    [!device.commonModeCapacitanceF, 'no input capacitance'],
    [hasUnlimitedSecondPole(stage), 'no second pole (phase margin of 90° or more)'],
  ];
  const missing = silent.filter(([isSilent]) => isSilent).map(([, text]) => text);
  return missing.length === 0 ? [] : [{ kind: 'assumed', text: `Assumed: ${missing.join(', ')}.` }];
}

function hasUnlimitedSecondPole(stage: StageFacts): boolean {
  return stage.stability !== null && stage.stability.secondPoleText !== null && stage.stability.secondPoleHz === null;
}

function onlyTypical(value: DatasheetValue | undefined): boolean {
  return value !== undefined && value.min === undefined && value.typ !== undefined;
}

function typicalOnlyMarks(device: Device, derating: number): readonly DataMark[] {
  const names: string[] = [];
  if (device.kind === 'voltage-feedback' && onlyTypical(device.gainBandwidthHz)) names.push(`GBW (× ${derating})`);
  if (device.kind === 'current-feedback' && onlyTypical(device.referenceBandwidthHz))
    names.push(`bandwidth (× ${derating})`);
  if (device.kind !== 'matched-block' && onlyTypical(device.slewRateVPerS)) names.push('slew rate');
  if (names.length === 0) return [];
  return [{ kind: 'typical-only', text: `Only typical values: ${names.join(', ')}. The minimum is assumed.` }];
}

function recordMarks(device: Device): readonly DataMark[] {
  const marks: DataMark[] = [];
  if (device.verified !== true) {
    marks.push({
      kind: 'not-verified',
      text: `${device.partNumber} has not been compared with its datasheet by a second person.`,
    });
  }
  const lifecycle = device.lifecycle ? LIFECYCLE_TEXT[device.lifecycle] : undefined;
  if (lifecycle) marks.push({ kind: 'lifecycle', text: `${device.partNumber} is ${lifecycle}.` });
  return marks;
}

function quoteMarks(stage: StageFacts): readonly DataMark[] {
  if (stage.cost.price?.lapsed !== true) return [];
  const until = stage.device?.quote?.validUntil ?? '';
  return [{ kind: 'quote-lapsed', text: `Its quote lapsed on ${until}; the price still counts.` }];
}

function cautionMarks(stage: StageFacts): readonly DataMark[] {
  const set = stage.stage;
  if (!isFeedbackStage(set) || set.kind !== 'current-feedback' || !set.feedbackF) return [];
  const text =
    'A capacitor straight across Rf lowers the feedback impedance of a current-feedback amplifier: it may oscillate.';
  return [{ kind: 'caution', text }];
}
