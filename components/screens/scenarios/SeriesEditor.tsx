import { useMutation } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { FileDrop } from '@/components/ui/FileDrop';
import { Notice } from '@/components/ui/Notice';
import { Table } from '@/components/ui/Table';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import type { Fault } from '@/shared/errors';
import type { ColumnsReading } from './columnsText';
import { RowsTable } from './RowsTable';

export interface SeriesColumn {
  title: string;
  unit: string;
  /** An SI value as it is shown, without its unit. */
  show: (value: number) => string;
}

interface SeriesEditorProps {
  /** What the table is, e.g. "Inflow table". */
  label: string;
  columns: readonly SeriesColumn[];
  /** One array a column, SI. */
  values: readonly (readonly number[])[];
  onChange: (values: number[][], reading: ColumnsReading) => void;
  read: (text: string) => ColumnsReading;
  write: (values: readonly (readonly number[])[]) => string;
  /** Left out where no file is read. */
  readFile?: (file: File) => Promise<ColumnsReading>;
  /** What is wrong with the values as they stand. */
  error?: string;
  disabled?: boolean;
}

const SHOWN = 200;
const FAULTS_SHOWN = 8;
/** Longer tables are pasted, not typed. */
const ROWS_TYPED = 200;

/** A table of values: pasted or typed as text, or read from a file, and shown as it was understood. */
export function SeriesEditor(props: SeriesEditorProps) {
  const { label, columns, values, onChange, read, write, readFile, error, disabled } = props;
  const [text, setText] = useState<string | null>(null);
  const [isShown, setShown] = useState(false);
  const [asRows, setAsRows] = useState(false);
  const count = values[0]?.length ?? 0;
  const isTyping = text !== null || count === 0;
  const reading = text === null ? null : read(text);
  const hasFaults = Boolean(reading?.faults.length);
  const faulty = useMemo(() => faultyRows(reading?.faults ?? []), [reading]);
  const file = useMutation({
    mutationFn: async (chosen: File) => {
      const found = await readFile!(chosen);
      if (found.faults.length > 0) return found;
      setText(null);
      onChange(found.columns, found);
      return found;
    },
  });

  /** A text that can be read is taken at once; one that cannot leaves the values as they were. */
  const type = (next: string) => {
    setText(next);
    const found = read(next);
    if (found.faults.length === 0) onChange(found.columns, found);
  };
  if (disabled && count === 0) return <Txt tone="soft">No values.</Txt>;
  return (
    <View role="group" aria-label={label} style={styles.box}>
      {isTyping && !disabled ? (
        <>
          {asRows ? (
            <RowsTable {...{ label, columns, faulty }} text={text ?? ''} onText={type} />
          ) : (
            <TextField
              label={label}
              lines={8}
              hint={`Paste from a spreadsheet or type, a row a line: ${columns.map(({ title, unit }) => `${title} in ${unit}`).join(', then ')}.`}
              value={text ?? ''}
              onChange={type}
              error={hasFaults ? undefined : error}
            />
          )}
          {reading && reading.faults.length === 0 && count > 0 ? (
            <Txt role="status" variant="small" tone="moss">
              {reading.understood}
            </Txt>
          ) : null}
          {reading ? (
            <Faults faults={asRows ? inRows(reading.faults) : reading.faults} kept={count > 0} />
          ) : null}
          <Button
            kind="quiet"
            label={asRows ? 'As text, to paste' : 'Row by row'}
            name={`${asRows ? 'As text, to paste' : 'Row by row'}, ${label}`}
            disabled={!asRows && (hasFaults || count > ROWS_TYPED)}
            onPress={() => {
              // Whatever stood between the columns: rows are cut at tabs.
              if (!asRows && reading) setText(write(reading.columns));
              setAsRows(!asRows);
            }}
          />
        </>
      ) : error ? (
        <Txt role="alert" variant="small" tone="brick" strong>
          {error}
        </Txt>
      ) : null}
      {count > 0 ? (
        <View style={styles.buttons}>
          {disabled ? null : (
            <Button
              kind="quiet"
              label={text === null ? 'Edit the values' : 'Done'}
              name={`${text === null ? 'Edit the values' : 'Done'}, ${label}`}
              disabled={hasFaults}
              onPress={() => setText(text === null ? write(values) : null)}
            />
          )}
          <Button
            kind="quiet"
            label={isShown ? 'Hide the table' : `Show the table, ${count} rows`}
            name={`${isShown ? 'Hide' : 'Show'} the table, ${label}`}
            onPress={() => setShown(!isShown)}
          />
        </View>
      ) : null}
      {readFile && !disabled ? (
        <FileDrop
          label="Choose a file"
          accept=".xlsx,.csv,.tsv,.txt"
          hint={`XLSX or CSV with ${columns.map(({ title }) => title).join(' and ')}; or drop it here.`}
          busy={file.isPending}
          onFile={(chosen) => file.mutate(chosen)}
        />
      ) : null}
      {file.data && file.data.faults.length > 0 ? (
        <Faults faults={file.data.faults} kept={count > 0} />
      ) : file.data && text === null ? (
        <Txt role="status" variant="small" tone="moss">
          {file.data.understood}
        </Txt>
      ) : null}
      {file.isError ? <ErrorState title="The file was not read" error={file.error} /> : null}
      {isShown && count > 0 ? <Values {...{ label, columns, values, count }} /> : null}
    </View>
  );
}

/** Rows of the fields, below their heading line; of a text that begins with its heading. */
const rowOf = ({ path }: Fault): number => Number(/\d+/.exec(path)?.[0] ?? 1) - 2;
const faultyRows = (faults: readonly Fault[]): ReadonlySet<number> => new Set(faults.map(rowOf));
const inRows = (faults: readonly Fault[]): Fault[] =>
  faults.map((fault) => ({
    ...fault,
    message: fault.message.replace(/^Line \d+/, `Row ${rowOf(fault) + 1}`),
  }));

function Faults({ faults, kept }: { faults: readonly Fault[]; kept: boolean }) {
  if (faults.length === 0) return null;
  const rest = faults.length - FAULTS_SHOWN;
  return (
    <Notice
      tone="danger"
      title={kept ? 'Not taken over: the values stay as they were' : 'Not taken over yet'}
    >
      {faults.slice(0, FAULTS_SHOWN).map(({ path, message }) => (
        <Txt key={path + message}>{message}</Txt>
      ))}
      {rest > 0 ? <Txt tone="soft">And {rest} more.</Txt> : null}
    </Notice>
  );
}

function Values(
  props: Pick<SeriesEditorProps, 'label' | 'columns' | 'values'> & { count: number },
) {
  const { label, columns, values, count } = props;
  const rows = Array.from({ length: Math.min(count, SHOWN) }, (_, row) => row);
  return (
    <>
      <Table
        label={label}
        columns={columns.map(({ title, unit, show }, at) => ({
          key: title,
          title,
          unit,
          align: 'right',
          render: (row: number) => show(values[at][row]),
        }))}
        rows={rows}
        rowKey={(row) => row}
        maxHeight={280}
      />
      {count > SHOWN ? (
        <Txt variant="small" tone="soft">
          The first {SHOWN} of {count.toLocaleString('en-GB')} rows.
        </Txt>
      ) : null}
    </>
  );
}

const styles = StyleSheet.create({
  box: { gap: space.one, alignSelf: 'stretch', minWidth: 0 },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two },
});
