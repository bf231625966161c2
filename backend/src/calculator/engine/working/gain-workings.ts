import type { Maybe } from '../analysis';
import { fullLabel, isFeedbackStage } from '../report/facts';
import { combine } from '../maybe';
import { ratioToDb } from '../units';
import type { WorkingStep } from '../report';
import { decibelText, setFrequency } from '../text/phrases';
import { bandData, derivedDatum, loopData, networkData, terminalData } from './data';
import { complexText, lastStep, magnitude, num, probeAt, step } from './scope';
import type { Draft, StageScope } from './scope';
import { CLOSED_LOOP_SOURCE, LINEAR_NETWORK, NETWORK_SOURCE, SMALL_SIGNAL } from './sources';
import type { ChainProbe } from '../chain/probe';
import type { Complex } from '../complex';

/** Gain of the resistors around the amplifier, or of a block or section. */
export function signalGainWorking(scope: StageScope): Draft {
  const { formula, substituted, value } = resistorGain(scope);
  return {
    title: `Gain set of ${fullLabel(scope.stage)}`,
    steps: [lastStep(scope, formula, substituted, value)],
    data: networkData(scope.stage),
    assumptions: ['Ideal amplifier.'],
    validity: ['The gain that is set, before loading and before the amplifier runs out of gain.'],
    source: CLOSED_LOOP_SOURCE,
  };
}

interface GainFormula {
  readonly formula: string;
  readonly substituted: string;
  readonly value: number;
}

function resistorGain(scope: StageScope): GainFormula {
  const set = scope.stage.stage;
  const { signalGain } = scope.stage.analysis;
  if (set.kind === 'rc-section') {
    return { formula: 'midband division of the section', substituted: num(signalGain), value: signalGain };
  }
  if (set.kind === 'matched-block') {
    return { formula: '10^(G/20)', substituted: `10^(${num(ratioToDb(Math.abs(signalGain)))}/20)`, value: signalGain };
  }
  const rf = set.feedbackOhm;
  const rg = set.gainOhm;
  if (set.topology === 'transimpedance') return { formula: '−Rf', substituted: `−${num(rf, 'Ω')}`, value: -rf };
  if (set.topology === 'follower' || typeof rg !== 'number') return { formula: '1', substituted: '1', value: 1 };
  if (set.topology === 'inverting') {
    return { formula: '−Rf/Rg', substituted: `−${num(rf, 'Ω')} / ${num(rg, 'Ω')}`, value: -rf / rg };
  }
  return { formula: '1 + Rf/Rg', substituted: `1 + ${num(rf, 'Ω')} / ${num(rg, 'Ω')}`, value: 1 + rf / rg };
}

/** Gain with an ideal amplifier, the division by what follows and what is in front included. */
export function idealGainWorking(scope: StageScope): Draft {
  const { idealGainDb, signalGain } = scope.stage.analysis;
  const set = Math.abs(signalGain);
  const division = idealGainDb.value === null ? null : 10 ** (idealGainDb.value / 20) / set;
  const isResistive = isFeedbackStage(scope.stage.stage) && scope.stage.stage.topology === 'transimpedance';
  const substituted = division === null ? '—' : `20·lg(${num(set, isResistive ? 'Ω' : null)} · ${num(division)})`;
  return {
    title: `Ideal gain of ${fullLabel(scope.stage)}`,
    steps: [
      step(
        'division k around the stage (source, coupling and load resistances)',
        'resistive network',
        division === null ? '—' : num(division),
      ),
      lastStep(scope, '20·lg(|gain set| · k)', substituted, division === null ? null : ratioToDb(set * division)),
    ],
    data: [...networkData(scope.stage), ...terminalData(scope.facts)],
    assumptions: ['Ideal amplifiers, coupling shorted, shunt capacitances removed.', reference(scope)],
    validity: [SMALL_SIGNAL],
    source: NETWORK_SOURCE,
  };
}

function reference(scope: StageScope): string {
  if (scope.stage.index > 0) return 'From the node in front of the stage to the node behind it.';
  return scope.facts.input.specification.source.kind === 'current'
    ? "From the source's current to the node behind the stage."
    : "From the source's EMF to the node behind the stage.";
}

/** True when the stage feeds a virtual ground: a transimpedance stage or an inverting one without Rg. */
function feedsVirtualGround(scope: StageScope, index: number): boolean {
  const next = scope.facts.input.stages[index + 1];
  if (!next || !isFeedbackStage(next)) return false;
  const isInverting = next.topology === 'inverting' || next.topology === 'transimpedance';
  return isInverting && (next.topology === 'transimpedance' || !next.gainOhm);
}

/** Voltage that stands for the node behind a stage: in front of a virtual ground the open-circuit voltage. */
function nodeBehind(scope: StageScope, probe: ChainProbe, index: number): Complex {
  const { node, openCircuit } = probe.stages[index];
  return feedsVirtualGround(scope, index) ? openCircuit : node;
}

/** Node behind and node in front of the stage at one frequency, per unit EMF (a current source: its current). */
export function stageNodes(
  scope: StageScope,
  frequencyHz: number,
): { behind: Complex; front: number; frontPhase: number } {
  const probe = probeAt(scope, frequencyHz);
  const { index } = scope.stage;
  const behind = nodeBehind(scope, probe, index);
  if (index > 0) {
    const front = nodeBehind(scope, probe, index - 1);
    return { behind, front: magnitude(front), frontPhase: Math.atan2(front.im, front.re) };
  }
  const isCurrent = scope.facts.input.specification.source.kind === 'current';
  if (!isCurrent) return { behind, front: 1, frontPhase: 0 };
  const z = probe.sourceImpedance;
  return { behind, front: 1 / magnitude(z), frontPhase: -Math.atan2(z.im, z.re) };
}

/** Gain of the stage at a frequency of the band, everything connected. */
export function stageGainWorking(scope: StageScope, frequencyHz: number, where: string): Draft {
  const { behind, front } = stageNodes(scope, frequencyHz);
  const size = magnitude(behind);
  return {
    title: `Gain of ${fullLabel(scope.stage)} at ${setFrequency(frequencyHz)}, ${where}`,
    steps: [
      step(
        'V behind the stage, per unit of the source',
        `full network at ${setFrequency(frequencyHz)}`,
        `${complexText(behind)}, size ${num(size)}`,
      ),
      lastStep(
        scope,
        '20·lg(|V behind| / |V in front|)',
        `20·lg(${num(size)} / ${num(front)})`,
        ratioToDb(size / front),
      ),
    ],
    data: [...bandData(scope.facts), ...networkData(scope.stage), ...loopData(scope.facts, scope.stage)],
    assumptions: [reference(scope)],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

/** Gain minus ideal gain. The one-pole droop stands beside it, because everybody checks it by hand. */
export function droopWorking(scope: StageScope, gain: Maybe, frequencyHz: number, where: string): Draft {
  const ideal = scope.stage.analysis.idealGainDb;
  const difference = combine([gain, ideal], (a, b) => a - b).value;
  const substituted = difference === null ? '—' : `${decibels(gain)} − (${decibels(ideal)})`;
  return {
    title: `Droop of ${fullLabel(scope.stage)} at ${setFrequency(frequencyHz)}, ${where}`,
    steps: [...onePoleStep(scope, frequencyHz), lastStep(scope, 'gain − ideal gain', substituted, difference)],
    data: [...derivedDatum('gain', decibels(gain)), ...derivedDatum('ideal gain', decibels(ideal))],
    validity: [SMALL_SIGNAL],
    source: CLOSED_LOOP_SOURCE,
  };
}

function decibels(value: Maybe): string {
  return value.value === null ? value.reason : `${num(value.value)} dB`;
}

function onePoleStep(scope: StageScope, frequencyHz: number): readonly WorkingStep[] {
  const corner = scope.stage.analysis.cornerFirstOrderHz.value;
  if (corner === null) return [];
  return [
    step(
      'one pole, for comparison: −10·lg(1 + (f/fcl)²)',
      `−10·lg(1 + (${setFrequency(frequencyHz)} / ${num(corner, 'Hz')})²)`,
      decibelText(-10 * Math.log10(1 + (frequencyHz / corner) ** 2)),
    ),
  ];
}

/** Voltage of the node behind the stage over the EMF (or per ampere of the source). */
export function runningGainWorking(scope: StageScope): Draft {
  const { operatingHz } = scope.facts.input.specification.band;
  const probe = probeAt(scope, operatingHz);
  const isCurrent = scope.facts.input.specification.source.kind === 'current';
  const size = magnitude(nodeBehind(scope, probe, scope.stage.index));
  const sourceOhm = magnitude(probe.sourceImpedance);
  const formula = isCurrent ? '20·lg(|V behind / E| · |Z source|)' : '20·lg|V behind / E|';
  const substituted = isCurrent ? `20·lg(${num(size)} · ${num(sourceOhm, 'Ω')})` : `20·lg ${num(size)}`;
  return {
    title: `Running gain behind ${fullLabel(scope.stage)}`,
    steps: [lastStep(scope, formula, substituted, ratioToDb(isCurrent ? size * sourceOhm : size))],
    data: [...bandData(scope.facts), ...terminalData(scope.facts)],
    assumptions: ['Everything up to here and everything behind is connected.'],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

/** Phase from the node in front to the node behind at the operating frequency. */
export function phaseWorking(scope: StageScope): Draft {
  const { operatingHz } = scope.facts.input.specification.band;
  const { behind, frontPhase } = stageNodes(scope, operatingHz);
  const raw = ((Math.atan2(behind.im, behind.re) - frontPhase) * 180) / Math.PI;
  return {
    title: `Phase of ${fullLabel(scope.stage)} at ${setFrequency(operatingHz)}`,
    steps: [
      lastStep(
        scope,
        '∠V behind − ∠V in front',
        `${num(raw)}° (whole turns taken out)`,
        sameTurn(raw, scope.figure.value),
      ),
    ],
    data: bandData(scope.facts),
    assumptions: [reference(scope)],
    validity: [SMALL_SIGNAL, LINEAR_NETWORK],
    source: NETWORK_SOURCE,
  };
}

/** The angle plus as many whole turns as bring it next to the reference. */
export function sameTurn(angleDeg: number, referenceDeg: number | null): number {
  return referenceDeg === null ? angleDeg : angleDeg + 360 * Math.round((referenceDeg - angleDeg) / 360);
}
