import { sha256 } from './sha256';

/** SHA-256 of a file, hex; it is read here and goes nowhere. */
export async function hashFile(file: File): Promise<string> {
  const bytes = await file.arrayBuffer();
  // Browsers offer their own only over HTTPS and on the machine itself.
  if (!globalThis.crypto?.subtle) return sha256(new Uint8Array(bytes));
  const hash = new Uint8Array(await crypto.subtle.digest('SHA-256', bytes));
  return [...hash].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}
