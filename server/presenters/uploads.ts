import type { UploadRow } from '../../shared/uploads/types';
import type { UploadModel } from '../models/Upload';

export const presentUpload = (upload: UploadModel): UploadRow => ({
  id: upload.id,
  fileName: upload.fileName,
  size: upload.size,
  received: upload.received,
  startedAt: upload.startedAt.toISOString(),
  expiresAt: upload.expiresAt.toISOString(),
});
