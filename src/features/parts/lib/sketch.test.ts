import { describe, expect, it } from 'vitest';
import { sketchOf } from './sketch';

describe('the picture of what is typed', () => {
  it('draws factors from nothing to the catalogue value', () => {
    const sketch = sketchOf('bias_curve', [
      [0, 1],
      [5, 0.5],
    ]);
    expect(sketch?.edges).toEqual({ left: 0, right: 5, bottom: 0, top: 1 });
    expect(sketch?.points).toEqual([
      [0, 1],
      [1, 0.5],
    ]);
  });

  it('draws tables over decades, a measured one by |Z|', () => {
    expect(
      sketchOf('impedance_table', [
        [1e4, 3, -4],
        [1e6, 0.3, 0.4],
        [1e8, 30, 40],
      ])?.points.map((point) => point.map((x) => Number(x.toFixed(3)))),
    ).toEqual([
      [0, 0.5],
      [0.5, 0],
      [1, 1],
    ]);
  });

  it('waits while there is no line to draw', () => {
    expect(sketchOf('bias_curve', [[0, 1]])).toBeNull();
    expect(
      sketchOf('esr_table', [
        [0, 1],
        [1e3, 2],
      ]),
    ).toBeNull();
    expect(
      sketchOf('temperature_curve', [
        [5, 1],
        [5, 0.9],
      ]),
    ).toBeNull();
  });
});
