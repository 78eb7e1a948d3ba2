import { useCurrentStudy } from '@/components/layout/studyContext';
import { useMe } from '@/components/queries/SessionProvider';
import { ClientStudy } from './ClientStudy';
import { StudyOverview } from './StudyOverview';
import { SurveyorStudy } from './SurveyorStudy';

/** A study opens on what the person comes for. */
export function StudyScreen() {
  const { study, may } = useCurrentStudy();
  const me = useMe();
  if (may('study.change')) return <StudyOverview study={study} />;
  if (may('survey.send')) return <SurveyorStudy study={study} />;
  return <ClientStudy study={study} firmName={me.firm.name} />;
}
