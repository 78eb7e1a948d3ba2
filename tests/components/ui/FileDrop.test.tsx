import { fireEvent, render, screen } from '@testing-library/react';
import { FileDrop } from '@/components/ui/FileDrop';

const file = new File(['a'], 'veshall.xlsx');
const input = () => document.querySelector('input') as HTMLInputElement;

test('a file is taken by choosing or by dropping', () => {
  const take = jest.fn();
  render(<FileDrop label="Choose the survey file" accept=".xlsx" onFile={take} />);
  fireEvent.change(input(), { target: { files: [file] } });
  fireEvent.drop(input().parentElement!, { dataTransfer: { files: [file] } });
  expect(take.mock.calls).toEqual([[file], [file]]);
  expect(screen.getByRole('button', { name: 'Choose the survey file' })).toBeTruthy();
});

test('while one is being read no other is taken', () => {
  const take = jest.fn();
  render(<FileDrop label="Choose the survey file" accept=".xlsx" busy onFile={take} />);
  fireEvent.drop(input().parentElement!, { dataTransfer: { files: [file] } });
  expect(take).not.toHaveBeenCalled();
});
