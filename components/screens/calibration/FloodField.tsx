import { useId } from 'react';
import { Field } from '@/components/ui/Field';
import { controlStyle } from '@/components/ui/controlStyle';
import { domTextStyle } from '@/components/ui/textStyle';
import { useTheme } from '@/components/theme/useTheme';
import { LIMITS } from '@/shared/limits';

interface Props {
  value: string;
  onChange: (value: string) => void;
  /** Names that are there already. */
  floods: readonly string[];
  error?: string;
  disabled?: boolean;
}

/** Which flood it was: typed, or one that has a name already. */
export function FloodField({ value, onChange, floods, error, disabled }: Props) {
  const { colours } = useTheme();
  const list = useId();
  return (
    <Field
      label="Flood"
      hint="Which flood left it, e.g. January 2024. Runs are compared with one flood at a time."
      error={error}
    >
      {({ id, describedBy, invalid }) => (
        <>
          <input
            id={id}
            type="text"
            list={list}
            value={value}
            maxLength={LIMITS.textShort}
            disabled={disabled}
            aria-describedby={describedBy}
            aria-invalid={invalid || undefined}
            onChange={(event) => onChange(event.target.value)}
            style={{
              ...domTextStyle(colours, 'lead'),
              ...controlStyle(colours, invalid),
              width: '100%',
              boxSizing: 'border-box',
            }}
          />
          <datalist id={list}>
            {floods.filter(Boolean).map((flood) => (
              <option key={flood} value={flood} />
            ))}
          </datalist>
        </>
      )}
    </Field>
  );
}
