import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { ApiError } from './problem';

/** Puts the faults that the server named at their fields; true when every fault found its field. */
export function showServerFaults<T extends FieldValues>(
  error: unknown,
  fields: readonly FieldPath<T>[],
  setError: UseFormSetError<T>,
): boolean {
  if (!(error instanceof ApiError)) return false;
  const faults = error.problem.errors ?? [];
  let all = faults.length > 0;
  for (const fault of faults) {
    const field = fields.find((name) => name === fault.path);
    if (field) setError(field, { type: 'server', message: fault.message });
    else all = false;
  }
  return all;
}
