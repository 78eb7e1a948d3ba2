import { fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { NumberField } from '@/components/ui/NumberField';
import { UnitSystemProvider } from '@/components/ui/unitSystem';
import type { UnitSystem } from '@/shared/units/units';

const seen = jest.fn();

function Bench({
  system = 'metric',
  start = null,
}: {
  system?: UnitSystem;
  start?: number | null;
}) {
  const [value, setValue] = useState<number | null>(start);
  return (
    <UnitSystemProvider value={system}>
      <NumberField
        label="Chainage"
        quantity="chainage"
        value={value}
        onChange={(next) => {
          seen(next);
          setValue(next);
        }}
      />
      <button onClick={() => setValue(2500)}>set from outside</button>
    </UnitSystemProvider>
  );
}

const field = () => screen.getByLabelText<HTMLInputElement>(/Chainage/);
const type = (text: string) => fireEvent.change(field(), { target: { value: text } });

test('what is typed in kilometres is kept in metres, and stays as typed', () => {
  render(<Bench />);
  type('10,60');
  expect(seen).toHaveBeenLastCalledWith(10_600);
  expect(field().value).toBe('10,60');
});

test('feet for US customary studies, with the unit in the label', () => {
  render(<Bench system="usCustomary" start={304.8} />);
  expect(field().value).toBe('1000');
  expect(screen.getByText(/ft/)).toBeTruthy();
});

test('what cannot be read stays, is NaN outside, and is told', () => {
  render(<Bench />);
  type('ten');
  expect(seen).toHaveBeenLastCalledWith(NaN);
  expect(field().value).toBe('ten');
  expect(screen.getByRole('alert').textContent).toBe('“ten” is not a number.');
  expect(field().getAttribute('aria-invalid')).toBe('true');
});

test('a value set from outside replaces what was typed', () => {
  render(<Bench />);
  type('1,0');
  fireEvent.click(screen.getByText('set from outside'));
  expect(field().value).toBe('2.5');
});

test('emptied is null', () => {
  render(<Bench start={1000} />);
  type('');
  expect(seen).toHaveBeenLastCalledWith(null);
});
