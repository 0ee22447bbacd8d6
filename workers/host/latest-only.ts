import type { Answer } from './answer';

/**
 * Lets one request run and keeps at most one waiting: a newer request takes the waiting one's place, and answers that
 * are no longer the newest come back as `stale`. So a fast hand on the keyboard never builds a queue.
 */
export class LatestOnly<Request, Value> {
  private newest = 0;
  private running = false;
  private waiting: { request: Request; ticket: number; resolve: (answer: Answer<Value>) => void } | null =
    null;
  private readonly work: (request: Request) => Promise<Answer<Value>>;

  constructor(work: (request: Request) => Promise<Answer<Value>>) {
    this.work = work;
  }

  run(request: Request): Promise<Answer<Value>> {
    const ticket = ++this.newest;
    return new Promise((resolve) => {
      this.waiting?.resolve({ status: 'stale' });
      this.waiting = { request, ticket, resolve };
      if (!this.running) void this.drain();
    });
  }

  private async drain(): Promise<void> {
    this.running = true;
    while (this.waiting) {
      const { request, ticket, resolve } = this.waiting;
      this.waiting = null;
      const answer = await this.work(request);
      resolve(ticket === this.newest ? answer : { status: 'stale' });
    }
    this.running = false;
  }
}
