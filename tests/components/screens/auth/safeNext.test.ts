import { safeNext } from '@/components/screens/auth/safeNext';

test('leads on to an address of our own, with place and time', () => {
  expect(safeNext('/studies/1/runs/2?at=10600&t=81000')).toBe('/studies/1/runs/2?at=10600&t=81000');
});

test.each([
  undefined,
  '',
  'https://elsewhere.example',
  '//elsewhere.example',
  '/\\elsewhere.example',
  'javascript:alert(1)',
])('%p leads to the first page', (next) => expect(safeNext(next)).toBe('/'));
