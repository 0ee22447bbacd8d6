// The project's checks in one command: types, lint and format, unit and API tests, build, end-to-end in a browser.
// Installs what is missing where it may; what it cannot check it says, with the reason.
import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { ensureInstalled, requireNode, root } from '../server/scripts/install.mjs';
import { ensureSystemPackages } from './system-packages.mjs';

requireNode();
ensureInstalled();
const missing = ensureSystemPackages();

const WHY = {
  chromium: 'the end-to-end run, since Chromium is not installed',
  ngspice: 'the live comparison with ngspice, since it is not installed (its recorded results were checked)',
};
const results = path.join(root, 'test-results');
const total = { passed: 0, failed: 0, skipped: 0 };
const failedSteps = [];
const binary = (name) => path.join(root, 'node_modules', '.bin', name);

function step(title, command, args) {
  console.log(`\n— ${title}`);
  const start = Date.now();
  const { status } = spawnSync(command, args, {
    cwd: root,
    stdio: 'inherit',
    shell: process.platform === 'win32',
  });
  console.log(`  ${status === 0 ? 'done' : 'FAILED'} in ${((Date.now() - start) / 1000).toFixed(1)} s`);
  if (status !== 0) failedSteps.push(title);
  return status === 0;
}

function count(file, read) {
  const report = path.join(results, file);
  if (!existsSync(report)) return;
  const [passed, failed, skipped] = read(JSON.parse(readFileSync(report, 'utf8')));
  total.passed += passed;
  total.failed += failed;
  total.skipped += skipped;
}

rmSync(results, { recursive: true, force: true });
step('types', binary('tsc'), ['--noEmit']);
step('lint and format', binary('biome'), ['check', '--error-on-warnings', '.']);
step('unit, property, reference and API tests', binary('vitest'), [
  'run',
  '--reporter=default',
  '--reporter=json',
  `--outputFile.json=${path.join(results, 'vitest.json')}`,
]);
count('vitest.json', (r) => [r.numPassedTests, r.numFailedTests, r.numPendingTests + r.numTodoTests]);
const built = step('build', binary('vite'), ['build', '--logLevel', 'warn']);
if (missing.includes('chromium')) console.log('\n— end to end: SKIPPED, Chromium is not installed');
else if (built) {
  step('end to end in Chromium', binary('playwright'), ['test']);
  count('e2e.json', ({ stats }) => [stats.expected + stats.flaky, stats.unexpected, stats.skipped]);
}

console.log('');
for (const name of missing) console.log(`not checked: ${WHY[name] ?? name}`);
for (const title of failedSteps) console.log(`failed: ${title}`);
const failed = Math.max(total.failed, failedSteps.length > 0 ? 1 : 0);
console.log(`${total.passed} passed, ${failed} failed, ${total.skipped} skipped`);
process.exit(failed > 0 ? 1 : 0);
