import type { ChainInput, DatasheetValue, Device, Load, Source, Stage } from '../types';

/** Every resistance times k and every capacitance over k: voltages, corners and loop gains stay as they are. */
export function scaleImpedances(input: ChainInput, k: number): ChainInput {
  const { specification } = input;
  return {
    ...input,
    specification: {
      ...specification,
      source: scaleSource(specification.source, k),
      load: scaleLoad(specification.load, k),
    },
    stages: input.stages.map((stage) => scaleByName(stage, k)),
    devices: input.devices.map((device) => scaleByName(device, k)),
  };
}

function scaleSource(source: Source, k: number): Source {
  return source.kind === 'voltage'
    ? { ...source, resistanceOhm: source.resistanceOhm * k }
    : { ...source, resistanceOhm: source.resistanceOhm * k, capacitanceF: source.capacitanceF / k };
}

function scaleLoad(load: Load, k: number): Load {
  return {
    resistanceOhm: load.resistanceOhm === null ? null : load.resistanceOhm * k,
    ...(load.capacitanceF === undefined ? {} : { capacitanceF: load.capacitanceF / k }),
  };
}

/** A name says its unit: …Ohm is a resistance, …F a capacitance. */
function scaleByName<T extends Stage | Device>(owner: T, k: number): T {
  const entries = Object.entries(owner).map(([name, value]) => {
    if (name.endsWith('Ohm')) return [name, timesValue(value as number | DatasheetValue | null, k)];
    if (name.endsWith('F')) return [name, timesValue(value as number | DatasheetValue | null, 1 / k)];
    return [name, value];
  });
  return Object.fromEntries(entries) as T;
}

function timesValue(value: number | DatasheetValue | null, k: number): unknown {
  if (value === null) return null;
  if (typeof value === 'number') return value * k;
  return { ...value, ...(value.typ === undefined ? {} : { typ: value.typ * k }) };
}
