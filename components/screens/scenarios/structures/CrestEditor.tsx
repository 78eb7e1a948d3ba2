import { ColumnTableEditor } from '../ColumnTableEditor';

interface CrestEditorProps {
  path: string;
  label: string;
  crest: { offsets: number[]; levels: number[] };
  onChange: (crest: { offsets: number[]; levels: number[] }) => void;
}

/** A crest as a table of offset and level, in the offsets of the surveyed sections. */
export function CrestEditor({ path, label, crest, onChange }: CrestEditorProps) {
  return (
    <ColumnTableEditor
      path={path}
      label={label}
      columns={[
        { title: 'offset', quantity: 'length' },
        { title: 'level', quantity: 'elevation' },
      ]}
      values={[crest.offsets, crest.levels]}
      onChange={([offsets, levels]) => onChange({ offsets, levels })}
    />
  );
}
