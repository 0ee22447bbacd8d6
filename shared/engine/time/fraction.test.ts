import { describe, expect, it } from 'vitest';
import { type Branch, branchAdmittance } from '../branch';
import { branchFraction, type Fraction, merged } from './fraction';

/** The fraction at s = jω, as [re, im]. */
function at({ n0, n1, q0, q1, q2 }: Fraction, frequency_Hz: number): [number, number] {
  const w = 2 * Math.PI * frequency_Hz;
  const qRe = q0 - q2 * w * w;
  const qIm = q1 * w;
  const q = qRe * qRe + qIm * qIm;
  return [(n0 * qRe + n1 * w * qIm) / q, (n1 * w * qRe - n0 * qIm) / q];
}

const branches: Record<string, Branch> = {
  'R–L–C': { kind: 'series', r: 0.01, l: 1e-9, d: 1e6 },
  'R–C': { kind: 'series', r: 0.01, l: 0, d: 1e6 },
  'L–C': { kind: 'series', r: 0, l: 1e-9, d: 1e6 },
  'C alone': { kind: 'series', r: 0, l: 0, d: 1e6 },
  'R–L': { kind: 'series', r: 0.01, l: 1e-9, d: 0 },
  'R alone': { kind: 'series', r: 0.01, l: 0, d: 0 },
  'L alone': { kind: 'series', r: 0, l: 1e-9, d: 0 },
  damped: { kind: 'damped', r0: 1e-3, l0: 1e-9, rl: 2e-3, l: 1e-6, r1: 0.02, l1: 3e-9 },
  'damped without resistance but R1': { kind: 'damped', r0: 0, l0: 0, rl: 0, l: 1e-6, r1: 0.02, l1: 0 },
  'damped with a short circuit in it': { kind: 'damped', r0: 1e-3, l0: 1e-9, rl: 0, l: 0, r1: 0.02, l1: 0 },
  'damped by an inductor of the same time constant': {
    kind: 'damped',
    r0: 1e-3,
    l0: 1e-9,
    rl: 2e-3,
    l: 1e-6,
    r1: 4e-3,
    l1: 2e-6,
  },
  'two inductors without resistance': { kind: 'damped', r0: 1e-3, l0: 0, rl: 0, l: 1e-6, r1: 0, l1: 1e-8 },
};

describe('a branch as a fraction', () => {
  for (const [name, branch] of Object.entries(branches))
    it(`of ${name} is its admittance`, () => {
      const y = new Float64Array(4);
      for (const f of [1e3, 1e5, 3e6, 1e8]) {
        branchAdmittance(branch, f, y);
        const [re, im] = at(branchFraction(branch, 3, 'x'), f);
        expect(Math.hypot(re - 3 * y[0], im - 3 * y[1])).toBeLessThan(1e-12 * Math.hypot(re, im));
      }
    });

  it('has no root above and below the line at once', () => {
    const { q2, q1, q0 } = branchFraction(
      branches['damped by an inductor of the same time constant'],
      1,
      'x',
    );
    expect([q2, q1 > 0, q0 > 0]).toEqual([0, true, true]);
  });

  it('refuses what has no poles, and a short circuit', () => {
    const esr = { u: new Float64Array(2), logR: new Float64Array(2) };
    expect(() => branchFraction({ kind: 'lossy', esr, l: 0, d: 1 }, 1, 'lines[0]')).toThrow(/no poles/);
    expect(() => branchFraction({ kind: 'series', r: 0, l: 0, d: 0 }, 1, 'lines[1]')).toThrow(
      /short circuit/,
    );
  });
});

describe('fractions put together', () => {
  it('adds up parts that are multiples of each other', () => {
    const one = branchFraction({ kind: 'series', r: 0.01, l: 1e-9, d: 1e6 }, 2, 'a');
    const half = branchFraction({ kind: 'series', r: 0.02, l: 2e-9, d: 2e6 }, 4, 'b');
    const [both, ...others] = merged([one, half]);
    expect(others).toEqual([]);
    expect(at(both, 1e6)[0]).toBeCloseTo(2 * at(one, 1e6)[0], 9);
  });

  it('lets R–L and R–C of equal time constants cancel to a resistance', () => {
    const source = branchFraction({ kind: 'series', r: 0.01, l: 1e-8, d: 0 }, 1, 'source');
    const bank = branchFraction({ kind: 'series', r: 0.01, l: 0, d: 1e4 }, 1, 'c');
    const [flat] = merged([source, bank]);
    expect(flat.q1 + flat.q2).toBe(0);
    expect(flat.q0 / flat.n0).toBeCloseTo(0.01, 12);
  });
});
