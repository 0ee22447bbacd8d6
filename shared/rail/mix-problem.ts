import type { RailDocument } from '../schemas/rail-document.schema';
import type { MixProblem } from '../search/problem';
import { lineModel, networkWith } from './network';
import { targetMask } from './target-mask';

/** As many of one part at most, when the document does not say. */
export const DEFAULT_MAX_PER_PART = 80;

/**
 * The mix search that a document asks for: locked lines stay, all other lines of the bank make room. A candidate is
 * mounted as the bank's line of that part is, where there is one, else in the part's usual way at the search's `distance_m` (nowhere: no path is added).
 */
export function mixProblem(document: RailDocument): MixProblem {
  const { rail, search } = document;
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  const locked = document.bank.filter((line) => line.locked);
  const candidates = (search?.candidates ?? document.parts.map((part) => part.id)).flatMap((id) => {
    const part = parts.get(id);
    if (!part) return [];
    const placed =
      document.bank.find((line) => line.part === id && !line.locked) ??
      (search?.distance_m !== undefined ? { distance_m: search.distance_m } : undefined);
    return [
      {
        id,
        line: lineModel(rail, part, { ...placed, count: 1 }),
        cost: part.unit_cost,
        area_mm2: part.area_mm2,
        max: search?.max_per_part ?? DEFAULT_MAX_PER_PART,
      },
    ];
  });
  const lines = locked.flatMap((line) => {
    const part = parts.get(line.part);
    return part ? [lineModel(rail, part, line)] : [];
  });
  return {
    network: networkWith(rail, lines),
    candidates,
    band_Hz: rail.band_Hz,
    target: targetMask(rail),
    minimise: search?.minimise ?? 'parts',
    ...(search?.max_kinds !== undefined && { maxKinds: search.max_kinds }),
  };
}
