import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import type { Review } from '@/shared/review/types';
import type { Run } from '@/shared/runs/types';
import { IssueDialog } from './IssueDialog';
import { ReasonDialog } from './ReasonDialog';
import { SignDialog } from './SignDialog';

type Step = 'return' | 'sign' | 'issue' | 'withdraw';

/** What may be decided now, by this person. */
export function CheckActions({ run, review }: { run: Run; review: Review }) {
  const [step, setStep] = useState<Step | null>(null);
  const close = () => setStep(null);
  const { may, obstacles } = review;
  const waits = obstacles.length > 0;
  return (
    <>
      {may.includes('review.withdraw') ? (
        <Button kind="danger" label="Withdraw the signature" onPress={() => setStep('withdraw')} />
      ) : null}
      {may.includes('review.return') ? (
        <Button
          label="Return"
          name="Return the run to the modeller"
          onPress={() => setStep('return')}
        />
      ) : null}
      {may.includes('review.sign') ? (
        <Button
          kind="solid"
          label="Sign"
          name={waits ? 'Sign: not yet, see what is in the way' : 'Sign the run'}
          disabled={waits}
          onPress={() => setStep('sign')}
        />
      ) : null}
      {review.state === 'issued' ? (
        <Button label="See what the client sees" href={`/studies/${run.studyId}/issued`} />
      ) : null}
      {may.includes('review.issue') ? (
        <Button kind="solid" label="Issue to the client" onPress={() => setStep('issue')} />
      ) : null}
      {step === 'return' ? <ReasonDialog run={run} kind="return" onClose={close} /> : null}
      {step === 'withdraw' ? <ReasonDialog run={run} kind="withdraw" onClose={close} /> : null}
      {step === 'sign' ? <SignDialog run={run} onClose={close} /> : null}
      {step === 'issue' ? <IssueDialog run={run} onClose={close} /> : null}
    </>
  );
}
