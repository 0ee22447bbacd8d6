import { Bank } from './bank';
import { growGreedily, prunePieces } from './greedy';
import type { Prepared } from './prepare';
import type { Rows } from './rows';

/**
 * One round of destroy and repair: takes a random share of the pieces out of `counts` (or one kind altogether), lets the
 * greedy stage fill up again with a little noise below `limit`, and prunes. Returns the new bank when the grid holds, else null.
 */
export function destroyAndRepair(
  prepared: Prepared,
  rows: Rows,
  counts: ArrayLike<number>,
  limit: number,
  random: () => number,
): Bank | null {
  const bank = new Bank(prepared, rows, counts);
  const removable: number[] = [];
  for (let k = 0; k < counts.length; k++)
    for (let n = prepared.parts[k].min; n < counts[k]; n++) removable.push(k);
  if (removable.length === 0) return null;
  if (random() < 0.25) {
    const kind = removable[Math.floor(random() * removable.length)];
    while (bank.canRemove(kind)) bank.change(kind, -1);
  } else {
    const share = 0.05 + 0.4 * random();
    const take = Math.max(2, Math.round(share * removable.length));
    for (let t = 0; t < take && removable.length > 0; t++) {
      const at = Math.floor(random() * removable.length);
      bank.change(removable[at], -1);
      removable[at] = removable[removable.length - 1];
      removable.pop();
    }
  }
  if (growGreedily(prepared, rows, bank, limit, 0.3, random) > 0) return null;
  prunePieces(prepared, rows, bank, random);
  return bank;
}
