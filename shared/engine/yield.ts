import { uniformFloat64 } from 'pure-rand/distribution/uniformFloat64';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';
import { squaredCorrelation } from './correlation';
import { EngineError } from './errors';
import { HOLD_TOLERANCE } from './headroom';
import type { CompiledRail } from './rail';
import type { TargetMask } from './target';
import { wilsonInterval } from './wilson';
import { drawGrid, sumOf, tightestOnGrid, withFactors } from './yield-draw';

/** How far the parts of one line may lie from what the rail was compiled with, as factors: [least, most]. */
export interface LineSpread {
  /** Index into `CompiledRail.members`. */
  member: number;
  capacitance: readonly [number, number];
  esr: readonly [number, number];
  esl: readonly [number, number];
  /** The part's own ESL in henry: mount and path do not vary with it. */
  esl_H: number;
}

export interface YieldOptions {
  draws: number;
  seed: number;
  /** Answers after so many draws each, so that a cancel is heard. */
  chunk?: number;
}

export interface YieldProgress {
  done: number;
  hits: number;
}

/** Which of a line's values moves the headroom, and how much of its variance goes with it. */
export interface Influence {
  member: number;
  value: 'capacitance' | 'esr' | 'esl';
  /** Squared correlation with the headroom, 0 … 1. */
  share: number;
}

export interface YieldResult {
  draws: number;
  hits: number;
  yield: number;
  /** 95 % (Wilson). */
  low: number;
  high: number;
  /** One headroom a draw, rising. */
  headroom_dB: Float64Array;
  /** Largest first; values that do not vary are left out. */
  influence: Influence[];
}

const VALUES = ['capacitance', 'esr', 'esl'] as const;

/**
 * Monte Carlo over the lines' tolerances: every draw takes each line's C, ESR and ESL evenly from their ranges, the capacitors of
 * one line alike (they come from one reel), and looks for the tightest headroom over the band: on the rail's own refined sweep,
 * its three highest points refined further. Seeded (xoroshiro128+), so the same seed gives the same answer. Yields progress.
 * Throws EngineError for a bad range or number of draws.
 */
export function* runYield(
  rail: CompiledRail,
  spreads: readonly LineSpread[],
  band_Hz: readonly [number, number],
  target: TargetMask,
  { draws, seed, chunk = 500 }: YieldOptions,
): Generator<YieldProgress, YieldResult> {
  if (!Number.isInteger(draws) || draws < 1 || draws > 1_000_000)
    throw new EngineError('draws', 'the number of draws must be a whole number from 1 to 1 000 000');
  for (const spread of spreads) checkSpread(spread);
  const random = xoroshiro128plus(seed);
  const grid = drawGrid(rail, band_Hz, target);
  const drawn: CompiledRail = { ...rail, members: rail.members.map((member) => ({ ...member })) };
  const moving = new Set(spreads.map((spread) => spread.member));
  const still = sumOf(
    rail.members.filter((_, k) => !moving.has(k)),
    grid,
  );
  const headroom_dB = new Float64Array(draws);
  const factors = spreads.map(() => VALUES.map(() => new Float64Array(draws)));
  let hits = 0;
  for (let n = 0; n < draws; n++) {
    spreads.forEach((spread, k) => {
      const [c, r, l] = VALUES.map((value, v) => {
        const [low, high] = spread[value];
        const factor = low + (high - low) * uniformFloat64(random);
        factors[k][v][n] = factor;
        return factor;
      });
      const { branch } = rail.members[spread.member];
      drawn.members[spread.member].branch = withFactors(branch, c, r, (l - 1) * spread.esl_H);
    });
    headroom_dB[n] = tightestOnGrid(drawn, moving, still, grid, target);
    if (headroom_dB[n] >= -20 * Math.log10(1 + HOLD_TOLERANCE)) hits++;
    if ((n + 1) % chunk === 0 && n + 1 < draws) yield { done: n + 1, hits };
  }
  const influence = spreads
    .flatMap((spread, k) =>
      VALUES.flatMap((value, v) =>
        spread[value][1] > spread[value][0]
          ? [{ member: spread.member, value, share: squaredCorrelation(factors[k][v], headroom_dB) }]
          : [],
      ),
    )
    .sort((a, b) => b.share - a.share);
  return {
    draws,
    hits,
    yield: hits / draws,
    ...wilsonInterval(hits, draws),
    headroom_dB: headroom_dB.sort(),
    influence,
  };
}

function checkSpread(spread: LineSpread): void {
  for (const value of VALUES) {
    const [low, high] = spread[value];
    if (!(low > 0) || !(high >= low) || !Number.isFinite(high))
      throw new EngineError(`members[${spread.member}].${value}`, 'the range must rise and lie above zero');
  }
}
