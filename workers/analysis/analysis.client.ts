import { LatestOnly } from '../host/latest-only';
import { WorkerHost, workerSeat } from '../host/worker-host';
import type { AnalysisApi, BenchAnalysis, BenchRequest } from './analysis.interface';

/** The bench's calculator: the newest request wins. */
export class AnalysisClient {
  private readonly host = new WorkerHost(() =>
    workerSeat<AnalysisApi>(new Worker(new URL('./analysis.worker.ts', import.meta.url), { type: 'module' })),
  );
  private readonly latest = new LatestOnly<BenchRequest, BenchAnalysis>((request) =>
    this.host.call((api) => api.analyse(request)),
  );

  analyse(request: BenchRequest) {
    return this.latest.run(request);
  }

  dispose(): void {
    this.host.dispose();
  }
}
