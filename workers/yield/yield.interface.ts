import type { YieldProgress } from '@shared/engine/yield';
import type { RailYield } from '@shared/rail/yield';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { Answer } from '../host/answer';

export interface YieldRequest {
  document: RailDocument;
  draws: number;
  seed: number;
}

export interface YieldApi {
  /** Runs to the end or to `cancel`; `onProgress` hears of every few hundred draws. */
  run(request: YieldRequest, onProgress: (progress: YieldProgress) => void): Promise<Answer<RailYield>>;
  /** Stops the run at its next pause; it then answers `stale`. */
  cancel(): Promise<void>;
}
