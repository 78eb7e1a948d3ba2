import { readFileSync } from 'node:fs';
import path from 'node:path';

import { compileKernel } from '@/server/solvers/fast/compileKernel';

const KEPT = path.join(__dirname, '../../../server/solvers/fast/kernelBytes.ts');

it('the fast kernel that is kept is what its sources compile to', () => {
  expect(readFileSync(KEPT, 'utf8')).toBe(compileKernel());
}, 60_000);
