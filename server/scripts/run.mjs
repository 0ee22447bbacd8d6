import { spawn } from 'node:child_process';
import { root } from './install.mjs';

/** Runs Node.js with the arguments in the project's folder, sharing the terminal. */
export const runNode = (args) => spawn(process.execPath, args, { cwd: root, stdio: 'inherit' });

/** Hands signals to the children and leaves, with the first one's exit status, when it ends. */
export function passOn(children) {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'])
    process.on(signal, () => {
      for (const child of children) child.kill(signal);
    });
  for (const child of children)
    child.on('exit', (status, signal) => {
      for (const other of children) if (other !== child) other.kill('SIGTERM');
      process.exitCode ??= status ?? (signal ? 1 : 0);
    });
}
