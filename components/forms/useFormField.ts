import { getIn } from 'formik';
import { useForm } from './FormRoot';

/** Binds one field by its path; `V` is what the form's schema holds there. */
export function useFormField<V>(name: string) {
  const { formik, errorOf } = useForm();
  return {
    value: getIn(formik.values, name) as V,
    error: errorOf(name),
    disabled: formik.isSubmitting,
    onChange: (value: V) => void formik.setFieldValue(name, value),
    onBlur: () => void formik.setFieldTouched(name, true),
  };
}
