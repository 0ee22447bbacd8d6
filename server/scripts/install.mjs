import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

const OLDEST_NODE = [20, 19];

/** Stops with one sentence where Node.js is too old to run any of this. */
export function requireNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  const [wantedMajor, wantedMinor] = OLDEST_NODE;
  if (major > wantedMajor || (major === wantedMajor && minor >= wantedMinor)) return;
  console.error(
    `Millpond needs Node.js ${OLDEST_NODE.join('.')} or newer; this is ${process.versions.node}.`,
  );
  process.exit(1);
}

const stampFile = path.join(root, 'node_modules', '.millpond-installed');

/** True when what is installed is what the lock file says. */
function isInstalled(lock) {
  if (existsSync(stampFile)) return readFileSync(stampFile, 'utf8') === lock;
  // Installed by hand: npm keeps a lock of its own there, without what it left out for this machine.
  const npmLock = path.join(root, 'node_modules', '.package-lock.json');
  if (!existsSync(npmLock)) return false;
  const installed = JSON.parse(readFileSync(npmLock, 'utf8')).packages;
  return Object.entries(JSON.parse(lock).packages).every(
    ([name, { version, optional, devOptional }]) =>
      name === '' || (name in installed ? installed[name].version === version : optional || devOptional),
  );
}

/** Installs the dependencies when they are missing or older than the lock file. */
export function ensureInstalled() {
  const lock = readFileSync(path.join(root, 'package-lock.json'), 'utf8');
  if (isInstalled(lock)) return;
  console.log('Installing dependencies (npm ci) …');
  const npm = process.platform === 'win32' ? 'npm.cmd' : 'npm';
  const { status } = spawnSync(npm, ['ci', '--no-audit', '--no-fund', '--include=dev', '--loglevel=error'], {
    cwd: root,
    stdio: 'inherit',
    shell: process.platform === 'win32',
  });
  if (status !== 0) process.exit(status ?? 1);
  writeFileSync(stampFile, lock);
}
