import { unreadable } from '../importError';

const OLE_SIGNATURE = Buffer.from([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1]);
const ZIP_SIGNATURE = Buffer.from([0x50, 0x4b, 0x03, 0x04]);
/** Other files that people send by mistake; told by their first bytes, since names lie. */
const FOREIGN: [string, number[]][] = [
  ['a PDF', [0x25, 0x50, 0x44, 0x46]],
  ['a picture', [0x89, 0x50, 0x4e, 0x47]],
  ['a picture', [0xff, 0xd8, 0xff]],
  ['a packed archive', [0x1f, 0x8b]],
  ['a packed archive', [0x52, 0x61, 0x72, 0x21]],
  ['a packed archive', [0x37, 0x7a, 0xbc, 0xaf]],
];
const HOW_TO = 'Save it as XLSX or CSV and send that.';

/** Tells a workbook from a text file by its bytes. Throws an ImportError for anything else. */
export function sniffFormat(bytes: Buffer): 'zip' | 'text' {
  if (bytes.length === 0)
    throw unreadable('The file is empty. Send the XLSX or CSV with the data.');
  if (bytes.subarray(0, 4).equals(ZIP_SIGNATURE)) return 'zip';
  if (bytes.subarray(0, 8).equals(OLE_SIGNATURE)) throw oleError(bytes);
  for (const [what, signature] of FOREIGN) {
    if (signature.every((byte, index) => bytes[index] === byte))
      throw unreadable(`The file is ${what}, not a spreadsheet. ${HOW_TO}`);
  }
  return 'text';
}

/** An encrypted XLSX travels in the container of the older binary workbooks. */
function oleError(bytes: Buffer) {
  const encrypted = bytes.includes(Buffer.from('EncryptedPackage', 'utf16le'));
  return encrypted
    ? unreadable('The workbook is locked with a password. Save it without one and send that.')
    : unreadable(`The file is an older binary workbook. ${HOW_TO}`);
}
