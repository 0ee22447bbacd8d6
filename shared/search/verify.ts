import { holds, surfaceMaxima, type Tightest } from '../engine/headroom';
import type { Prepared } from './prepare';

/** What the engine says of a mix: does it hold everywhere, where is it tightest, and which maxima break the surface. */
export interface Verdict {
  holds: boolean;
  tightest: Tightest;
  breaking_Hz: number[];
}

/** Puts `counts` (prepared order) into the rail and asks the engine, on refined peaks rather than on the grid. */
export function verifyMix(prepared: Prepared, counts: ArrayLike<number>): Verdict {
  const { rail, parts, problem } = prepared;
  parts.forEach((part, k) => {
    rail.members[part.member].count = counts[k];
  });
  const maxima = surfaceMaxima(rail, problem.band_Hz, problem.target);
  parts.forEach((part) => {
    rail.members[part.member].count = 0;
  });
  const tightest = maxima.reduce((worst, next) => (next.headroom_dB < worst.headroom_dB ? next : worst));
  const breaking_Hz = maxima.filter((maximum) => !holds(maximum)).map((maximum) => maximum.frequency_Hz);
  return { holds: breaking_Hz.length === 0, tightest, breaking_Hz };
}
