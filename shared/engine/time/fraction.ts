import type { Branch } from '../branch';
import { EngineError } from '../errors';

/** An admittance as a fraction of polynomials, y(s) = (n0 + n1·s) / (q0 + q1·s + q2·s²), in siemens; no coefficient is negative. */
export interface Fraction {
  n0: number;
  n1: number;
  q0: number;
  q1: number;
  q2: number;
}

/** Two numbers this close are taken as one: what is left of equal values after a few roundings. */
const SAME = 1e-12;

/**
 * `count` equal branches in parallel as a fraction. Series R–L–C: s/(L·s² + R·s + D), without a capacitor 1/(L·s + R);
 * damped source: with σ = R_L + R₁ and λ = L + L₁, (σ + λs) / ((R₀ + L₀s)(σ + λs) + (R_L + Ls)(R₁ + L₁s)).
 * Throws EngineError naming `field` for a branch that is no such fraction (a table, an ESR over frequency) or is a short circuit.
 */
export function branchFraction(branch: Branch, count: number, field: string): Fraction {
  if (branch.kind === 'damped') {
    const { r0, l0, rl, l, r1, l1 } = branch;
    const pairIsShort = (rl === 0 && l === 0) || (r1 === 0 && l1 === 0);
    if (pairIsShort) return branchFraction({ kind: 'series', r: r0, l: l0, d: 0 }, count, field);
    const sum = rl + r1;
    const both = l + l1;
    return withoutCommonFactor({
      n0: count * sum,
      n1: count * both,
      q0: r0 * sum + rl * r1,
      q1: r0 * both + l0 * sum + rl * l1 + l * r1,
      q2: l0 * both + l * l1,
    });
  }
  if (branch.kind !== 'series')
    throw new EngineError(field, 'has no poles of its own: give it a series R–L–C');
  const { r, l, d } = branch;
  if (r === 0 && l === 0 && d === 0) throw new EngineError(field, 'is a short circuit');
  if (d === 0) return { n0: count, n1: 0, q0: r, q1: l, q2: 0 };
  return { n0: 0, n1: count, q0: d, q1: r, q2: l };
}

/** Divides by s + z where both halves of the fraction have the zero −z: such a pole would cancel in Z anyway. */
export function withoutCommonFactor(y: Fraction): Fraction {
  const { n0, n1, q0, q1, q2 } = y;
  if (n1 === 0 || (q1 === 0 && q2 === 0)) return y;
  const z = n0 / n1;
  const left = Math.abs(q0 - z * (q1 - z * q2));
  if (left > SAME * (q0 + z * (q1 + z * q2))) return y;
  // q0 + q1·s + q2·s² = (s + z)(q2·s + (q1 − q2·z)); the difference is written as q0/z where that cancels nothing.
  return { n0: n1, n1: 0, q0: z > 0 ? q0 / z : q1, q1: q2, q2: 0 };
}

/**
 * Adds up fractions whose denominators are multiples of each other, such as those of equal parts in two lines: apart,
 * they would put a pole on top of a zero.
 */
export function merged(fractions: readonly Fraction[]): Fraction[] {
  const groups: Fraction[] = [];
  for (const one of fractions.map(monic)) {
    const equal = groups.find((g) => near(g.q0, one.q0) && near(g.q1, one.q1) && near(g.q2, one.q2));
    if (equal) {
      equal.n0 += one.n0;
      equal.n1 += one.n1;
    } else groups.push({ ...one });
  }
  return groups.map(withoutCommonFactor);
}

const near = (a: number, b: number): boolean => Math.abs(a - b) <= SAME * Math.max(a, b);

/** The same fraction with a denominator that begins with 1. */
function monic({ n0, n1, q0, q1, q2 }: Fraction): Fraction {
  const lead = q2 > 0 ? q2 : q1 > 0 ? q1 : q0;
  return { n0: n0 / lead, n1: n1 / lead, q0: q0 / lead, q1: q1 / lead, q2: q2 / lead };
}
