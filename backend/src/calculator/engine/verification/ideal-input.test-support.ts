import type { ChainInput, Device, Stage } from '../types';

/** 300 dB: the ideal amplifier to 15 digits. */
const IDEAL_GAIN_DB = { typ: 300 };
const IDEAL_BANDWIDTH_HZ = { min: 1e15, typ: 1e15 };
const IDEAL_TRANSIMPEDANCE_OHM = { typ: 1e15 };

/** The same chain with ideal amplifiers; resistors, capacitors and input resistances stay. */
export function withIdealAmplifiers(input: ChainInput): ChainInput {
  return { ...input, devices: input.devices.map(idealDevice) };
}

function idealDevice(device: Device): Device {
  if (device.kind === 'voltage-feedback') {
    const rest = without(device, ['secondPoleHz', 'phaseMarginDeg', 'outputResistanceOhm']);
    return { ...rest, gainBandwidthHz: IDEAL_BANDWIDTH_HZ, openLoopGainDb: IDEAL_GAIN_DB };
  }
  if (device.kind === 'current-feedback') {
    const rest = without(device, ['secondPoleHz', 'outputResistanceOhm']);
    return { ...rest, referenceBandwidthHz: IDEAL_BANDWIDTH_HZ, openLoopTransimpedanceOhm: IDEAL_TRANSIMPEDANCE_OHM };
  }
  return device;
}

/** Coupling shorted and shunt capacitances removed, with ideal amplifiers: what the ideal gain is defined by. */
export function idealInput(input: ChainInput): ChainInput {
  const ideal = withIdealAmplifiers(input);
  const { source, load } = ideal.specification;
  return {
    ...ideal,
    specification: {
      ...ideal.specification,
      source: source.kind === 'current' ? { ...source, capacitanceF: 0 } : source,
      load: { resistanceOhm: load.resistanceOhm },
    },
    stages: ideal.stages.map((stage) => without(stage, CAPACITORS) as Stage),
    devices: ideal.devices.map((device) => without(device, DEVICE_CAPACITORS) as Device),
  };
}

const CAPACITORS = ['couplingF', 'seriesF', 'shuntF', 'strayF', 'feedbackF'];
const DEVICE_CAPACITORS = ['commonModeCapacitanceF', 'differentialCapacitanceF', 'lowerCornerHz', 'upperCornerHz'];

function without<T extends object>(value: T, names: readonly string[]): T {
  return Object.fromEntries(Object.entries(value).filter(([name]) => !names.includes(name))) as T;
}
