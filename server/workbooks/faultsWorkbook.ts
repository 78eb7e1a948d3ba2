import type { SurveyFault } from '../../shared/surveys/types';
import { writeWorkbook } from './writeWorkbook';

/** The faults of a refused survey as a list to work off. */
export const faultsWorkbook = (fileName: string, faults: SurveyFault[]): Buffer =>
  writeWorkbook([
    {
      name: 'Faults',
      widths: [18, 8, 10, 8, 10, 48, 80],
      rows: [
        ['File', fileName],
        [],
        ['Sheet', 'Row', 'Last row', 'Column', 'Weight', 'What', 'Where, and what would be right'],
        ...faults.map(({ sheet, row, lastRow, column, severity, title, detail }) => [
          sheet,
          row,
          lastRow,
          column,
          severity === 'fault' ? 'Fault' : 'Doubt',
          title,
          detail,
        ]),
      ],
    },
  ]);
