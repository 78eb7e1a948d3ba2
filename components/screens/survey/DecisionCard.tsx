import { useState } from 'react';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useDecideSurvey } from '@/components/queries/surveys';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import type { SurveyRevisionRow } from '@/shared/surveys/types';

/** An engineer accepts what a surveyor has handed in, or returns it with remarks. */
export function DecisionCard({ survey }: { survey: SurveyRevisionRow }) {
  const { study } = useCurrentStudy();
  const decide = useDecideSurvey({ id: survey.id, studyId: study.id });
  const [remarks, setRemarks] = useState('');
  const [missing, setMissing] = useState(false);
  const isReturned = survey.decision?.decision === 'returned';
  const say = (decision: 'accepted' | 'returned') => {
    const lacks = decision === 'returned' && remarks.trim() === '';
    setMissing(lacks);
    if (!lacks) decide.mutate({ decision, remarks });
  };
  return (
    <Card title={isReturned ? 'Accept it after all' : 'Accept it or return it'}>
      <Txt tone="soft">
        Accepted it becomes a reach to work on. Returned it stays as it is, and {survey.sentBy} is
        told by mail what to mend. Either way the revision itself never changes.
      </Txt>
      <TextField
        label={isReturned ? 'Remarks' : 'Remarks, needed for a return'}
        value={remarks}
        lines={4}
        maxLength={LIMITS.textLong}
        error={missing ? 'Say what is to be mended.' : undefined}
        onChange={setRemarks}
      />
      {decide.error ? <ErrorState title="That was not done" error={decide.error} /> : null}
      <ButtonRow>
        <Button
          kind="solid"
          label="Accept the survey"
          busy={decide.isPending}
          onPress={() => say('accepted')}
        />
        {isReturned ? null : (
          <Button label="Return it" busy={decide.isPending} onPress={() => say('returned')} />
        )}
      </ButtonRow>
    </Card>
  );
}
