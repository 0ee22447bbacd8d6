import { describe, expect, it } from 'vitest';
import { readPointsOnce } from './points-memo';

describe('points that are read once', () => {
  it('are the same object while the text stays, and read anew when it changes', () => {
    const first = readPointsOnce('10k 3m', ['Hz', 'Ω']);
    const table = readPointsOnce('10k 3m 5m', ['Hz', 'Ω', 'Ω']);
    expect(readPointsOnce('10k 3m', ['Hz', 'Ω'])).toBe(first);
    expect(readPointsOnce('10k 3m 5m', ['Hz', 'Ω', 'Ω'])).toBe(table);
    expect(readPointsOnce('10k 4m', ['Hz', 'Ω'])).toMatchObject({ rows: [[1e4, 4e-3]] });
    expect(readPointsOnce('10k 3m', ['Hz', 'V'])).toMatchObject({ ok: true, rows: [[1e4, 3e-3]] });
    expect(first).toMatchObject({ rows: [[1e4, 3e-3]] });
  });
});
