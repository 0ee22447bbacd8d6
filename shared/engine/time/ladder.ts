import type { CompiledRail } from '../rail';
import { branchFraction, type Fraction, merged } from './fraction';

/**
 * A rail as a ladder that is climbed from an open end: Z(s) = A(s)/B(s), beginning with A = 1, B = 0. A branch to ground with
 * y = n/q makes (A, B) into (qA, qB + nA); a branch in series with z makes them (A + zB, B). So neither polynomial is ever
 * written out, nothing is divided, and as no coefficient is negative nothing cancels but what cancels in Z itself.
 */
export interface Ladder {
  /** Branches from the pins to ground. */
  pins: Fraction[];
  /** The package between pins and die, when the rail is looked at from the die. */
  series: { r: number; l: number } | null;
  /** The die's capacitance. */
  die: Fraction | null;
  /** All of it in order, seven numbers a step: n0, n1, q0, q1, q2 and z0, z1 of a series branch z0 + z1·s. */
  steps: Float64Array;
}

/** Numbers a step of `Ladder.steps`. */
export const STEP = 7;

/** The ladder of a rail that has series and damped branches only (see stand-in.ts). Throws EngineError for any other branch. */
export function ladderOf(rail: CompiledRail): Ladder {
  const pins = merged(rail.members.map(({ branch, count, id }) => branchFraction(branch, count, id)));
  const view = rail.view;
  const series = view && { r: view.r, l: view.l };
  const die = view?.die ? branchFraction(view.die, 1, 'package') : null;
  const shunt = ({ n0, n1, q0, q1, q2 }: Fraction) => [n0, n1, q0, q1, q2, 0, 0];
  const steps = [...pins.map(shunt), ...(series ? [[0, 0, 1, 0, 0, series.r, series.l]] : [])];
  if (die) steps.push(shunt(die));
  return { pins, series, die, steps: Float64Array.from(steps.flat()) };
}

/** Where `climb` puts its answer: A, B, dB/ds as pairs (re, im), all to be multiplied by 2^out[6]. */
export const climbScratch = (): Float64Array => new Float64Array(7);

const HUGE = 2 ** 300;
const TINY = 2 ** -300;

/** A(s), B(s) and B′(s) at s = re + j·im. Scaled by powers of two on the way, which round nothing. */
export function climb({ steps }: Ladder, re: number, im: number, out: Float64Array): void {
  let aRe = 1;
  let aIm = 0;
  let bRe = 0;
  let bIm = 0;
  // The derivatives of both by s.
  let daRe = 0;
  let daIm = 0;
  let dbRe = 0;
  let dbIm = 0;
  let exponent = 0;
  const s2Re = (re - im) * (re + im);
  const s2Im = 2 * re * im;
  for (let k = 0; k < steps.length; k += STEP) {
    const n1 = steps[k + 1];
    const q1 = steps[k + 3];
    const q2 = steps[k + 4];
    const z1 = steps[k + 6];
    const nRe = steps[k] + n1 * re;
    const nIm = n1 * im;
    const qRe = steps[k + 2] + q1 * re + q2 * s2Re;
    const qIm = q1 * im + q2 * s2Im;
    const dqRe = q1 + 2 * q2 * re;
    const dqIm = 2 * q2 * im;
    const zRe = steps[k + 5] + z1 * re;
    const zIm = z1 * im;
    const newDaRe = dqRe * aRe - dqIm * aIm + qRe * daRe - qIm * daIm + z1 * bRe + zRe * dbRe - zIm * dbIm;
    const newDaIm = dqRe * aIm + dqIm * aRe + qRe * daIm + qIm * daRe + z1 * bIm + zRe * dbIm + zIm * dbRe;
    const newDbRe = dqRe * bRe - dqIm * bIm + qRe * dbRe - qIm * dbIm + n1 * aRe + nRe * daRe - nIm * daIm;
    const newDbIm = dqRe * bIm + dqIm * bRe + qRe * dbIm + qIm * dbRe + n1 * aIm + nRe * daIm + nIm * daRe;
    const newARe = qRe * aRe - qIm * aIm + zRe * bRe - zIm * bIm;
    const newAIm = qRe * aIm + qIm * aRe + zRe * bIm + zIm * bRe;
    const newBRe = qRe * bRe - qIm * bIm + nRe * aRe - nIm * aIm;
    const newBIm = qRe * bIm + qIm * bRe + nRe * aIm + nIm * aRe;
    const size = Math.max(Math.abs(newARe), Math.abs(newAIm), Math.abs(newBRe), Math.abs(newBIm));
    const scale = size > HUGE ? TINY : size < TINY ? HUGE : 1;
    if (scale !== 1) exponent += size > HUGE ? 300 : -300;
    aRe = newARe * scale;
    aIm = newAIm * scale;
    bRe = newBRe * scale;
    bIm = newBIm * scale;
    daRe = newDaRe * scale;
    daIm = newDaIm * scale;
    dbRe = newDbRe * scale;
    dbIm = newDbIm * scale;
  }
  out[0] = aRe;
  out[1] = aIm;
  out[2] = bRe;
  out[3] = bIm;
  out[4] = dbRe;
  out[5] = dbIm;
  out[6] = exponent;
}
