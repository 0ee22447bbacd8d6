import { EngineError } from '../engine/errors';
import { holds, tightestHeadroom } from '../engine/headroom';
import { compileRail } from '../engine/rail';
import { ENGINE_VERSION } from '../engine/version';
import type { RailSummary } from '../schemas/rail.schema';
import type { RailDocument } from '../schemas/rail-document.schema';
import { bankFigures } from './bank-figures';
import { networkOf } from './network';
import { targetMask } from './target-mask';

/** What lists show of a rail. Never throws for a valid document: the reason it has no result stands in `error`. */
export function summariseRail(document: RailDocument): RailSummary {
  const figures = { engineVersion: ENGINE_VERSION, ...bankFigures(document) };
  try {
    const rail = compileRail(networkOf(document));
    const tightest = tightestHeadroom(rail, document.rail.band_Hz, targetMask(document.rail));
    return { ...figures, holds: holds(tightest), tightest, error: null };
  } catch (error) {
    if (!(error instanceof EngineError)) throw error;
    return { ...figures, holds: null, tightest: null, error: error.message };
  }
}
