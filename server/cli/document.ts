import { readFile } from 'node:fs/promises';
import { EngineError } from '@shared/engine/errors';
import { formatPath } from '@shared/schemas/common.schema';
import { type RailDocument, railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { BadInput } from './bad-input';

/** Reads a rail document; what is wrong with it is said with the file and the field. */
export async function readDocument(file: string): Promise<RailDocument> {
  let text: string;
  try {
    text = await readFile(file, 'utf8');
  } catch (error) {
    throw new BadInput(`${file}: cannot be read: ${error instanceof Error ? error.message : String(error)}`);
  }
  let json: unknown;
  try {
    json = JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch (error) {
    throw new BadInput(`${file}: not JSON: ${error instanceof Error ? error.message : String(error)}`);
  }
  const parsed = railDocumentSchema.safeParse(json);
  if (parsed.success) return parsed.data;
  const faults = parsed.error.issues.map((issue) => {
    const unknown = 'keys' in issue && Array.isArray(issue.keys) ? issue.keys.map(String) : [];
    const path = formatPath([...issue.path, ...unknown.slice(0, 1)]);
    return `${path || 'document'}: ${unknown.length > 0 ? 'unknown key' : issue.message}`;
  });
  throw new BadInput(`${file}: ${faults.slice(0, 5).join('; ')}${faults.length > 5 ? '; and more' : ''}`);
}

/** Runs `work` on a document; what the engine refuses becomes bad input that names the field. */
export function onDocument<T>(file: string, work: () => T): T {
  try {
    return work();
  } catch (error) {
    if (error instanceof EngineError) throw new BadInput(`${file}: ${error.field}: ${error.message}`);
    throw error;
  }
}

/** One JSON object on standard output. */
export function printJson(value: unknown): Promise<void> {
  return new Promise((resolve, reject) => {
    process.stdout.write(`${JSON.stringify(value)}\n`, (error) => (error ? reject(error) : resolve()));
  });
}
