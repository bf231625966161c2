import { sourcePeak } from '../chain/levels';
import { headroomNegativeFor, headroomPositiveFor } from '../devices/amplifier-values';
import { outputCurrentAvailable } from '../report/derived';
import { fullLabel, isFeedbackStage } from '../report/facts';
import type { ChainFacts } from '../report/facts';
import type { WorkingDatum, WorkingStep } from '../report';
import type { Source } from '../types';
import { derivedDatum, deviceDatum, networkData, specified } from './data';
import { lastStep, num, step } from './scope';
import type { Draft, StageScope } from './scope';
import { COMMON_PRACTICE, DATASHEET_CONDITIONS, NETWORK_SOURCE } from './sources';

/** The source's peak EMF (or peak current) at its largest level, with the formula that reads the level. */
export interface PeakLevel {
  readonly formula: string;
  readonly substituted: string;
  readonly value: number | null;
  readonly unit: 'V' | 'A';
  readonly data: readonly WorkingDatum[];
}

/** Reads the largest level of a source as a peak value. */
export function peakLevel(source: Source): PeakLevel {
  const level = source.largestLevel;
  if (level === undefined)
    return { formula: 'no largest level set', substituted: '—', value: null, unit: 'V', data: [] };
  const value = sourcePeak(source, level);
  if (source.kind === 'current') {
    return {
      formula: 'I peak',
      substituted: num(level, 'A'),
      value,
      unit: 'A',
      data: specified('largest level', level, 'A'),
    };
  }
  if (source.levelKind === 'available-power') return powerLevel(source.resistanceOhm, level, value);
  const isPeak = source.levelKind === 'peak-emf';
  return {
    formula: isPeak ? 'E peak' : 'E peak = √2·E rms',
    substituted: isPeak ? num(level, 'V') : `√2 · ${num(level, 'V')}`,
    value,
    unit: 'V',
    data: specified(`largest level, ${isPeak ? 'peak' : 'rms'} EMF`, level, 'V'),
  };
}

function powerLevel(resistanceOhm: number, levelDbm: number, value: number): PeakLevel {
  return {
    formula: 'E peak = √(8·Rs·P)',
    substituted: `√(8 · ${num(resistanceOhm, 'Ω')} · ${num(1e-3 * 10 ** (levelDbm / 10), 'W')})`,
    value,
    unit: 'V',
    data: [
      {
        label: 'largest level, available power',
        value: `${num(levelDbm)} dBm`,
        origin: 'specification',
        assumed: false,
      },
    ],
  };
}

/** Peak voltage at the amplifier's own output. */
export function outputLevelWorking(scope: StageScope): Draft {
  const level = peakLevel(scope.facts.input.specification.source);
  const peak = scope.stage.analysis.outputPeakV.value;
  const ratio = peak === null || !level.value ? null : peak / level.value;
  const unit = level.unit === 'A' ? 'Ω' : null;
  return {
    title: `Output level of ${fullLabel(scope.stage)}`,
    steps: [
      step(level.formula, level.substituted, level.value === null ? '—' : num(level.value, level.unit)),
      step(
        'ideal gain g from the source to the output pin',
        'product of the ideal stages with their loading',
        ratio === null ? '—' : num(ratio, unit),
      ),
      lastStep(
        scope,
        'V peak = level · g',
        ratio === null || level.value === null ? '—' : `${num(level.value, level.unit)} · ${num(ratio, unit)}`,
        ratio === null || level.value === null ? peak : level.value * ratio,
      ),
    ],
    data: [...level.data, ...networkData(scope.stage)],
    assumptions: ['Largest input, ideal gain: droop would hide clipping. In front of the isolation resistor.'],
    source: NETWORK_SOURCE,
  };
}

/** Peak swing that rails, device and offset leave. */
export function swingAvailableWorking(scope: StageScope): Draft {
  const { supply } = scope.facts.input.specification;
  return {
    title: `Swing available in ${fullLabel(scope.stage)}`,
    steps: swingSteps(scope),
    data: [
      ...specified('positive rail', supply.positiveV, 'V'),
      ...specified('negative rail', supply.negativeV, 'V'),
      ...swingData(scope),
    ],
    assumptions: supply.negativeV === 0 ? ['On a single supply the output rests at half of it.'] : [],
    validity: [DATASHEET_CONDITIONS],
    source: COMMON_PRACTICE,
  };
}

function swingSteps(scope: StageScope): readonly WorkingStep[] {
  const { device, analysis } = scope.stage;
  const { supply } = scope.facts.input.specification;
  if (!device || device.kind === 'matched-block' || analysis.swingAvailableV.value === null) {
    return [lastStep(scope, 'smaller way to a rail − offset', '—', null)];
  }
  const above = headroomPositiveFor(device)?.value ?? 0;
  const below = headroomNegativeFor(device)?.value ?? 0;
  const restV = supply.negativeV === 0 ? supply.positiveV / 2 : 0;
  const up = supply.positiveV - above - restV;
  const down = restV - supply.negativeV - below;
  const offset = analysis.outputOffsetV.value ?? 0;
  const rest = num(restV, 'V');
  return [
    step('way up', `${num(supply.positiveV, 'V')} − ${num(above, 'V')} − ${rest}`, num(up, 'V')),
    step('way down', `${rest} − (${num(supply.negativeV, 'V')}) − ${num(below, 'V')}`, num(down, 'V')),
    lastStep(
      scope,
      'smaller way − offset',
      `${num(Math.min(up, down), 'V')} − ${num(offset, 'V')}`,
      Math.min(up, down) - offset,
    ),
  ];
}

function swingData(scope: StageScope): readonly WorkingDatum[] {
  const { device, analysis } = scope.stage;
  if (!device || device.kind === 'matched-block') return [];
  const { outputOffsetV } = analysis;
  return [
    ...deviceDatum(scope.stage, 'distance from the positive rail', headroomPositiveFor(device), 'V'),
    ...deviceDatum(scope.stage, 'distance from the negative rail', headroomNegativeFor(device), 'V'),
    outputOffsetV.value === null
      ? { label: 'output offset', value: '0 V', origin: outputOffsetV.reason, assumed: true }
      : {
          label: 'output offset',
          value: num(outputOffsetV.value, 'V'),
          origin: 'calculated; has its own working',
          assumed: false,
        },
  ];
}

/** Peak current out of the amplifier. */
export function outputCurrentWorking(scope: StageScope): Draft {
  const { outputPeakV, outputCurrentPeakA } = scope.stage.analysis;
  const peak = outputPeakV.value;
  const current = outputCurrentPeakA.value;
  const seenOhm = peak === null || !current ? null : peak / current;
  return {
    title: `Output current of ${fullLabel(scope.stage)}`,
    steps: [
      step(
        'R seen by the output: feedback in parallel with the load',
        isolationText(scope),
        seenOhm === null ? '—' : num(seenOhm, 'Ω'),
      ),
      lastStep(
        scope,
        'V peak / R',
        seenOhm === null || peak === null ? '—' : `${num(peak, 'V')} / ${num(seenOhm, 'Ω')}`,
        seenOhm === null || peak === null ? current : peak / seenOhm,
      ),
    ],
    data: [
      ...derivedDatum('output level', peak === null ? 'not known' : num(peak, 'V')),
      ...networkData(scope.stage),
      ...loadDatum(scope.facts, scope),
    ],
    assumptions: ['Largest input, ideal gain.'],
    source: NETWORK_SOURCE,
  };
}

function isolationText(scope: StageScope): string {
  const set = scope.stage.stage;
  return isFeedbackStage(set) && set.isolationOhm
    ? 'isolation resistor and what follows, with the feedback'
    : 'what follows, with the feedback';
}

function loadDatum(facts: ChainFacts, scope: StageScope): readonly WorkingDatum[] {
  const isLast = scope.stage.index === facts.stages.length - 1;
  return isLast ? specified('load resistance', facts.input.specification.load.resistanceOhm, 'Ω') : [];
}

/** Output current that the device gives. */
export function currentHave(scope: StageScope): number | null {
  return outputCurrentAvailable(scope.stage).value;
}
