import { crc32 } from 'node:zlib';
import type { PackedPart } from './unzipWorkbook';

/**
 * Packs parts into an archive without compression, so that the workbook reader sees the checked parts and nothing else.
 * Layout: PKWARE APPNOTE 6.3.10, sections 4.3.7, 4.3.12 and 4.3.16.
 */
export function packStored(parts: PackedPart[]): Buffer {
  const chunks: Buffer[] = [];
  const directory: Buffer[] = [];
  let offset = 0;
  for (const part of parts) {
    const name = Buffer.from(part.name, 'utf8');
    const local = Buffer.alloc(30);
    local.writeUInt32LE(0x04034b50, 0);
    local.writeUInt16LE(20, 4);
    describe(local, 14, part.content, name.length);
    const entry = Buffer.alloc(46);
    entry.writeUInt32LE(0x02014b50, 0);
    entry.writeUInt16LE(20, 4);
    entry.writeUInt16LE(20, 6);
    describe(entry, 16, part.content, name.length);
    entry.writeUInt32LE(offset, 42);
    chunks.push(local, name, part.content);
    directory.push(entry, name);
    offset += local.length + name.length + part.content.length;
  }
  const directoryBytes = directory.reduce((sum, chunk) => sum + chunk.length, 0);
  const end = Buffer.alloc(22);
  end.writeUInt32LE(0x06054b50, 0);
  end.writeUInt16LE(parts.length, 8);
  end.writeUInt16LE(parts.length, 10);
  end.writeUInt32LE(directoryBytes, 12);
  end.writeUInt32LE(offset, 16);
  return Buffer.concat([...chunks, ...directory, end]);
}

/** Checksum, both sizes and the length of the name stand in a row in both headers. */
function describe(header: Buffer, at: number, content: Buffer, nameLength: number) {
  header.writeUInt32LE(crc32(content), at);
  header.writeUInt32LE(content.length, at + 4);
  header.writeUInt32LE(content.length, at + 8);
  header.writeUInt16LE(nameLength, at + 12);
}
