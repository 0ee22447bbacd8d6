import { describe, expect, it } from 'vitest';
import { linearTicks, thinnedPath } from './linear-axis';

describe('a linear axis', () => {
  it('is marked at round places inside its ends', () => {
    expect(linearTicks(0, 1, 5)).toEqual([0, 0.2, 0.4, 0.6, 0.8, 1]);
    expect(linearTicks(-0.03, 0.021, 5)).toEqual([-0.02, 0, 0.02]);
    expect(linearTicks(0, 0.0003, 3)).toEqual([0, 0.0001, 0.0002, 0.0003]);
    expect(linearTicks(1, 1, 5)).toEqual([]);
  });

  it('keeps every swing of a curve with far more points than pixels', () => {
    const n = 20_000;
    const xs = Float64Array.from({ length: n }, (_, i) => i / n);
    const ys = Float64Array.from({ length: n }, (_, i) => (i === 12_345 ? 9 : i === 7 ? -4 : 0));
    const path = thinnedPath(
      xs,
      ys,
      [0, 1],
      (v) => v * 300,
      (v) => v,
    );
    const values = [...path.matchAll(/ (-?[\d.]+)/g)].map((m) => Number(m[1]));
    expect(Math.max(...values)).toBe(9);
    expect(Math.min(...values)).toBe(-4);
    expect(values.length).toBeLessThan(4 * 301);
    expect(path.startsWith('M')).toBe(true);
  });

  it('draws a window with one point beyond each end', () => {
    const xs = Float64Array.from([0, 1, 2, 3, 4, 5]);
    const path = thinnedPath(
      xs,
      xs,
      [1.5, 3.5],
      (v) => v,
      (v) => v,
    );
    expect(path).toBe('M1.00 1.00L2.00 2.00L3.00 3.00L4.00 4.00');
  });
});
