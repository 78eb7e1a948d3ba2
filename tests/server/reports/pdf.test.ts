import { runPdf } from '../../../server/reports/runPdf';
import { runReport, type RunReport } from '../../../server/reports/runReport';
import type { ReportFacts } from '../../../server/reports/types';
import type { RunResiduals } from '../../../shared/calibration/types';
import { CAUTIONS } from '../../../shared/runs/cautions';
import { sampleBlocks, sampleCase } from '../results/sampleRun';
import { inkShare, pdfInfo, pdfPages, pdfStructure } from './pdfText';
import { sampleFacts } from './sampleFacts';

jest.setTimeout(120_000);

const PARTS = [
  'The question',
  'Survey and datum',
  'Scenario',
  'Method',
  'Results',
  'Confidence',
  'Check',
  'Limits and cautions',
  'Sign-off',
  'Cross-sections',
];

const reportOf = (facts: ReportFacts): Promise<RunReport> =>
  runReport(sampleBlocks().blocks, sampleCase(), facts);

describe('a signed report', () => {
  let pdf: Uint8Array;
  let pages: string[];
  let count: number;
  beforeAll(async () => {
    ({ pdf, pages: count } = await runPdf(await reportOf(sampleFacts()), 'A4'));
    pages = await pdfPages(pdf);
  });

  it('has every part, n of m on each page and no mark', () => {
    const text = pages.join(' ');
    for (const part of PARTS) expect(text).toContain(part);
    expect(pages).toHaveLength(count);
    pages.forEach((page, k) => expect(page).toContain(`${k + 1} of ${count}`));
    expect(text).not.toMatch(/PRELIMINARY|WITHDRAWN/);
  });

  it('tells the peaks of the run with their units', () => {
    // The sample wave is 3 m deep at its top, where the bed lies at 49 m and 48.3 m.
    expect(pages[0]).toContain('Mill bridge 52.00 m 60.0 m³/s');
    expect(pages[0]).toContain('Ferrin quay 51.30 m');
    // Chainage over 2 m/s after half an hour: 1000 m at 2300 s.
    expect(pages[0]).toContain('0 h 38 (14 Nov, 00:38)');
  });

  it('names the signer, the code in groups, the input and the cautions', () => {
    const text = pages.join(' ');
    for (const words of [
      'Rurik Tesk, Chartered Engineer, on 5 November 2026',
      'TE-4471',
      'I have checked run 3 and did not run it myself.',
      '7K4Q-M2XW-9TRB-3HCD',
      'https://spate.example/verify/7K4Q-M2XW-9TRB-3HCD',
      `sha256:${'c4'.repeat(32)}`,
      'Supersedes run 1',
      'AIDR Guideline 7-3 (2017)',
      'Modeller: Two marks of the 2011 flood at the mill, within 0.15 m.',
      'The meadow behind the mill drains through the narrow.',
      "Calibration Not computed. In the modeller's words: Two marks of the 2011 flood at the mill",
      'Sensitivity Not done.',
      'Cell-size convergence Not done.',
      'Fast water.',
      'Mill bridge Bridge soffit',
      '52.40 m 52.00 m 0.40 m never',
      ...CAUTIONS,
    ])
      expect(text).toContain(words);
  });

  it('is a tagged document in English with a title, bookmarks and pictures told in words', async () => {
    const info = await pdfInfo(pdf);
    expect(info).toMatch(/Title:\s+Lower Veshall at Tornick: 1 in 100 year, run 3/);
    expect(info).toMatch(/Tagged:\s+yes/);
    expect(info).toMatch(/Page size:\s+595\.28 x 841\.89/);
    const structure = await pdfStructure(pdf);
    expect(structure).toContain('Table');
    expect(structure).toMatch(/H1[\s\S]*"Results/);
    const raw = Buffer.from(pdf).toString('latin1');
    expect(raw).toContain('/Lang (en-GB)');
    expect(raw).toContain('/DisplayDocTitle true');
    expect(raw.match(/\/Alt \(/g)!.length).toBeGreaterThanOrEqual(8);
    for (const part of PARTS) expect(raw).toContain(`/Title (${part})`);
  });

  it('draws something on every page', async () => {
    for (let page = 1; page <= count; page++)
      expect(await inkShare(pdf, page)).toBeGreaterThan(0.005);
  });

  it('gives the same bytes again, and others for another fact', async () => {
    const again = await runPdf(await reportOf(sampleFacts()), 'A4');
    expect(Buffer.compare(Buffer.from(pdf), Buffer.from(again.pdf))).toBe(0);
    const other = await runPdf(await reportOf(sampleFacts({ firmName: 'Another firm' })), 'A4');
    expect(Buffer.compare(Buffer.from(pdf), Buffer.from(other.pdf))).not.toBe(0);
  });
});

it('is marked preliminary on every page until it is signed', async () => {
  const { pdf } = await runPdf(
    await reportOf(sampleFacts({ signOff: null, review: null })),
    'LETTER',
  );
  const pages = await pdfPages(pdf);
  for (const page of pages) expect(page).toContain('PRELIMINARY – not signed, not to be relied on');
  expect(pages.join(' ')).toContain('This run was not sent for checking');
  expect(pages.join(' ')).not.toContain('7K4Q');
  expect(await pdfInfo(pdf)).toMatch(/Page size:\s+612 x 792/);
});

it('is marked on every page after it was withdrawn, and says why', async () => {
  const withdrawal = {
    by: 'Rurik Tesk',
    at: '2026-12-01T10:00:00.000Z',
    reason: 'The inflow was that of another catchment.',
  };
  const { pdf } = await runPdf(await reportOf(sampleFacts({ withdrawal })), 'A4');
  const pages = await pdfPages(pdf);
  for (const page of pages) expect(page).toContain('WITHDRAWN – not to be relied on');
  expect(pages[0]).toContain(withdrawal.reason);
});

it('speaks US customary units where the study does, and takes the ends where there are no stations', async () => {
  const { study } = sampleFacts();
  const facts = sampleFacts({ study: { ...study, unitSystem: 'usCustomary' }, stations: [] });
  const report = await reportOf(facts);
  expect(report.places.map(({ name }) => name)).toEqual(['XS-01', '=XS-02', 'XS-03']);
  const text = (await pdfPages((await runPdf(report, 'LETTER')).pdf)).join(' ');
  // 53 m and 60 m³/s in feet (1 ft = 0.3048 m exactly).
  expect(text).toContain('XS-01 173.88 ft 2,119 ft³/s');
  // The same n in feet: (1 / 0.3048)^(1/3) = 1.486.
  expect(text).toContain('conveyance, 1.486 A R^(2/3) / n');
  const si =
    /\d\s?(k?m|m³\/s|m\/s|m²|m³|mm|cm)(?![\p{L}\d²³/])|[\s(,](k?m|m³\/s|m\/s|m²|m³)(?=[\s),.;:])/u;
  const inWords = text.split(/(?<=[.:;]) /).filter((sentence) => si.test(sentence));
  // What people wrote stays as they wrote it.
  const written = 'Two marks of the 2011 flood at the mill, within 0.15 m.';
  expect(inWords.filter((sentence) => sentence !== written)).toEqual([]);
});

it('bears long names and texts without losing a page', async () => {
  const long = 'A statement that goes on and on about everything that was assumed. '.repeat(120);
  const facts = sampleFacts();
  const { pdf, pages } = await runPdf(
    await reportOf({
      ...facts,
      study: { ...facts.study, title: 'Very long title '.repeat(7).trim() },
      review: { ...facts.review!, assumptions: long },
    }),
    'A4',
  );
  const found = await pdfPages(pdf);
  expect(found).toHaveLength(pages);
  expect(found.join(' ').match(/goes on and on/g)).toHaveLength(120);
});

it('draws what was observed where it compares with a flood', async () => {
  const series = { times: [0, 3600], observed: [51, 51.4], computed: [51.1, 51.3] };
  const gauge = { gaugeId: 1, name: 'Mill', quantity: 'stage', why: null, figures: null } as const;
  const mark = { level: 50, kind: 'debris', confidence: 'good', observedOn: null } as const;
  const facts = sampleFacts();
  const bridge = facts.stations[0].chainage;
  const observed: RunResiduals = {
    runId: 3,
    flood: 'January 2019',
    reported: 'January 2019',
    marks: [1200, 90_000].map((chainage, id) => ({
      mark: { ...mark, id, chainage, flood: 'January 2019', note: '' },
      computed: 50.2,
      why: null,
      residual: 0.2,
      tolerance: 0.3,
    })),
    all: null,
    byKind: [],
    byConfidence: [],
    gauges: [{ ...gauge, chainage: bridge, series }],
    misfit: null,
  };
  const { pdf } = await runPdf(await reportOf({ ...facts, observed }), 'A4');
  const text = (await pdfPages(pdf)).join(' ');
  expect(text).toContain('Crosses: marks of the flood January 2019, each with its tolerance.');
  expect(text).toContain('Mill bridge (observed: crosses)');
  expect(text).not.toContain('Ferrin quay (observed: crosses)');
});
