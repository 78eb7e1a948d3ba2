import { useState } from 'react';
import { Facts } from '@/components/ui/Facts';
import { FileDrop } from '@/components/ui/FileDrop';
import { formatDay } from '@/components/ui/formatDay';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { Verification } from '@/shared/review/types';
import { hashFile } from './hashFile';
import { isTheVeryOne, standing } from './verificationWords';

interface Compared {
  name: string;
  /** null: could not be read. */
  hash: string | null;
}

/** What is known of the report, and a file held against it. */
export function Standing({ found }: { found: Verification }) {
  const { tone, title, text } = standing(found);
  const [compared, setCompared] = useState<Compared | null>(null);
  const [isBusy, setIsBusy] = useState(false);
  const compare = async (file: File) => {
    setIsBusy(true);
    const hash = await hashFile(file).catch(() => null);
    setCompared({ name: file.name, hash });
    setIsBusy(false);
  };
  return (
    <>
      <Notice tone={tone} title={title}>
        {text}
      </Notice>
      <Facts
        facts={[
          ['Signed by', found.signedBy],
          ['Qualification', found.qualification],
          ['Firm', found.firmName],
          ['Signed', formatDay(found.signedAt)],
          ['Replaced', found.supersededAt && formatDay(found.supersededAt)],
          ['Withdrawn', found.withdrawnAt && formatDay(found.withdrawnAt)],
        ]}
      />
      {found.reportHash || found.reportHashes.length ? (
        <FileDrop
          label="Compare a PDF"
          accept=".pdf"
          hint="Choose the report or drop it here. It is compared on this device and does not leave it."
          busy={isBusy}
          onFile={(file) => void compare(file)}
        />
      ) : (
        <Txt tone="soft">The report itself has not been made yet, so no file can be compared.</Txt>
      )}
      {compared ? <Comparison compared={compared} found={found} /> : null}
    </>
  );
}

function Comparison({ compared, found }: { compared: Compared; found: Verification }) {
  const { name, hash } = compared;
  if (hash === null)
    return (
      <Notice tone="danger" title={`${name} could not be read`}>
        Choose it again from where it is stored on this device.
      </Notice>
    );
  const match = isTheVeryOne(hash, found);
  return (
    <Notice
      tone={match ? 'done' : 'danger'}
      title={
        match ? 'It is the very report that was signed' : 'It is not the report that was signed'
      }
    >
      <Txt>
        {match
          ? `${name} is the same to the last byte.`
          : `${name} differs from every report kept under this code: it was changed, or it is another report, a preliminary one or a withdrawn one. Do not rely on it.`}
      </Txt>
      <Txt variant="caption" style={{ overflowWrap: 'anywhere' } as object}>
        {`SHA-256 ${hash}`}
      </Txt>
    </Notice>
  );
}
