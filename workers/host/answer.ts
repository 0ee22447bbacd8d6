/**
 * What a worker's facade answers. Errors cross the boundary as data, since a thrown error loses its class on the way;
 * `stale` means that a newer request has taken this one's place.
 */
export type Answer<T> =
  | { status: 'done'; value: T }
  | { status: 'failed'; message: string; field: string | null; frequency_Hz: number | null }
  | { status: 'stale' };

export const done = <T>(value: T): Answer<T> => ({ status: 'done', value });

export const failed = (
  message: string,
  field: string | null = null,
  frequency_Hz: number | null = null,
): Answer<never> => ({
  status: 'failed',
  message,
  field,
  frequency_Hz,
});
