import { mixProblem } from '@shared/rail/mix-problem';
import { runSearch } from '@shared/search/search';
import { oneFile, readArguments } from './arguments';
import { BadInput } from './bad-input';
import { onDocument, printJson, readDocument } from './document';

const DEFAULT_SECONDS = 60;

/** Finds the smallest bank that a rail document asks for. `--seconds N` limits the proof (default 60). */
export async function run(args: string[]): Promise<number> {
  const { values, positionals } = readArguments(args, { seconds: { type: 'string' } });
  const seconds = secondsOf(values.seconds);
  const file = oneFile(positionals, 'search');
  const document = await readDocument(file);
  const seed = document.search?.seed;
  const result = onDocument(file, () =>
    runSearch(mixProblem(document), {
      seconds,
      now: () => performance.now(),
      ...(seed !== undefined && { seed }),
    }),
  );
  if (!result.found) {
    await printJson({ mix: null, reason: result.reason, frequency_Hz: result.frequency_Hz });
    return 0;
  }
  const locked = document.bank.filter((line) => line.locked).map(({ part, count }) => ({ part, count }));
  await printJson({
    mix: result.mix.map(({ id, count }) => ({ part: id, count })),
    weight: result.weight,
    lower_bound: result.lowerBound,
    proven: result.proven,
    holds: result.holds,
    seconds: result.seconds,
    // They stay in the bank beside the mix and are not in its weight.
    ...(locked.length > 0 && { locked }),
  });
  return 0;
}

function secondsOf(text: string | undefined): number {
  const seconds = text === undefined ? DEFAULT_SECONDS : Number(text);
  if (!(seconds > 0) || !Number.isFinite(seconds)) throw new BadInput('--seconds takes a number above 0');
  return seconds;
}
