import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { drawnHeights } from './drawn-heights';
import { scaleBar } from './scale-bar';
import { spread } from './spread';

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

describe('heights of layers', () => {
  it('are to scale where all can be seen', () => {
    const { heights, scale, isThickened } = drawnHeights([1e-4, 2e-4, 1e-4], 400, 3);
    expect(heights.map(Math.round)).toEqual([100, 200, 100]);
    expect(scale).toBeCloseTo(1e6, 3);
    expect(isThickened).toEqual([false, false, false]);
  });

  it('fill the drawing, thin ones at their least, the others in proportion', () => {
    const thickness = fc.array(fc.double({ min: 1e-6, max: 2e-3, noNaN: true }), {
      minLength: 1,
      maxLength: 60,
    });
    fc.assert(
      fc.property(thickness, (layers) => {
        const { heights, scale, isThickened } = drawnHeights(layers, 400, 3);
        expect(sum(heights)).toBeCloseTo(400, 6);
        heights.forEach((height, i) => {
          expect(height).toBeGreaterThanOrEqual(3 - 1e-9);
          if (!isThickened[i]) expect(height).toBeCloseTo(layers[i] * scale, 6);
        });
      }),
    );
  });

  it('are all alike where there is no room', () => {
    expect(drawnHeights([1e-6, 1e-3, 1e-6], 6, 3).heights).toEqual([3, 3, 3]);
  });
});

describe('places of labels', () => {
  it('are what they want where they do not collide', () => {
    expect(spread([10, 40, 90], 15, 0, 100)).toEqual([10, 40, 90]);
  });

  it('part evenly around where they collide, and stay in', () => {
    expect(spread([50, 50], 16, 0, 100)).toEqual([42, 58]);
    expect(spread([0, 1, 2], 15, 7, 100)).toEqual([7, 22, 37]);
    expect(spread([99, 100], 15, 0, 100)).toEqual([85, 100]);
    expect(spread([], 15, 0, 100)).toEqual([]);
  });

  it('keep their order and their distance', () => {
    const wanted = fc.array(fc.double({ min: 0, max: 300, noNaN: true }), { minLength: 1, maxLength: 15 });
    fc.assert(
      fc.property(wanted, (places) => {
        const put = spread(
          places.toSorted((a, b) => a - b),
          15,
          7,
          330,
        );
        put.forEach((place, i) => {
          expect(place).toBeGreaterThanOrEqual(7 - 1e-9);
          expect(place).toBeLessThanOrEqual(330 + 1e-9);
          if (i > 0) expect(place - put[i - 1]).toBeGreaterThanOrEqual(15 - 1e-9);
        });
      }),
    );
  });
});

describe('the scale', () => {
  it('is the longest round length that fits', () => {
    expect(scaleBar(100_000, 110)).toEqual({ length_m: 1e-3, px: 100 });
    expect(scaleBar(100_000, 90).length_m).toBe(0.5e-3);
    expect(scaleBar(1, 1).length_m).toBe(5e-3);
  });
});
