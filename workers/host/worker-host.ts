import * as Comlink from 'comlink';
import { type Answer, failed } from './answer';

/** How a worker is made and talked to; tests put an object in its place that runs in the same process. */
export interface WorkerSeat<Api> {
  api: Api;
  /** Called when the worker itself breaks (its script fails to load, memory runs out). */
  onCrash: (listener: (message: string) => void) => void;
  end: () => void;
}

/** A seat with a real worker behind it. */
export function workerSeat<Api>(worker: Worker): WorkerSeat<Comlink.Remote<Api>> {
  return {
    api: Comlink.wrap<Api>(worker),
    onCrash: (listener) => {
      worker.addEventListener('error', (event) => listener(event.message || 'the worker stopped'));
      worker.addEventListener('messageerror', () => listener('the worker sent something unreadable'));
    },
    end: () => worker.terminate(),
  };
}

/**
 * Holds one worker, made when it is first needed. A worker that crashes fails whatever waits for it, and the next call
 * starts a fresh one.
 */
export class WorkerHost<Api> {
  private seat: WorkerSeat<Api> | null = null;
  private readonly waiting = new Set<(answer: Answer<never>) => void>();
  private readonly makeSeat: () => WorkerSeat<Api>;

  constructor(makeSeat: () => WorkerSeat<Api>) {
    this.makeSeat = makeSeat;
  }

  /** Calls the worker; settles with `failed` if it crashes or is ended before it has answered. */
  async call<T>(work: (api: Api) => Promise<Answer<T>>): Promise<Answer<T>> {
    const seat = this.take();
    let fail: ((answer: Answer<never>) => void) | null = null;
    const crash = new Promise<Answer<never>>((resolve) => {
      fail = resolve;
      this.waiting.add(resolve);
    });
    try {
      return await Promise.race([work(seat.api).catch((error: unknown) => failed(String(error))), crash]);
    } finally {
      if (fail) this.waiting.delete(fail);
    }
  }

  /** Ends the worker; calls under way settle with `failed` and this message. */
  dispose(message = 'stopped'): void {
    this.seat?.end();
    this.seat = null;
    for (const fail of this.waiting) fail(failed(message));
    this.waiting.clear();
  }

  private take(): WorkerSeat<Api> {
    if (this.seat) return this.seat;
    const seat = this.makeSeat();
    seat.onCrash((message) => {
      if (this.seat === seat) this.dispose(`the calculation stopped: ${message}`);
    });
    this.seat = seat;
    return seat;
  }
}
