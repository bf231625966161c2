import type { GainBasis, Source, Specification } from '../../../api/types';

/** A beginning that every field of can be changed: 50 Ω source, 1 kΩ load, ±5 V; no requirement is invented. */
export const EMPTY_SPECIFICATION: Specification = {
  source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf' },
  load: { resistanceOhm: 1000 },
  gainBasis: 'voltage',
  band: { lowHz: 100e3, operatingHz: 1e6, highHz: 2e6 },
  supply: { positiveV: 5, negativeV: -5 },
  requirements: {},
};

/** The other kind of source with plausible parts; a level in volts says nothing in amperes and is dropped. */
export function sourceOfKind(kind: Source['kind'], present: Source): Source {
  if (kind === present.kind) return present;
  return kind === 'voltage'
    ? { kind, resistanceOhm: 50, levelKind: 'peak-emf' }
    : { kind, resistanceOhm: 1e8, capacitanceF: 10e-12 };
}

/** A gain in Ω needs a current, a gain in volts a voltage. */
export function withSourceKind(specification: Specification, kind: Source['kind']): Specification {
  const source = sourceOfKind(kind, specification.source);
  const gainBasis: GainBasis = kind === 'current' ? 'transimpedance' : 'voltage';
  return kind === specification.source.kind ? specification : { ...specification, source, gainBasis };
}

export function gainBasesOf(specification: Specification): GainBasis[] {
  if (specification.source.kind === 'current') return ['transimpedance'];
  return specification.load.resistanceOhm === null ? ['voltage'] : ['voltage', 'transducer'];
}
