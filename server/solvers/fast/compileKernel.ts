import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

const COMPILER = require.resolve('assemblyscript/package.json');
const OPTIONS = ['--runtime', 'stub', '--importMemory', '--noExportMemory', '--enable', 'simd'];
const OPTIMISED = ['-O3', '--converge', '--noAssert', '--disableWarning'];

/** The text of kernelBytes.ts: assembly/ compiled, in base64. The same sources give the same text. */
export function compileKernel(): string {
  const folder = mkdtempSync(path.join(tmpdir(), 'spate-kernel-'));
  try {
    const outFile = path.join(folder, 'kernel.wasm');
    const compiler = path.join(path.dirname(COMPILER), 'bin/asc.js');
    const args = [compiler, 'index.ts', ...OPTIONS, ...OPTIMISED, '--outFile', outFile];
    execFileSync(process.execPath, args, { cwd: path.join(__dirname, 'assembly') });
    const bytes = readFileSync(outFile).toString('base64');
    return (
      '/** Made of assembly/ by `npm run kernel`; not to be changed by hand. */\n' +
      `export const KERNEL_BYTES =\n  '${bytes}';\n`
    );
  } finally {
    rmSync(folder, { recursive: true });
  }
}
