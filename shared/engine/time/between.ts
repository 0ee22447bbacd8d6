import { type Ladder, STEP } from './ladder';
import type { ComplexList } from './zeros';

/**
 * Improves first guesses for the poles in place: between each two neighbouring zeros of the branches' own impedances lies a pole
 * (branches in parallel resonate against each other), so the guess of the nearest size is put there. Without this, the poles of nearly
 * equal parts, close together as they are, would be found very slowly.
 */
export function guessBetween({ steps }: Ladder, guess: ComplexList): void {
  const real: number[] = [];
  const upper: [number, number][] = [];
  for (let k = 0; k < steps.length; k += STEP) {
    const [q0, q1, q2] = steps.subarray(k + 2, k + 5);
    if (q2 === 0) {
      if (q1 > 0) real.push(-q0 / q1);
      continue;
    }
    const half = q1 / (2 * q2);
    const square = half * half - q0 / q2;
    if (square < 0) upper.push([-half, Math.sqrt(-square)]);
    else {
      const far = half + Math.sqrt(square);
      // The nearer root from the product of both: the difference would cancel.
      real.push(-far, -q0 / q2 / far);
    }
  }
  const taken = new Set<number>();
  const put = (re: number, im: number) => {
    const i = nearest(guess, Math.hypot(re, im), taken);
    if (i < 0) return;
    taken.add(i);
    guess.re[i] = re;
    guess.im[i] = im;
  };
  real.sort((a, b) => b - a);
  upper.sort((a, b) => Math.hypot(...a) - Math.hypot(...b));
  for (let i = 0; i + 1 < upper.length; i++) {
    const [aRe, aIm] = upper[i];
    const [bRe, bIm] = upper[i + 1];
    if (isNear(upper[i], upper[i + 1]))
      for (const side of [1, -1])
        put(0.5 * (aRe + bRe) - OFF * (bIm - aIm), side * (0.5 * (aIm + bIm) + OFF * (bRe - aRe)));
  }
  for (let i = 0; i + 1 < real.length; i++)
    if (isNear([real[i], 0], [real[i + 1], 0]))
      put(0.5 * (real[i] + real[i + 1]), OFF * (real[i + 1] - real[i]));
}

/** A little off the straight line between the two, so that no symmetry holds a guess. */
const OFF = 0.1;
/** How near two zeros must be, relative to their size, for the middle to be a good guess. */
const NEAR = 0.5;

const isNear = (a: readonly number[], b: readonly number[]): boolean =>
  Math.hypot(a[0] - b[0], a[1] - b[1]) < NEAR * Math.hypot(b[0], b[1]);

function nearest({ re, im }: ComplexList, size: number, taken: ReadonlySet<number>): number {
  let best = -1;
  let least = Number.POSITIVE_INFINITY;
  for (let i = 0; i < re.length; i++) {
    if (taken.has(i)) continue;
    const away = Math.abs(Math.log(Math.hypot(re[i], im[i]) / size));
    if (away < least) {
      least = away;
      best = i;
    }
  }
  return best;
}
