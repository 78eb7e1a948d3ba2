import { gunzipSync } from 'node:zlib';
import type { CaseFile } from '../../../shared/case/caseFile';
import type { EncodedBlock } from '../blocks/blockTypes';
import { runBlocks } from '../blocks/runBlocks';
import type { ExportedRun } from './exportedRun';
import { workbook } from './workbook';

export interface WorkbookTask {
  blocks: EncodedBlock[];
  /** The frozen case, gzip. */
  caseBytes: Uint8Array;
  run: ExportedRun;
}

/** Entry of the worker thread that writes workbooks. */
export default function writeWorkbook({ blocks, caseBytes, run }: WorkbookTask) {
  const stored = new Map(blocks.map(({ kind, part, bytes }) => [`${kind}/${part}`, bytes]));
  const source = runBlocks(async (kind, parts) =>
    parts.map((part) => {
      const bytes = stored.get(`${kind}/${part}`);
      if (!bytes) throw new Error(`The block ${kind}/${part} is missing.`);
      return bytes;
    }),
  );
  const caseFile = JSON.parse(gunzipSync(caseBytes).toString('utf8')) as CaseFile;
  return workbook(source, caseFile, run);
}
