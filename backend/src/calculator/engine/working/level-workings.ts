import { headroomNegativeFor, headroomPositiveFor } from '../devices/amplifier-values';
import { outputCurrentAvailable, slewAvailable } from '../report/derived';
import { fullLabel, isFeedbackStage } from '../report/facts';
import type { ChainFacts } from '../report/facts';
import type { WorkingDatum } from '../report';
import type { Source } from '../types';
import { setFrequency } from '../text/phrases';
import { bandData, derivedDatum, deviceDatum, networkData, policyDatum, specified } from './data';
import { usedFormula } from './gbw-workings';
import { lastStep, num, step } from './scope';
import type { Draft, StageScope } from './scope';
import { COMMON_PRACTICE, DATASHEET_CONDITIONS, FEEDBACK_SOURCE, NETWORK_SOURCE, SLEW_SOURCE } from './sources';

/** The source's peak EMF (or peak current) at its largest level, with the formula that reads the level. */
export interface PeakLevel {
  readonly formula: string;
  readonly substituted: string;
  readonly value: number | null;
  readonly unit: 'V' | 'A';
  readonly data: readonly WorkingDatum[];
}

/** Reads the largest level of a source as a peak value; the nominal one stands in where no largest is set. */
export function peakLevel(source: Source): PeakLevel {
  const level = source.largestLevel ?? source.nominalLevel;
  if (level === undefined) return { formula: 'no level set', substituted: '—', value: null, unit: 'V', data: [] };
  if (source.kind === 'current') {
    return {
      formula: 'I peak',
      substituted: num(level, 'A'),
      value: level,
      unit: 'A',
      data: specified('largest level', level, 'A'),
    };
  }
  switch (source.levelKind) {
    case 'peak-emf':
      return {
        formula: 'E peak',
        substituted: num(level, 'V'),
        value: level,
        unit: 'V',
        data: specified('largest level, peak EMF', level, 'V'),
      };
    case 'rms-emf':
      return {
        formula: 'E peak = √2·E rms',
        substituted: `√2 · ${num(level, 'V')}`,
        value: Math.SQRT2 * level,
        unit: 'V',
        data: specified('largest level, rms EMF', level, 'V'),
      };
    default: {
      const watt = 1e-3 * 10 ** (level / 10);
      return {
        formula: 'E peak = √(8·Rs·P)',
        substituted: `√(8 · ${num(source.resistanceOhm, 'Ω')} · ${num(watt, 'W')})`,
        value: Math.sqrt(8 * source.resistanceOhm * watt),
        unit: 'V',
        data: [
          {
            label: 'largest level, available power',
            value: `${num(level)} dBm`,
            origin: 'specification',
            assumed: false,
          },
        ],
      };
    }
  }
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
  const { device, analysis } = scope.stage;
  const { supply } = scope.facts.input.specification;
  const title = `Swing available in ${fullLabel(scope.stage)}`;
  const available = analysis.swingAvailableV.value;
  if (!device || device.kind === 'matched-block' || available === null) {
    return { title, steps: [lastStep(scope, 'not known', '—', null)], data: [], source: COMMON_PRACTICE };
  }
  const positive = headroomPositiveFor(device);
  const negative = headroomNegativeFor(device);
  const up = supply.positiveV - (positive?.value ?? 0);
  const down = supply.negativeV + (negative?.value ?? 0);
  return {
    title,
    steps: [
      step('highest output', `${num(supply.positiveV, 'V')} − ${num(positive?.value ?? 0, 'V')}`, num(up, 'V')),
      step('lowest output', `${num(supply.negativeV, 'V')} + ${num(negative?.value ?? 0, 'V')}`, num(down, 'V')),
      step(
        'DC taken off: how far the output rests from the middle',
        'offset or bias point',
        num((up - down) / 2 - available, 'V'),
      ),
      lastStep(
        scope,
        '(highest − lowest)/2 − DC',
        `(${num(up, 'V')} − (${num(down, 'V')}))/2 − ${num((up - down) / 2 - available, 'V')}`,
        available,
      ),
    ],
    data: [
      ...specified('positive rail', supply.positiveV, 'V'),
      ...specified('negative rail', supply.negativeV, 'V'),
      ...deviceDatum(scope.stage, 'distance from the positive rail', positive, 'V'),
      ...deviceDatum(scope.stage, 'distance from the negative rail', negative, 'V'),
      ...derivedDatum(
        'output offset',
        analysis.outputOffsetV.value === null ? analysis.outputOffsetV.reason : num(analysis.outputOffsetV.value, 'V'),
      ),
    ],
    validity: [DATASHEET_CONDITIONS],
    source: COMMON_PRACTICE,
  };
}

/** Have ÷ need of a level. */
export function ratioWorking(
  scope: StageScope,
  what: {
    title: string;
    formula: string;
    have: number | null;
    need: number | null;
    unit: 'V' | 'A' | 'V/s';
    target: string;
  },
): Draft {
  const { have, need, unit } = what;
  const both = have !== null && need !== null && need !== 0;
  return {
    title: `${what.title} of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(scope, what.formula, both ? `${num(have, unit)} / ${num(need, unit)}` : '—', both ? have / need : null),
    ],
    data: [
      ...derivedDatum('have', have === null ? 'not known' : num(have, unit)),
      ...derivedDatum('need', need === null ? 'not known' : num(need, unit)),
      ...policyDatum('margin', what.target),
    ],
    validity: [DATASHEET_CONDITIONS],
    source: COMMON_PRACTICE,
  };
}

/** Slew rate of a sine. */
export function slewNeededWorking(scope: StageScope): Draft {
  const { highHz } = scope.facts.input.specification.band;
  const peak = scope.stage.analysis.outputPeakV.value;
  return {
    title: `Slew rate needed by ${fullLabel(scope.stage)} at ${setFrequency(highHz)}`,
    steps: [
      lastStep(
        scope,
        '2π·f·V peak',
        peak === null ? '—' : `2π · ${num(highHz, 'Hz')} · ${num(peak, 'V')}`,
        peak === null ? null : 2 * Math.PI * highHz * peak,
      ),
    ],
    data: [...bandData(scope.facts), ...derivedDatum('output level', peak === null ? 'not known' : num(peak, 'V'))],
    assumptions: ['A sine of the largest level at the top of the band, ideal gain.'],
    source: SLEW_SOURCE,
  };
}

/** The device's slew rate as judged. */
export function slewAvailableWorking(scope: StageScope): Draft {
  const used = scope.stage.analysis.slewAvailable;
  const title = `Slew rate of ${fullLabel(scope.stage)}`;
  if (!used) return { title, steps: [lastStep(scope, 'not known', '—', null)], data: [], source: SLEW_SOURCE };
  const { formula, substituted } = usedFormula({ ...used, value: used.value / 1e6 }, 'slew rate');
  return {
    title,
    steps: [lastStep(scope, formula, `${substituted} V/µs`, used.value)],
    data: [
      ...deviceDatum(scope.stage, 'slew rate', used, 'V/s'),
      ...(used.basis === 'typ-derated' ? policyDatum('slew derating', num(scope.facts.policy.slewDerating)) : []),
    ],
    assumptions:
      used.basis === 'typ-derated' ? ['The datasheet gives no minimum: typical × derating, common practice.'] : [],
    validity: [DATASHEET_CONDITIONS],
    source: COMMON_PRACTICE,
  };
}

/** Highest frequency of a full sine at this level. */
export function fullPowerWorking(scope: StageScope): Draft {
  const have = slewAvailable(scope.stage).value;
  const peak = scope.stage.analysis.outputPeakV.value;
  const both = have !== null && peak !== null && peak !== 0;
  return {
    title: `Full-power bandwidth of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(
        scope,
        'SR / (2π·V peak)',
        both ? `${num(have, 'V/s')} / (2π · ${num(peak, 'V')})` : '—',
        both ? have / (2 * Math.PI * peak) : null,
      ),
    ],
    data: [
      ...deviceDatum(scope.stage, 'slew rate', scope.stage.analysis.slewAvailable, 'V/s'),
      ...derivedDatum('output level', peak === null ? 'not known' : num(peak, 'V')),
    ],
    source: SLEW_SOURCE,
  };
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

/** DC at the amplifier's output. */
export function outputOffsetWorking(scope: StageScope): Draft {
  const { device, analysis } = scope.stage;
  const offset = analysis.outputOffsetV.value;
  const isAmplifier = device !== null && device.kind !== 'matched-block';
  return {
    title: `Output offset of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(
        scope,
        'Vos·NG(0) + bias currents × resistances × their gain, plus what comes DC-coupled from the stages in front',
        offset === null ? '—' : 'worst case, sizes added',
        offset,
      ),
    ],
    data: isAmplifier ? offsetData(scope) : [],
    assumptions: ['A coupling capacitor stops the DC of everything in front of it.'],
    validity: [DATASHEET_CONDITIONS],
    source: FEEDBACK_SOURCE,
  };
}

function offsetData(scope: StageScope): readonly WorkingDatum[] {
  const { device } = scope.stage;
  if (!device || device.kind === 'matched-block') return [];
  const offset = device.inputOffsetVoltageV;
  const bias = device.inputBiasCurrentA;
  const column = (value: { max?: number; typ?: number; min?: number }): number =>
    value.max ?? value.typ ?? value.min ?? 0;
  return [
    ...(offset
      ? [
          {
            label: 'Vos',
            value: num(column(offset), 'V'),
            origin: `${device.partNumber}, datasheet`,
            assumed: false,
            page: offset.page,
          },
        ]
      : []),
    ...(bias
      ? [
          {
            label: 'Ib',
            value: num(column(bias), 'A'),
            origin: `${device.partNumber}, datasheet`,
            assumed: false,
            page: bias.page,
          },
        ]
      : []),
    ...networkData(scope.stage),
  ];
}
