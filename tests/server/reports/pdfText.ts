import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';

const run = promisify(execFile);

/** Runs one of the poppler tools on a PDF; `FILE` among the arguments stands for it. */
async function poppler(tool: string, pdf: Uint8Array, args: string[]): Promise<string> {
  const directory = await mkdtemp(path.join(os.tmpdir(), 'spate-pdf-'));
  const file = path.join(directory, 'report.pdf');
  try {
    await writeFile(file, pdf);
    const given = args.map((arg) => (arg === 'FILE' ? file : arg));
    const { stdout } = await run(tool, given, { maxBuffer: 64e6, encoding: 'latin1' });
    return stdout;
  } finally {
    await rm(directory, { recursive: true, force: true });
  }
}

/** The text as a reader finds it, a string a page, white space made single. */
export async function pdfPages(pdf: Uint8Array): Promise<string[]> {
  const text = Buffer.from(await poppler('pdftotext', pdf, ['FILE', '-']), 'latin1');
  const pages = text.toString('utf8').split('\f');
  return pages.slice(0, -1).map((page) => page.replace(/\s+/g, ' ').trim());
}

export const pdfInfo = (pdf: Uint8Array): Promise<string> => poppler('pdfinfo', pdf, ['FILE']);
export const pdfStructure = (pdf: Uint8Array): Promise<string> =>
  poppler('pdfinfo', pdf, ['-struct-text', 'FILE']);

/** Pixels of a page that are not white, as a share of all: something is drawn on it. */
export async function inkShare(pdf: Uint8Array, page: number): Promise<number> {
  const at = String(page);
  const args = ['-r', '40', '-gray', '-f', at, '-l', at, 'FILE'];
  const image = Buffer.from(await poppler('pdftoppm', pdf, args), 'latin1');
  const head = /^P5\s+\d+\s+\d+\s+255\s/.exec(image.subarray(0, 60).toString('latin1'))!;
  const pixels = image.subarray(head[0].length);
  return pixels.reduce((dark, value) => dark + (value < 250 ? 1 : 0), 0) / pixels.length;
}
