/**
 * SHA-256 of bytes, as lower-case hex. For pages that are not served over HTTPS, where the browser keeps its own from
 * us; slower, so it is used only there.
 *
 * Source: NIST FIPS 180-4, "Secure Hash Standard", 4.1.2, 4.2.2, 5.3.3 and 6.2. The constants are the first 32 bits of
 * the fractional parts of cube and square roots of the first primes, computed here as the standard defines them.
 */
export function sha256(bytes: Uint8Array): string {
  const hash = Uint32Array.from(INITIAL);
  const padded = pad(bytes);
  const view = new DataView(padded.buffer);
  const w = new Uint32Array(64);
  for (let block = 0; block < padded.length; block += 64) {
    for (let i = 0; i < 16; i++) w[i] = view.getUint32(block + 4 * i);
    for (let i = 16; i < 64; i++) {
      const a = w[i - 15];
      const b = w[i - 2];
      const small0 = rotate(a, 7) ^ rotate(a, 18) ^ (a >>> 3);
      const small1 = rotate(b, 17) ^ rotate(b, 19) ^ (b >>> 10);
      w[i] = w[i - 16] + small0 + w[i - 7] + small1;
    }
    compress(hash, w);
  }
  return [...hash].map((word) => word.toString(16).padStart(8, '0')).join('');
}

function compress(hash: Uint32Array, w: Uint32Array): void {
  let [a, b, c, d, e, f, g, h] = hash;
  for (let i = 0; i < 64; i++) {
    const big1 = rotate(e, 6) ^ rotate(e, 11) ^ rotate(e, 25);
    const t1 = (h + big1 + ((e & f) ^ (~e & g)) + ROUND[i] + w[i]) | 0;
    const big0 = rotate(a, 2) ^ rotate(a, 13) ^ rotate(a, 22);
    const t2 = (big0 + ((a & b) ^ (a & c) ^ (b & c))) | 0;
    [h, g, f, e, d, c, b, a] = [g, f, e, (d + t1) | 0, c, b, a, (t1 + t2) | 0];
  }
  [a, b, c, d, e, f, g, h].forEach((word, i) => (hash[i] += word));
}

/** A one bit, zeros, and the length in bits, to whole blocks of 64 bytes. */
function pad(bytes: Uint8Array): Uint8Array {
  const padded = new Uint8Array(Math.ceil((bytes.length + 9) / 64) * 64);
  padded.set(bytes);
  padded[bytes.length] = 0x80;
  const view = new DataView(padded.buffer);
  view.setUint32(padded.length - 8, Math.floor(bytes.length / 2 ** 29));
  view.setUint32(padded.length - 4, bytes.length * 8);
  return padded;
}

const rotate = (word: number, by: number) => (word >>> by) | (word << (32 - by));

function primes(count: number): number[] {
  const found: number[] = [];
  for (let n = 2; found.length < count; n++)
    if (found.every((prime) => n % prime !== 0)) found.push(n);
  return found;
}

const fraction = (value: number) => Math.floor((value - Math.floor(value)) * 2 ** 32);
const ROUND = Uint32Array.from(primes(64), (prime) => fraction(Math.cbrt(prime)));
const INITIAL = Uint32Array.from(primes(8), (prime) => fraction(Math.sqrt(prime)));
