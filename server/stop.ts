import type { Server } from 'node:http';
import type { Context } from './context';

const PATIENCE_MS = 10_000;

/** On SIGTERM or SIGINT: take no more requests, finish those that run, close the database, leave. */
export function stopOnSignals(ctx: Context, server: Server): void {
  let stopping = false;
  const stop = async (signal: string) => {
    if (stopping) return;
    stopping = true;
    ctx.log.info({ signal }, 'stopping');
    setTimeout(() => {
      ctx.log.warn('requests did not end in time');
      server.closeAllConnections();
    }, PATIENCE_MS).unref();
    await new Promise<void>((resolve) => {
      server.close(() => resolve());
      server.closeIdleConnections();
    });
    await ctx.background.idle();
    await ctx.db.close();
    ctx.log.info('stopped');
    process.exit(0);
  };
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => void stop(signal));
}
