import type { YieldProgress } from '@shared/engine/yield';
import type { RailYield } from '@shared/rail/yield';
import * as Comlink from 'comlink';
import type { Answer } from '../host/answer';
import { WorkerHost, workerSeat } from '../host/worker-host';
import type { YieldApi, YieldRequest } from './yield.interface';

/** Monte Carlo in a worker of its own, so that the bench goes on answering. */
export class YieldClient {
  private readonly host = new WorkerHost(() =>
    workerSeat<YieldApi>(new Worker(new URL('./yield.worker.ts', import.meta.url), { type: 'module' })),
  );

  run(request: YieldRequest, onProgress: (progress: YieldProgress) => void): Promise<Answer<RailYield>> {
    return this.host.call((api) => api.run(request, Comlink.proxy(onProgress)));
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
