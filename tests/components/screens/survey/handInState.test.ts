import { handInReducer, refuses, START } from '@/components/screens/survey/handInState';
import type { SurveyReading } from '@/shared/surveys/types';

const file = { name: 'reach.xlsx' } as File;
const other = { name: 'other.xlsx' } as File;
const reading = (faults: SurveyReading['faults'] = []): SurveyReading => ({
  fileName: 'reach.xlsx',
  sheets: [
    {
      sheet: 'Main',
      layout: 'longTable',
      headingRow: 1,
      columns: [{ column: 0, heading: 'Ch', field: 'chainage', unit: 'm', sample: ['0'] }],
    },
  ],
  decimal: 'point',
  sectionCount: 1,
  pointCount: 3,
  faults,
  faultsNotListed: 0,
  sections: [],
});
const choice = { columns: [], decimal: 'comma' as const };

describe('handing in a survey', () => {
  it('reads the file that was chosen and offers its match', () => {
    const chosen = handInReducer(START, { type: 'fileChosen', file });
    expect(chosen.step).toBe('reading');
    const read = handInReducer(chosen, {
      type: 'readingArrived',
      file,
      choice: null,
      reading: reading(),
    });
    expect(read).toMatchObject({
      step: 'read',
      changed: false,
      choice: { columns: [{ column: 0, field: 'chainage', unit: 'm' }], decimal: 'auto' },
    });
  });

  it('passes over the answer about a file or a match that no longer stands', () => {
    const first = handInReducer(START, { type: 'fileChosen', file });
    const second = handInReducer(first, { type: 'fileChosen', file: other });
    const late = { type: 'readingArrived' as const, file, choice: null, reading: reading() };
    expect(handInReducer(second, late)).toBe(second);

    const read = handInReducer(first, late);
    const again = handInReducer(read, { type: 'matchChanged', choice });
    expect(handInReducer(again, late)).toBe(again);
    expect(
      handInReducer(again, { type: 'readingFailed', file, choice: null, error: new Error() }),
    ).toBe(again);
  });

  it('keeps the earlier reading in sight while it is read again with another match', () => {
    const read = handInReducer(handInReducer(START, { type: 'fileChosen', file }), {
      type: 'readingArrived',
      file,
      choice: null,
      reading: reading(),
    });
    const again = handInReducer(read, { type: 'matchChanged', choice });
    expect(again).toMatchObject({ step: 'reading', choice, previous: { sectionCount: 1 } });
    const done = handInReducer(again, { type: 'readingArrived', file, choice, reading: reading() });
    expect(done).toMatchObject({ step: 'read', changed: true, choice });
  });

  it('offers the same file and match again after a failure', () => {
    const first = handInReducer(START, { type: 'fileChosen', file });
    const failed = handInReducer(first, {
      type: 'readingFailed',
      file,
      choice: null,
      error: new Error('timeout'),
    });
    expect(failed.step).toBe('unread');
    expect(handInReducer(failed, { type: 'readAgain' })).toMatchObject({ step: 'reading', file });
  });

  it('is refused by faults, listed or not, and not by doubts', () => {
    const at = { sheet: 'Main', row: 1, lastRow: null, column: 'A', title: '', detail: '' };
    expect(refuses(reading())).toBe(false);
    expect(refuses(reading([{ ...at, severity: 'doubt' }]))).toBe(false);
    expect(refuses(reading([{ ...at, severity: 'fault' }]))).toBe(true);
    expect(refuses({ ...reading(), faultsNotListed: 2 })).toBe(true);
  });
});
