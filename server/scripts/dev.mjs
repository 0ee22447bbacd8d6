import { ensureInstalled, requireNode } from './install.mjs';
import { passOn, runNode } from './run.mjs';

requireNode();
ensureInstalled();
passOn([
  runNode(['node_modules/tsx/dist/cli.mjs', 'watch', '--clear-screen=false', 'server/main.ts']),
  runNode(['node_modules/vite/bin/vite.js']),
]);
