import { randomUUID } from 'node:crypto';
import type { Agent } from '../create-test-app';

export interface Row {
  readonly id: string;
  readonly version: number;
}

interface ChainAnswer extends Row {
  readonly options: readonly Row[];
}

export function projectBody(overrides: Record<string, unknown> = {}): Record<string, unknown> {
  return { code: 'TB-1', name: 'Test bench', open: true, currency: 'USD', buildQuantity: 250, ...overrides };
}

export async function createProject(agent: Agent, overrides: Record<string, unknown> = {}): Promise<Row> {
  const response = await agent.post('/api/projects').send(projectBody(overrides)).expect(201);
  return response.body as Row;
}

export function specification(overrides: Record<string, unknown> = {}): Record<string, unknown> {
  return {
    source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', nominalLevel: 1e-3, largestLevel: 1e-3 },
    load: { resistanceOhm: 1000 },
    gainBasis: 'voltage',
    band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
    supply: { positiveV: 5, negativeV: -5 },
    requirements: { gainDb: { target: 20, tolerance: 1 } },
    ...overrides,
  };
}

export async function createChain(agent: Agent, projectId: string, overrides = {}): Promise<ChainAnswer> {
  const body = { name: 'Receive chain', specification: specification(), ...overrides };
  const response = await agent.post(`/api/projects/${projectId}/chains`).send(body).expect(201);
  return response.body as ChainAnswer;
}

export function invertingStage(deviceId: string, overrides: Record<string, unknown> = {}): Record<string, unknown> {
  return {
    id: randomUUID(),
    name: 'Gain',
    kind: 'voltage-feedback',
    topology: 'inverting',
    deviceId,
    wantedGain: -10,
    feedbackOhm: 1000,
    gainOhm: 100,
    ...overrides,
  };
}

export function rcStage(overrides: Record<string, unknown> = {}): Record<string, unknown> {
  return { id: randomUUID(), name: 'Filter', kind: 'rc-section', seriesOhm: 100, shuntF: 1e-12, ...overrides };
}
