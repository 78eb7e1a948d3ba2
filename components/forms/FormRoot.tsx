import { createContext, useContext, type ReactNode } from 'react';
import { space } from '../theme/tokens';
import { ErrorState } from '../ui/ErrorState';
import { Notice } from '../ui/Notice';
import { Txt } from '../ui/Txt';
import type { YupForm } from './useYupForm';

const FormContext = createContext<YupForm | null>(null);

/** The form within which a field stands. */
export function useForm(): YupForm {
  const form = useContext(FormContext);
  if (!form) throw new Error('A form field stands outside FormRoot');
  return form;
}

interface FormRootProps {
  form: YupForm;
  /** Name for screen readers. */
  label: string;
  /** Heads what the server refused. */
  failedTitle?: string;
  children: ReactNode;
}

/** The form element: Enter sends it, a password manager knows it. Says below what the server refused. */
export function FormRoot({ form, label, failedTitle = 'Not saved', children }: FormRootProps) {
  return (
    <FormContext.Provider value={form}>
      <form
        aria-label={label}
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          void form.formik.submitForm();
        }}
        style={{ display: 'flex', flexDirection: 'column', gap: space.two, minWidth: 0, margin: 0 }}
      >
        {children}
        {form.failure ? <FormFailure form={form} title={failedTitle} /> : null}
        <button type="submit" hidden />
      </form>
    </FormContext.Provider>
  );
}

function FormFailure({ form, title }: { form: YupForm; title: string }) {
  if (form.looseFaults.length === 0) return <ErrorState error={form.failure} title={title} />;
  return (
    <Notice tone="danger" title={title}>
      {form.looseFaults.map((fault) => (
        <Txt key={fault.path + fault.message}>{fault.message}</Txt>
      ))}
    </Notice>
  );
}
