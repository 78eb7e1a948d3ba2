import { TextField, type TextFieldProps } from '../ui/TextField';
import { useFormField } from './useFormField';

type Props = Omit<TextFieldProps, 'value' | 'onChange' | 'onBlur' | 'error'> & { name: string };

export function FormTextField({ name, disabled, ...rest }: Props) {
  const field = useFormField<string>(name);
  return <TextField {...rest} {...field} disabled={disabled || field.disabled} />;
}
