import { gunzipSync } from 'node:zlib';
import type { CaseFile } from '../../shared/case/caseFile';
import type { Paper } from '../../shared/reports/types';
import type { EncodedBlock } from '../results/blocks/blockTypes';
import { runBlocks } from '../results/blocks/runBlocks';
import type { AnnexFacts } from './annex/types';
import { runPdf, type DrawnReport } from './runPdf';
import { runReport } from './runReport';
import type { ReportFacts } from './types';

export interface ReportTask {
  blocks: EncodedBlock[];
  /** The frozen case, gzip. */
  caseBytes: Uint8Array;
  facts: ReportFacts;
  papers: Paper[];
  /** Published cases to be added; null: none. */
  annex: AnnexFacts | null;
}

/** Entry of the worker thread that draws reports: one of each paper, in their order. */
export default async function drawReports(task: ReportTask) {
  const { blocks, caseBytes, facts, papers, annex } = task;
  const stored = new Map(blocks.map(({ kind, part, bytes }) => [`${kind}/${part}`, bytes]));
  const source = runBlocks(async (kind, parts) =>
    parts.map((part) => {
      const bytes = stored.get(`${kind}/${part}`);
      if (!bytes) throw new Error(`The block ${kind}/${part} is missing.`);
      return bytes;
    }),
  );
  const caseFile = JSON.parse(gunzipSync(caseBytes).toString('utf8')) as CaseFile;
  const report = await runReport(source, caseFile, facts);
  const drawn: DrawnReport[] = [];
  for (const paper of papers) drawn.push(await runPdf(report, paper, annex));
  return drawn;
}
