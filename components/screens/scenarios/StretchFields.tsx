import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { NumberField } from '@/components/ui/NumberField';
import { FieldRow } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';

interface StretchFieldsProps {
  title: string;
  /** Of the entry in the body, e.g. `localLosses[0]` */
  path: string;
  /** m */
  from: number | null;
  to: number | null;
  onChange: (change: { from?: number | null; to?: number | null }) => void;
  onRemove: () => void;
  children: ReactNode;
}

/** What holds for a stretch of the reach: where it begins and ends, and the rest below. */
export function StretchFields({
  title,
  path,
  from,
  to,
  onChange,
  onRemove,
  children,
}: StretchFieldsProps) {
  const { isLocked: disabled } = useEditing();
  const { colours } = useTheme();
  return (
    <View
      role="group"
      aria-label={title}
      style={[styles.stretch, { borderTopColor: colours.line }]}
    >
      <FieldRow>
        <PlacedField path={`${path}.from`} half>
          {(error) => (
            <NumberField
              label="From chainage"
              quantity="chainage"
              value={from}
              onChange={(value) => onChange({ from: value })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path={`${path}.to`} half>
          {(error) => (
            <NumberField
              label="To chainage"
              quantity="chainage"
              value={to}
              onChange={(value) => onChange({ to: value })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      </FieldRow>
      {children}
      {disabled ? null : (
        <Button kind="danger" label="Remove" name={`Remove ${title}`} onPress={onRemove} />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  stretch: { gap: space.two, paddingTop: space.two, borderTopWidth: hairline },
});
