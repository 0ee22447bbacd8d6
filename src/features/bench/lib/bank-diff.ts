import type { Part } from '@shared/schemas/part.schema';
import type { BankLine } from '@shared/schemas/rail.schema';
import { partName } from './part-name';

export interface BankDifference {
  part: string;
  mine: string;
  theirs: string;
}

/** Where two banks differ, part by part: how many, and how mounted where only that differs. */
export function bankDifferences(
  mine: readonly BankLine[],
  theirs: readonly BankLine[],
  parts: ReadonlyMap<string, Part>,
): BankDifference[] {
  const ids = new Set([...mine, ...theirs].map((line) => line.partId));
  return [...ids].flatMap((id) => {
    const [a, b] = [mine, theirs].map((bank) => bank.filter((line) => line.partId === id));
    if (JSON.stringify(a.map(fields)) === JSON.stringify(b.map(fields))) return [];
    const part = parts.get(id);
    const counts = [a, b].map((lines) => lines.reduce((sum, line) => sum + line.count, 0));
    const [ours, other] = counts.map((count, i) => ([a, b][i].length === 0 ? 'not there' : String(count)));
    const onlyMount = ours === other;
    return [
      {
        part: part ? partName(part) : 'another part',
        mine: onlyMount ? `${ours}, mounted otherwise` : ours,
        theirs: other,
      },
    ];
  });
}

const fields = ({ count, mount_H, recipeId, distance_m, side, locked }: BankLine) => [
  count,
  mount_H,
  recipeId,
  distance_m,
  side,
  locked,
];
