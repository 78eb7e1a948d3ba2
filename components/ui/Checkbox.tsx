import { space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { domTextStyle } from './textStyle';

interface CheckboxProps {
  label: string;
  checked: boolean;
  onChange: (checked: boolean) => void;
  disabled?: boolean;
  hint?: string;
  /** Keeps the label for screen readers only, e.g. in a table. */
  hideLabel?: boolean;
}

export function Checkbox({ label, checked, onChange, disabled, hint, hideLabel }: CheckboxProps) {
  const { colours } = useTheme();
  return (
    <label
      style={{
        ...domTextStyle(colours),
        display: 'flex',
        gap: space.one,
        alignItems: 'center',
        minHeight: touch,
        padding: `${space.half}px 0`,
        minWidth: hideLabel ? touch : undefined,
        justifyContent: hideLabel ? 'center' : undefined,
        cursor: disabled ? 'default' : 'pointer',
        opacity: disabled ? 0.6 : 1,
      }}
    >
      <input
        type="checkbox"
        aria-label={hideLabel ? label : undefined}
        checked={checked}
        disabled={disabled}
        onChange={(event) => onChange(event.target.checked)}
        style={{ width: 20, height: 20, flexShrink: 0, accentColor: colours.ink }}
      />
      {hideLabel ? null : (
        <span>
          {label}
          {hint ? (
            <span style={{ ...domTextStyle(colours, 'small', 'soft'), display: 'block' }}>
              {hint}
            </span>
          ) : null}
        </span>
      )}
    </label>
  );
}
