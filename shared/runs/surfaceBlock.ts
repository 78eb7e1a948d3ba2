import type { RunSurface } from './types';

/**
 * Layout of the surface block, little-endian:
 * Uint32 magic, Uint32 version, Uint32 places P, Uint32 moments M,
 * Float64[M] times s, Float64[P] chainages m,
 * Float32[P] bed, left bank, right bank, peak stage (m), Float32[M*P] stage (m), Float32[M*P] flow (m³/s).
 */
const MAGIC = 0x53504154;
const VERSION = 1;
const HEADER_BYTES = 16;

export function encodeSurface(surface: RunSurface): ArrayBuffer {
  const { places: p, moments: m } = surface;
  const buffer = new ArrayBuffer(HEADER_BYTES + 8 * (m + p) + 4 * (4 * p + 2 * m * p));
  new Uint32Array(buffer, 0, 4).set([MAGIC, VERSION, p, m]);
  const parts = slices(buffer, p, m);
  for (const key of KEYS) parts[key].set(surface[key]);
  return buffer;
}

/** Throws where the block is not one of ours or is cut short. */
export function decodeSurface(buffer: ArrayBuffer): RunSurface {
  if (buffer.byteLength < HEADER_BYTES) throw new Error('The surface block is cut short.');
  const [magic, version, places, moments] = new Uint32Array(buffer, 0, 4);
  if (magic !== MAGIC || version !== VERSION)
    throw new Error('Not a surface block of this version.');
  return { places, moments, ...slices(buffer, places, moments) };
}

const KEYS = [
  'times',
  'chainages',
  'bed',
  'leftBank',
  'rightBank',
  'peakStage',
  'stage',
  'flow',
] as const;

function slices(buffer: ArrayBuffer, p: number, m: number) {
  let at = HEADER_BYTES;
  const doubles = (length: number) => {
    const part = new Float64Array(buffer, at, length);
    at += 8 * length;
    return part;
  };
  const floats = (length: number) => {
    const part = new Float32Array(buffer, at, length);
    at += 4 * length;
    return part;
  };
  return {
    times: doubles(m),
    chainages: doubles(p),
    bed: floats(p),
    leftBank: floats(p),
    rightBank: floats(p),
    peakStage: floats(p),
    stage: floats(m * p),
    flow: floats(m * p),
  };
}
