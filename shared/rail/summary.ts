import { EngineError } from '../engine/errors';
import { ENGINE_VERSION } from '../engine/version';
import type { RailSummary, Verdict } from '../schemas/rail.schema';
import type { RailDocument } from '../schemas/rail-document.schema';
import { bankFigures } from './bank-figures';
import { IN_SERVICE } from './corner';
import { documentIn } from './in-service';
import { cornerResults, headroomOf, missingParts } from './worst-cases';

/**
 * What lists show of a rail: headroom in service, and beside it at catalogue values, in the worst corner, and with the one part
 * open that hurts most. Never throws for a valid document: the reason it has no result stands in `error`.
 */
export function summariseRail(document: RailDocument): RailSummary {
  const nothing = { holds: null, tightest: null, catalogue: null, worst: null, missing: null };
  const figures = { engineVersion: ENGINE_VERSION, ...bankFigures(document) };
  let catalogue: Verdict | null = null;
  try {
    catalogue = headroomOf(document);
    const serving = documentIn(document, IN_SERVICE);
    const { tightest, holds } = headroomOf(serving);
    const [worst] = cornerResults(document);
    const missing = missingParts(serving).at(0);
    return {
      ...figures,
      holds,
      tightest,
      catalogue,
      worst: { holds: worst.holds, tightest: worst.tightest, corner: worst.name },
      missing: missing?.tightest
        ? { holds: missing.holds, tightest: missing.tightest, part: missing.part }
        : null,
      error: null,
    };
  } catch (error) {
    if (!(error instanceof EngineError)) throw error;
    return { ...figures, ...nothing, catalogue, error: error.message };
  }
}
