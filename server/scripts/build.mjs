import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { root } from './install.mjs';

const sources = [
  'src',
  'shared',
  'workers',
  'public',
  'index.html',
  'vite.config.ts',
  'tailwind.config.ts',
  'package-lock.json',
];

function newest(entry) {
  if (!existsSync(entry)) return 0;
  const own = statSync(entry);
  if (!own.isDirectory()) return own.mtimeMs;
  return readdirSync(entry).reduce((latest, name) => Math.max(latest, newest(path.join(entry, name))), 0);
}

/** Builds the client when it is missing or older than what it is made from. */
export function ensureBuilt() {
  const page = path.join(root, 'dist', 'index.html');
  const latest = Math.max(...sources.map((name) => newest(path.join(root, name))));
  if (existsSync(page) && statSync(page).mtimeMs >= latest) return;
  console.log('Building the client (vite build) …');
  const vite = path.join(root, 'node_modules', 'vite', 'bin', 'vite.js');
  const { status } = spawnSync(process.execPath, [vite, 'build', '--logLevel', 'warn'], {
    cwd: root,
    stdio: 'inherit',
  });
  if (status !== 0) process.exit(status ?? 1);
}
