import { Router } from 'express';
import { tableFormSchema, type TableForm } from '../../shared/scenarios/tableForm';
import type { Services } from '../composition';
import { authorize } from '../middleware/authorize';
import { fileOf, uploadFile } from '../middleware/uploadFile';
import { validate } from '../middleware/validate';
import { readFile } from '../services/files/readFile';

/** Tables of values against time from files; nothing is stored. */
export function tableRoutes({ authenticate }: Services): Router {
  const router = Router();
  router.post(
    '/tables/read',
    authenticate,
    authorize('table.read'),
    uploadFile,
    validate(tableFormSchema),
    async (req, res) => {
      const file = fileOf(req);
      const form = req.body as TableForm;
      res.json(await readFile(file, { kind: 'table', options: { ...form, fileName: file.name } }));
    },
  );
  return router;
}
