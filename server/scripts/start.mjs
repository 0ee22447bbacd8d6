import { ensureBuilt } from './build.mjs';
import { ensureInstalled, requireNode } from './install.mjs';
import { passOn, runNode } from './run.mjs';

requireNode();
ensureInstalled();
ensureBuilt();
passOn([runNode(['--import', 'tsx', 'server/main.ts'])]);
