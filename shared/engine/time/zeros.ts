import { guessBetween } from './between';
import { climb, climbScratch, type Ladder } from './ladder';
import { startGuess } from './start-guess';

const MOST_ROUNDS = 120;
/** A correction this small, relative to the zero, is rounding. */
const FINE = 4e-16;
/** So is one this small that no longer shrinks. */
const FAIRLY_FINE = 1e-12;
/** Between two zeros that all but coincide rounding leaves corrections of about its root, which never end. */
const NOISE = 1e-6;

/** Complex numbers, side by side. */
export interface ComplexList {
  re: Float64Array;
  im: Float64Array;
}

/**
 * All zeros of B(s) in rad/s, found together by the Ehrlich–Aberth iteration (O. Aberth, Math. Comp. 27, 1973; L. W. Ehrlich,
 * Comm. ACM 10, 1967): Δ = B/(B′ − B·Σ 1/(s − s_j)), each step Newton's with the other zeros kept away. B is climbed, never
 * expanded, so each zero is as good as its own condition allows. `logB`: logarithms of B's coefficients (start-guess.ts), for
 * the first guesses. Null where not every zero came to rest.
 */
export function findZeros(ladder: Ladder, logB: readonly number[]): ComplexList | null {
  const guess = startGuess(logB);
  guessBetween(ladder, guess);
  const n = guess.re.length;
  const last = new Float64Array(n).fill(Number.POSITIVE_INFINITY);
  const atRest = new Uint8Array(n);
  let moving = n;
  for (let round = 0; round < MOST_ROUNDS && moving > 0; round++) {
    for (let i = 0; i < n; i++) {
      if (atRest[i]) continue;
      const moved = aberthStep(ladder, guess, i);
      if (moved < FINE || (moved < FAIRLY_FINE && moved >= 0.5 * last[i])) {
        atRest[i] = 1;
        moving--;
      }
      last[i] = moved;
    }
  }
  return last.every((moved) => moved < NOISE) ? guess : null;
}

const here = climbScratch();

/** Moves zero `i` by one step and tells how far, relative to where it was. */
export function aberthStep(ladder: Ladder, { re, im }: ComplexList, i: number): number {
  const x = re[i];
  const y = im[i];
  let sumRe = 0;
  let sumIm = 0;
  for (let j = 0; j < re.length; j++) {
    const dx = x - re[j];
    const dy = y - im[j];
    const d2 = dx * dx + dy * dy;
    if (d2 === 0) continue;
    sumRe += dx / d2;
    sumIm -= dy / d2;
  }
  climb(ladder, x, y, here);
  const bRe = here[2];
  const bIm = here[3];
  const downRe = here[4] - (bRe * sumRe - bIm * sumIm);
  const downIm = here[5] - (bRe * sumIm + bIm * sumRe);
  const down2 = downRe * downRe + downIm * downIm;
  if (!(down2 > 0)) return 0;
  const moveRe = (bRe * downRe + bIm * downIm) / down2;
  const moveIm = (bIm * downRe - bRe * downIm) / down2;
  re[i] = x - moveRe;
  im[i] = y - moveIm;
  return Math.hypot(moveRe, moveIm) / Math.hypot(x, y);
}
