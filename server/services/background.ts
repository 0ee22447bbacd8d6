import type { Logger } from 'pino';

/** Work that an answer does not wait for; a graceful stop does. */
export class Background {
  private readonly running = new Set<Promise<void>>();

  constructor(private readonly log: Logger) {}

  run(what: string, work: () => Promise<unknown>): void {
    const job = new Promise<void>((resolve) => setImmediate(resolve))
      .then(work)
      .then(
        () => undefined,
        (error: unknown) => this.log.error({ err: error }, `${what} failed`),
      )
      .finally(() => this.running.delete(job));
    this.running.add(job);
  }

  async idle(): Promise<void> {
    while (this.running.size > 0) await Promise.all(this.running);
  }
}
