import type { Response } from 'express';

const XLSX_TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** Answers with an XLSX to be saved under a name. */
export function sendWorkbook(res: Response, name: string, bytes: Buffer) {
  res.attachment(name);
  res.type(XLSX_TYPE);
  res.send(bytes);
}
