import { gridConvergence } from '../../../shared/confidence/gridConvergence';
import type { ConfidenceResult } from '../../../shared/confidence/types';
import { runPdf } from '../../../server/reports/runPdf';
import { runReport } from '../../../server/reports/runReport';
import type { ConfidenceFacts } from '../../../server/reports/types';
import { confidenceFacts } from '../../../server/services/reports/confidenceFacts';
import type { ConfidenceSet } from '../../../server/services/confidence/readConfidence';
import { sampleBlocks, sampleCase } from '../results/sampleRun';
import { pdfPages } from './pdfText';
import { sampleFacts } from './sampleFacts';

jest.setTimeout(60_000);

const place = { name: 'Mill bridge', chainage: 1000 };
const base = { peakStage: 50.5, peakFlow: 80, arrival: 3600 };
const grids: [number, number, number] = [50.01, 50.04, 50.16];
const RESULTS: ConfidenceResult[] = [
  {
    kind: 'convergence',
    grids: [10, 20, 40].map((cellSize) => ({ cellSize, cells: 2000 / cellSize, seconds: 1 })),
    stations: [
      {
        ...place,
        // Order 2 exactly; the index of the finest: 1.25 × 0.03 / 3 = 0.0125 m.
        peakStage: {
          values: grids,
          convergence: gridConvergence(grids, [10, 20, 40]),
          band: 0.0125,
        },
        peakFlow: { values: [80, 80, null], convergence: null, band: null },
        arrival: { values: [3600, 3600, 3600], convergence: null, band: null },
      },
    ],
    along: {
      chainage: [0, 1000],
      bed: [48, 47],
      peakStage: [51, 50.01],
      difference: [0.01, 0.03],
      band: [null, 0.0125],
      order: 2,
      monotone: 1,
    },
    widest: { chainage: 1000, difference: 0.03 },
  },
  {
    kind: 'sensitivity',
    cellSize: 50,
    stations: [place],
    base: [base],
    rows: [
      {
        parameter: 'roughness',
        low: { value: 0.8, stations: [{ peakStage: 50.25, peakFlow: 81, arrival: 3000 }] },
        high: { value: 1.2, stations: null },
      },
    ],
  },
  {
    kind: 'ensemble',
    cellSize: 100,
    members: 21,
    failed: 1,
    drawn: [],
    times: [0, 3600],
    stations: [
      {
        ...place,
        base,
        stage: { p5: [49, 50], p50: [49, 50.5], p95: [49, 51] },
        flow: { p5: [10, 70], p50: [10, 80], p95: [10, 90] },
        // 5, 50 and 95 of 100 of 50.0, 50.1 … 52.0 are 50.1, 51.0 and 51.9.
        peakStages: Array.from({ length: 21 }, (_, k) => 50 + k / 10),
        peakFlows: Array.from({ length: 21 }, () => 80),
        arrivals: Array.from({ length: 21 }, (_, k) => (k < 19 ? 3600 : null)),
      },
    ],
    along: {
      chainage: [0, 1000],
      bed: [48, 47],
      base: [51, 50.5],
      peakStage: { p5: [50.5, 50], p50: [51, 50.5], p95: [51.5, 51] },
    },
  },
];
const sets = RESULTS.map((result, k): ConfidenceFacts => ({
  name: `Set ${k + 1}`,
  kind: result.kind,
  finishedAt: '2026-11-03T09:00:00.000Z',
  total: 22,
  failed: result.kind === 'ensemble' ? 1 : 0,
  settings: [['Seed', '7']],
  result,
}));

it('tells what each set found, with its settings and what failed', async () => {
  const facts = sampleFacts({ confidence: sets });
  const report = await runReport(sampleBlocks().blocks, sampleCase(), facts);
  const text = (await pdfPages((await runPdf(report, 'A4')).pdf)).join(' ');
  for (const words of [
    'The finest two grids differ in peak stage by at most 0.030 m',
    'Observed order of the peak stage 2.0',
    'peak stage, m 50.010 50.040 50.160 2.0 ± 0.0125',
    'Mill bridge Base case 50.50 m 80.0 m³/s 1 h 00',
    "Manning's n −20 % −0.25 m +1.0 m³/s −10 min",
    "Manning's n +20 % no result no result no result",
    'Seed: 7. Computed 3 November 2026, 09:00 UTC; 1 of 22 members failed and are left out.',
    'Peak stage 50.50 m 50.10 m 51.00 m 51.90 m',
    'Arrival 1 h 00 1 h 00 1 h 00 never',
    'Done: Set 2, above.',
  ])
    expect(text).toContain(words);
  expect(text).not.toContain('The result was not repeated');
});

it('shows of each kind the latest, and of a signed run only what its signature saw', () => {
  const made = (kind: ConfidenceSet['set']['kind'], name: string, finishedAt: string) =>
    ({
      set: { kind, name, settings: { finest: 'same' }, finishedAt: new Date(finishedAt) },
      total: 3,
      failed: 0,
      result: RESULTS[0],
    }) as ConfidenceSet;
  const newest = [
    made('convergence', 'third', '2026-11-07T00:00:00Z'),
    made('convergence', 'second', '2026-11-03T00:00:00Z'),
    made('convergence', 'first', '2026-11-01T00:00:00Z'),
  ];
  const names = (signedAt: string | null) =>
    confidenceFacts(newest, 'metric', signedAt).map(({ name }) => name);
  expect(names(null)).toEqual(['third']);
  expect(names('2026-11-05T00:00:00Z')).toEqual(['second']);
  expect(names('2026-10-05T00:00:00Z')).toEqual([]);
});
