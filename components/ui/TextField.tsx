import { TextInput, type TextInputProps } from 'react-native';
import { space, type } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { aria } from './aria';
import { controlStyle } from './controlStyle';
import { Field, type FieldProps } from './Field';
import { textStyle } from './textStyle';

export interface TextFieldProps extends FieldProps {
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  /** Enter was pressed. */
  onSubmit?: () => void;
  disabled?: boolean;
  secret?: boolean;
  /** Several lines. */
  lines?: number;
  autoComplete?: TextInputProps['autoComplete'];
  inputMode?: TextInputProps['inputMode'];
  autoFocus?: boolean;
  maxLength?: number;
}

export function TextField(props: TextFieldProps) {
  const { value, onChange, onBlur, onSubmit, disabled, secret, lines, ...rest } = props;
  const { autoComplete, inputMode, autoFocus, maxLength, ...field } = rest;
  const { colours } = useTheme();
  return (
    <Field {...field}>
      {({ id, describedBy, invalid }) => (
        <TextInput
          id={id}
          value={value}
          onChangeText={onChange}
          onBlur={onBlur}
          onSubmitEditing={onSubmit}
          editable={!disabled}
          secureTextEntry={secret}
          multiline={lines !== undefined}
          numberOfLines={lines}
          autoComplete={autoComplete}
          autoCapitalize={inputMode === 'email' || secret ? 'none' : undefined}
          inputMode={inputMode}
          autoFocus={autoFocus}
          maxLength={maxLength}
          {...aria({ 'aria-describedby': describedBy, 'aria-invalid': invalid || undefined })}
          style={[
            textStyle(colours, 'lead'),
            controlStyle(colours, invalid),
            { paddingVertical: space.one, opacity: disabled ? 0.6 : 1 },
            lines !== undefined && lines <= NOTE_LINES ? growing(lines) : null,
          ]}
        />
      )}
    </Field>
  );
}

/** A note is read whole; a long table scrolls. */
const NOTE_LINES = 5;
const growing = (lines: number) =>
  ({
    fieldSizing: 'content',
    minHeight: lines * type.lead.lineHeight + 2 * space.one,
    maxHeight: 320,
  }) as object;
