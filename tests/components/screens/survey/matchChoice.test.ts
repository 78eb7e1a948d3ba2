import {
  chooseField,
  chooseUnit,
  choiceOf,
  groupSheets,
  isShort,
  passedOver,
} from '@/components/screens/survey/matchChoice';
import type { ColumnMatch, SheetMatch } from '@/shared/surveys/types';

const column = (
  index: number,
  heading: string,
  field: ColumnMatch['field'],
  unit: ColumnMatch['unit'] = null,
): ColumnMatch => ({ column: index, heading, field, unit, sample: [] });

const sheet = (name: string, columns: ColumnMatch[], layout: SheetMatch['layout'] = 'section') => ({
  sheet: name,
  layout,
  headingRow: 1,
  columns,
});

const columns = [
  column(0, 'Offset (ft)', 'offset', 'ft'),
  column(1, 'RL (ft)', 'elevation', 'ft'),
  column(2, 'Remark', null),
];

describe('the match of a survey file', () => {
  it('groups sheets with the same headings and leaves out those passed over', () => {
    const sheets = [
      sheet('Cover', [column(0, 'Project', null)], 'ignored'),
      sheet('XS-01', columns),
      sheet('XS-02', columns),
      sheet('XS-03', [column(0, 'Dist', 'offset', 'm'), column(1, 'Level', 'elevation', 'm')]),
    ];
    expect(groupSheets(sheets).map((group) => group.sheets)).toEqual([
      ['XS-01', 'XS-02'],
      ['XS-03'],
    ]);
    expect(passedOver(sheets)).toEqual(['Cover']);
  });

  it('offers every sheet with headings where none was taken for a survey', () => {
    const sheets = [
      sheet('Notes', [], 'ignored'),
      sheet('Data', [column(0, 'Weite', null), column(1, 'Hoch', null)], 'ignored'),
    ];
    expect(groupSheets(sheets).map((group) => group.sheets)).toEqual([['Data']]);
    expect(passedOver(sheets)).toEqual(['Notes']);
    expect(choiceOf(sheets, 'auto').columns).toHaveLength(2);
  });

  it('knows when a needed column is missing', () => {
    expect(isShort(sheet('A', columns, 'section'))).toBe(false);
    expect(isShort(sheet('A', columns, 'longTable'))).toBe(true);
    expect(isShort(sheet('A', columns.slice(0, 1), 'section'))).toBe(true);
  });

  it('starts from what was recognised', () => {
    const choice = choiceOf(
      [sheet('Cover', [column(0, 'x', null)], 'ignored'), sheet('A', columns)],
      'auto',
    );
    expect(choice).toEqual({
      decimal: 'auto',
      columns: [
        { column: 0, field: 'offset', unit: 'ft' },
        { column: 1, field: 'elevation', unit: 'ft' },
        { column: 2, field: null, unit: null },
      ],
    });
  });

  it('moves a meaning from one column to another with the unit of the file', () => {
    const start = choiceOf([sheet('A', columns)], 'auto');
    const next = chooseField(start, 2, 'elevation');
    expect(next.columns).toEqual([
      { column: 0, field: 'offset', unit: 'ft' },
      { column: 1, field: null, unit: null },
      { column: 2, field: 'elevation', unit: 'ft' },
    ]);
  });

  it('lets several columns be passed over, and drops the unit of what has none', () => {
    const start = choiceOf([sheet('A', columns)], 'comma');
    const next = chooseField(chooseField(start, 0, null), 1, 'roughness');
    expect(next.columns).toEqual([
      { column: 0, field: null, unit: null },
      { column: 1, field: 'roughness', unit: null },
      { column: 2, field: null, unit: null },
    ]);
    expect(next.decimal).toBe('comma');
  });

  it('changes one unit', () => {
    const start = choiceOf([sheet('A', columns)], 'auto');
    expect(chooseUnit(start, 1, 'usft').columns[1].unit).toBe('usft');
    expect(chooseUnit(start, 1, 'usft').columns[0].unit).toBe('ft');
  });
});
