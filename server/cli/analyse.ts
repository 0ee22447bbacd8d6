import { analyseDocument } from '@shared/rail/analyse';
import { analyseConditions } from '@shared/rail/analyse-conditions';
import { oneFile, readArguments } from './arguments';
import { onDocument, printJson, readDocument } from './document';

/**
 * Impedance, peaks and tightest headroom of a rail document, with its parts' numbers as they stand. `--conditions`: with its parts
 * in service, and beside it every corner of the rail's conditions, each part's factors and the missing-part check. Status 1: the
 * rail does not hold (with `--conditions`: in service or in some corner).
 */
export async function run(args: string[]): Promise<number> {
  const { values, positionals } = readArguments(args, { conditions: { type: 'boolean' } });
  const file = oneFile(positionals, 'analyse');
  const document = await readDocument(file);
  const analysis = onDocument(file, () =>
    values.conditions ? analyseConditions(document) : analyseDocument(document),
  );
  await printJson(analysis);
  return analysis.holds ? 0 : 1;
}
