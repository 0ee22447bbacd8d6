import { type ChildProcess, spawn } from 'node:child_process';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '../..');

export interface Ended {
  status: number | null;
  stdout: string;
  stderr: string;
}

function collect(child: ChildProcess): Promise<Ended> {
  let stdout = '';
  let stderr = '';
  child.stdout?.on('data', (chunk) => (stdout += chunk));
  child.stderr?.on('data', (chunk) => (stderr += chunk));
  return new Promise((resolve) => child.on('close', (status) => resolve({ status, stdout, stderr })));
}

function start(script: string, args: string[], environment: NodeJS.ProcessEnv): ChildProcess {
  return spawn(process.execPath, ['--import', 'tsx', script, ...args], {
    cwd: root,
    env: { ...process.env, MILLPOND_RATE_LIMIT: '0', ...environment },
    stdio: ['pipe', 'pipe', 'pipe'],
  });
}

/** Runs the command to its end. */
export function millpond(args: string[], dataFolder: string, stdin = ''): Promise<Ended> {
  const child = start('server/cli/main.ts', args, { MILLPOND_DATA: dataFolder });
  child.stdin?.end(stdin);
  return collect(child);
}

export interface RunningServer {
  url: string;
  /** Sends the signal and waits for the end. */
  stop(signal?: NodeJS.Signals): Promise<Ended>;
}

/** Starts the server on a free port and waits until it says where it is. */
export async function startServer(
  dataFolder: string,
  environment: NodeJS.ProcessEnv = {},
): Promise<RunningServer> {
  const child = start('server/main.ts', [], { MILLPOND_DATA: dataFolder, PORT: '0', ...environment });
  const ended = collect(child);
  const url = await new Promise<string>((resolve, reject) => {
    let text = '';
    child.stdout?.on('data', (chunk) => {
      text += chunk;
      const found = text.match(/http:\/\/\S+/);
      if (found) resolve(found[0]);
    });
    ended.then(({ stderr }) => reject(new Error(`the server did not start: ${stderr}`)));
  });
  return {
    url,
    stop: (signal = 'SIGTERM') => {
      child.kill(signal);
      return ended;
    },
  };
}
