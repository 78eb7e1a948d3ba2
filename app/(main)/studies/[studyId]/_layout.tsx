import { Slot, useLocalSearchParams, usePathname } from 'expo-router';
import { StudyProvider } from '@/components/layout/StudyProvider';

export { BrokenScreen as ErrorBoundary } from '@/components/layout/BrokenScreen';

/** The screens of one study. */
export default function StudyLayout() {
  const { studyId } = useLocalSearchParams<{ studyId: string }>();
  const segment = usePathname().split('/')[3];
  return (
    <StudyProvider studyId={Number(studyId)} segment={segment}>
      <Slot />
    </StudyProvider>
  );
}
