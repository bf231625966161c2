import { worsePoint } from '../report/stage-figures';
import { fullLabel } from '../report/facts';
import { ratioToDb } from '../units';
import type { WorkingStep } from '../report';
import { basisText, setFrequency } from '../text/phrases';
import { bandData, derivedDatum, deviceDatum, loopData, networkData, policyDatum } from './data';
import { stageNodes } from './gain-workings';
import { complexText, lastStep, magnitude, num, probeAt, step } from './scope';
import type { Draft, StageScope } from './scope';
import {
  COMMON_PRACTICE,
  FEEDBACK_SOURCE,
  LINEAR_NETWORK,
  NETWORK_SOURCE,
  RISE_TIME_SOURCE,
  SMALL_SIGNAL,
  STABILITY_SOURCE,
} from './sources';

/** Decibels of half power. */
const HALF_POWER_DB = 10 * Math.log10(2);

/** 0.35, the usual rounding of ln 9/(2π). */
const RISE_TIME_PRODUCT = 0.35;

/** The exact corner: the frequency at which the full network is at half power of its ideal gain. */
export function cornerWorking(scope: StageScope, side: 'upper' | 'lower'): Draft {
  const { analysis } = scope.stage;
  const corner = side === 'upper' ? analysis.cornerUpperHz.value : analysis.cornerLowerHz.value;
  const ideal = analysis.idealGainDb.value;
  const isKnown = corner !== null && corner > 0 && ideal !== null;
  return {
    title: `${side === 'upper' ? 'Upper' : 'Lower'} corner of ${fullLabel(scope.stage)}`,
    steps: isKnown
      ? [halfPowerStep(scope, corner, ideal), lastStep(scope, 'the frequency found', num(corner, 'Hz'), corner)]
      : [lastStep(scope, '|H|² = ½·|H ideal|²', '—', corner)],
    data: [...bandData(scope.facts), ...networkData(scope.stage), ...loopData(scope.facts, scope.stage)],
    assumptions: [
      'Loaded by what follows, fed by what is in front.',
      ...(analysis.operatingBeyondCorner ? ['Searched downwards: the operating frequency is beyond the corner.'] : []),
    ],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

function halfPowerStep(scope: StageScope, cornerHz: number, idealDb: number): ReturnType<typeof step> {
  const { behind, front } = stageNodes(scope, cornerHz);
  const gainDb = ratioToDb(magnitude(behind) / front);
  return step(
    '20·lg|H(f)| = 20·lg|H ideal| − 3.0103 dB, searched outwards from the operating frequency',
    `at ${num(cornerHz, 'Hz')}: ${num(gainDb)} dB; ideal ${num(idealDb)} dB − ${num(HALF_POWER_DB)} dB`,
    `${num(idealDb - HALF_POWER_DB)} dB`,
  );
}

/** Exact corner over the top of the band. */
export function bandwidthRatioWorking(scope: StageScope): Draft {
  const corner = scope.stage.analysis.cornerUpperHz.value;
  const { highHz } = scope.facts.input.specification.band;
  return {
    title: `Corner of ${fullLabel(scope.stage)} over the top of the band`,
    steps: [
      lastStep(
        scope,
        'exact corner / top of the band',
        corner === null ? '—' : `${num(corner, 'Hz')} / ${num(highHz, 'Hz')}`,
        corner === null ? null : corner / highHz,
      ),
    ],
    data: [
      ...derivedDatum('upper corner', corner === null ? 'not known' : num(corner, 'Hz')),
      ...bandData(scope.facts),
      ...policyDatum('bandwidth target', `×${num(scope.facts.policy.bandwidthTarget)}`),
    ],
    source: COMMON_PRACTICE,
  };
}

/** Loop gain, loaded, at the operating frequency. */
export function loopGainWorking(scope: StageScope): Draft {
  const { operatingHz } = scope.facts.input.specification.band;
  const loopGain = probeAt(scope, operatingHz).stages[scope.stage.index].loopGain;
  return {
    title: `Loop gain of ${fullLabel(scope.stage)} at ${setFrequency(operatingHz)}`,
    steps: [
      ...(loopGain ? [step(loopFormula(scope), 'loaded', complexText(loopGain))] : []),
      lastStep(
        scope,
        '20·lg|T|',
        loopGain ? `20·lg ${num(magnitude(loopGain))}` : '—',
        loopGain ? ratioToDb(magnitude(loopGain)) : null,
      ),
    ],
    data: [...bandData(scope.facts), ...networkData(scope.stage), ...loopData(scope.facts, scope.stage)],
    assumptions: [
      isCurrentFeedback(scope)
        ? 'Z is the open-loop transimpedance behind its output resistance, loaded.'
        : 'A is the open-loop gain behind its output resistance, loaded.',
    ],
    validity: [LINEAR_NETWORK],
    source: FEEDBACK_SOURCE,
  };
}

function isCurrentFeedback(scope: StageScope): boolean {
  return scope.stage.stage.kind === 'current-feedback';
}

function loopFormula(scope: StageScope): string {
  return isCurrentFeedback(scope) ? 'T = Z/(D − Z)' : 'T = A/(D − A)';
}

/** What limits the loop: a current-feedback amplifier has no GBW, but a bandwidth in its reference circuit. */
function speedName(scope: StageScope): string {
  return isCurrentFeedback(scope) ? 'bandwidth' : 'GBW';
}

/** |1/(1 + T)|: what is missing from the ideal vector. */
export function vectorErrorWorking(scope: StageScope): Draft {
  const { operatingHz } = scope.facts.input.specification.band;
  const loopGain = probeAt(scope, operatingHz).stages[scope.stage.index].loopGain;
  const sum = loopGain ? { re: loopGain.re + 1, im: loopGain.im } : null;
  return {
    title: `Vector error of ${fullLabel(scope.stage)} at ${setFrequency(operatingHz)}`,
    steps: [lastStep(scope, '1 / |1 + T|', sum ? `1 / |${complexText(sum)}|` : '—', sum ? 1 / magnitude(sum) : null)],
    data: derivedDatum('T', loopGain ? complexText(loopGain) : 'none'),
    validity: [LINEAR_NETWORK],
    source: FEEDBACK_SOURCE,
  };
}

function gbwRangeData(scope: StageScope): Draft['data'] {
  const { stability } = scope.stage;
  if (!stability) return [];
  return [
    ...deviceDatum(scope.stage, `${speedName(scope)}, lower end`, stability.minimumGbw, 'Hz'),
    ...deviceDatum(scope.stage, `${speedName(scope)}, upper end`, stability.maximumGbw, 'Hz'),
  ];
}

/** Phase margin at the worse end of the GBW range. */
export function phaseMarginWorking(scope: StageScope): Draft {
  const margin = worsePoint(scope.stage)?.phaseMarginDeg ?? null;
  const substituted = margin === null ? '—' : `180° + (${num(margin - 180)}°)`;
  return {
    title: `Phase margin of ${fullLabel(scope.stage)}`,
    steps: [...crossingSteps(scope), lastStep(scope, '180° + ∠T, unwrapped from DC', substituted, margin)],
    data: [...gbwRangeData(scope), ...loopData(scope.facts, scope.stage), ...networkData(scope.stage)],
    assumptions: phaseMarginAssumptions(scope),
    validity: [LINEAR_NETWORK],
    source: STABILITY_SOURCE,
  };
}

function crossingSteps(scope: StageScope): readonly WorkingStep[] {
  const { stability } = scope.stage;
  const point = worsePoint(scope.stage);
  if (!stability || !point || point.crossingHz === null || point.phaseMarginDeg === null) return [];
  const used = stability.worse === 'maximum' ? stability.maximumGbw : stability.minimumGbw;
  const substituted = `loaded loop, ${stability.worse} ${speedName(scope)} (${basisText(used)})`;
  return [step('|T(f)| = 1', substituted, `${num(point.crossingHz, 'Hz')}, ∠T = ${num(point.phaseMarginDeg - 180)}°`)];
}

function phaseMarginAssumptions(scope: StageScope): readonly string[] {
  const { stability } = scope.stage;
  const always = [
    `Looked at with the smallest and the largest ${speedName(scope)}; the worse counts in every case.`,
    'Of several crossings the smallest margin counts.',
  ];
  if (!stability) return always;
  if (stability.secondPoleText === null) always.push('No second pole known: an upper bound.');
  if (!stability.outputResistanceKnown) always.push('No output resistance known: taken as 0.');
  return always;
}

/** Peaking of the closed loop at the worse end of the GBW range. */
export function peakingWorking(scope: StageScope): Draft {
  const point = worsePoint(scope.stage);
  return {
    title: `Peaking of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(
        scope,
        'largest 20·lg(|H(f)| / |H ideal|), at least 0',
        point ? `searched over frequency with the ${scope.stage.stability?.worse} GBW` : '—',
        point ? point.peakingDb : null,
      ),
    ],
    data: [...gbwRangeData(scope), ...loopData(scope.facts, scope.stage), ...networkData(scope.stage)],
    assumptions: scope.stage.stability?.secondPoleText === null ? ['No second pole known: a lower bound.'] : [],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: STABILITY_SOURCE,
  };
}

/** 10–90 % rise time of a small step. */
export function riseTimeWorking(scope: StageScope): Draft {
  const corner = scope.stage.analysis.cornerUpperHz.value;
  return {
    title: `Rise time of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(
        scope,
        '0.35 / fcl',
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
