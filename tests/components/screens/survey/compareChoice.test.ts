import { geometryOptions, parseKey } from '@/components/screens/survey/compare/geometryChoice';
import { countFates, nameOf } from '@/components/screens/survey/compare/fateWords';
import { compareGeometries } from '@/shared/reaches/compare/compareGeometries';
import { newestReach } from '@/shared/reaches/newestReach';
import type { ReachRow } from '@/shared/reaches/types';
import type { SurveyRevisionRow } from '@/shared/surveys/types';
import { plainSections } from '@/tests/helpers/plainSections';

const revision = (id: number, number: number) =>
  ({ id, revision: number }) as unknown as SurveyRevisionRow;
const reach = (id: number, name: string, number: number, copiedFrom: number | null) =>
  ({ id, name, revision: number, copiedFrom }) as unknown as ReachRow;

test('surveys come first, then what was made of them; the address names each', () => {
  const options = geometryOptions(
    [revision(7, 2), revision(4, 1)],
    [reach(9, 'Dredged', 1, 3), reach(3, 'Revision 1', 1, null)],
  );
  expect(options).toEqual([
    { value: 'survey-4', label: 'Survey, revision 1' },
    { value: 'survey-7', label: 'Survey, revision 2' },
    { value: 'reach-3', label: 'Reach of revision 1' },
    { value: 'reach-9', label: 'Geometry Dredged' },
  ]);
  expect(parseKey('reach-9')).toEqual({ kind: 'reach', id: 9 });
  expect(parseKey('reach-x')).toBeNull();
  expect(parseKey(undefined)).toBeNull();
});

test('until one is chosen the reach of the newest survey is shown, no working geometry', () => {
  const rows = [reach(9, 'Dredged', 2, 5), reach(5, 'Revision 2', 2, null), reach(3, 'R', 1, null)];
  expect(newestReach(rows)?.id).toBe(5);
  expect(newestReach([])).toBeUndefined();
});

test('what became of the sections is counted in words', () => {
  const [one, two, three, four] = plainSections();
  const rows = compareGeometries(
    [one, two, three],
    [one, { ...two, banks: null }, { ...three, id: 'Weir' }, four],
  );
  expect(countFates(rows)).toBe('1 changed, 1 renamed, 1 new, 1 as they were');
  expect(rows.map(nameOf)).toEqual(['XS-01', 'XS-02', 'XS-03, now Weir', 'XS-04']);
});
