import { describe, expect, it } from 'vitest';

import type { Draft } from './draft';
import { historyReducer, isDirty, redoLabel, startHistory, undoLabel, type History } from './history';
import { EMPTY_SPECIFICATION } from './specification-defaults';

const named = (name: string): Draft => ({ name, stages: [], specification: EMPTY_SPECIFICATION });
const begin = () => startHistory({ draft: named('start'), optionVersion: 3, chainVersion: 1 });

function edit(history: History, name: string, mergeKey?: string): History {
  return historyReducer(history, { type: 'edit', draft: named(name), label: `to ${name}`, mergeKey });
}

const undo = (history: History) => historyReducer(history, { type: 'undo' });
const redo = (history: History) => historyReducer(history, { type: 'redo' });

describe('historyReducer', () => {
  it('undoes and redoes edit by edit, with the name of what is undone', () => {
    const edited = edit(edit(begin(), 'a'), 'b');
    expect(undoLabel(edited)).toBe('to b');
    const back = undo(edited);
    expect(back.present.name).toBe('a');
    expect(redoLabel(back)).toBe('to b');
    expect(undo(back).present.name).toBe('start');
    expect(redo(redo(undo(back))).present.name).toBe('b');
  });

  it('stays where it is when there is nothing to undo or redo', () => {
    const history = begin();
    expect(undo(history)).toBe(history);
    expect(redo(history)).toBe(history);
  });

  it('takes a run of typing as one step, until it is settled', () => {
    const typed = edit(edit(edit(begin(), '1', 'gain'), '12', 'gain'), '123', 'gain');
    expect(undo(typed).present.name).toBe('start');
    const twice = edit(historyReducer(typed, { type: 'settle' }), '1234', 'gain');
    expect(undo(twice).present.name).toBe('123');
  });

  it('does not merge edits of different fields', () => {
    const history = edit(edit(begin(), 'a', 'gain'), 'b', 'load');
    expect(undo(history).present.name).toBe('a');
  });

  it('drops what could be redone once something new is edited', () => {
    const history = edit(undo(edit(begin(), 'a')), 'b');
    expect(redoLabel(history)).toBeNull();
  });

  it('is clean again after undo to the base, and after saving', () => {
    const edited = edit(begin(), 'a');
    expect(isDirty(edited)).toBe(true);
    expect(isDirty(undo(edited))).toBe(false);
    const saved = historyReducer(edited, {
      type: 'saved',
      base: { draft: named('a'), optionVersion: 4, chainVersion: 1 },
    });
    expect(isDirty(saved)).toBe(false);
    expect(undo(saved).present.name).toBe('start');
    expect(isDirty(undo(saved))).toBe(true);
  });

  it('keeps what was typed while the save was under way', () => {
    const history = edit(edit(begin(), 'a'), 'b');
    const saved = historyReducer(history, {
      type: 'saved',
      base: { draft: named('a'), optionVersion: 4, chainVersion: 1 },
    });
    expect(saved.present.name).toBe('b');
    expect(isDirty(saved)).toBe(true);
  });
});
