import { useEffect, useState } from 'react';

/** The value once it has rested; the first one at once. */
export function useSettled<T>(value: T | null, ms: number): T | null {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    if (settled === value) return undefined;
    const timer = setTimeout(() => setSettled(value), settled === null ? 0 : ms);
    return () => clearTimeout(timer);
  }, [value, settled, ms]);
  return settled;
}
