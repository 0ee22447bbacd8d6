import { partInService, startUpCheck } from '@shared/rail/checks';
import { IN_SERVICE } from '@shared/rail/corner';
import { documentIn } from '@shared/rail/in-service';
import { railTime, worstCornerStep } from '@shared/rail/time';
import { cornerResults, envelopeOver, headroomOf, missingParts } from '@shared/rail/worst-cases';
import { guard } from '../host/guard';
import type { ChecksApi, ChecksRequest, RailInTime, RailVerdicts } from './checks.interface';

/** Points a decade of the envelope; it is drawn, verdicts come from refined peaks. */
const PER_DECADE = 60;

/** The slower answers about a rail, each asked for itself so that none waits for another. */
export class Checks implements ChecksApi {
  async verdicts(request: ChecksRequest) {
    return guard(() => verdictsOf(request));
  }

  async inTime({ document }: ChecksRequest) {
    return guard(() => inTimeOf(document));
  }
}

export function verdictsOf({ document, span_Hz }: ChecksRequest): RailVerdicts {
  const start = performance.now();
  const serving = documentIn(document, IN_SERVICE);
  const frequency_Hz = evenGrid(span_Hz);
  return {
    catalogue: headroomOf(document),
    service: headroomOf(serving),
    corners: cornerResults(document),
    missing: missingParts(serving),
    envelope: { frequency_Hz, ...envelopeOver(document, frequency_Hz) },
    parts: document.parts
      .filter((part) => document.bank.some((line) => line.part === part.id))
      .map((part) => partInService(part, document.rail)),
    elapsed_ms: performance.now() - start,
  };
}

export function inTimeOf(document: ChecksRequest['document']): RailInTime {
  const start = performance.now();
  const time = railTime(documentIn(document, IN_SERVICE));
  return {
    ...time,
    worst_step: worstCornerStep(document),
    start_up: startUpCheck(document),
    elapsed_ms: performance.now() - start,
  };
}

function evenGrid([low, high]: readonly [number, number]): Float64Array {
  const steps = Math.max(2, Math.ceil(Math.log10(high / low) * PER_DECADE));
  return Float64Array.from({ length: steps + 1 }, (_, i) =>
    i === steps ? high : low * (high / low) ** (i / steps),
  );
}
