import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { SearchProgress, SearchResult } from '@shared/search/problem';
import type { Answer } from '../host/answer';

export interface SearchRequest {
  document: RailDocument;
  seconds: number;
  seed: number;
}

export interface SearchApi {
  /** Runs to the end, the time limit or `cancel`; `onProgress` hears of each better mix or bound. */
  search(
    request: SearchRequest,
    onProgress: (progress: SearchProgress) => void,
  ): Promise<Answer<SearchResult>>;
  /** Stops the run at its next pause; it then answers `stale`. */
  cancel(): Promise<void>;
}
