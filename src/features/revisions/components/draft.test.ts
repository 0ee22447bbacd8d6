import { railDocument } from '@shared/rail/document';
import { EMPTY_SETUP } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import { type Rail, searchSettingsSchema } from '@shared/schemas/rail.schema';
import { railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { describe, expect, it } from 'vitest';
import { draftOf, nextLetter } from './draft';

describe('nextLetter', () => {
  it.each([
    [null, 'A'],
    ['A', 'B'],
    ['Z', 'AA'],
    ['AZ', 'BA'],
    ['ZZ', 'AAA'],
  ])('after %s comes %s', (letter, next) => {
    expect(nextLetter(letter)).toBe(next);
  });
});

const part: Part = {
  id: 'p1',
  partNumber: 'C-1',
  description: '',
  technology: 'ceramic',
  dielectric: 'X7R',
  caseSize: '0402',
  capacitance_F: 1e-7,
  tolerance: 'K',
  rated_voltage_V: 16,
  esr_ohm: 0.02,
  esl_H: 3e-10,
  mount_H: 5e-10,
  height_mm: null,
  termination: 'standard',
  unit_cost: 0.01,
  area_mm2: 1,
  bias_curve: null,
  temperature_curve: null,
  ageing_percent_per_decade: null,
  esr_table: null,
  impedance_table: null,
  esr_tolerance_percent: null,
  esl_tolerance_percent: null,
  state: 'approved',
  version: 1,
  createdAt: '2026-01-01T00:00:00Z',
  updatedAt: '2026-01-01T00:00:00Z',
  updatedBy: null,
};
const rail = (id: string, count: number, holds = true): Rail => ({
  id,
  boardId: 'b',
  position: 0,
  version: 1,
  updatedAt: '2026-01-02T00:00:00Z',
  updatedBy: null,
  spec: {
    name: id.toUpperCase(),
    voltage_V: 1,
    target: { kind: 'flat', impedance_ohm: 0.1 },
    band_Hz: [1e4, 1e7],
    source: { kind: 'rl', resistance_ohm: 0.01, inductance_H: 1e-8 },
    observe: 'pins',
  },
  bank: [
    { partId: 'p1', count, mount_H: null, recipeId: null, distance_m: null, side: 'top', locked: false },
  ],
  search: searchSettingsSchema.parse({}),
  summary: {
    engineVersion: '1',
    holds,
    tightest: null,
    catalogue: null,
    worst: null,
    missing: null,
    parts: count,
    kinds: 1,
    cost: null,
    area_mm2: null,
    error: null,
  },
});
/** As a revision comes from the server: through JSON and the schema. */
const cut = (...rails: Rail[]) => ({
  letter: 'B',
  railResults: rails.map(({ id, spec, bank }) => ({
    railId: id,
    document: railDocumentSchema.parse(
      JSON.parse(JSON.stringify(railDocument(spec, bank, new Map([['p1', part]]), EMPTY_SETUP))),
    ),
  })),
});

describe('draftOf', () => {
  const [a, b] = [rail('a', 2), rail('b', 3, false)];

  it('finds nothing changed in what was cut, whenever it was saved', () => {
    const saved = { ...a, version: 9, updatedAt: '2027-01-01T00:00:00Z' };
    const draft = draftOf({ rails: [saved, b], parts: [part] }, EMPTY_SETUP, cut(a, b));
    expect(draft).toMatchObject({ latest: 'B', next: 'C', added: [], edited: [], byParts: [], deleted: [] });
    expect(draft.short).toEqual(['B']);
  });

  it('names what is short in its worst case or with one part open, though it holds in service', () => {
    const tightest = { frequency_Hz: 1e6, impedance_ohm: 1, target_ohm: 0.5, headroom_dB: -6 };
    const summary = {
      ...a.summary,
      worst: { holds: false, tightest, corner: 'cold' },
      missing: { holds: true, tightest, part: 'C-1' },
    };
    const draft = draftOf({ rails: [{ ...a, summary }], parts: [part] }, EMPTY_SETUP, null);
    expect(draft).toMatchObject({ short: [], worst: ['A'], missing: [] });
  });

  it('tells edited, added and deleted rails apart', () => {
    const draft = draftOf({ rails: [rail('a', 5), rail('c', 1)], parts: [part] }, EMPTY_SETUP, cut(a, b));
    expect(draft).toMatchObject({ edited: ['A'], added: ['C'], deleted: ['B'], byParts: [] });
  });

  it('tells a changed part from an edit', () => {
    const draft = draftOf({ rails: [a], parts: [{ ...part, esr_ohm: 0.5 }] }, EMPTY_SETUP, cut(a));
    expect(draft).toMatchObject({ edited: [], byParts: ['A'] });
  });

  it('has all rails new before the first revision', () => {
    expect(draftOf({ rails: [a, b], parts: [part] }, EMPTY_SETUP, null)).toMatchObject({
      latest: null,
      next: 'A',
      total: 2,
    });
  });
});
