import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { decadesAround, frequencyAt, impedanceScale, xOf } from './axis';

describe('the frequency axis', () => {
  it('goes from frequency to place and back', () => {
    const axis = { low_Hz: 1e4, high_Hz: 1e8, width: 600 };
    fc.assert(
      fc.property(fc.double({ min: 1e4, max: 1e8, noNaN: true }), (f) => {
        expect(frequencyAt(axis, xOf(axis, f)) / f).toBeCloseTo(1, 10);
      }),
    );
    expect(xOf(axis, 1e6)).toBeCloseTo(300, 9);
  });

  it('spans whole decades, and keeps a band that ends on one', () => {
    expect(decadesAround(1e4, 4e7)).toEqual([1e4, 1e8]);
    expect(decadesAround(1e4, 1e8)).toEqual([1e4, 1e8]);
    expect(decadesAround(2e5, 3e5)).toEqual([1e5, 1e6]);
  });

  it('cuts a curve that shoots far above the waterline', () => {
    const [low, high] = impedanceScale([2.5e-3, 50], [10e-3]);
    expect(low).toBeCloseTo(2e-3, 12);
    expect(high).toBeCloseTo(0.5, 12);
  });
});
