import { describe, expect, it } from 'vitest';
import { thinOut, withPoints } from './drawing';

const wave = {
  time_s: Array.from({ length: 1000 }, (_, i) => i),
  fall_V: Array.from({ length: 1000 }, (_, i) => Math.sin(i / 3) + (i === 517 ? 7 : 0)),
};

describe('a drawing thinned out', () => {
  it('keeps its ends, its extremes and the order of times', () => {
    const thin = thinOut(wave, 100);
    expect(thin.time_s.length).toBeLessThanOrEqual(100);
    expect(thin.time_s.length).toBeGreaterThan(90);
    expect([thin.time_s[0], thin.time_s.at(-1)]).toEqual([0, 999]);
    expect(Math.max(...thin.fall_V)).toBe(Math.max(...wave.fall_V));
    expect(Math.min(...thin.fall_V)).toBe(Math.min(...wave.fall_V));
    for (let i = 1; i < thin.time_s.length; i++) expect(thin.time_s[i]).toBeGreaterThan(thin.time_s[i - 1]);
  });

  it('is left alone when it is small enough', () => {
    expect(thinOut(wave, 1000)).toEqual(wave);
  });
});

describe('single points', () => {
  it('go in between, and not twice at one time', () => {
    const { time_s, fall_V } = withPoints({ time_s: [0, 1, 2], fall_V: [5, 6, 7] }, [
      [1.5, 9],
      [2, 7],
    ]);
    expect(time_s).toEqual([0, 1, 1.5, 2]);
    expect(fall_V).toEqual([5, 6, 9, 7]);
  });
});
