import { LatestOnly } from '../host/latest-only';
import { WorkerHost, workerSeat } from '../host/worker-host';
import type { ChecksApi, ChecksRequest, RailInTime, RailVerdicts } from './checks.interface';

/** The bench's slower questions; of each kind the newest request wins. */
export class ChecksClient {
  private readonly host = new WorkerHost(() =>
    workerSeat<ChecksApi>(new Worker(new URL('./checks.worker.ts', import.meta.url), { type: 'module' })),
  );
  private readonly latestVerdicts = new LatestOnly<ChecksRequest, RailVerdicts>((request) =>
    this.host.call((api) => api.verdicts(request)),
  );
  private readonly latestInTime = new LatestOnly<ChecksRequest, RailInTime>((request) =>
    this.host.call((api) => api.inTime(request)),
  );

  verdicts(request: ChecksRequest) {
    return this.latestVerdicts.run(request);
  }

  inTime(request: ChecksRequest) {
    return this.latestInTime.run(request);
  }

  dispose(): void {
    this.host.dispose();
  }
}
