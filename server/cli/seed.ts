import { seedDemo } from '../db/demo/seed';
import { readArguments } from './arguments';
import { BadInput } from './bad-input';
import { withContext } from './with-context';

export async function run(args: string[]): Promise<number> {
  const { positionals } = readArguments(args, {});
  if (positionals.length > 0) throw new BadInput(`unexpected word: ${positionals[0]}`);
  await withContext(seedDemo);
  process.stdout.write('The demo data is in place.\n');
  return 0;
}
