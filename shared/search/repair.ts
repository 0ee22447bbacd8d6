import { Bank } from './bank';
import { growGreedily, prunePieces } from './greedy';
import type { Prepared } from './prepare';
import type { Rows } from './rows';

/**
 * One round of destroy and repair: takes pieces out of `counts`, lets the greedy stage fill up again with a little noise below
 * `limit`, and prunes. Taken out are: one kind altogether, or a random share of the pieces, or (where the number of kinds is
 * limited) one kind that a random other one replaces. Returns the new bank when the grid holds, else null.
 */
export function destroyAndRepair(
  prepared: Prepared,
  rows: Rows,
  counts: ArrayLike<number>,
  limit: number,
  random: () => number,
): Bank | null {
  const bank = new Bank(prepared, rows, counts);
  const pick = (list: readonly number[]): number => list[Math.floor(random() * list.length)];
  const used = bank.used().filter((k) => bank.canRemove(k));
  if (used.length === 0) return null;
  const isTight = bank.kinds >= prepared.maxKinds && bank.kinds < prepared.parts.length;
  if (isTight && random() < 0.5) {
    const kinds = new Set(bank.used());
    const leaving = pick(used);
    bank.clear(leaving);
    if (prepared.parts[leaving].min === 0) kinds.delete(leaving);
    kinds.add(
      pick(
        Array.from(counts as ArrayLike<number>, (_, k) => k).filter(
          (k) => bank.counts[k] === 0 && k !== leaving,
        ),
      ),
    );
    bank.allowed = kinds;
    takePieces(bank, 0.3 * random(), random);
  } else if (random() < 0.25) bank.clear(pick(used));
  else takePieces(bank, 0.05 + 0.4 * random(), random);
  if (growGreedily(prepared, rows, bank, limit, 0.3, random) > 0) return null;
  prunePieces(prepared, rows, bank, random);
  return bank.kinds <= prepared.maxKinds ? bank : null;
}

/** Takes a random `share` of the removable pieces out, two at least. */
function takePieces(bank: Bank, share: number, random: () => number): void {
  const removable: number[] = [];
  const total = bank.counts.reduce((sum, n) => sum + n, 0);
  const take = Math.max(2, Math.round(share * total));
  for (const k of bank.used()) for (let n = bank.counts[k]; n > 0; n--) removable.push(k);
  for (let t = 0; t < take && removable.length > 0; t++) {
    const at = Math.floor(random() * removable.length);
    if (bank.canRemove(removable[at])) bank.change(removable[at], -1);
    removable[at] = removable[removable.length - 1];
    removable.pop();
  }
}
