import { readFileSync, writeFileSync, writeSync } from 'node:fs';

import { validateCase } from '../../../shared/case/validateCase';
import { routeCase, RunFailed } from '../index';

const USAGE = 'Usage: npm run --silent route -- <case.json | -> [--out <result.json>]';

/** 0 routed, 1 the run failed, 2 the case or the command is not valid. */
type ExitCode = 0 | 1 | 2;

function main(args: string[]): ExitCode {
  const command = parseArguments(args);
  if (typeof command === 'string') return refuse([command, USAGE]);
  const { source, out } = command;

  let value: unknown;
  try {
    value = JSON.parse(readFileSync(source === '-' ? 0 : source, 'utf8').replace(/^\uFEFF/, ''));
  } catch (error) {
    return refuse([`${source === '-' ? '(standard input)' : source}: ${reasonOf(error)}`]);
  }
  const { faults, caseFile } = validateCase(value);
  if (caseFile === null) return refuse(faults.map(({ path, message }) => `${path}: ${message}`));

  try {
    const result = routeCase(caseFile, { onProgress: showProgress });
    clearProgress();
    for (const { message } of result.warnings) process.stderr.write(`Warning: ${message}\n`);
    const text = `${JSON.stringify(result)}\n`;
    if (out === null) writeAll(text);
    else writeFileSync(out, text);
    return 0;
  } catch (error) {
    clearProgress();
    process.stderr.write(`${error instanceof RunFailed ? error.message : reasonOf(error)}\n`);
    return 1;
  }
}

function parseArguments(args: string[]): { source: string; out: string | null } | string {
  let source: string | null = null;
  let out: string | null = null;
  for (let k = 0; k < args.length; k++) {
    if (args[k] === '--out') {
      if (args[k + 1] === undefined) return '--out: name the file to write';
      if (out !== null) return '--out: given twice';
      out = args[++k];
    } else if (args[k].startsWith('--')) return `${args[k]}: not a known option`;
    else if (source !== null) return `${args[k]}: only one case at a time`;
    else source = args[k];
  }
  return source === null ? 'No case given' : { source, out };
}

function refuse(lines: string[]): ExitCode {
  process.stderr.write(`${lines.join('\n')}\n`);
  return 2;
}

function reasonOf(error: unknown): string {
  return error instanceof Error ? error.message : String(error);
}

/** Standard output may be a pipe that takes less than the whole at once. */
function writeAll(text: string): void {
  let rest = Buffer.from(text);
  while (rest.length > 0) {
    try {
      rest = rest.subarray(writeSync(1, rest));
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'EAGAIN') throw error;
    }
  }
}

let shownPercent = -1;

/** On a terminal one line that changes; in a log a line for each percent. */
function showProgress({ fraction, time }: { fraction: number; time: number }): void {
  const percent = Math.floor(100 * fraction);
  if (percent === shownPercent) return;
  shownPercent = percent;
  const [start, end] = process.stderr.isTTY ? ['\r', ''] : ['', '\n'];
  process.stderr.write(`${start}${percent} % (${(time / 3600).toFixed(2)} h)${end}`);
}

function clearProgress(): void {
  if (process.stderr.isTTY) process.stderr.write('\n');
}

process.exitCode = main(process.argv.slice(2));
