import { analyseDocument } from '@shared/rail/analyse';
import { oneFile, readArguments } from './arguments';
import { onDocument, printJson, readDocument } from './document';

/** Impedance, peaks and tightest headroom of a rail document. Status 1: the rail does not hold. */
export async function run(args: string[]): Promise<number> {
  const file = oneFile(readArguments(args, {}).positionals, 'analyse');
  const document = await readDocument(file);
  const analysis = onDocument(file, () => analyseDocument(document));
  await printJson(analysis);
  return analysis.holds ? 0 : 1;
}
