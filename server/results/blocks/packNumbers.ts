/**
 * Makes columns of slowly changing numbers half as large under gzip, without loss: each 32-bit word is replaced by its
 * difference from the word of the value before (modulo 2^32), then the first bytes of all values are put together, the
 * second bytes, and so on: signs, exponents and leading digits hardly change. `valueBytes` is 4 or 8.
 */
export function packNumbers(bytes: Uint8Array, valueBytes: number): Uint8Array {
  const words = wordsOf(bytes);
  const stride = valueBytes / 4;
  for (let i = words.length - 1; i >= stride; i--) words[i] -= words[i - stride];
  const apart = new Uint8Array(words.buffer);
  const count = apart.length / valueBytes;
  const packed = new Uint8Array(apart.length);
  for (let i = 0; i < count; i++) {
    for (let k = 0; k < valueBytes; k++) packed[k * count + i] = apart[i * valueBytes + k];
  }
  return packed;
}

/** The inverse; the answer starts a buffer of its own. */
export function unpackNumbers(packed: Uint8Array, valueBytes: number): Uint8Array {
  const bytes = new Uint8Array(packed.length);
  const count = packed.length / valueBytes;
  for (let i = 0; i < count; i++) {
    for (let k = 0; k < valueBytes; k++) bytes[i * valueBytes + k] = packed[k * count + i];
  }
  const words = new Uint32Array(bytes.buffer);
  const stride = valueBytes / 4;
  for (let i = stride; i < words.length; i++) words[i] += words[i - stride];
  return bytes;
}

/** A copy. */
const wordsOf = (bytes: Uint8Array): Uint32Array => new Uint32Array(new Uint8Array(bytes).buffer);
