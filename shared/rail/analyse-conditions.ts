import type { Tightest } from '../engine/headroom';
import type { PartInService } from '../schemas/checks.schema';
import type { RailDocument } from '../schemas/rail-document.schema';
import type { Conditions } from '../schemas/rail-spec.schema';
import { type Analysis, analyseDocument } from './analyse';
import { partInService } from './checks';
import { conditionsOf } from './conditions';
import { IN_SERVICE } from './corner';
import { documentIn } from './in-service';
import { cornerResults, headroomOf, missingParts } from './worst-cases';

interface Circumstance {
  tightest: Tightest | null;
  holds: boolean;
}

/** What `analyse --conditions` prints: the analysis in service, and what else the rail's conditions bring. */
export interface ConditionsAnalysis extends Analysis {
  conditions: Conditions;
  /** The document states none: the usual ones stand in. */
  assumed: boolean;
  catalogue: Circumstance;
  service: Circumstance;
  /** The worst first. */
  corners: (Circumstance & { corner: string })[];
  /** One capacitor of a line open, in service; the one that hurts most first. */
  missing: (Circumstance & { part: string })[];
  parts: PartInService[];
}

/**
 * A document's rail under its conditions. `frequency_Hz` … `tightest` are those in service; `holds` only when it holds in service
 * and in every corner. Throws EngineError naming the field at fault.
 */
export function analyseConditions(document: RailDocument): ConditionsAnalysis {
  const { conditions, assumed } = conditionsOf(document.rail);
  const serving = documentIn(document, IN_SERVICE);
  const analysis = analyseDocument(serving);
  const corners = cornerResults(document);
  const inBank = new Set(document.bank.map((line) => line.part));
  return {
    ...analysis,
    holds: analysis.holds && corners.every((one) => one.holds),
    conditions,
    assumed,
    catalogue: headroomOf(document),
    service: { tightest: analysis.tightest, holds: analysis.holds },
    corners: corners.map(({ name, tightest, holds }) => ({ corner: name, tightest, holds })),
    missing: missingParts(serving).map(({ part, tightest, holds }) => ({ part, tightest, holds })),
    parts: document.parts
      .filter((part) => inBank.has(part.id))
      .map((part) => partInService(part, document.rail)),
  };
}
