import { LinkTxt } from '@/components/ui/LinkTxt';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { wallClock } from '@/components/ui/wallClock';
import type { RunSummary } from '@/shared/runs/types';
import type { StationDifference } from '@/shared/studies/stationDifferences';

interface Props {
  studyId: number;
  signed: NonNullable<RunSummary['signed']>;
}

/** A signed run is read as it was signed; said only where the study has gone on since. */
export function AsSigned({ studyId, signed: { at, differs } }: Props) {
  if (differs.length === 0) return null;
  return (
    <Notice title="Stations and levels as they were signed" still>
      <Txt>
        {`This run was signed on ${wallClock(at)}, and is shown with the stations and levels of that day. Since then: ${differs.map(differenceWords).join('; ')}.`}
      </Txt>
      <LinkTxt href={`/studies/${studyId}/stations`}>Stations of today</LinkTxt>
    </Notice>
  );
}

const WORDS: Record<StationDifference['what'], string> = {
  added: 'was added',
  gone: 'was removed',
  renamed: 'has another name',
  moved: 'was moved',
  levels: 'has other levels',
};

export const differenceWords = ({ name, what }: StationDifference): string =>
  `${name} ${WORDS[what]}`;
