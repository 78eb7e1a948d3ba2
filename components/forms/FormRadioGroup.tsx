import type { ComponentProps } from 'react';
import { RadioGroup } from '../ui/RadioGroup';
import { useFormField } from './useFormField';

type Props<V extends string> = Omit<
  ComponentProps<typeof RadioGroup<V>>,
  'value' | 'onChange' | 'error'
> & { name: string };

export function FormRadioGroup<V extends string>({ name, disabled, ...rest }: Props<V>) {
  const { value, error, onChange, disabled: sending } = useFormField<V | null>(name);
  return (
    <RadioGroup
      {...rest}
      value={value}
      error={error}
      onChange={onChange}
      disabled={disabled || sending}
    />
  );
}
