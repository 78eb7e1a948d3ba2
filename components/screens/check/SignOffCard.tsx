import { Card } from '@/components/ui/Card';
import { Facts } from '@/components/ui/Facts';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { Txt } from '@/components/ui/Txt';
import type { Review, SignOff } from '@/shared/review/types';
import { wallClock } from '@/components/ui/wallClock';

/** What the signature fixed, and what became of it since. */
export function SignOffCard({ signOff, reads }: { signOff: SignOff; reads: Review['reads'] }) {
  const { by, withdrawal, verificationCode } = signOff;
  const run = (number: number | null) => (number === null ? null : `run ${number}`);
  return (
    <Card title="Signature" aside={wallClock(signOff.at)}>
      <Txt>{signOff.statement}</Txt>
      <Facts
        facts={[
          ['Signed by', by.name],
          ['Qualification', signOff.qualification],
          ['Registration', signOff.registrationNumber],
          ['Solver', signOff.solverVersion],
          ['Inputs', signOff.caseHash],
          ['Replaces', run(signOff.supersedesRunNumber)],
          ['Replaced by', run(signOff.supersededByRunNumber)],
          ['Issued', signOff.issuedAt && wallClock(signOff.issuedAt)],
          ['Read by', reads.map((read) => `${read.by}, ${wallClock(read.at)}`).join('; ') || null],
          ['Withdrawn', withdrawal && `${withdrawal.by}, ${wallClock(withdrawal.at)}`],
        ]}
      />
      <Txt>
        {'Verification code '}
        <LinkTxt href={`/verify/${verificationCode}`} strong>
          {verificationCode}
        </LinkTxt>
      </Txt>
    </Card>
  );
}
