import { unreadable } from '../importError';

/** Bytes of a text file to a string: UTF-8 and UTF-16 with or without a mark, and Latin-1 as Windows writes it. */
export function decodeText(bytes: Buffer): string {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return decode(bytes, 'utf-16le');
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return decode(bytes, 'utf-16be');
  const sample = bytes.subarray(0, 4096);
  const zeros = [0, 0];
  sample.forEach((byte, index) => {
    if (byte === 0) zeros[index % 2]++;
  });
  const half = sample.length / 2;
  // Latin letters and digits in UTF-16 have one zero byte each, always on the same side.
  if (zeros[1] > 0.4 * half && zeros[0] < 0.05 * half) return decode(bytes, 'utf-16le');
  if (zeros[0] > 0.4 * half && zeros[1] < 0.05 * half) return decode(bytes, 'utf-16be');
  if (zeros[0] + zeros[1] > 0)
    throw unreadable('The file is not a spreadsheet. Save the data as XLSX or CSV and send that.');
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return decode(bytes, 'windows-1252');
  }
}

const decode = (bytes: Buffer, encoding: string) => new TextDecoder(encoding).decode(bytes);
