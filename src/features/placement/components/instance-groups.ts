import { hasSoftTermination, isLargeCeramic, isPolarised } from '@shared/rail/cautions';
import type { Instance, RevisionRail } from '@shared/schemas/revision.schema';

export interface RailGroup {
  railId: string;
  rail: string;
  instances: Instance[];
}

/** The capacitors of a revision, rail by rail; rails without any are left out. */
export function railGroups(results: readonly RevisionRail[]): RailGroup[] {
  return results
    .filter(({ instances }) => instances.length > 0)
    .map(({ railId, document, instances }) => ({ railId, rail: document.rail.name, instances }));
}

/** The one remark on the farthest distance that holds for every capacitor of a rail, so that it is said once. */
export function sharedReason({ instances }: Pick<RailGroup, 'instances'>): string | null {
  const [first] = instances;
  const isShared = instances.every(
    (one) =>
      one.farthestReason === first.farthestReason &&
      (one.farthest_m === null) === (first.farthest_m === null),
  );
  return isShared ? first.farthestReason : null;
}

export interface LayoutCautions {
  /** Part numbers of large ceramics without soft terminations, and of those with. */
  cracks: string[];
  bends: string[];
  polarised: string[];
}

/** The parts of a revision that layout must treat with care, each named once. */
export function layoutCautions(results: readonly RevisionRail[]): LayoutCautions {
  const placed = new Set(results.flatMap(({ instances }) => instances.map((one) => one.partNumber)));
  const parts = results.flatMap(({ document }) => document.parts).filter((part) => placed.has(part.id));
  const large = parts.filter((part) => isLargeCeramic(part));
  const unique = (ids: string[]) => [...new Set(ids)].sort();
  return {
    cracks: unique(large.filter((part) => !hasSoftTermination(part)).map((part) => part.id)),
    bends: unique(large.filter(hasSoftTermination).map((part) => part.id)),
    polarised: unique(parts.filter((part) => isPolarised(part)).map((part) => part.id)),
  };
}
