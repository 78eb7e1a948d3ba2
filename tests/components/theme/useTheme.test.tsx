import { fireEvent, render, screen } from '@testing-library/react';
import { ThemeProvider, useTheme } from '@/components/theme/useTheme';

function Bench() {
  const { scheme, choice, setChoice } = useTheme();
  return (
    <>
      <p>{`${choice}: ${scheme}`}</p>
      <button onClick={() => setChoice('dark')}>dark</button>
      <button onClick={() => setChoice('system')}>system</button>
    </>
  );
}
const show = () =>
  render(
    <ThemeProvider>
      <Bench />
    </ThemeProvider>,
  );

beforeEach(() => localStorage.clear());

test('the choice outlives the page, and the ground behind it follows', () => {
  const first = show();
  expect(screen.getByText('system: light')).toBeTruthy();
  fireEvent.click(screen.getByText('dark'));
  expect(document.getElementById('spate-page-style')?.textContent).toContain('color-scheme: dark');
  first.unmount();
  show();
  expect(screen.getByText('dark: dark')).toBeTruthy();
  fireEvent.click(screen.getByText('system'));
  expect(localStorage.length).toBe(0);
});

test('a value in storage that is none of ours is passed over', () => {
  localStorage.setItem('spate.theme', 'mauve');
  show();
  expect(screen.getByText('system: light')).toBeTruthy();
});
