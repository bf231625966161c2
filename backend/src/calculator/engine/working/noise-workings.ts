import { noiseDensity } from '../report/derived';
import { fullLabel } from '../report/facts';
import { noiseUnit } from '../report/stage-figures';
import { BOLTZMANN_J_PER_K, REFERENCE_TEMPERATURE_K } from '../constants';
import { setFrequency } from '../text/phrases';
import { upperWorst } from '../devices/amplifier-values';
import type { DatasheetValue, Source } from '../types';
import type { Unit, WorkingDatum } from '../report';
import { bandData, derivedDatum, deviceDatum, networkData, specified } from './data';
import { lastStep, magnitude, num, probeAt, step } from './scope';
import type { ChainScope, Draft, StageScope } from './scope';
import { LINEAR_NETWORK, NOISE_FIGURE_SOURCE, NOISE_SOURCE } from './sources';

/** Noise that a stage adds, referred to the source. */
export function noiseAddedWorking(scope: StageScope): Draft {
  const { operatingHz } = scope.facts.input.specification.band;
  const unit = noiseUnit(scope.facts);
  const density = noiseDensity(scope.stage).value;
  const probe = probeAt(scope, operatingHz);
  const stage = probe.stages[scope.stage.index];
  const atOutput = Math.sqrt(stage.noiseSources.reduce((sum, source) => sum + source.v2PerHzAtOutput, 0));
  const gain = magnitude(stage.openCircuit) * (unit === 'A/√Hz' ? magnitude(probe.sourceImpedance) : 1);
  const sources = stage.noiseSources.map((source) =>
    step(
      `${source.label}, at the open output`,
      `at ${setFrequency(operatingHz)}`,
      num(Math.sqrt(source.v2PerHzAtOutput), 'V/√Hz'),
    ),
  );
  const gainText = num(gain, unit === 'A/√Hz' ? 'Ω' : null);
  return {
    title: `Noise added by ${fullLabel(scope.stage)}`,
    steps: [
      ...(density === null ? [] : sources),
      lastStep(
        scope,
        '√(Σ of the squares) / gain from the source to this output, unloaded',
        density === null ? '—' : `${num(atOutput, 'V/√Hz')} / ${gainText}`,
        density === null ? null : atOutput / gain,
      ),
    ],
    data: [...noiseData(scope), ...networkData(scope.stage), ...bandData(scope.facts), ...ambient(scope)],
    assumptions: ['Sources are uncorrelated.'],
    validity: [LINEAR_NETWORK],
    source: NOISE_SOURCE,
  };
}

function noiseData(scope: StageScope): readonly WorkingDatum[] {
  const { stage, facts } = scope;
  const { device } = stage;
  if (!device) return [];
  const datum = (label: string, sheet: DatasheetValue | undefined, unit: Unit): readonly WorkingDatum[] =>
    deviceDatum(stage, label, upperWorst(sheet, facts.gbwCase), unit);
  if (device.kind === 'matched-block') return datum('noise figure', device.noiseFigureDb, 'dB');
  return [
    ...datum('voltage noise', device.voltageNoiseVPerRtHz, 'V/√Hz'),
    ...datum('current noise', device.currentNoiseAPerRtHz, 'A/√Hz'),
    ...(device.kind === 'current-feedback'
      ? datum('inverting current noise', device.invertingCurrentNoiseAPerRtHz, 'A/√Hz')
      : []),
  ];
}

function ambient(scope: ChainScope): readonly WorkingDatum[] {
  const { ambientK } = scope.facts.input.specification;
  if (ambientK !== undefined) {
    return [{ label: 'ambient', value: `${num(ambientK)} K`, origin: 'specification', assumed: false }];
  }
  return [{ label: 'ambient', value: '298.15 K', origin: 'not set, 25 °C assumed', assumed: true }];
}

/** Share of a stage in the added noise power. */
export function noiseShareWorking(scope: StageScope): Draft {
  const densities = scope.facts.stages.map((stage) => noiseDensity(stage).value);
  const own = densities[scope.stage.index];
  const isKnown = own !== null && densities.every((density) => density !== null);
  const total = isKnown ? Math.sqrt(densities.reduce<number>((sum, each) => sum + (each ?? 0) ** 2, 0)) : null;
  const unit = noiseUnit(scope.facts);
  const computed = own === null || total === null || total === 0 ? null : (own / total) ** 2;
  return {
    title: `Noise share of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(
        scope,
        'own² / Σ of all stages²',
        computed === null || own === null || total === null ? '—' : `(${num(own, unit)} / ${num(total, unit)})²`,
        computed,
      ),
    ],
    data: scope.facts.stages.flatMap((stage, index) => {
      const density = densities[index];
      return derivedDatum(`added by ${stage.label}`, density === null ? 'not known' : num(density, unit));
    }),
    assumptions: ['Powers are compared; the source itself is left out.'],
    source: NOISE_SOURCE,
  };
}

/** Added noise of the whole chain, referred to the source. */
export function inputNoiseWorking(scope: ChainScope): Draft {
  const unit = noiseUnit(scope.facts);
  const densities = scope.facts.stages.map((stage) => noiseDensity(stage).value);
  const isKnown = scope.figure.value !== null && densities.every((density) => density !== null);
  const squares = densities.map((density, index) => `${scope.facts.stages[index].label} ${num(density ?? 0, unit)}`);
  return {
    title: `Input noise of the chain at ${setFrequency(scope.facts.input.specification.band.operatingHz)}`,
    steps: [
      lastStep(
        scope,
        '√(Σ of the stages, squared)',
        isKnown ? `√(${squares.map((text) => `(${text})²`).join(' + ')})` : '—',
        isKnown ? Math.sqrt(densities.reduce<number>((sum, each) => sum + (each ?? 0) ** 2, 0)) : null,
      ),
    ],
    data: scope.facts.stages.flatMap((stage, index) => {
      const density = densities[index];
      return derivedDatum(`added by ${stage.label}`, density === null ? 'not known' : num(density, unit));
    }),
    assumptions: ['Added noise: the source itself and the load are left out.'],
    validity: [LINEAR_NETWORK],
    source: NOISE_SOURCE,
  };
}

function referenceFormula({ kind }: Source): string {
  return kind === 'current' ? '√(4kT0·Re(1/Zs)), T0 = 290 K' : '√(4kT0·Re Zs), T0 = 290 K';
}

/** Noise figure against the thermal noise of the source at 290 K. */
export function noiseFigureWorking(scope: ChainScope): Draft {
  const { source, band } = scope.facts.input.specification;
  const added = scope.facts.chain.inputNoise.value;
  const isKnown = scope.figure.value !== null && added !== null;
  const z = isKnown ? probeAt(scope, band.operatingHz).sourceImpedance : { re: 0, im: 0 };
  const ohm = source.kind === 'current' ? z.re / magnitude(z) ** 2 : z.re;
  const reference = Math.sqrt(4 * BOLTZMANN_J_PER_K * REFERENCE_TEMPERATURE_K * ohm);
  const unit = noiseUnit(scope.facts);
  const computed = added === null ? null : 10 * Math.log10(1 + (added / reference) ** 2);
  return {
    title: 'Noise figure of the chain',
    steps: [
      ...(isKnown
        ? [
            step(
              referenceFormula(source),
              source.kind === 'current' ? 'as a current' : `Rs ${num(ohm, 'Ω')}`,
              num(reference, unit),
            ),
          ]
        : []),
      lastStep(
        scope,
        '10·lg(1 + added²/source²)',
        isKnown ? `10·lg(1 + (${num(added, unit)} / ${num(reference, unit)})²)` : '—',
        isKnown ? computed : null,
      ),
    ],
    data: [
      ...derivedDatum('added noise', added === null ? 'not known' : num(added, unit)),
      ...specified('source resistance', source.resistanceOhm, 'Ω'),
    ],
    validity: [LINEAR_NETWORK],
    source: NOISE_FIGURE_SOURCE,
  };
}
