import { useLocalSearchParams } from 'expo-router';
import { useEffect } from 'react';
import { jumpTo } from './jumpTo';

/** Opens the editor at the field that the address names, e.g. `?part=downstream.slope`. */
export function usePartOfAddress(): void {
  const { part } = useLocalSearchParams<{ part?: string }>();
  useEffect(() => {
    if (!part) return undefined;
    // Once the fields of the editor stand on the page.
    const timer = setTimeout(() => jumpTo(part), 100);
    return () => clearTimeout(timer);
  }, [part]);
}
