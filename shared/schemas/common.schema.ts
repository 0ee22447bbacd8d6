import { z } from 'zod';
import './plain-messages';

export const idSchema = z.uuid();
export const isoDateSchema = z.iso.datetime();

/** A name a person gives: trimmed, on one line. */
export const nameSchema = z
  .string()
  .trim()
  .min(1, 'must not be empty')
  .max(80, 'at most 80 characters')
  .regex(/^[^\p{Cc}]*$/u, 'must not contain control characters');

export const noteSchema = z.string().trim().max(2000, 'at most 2000 characters');

/** The version of an editable thing, for optimistic concurrency: a save names the one it started from. */
export const versionSchema = z.int().min(1);

/** The same in a query, where a request has no body (DELETE). */
export const versionQuerySchema = z.strictObject({ version: z.coerce.number().pipe(versionSchema) });

export const pageQuerySchema = z.strictObject({
  limit: z.coerce.number().int().min(1).max(500).default(100),
  offset: z.coerce.number().int().min(0).max(1_000_000).default(0),
});
export type PageQuery = z.infer<typeof pageQuerySchema>;

export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), total: z.int(), limit: z.int(), offset: z.int() });
export interface Page<T> {
  items: T[];
  total: number;
  limit: number;
  offset: number;
}

/** An error as RFC 9457 problem details. `errors` has one entry a fault, its path as in `rail.band_Hz[1]`. */
export const problemSchema = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string().optional(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
});
export type Problem = z.infer<typeof problemSchema>;

/** Who did something, as shown beside it. */
export const personRefSchema = z.object({ id: idSchema, name: z.string() });
export type PersonRef = z.infer<typeof personRefSchema>;

/** `['rail','band_Hz',1]` → `rail.band_Hz[1]`. */
export function formatPath(path: readonly PropertyKey[]): string {
  return path.reduce<string>(
    (text, key) =>
      typeof key === 'number' ? `${text}[${key}]` : text === '' ? String(key) : `${text}.${String(key)}`,
    '',
  );
}
