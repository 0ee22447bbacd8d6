import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

export const PASSWORD = 'still water at dusk';
export const EMAIL = 'engineer@alderbrook.example';

/** The product with fresh demo data on a port of its own, for as long as `work` runs. */
export async function withServer<T>(port: number, work: (base: string) => Promise<T>): Promise<T> {
  const data = mkdtempSync(path.join(tmpdir(), 'millpond-bench-'));
  const server: ChildProcess = spawn('node', ['--import', 'tsx', 'server/main.ts'], {
    stdio: 'ignore',
    env: {
      ...process.env,
      PORT: String(port),
      MILLPOND_DATA: data,
      MILLPOND_RATE_LIMIT: '0',
      MILLPOND_LOG_LEVEL: 'warn',
    },
  });
  const base = `http://127.0.0.1:${port}`;
  try {
    for (let i = 0; ; i++) {
      const answers = await fetch(`${base}/api/health`).then(
        (response) => response.ok,
        () => false,
      );
      if (answers) break;
      if (i > 100) throw new Error('the server did not start');
      await new Promise((resolve) => setTimeout(resolve, 200));
    }
    return await work(base);
  } finally {
    server.kill('SIGTERM');
    await new Promise((resolve) => server.once('exit', resolve));
    rmSync(data, { recursive: true, force: true });
  }
}

/** Signs in and gives the cookie to send. */
export async function cookieOf(base: string): Promise<string> {
  const response = await fetch(`${base}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: EMAIL, password: PASSWORD }),
  });
  return response.headers.getSetCookie()[0].split(';')[0];
}
