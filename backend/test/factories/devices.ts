import type { Agent } from '../create-test-app';

let counter = 0;

/** A voltage-feedback amplifier as a designer would type it from an invented datasheet. */
export function voltageFeedbackBody(overrides: Record<string, unknown> = {}): Record<string, unknown> {
  counter += 1;
  return {
    kind: 'voltage-feedback',
    partNumber: `TSTV-${counter}`,
    maker: 'Testbench Semiconductor',
    grade: 'general-purpose',
    package: 'SOT-23-5',
    lifecycle: 'active',
    channels: 1,
    gainBandwidthHz: { min: 75e6, typ: 100e6, condition: 'G = 10, RL = 1 kΩ', page: '4' },
    minimumStableGain: 1,
    phaseMarginDeg: 60,
    slewRateVPerS: { typ: 55e6, page: '4' },
    supplyCurrentA: { typ: 4e-3, page: '3' },
    ...overrides,
  };
}

export function currentFeedbackBody(overrides: Record<string, unknown> = {}): Record<string, unknown> {
  counter += 1;
  return {
    kind: 'current-feedback',
    partNumber: `TSTC-${counter}`,
    grade: 'rf',
    channels: 1,
    referenceBandwidthHz: { min: 150e6, typ: 180e6, page: '5' },
    referenceNoiseGain: 3,
    referenceFeedbackOhm: 600,
    ...overrides,
  };
}

export async function createDevice(agent: Agent, overrides: Record<string, unknown> = {}): Promise<DeviceAnswer> {
  const response = await agent.post('/api/devices').send(voltageFeedbackBody(overrides)).expect(201);
  return response.body as DeviceAnswer;
}

export interface DeviceAnswer {
  readonly id: string;
  readonly version: number;
  readonly partNumber: string;
  readonly [key: string]: unknown;
}
