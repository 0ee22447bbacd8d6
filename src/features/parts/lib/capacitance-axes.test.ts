import { describe, expect, it } from 'vitest';
import { bandPath, capacitanceAxes, heightOf, linePath } from './capacitance-axes';
import type { CurvePoint } from './capacitance-curves';

const point = (x: number, value: number, spread = 0): CurvePoint => ({
  x,
  capacitance_F: value,
  low_F: value * (1 - spread),
  high_F: value * (1 + spread),
  estimated: spread > 0,
});
const curve = (...chosen: CurvePoint[]) => ({ range: [0, 4] as const, chosen, alone: [] });

describe('the paper of a capacitance chart', () => {
  it.each([
    [22e-6, 25e-6],
    [10e-6, 12e-6],
    [1e-9, 1.2e-9],
    [470e-6, 600e-6],
  ])('of %d F ends at a round value with room above the curve', (catalogue_F, top_F) => {
    const { y, rows } = capacitanceAxes(curve(), catalogue_F, 300);
    expect(y.high).toBeCloseTo(top_F, 15);
    expect(rows[0]).toBe(0);
    expect(rows.length).toBeLessThan(8);
    expect(y.high).toBeGreaterThanOrEqual(catalogue_F * 1.1 * (1 - 1e-9));
  });

  it('holds what lies above the catalogue value', () => {
    const axes = capacitanceAxes(curve(point(0, 1e-6, 0.22), point(4, 1e-6, 0.22)), 1e-6, 300);
    expect(heightOf(axes, 1.22e-6)).toBeGreaterThan(9);
    expect(heightOf(axes, 0)).toBe(axes.y.length);
  });

  it('draws lines left to right and bands there and back, or none', () => {
    const points = [point(0, 1e-6), point(4, 0)];
    const axes = capacitanceAxes(curve(...points), 1e-6, 300);
    expect(linePath(axes, points)).toBe('M0.0 30.7L300.0 184.0');
    expect(bandPath(axes, points)).toBe('');
    expect(bandPath(axes, [point(0, 1e-6, 0.1), point(4, 1e-6, 0.1)]).split('L')).toHaveLength(4);
  });
});
