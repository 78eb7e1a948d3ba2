import type { Station } from '../../../shared/studies/types';
import { levelsSheet } from '../../../server/results/exports/levelsSheet';
import { levelsAt } from '../../../server/results/levelsAt';
import { gzipSync } from 'node:zlib';
import { read, utils } from 'xlsx';
import { CAUTIONS } from '../../../shared/runs/cautions';
import { csv } from '../../../server/results/exports/csv';
import { csvLine } from '../../../server/results/exports/csvField';
import type { ExportedRun } from '../../../server/results/exports/exportedRun';
import writeWorkbook from '../../../server/results/exports/workbookWorker';
import { METRES_PER_FOOT } from '../../../shared/units/units';
import { sampleBlocks } from './sampleRun';

const about: ExportedRun = {
  number: 12,
  studyTitle: 'Lower Veshall',
  scenarioName: '=1 in 100',
  verticalDatum: 'local',
  unitSystem: 'metric',
  requestedBy: 'Ines Corrow',
  finishedAt: '2026-03-01T10:00:00.000Z',
  startsAt: null,
  caseHash: 'sha256:00',
  solverVersion: '1.0.0',
  stations: [{ id: 4, name: 'Mill, old', chainage: 725 }],
};

async function csvRows(run: ExportedRun) {
  const { blocks, result } = sampleBlocks();
  let text = '';
  for await (const piece of csv(blocks, run)) text += piece;
  const lines = text.trimEnd().split('\r\n');
  // The fields of these data hold no comma but in the quoted name of the station.
  const rows = lines.slice(1).map((line) => line.replace('"Mill, old"', 'Mill old').split(','));
  return { heading: lines[0], rows, result };
}

describe('CSV', () => {
  test('is one long table with every digit that was computed', async () => {
    const { heading, rows, result } = await csvRows(about);
    expect(heading).toBe(
      'section,kind,chainage (m),time (s),stage (m),depth (m),flow (m3/s),velocity (m/s),Froude number (-),' +
        'peak stage (m),peak stage time (s),peak flow (m3/s),peak flow time (s),arrival (s)',
    );
    expect(rows).toHaveLength(4 * result.times.length);
    const last = rows.filter((row) => row[0] === 'XS-03');
    expect(last.map((row) => Number(row[3]))).toEqual(result.times);
    expect(last.map((row) => Number(row[4]))).toEqual(result.sections[2].stage);
    expect(last.map((row) => Number(row[6]))).toEqual(result.sections[2].flow);
    expect(new Set(last.map((row) => Number(row[9])))).toEqual(
      new Set([result.sections[2].peak.stage]),
    );
  });

  test('has the stations between the sections, in order of chainage', async () => {
    const { rows } = await csvRows(about);
    expect([...new Set(rows.map((row) => row[0]))]).toEqual([
      'XS-01',
      'Mill old',
      "'=XS-02",
      'XS-03',
    ]);
    expect(rows.find((row) => row[1] === 'station')![8]).toBe('');
  });

  test('is in feet for a study in US customary units, with the clock where there is one', async () => {
    const startsAt = '2026-11-14T06:00:00.000Z';
    const { heading, rows, result } = await csvRows({
      ...about,
      unitSystem: 'usCustomary',
      startsAt,
    });
    expect(heading).toContain('chainage (ft),time (s),clock time (UTC),stage (ft)');
    expect(heading).toContain('flow (ft3/s)');
    const row = rows.find((r) => r[0] === 'XS-03' && r[3] === '3600')!;
    expect(row[4]).toBe('2026-11-14T07:00:00Z');
    expect(Number(row[5])).toBeCloseTo(result.sections[2].stage[60] / METRES_PER_FOOT, 10);
  });

  test('quotes and disarms text', () => {
    expect(csvLine(['a"b', '@x', '-1', -1, null, NaN, 1e-7])).toBe(
      '"a""b",\'@x,\'-1,-1,,,1e-7\r\n',
    );
  });
});

describe('workbook', () => {
  async function book(run: ExportedRun) {
    const { encoded, caseFile, result } = sampleBlocks();
    const bytes = await writeWorkbook({
      blocks: encoded,
      caseBytes: gzipSync(JSON.stringify(caseFile)),
      run,
    });
    const workbook = read(bytes, { type: 'array', cellFormula: true, cellNF: true });
    const rows = (name: string) =>
      utils.sheet_to_json<(string | number | null)[]>(workbook.Sheets[name], {
        header: 1,
        defval: null,
      });
    return { workbook, rows, result };
  }

  test('has its sheets, read back to the same numbers', async () => {
    const { workbook, rows, result } = await book(about);
    expect(workbook.SheetNames).toEqual([
      'Peaks',
      'Stage',
      'Flow',
      'Velocity',
      'Inputs',
      'Warnings',
    ]);
    const [headings, ...peaks] = rows('Peaks');
    expect(headings).toContain('Peak stage (m)');
    expect(peaks.map((row) => row[0])).toEqual(['XS-01', 'Mill, old', '=XS-02', 'XS-03']);
    expect(peaks[3][4]).toBe(result.sections[2].peak.stage);
    expect(peaks[3][5]).toBeCloseTo(result.sections[2].peak.stageTime / 3600, 12);

    const stage = rows('Stage');
    expect(stage[0]).toEqual(['Time (h)', 'XS-01', 'Mill, old', '=XS-02', 'XS-03']);
    expect(stage[1]).toEqual(['Chainage (m)', 0, 725, 1000, 2500]);
    expect(stage.slice(2).map((row) => row[4])).toEqual(result.sections[2].stage);
    expect(
      rows('Flow')
        .slice(2)
        .map((row) => row[1]),
    ).toEqual(result.sections[0].flow);
    expect(stage.slice(2).map((row) => row[0])).toEqual(result.times.map((t) => t / 3600));
  });

  test('writes text as text, never as a formula', async () => {
    const { workbook, rows } = await book(about);
    for (const sheet of Object.values(workbook.Sheets)) {
      for (const [at, cell] of Object.entries(sheet)) {
        if (!at.startsWith('!')) expect((cell as { f?: string }).f).toBeUndefined();
      }
    }
    expect(rows('Inputs').find((row) => row[0] === 'Scenario')![1]).toBe('=1 in 100');
  });

  test('says what went in and what to mind', async () => {
    const { rows } = await book({ ...about, startsAt: '2026-11-14T06:00:00.000Z' });
    const inputs = rows('Inputs');
    expect(inputs).toContainEqual(['Case', 'sha256:00', null]);
    expect(inputs).toContainEqual(['Outlet', 'Normal depth', null]);
    expect(inputs).toContainEqual(['', 1800, 100]);
    const warnings = rows('Warnings').map((row) => row.join('|'));
    expect(warnings.some((row) => row.includes('Fast water.'))).toBe(true);
    for (const caution of CAUTIONS) {
      expect(warnings.some((row) => row.includes(caution))).toBe(true);
    }
    expect(rows('Stage')[0][1]).toBe('Clock time (UTC)');
    expect(rows('Stage')[3][1]).toBe('2026-11-14T06:01:00Z');
  });
});

test('levels with their freeboard, by hand: the wave of the sample run stands 3 m deep at its top', async () => {
  const { blocks } = sampleBlocks();
  const stations: Station[] = [
    {
      id: 1,
      name: 'Mill',
      chainage: 1000,
      levels: [
        { kind: 'road', level: 53, note: '' },
        { kind: 'floor', level: 51.6, note: 'Mill house' },
      ],
    },
    { id: 2, name: 'Far', chainage: 9000, levels: [{ kind: 'road', level: 1, note: '' }] },
  ];
  const levels = await levelsAt(blocks, stations);
  const [, floor, road] = levelsSheet(levels, 'metric');
  expect(road).toEqual(['Mill', 1000, 'Road level', 53, 52, 1, null, null]);
  expect(floor.slice(0, 5)).toEqual(['Mill', 1000, 'House floor, Mill house', 51.6, 52]);
  expect(floor[5]).toBeCloseTo(-0.4, 9);
  // 2.6 m and more while exp(-((t - 2300)/900)²) > 0.8: from 2300 - 425 s on, for 850 s; the moments are 60 s apart.
  const half = 900 * Math.sqrt(-Math.log(0.8));
  expect(Math.abs(Number(floor[6]) * 3600 - (2300 - half))).toBeLessThan(2);
  expect(Math.abs(Number(floor[7]) * 3600 - 2 * half)).toBeLessThan(4);
  const [heads, us] = levelsSheet(levels, 'usCustomary');
  expect(heads[5]).toBe('Freeboard (ft)');
  expect(us[5]).toBeCloseTo(-0.4 / 0.3048, 9);
});
