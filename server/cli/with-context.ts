import type { Context } from '../context';
import { startContext } from '../start-context';
import { commandConfig } from './settings';

/** Opens the data folder, does the work, closes it again. */
export async function withContext<T>(work: (ctx: Context) => Promise<T>): Promise<T> {
  const ctx = await startContext(commandConfig());
  try {
    return await work(ctx);
  } finally {
    await ctx.background.idle();
    await ctx.db.close();
  }
}
