import { useLocalSearchParams } from 'expo-router';
import { useEffect } from 'react';
import { jumpToPoint } from './jumpToPoint';

/** Opens the discussion at the point that the address names: `?point=12`. */
export function usePointOfAddress(): void {
  const { point } = useLocalSearchParams<{ point?: string }>();
  useEffect(() => {
    if (!point) return undefined;
    // Once the drawings above it have their heights.
    const timer = setTimeout(() => jumpToPoint(Number(point)), 100);
    return () => clearTimeout(timer);
  }, [point]);
}
