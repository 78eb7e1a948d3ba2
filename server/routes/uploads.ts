import { Router } from 'express';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { announcedFile, partOf, readPart, tellUpload, tus, TUS_VERSION } from '../middleware/tus';
import type { StudyModel } from '../models/Study';
import type { UploadModel } from '../models/Upload';
import { presentUpload } from '../presenters/uploads';
import { plainFileName } from '../services/files/plainFileName';

/** Files that arrive part by part. */
export function uploadRoutes({ authenticate, studies, uploads }: Services): Router {
  const router = Router();
  const study: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);
  const upload: Loader<UploadModel> = (req, actor) => uploads.load(pathId(req, 'uploadId'), actor);

  router.get(
    '/studies/:studyId/uploads',
    authenticate,
    authorize('survey.send', study),
    async (_req, res) => {
      res.json((await uploads.list(recordOf(res), actorOf(res))).map(presentUpload));
    },
  );

  router.post(
    '/studies/:studyId/uploads',
    authenticate,
    authorize('survey.send', study),
    tus,
    async (req, res) => {
      const { name, size } = announcedFile(req);
      const file = { name: plainFileName(name), size };
      const made = await uploads.create(recordOf(res), actorOf(res), file);
      tellUpload(res, made);
      res.setHeader('Location', `/api/uploads/${made.id}`);
      res.status(201).end();
    },
  );

  router.head(
    '/uploads/:uploadId',
    authenticate,
    authorize('upload.change', upload),
    tus,
    (_req, res) => {
      tellUpload(res, recordOf<UploadModel>(res));
      res.status(200).end();
    },
  );

  router.patch(
    '/uploads/:uploadId',
    authenticate,
    authorize('upload.change', upload),
    tus,
    readPart,
    async (req, res) => {
      const record = recordOf<UploadModel>(res);
      const { place, bytes } = partOf(req);
      const received = await uploads.append(record, place, bytes);
      tellUpload(res, { ...record.get(), received });
      res.status(204).end();
    },
  );

  router.delete(
    '/uploads/:uploadId',
    authenticate,
    authorize('upload.change', upload),
    async (_req, res) => {
      await uploads.remove(recordOf<UploadModel>(res).id);
      res.setHeader('Tus-Resumable', TUS_VERSION);
      res.status(204).end();
    },
  );
  return router;
}
