import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Dialog } from '@/components/ui/Dialog';
import { Notice } from '@/components/ui/Notice';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { writeColumns } from '@/components/screens/scenarios/columnsText';
import { withPoints } from '@/shared/reaches/edit/withPoints';
import { UNITS } from '@/shared/units/units';
import { useEditing } from './editorContext';
import { pastedPoints } from './pastedPoints';

const COLUMNS = [
  { title: 'offset', quantity: 'length' },
  { title: 'elevation', quantity: 'elevation' },
] as const;
const FEW = 5;

/** Every point of the section as text, to be copied to a spreadsheet and pasted back. */
export function AllPointsDialog({ onClose }: { onClose: () => void }) {
  const { section, put, editor } = useEditing();
  const system = useUnitSystem();
  const [text, setText] = useState(() =>
    writeColumns(
      [section.points.map(([y]) => y), section.points.map(([, z]) => z)],
      COLUMNS,
      system,
    ),
  );
  const pasted = pastedPoints({ ...section, points: [], coordinates: null }, 0, 0, text, system);
  const take = () => {
    const made = pastedPoints(section, 0, 0, text, system);
    if (!made.section) return;
    editor.unread.clear();
    // Rows beyond those given are gone: this text is the whole section.
    put(
      withPoints(section, made.section.points.slice(0, made.rows)),
      `${made.rows} points put in place of ${section.points.length}`,
    );
    onClose();
  };
  return (
    <Dialog
      title={`Points of ${section.id}`}
      open
      onClose={onClose}
      actions={
        <ButtonRow>
          <Button
            kind="solid"
            label="Put these in place"
            disabled={pasted.faults.length > 0}
            onPress={take}
          />
          <Button label="Leave as it was" onPress={onClose} />
        </ButtonRow>
      }
    >
      <TextField
        label="Offset and elevation, a point a line"
        hint={`Offset in ${UNITS[system].length.symbol}, elevation in ${UNITS[system].elevation.symbol}, from left to right looking downstream. Copy it out, or paste over it.`}
        lines={12}
        value={text}
        onChange={setText}
      />
      {pasted.faults.length > 0 ? (
        <Notice tone="danger" title="This cannot be taken over yet">
          {pasted.faults.slice(0, FEW).map((message) => (
            <Txt key={message}>{message}</Txt>
          ))}
          {pasted.faults.length > FEW ? (
            <Txt tone="soft">And {pasted.faults.length - FEW} more.</Txt>
          ) : null}
        </Notice>
      ) : (
        <Txt role="status" variant="small" tone="moss">
          {pasted.rows} points understood.
        </Txt>
      )}
    </Dialog>
  );
}
