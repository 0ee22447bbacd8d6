import type { Tightest } from '../engine/headroom';
import { Bank } from './bank';
import { growGreedily, prunePieces } from './greedy';
import { insertNew, startGrid } from './grid';
import type { Prepared } from './prepare';
import { seededRandom } from './random';
import { destroyAndRepair } from './repair';
import { buildRows, type Rows } from './rows';
import { verifyMix } from './verify';

/** The best mix known, verified by the engine. */
export interface Incumbent {
  counts: Int32Array;
  weight: number;
  tightest: Tightest;
}

/**
 * Grid, rows and incumbent of a search: whatever finds a mix brings it here. Only what the engine confirms on refined peaks
 * becomes the incumbent; frequencies at which it fails join the grid (at its end, so that rows keep their numbers).
 */
export class MixStage {
  readonly prepared: Prepared;
  rows: Rows;
  incumbent: Incumbent | null = null;
  /** The attempt that came closest while nothing holds. */
  closest: Tightest | null = null;
  /** What a mix without a limit on the kinds weighs, a guess at the order of size; 0 when unknown. */
  scale = 0;
  private grid: number[];
  private drift: Int32Array | null = null;
  private readonly random: () => number;

  constructor(prepared: Prepared, gridPoints: number, seed: number) {
    this.prepared = prepared;
    this.grid = startGrid(prepared, gridPoints);
    this.rows = buildRows(prepared, this.grid);
    this.random = seededRandom(seed);
  }

  get gridPoints(): number {
    return this.grid.length;
  }

  /** 'held': the new incumbent, or as light as it; 'grown': fails at new frequencies, rows are new; 'refused': fails, nothing new. */
  offer(counts: ArrayLike<number>, weight: number): 'held' | 'grown' | 'refused' {
    const verdict = verifyMix(this.prepared, counts);
    if (verdict.holds) {
      if (!this.incumbent || weight < this.incumbent.weight)
        this.incumbent = { counts: Int32Array.from(counts), weight, tightest: verdict.tightest };
      return 'held';
    }
    this.noteAttempt(verdict.tightest);
    const grown = insertNew(this.grid, verdict.breaking_Hz);
    if (grown.length === this.grid.length) return 'refused';
    this.grid = grown;
    this.rows = buildRows(this.prepared, grown);
    return 'grown';
  }

  /** One greedy mix from nothing; true when there is a new incumbent. */
  growFirst(noise: number): boolean {
    for (let round = 0; round < 20; round++) {
      const bank = new Bank(this.prepared, this.rows);
      const limit = this.incumbent?.weight ?? Number.POSITIVE_INFINITY;
      if (growGreedily(this.prepared, this.rows, bank, limit, noise, this.random) > 0) {
        if (!this.incumbent && bank.x.some((x) => x !== 0))
          this.noteAttempt(verifyMix(this.prepared, bank.counts).tightest);
        return false;
      }
      prunePieces(this.prepared, this.rows, bank, this.random);
      const answer = this.offer(bank.counts, bank.weight);
      if (answer !== 'grown') return answer === 'held';
    }
    return false;
  }

  /**
   * Where the number of kinds is limited: a mix of as many kinds as it takes, then without one kind after the other, each time
   * the one that is missed least. (Greedy from nothing spends its kinds before it knows what it needs.) Yields between trials.
   */
  *eliminateKinds(): Generator<void, void, void> {
    const { prepared, rows, random } = this;
    let best = new Bank(prepared, rows);
    best.allowed = new Set(prepared.parts.keys());
    if (growGreedily(prepared, rows, best, Number.POSITIVE_INFINITY, 0, random) > 0) return;
    prunePieces(prepared, rows, best, random);
    this.scale = best.weight;
    while (best.kinds > prepared.maxKinds) {
      let next: Bank | null = null;
      for (const k of best.used().filter((used) => prepared.parts[used].min === 0)) {
        const bank = new Bank(prepared, rows, best.counts);
        bank.clear(k);
        bank.allowed = new Set(bank.used());
        const limit = next?.weight ?? Number.POSITIVE_INFINITY;
        yield;
        if (growGreedily(prepared, rows, bank, limit, 0, random) > 0) continue;
        prunePieces(prepared, rows, bank, random);
        if (!next || bank.weight < next.weight) next = bank;
      }
      if (!next) return;
      best = next;
    }
    if (!this.incumbent || best.weight < this.incumbent.weight) this.offer(best.counts, best.weight);
  }

  /** One round of destroy and repair from the incumbent, or from an equally light mix that it drifted to. */
  improve(): boolean {
    const { incumbent } = this;
    if (!incumbent) return this.growFirst(0.5);
    const limit = incumbent.weight * (1 + 1e-9) + this.prepared.step * 0.5;
    const from = this.drift ?? incumbent.counts;
    const bank = destroyAndRepair(this.prepared, this.rows, from, limit, this.random);
    if (!bank) return false;
    if (bank.weight < incumbent.weight * (1 - 1e-9)) {
      this.drift = null;
      return this.offer(bank.counts, bank.weight) === 'held';
    }
    this.drift = bank.counts;
    return false;
  }

  private noteAttempt(tightest: Tightest): void {
    if (!this.closest || tightest.headroom_dB > this.closest.headroom_dB) this.closest = tightest;
  }
}
