import { describe, expect, it } from 'vitest';
import { smoothed, worstSwitching } from './switching';

const turns = [
  [0, 0],
  [1, 5],
  [2, 2],
  [3, 3],
  [Number.POSITIVE_INFINITY, 2.5],
] as const;

describe('the worst switching', () => {
  it('is on as long ago as the response rises, and ends on for a fall', () => {
    const { edges, peak_s } = worstSwitching({ turns: [...turns], variation_ohm: 9.5 }, 'fall', 10, 0, false);
    expect(peak_s).toBe(3);
    expect(edges).toEqual([
      [0, 1],
      [1, 0],
      [2, 1],
    ]);
  });

  it('is on as long ago as it falls for a rise, from as far back as is asked, and ends off', () => {
    const { edges, peak_s } = worstSwitching({ turns: [...turns], variation_ohm: 9.5 }, 'rise', 10, 0, false);
    expect(peak_s).toBe(10);
    expect(edges).toEqual([
      [0, 1],
      [7, 0],
      [8, 1],
      [9, 0],
    ]);
  });

  it('opens a notch for a jump at the end of the edge', () => {
    const jumps = [
      [0, 0],
      [1, 5],
      [1, 3],
      [4, 6],
      [Number.POSITIVE_INFINITY, 6],
    ] as const;
    const { edges, peak_s } = worstSwitching({ turns: [...jumps], variation_ohm: 10 }, 'fall', 10, 1, true);
    expect(peak_s).toBe(4);
    expect(edges.map(([, level]) => level)).toEqual([1, 0, 1]);
    expect(edges[1][0]).toBe(3);
    expect(edges[2][0] - edges[1][0]).toBeCloseTo(1e-5, 12);
  });
});

describe('a switching with edges that take their time', () => {
  it('goes up and down straight', () => {
    const corners = smoothed(
      [
        [0, 1],
        [5, 0],
      ],
      2,
      1,
    );
    expect(corners).toEqual([
      [0, 0],
      [1, 2],
      [5, 2],
      [6, 0],
    ]);
  });

  it('does not get all the way when edges overlap', () => {
    const corners = smoothed(
      [
        [0, 1],
        [0.25, 0],
      ],
      2,
      1,
    );
    expect(corners).toEqual([
      [0, 0],
      [0.25, 0.5],
      [1, 0.5],
      [1.25, 0],
    ]);
  });

  it('jumps without a rise time, and is nothing without edges', () => {
    expect(smoothed([[3, 1]], 2, 0)).toEqual([
      [3, 0],
      [3, 2],
    ]);
    expect(smoothed([], 2, 1)).toEqual([[0, 0]]);
  });
});
