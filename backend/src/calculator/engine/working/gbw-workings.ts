import type { UsedValue } from '../analysis';
import { currentFeedbackSecondPole } from '../devices/second-pole';
import { invertingInputResistanceFor } from '../devices/amplifier-values';
import { gbwMaybe, gbwUsed, worstHeadroom } from '../report/derived';
import { fullLabel, isFeedbackStage } from '../report/facts';
import type { StageFacts } from '../report/facts';
import type { Unit, WorkingStep } from '../report';
import { setFrequency } from '../text/phrases';
import { bandData, derivedDatum, deviceDatum, networkData, policyDatum, referenceCircuitData } from './data';
import { complexText, lastStep, magnitude, num, probeAt, step } from './scope';
import type { Draft, StageScope } from './scope';
import {
  CLOSED_LOOP_SOURCE,
  COMMON_PRACTICE,
  CURRENT_FEEDBACK_SOURCE,
  DATASHEET_CONDITIONS,
  FEEDBACK_SOURCE,
} from './sources';

/** Midband, resistive noise gain. */
export function noiseGainWorking(scope: StageScope): Draft {
  return {
    title: `Noise gain of ${fullLabel(scope.stage)}`,
    steps: noiseGainSteps(scope),
    data: networkData(scope.stage),
    assumptions: [
      'Coupling shorted, shunt capacitances removed.',
      'The noise gain, not the signal gain, sets the bandwidth: an inverting −10 has 11.',
    ],
    source: CLOSED_LOOP_SOURCE,
  };
}

function noiseGainSteps(scope: StageScope): readonly WorkingStep[] {
  const { noiseGain } = scope.stage.analysis;
  const set = scope.stage.stage;
  if (!isFeedbackStage(set) || noiseGain === null)
    return [lastStep(scope, 'no feedback around an amplifier', '—', null)];
  const rf = set.feedbackOhm;
  const rg = set.gainOhm ?? 0;
  if (set.topology === 'follower' || (set.topology === 'non-inverting' && rg === 0))
    return [lastStep(scope, '1', '1', 1)];
  if (set.topology === 'non-inverting') {
    return [lastStep(scope, '1 + Rf/Rg', `1 + ${num(rf, 'Ω')} / ${num(rg, 'Ω')}`, 1 + rf / rg)];
  }
  const frontOhm = Math.max(0, rf / (noiseGain - 1) - rg);
  return [
    step('resistance in front of the stage, Rs', 'source or stage in front, with its termination', num(frontOhm, 'Ω')),
    lastStep(
      scope,
      '1 + Rf/(Rs + Rg)',
      `1 + ${num(rf, 'Ω')} / (${num(frontOhm, 'Ω')} + ${num(rg, 'Ω')})`,
      1 + rf / (frontOhm + rg),
    ),
  ];
}

/** |noise gain| at a frequency, all capacitances in it. */
export function noiseGainAtWorking(scope: StageScope, frequencyHz: number): Draft {
  const probed = scope.figure.value === null ? null : probeAt(scope, frequencyHz).stages[scope.stage.index].noiseGain;
  return {
    title: `Noise gain of ${fullLabel(scope.stage)} at ${setFrequency(frequencyHz)}`,
    steps: [
      lastStep(
        scope,
        '|m·(1 + Zf·Yg) + Zf·Yd|, with m = 1 + Zp·Yd',
        probed ? `|${complexText(probed)}|` : '—',
        probed ? magnitude(probed) : null,
      ),
    ],
    data: [...bandData(scope.facts), ...networkData(scope.stage)],
    assumptions: [
      'What the open-loop gain must exceed at this frequency; Yd is the capacitance between the input pins.',
    ],
    source: FEEDBACK_SOURCE,
  };
}

/** GBW as used in this case. */
export function gbwHaveWorking(scope: StageScope): Draft {
  const { gbw } = scope.stage.analysis;
  const title = `GBW of ${scope.stage.device?.partNumber ?? fullLabel(scope.stage)}`;
  if (!gbw) return { title, steps: [lastStep(scope, 'none', '—', null)], data: [], source: COMMON_PRACTICE };
  const { formula, substituted } = usedFormula(gbw, 'GBW', 'Hz');
  return {
    title,
    steps: [lastStep(scope, formula, substituted, gbw.value)],
    data: [
      ...deviceDatum(scope.stage, 'GBW', gbw, 'Hz'),
      ...(gbw.basis === 'typ-derated' ? policyDatum('derating', num(scope.facts.policy.gbwDerating)) : []),
    ],
    assumptions:
      gbw.basis === 'typ-derated' ? ['The datasheet gives no minimum: typical × derating, common practice.'] : [],
    validity: [DATASHEET_CONDITIONS],
    source: COMMON_PRACTICE,
  };
}

/** How a device value came from its column. */
export function usedFormula(used: UsedValue, name: string, unit: Unit): { formula: string; substituted: string } {
  const factors = used.text
    .split('×')
    .slice(1)
    .map((part) => Number.parseFloat(part));
  const known = factors.filter((factor) => Number.isFinite(factor) && factor !== 0);
  const base = known.reduce((value, factor) => value / factor, used.value);
  const substituted = [num(base, unit), ...known.map((factor) => num(factor))].join(' × ');
  return { formula: `${name}: ${used.text}`, substituted };
}

/** Noise gain × frequency. */
export function gbwUsedWorking(scope: StageScope, at: 'operating' | 'top' | 'worst'): Draft {
  const { facts, stage } = scope;
  const { band } = facts.input.specification;
  const worst = worstHeadroom(facts, stage).at;
  const where = at === 'worst' ? worst : at;
  const frequencyHz = where === 'operating' ? band.operatingHz : band.highHz;
  const noiseGain = where === 'operating' ? stage.analysis.noiseGainOperating : stage.analysis.noiseGainTop;
  const computed = noiseGain === null ? null : noiseGain * frequencyHz;
  return {
    title: `GBW used by ${fullLabel(stage)} at ${setFrequency(frequencyHz)}`,
    steps: [
      lastStep(
        scope,
        '|NG(j2πf)| · f',
        noiseGain === null ? '—' : `${num(noiseGain)} · ${num(frequencyHz, 'Hz')}`,
        computed,
      ),
    ],
    data: [...derivedDatum('noise gain', noiseGain === null ? 'none' : num(noiseGain)), ...bandData(facts)],
    assumptions:
      at === 'worst'
        ? ['Taken where the headroom is lower: at the operating frequency or at the top of the band.']
        : [],
    source: CLOSED_LOOP_SOURCE,
  };
}

/** Have − used. */
export function gbwLeftWorking(scope: StageScope): Draft {
  const have = gbwMaybe(scope.stage).value;
  const used = gbwUsed(scope.facts, scope.stage, 'worst').value;
  const both = have !== null && used !== null;
  return {
    title: `GBW left in ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(
        scope,
        'GBW − GBW used',
        both ? `${num(have, 'Hz')} − ${num(used, 'Hz')}` : '—',
        both ? have - used : null,
      ),
    ],
    data: [
      ...deviceDatum(scope.stage, 'GBW', scope.stage.analysis.gbw, 'Hz'),
      ...derivedDatum('GBW used', used === null ? 'not known' : num(used, 'Hz')),
    ],
    validity: [DATASHEET_CONDITIONS],
    source: CLOSED_LOOP_SOURCE,
  };
}

/** Have ÷ used. */
export function headroomWorking(scope: StageScope, at: 'operating' | 'top' | 'worst'): Draft {
  const { facts, stage } = scope;
  const { band } = facts.input.specification;
  const where = at === 'worst' ? worstHeadroom(facts, stage).at : at;
  const frequencyHz = where === 'operating' ? band.operatingHz : band.highHz;
  const noiseGain = where === 'operating' ? stage.analysis.noiseGainOperating : stage.analysis.noiseGainTop;
  const have = gbwMaybe(stage).value;
  const both = have !== null && noiseGain !== null;
  return {
    title: `Headroom of ${fullLabel(stage)} at ${setFrequency(frequencyHz)}`,
    steps: [
      lastStep(
        scope,
        'H = GBW / (|NG(j2πf)| · f)',
        both ? `${num(have, 'Hz')} / (${num(noiseGain)} · ${num(frequencyHz, 'Hz')})` : '—',
        both ? have / (noiseGain * frequencyHz) : null,
      ),
    ],
    data: [
      ...deviceDatum(stage, 'GBW', stage.analysis.gbw, 'Hz'),
      ...derivedDatum('noise gain', noiseGain === null ? 'none' : num(noiseGain)),
      ...bandData(facts),
      ...policyDatum('headroom target', `×${num(facts.policy.headroomTarget)}`),
    ],
    assumptions: at === 'worst' ? ['The lower of operating frequency and top of the band; the verdict uses it.'] : [],
    validity: [DATASHEET_CONDITIONS],
    source: CLOSED_LOOP_SOURCE,
  };
}

/** First-order corner: GBW/NG, or K/(2π(Rf + NG·Rb)). */
export function firstOrderWorking(scope: StageScope): Draft {
  const { stage } = scope;
  const { gbw, noiseGain, cornerFirstOrderHz } = stage.analysis;
  const title = `First-order corner of ${fullLabel(stage)}`;
  if (stage.device?.kind === 'current-feedback') return currentFeedbackCorner(scope, title);
  const both = gbw !== null && noiseGain !== null && cornerFirstOrderHz.value !== null;
  return {
    title,
    steps: [
      lastStep(
        scope,
        'fcl = GBW/NG',
        both ? `${num(gbw.value, 'Hz')} / ${num(noiseGain)}` : '—',
        both ? gbw.value / noiseGain : cornerFirstOrderHz.value,
      ),
    ],
    data: [
      ...deviceDatum(stage, 'GBW', gbw, 'Hz'),
      ...derivedDatum('noise gain', noiseGain === null ? 'none' : num(noiseGain)),
    ],
    assumptions: ['One pole, no output resistance, no capacitance: the hand check beside the exact corner.'],
    validity: ['Not used for any verdict.'],
    source: CLOSED_LOOP_SOURCE,
  };
}

function currentFeedbackCorner(scope: StageScope, title: string): Draft {
  const { stage, facts } = scope;
  const { noiseGain, cornerFirstOrderHz } = stage.analysis;
  const { device } = stage;
  const isComplete = device?.kind === 'current-feedback' && stage.stage.kind === 'current-feedback';
  if (
    !isComplete ||
    noiseGain === null ||
    cornerFirstOrderHz.value === null ||
    stage.stage.kind !== 'current-feedback'
  ) {
    return { title, steps: [lastStep(scope, 'not known', '—', null)], data: [], source: CURRENT_FEEDBACK_SOURCE };
  }
  const buffer = invertingInputResistanceFor(device);
  const rf = stage.stage.feedbackOhm;
  const seen = rf + noiseGain * buffer.value;
  const k = cornerFirstOrderHz.value * 2 * Math.PI * seen;
  return {
    title,
    steps: [
      step(
        'K = Z0·ωz, solved so that the whole model is at half power at its reference bandwidth',
        referenceText(scope),
        `${num(k)} Ω·rad/s`,
      ),
      lastStep(
        scope,
        'fcl = K / (2π·(Rf + NG·Rb))',
        `${num(k)} / (2π·(${num(rf, 'Ω')} + ${num(noiseGain)} · ${num(buffer.value, 'Ω')}))`,
        k / (2 * Math.PI * seen),
      ),
    ],
    data: [...referenceCircuitData(facts, stage, device), ...networkData(stage)],
    assumptions: currentFeedbackSecondPole(device).known ? [] : ['No second pole entered: one pole.'],
    validity: ['Current feedback has no GBW; Rf sets the bandwidth.'],
    source: CURRENT_FEEDBACK_SOURCE,
  };
}

function referenceText(scope: { readonly stage: StageFacts }): string {
  const { device } = scope.stage;
  if (device?.kind !== 'current-feedback') return '—';
  return `Rf ${num(device.referenceFeedbackOhm, 'Ω')}, noise gain ${num(device.referenceNoiseGain)}`;
}
