import { describe, expect, it } from 'vitest';
import { type DraftLine, editBank, startHistory } from './bank-history';

const line = (key: string, count = 1): DraftLine => ({
  key,
  partId: '00000000-0000-4000-8000-000000000001',
  count,
  mount_H: null,
  recipeId: null,
  distance_m: null,
  side: 'top',
  locked: false,
});

describe('bank edits', () => {
  it('undoes and redoes in order', () => {
    let state = startHistory([line('a', 2)]);
    state = editBank(state, { type: 'count', key: 'a', count: 3, at: 0 });
    state = editBank(state, { type: 'add', line: line('b') });
    state = editBank(state, { type: 'undo' });
    expect(state.lines.map((one) => one.key)).toEqual(['a']);
    state = editBank(state, { type: 'undo' });
    expect(state.lines[0].count).toBe(2);
    state = editBank(state, { type: 'redo' });
    expect(state.lines[0].count).toBe(3);
    expect(editBank(startHistory([]), { type: 'undo' }).lines).toEqual([]);
  });

  it('takes a held key as one step, and a later press as another', () => {
    let state = startHistory([line('a', 1)]);
    for (let i = 0; i < 5; i++)
      state = editBank(state, { type: 'count', key: 'a', count: 2 + i, at: i * 50 });
    state = editBank(state, { type: 'count', key: 'a', count: 9, at: 5000 });
    state = editBank(state, { type: 'undo' });
    expect(state.lines[0].count).toBe(6);
    state = editBank(state, { type: 'undo' });
    expect(state.lines[0].count).toBe(1);
  });

  it('forgets what could be redone once something new is done, and never counts below zero', () => {
    let state = startHistory([line('a', 1)]);
    state = editBank(state, { type: 'count', key: 'a', count: 5, at: 0 });
    state = editBank(state, { type: 'undo' });
    state = editBank(state, { type: 'count', key: 'a', count: -3, at: 9000 });
    expect(state.lines[0].count).toBe(0);
    expect(state.future).toEqual([]);
  });
});
