import { worstHeadroom, worstHeadroomStage } from '../report/derived';
import { setFrequency } from '../text/phrases';
import { bandData, derivedDatum, policyDatum, terminalData } from './data';
import { sameTurn } from './gain-workings';
import { peakLevel } from './level-workings';
import { lastStep, num, probeAt, step } from './scope';
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

import { basisOf } from './chain-gain-workings';

const HALF_POWER_DB = 10 * Math.log10(2);
const RISE_TIME_PRODUCT = 0.35;

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
