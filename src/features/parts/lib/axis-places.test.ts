import { describe, expect, it } from 'vitest';
import { controlStep, placeOn, ticksWithEnds } from './axis-places';

describe('places on a level scale', () => {
  const axis = { low: -55, high: 125, length: 360 };

  it('go from one end to the other', () => {
    expect(placeOn(axis, -55)).toBe(0);
    expect(placeOn(axis, 35)).toBe(180);
    expect(placeOn(axis, 125)).toBe(360);
  });

  it('label both ends and what keeps clear of them', () => {
    expect(ticksWithEnds(axis, 4, 51)).toEqual([-55, 0, 50, 125]);
    expect(ticksWithEnds({ low: 0, high: 6.3, length: 300 }, 4, 40)).toEqual([0, 2, 4, 6.3]);
  });
});

describe('the step of a control', () => {
  it.each([
    [6.3, 0.1],
    [4, 0.05],
    [2.5, 0.02],
    [16, 0.2],
    [25, 0.2],
    [50, 0.5],
    [100, 1],
  ])('for up to %d is %d, and ends there', (most, step) => {
    expect(controlStep(most)).toBe(step);
    expect(most / step).toBeCloseTo(Math.round(most / step), 9);
  });

  it('parts an odd rating by a hundred', () => {
    expect(controlStep(7.77)).toBeCloseTo(0.0777, 12);
  });
});
