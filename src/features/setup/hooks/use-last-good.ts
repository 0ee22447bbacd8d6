import { useState } from 'react';

/** The last value that was not null, so that a drawing stays while a number is half typed; `isOld` says that it is not what stands there. */
export function useLastGood<T>(value: T | null): { good: T | null; isOld: boolean } {
  const [good, setGood] = useState(value);
  if (value !== null && value !== good) setGood(value);
  return { good: value ?? good, isOld: value === null };
}
