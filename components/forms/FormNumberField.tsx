import { NumberField, type NumberFieldProps } from '../ui/NumberField';
import { useFormField } from './useFormField';

type Props = Omit<NumberFieldProps, 'value' | 'onChange' | 'onBlur' | 'error'> & { name: string };

export function FormNumberField({ name, disabled, ...rest }: Props) {
  const field = useFormField<number | null>(name);
  return <NumberField {...rest} {...field} disabled={disabled || field.disabled} />;
}
