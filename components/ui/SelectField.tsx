import { useTheme } from '../theme/useTheme';
import { controlStyle } from './controlStyle';
import { Field, type FieldProps } from './Field';
import { domTextStyle } from './textStyle';

export interface Option<V extends string> {
  value: V;
  label: string;
}

export interface SelectFieldProps<V extends string> extends FieldProps {
  value: V | null;
  options: readonly Option<V>[];
  onChange: (value: V) => void;
  onBlur?: () => void;
  disabled?: boolean;
  /** Shown while nothing is chosen. */
  placeholder?: string;
}

/** The browser's own list: what every phone and screen reader knows best. */
export function SelectField<V extends string>(props: SelectFieldProps<V>) {
  const { value, options, onChange, onBlur, disabled, placeholder, ...field } = props;
  const { colours } = useTheme();
  return (
    <Field {...field}>
      {({ id, describedBy, invalid }) => (
        <select
          id={id}
          value={value ?? ''}
          disabled={disabled}
          aria-describedby={describedBy}
          aria-invalid={invalid || undefined}
          onBlur={onBlur}
          onChange={(event) => {
            const chosen = options.find((option) => option.value === event.target.value);
            if (chosen) onChange(chosen.value);
          }}
          style={{
            ...domTextStyle(colours, 'lead'),
            ...controlStyle(colours, invalid),
            width: '100%',
            opacity: disabled ? 0.6 : 1,
          }}
        >
          {value === null ? <option value="">{placeholder ?? 'Choose…'}</option> : null}
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
