import { getIn, useFormik, type FormikValues } from 'formik';
import { useEffect, useState } from 'react';
import type { InferType, ObjectSchema, AnyObject } from 'yup';
import { isApiError } from '../queries/ApiError';
import './yupWords';

interface YupFormOptions<V extends FormikValues, S extends ObjectSchema<AnyObject>> {
  /** Of the body that is sent; shared with the server. */
  schema: S;
  initial: V;
  /** Gets the body as the schema casts it; what it throws is shown, nothing typed is lost. */
  onSubmit: (body: InferType<S>) => Promise<unknown>;
  /** Takes new initial values over what is shown, e.g. once they have been read. */
  follow?: boolean;
}

interface ServerFault {
  path: string;
  message: string;
  /** The value that the server refused: the fault stands until it is changed. */
  value: unknown;
}

/** A form on a yup schema: Formik keeps it, the schema checks it, the server's faults come back to their fields. */
export function useYupForm<V extends FormikValues, S extends ObjectSchema<AnyObject>>({
  schema,
  initial,
  onSubmit,
  follow,
}: YupFormOptions<V, S>) {
  const [serverFaults, setServerFaults] = useState<ServerFault[]>([]);
  const [failure, setFailure] = useState<unknown>(null);

  const formik = useFormik<V>({
    initialValues: initial,
    validationSchema: schema,
    enableReinitialize: follow,
    onSubmit: async (values) => {
      setFailure(null);
      setServerFaults([]);
      try {
        await onSubmit(schema.cast(values) as InferType<S>);
      } catch (error) {
        setFailure(error);
        if (isApiError(error)) {
          setServerFaults(error.faults.map((f) => ({ ...f, value: getIn(values, f.path) })));
        }
      }
    },
  });

  const { submitCount, isSubmitting } = formik;
  useEffect(() => {
    if (submitCount > 0 && !isSubmitting) {
      document.querySelector<HTMLElement>('form [aria-invalid="true"]')?.focus();
    }
  }, [submitCount, isSubmitting, serverFaults]);

  /** What is wrong with a field, once the person has had the chance to fill it in. */
  const errorOf = (name: string): string | undefined => {
    const refused = serverFaults.find((fault) => fault.path === name);
    if (refused && Object.is(refused.value, getIn(formik.values, name))) return refused.message;
    const seen = submitCount > 0 || getIn(formik.touched, name);
    const error: unknown = getIn(formik.errors, name);
    return seen && typeof error === 'string' ? error : undefined;
  };

  /** Faults of the server that belong to no field shown here. */
  const looseFaults = serverFaults.filter(
    (fault) => getIn(formik.values, fault.path) === undefined,
  );
  return { formik, failure, errorOf, looseFaults, clearFailure: () => setFailure(null) };
}

/** What `FormRoot` needs; the values' own type does not matter to the fields. */
export interface YupForm {
  formik: Pick<
    ReturnType<typeof useFormik<FormikValues>>,
    'isSubmitting' | 'submitForm' | 'setFieldValue' | 'setFieldTouched' | 'dirty'
  > & { values: FormikValues };
  failure: unknown;
  errorOf: (name: string) => string | undefined;
  looseFaults: { path: string; message: string }[];
}
