import type { BankLine } from '@shared/schemas/rail.schema';

/** A bank line with a key that stays when it is edited. */
export type DraftLine = BankLine & { key: string };

export interface BankHistory {
  past: DraftLine[][];
  lines: DraftLine[];
  future: DraftLine[][];
  /** The last count step, so that a held key is one step to undo. */
  lastStep: { key: string; at: number } | null;
}

export type BankEdit =
  | { type: 'count'; key: string; count: number; at: number }
  | { type: 'add'; line: DraftLine }
  | { type: 'remove'; key: string }
  | { type: 'change'; key: string; patch: Partial<BankLine> }
  | { type: 'replace'; lines: DraftLine[] }
  | { type: 'undo' }
  | { type: 'redo' }
  /** The server's state takes over; nothing before it can be undone. */
  | { type: 'reset'; lines: DraftLine[] };

const MOST_STEPS = 200;
/** Count steps on one line within this time belong together, ms. */
const TOGETHER_MS = 700;
const MOST_OF_ONE = 9999;

export const startHistory = (lines: DraftLine[]): BankHistory => ({
  past: [],
  lines,
  future: [],
  lastStep: null,
});

let serial = 0;
/** Gives each line of a saved bank its key. */
export const keyed = (bank: readonly BankLine[]): DraftLine[] =>
  bank.map((line) => ({ ...line, key: `line-${++serial}` }));

/** What is saved: the lines without their keys. */
export const savedBank = (lines: readonly DraftLine[]): BankLine[] =>
  lines.map(({ key: _key, ...line }) => line);

/** Two lines that the server would take for the same: equal part, mount, distance and side. */
export const isSameLine = (a: BankLine, b: BankLine): boolean =>
  a.partId === b.partId &&
  a.mount_H === b.mount_H &&
  a.recipeId === b.recipeId &&
  a.distance_m === b.distance_m &&
  a.side === b.side;

export function editBank(state: BankHistory, edit: BankEdit): BankHistory {
  switch (edit.type) {
    case 'undo': {
      const previous = state.past.at(-1);
      if (!previous) return state;
      return {
        past: state.past.slice(0, -1),
        lines: previous,
        future: [state.lines, ...state.future],
        lastStep: null,
      };
    }
    case 'redo': {
      const [next, ...future] = state.future;
      if (!next) return state;
      return { past: [...state.past, state.lines], lines: next, future, lastStep: null };
    }
    case 'reset':
      return startHistory(edit.lines);
    case 'count': {
      const count = Math.min(MOST_OF_ONE, Math.max(0, Math.round(edit.count)));
      const line = state.lines.find((one) => one.key === edit.key);
      if (!line || line.count === count) return state;
      const lines = state.lines.map((one) => (one.key === edit.key ? { ...one, count } : one));
      const together = state.lastStep?.key === edit.key && edit.at - state.lastStep.at < TOGETHER_MS;
      const past = together ? state.past : remember(state);
      return { past, lines, future: [], lastStep: { key: edit.key, at: edit.at } };
    }
    case 'add':
      return changed(state, [...state.lines, edit.line]);
    case 'remove':
      return changed(
        state,
        state.lines.filter((line) => line.key !== edit.key),
      );
    case 'change':
      return changed(
        state,
        state.lines.map((line) => (line.key === edit.key ? { ...line, ...edit.patch } : line)),
      );
    case 'replace':
      return changed(state, edit.lines);
  }
}

const remember = (state: BankHistory): DraftLine[][] => [...state.past, state.lines].slice(-MOST_STEPS);

const changed = (state: BankHistory, lines: DraftLine[]): BankHistory => ({
  past: remember(state),
  lines,
  future: [],
  lastStep: null,
});
