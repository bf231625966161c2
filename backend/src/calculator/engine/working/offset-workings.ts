import type { UsedValue } from '../analysis';
import { ChainNetwork } from '../chain/chain-network';
import { dcTerms } from '../chain/dc-offset';
import type { DcTerms } from '../chain/dc-offset';
import { upperWorst } from '../devices/amplifier-values';
import { fullLabel, isFeedbackStage } from '../report/facts';
import type { WorkingDatum, WorkingStep } from '../report';
import type { AmplifierDevice, DatasheetValue, FeedbackStage } from '../types';
import { deviceDatum, networkData } from './data';
import { lastStep, num, step } from './scope';
import type { Draft, StageScope } from './scope';
import { DATASHEET_CONDITIONS, FEEDBACK_SOURCE } from './sources';

/** DC at the amplifier's output. */
export function outputOffsetWorking(scope: StageScope): Draft {
  return {
    title: `Output offset of ${fullLabel(scope.stage)}`,
    steps: offsetSteps(scope),
    data: offsetData(scope),
    assumptions: [
      'Worst case: sizes are added, because their signs are not known.',
      'A coupling capacitor stops the DC of everything in front of it.',
    ],
    validity: [DATASHEET_CONDITIONS],
    source: FEEDBACK_SOURCE,
  };
}

function offsetSteps(scope: StageScope): readonly WorkingStep[] {
  const { facts, stage } = scope;
  const { device } = stage;
  const offset = stage.analysis.outputOffsetV.value;
  const { prepared } = new ChainNetwork(facts.input, facts.gbwCase);
  const terms = offset === null ? null : dcTerms(facts.input, prepared, facts.gbwCase, stage.index);
  if (!terms || !device || device.kind === 'matched-block' || !isFeedbackStage(stage.stage)) {
    return [lastStep(scope, 'what comes DC-coupled from the stages in front', '—', offset)];
  }
  return [
    step('noise gain at DC', 'resistors, couplings open', num(terms.noiseGain)),
    ...(terms.carriedV === 0 ? [] : [step('carried from the stages in front', 'DC-coupled', num(terms.carriedV, 'V'))]),
    sumStep(scope, device, stage.stage, terms),
  ];
}

/** Vos·NG + Ib·Rp·NG + Ib−·Rf + what is carried. */
function sumStep(scope: StageScope, device: AmplifierDevice, set: FeedbackStage, terms: DcTerms): WorkingStep {
  const { noiseGain, plusOhm, carriedV } = terms;
  const size = (sheet: DatasheetValue | undefined): number =>
    Math.abs(upperWorst(sheet, scope.facts.gbwCase)?.value ?? 0);
  const offset = size(device.inputOffsetVoltageV);
  const plus = size(device.inputBiasCurrentA);
  const minus = device.kind === 'current-feedback' ? size(device.invertingBiasCurrentA) : plus;
  const rf = set.feedbackOhm;
  const substituted =
    `${num(offset, 'V')} · ${num(noiseGain)} + ${num(plus, 'A')} · ${num(plusOhm, 'Ω')} · ${num(noiseGain)} + ` +
    `${num(minus, 'A')} · ${num(rf, 'Ω')} + ${num(carriedV, 'V')}`;
  const value = offset * noiseGain + plus * plusOhm * noiseGain + minus * rf + carriedV;
  return lastStep(scope, 'Vos·NG + Ib·Rp·NG + Ib−·Rf + carried', substituted, value);
}

function offsetData(scope: StageScope): readonly WorkingDatum[] {
  const { device } = scope.stage;
  if (!device || device.kind === 'matched-block') return [];
  const used = (sheet: DatasheetValue | undefined): UsedValue | null => upperWorst(sheet, scope.facts.gbwCase);
  return [
    ...deviceDatum(scope.stage, 'Vos', used(device.inputOffsetVoltageV), 'V'),
    ...deviceDatum(scope.stage, 'Ib', used(device.inputBiasCurrentA), 'A'),
    ...(device.kind === 'current-feedback'
      ? deviceDatum(scope.stage, 'Ib of the inverting input', used(device.invertingBiasCurrentA), 'A')
      : []),
    ...networkData(scope.stage),
  ];
}
