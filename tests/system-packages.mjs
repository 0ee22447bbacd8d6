import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

/** What the tests use beyond npm packages, how it is found, and Debian's package that brings it. */
const WANTED = [
  { name: 'chromium', find: () => findChromium() !== null },
  { name: 'ngspice', find: () => spawnSync('ngspice', ['--version'], { stdio: 'ignore' }).status === 0 },
];

/** Where Chromium is: MILLPOND_CHROMIUM, or the usual places; null where it is not. */
export function findChromium() {
  const places = [
    process.env.MILLPOND_CHROMIUM,
    '/usr/bin/chromium',
    '/usr/bin/chromium-browser',
    '/usr/bin/google-chrome',
  ];
  return places.find((place) => place && existsSync(place)) ?? null;
}

const mayInstall = () => process.getuid?.() === 0 && existsSync('/usr/bin/apt-get');

/** Installs what is missing from Debian's packages where that is allowed; gives the names of what is missing still. */
export function ensureSystemPackages() {
  const missing = () => WANTED.filter(({ find }) => !find()).map(({ name }) => name);
  const before = missing();
  if (before.length === 0 || !mayInstall()) return before;
  console.log(`Installing ${before.join(' and ')} (apt-get) …`);
  const options = {
    stdio: ['ignore', 'ignore', 'inherit'],
    timeout: 600_000,
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  };
  spawnSync('apt-get', ['update', '-qq'], options);
  spawnSync('apt-get', ['install', '-y', '-qq', '--no-install-recommends', ...before], options);
  return missing();
}
