/** A turn of a response: when, and how high. */
export interface Turn {
  at_s: number;
  ohm: number;
}

/** All ways up (`sign` 1) or down (−1) of a sequence together. */
export const wayOf = (turns: readonly Turn[], sign: 1 | -1): number =>
  turns.reduce((sum, { ohm }, i) => sum + (i > 0 ? Math.max(0, sign * (ohm - turns[i - 1].ohm)) : 0), 0);

/** The turns that are left when swings of less than `least_ohm` are passed over: each is that far from the next. */
export function largeSwings(turns: readonly Turn[], least_ohm: number): Turn[] {
  const kept: Turn[] = [];
  let low = turns[0];
  let high = turns[0];
  let direction = 0;
  for (const turn of turns) {
    // Until a swing is large enough the lowest and the highest so far may be where it begins; after that only the way back counts.
    if (turn.ohm > high.ohm) high = turn;
    if (turn.ohm < low.ohm) low = turn;
    if (direction <= 0 && turn.ohm > low.ohm && turn.ohm - low.ohm >= least_ohm) {
      kept.push(low);
      direction = 1;
      high = turn;
    } else if (direction >= 0 && turn.ohm < high.ohm && high.ohm - turn.ohm >= least_ohm) {
      kept.push(high);
      direction = -1;
      low = turn;
    }
  }
  if (direction !== 0) kept.push(direction > 0 ? high : low);
  return kept;
}

/**
 * As few turns as leave all but `share` of the way in one direction, or fewer when that takes more than `most` turns: the smallest
 * swings go first.
 */
export function fewestSwings(turns: readonly Turn[], sign: 1 | -1, share: number, most: number): Turn[] {
  const all = wayOf(turns, sign);
  const fits = (least: number) => {
    const kept = largeSwings(turns, least);
    return kept.length > most || wayOf(kept, sign) >= (1 - share) * all;
  };
  // Bisection on the logarithm of the least swing that stays: from what is nothing to what is everything.
  let low = Math.log(1e-12 * all);
  let high = Math.log(all);
  for (let round = 0; round < 40; round++) {
    const middle = 0.5 * (low + high);
    if (fits(Math.exp(middle))) low = middle;
    else high = middle;
  }
  const kept = largeSwings(turns, Math.exp(low));
  return kept.length > most ? largeSwings(turns, Math.exp(high)) : kept;
}
