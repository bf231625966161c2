import type { ChainInput, Device } from '../types';
import { ReceiverOption, receiver } from './ultrasonic-receiver.test-support';

/** What the hand table leaves open, entered so that every check can be judged without changing a hand figure. */
const AMPLIFIER = {
  headroomPositiveV: { max: 1.2 },
  headroomNegativeV: { max: 1.2 },
  outputCurrentA: { min: 30e-3 },
  supplyVoltageV: { min: 5, max: 12 },
  inputOffsetVoltageV: { max: 0 },
  inputBiasCurrentA: { max: 0 },
  invertingBiasCurrentA: { max: 0 },
  voltageNoiseVPerRtHz: { typ: 1e-9 },
  currentNoiseAPerRtHz: { typ: 0 },
  invertingCurrentNoiseAPerRtHz: { typ: 0 },
  verified: true,
} as const;

const pageOfGbw = (device: Device): Device =>
  device.kind === 'voltage-feedback'
    ? { ...device, gainBandwidthHz: { ...device.gainBandwidthHz, page: '4' } }
    : device;

/** The invented receiver with its hand assumptions and complete device data; all its devices may be proposed. */
export function completeReceiver(option: ReceiverOption): ChainInput {
  const input = receiver(option);
  const devices = input.devices.map((device) => pageOfGbw({ ...device, ...AMPLIFIER } as Device));
  const names = ['Preamplifier', 'Gain', 'Post gain', 'Driver'];
  const stages = input.stages.map((stage, index) => ({ ...stage, name: names[index] ?? 'Driver' }));
  // The hand table leaves the noise of the 1 kΩ resistors out; the limit is wide enough for them.
  const requirements = { ...input.specification.requirements, inputNoise: 10e-9 };
  return { ...input, devices, stages, specification: { ...input.specification, requirements } };
}
