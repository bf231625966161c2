import type { UsedValue } from '../analysis';
import { invertingInputResistanceFor, openLoopGainDbFor, outputResistanceFor } from '../devices/amplifier-values';
import { referenceBandwidthFor } from '../devices/used-values';
import { isFeedbackStage } from '../report/facts';
import type { ChainFacts, StageFacts } from '../report/facts';
import type { CurrentFeedbackDevice } from '../types';
import type { Unit, WorkingDatum } from '../report';
import { typed } from '../text/si-format';
import { isBelow } from '../text/deciding-digits';
import { num } from './scope';

/** A value that the designer set in the stage. */
export function setUp(label: string, value: number | null | undefined, unit: Unit): readonly WorkingDatum[] {
  if (value === null || value === undefined) return [];
  return [{ label, value: typed(value, unit), origin: 'set-up of the stage', assumed: false }];
}

/** A value of the specification. */
export function specified(label: string, value: number | null | undefined, unit: Unit): readonly WorkingDatum[] {
  if (value === null || value === undefined) return [];
  return [{ label, value: typed(value, unit), origin: 'specification', assumed: false }];
}

/** A threshold of the project's policy. */
export function policyDatum(label: string, value: string): readonly WorkingDatum[] {
  return [{ label, value, origin: 'policy of the project', assumed: false }];
}

/** A device value as used, with column, condition and page. */
export function deviceDatum(
  stage: StageFacts,
  label: string,
  used: UsedValue | null,
  unit: Unit,
): readonly WorkingDatum[] {
  if (!used) return [];
  return [
    {
      label,
      value: num(used.value, unit),
      origin: `${stage.device?.partNumber ?? 'device'}, ${used.text}`,
      assumed: used.basis === 'assumed' || used.basis === 'typ-derated',
      ...(used.page === undefined ? {} : { page: used.page }),
      ...(used.condition === undefined ? {} : { condition: used.condition }),
    },
  ];
}

/** A figure that another working explains. */
export function derivedDatum(label: string, value: string): readonly WorkingDatum[] {
  return [{ label, value, origin: 'calculated; has its own working', assumed: false }];
}

/** Resistors and capacitors around an amplifier, or those of a passive section. */
export function networkData(stage: StageFacts): readonly WorkingDatum[] {
  const set = stage.stage;
  if (set.kind === 'rc-section') {
    return [
      ...setUp('series R', set.seriesOhm, 'Ω'),
      ...setUp('series C', set.seriesF, 'F'),
      ...setUp('shunt R', set.shuntOhm, 'Ω'),
      ...setUp('shunt C', set.shuntF, 'F'),
    ];
  }
  if (!isFeedbackStage(set)) return [];
  return [
    ...setUp('Rf', set.feedbackOhm, 'Ω'),
    ...setUp('Rg', set.gainOhm, 'Ω'),
    ...setUp('Cf', set.feedbackF, 'F'),
    ...setUp('stray C at the inverting node', set.strayF, 'F'),
    ...setUp('termination', set.terminationOhm, 'Ω'),
    ...setUp('input coupling', set.couplingF, 'F'),
    ...setUp('bias resistor', set.biasOhm, 'Ω'),
    ...setUp('isolation', set.isolationOhm, 'Ω'),
  ];
}

/** What the open loop of the amplifier is made of. */
export function loopData(facts: ChainFacts, stage: StageFacts): readonly WorkingDatum[] {
  const { device, analysis, stability } = stage;
  if (!device || device.kind === 'matched-block') return [];
  const gain =
    device.kind === 'voltage-feedback'
      ? [
          ...deviceDatum(stage, 'GBW', analysis.gbw, 'Hz'),
          ...deviceDatum(stage, 'A0', openLoopGainDbFor(device, facts.gbwCase), 'dB'),
        ]
      : referenceCircuitData(facts, stage, device);
  return [
    ...gain,
    ...deviceDatum(stage, 'Ro', outputResistanceFor(device), 'Ω'),
    ...secondPoleDatum(stability?.secondPoleHz ?? null, stability?.secondPoleText ?? null),
  ];
}

/** What stands in place of a GBW: the bandwidth, and the circuit in which the datasheet states it. */
export function referenceCircuitData(
  facts: ChainFacts,
  stage: StageFacts,
  device: CurrentFeedbackDevice,
): readonly WorkingDatum[] {
  const stated = (label: string, value: string): WorkingDatum => ({
    label,
    value,
    origin: `${device.partNumber}, reference circuit`,
    assumed: false,
  });
  return [
    ...deviceDatum(stage, 'reference bandwidth', referenceBandwidthFor(device, facts.policy, facts.gbwCase), 'Hz'),
    stated('its feedback resistor', num(device.referenceFeedbackOhm, 'Ω')),
    stated('its noise gain', num(device.referenceNoiseGain)),
    ...deviceDatum(stage, 'Rb', invertingInputResistanceFor(device), 'Ω'),
  ];
}

function secondPoleDatum(frequencyHz: number | null, text: string | null): readonly WorkingDatum[] {
  if (text === null) {
    return [{ label: 'f2', value: 'none', origin: 'not entered, one pole assumed', assumed: true }];
  }
  const value = frequencyHz === null ? 'none' : num(frequencyHz, 'Hz');
  return [{ label: 'f2', value, origin: `second pole ${text}`, assumed: frequencyHz === null }];
}

/** Band edges and operating frequency. */
export function bandData(facts: ChainFacts): readonly WorkingDatum[] {
  const { band } = facts.input.specification;
  const edges = isBelow(band.lowHz, band.highHz)
    ? [...specified('bottom of the band', band.lowHz, 'Hz'), ...specified('top of the band', band.highHz, 'Hz')]
    : [];
  return [...specified('operating frequency', band.operatingHz, 'Hz'), ...edges];
}

/** Source and load of the chain. */
export function terminalData(facts: ChainFacts): readonly WorkingDatum[] {
  const { source, load } = facts.input.specification;
  return [
    ...specified('source resistance', source.resistanceOhm, 'Ω'),
    ...(source.kind === 'current' ? specified('source capacitance', source.capacitanceF, 'F') : []),
    ...specified('load resistance', load.resistanceOhm, 'Ω'),
    ...specified('load capacitance', load.capacitanceF, 'F'),
  ];
}
