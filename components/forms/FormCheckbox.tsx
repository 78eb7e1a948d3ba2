import type { ComponentProps } from 'react';
import { Checkbox } from '../ui/Checkbox';
import { useFormField } from './useFormField';

type Props = Omit<ComponentProps<typeof Checkbox>, 'checked' | 'onChange'> & { name: string };

export function FormCheckbox({ name, disabled, ...rest }: Props) {
  const { value, onChange, disabled: sending } = useFormField<boolean>(name);
  return <Checkbox {...rest} checked={value} onChange={onChange} disabled={disabled || sending} />;
}
