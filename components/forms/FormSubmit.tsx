import { Button, type ButtonKind } from '../ui/Button';
import { useForm } from './FormRoot';

interface FormSubmitProps {
  label: string;
  kind?: ButtonKind;
  disabled?: boolean;
  hint?: string;
  wide?: boolean;
}

/** Sends the form it stands in. */
export function FormSubmit({ kind = 'solid', ...rest }: FormSubmitProps) {
  const { formik } = useForm();
  return (
    <Button
      {...rest}
      kind={kind}
      busy={formik.isSubmitting}
      onPress={() => void formik.submitForm()}
    />
  );
}
