import { packNumbers, unpackNumbers } from './packNumbers';

/**
 * Named columns of numbers as one compact block, self-describing and versioned, little-endian:
 * Uint32 magic, Uint32 length H of the heading, H bytes of JSON [{name, type, length, packed}], padding to 8 bytes,
 * then each column, long ones packed (`packNumbers.ts`), padded to 8 bytes.
 */
const MAGIC = 0x31425053; // "SPB1"
const PREFIX_BYTES = 8;
/** Shorter columns gain nothing by being packed. */
const PACKED_FROM = 32;

const TYPES = { f64: Float64Array, f32: Float32Array, i32: Int32Array } as const;
type ColumnType = keyof typeof TYPES;
export type Column = Float64Array | Float32Array | Int32Array;
export type Columns = Record<string, Column>;

interface Heading {
  name: string;
  type: ColumnType;
  length: number;
  packed: boolean;
}

const padded = (bytes: number) => Math.ceil(bytes / 8) * 8;

export function encodeColumns(columns: Columns): Uint8Array {
  const headings = Object.entries(columns).map(([name, column]): Heading => {
    const { length } = column;
    return { name, type: typeOf(column), length, packed: length >= PACKED_FROM };
  });
  const text = new TextEncoder().encode(JSON.stringify(headings));
  const start = padded(PREFIX_BYTES + text.length);
  const total = Object.values(columns).reduce((sum, c) => sum + padded(c.byteLength), start);
  const block = new Uint8Array(total);
  new Uint32Array(block.buffer, 0, 2).set([MAGIC, text.length]);
  block.set(text, PREFIX_BYTES);
  let at = start;
  for (const { name, packed, type } of headings) {
    const { buffer, byteOffset, byteLength } = columns[name];
    const bytes = new Uint8Array(buffer, byteOffset, byteLength);
    block.set(packed ? packNumbers(bytes, TYPES[type].BYTES_PER_ELEMENT) : bytes, at);
    at += padded(byteLength);
  }
  return block;
}

/** The columns of a block, each of the type that `C` says. Throws where the block is not one of ours or is cut short. */
export function decodeColumns<C extends Columns>(block: Uint8Array): C {
  // A copy that starts on an 8-byte boundary: buffers from the pool of Node need not.
  const bytes = block.byteOffset % 8 === 0 ? block : new Uint8Array(block);
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  if (bytes.length < PREFIX_BYTES || view.getUint32(0, true) !== MAGIC) {
    throw new Error('Not a block of columns of this version.');
  }
  const textLength = view.getUint32(4, true);
  const text = bytes.subarray(PREFIX_BYTES, PREFIX_BYTES + textLength);
  const headings = JSON.parse(new TextDecoder().decode(text)) as Heading[];
  const columns: Columns = {};
  let at = padded(PREFIX_BYTES + textLength);
  for (const { name, type, length, packed } of headings) {
    const valueBytes = TYPES[type].BYTES_PER_ELEMENT;
    const size = length * valueBytes;
    if (at + size > bytes.length) throw new Error(`The block is cut short in column ${name}.`);
    const stored = bytes.subarray(at, at + size);
    const { buffer, byteOffset } = packed ? unpackNumbers(stored, valueBytes) : stored;
    columns[name] = new TYPES[type](buffer as ArrayBuffer, byteOffset, length);
    at += padded(size);
  }
  return columns as C;
}

function typeOf(column: Column): ColumnType {
  if (column instanceof Float64Array) return 'f64';
  return column instanceof Float32Array ? 'f32' : 'i32';
}
