import { describe, expect, it } from 'vitest';
import { localMaxima } from './maxima';

/** Samples a function with its slope on an even grid. */
function sampled(f: (u: number) => number, df: (u: number) => number, from: number, to: number, n: number) {
  const u = Array.from({ length: n }, (_, i) => from + ((to - from) * i) / (n - 1));
  return {
    u,
    value: u.map(f),
    slope: u.map(df),
    at: (place: number) => ({ value: f(place), slope: df(place) }),
  };
}

describe('local maxima', () => {
  it('finds a maximum between samples though no sample is higher than both neighbours', () => {
    const top = Math.PI / 2;
    const found = localMaxima(sampled(Math.sin, Math.cos, 1, 2.5, 3));
    expect(found).toHaveLength(1);
    expect(found[0].u).toBeCloseTo(top, 12);
    expect(found[0].value).toBeCloseTo(1, 14);
  });

  it('reports the edges where the function falls away from them, and nowhere else', () => {
    const found = localMaxima(sampled(Math.cos, (u) => -Math.sin(u), -3, 3, 60));
    expect(found.map((m) => m.edge)).toEqual([null]);
    const valley = localMaxima(
      sampled(
        (u) => u * u,
        (u) => 2 * u,
        -1,
        2,
        50,
      ),
    );
    expect(valley.map((m) => [m.edge, m.u])).toEqual([
      ['low', -1],
      ['high', 2],
    ]);
  });

  it('sees no peak on a plateau, nor on a falling one', () => {
    expect(
      localMaxima(
        sampled(
          () => 3,
          () => 0,
          0,
          1,
          20,
        ),
      ),
    ).toEqual([]);
    const noise = (u: number) => 1e-12 * Math.sin(50 * u);
    expect(localMaxima(sampled(noise, (u) => 5e-11 * Math.cos(50 * u), 0, 1, 200))).toEqual([]);
    // Falls, rests, falls again: the rest is not a peak.
    const f = (u: number) => (u < 1 ? 1 - u : u < 2 ? 0 : 2 - u);
    const df = (u: number) => (u < 1 ? -1 : u < 2 ? 0 : -1);
    expect(localMaxima(sampled(f, df, 0, 3, 31)).map((m) => m.edge)).toEqual(['low']);
  });

  it('takes no samples, or one', () => {
    expect(localMaxima(sampled(Math.sin, Math.cos, 0, 1, 0))).toEqual([]);
    expect(localMaxima({ u: [1], value: [2], slope: [0], at: () => ({ value: 2, slope: 0 }) })).toHaveLength(
      1,
    );
  });
});
