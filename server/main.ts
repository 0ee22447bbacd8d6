import type { AddressInfo } from 'node:net';
import path from 'node:path';
import { config as loadEnvironmentFile } from 'dotenv';
import { announce } from './announce';
import { createApp } from './app';
import { ConfigError, readConfig } from './config/environment';
import { seedOnFirstRun } from './db/demo/seed';
import { renewOldResults } from './services/renew-results';
import { startContext } from './start-context';
import { stopOnSignals } from './stop';

const CLIENT_FOLDER = path.resolve(import.meta.dirname, '../dist');

async function main(): Promise<void> {
  loadEnvironmentFile({ quiet: true });
  const ctx = await startContext(readConfig(process.env));
  if (ctx.config.demo) await seedOnFirstRun(ctx);
  await renewOldResults(ctx);
  const server = createApp(ctx, { clientFolder: CLIENT_FOLDER }).listen(ctx.config.port, ctx.config.host);
  await new Promise<void>((resolve, reject) => {
    server.once('listening', resolve);
    server.once('error', reject);
  });
  stopOnSignals(ctx, server);
  const { port } = server.address() as AddressInfo;
  await announce(ctx, port);
}

main().catch((error: unknown) => {
  const inUse = error instanceof Error && 'code' in error && error.code === 'EADDRINUSE';
  const reason = inUse
    ? 'another program listens on this port; choose one, e.g. PORT=4781 npm start'
    : error instanceof Error
      ? error.message
      : String(error);
  process.stderr.write(
    error instanceof ConfigError
      ? `Millpond cannot start: wrong setting: ${reason}\n`
      : `Millpond cannot start: ${reason}\n`,
  );
  process.exit(1);
});
