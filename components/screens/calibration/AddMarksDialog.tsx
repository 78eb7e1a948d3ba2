import { useMutation } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { readMarkFile, useAddMarks } from '@/components/queries/observations';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { ErrorState } from '@/components/ui/ErrorState';
import { FileDrop } from '@/components/ui/FileDrop';
import { Notice } from '@/components/ui/Notice';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { readMarks } from '@/shared/calibration/readMarks';
import type { MarksReading } from '@/shared/calibration/types';
import { UNITS } from '@/shared/units/units';
import { useNewestReachRow } from '../studies/useNewestReach';
import { FloodField } from './FloodField';
import { MarksPreview } from './MarksPreview';

interface Props {
  floods: readonly string[];
  onClose: () => void;
}

const FAULTS_SHOWN = 8;

/** Marks pasted, typed or from a file; shown as they were understood before they are added. */
export function AddMarksDialog({ floods, onClose }: Props) {
  const { study } = useCurrentStudy();
  const reach = useNewestReachRow(study.id);
  const add = useAddMarks(study.id);
  const [flood, setFlood] = useState(floods[0] ?? '');
  const [text, setText] = useState('');
  const file = useMutation({
    mutationFn: (chosen: File) => readMarkFile(study.id, chosen, flood.trim()),
    onSuccess: () => setText(''),
  });
  const typed = useMemo((): MarksReading | null => {
    if (text.trim() === '') return null;
    const span = reach && { from: reach.firstChainage, to: reach.lastChainage };
    return readMarks(text, { unitSystem: study.unitSystem, flood: flood.trim(), reach: span });
  }, [text, flood, reach, study.unitSystem]);
  const reading = typed ?? file.data ?? null;
  const units = UNITS[study.unitSystem];
  const count = reading?.marks.length ?? 0;
  const send = () => add.mutate(reading!.marks, { onSuccess: onClose });
  return (
    <Dialog
      title="Add marks"
      open
      onClose={onClose}
      actions={
        <>
          <Button
            kind="solid"
            label={count === 0 ? 'Add' : count === 1 ? 'Add one mark' : `Add ${count} marks`}
            disabled={count === 0}
            busy={add.isPending}
            onPress={send}
          />
          <Button label="Close" onPress={onClose} />
        </>
      }
    >
      <FloodField value={flood} onChange={setFlood} floods={floods} />
      <TextField
        label="Marks"
        lines={6}
        hint={`A row a mark, pasted from a spreadsheet or typed: chainage in ${units.chainage.symbol}, level in ${units.elevation.symbol}, then what it is, confidence and a note. A heading row may name the columns and their units in any order.`}
        value={text}
        onChange={setText}
      />
      <FileDrop
        label="Choose a file"
        accept=".xlsx,.csv,.tsv,.txt"
        hint="XLSX or CSV with the same columns; or drop it here."
        busy={file.isPending}
        onFile={(chosen) => file.mutate(chosen)}
      />
      {file.error && !typed ? (
        <ErrorState error={file.error} title="The file was not read" />
      ) : null}
      {reading && reading.faults.length > 0 ? <Faults reading={reading} /> : null}
      {reading && count > 0 ? (
        <>
          <Txt role="status" variant="small" tone="moss">
            {reading.understood}
          </Txt>
          <MarksPreview marks={reading.marks} />
        </>
      ) : null}
      {add.error ? <ErrorState error={add.error} title="The marks were not added" /> : null}
    </Dialog>
  );
}

function Faults({ reading: { faults } }: { reading: MarksReading }) {
  const rest = faults.length - FAULTS_SHOWN;
  return (
    <Notice tone="danger" title="Not taken over yet">
      {faults.slice(0, FAULTS_SHOWN).map(({ message }) => (
        <Txt key={message}>{message}</Txt>
      ))}
      {rest > 0 ? <Txt tone="soft">{`And ${rest} more.`}</Txt> : null}
    </Notice>
  );
}
