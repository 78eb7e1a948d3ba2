import {
  addRow,
  cutRows,
  joinRows,
  pasteCells,
  removeRow,
} from '@/components/screens/scenarios/rowsText';

const HEADING = 'stage m\tstorage m³';
const cut = (text: string) => cutRows(text, HEADING, 2);

test('a text is cut into its cells and joined again; its heading stays', () => {
  const text = `${HEADING}\n310\t0\n311.5\t4000`;
  expect(cut(text).cells).toEqual([
    ['310', '0'],
    ['311.5', '4000'],
  ]);
  expect(joinRows(cut(text))).toBe(text);
  expect(joinRows(cut('310\t0'))).toBe(`${HEADING}\n310\t0`);
  expect(cut('').cells).toEqual([['', '']]);
});

test('rows are added below one, and the last that is left is emptied', () => {
  const rows = cut('1\t2\n3\t4');
  expect(addRow(rows, 0).cells).toEqual([
    ['1', '2'],
    ['', ''],
    ['3', '4'],
  ]);
  expect(removeRow(removeRow(rows, 0), 0).cells).toEqual([['', '']]);
});

test('what is pasted lies over the cells from one on; what is beyond the last column is left out', () => {
  expect(pasteCells(cut('1\t2'), 0, 1, '8\t9\r\n7\r\n').cells).toEqual([
    ['1', '8'],
    ['', '7'],
  ]);
});
