import { useState } from 'react';
import { fromSi, toSi, UNITS, type Quantity } from '@/shared/units/units';
import type { FieldProps } from './Field';
import { parseTyped, typedText } from './parseTyped';
import { TextField } from './TextField';
import { useUnitSystem } from './unitSystem';

export interface NumberFieldProps extends FieldProps {
  /** SI where a quantity is given, else as it stands; null while empty, NaN while it cannot be read. */
  value: number | null;
  onChange: (value: number | null) => void;
  onBlur?: () => void;
  onSubmit?: () => void;
  /** Typed in the study's unit of it, kept in SI. */
  quantity?: Quantity;
  disabled?: boolean;
  autoFocus?: boolean;
}

/** Keeps what was typed, down to the last zero, for as long as it means the value it is given. */
export function NumberField({ value, onChange, quantity, unit, error, ...rest }: NumberFieldProps) {
  const system = useUnitSystem();
  const [typed, setTyped] = useState<string | null>(null);

  const read = (text: string): number | null => {
    const number = parseTyped(text);
    return number === null || quantity === undefined ? number : toSi(number, quantity, system);
  };
  const shown = (si: number | null): string =>
    si === null || quantity === undefined ? typedText(si) : typedText(fromSi(si, quantity, system));

  const kept = typed !== null && Object.is(read(typed), value);
  const text = kept ? typed : shown(value);
  const unreadable = kept && Number.isNaN(value) ? `“${typed}” is not a number.` : undefined;
  return (
    <TextField
      {...rest}
      unit={unit ?? (quantity && UNITS[system][quantity].symbol)}
      error={unreadable ?? error}
      inputMode="decimal"
      value={text}
      onChange={(next) => {
        setTyped(next);
        onChange(read(next));
      }}
    />
  );
}
