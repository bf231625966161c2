import type { Maybe } from '../analysis';
import { chainGainUnit } from '../report/chain-figures';
import { ratioToDb } from '../units';
import { setFrequency } from '../text/phrases';
import type { ChainProbe } from '../chain/probe';
import { bandData, derivedDatum, terminalData } from './data';
import { complexText, lastStep, magnitude, num, probeAt, step } from './scope';
import type { ChainScope, Draft } from './scope';
import { CLOSED_LOOP_SOURCE, LINEAR_NETWORK, NETWORK_SOURCE, SMALL_SIGNAL } from './sources';

/** How the gain basis turns V_load/E into the gain shown. */
interface Basis {
  readonly formula: string;
  readonly substitute: (probe: ChainProbe) => string;
  readonly value: (probe: ChainProbe) => number;
}

/** The gain basis of the specification. */
export function basisOf(scope: ChainScope): Basis {
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
