import { gzipSync } from 'node:zlib';
import type { CaseFile } from '../../../shared/case/caseFile';
import { lazyPool } from '../../../server/jobs/lazyPool';
import type { ReportTask } from '../../../server/reports/reportWorker';
import type { DrawnReport } from '../../../server/reports/runPdf';
import { encodeRun } from '../../../server/results/blocks/encodeRun';
import { recordWave } from '../../../server/results/blocks/waveRecorder';
import { sampleCase, sampleResult } from '../results/sampleRun';
import { pdfPages } from './pdfText';
import { sampleFacts } from './sampleFacts';

jest.setTimeout(120_000);

/** A reach of sixty sections, 40 m apart, over two hours. */
function largeRun() {
  const small = sampleCase();
  const [first] = small.sections;
  const sections = Array.from({ length: 60 }, (_, k) => ({
    ...first,
    id: `XS-${String(k + 1).padStart(2, '0')}`,
    chainage: 40 * k,
    points: first.points.map(([x, z]): [number, number] => [x, z - 0.04 * k]),
  }));
  const caseFile: CaseFile = { ...small, sections };
  const result = sampleResult(caseFile, 1000, 30);
  const wave = recordWave(result.times.length);
  const { chainage, bed } = result.cells;
  result.times.forEach((time, index) =>
    wave.add({
      index,
      time,
      stage: Float64Array.from(bed, (z) => z + 1.5),
      flow: new Float64Array(chainage.length).fill(30),
      velocity: new Float64Array(chainage.length).fill(2),
    }),
  );
  return { caseFile, blocks: encodeRun(caseFile, result, wave.finish()) };
}

it('a report of sixty sections takes seconds, in a thread that leaves the server free', async () => {
  const stops: (() => Promise<void> | void)[] = [];
  const pool = lazyPool<ReportTask, DrawnReport[]>(
    { onClose: (stop) => void stops.push(stop) },
    `${__dirname}/../../../server/reports`,
    'reportWorker',
  );
  const { caseFile, blocks } = largeRun();
  const caseBytes = gzipSync(JSON.stringify(caseFile));
  let longest = 0;
  let last = performance.now();
  const ticking = setInterval(() => {
    longest = Math.max(longest, performance.now() - last);
    last = performance.now();
  }, 10);
  const begun = performance.now();
  const [report] = await pool().run({
    blocks,
    caseBytes,
    facts: sampleFacts(),
    papers: ['A4'],
    annex: null,
  });
  const seconds = (performance.now() - begun) / 1000;
  clearInterval(ticking);
  for (const stop of stops) await stop();

  // Some 2 s on an idle core, the start of the thread included; the bound leaves room for a busy machine.
  expect(seconds).toBeLessThan(40);
  expect(longest).toBeLessThan(1000 * (seconds / 2));
  const text = (await pdfPages(report.pdf)).join(' ');
  for (const { id } of caseFile.sections) expect(text).toContain(`${id}, chainage`);
});
