import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { conditionAt, quadratic } from './condition';
import { seededRandom } from './random';
import { tangentRows } from './tangent';

describe('condition on the node admittance', () => {
  const random = seededRandom(5);
  const signed = (): number => 2 * random() - 1;

  it('has the sign of target minus |Z| seen from the die, and radius Zt/|A|', () => {
    const shapes = new Set<number>();
    for (let i = 0; i < 3000; i++) {
      const zs = new Complex(0.01 * random(), 0.03 * random());
      const yd = i % 3 === 0 ? new Complex(0, 0) : new Complex(20 * random(), 80 * random());
      const zt = 0.002 + 0.04 * random();
      const c = conditionAt({ zsRe: zs.re, zsIm: zs.im, ydRe: yd.re, ydIm: yd.im }, zt);
      const y = new Complex(300 * random(), 300 * signed());
      const z = yd.add(zs.add(y.inverse()).inverse()).inverse().abs();
      const q = quadratic(c, y.re, y.im);
      if (Math.abs(z / zt - 1) > 1e-9) expect(q > 0).toBe(z < zt);
      shapes.add(Math.sign(c.a));
      expect(c.px * c.px + c.py * c.py - c.a * c.d).toBeCloseTo(zt * zt, 10);
    }
    expect(shapes).toEqual(new Set([1, -1]));
  });

  it('is |Y| ≥ 1/Zt at the pins', () => {
    const c = conditionAt({ zsRe: 0, zsIm: 0, ydRe: 0, ydIm: 0 }, 0.01);
    expect(quadratic(c, 0, 100)).toBeCloseTo(0, 12);
    expect(quadratic(c, 70, 70)).toBeLessThan(0);
  });

  it('has tangents that contain the disk of a condition with A < 0', () => {
    let least = 0;
    for (let i = 0; i < 200; i++) {
      const zt = 0.005 + 0.01 * random();
      const zsIm = zt * (1.0001 + 2 * random());
      const c = conditionAt({ zsRe: 0.001, zsIm, ydRe: 0, ydIm: 20 * random() }, zt);
      if (c.a >= 0) continue;
      const radius = c.zt / -c.a;
      for (let t = 0; t < 40; t++) {
        const angle = 7 * random();
        const r = radius * random();
        const x = -c.px / c.a + r * Math.cos(angle);
        const y = -c.py / c.a + r * Math.sin(angle);
        for (const row of tangentRows(c)) {
          const size = 1 + Math.abs(row.d) + Math.hypot(row.px * x, row.py * y);
          least = Math.min(least, quadratic(row, x, y) / size);
        }
      }
    }
    expect(least).toBeGreaterThan(-1e-9);
  });
});
