import { useId, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { domTextStyle } from './textStyle';
import { Txt } from './Txt';

export interface FieldProps {
  label: string;
  /** Symbol behind the label, e.g. `m³/s`. */
  unit?: string;
  hint?: string;
  error?: string;
  /** Left out: said in words, as most fields must be filled in. */
  optional?: boolean;
}

/** What a control needs to be tied to its label, hint and error. */
export interface FieldIds {
  id: string;
  describedBy: string | undefined;
  invalid: boolean;
}

/** Label, unit, hint and error around one control. */
export function Field(props: FieldProps & { children: (ids: FieldIds) => ReactNode }) {
  const { label, unit, hint, error, optional, children } = props;
  const { colours } = useTheme();
  const id = useId();
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <View style={styles.field}>
      <label htmlFor={id} style={domTextStyle(colours, 'small', 'ink', true)}>
        {label}
        {unit ? <span style={domTextStyle(colours, 'small', 'soft')}> {unit}</span> : null}
        {optional ? <span style={domTextStyle(colours, 'small', 'soft')}> (optional)</span> : null}
      </label>
      {hint ? (
        <Txt id={`${id}-hint`} variant="small" tone="soft">
          {hint}
        </Txt>
      ) : null}
      {children({ id, describedBy: described || undefined, invalid: Boolean(error) })}
      {error ? (
        <Txt id={`${id}-error`} role="alert" variant="small" tone="brick" strong>
          {error}
        </Txt>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({ field: { gap: space.half, minWidth: 0 } });
