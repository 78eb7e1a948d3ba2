/** A file that is on its way in, or waits to be read. `GET /api/studies/:studyId/uploads`: one's own. */
export interface UploadRow {
  id: number;
  fileName: string;
  /** Bytes of the whole file, and those that have arrived. */
  size: number;
  received: number;
  startedAt: string;
  expiresAt: string;
}
