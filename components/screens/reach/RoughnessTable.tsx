import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { SelectField, type Option } from '@/components/ui/SelectField';
import { Table, type Column } from '@/components/ui/Table';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import {
  groupWords,
  ROUGHNESS_SOURCE,
  ROUGHNESS_TABLE,
  type RoughnessRow,
} from '@/shared/reaches/roughnessTable';
import { formatNumber } from '@/shared/units/format';
import { filterRoughness } from './filterRoughness';

interface RoughnessTableProps {
  /** Fields that a value can be taken into. */
  targets: readonly Option<string>[];
  target: string | null;
  onTarget: (target: string) => void;
  onTake: (n: number) => void;
}

/** The published values of Manning's n; a press takes one into the form. */
export function RoughnessTable({ targets, target, onTarget, onTake }: RoughnessTableProps) {
  const [typed, setTyped] = useState('');
  const system = useUnitSystem();
  const rows = filterRoughness(ROUGHNESS_TABLE, typed);
  const taken = targets.find(({ value }) => value === target)?.label ?? '';
  const value = (key: 'min' | 'normal' | 'max', title: string): Column<RoughnessRow> => ({
    key,
    title,
    align: 'right',
    render: (row) => {
      const n = row[key];
      if (n === null) return '–';
      const text = formatNumber(n, 3);
      return (
        <Button
          kind="quiet"
          label={text}
          name={`Take ${text}, ${title.toLowerCase()} of ${row.description}, for ${taken}`}
          onPress={() => onTake(n)}
        />
      );
    },
  });
  return (
    <View role="group" aria-label="Published values of Manning's n" style={styles.group}>
      <Txt strong heading={3}>
        Published values
      </Txt>
      <TextField
        label="Find"
        optional
        hint="Words of the description, like pasture or winding."
        value={typed}
        onChange={setTyped}
      />
      <SelectField label="Take a value for" value={target} options={targets} onChange={onTarget} />
      {rows.length === 0 ? (
        <Txt tone="soft">No row holds these words. Try fewer, or a plainer one.</Txt>
      ) : (
        <Table
          label="Manning's n"
          columns={[
            {
              key: 'description',
              title: 'Channel or flood plain',
              render: ({ group, description }) => (
                <>
                  <Txt variant="small" tone="soft">
                    {groupWords(group, system)}:{' '}
                  </Txt>
                  <Txt variant="small">{description}</Txt>
                </>
              ),
            },
            value('normal', 'Normal'),
            value('min', 'Least'),
            value('max', 'Most'),
          ]}
          rows={rows}
          rowKey={({ group, description }) => `${group} ${description}`}
          maxHeight={320}
        />
      )}
      <Txt variant="small" tone="soft">
        {ROUGHNESS_SOURCE}
      </Txt>
    </View>
  );
}

const styles = StyleSheet.create({ group: { gap: space.one } });
