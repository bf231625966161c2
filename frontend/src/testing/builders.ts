import type { DeviceDto, Figure, OptionSummary, Policy, Project, Session, SessionUser } from '../api/types';

/** Rows as the server answers them, with everything invented; a test states only what it is about. */

export function buildUser(changes: Partial<SessionUser> = {}): SessionUser {
  return { id: 'user-1', name: 'Ilse Varga', email: 'ilse@example.test', roles: ['designer'], ...changes };
}

export function buildSession(changes: Partial<Session> = {}): Session {
  return { user: buildUser(), demo: false, setupNeeded: false, demoAccounts: [], version: '0.1.0', ...changes };
}

export function buildPolicy(): Policy {
  return {
    gbwCase: 'minimum',
    gbwDerating: 0.7,
    temperatureFactor: 1,
    slewDerating: 0.7,
    headroomTarget: 3,
    bandwidthTarget: 2,
    slewTarget: 2,
    levelMarginDb: 1,
    noiseMarginDb: 0.5,
    budgetMargin: 0.1,
    toleranceMargin: 0.2,
    phaseMarginOverDeg: 30,
    phaseMarginTightDeg: 45,
  };
}

export function buildProject(changes: Partial<Project> = {}): Project {
  return {
    id: 'project-1',
    code: 'PW-5',
    name: 'Thickness receiver',
    description: '',
    open: true,
    members: [{ id: 'user-1', name: 'Ilse Varga' }],
    policy: buildPolicy(),
    currency: 'USD',
    buildQuantity: 250,
    chainCount: 1,
    version: 1,
    updatedAt: '2026-01-05T10:00:00.000Z',
    can: { edit: true, setPolicy: false, createChain: true, delete: false },
    ...changes,
  };
}

export const ratio = (value: number, digits = 3): Figure => ({ value, unit: 'ratio', digits });

export function buildSummary(changes: Partial<OptionSummary> = {}): OptionSummary {
  return {
    verdict: 'over',
    lead: 'S2 spends more than it has.',
    text: 'At 7 MHz noise gain 11 uses 77.0 MHz of 75.0 MHz.',
    worstHeadroom: ratio(0.974),
    worstHeadroomStage: 'S2 Gain',
    gain: { value: 58.08, unit: 'dB', digits: 4 },
    cost: { amountMicros: 8_120_000, currency: 'USD' },
    costLimit: { amountMicros: 9_000_000, currency: 'USD' },
    ...changes,
  };
}

export function buildDevice(changes: Partial<DeviceDto> = {}): DeviceDto {
  const device = {
    id: 'device-1',
    kind: 'voltage-feedback',
    partNumber: 'MRWG-G072',
    maker: 'Marrowgate Devices',
    grade: 'general-purpose',
    channels: 1,
    verified: false,
    gainBandwidthHz: { min: 75e6, typ: 100e6, page: '4' },
    version: 3,
    quoteVersion: 0,
    enteredBy: { id: 'user-2', name: 'Teo Marsh' },
    verifiedBy: null,
    updatedAt: '2026-01-05T10:00:00.000Z',
    can: { edit: true, delete: true, verify: true, editQuote: true },
    ...changes,
  };
  return device as DeviceDto;
}
