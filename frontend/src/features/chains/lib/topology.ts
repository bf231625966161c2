import type { CurrentFeedbackTopology, FeedbackStage, VoltageFeedbackTopology } from '../../../api/types';
import { gainOfResistors, pairHoldingFeedback, pairHoldingGainResistor, ratioForGain } from './resistors';
import { nearestPreferred, type ResistorSeries } from './resistor-series';

export type Topology = VoltageFeedbackTopology | CurrentFeedbackTopology;

export const VOLTAGE_FEEDBACK_TOPOLOGIES: readonly VoltageFeedbackTopology[] = [
  'non-inverting',
  'follower',
  'inverting',
  'transimpedance',
];
export const CURRENT_FEEDBACK_TOPOLOGIES: readonly CurrentFeedbackTopology[] = ['non-inverting', 'inverting'];

export function topologiesOf(kind: FeedbackStage['kind']): readonly Topology[] {
  return kind === 'voltage-feedback' ? VOLTAGE_FEEDBACK_TOPOLOGIES : CURRENT_FEEDBACK_TOPOLOGIES;
}

/** Topologies whose signal goes to the + pin. */
export function isNonInverting(topology: Topology): boolean {
  return topology === 'non-inverting' || topology === 'follower';
}

const DEFAULT_GAIN_OHM = 100;
const DEFAULT_FEEDBACK_OHM = 1000;
const DEFAULT_BIAS_OHM = 10e3;

function signedGain(topology: Topology, typed: number): number {
  return isNonInverting(topology) ? typed : -Math.abs(typed);
}

/** Why a wanted gain cannot be had with this topology; null: it can. */
export function gainProblem(topology: Topology, typed: number): string | null {
  if (typed === 0) return 'A gain of 0 is not a stage. Give for example −10 or 20 dB.';
  if (topology === 'non-inverting' && typed < 0)
    return 'Non-inverting gains are positive. Choose inverting for a negative one.';
  if (topology === 'non-inverting' && typed <= 1) return 'Non-inverting gives more than ×1. Choose follower for ×1.';
  return null;
}

function held(stage: FeedbackStage, ratio: number, series: ResistorSeries): { feedbackOhm: number; gainOhm: number } {
  if (stage.kind === 'current-feedback') {
    return pairHoldingFeedback(ratio, stage.feedbackOhm > 0 ? stage.feedbackOhm : DEFAULT_FEEDBACK_OHM, series);
  }
  return pairHoldingGainResistor(ratio, stage.gainOhm ?? DEFAULT_GAIN_OHM, series);
}

/** The stage with resistors for a wanted gain (for transimpedance in Ω). The caller has asked gainProblem first. */
export function withWantedGain<S extends FeedbackStage>(stage: S, typed: number, series: ResistorSeries): S {
  const { topology } = stage;
  if (topology === 'follower') return { ...stage, wantedGain: 1, gainOhm: null };
  const wantedGain = signedGain(topology, typed);
  if (topology === 'transimpedance') {
    const ohm = Math.abs(typed);
    return {
      ...stage,
      wantedGain,
      feedbackOhm: series === 'exact' ? ohm : nearestPreferred(series, ohm),
      gainOhm: null,
    };
  }
  return { ...stage, wantedGain, ...held(stage, ratioForGain(topology, wantedGain), series) };
}

/** Resistors were typed: there is no wanted gain any more. */
export function withResistors<S extends FeedbackStage>(
  stage: S,
  change: Partial<Pick<FeedbackStage, 'feedbackOhm' | 'gainOhm'>>,
): S {
  return { ...stage, ...change, wantedGain: null };
}

function gainAfterChange(stage: FeedbackStage, to: Topology): number {
  const present = stage.wantedGain ?? gainOfResistors(stage.topology, stage.feedbackOhm, stage.gainOhm) ?? 10;
  const wasRatio = stage.topology !== 'transimpedance';
  if (to === 'transimpedance') return wasRatio && stage.feedbackOhm > 0 ? stage.feedbackOhm : 10e3;
  const size = wasRatio ? Math.abs(present) : 10;
  return to === 'non-inverting' && size <= 1 ? 2 : size;
}

/**
 * Another topology with the same size of gain, as far as it can have it: resistors follow the preferred series, the
 * sign follows the topology, and a coupled + input gets the DC return that it needs.
 */
export function withTopology(stage: FeedbackStage, topology: Topology, series: ResistorSeries): FeedbackStage {
  if (topology === stage.topology) return stage;
  const gain = gainAfterChange(stage, topology);
  const biasOhm = isNonInverting(topology) && stage.couplingF ? (stage.biasOhm ?? DEFAULT_BIAS_OHM) : null;
  const changed = { ...stage, topology, biasOhm } as FeedbackStage;
  if (topology === 'follower') return { ...changed, wantedGain: 1, feedbackOhm: 0, gainOhm: null };
  return withWantedGain(changed, gain, series);
}

/** Sets or removes the input coupling; a coupled + input gets a DC return, since without one it has no bias. */
export function withCoupling<S extends FeedbackStage>(stage: S, couplingF: number | null): S {
  const needsReturn = couplingF !== null && isNonInverting(stage.topology);
  return { ...stage, couplingF, biasOhm: needsReturn ? (stage.biasOhm ?? DEFAULT_BIAS_OHM) : (stage.biasOhm ?? null) };
}
