import type { Kernel } from '../kernel';
import { createLimitedEnds } from '../reconstruction/limitedSlopes';
import type { Workspace } from '../workspace';
import { KERNEL_BYTES } from './kernelBytes';

/** What `assembly/index.ts` lets out, besides the places of the arrays. */
interface KernelExports {
  slopes(): void;
  fluxes(): void;
  limitOutflow(dt: number): void;
  predict(dt: number): void;
  correct(dt: number): number;
  fastestWave(): number;
}

let compiled: WebAssembly.Module | null | undefined;

/** The compiled loops; null where this machine has no WebAssembly with SIMD. */
function kernelModule(): WebAssembly.Module | null {
  if (compiled === undefined) {
    const bytes = Buffer.from(KERNEL_BYTES, 'base64');
    const runs = typeof WebAssembly === 'object' && WebAssembly.validate(bytes);
    compiled = runs ? new WebAssembly.Module(bytes) : null;
  }
  return compiled;
}

export function hasFastKernel(): boolean {
  return kernelModule() !== null;
}

/**
 * The loops in WebAssembly, two cells at once, with the operations of the readable ones in their order: the same bits.
 * They work where the arrays of the workspace are, in its memory. Throws where there is none or hasFastKernel is false.
 */
export function createFastKernel(workspace: Workspace): Kernel {
  const module = kernelModule();
  const { memory } = workspace;
  if (module === null || memory === null) throw new Error('No memory or no WebAssembly to run in');
  const instance = new WebAssembly.Instance(module, { env: { memory } });
  for (const [name, entry] of Object.entries(instance.exports)) {
    if (!(entry instanceof WebAssembly.Global)) continue;
    const value = workspace[name as keyof Workspace];
    if (ArrayBuffer.isView(value)) entry.value = value.byteOffset;
    else if (typeof value === 'number') entry.value = value;
    else throw new Error(`The workspace has no ${name}, which the fast kernel works on`);
  }
  const loops = instance.exports as unknown as KernelExports;
  const limitedEnds = createLimitedEnds(workspace);

  return {
    slopes() {
      loops.slopes();
      limitedEnds();
    },
    fluxes: loops.fluxes,
    limitOutflow: loops.limitOutflow,
    predict: loops.predict,
    correct: loops.correct,
    fastestWave: loops.fastestWave,
  };
}
