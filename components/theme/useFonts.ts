import { useFonts as useExpoFonts } from 'expo-font';
import regular from '../../assets/fonts/SourceSans3-regular.woff2';
import semibold from '../../assets/fonts/SourceSans3-semibold.woff2';
import bold from '../../assets/fonts/SourceSans3-bold.woff2';
import { fonts } from './tokens';

/** True once the type is there, or cannot be had: then the system's own sans-serif stands in. */
export function useFonts(): boolean {
  const [loaded, error] = useExpoFonts({
    [fonts.regular]: regular,
    [fonts.semibold]: semibold,
    [fonts.bold]: bold,
  });
  return loaded || error !== null;
}
