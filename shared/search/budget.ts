import type { Prepared } from './prepare';

type Stepped = Pick<Prepared, 'step'>;

/** Two real weights closer than this (relative) count as equal. */
const SAME = 1e-9;

/** The largest budget that excludes weight `weight`: one unit less, or for real weights a hair less. */
export function budgetBelow({ step }: Stepped, weight: number): number {
  return step === 1 ? weight - 1 : weight * (1 - SAME);
}

/** The bound after all mixes of weight ≤ `budget` are excluded. */
export function boundAbove({ step }: Stepped, budget: number): number {
  return step === 1 ? Math.floor(budget) + 1 : budget;
}

/** True when no weight is left between bound and incumbent. */
export function isClosed(prepared: Stepped, bound: number, weight: number): boolean {
  return bound > budgetBelow(prepared, weight) || bound >= weight * (1 - 2 * SAME);
}

/** Share of the gap between bound and incumbent that one pass of the deepening covers. */
const STRIDE = 1 / 3;

/**
 * The next budget of the deepening: the bound plus a third of the gap to the incumbent (the passes far below are over at once
 * and tell little), but for whole weights at least the bound itself, and never past what would still be an improvement.
 * `most` is the weight of everything at its maximum, which ends the search when there is no incumbent; `scale` is then a guess
 * at the order of size, or 0.
 */
export function nextBudget(
  prepared: Stepped,
  bound: number,
  incumbent: number | null,
  most: number,
  scale: number,
): number {
  const top = incumbent === null ? most : budgetBelow(prepared, incumbent);
  const gap = incumbent === null ? Math.max(0.9 * bound, scale > 0 ? scale : 0.06 * most) : incumbent - bound;
  if (prepared.step === 1)
    return Math.min(top, Math.floor(bound) + Math.max(0, Math.floor(STRIDE * gap) - 1));
  const least = 0.01 * (incumbent ?? most);
  const next = bound + Math.max(STRIDE * gap, least);
  return next > top - least ? top : next;
}
