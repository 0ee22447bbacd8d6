import type { BankLine } from '@shared/schemas/rail.schema';
import { describe, expect, it } from 'vitest';
import { bankDifferences } from './bank-diff';

const line = (n: number, count: number, distance_m: number | null = null): BankLine => ({
  partId: `00000000-0000-4000-8000-00000000000${n}`,
  count,
  mount_H: null,
  recipeId: null,
  distance_m,
  side: 'top',
  locked: false,
});

describe('where two banks differ', () => {
  it('names counts, lines that only one has, and other mounts', () => {
    const found = bankDifferences(
      [line(1, 2), line(2, 3), line(4, 5, 0.01)],
      [line(1, 4), line(3, 1), line(4, 5)],
      new Map(),
    );
    expect(found.map(({ mine, theirs }) => [mine, theirs])).toEqual([
      ['2', '4'],
      ['3', 'not there'],
      ['5, mounted otherwise', '5'],
      ['not there', '1'],
    ]);
  });

  it('says nothing where nothing differs', () => {
    expect(bankDifferences([line(1, 2)], [line(1, 2)], new Map())).toEqual([]);
  });
});
