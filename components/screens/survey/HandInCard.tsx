import { useState } from 'react';
import { Card } from '@/components/ui/Card';
import { FileDrop } from '@/components/ui/FileDrop';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import { megabytes } from './megabytes';

/** Endings, and the kinds by which a phone knows such files. */
export const SURVEY_ENDINGS =
  '.xlsx,.csv,.tsv,.txt,application/vnd.openxmlformats-officedocument.spreadsheetml.sheet,text/csv,text/plain';

/** The file that is handed in; one too large is said at once, before it travels. */
export function HandInCard({ onFile }: { onFile: (file: File) => void }) {
  const [tooLarge, setTooLarge] = useState<File | null>(null);
  const most = `${megabytes(LIMITS.upload.bytes)} MB`;
  return (
    <Card title="Hand in a survey">
      <Txt tone="soft">
        An XLSX workbook or a CSV file: one long table of all sections, or one sheet a section.
        Nothing is kept until you have seen what was read.
      </Txt>
      <FileDrop
        label="Choose the survey file"
        kind="solid"
        accept={SURVEY_ENDINGS}
        hint={`Or drop it here. Up to ${most}, ${LIMITS.upload.sections} sections, ${LIMITS.upload.pointsPerSection.toLocaleString('en-GB')} points a section.`}
        onFile={(file) => {
          const fits = file.size <= LIMITS.upload.bytes;
          setTooLarge(fits ? null : file);
          if (fits) onFile(file);
        }}
      />
      {tooLarge ? (
        <Notice tone="danger" title={`${tooLarge.name} is too large`}>
          {`It has ${megabytes(tooLarge.size)} MB, more than the ${most} that can be handed in. It was not sent. Take out sheets and pictures that are no survey, or save it as CSV, and choose it again.`}
        </Notice>
      ) : null}
    </Card>
  );
}
