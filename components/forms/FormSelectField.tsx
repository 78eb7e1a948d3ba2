import { SelectField, type SelectFieldProps } from '../ui/SelectField';
import { useFormField } from './useFormField';

type Props<V extends string> = Omit<
  SelectFieldProps<V>,
  'value' | 'onChange' | 'onBlur' | 'error'
> & { name: string };

export function FormSelectField<V extends string>({ name, disabled, ...rest }: Props<V>) {
  const field = useFormField<V | null>(name);
  return <SelectField {...rest} {...field} disabled={disabled || field.disabled} />;
}
