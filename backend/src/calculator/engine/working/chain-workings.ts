import type { Maybe } from '../analysis';
import { worstHeadroom, worstHeadroomStage } from '../report/derived';
import { chainGainUnit } from '../report/chain-figures';
import { ratioToDb } from '../report/maybe';
import { setFrequency } from '../text/phrases';
import type { ChainProbe } from '../chain/probe';
import { bandData, derivedDatum, policyDatum, terminalData } from './data';
import { sameTurn } from './gain-workings';
import { peakLevel } from './level-workings';
import { complexText, lastStep, magnitude, num, probeAt, step } from './scope';
import type { ChainScope, Draft } from './scope';
import {
  CASCADE_SOURCE,
  CLOSED_LOOP_SOURCE,
  COMMON_PRACTICE,
  FEEDBACK_SOURCE,
  LINEAR_NETWORK,
  NETWORK_SOURCE,
  RISE_TIME_SOURCE,
  SMALL_SIGNAL,
} from './sources';

const HALF_POWER_DB = 10 * Math.log10(2);
const RISE_TIME_PRODUCT = 0.35;

/** How the gain basis turns V_load/E into the gain shown. */
interface Basis {
  readonly formula: string;
  readonly substitute: (probe: ChainProbe) => string;
  readonly value: (probe: ChainProbe) => number;
}

function basisOf(scope: ChainScope): Basis {
  const { gainBasis, source, load } = scope.facts.input.specification;
  if (gainBasis === 'transducer') {
    const ratio = (4 * source.resistanceOhm) / (load.resistanceOhm ?? Number.POSITIVE_INFINITY);
    return {
      formula: '20·lg|V load/E| + 10·lg(4·Rs/RL)',
      substitute: (probe) => `20·lg ${num(magnitude(probe.gain))} + 10·lg ${num(ratio)}`,
      value: (probe) => ratioToDb(magnitude(probe.gain)) + 10 * Math.log10(ratio),
    };
  }
  if (gainBasis === 'transimpedance') {
    return {
      formula: '20·lg(|V load/E| · |Z source|)',
      substitute: (probe) => `20·lg(${num(magnitude(probe.gain))} · ${num(magnitude(probe.sourceImpedance), 'Ω')})`,
      value: (probe) => ratioToDb(magnitude(probe.gain) * magnitude(probe.sourceImpedance)),
    };
  }
  return {
    formula: '20·lg|V load/E|',
    substitute: (probe) => `20·lg ${num(magnitude(probe.gain))}`,
    value: (probe) => ratioToDb(magnitude(probe.gain)),
  };
}

/** Gain of the chain at a frequency of the band. */
export function chainGainWorking(scope: ChainScope, frequencyHz: number): Draft {
  const basis = basisOf(scope);
  const probe = scope.figure.value === null ? null : probeAt(scope, frequencyHz);
  return {
    title: `Gain of the chain at ${setFrequency(frequencyHz)}`,
    steps: [
      ...(probe
        ? [
            step(
              'V load/E',
              `all stages at ${setFrequency(frequencyHz)}`,
              `${complexText(probe.gain)}, size ${num(magnitude(probe.gain))}`,
            ),
          ]
        : []),
      lastStep(scope, basis.formula, probe ? basis.substitute(probe) : '—', probe ? basis.value(probe) : null),
    ],
    data: [...bandData(scope.facts), ...terminalData(scope.facts), ...stageGains(scope)],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

function stageGains(scope: ChainScope): Draft['data'] {
  return scope.facts.stages.flatMap((stage) => {
    const gain = stage.analysis.gainOperatingDb;
    return derivedDatum(
      `gain of ${stage.label} at the operating frequency`,
      gain.value === null ? gain.reason : `${num(gain.value)} dB`,
    );
  });
}

/** Ideal gain of the chain: the stages' ideal gains from node to node, in the chain's basis. */
export function chainIdealWorking(scope: ChainScope): Draft {
  const ideal = scope.facts.stages.map((stage) => stage.analysis.idealGainDb.value);
  const isKnown = scope.figure.value !== null && ideal.every((value) => value !== null);
  const sum = ideal.reduce<number>((total, value) => total + (value ?? 0), 0);
  const total = scope.facts.chain.idealGainDb.value;
  const correction = isKnown && total !== null ? total - sum : 0;
  const terms = ideal.map((value) => num(value ?? 0));
  if (Math.abs(correction) > 5e-4) terms.push(`${num(correction)} (basis and source)`);
  return {
    title: 'Ideal gain of the chain',
    steps: [
      lastStep(
        scope,
        'Σ of the ideal gains from node to node',
        isKnown ? terms.join(' + ') : '—',
        isKnown ? sum + correction : null,
      ),
    ],
    data: [
      ...terminalData(scope.facts),
      ...scope.facts.stages.flatMap((stage, index) => {
        const value = ideal[index];
        return derivedDatum(`ideal gain of ${stage.label}`, value === null ? 'not known' : `${num(value)} dB`);
      }),
    ],
    assumptions: ['Ideal amplifiers, coupling shorted, shunt capacitances removed.'],
    validity: [SMALL_SIGNAL],
    source: NETWORK_SOURCE,
  };
}

/** One figure minus another in dB. */
export function differenceWorking(
  scope: ChainScope,
  title: string,
  names: readonly [string, string],
  values: readonly [Maybe, Maybe],
): Draft {
  const [a, b] = values;
  const both = a.value !== null && b.value !== null;
  const text = (value: Maybe): string =>
    value.value === null ? value.reason : `${num(value.value)} ${chainGainUnit(scope.facts)}`;
  return {
    title,
    steps: [
      lastStep(
        scope,
        `${names[0]} − ${names[1]}`,
        both ? `${text(a)} − (${text(b)})` : '—',
        both ? (a.value ?? 0) - (b.value ?? 0) : null,
      ),
    ],
    data: [...derivedDatum(names[0], text(a)), ...derivedDatum(names[1], text(b))],
    validity: [SMALL_SIGNAL],
    source: CLOSED_LOOP_SOURCE,
  };
}

/** Largest minus smallest gain over the band. */
export function flatnessWorking(scope: ChainScope): Draft {
  const { chain } = scope.facts;
  const { band } = scope.facts.input.specification;
  const flatness = chain.flatnessDb.value;
  const ideal = chain.idealGainDb.value;
  const droop = chain.worstDroopDb.value;
  const lowest = ideal !== null && droop !== null ? ideal + droop : null;
  const highest = lowest !== null && flatness !== null ? lowest + flatness : null;
  const isKnown = lowest !== null && highest !== null;
  return {
    title: `Flatness from ${setFrequency(band.lowHz)} to ${setFrequency(band.highHz)}`,
    steps: [
      step(
        'lowest gain in the band',
        isKnown ? `at ${num(chain.worstDroopHz, 'Hz')}` : '—',
        isKnown ? `${num(lowest)} dB` : '—',
      ),
      lastStep(
        scope,
        'highest − lowest gain on the band grid, refined at the extremes',
        isKnown ? `${num(highest)} dB − ${num(lowest)} dB` : '—',
        isKnown ? highest - lowest : flatness,
      ),
    ],
    data: [
      ...bandData(scope.facts),
      ...gainDatum('gain at the bottom of the band', chain.gainLowDb),
      ...gainDatum('gain at the operating frequency', chain.gainOperatingDb),
      ...gainDatum('gain at the top of the band', chain.gainHighDb),
    ],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

function gainDatum(label: string, gain: Maybe): Draft['data'] {
  return derivedDatum(label, gain.value === null ? gain.reason : `${num(gain.value)} dB`);
}

/** Most negative gain over ideal in the band. */
export function worstDroopWorking(scope: ChainScope): Draft {
  const { chain } = scope.facts;
  const ideal = chain.idealGainDb.value;
  const isKnown = chain.worstDroopDb.value !== null && ideal !== null;
  const gain = isKnown ? basisOf(scope).value(probeAt(scope, chain.worstDroopHz)) : 0;
  return {
    title: 'Worst droop in the band',
    steps: [
      lastStep(
        scope,
        'lowest gain − ideal gain',
        isKnown ? `${num(gain)} dB at ${num(chain.worstDroopHz, 'Hz')} − ${num(ideal)} dB` : '—',
        isKnown ? gain - ideal : null,
      ),
    ],
    data: [...bandData(scope.facts), ...gainDatum('ideal gain', chain.idealGainDb)],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

/** Exact corner of the chain. */
export function chainCornerWorking(scope: ChainScope, side: 'upper' | 'lower'): Draft {
  const { chain } = scope.facts;
  const corner = side === 'upper' ? chain.cornerUpperHz.value : chain.cornerLowerHz.value;
  const ideal = chain.idealGainDb.value;
  const isKnown = corner !== null && corner > 0 && ideal !== null;
  return {
    title: `${side === 'upper' ? 'Upper' : 'Lower'} corner of the chain`,
    steps: isKnown
      ? [
          step(
            'gain = ideal gain − 3.0103 dB (half power)',
            `at ${num(corner, 'Hz')}: ${num(basisOf(scope).value(probeAt(scope, corner)))} dB; ideal ${num(ideal)} dB`,
            `${num(ideal - HALF_POWER_DB)} dB`,
          ),
          lastStep(scope, 'the frequency found', num(corner, 'Hz'), corner),
        ]
      : [lastStep(scope, '|H|² = ½·|H ideal|²', '—', corner)],
    data: [
      ...bandData(scope.facts),
      ...scope.facts.stages.flatMap((stage) => {
        const own = side === 'upper' ? stage.analysis.cornerUpperHz : stage.analysis.cornerLowerHz;
        return derivedDatum(`corner of ${stage.label}`, own.value === null ? own.reason : num(own.value, 'Hz'));
      }),
    ],
    assumptions: chain.operatingBeyondCorner
      ? ['Searched downwards: the operating frequency is beyond the corner.']
      : [],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

/** Chain corner over the lowest stage corner. */
export function shrinkageWorking(scope: ChainScope): Draft {
  const corner = scope.facts.chain.cornerUpperHz.value;
  const corners = scope.facts.stages
    .map((stage) => stage.analysis.cornerUpperHz.value)
    .filter((value) => value !== null);
  const isKnown = scope.figure.value !== null && corner !== null && corners.length > 0;
  const lowest = isKnown ? Math.min(...corners) : 1;
  return {
    title: 'Shrinkage of the cascade',
    steps: [
      lastStep(
        scope,
        'corner of the chain / lowest corner of a stage',
        isKnown ? `${num(corner, 'Hz')} / ${num(lowest, 'Hz')}` : '—',
        isKnown ? corner / lowest : null,
      ),
    ],
    data: scope.facts.stages.flatMap((stage) =>
      derivedDatum(
        `corner of ${stage.label}`,
        stage.analysis.cornerUpperHz.value === null ? 'none' : num(stage.analysis.cornerUpperHz.value, 'Hz'),
      ),
    ),
    assumptions: ['For comparison: n equal poles shrink to √(2^(1/n) − 1).'],
    source: CASCADE_SOURCE,
  };
}

/** Phase of the whole chain at the operating frequency. */
export function chainPhaseWorking(scope: ChainScope): Draft {
  const { operatingHz } = scope.facts.input.specification.band;
  const probe = probeAt(scope, operatingHz);
  const z = probe.sourceImpedance;
  const isTransimpedance = scope.facts.input.specification.gainBasis === 'transimpedance';
  const source = isTransimpedance ? Math.atan2(z.im, z.re) : 0;
  const raw = ((Math.atan2(probe.gain.im, probe.gain.re) + source) * 180) / Math.PI;
  return {
    title: `Phase of the chain at ${setFrequency(operatingHz)}`,
    steps: [
      lastStep(
        scope,
        isTransimpedance ? '∠(V load/I)' : '∠(V load/E)',
        `${num(raw)}° (whole turns taken out)`,
        scope.figure.value === null ? null : sameTurn(raw, scope.figure.value),
      ),
    ],
    data: bandData(scope.facts),
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

/** −dφ/dω at the operating frequency. */
export function groupDelayWorking(scope: ChainScope): Draft {
  const value = scope.figure.value;
  return {
    title: 'Group delay of the chain',
    steps: [
      lastStep(
        scope,
        '−dφ/dω',
        value === null
          ? '—'
          : `slope of the phase at ${setFrequency(scope.facts.input.specification.band.operatingHz)}`,
        value,
      ),
    ],
    data: bandData(scope.facts),
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

/** 10–90 % rise time of the chain. */
export function chainRiseTimeWorking(scope: ChainScope): Draft {
  const corner = scope.facts.chain.cornerUpperHz.value;
  return {
    title: 'Rise time of the chain',
    steps: [
      lastStep(
        scope,
        '0.35 / corner',
        corner === null ? '—' : `0.35 / ${num(corner, 'Hz')}`,
        corner === null ? null : RISE_TIME_PRODUCT / corner,
      ),
    ],
    data: derivedDatum('upper corner', corner === null ? 'not known' : num(corner, 'Hz')),
    assumptions: ['One pole (exactly ln 9/2π = 0.3497).'],
    validity: [SMALL_SIGNAL],
    source: RISE_TIME_SOURCE,
  };
}

/** The smallest headroom of all stages. */
export function worstHeadroomWorking(scope: ChainScope): Draft {
  const worst = worstHeadroomStage(scope.facts);
  const values = scope.facts.stages
    .filter((stage) => stage.stage.kind === 'voltage-feedback')
    .map((stage) => ({ stage, at: worstHeadroom(scope.facts, stage) }));
  const text = (value: number | null): string => (value === null ? 'not known' : `×${num(value)}`);
  return {
    title: 'Worst headroom of the chain',
    steps: [
      lastStep(
        scope,
        'smallest of the stages',
        values.map(({ stage, at }) => `${stage.label} ${text(at.headroom.value)}`).join(', ') || '—',
        worst ? worstHeadroom(scope.facts, worst).headroom.value : null,
      ),
    ],
    data: [
      ...values.flatMap(({ stage, at }) =>
        derivedDatum(`${stage.label} at ${setFrequency(at.atHz)}`, text(at.headroom.value)),
      ),
      ...policyDatum('headroom target', `×${num(scope.facts.policy.headroomTarget)}`),
    ],
    source: CLOSED_LOOP_SOURCE,
  };
}

/** DC at the load. */
export function chainOffsetWorking(scope: ChainScope): Draft {
  const value = scope.figure.value;
  return {
    title: 'Output offset of the chain',
    steps: [
      lastStep(
        scope,
        'offset of the last amplifier, divided by isolation and load',
        value === null ? '—' : 'worst case, sizes added',
        value,
      ),
    ],
    data: scope.facts.stages.flatMap((stage) => {
      const { outputOffsetV } = stage.analysis;
      return derivedDatum(
        `offset of ${stage.label}`,
        outputOffsetV.value === null ? outputOffsetV.reason : num(outputOffsetV.value, 'V'),
      );
    }),
    assumptions: ['A coupling capacitor stops the DC of everything in front of it.'],
    source: FEEDBACK_SOURCE,
  };
}

/** Peak voltage at the load. */
export function chainLevelWorking(scope: ChainScope): Draft {
  const level = peakLevel(scope.facts.input.specification.source);
  const peak = scope.figure.value;
  const ratio = peak === null || !level.value ? null : peak / level.value;
  const unit = level.unit === 'A' ? 'Ω' : null;
  return {
    title: 'Output level of the chain',
    steps: [
      step(level.formula, level.substituted, level.value === null ? '—' : num(level.value, level.unit)),
      lastStep(
        scope,
        'V peak = level · ideal gain to the load',
        ratio === null || level.value === null ? '—' : `${num(level.value, level.unit)} · ${num(ratio, unit)}`,
        ratio === null || level.value === null ? peak : level.value * ratio,
      ),
    ],
    data: [...level.data, ...terminalData(scope.facts)],
    assumptions: ['Largest input, ideal gain.'],
    source: COMMON_PRACTICE,
  };
}
