import type { UsedValue } from '../analysis';
import { DEFAULT_AMBIENT_K } from '../constants';
import {
  invertingInputResistanceFor,
  lowerWorst,
  openLoopGainDbFor,
  openLoopTransimpedanceFor,
  outputResistanceFor,
  parasitic,
  transimpedanceBandwidthFor,
  upperWorst,
} from '../devices/amplifier-values';
import { currentFeedbackSecondPole, secondPoleFor } from '../devices/second-pole';
import { DeviceCorner, gbwFor, referenceBandwidthFor, upperCornerFor } from '../devices/used-values';
import type {
  AmplifierDevice,
  CurrentFeedbackDevice,
  Device,
  FeedbackStage,
  MatchedBlockDevice,
  Policy,
  RcSectionStage,
  Stage,
  VoltageFeedbackDevice,
} from '../types';
import { dbToPower, dbToRatio } from '../units';
import { CurrentFeedbackNetwork } from './current-feedback';
import type { AmplifierNoise } from './feedback-noise';
import type { FeedbackPartValues } from './feedback-parts';
import { MatchedBlockNetwork, MatchedBlockValues } from './matched-block';
import type { NetworkStage } from './network-stage';
import { RcSectionNetwork, RcSectionValues } from './rc-section';
import { VoltageFeedbackNetwork } from './voltage-feedback';

/** What a stage is made ready with. */
export interface PrepareContext {
  readonly policy: Policy;
  readonly corner: DeviceCorner;
  /** Absent: 298.15 K. */
  readonly ambientK?: number;
}

/** A stage's numbers in one corner; exactly one of the three last is there. */
export interface PreparedStage {
  readonly stage: Stage;
  readonly device: Device | null;
  readonly network: NetworkStage;
  readonly feedback: FeedbackPartValues | null;
  readonly section: RcSectionValues | null;
  readonly block: MatchedBlockValues | null;
  /** K of a current-feedback stage, Ω·rad/s. */
  readonly transimpedanceBandwidth: number | null;
  /** Feedback stages: GBW, with current feedback the higher of reference bandwidth and K/(2π·(Rf + Rb)), Hz. */
  readonly loopBandwidthHz: number | null;
  /** Feedback stages: Infinity when there is none or it is not known. */
  readonly secondPoleHz: number | null;
}

/** True for the topologies whose signal goes into the inverting node. */
export function isInverting(stage: FeedbackStage): boolean {
  return stage.topology === 'inverting' || stage.topology === 'transimpedance';
}

/**
 * Makes a validated stage ready for one corner: picks the device values and builds its network.
 *
 * @example prepareStage(stage, device, { policy: DEFAULT_POLICY, corner: 'minimum' }).network.stageId // stage.id
 */
export function prepareStage(stage: Stage, device: Device | null, context: PrepareContext): PreparedStage {
  if (stage.kind === 'rc-section') {
    const section = sectionValues(stage, context);
    return passive(stage, device, new RcSectionNetwork(stage.id, section), section, null);
  }
  if (stage.kind === 'matched-block') {
    const block = blockValues(device as MatchedBlockDevice, context);
    return passive(stage, device, new MatchedBlockNetwork(stage.id, block), null, block);
  }
  if (stage.kind === 'voltage-feedback') return voltageFeedback(stage, device as VoltageFeedbackDevice, context);
  return currentFeedback(stage, device as CurrentFeedbackDevice, context);
}

function passive(
  stage: Stage,
  device: Device | null,
  network: NetworkStage,
  section: RcSectionValues | null,
  block: MatchedBlockValues | null,
): PreparedStage {
  return {
    stage,
    device,
    network,
    feedback: null,
    section,
    block,
    transimpedanceBandwidth: null,
    loopBandwidthHz: null,
    secondPoleHz: null,
  };
}

const or = <T>(value: T | null | undefined, fallback: T): T => value ?? fallback;

/** Literals without spreads: a picker prepares thousands of stages. */
function feedbackValues(stage: FeedbackStage, device: AmplifierDevice): FeedbackPartValues {
  const inverting = isInverting(stage);
  const inputF = valueOr(parasitic(device.commonModeCapacitanceF), 0);
  return {
    inverting,
    feedbackOhm: stage.feedbackOhm,
    feedbackF: or(stage.feedbackF, 0),
    seriesOhm: stage.topology === 'inverting' ? or(stage.gainOhm, 0) : 0,
    gainS: stage.topology === 'non-inverting' && stage.gainOhm ? 1 / stage.gainOhm : 0,
    nodeF: inputF + or(stage.strayF, 0),
    inputS: 1 / valueOr(parasitic(device.inputResistanceOhm), Infinity),
    inputF,
    outputOhm: outputResistanceFor(device).value,
    isolationOhm: or(stage.isolationOhm, 0),
    terminationOhm: or(stage.terminationOhm, null),
    couplingF: or(stage.couplingF, null),
    biasOhm: inverting ? null : or(stage.biasOhm, null),
  };
}

function valueOr<T>(used: UsedValue | null, fallback: T): number | T {
  return used ? used.value : fallback;
}

function amplifierNoise(device: AmplifierDevice, context: PrepareContext): AmplifierNoise {
  const { corner } = context;
  const ofCurrentFeedback = device.kind === 'current-feedback';
  const minus = ofCurrentFeedback ? device.invertingCurrentNoiseAPerRtHz : device.currentNoiseAPerRtHz;
  return {
    voltageVPerRtHz: valueOr(upperWorst(device.voltageNoiseVPerRtHz, corner), null),
    voltageCornerHz: or(device.voltageNoiseCornerHz, 0),
    plusCurrentAPerRtHz: valueOr(upperWorst(device.currentNoiseAPerRtHz, corner), null),
    minusCurrentAPerRtHz: valueOr(upperWorst(minus, corner), null),
    minusCurrentDatum: ofCurrentFeedback ? 'current noise of the inverting input' : 'current noise',
    currentCornerHz: or(device.currentNoiseCornerHz, 0),
    ambientK: or(context.ambientK, DEFAULT_AMBIENT_K),
  };
}

function voltageFeedback(stage: FeedbackStage, device: VoltageFeedbackDevice, context: PrepareContext): PreparedStage {
  const { policy, corner } = context;
  const feedback = feedbackValues(stage, device);
  const loopBandwidthHz = gbwFor(device, policy, corner).value;
  const secondPoleHz = secondPoleFor(device).frequencyHz;
  const network = new VoltageFeedbackNetwork(stage.id, feedback, {
    openLoopGain: dbToRatio(openLoopGainDbFor(device, corner).value),
    gainBandwidthHz: loopBandwidthHz,
    secondPoleHz,
    differentialF: valueOr(parasitic(device.differentialCapacitanceF), 0),
    noise: amplifierNoise(device, context),
  });
  return {
    stage,
    device,
    network,
    feedback,
    section: null,
    block: null,
    transimpedanceBandwidth: null,
    loopBandwidthHz,
    secondPoleHz,
  };
}

function currentFeedback(stage: FeedbackStage, device: CurrentFeedbackDevice, context: PrepareContext): PreparedStage {
  const { policy, corner } = context;
  const feedback = feedbackValues(stage, device);
  const transimpedanceBandwidth = transimpedanceBandwidthFor(device, policy, corner);
  const invertingInputOhm = invertingInputResistanceFor(device).value;
  const secondPoleHz = currentFeedbackSecondPole(device).frequencyHz;
  const network = new CurrentFeedbackNetwork(stage.id, feedback, {
    openLoopOhm: openLoopTransimpedanceFor(device, corner).value,
    transimpedanceBandwidth,
    secondPoleHz,
    invertingInputOhm,
    noise: amplifierNoise(device, context),
  });
  const unityHz = transimpedanceBandwidth / (2 * Math.PI * (feedback.feedbackOhm + invertingInputOhm));
  return {
    stage,
    device,
    network,
    feedback,
    section: null,
    block: null,
    transimpedanceBandwidth,
    loopBandwidthHz: Math.max(referenceBandwidthFor(device, policy, corner).value, unityHz),
    secondPoleHz,
  };
}

function sectionValues(stage: RcSectionStage, context: PrepareContext): RcSectionValues {
  return {
    seriesOhm: stage.seriesOhm ?? 0,
    seriesF: stage.seriesF ?? 0,
    shuntS: stage.shuntOhm ? 1 / stage.shuntOhm : 0,
    shuntF: stage.shuntF ?? 0,
    ambientK: context.ambientK ?? DEFAULT_AMBIENT_K,
  };
}

function blockValues(device: MatchedBlockDevice, context: PrepareContext): MatchedBlockValues {
  const { corner, policy } = context;
  const gainDb = lowerWorst(device.gainDb, corner)?.value ?? 0;
  const noiseFigureDb = upperWorst(device.noiseFigureDb, corner)?.value;
  const silent = gainDb <= 0 ? 'loss' : null;
  return {
    impedanceOhm: device.impedanceOhm,
    gain: dbToRatio(gainDb),
    lowerCornerHz: upperWorst(device.lowerCornerHz, corner)?.value ?? 0,
    upperCornerHz: upperCornerFor(device, policy, corner)?.value ?? Infinity,
    noiseFactor: noiseFigureDb === undefined ? silent : dbToPower(noiseFigureDb),
  };
}
