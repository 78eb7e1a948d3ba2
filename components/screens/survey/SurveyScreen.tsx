import { useLocalSearchParams } from 'expo-router';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { HandInScreen } from './HandInScreen';
import { RevisionScreen } from './RevisionScreen';
import { SurveyOverview } from './SurveyOverview';
import { useHandIn } from './useHandIn';

/** What was handed in, and handing in more; one revision of it with `revision` in the address. */
export function SurveyScreen() {
  const { study } = useCurrentStudy();
  const { revision } = useLocalSearchParams<{ revision?: string }>();
  const control = useHandIn(study.id);

  if (revision) return <RevisionScreen surveyId={Number(revision)} />;
  if (control.state.step === 'choose' || control.state.step === 'accepted')
    return <SurveyOverview control={control} />;
  return <HandInScreen control={control} />;
}
