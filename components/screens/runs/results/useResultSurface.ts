import { useRunSurface } from '@/components/queries/runs';
import { useBreakpoint } from '@/components/theme/useBreakpoint';

/** As many places and moments as the drawing can show: two sizes, so that turning a phone asks once more at most. */
export function useResultSurface(runId: number) {
  const { isWide } = useBreakpoint();
  return useRunSurface(runId, isWide ? 480 : 240, isWide ? 300 : 180);
}
