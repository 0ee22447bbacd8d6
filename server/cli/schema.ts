import { railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { z } from 'zod';
import { BadInput } from './bad-input';
import { printJson } from './document';

/** The rail document's definition as JSON Schema. */
export async function run(args: string[]): Promise<number> {
  if (args.length > 0) throw new BadInput('schema takes no arguments');
  await printJson(z.toJSONSchema(railDocumentSchema, { io: 'input' }));
  return 0;
}
