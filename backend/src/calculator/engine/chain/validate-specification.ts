import { typed } from '../text/si-format';
import { GBW_CASES, Policy, Requirements, Source, Specification } from '../types';
import type { IssueCollector, RangeName } from './issue-collector';

function source(found: IssueCollector, path: string, value: Source): void {
  if (!found.oneOf(`${path}.kind`, value.kind, ['voltage', 'current'])) return;
  found.required(`${path}.resistanceOhm`, value.resistanceOhm, 'resistanceOhm');
  let level: RangeName = 'positive';
  if (value.kind === 'current') {
    found.required(`${path}.capacitanceF`, value.capacitanceF, 'capacitanceOrZeroF');
    found.optional(`${path}.dcCurrentA`, value.dcCurrentA, 'any');
  } else {
    found.oneOf(`${path}.levelKind`, value.levelKind, ['peak-emf', 'rms-emf', 'available-power']);
    if (value.levelKind === 'available-power') level = 'decibel';
  }
  found.optional(`${path}.nominalLevel`, value.nominalLevel, level);
  found.optional(`${path}.largestLevel`, value.largestLevel, level);
}

function band(found: IssueCollector, path: string, { lowHz, operatingHz, highHz }: Specification['band']): void {
  const low = found.required(`${path}.lowHz`, lowHz, 'frequencyHz');
  const operating = found.required(`${path}.operatingHz`, operatingHz, 'frequencyHz');
  const high = found.required(`${path}.highHz`, highHz, 'frequencyHz');
  if (!low || !operating || !high) return;
  if (highHz < lowHz) {
    found.add(
      'band_reversed',
      `${path}.highHz`,
      `The upper band edge (${typed(highHz, 'Hz')}) is below the lower (${typed(lowHz, 'Hz')}).`,
    );
  } else if (operatingHz < lowHz || operatingHz > highHz) {
    const edges = `${typed(lowHz, 'Hz')} to ${typed(highHz, 'Hz')}`;
    found.add('band_reversed', `${path}.operatingHz`, `The operating frequency has to lie in the band, ${edges}.`);
  }
}

const REQUIREMENT_RANGES: Readonly<Record<string, RangeName>> = {
  minimumGainDb: 'decibel',
  maximumGainDb: 'decibel',
  flatnessDb: 'decibelOrZero',
  upperCornerHz: 'frequencyHz',
  lowerCornerHz: 'frequencyHz',
  loopGainDb: 'decibel',
  inputNoise: 'positive',
  noiseFigureDb: 'decibelOrZero',
  outputOffsetV: 'positive',
  supplyCurrentA: 'positive',
  supplyPowerW: 'positive',
  costMicros: 'notNegative',
};

/** Two limits that no chain could meet together. */
function notBelow(found: IssueCollector, path: string, most?: number, least?: number, what = ''): void {
  if (least !== undefined && most !== undefined && most < least) {
    found.add('out_of_range', path, `Cannot be below ${least} ${what}.`);
  }
}

function requirements(found: IssueCollector, path: string, value: Requirements): void {
  for (const [name, range] of Object.entries(REQUIREMENT_RANGES)) {
    found.optional(`${path}.${name}`, value[name as keyof Requirements], range);
  }
  if (value.gainDb) {
    found.required(`${path}.gainDb.target`, value.gainDb.target, 'decibel');
    found.required(`${path}.gainDb.tolerance`, value.gainDb.tolerance, 'decibelOrZero');
  }
  const { minimumGainDb, maximumGainDb, lowerCornerHz, upperCornerHz } = value;
  notBelow(found, `${path}.maximumGainDb`, maximumGainDb, minimumGainDb, 'dB, the smallest gain asked for');
  notBelow(found, `${path}.upperCornerHz`, upperCornerHz, lowerCornerHz, 'Hz, the lower corner asked for');
  if (value.polarity) found.oneOf(`${path}.polarity`, value.polarity, ['in-phase', 'inverted']);
}

/** What is wrong with a specification. */
export function validateSpecification(found: IssueCollector, specification: Specification): void {
  const path = 'specification';
  source(found, `${path}.source`, specification.source);
  const { load, supply } = specification;
  if (load.resistanceOhm === undefined) {
    found.add('required', `${path}.load.resistanceOhm`, 'A load resistance is needed; an open load is stated as such.');
  }
  found.optional(`${path}.load.resistanceOhm`, load.resistanceOhm, 'resistanceOhm');
  found.optional(`${path}.load.capacitanceF`, load.capacitanceF, 'capacitanceOrZeroF');
  found.oneOf(`${path}.gainBasis`, specification.gainBasis, ['voltage', 'transducer', 'transimpedance']);
  band(found, `${path}.band`, specification.band);
  found.required(`${path}.supply.positiveV`, supply.positiveV, 'volt');
  found.required(`${path}.supply.negativeV`, supply.negativeV === 0 ? 0 : supply.negativeV, 'noVoltAbove');
  found.optional(`${path}.ambientK`, specification.ambientK, 'kelvin');
  requirements(found, `${path}.requirements`, specification.requirements);
}

const POLICY_RANGES: Readonly<Record<Exclude<keyof Policy, 'gbwCase'>, RangeName>> = {
  gbwDerating: 'derating',
  temperatureFactor: 'derating',
  slewDerating: 'derating',
  headroomTarget: 'target',
  bandwidthTarget: 'target',
  slewTarget: 'target',
  levelMarginDb: 'decibelOrZero',
  noiseMarginDb: 'decibelOrZero',
  budgetMargin: 'fraction',
  toleranceMargin: 'fraction',
  phaseMarginOverDeg: 'degrees',
  phaseMarginTightDeg: 'degrees',
};

/** What is wrong with a policy. */
export function validatePolicy(found: IssueCollector, policy: Policy): void {
  found.oneOf('policy.gbwCase', policy.gbwCase, GBW_CASES);
  for (const [name, range] of Object.entries(POLICY_RANGES)) {
    found.required(`policy.${name}`, policy[name as keyof Policy], range);
  }
  if (policy.phaseMarginTightDeg < policy.phaseMarginOverDeg) {
    const message = 'The phase margin that counts as tight cannot be below the one that counts as over.';
    found.add('out_of_range', 'policy.phaseMarginTightDeg', message);
  }
}
