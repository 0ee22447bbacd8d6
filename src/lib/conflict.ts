import { personRefSchema } from '@shared/schemas/common.schema';
import { z } from 'zod';
import { ApiError } from './problem';

export interface Conflict<T> {
  /** The state that stands on the server now. */
  current: T;
  changedBy: string | null;
  changedAt: string | null;
}

/** What a stale save met: the newer state, who made it and when; null when the error is another one. */
export function conflictOf<T extends z.ZodType>(error: unknown, schema: T): Conflict<z.infer<T>> | null {
  if (!(error instanceof ApiError) || error.status !== 409) return null;
  const parsed = z
    .looseObject({
      current: schema,
      changedBy: personRefSchema.nullish(),
      changedAt: z.string().nullish(),
    })
    .safeParse(error.problem);
  if (!parsed.success) return null;
  return {
    current: parsed.data.current as z.infer<T>,
    changedBy: parsed.data.changedBy?.name ?? null,
    changedAt: parsed.data.changedAt ?? null,
  };
}
