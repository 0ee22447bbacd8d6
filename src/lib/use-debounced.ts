import { useEffect, useState } from 'react';

/** The value as it was when it last stood still for `wait_ms`. */
export function useDebounced<T>(value: T, wait_ms = 200): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), wait_ms);
    return () => clearTimeout(timer);
  }, [value, wait_ms]);
  return settled;
}
