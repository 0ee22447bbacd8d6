import type { CornerStep, RailTime } from '@shared/rail/time';
import type { CornerResult, Envelope, MissingPart } from '@shared/rail/worst-cases';
import type { PartInService, RailChecks } from '@shared/schemas/checks.schema';
import type { Verdict } from '@shared/schemas/rail.schema';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { Answer } from '../host/answer';

/** What the bench asks beside its curve: `document` with catalogue parts and lines of count 1 or more. */
export interface ChecksRequest {
  document: RailDocument;
  /** What the chart shows. */
  span_Hz: readonly [number, number];
}

/** Headroom in all circumstances. */
export interface RailVerdicts {
  catalogue: Verdict;
  service: Verdict;
  /** All corners, the worst first. */
  corners: CornerResult[];
  /** In service, the one that hurts most first. */
  missing: MissingPart[];
  envelope: Envelope & { frequency_Hz: Float64Array };
  /** The parts of the bank with their factors. */
  parts: PartInService[];
  elapsed_ms: number;
}

/** Behaviour in time, in service. */
export interface RailInTime extends RailTime {
  worst_step: CornerStep | null;
  start_up: RailChecks['start_up'];
  elapsed_ms: number;
}

export interface ChecksApi {
  verdicts(request: ChecksRequest): Promise<Answer<RailVerdicts>>;
  inTime(request: ChecksRequest): Promise<Answer<RailInTime>>;
}
