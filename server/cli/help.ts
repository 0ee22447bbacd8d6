import { commands } from './commands';

export async function run(): Promise<number> {
  const entries = Object.values(commands);
  const width = Math.max(...entries.map((entry) => entry.usage.length));
  const lines = entries.map((entry) => `  ${entry.usage.padEnd(width)}  ${entry.what}`);
  process.stdout.write(`millpond: plans the decoupling of circuit boards\n\n${lines.join('\n')}\n`);
  return 0;
}
