import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { object, string, number } from 'yup';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { ApiError } from '@/components/queries/ApiError';

const schema = object({
  name: string().trim().required('Name the place.'),
  chainage: number().required('Give its chainage.'),
}).noUnknown();

const initial: { name: string; chainage: number | null } = { name: '', chainage: null };

function Bench({ send }: { send: (body: { name: string; chainage: number }) => Promise<unknown> }) {
  const form = useYupForm({ schema, initial, onSubmit: send });
  return (
    <FormRoot form={form} label="Station">
      <FormTextField name="name" label="Name" />
      <FormNumberField name="chainage" label="Chainage" quantity="chainage" />
      <FormSubmit label="Save" />
    </FormRoot>
  );
}

const name = () => screen.getByLabelText<HTMLInputElement>('Name');
const chainage = () => screen.getByLabelText<HTMLInputElement>(/Chainage/);
const fill = (field: HTMLInputElement, value: string) =>
  fireEvent.change(field, { target: { value } });
const save = () => fireEvent.click(screen.getByRole('button', { name: 'Save' }));

test('nothing is sent before the schema holds; faults stand at their fields, the first has the focus', async () => {
  const send = jest.fn();
  render(<Bench send={send} />);
  save();
  expect(await screen.findByText('Name the place.')).toBeTruthy();
  expect(screen.getByText('Give its chainage.')).toBeTruthy();
  await waitFor(() => expect(document.activeElement).toBe(name()));
  expect(send).not.toHaveBeenCalled();
});

test('what is sent is the body as the schema casts it, in SI', async () => {
  const send = jest.fn().mockResolvedValue(undefined);
  render(<Bench send={send} />);
  fill(name(), '  Sallow Mill ');
  fill(chainage(), '13,1');
  save();
  await waitFor(() => expect(send).toHaveBeenCalledWith({ name: 'Sallow Mill', chainage: 13_100 }));
});

test('a fault of the server stands at its field until that is changed; nothing typed is lost', async () => {
  const refusal = new ApiError('invalid', 'Not taken.', [
    { path: 'name', message: 'That name is taken.' },
  ]);
  render(<Bench send={() => Promise.reject(refusal)} />);
  fill(name(), 'Sallow Mill');
  fill(chainage(), '13,10');
  save();
  expect(await screen.findByText('That name is taken.')).toBeTruthy();
  expect(name().value).toBe('Sallow Mill');
  expect(chainage().value).toBe('13,10');
  fill(name(), 'Sallow Mill weir');
  await waitFor(() => expect(screen.queryByText('That name is taken.')).toBeNull());
});

test('a fault that belongs to no field here is told below', async () => {
  const refusal = new ApiError('invalid', 'Not taken.', [
    { path: 'elsewhere', message: 'The reach is gone.' },
  ]);
  render(<Bench send={() => Promise.reject(refusal)} />);
  fill(name(), 'a');
  fill(chainage(), '1');
  save();
  expect(await screen.findByText('The reach is gone.')).toBeTruthy();
});
