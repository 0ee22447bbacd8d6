import type { SearchProgress, SearchResult } from '@shared/search/problem';
import * as Comlink from 'comlink';
import type { Answer } from '../host/answer';
import { WorkerHost, workerSeat } from '../host/worker-host';
import type { SearchApi, SearchRequest } from './search.interface';

/** The mix search in a worker of its own; a new search ends the one before. */
export class SearchClient {
  private readonly host = new WorkerHost(() =>
    workerSeat<SearchApi>(new Worker(new URL('./search.worker.ts', import.meta.url), { type: 'module' })),
  );

  search(
    request: SearchRequest,
    onProgress: (progress: SearchProgress) => void,
  ): Promise<Answer<SearchResult>> {
    return this.host.call((api) => api.search(request, Comlink.proxy(onProgress)));
  }

  /** Asks the run to stop; it answers `stale`. */
  async cancel(): Promise<void> {
    await this.host.call(async (api) => {
      await api.cancel();
      return { status: 'stale' };
    });
  }

  dispose(): void {
    this.host.dispose();
  }
}
