import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { monotoneCubic } from './monotone-cubic';
import type { CurvePoints } from './part-behaviour';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });
const bias: CurvePoints = [
  [0, 1],
  [2, 0.97],
  [3, 0.8],
  [6.3, 0.45],
  [10, 0.3],
];
/** Rising x with any y. */
const anyPoints = fc
  .array(
    fc.tuple(fc.double({ min: 0.01, max: 10, noNaN: true }), fc.double({ min: -5, max: 5, noNaN: true })),
    {
      minLength: 2,
      maxLength: 12,
    },
  )
  .map((steps) => {
    let x = -3;
    return steps.map(([step, y]): [number, number] => {
      x += step;
      return [x, y];
    });
  });

describe('monotone cubic', () => {
  it('goes through its points and is level beyond both ends', () => {
    const at = monotoneCubic(bias, 'curve');
    for (const [x, y] of bias) expect(at(x)).toBe(y);
    expect(at(-1)).toBe(1);
    expect(at(1e6)).toBe(0.3);
  });

  it('reproduces a straight line, and a level one exactly', () => {
    const line = monotoneCubic(
      [-1, 0, 0.5, 4, 5].map((x) => [x, 3 - 0.25 * x] as const),
      'curve',
    );
    for (let x = -1; x <= 5; x += 0.01) expect(line(x)).toBeCloseTo(3 - 0.25 * x, 13);
    const level = monotoneCubic(
      [
        [0, 0.7],
        [1, 0.7],
        [9, 0.7],
      ],
      'curve',
    );
    for (let x = 0; x <= 9; x += 0.07) expect(level(x)).toBe(0.7);
  });

  it('has no corner at a point, unlike straight joins', () => {
    const at = monotoneCubic(bias, 'curve');
    for (const x of [2, 3, 6.3]) {
      const before = (at(x) - at(x - 1e-6)) / 1e-6;
      const after = (at(x + 1e-6) - at(x)) / 1e-6;
      expect(Math.abs(after - before)).toBeLessThan(1e-5);
      expect(before).toBeLessThan(-0.01);
    }
  });

  it('never leaves the span of two neighbours and falls wherever they fall', () => {
    fc.assert(
      fc.property(anyPoints, (points) => {
        const at = monotoneCubic(points, 'curve');
        for (let i = 0; i + 1 < points.length; i++) {
          const [[x0, y0], [x1, y1]] = [points[i], points[i + 1]];
          let previous = y0;
          for (let k = 1; k <= 40; k++) {
            const y = k === 40 ? at(x1) : at(x0 + ((x1 - x0) * k) / 40);
            // Rounding may step back by a few units in the last place, no more.
            expect(Math.sign(y1 - y0) * (y - previous)).toBeGreaterThanOrEqual(-1e-13);
            expect(y).toBeGreaterThanOrEqual(Math.min(y0, y1));
            expect(y).toBeLessThanOrEqual(Math.max(y0, y1));
            previous = y;
          }
        }
      }),
      { numRuns: 200, seed: 11 },
    );
  });

  it('names what it refuses', () => {
    expect(() => monotoneCubic([[0, 1]], 'bias_curve')).toThrow(fault('bias_curve'));
    expect(() =>
      monotoneCubic(
        [
          [0, 1],
          [0, 0.9],
        ],
        'bias_curve',
      ),
    ).toThrow(fault('bias_curve[1]'));
    expect(() =>
      monotoneCubic(
        [
          [0, 1],
          [2, 1],
          [1, 1],
        ],
        'c',
      ),
    ).toThrow(fault('c[2]'));
    expect(() =>
      monotoneCubic(
        [
          [0, Number.NaN],
          [1, 1],
        ],
        'c',
      ),
    ).toThrow(fault('c[0]'));
    expect(() =>
      monotoneCubic(
        [
          [0, 1],
          [Number.POSITIVE_INFINITY, 1],
        ],
        'c',
      ),
    ).toThrow(fault('c[1]'));
    expect(() => monotoneCubic(bias, 'c')(Number.NaN)).toThrow(fault('c'));
  });
});
