import { inflateRawSync } from 'node:zlib';
import { LIMITS } from '../../../shared/limits';
import { tooLarge, unreadable } from '../importError';

/**
 * Unpacks the parts of an XLSX that hold cells, within a bound on what they may unpack to.
 * Layout of the archive: PKWARE APPNOTE 6.3.10, sections 4.3.12 (central directory) and 4.3.16 (its end).
 * What the directory declares is checked first, what really comes out is capped again, since declarations lie.
 */
export interface PackedPart {
  name: string;
  content: Buffer;
}

const END_SIGNATURE = 0x06054b50;
const ENTRY_SIGNATURE = 0x02014b50;
const LOCAL_SIGNATURE = 0x04034b50;
const END_BYTES = 22;
const MAX_COMMENT = 0xffff;
const MAX_ENTRIES = 4 * LIMITS.upload.sheets;
const ENCRYPTED_FLAG = 1;
const STORED = 0;
const DEFLATED = 8;

const BROKEN =
  'The workbook is damaged: it cannot be unpacked. Open it, save it anew and send that.';
const BOMB = `The workbook unpacks to more than ${LIMITS.upload.unpackedBytes / 1024 / 1024} MB. Send the sections alone, without pictures and spare sheets.`;

const CONTENTS = '[Content_Types].xml';

interface Entry {
  name: string;
  method: number;
  packed: number;
  unpacked: number;
  offset: number;
}

/** Pictures, macros, drawings, links and the like are never unpacked. */
const holdsCells = (name: string) =>
  /^(\[Content_Types\]\.xml|_rels\/\.rels|docProps\/\w+\.xml)$/.test(name) ||
  /^(xl\/)?(\w+\.xml|_rels\/workbook\.xml\.rels|(worksheets|theme)\/[^/]+\.xml)$/i.test(name);

export function unzipWorkbook(bytes: Buffer): PackedPart[] {
  const entries = readDirectory(bytes);
  refuseForeign(entries);
  const wanted = entries.filter((entry) => holdsCells(entry.name));
  const declared = wanted.reduce((sum, entry) => sum + entry.unpacked, 0);
  if (declared > LIMITS.upload.unpackedBytes) throw tooLarge(BOMB);
  let left: number = LIMITS.upload.unpackedBytes;
  const parts = wanted.map((entry) => {
    const content = unpack(bytes, entry, left);
    left -= content.length;
    return { name: entry.name, content };
  });
  return parts.map((part) => (part.name === CONTENTS ? onlyKept(part, parts) : part));
}

/** The list of contents without the parts that were left packed, lest the reader look for them. */
function onlyKept(contents: PackedPart, parts: PackedPart[]): PackedPart {
  const kept = new Set(parts.map(({ name }) => `/${name}`.toLowerCase()));
  const list = contents.content
    .toString('utf8')
    .replace(/<Override\b[^>]*\bPartName="([^"]*)"[^>]*>/g, (entry, name: string) =>
      kept.has(name.toLowerCase()) ? entry : '',
    );
  return { name: contents.name, content: Buffer.from(list, 'utf8') };
}

function readDirectory(bytes: Buffer): Entry[] {
  const end = findEnd(bytes);
  const count = bytes.readUInt16LE(end + 10);
  let at = bytes.readUInt32LE(end + 16);
  if (count > MAX_ENTRIES) throw tooLarge(BOMB);
  const entries: Entry[] = [];
  const names = new Set<string>();
  for (let index = 0; index < count; index++) {
    if (at + 46 > bytes.length || bytes.readUInt32LE(at) !== ENTRY_SIGNATURE)
      throw unreadable(BROKEN);
    if (bytes.readUInt16LE(at + 8) & ENCRYPTED_FLAG)
      throw unreadable(
        'The workbook is locked with a password. Save it without one and send that.',
      );
    const nameLength = bytes.readUInt16LE(at + 28);
    const entry: Entry = {
      name: bytes.toString('utf8', at + 46, at + 46 + nameLength),
      method: bytes.readUInt16LE(at + 10),
      packed: bytes.readUInt32LE(at + 20),
      unpacked: bytes.readUInt32LE(at + 24),
      offset: bytes.readUInt32LE(at + 42),
    };
    if (names.has(entry.name)) throw unreadable(BROKEN);
    names.add(entry.name);
    entries.push(entry);
    at += 46 + nameLength + bytes.readUInt16LE(at + 30) + bytes.readUInt16LE(at + 32);
  }
  return entries;
}

function findEnd(bytes: Buffer): number {
  const lowest = Math.max(0, bytes.length - END_BYTES - MAX_COMMENT);
  for (let at = bytes.length - END_BYTES; at >= lowest; at--) {
    if (bytes.readUInt32LE(at) === END_SIGNATURE) return at;
  }
  throw unreadable(BROKEN);
}

function refuseForeign(entries: Entry[]) {
  const has = (pattern: RegExp) => entries.some((entry) => pattern.test(entry.name));
  if (has(/workbook\.xml$/i)) return;
  if (has(/workbook\.bin$/i) || has(/^content\.xml$/))
    throw unreadable('The workbook is in another format than XLSX. Save it as XLSX and send that.');
  throw unreadable('The file is a packed archive, not a spreadsheet. Send the XLSX or CSV alone.');
}

function unpack(bytes: Buffer, entry: Entry, left: number): Buffer {
  const { offset } = entry;
  if (offset + 30 > bytes.length || bytes.readUInt32LE(offset) !== LOCAL_SIGNATURE)
    throw unreadable(BROKEN);
  const start = offset + 30 + bytes.readUInt16LE(offset + 26) + bytes.readUInt16LE(offset + 28);
  const packed = bytes.subarray(start, start + entry.packed);
  if (packed.length < entry.packed) throw unreadable(BROKEN);
  if (entry.method === STORED) {
    if (packed.length > left) throw tooLarge(BOMB);
    return packed;
  }
  if (entry.method !== DEFLATED) throw unreadable(BROKEN);
  try {
    return inflateRawSync(packed, { maxOutputLength: Math.max(left, 1) });
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code;
    throw code === 'ERR_BUFFER_TOO_LARGE' ? tooLarge(BOMB) : unreadable(BROKEN);
  }
}
