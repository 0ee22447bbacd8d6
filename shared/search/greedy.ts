import type { Bank } from './bank';
import type { Prepared } from './prepare';
import type { Rows } from './rows';
import { shortfall } from './shortfall';

/** So many pieces in a row may make things worse (an anti-resonance on the way) before the greedy stage gives up. */
const MOST_WORSE = 6;

/**
 * Adds the piece with the largest fall of the total log-shortfall per weight until the grid holds. Adding can raise |Z|, so
 * a step that makes it worse is taken when there is no better one, a few times. `limit`: give up at this weight. `noise`
 * (0 … 1) shakes each rating, so that repeated repairs differ. Returns the shortfall left, 0 when the grid holds.
 */
export function growGreedily(
  prepared: Prepared,
  rows: Rows,
  bank: Bank,
  limit: number,
  noise: number,
  random: () => number,
): number {
  const { parts } = prepared;
  let now = shortfall(rows, bank.x, bank.y);
  let best = now;
  let worse = 0;
  while (now > 0) {
    let choice = -1;
    let rating = Number.NEGATIVE_INFINITY;
    let after = now;
    for (let k = 0; k < parts.length; k++) {
      if (!bank.canAdd(k) || bank.weight + parts[k].weight >= limit) continue;
      const next = shortfall(rows, bank.x, bank.y, k);
      const gain = (now - next) / parts[k].weight;
      const shaken = noise === 0 ? gain : gain * (1 + (gain > 0 ? 1 : -1) * noise * (random() - 0.5));
      if (shaken > rating) {
        rating = shaken;
        choice = k;
        after = next;
      }
    }
    if (choice < 0) return best;
    bank.change(choice, 1);
    now = after;
    if (now < best) {
      best = now;
      worse = 0;
    } else if (++worse > MOST_WORSE) return best;
  }
  return 0;
}

/** Takes out pieces that are not needed, heaviest first (ties: as `random` says), while the grid holds. */
export function prunePieces(prepared: Prepared, rows: Rows, bank: Bank, random: () => number): void {
  const order = prepared.parts.map((part, k) => ({ k, key: part.weight * (1 + 1e-3 * random()) }));
  order.sort((a, b) => b.key - a.key);
  for (const { k } of order) {
    while (bank.canRemove(k) && shortfall(rows, bank.x, bank.y, k, -1) === 0) bank.change(k, -1);
  }
}
