/** A turn of a response: when, and how high. */
export interface Turn {
  at_s: number;
  ohm: number;
}

/** All ways up (`sign` 1) or down (−1) of a sequence together. */
export const wayOf = (turns: readonly Turn[], sign: 1 | -1): number =>
  turns.reduce((sum, { ohm }, i) => sum + (i > 0 ? Math.max(0, sign * (ohm - turns[i - 1].ohm)) : 0), 0);

/** The turns that are left when swings of less than `least_ohm` are passed over. The first turn stays, the last may go. */
export function largeSwings(turns: readonly Turn[], least_ohm: number): Turn[] {
  const kept = [turns[0]];
  let best = turns[0];
  let direction = 0;
  for (const turn of turns) {
    const beyond = turn.ohm - best.ohm;
    if (direction * beyond > 0) best = turn;
    else if (Math.abs(beyond) >= least_ohm && beyond !== 0) {
      if (direction !== 0) kept.push(best);
      direction = Math.sign(beyond);
      best = turn;
    }
  }
  if (direction !== 0) kept.push(best);
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
