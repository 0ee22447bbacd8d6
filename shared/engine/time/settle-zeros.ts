import type { Ladder } from './ladder';
import { mirror, setApart } from './set-apart';
import { aberthStep, type ComplexList } from './zeros';

/** An imaginary part below this share of a zero is rounding. */
const REAL = 1e-12;

/**
 * The zeros as a passive rail has them: real ones exactly real and first, then the others in pairs, the upper one before its
 * conjugate. A near-double zero can only be known to about the root of the rounding; but its mean is known as well as
 * any other zero, so two that are nearer than `apart`, relative to their size, are put so far apart about their mean. That moves Z by
 * about `apart`², and leaves residues that rounding cannot spoil; 0 leaves all as they are. Null when the zeros do not pair up.
 */
export function settleZeros(
  ladder: Ladder,
  logLead: number,
  found: ComplexList,
  apart: number,
): ComplexList | null {
  const real: number[] = [];
  const upper: [number, number][] = [];
  let below = 0;
  found.re.forEach((re, i) => {
    const im = found.im[i];
    if (Math.abs(im) <= Math.max(REAL, 0.5 * apart) * Math.hypot(re, im)) real.push(re);
    else if (im > 0) upper.push([re, im]);
    else below++;
  });
  if (upper.length !== below) return null;
  const zeros: ComplexList = {
    re: Float64Array.from([...real, ...upper.flatMap(([re]) => [re, re])]),
    im: Float64Array.from([...real.map(() => 0), ...upper.flatMap(([, im]) => [im, -im])]),
  };
  const isLone = setApart(ladder, logLead, zeros, real.length, apart);
  for (let round = 0; round < 2; round++)
    for (const i of isLone) {
      aberthStep(ladder, zeros, i);
      mirror(zeros, i, real.length);
    }
  return zeros;
}
