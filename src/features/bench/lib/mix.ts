import { IN_SERVICE } from '@shared/rail/corner';
import { railDocument } from '@shared/rail/document';
import { documentIn } from '@shared/rail/in-service';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { SearchSettings } from '@shared/schemas/rail.schema';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import type { MixEntry, Objective } from '@shared/search/problem';
import { formatQuantity } from '@shared/units/format';
import { formatCost } from '@/lib/format-cost';
import type { DraftLine } from './bank-history';
import { keyed } from './bank-history';

/**
 * The bank that a mix makes: locked lines stay, a part that is in the bank already keeps its mount and distance, what the
 * mix does not use goes.
 */
export function bankOfMix(
  lines: readonly DraftLine[],
  mix: readonly MixEntry[],
  parts: ReadonlyMap<string, Part>,
  newPartDistance_m: number | null,
): DraftLine[] {
  const byNumber = new Map([...parts.values()].map((part) => [part.partNumber, part]));
  const found = mix.flatMap(({ id, count }) => {
    const part = byNumber.get(id);
    if (!part || count === 0) return [];
    const placed = lines.find((line) => line.partId === part.id && !line.locked);
    if (placed) return [{ ...placed, count }];
    return keyed([
      {
        partId: part.id,
        count,
        mount_H: null,
        recipeId: null,
        distance_m: newPartDistance_m,
        side: 'top',
        locked: false,
      },
    ]);
  });
  found.sort((a, b) => (parts.get(b.partId)?.capacitance_F ?? 0) - (parts.get(a.partId)?.capacitance_F ?? 0));
  return [...lines.filter((line) => line.locked), ...found];
}

/** `17 parts`, `1.90 €`, `106 mm²`. */
export function weightText(objective: Objective, weight: number | null): string {
  if (weight === null || !Number.isFinite(weight)) return '—';
  if (objective === 'parts') return `${Math.round(weight)} part${Math.round(weight) === 1 ? '' : 's'}`;
  if (objective === 'cost') return formatCost(weight, 3);
  return formatQuantity(weight, 'mm²');
}

/** A bound is never shown higher than it is: rounded down to the digits shown. */
export function boundText(objective: Objective, bound: number): string {
  if (objective === 'parts') return weightText('parts', Math.ceil(bound - 1e-9));
  const step = objective === 'cost' ? 1000 : 10;
  return weightText(objective, Math.floor(bound * step + 1e-9) / step);
}

/**
 * What a search is asked: the rail, its locked lines, the candidates and how each is mounted. Counts of lines that are not
 * locked do not matter to it, so changing one leaves an answer as true as it was. Throws EngineError where a part has no value in
 * service on this rail.
 */
export function searchQuestion(
  spec: RailSpec,
  lines: readonly DraftLine[],
  parts: ReadonlyMap<string, Part>,
  setup: BoardSetup,
  search: SearchSettings,
  inService: boolean,
): RailDocument {
  const asked = lines
    .filter((line) => !line.locked || line.count > 0)
    .map((line) => (line.locked ? line : { ...line, count: 1 }));
  const document = railDocument(spec, asked, parts, setup, search);
  return inService ? documentIn(document, IN_SERVICE) : document;
}
