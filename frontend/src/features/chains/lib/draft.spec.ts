import { describe, expect, it } from 'vitest';

import type { RcSectionStage } from '../../../api/types';
import { addStage, applyRemedy, duplicateStage, moveStage, neighbourOf, removeStage, type Draft } from './draft';
import { EMPTY_SPECIFICATION } from './specification-defaults';

function stage(id: string): RcSectionStage {
  return { id, name: id.toUpperCase(), kind: 'rc-section', seriesOhm: 100 };
}

function draftOf(...ids: string[]): Draft {
  return { name: 'Baseline', stages: ids.map(stage), specification: EMPTY_SPECIFICATION };
}

const order = (draft: Draft) => draft.stages.map((each) => each.id).join(' ');

describe('edits of a draft', () => {
  it('adds behind the stage named, and at the end without one', () => {
    expect(order(addStage(draftOf('a', 'b'), stage('x'), 'a'))).toBe('a x b');
    expect(order(addStage(draftOf('a', 'b'), stage('x'), null))).toBe('a b x');
  });

  it('puts a duplicate right behind its original, under its own id', () => {
    const draft = duplicateStage(draftOf('a', 'b'), 'a', 'a2');
    expect(order(draft)).toBe('a a2 b');
    expect(draft.stages[1]).toMatchObject({ name: 'A', seriesOhm: 100 });
  });

  it('moves in both directions and stops at the ends', () => {
    expect(order(moveStage(draftOf('a', 'b', 'c'), 'a', 2))).toBe('b c a');
    expect(order(moveStage(draftOf('a', 'b', 'c'), 'c', 0))).toBe('c a b');
    expect(order(moveStage(draftOf('a', 'b', 'c'), 'c', 9))).toBe('a b c');
  });

  it('names the stage to select after a removal', () => {
    const draft = draftOf('a', 'b', 'c');
    expect(neighbourOf(draft, 'b')).toBe('c');
    expect(neighbourOf(draft, 'c')).toBe('b');
    expect(neighbourOf(removeStage(removeStage(draft, 'a'), 'b'), 'c')).toBeNull();
  });
});

describe('applyRemedy', () => {
  it('replaces the one stage by two and keeps the others', () => {
    expect(order(applyRemedy(draftOf('a', 'b', 'c'), 'b', [stage('b'), stage('b2')]))).toBe('a b b2 c');
  });

  it('takes a whole chain as it is', () => {
    expect(order(applyRemedy(draftOf('a', 'b'), 'b', [stage('b'), stage('a'), stage('n')]))).toBe('b a n');
  });

  it('changes nothing for a stage that is no longer there', () => {
    const draft = draftOf('a');
    expect(applyRemedy(draft, 'gone', [stage('x')])).toBe(draft);
  });
});
