import type { RailDocument } from '../schemas/rail-document.schema';

export interface BankFigures {
  parts: number;
  kinds: number;
  /** null where a part of the bank has no price, or no area: a sum that leaves something out would be wrong. */
  cost: number | null;
  area_mm2: number | null;
}

/** Parts, kinds, cost and area of a document's bank. */
export function bankFigures(document: Pick<RailDocument, 'parts' | 'bank'>): BankFigures {
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  const figures: BankFigures = { parts: 0, kinds: 0, cost: 0, area_mm2: 0 };
  const kinds = new Set<string>();
  for (const line of document.bank) {
    const part = parts.get(line.part);
    if (!part || line.count === 0) continue;
    figures.parts += line.count;
    kinds.add(part.id);
    figures.cost = add(figures.cost, part.unit_cost, line.count);
    figures.area_mm2 = add(figures.area_mm2, part.area_mm2, line.count);
  }
  return { ...figures, kinds: kinds.size };
}

const add = (sum: number | null, each: number | undefined, count: number): number | null =>
  sum === null || each === undefined ? null : sum + each * count;
