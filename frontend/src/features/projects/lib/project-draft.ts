import type { Policy, Project } from '../../../api/types';

/** What the project form edits. */
export interface ProjectDraft {
  readonly code: string;
  readonly name: string;
  readonly description: string;
  readonly open: boolean;
  readonly currency: string;
  readonly buildQuantity: number | null;
  readonly memberIds: readonly string[];
  readonly policy: Policy | null;
}

export function newProjectDraft(ownId: string): ProjectDraft {
  return {
    code: '',
    name: '',
    description: '',
    open: true,
    currency: 'USD',
    buildQuantity: 100,
    memberIds: [ownId],
    policy: null,
  };
}

export function draftOf(project: Project): ProjectDraft {
  return {
    code: project.code,
    name: project.name,
    description: project.description ?? '',
    open: project.open,
    currency: project.currency,
    buildQuantity: project.buildQuantity,
    memberIds: project.members.map((member) => member.id),
    policy: project.policy,
  };
}

export type ProjectProblems = Readonly<Record<string, string>>;

/** What the form can tell by itself; paths as the server names them. */
export function projectProblems(draft: ProjectDraft): ProjectProblems {
  const problems: Record<string, string> = {};
  if (draft.code.trim() === '') problems['code'] = 'A short code is needed, for example PW-5.';
  if (draft.name.trim() === '') problems['name'] = 'A name is needed.';
  if (!/^[A-Z]{3}$/.test(draft.currency.trim())) problems['currency'] = 'Three capital letters (ISO 4217), e.g. USD.';
  if (draft.buildQuantity === null) problems['buildQuantity'] = 'The number of boards is needed: prices depend on it.';
  const { policy } = draft;
  if (policy && policy.phaseMarginTightDeg < policy.phaseMarginOverDeg) {
    problems['policy.phaseMarginTightDeg'] = 'Must not be below the limit for over.';
  }
  return problems;
}

/** The request body; the policy only where it may be set. */
export function projectBody(draft: ProjectDraft, withPolicy: boolean): Record<string, unknown> {
  const { policy, ...rest } = draft;
  return {
    ...rest,
    code: rest.code.trim(),
    name: rest.name.trim(),
    currency: rest.currency.trim(),
    ...(withPolicy && policy ? { policy } : {}),
  };
}
