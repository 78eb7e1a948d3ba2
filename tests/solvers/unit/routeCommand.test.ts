import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { routeCase } from '../../../server/solvers';
import type { ResultFile } from '../../../shared/case/resultFile';
import { soundCase } from './soundCase';

const ROOT = join(__dirname, '../../..');
const TSX = join(ROOT, 'node_modules/.bin/tsx');

/** The command of `npm run route`, without npm around it. */
function route(args: string[], input?: string) {
  const { status, stdout, stderr } = spawnSync(TSX, ['server/solvers/cli/route.ts', ...args], {
    cwd: ROOT,
    input,
    encoding: 'utf8',
    maxBuffer: 1e8,
  });
  return { status, stdout, stderr };
}

const timeless = (result: ResultFile): ResultFile => ({ ...result, seconds: 0 });

describe('the route command', () => {
  let folder: string;
  let file: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'spate-route-'));
    file = join(folder, 'case.json');
    writeFileSync(file, JSON.stringify(soundCase()));
  });
  afterAll(() => rmSync(folder, { recursive: true }));

  it('is what package.json runs', () => {
    const { scripts } = JSON.parse(readFileSync(join(ROOT, 'package.json'), 'utf8')) as {
      scripts: Record<string, string>;
    };
    expect(scripts.route).toBe('tsx server/solvers/cli/route.ts');
  });

  it('writes the result to standard output and progress to standard error', () => {
    const { status, stdout, stderr } = route([file]);
    expect(status).toBe(0);
    expect(stderr).toContain('100 %');
    expect(timeless(JSON.parse(stdout) as ResultFile)).toEqual(timeless(routeCase(soundCase())));
  });

  it('reads standard input and writes a file', () => {
    const out = join(folder, 'result.json');
    const { status, stdout } = route(['-', '--out', out], JSON.stringify(soundCase()));
    expect(status).toBe(0);
    expect(stdout).toBe('');
    const result = JSON.parse(readFileSync(out, 'utf8')) as ResultFile;
    expect(timeless(result)).toEqual(timeless(routeCase(soundCase())));
  });

  it('names every fault as path: what is wrong, and writes nothing', () => {
    const faulty = { ...soundCase(), title: 5, structures: [{}] };
    const { status, stdout, stderr } = route(['-'], JSON.stringify(faulty));
    expect(status).toBe(2);
    expect(stdout).toBe('');
    expect(stderr.trim().split('\n')).toEqual([
      'title: must be a text, not 5',
      expect.stringContaining('structures[0].kind: must be one of weir'),
    ]);
  });

  it.each([
    ['a file that is not there', ['nowhere.json']],
    ['no case', []],
    ['two cases', ['a.json', 'b.json']],
    ['an unknown option', ['a.json', '--fast']],
    ['an option without its value', ['a.json', '--out']],
  ])('ends with 2 on %s', (_, args) => {
    const { status, stdout, stderr } = route(args);
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr).not.toContain('    at ');
  });

  it('ends with 2 on what is not JSON', () => {
    const { status, stderr } = route(['-'], '{"format":');
    expect(status).toBe(2);
    expect(stderr).toContain('(standard input):');
  });

  it('ends with 1 where the run fails, and says where and when', () => {
    const absurd = soundCase();
    absurd.upstream = { kind: 'inflow', times: [0, 1], flows: [5, 9e8] };
    const { status, stdout, stderr } = route(['-'], JSON.stringify(absurd));
    expect([status, stdout]).toEqual([1, '']);
    expect(stderr).toMatch(/The run failed.* at \d+\.\d s: /);
  });
});
