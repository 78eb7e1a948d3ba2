import type { CaseFile } from '../../../shared/case/caseFile';
import { runPdf } from '../../../server/reports/runPdf';
import { runReport } from '../../../server/reports/runReport';
import { sampleBlocks, sampleCase } from '../results/sampleRun';
import { pdfPages } from './pdfText';
import { sampleFacts } from './sampleFacts';

jest.setTimeout(60_000);

it('tells the reservoir, the failing dam and the weir with what they were given', async () => {
  const caseFile: CaseFile = {
    ...sampleCase(),
    upstream: {
      kind: 'reservoir',
      stages: [50, 60],
      volumes: [100_000, 4_000_000],
      initialStage: 58,
      inflow: { times: [0, 3600, 7200], flows: [10, 80, 10] },
    },
    structures: [
      {
        kind: 'breach',
        id: 'D1',
        chainage: 0,
        crest: [
          [0, 60],
          [80, 60.5],
        ],
        trigger: { kind: 'stage', stage: 60.2 },
        mode: 'overtopping',
        growth: 'sine',
        formationTime: 1800,
        bottomWidth: 30,
        bottomLevel: 51,
        sideSlope: 0.8,
      },
      {
        kind: 'weir',
        id: 'W1',
        chainage: 1000,
        crest: [
          [0, 52],
          [30, 52],
        ],
        form: 'sharp',
      },
    ],
  };
  const report = await runReport(sampleBlocks().blocks, caseFile, sampleFacts());
  const text = (await pdfPages((await runPdf(report, 'A4')).pdf)).join(' ');
  for (const words of [
    'Water at the start 58.00 m',
    '60.00 m, 4,000,000 m³',
    'highest 80.0 m³/s at 1 h 00',
    'Failing dam D1',
    'when the water above it stands at 60.20 m',
    '30.0 m wide at 51.00 m',
    'Weir W1',
  ])
    expect(text).toContain(words);
  expect(text).not.toContain('no bridge, culvert or weir');
});
