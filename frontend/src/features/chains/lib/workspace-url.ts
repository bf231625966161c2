import { GBW_CASES, type GbwCase } from '../../../api/types';

export const SECTIONS = ['ledger', 'response'] as const;
export type Section = (typeof SECTIONS)[number];

export function isSection(text: string | undefined): text is Section {
  return SECTIONS.some((section) => section === text);
}

/** What of the screen is in the address; everything that is not there is the default. */
export interface WorkspaceAddress {
  readonly optionId: string | null;
  /** Null: the project's case. */
  readonly gbwCase: GbwCase | null;
  readonly stageId: string | null;
}

export function readAddress(search: URLSearchParams): WorkspaceAddress {
  const gbwCase = GBW_CASES.find((each) => each === search.get('case')) ?? null;
  return { optionId: search.get('option'), gbwCase, stageId: search.get('stage') };
}

export function writeAddress(search: URLSearchParams, change: Partial<WorkspaceAddress>): URLSearchParams {
  const address = { ...readAddress(search), ...change };
  const next = new URLSearchParams(search);
  const entries = { option: address.optionId, case: address.gbwCase, stage: address.stageId };
  for (const [key, value] of Object.entries(entries)) {
    if (value === null) next.delete(key);
    else next.set(key, value);
  }
  return next;
}
