import { formatPath } from '@shared/schemas/common.schema';
import type { z } from 'zod';
import type { Fault } from './problems';

const MOST = 50;

/** One entry a fault; an unknown key is named by its own path. */
export function faultsOf(error: z.ZodError): Fault[] {
  return error.issues
    .flatMap((issue) =>
      issue.code === 'unrecognized_keys'
        ? issue.keys.map((key) => ({
            path: formatPath([...issue.path, key]).slice(0, 200),
            message: 'is not a known field',
          }))
        : [{ path: formatPath(issue.path), message: issue.message }],
    )
    .slice(0, MOST);
}
