import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { defineConfig } from '@playwright/test';
import { findChromium } from './tests/system-packages.mjs';

const port = Number(process.env.MILLPOND_E2E_PORT ?? 4799);
// One fresh data folder a run; workers read the same name from the environment.
process.env.MILLPOND_E2E_DATA ??= join(tmpdir(), `millpond-e2e-${Date.now()}`);

export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: 'test-results/e2e',
  // The steps build on each other's data and share two cores: one after the other.
  workers: 1,
  fullyParallel: false,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [['list'], ['json', { outputFile: 'test-results/e2e.json' }]],
  use: {
    baseURL: `http://127.0.0.1:${port}`,
    viewport: { width: 1440, height: 920 },
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: findChromium() ?? undefined,
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        '--no-first-run',
      ],
    },
  },
  webServer: {
    command: 'node --import tsx server/main.ts',
    url: `http://127.0.0.1:${port}/api/health`,
    timeout: 60_000,
    stdout: 'ignore',
    env: {
      PORT: String(port),
      MILLPOND_DATA: process.env.MILLPOND_E2E_DATA,
      MILLPOND_RATE_LIMIT: '0',
      MILLPOND_LOG_LEVEL: 'warn',
    },
  },
});
