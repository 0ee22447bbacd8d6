import { BadInput } from './bad-input';
import { commands } from './commands';

const oneLine = (text: string): string => text.replace(/\s+/g, ' ').trim();

async function main([name = 'help', ...args]: string[]): Promise<number> {
  const wanted = name === '--help' || name === '-h' ? 'help' : name;
  if (!Object.hasOwn(commands, wanted))
    throw new BadInput(`there is no command ${wanted}; millpond help lists them`);
  const command = await commands[wanted].load();
  return command.run(args);
}

try {
  process.exitCode = await main(process.argv.slice(2));
} catch (error) {
  process.stderr.write(`millpond: ${oneLine(error instanceof Error ? error.message : String(error))}\n`);
  // 1 is an answer (the rail does not hold), so every failure is 2.
  process.exitCode = 2;
}
