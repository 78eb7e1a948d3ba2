import { Slot, useLocalSearchParams } from 'expo-router';
import { StudyProvider } from '@/components/layout/StudyProvider';

/** The screens of one study. */
export default function StudyLayout() {
  const { studyId } = useLocalSearchParams<{ studyId: string }>();
  return (
    <StudyProvider studyId={Number(studyId)}>
      <Slot />
    </StudyProvider>
  );
}
