import { LIMITS } from '../../../shared/limits';
import { tooLarge } from '../importError';
import { decodeText } from './decodeText';
import { readDelimited } from './readDelimited';
import { readXlsx } from './readXlsx';
import { sniffFormat } from './sniffFormat';
import type { Workbook } from './types';

/** Bytes in, sheets of cells out. Throws an ImportError where there is nothing to read. */
export function readWorkbook(bytes: Buffer, fileName: string): Workbook {
  if (bytes.length > LIMITS.upload.bytes)
    throw tooLarge(`The file is larger than ${LIMITS.upload.bytes / 1024 / 1024} MB.`);
  if (sniffFormat(bytes) === 'zip') return readXlsx(bytes);
  return readDelimited(decodeText(bytes), fileName.replace(/\.[^.]*$/, '') || fileName);
}
