import { benchApi } from './api';
import { benchChart } from './chart';
import { benchChecks } from './checks';
import { benchEngine } from './engine';
import { benchSearch } from './search';
import { benchTime } from './time';

const BENCHES: Record<string, () => string | Promise<string>> = {
  engine: benchEngine,
  checks: benchChecks,
  time: benchTime,
  search: benchSearch,
  api: benchApi,
  chart: benchChart,
};

// All of them, or those named: npm run bench -- engine search
const wanted = process.argv.slice(2);
for (const [name, bench] of Object.entries(BENCHES)) {
  if (wanted.length > 0 && !wanted.includes(name)) continue;
  console.log(`\n— ${name}`);
  console.log(await bench());
}
