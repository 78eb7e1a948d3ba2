import { NumberField, type NumberFieldProps } from '@/components/ui/NumberField';

const SECONDS = { s: 1, min: 60, h: 3600 } as const;

type TimeFieldProps = Omit<NumberFieldProps, 'unit' | 'quantity'> & {
  unit: keyof typeof SECONDS;
};

/** A time kept in seconds and typed in hours, minutes or seconds. */
export function TimeField({ unit, value, onChange, ...rest }: TimeFieldProps) {
  const factor = SECONDS[unit];
  return (
    <NumberField
      {...rest}
      unit={unit}
      // Twelve digits: 14.1 h comes back as it was typed, not as 14.100000000000001.
      value={value === null ? null : Number((value / factor).toPrecision(12))}
      onChange={(typed) => onChange(typed === null ? null : typed * factor)}
    />
  );
}
