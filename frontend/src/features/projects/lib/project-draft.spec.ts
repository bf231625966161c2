import { describe, expect, it } from 'vitest';

import { buildPolicy, buildProject } from '../../../testing/builders';
import { draftOf, newProjectDraft, projectBody, projectProblems } from './project-draft';

describe('projectProblems(draft)', () => {
  it('asks for code and name of a new project, and for nothing else', () => {
    expect(Object.keys(projectProblems(newProjectDraft('me')))).toEqual(['code', 'name']);
  });

  it('finds nothing in a saved project', () => {
    expect(projectProblems(draftOf(buildProject()))).toEqual({});
  });

  it.each(['', 'usd', 'US', 'DOLLAR', 'U$D'])('refuses the currency “%s”', (currency) => {
    expect(projectProblems({ ...draftOf(buildProject()), currency })).toHaveProperty('currency');
  });

  it('refuses phase margins in the wrong order', () => {
    const policy = { ...buildPolicy(), phaseMarginOverDeg: 50, phaseMarginTightDeg: 45 };
    expect(projectProblems({ ...draftOf(buildProject()), policy })).toHaveProperty(['policy.phaseMarginTightDeg']);
  });
});

describe('projectBody(draft, withPolicy)', () => {
  it('leaves the policy out for people who may not set it', () => {
    expect(projectBody(draftOf(buildProject()), false)).not.toHaveProperty('policy');
    expect(projectBody(draftOf(buildProject()), true)).toHaveProperty('policy.headroomTarget', 3);
  });
});
