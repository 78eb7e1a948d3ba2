import { useId } from 'react';
import { StyleSheet, View } from 'react-native';
import { space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import type { Option } from './SelectField';
import { domTextStyle } from './textStyle';
import { Txt } from './Txt';

interface RadioGroupProps<V extends string> {
  label: string;
  value: V | null;
  options: readonly (Option<V> & { hint?: string })[];
  onChange: (value: V) => void;
  disabled?: boolean;
  hint?: string;
  error?: string;
  /** Side by side where there is room: for short words without hints. */
  inline?: boolean;
}

/** A few choices, all seen at once; the browser's own buttons bring the arrow keys. */
export function RadioGroup<V extends string>(props: RadioGroupProps<V>) {
  const { label, value, options, onChange, disabled, hint, error, inline } = props;
  const { colours } = useTheme();
  const id = useId();
  return (
    <View role="radiogroup" aria-label={label} style={styles.group}>
      <Txt variant="small" strong>
        {label}
      </Txt>
      {hint ? (
        <Txt variant="small" tone="soft">
          {hint}
        </Txt>
      ) : null}
      <View style={inline ? styles.inline : null}>
        {options.map((option) => (
          <label
            key={option.value}
            style={{
              ...domTextStyle(colours),
              display: 'flex',
              gap: space.one,
              alignItems: 'center',
              minHeight: touch,
              padding: `${space.half}px 0`,
              cursor: disabled ? 'default' : 'pointer',
              opacity: disabled ? 0.6 : 1,
            }}
          >
            <input
              type="radio"
              name={id}
              checked={option.value === value}
              disabled={disabled}
              onChange={() => onChange(option.value)}
              style={{ width: 20, height: 20, flexShrink: 0, accentColor: colours.ink }}
            />
            <span>
              {option.label}
              {option.hint ? (
                <span style={{ ...domTextStyle(colours, 'small', 'soft'), display: 'block' }}>
                  {option.hint}
                </span>
              ) : null}
            </span>
          </label>
        ))}
      </View>
      {error ? (
        <Txt role="alert" variant="small" tone="brick" strong>
          {error}
        </Txt>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  group: { gap: 0 },
  inline: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.three },
});
