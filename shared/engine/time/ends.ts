import type { Fraction } from './fraction';
import type { Ladder } from './ladder';

/** What Z becomes as s goes to infinity: s·L + R. */
export interface EndAtInfinity {
  inductance_H: number;
  resistance_ohm: number;
}

/**
 * Z(0) in ohm: what the source's resistance and the package leave of a direct current. Zero when the source has no
 * resistance, Infinity when nothing passes direct current.
 */
export function directResistance({ pins, series }: Ladder): number {
  // The die's capacitance blocks, so it does not count.
  const siemens = pins.reduce((sum, { n0, q0 }) => sum + (n0 === 0 ? 0 : n0 / q0), 0);
  return 1 / siemens + (series?.r ?? 0);
}

/**
 * Z for s → ∞, from the expansion of the node's admittance in falling powers of s. A capacitor without resistance and
 * inductance leaves nothing; resistance without inductance leaves R; and where every branch has inductance s·L + R are left,
 * with L = 1/Σ(1/L_k) and R = L²·Σ(R_k/L_k²) for series branches.
 */
export function endAtInfinity({ pins, series, die }: Ladder): EndAtInfinity {
  const sum = [0, 0, 0, 0];
  for (const one of pins)
    fallingPowers(one).forEach((term, k) => {
      sum[k] += term;
    });
  let inductance_H = 0;
  let resistance_ohm = 0;
  if (sum[0] === 0 && sum[1] > 0) resistance_ohm = 1 / sum[1];
  else if (sum[0] === 0) {
    inductance_H = 1 / sum[2];
    resistance_ohm = -sum[3] / (sum[2] * sum[2]);
  }
  if (series) {
    inductance_H += series.l;
    resistance_ohm += series.r;
  }
  if (!die) return { inductance_H, resistance_ohm };
  // Against s·L the die is all that is left; against a resistance it is in parallel.
  const dieOhm = die.q1 / die.n1;
  const both = resistance_ohm + dieOhm;
  if (inductance_H > 0) return { inductance_H: 0, resistance_ohm: dieOhm };
  return { inductance_H: 0, resistance_ohm: both > 0 ? (resistance_ohm * dieOhm) / both : 0 };
}

/** Coefficients of s, 1, 1/s and 1/s² of a fraction for large s, as far as they are of use (see above). */
function fallingPowers({ n0, n1, q0, q1, q2 }: Fraction): number[] {
  if (q2 > 0) return [0, 0, n1 / q2, (n0 - (n1 * q1) / q2) / q2];
  if (q1 > 0) {
    const first = (n0 - (n1 * q0) / q1) / q1;
    return [0, n1 / q1, first, (-first * q0) / q1];
  }
  return [n1 / q0, n0 / q0, 0, 0];
}
