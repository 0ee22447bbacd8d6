import { describe, expect, it } from 'vitest';
import { localMaxima, type Sampled } from './maxima';

const sampled = (u: number[], f: (u: number) => number, df: (u: number) => number): Sampled => ({
  u,
  value: u.map(f),
  slope: u.map(df),
  at: (x) => ({ value: f(x), slope: df(x) }),
});

describe('localMaxima', () => {
  it('keeps a peak whose top lies a hair before a sample', () => {
    // the sample at 1 stands above both neighbours and already slopes down: it is not a second peak
    const top = 1 - 1e-6;
    const u = [0, 0.5, 1, 1.5, 2];
    const found = localMaxima(
      sampled(
        u,
        (x) => -((x - top) ** 2),
        (x) => -2 * (x - top),
      ),
    );
    expect(found).toHaveLength(1);
    expect(found[0].u).toBeCloseTo(top, 9);
    expect(found[0].edge).toBeNull();
  });

  it('counts a plateau once and a falling plateau not at all', () => {
    const u = [0, 1, 2, 3, 4, 5];
    const top = { u, value: [0, 1, 1, 1, 0, -1], slope: [1, 1, 0, 0, -1, -1] };
    const at = (x: number) => ({ value: x < 1 ? x : x <= 3 ? 1 : 4 - x, slope: x < 1 ? 1 : x < 3 ? 0 : -1 });
    expect(localMaxima({ ...top, at })).toHaveLength(1);
    const fall = { u, value: [3, 2, 2, 2, 1, 0], slope: [-1, 0, 0, 0, -1, -1] };
    expect(localMaxima({ ...fall, at }).map((m) => m.edge)).toEqual(['low']);
  });
});
