import { useWindowDimensions } from 'react-native';
import { WIDE } from './tokens';

/** The only place where the layout asks how wide the window is. */
export function useBreakpoint(): { isWide: boolean; width: number } {
  const { width } = useWindowDimensions();
  return { isWide: width >= WIDE, width };
}
